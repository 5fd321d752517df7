import type { AmountsAnswerShown } from '../desk/schema/answer.ts';
import type { Quantity } from '../desk/schema/shape.ts';
import { budgetLines } from './budget.ts';
import { type Alignment, type Cell, columns } from './columns.ts';
import { figureOf, uncertaintyOf } from './figure.ts';
import type { Look } from './look.ts';
import { electronText, speciesText } from './spelling.ts';
import { tankLines } from './tank-balance.ts';

type Blocks = readonly (readonly string[])[];
type Quantities = Readonly<Record<string, Quantity>>;

/** One cell's answer: of the ask itself, or of a further cell in series. */
type OneCell = Pick<AmountsAnswerShown, 'quantities' | 'alongside' | 'electronsPerMole' | 'derived'>;

const worded = (name: string): string => name.replaceAll('_', ' ');

const exactDecimal = (exact: string): string => {
  const [numerator = '0', denominator] = exact.split('/');
  return denominator === undefined ? exact : `${exact} (${(Number(numerator) / Number(denominator)).toPrecision(6)})`;
};

const quantityRows = ({ quantities, derived }: OneCell, look: Look): readonly (readonly (Cell | string)[])[] =>
  Object.entries(quantities).map(([name, quantity]) => [
    { text: worded(name).padEnd(10), paint: look.paint.faint },
    figureOf(quantity),
    { text: uncertaintyOf(quantity), paint: look.paint.faint },
    quantity.unit,
    // what was given has no relation
    { text: derived.find((one) => one.quantity === name)?.relation ?? '', paint: look.paint.faint },
  ]);

/** What goes into a table of species: what differs between them. */
const PER_SPECIES = ['amount', 'mass', 'volume', 'mass_per_charge'] as const;

interface SpeciesRow {
  readonly species: string;
  readonly electronsPerMole: string | undefined;
  readonly quantities: Quantities;
}

const speciesTable = (heading: string, rows: readonly SpeciesRow[], look: Look): readonly string[] => {
  if (rows.length === 0) return [];
  const known = PER_SPECIES.filter((name) => rows.some(({ quantities }) => quantities[name] !== undefined));
  // four quantities are wider than a terminal: where there is gas, its volume says more
  const shown = known.includes('volume') ? known.filter((name) => name !== 'mass_per_charge') : known;
  const head = [heading, `${electronText(look)} per mole`, ...shown.flatMap((name) => [worded(name), ''])];
  const lines = rows.map(({ species, electronsPerMole, quantities }) => [
    speciesText(species, look),
    exactDecimal(electronsPerMole ?? '-'),
    ...shown.flatMap((name) => {
      const quantity = quantities[name];
      return quantity === undefined ? ['', ''] : [figureOf(quantity), quantity.unit];
    }),
  ]);
  const side: readonly Alignment[] = ['left', 'right', ...PER_SPECIES.flatMap((): Alignment[] => ['right', 'left'])];
  return columns([head.map((text): Cell => ({ text, paint: look.paint.faint })), ...lines], side);
};

const alongsideRows = ({ alongside, electronsPerMole }: OneCell): readonly SpeciesRow[] =>
  Object.entries(alongside).map(([species, quantities]) => ({
    species,
    electronsPerMole: electronsPerMole[species],
    quantities,
  }));

/** The species asked: it alone does not stand alongside. */
const askedOf = ({ electronsPerMole, alongside }: OneCell): string | undefined =>
  Object.keys(electronsPerMole).find((name) => !(name in alongside));

const seriesRows = (series: readonly OneCell[]): readonly SpeciesRow[] =>
  series.map((cell) => {
    const species = askedOf(cell) ?? '-';
    return { species, electronsPerMole: cell.electronsPerMole[species], quantities: cell.quantities };
  });

/**
 * The quantities of the species asked, each with the relation it follows from, then the other species for the same
 * charge, the further cells in series, the balance of the tank and the budget, where they were asked for.
 */
export const amountsBlocks = (answer: AmountsAnswerShown, species: string, look: Look): Blocks => {
  const asked = askedOf(answer);
  const electrons = asked === undefined ? undefined : answer.electronsPerMole[asked];
  const head = look.paint.strong(speciesText(asked ?? species, look));
  return [
    [electrons === undefined ? head : `${head}   ${exactDecimal(electrons)} mol of electrons per mole`],
    columns(quantityRows(answer, look), ['left', 'right', 'left', 'left', 'left']),
    speciesTable('same charge', alongsideRows(answer), look),
    speciesTable('in series', seriesRows(answer.series ?? []), look),
    tankLines(answer.tank, look),
    budgetLines(answer.budgets, look),
  ];
};
