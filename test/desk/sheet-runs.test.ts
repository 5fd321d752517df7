import { describe, expect, it } from 'vitest';
import { openRecord } from '../../src/amounts/record/reader.ts';
import { readClock, clockText, minutesBetween, type Clock } from '../../src/desk/sheet/clock.ts';
import { readGoal } from '../../src/desk/sheet/goal.ts';
import type { SheetAnswer, WholeRun, WholeTank, WholeTarget } from '../../src/desk/sheet/answer.ts';
import { namedRecord, type Records } from '../../src/desk/sheet/record.ts';
import { answerReadSheet, answerSheet, readSheet } from '../../src/desk/sheet/sheet.ts';

const FARADAY = 96_485.33212;
const COPPER = 63.546;

const tankText = (rest: string): string => `plant: P
cells:
  - name: A
    medium: acid
    anode: [H2O -> O2(g)]
    cathode: [Cu^2+ -> Cu]
${rest}`;

const sheetOf = (text: string, records: Records = new Map()): SheetAnswer => {
  const read = readSheet(text);
  if (!read.ok) throw new Error(read.fault.message);
  return answerReadSheet(read.value, records);
};

const tankOf = (text: string, records?: Records): WholeTank => {
  const [tank] = sheetOf(text, records).tanks;
  if (tank === undefined || 'fault' in tank) throw new Error('the tank was not answered');
  return tank;
};

const runOf = (tank: WholeTank, at = 0): WholeRun => {
  const run = tank.runs[at];
  if (run === undefined || 'fault' in run) throw new Error(`run ${String(at)} was not answered`);
  return run;
};

const goalOf = (tank: WholeTank, at = 0): WholeTarget => {
  const target = tank.targets[at];
  if (target === undefined || 'fault' in target) throw new Error(`goal ${String(at)} was not answered`);
  return target;
};

const clock = (text: string): Clock => {
  const read = readClock(text);
  if (read === undefined) throw new Error(text);
  return read;
};

describe('a clock', () => {
  it.each([
    ['08:00', '16:00', 480],
    ['8:05', '08:00', 1435],
    ['22:00', '02:30', 270],
    ['08:00', '08:00', 1440],
    ['2026-05-04 08:00', '2026-05-06 07:00', 2820],
    ['2026-05-04 08:00', '2026-05-04 07:00', -60],
    ['2026-02-28 23:00', '01:00', 120],
  ])('counts from %s to %s: %i min', (start, end, minutes) => {
    expect(minutesBetween(clock(start), clock(end))).toBe(minutes);
  });

  it.each(['24:00', '12:60', '16', '16:0', 'noon', '2026-02-30 10:00', '2026-13-01 10:00', ''])(
    'refuses %j',
    (text) => {
      expect(readClock(text)).toBeUndefined();
    },
  );

  it.each([
    ['08:00', 312, '13:12'],
    ['08:00', 312.4, '13:13'],
    ['22:00', 270, '02:30, 1 day later'],
    ['08:00', 3 * 1440 + 5, '08:05, 3 days later'],
    ['02:00', -180, '23:00, 1 day before'],
    ['2026-12-31 23:30', 45, '2027-01-01 00:15'],
  ])('shows what is %s and %d min as %s', (start, minutes, shown) => {
    expect(clockText(clock(start), minutes)).toBe(shown);
  });
});

describe('a goal', () => {
  it.each([
    ['2 kg by 16:00', 'mass', '2 kg', null, '16:00'],
    ['12 µm', 'thickness', '12 µm', null, null],
    ['40 L of H2 by 2026-05-04 16:00', 'volume', '40 L', 'H2', '2026-05-04 16:00'],
    ['3 mol of Cu', 'amount', '3 mol', 'Cu', null],
    ['900 A h by 9:30', 'charge', '900 A h', null, '9:30'],
  ])('is read: %s', (text, quantity, amount, species, by) => {
    const read = readGoal(text);
    if (!read.ok) throw new Error(read.fault.message);
    expect(read.value).toMatchObject({ quantity, text: amount, species });
    expect(read.value.by?.text ?? null).toBe(by);
  });

  it.each([
    ['soon', { from: 0, to: 4 }],
    ['2 kg by noon', { from: 8, to: 12 }],
    ['2 zz by 16:00', { from: 0, to: 4 }],
  ])('is refused with its place: %s', (text, span) => {
    const read = readGoal(text);
    if (read.ok) throw new Error('it was read');
    expect(read.fault).toMatchObject({ code: 'bad-ask', field: 'goal', span });
  });
});

