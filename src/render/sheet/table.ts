import { productsOf, quantitiesOf } from '../../desk/sheet/products.ts';
import type { RunAnswer, WholeRun, WholeTank } from '../../desk/sheet/answer.ts';
import { efficiencyText, four } from './words.ts';

const SHOWN = ['mass', 'volume', 'thickness'] as const;

/** A column of numbers: a species, or a word. */
export interface RunColumn {
  readonly heading: string;
  readonly isSpecies: boolean;
  readonly unit: string;
}

/** A row of the table of runs. */
export interface RunRow {
  readonly run: WholeRun;
  readonly cells: readonly string[];
}

/** The runs of a tank: charge, efficiency, and what each makes of every product. */
export interface RunTable {
  readonly columns: readonly RunColumn[];
  readonly rows: readonly RunRow[];
}

interface Wanted extends RunColumn {
  readonly name: (typeof SHOWN)[number];
}

const isWholeRun = (run: RunAnswer): run is WholeRun => !('fault' in run);

/** Why a weighing is doubtful; null where it is not, or where nothing was weighed. */
export const standsOut = ({ weighed }: WholeRun): string | null => weighed?.standsOut ?? null;

const wantedOf = (tank: WholeTank, runs: readonly WholeRun[]): readonly Wanted[] =>
  productsOf(tank.cell.answer.overall, tank.product).flatMap((species) =>
    SHOWN.flatMap((name) => {
      const found = runs.map((run) => quantitiesOf(run.amounts.answer, species)[name]).find((one) => one !== undefined);
      return found === undefined ? [] : [{ heading: species, isSpecies: true, name, unit: found.unit }];
    }),
  );

/** A weighed efficiency with its uncertainty; one that was stated to four digits. */
const efficiencyCell = ({ weighed, amounts }: WholeRun): string => {
  const { efficiency } = amounts.answer.quantities;
  if (weighed !== null) return efficiencyText(weighed).replace(/ %$/, '');
  return efficiency === undefined ? '' : four(efficiency);
};

/** The table of a tank's runs; null where none was answered. A column that would be empty throughout is left out. */
export const runTable = (tank: WholeTank): RunTable | null => {
  const runs = tank.runs.filter(isWholeRun);
  if (runs.length === 0) return null;
  const wanted = wantedOf(tank, runs);
  const charge = runs.map((run) => run.amounts.answer.quantities['charge']);
  const energy = runs.map((run) => run.amounts.answer.quantities['energy']);
  const withEnergy = energy.some((one) => one !== undefined);
  const word = (heading: string, unit: string): RunColumn => ({ heading, isSpecies: false, unit });
  const columns = [
    word('charge', charge.find((one) => one !== undefined)?.unit ?? ''),
    ...(withEnergy ? [word('energy', 'kWh')] : []),
    word('efficiency', '%'),
    ...wanted,
  ];
  const cell = (quantity: (typeof charge)[number]): string => (quantity === undefined ? '' : four(quantity));
  const rows = runs.map((run, at) => ({
    run,
    cells: [
      cell(charge[at]),
      ...(withEnergy ? [cell(energy[at])] : []),
      efficiencyCell(run),
      ...wanted.map(({ heading, name }) => cell(quantitiesOf(run.amounts.answer, heading)[name])),
    ],
  }));
  return { columns, rows };
};
