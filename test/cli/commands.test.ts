import { describe, expect, it } from 'vitest';
import { couplet } from './world.ts';

const ESCAPE = '\u001b';

describe('couplet half', () => {
  it('balances permanganate in acid', async () => {
    const { code, out, err } = await couplet(['half', 'MnO4^- -> Mn^2+', '--medium', 'acid']);
    expect(code).toBe(0);
    expect(out).toContain('MnO4^- + 8 H^+ + 5 e^- -> Mn^2+ + 4 H2O');
    expect(err).toBe('');
  });

  it('prints the answer of the contract on one line with --json', async () => {
    const { code, out } = await couplet(['half', 'MnO4^- -> Mn^2+', '--medium', 'acid', '--json']);
    expect(code).toBe(0);
    expect(out.trimEnd().split('\n')).toHaveLength(1);
    expect(JSON.parse(out)).toMatchObject({ contract: 1, ask: 'half', ok: true, answer: { electrons: '5' } });
  });

  it('takes a list of helpers, a subscript and a definition', async () => {
    const host = await couplet(['half', 'Li1-xCoO2 -> LiCoO2', '--helpers', 'Li^+', '--where', 'x=0.4', '--json']);
    expect(JSON.parse(host.out)).toMatchObject({
      answer: { reaction: { plain: '5 Li0.6CoO2 + 2 Li^+ + 2 e^- -> 5 LiCoO2' } },
    });
    const bath = ['half', 'Cu(EDTA)^2- -> Cu', '--helpers', 'EDTA^4-', '--define', 'EDTA^4-=C10H12N2O8^4-', '--json'];
    expect(JSON.parse((await couplet(bath)).out)).toMatchObject({ ok: true, answer: { electrons: '2' } });
  });

  it('shows Unicode on a terminal, and the canonical spelling there with --plain', async () => {
    const shown = await couplet(['half', 'Cu^2+ -> Cu'], { terminal: true });
    expect(shown.out).toContain('Cu²⁺ + 2 e⁻ → Cu');
    const plain = await couplet(['half', 'Cu^2+ -> Cu', '--plain'], { terminal: true });
    expect(plain.out).toContain('Cu^2+ + 2 e^- -> Cu');
  });

  it('colours only where colour is wanted', async () => {
    const argv = ['half', 'Cu^2+ -> Cu'];
    expect((await couplet(argv, { terminal: true, colour: true })).out).toContain(ESCAPE);
    expect((await couplet(argv, { terminal: true })).out).not.toContain(ESCAPE);
    expect((await couplet(argv)).out).not.toContain(ESCAPE);
  });
});

describe('a fault', () => {
  it('goes to standard error with its place, and the code is 1', async () => {
    const { code, out, err } = await couplet(['half', 'Fe^2+ + Xx -> Fe^3+']);
    expect(code).toBe(1);
    expect(out).toBe('');
    expect(err.split('\n').slice(0, 2)).toEqual(['skeleton:1:9', '  Fe^2+ + Xx -> Fe^3+']);
    expect(err.split('\n')[2]?.startsWith('          ^^ ')).toBe(true);
  });

  it('goes to standard output with --json', async () => {
    const { code, out, err } = await couplet(['half', 'Fe^2+ + Xx -> Fe^3+', '--json']);
    expect(code).toBe(1);
    expect(err).toBe('');
    expect(JSON.parse(out)).toMatchObject({ ok: false, fault: { code: 'unknown-element', field: 'skeleton' } });
  });

  it('points into the reaction of the electrode it stands in', async () => {
    const argv = ['cell', '--anode', 'Zn -> Zn^2+', '--cathode', 'Cu^2+ -> Cu', '--cathode', 'Ag^+ -> Agg @ 5 %'];
    const { err } = await couplet(argv);
    expect(err.split('\n').slice(0, 2)).toEqual(['cathode[1]:1:9', '  Ag^+ -> Agg']);
  });

  it('offers the ways to settle what conservation leaves open', async () => {
    const { code, err } = await couplet(['redox', 'MnO4^- + H2O2 -> Mn^2+ + O2', '--medium', 'acid']);
    expect(code).toBe(1);
    const settle = /--settle "([^"]*)"/.exec(err)?.[1] ?? '';
    expect(settle).not.toBe('');
    const settled = await couplet(['redox', 'MnO4^- + H2O2 -> Mn^2+ + O2', '--medium', 'acid', '--settle', settle]);
    expect(settled.code).toBe(0);
  });

  it('is told of an empty side, though the text begins like an option', async () => {
    const half = await couplet(['half', '-> Cu', '--json']);
    expect(half.code).toBe(1);
    expect(JSON.parse(half.out)).toMatchObject({ fault: { code: 'empty-side', field: 'skeleton' } });
    const cell = await couplet(['cell', '--anode', '-> Cu^2+', '--cathode', 'Ag^+ -> Ag', '--json']);
    expect(JSON.parse(cell.out)).toMatchObject({ fault: { code: 'empty-side', field: 'anode[0]' } });
  });

  it('never shows a stack trace', async () => {
    for (const text of ['', '^', '((((', '->', 'Fe ->', '\u0000', 'Fe^'.repeat(500), '('.repeat(3000)]) {
      const { err, out, code } = await couplet(['half', text]);
      expect(code).toBe(1);
      expect(out).toBe('');
      expect(err).not.toMatch(/ at .*:\d+:\d+|Error:|node:/);
    }
  });
});

