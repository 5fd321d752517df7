import { describe, expect, it } from 'vitest';
import { printNumber, printQuantity } from '../../src/amounts/print.ts';
import { wallTable } from '../../src/amounts/wall-table.ts';
import { wallText } from '../../src/amounts/wall-text.ts';
import { plain } from '../support/plain.ts';
import { plainHalf } from './circuit.ts';

const rows = (...halves: readonly string[]) => {
  const table = wallTable(halves.map((half) => plainHalf(half)));
  if (!table.ok) throw new Error(JSON.stringify(table.fault));
  return table.value;
};

describe('the table for the wall', () => {
  it('has a row for every product, with equivalents and gas', () => {
    const [copper, hydrogen, hydroxide] = rows('Cu^2+ + 2 e^- -> Cu', '2 H2O + 2 e^- -> H2(g) + 2 OH^-');
    expect(copper).toMatchObject({ reaction: 'Cu^2+ + 2 e^- -> Cu', species: 'Cu', electronsPerMole: '2' });
    expect(copper?.electronsPerKilogram?.value).toBeCloseTo(2000 / 63.546, 9);
    expect(copper?.massPerCharge?.value).toBeCloseTo(1.185494, 6);
    expect(copper?.chargePerMass?.value).toBeCloseTo(843.53008, 5);
    expect(copper?.gasPerCharge).toBeNull();
    // 60 C over 2 F is 0.3109 mmol; times 22.414 L/mol.
    expect(hydrogen?.gasPerCharge?.value).toBeCloseTo((60 / (2 * 96485.33212) / 1) * 22413.96954, 6);
    expect(hydroxide?.species).toBe('OH^-');
  });

  it('takes a named species and other conditions', () => {
    const half = plainHalf('2 H2O -> O2(g) + 4 H^+ + 4 e^-');
    const table = wallTable([{ ...half, species: plain('H2O') }], { temperature: '25 °C', pressure: '1 bar' });
    expect(table).toMatchObject({ ok: true, value: [{ species: 'H2O', electronsPerMole: '2' }] });
    const refused = wallTable([{ ...half, species: plain('Cu') }]);
    expect(refused).toMatchObject({ ok: false, fault: { code: 'bad-ask', field: 'species' } });
  });

  it('is written as Markdown and as CSV, each number rounded by its uncertainty', () => {
    const table = rows('Cu^2+ + 2 e^- -> Cu', '2 Cl^- -> Cl2(g) + 2 e^-', 'TcO4^- + 8 H^+ + 7 e^- -> Tc + 4 H2O');
    expect(wallText(table, 'markdown').split('\n')[2]).toMatch(
      /^\| Cu\^2\+ \+ 2 e\^- -> Cu \| Cu \| 2 \| 31\.47\d+\(\d+\) \| 1\.185494\(32\) \| 843\.530\(23\) \|/,
    );
    const csv = wallText(table, 'csv').split('\r\n');
    expect(csv[0]).toContain('"gas in mL/(A min) at 0 °C, 101.325 kPa"');
    expect(csv[2]).toMatch(/^2 Cl\^- -> Cl2\(g\) \+ 2 e\^-,Cl2,2,.*,6\.969133$/);
    expect(csv[3]).toBe('TcO4^- + 8 H^+ + 7 e^- -> Tc + 4 H2O,Tc,7,,,,');
  });
});

describe('printing a quantity', () => {
  // GUM 7.2.2: m_S = 100.02147(35) g; the others by hand.
  it.each([
    [100.021474, 0.00035, '100.02147(35) g'],
    [1.185494183, 0.0000323126, '1.185494(32) g'],
    [296.37354, 0.00808, '296.3735(81) g'],
    [9.9999, 0.0996, '10.00(10) g'],
    [12345.6, 123.4, '12350(120) g'],
    [3.5, 0.5, '3.50(50) g'],
    [1234.5, 12, '1235(12) g'],
    [1.5e-9, 2e-11, '1.500(20)e-9 g'],
  ])('rounds %d by %d', (value, uncertainty, text) => {
    expect(printQuantity({ value, unit: 'g', uncertainty })).toBe(text);
  });

  it('prints seven digits where nothing is known of the uncertainty', () => {
    expect(printQuantity({ value: 900000, unit: 'C' })).toBe('900000 C');
    expect(printNumber(1 / 3)).toBe('0.3333333');
  });
});
