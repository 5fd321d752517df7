import { excerpt } from '../report/excerpt.ts';
import type { Fault, ShownCoupling, ShownReaction } from '../report/fault.ts';
import { columns, indented } from './columns.ts';
import type { Look } from './look.ts';
import { reactionText, speciesText } from './spelling.ts';

const MOST = 8;

const couplingRow = (coupling: ShownCoupling, look: Look): readonly string[] => [
  reactionText((coupling.overall ?? coupling.reaction)?.plain ?? '', look),
  `${coupling.electrons} e-`,
  `--settle ${JSON.stringify(coupling.assume)}`,
];

const list = (head: string, rows: readonly (readonly string[])[], look: Look): readonly string[] => {
  const shown = columns(rows.slice(0, MOST), ['left', 'right', 'left']);
  const more = rows.length > MOST ? [`and ${String(rows.length - MOST)} more`] : [];
  return rows.length === 0 ? [] : [look.paint.faint(head), ...indented([...shown, ...more])];
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
  if (fault.code === 'several-balances' && fault.couplings.length > 0) {
    return list(
      'settle it with one of these',
      fault.couplings.map((coupling) => couplingRow(coupling, look)),
      look,
    );
  }
  if (fault.code === 'several-balances') return list('each of these balances', fault.family.flatMap(one), look);
  if (fault.code === 'wrong-side') return list('as it would balance', one(fault.reaction), look);
  if (fault.code === 'no-electrons') return list('as it balances', one(fault.reaction), look);
  return fault.code === 'not-enough-given' ? list('missing', [[fault.missing.join(', ')]], look) : [];
};

/** Where the ways out are listed, the hint that there are some says nothing more. */
const withoutHint = (fault: Fault): Fault => {
  if (fault.code !== 'several-balances' || fault.couplings.length === 0) return fault;
  const { hint, ...rest } = fault;
  return hint === undefined ? fault : rest;
};

/** A fault for a person: the place with carets, the sentence, the hint, and what else it carries. */
export const renderFault = (fault: Fault, text: string | null, look: Look): string =>
  `${[excerpt(withoutHint(fault), text), ...indented(particulars(fault, look))].join('\n')}\n`;
