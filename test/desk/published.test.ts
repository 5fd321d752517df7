import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { parse } from 'yaml';
import * as z from 'zod';
import { openRecord } from '../../src/amounts/record/reader.ts';
import { answer } from '../../src/desk/answer.ts';
import { type Published, publishedSchema } from '../../src/desk/schema/published.ts';
import { runSchema, targetSchema } from '../../src/desk/schema/sheet.ts';

type Node = Parameters<typeof z.fromJSONSchema>[0];

/** Made up: a plating run with a pause, a reversal, a gap, and rows that cannot be used. */
const HURT = [
  'time (min),current (mA)',
  '0,0',
  '0.5,1200',
  '1,1250',
  '1,1240',
  '0.8,5',
  '1.5,',
  '1.5,x',
  '2,-600,7',
  '2.5,-600',
  '3,"-600',
  'time (min),current (mA)',
  '3,-600',
  '99,-500',
].join('\n');

/** A checker made from the published text alone: it shares nothing with the schemas it came from. */
const checkerOf = (which: Published): z.ZodType =>
  z.fromJSONSchema(JSON.parse(JSON.stringify(publishedSchema(which))) as Node);

/** A sheet as an editor sees it: numbers and truth values where YAML makes them. */
const QUAY: unknown = parse(readFileSync('fixtures/tern-quay.yaml', 'utf8'));

describe('the published schema of a sheet', () => {
  const sheet = checkerOf('sheet');

  it('takes the demo plant as an editor reads it', () => {
    expect(sheet.safeParse(QUAY).success).toBe(true);
  });

  it('takes numbers and truth values for what a sheet reads as text', () => {
    const text = 'plant: 7\nwhere: { x: 0.4 }\ncells: [{ name: 1, anode: [a], cathode: [b], separator: true }]';
    expect(sheet.safeParse(parse(text)).success).toBe(true);
  });

  it.each([
    ['a wrong key', 'plant: P\ncels: []'],
    ['a wrong key of a tank', 'plant: P\ncells: [{ name: A, anode: [a], cathode: [b], runns: [] }]'],
    [
      'a wrong key of a run',
      'plant: P\ncells: [{ name: A, anode: [a], cathode: [b], runs: [{ label: r, curent: 2 A }] }]',
    ],
    [
      'a goal without a goal',
      'plant: P\ncells: [{ name: A, anode: [a], cathode: [b], targets: [{ start: "08:00" }] }]',
    ],
    ['no tanks', 'plant: P\ncells: []'],
    ['a wrong mode', 'plant: P\ncells: [{ name: A, anode: [a], cathode: [b], mode: magic }]'],
  ])('refuses %s', (_, text) => {
    expect(sheet.safeParse(parse(text)).success).toBe(false);
  });

  it('describes every field of a run and a goal that is not plain', () => {
    const bare = [runSchema, targetSchema].flatMap(({ shape }) =>
      Object.entries(shape).flatMap(([name, field]) => (field.description === undefined ? [name] : [])),
    );
    expect(bare).toEqual(['note', 'label']);
  });
});

describe('the published schemas of the contract', () => {
  it('take an ask, its answer and a fault', () => {
    const ask = { ask: 'half', skeleton: 'MnO4^- -> Mn^2+', medium: 'acid' };
    expect(checkerOf('asks').safeParse(ask).success).toBe(true);
    expect(checkerOf('asks').safeParse({ ...ask, medum: 'acid' }).success).toBe(false);
    const answers = checkerOf('answers');
    for (const one of [ask, { ask: 'half', skeleton: 'Xx' }, 7]) {
      expect(answers.safeParse(JSON.parse(JSON.stringify(answer(one)))).success).toBe(true);
    }
    expect(answers.safeParse({ contract: 2, ok: true }).success).toBe(false);
  });
});

describe('the published schema of a record', () => {
  const checker = checkerOf('record');

  /** As the command prints it. */
  const replyTo = (text: string): Readonly<Record<string, unknown>> => {
    const opened = openRecord();
    if (!opened.ok) throw new Error(opened.fault.message);
    opened.value.take(text);
    const record = opened.value.end();
    const shown = record.ok ? { record: record.value } : { fault: record.fault };
    return JSON.parse(JSON.stringify({ contract: 1, ok: record.ok, ...shown })) as Readonly<Record<string, unknown>>;
  };

  it.each([
    ['a plain one', 'time_s,current_A\n0,1\n60,1\n'],
    ['one with a pause, a reversal, a gap, and rows that hurt', HURT],
    ['clock times', 'Zeit;Strom [mA]\n23:59:00;1,5\n00:01:00;1,5\n00:01:00;2\n'],
    ['a fault', 'time_s,voltage_V\n0,1\n'],
  ])('takes %s', (_, text) => {
    const reply = replyTo(text);
    expect(checker.safeParse(reply).error?.issues).toBeUndefined();
    expect(checker.safeParse({ ...reply, more: 1 }).success).toBe(false);
  });
});
