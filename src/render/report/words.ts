import type { Fault } from '../../report/fault.ts';
import { excerpt } from '../../report/excerpt.ts';
import { escaped, formulaHtml } from '../markup.ts';
import type { Writing } from '../sheet/words.ts';

/** How the report writes: names escaped, formulas with their digits lowered and raised. */
export const REPORT_WRITING: Writing = {
  text: escaped,
  species: formulaHtml,
  alarm: (written) => `<span class="alarm">${written}</span>`,
};

/** A fault with the line it stands in. */
export const faultHtml = (name: string, fault: Fault, sheetText: string): string => {
  const { hint, ...bare } = fault;
  const place = excerpt({ ...bare, message: '' }, sheetText).trimEnd();
  const words = [fault.message, hint ?? ''].map(sentence).join(' ').trim();
  return (
    `<div class="fault"><p><span class="alarm">${escaped(name)} was not answered</span></p>` +
    `<pre>${escaped(place)}</pre><p>${escaped(words)}</p></div>`
  );
};

const sentence = (text: string): string => (text === '' || /[.?!]$/.test(text) ? capital(text) : `${capital(text)}.`);

/** A number stays on one line with its unit. */
const BEFORE_UNIT = /(\d) (?=(?:%|kg|mg|g|L|A|V|h|min|µm|kWh|m³)(?![A-Za-z]))/g;

/** A list of sentences; nothing where there are none. */
export const saidList = (heading: string, lines: readonly string[]): string =>
  lines.length === 0
    ? ''
    : `<div><h3>${heading}</h3><ul class="said">${lines.map((line) => `<li>${line.replace(BEFORE_UNIT, '$1&#160;')}</li>`).join('')}</ul></div>`;

/** A plain word that begins a line of prose; a path or a formula stays as it is. */
export const capital = (text: string): string =>
  /^[a-z]+ /.test(text) ? text.charAt(0).toUpperCase() + text.slice(1) : text;
