import { type Rational, ONE, isWhole, showDecimal } from '../../exact/rational.ts';
import type { Atom, Formula, Member } from '../formula.ts';

/** A count as canonical text: nothing for 1, decimals where they end, else a fraction in brackets: "2", "0.5", "(1/3)". */
export const countText = (count: Rational): string => {
  if (count.equals(ONE)) return '';
  const text = showDecimal(count);
  return text.includes('/') ? `(${text})` : text;
};

const CLOSING = { '(': ')', '[': ']', '{': '}' } as const;

const atomText = (atom: Atom): string =>
  atom.spelled ?? (atom.massNumber === null ? atom.symbol : `[${atom.massNumber}${atom.symbol}]`);

const memberText = (member: Member): string => {
  const count = countText(member.count);
  if (member.kind === 'atom') return atomText(member) + count;
  if (member.kind === 'named') return member.name + count;
  return member.bracket + member.members.map(memberText).join('') + CLOSING[member.bracket] + count;
};

/** The canonical plain text of a formula, brackets as spelled: "[Fe(CN)6]", "CuSO4*5H2O". */
export const formulaText = (formula: Formula): string =>
  formula.map((part) => multiplierText(part.multiplier) + part.members.map(memberText).join('')).join('*');

/** A multiplier in front of a part of an adduct; a number that does not end as a decimal is a bare fraction: 1/3H2O. */
const multiplierText = (multiplier: Rational): string =>
  multiplier.equals(ONE) || isWhole(multiplier) ? countText(multiplier) : showDecimal(multiplier);

const memberKey = (member: Member): string => {
  if (member.kind === 'atom') return nuclideKey(member) + countText(member.count);
  return `(${membersKey(member.members)})${countText(member.count)}`;
};

const nuclideKey = ({ massNumber, symbol }: Atom): string =>
  massNumber === null ? symbol : `{${massNumber}${symbol}}`;

/** Members of a bracket that only wraps another bracket or everything are those of the inner one. */
const membersKey = (members: readonly Member[]): string => {
  const [only] = members;
  if (members.length === 1 && only !== undefined && only.kind !== 'atom' && only.count.equals(ONE))
    return membersKey(only.members);
  return members.map(memberKey).join('');
};

/** What tells formulas apart: as spelled, but bracket shapes, an outer pair of brackets, D or ^2H, and names do not count. */
export const formulaKey = (formula: Formula): string =>
  formula.map((part) => multiplierText(part.multiplier) + membersKey(part.members)).join('*');
