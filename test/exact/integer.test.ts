import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { gcd, gcdOf, lcm, lcmOf, magnitude } from '../../src/exact/integer.ts';

const BIG = 2n ** 220n;
const anyWhole = fc.bigInt({ min: -BIG, max: BIG });

describe('whole numbers', () => {
  it.each([
    [0n, 0n, 0n],
    [0n, -6n, 6n],
    [12n, 18n, 6n],
    [-12n, 18n, 6n],
    [2n ** 60n, 6n ** 30n, 2n ** 30n],
    [10n ** 80n, 6n * 10n ** 79n, 2n * 10n ** 79n],
  ])('gives gcd(%s, %s) as %s', (a, b, expected) => {
    expect(gcd(a, b)).toBe(expected);
  });

  it.each([
    [0n, 5n, 0n],
    [4n, 6n, 12n],
    [-4n, 6n, 12n],
    [2n ** 64n, 2n ** 70n * 3n, 2n ** 70n * 3n],
  ])('gives lcm(%s, %s) as %s', (a, b, expected) => {
    expect(lcm(a, b)).toBe(expected);
  });

  it('takes the greatest divisor and the least multiple of a list, 0 and 1 of none', () => {
    expect([gcdOf([12n, -18n, 30n]), lcmOf([4n, 6n, 10n]), gcdOf([]), lcmOf([])]).toEqual([6n, 60n, 0n, 1n]);
  });

  it('keeps gcd times lcm equal to the product, past 2^200', () => {
    fc.assert(
      fc.property(anyWhole, anyWhole, (a, b) => {
        expect(gcd(a, b) * lcm(a, b)).toBe(magnitude(a * b));
      }),
    );
  });

  it('finds a divisor that divides, and leaves coprime quotients', () => {
    fc.assert(
      fc.property(anyWhole, anyWhole, (a, b) => {
        fc.pre(a !== 0n || b !== 0n);
        const divisor = gcd(a, b);
        expect([a % divisor, b % divisor]).toEqual([0n, 0n]);
        expect(gcd(a / divisor, b / divisor)).toBe(1n);
      }),
    );
  });
});
