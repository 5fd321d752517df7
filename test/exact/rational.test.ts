import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  ONE,
  ZERO,
  denominatorOf,
  isWhole,
  isZero,
  numeratorOf,
  rational,
  rationalFromText,
  readRational,
  showDecimal,
  showRational,
  signOf,
} from '../../src/exact/rational.ts';

const BIG = 2n ** 210n;
const anyRational = fc
  .tuple(fc.bigInt({ min: -BIG, max: BIG }), fc.bigInt({ min: 1n, max: BIG }))
  .map(([top, bottom]) => rational(top, bottom));

describe('reading an exact number', () => {
  it.each([
    ['0', '0'],
    ['5', '5'],
    ['-5', '-5'],
    ['+5', '5'],
    ['0.35', '7/20'],
    ['.5', '1/2'],
    ['5.', '5'],
    ['-0.125', '-1/8'],
    ['5/2', '5/2'],
    ['-6/4', '-3/2'],
    ['1.5/4', '3/8'],
    [' 2 ', '2'],
    ['0.1', '1/10'],
    ['9007199254740993', '9007199254740993'],
    ['0.9007199254740993', '9007199254740993/10000000000000000'],
    ['-0', '0'],
  ])('reads %s as %s', (text, expected) => {
    expect(showRational(rationalFromText(text))).toBe(expected);
  });

  it.each(['', '.', '-', 'x', '1e3', '1/0', '1/', '/2', '1/2/3', '1 2', '0.(3)', '1,5', '--1', '1/-2', 'NaN', '0x10'])(
    'refuses %j',
    (text) => {
      expect(readRational(text)).toBeUndefined();
      expect(() => rationalFromText(text)).toThrow(RangeError);
    },
  );
});

describe('showing an exact number', () => {
  it.each([
    ['7/20', '0.35'],
    ['-7/20', '-0.35'],
    ['1/3', '1/3'],
    ['-5/6', '-5/6'],
    ['5', '5'],
    ['0', '0'],
    ['1/8', '0.125'],
    ['1/1000', '0.001'],
    ['-1/1024', '-0.0009765625'],
    ['123456789012345678901234567890/10', '12345678901234567890123456789'],
    ['1234567890123456789012345678901/10', '123456789012345678901234567890.1'],
  ])('shows %s as the decimal %s', (text, expected) => {
    expect(showDecimal(rationalFromText(text))).toBe(expected);
  });

  it('reads back what it shows, both ways', () => {
    fc.assert(
      fc.property(anyRational, (value) => {
        expect(rationalFromText(showRational(value)).equals(value)).toBe(true);
        expect(rationalFromText(showDecimal(value)).equals(value)).toBe(true);
      }),
    );
  });

  it('shows every terminating decimal without its trailing zeros', () => {
    fc.assert(
      fc.property(fc.bigInt({ min: 1n, max: BIG }), fc.integer({ min: 1, max: 40 }), (digits, places) => {
        fc.pre(digits % 10n !== 0n);
        const text = digits.toString().padStart(places + 1, '0');
        const expected = `${text.slice(0, -places)}.${text.slice(-places)}`;
        expect(showDecimal(rational(digits, 10n ** BigInt(places)))).toBe(expected);
      }),
    );
  });
});

describe('parts of an exact number', () => {
  it('is in lowest terms with the sign above the line', () => {
    const value = rational(6n, -4n);
    expect([numeratorOf(value), denominatorOf(value), signOf(value)]).toEqual([-3n, 2n, -1n]);
  });

  it('tells zero and whole numbers apart from the rest', () => {
    expect([isZero(ZERO), isZero(ONE), isWhole(rational(4n, 2n)), isWhole(rational(1n, 2n))]).toEqual([
      true,
      false,
      true,
      false,
    ]);
    expect([signOf(ZERO), signOf(rational(0n, -3n)), signOf(ONE)]).toEqual([0n, 0n, 1n]);
  });

  it('adds and multiplies like whole numbers cleared of denominators', () => {
    fc.assert(
      fc.property(anyRational, anyRational, (a, b) => {
        const sum = a.add(b);
        const cross = numeratorOf(a) * denominatorOf(b) + numeratorOf(b) * denominatorOf(a);
        expect(numeratorOf(sum) * denominatorOf(a) * denominatorOf(b)).toBe(cross * denominatorOf(sum));
      }),
    );
  });
});
