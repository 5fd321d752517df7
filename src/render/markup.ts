/** `text` with what HTML and SVG keep for themselves written as entities, and without characters that XML forbids. */
export const escaped = (text: string): string =>
  Array.from(text)
    .map((point) => (FORBIDDEN.test(point) ? '\ufffd' : (ENTITIES[point] ?? point)))
    .join('');

const ENTITIES: Readonly<Record<string, string>> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};

/** Controls but tab and line end, lone surrogates, and what turns the direction of text around. */
const FORBIDDEN = /[^\P{Cc}\t\n]|[\p{Cs}\ufffe\uffff\u202a-\u202e\u2066-\u2069]/u;

/** A part of a formula: on the line, lowered or raised. */
export interface FormulaPart {
  readonly text: string;
  readonly place: 'line' | 'low' | 'high';
}

/** `^2+`, `^{18}`: raised; a number behind a letter or a closing bracket: lowered, "1/3" and "0.5" too. */
const PARTS = /\^\{(\d+)\}|\^(\d*[+-])|(?<=[A-Za-z)\]}])(\d+(?:\.\d+|\/\d+)?)|->|[*]|./gsu;

const partOf = ([whole, mass, charge, count]: RegExpMatchArray): FormulaPart => {
  if (mass !== undefined) return { text: mass, place: 'high' };
  if (charge !== undefined) return { text: charge.replace('-', '−'), place: 'high' };
  if (count !== undefined) return { text: count, place: 'low' };
  return { text: whole === '->' ? '→' : whole === '*' ? '·' : whole, place: 'line' };
};

/** A canonical species or reaction in the parts that print differently; neighbours on the line are joined. */
export const formulaParts = (plain: string): readonly FormulaPart[] => {
  const parts: FormulaPart[] = [];
  for (const match of plain.matchAll(PARTS)) {
    const part = partOf(match);
    const last = parts.at(-1);
    if (last?.place === 'line' && part.place === 'line')
      parts[parts.length - 1] = { ...last, text: last.text + part.text };
    else parts.push(part);
  }
  return parts;
};

/** A coefficient and the blank behind it: a line is not broken between it and its species. */
const COEFFICIENT = /(?<=^| )([\d./]+) (?=\S)/g;

const TAGS = { line: '', low: 'sub', high: 'sup' } as const;

/** A canonical species or reaction in HTML. */
export const formulaHtml = (plain: string): string =>
  formulaParts(plain.replace(COEFFICIENT, '$1\u00a0'))
    .map(({ text, place }) => {
      const tag = TAGS[place];
      return tag === '' ? escaped(text) : `<${tag}>${escaped(text)}</${tag}>`;
    })
    .join('');
