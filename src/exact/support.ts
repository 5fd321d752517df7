/** The places where a vector is not 0, as a bit set in words of 32. */
export type Support = Uint32Array;

/** The support of the first `width` entries of `vector`. */
export const supportOf = (vector: readonly bigint[], width: number = vector.length): Support => {
  const words = new Uint32Array(Math.ceil(width / 32));
  for (let at = 0; at < width; at += 1) {
    // place `at` is bit at mod 32 of word at / 32
    if ((vector[at] ?? 0n) !== 0n) words[at >>> 5] = (words[at >>> 5] ?? 0) | (1 << (at & 31));
  }
  return words;
};

/** The places of either. */
export const unionOf = (a: Support, b: Support): Support => a.map((word, index) => word | (b[index] ?? 0));

/** True where every place of `part` is a place of `whole`. */
export const isInside = (part: Support, whole: Support): boolean => {
  for (let index = 0; index < part.length; index += 1) {
    if (((part[index] ?? 0) & ~(whole[index] ?? 0)) !== 0) return false;
  }
  return true;
};

/** The number of places. */
export const sizeOf = (support: Support): number => {
  let count = 0;
  for (const word of support) for (let rest = word; rest !== 0; rest &= rest - 1) count += 1;
  return count;
};
