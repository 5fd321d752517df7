import type { RecordOptions } from '../amounts/record/options.ts';
import { readRecordStream } from '../amounts/record/stream.ts';
import { renderFault } from '../render/fault.ts';
import { renderRecord } from '../render/record.ts';
import { lookFor } from './look.ts';
import type { Showing } from './outcome.ts';
import { progressOn } from './progress.ts';
import { textBytes } from './text-file.ts';
import type { ExitCode, World } from './world.ts';

/** The text that a fault of an option points into. */
const optionText = (options: RecordOptions, field: string | undefined): string | null => {
  const { gap, zero, timeUnit, currentUnit } = options;
  const texts: Readonly<Record<string, string | undefined>> = { gap, zero, timeUnit, currentUnit };
  return texts[field ?? ''] ?? null;
};

/** Integrates a current record and shows it; exit code 1 where it cannot be read. */
export const showRecord = async (
  path: string,
  options: RecordOptions,
  showing: Showing,
  world: World,
): Promise<ExitCode> => {
  const size = path === '-' ? undefined : await world.sizeOf?.(path);
  const progress = progressOn(world, size);
  const record = await readRecordStream(textBytes(world, path), options, progress.read).finally(progress.done);
  const look = lookFor(world, showing.plain);
  if (showing.json === true) {
    const shown = record.ok ? { record: record.value } : { fault: record.fault };
    await world.out(`${JSON.stringify({ contract: 1, ok: record.ok, ...shown })}\n`);
  } else if (record.ok) await world.out(renderRecord(record.value, look));
  else world.err(renderFault(record.fault, optionText(options, record.fault.field), look));
  return record.ok ? 0 : 1;
};
