import type { WallConditions, WallRow } from '../amounts/wall-table.ts';
import { wallCell } from '../amounts/wall-text.ts';
import type { ShownCaution, ShownNote } from '../desk/schema/shape.ts';
import { page } from './block.ts';
import { type Alignment, type Cell, columns } from './columns.ts';
import type { Look } from './look.ts';
import { absenceLines, cautionLines, graveLines, noteLines } from './remarks.ts';
import { electronText, reactionText, speciesText } from './spelling.ts';

const HEAD = ['product', 'e- per mole', 'mol e-/kg', 'g/(A h)', 'A h/kg', 'mL/(A min)'];
const SIDES: readonly Alignment[] = ['left', 'right', 'right', 'right', 'right', 'right'];

const cellsOf = (row: WallRow, look: Look): readonly string[] => [
  `  ${speciesText(row.species, look)}`,
  row.electronsPerMole,
  wallCell(row.electronsPerKilogram),
  wallCell(row.massPerCharge),
  wallCell(row.chargePerMass),
  wallCell(row.gasPerCharge),
];

/** The rows under one another, each half-reaction on a line of its own above its products. */
const tableLines = (rows: readonly WallRow[], look: Look): readonly string[] => {
  const head = HEAD.map((words): Cell => ({ text: words.replace('e-', electronText(look)), paint: look.paint.faint }));
  const [first = '', ...lines] = columns([head, ...rows.map((row) => cellsOf(row, look))], SIDES);
  return [
    first,
    ...lines.flatMap((line, at) => {
      const reaction = rows[at]?.reaction ?? '';
      const heading = reaction === rows[at - 1]?.reaction ? [] : [look.paint.strong(reactionText(reaction, look))];
      return [...heading, line];
    }),
  ];
};

const once = <T>(list: readonly T[], key: (one: T) => string): readonly T[] =>
  list.filter((one, at) => list.findIndex((other) => key(other) === key(one)) === at);

/** Notes and cautions of a table, each once; `absence` says at the end that none shown does not mean safe. */
const remarksOf = (notes: readonly ShownNote[], cautions: readonly ShownCaution[], look: Look) => {
  const distinct = once(cautions, ({ text }) => text);
  return {
    grave: graveLines(distinct, look),
    notes: noteLines(
      once(notes, ({ message }) => message),
      look,
    ),
    others: cautionLines(distinct, look),
    absence: absenceLines(distinct, look),
  };
};

/** The table for the wall as a page for a person. */
export const renderWall = (
  rows: readonly WallRow[],
  { temperature, pressure }: WallConditions,
  remarks: { readonly notes: readonly ShownNote[]; readonly cautions: readonly ShownCaution[] },
  look: Look,
): string => {
  const { grave, notes, others, absence } = remarksOf(remarks.notes, remarks.cautions, look);
  const foot = rows.some(({ gasPerCharge }) => gasPerCharge !== null)
    ? [look.paint.faint(`mL/(A min): ideal dry gas at ${temperature} and ${pressure}`)]
    : [];
  return page([grave, tableLines(rows, look), foot, notes, others, absence]);
};

/** Notes and cautions alone, for what cannot hold them. "" where there are none. */
export const renderWallRemarks = (
  notes: readonly ShownNote[],
  cautions: readonly ShownCaution[],
  look: Look,
): string => {
  const { grave, notes: said, others, absence } = remarksOf(notes, cautions, look);
  return grave.length + said.length + others.length === 0 ? '' : page([grave, said, others, absence]);
};
