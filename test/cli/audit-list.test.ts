import { describe, expect, it } from 'vitest';
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
