import type { Fault } from '../report/fault.ts';
import { type Result, chain, failure, success } from '../report/result.ts';
import { answer } from './answer.ts';
import { fieldsOf } from './read-ask.ts';
import { foremost, issueFault } from './issue.ts';
import type { Answer } from './schema/answer.ts';
import { type SheetHead, type SheetRun, type SheetTank, runSchema, sheetSchema, tankSchema } from './schema/sheet.ts';
import { type SheetText, readSheetText } from './sheet-text.ts';
import type * as z from 'zod';

type CellReply = Extract<Answer, { readonly ok: true; readonly ask: 'cell' }>;
type AmountsReply = Extract<Answer, { readonly ok: true; readonly ask: 'amounts' }>;

/** A part of a sheet that could not be answered; the fault is placed in the sheet's text. */
export interface SheetFault {
  readonly name: string;
  readonly fault: Fault;
}

/** One run: what it makes of every species, or its fault. */
export type RunAnswer =
  SheetFault | { readonly name: string; readonly note: string | null; readonly amounts: AmountsReply };

/** One tank: its cell reaction, the yield of a stated charge, and its runs; or its fault. */
export type TankAnswer =
  | SheetFault
  | {
      readonly name: string;
      readonly purpose: string | null;
      readonly product: string;
      readonly cell: CellReply;
      /** What 1 kA h makes: electrons per mole of each species. */
      readonly yield: AmountsReply | SheetFault;
      readonly runs: readonly RunAnswer[];
    };

/** A plant: its tanks in the order of the sheet. */
export interface SheetAnswer {
  readonly plant: string;
  readonly about: string | null;
  /** True where the sheet says that its figures are invented. */
  readonly invented: boolean;
  readonly tanks: readonly TankAnswer[];
}

type Path = readonly PropertyKey[];

/** A part of the sheet against its schema; the fault is placed in the sheet. */
const checked = <T>(
  sheet: SheetText,
  schema: z.ZodType<T> & { readonly shape: object },
  value: unknown,
  path: Path,
  where: string,
): Result<T> => {
  const parsed = schema.safeParse(value);
  if (parsed.success) return success(parsed.data);
  const fault = issueFault(foremost(parsed.error.issues), Object.keys(schema.shape), where);
  return failure(sheet.place(fault, path));
};

/** The name of a tank or run that may be broken, for its heading. */
const nameOf = (value: unknown, key: 'name' | 'label', fallback: string): string => {
  const name = fieldsOf(value)?.[key];
  return typeof name === 'string' && name !== '' ? name : fallback;
};

const common = ({ where, define }: SheetHead): object => ({
  ...(where === undefined ? {} : { where }),
  ...(define === undefined ? {} : { define }),
});

const cellOf = ({ anode, cathode, medium, separator }: SheetTank): object => ({
  anode,
  cathode,
  ...(medium === undefined ? {} : { medium }),
  ...(separator === undefined ? {} : { separator: separator === 'true' || separator === 'yes' }),
});

/** What the tank is run for: as stated, else the first product of the first cathode reaction. */
const productOf = ({ product }: SheetTank, { answer: cell }: CellReply): string => {
  const terms = cell.cathode[0]?.reaction.terms ?? [];
  return product ?? terms.find((term) => !term.nu.startsWith('-') && term.species !== 'e^-')?.species ?? '';
};

/** What belongs to a run and not to the law. */
const BESIDES = new Set(['label', 'product', 'note', 'weighed']);

const givenOf = (run: SheetRun): object => {
  const quantities = Object.entries(run).filter(([name]) => !BESIDES.has(name));
  return { ...Object.fromEntries(quantities), ...(run.weighed === undefined ? {} : { mass: run.weighed }) };
};

/** Fields of the ask as the sheet calls them: `given.current` is `current`, `given.mass` is `weighed`. */
const sheetField = (fault: Fault): Fault => {
  const field = (fault.field ?? '')
    .replace(/^given\.mass$/, 'weighed')
    .replace(/^given\.?/, '')
    .replace(/^species$/, 'product');
  return { ...fault, field };
};

