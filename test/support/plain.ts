import { type Rational, ONE, ZERO, rational, rationalFromText } from '../../src/exact/rational.ts';
import type { Member, Part } from '../../src/notation/formula.ts';
import type { Equation, EquationTerm } from '../../src/species/equation.ts';
import { type Species, ELECTRON, countAtoms, plainCharge } from '../../src/species/species.ts';

/**
 * A second reader, for tests only: canonical plain spelling (caret charges, `( )` and `[ ]`, decimal counts,
 * `*` adducts, states) read by a few regular expressions. It shares no code with the grammar, so that a count
 * made with it is a count by somebody else.
 */

const STATE = /\((s|l|g|aq|cr|am)(?:,[^()]*)?\)$/;
const CHARGE = /\^(\d*)([+-])$/;
const TOKEN = /([A-Z][a-z]?)|([([])|([)\]])|(\d+(?:\.\d+)?)/y;

const tokens = (text: string): readonly RegExpExecArray[] => {
  const found: RegExpExecArray[] = [];
  TOKEN.lastIndex = 0;
  while (TOKEN.lastIndex < text.length) {
    const at = TOKEN.lastIndex;
    const match = TOKEN.exec(text);
    if (match === null) throw new Error(`plain reader: ${text} at ${String(at)}`);
    found.push(match);
  }
  return found;
};

const membersOf = (text: string): readonly Member[] => {
  const stack: Member[][] = [[]];
  const top = (): Member[] => stack[stack.length - 1] ?? [];
  const recount = (count: Rational): void => {
    const last = top().pop();
    if (last === undefined) throw new Error(`plain reader: a count with nothing before it in ${text}`);
    top().push({ ...last, count });
  };
  for (const [, symbol, open, close, digits] of tokens(text)) {
    if (symbol !== undefined) top().push({ kind: 'atom', symbol, massNumber: null, count: ONE });
    else if (open !== undefined) stack.push([]);
    else if (close !== undefined) {
      const members = stack.pop() ?? [];
      top().push({ kind: 'group', bracket: close === ')' ? '(' : '[', members, count: ONE });
    } else if (digits !== undefined) recount(rationalFromText(digits));
  }
  if (stack.length !== 1) throw new Error(`plain reader: brackets in ${text}`);
  return top();
};

const partOf = (text: string): Part => {
  const [, digits = '', rest = ''] = /^(\d+(?:\.\d+)?)?(.*)$/.exec(text) ?? [];
  return { multiplier: digits === '' ? ONE : rationalFromText(digits), members: membersOf(rest) };
};

/** The species of a canonical plain spelling; throws on anything else. */
export const plain = (text: string): Species => {
  const state = STATE.exec(text)?.[1] ?? null;
  const bare = text.replace(STATE, '');
  if (bare === 'e^-') return { ...ELECTRON, state };
  const match = CHARGE.exec(bare);
  const size = match === null ? ZERO : rational(BigInt(match[1] === '' ? '1' : (match[1] ?? '1')));
  const charge = match?.[2] === '-' ? size.neg() : size;
  const formula = bare.replace(CHARGE, '');
  const parts = formula.split('*').map(partOf);
  const key =
    formula
      .replace(/^\[(.*)\]$/, '$1')
      .replaceAll('[', '(')
      .replaceAll(']', ')') + plainCharge(charge);
  return { formula, parts, composition: countAtoms(parts), charge, state, key };
};

const termOf = (text: string): EquationTerm => {
  const [, digits = '', rest = ''] = /^\s*(\d+(?:[./]\d+)?\s+)?(\S+)\s*$/.exec(text) ?? [];
  const coefficient = digits === '' ? ONE : rationalFromText(digits.trim());
  return { coefficient, coefficientWritten: digits !== '', species: plain(rest), span: { from: 0, to: 0 } };
};

/** The equation of a canonical plain spelling (`2 H^+ + 2 e^- -> H2`); spans are not kept. */
export const plainEquation = (text: string): Equation => {
  const [left = '', right = ''] = text.split(' -> ');
  const side = (half: string): readonly EquationTerm[] => half.split(' + ').map(termOf);
  return { text, left: side(left), right: side(right) };
};

/** Right minus left of each element and of the charge, by plain counting; zeros left out. */
export const residualByHand = (text: string): ReadonlyMap<string, Rational> => {
  const equation = plainEquation(text);
  const sums = new Map<string, Rational>();
  const add = (key: string, value: Rational): void => {
    sums.set(key, (sums.get(key) ?? ZERO).add(value));
  };
  const count = (terms: readonly EquationTerm[], sign: Rational): void => {
    for (const { coefficient, species } of terms) {
      const times = coefficient.mul(sign);
      for (const [element, atoms] of species.composition) add(element, atoms.mul(times));
      add('charge', species.charge.mul(times));
    }
  };
  count(equation.right, ONE);
  count(equation.left, ONE.neg());
  return new Map([...sums].filter(([, value]) => !value.equals(ZERO)));
};
