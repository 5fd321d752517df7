import { displayWidth, excerpt, printable } from '../report/excerpt.ts';
import type { Fault, ShownCoupling, ShownReaction } from '../report/fault.ts';
import { wrapped } from './block.ts';
import { columns, indented } from './columns.ts';
import type { Look } from './look.ts';
import { electronText, reactionText, speciesText } from './spelling.ts';

const MOST = 8;

const couplingRow = (coupling: ShownCoupling, look: Look): readonly string[] => [
  reactionText((coupling.overall ?? coupling.reaction)?.plain ?? '', look),
  `${coupling.electrons} ${electronText(look)}`,
];

/** Each way to settle it with its electrons, and below it the option that does. */
const couplingLines = (couplings: readonly ShownCoupling[], look: Look): readonly string[] => {
  const shown = couplings.slice(0, MOST);
  const rows = columns(
    shown.map((coupling) => couplingRow(coupling, look)),
    ['left', 'right'],
  );
  const lines = rows.flatMap((row, at) => [row, `  --settle ${JSON.stringify(shown[at]?.assume ?? '')}`]);
  const more = couplings.length > MOST ? [`and ${String(couplings.length - MOST)} more`] : [];
  return couplings.length === 0
    ? []
    : [look.paint.faint('settle it with one of these'), ...indented([...lines, ...more])];
};

const list = (head: string, rows: readonly (readonly string[])[], look: Look, most = MOST): readonly string[] => {
  const shown = columns(rows.slice(0, most), ['left', 'right', 'left']);
  const more = rows.length > most ? [`and ${String(rows.length - most)} more`] : [];
  return rows.length === 0 ? [] : [look.paint.faint(head), ...indented([...shown, ...more])];
};

const reactionRows = (reactions: readonly ShownReaction[], look: Look): readonly (readonly string[])[] =>
  reactions.map(({ plain }) => [reactionText(plain, look)]);

/** The assumptions that settle it, else what balances; then, where asked for, what every balance is a sum of. */
const waysOut = (fault: Fault & { readonly code: 'several-balances' }, look: Look): readonly string[] => {
  const { couplings, family, irreducible = [] } = fault;
  return [
    ...couplingLines(couplings, look),
    ...(couplings.length > 0 || irreducible.length > 0
      ? []
      : list('each of these balances', reactionRows(family, look), look)),
    ...list('every whole balance is a sum of these', reactionRows(irreducible, look), look, irreducible.length),
  ];
};

/** What a fault carries besides its sentence: the readings to choose from, the ways to settle it, how it would balance. */
const particulars = (fault: Fault, look: Look): readonly string[] => {
  const one = (reaction: ShownReaction): readonly (readonly string[])[] => [[reactionText(reaction.plain, look)]];
  if (fault.code === 'several-readings') {
    return list(
      'write one of these',
      fault.readings.map((reading) => [speciesText(reading, look)]),
      look,
    );
  }
  if (fault.code === 'several-balances') return waysOut(fault, look);
  if (fault.code === 'wrong-side') return list('as it would balance', one(fault.reaction), look);
  if (fault.code === 'no-electrons') return list('as it balances', one(fault.reaction), look);
  // The hint names them already where there is one.
  return fault.code === 'not-enough-given' && fault.hint === undefined
    ? list('missing', [[fault.missing.join(', ')]], look)
    : [];
};

/** Where the ways out are listed, the hint that there are some says nothing more. */
const withoutHint = (fault: Fault): Fault => {
  if (fault.code !== 'several-balances' || fault.couplings.length === 0) return fault;
  const { hint, ...rest } = fault;
  return hint === undefined ? fault : rest;
};

/** Columns of a terminal that nothing is wider than. */
const TERMINAL = 80;

/** The place, the text and the carets with the sentence behind them; a sentence that is too long stands below. */
const placeLines = (fault: Fault, text: string | null): readonly string[] => {
  const lines = excerpt({ ...fault, message: '' }, text).split('\n');
  const carets = lines.pop()?.trimEnd() ?? '';
  const beside = `${carets === '' ? ' ' : carets} ${printable(fault.message)}`;
  if (displayWidth(beside) <= TERMINAL) return [...lines, beside];
  return [...lines, ...(carets === '' ? [] : [carets]), ...indented(wrapped(printable(fault.message)))];
};

/** A fault for a person: the place with carets, the sentence, the hint, and what else it carries. */
export const renderFault = (fault: Fault, text: string | null, look: Look): string => {
  const { hint, ...rest } = withoutHint(fault);
  const below = [...(hint === undefined ? [] : wrapped(printable(hint))), ...particulars(fault, look)];
  return `${[...placeLines(rest, text), ...indented(below)].join('\n')}\n`;
};
