import { describe, expect, it } from 'vitest';
import { AVOGADRO, ELEMENTARY_CHARGE, FARADAY, GAS_CONSTANT } from '../../src/elements/constants.ts';
import { denominatorOf, numeratorOf, showDecimal } from '../../src/exact/rational.ts';

describe('constants', () => {
  it('are exact decimals', () => {
    expect(showDecimal(ELEMENTARY_CHARGE)).toBe('0.0000000000000000001602176634');
    expect(showDecimal(AVOGADRO)).toBe('602214076000000000000000');
  });

  it('multiply to the Faraday constant without rounding', () => {
    // 1602176634 × 602214076, by long multiplication on paper, is 964853321233100184.
    expect(1_602_176_634n * 602_214_076n).toBe(964_853_321_233_100_184n);
    expect(showDecimal(FARADAY)).toBe('96485.3321233100184');
    expect(numeratorOf(FARADAY) * 10n ** 13n).toBe(964_853_321_233_100_184n * denominatorOf(FARADAY));
  });

  it('give the gas constant without rounding', () => {
    expect(showDecimal(GAS_CONSTANT)).toBe('8.31446261815324');
  });
});
