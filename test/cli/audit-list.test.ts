import { describe, expect, it } from 'vitest';
import { equationsOfText } from '../../src/cli/equation-list.ts';
import { couplet } from './world.ts';

const TEXT = `# by hand
2 H2 + O2 -> 2 H2O

tank 3: Zn -> Zn^2+ + 2 e^-   # right
tank 4: H2 + O2 -> H2O
4 H2 + 2 O2 -> 4 H2O
Fe -> Xx
`;

const CSV = `label,"equation",who
one,"2 H2 + O2 -> 2 H2O",A
"two, wrong","H2 + O2 -> H2O",B
"three
lines","Zn -> Zn^2+ + 2 e^-","said ""yes"""
`;

describe('an audit of many equations', () => {
  it('counts each verdict, then shows only what needs attention', async () => {
    const { code, out } = await couplet(['audit', '--file', 'list.txt'], { files: { 'list.txt': TEXT } });
    expect(code).toBe(1);
    expect(out).toMatch(/balanced +2\n/);
    expect(out).toMatch(/not-lowest +1\n/);
    expect(out).toMatch(/unbalanced +1\n/);
    expect(out).toMatch(/unreadable +1\n/);
    expect(out).toContain('line 5, tank 4');
    expect(out).toContain('line 7');
    expect(out).not.toContain('tank 3');
  });

  it('gives 0 where nothing is wrong', async () => {
    const { code } = await couplet(['audit', '--file', '-'], { input: '2 H2 + O2 -> 2 H2O\n' });
    expect(code).toBe(0);
  });

  it('reads the named column of a CSV file, with quotes, separators and line ends inside', async () => {
    const argv = ['audit', '--file', 'r.csv', '--column', 'equation', '--format', 'ndjson'];
    const { out, code } = await couplet(argv, { files: { 'r.csv': CSV } });
    expect(code).toBe(1);
    expect(
      out
        .trimEnd()
        .split('\n')
        .map((line): unknown => JSON.parse(line)),
    ).toMatchObject([
      { line: 2, label: 'one', ok: true, answer: { verdict: 'balanced' } },
      { line: 3, label: 'two, wrong', answer: { verdict: 'unbalanced' } },
      { line: 4, label: 'three\nlines', answer: { verdict: 'balanced' } },
    ]);
  });

  it('takes a semicolon or a tab for the separator where the header has one', async () => {
    const files = {
      'r.csv': 'label;equation\r\none;2 H2 + O2 -> 2 H2O\r\n',
      'r.tsv': 'equation\tlabel\nH2 -> 2 H\tx\n',
    };
    expect((await couplet(['audit', '--file', 'r.csv', '--column', 'equation'], { files })).code).toBe(0);
    expect((await couplet(['audit', '--file', 'r.tsv', '--column', 'Equation'], { files })).code).toBe(0);
  });

  it('is a wrong command where the column is missing or a quotation mark stays open', async () => {
    const missing = await couplet(['audit', '--file', 'r.csv', '--column', 'reaction'], { files: { 'r.csv': CSV } });
    expect(missing.code).toBe(2);
    expect(missing.err).toContain('label, equation, who');
    const files = { 'r.csv': 'equation\n"H2 -> H2\nmore\n' };
    expect((await couplet(['audit', '--file', 'r.csv', '--column', 'equation'], { files })).code).toBe(2);
  });

  it('writes a Markdown table and CSV that can be read back', async () => {
    const markdown = await couplet(['audit', '--file', 'l', '--format', 'markdown'], { files: { l: TEXT } });
    expect(markdown.out).toContain('| balanced | 2 |');
    expect(markdown.out).toContain('| 5 | tank 4 | `H2 + O2 -> H2O` | unbalanced |');
    const csv = await couplet(['audit', '--file', 'l', '--format', 'csv'], { files: { l: TEXT } });
    expect(csv.out.split('\n')[0]).toBe('line,label,equation,verdict,right_minus_left,likeliest_repair');
    expect(csv.out.trimEnd().split('\n')).toHaveLength(6);
  });
});

