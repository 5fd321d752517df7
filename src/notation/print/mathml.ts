import { type Rational, ONE, showDecimal } from '../../exact/rational.ts';
import type { Formula, Member } from '../formula.ts';
import { escapeMarkup, printedSign } from './html.ts';
import { type Spelled, chargePiece } from './pieces.ts';

const CLOSING = { '(': ')', '[': ']', '{': '}' } as const;

const symbol = (text: string): string => `<mi mathvariant="normal">${escapeMarkup(text)}</mi>`;
const fence = (text: string): string => `<mo stretchy="false">${text}</mo>`;
const row = (inner: string): string => `<mrow>${inner}</mrow>`;

const counted = (base: string, count: Rational): string =>
  count.equals(ONE) ? base : `<msub>${base}<mn>${showDecimal(count)}</mn></msub>`;

const nuclide = (massNumber: string, text: string): string =>
  `<mmultiscripts>${symbol(text)}<mprescripts/><none/><mn>${massNumber}</mn></mmultiscripts>`;

const memberMathml = (member: Member): string => {
  if (member.kind === 'named') return counted(symbol(member.name), member.count);
  if (member.kind === 'group') {
    const inside = member.members.map(memberMathml).join('');
    return counted(row(fence(member.bracket) + inside + fence(CLOSING[member.bracket])), member.count);
  }
  const { massNumber, spelled } = member;
  const base =
    massNumber === null || spelled !== undefined
      ? symbol(spelled ?? member.symbol)
      : nuclide(massNumber, member.symbol);
  return counted(base, member.count);
};

const formulaMathml = (parts: Formula): string =>
  parts
    .map(({ multiplier, members }) => {
      const number = multiplier.equals(ONE) ? '' : `<mn>${showDecimal(multiplier)}</mn>`;
      return number + members.map(memberMathml).join('');
    })
    .join('<mo>·</mo>');

/** A species as MathML, without the `math` element around it. */
export const mathmlSpecies = ({ parts, charge, state }: Spelled): string => {
  const base = row(parts.length === 0 ? symbol('e') : formulaMathml(parts));
  const written = chargePiece(charge);
  const size = written === null || written.size === '' ? '' : `<mn>${written.size}</mn>`;
  const charged =
    written === null ? base : `<msup>${base}${row(`${size}<mo>${printedSign(written.sign)}</mo>`)}</msup>`;
  return state === null ? charged : charged + row(`${fence('(')}${symbol(state)}${fence(')')}`);
};
