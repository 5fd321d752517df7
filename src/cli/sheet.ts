import { CONTRACT } from '../desk/envelope.ts';
import { answerReadSheet, readSheet } from '../desk/sheet.ts';
import type { SheetAnswer, SheetFault, TankAnswer } from '../desk/sheet-answer.ts';
import { printable } from '../report/excerpt.ts';
import { renderFault } from '../render/fault.ts';
import type { Look } from '../render/look.ts';
import { reportHtml } from '../render/report-html.ts';
import { renderCautions, renderFoot, renderHead, renderTank, renderTotals } from '../render/sheet.ts';
import { sheetCsv } from '../render/sheet-csv.ts';
import { sheetMarkdown } from '../render/sheet-markdown.ts';
import { lookFor } from './look.ts';
import type { Showing } from './outcome.ts';
import { readRecords } from './sheet-records.ts';
import { type ExitCode, UnreadableFile, type World, saveText, textOf } from './world.ts';

/** The formats of a sheet's answers. */
export const SHEET_FORMATS = ['text', 'markdown', 'csv', 'json', 'html'] as const;
type Format = (typeof SHEET_FORMATS)[number];

/** How a sheet is shown, and where it goes: to a file, or to standard output. */
export interface SheetShowing extends Showing {
  readonly format?: Format | undefined;
  readonly out?: string | undefined;
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
    for (const { name, fault } of faultsOf(tank)) world.err(`${printable(name)}\n${renderFault(fault, text, look)}\n`);
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

/** A world whose standard output is gathered for a file. */
const gathering = (world: World): { readonly world: World; readonly text: () => string } => {
  const pieces: string[] = [];
  const out = (piece: string): Promise<void> => {
    pieces.push(piece);
    return Promise.resolve();
  };
  return { world: { ...world, out, terminal: false, colour: false }, text: () => pieces.join('') };
};

const show = async (path: string, showing: SheetShowing, world: World): Promise<ExitCode> => {
  const format = showing.format ?? (showing.json === true ? 'json' : 'text');
  const look = lookFor(world, showing.plain);
  const text = await textOf(world, path);
  const read = readSheet(text);
  if (!read.ok) {
    if (format === 'json') await world.out(`${JSON.stringify({ contract: CONTRACT, ok: false, fault: read.fault })}\n`);
    else world.err(renderFault(read.fault, text, look));
    return 1;
  }
  const sheet = answerReadSheet(read.value, await readRecords(path, read.value.records, world));
  if (format === 'text') await showPages(sheet, text, look, world);
  else await world.out(written(sheet, text, format));
  return sheet.tanks.some((tank) => faultsOf(tank).length > 0) ? 1 : 0;
};

/** Answers a sheet and shows it in a format; exit code 1 where anything in it is at fault. Throws `UnreadableFile`. */
export const showSheet = async (path: string, showing: SheetShowing, world: World): Promise<ExitCode> => {
  if (showing.out === undefined) return show(path, showing, world);
  if (showing.out === path) throw new UnreadableFile(`${path} is the sheet itself: write to another file.`);
  const gathered = gathering(world);
  const code = await show(path, showing, gathered.world);
  const text = gathered.text();
  if (text !== '') await saveText(world, showing.out, text);
  return code;
};
