/** Letters of other scripts, and signs, that look like a Latin letter, digit or sign: code points and what they look like. */
const LOOK_ALIKES: ReadonlyMap<string, string> = new Map(
  (
    'АA ВB СC ЕE НH ІI ЈJ КK МM ОO РP ЅS ТT ХX Ѕs аa сc еe оo рp хx уy іi ѕs ҮY ԜW ' +
    'ΑA ΒB ΕE ΖZ ΗH ΙI ΚK ΜM ΝN ΟO ΡP ΤT ΥY ΧX οo νv ' +
    '＋+ －- （( ）) ［[ ］] ／/ ＾^ ．. ˆ^ ➕+ ﹢+ ➖- ⟮( ⟯) ❨( ❩) '
  )
    .trim()
    .split(' ')
    .map((pair): readonly [string, string] => [pair.slice(0, -1), pair.slice(-1)]),
);

/** Names of the Unicode standard for characters that do not show, or that turn the direction of what follows. */
const HIDDEN: ReadonlyMap<number, string> = new Map([
  [0x00ad, 'SOFT HYPHEN'],
  [0x034f, 'COMBINING GRAPHEME JOINER'],
  [0x061c, 'ARABIC LETTER MARK'],
  [0x180e, 'MONGOLIAN VOWEL SEPARATOR'],
  [0x200b, 'ZERO WIDTH SPACE'],
  [0x200c, 'ZERO WIDTH NON-JOINER'],
  [0x200d, 'ZERO WIDTH JOINER'],
  [0x200e, 'LEFT-TO-RIGHT MARK'],
  [0x200f, 'RIGHT-TO-LEFT MARK'],
  [0x2028, 'LINE SEPARATOR'],
  [0x2029, 'PARAGRAPH SEPARATOR'],
  [0x202a, 'LEFT-TO-RIGHT EMBEDDING'],
  [0x202b, 'RIGHT-TO-LEFT EMBEDDING'],
  [0x202c, 'POP DIRECTIONAL FORMATTING'],
  [0x202d, 'LEFT-TO-RIGHT OVERRIDE'],
  [0x202e, 'RIGHT-TO-LEFT OVERRIDE'],
  [0x2060, 'WORD JOINER'],
  [0x2061, 'FUNCTION APPLICATION'],
  [0x2062, 'INVISIBLE TIMES'],
  [0x2063, 'INVISIBLE SEPARATOR'],
  [0x2064, 'INVISIBLE PLUS'],
  [0x2066, 'LEFT-TO-RIGHT ISOLATE'],
  [0x2067, 'RIGHT-TO-LEFT ISOLATE'],
  [0x2068, 'FIRST STRONG ISOLATE'],
  [0x2069, 'POP DIRECTIONAL ISOLATE'],
  [0xfeff, 'ZERO WIDTH NO-BREAK SPACE'],
  [0xfffd, 'REPLACEMENT CHARACTER'],
]);

/** Names of the control characters U+0000 to U+001F and U+007F (their aliases in the Unicode standard). */
const CONTROLS: readonly string[] = (
  'NULL,START OF HEADING,START OF TEXT,END OF TEXT,END OF TRANSMISSION,ENQUIRY,ACKNOWLEDGE,ALERT,BACKSPACE,' +
  'CHARACTER TABULATION,LINE FEED,LINE TABULATION,FORM FEED,CARRIAGE RETURN,SHIFT OUT,SHIFT IN,DATA LINK ESCAPE,' +
  'DEVICE CONTROL ONE,DEVICE CONTROL TWO,DEVICE CONTROL THREE,DEVICE CONTROL FOUR,NEGATIVE ACKNOWLEDGE,' +
  'SYNCHRONOUS IDLE,END OF TRANSMISSION BLOCK,CANCEL,END OF MEDIUM,SUBSTITUTE,ESCAPE,INFORMATION SEPARATOR FOUR,' +
  'INFORMATION SEPARATOR THREE,INFORMATION SEPARATOR TWO,INFORMATION SEPARATOR ONE'
).split(',');

const NUMBER_NAMES = 'ZERO,ONE,TWO,THREE,FOUR,FIVE,SIX,SEVEN,EIGHT,NINE'.split(',');

/** Digits of other scripts: their zero and the script's name. */
const DIGIT_SCRIPTS: readonly (readonly [number, string])[] = [
  [0x0660, 'ARABIC-INDIC'],
  [0x06f0, 'EXTENDED ARABIC-INDIC'],
  [0x0966, 'DEVANAGARI'],
  [0x09e6, 'BENGALI'],
  [0x0e50, 'THAI'],
  [0xff10, 'FULLWIDTH'],
];

const SCRIPTS: readonly (readonly [RegExp, string])[] = [
  [/\p{Script=Cyrillic}/u, 'a Cyrillic letter'],
  [/\p{Script=Greek}/u, 'a Greek letter'],
  [/[\uff01-\uff5e]/u, 'a fullwidth form'],
  [/\p{Script=Arabic}/u, 'an Arabic character'],
  [/\p{Script=Hebrew}/u, 'a Hebrew character'],
  [/\p{Script=Han}/u, 'a Chinese character'],
  [/\p{Cc}/u, 'a control character'],
  [/\p{Cf}/u, 'a character that does not show'],
  [/\p{Cs}/u, 'half of a surrogate pair'],
  [/\p{Mn}/u, 'a combining mark'],
  [/\p{Extended_Pictographic}/u, 'a pictograph'],
  [/\p{L}/u, 'a letter of another script'],
  [/\p{Nd}/u, 'a digit of another script'],
];

/** The code point as U+XXXX. */
const codePoint = (point: number): string => `U+${point.toString(16).toUpperCase().padStart(4, '0')}`;

const digitName = (point: number): string | undefined => {
  const script = DIGIT_SCRIPTS.find(([zero]) => point >= zero && point < zero + 10);
  return script === undefined ? undefined : `${script[1]} DIGIT ${NUMBER_NAMES[point - script[0]] ?? ''}`;
};

const nameOf = (char: string, point: number): string | undefined =>
  HIDDEN.get(point) ??
  CONTROLS[point] ??
  (point === 0x7f ? 'DELETE' : undefined) ??
  digitName(point) ??
  SCRIPTS.find(([pattern]) => pattern.test(char))?.[1];

const digitBehind = (point: number): string | undefined => {
  const script = DIGIT_SCRIPTS.find(([zero]) => point >= zero && point < zero + 10);
  return script === undefined ? undefined : String(point - script[0]);
};

const shown = (char: string): boolean => !/[\p{C}\p{M}\p{Z}]/u.test(char);

/**
 * A character that has no meaning in a formula: how a message calls it, and what to do about it. Hidden characters are
 * never repeated in a message; they go by code point and name.
 */
export const describeCharacter = (char: string): { readonly name: string; readonly hint: string } => {
  const point = char.codePointAt(0) ?? 0;
  const name = nameOf(char, point);
  const code = name === undefined ? codePoint(point) : `${codePoint(point)}, ${name}`;
  const meant = LOOK_ALIKES.get(char) ?? digitBehind(point);
  return {
    name: shown(char) ? `${char} (${code})` : `the character ${code},`,
    hint: meant === undefined ? `leave out ${code}` : `${code} looks like ${meant}; write a plain ${meant}`,
  };
};