describe('the goals of a tank', () => {
  it('need the time that Faraday gives, and are reached or missed', () => {
    const tank = tankOf(
      tankText(`    targets:
      - { goal: 2 kg by 16:00, start: 08:00, current: 250 A, efficiency: 93 % }
      - { goal: 2 kg by 15:00, start: 08:00, current: 250 A, efficiency: 93 % }
`),
    );
    // t = m z F / (M η I)
    const hours = (2000 * 2 * FARADAY) / (COPPER * 0.93 * 250) / 3600;
    const first = goalOf(tank);
    expect(first.needed?.value).toBeCloseTo(hours, 6);
    expect(first).toMatchObject({ reached: true, ready: '15:16', latest: null, assumed: false });
    expect(first.spare?.value).toBeCloseTo(8 - hours, 6);
    expect(first.enough?.value).toBeCloseTo((250 * hours) / 8, 6);
    const second = goalOf(tank, 1);
    expect(second.reached).toBe(false);
    expect(second.spare?.value).toBeCloseTo(7 - hours, 6);
    expect(second.enough?.value).toBeCloseTo((250 * hours) / 7, 6);
  });

  it('tell the latest start, and the current alone, where the rest is left out', () => {
    const tank = tankOf(
      tankText(`    targets:
      - { goal: 1 kg by 09:00, current: 250 A }
      - { goal: 1 kg by 09:00, start: 07:00 }
      - { goal: 1 kg, current: 250 A }
`),
    );
    // 1 kg at 250 A takes 3.374 h = 202.4 min: 09:00 less 203 min is 05:37.
    expect(goalOf(tank)).toMatchObject({ latest: '05:37', reached: null, assumed: true });
    expect(goalOf(tank, 1)).toMatchObject({ needed: null, current: null, reached: null });
    expect(goalOf(tank, 1).enough?.value).toBeCloseTo((1000 * 2 * FARADAY) / COPPER / 7200, 5);
    expect(goalOf(tank, 2).needed?.value).toBeCloseTo((1000 * 2 * FARADAY) / COPPER / 250 / 3600, 6);
  });

  it('of a thickness take area and density', () => {
    const tank = tankOf(
      tankText(
        '    targets: [{ goal: 20 µm, current: 100 A, area: 50 dm^2, density: 8.96 g/cm^3, efficiency: 95 % }]\n',
      ),
    );
    // 20e-4 cm * 5000 cm^2 * 8.96 g/cm^3 = 89.6 g
    expect(goalOf(tank).needed?.value).toBeCloseTo((89.6 * 2 * FARADAY) / (COPPER * 0.95 * 100) / 3600, 6);
  });

  it.each([
    ['{ goal: 1 kg }', 'not-enough-given', 'goal'],
    ['{ goal: 1 kg of Ag, current: 2 A }', 'bad-ask', 'product'],
    ['{ goal: 1 kg by 2026-05-04 08:00, start: 2026-05-04 09:00, current: 2 A }', 'contradiction', 'goal'],
    ['{ goal: 1 kg, start: late, current: 2 A }', 'bad-ask', 'start'],
    ['{ goal: 1 kg, current: 2 Q }', 'unknown-unit', 'current'],
    ['{ gaol: 1 kg }', 'bad-ask', 'gaol'],
  ])('that fault have a place and lose nothing else: %s', (goal, code, field) => {
    const tank = tankOf(tankText(`    targets: [${goal}, { goal: 1 kg, current: 250 A }]\n`));
    expect(tank.targets[0]).toMatchObject({ fault: { code, field: `cells[0].targets[0].${field}` } });
    expect(goalOf(tank, 1).needed).not.toBeNull();
  });
});

