import { spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { openRecord } from '../../src/amounts/record/reader.ts';
import { answerReadSheet, answerSheet, readSheet } from '../../src/desk/sheet/sheet.ts';
import type { SheetAnswer } from '../../src/desk/sheet/answer.ts';
import { LONGEST_SHEET } from '../../src/desk/sheet/text.ts';
import type { Fault } from '../../src/report/fault.ts';

const QUAY = readFileSync('fixtures/tern-quay.yaml', 'utf8');

const sheetOf = (text: string): SheetAnswer => {
  const read = answerSheet(text);
  if (!read.ok) throw new Error(read.fault.message);
  return read.value;
};

const faultOf = (text: string): Fault => {
  const read = answerSheet(text);
  if (read.ok) throw new Error('the sheet was answered');
  return read.fault;
};

/** The text that a fault underlines. */
const underlined = (text: string, { span }: Fault): string =>
  span === undefined ? '' : Array.from(text).slice(span.from, span.to).join('');

const tank = (name: string, rest = ''): string => `  - name: ${name}
    medium: acid
    anode: [H2O -> O2(g)]
    cathode: [Cu^2+ -> Cu]
${rest}`;

const GOOD = tank('Good', '    runs: [{ label: r, current: 2 A, time: 1 h }]\n');

/** The record of the demo as its script writes it: the build does the same. */
const madeRecord = (): string => {
  const made = spawnSync(process.execPath, ['fixtures/make-tern-quay-record.js']);
  if (made.status !== 0) throw new Error(String(made.stderr));
  return readFileSync('fixtures/records/tern-quay-wednesday.csv', 'utf8');
};

const answeredQuay = (record: string): SheetAnswer => {
  const read = readSheet(QUAY);
  const opened = openRecord();
  if (!read.ok || !opened.ok) throw new Error('not read');
  opened.value.take(record);
  const [named] = read.value.records;
  return answerReadSheet(read.value, new Map([[named?.key ?? '', opened.value.end()]]));
};

describe('the sheet of Tern Quay', () => {
  const record = madeRecord();
  const quay = answeredQuay(record);

  it('has a logged run of at least 50 000 rows, the same bytes on every machine', () => {
    const digest = createHash('sha256').update(record).digest('hex');
    expect(record.split('\n').length - 2).toBeGreaterThanOrEqual(50_000);
    expect(digest).toBe('4d35796d0c6fe3e58f0b81ca4c3fe7e01a64392450817a0fa3aad6e056d018cf');
  });

  it('gives the charge of the record that a plain sum of trapezoids gives', () => {
    const rows = record.trim().split('\n').slice(1);
    const readings = rows.map((row) => row.split(',').map(Number) as [number, number]);
    let coulombs = 0;
    readings.forEach(([time, current], at) => {
      const [before = time, was = current] = readings[at - 1] ?? [];
      coulombs += ((time - before) * (current + was)) / 2;
    });
    const tank = quay.tanks[0];
    const run = tank === undefined || 'fault' in tank ? undefined : tank.runs[2];
    if (run === undefined || 'fault' in run) throw new Error('a fault');
    expect(run.amounts.answer.quantities['charge']?.value).toBeCloseTo(coulombs / 3600, 6);
    expect(run.record?.rows).toBe(readings.length);
    expect(run.record?.trace.length).toBeLessThanOrEqual(512);
  });

  it('lets the wet weighing of Thursday stand out, and reaches both goals', () => {
    const tank = quay.tanks[0];
    if (tank === undefined || 'fault' in tank) throw new Error('a fault');
    const out = tank.runs.filter((run) => !('fault' in run) && run.weighed !== null && run.weighed.standsOut !== null);
    expect(out.map(({ name }) => name)).toEqual(['Thursday']);
    const goals = quay.tanks.flatMap((one) => ('fault' in one ? [] : one.targets));
    expect(goals.map((goal) => 'fault' in goal || goal.reached)).toEqual([true, true]);
  });

  it('answers all four tanks and all their runs', () => {
    expect(quay.tanks.map(({ name }) => name)).toEqual(['Tank A', 'Tank B', 'Tank C', 'Tank D']);
    for (const one of quay.tanks) {
      expect('fault' in one).toBe(false);
      if (!('fault' in one)) expect(one.runs.some((run) => 'fault' in run)).toBe(false);
    }
    expect(quay.invented).toBe(true);
  });

  it.each([
    // By hand: twice (Cu^2+ + 2 e^- -> Cu) and once (2 H2O -> O2 + 4 H^+ + 4 e^-).
    [0, '2 Cu^2+ + 2 H2O', '4', { Cu: '2', O2: '4' }],
    // 92 % and 8 % of 100 electrons: 46 Zn and 4 H2 against 25 O2.
    [1, '46 Zn(OH)4^2-', '100', { Zn: '2', O2: '4', H2: '2' }],
    [2, 'SO3^2- + 2 Ag(S2O3)2^3- + H2O', '2', { Ag: '1', 'SO4^2-': '2' }],
    [3, 'Cl^- + H2O', '2', { 'ClO^-': '2', H2: '2' }],
  ])('tank %i: overall reaction, electron number and electrons per mole', (at, left, electrons, perMole) => {
    const one = quay.tanks[at];
    if (one === undefined || 'fault' in one || 'fault' in one.yield) throw new Error('a fault');
    expect(one.cell.answer.overall.plain.split(' -> ')[0]).toBe(left);
    expect(one.cell.answer.electrons).toBe(electrons);
    expect(one.yield.answer.electronsPerMole).toMatchObject(perMole);
  });

  it('makes 1.672 kg of copper on Monday', () => {
    // 250 A * 6 h * 3600 s/h * 0.94 * 63.546 g/mol / (2 * 96485.33212 C/mol) = 1671.5 g
    const [a] = quay.tanks;
    if (a === undefined || 'fault' in a) throw new Error('a fault');
    const [monday] = a.runs;
    if (monday === undefined || 'fault' in monday) throw new Error('a fault');
    expect(monday.amounts.answer.quantities['mass']?.unit).toBe('kg');
    expect(monday.amounts.answer.quantities['mass']?.value).toBeCloseTo(1.67154, 4);
  });
});

describe('a fault in one tank', () => {
  const broken = (lines: string): string => `plant: P\ncells:\n${GOOD}${lines}${tank('Last')}`;

  it.each([
    [
      'a wrong element',
      tank('Bad').replace('Cu^2+ -> Cu]', 'Cu^2+ -> Cq]'),
      'unknown-element',
      'cells[1].cathode[0]',
      'Cq',
    ],
    ['a wrong key', tank('Bad', '    purpos: x\n'), 'bad-ask', 'cells[1].purpos', 'purpos'],
    ['a wrong medium', tank('Bad').replace('acid', 'sour'), 'unknown-medium', 'cells[1].medium', 'sour'],
    ['a repeated name', tank('Good'), 'bad-ask', 'cells[1].name', 'name'],
    ['an electrode that is no list', tank('Bad').replace('[H2O -> O2(g)]', 'x'), 'bad-ask', 'cells[1].anode', 'anode'],
    ['a tank that is text', '  - just text\n', 'bad-ask', 'cells[1]', 'just text'],
    [
      'a share over 100 %',
      tank('Bad').replace(
        '[Cu^2+ -> Cu]',
        '[{ skeleton: Cu^2+ -> Cu, share: 130 % }, { skeleton: H^+ -> H2, share: 1 % }]',
      ),
      'contradiction',
      'cells[1].cathode',
      '[{ skeleton: Cu^2+ -> Cu, share: 130 % }, { skeleton: H^+ -> H2, share: 1 % }]',
    ],
    [
      'a species of none that is there',
      tank('Bad', '    present: [Cu^2+, Xq]\n'),
      'unknown-element',
      'cells[1].present[1]',
      'Xq',
    ],
    ['a mode that there is none of', tank('Bad', '    mode: magic\n'), 'bad-ask', 'cells[1].mode', 'mode'],
  ])('has its place and does not lose the others: %s', (_, lines, code, field, text) => {
    const sheet = broken(lines);
    const { tanks } = sheetOf(sheet);
    expect(tanks.map((one) => 'fault' in one)).toEqual([false, true, false]);
    const bad = tanks[1];
    if (bad === undefined || !('fault' in bad)) throw new Error('no fault');
    expect(bad.fault).toMatchObject({ code, field });
    expect(underlined(sheet, bad.fault)).toBe(text);
  });

  it.each([
    ['a unit', '{ label: r, current: 2 Q, time: 1 h }', 'unknown-unit', 'cells[1].runs[0].current', 'Q'],
    ['a key', '{ label: r, curent: 2 A, time: 1 h }', 'bad-ask', 'cells[1].runs[0].curent', 'curent'],
    ['too little', '{ label: r, current: 2 A }', 'not-enough-given', undefined, undefined],
    ['a weight', '{ label: r, charge: 1 A h, weighed: heavy }', undefined, 'cells[1].runs[0].weighed', 'heavy'],
    ['a product', '{ label: r, product: Ag, charge: 1 A h }', 'bad-ask', 'cells[1].runs[0].product', undefined],
  ])('of a run has its place and loses neither tank nor other runs: %s', (_, run, code, field, text) => {
    const sheet = broken(tank('Bad', `    runs:\n      - ${run}\n      - { label: ok, charge: 1 A h }\n`));
    const bad = sheetOf(sheet).tanks[1];
    if (bad === undefined || 'fault' in bad) throw new Error('the tank is lost');
    const [first, second] = bad.runs;
    if (first === undefined || !('fault' in first)) throw new Error('no fault');
    expect(second !== undefined && 'amounts' in second).toBe(true);
    if (code !== undefined) expect(first.fault.code).toBe(code);
    if (field !== undefined) expect(first.fault.field).toBe(field);
    if (text !== undefined) expect(underlined(sheet, first.fault)).toBe(text);
  });
});

describe('a sheet that cannot be read', () => {
  it.each([
    ['a tab', 'plant: P\ncells:\n\t- name: A\n', '\t'],
    ['a key that stands twice', `plant: P\nplant: Q\ncells:\n${GOOD}`, 'plant'],
    ['an unknown key', `plant: P\ncolour: red\ncells:\n${GOOD}`, 'colour'],
  ])('is a bad-ask with its place: %s', (_, text, place) => {
    const fault = faultOf(text);
    expect(fault.code).toBe('bad-ask');
    expect(underlined(text, fault)).toBe(place);
  });

  it.each([
    ['no tanks', 'plant: P\n'],
    ['an empty list of tanks', 'plant: P\ncells: []\n'],
    ['nothing', ''],
    ['text', 'hello'],
    ['a list', '- a\n- b\n'],
    ['two documents', 'plant: P\n---\nplant: Q\n'],
    ['an alias to nothing', 'plant: *p\ncells: []\n'],
    ['an open quotation mark', 'plant: "P\ncells: []\n'],
  ])('is a bad-ask: %s', (_, text) => {
    expect(faultOf(text).code).toBe('bad-ask');
  });

  it('is not read where aliases expand without end', () => {
    const levels = Array.from(
      { length: 12 },
      (_, at) => `l${String(at + 1)}: &l${String(at + 1)} [${`*l${String(at)},`.repeat(9)}]`,
    );
    expect(faultOf(`l0: &l0 x\n${levels.join('\n')}\n`).message).toContain('liases');
  });

  it.each([
    ['brackets', '['.repeat(100_000)],
    ['dashes', '- '.repeat(50_000)],
    ['question marks', '? '.repeat(50_000)],
    ['steps', Array.from({ length: 600 }, (_, at) => `${' '.repeat(at)}a:`).join('\n')],
  ])('is refused where %s nest too deeply', (_, text) => {
    expect(faultOf(text).message).toContain('deep');
  });

  it('is refused where it is too long', () => {
    expect(faultOf('#'.repeat(LONGEST_SHEET + 1)).code).toBe('too-long');
  });
});

describe('a part of a sheet that has no fields', () => {
  it.each([
    ['', 'sheet', 'A sheet', 'plant'],
    ['# to be written\n', 'sheet', 'A sheet', 'cells'],
    ['Tern Quay\n', 'sheet', 'A sheet', 'plant'],
    ['- Tern Quay\n', 'sheet', 'A sheet', 'cells'],
  ])('is told what must stand there: %j', (text, field, subject, named) => {
    const sheet = answerSheet(text);
    expect(sheet).toMatchObject({ ok: false, fault: { code: 'bad-ask', field } });
    if (sheet.ok) return;
    expect(sheet.fault.message).toBe(`${subject} must be written as fields, each with its value.`);
    expect(sheet.fault.hint).toContain(named);
  });

  it.each(['null', 'copper', '[copper]'])('is named where it is a tank: %s', (tank) => {
    const sheet = answerSheet(`plant: P\ncells: [${tank}]\n`);
    const fault = sheet.ok ? sheet.value.tanks.flatMap((one) => ('fault' in one ? [one.fault] : []))[0] : undefined;
    expect(fault).toMatchObject({ code: 'bad-ask', field: 'cells[0]', span: { from: 17, to: 17 + tank.length } });
    expect(fault?.message).toMatch(/^A tank must be/);
    expect(fault?.hint).toContain('anode');
  });
});