describe('a list as people keep it', () => {
  const audit = async (text: string | Uint8Array, ...more: readonly string[]): ReturnType<typeof couplet> =>
    couplet(['audit', '--file', 'l.txt', ...more], { files: { 'l.txt': text } });

  it('may be numbered or dashed, its labels behind the numbers', async () => {
    const text = '1. 2 H2 + O2 -> 2 H2O\n2) tank 3: H2 + O2 -> H2O\n- tank 4: 3. H2 -> H2\n* H2 -> H2\n';
    const { out, code } = await audit(text, '--format', 'csv');
    expect(code).toBe(1);
    expect(out.split('\n').slice(1, 5)).toEqual([
      '1,,2 H2 + O2 -> 2 H2O,balanced,,',
      '2,tank 3,H2 + O2 -> H2O,unbalanced,O -1,2 H2 + O2 -> 2 H2O',
      '3,tank 4,H2 -> H2,balanced,,',
      '4,,H2 -> H2,balanced,,',
    ]);
  });

  it.each([
    ['line feeds', '\n'],
    ['returns', '\r'],
    ['both', '\r\n'],
  ])('may end its lines with %s', async (_, end) => {
    const text = ['H2 -> H2', '', 'H2 + O2 -> H2O', ''].join(end);
    const { out } = await audit(text);
    expect(out).toMatch(/balanced +1\n/);
    expect(out).toContain('line 3   unbalanced');
    const table = ['equation', 'H2 -> H2', 'H2 + O2 -> H2O', ''].join(end);
    expect((await audit(table, '--column', 'equation')).out).toContain('line 3   unbalanced');
  });

  it('counts a return and a line feed once, though a piece of the file ends between them', async () => {
    const texts: string[] = [];
    const pieces = async function* (): AsyncGenerator<string> {
      for (const piece of ['H2 -> H2\r', '\nH2 ', '-> H2\r', '\r', '\nN2 -> N2\r']) yield await Promise.resolve(piece);
    };
    for await (const { line, text } of equationsOfText(pieces())) texts.push(`${String(line)} ${text}`);
    expect(texts).toEqual(['1 H2 -> H2', '2 H2 -> H2', '4 N2 -> N2']);
  });

  it('may be UTF-16 where a byte-order mark says so', async () => {
    expect((await audit(new Uint8Array(Buffer.from('\ufeffH2 -> H2\r\n', 'utf16le')))).code).toBe(0);
  });

  it('is asked for the column where it is CSV', async () => {
    for (const text of ['label,equation\na,H2 -> H2\n', 'label;"equation"\r\na;H2 -> H2\r\n']) {
      const { code, out, err } = await audit(text);
      expect([code, out]).toEqual([2, '']);
      expect(err).toContain('label, equation');
      expect(err).toContain('--column');
    }
    // A heading is one line that is no equation, and no more.
    expect((await audit('Tank 3, Monday\nH2 -> H2\n')).out).toMatch(/balanced +1\n.*unreadable +1\n/s);
  });

  it('is refused once for a setting that no line can be audited with', async () => {
    const sour = await audit('H2 -> H2\nN2 -> N2\n', '--medium', 'asid');
    expect([sour.code, sour.out]).toEqual([2, '']);
    expect(sour.err).toContain('--medium');
    expect(sour.err).toContain('Did you mean acid');
    expect(sour.err.match(/asid/g)).toHaveLength(2);
    const host = await audit('H2 -> H2\n', '--where', 'x=much');
    expect([host.code, host.out]).toEqual([2, '']);
    expect(host.err).toContain('--where x');
    expect((await audit('H2 -> H2\n', '--helpers', 'Xx^-')).err).toContain('--helpers');
  });

  it.each(['text', 'markdown', 'csv', 'ndjson'])('never passes on nothing: %s', async (format) => {
    for (const text of ['', '\n# to be written\n', 'equation\n']) {
      const column = text.startsWith('equation') ? ['--column', 'equation'] : [];
      const { code, err } = await audit(text, '--format', format, ...column);
      expect(code).toBe(1);
      expect(err).toBe('Nothing was audited: l.txt holds no equation.\n');
    }
  });
});

describe('a file that is no text', () => {
  const rubbish = new Uint8Array([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a, 0xff, 0xd8, 0x2d, 0x3e]);
  const zeros = new Uint8Array([0x48, 0x32, 0x00, 0x2d, 0x3e]);
  const late = new Uint8Array([...new TextEncoder().encode('time_s,current_A\n0,1\n'), 0xc3]);

  it.each([['audit', '--file'], ['table', '--file'], ['record'], ['sheet']])(
    'is refused and not repeated: %s',
    async (...command) => {
      for (const content of [rubbish, zeros, late]) {
        const { code, out, err } = await couplet([...command, 'bin'], { files: { bin: content } });
        expect([code, out]).toEqual([2, '']);
        expect(err).toBe('bin cannot be read: it is not UTF-8 text. If it is a text, save it as UTF-8.\n');
      }
    },
  );
});