describe('couplet cell', () => {
  it('composes two electrodes, the shares behind the reactions', async () => {
    const argv = [
      'cell',
      '--anode',
      'OH^- -> O2',
      '--cathode',
      'Zn(OH)4^2- -> Zn @ 92 %',
      '--cathode',
      'H2O -> H2 @ 8 %',
      '--medium',
      'base',
      '--json',
    ];
    const { out, code } = await couplet(argv);
    expect(code).toBe(0);
    // 100 electrons: 92 go into 46 Zn, 8 into 4 H2, 100 come from 25 O2.
    expect(JSON.parse(out)).toMatchObject({
      answer: { electrons: '100', cathode: [{ multiplier: '46' }, { multiplier: '4' }], anode: [{ multiplier: '25' }] },
    });
  });

  it('reads a diagram', async () => {
    const { out } = await couplet(['cell', '--diagram', 'Zn | Zn^2+ || Cu^2+ | Cu']);
    expect(out).toContain('Zn + Cu^2+ -> Zn^2+ + Cu');
  });

  it('wants both electrodes, and no diagram beside them', async () => {
    const alone = await couplet(['cell', '--anode', 'Zn -> Zn^2+']);
    expect(alone.code).toBe(2);
    expect(alone.err).toContain('--cathode');
    const both = await couplet(['cell', '--anode', 'Zn -> Zn^2+', '--diagram', 'Zn | Zn^2+ || Cu^2+ | Cu']);
    expect(both.code).toBe(2);
  });
});

