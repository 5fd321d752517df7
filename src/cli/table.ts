import { type WallConditions, NORMAL_CONDITIONS } from '../amounts/wall-table.ts';
import { type WallFormat, wallText } from '../amounts/wall-text.ts';
import { type WallEntryAnswer, type WallLine, type WallSettings, answerWall } from '../desk/wall.ts';
import { renderFault } from '../render/fault.ts';
import type { Look } from '../render/look.ts';
import { renderWall, renderWallRemarks } from '../render/wall.ts';
import { forCommandLine } from './command-fault.ts';
import { equationsOfText } from './equation-list.ts';
import { lookFor } from './look.ts';
import { textPieces } from './text-file.ts';
import type { ExitCode, World } from './world.ts';

/** How the table is written. */
export type TableFormat = 'text' | WallFormat | 'json';

/** What goes into the table and how it is shown. */
export interface TableRequest {
  /** "Cu^2+ -> Cu", or "Cu: Cu^2+ -> Cu" for one of its species. */
  readonly lines: readonly string[];
  readonly file?: string | undefined;
  readonly format: TableFormat;
  readonly plain?: true | undefined;
  readonly settings: Omit<WallSettings, 'conditions'>;
  readonly temperature?: string | undefined;
  readonly pressure?: string | undefined;
}

/** One text as a stream of one piece. */
const texts = async function* (lines: readonly string[]): AsyncGenerator<string> {
  yield await Promise.resolve(lines.map((line) => `${line}\n`).join(''));
};

const linesOf = async (pieces: AsyncIterable<string>): Promise<readonly WallLine[]> => {
  const lines: WallLine[] = [];
  for await (const { label, text } of equationsOfText(pieces))
    lines.push(label === '' ? { half: text } : { half: text, species: label });
  return lines;
};

type Answered = Extract<WallEntryAnswer, { readonly rows: unknown }>;
type Faulted = Extract<WallEntryAnswer, { readonly fault: unknown }>;

const showTable = async (
  answered: readonly Answered[],
  format: Exclude<TableFormat, 'json'>,
  conditions: WallConditions,
  look: Look,
  world: World,
): Promise<void> => {
  const rows = answered.flatMap((one) => one.rows);
  const notes = answered.flatMap((one) => one.notes);
  const cautions = answered.flatMap((one) => one.cautions);
  if (rows.length === 0) return;
  if (format === 'text') {
    await world.out(renderWall(rows, conditions, { notes, cautions }, look));
    return;
  }
  await world.out(wallText(rows, format, conditions));
  const remarks = renderWallRemarks(notes, cautions, look);
  if (remarks !== '') world.err(remarks);
};

const faultText = ({ fault, half, species }: Faulted, look: Look): string =>
  renderFault(forCommandLine(fault), fault.field === 'species' ? (species ?? null) : half, look);

/** Answers a table of half-reactions and shows it; exit code 1 where a line or the conditions are at fault. */
export const answerTable = async (request: TableRequest, world: World): Promise<ExitCode> => {
  const { file, format, settings, temperature, pressure } = request;
  const conditions = {
    temperature: temperature ?? NORMAL_CONDITIONS.temperature,
    pressure: pressure ?? NORMAL_CONDITIONS.pressure,
  };
  const look = lookFor(world, request.plain);
  const typed = await linesOf(texts(request.lines));
  const listed = file === undefined ? [] : await linesOf(textPieces(world, file));
  const table = answerWall([...typed, ...listed], { ...settings, conditions });
  if (format === 'json') {
    const shown = table.ok ? { conditions, table: table.value } : { fault: table.fault };
    await world.out(`${JSON.stringify({ contract: 1, ok: table.ok, ...shown })}\n`);
  }
  if (!table.ok) {
    const { fault } = table;
    const text = fault.field === 'temperature' || fault.field === 'pressure' ? conditions[fault.field] : null;
    if (format !== 'json') world.err(renderFault(fault, text, look));
    return 1;
  }
  const faulted = table.value.filter((one) => 'fault' in one);
  if (format !== 'json') {
    await showTable(
      table.value.filter((one) => 'rows' in one),
      format,
      conditions,
      look,
      world,
    );
    for (const one of faulted) world.err(faultText(one, look));
  }
  return faulted.length > 0 ? 1 : 0;
};
