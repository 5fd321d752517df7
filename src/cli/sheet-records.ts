import { dirname, isAbsolute, join } from 'node:path';
import { readRecordStream } from '../amounts/record/stream.ts';
import type { RecordSummary } from '../amounts/record/summary.ts';
import type { NamedRecord, Records } from '../desk/sheet/record.ts';
import { type Result, failure } from '../report/result.ts';
import { textBytes } from './text-file.ts';
import { UnreadableFile, type World } from './world.ts';

/** A record lies beside its sheet; a sheet from standard input lies where the command was started. */
const pathFrom = (sheet: string, record: string): string => {
  const path = isAbsolute(record) || sheet === '-' ? record : join(dirname(sheet), record);
  return path === '-' ? './-' : path;
};

/** A file that cannot be opened is the fault of the run that names it, and of no other. */
const readOne = async (sheet: string, { path, options }: NamedRecord, world: World): Promise<Result<RecordSummary>> => {
  try {
    return await readRecordStream(textBytes(world, pathFrom(sheet, path)), options);
  } catch (problem) {
    if (!(problem instanceof UnreadableFile)) throw problem;
    const hint = 'The path is seen from the folder of the sheet.';
    return failure({ code: 'bad-ask', field: 'record', message: problem.message, hint });
  }
};

/** Reads the records that a sheet names, one after the other. */
export const readRecords = async (sheet: string, named: readonly NamedRecord[], world: World): Promise<Records> => {
  const records = new Map<string, Result<RecordSummary>>();
  for (const record of named) records.set(record.key, await readOne(sheet, record, world));
  return records;
};
