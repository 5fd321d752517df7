import { describe, expect, it } from 'vitest';
import { couplet } from './world.ts';

const COPPER = ['amounts', '--half', 'Cu^2+ + 2 e^- -> Cu', '--species', 'Cu'];

describe('couplet amounts', () => {
  it('shows by which relation each quantity follows', async () => {
    const { out } = await couplet([...COPPER, '--given', 'current=2 A', '--given', 'time=1 h']);
    expect(out).toMatch(/^ {2}charge .* C +Q = I t$/m);
    expect(out).toMatch(/^ {2}current +2 +A$/m);
    expect(out).toMatch(/^ {2}mass .* g +m = n M$/m);
  });

  it('takes a stack', async () => {
    const stack = ['--given', 'charge=96485.33212 C', '--cells', '4', '--bypass', '50 %', '--json'];
    expect((await couplet([...COPPER, ...stack])).out).toMatch(/"amount":\{"value":(1|0\.99999|1\.00000)\d*,/);
  });

  it('shows the budget of what is uncertain', async () => {
    const uncertain = ['--given', 'current=2.00 A ± 0.02 A', '--given', 'time=100 s ± 2 s', '--budget'];
    const { out } = await couplet([...COPPER, ...uncertain]);
    expect(out).toContain('budget           parts of the variance');
    // 0.02^2 / (0.01^2 + 0.02^2)
    expect(out).toMatch(/^ {2}charge +time 80\.0 %, current 20\.0 %$/m);
    const joined = await couplet([...COPPER, ...uncertain, '--correlation', 'current,time=1', '--json']);
    // 1 % + 2 % of 200 C
    expect(joined.out).toMatch(/"charge":\{"value":200,"unit":"C","uncertainty":(6|5\.99999|6\.00000)\d*\}/);
    expect((await couplet([...COPPER, '--correlation', 'current=1'])).code).toBe(2);
  });

  it('shows the balance of the tank', async () => {
    const cell = ['amounts', '--anode', 'H2O -> O2', '--cathode', 'Cu^2+ -> Cu', '--species', 'Cu', '--tank'];
    const { out } = await couplet([...cell, '--given', 'charge=96485.33212 C']);
    expect(out).toMatch(/^ {2}tank {8}\+1 mol of H\^\+$/m);
    expect(out).toMatch(/^ {14}-0\.5 mol of water\n {14}that is -9\.007\d+ .* g, -0\.00903\d+ .* L at 25 °C$/m);
    const long = await couplet([...cell, '--given', 'charge=1 kA h'], { terminal: true });
    expect(long.out).toMatch(/^ {14}−18\.6\d+ mol of water\n {14}that is −336\./m);
    expect(long.out.split('\n').filter((line) => line.length > 80)).toEqual([]);
  });

  it('takes cells in series, a coulometer among them', async () => {
    const { out } = await couplet([...COPPER, '--series', 'Ag: Ag^+ + e^- -> Ag; mass=107.87 g']);
    expect(out).toMatch(/^ {2}amount +0\.50000\d* .* mol/m);
    expect(out).toMatch(/^ {2}in series .*\n {2}Ag +1 /m);
    const wrong = await couplet([...COPPER, '--series', 'Ag^+ -> Ag']);
    expect(wrong.code).toBe(2);
    expect(wrong.err).toContain('SPECIES: HALF');
  });

  it('fits a terminal of 80 columns', async () => {
    const given = ['--given', 'current=2.00 A ± 0.02 A', '--given', 'time=100 s ± 2 s'];
    const { out } = await couplet([...COPPER, ...given, '--budget', '--tank', '--series', 'Ag: Ag^+ + e^- -> Ag']);
    const cell = ['amounts', '--anode', 'Cl^- -> Cl2(g)', '--cathode', 'H2O -> H2(g)', '--species', 'Cl2'];
    const gas = ['--medium', 'neutral', '--given', 'charge=1.000(1) kA h', '--given', 'temperature=25 °C'];
    const gases = await couplet([...cell, ...gas, '--given', 'pressure=1 bar']);
    expect(gases.out).toMatch(/^ {2}same charge .* volume$/m);
    expect(`${out}${gases.out}`.split('\n').filter((line) => line.length > 80)).toEqual([]);
  });
});

describe('couplet table', () => {
  const HALVES = ['Cu^2+ + 2 e^- -> Cu', 'H2: 2 H2O + 2 e^- -> H2(g) + 2 OH^-'];

  it('shows what each product takes, its half-reaction above it', async () => {
    const { out, code } = await couplet(['table', ...HALVES]);
    expect(code).toBe(0);
    expect(out).toMatch(
      /^ {2}Cu\^2\+ \+ 2 e\^- -> Cu\n {4}Cu +2 +31\.473\d+\(\d+\) +1\.185494\(32\) +843\.530\(23\)$/m,
    );
    // 60 C over 2 F, times 22.414 L/mol; OH^- was not asked for.
    expect(out).toMatch(/^ {4}H2 .* 6\.969\d+$/m);
    expect(out).not.toMatch(/^ {4}OH/m);
    expect(out).toContain('mL/(A min): ideal dry gas at 0 °C and 101.325 kPa');
  });

  it('is Markdown or CSV for other programs, the cautions on standard error', async () => {
    const markdown = await couplet([
      'table',
      '2 Cl^- -> Cl2(g) + 2 e^-',
      '--format',
      'markdown',
      '--temperature',
      '25 °C',
    ]);
    expect(markdown.out.split('\n')[0]).toContain('at 25 °C, 101.325 kPa');
    expect(markdown.err.startsWith('  danger ')).toBe(true);
    const csv = await couplet(['table', ...HALVES, '--format', 'csv']);
    expect(csv.out.split('\r\n')).toHaveLength(4);
  });

  it('reads a file, balances skeletons, and loses nothing by a line at fault', async () => {
    const files = { 'baths.txt': '# copper and zinc\nCu: Cu^2+ -> Cu\nXx -> Y\n\nZn(OH)4^2- -> Zn\n' };
    const { out, err, code } = await couplet(['table', '--file', 'baths.txt', '--medium', 'base'], { files });
    expect(code).toBe(1);
    expect(out).toContain('Zn(OH)4^2- + 2 e^- -> Zn + 4 OH^-');
    expect(err.split('\n').slice(0, 2)).toEqual(['half:1:1', '  Xx -> Y']);
    const json = await couplet(['table', '--file', 'baths.txt', '--medium', 'base', '--json'], { files });
    expect(JSON.parse(json.out)).toMatchObject({
      contract: 1,
      ok: true,
      table: [{ species: 'Cu', rows: [{ electronsPerMole: '2' }] }, { fault: { code: 'unknown-element' } }, {}],
    });
  });

  it('refuses conditions that are none, a species without a part, and nothing at all', async () => {
    const bad = await couplet(['table', ...HALVES, '--temperature', '25 parsec']);
    expect(bad.code).toBe(1);
    expect(bad.err).toContain('temperature:1:4');
    expect((await couplet(['table', 'Zn: Cu^2+ -> Cu'])).err).toContain('species:1:1');
    expect((await couplet(['table'])).code).toBe(2);
  });
});
