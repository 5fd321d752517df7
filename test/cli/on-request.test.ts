import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { QUANTITY_NAMES } from '../../src/amounts/quantities.ts';
import { couplet } from './world.ts';

const ESCAPE = '\u001b';

describe('a style', () => {
  const half = ['half', 'MnO4^- -> Mn^2+', '--medium', 'acid'];

  it('gives the formulas alone, to be pasted, and what must be known on standard error', async () => {
    const { code, out, err } = await couplet([...half, '--style', 'html']);
    expect(code).toBe(0);
    expect(out).toBe(
      'MnO<sub>4</sub><sup>−</sup> + 8\u00a0H<sup>+</sup> + 5\u00a0e<sup>−</sup> → Mn<sup>2+</sup> + 4\u00a0H<sub>2</sub>O\n',
    );
    expect(err).toContain('Permanganate in concentrated sulfuric acid');
  });

  it('never hides a grave caution', async () => {
    const chlorine = ['cell', '--anode', 'Cl^- -> Cl2', '--cathode', 'H2O -> H2', '--medium', 'neutral'];
    for (const style of ['html', 'latex', 'mathml']) {
      const { out, err } = await couplet([...chlorine, '--style', style]);
      expect(out.trimEnd().split('\n')).toHaveLength(3);
      expect(err.startsWith('  danger ')).toBe(true);
    }
    for (const style of ['plain', 'unicode'])
      expect((await couplet([...chlorine, '--style', style])).out.startsWith('  danger ')).toBe(true);
  });

  it('is LaTeX that needs no package, or MathML', async () => {
    const latex = await couplet(['half', 'Cu^2+ -> Cu', '--medium', 'acid', '--style', 'latex']);
    expect(latex.out).toBe('\\mathrm{Cu^{2+}} + 2\\,\\mathrm{e^{-}} \\rightarrow \\mathrm{Cu}\n');
    const mathml = await couplet(['species', 'H2O', '--style', 'mathml']);
    expect(mathml.out).toMatch(/^<math xmlns="http:\/\/www\.w3\.org\/1998\/Math\/MathML">.*<mn>2<\/mn>.*<\/math>\n$/);
  });

  it('is plain on a terminal and Unicode in a pipe where that is asked for', async () => {
    expect((await couplet([...half, '--style', 'plain'], { terminal: true })).out).toContain('MnO4^- + 8 H^+');
    expect((await couplet([...half, '--style', 'unicode'])).out).toContain('MnO₄⁻ + 8 H⁺ + 5 e⁻ → Mn²⁺ + 4 H₂O');
  });

  it('is had by equations, redox reactions and audits, and spells defined names', async () => {
    const equation = await couplet(['equation', '2H2+O2=2H2O', '--style', 'unicode']);
    expect(equation.out).toContain('H₂O');
    const redox = await couplet(['redox', 'Cl2 -> Cl^- + ClO3^-', '--medium', 'base', '--style', 'latex']);
    expect(redox.out.trimEnd().split('\n')).toHaveLength(3);
    const audit = await couplet(['audit', '2 H2 + O2 -> H2O', '--style', 'html']);
    expect(audit.code).toBe(1);
    expect(audit.out.split('\n')[0]).toBe('2\u00a0H<sub>2</sub> + O<sub>2</sub> → H<sub>2</sub>O');
    const named = ['species', 'Cu(EDTA)^2-', '--define', 'EDTA^4-=C10H12N2O8^4-', '--style', 'html'];
    expect((await couplet(named)).out).toBe('Cu(EDTA)<sup>2−</sup>\n');
  });

  it('is a wrong command where it is none, or beside --json', async () => {
    expect((await couplet([...half, '--style', 'pdf'])).code).toBe(2);
    expect((await couplet([...half, '--style', 'html', '--json'])).code).toBe(2);
    const files = { 'list.txt': '2 H2 + O2 -> H2O\n' };
    expect((await couplet(['audit', '--file', 'list.txt', '--style', 'html'], { files })).code).toBe(2);
    const list = await couplet(['audit', '--file', 'list.txt', '--style', 'unicode'], { files });
    expect(list.out).toContain('2 H₂ + O₂ → 2 H₂O');
  });
});

