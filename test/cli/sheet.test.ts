import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { run } from '../../src/cli/run.ts';
import type { World } from '../../src/cli/world.ts';

const SHEET = `plant: P
cells:
  - name: A
    medium: acid
    anode: [H2O -> O2(g)]
    cathode: [Cu^2+ -> Cu]
    runs:
      - { label: logged, record: logs/a.csv }
      - { label: stated, current: 250 A, time: 6 h }
`;
const LOG = 'time (s),current (A)\n0,10\n3600,10\n';

/** 250 A for seven and a half hours. */
const LOG_OF_1875 = 'time (h),current (A)\n0,250\n7.5,250\n';

interface Shown {
  readonly code: number;
  readonly out: string;
  readonly err: string;
  readonly saved: ReadonlyMap<string, string>;
}

const bytes = async function* (text: string): AsyncGenerator<Uint8Array> {
  await Promise.resolve();
  yield new TextEncoder().encode(text);
};

const failing = (code: string): Error => Object.assign(new Error(code), { code });

const open = async function* (files: Readonly<Record<string, string>>, path: string): AsyncGenerator<Uint8Array> {
  const text = files[path];
  if (text === undefined) throw failing('ENOENT');
  yield* bytes(text);
};

const couplet = async (
  argv: readonly string[],
  files: Readonly<Record<string, string>>,
  input = '',
): Promise<Shown> => {
  let out = '';
  let err = '';
  const saved = new Map<string, string>();
  const world: World = {
    out: (text) => {
      out += text;
      return Promise.resolve();
    },
    err: (text) => {
      err += text;
    },
    input: bytes(input),
    open: (path) => open(files, path),
    save: (path, text) => {
      if (path.startsWith('locked/')) return Promise.reject(failing('EACCES'));
      saved.set(path, text);
      return Promise.resolve();
    },
    terminal: false,
    colour: false,
  };
  const code = await run(argv, world);
  return { code, out, err, saved };
};

const FILES = { 'plant/p.yaml': SHEET, 'plant/logs/a.csv': LOG };

describe('couplet sheet', () => {
  it('reads the records that lie beside the sheet', async () => {
    const { code, out, err } = await couplet(['sheet', 'plant/p.yaml'], FILES);
    expect(err).toBe('');
    expect(code).toBe(0);
    expect(out).toContain('2 rows of logs/a.csv over 60 min');
  });

  it('faults only the run whose record cannot be read, and gives 1', async () => {
    const { code, out, err } = await couplet(['sheet', 'plant/p.yaml'], { 'plant/p.yaml': SHEET });
    expect(code).toBe(1);
    expect(out).toContain('stated');
    expect(err).toContain('logs/a.csv cannot be read: there is no such file.');
    expect(err).toContain('cells[0].runs[0].record:8:26');
  });

  it('reads records from where the command was started when the sheet comes from standard input', async () => {
    const { code, out } = await couplet(['sheet', '-'], { 'logs/a.csv': LOG }, SHEET);
    expect(code).toBe(0);
    expect(out).toContain('logged');
  });

  it.each([
    ['markdown', /^# P\n/],
    ['csv', /^part,tank,name,/],
    ['json', /^\{"contract":1,"ok":true,"sheet":\{/],
    ['html', /^<!DOCTYPE html>\n<html lang="en">/],
    ['text', /^P\n/],
  ])('shows %s, on standard output or in a file', async (format, start) => {
    const { code, out, err } = await couplet(['sheet', 'plant/p.yaml', '--format', format], FILES);
    expect([code, err]).toEqual([0, '']);
    expect(out).toMatch(start);
    const filed = await couplet(['sheet', 'plant/p.yaml', '--format', format, '--out', 'page'], FILES);
    expect([filed.code, filed.out, filed.saved.get('page')]).toEqual([0, '', out]);
  });

  it('gives 1 where a part of a page is at fault, and holds the fault in the page', async () => {
    const broken = { 'p.yaml': SHEET };
    for (const format of ['markdown', 'csv', 'json', 'html']) {
      const { code, out, err } = await couplet(['sheet', 'p.yaml', '--format', format], broken);
      expect([code, err]).toEqual([1, '']);
      expect(out).toContain('there is no such file');
    }
  });

  it.each([
    ['the sheet itself', ['sheet', 'plant/p.yaml', '--out', 'plant/p.yaml'], 'is the sheet itself'],
    ['a file that may not be written', ['sheet', 'plant/p.yaml', '--out', 'locked/page'], 'cannot be written'],
    ['an unknown format', ['sheet', 'plant/p.yaml', '--format', 'doc'], 'doc'],
    ['two places', ['sheet', 'plant/p.yaml', '--out', 'a', '--every', 'b'], 'every'],
    ['two formats', ['sheet', 'plant/p.yaml', '--format', 'csv', '--json'], 'json'],
  ])('gives 2 for %s', async (_, argv, words) => {
    const { code, err, saved } = await couplet(argv, FILES);
    expect(code).toBe(2);
    expect(err).toContain(words);
    expect(saved.size).toBe(0);
  });

  it('writes every format from one command', async () => {
    const { code, out, err, saved } = await couplet(['sheet', 'plant/p.yaml', '--every', 'day'], FILES);
    expect([code, out, err]).toEqual([0, '', '']);
    expect([...saved.keys()]).toEqual(['day.txt', 'day.md', 'day.csv', 'day.json', 'day.html']);
    for (const format of ['text', 'markdown', 'csv', 'json', 'html']) {
      const alone = await couplet(['sheet', 'plant/p.yaml', '--format', format], FILES);
      expect([...saved.values()]).toContain(alone.out);
    }
  });

  it('says in a page of text what was not answered, in its place', async () => {
    const { out } = await couplet(['sheet', 'p.yaml'], { 'p.yaml': SHEET });
    expect(out).toContain('! logged was not answered.');
  });

  it('writes no file for a sheet that cannot be read', async () => {
    const { code, err, saved } = await couplet(['sheet', 'p.yaml', '--format', 'html', '--out', 'page'], {
      'p.yaml': 'plant: P\n\tcells: []\n',
    });
    expect(code).toBe(1);
    expect(err).toContain('sheet:2:1');
    expect(saved.size).toBe(0);
  });
});

describe('the README', () => {
  it('shows a sheet that is answered whole', async () => {
    const [, sheet = ''] = /^```yaml\n(.*?)^```$/ms.exec(readFileSync('README.md', 'utf8')) ?? [];
    const { code, out, err } = await couplet(['sheet', 'p.yaml'], { 'p.yaml': sheet, 'logs/tuesday.csv': LOG_OF_1875 });
    expect([code, err]).toEqual([0, '']);
    const said = out.replace(/\s+/g, ' ');
    expect(said).toContain('by 2 weighed runs');
    expect(said).toContain('ready at 15:16');
  });
});

describe('couplet schema', () => {
  it.each(['sheet', 'asks', 'answers', 'record'])('prints the schema of %s as JSON', async (what) => {
    const { code, out } = await couplet(['schema', what], {});
    expect(code).toBe(0);
    expect(JSON.parse(out)).toMatchObject({ $schema: 'https://json-schema.org/draft/2020-12/schema' });
  });

  it('gives 2 for anything else', async () => {
    const { code, err } = await couplet(['schema', 'plant'], {});
    expect(code).toBe(2);
    expect(err).toContain('sheet');
  });
});
