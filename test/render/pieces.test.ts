import { describe, expect, it } from 'vitest';
import { wrapped } from '../../src/render/block.ts';
import { columns } from '../../src/render/columns.ts';
import { figureOf, quantityText } from '../../src/render/figure.ts';
import { ledgerLines } from '../../src/render/ledger.ts';
import { type Look, PLAIN_LOOK, UNPAINTED } from '../../src/render/look.ts';
import { reactionText, speciesText } from '../../src/render/spelling.ts';

const UNICODE: Look = { unicode: true, paint: UNPAINTED };

describe('a spelling', () => {
  it.each([
    ['Cr2O7^2-', 'Cr₂O₇²⁻'],
    ['[Fe(CN)6]^4-', '[Fe(CN)₆]⁴⁻'],
    ['CuSO4*5H2O', 'CuSO₄·5H₂O'],
    ['e^-', 'e⁻'],
    ['H^+', 'H⁺'],
    ['[H2W12O42]^10-', '[H₂W₁₂O₄₂]¹⁰⁻'],
    ['Li0.5CoO2', 'Li₀.₅CoO₂'],
    ['Cu(EDTA)^2-', 'Cu(EDTA)²⁻'],
    ['H2O(l)', 'H₂O(l)'],
  ])('of %s is %s on a terminal and itself in a pipe', (plain, unicode) => {
    expect(speciesText(plain, UNICODE)).toBe(unicode);
    expect(speciesText(plain, PLAIN_LOOK)).toBe(plain);
  });

  it('leaves coefficients on the line', () => {
    expect(reactionText('1/2 O2 + 2 H^+ + 2 e^- -> H2O', UNICODE)).toBe('1/2 O₂ + 2 H⁺ + 2 e⁻ → H₂O');
  });

  it('says so where nothing is left', () => {
    expect(reactionText('', UNICODE)).toBe('nothing is left');
  });
});

describe('a figure', () => {
  it.each([
    [{ value: 1.18549412, unit: 'g/(A h)', uncertainty: 0.000028 }, '1.185494 ± 0.000028 g/(A h)'],
    [{ value: 900000, unit: 'C' }, '900 000 C'],
    [{ value: 0, unit: 'g' }, '0 g'],
    [{ value: 4.66392133, unit: 'mol' }, '4.66392 mol'],
    [{ value: 1.5e-7, unit: 'mol' }, '1.50000e-7 mol'],
    [{ value: 94, unit: '%', uncertainty: 1 }, '94.0 ± 1.0 %'],
    [{ value: -12.5, unit: 'A h' }, '-12.5 A h'],
  ])('of %o is %s', (quantity, text) => {
    expect(quantityText(quantity)).toBe(text);
  });

  it('keeps no zeros behind the point where no uncertainty is known', () => {
    expect(figureOf({ value: 2.5, unit: 'g' })).toBe('2.5');
    expect(figureOf({ value: 100, unit: 'g' })).toBe('100');
  });
});

describe('columns', () => {
  it('stand under one another by what a terminal shows', () => {
    expect(
      columns(
        [
          ['a', '1'],
          ['銅銅', '22'],
        ],
        ['left', 'right'],
      ),
    ).toEqual(['a      1', '銅銅  22']);
  });

  it('are padded before they are painted', () => {
    const painted = { text: 'x', paint: (text: string) => `<${text}>` };
    expect(
      columns(
        [
          [painted, 'b'],
          ['long', 'b'],
        ],
        ['left', 'left'],
      ),
    ).toEqual(['<x>     b', 'long  b']);
  });
});

describe('running text', () => {
  it('is broken at spaces and loses nothing', () => {
    const text = 'Keep oils away, use clean parts and ventilate to the local limit. '.repeat(5).trim();
    const lines = wrapped(text, 30);
    expect(lines.every((line) => line.length <= 30)).toBe(true);
    expect(lines.join(' ')).toBe(text);
  });
});

describe('a ledger', () => {
  it('shows left, right and what is off, the charge with its sign', () => {
    const ledger = { O: ['4', '3'], charge: ['2', '0'] } as const;
    expect(ledgerLines(ledger, PLAIN_LOOK, { O: '-1', charge: '-2' })).toEqual([
      '             O  charge',
      'left         4      +2',
      'right        3       0',
      'off by      -1      -2',
    ]);
  });

  it('leaves the last line out where nothing is off', () => {
    expect(ledgerLines({ H: ['2', '2'], charge: ['0', '0'] }, PLAIN_LOOK, {})).toHaveLength(3);
  });
});
