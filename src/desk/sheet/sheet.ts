import type { Fault } from '../../report/fault.ts';
import { type Result, chain, success } from '../../report/result.ts';
import { answer } from '../answer.ts';
import { type SheetHead, type SheetTank, sheetSchema, tankSchema } from '../schema/sheet.ts';
import type { CellReply, SheetAnswer, SheetFault, TankAnswer, WholeTank } from './answer.ts';
import { gatherCautions } from './cautions.ts';
import { currentUseOf } from './current-use.ts';
import { gasRatesOf } from './gas.ts';
import { type Path, checked, nameOf } from './part.ts';
import { productOfHalf, productsOf } from './products.ts';
import { type NamedRecord, type Records, recordsNamed } from './record.ts';
import { answerRuns } from './run.ts';
import { cellOf, commonOf } from './tank-ask.ts';
import { tankCautions } from './tank-cautions.ts';
import { type TankContext, answerTargets, yieldOf } from './tank-parts.ts';
import { type SheetText, readSheetText } from './text.ts';
import { type CountedRun, totalsOf } from './totals.ts';

/** What the tank is run for: as stated, else the first product of the first cathode reaction. */
const productFor = ({ product }: SheetTank, { answer: cell }: CellReply): string => {
  const [first] = cell.cathode;
  return product ?? (first === undefined ? '' : productOfHalf(first.reaction));
};

const runsOf = (tank: TankAnswer): readonly CountedRun[] => {
  if ('fault' in tank) return [];
  const products = productsOf(tank.cell.answer.overall, tank.product);
  return tank.runs.flatMap((run) => ('fault' in run ? [] : [{ run, products }]));
};

/** The gases of a cell as its reactions write them: `O2(g)`. */
const gasesIn = ({ answer: cell }: CellReply): ReadonlySet<string> =>
  new Set(cell.overall.terms.filter(({ state }) => state === 'g').map(({ species }) => species));

/** cell -> runs and goals -> what they come to together */
const wholeTank = (context: TankContext, cell: CellReply, records: Records): Result<WholeTank> => {
  const { tank, product } = context;
  const { runs, weighed } = answerRuns(context, records);
  const answered = runs.flatMap((run) => ('fault' in run ? [] : [run]));
  const products = productsOf(cell.answer.overall, product);
  const gas = gasRatesOf(answered, products, gasesIn(cell));
  return chain(tankCautions(context, gas.length > 0), (cautions) =>
    success({
      name: tank.name,
      purpose: tank.purpose ?? null,
      product,
      present: tank.present ?? [],
      cautions,
      cell,
      yield: yieldOf(context),
      runs,
      targets: answerTargets(context),
      currentUse: currentUseOf(cell, product, answered),
      weighed,
      gas,
      totals: totalsOf(answered.map((run) => ({ run, products }))),
    }),
  );
};

const answerTank = (sheet: SheetText, head: SheetHead, value: unknown, path: Path, records: Records): TankAnswer => {
  const name = nameOf(value, 'name', `tank ${String(Number(path.at(-1)) + 1)}`);
  const tank = checked(sheet, tankSchema, value, path, 'a tank');
  if (!tank.ok) return { name, fault: tank.fault };
  const cell = answer({ ask: 'cell', ...cellOf(tank.value), ...commonOf(head) });
  if (!cell.ok) return { name, fault: sheet.place(cell.fault, path) };
  if (cell.ask !== 'cell') throw new RangeError('a cell was answered with something else');
  const context = { sheet, head, tank: tank.value, product: productFor(tank.value, cell), path };
  const whole = wholeTank(context, cell, records);
  return whole.ok ? whole.value : { name, fault: sheet.place(whole.fault, path) };
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

const answerHead = (sheet: SheetText, head: SheetHead, records: Records): SheetAnswer => {
  const tanks = head.cells.map(
    (value, at) => repeatedName(sheet, head.cells, at) ?? answerTank(sheet, head, value, ['cells', at], records),
  );
  return {
    plant: head.plant,
    about: head.about ?? null,
    invented: head.figures === 'invented',
    cautions: gatherCautions(tanks.flatMap((tank) => ('fault' in tank ? [] : [tank]))),
    totals: totalsOf(tanks.flatMap(runsOf)),
    tanks,
  };
};

/** A sheet whose YAML and head are read; its tanks are not. */
export interface ReadSheet {
  readonly sheet: SheetText;
  readonly head: SheetHead;
  /** What the shell reads before the tanks are answered. */
  readonly records: readonly NamedRecord[];
}

/** Reads a sheet and says which records it names. Faults: `too-long`, and `bad-ask` for YAML or a head that cannot be read. */
export const readSheet = (text: string): Result<ReadSheet> =>
  chain(readSheetText(text), (sheet) =>
    chain(checked(sheet, sheetSchema, sheet.value, [], 'a sheet'), (head) =>
      success({ sheet, head, records: recordsNamed(sheet) }),
    ),
  );

/** The answers to a sheet that was read, with its records: every tank by itself, so that a fault in one does not lose the others. */
export const answerReadSheet = ({ sheet, head }: ReadSheet, records: Records): SheetAnswer =>
  answerHead(sheet, head, records);

/** The answers to a sheet that names no records; runs that name one are at fault. Faults: those of `readSheet`. */
export const answerSheet = (text: string): Result<SheetAnswer> =>
  chain(readSheet(text), (read) => success(answerReadSheet(read, new Map())));
