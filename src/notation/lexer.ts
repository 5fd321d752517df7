import moo from 'moo';
import { SPACE_CLASS } from './spaces.ts';
import { ELEMENTS_BY_LENGTH } from './symbols.ts';
import { VULGAR_CLASS, VULGAR_FRACTIONS } from './vulgar.ts';

/** Superscript, subscript and fullwidth forms and the plain character that each stands for. */
const PLAIN_FORMS: ReadonlyMap<string, string> = new Map(
  '⁰0 ¹1 ²2 ³3 ⁴4 ⁵5 ⁶6 ⁷7 ⁸8 ⁹9 ₀0 ₁1 ₂2 ₃3 ₄4 ₅5 ₆6 ₇7 ₈8 ₉9 ₓx ₙn ₘm ⁺+ ₊+ ⁻- ₋-'
    .split(' ')
    .map((pair): readonly [string, string] => [pair.slice(0, 1), pair.slice(1)]),
);

/** The plain character behind a superscript or subscript form; any other text as it is. */
export const plainForm = (text: string): string => PLAIN_FORMS.get(text) ?? text;

/** Letters that are subscripts of unknown size without being declared: CuxS, CnH2n+2, YBa2Cu3O7-δ. */
export const UNKNOWN_SUBSCRIPTS: readonly string[] = ['x', 'y', 'z', 'n', 'm', 'k', 'δ', 'ε', 'ξ'];

/** Minus signs as typed and pasted: hyphen-minus, minus sign, hyphens, dashes, small and fullwidth hyphen-minus. */
const MINUS_SIGNS = '\\-\\u2212\\u2010\\u2011\\u2012\\u2013\\u2014\\ufe63\\uff0d';

/** States of the IUPAC Green Book (3rd ed., 2.10.1) and `ads`; the first of two that start alike is the longer. */
export const STATES: readonly string[] = [
  'aq',
  'am',
  'ads',
  'cd',
  'cr',
  'fl',
  'lc',
  'mon',
  'pol',
  'sln',
  'vit',
  'a',
  's',
  'l',
  'g',
];

const alternatives = (words: readonly string[]): string => [...words].sort((a, b) => b.length - a.length).join('|');

/** Token types, tried in this order at each place. Every text lexes: what fits nowhere is a `stray`. */
const rulesFor = (names: readonly string[], unknowns: readonly string[]): moo.Rules => ({
  space: { match: new RegExp(`[${SPACE_CLASS}]+`, 'u'), lineBreaks: true },
  state: {
    match: new RegExp(`\\(\\s*(?:${alternatives(STATES)})\\s*(?:,[^()]*)?\\)`, 'u'),
    lineBreaks: true,
  },
  ...(names.length === 0 ? {} : { name: new RegExp(alternatives(names), 'u') }),
  element: new RegExp(alternatives(ELEMENTS_BY_LENGTH), 'u'),
  unknown: {
    match: new RegExp(alternatives([...unknowns, 'ₓ', 'ₙ', 'ₘ']), 'u'),
    value: plainForm,
  },
  electron: /e/u,
  // 1.5 as a count: a count of 1 is never written, so its period is no dot of an adduct.
  onePoint: /(?<![0-9.])1\.(?=[0-9])/u,
  zero: /0/u,
  digit: /[1-9]/u,
  subZero: { match: /₀/u, value: plainForm },
  subDigit: { match: /[₁-₉]/u, value: plainForm },
  superZero: { match: /⁰/u, value: plainForm },
  superDigit: { match: /[¹²³⁴-⁹]/u, value: plainForm },
  superPlus: { match: /⁺/u, value: plainForm },
  superMinus: { match: /⁻/u, value: plainForm },
  subPlus: { match: /₊/u, value: plainForm },
  subMinus: { match: /₋/u, value: plainForm },
  plus: /\+/u,
  minus: new RegExp(`[${MINUS_SIGNS}]`, 'u'),
  caret: /\^/u,
  underscore: /_/u,
  roundOpen: /\(/u,
  roundClose: /\)/u,
  squareOpen: /\[/u,
  squareClose: /\]/u,
  curlyOpen: /\{/u,
  curlyClose: /\}/u,
  period: /\./u,
  dot: /[·•∙⋅]/u,
  adduct: /[*∗⸱・]/u,
  slash: /[/⁄∕]/u,
  vulgar: { match: new RegExp(`[${VULGAR_CLASS}]`, 'u'), value: (text) => VULGAR_FRACTIONS.get(text) ?? text },
  arrowMark: /[↑↓]/u,
  letters: /[A-Z][a-z]*|[a-z]+/u,
  stray: { match: /[\s\S]/u, lineBreaks: true },
});

/** The lexer of species text without definitions. */
export const lexer: moo.Lexer = moo.compile(rulesFor([], UNKNOWN_SUBSCRIPTS));

/** A lexer that also knows these defined names and these unknown subscripts. */
export const lexerWith = (names: readonly string[], unknowns: readonly string[]): moo.Lexer =>
  moo.compile(rulesFor(names, [...new Set([...unknowns, ...UNKNOWN_SUBSCRIPTS])]));

/** All tokens of `text`; offsets are UTF-16. The lexer is reset and drained at once, so no two texts meet in it. */
export const tokensOf = (text: string, source: moo.Lexer = lexer): readonly moo.Token[] => {
  source.reset(text);
  return [...source];
};