describe('couplet amounts', () => {
  it('takes what is given and wanted', async () => {
    const argv = ['amounts', '--half', 'Cu^2+ + 2 e^- -> Cu', '--species', 'Cu', '--json'];
    const { out } = await couplet([...argv, '--given', 'current=250 A', '--given', 'time=1 h', '--want', 'mass=kg']);
    const given: unknown = JSON.parse(out);
    // 250 A h times 63.546 / (2 * 96485.33212 C/mol) * 3600 s/h = 296.37 g
    expect(given).toMatchObject({ answer: { quantities: { mass: { unit: 'kg' } }, electronsPerMole: { Cu: '2' } } });
    expect(out).toMatch(/"mass":\{"value":0\.29637/);
  });

  it('takes reactions in parallel and a cell', async () => {
    const parallel = ['amounts', '--half', 'Zn^2+ -> Zn @ 90 %', '--half', 'H^+ -> H2', '--species', 'Zn'];
    expect((await couplet([...parallel, '--given', 'charge=1 A h'])).code).toBe(0);
    const cell = ['amounts', '--anode', 'H2O -> O2', '--cathode', 'Cu^2+ -> Cu', '--species', 'O2'];
    expect((await couplet([...cell, '--given', 'charge=1 A h'])).out).toContain('4 mol of electrons per mole');
  });

  it('is a wrong command without a reaction, without a species, or with a quantity given twice', async () => {
    expect((await couplet(['amounts', '--species', 'Cu'])).code).toBe(2);
    expect((await couplet(['amounts', '--half', 'Cu^2+ -> Cu'])).code).toBe(2);
    const twice = ['amounts', '--half', 'Cu^2+ -> Cu', '--species', 'Cu', '--given', 'time=1 s', '--given', 'time=2 s'];
    expect((await couplet(twice)).code).toBe(2);
  });
});

describe('couplet audit', () => {
  it('gives 0 for balanced, 0 for not in lowest terms, 1 for unbalanced', async () => {
    expect((await couplet(['audit', '2 H2 + O2 -> 2 H2O'])).code).toBe(0);
    expect((await couplet(['audit', '4 H2 + 2 O2 -> 4 H2O'])).code).toBe(0);
    const { code, out } = await couplet(['audit', 'H2 + O2 -> H2O']);
    expect(code).toBe(1);
    expect(out).toContain('not balanced');
    expect(out).toContain('2 H2 + O2 -> 2 H2O');
  });

  it('audits a whole cell', async () => {
    const argv = ['audit', '--anode', 'Zn -> Zn^2+ + 2 e^-', '--cathode', 'Ag^+ + e^- -> Ag'];
    const right = await couplet([...argv, '--overall', 'Zn + 2 Ag^+ -> Zn^2+ + 2 Ag', '--electrons', '2']);
    expect(right.code).toBe(0);
    const wrong = await couplet([...argv, '--overall', 'Zn + 2 Ag^+ -> Zn^2+ + 2 Ag', '--electrons', '1']);
    expect(wrong.code).toBe(1);
    expect(wrong.out).toContain('electrons');
  });

  it('wants exactly one thing to audit', async () => {
    expect((await couplet(['audit'])).code).toBe(2);
    expect((await couplet(['audit', 'H2 -> H2', '--file', '-'])).code).toBe(2);
  });
});

describe('couplet species and equation', () => {
  it('show what was read', async () => {
    const { out } = await couplet(['species', 'CuSO4*5H2O']);
    expect(out).toContain('O 9');
    expect((await couplet(['equation', '2H2+O2=2H2O'])).out).toContain('H2O');
  });

  it('refuse an ambiguous spelling with --strict and name the readings', async () => {
    const { code, err } = await couplet(['species', 'Fe3+', '--strict']);
    expect(code).toBe(1);
    expect(err).toContain('Fe^3+');
    expect(err).toContain('Fe3^+');
  });
});

describe('a wrong command', () => {
  it.each([
    [['hafl', 'Cu^2+ -> Cu']],
    [['half']],
    [['half', 'Cu^2+ -> Cu', 'too much']],
    [['half', 'Cu^2+ -> Cu', '--colour']],
    [['half', 'Cu^2+ -> Cu', '--medium', 'acid', '--helpers', 'H2O']],
    [['half', 'CuxS -> Cu', '--where', 'x']],
    [['audit', '--file', '-', '--format', 'pdf']],
    [['sheet', 'nowhere.yaml']],
    [['batch', 'nowhere.ndjson']],
    [[]],
  ])('gives 2 and prints nothing on standard output: %j', async (argv) => {
    const { code, out, err } = await couplet(argv);
    expect(code).toBe(2);
    expect(out).toBe('');
    expect(err).not.toBe('');
  });

  it('is told what was meant', async () => {
    expect((await couplet(['hafl', 'x'])).err).toContain('half');
  });
});

describe('help', () => {
  it.each(['half', 'redox', 'cell', 'audit', 'amounts', 'species', 'equation', 'sheet', 'batch'])(
    'of %s has examples and ends with 0',
    async (command) => {
      const { code, out } = await couplet([command, '--help']);
      expect(code).toBe(0);
      expect(out).toContain('Examples:');
      expect(out).toContain(`couplet ${command}`);
      expect(out.split('\n').every((line) => line.length <= 110)).toBe(true);
    },
  );

  it('of the whole names every command', async () => {
    const { code, out } = await couplet(['--help']);
    expect(code).toBe(0);
    for (const command of ['half', 'redox', 'cell', 'audit', 'amounts', 'sheet', 'batch'])
      expect(out).toContain(command);
  });
});

describe('couplet batch', () => {
  it('answers standard input and files, and gives 0 though lines fault', async () => {
    const input = '{"ask": "half", "skeleton": "Cu^2+ -> Cu", "id": "1"}\nnonsense\n';
    const { code, out } = await couplet(['batch'], { input });
    expect(code).toBe(0);
    const lines = out
      .trimEnd()
      .split('\n')
      .map((line): unknown => JSON.parse(line));
    expect(lines).toMatchObject([
      { id: '1', ok: true },
      { ask: null, ok: false },
    ]);
    expect((await couplet(['batch', 'asks.ndjson'], { files: { 'asks.ndjson': input } })).out).toBe(out);
  });
});
