import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { rational } from '../../src/exact/rational.ts';
import type { Atom, Formula, Group, Member } from '../../src/notation/formula.ts';
import { type PrintStyle, printReaction, printSpecies } from '../../src/notation/print/print.ts';
import type { Spelled } from '../../src/notation/print/pieces.ts';
import { readEquation, readSpecies } from '../../src/species/read.ts';
import { plainWithState } from '../../src/species/species.ts';

const RUNS = 300;

const count = fc.oneof(
  { weight: 6, arbitrary: fc.integer({ min: 1, max: 130 }).map((n) => rational(BigInt(n))) },
  { weight: 2, arbitrary: fc.integer({ min: 1, max: 199 }).map((n) => rational(BigInt(n), 100n)) },
  { weight: 1, arbitrary: fc.constantFrom(rational(1n, 3n), rational(2n, 3n), rational(5n, 7n)) },
);

const atom: fc.Arbitrary<Atom> = fc.oneof(
  {
    weight: 8,
    arbitrary: fc
      .record({ symbol: fc.constantFrom('H', 'C', 'O', 'Co', 'Fe', 'N', 'Cl', 'U', 'S', 'Na', 'I', 'V'), count })
      .map((each): Atom => ({ kind: 'atom', massNumber: null, ...each })),
  },
  {
    weight: 1,
    arbitrary: fc
      .record({ nuclide: fc.constantFrom(['H', '2'], ['C', '13'], ['O', '18'], ['U', '235'] as const), count })
      .map(({ nuclide: [symbol = 'H', massNumber = '2'], count: each }): Atom => ({
        kind: 'atom',
        symbol,
        massNumber,
        count: each,
      })),
  },
  {
    weight: 1,
    arbitrary: count.map((each): Atom => ({ kind: 'atom', symbol: 'H', massNumber: '2', spelled: 'D', count: each })),
  },
);

const { member } = fc.letrec<{ member: Member; group: Group }>((tie) => ({
  member: fc.oneof({ maxDepth: 3, depthIdentifier: 'formula' }, atom, tie('group')),
  group: fc.record({
    kind: fc.constant<'group'>('group'),
    bracket: fc.constantFrom<'(' | '[' | '{'>('(', '[', '{'),
    members: fc.array(tie('member'), { minLength: 1, maxLength: 3, depthIdentifier: 'formula' }),
    count,
  }),
}));

const formula: fc.Arbitrary<Formula> = fc
  .tuple(
    fc.array(member, { minLength: 1, maxLength: 4 }),
    fc.array(fc.record({ multiplier: count, members: fc.array(atom, { minLength: 1, maxLength: 2 }) }), {
      maxLength: 2,
    }),
  )
  .map(([members, others]) => [{ multiplier: rational(1n), members }, ...others]);

const spelled: fc.Arbitrary<Spelled> = fc.record({
  parts: formula,
  charge: fc.oneof(
    fc.integer({ min: -14, max: 14 }).map((z) => rational(BigInt(z))),
    fc.constantFrom(rational(1n, 2n), rational(-3n, 4n)),
  ),
  state: fc.constantFrom(null, 's', 'l', 'g', 'aq', 'cr', 'am'),
});

