/** The vulgar fractions of Unicode (Number Forms and Latin-1), each as numerator/denominator. */
export const VULGAR_FRACTIONS: ReadonlyMap<string, string> = new Map(
  '½1/2 ⅓1/3 ⅔2/3 ¼1/4 ¾3/4 ⅕1/5 ⅖2/5 ⅗3/5 ⅘4/5 ⅙1/6 ⅚5/6 ⅛1/8 ⅜3/8 ⅝5/8 ⅞7/8'
    .split(' ')
    .map((pair): readonly [string, string] => [pair.slice(0, 1), pair.slice(1)]),
);

/** The characters themselves, for a character class. */
export const VULGAR_CLASS = [...VULGAR_FRACTIONS.keys()].join('');
