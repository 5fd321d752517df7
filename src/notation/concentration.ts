import type { Place } from './arrows.ts';

/** A species of a diagram cut into its formula and what was said of its amount. */
export interface WithConcentration {
  readonly formula: Place;
  /** State in front of the amount, as the species takes it: "(aq)"; "" for none. */
  readonly state: string;
  /** The amount as written: "0.1 mol/L"; null for none. */
  readonly concentration: string | null;
}

/** `0.1 M`, `1 mol/L`, `a = 1`, `1 bar`, `sat.`, `x M`, `p = 1 atm`, `c1`, `1.0 mol dm^-3`, `saturated`. */
const AMOUNT =
  /^(?:(?:[acpmbfx]\w{0,3}|pH|\[[^\]]*\])\s*(?:=|≈|~)\s*.*|~?\s*\d.*|sat(?:d|urated|\.)?.*|satd\.?.*|[acmp][₁₂12]?|unit activity|dil.*|conc.*|x+ M)$/iu;
const STATE_FIRST = /^(aq|s|l|g|cr|am|sln)\s*[,;]\s*(.*)$/u;
const AMOUNT_FIRST = /^(.*?)\s*[,;]\s*(aq|s|l|g|cr|am|sln)$/u;

const trailingBracket = (text: string): { readonly from: number; readonly inner: string } | null => {
  const match = /\s*([([])([^()[\]]*(?:\[[^\]]*\])?[^()[\]]*)[)\]]\s*$/u.exec(text);
  return match === null ? null : { from: match.index, inner: (match[2] ?? '').trim() };
};

/**
 * The species text without the amount in brackets behind it. A charge is no amount: `Fe(3+)` stays whole.
 *   Cu^2+ (aq, 0.1 mol/L)   formula Cu^2+, state (aq), concentration 0.1 mol/L
 */
export const cutConcentration = (text: string): WithConcentration => {
  const whole: WithConcentration = { formula: { from: 0, to: text.length }, state: '', concentration: null };
  const bracket = trailingBracket(text);
  if (bracket === null || bracket.from === 0 || /^\d*[+-]$|^[+-]\d*$/u.test(bracket.inner)) return whole;
  const formula = { from: 0, to: bracket.from };
  const [, stateFirst, amountBehind = ''] = STATE_FIRST.exec(bracket.inner) ?? [];
  if (stateFirst !== undefined && AMOUNT.test(amountBehind))
    return { formula, state: `(${stateFirst})`, concentration: amountBehind };
  const [, amountFirst = '', stateBehind] = AMOUNT_FIRST.exec(bracket.inner) ?? [];
  if (stateBehind !== undefined && AMOUNT.test(amountFirst))
    return { formula, state: `(${stateBehind})`, concentration: amountFirst };
  const isCount = /^\d+(?:\/\d+)?$/u.test(bracket.inner);
  return AMOUNT.test(bracket.inner) && !isCount ? { formula, state: '', concentration: bracket.inner } : whole;
};