describe('weighed runs', () => {
  const runs = (...lines: readonly string[]): WholeTank =>
    tankOf(tankText(`    runs:\n${lines.map((line) => `      - ${line}\n`).join('')}`));

  it('give the current efficiency with its uncertainty and what it is made of', () => {
    const tank = runs('{ label: a, current: 250.0(8) A, time: 7 h 30 min, weighed: 2.060(4) kg }');
    // η = m z F / (M I t); u(η)/η = sqrt((4/2060)^2 + (0.8/250)^2), the atomic weight aside
    const value = (2060 * 2 * FARADAY) / (COPPER * 250 * 27_000);
    const relative = Math.hypot(4 / 2060, 0.8 / 250);
    const { weighed } = runOf(tank);
    expect(weighed?.efficiency.value).toBeCloseTo(value * 100, 8);
    expect(weighed?.efficiency.uncertainty).toBeCloseTo(value * relative * 100, 3);
    expect(weighed?.budget.map(({ input }) => input)).toEqual(['current', 'weighed', 'atomic weight of Cu']);
    expect(weighed?.budget[0]?.part).toBeCloseTo((0.8 / 250 / relative) ** 2, 3);
    expect(weighed?.budget.reduce((sum, { part }) => sum + part, 0)).toBeCloseTo(1, 10);
  });

  it('give the efficiency of the tank: all mass over all that the charge could make', () => {
    const tank = runs(
      '{ label: a, charge: 1000(2) A h, weighed: 1.100(3) kg }',
      '{ label: b, charge: 3000(9) A h, weighed: 3.350(3) kg }',
    );
    const value = (4450 * 2 * FARADAY) / (COPPER * 4000 * 3600);
    expect(tank.weighed?.runs).toBe(2);
    expect(tank.weighed?.efficiency.value).toBeCloseTo(value * 100, 8);
    // η = M / (k Q): u(η)/η = sqrt((u1² + u2²) / M² + (uQ1² + uQ2²) / Q²), the atomic weight aside
    const relative = Math.hypot(Math.hypot(3, 3) / 4450, Math.hypot(2, 9) / 4000);
    expect(tank.weighed?.efficiency.uncertainty).toBeCloseTo(value * relative * 100, 3);
  });

  it('state no uncertainty where the sheet states none: the atomic weights say nothing of a balance', () => {
    const { weighed } = runOf(runs('{ label: a, charge: 1000 A h, weighed: 1.1 kg }'));
    expect(weighed?.efficiency.uncertainty).toBeUndefined();
    expect(weighed?.budget).toEqual([]);
  });

  const good = (label: string, kilograms: string): string =>
    `{ label: ${label}, charge: 1000(2) A h, weighed: ${kilograms}(3) kg }`;

  it('let a planted weighing error stand out, and no other run', () => {
    const tank = runs(good('a', '1.100'), good('b', '1.103'), good('c', '1.160'), good('d', '1.098'));
    const verdicts = tank.runs.map((run) => ('fault' in run ? null : (run.weighed?.standsOut ?? null)));
    expect(verdicts.map((verdict) => verdict !== null)).toEqual([false, false, true, false]);
    expect(verdicts[2]).toContain('above the mean');
    const value = ((1100 + 1103 + 1098) * 2 * FARADAY) / (COPPER * 3000 * 3600);
    expect(tank.weighed?.without?.efficiency.value).toBeCloseTo(value * 100, 8);
  });

  it('find it by scatter where no uncertainty is stated, once four runs were weighed', () => {
    const bare = (label: string, kilograms: string): string =>
      `{ label: ${label}, charge: 1000 A h, weighed: ${kilograms} kg }`;
    const of = (...masses: readonly string[]): readonly boolean[] =>
      runs(...masses.map((mass, at) => bare(`r${String(at)}`, mass))).runs.map(
        (run) => !('fault' in run) && run.weighed?.standsOut !== null,
      );
    expect(of('1.100', '1.103', '1.030', '1.098')).toEqual([false, false, true, false]);
    expect(of('1.100', '1.103', '1.030')).toEqual([false, false, false]);
    expect(of('1.100', '1.103', '1.101', '1.098')).toEqual([false, false, false, false]);
  });

  it('name both of two that disagree, and neither of two that agree', () => {
    const outOf = (...masses: readonly string[]): readonly boolean[] =>
      runs(...masses.map((mass, at) => good(`r${String(at)}`, mass))).runs.map(
        (run) => !('fault' in run) && run.weighed?.standsOut !== null,
      );
    expect(outOf('1.100', '1.140')).toEqual([true, true]);
    expect(outOf('1.100', '1.104')).toEqual([false, false]);
  });

  it('stand out over 100 % even alone', () => {
    const { weighed } = runOf(runs('{ label: a, charge: 1000 A h, weighed: 1.2 kg }'));
    expect(weighed?.standsOut).toContain('over 100 %');
  });

  it('of another product are not held against those of the tank', () => {
    const tank = runs(good('a', '1.100'), '{ label: b, product: O2, charge: 1000(2) A h, weighed: 0.200(1) kg }');
    expect(tank.weighed?.runs).toBe(1);
    expect(runOf(tank, 1).weighed?.standsOut).toBeNull();
  });
});

