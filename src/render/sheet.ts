import type { AmountsAnswerShown, CellAnswer } from '../desk/schema/answer.ts';
import type { Quantity } from '../desk/schema/shape.ts';
import type { RunAnswer, SheetAnswer, TankAnswer } from '../desk/sheet.ts';
import { hanging, labelled, page } from './block.ts';
import { type Cell, columns } from './columns.ts';
import { figureOf } from './figure.ts';
import type { Look } from './look.ts';
import { halfRows } from './reactions.ts';
import { gatheredCautions, noteLines } from './remarks.ts';
import { reactionText, speciesText } from './spelling.ts';

type Whole = Exclude<TankAnswer, { readonly fault: unknown }>;
type WholeRun = Exclude<RunAnswer, { readonly fault: unknown }>;

/** What the medium lends is made and used everywhere; nobody runs a tank for it. */
const LENT = new Set(['H2O', 'H^+', 'OH^-', 'e^-']);

/** What the cell makes, the tank's product first. */
const productsOf = ({ cell, product }: Whole): readonly string[] => {
  const made = cell.answer.overall.terms
    .filter((term) => !term.nu.startsWith('-') && !LENT.has(term.species))
    .map((term) => term.species);
  const first = made.filter((species) => product.startsWith(species));
  return [...new Set([...first, ...made])];
};

/** The quantities of one species, whether it is the one asked or stands alongside. */
const quantitiesOf = (amounts: AmountsAnswerShown, species: string): Readonly<Record<string, Quantity>> =>
  amounts.alongside[species] ?? amounts.quantities;

const reactionLines = (cell: CellAnswer, look: Look): readonly string[] =>
  columns(
    [
      ...halfRows('anode', cell.anode, look),
      ...halfRows('cathode', cell.cathode, look),
      [
        { text: 'overall', paint: look.paint.faint },
        '',
        { text: reactionText(cell.overall.plain, look), paint: look.paint.strong },
      ],
    ],
    ['left', 'right', 'left'],
  );

const perMole = (tank: Whole, look: Look): string => {
  if ('fault' in tank.yield) return '';
  const { electronsPerMole } = tank.yield.answer;
  return productsOf(tank)
    .flatMap((species) => {
      const electrons = electronsPerMole[species];
      return electrons === undefined ? [] : [`${electrons} per ${speciesText(species, look)}`];
    })
    .join(',  ');
};

const SHOWN = ['mass', 'volume'] as const;

interface Column {
  readonly species: string;
  readonly name: (typeof SHOWN)[number];
  readonly unit: string;
}

const columnsOf = (tank: Whole, runs: readonly WholeRun[]): readonly Column[] =>
  productsOf(tank).flatMap((species) =>
    SHOWN.flatMap((name) => {
      const found = runs.map((run) => quantitiesOf(run.amounts.answer, species)[name]).find((one) => one !== undefined);
      return found === undefined ? [] : [{ species, name, unit: found.unit }];
    }),
  );

const four = (quantity: Quantity | undefined): string =>
  quantity === undefined ? '' : figureOf({ value: Number(quantity.value.toPrecision(4)), unit: quantity.unit });

const runRow = (run: WholeRun, wanted: readonly Column[]): readonly string[] => {
  const { answer } = run.amounts;
  const { charge, efficiency } = answer.quantities;
  return [
    run.name,
    four(charge),
    four(efficiency),
    ...wanted.map(({ species, name }) => four(quantitiesOf(answer, species)[name])),
  ];
};

/** The runs of a tank: charge, efficiency, and what each makes of every product. */
const runLines = (tank: Whole, look: Look): readonly string[] => {
  const runs = tank.runs.filter((run): run is WholeRun => !('fault' in run));
  if (runs.length === 0) return [];
  const wanted = columnsOf(tank, runs);
  const faint = (text: string): Cell => ({ text, paint: look.paint.faint });
  const head = ['run', 'charge', 'efficiency', ...wanted.map(({ species }) => speciesText(species, look))].map(faint);
  const charge = runs.map((run) => run.amounts.answer.quantities['charge']).find((one) => one !== undefined);
  const units = ['', charge?.unit ?? '', '%', ...wanted.map(({ unit }) => unit)].map(faint);
  const rows = runs.map((run) => runRow(run, wanted));
  return columns([head, units, ...rows], ['left', ...head.map(() => 'right' as const)]);
};

/** Water and its ions are what is summed over reactions; they stand in no column here. */
const notesOf = (tank: Whole): Whole['cell']['notes'] => {
  const runs = tank.runs.flatMap((run) => ('fault' in run ? [] : run.amounts.notes));
  const all = [...tank.cell.notes, ...runs].filter(({ code }) => code !== 'summed');
  return all.filter((one, at) => all.findIndex((other) => other.message === one.message) === at);
};

/** A tank as a page of its own; its faults are shown elsewhere. */
export const renderTank = (tank: Whole, look: Look): string => {
  const head = look.paint.strong(tank.name) + (tank.purpose === null ? '' : `   ${tank.purpose}`);
  const { cell } = tank;
  const told = perMole(tank, look);
  const numbers: readonly (readonly [string, string])[] = [
    ['electrons', cell.answer.electrons],
    ...(told === '' ? [] : [['per mole', told] as const]),
  ];
  return `${head}\n${page([
    reactionLines(cell.answer, look),
    labelled(numbers, look),
    runLines(tank, look),
    noteLines(notesOf(tank), look),
  ])}`;
};

/** The heading of a sheet. */
export const renderHead = ({ plant, about }: SheetAnswer, look: Look): string =>
  [
    look.paint.strong(plant),
    ...(about === null ? [] : hanging('', about, look.paint.faint).map((line) => line.trim())),
  ].join('\n') + '\n';

/** The cautions of all tanks, each once; "" where there are none. */
export const renderCautions = ({ tanks }: SheetAnswer, look: Look): string => {
  const parts = tanks.flatMap((tank) => ('fault' in tank ? [] : [{ name: tank.name, cautions: tank.cell.cautions }]));
  const blocks = gatheredCautions(parts, look);
  return blocks.length === 0 ? '' : `${look.paint.strong('Cautions')}\n${page(blocks)}`;
};

/** The last line of a sheet. */
export const renderFoot = ({ plant, invented }: SheetAnswer): string =>
  invented ? `${plant} and all its figures are invented.\n` : '';
