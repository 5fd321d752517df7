import { type Rational, ONE, ZERO, isZero, rational, showRational, signOf } from '../exact/rational.ts';
import type { Formula, Member } from '../notation/formula.ts';

/** Atoms of each element or nuclide in one formula unit. Keys: "Fe", "2H" (mass number and symbol). */
export type Composition = ReadonlyMap<string, Rational>;

/** A chemical species, or the electron (formula "e", no parts, charge number -1). */
export interface Species {
  /** Canonical spelling, charge and state aside: "Cr2O7", "CuSO4*5H2O", "[Fe(CN)6]". */
  readonly formula: string;
  readonly parts: Formula;
  readonly composition: Composition;
  /** Charge number z. */
  readonly charge: Rational;
  /** Written state ("aq", "s", ...) or null. */
  readonly state: string | null;
  /** Two species are the same where their keys are equal and their states do not differ. */
  readonly key: string;
}

/** A charge as the canonical spelling writes it: "^2+", "^-", "" for none. */
export const plainCharge = (charge: Rational): string => {
  if (isZero(charge)) return '';
  const size = charge.abs();
  return `^${size.equals(ONE) ? '' : showRational(size)}${signOf(charge) > 0n ? '+' : '-'}`;
};

/** The canonical plain spelling without state: "Cr2O7^2-". */
export const plainSpecies = (species: Species): string => species.formula + plainCharge(species.charge);

/** The canonical plain spelling with the state where written: "Cr2O7^2-(aq)". */
export const plainWithState = (species: Species): string =>
  species.state === null ? plainSpecies(species) : `${plainSpecies(species)}(${species.state})`;

/** The contract's rule: same formula, nuclides and charge, and no two differing states. */
export const sameSpecies = (a: Species, b: Species): boolean =>
  a.key === b.key && (a.state === null || b.state === null || a.state === b.state);

export const isElectron = (species: Species): boolean => species.key === 'e^-';

/** The composition of members, counted through all brackets and names. */
export const countAtoms = (parts: Formula): Composition => {
  const counts = new Map<string, Rational>();
  const add = (members: readonly Member[], factor: Rational): void => {
    for (const member of members) {
      const times = factor.mul(member.count);
      if (member.kind !== 'atom') {
        add(member.members, times);
        continue;
      }
      const key = (member.massNumber ?? '') + member.symbol;
      counts.set(key, (counts.get(key) ?? ZERO).add(times));
    }
  };
  for (const part of parts) add(part.members, part.multiplier);
  return counts;
};

/** The electron, e^-. */
export const ELECTRON: Species = {
  formula: 'e',
  parts: [],
  composition: new Map(),
  charge: rational(-1n),
  state: null,
  key: 'e^-',
};
