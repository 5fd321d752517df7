import type { CellAnswer, RedoxAnswer } from '../desk/schema/answer.ts';
import type { ShownHalf, ShownMedium, ShownScaledHalf } from '../desk/schema/shape.ts';
import { labelled } from './block.ts';
import { type Cell, columns } from './columns.ts';
import { ledgerLines } from './ledger.ts';
import type { Look } from './look.ts';
import { numberText, reactionText, speciesText } from './spelling.ts';

type Blocks = readonly (readonly string[])[];

const mediumText = (medium: ShownMedium, look: Look): string =>
  typeof medium === 'string'
    ? medium
    : `helpers ${medium.helpers.map((helper) => speciesText(helper, look)).join(', ')}`;

/** A balanced half-reaction, its electron number and its ledger. */
export const halfBlocks = (half: ShownHalf, look: Look): Blocks => [
  [look.paint.strong(reactionText(half.reaction.plain, look))],
  labelled(
    [
      ['kind', half.kind],
      ['electrons', half.electrons],
      ['medium', mediumText(half.medium, look)],
    ],
    look,
  ),
  ledgerLines(half.ledger, look),
];

/** "× 2" in front of a half-reaction; nothing where it is taken once. */
const timesText = (half: ShownScaledHalf, look: Look): string =>
  half.multiplier === undefined ? '' : `${half.multiplier} ${look.unicode ? '×' : 'x'}`;

/** Half-reactions under one another, each with its multiplier. */
export const halfRows = (
  label: string,
  halves: readonly ShownScaledHalf[],
  look: Look,
): readonly (readonly (Cell | string)[])[] =>
  halves.map((half, at) => [
    { text: (at === 0 ? label : '').padEnd(10), paint: look.paint.faint },
    timesText(half, look),
    reactionText(half.reaction.plain, look),
  ]);

/** A redox reaction with its two halves and the oxidation numbers that change. */
export const redoxBlocks = (answer: RedoxAnswer, look: Look): Blocks => {
  const { overall, electrons, oxidation, reduction, changes, ledger } = answer;
  const rows = [
    ...(oxidation === undefined ? [] : halfRows('oxidation', [oxidation], look)),
    ...(reduction === undefined ? [] : halfRows('reduction', [reduction], look)),
  ];
  const arrow = look.unicode ? '→' : '->';
  const moved = changes.map(({ element, from, to }): readonly [string, string] => [
    element,
    `${numberText(from, look)} ${arrow} ${numberText(to, look)}`,
  ]);
  const numbers: readonly (readonly [string, string])[] = [['electrons', electrons]];
  return [
    [look.paint.strong(reactionText(overall.plain, look))],
    labelled(numbers, look),
    columns(rows, ['left', 'right', 'left']),
    labelled(moved, look),
    ledgerLines(ledger, look),
  ];
};

/** What crosses the separator; charge that ions without a part carry has a line more. */
const crossingRows = (answer: CellAnswer, look: Look): readonly (readonly [string, string])[] =>
  (answer.crossing ?? []).flatMap(({ species, amount, from, to }, at): readonly (readonly [string, string])[] => {
    const label = at === 0 ? 'crossing' : '';
    const who = species === null ? 'positive charge' : speciesText(species, look);
    const row = [label, `${amount} ${who} per electron, ${from} to ${to}`] as const;
    return species === null ? [row, ['', 'carried by ions that take no part']] : [row];
  });

/** A cell: overall reaction, electron number, the electrodes, what was struck out. */
export const cellBlocks = (answer: CellAnswer, look: Look): Blocks => {
  const { overall, electrons, ledger, anode, cathode, cancelled, waterFormed } = answer;
  const struck = cancelled.map(({ species, amount }) => `${amount} ${speciesText(species, look)}`).join(', ');
  const rows: readonly (readonly [string, string])[] = [
    ...(struck === '' ? [] : [['cancelled', struck] as const]),
    ...(waterFormed === '0'
      ? []
      : [['water', `${waterFormed} from ${speciesText('H^+', look)} and ${speciesText('OH^-', look)}`] as const]),
    ...crossingRows(answer, look),
  ];
  return [
    [look.paint.strong(reactionText(overall.plain, look))],
    labelled([['electrons', electrons]], look),
    columns([...halfRows('anode', anode, look), ...halfRows('cathode', cathode, look)], ['left', 'right', 'left']),
    labelled(rows, look),
    ledgerLines(ledger, look),
  ];
};