/** Groups of I and V alone look like an oxidation number; no chemist writes (I) for iodine. */
const isRoman = (text: string): boolean => /\((?:I{1,3}|IV|VI{0,3}|IX)\)(?![\d(₀-₉])/u.test(text);

/** A group of one nuclide is printed with a raised mass number as the nuclide in its own brackets is: [²H]. */
const isNuclideInBrackets = (text: string): boolean => /\[\[\d+[A-Z][a-z]?\]\]/u.test(text);

/** A reader of the printed forms by another hand: what a browser or a page of mathematics shows, as text. */
const textOfHtml = (html: string): string =>
  html
    .replaceAll(/<sup>(\d+)<\/sup>(?=[A-Z])/gu, '^{$1}')
    .replaceAll(/<sup>([^<]*)<\/sup>/gu, '^{$1}')
    .replaceAll(/<\/?sub>/gu, '');

const textOfLatex = (latex: string): string =>
  latex
    .replaceAll('{}', '')
    .replaceAll(/_\{([^}]*)\}/gu, '$1')
    .replaceAll('\\cdot ', '*')
    .replaceAll('\\rightarrow', '->')
    .replaceAll('\\,', ' ')
    .replaceAll(/\\frac\{(\d+)\}\{(\d+)\}/gu, '$1/$2')
    .replaceAll('\\{', '\u0001')
    .replaceAll('\\}', '\u0002')
    .replaceAll(/\\mathrm\{((?:[^{}]|\{[^{}]*\})*)\}/gu, '$1')
    .replaceAll('\u0001', '{')
    .replaceAll('\u0002', '}');

const readBack = (text: string): string => {
  const reading = readSpecies(text);
  if (!reading.ok) throw new Error(`${text}: ${reading.fault.message}`);
  expect(reading.value.readings).toHaveLength(1);
  return plainWithState(reading.value.species);
};

const asText: Readonly<Record<Exclude<PrintStyle, 'mathml'>, (printed: string) => string>> = {
  plain: (printed) => printed,
  unicode: (printed) => printed,
  html: textOfHtml,
  latex: textOfLatex,
};

describe('every printed form of a species reads back to the same spelling, with one reading', () => {
  test.each(['plain', 'unicode', 'html', 'latex'] as const)('in %s', (style) => {
    fc.assert(
      fc.property(spelled, (species) => {
        const plain = printSpecies(species, 'plain');
        fc.pre(!isRoman(plain) && !isNuclideInBrackets(plain));
        expect(readBack(asText[style](printSpecies(species, style)))).toBe(plain);
      }),
      { numRuns: RUNS, seed: 20261201 },
    );
  });
});

test('MathML closes every element that it opens and keeps every symbol', () => {
  fc.assert(
    fc.property(spelled, (species) => {
      const bare = { ...species, state: null };
      const printed = printSpecies(bare, 'mathml');
      const open: string[] = [];
      for (const [, slash, name = '', rest = ''] of printed.matchAll(/<(\/?)(\w+)([^>]*)>/gu)) {
        if (rest.endsWith('/')) continue;
        if (slash === '/') expect(open.pop()).toBe(name);
        else open.push(name);
      }
      expect(open).toEqual([]);
      const letters = (text: string): string => [...text.matchAll(/[A-Z][a-z]?/gu)].join('');
      const shown = [...printed.matchAll(/<mi[^>]*>([^<]*)<\/mi>/gu)].map((match) => match[1] ?? '').join('');
      expect(letters(shown)).toBe(letters(printSpecies(bare, 'plain')));
    }),
    { numRuns: RUNS, seed: 20261201 },
  );
});

test('a printed reaction reads back to the same terms', () => {
  const term = fc.record({ coefficient: fc.constantFrom('', '2', '14', '1/2'), species: spelled });
  const side = fc.array(term, { minLength: 1, maxLength: 3 });
  fc.assert(
    fc.property(side, side, fc.constantFrom<PrintStyle>('plain', 'unicode', 'html', 'latex'), (left, right, style) => {
      const plain = printReaction({ left, right }, 'plain');
      fc.pre(!isRoman(plain));
      const printed = printReaction({ left, right }, style);
      const result = readEquation(
        style === 'html' ? textOfHtml(printed) : style === 'latex' ? textOfLatex(printed) : printed,
      );
      if (!result.ok) throw new Error(`${printed}: ${result.fault.message}`);
      const terms = [...result.value.left, ...result.value.right];
      const expected = [...left, ...right];
      expect(terms.map(({ species }) => plainWithState(species))).toEqual(
        expected.map(({ species }) => printSpecies(species, 'plain')),
      );
    }),
    { numRuns: RUNS, seed: 20261201 },
  );
});
