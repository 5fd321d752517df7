import { describe, expect, test } from 'vitest';
import { progressOn } from '../../src/cli/progress.ts';
import { run } from '../../src/cli/run.ts';
import type { World } from '../../src/cli/world.ts';

const pieces = async function* (text: string, size = 7): AsyncGenerator<Uint8Array> {
  const bytes = new TextEncoder().encode(text);
  for (let at = 0; at < bytes.length; at += size) {
    await Promise.resolve();
    yield bytes.subarray(at, at + size);
  }
};

interface Outcome {
  readonly code: number;
  readonly out: string;
  readonly err: string;
}

/** The command with one file, "log.csv", or with the same text on standard input. */
const record = async (args: readonly string[], text: string, more: Partial<World> = {}): Promise<Outcome> => {
  let out = '';
  let err = '';
  const world: World = {
    out: (piece) => {
      out += piece;
      return Promise.resolve();
    },
    err: (piece) => {
      err += piece;
    },
    input: pieces(text),
    open: (path) => {
      if (path === 'log.csv') return pieces(text);
      throw Object.assign(new Error(path), { code: 'ENOENT' });
    },
    terminal: false,
    colour: false,
    ...more,
  };
  const code = await run(['record', ...args], world);
  return { code, out, err };
};

/** Made up: a plating run with a pause, a reversal, a gap and rows that hurt. */
const LOG = [
  '\ufeffTern Quay, tank B',
  'Zeit (min);Strom [mA]',
  '0;0',
  '0,5;1200,5',
  '1,0;1250',
  '0,8;5',
  '1,5;',
  '1,5;0',
  '2;0',
  '2,5;-600',
  '9;-500',
].join('\r\n');

describe('couplet record', () => {
  test('shows the charge both ways and what became of each line', async () => {
    const { code, out, err } = await record(['log.csv'], LOG);
    expect(code).toBe(0);
    expect(err).toBe('');
    // By hand, in A s: 18.0075 + 36.7575 + 18.75 forward; 9 + 214.5 reverse; together -149.985.
    expect(out).toMatch(/net charge +-149\.985 {2}C +-0\.0416625 {2}A h/);
    expect(out).toMatch(/forward +73\.515 {2}C/);
    expect(out).toMatch(/reverse +-223\.5 {2}C/);
    expect(out).toContain('11 in all, 7 used, 2 left out, 2 header lines');
    expect(out).toMatch(/1 {2}earlier than the row before {2}line 6 +0,8;5/);
    expect(out).toMatch(/1 {2}a value is missing +line 7 +1,5;/);
    expect(out).toContain('1 gap longer than 5 min, 6 min 30 s together');
    expect(out).toContain('once, line 10; the net is 50.4974 % of the charge moved');
    expect(out).toContain('The last line, 11, has no line end');
  });

  test('reads standard input and prints one line of JSON', async () => {
    const { code, out } = await record(['-', '--json'], LOG);
    expect(code).toBe(0);
    expect(out.split('\n')).toHaveLength(2);
    expect(JSON.parse(out)).toMatchObject({
      contract: 1,
      ok: true,
      record: { lines: { used: 7 }, bad: [{ reason: 'backward-time', lines: [6] }, { reason: 'missing-value' }] },
    });
  });

  test('takes columns, units, the rule and the gap from its options', async () => {
    const text = 'n;U;I\n0;2;1\n10;2;3\n100;2;3\n';
    const options = ['--time', '1', '--current', '3', '--time-unit', 's', '--current-unit', 'A', '--decimal', 'point'];
    const held = await record(['log.csv', ...options, '--rule', 'hold', '--gap', '30 s', '--gap-charge', 'skip'], text);
    expect(held.code).toBe(0);
    expect(held.out).toMatch(/charge +10 {2}C/);
    expect(held.out).toContain('no charge is counted across them');
    expect(held.out).toContain('each reading held until the next');
  });

  test('says what is wrong with a record and exits with 1', async () => {
    const { code, out, err } = await record(['log.csv'], 'time_s,voltage_V\n0,1\n');
    expect(code).toBe(1);
    expect(out).toBe('');
    expect(err).toContain('no column of current; it has time_s, voltage_V');
    const json = await record(['log.csv', '--json'], 'time_s,voltage_V\n0,1\n');
    expect(json.code).toBe(1);
    expect(JSON.parse(json.out)).toMatchObject({
      contract: 1,
      ok: false,
      fault: { code: 'bad-ask', field: 'current' },
    });
  });

  test('points into an option that cannot be read', async () => {
    const { code, err } = await record(['log.csv', '--gap', '30 m'], LOG);
    expect(code).toBe(1);
    expect(err).toContain('30 m');
    expect(err).toContain('m is no unit of the gap');
  });

  test('exits with 2 where the file is not there or the command is wrong', async () => {
    const nothing = await record(['nothing.csv'], LOG);
    expect(nothing.code).toBe(2);
    expect(nothing.err).toContain('there is no such file');
    expect((await record(['log.csv', '--rule', 'simpson'], LOG)).code).toBe(2);
  });

  test('shows each option in an example', async () => {
    const { code, out } = await record(['--help'], '');
    expect(code).toBe(0);
    const [, shown = ''] = out.split('Examples:');
    const options = [...out.matchAll(/^ {2}--([a-z-]+)/gm)].map(([, name]) => name ?? '');
    expect(options.length).toBeGreaterThan(9);
    for (const option of options.filter((name) => name !== 'help')) expect(shown).toContain(`--${option}`);
  });
});

describe('the progress bar', () => {
  test('is drawn on a terminal for errors only, and is wiped at the end', async () => {
    const size = () => Promise.resolve(new TextEncoder().encode(LOG).length);
    const shown = await record(['log.csv'], LOG, { errorTerminal: true, sizeOf: size });
    expect(shown.err).toContain('100 %');
    expect(shown.err.endsWith('\r\u001b[K')).toBe(true);
    expect(shown.out).not.toContain('\u001b');
    expect((await record(['log.csv'], LOG, { errorTerminal: false, sizeOf: size })).err).toBe('');
  });

  test('counts megabytes where the size is not known', () => {
    const drawn: string[] = [];
    const world = { err: (text: string) => void drawn.push(text), errorTerminal: true } as unknown as World;
    const progress = progressOn(world, undefined);
    for (let bytes = 0; bytes <= 12_000_000; bytes += 100_000) progress.read(bytes);
    progress.done();
    expect(drawn.map((text) => text.replace('\r\u001b[K', ''))).toEqual([
      '0 MB read',
      '4 MB read',
      '8 MB read',
      '12 MB read',
      '',
    ]);
  });
});
