/** The code point as U+XXXX. */
const codePoint = (char: string): string =>
  `U+${(char.codePointAt(0) ?? 0).toString(16).toUpperCase().padStart(4, '0')}`;

/** A character that has no meaning in chemistry text, and what to do about it. */
export const describeCharacter = (char: string): { readonly name: string; readonly hint: string } => ({
  name: codePoint(char),
  hint: `the character is ${codePoint(char)}; leave it out`,
});