describe('scale, folding and listing', () => {
  it('are options of half and redox', async () => {
    const per = await couplet(['half', 'O2 -> H2O', '--medium', 'acid', '--per', 'electron']);
    expect(per.out).toContain('1/4 O2 + H^+ + e^- -> 1/2 H2O');
    const folded = await couplet(['half', 'MnO4^- + H3O^+ -> Mn^2+ + H2O', '--fold-hydronium']);
    expect(folded.out).toContain('MnO4^- + 8 H^+ + 5 e^- -> Mn^2+ + 4 H2O');
    const { err, code } = await couplet(['redox', 'MnO4^- + H2O2 -> Mn^2+ + O2', '--medium', 'acid', '--irreducible']);
    expect(code).toBe(1);
    expect(err).toContain('every whole balance is a sum of these');
    expect(err).toContain('2 MnO4^- + H2O2 + 6 H^+ -> 2 Mn^2+ + 3 O2 + 4 H2O');
  });

  it('points into the scale that cannot be', async () => {
    const { err } = await couplet(['half', 'O2 -> H2O', '--medium', 'acid', '--per', 'Xx']);
    expect(err.split('\n').slice(0, 2)).toEqual(['per:1:1', '  Xx']);
  });
});

describe('an audit', () => {
  const wrong = 'MnO4^- + 8 H^+ + 5 e^- -> Mn^2+ + 3 H2O';

  it('lists what each term puts in', async () => {
    const { out } = await couplet(['audit', wrong, '--contributions']);
    expect(out).toMatch(/left {8}MnO4\^- {3}1 {2}4 {2}\. {6}-1\n/);
    expect(out).toMatch(/right {7}Mn\^2\+ {4}1 {2}\. {2}\. {6}\+2\n/);
  });

  it('is a Markdown table for a report', async () => {
    const { out, code } = await couplet(['audit', wrong, '--format', 'markdown']);
    expect(code).toBe(1);
    expect(out.split('\n').slice(0, 7)).toEqual([
      `\`${wrong}\`: **not balanced**`,
      '',
      '|  | Mn | O | H | charge |',
      '| --- | --: | --: | --: | --: |',
      '| left | 1 | 4 | 8 | +2 |',
      '| right | 1 | 3 | 6 | +2 |',
      '| off by |  | **-1** | **-2** |  |',
    ]);
    expect(out).toContain('1. `MnO4^- + 8 H^+ + 5 e^- -> Mn^2+ + 4 H2O`: 4 H2O instead of 3 on the right');
    expect((await couplet(['audit', wrong, '--format', 'csv'])).code).toBe(2);
    expect((await couplet(['audit', wrong, '--format', 'ndjson'])).out).toContain('"verdict":"unbalanced"');
  });

  it('underlines in the terminal what a repair changes', async () => {
    const { out } = await couplet(['audit', wrong], { terminal: true, colour: true });
    expect(out).toContain(`Mn²⁺ + ${ESCAPE}[4m4 H₂O${ESCAPE}[24m`);
  });

  it('of a whole cell shows its equations, what fails, and what the cell makes', async () => {
    const argv = ['audit', '--anode', 'Zn -> Zn^2+ + 2 e^-', '--cathode', 'Ag^+ + e^- -> Ag', '--electrons', '1'];
    const { out, code } = await couplet([...argv, '--overall', 'Zn + 2 Ag^+ -> Zn^2+ + 2 Ag']);
    expect(code).toBe(1);
    expect(out).toContain('anode       Zn -> Zn^2+ + 2 e^-          balanced');
    expect(out).toContain('taken       1 x anode, 2 x cathode');
    expect(out).toContain('electrons   2, claimed 1');
    expect(out).toContain('fails       electrons');
    expect(out).toMatch(/makes {7}Zn\^2\+ {2}2 {2}mol of electrons per mole\n {14}Ag {5}1/);
    const markdown = await couplet([...argv, '--overall', 'Zn + 2 Ag^+ -> Zn^2+ + 2 Ag', '--format', 'markdown']);
    expect(markdown.out).toContain('### overall');
    expect(markdown.out).toContain('**fails: electrons**');
  });
});

