import { CONTRACT } from '../desk/envelope.ts';
import { answerReadSheet, readSheet } from '../desk/sheet/sheet.ts';
import type { SheetAnswer, SheetFault, TankAnswer } from '../desk/sheet/answer.ts';
import type { Fault } from '../report/fault.ts';
import { printable } from '../report/excerpt.ts';
import { renderFault } from '../render/fault.ts';
import type { Look } from '../render/look.ts';
import { reportHtml } from '../render/report/html.ts';
import {
  renderCautions,
  renderFoot,
  renderHead,
  renderTank,
  renderTotals,
  renderUnanswered,
} from '../render/sheet/sheet.ts';
import { sheetCsv } from '../render/sheet/csv.ts';
import { sheetMarkdown } from '../render/sheet/markdown.ts';
import { lookFor } from './look.ts';
import type { Showing } from './outcome.ts';
import { readRecords } from './sheet-records.ts';
import { textOf } from './text-file.ts';
import { type ExitCode, UnreadableFile, type World, saveText } from './world.ts';

/** The formats of a sheet's answers, each with the end of its file's name. */
const ENDINGS = { text: 'txt', markdown: 'md', csv: 'csv', json: 'json', html: 'html' } as const;
type Format = keyof typeof ENDINGS;
const FORMATS: readonly Format[] = ['text', 'markdown', 'csv', 'json', 'html'];

/** How a sheet is shown, and where it goes: to standard output, to a file, or in every format to files of one stem. */
export interface SheetShowing extends Showing {
  readonly format?: Format | undefined;
  readonly out?: string | undefined;
  readonly every?: string | undefined;
}

/** Every fault of a sheet, those of runs and goals under their tank. */
const faultsOf = (tank: TankAnswer): readonly SheetFault[] => {
  if ('fault' in tank) return [tank];
  return [tank.yield, ...tank.runs, ...tank.targets].filter((part): part is SheetFault => 'fault' in part);
};

/** The whole page of text; faults go to standard error, each where its tank stands. */
const showPages = async (sheet: SheetAnswer, text: string, look: Look, world: World): Promise<void> => {
  await world.out(`${renderHead(sheet, look)}\n`);
  for (const tank of sheet.tanks) {
    if (!('fault' in tank)) await world.out(`${renderTank(tank, look)}\n`);
    for (const { name, fault } of faultsOf(tank)) {
      await world.out(`${renderUnanswered(name, look)}\n`);
      world.err(`${printable(name)}\n${renderFault(fault, text, look)}\n`);
    }
  }
  const totals = renderTotals(sheet, look);
  if (totals !== '') await world.out(`${totals}\n`);
  await world.out(`${renderCautions(sheet, look)}\n${renderFoot(sheet)}`);
};

/** The answers in a format that holds its faults itself. */
const written = (sheet: SheetAnswer, text: string, format: Exclude<Format, 'text'>): string => {
  switch (format) {
    case 'json':
      return `${JSON.stringify({ contract: CONTRACT, ok: true, sheet })}\n`;
    case 'csv':
      return sheetCsv(sheet);
    case 'markdown':
      return sheetMarkdown(sheet, text);
    case 'html':
      return reportHtml(sheet, text);
  }
};

const page = async (sheet: SheetAnswer, text: string, format: Format, look: Look, world: World): Promise<void> => {
  if (format === 'text') await showPages(sheet, text, look, world);
  else await world.out(written(sheet, text, format));
};

/** What a page would print, for a file: no colour, no terminal. */
const filed = async (world: World, print: (gathering: World) => Promise<void>): Promise<string> => {
  const pieces: string[] = [];
  const out = (piece: string): Promise<void> => {
    pieces.push(piece);
    return Promise.resolve();
  };
  await print({ ...world, out, terminal: false, colour: false });
  return pieces.join('');
};

/** The files that are asked for, each with its format; none: standard output. */
const filesOf = ({ format, json, out, every }: SheetShowing): readonly (readonly [string, Format])[] => {
  if (every !== undefined) return FORMATS.map((one) => [`${every}.${ENDINGS[one]}`, one]);
  return out === undefined ? [] : [[out, format ?? (json === true ? 'json' : 'text')]];
};

const refused = (fault: Fault, text: string, isJson: boolean, look: Look, world: World): Promise<void> => {
  if (isJson) return world.out(`${JSON.stringify({ contract: CONTRACT, ok: false, fault })}\n`);
  world.err(renderFault(fault, text, look));
  return Promise.resolve();
};

/**
 * Answers a sheet and shows it; exit code 1 where anything in it is at fault. A sheet that cannot be read writes no
 * file. Throws `UnreadableFile`.
 */
export const showSheet = async (path: string, showing: SheetShowing, world: World): Promise<ExitCode> => {
  const files = filesOf(showing);
  if (files.some(([file]) => file === path)) {
    throw new UnreadableFile(`${path} is the sheet itself: write to another file.`);
  }
  const format = showing.format ?? (showing.json === true ? 'json' : 'text');
  const text = await textOf(world, path);
  const read = readSheet(text);
  if (!read.ok) {
    await refused(read.fault, text, format === 'json' && files.length === 0, lookFor(world, showing.plain), world);
    return 1;
  }
  const sheet = answerReadSheet(read.value, await readRecords(path, read.value.records, world));
  if (files.length === 0) await page(sheet, text, format, lookFor(world, showing.plain), world);
  for (const [file, one] of files) {
    const printed = await filed(world, (gathering) => page(sheet, text, one, lookFor(gathering), gathering));
    await saveText(world, file, printed);
  }
  return sheet.tanks.some((tank) => faultsOf(tank).length > 0) ? 1 : 0;
};
