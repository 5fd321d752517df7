import type { AmountsAnswerShown } from '../desk/schema/answer.ts';
import type { Quantity } from '../desk/schema/shape.ts';
import { type Alignment, type Cell, columns } from './columns.ts';
import { figureOf, uncertaintyOf } from './figure.ts';
import type { Look } from './look.ts';
import { speciesText } from './spelling.ts';

type Blocks = readonly (readonly string[])[];

const worded = (name: string): string => name.replaceAll('_', ' ');

const exactDecimal = (exact: string): string => {
  const [numerator = '0', denominator] = exact.split('/');
  return denominator === undefined ? exact : `${exact} (${(Number(numerator) / Number(denominator)).toPrecision(6)})`;
};

const quantityRow = (name: string, quantity: Quantity, look: Look): readonly (Cell | string)[] => [
  { text: worded(name).padEnd(10), paint: look.paint.faint },
  figureOf(quantity),
  { text: uncertaintyOf(quantity), paint: look.paint.faint },
  quantity.unit,
];

/** What goes into the table of the other species: what differs between them. */
const PER_SPECIES = ['amount', 'mass', 'volume', 'mass_per_charge'] as const;

const alongsideRows = (answer: AmountsAnswerShown, look: Look): readonly (readonly (Cell | string)[])[] => {
  const others = Object.entries(answer.alongside);
  const shown = PER_SPECIES.filter((name) => others.some(([, quantities]) => quantities[name] !== undefined));
  const head = ['for the same charge', 'e- per mole', ...shown.flatMap((name) => [worded(name), ''])];
  const rows = others.map(([species, quantities]) => [
    speciesText(species, look),
    exactDecimal(answer.electronsPerMole[species] ?? '-'),
    ...shown.flatMap((name) => {
      const quantity = quantities[name];
      return quantity === undefined ? ['', ''] : [figureOf(quantity), quantity.unit];
    }),
  ]);
  return others.length === 0 ? [] : [head.map((text): Cell => ({ text, paint: look.paint.faint })), ...rows];
};

/** The quantities of the species asked, then the other species for the same charge. */
export const amountsBlocks = (answer: AmountsAnswerShown, species: string, look: Look): Blocks => {
  const asked = Object.keys(answer.electronsPerMole).find((name) => !(name in answer.alongside));
  const electrons = asked === undefined ? undefined : answer.electronsPerMole[asked];
  const head = look.paint.strong(speciesText(asked ?? species, look));
  const perMole = electrons === undefined ? [] : [`${head}   ${exactDecimal(electrons)} mol of electrons per mole`];
  const quantities = Object.entries(answer.quantities).map(([name, quantity]) => quantityRow(name, quantity, look));
  const side: readonly Alignment[] = ['left', 'right', ...PER_SPECIES.flatMap((): Alignment[] => ['right', 'left'])];
  return [
    perMole.length === 0 ? [head] : perMole,
    columns(quantities, ['left', 'right', 'left', 'left']),
    columns(alongsideRows(answer, look), side),
  ];
};