describe('a page in colour', () => {
  const chlorine = ['cell', '--anode', 'Cl^- -> Cl2', '--cathode', 'H2O -> H2', '--medium', 'neutral'];
  const pages = [
    chlorine,
    ['half', 'MnO4^- -> Mn^2+'],
    ['table', 'Cl^- -> Cl2', 'H2O -> H2', '--medium', 'neutral'],
    ['audit', 'H2 + O2 -> H2O', '--contributions'],
    ['cell', '--anode', 'Cl^- -> Cl2', '--cathode', 'H2O -> H2', '--cathode-medium', 'base', '--separator'],
    ['amounts', '--half', '2 Cl^- -> Cl2(g) + 2 e^-', '--species', 'Cl2', '--given', 'charge=1.00(1) A h', '--budget'],
  ];

  it.each(pages)('says what it says without: %s %s', async (...argv) => {
    const coloured = await couplet(argv, { terminal: true, colour: true });
    const bare = await couplet(argv, { terminal: true });
    expect(coloured.out).toContain(ESCAPE);
    expect(coloured.out.replaceAll(new RegExp(`${ESCAPE}\\[\\d+m`, 'g'), '')).toBe(bare.out);
    expect(bare.out.split('\n').filter((line) => line.length > 80)).toEqual([]);
  });
});

describe('a sheet in colour', () => {
  it('says what it says without', async () => {
    const files = {
      'p.yaml': `plant: P\nabout: A works.\ncells:\n  - { name: A, anode: [H2O -> O2(g)], cathode: [Cu^2+ -> Cu] }\n`,
    };
    const coloured = await couplet(['sheet', 'p.yaml'], { files, terminal: true, colour: true });
    const bare = await couplet(['sheet', 'p.yaml'], { files, terminal: true });
    expect(bare.out).toMatch(/^A works\.$/m);
    expect(coloured.out).toContain(ESCAPE);
    expect(coloured.out.replaceAll(new RegExp(`${ESCAPE}\\[\\d+m`, 'g'), '')).toBe(bare.out);
  });
});

describe('a page in Unicode', () => {
  it.each([
    [['species', 'SO4^2-'], 'charge      −2', 'O −2'],
    [['redox', 'Cl2 -> Cl^- + ClO3^-', '--medium', 'base'], '0 → −1', '3 Cl₂ + 6 OH⁻'],
    [['table', 'Cu^2+ -> Cu'], 'e⁻ per mole', 'mol e⁻/kg'],
    [['half', 'MnO4^- -> Mn^2+', '--medium', 'acid'], '(MnO₄⁻; GHS', 'Mn²⁺'],
    [
      ['amounts', '--half', 'Cu^2+ -> Cu', '--species', 'Cu', '--given', 'current=1 A', '--given', 'time=1 h'],
      'e⁻ per mole',
      'No efficiency is known: 100 % was taken.',
    ],
  ])('spells signs, electrons and what calls for a caution alike: %j', async (argv, ...said) => {
    const { out } = await couplet(argv, { terminal: true });
    for (const words of said) expect(out).toContain(words);
  });
});

describe('the version', () => {
  it('is that of package.json', async () => {
    const { version } = JSON.parse(readFileSync('package.json', 'utf8')) as { readonly version: string };
    expect((await couplet(['--version'])).out).toBe(`${version}\n`);
  });
});

describe('help', () => {
  it('of amounts names every quantity', async () => {
    const { out } = await couplet(['amounts', '--help']);
    const [, named = ''] = /\nQuantities of [^\n]*\n(.*?)\n {2}A standard/s.exec(out) ?? [];
    const words = new Set(named.replaceAll(/\([^)]*\)/g, '').match(/[a-z_]+/g));
    expect([...words].sort()).toEqual([...QUANTITY_NAMES].sort());
  });

  it.each(['', 'half', 'redox', 'cell', 'audit', 'amounts', 'species', 'equation', 'table', 'sheet', 'batch'])(
    'fits a terminal of 80 columns: %s',
    async (command) => {
      const { out } = await couplet([...(command === '' ? [] : [command]), '--help']);
      expect(out.split('\n').filter((line) => line.length > 80)).toEqual([]);
    },
  );

  const commands = ['half', 'redox', 'cell', 'audit', 'amounts', 'species', 'equation', 'table'];

  it.each(commands)('of %s shows for every option with a value how it is written', async (command) => {
    const { out } = await couplet([command, '--help']);
    const [, options = '', examples = ''] = /\nOptions:\n(.*)\nExamples:\n(.*)$/s.exec(out) ?? [];
    const valued = [...options.matchAll(/^ {2}(--[a-z-]+) </gm)].map(([, name]) => name ?? '');
    for (const name of valued) {
      const shown = options.split(/\n(?= {2}--)/).find((one) => one.trimStart().startsWith(`${name} `)) ?? '';
      const inWords = shown.trimStart().slice(name.length);
      expect(`${inWords}${examples}`.replaceAll(/\s+/g, ' '), name).toContain(`${name} `);
    }
  });
});
