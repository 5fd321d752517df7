import type { Look } from './look.ts';

const SUPER: Readonly<Record<string, string>> = {
  '0': '⁰',
  '1': '¹',
  '2': '²',
  '3': '³',
  '4': '⁴',
  '5': '⁵',
  '6': '⁶',
  '7': '⁷',
  '8': '⁸',
  '9': '⁹',
  '+': '⁺',
  '-': '⁻',
};
const SUB = '₀₁₂₃₄₅₆₇₈₉';

const raised = (text: string): string =>
  Array.from(text)
    .map((letter) => SUPER[letter] ?? letter)
    .join('');
const lowered = (text: string): string =>
  Array.from(text)
    .map((digit) => SUB[Number(digit)] ?? digit)
    .join('');

/**
 * A canonical species in Unicode: Cr2O7^2- is Cr₂O₇²⁻. Counts with a decimal point or a slash have no Unicode
 * form that is read back, so they stay on the line; a charge is raised, a dot stands for the asterisk.
 */
const unicodeSpecies = (plain: string): string =>
  plain
    .replace(/\^\{(\d+)\}/g, (_, mass: string) => raised(mass))
    .replace(/\^(\d*[+-])/g, (_, charge: string) => raised(charge))
    .replace(/(?<=[A-Za-z)\]}])(\d+)(?![\d.]*[./]\d)(?![\d.])/g, (_, count: string) => lowered(count))
    .replaceAll('*', '·');

/** A canonical species as the look wants it. */
export const speciesText = (plain: string, look: Look): string => (look.unicode ? unicodeSpecies(plain) : plain);

/** A canonical reaction as the look wants it: coefficients stay on the line. */
export const reactionText = (plain: string, look: Look): string => {
  if (plain === '') return 'nothing is left';
  if (!look.unicode) return plain;
  return plain
    .split(' ')
    .map((word) => (word === '->' ? '→' : /^[\d./]+$/.test(word) || word === '+' ? word : unicodeSpecies(word)))
    .join(' ');
};
