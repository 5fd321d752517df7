import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { openRecord } from '../../src/amounts/record/reader.ts';
import type { SheetAnswer } from '../../src/desk/sheet/answer.ts';
import type { Records } from '../../src/desk/sheet/record.ts';
import { answerReadSheet, readSheet } from '../../src/desk/sheet/sheet.ts';
import { reportHtml } from '../../src/render/report/html.ts';
import { sheetCsv } from '../../src/render/sheet/csv.ts';
import { sheetMarkdown } from '../../src/render/sheet/markdown.ts';
import { activeParts, markupProblem } from '../support/markup.ts';

const QUAY = readFileSync('fixtures/tern-quay.yaml', 'utf8');
const HOSTILE = readFileSync('fixtures/sheets/hostile.yaml', 'utf8');

const recordOf = (text: string): ReturnType<Records['get']> => {
  const opened = openRecord();
  if (!opened.ok) return opened;
  opened.value.take(text);
  return opened.value.end();
};

/** Two hours at 100 A with a pause of half an hour between them. */
const LOG = 'time (s),current (A)\n0,100\n3600,100\n3600,0\n5400,0\n5400,100\n9000,100\n';

const answered = (text: string): SheetAnswer => {
  const read = readSheet(text);
  if (!read.ok) throw new Error(read.fault.message);
  const records = read.value.records.flatMap(({ key }) => {
    const record = recordOf(LOG);
    return record === undefined ? [] : [[key, record] as const];
  });
  return answerReadSheet(read.value, new Map(records));
};

const pageOf = (text: string): string => reportHtml(answered(text), text);
const quay = pageOf(QUAY);
const hostile = pageOf(HOSTILE);

describe('the strict reader of these tests', () => {
  it.each([
    ['<!DOCTYPE html>\n<p>a<b>c</p></b>', '</p> closes <b>'],
    ['<!DOCTYPE html>\n<p>a & b</p>', 'stray sign'],
    ['<!DOCTYPE html>\n<p class=x>a</p>', 'no tag'],
    ['<!DOCTYPE html>\n<p id="a">a</p><p id="a">a</p>', 'twice'],
    ['<!DOCTYPE html>\n<p>', 'never closed'],
    ['<p>a</p>', 'no document type'],
  ])('finds what is wrong with %s', (page, problem) => {
    expect(markupProblem(page)).toContain(problem);
  });

  it('finds what could run or fetch something', () => {
    const parts = ['<script>', '<p onclick="x">', '<a href="x">', '<img src="x">', 'url(x)', '@import', 'http://x'];
    for (const part of parts) expect(activeParts(part)).not.toEqual([]);
    expect(activeParts('<a href="#tank1">url(#hatch)</a>')).toEqual([]);
  });
});

describe('the report of a sheet', () => {
  it.each([
    ['Tern Quay', quay],
    ['a sheet of hostile names', hostile],
    ['a sheet without runs', pageOf('plant: P\ncells:\n  - { name: A, anode: [H2O -> O2], cathode: [Cu^2+ -> Cu] }\n')],
    ['a sheet of which nothing is answered', pageOf('plant: P\ncells:\n  - { name: A, anode: [Xx -> O2] }\n')],
  ])('is well-formed, runs nothing and fetches nothing: %s', (_, page) => {
    expect(markupProblem(page)).toBe('');
    expect(activeParts(page)).toEqual([]);
  });

  it('prints every name of the sheet escaped', () => {
    for (const place of [
      'plant',
      'about',
      'tank',
      'purpose',
      'run',
      'note',
      'record',
      'goal',
      'broken run',
      'broken tank',
    ]) {
      expect(hostile).toContain(`&lt;script&gt;${place}&lt;/script&gt;`);
      expect(hostile).not.toContain(`<script>${place}`);
    }
  });

  it('shows no character that turns the direction of text or moves a cursor', () => {
    expect(hostile).not.toMatch(/[\u202a-\u202e\u2066-\u2069\u0000-\u0008\u000b-\u001f]/);
  });

  it('has a section for each tank, a picture of its current, and a chart where a current was logged', () => {
    expect(quay.match(/<section class="tank" aria-labelledby="tank\d"/g)).toHaveLength(4);
    expect(quay.match(/Where the current went/g)).toHaveLength(4);
    expect(quay.match(/charge and mass over time<\/h3>/g)).toHaveLength(1);
  });

  it('gives a narrow page and paper their own layout, and is told apart without colour', () => {
    expect(quay).toContain('@media print');
    expect(quay).toContain('size:A4');
    expect(quay).toContain('@media (max-width:38rem)');
    expect(quay).toContain('name="viewport"');
    expect(quay).toContain('id="hatch"');
  });

  it('tells a reader without pictures where the current went', () => {
    expect(quay).toContain('Cathode: Zn 92 %, H2 8 %.');
  });

  it('says of invented figures that they are invented, and what no caution means', () => {
    expect(quay).toContain('Tern Quay and all its figures are invented.');
    expect(quay).toContain('does not mean that it is safe');
  });
});

