import { ABSENCE } from '../../caution/cautions.ts';
import type { Quantity } from '../../desk/schema/shape.ts';
import type {
  SheetAnswer,
  SheetCaution,
  SheetFault,
  TankAnswer,
  Totals,
  WholeRun,
  WholeTank,
  WholeTarget,
} from '../../desk/sheet/answer.ts';
import { graveOf, othersOf } from './cautions.ts';
import { tankNotes, writtenNotes } from './notes.ts';
import { standsOut } from './table.ts';

/** The columns of the table: one row for each thing that is known. */
const COLUMNS = ['part', 'tank', 'name', 'species', 'quantity', 'value', 'unit', 'uncertainty', 'text'] as const;

type Row = Partial<Record<(typeof COLUMNS)[number], string>>;

/** RFC 4180: quotes around what holds a comma, a quote or a line end. */
const field = (text: string): string => (/[",\r\n]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text);

const line = (row: Row): string => COLUMNS.map((name) => field(row[name] ?? '')).join(',');

const quantityRow = (row: Row, quantity: string, { value, unit, uncertainty }: Quantity): Row => ({
  ...row,
  quantity,
  value: String(value),
  unit,
  ...(uncertainty === undefined ? {} : { uncertainty: String(uncertainty) }),
});

const cautionRow = (caution: SheetCaution): Row => ({
  part: caution.grave === true ? 'grave caution' : 'caution',
  tank: caution.tanks.join('; '),
  species: caution.because.join(', '),
  text: `${caution.text} (${caution.basis})`,
});

const faultRow = (tank: string, { name, fault }: SheetFault): Row => ({
  part: 'fault',
  tank,
  name,
  text: [fault.code, fault.field ?? '', fault.message, fault.hint ?? ''].filter((part) => part !== '').join('; '),
});

const runRows = (tank: WholeTank, run: WholeRun): readonly Row[] => {
  const { quantities, alongside } = run.amounts.answer;
  const own: Row = { part: 'run', tank: tank.name, name: run.name, species: run.product };
  const weighed = run.weighed;
  const doubt = standsOut(run);
  const budget = (weighed?.budget ?? []).map(({ input, contribution }): Row => ({
    ...quantityRow(own, 'contribution to uncertainty', { value: contribution, unit: '%' }),
    part: 'budget',
    text: input,
  }));
  return [
    ...Object.entries(quantities).map(([name, quantity]) => quantityRow(own, name, quantity)),
    ...Object.entries(alongside).flatMap(([species, beside]) =>
      Object.entries(beside).map(([name, quantity]) => quantityRow({ ...own, species }, name, quantity)),
    ),
    ...budget,
    ...(doubt === null ? [] : [{ ...own, part: 'stands out', text: doubt }]),
    ...(run.record?.remarks ?? []).map((text): Row => ({ ...own, part: 'record', text })),
  ];
};

const targetRows = (tank: WholeTank, target: WholeTarget): readonly Row[] => {
  const own: Row = { part: 'goal', tank: tank.name, name: target.name, species: target.species };
  const quantities = { time: target.needed, 'spare time': target.spare, 'current that would do': target.enough };
  const verdict = target.reached === null ? [] : [target.reached ? 'reached' : 'missed'];
  const words = [...verdict, ...(target.ready === null ? [] : [`ready at ${target.ready}`])];
  const latest = target.latest === null ? [] : [`start at ${target.latest} at the latest`];
  return [
    { ...own, text: [target.goal.text, ...words, ...latest].join('; ') },
    ...Object.entries(quantities).flatMap(([name, one]) => (one === null ? [] : [quantityRow(own, name, one)])),
  ];
};

const totalsRows = (part: string, tank: string, totals: Totals): readonly Row[] => {
  const own: Row = { part, tank };
  const energy = totals.energy === null ? [] : [quantityRow(own, 'energy', totals.energy)];
  const products = totals.products.flatMap(({ species, ...sums }) =>
    Object.entries(sums).map(([name, quantity]) => quantityRow({ ...own, species }, name, quantity)),
  );
  return totals.runs === 0 ? [] : [quantityRow(own, 'charge', totals.charge), ...energy, ...products];
};

const tankRows = (tank: WholeTank): readonly Row[] => {
  const { name, cell, weighed, gas } = tank;
  const gases = gas.flatMap((one): readonly Row[] => [
    quantityRow({ part: 'gas', tank: name, name: one.run, species: one.species }, 'rate', one.rate),
    ...(one.air === null ? [] : [quantityRow({ part: 'gas', tank: name, name: one.run }, 'dilution air', one.air)]),
  ]);
  return [
    {
      part: 'tank',
      tank: name,
      species: tank.product,
      text: cell.answer.overall.plain,
      quantity: 'electrons',
      value: cell.answer.electrons,
    },
    ...tank.runs.flatMap((run) => ('fault' in run ? [faultRow(name, run)] : runRows(tank, run))),
    ...tank.targets.flatMap((target) => ('fault' in target ? [faultRow(name, target)] : targetRows(tank, target))),
    ...(weighed === null
      ? []
      : [quantityRow({ part: 'tank', tank: name, species: tank.product }, 'weighed efficiency', weighed.efficiency)]),
    ...totalsRows('tank', name, tank.totals),
    ...gases,
    ...('fault' in tank.yield ? [faultRow(name, tank.yield)] : []),
    ...[...tankNotes(tank), ...writtenNotes(tank)].map((text): Row => ({ part: 'note', tank: name, text })),
  ];
};

const anyTank = (tank: TankAnswer): readonly Row[] => ('fault' in tank ? [faultRow('', tank)] : tankRows(tank));

/** A sheet's answers as one long table (RFC 4180, line feeds): grave cautions first, numbers unrounded. */
export const sheetCsv = (sheet: SheetAnswer): string => {
  const rows: readonly Row[] = [
    ...graveOf(sheet).map(cautionRow),
    ...sheet.tanks.flatMap(anyTank),
    ...totalsRows('plant', '', sheet.totals),
    ...othersOf(sheet).map(cautionRow),
    { part: 'caution', text: ABSENCE },
    ...(sheet.invented ? [{ part: 'note', text: `${sheet.plant} and all its figures are invented.` }] : []),
  ];
  return `${[COLUMNS.join(','), ...rows.map(line)].join('\n')}\n`;
};
