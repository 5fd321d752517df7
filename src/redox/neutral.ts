import type { Unknown } from '../balance/unknowns.ts';
import { sameSpecies } from '../species/species.ts';
import { HYDROXIDE, PROTON, WATER } from './media.ts';

/** Numbers with the unknowns they belong to. */
export interface Numbered {
  readonly unknowns: readonly Unknown[];
  readonly numbers: readonly bigint[];
}

/**
 * In a neutral medium H^+ forms but is not used up. Where n H^+ that nobody wrote stand on the left, n OH^- are added to
 * both sides and folded:   n H^+ + n OH^- -> n H2O on the left,   n OH^- on the right.
 * So H2O changes by -n and OH^- by +n; a common factor can neither arise nor go.
 */
export const foldNeutral = ({ unknowns, numbers }: Numbered): Numbered => {
  const at = unknowns.findIndex((unknown) => !unknown.written && sameSpecies(unknown.species, PROTON));
  const used = -(numbers[at] ?? 0n);
  if (used <= 0n) return { unknowns, numbers };
  const changes = unknowns.map(({ species }, index) => {
    const nu = numbers[index] ?? 0n;
    if (index === at) return 0n;
    return sameSpecies(species, WATER) ? nu - used : nu;
  });
  // OH^- is printed after the other helpers, at + 1, and before the electron
  const hydroxide: Unknown = { species: HYDROXIDE, side: 'free', written: false, helper: true };
  return {
    unknowns: [...unknowns.slice(0, at + 1), hydroxide, ...unknowns.slice(at + 1)],
    numbers: [...changes.slice(0, at + 1), used, ...changes.slice(at + 1)],
  };
};
