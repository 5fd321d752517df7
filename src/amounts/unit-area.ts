import type { Derived } from './derivation.ts';
import { over } from './measured.ts';

/** The formula by which a thickness on one square metre was given. */
export const PER_AREA = 'd = m / ρ on 1 m^2';

/**
 * Without an area the thickness is per unit area: what the mass would make on one square metre, d = m / (ρ · 1 m²).
 * Nothing changes where an area or a current density is known, or the thickness follows anyway.
 */
export const withUnitArea = (derived: Derived): Derived => {
  const { known, steps } = derived;
  const mass = known.get('mass');
  const density = known.get('density');
  const settled = known.has('thickness') || known.has('area') || known.has('current_density');
  if (mass === undefined || density === undefined || settled || known.has('drop')) return derived;
  const relation = {
    kind: 'product',
    formula: PER_AREA,
    terms: [
      ['thickness', -1],
      ['mass', 1],
      ['density', -1],
    ],
  } as const;
  const step = { name: 'thickness', relation, from: ['mass', 'density'] } as const;
  return { ...derived, known: new Map([...known, ['thickness', over(mass, density)]]), steps: [...steps, step] };
};
