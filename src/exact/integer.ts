/** The absolute value. */
export const magnitude = (value: bigint): bigint => (value < 0n ? -value : value);

/** How many words of 64 bits a number fills, at least 1: what an operation on it costs. */
export const wordsOf = (value: bigint): number =>
  // inside 2^53 no text is made
  Number.isSafeInteger(Number(value)) ? 1 : Math.ceil(magnitude(value).toString(16).length / 16);

/** Greatest common divisor, never negative; gcd(0, 0) is 0. Euclid's algorithm. */
export const gcd = (a: bigint, b: bigint): bigint => {
  let x = magnitude(a);
  let y = magnitude(b);
  while (y !== 0n) [x, y] = [y, x % y];
  return x;
};

/** Least common multiple, never negative; 0 if either is 0. */
export const lcm = (a: bigint, b: bigint): bigint => (a === 0n || b === 0n ? 0n : magnitude((a / gcd(a, b)) * b));

/** Greatest common divisor of all values; 0 for none. */
export const gcdOf = (values: readonly bigint[]): bigint => values.reduce(gcd, 0n);

/** Least common multiple of all values; 1 for none. */
export const lcmOf = (values: readonly bigint[]): bigint => values.reduce(lcm, 1n);
