import { plainReaction } from '../balance/reaction.ts';
import { FARADAY } from '../elements/constants.ts';
import { showRational } from '../exact/rational.ts';
import { type Result, all, chain, success } from '../report/result.ts';
import type { Species } from '../species/species.ts';
import { computeAmounts } from './amounts.ts';
import type { Quantity } from './answered.ts';
import type { ParallelReaction } from './branches.ts';
import { toFloat } from './number.ts';
import { equivalenceIn, setUp } from './problem.ts';
import { stakesOf } from './stakes.ts';

/** Conditions of the gas volumes, as quantity texts; dry gas. */
export interface WallConditions {
  readonly temperature: string;
  readonly pressure: string;
}

/** 0 °C and 101.325 kPa (DIN 1343). */
export const NORMAL_CONDITIONS: WallConditions = { temperature: '0 °C', pressure: '101.325 kPa' };

/** A half-reaction of the table; without a species every product makes a row. */
export interface WallEntry extends ParallelReaction {
  readonly species?: Species;
}

/** One row: what one product takes and what a charge makes of it. `null` where no weight is known or no gas. */
export interface WallRow {
  readonly reaction: string;
  readonly species: string;
  /** Exact. */
  readonly electronsPerMole: string;
  /** mol of electrons per kg. */
  readonly electronsPerKilogram: Quantity | null;
  /** g/(A h). */
  readonly massPerCharge: Quantity | null;
  /** A h/kg. */
  readonly chargePerMass: Quantity | null;
  /** mL of dry gas per A min. */
  readonly gasPerCharge: Quantity | null;
}

const productsOf = (entry: WallEntry): readonly Species[] => {
  if (entry.species !== undefined) return [entry.species];
  const branch = { ...entry, share: null, electrode: 'electrode', written: false } as const;
  return stakesOf([branch])
    .filter(({ parts }) => parts.some(({ perElectron }) => perElectron.compare(0) > 0))
    .map(({ species }) => species);
};

/** Moles of electrons per kg:  (Q / m) / F, from A h/kg. */
const perKilogram = (chargePerMass: Quantity): Quantity => {
  const factor = 3600 / toFloat(FARADAY);
  const { value, uncertainty } = chargePerMass;
  return {
    value: value * factor,
    unit: 'mol/kg',
    ...(uncertainty === undefined ? {} : { uncertainty: uncertainty * factor }),
  };
};

const gasOf = (entry: WallEntry, species: Species, conditions: WallConditions): Quantity | null => {
  const given = { charge: '1 A min', ...conditions };
  const answer = computeAmounts({ circuit: { kind: 'half', half: entry }, species, given, want: { volume: 'mL' } });
  const volume = answer.ok ? answer.value.quantities['volume'] : undefined;
  return volume === undefined ? null : { ...volume, unit: 'mL/(A min)' };
};

const rowOf = (entry: WallEntry, species: Species, conditions: WallConditions): Result<WallRow> => {
  const circuit = { kind: 'half', half: entry } as const;
  return chain(setUp(circuit, species), (problem) => {
    const { electronsPerMole } = equivalenceIn(problem.asked, problem);
    return chain(computeAmounts({ circuit, species, given: {} }), ({ quantities }) => {
      const chargePerMass = quantities['charge_per_mass'] ?? null;
      return success({
        reaction: plainReaction(entry.reaction),
        species: problem.asked.name,
        electronsPerMole: electronsPerMole === null ? '' : showRational(electronsPerMole),
        electronsPerKilogram: chargePerMass === null ? null : perKilogram(chargePerMass),
        massPerCharge: quantities['mass_per_charge'] ?? null,
        chargePerMass,
        gasPerCharge: gasOf(entry, species, conditions),
      });
    });
  });
};

/**
 * The table for the wall: for each half-reaction and product, electrons per mole and per kilogram, g/(A h), A h/kg and
 * mL of dry gas per A min at the stated conditions. Faults: those of `computeAmounts`.
 */
export const wallTable = (
  entries: readonly WallEntry[],
  conditions: WallConditions = NORMAL_CONDITIONS,
): Result<readonly WallRow[]> =>
  all(entries.flatMap((entry) => productsOf(entry).map((species) => rowOf(entry, species, conditions))));