describe('grave cautions', () => {
  const formats: readonly (readonly [string, (sheet: SheetAnswer) => string])[] = [
    ['html', (sheet) => reportHtml(sheet, QUAY)],
    ['markdown', (sheet) => sheetMarkdown(sheet, QUAY)],
    ['csv', sheetCsv],
    ['json', (sheet) => JSON.stringify(sheet)],
  ];

  it.each(formats)('come before the first tank in %s', (_, show) => {
    const page = show(answered(QUAY));
    const grave = page.indexOf('cyanogen chloride, a severe lung');
    expect(grave).toBeGreaterThan(0);
    expect(grave).toBeLessThan(
      page.indexOf('copper from spent pickle') < 0
        ? page.indexOf('run,Tank A')
        : page.indexOf('copper from spent pickle'),
    );
  });

  it.each([
    ['cyanide in acid', 'acid', 'H2O -> O2(g)', 'Cu^2+ -> Cu', '[CN^-]', 'hydrogen cyanide'],
    ['chlorine from chloride', 'acid', 'Cl^- -> Cl2(g)', 'Cu^2+ -> Cu', '[]', 'corrosive lung irritant'],
    ['hydrogen and oxygen undivided', 'acid', 'H2O -> O2(g)', 'H^+ -> H2(g)', '[]', 'explosive mixture'],
  ])('are raised by %s', (_, medium, anode, cathode, present, words) => {
    const text = `plant: P\ncells:\n  - { name: A, medium: ${medium}, anode: ["${anode}"], cathode: ["${cathode}"], present: ${present} }\n`;
    const sheet = answered(text);
    expect(
      sheet.cautions
        .filter(({ grave }) => grave === true)
        .map((one) => one.text)
        .join(' '),
    ).toContain(words);
    expect(sheet.cautions[0]?.grave).toBe(true);
  });
});

describe('the other formats', () => {
  it('keep Markdown tables whole whatever a run is called', () => {
    const page = sheetMarkdown(answered(HOSTILE), HOSTILE);
    expect(page).toContain('\\<script\\>tank\\</script\\>');
    expect(page).toContain('pipe \\| star \\*');
    const table = page.split('\n').filter((line) => line.startsWith('| ') && !line.includes('electrode'));
    for (const line of table) expect(line.endsWith(' |')).toBe(true);
  });

  it('write CSV that is read back field by field (RFC 4180)', () => {
    const rows = parsedCsv(sheetCsv(answered(HOSTILE)));
    const [head = []] = rows;
    expect(head).toEqual(['part', 'tank', 'name', 'species', 'quantity', 'value', 'unit', 'uncertainty', 'text']);
    for (const row of rows) expect(row).toHaveLength(head.length);
    expect(rows.some((row) => row[2] === '<script>run</script>, "one"\n| pipe | star *')).toBe(true);
  });
});

/** An own small reader of CSV, which shares nothing with the writer. */
const parsedCsv = (text: string): readonly (readonly string[])[] => {
  const rows: string[][] = [[]];
  let field = '';
  let quoted = false;
  for (let at = 0; at < text.length; at += 1) {
    const letter = text[at] ?? '';
    if (quoted && letter === '"' && text[at + 1] === '"') {
      field += '"';
      at += 1;
    } else if (letter === '"') quoted = !quoted;
    else if (!quoted && (letter === ',' || letter === '\n')) {
      rows.at(-1)?.push(field);
      field = '';
      if (letter === '\n') rows.push([]);
    } else field += letter;
  }
  return rows.slice(0, -1);
};