describe('the records of runs', () => {
  const LOG = 'time (min);current (A)\n0;100,0\n30;100,0\n60;-20,0\n';

  const records = (...texts: readonly (readonly [key: string, text: string])[]): Records =>
    new Map(
      texts.map(([key, text]) => {
        const opened = openRecord();
        if (!opened.ok) return [key, opened];
        opened.value.take(text);
        return [key, opened.value.end()];
      }),
    );

  it('are named once each, whatever tank or run names them', () => {
    const read = readSheet(
      `${tankText(`    runs:
      - { label: a, record: x.csv }
      - { label: b, record: x.csv }
      - { label: c, record: { file: x.csv, decimal: comma } }
      - { label: d, record: { fil: x.csv } }
`)}  - { name: B, anode: [], cathode: [], runs: [{ record: y.csv }] }\n`,
    );
    if (!read.ok) throw new Error('not read');
    expect(read.value.records.map(({ path, options }) => [path, options.decimal])).toEqual([
      ['x.csv', undefined],
      ['x.csv', 'comma'],
      ['y.csv', undefined],
    ]);
  });

  it('give the charge net of reversals, both directions, and the mass that follows', () => {
    const tank = tankOf(
      tankText('    runs: [{ label: a, record: x.csv, efficiency: 95 % }]\n'),
      records(['x.csv', LOG]),
    );
    const run = runOf(tank);
    // 50 A h, then 100 to -20 A in half an hour: 25 min forward at 50 A on average, 5 min back at 10 A.
    const forward = 50 + (50 * 25) / 60;
    const reverse = (10 * 5) / 60;
    expect(run.amounts.answer.quantities['charge']?.value).toBeCloseTo(forward - reverse, 8);
    expect(run.record?.reversed?.forward.value).toBeCloseTo(forward, 8);
    expect(run.record?.reversed?.reverse.value).toBeCloseTo(-reverse, 8);
    const mass = ((forward - reverse) * 3600 * 0.95 * COPPER) / (2 * FARADAY) / 1000;
    expect(run.amounts.answer.quantities['mass']?.value).toBeCloseTo(mass, 6);
    expect(run.record?.remarks.join(' ')).toContain('reversed');
  });

  it('carry the uncertainty of the meter into the efficiency', () => {
    const tank = tankOf(
      tankText('    runs: [{ label: a, record: { file: x.csv, meter: 1 % }, weighed: 70.0 g }]\n'),
      records([namedRecord({ file: 'x.csv', meter: '1 %' }).key, LOG]),
    );
    const { weighed } = runOf(tank);
    expect(weighed?.budget[0]).toMatchObject({ input: 'record' });
    expect((weighed?.efficiency.uncertainty ?? 0) / (weighed?.efficiency.value ?? 1)).toBeCloseTo(0.01, 4);
  });

  it.each([
    ['was not read', '{ label: a, record: nowhere.csv }', 'bad-ask', 'record'],
    ['has no columns', '{ label: a, record: bad.csv }', 'unknown-unit', 'record'],
    ['stands beside a current', '{ label: a, record: x.csv, current: 2 A }', 'contradiction', 'current'],
  ])('fault for their run only: one that %s', (_, run, code, field) => {
    const tank = tankOf(
      tankText(`    runs: [${run}, { label: b, record: x.csv }]\n`),
      records(['x.csv', LOG], ['bad.csv', 'foo,bar\n1,2\n']),
    );
    expect(tank.runs[0]).toMatchObject({ fault: { code, field: `cells[0].runs[0].${field}` } });
    expect(runOf(tank, 1).record?.rows).toBe(3);
  });

  it('are told by line where rows were left out', () => {
    const log = 'time (s),current (A)\n0,10\n10,abc\n20,10\n20,12\n15,3\n30,12\n';
    const remarks = runOf(tankOf(tankText('    runs: [{ label: a, record: x.csv }]\n'), records(['x.csv', log]))).record
      ?.remarks;
    expect(remarks).toContain('1 row left out with something that is no number: line 3');
    expect(remarks).toContain('1 row left out with a time before the one above: line 6');
    expect(remarks).toContain('1 row at the time of the one above, taken as a step: line 5');
  });

  it('make a run fault where the sheet is answered without them', () => {
    const answered = answerSheet(tankText('    runs: [{ label: a, record: x.csv }]\n'));
    if (!answered.ok) throw new Error('not answered');
    const [tank] = answered.value.tanks;
    expect(tank).toMatchObject({ runs: [{ name: 'a', fault: { field: 'cells[0].runs[0].record' } }] });
  });
});

