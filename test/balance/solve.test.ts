import { describe, expect, it } from 'vitest';
import { certificateOf } from '../../src/balance/certificate.ts';
import { elementaryBalances } from '../../src/balance/elementary.ts';
import { irreducibleBalances, minimalBalances } from '../../src/balance/family.ts';
import { solve } from '../../src/balance/solve.ts';
import { type Unknown, unknownsOf } from '../../src/balance/unknowns.ts';
import { plainSpecies } from '../../src/species/species.ts';
import { plain, plainEquation } from '../support/plain.ts';

const unknowns = (skeleton: string, helpers: readonly string[] = [], electron = false): readonly Unknown[] =>
  unknownsOf(plainEquation(skeleton), { helpers: helpers.map(plain), electron });

const described = (all: readonly Unknown[]): readonly string[] =>
  all.map(({ species, side }) => `${plainSpecies(species)} ${side}`);

describe('the unknowns of a skeleton', () => {
  it('are what is written, then the other helpers, then the electron', () => {
    expect(described(unknowns('MnO4^- + H^+ -> Mn^2+', ['H2O', 'H^+'], true))).toEqual([
      'MnO4^- left',
      'H^+ left',
      'Mn^2+ right',
      'H2O free',
      'e^- free',
    ]);
  });

  it('merge what is written twice on a side and free what is written on both', () => {
    expect(described(unknowns('A + A + B -> B + C'.replaceAll('A', 'Na').replaceAll('C', 'K')))).toEqual([
      'Na left',
      'B free',
      'K right',
    ]);
  });
});

describe('the verdict', () => {
  it('is unique with the numbers of the reaction', () => {
    expect(solve(unknowns('H2 + O2 -> H2O'))).toEqual({ kind: 'unique', numbers: [-2n, -1n, 2n], dimension: 1 });
  });

  it('is a family where a larger space holds a balance of all species', () => {
    expect(solve(unknowns('C + O2 -> CO + CO2'))).toEqual({ kind: 'family', dimension: 2 });
  });

  it('names the first element that stands on one side only', () => {
    expect(solve(unknowns('H2 + N2 -> H2O'))).toEqual({ kind: 'missing-element', element: 'N', index: 1 });
  });

  it('is no-balance in dimension 0, with a certificate', () => {
    expect(solve(unknowns('CO2 -> CO'))).toMatchObject({ kind: 'no-balance' });
  });

  it('is wrong-side before idle-species in dimension 1', () => {
    expect(solve(unknowns('H2O2 + O2 -> H2O'))).toEqual({ kind: 'wrong-side', index: 1, numbers: [-2n, 1n, 2n] });
    expect(solve(unknowns('H2O2 + CN^- + O2 -> H2O', ['CN^-']))).toMatchObject({ kind: 'wrong-side', index: 2 });
  });

  it('is idle-species where only a part of the skeleton balances', () => {
    expect(solve(unknowns('Cu + CN^- -> Cu^2+ + Cu^+', ['CN^-'], true))).toEqual({ kind: 'idle-species', index: 1 });
  });
});

describe('certificates in words', () => {
  const words = (weights: readonly (readonly [string, bigint])[], skeleton: string, electron = false): string =>
    certificateOf(new Map(weights), unknowns(skeleton, [], electron)).text;

  it('name one element that nothing gives or takes up', () => {
    expect(words([['Na', -1n]], 'Na -> Na')).toBe('nothing here takes up Na');
    expect(words([['Na', 1n]], 'Na -> Na')).toBe('nothing here gives Na');
    expect(words([['charge', 1n]], 'Na -> Na')).toBe('the charge grows more positive in any amounts');
  });

  it('say who is oxidised only where electrons are no unknown', () => {
    const weights = [
      ['Fe', -2n],
      ['charge', 1n],
    ] as const;
    expect(words(weights, 'Fe^2+ -> Fe^3+')).toBe('the only reactant is oxidised: no electrons are accepted');
    expect(words(weights, 'Fe^2+ -> Fe^3+', true)).toBe(
      'counted as 2 Fe - charge, the left exceeds the right in any amounts',
    );
  });
});

describe('families', () => {
  it('of dependent free unknowns are those of each independent set', () => {
    const found = minimalBalances(unknowns('MnO4^- -> Mn^2+', ['H2O', 'H^+', 'OH^-'], true));
    expect(found.kind === 'family' && found.members.length).toBe(3);
  });

  it('of irreducible balances hold more than the minimal ones', () => {
    const all = unknowns('VO2^+ + V^2+ -> VO^2+ + V^3+', ['H2O', 'H^+']);
    const [minimal, irreducible] = [minimalBalances(all), irreducibleBalances(all)];
    expect(minimal.kind === 'family' && minimal.members.length).toBe(2);
    expect(irreducible.kind === 'family' && irreducible.members).toContainEqual([-1n, -1n, 1n, 1n, 1n, -2n]);
  });

  it('too large to list are refused with the limit', () => {
    const side = (charge: string): string =>
      Array.from({ length: 80 }, (_, index) => `C${String(index + 1)}H${String((index + 1) ** 2)}O${charge}`).join(
        ' + ',
      );
    const many = unknowns(`${side('')} -> ${side('2')}`);
    expect(minimalBalances(many)).toMatchObject({ kind: 'too-hard' });
  });
});

describe('elementary balances', () => {
  it('are those from which no species can be dropped', () => {
    const found = elementaryBalances(unknowns('O2 -> H2O2', ['H2O', 'H^+'], true));
    expect(found.kind === 'elementary' && found.balances.map((numbers) => numbers.join(' ')).toSorted()).toEqual(
      // O2, H2O2, H2O, H^+, e^-
      ['-1 0 2 -4 -4', '-1 1 0 -2 -2', '-1 2 -2 0 0', '0 1 -2 2 2'],
    );
  });
});
