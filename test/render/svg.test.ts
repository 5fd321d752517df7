import { describe, expect, it } from 'vitest';
import type { TraceStretch } from '../../src/desk/sheet/answer.ts';
import { escaped, formulaHtml, formulaParts } from '../../src/render/markup.ts';
import { bandText, electrodeBand, shareText } from '../../src/render/svg/band.ts';
import { recordChart } from '../../src/render/svg/chart.ts';
import { element } from '../../src/render/svg/element.ts';
import { scaleOver, timeScale, timeUnit } from '../../src/render/svg/scale.ts';

describe('a scale', () => {
  it.each([
    [0, 3344, 4, [0, 1000, 2000, 3000, 4000]],
    [0, 251.8, 3, [0, 100, 200, 300]],
    [-20, 100, 4, [-50, 0, 50, 100]],
    [0, 0.0012, 4, [0, 0.0005, 0.001, 0.0015]],
    [0, 0, 4, [0, 0.5, 1]],
    [5, 5, 4, [4, 6]],
  ])('from %d to %d has whole steps around both ends', (low, high, most, ticks) => {
    const scale = scaleOver(low, high, [100, 0], most);
    expect(scale.ticks[0]).toBeLessThanOrEqual(low);
    expect(scale.ticks.at(-1)).toBeGreaterThanOrEqual(high);
    if (low !== high) expect(scale.ticks).toEqual(ticks);
    expect(scale.at(scale.from)).toBe(100);
    expect(scale.at(scale.to)).toBeCloseTo(0, 9);
  });

  it.each([
    [3600, [0, 600, 1200, 1800, 2400, 3000, 3600]],
    [50_400, [0, 10_800, 21_600, 32_400, 43_200]],
    [90, [0, 60]],
  ])('of %d s has steps that people read', (seconds, ticks) => {
    expect(timeScale(seconds, [0, 300]).ticks).toEqual(ticks);
  });

  it('counts in min, h or days', () => {
    expect([60, 7200, 259_200].map((seconds) => timeUnit(seconds).unit)).toEqual(['min', 'h', 'd']);
  });
});

describe('markup', () => {
  it('lowers counts, raises charges, and leaves coefficients and states on the line', () => {
    expect(formulaHtml('2 Ag(S2O3)2^3-(aq) -> 2 Ag')).toBe(
      '2\u00a0Ag(S<sub>2</sub>O<sub>3</sub>)<sub>2</sub><sup>3−</sup>(aq) → 2\u00a0Ag',
    );
    expect(formulaHtml('e^- -> Fe0.95O')).toBe('e<sup>−</sup> → Fe<sub>0.95</sub>O');
    expect(formulaHtml('[18O]2^-')).toBe('<sup>18</sup>O<sub>2</sub><sup>−</sup>');
    expect(formulaParts('[18O]2^-(g)').map(({ text, place }) => `${place} ${text}`)).toEqual([
      'high 18',
      'line O',
      'low 2',
      'high −',
      'line (g)',
    ]);
    expect(formulaHtml('CuSO4*5H2O')).toBe('CuSO<sub>4</sub>·5H<sub>2</sub>O');
  });

  it('gives back every character of a species that is none', () => {
    const hostile = '<script>^"&\'';
    expect(
      formulaParts(hostile)
        .map(({ text }) => text)
        .join(''),
    ).toBe(hostile);
    expect(formulaHtml(hostile)).not.toContain('<script');
  });

  it('escapes attributes and drops what XML forbids', () => {
    expect(element('rect', { x: 1 / 3, title: '"<&\'' })).toBe('<rect x="0.33" title="&quot;&lt;&amp;&#39;"/>');
    expect(escaped('a\u0000\u202eb\ud800\n')).toBe('a\ufffd\ufffdb\ufffd\n');
  });
});

/** The numbers of an attribute, in the order of the elements. */
const numbersOf = (markup: string, pattern: RegExp): readonly number[] =>
  [...markup.matchAll(pattern)].map(([, value]) => Number(value));

describe('the band of an electrode', () => {
  const parts = [
    { species: 'Zn', share: 0.92 },
    { species: 'H2', share: 0.05 },
    { species: null, share: 0.03 },
  ];

  it('is as wide as its shares and names every one', () => {
    const { markup } = electrodeBand('cathode', parts, 0);
    const bars = numbersOf(markup, /<rect class="(?:part\d|rest)" x="[\d.]+" y="14" width="([\d.]+)"/g);
    expect(bars).toHaveLength(3);
    expect(bars.reduce((sum, one) => sum + one, 0)).toBeCloseTo(359, 1);
    expect((bars[0] ?? 0) / 359).toBeCloseTo(0.92, 3);
    expect(markup).toContain('92 %');
    expect(markup).toContain('not accounted for');
    expect(bandText(parts)).toBe('Zn 92 %, H2 5 %, not accounted for 3 %');
  });

  it('stays in its frame where an efficiency is over 100 %', () => {
    const bars = numbersOf(
      electrodeBand('cathode', [{ species: 'Cu', share: 1.35 }], 0).markup,
      /height="20"|y="14" width="([\d.]+)"/g,
    );
    expect(Math.max(...bars.filter((one) => !Number.isNaN(one)))).toBeLessThanOrEqual(359);
  });

  it('grows by lines where names are long', () => {
    const long = Array.from({ length: 5 }, (_, at) => ({ species: `Fe(CN)6${'A'.repeat(at + 12)}`, share: 0.2 }));
    expect(electrodeBand('anode', long, 0).height).toBeGreaterThan(electrodeBand('anode', parts, 0).height);
  });

  it.each([
    [0.9337, '93.4 %'],
    [1, '100 %'],
    [0.00042, '0.042 %'],
    [0.99996, '99.996 %'],
    [0.000001, 'under 0.001 %'],
  ])('shows the share %d', (share, text) => {
    expect(shareText(share)).toBe(text);
  });
});

describe('the chart of a record', () => {
  const trace: readonly TraceStretch[] = [
    { from: 0, to: 1800, least: 100, greatest: 100, charge: 50 },
    { from: 1800, to: 3600, least: -20, greatest: 100, charge: 75 },
    { from: 3600, to: 7200, least: -20, greatest: -20, charge: 55 },
  ];

  it('draws the charge through every stretch, and the current between its extremes', () => {
    const markup = recordChart(trace, null);
    const line = /class="line" d="([^"]+)"/.exec(markup)?.[1] ?? '';
    expect(line.split(/[ML]/).slice(1)).toHaveLength(4);
    expect(markup).toContain('class="envelope"');
    expect(markup).not.toContain('NaN');
    expect(markup).not.toContain('Infinity');
  });

  it('sets the axis of mass so that one line is read on both', () => {
    const markup = recordChart(trace, { species: 'Cu', unit: 'kg', perCharge: 0.001 });
    // 0.02 kg stand where 20 A h stand.
    const heights = numbersOf(markup, /<text x="\d+" y="([\d.]+)"[^>]*>(?:20|0\.02)<\/text>/g);
    expect(heights).toHaveLength(2);
    expect(heights[0]).toBe(heights[1]);
  });

  it('is drawn for a record in which nothing flowed', () => {
    const idle = [
      { from: 0, to: 10, least: 0, greatest: 0, charge: 0 },
      { from: 10, to: 20, least: 0, greatest: 0, charge: 0 },
    ];
    expect(recordChart(idle, null)).not.toContain('NaN');
  });
});