describe('sums', () => {
  it('add the runs of a tank, and of the plant, and count those without a voltage', () => {
    const sheet = sheetOf(
      `${tankText('    runs: [{ label: a, charge: 1000 A h, voltage: 2 V }, { label: b, charge: 500 A h }]\n')}  - name: B
    medium: acid
    anode: [H2O -> O2(g)]
    cathode: [Ag^+ -> Ag]
    runs: [{ label: c, charge: 100 A h, voltage: 3 V, temperature: 25 °C, pressure: 1 bar }]
`,
    );
    expect(sheet.totals.runs).toBe(3);
    expect(sheet.totals.charge.value).toBeCloseTo(1600, 9);
    expect(sheet.totals.energy?.value).toBeCloseTo(2.3, 9);
    expect(sheet.totals.withoutVoltage).toBe(1);
    const copper = (1500 * 3600 * COPPER) / (2 * FARADAY) / 1000;
    const totals = new Map(sheet.totals.products.map((one) => [one.species, one]));
    expect(totals.get('Cu')?.mass?.value).toBeCloseTo(copper, 6);
    expect(totals.get('O2')?.amount?.value).toBeCloseTo((1600 * 3600) / (4 * FARADAY), 6);
    // Tank A states no conditions: its oxygen has no volume, and half a sum would mislead.
    expect(totals.get('O2')?.volume).toBeUndefined();
  });
});

describe('a tank that is run for water', () => {
  it('counts it among its products', () => {
    const [tank] = sheetOf(
      'plant: P\ncells:\n  - { name: F, mode: galvanic, medium: acid, product: H2O, anode: [H2(g) -> H^+], cathode: [O2(g) -> H2O], runs: [{ label: a, charge: 100 A h }] }\n',
    ).tanks;
    if (tank === undefined || 'fault' in tank) throw new Error('not answered');
    // 100 A h * 3600 s/h / (2 F) * 18.015 g/mol
    expect(tank.totals.products.map(({ species }) => species)).toEqual(['H2O']);
    expect(tank.totals.products[0]?.mass?.value).toBeCloseTo(((360_000 / (2 * FARADAY)) * 18.015) / 1000, 6);
  });
});

describe('where the current went', () => {
  it('follows the shares of the reactions, and the efficiency of the product', () => {
    const tank = tankOf(
      tankText(
        '    runs: [{ label: a, charge: 100 A h, efficiency: 90 % }, { label: b, charge: 300 A h, efficiency: 94 % }]\n',
      ),
    );
    expect(tank.currentUse.measured).toBe('cathode');
    expect(tank.currentUse.anode).toEqual([{ species: 'O2', share: 1 }]);
    const [copper, rest] = tank.currentUse.cathode;
    expect(copper?.species).toBe('Cu');
    expect(copper?.share).toBeCloseTo(0.93, 12);
    expect(rest?.species).toBeNull();
    expect(rest?.share).toBeCloseTo(0.07, 12);
  });

  it('is as the reactions are written where no run says more', () => {
    const [tank] = sheetOf(
      'plant: P\ncells:\n  - { name: B, medium: base, anode: [OH^- -> O2], cathode: [{ skeleton: Zn(OH)4^2- -> Zn, share: 92 % }, H2O -> H2] }\n',
    ).tanks;
    if (tank === undefined || 'fault' in tank) throw new Error('not answered');
    expect(tank.currentUse.measured).toBeNull();
    const shares = tank.currentUse.cathode.map(({ species, share }) => [species, Math.round(share * 1e9) / 1e9]);
    expect(shares).toEqual([
      ['Zn', 0.92],
      ['H2', 0.08],
    ]);
  });
});

describe('gas', () => {
  it('is rated at the fastest run, with the air that dilutes hydrogen', () => {
    const [tank] = sheetOf(
      'plant: P\ncells:\n  - { name: B, medium: base, anode: [OH^- -> O2(g)], cathode: [H2O -> H2(g)], runs: [{ label: slow, current: 100 A, time: 1 h }, { label: fast, current: 400 A, time: 2 h }] }\n',
    ).tanks;
    if (tank === undefined || 'fault' in tank) throw new Error('not answered');
    // 400 A / (2 F) * R * 298.15 K / 101325 Pa, in L/min; air 99 times as much, in m³/h
    const litres = ((400 / (2 * FARADAY)) * 8.314462618 * 298.15 * 1000 * 60) / 101_325;
    const hydrogen = tank.gas.find(({ species }) => species === 'H2');
    expect(hydrogen).toMatchObject({ run: 'fast' });
    expect(hydrogen?.rate.value).toBeCloseTo(litres, 6);
    expect(hydrogen?.air?.value).toBeCloseTo(litres * 99 * 0.06, 6);
    expect(tank.gas.find(({ species }) => species === 'O2')?.rate.value).toBeCloseTo(litres / 2, 6);
  });
});