const amountsOf = (head: SheetHead, tank: SheetTank, species: string, given: object): Answer =>
  answer({
    ask: 'amounts',
    cell: cellOf(tank),
    species,
    given,
    want: { charge: 'A h', mass: 'kg' },
    ...common(head),
  });

const answerRun = (
  sheet: SheetText,
  head: SheetHead,
  tank: SheetTank,
  product: string,
  value: unknown,
  path: Path,
): RunAnswer => {
  const name = nameOf(value, 'label', `run ${String(Number(path.at(-1)) + 1)}`);
  const run = checked(sheet, runSchema, value, path, 'a run');
  if (!run.ok) return { name, fault: run.fault };
  const given = amountsOf(head, tank, run.value.product ?? product, givenOf(run.value));
  if (!given.ok) return { name, fault: sheet.place(sheetField(given.fault), path) };
  if (given.ask !== 'amounts') throw new RangeError('amounts were answered with something else');
  return { name, note: run.value.note ?? null, amounts: given };
};

const yieldOf = (
  sheet: SheetText,
  head: SheetHead,
  tank: SheetTank,
  product: string,
  path: Path,
): AmountsReply | SheetFault => {
  const given = amountsOf(head, tank, product, { charge: '1 kA h' });
  if (given.ok && given.ask === 'amounts') return given;
  if (given.ok) throw new RangeError('amounts were answered with something else');
  return { name: tank.name, fault: sheet.place(sheetField(given.fault), path) };
};

const answerTank = (sheet: SheetText, head: SheetHead, value: unknown, at: number): TankAnswer => {
  const path = ['cells', at];
  const name = nameOf(value, 'name', `tank ${String(at + 1)}`);
  const tank = checked(sheet, tankSchema, value, path, 'a tank');
  if (!tank.ok) return { name, fault: tank.fault };
  const cell = answer({ ask: 'cell', ...cellOf(tank.value), ...common(head) });
  if (!cell.ok) return { name, fault: sheet.place(cell.fault, path) };
  if (cell.ask !== 'cell') throw new RangeError('a cell was answered with something else');
  const product = productOf(tank.value, cell);
  const runs = (tank.value.runs ?? []).map((run, index) =>
    answerRun(sheet, head, tank.value, product, run, [...path, 'runs', index]),
  );
  const made = yieldOf(sheet, head, tank.value, product, path);
  return { name, purpose: tank.value.purpose ?? null, product, cell, yield: made, runs };
};

/** A tank whose name another has already is not answered: nobody could tell which is meant. */
const repeatedName = (sheet: SheetText, cells: readonly unknown[], at: number): SheetFault | null => {
  const name = nameOf(cells[at], 'name', '');
  const first = cells.findIndex((other) => nameOf(other, 'name', '') === name);
  if (name === '' || first === at) return null;
  const message = `There are two tanks called ${name}.`;
  const fault: Fault = { code: 'bad-ask', field: 'name', message, hint: 'Give each tank its own name.' };
  return { name, fault: sheet.place(fault, ['cells', at]) };
};

const answerHead = (sheet: SheetText, head: SheetHead): SheetAnswer => ({
  plant: head.plant,
  about: head.about ?? null,
  invented: head.figures === 'invented',
  tanks: head.cells.map((value, at) => repeatedName(sheet, head.cells, at) ?? answerTank(sheet, head, value, at)),
});

/**
 * The answers to a sheet: every tank by itself, so that a fault in one does not lose the others.
 * Faults, of the whole sheet only: `too-long`, and `bad-ask` for YAML or a head that cannot be read.
 */
export const answerSheet = (text: string): Result<SheetAnswer> =>
  chain(readSheetText(text), (sheet) =>
    chain(checked(sheet, sheetSchema, sheet.value, [], 'a sheet'), (head) => success(answerHead(sheet, head))),
  );
