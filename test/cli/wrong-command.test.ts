import { describe, expect, it } from 'vitest';
import { couplet } from './world.ts';

const ZINC = 'Zn -> Zn^2+ + 2 e^-';

describe('a command that cannot be what was meant', () => {
  it.each([
    [
      ['--anode', ZINC],
      ['--cathode', '--overall'],
    ],
    [['--anode', ZINC, '--overall', 'Zn -> Zn'], ['--cathode']],
    [
      ['--electrons', '2'],
      ['--anode', '--cathode', '--overall'],
    ],
  ])('names what a whole cell needs to be audited: %j', async (argv, named) => {
    const { code, out, err } = await couplet(['audit', ...argv]);
    expect([code, out]).toEqual([2, '']);
    for (const option of named) expect(err).toContain(option);
    for (const given of argv.filter((word) => word.startsWith('--'))) expect(err).not.toContain(given);
  });

  it.each([
    [['audit', 'H2 -> H2', '--column', 'equation'], '--column'],
    [['audit', 'H2 -> H2', '--format', 'csv'], '--format csv'],
    [['audit', 'H2 -> H2', '--format', 'markdown', '--json'], '--json'],
    [['audit', '--file', '-', '--format', 'csv', '--json'], '--json'],
    [['audit', '--file', '-', '--contributions'], '--contributions'],
    [['table', 'Cu^2+ -> Cu', '--format', 'csv', '--json'], '--json'],
  ])('is not silently passed over: %j', async (argv, named) => {
    const { code, out, err } = await couplet(argv, { input: 'H2 -> H2\n' });
    expect([code, out]).toEqual([2, '']);
    expect(err).toContain(named);
  });

  it.each([
    [['half', 'Cu^2+', '=', 'Cu']],
    [['half', 'Cu^2+', '-']],
    [['amounts', '--half', 'Cu^2+ -> Cu', '--species', 'Cu', '--given', 'current=2', 'A']],
    [['table', 'Cu^2+', '->', 'Cu']],
  ])('is told of the quotes that are missing: %j', async (argv) => {
    const { code, err } = await couplet(argv);
    expect(code).toBe(2);
    expect(err).toContain('in quotes: "Cu^2+ -> Cu", --given current="2 A"');
  });
});

describe('a hint', () => {
  it.each([
    [['half', 'LixCoO2 -> CoO2'], '--where x=0.4'],
    [['equation', 'x H2 -> H2'], '--where x=0.4'],
    [['half', 'Cu^2+ -> Cu', '--settle', 'it'], 'Leave --settle out.'],
    [['half', 'Cu^2+ -> Cu', '--medium', 'vinegar'], 'or give --helpers'],
    [['redox', 'Cu^2+ + 2 e^- -> Cu'], 'couplet half'],
    [['half', 'H^+ + OH^- -> H2'], '--medium acid, base or neutral'],
    [['amounts', '--half', 'Cu^2+ -> Cu', '--species', 'Cu', '--given', 'record=a.csv'], 'couplet record FILE'],
    [['cell', '--anode', 'Cu@95% -> Cu^2+', '--cathode', 'Ag^+ -> Ag'], '"Cu^2+ -> Cu @ 95 %"'],
    [['half', 'Cu^2+ -> Cu @ 95 %'], 'couplet cell and couplet amounts'],
  ])('speaks of options, not of JSON: %j', async (argv, said) => {
    const { code, err } = await couplet(argv);
    expect(code).toBe(1);
    expect(err.replace(/\s+/g, ' ')).toContain(said);
  });

  it('keeps the words of the contract with --json', async () => {
    expect((await couplet(['half', 'LixCoO2 -> CoO2', '--json'])).out).toContain('give it in where');
  });
});

describe('a share', () => {
  it.each(['Cu -> Cu^2+@95%', 'Cu -> Cu^2+ @95 %', 'Cu -> Cu^2+@ 0.95', 'Cu -> Cu^2+@19/20'])(
    'is read without its blanks: %s',
    async (anode) => {
      const argv = ['cell', '--anode', anode, '--anode', 'H2O -> O2', '--cathode', 'Ag^+ -> Ag', '--json'];
      // 95 of 100 electrons into 47.5 Cu, 5 into 1.25 O2: 38 to 1.
      expect(JSON.parse((await couplet(argv)).out)).toMatchObject({
        answer: { anode: [{ multiplier: '38' }, { multiplier: '1' }] },
      });
    },
  );
});

describe('help', () => {
  it.each([[['help']], [['-h']], [['--help']]])('is had by %j', async (argv) => {
    const { code, out, err } = await couplet(argv);
    expect([code, err]).toEqual([0, '']);
    expect(out).toContain('couplet COMMAND --help');
  });

  it.each([[['help', 'half']], [['half', '-h']]])('of a command is had by %j', async (argv) => {
    const { code, out } = await couplet(argv);
    expect(code).toBe(0);
    expect(out).toBe((await couplet(['half', '--help'])).out);
  });
});

describe('a fault in a terminal of 80 columns', () => {
  it.each([
    [['half', 'Cu^2+ -> Cu', '--medium', 'vinegar']],
    [['half', 'Cu^2+ -> Cu', '--per', 'a species that nobody has ever written down']],
    [['half', `Cu^2+ + ${'H2O + '.repeat(12)}Xx -> Cu`]],
    [['redox', 'MnO4^- + H2O2 -> Mn^2+ + O2', '--medium', 'acid']],
    [['audit', 'Cu(EDTA)^2- -> Cu', '--define', 'EDTA=C10H12N2O8^4-']],
    [['amounts', '--half', 'Cu^2+ -> Cu', '--species', 'Cu', '--given', 'time=6 fortnights']],
  ])('is not broken by it: %j', async (argv) => {
    const { code, err } = await couplet(argv);
    expect(code).toBe(1);
    expect(err.split('\n').filter((line) => line.length > 80)).toEqual([]);
    expect(err.split('\n').filter((line) => line !== line.trimEnd())).toEqual([]);
  });
});
