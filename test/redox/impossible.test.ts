import { describe, expect, it } from 'vitest';
import { type Rational, rationalFromText, signOf } from '../../src/exact/rational.ts';
import { isWritten, lend } from '../../src/redox/lend.ts';
import { chooseMedium } from '../../src/redox/choose-medium.ts';
import type { Species } from '../../src/species/species.ts';
import { plainEquation, residualByHand } from '../support/plain.ts';
import { faultWith, half, mediumOf, overall } from '../support/redox.ts';
import { readTable } from '../support/table.ts';

const rows = readTable('redox/impossible.tsv');

/** The sign of the weighted sum of a species, counted from its composition and charge. */
const weigh = (species: Species, weights: Readonly<Record<string, string>>): bigint => {
  const zero = rationalFromText('0');
  const amount = (label: string): Rational =>
    label === 'charge' ? species.charge : (species.composition.get(label) ?? zero);
  const parts = Object.entries(weights).map(([label, weight]) => amount(label).mul(rationalFromText(weight)));
  return signOf(parts.reduce((sum, part) => sum.add(part), zero));
};

/** The weights count 0 for every helper that is not written, never less than 0 in what the skeleton gains, and somewhere more. */
const expectCertificate = (skeleton: string, medium: string, weights: Readonly<Record<string, string>>): void => {
  const equation = plainEquation(skeleton);
  const chosen = chooseMedium(mediumOf(medium), equation);
  if (!chosen.ok) throw new Error(chosen.fault.message);
  const spare = lend(chosen.value, equation, false).helpers.filter((one) => !isWritten(one, equation));
  for (const helper of spare) expect(weigh(helper, weights)).toBe(0n);
  const gains = [
    ...equation.left.map(({ species }) => -weigh(species, weights)),
    ...equation.right.map(({ species }) => weigh(species, weights)),
  ];
  for (const gain of gains) expect(gain).toBeGreaterThanOrEqual(0n);
  expect(gains.some((gain) => gain > 0n)).toBe(true);
};

describe('the table of impossible skeletons', () => {
  it('has at least 30 rows', () => {
    expect(rows.length).toBeGreaterThanOrEqual(30);
  });

  it.each(rows)('$ask: $skeleton in $medium is $code', ({ ask, skeleton = '', medium = '', code, about = '' }) => {
    const outcome = ask === 'half' ? half(skeleton, medium) : overall(skeleton, medium);
    expect(outcome).toMatchObject({ code });
    if (code === 'missing-element') expect(outcome).toMatchObject({ element: about });
    if (code === 'wrong-side' || code === 'idle-species') expect(outcome).toMatchObject({ species: about });
    if (code === 'wrong-side') {
      expect(residualByHand(faultWith(outcome, 'wrong-side').reaction.plain)).toEqual(new Map());
    }
    if (code === 'no-balance') {
      const { certificate } = faultWith(outcome, 'no-balance');
      if (about !== '') expect(certificate.text).toBe(about);
      if (about !== 'no species here changes') expectCertificate(skeleton, medium, certificate.weights);
    }
  });
});
