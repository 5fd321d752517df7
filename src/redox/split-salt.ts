import { type Rational, ONE, ZERO, isZero, rational } from '../exact/rational.ts';
import type { Formula, Member } from '../notation/formula.ts';
import { formulaKey, formulaText } from '../notation/print/formula-text.ts';
import { KNOWN_IONS } from '../species/ions.ts';
import { type Species, countAtoms, plainCharge } from '../species/species.ts';

/** So many formula units of a species in one unit of another. */
export interface Portion {
  readonly species: Species;
  readonly count: Rational;
}

/** Ions that stand in salts under a second spelling or only there; common practice, no source. */
const MORE_IONS =
  'O2^2- OCl^- OBr^- OI^- HO^- NCO^- CNO^- NCS^- CNS^- C2H3O2^- C4H4O6^2- C6H5O7^3- BiO3^- SbO3^- AsO3^3- AlO2^- ' +
  'CrO2^- ZnO2^2- SnO2^2- SnO3^2- PbO2^2- VO3^- VO4^3- SiO3^2- P2O7^4- B4O7^2- TeO3^2- TeO4^2- SeCN^-';

/** Charge numbers of the known ions by the key of their formula: Fe has 2 and 3. */
const CHARGES: ReadonlyMap<string, readonly bigint[]> = (() => {
  const charges = new Map<string, bigint[]>();
  for (const ion of [...KNOWN_IONS, ...MORE_IONS.split(' ')]) {
    const [formula = '', charge = ''] = ion.split('^');
    const key = formula
      .replace(/^\[(.*)\]$/u, '$1')
      .replaceAll('[', '(')
      .replaceAll(']', ')');
    const size = BigInt(/^\d+/u.exec(charge)?.[0] ?? '1');
    charges.set(key, [...(charges.get(key) ?? []), charge.endsWith('-') ? -size : size]);
  }
  return charges;
})();

/** The most kinds of ion in one salt: potassium, aluminium and sulfate in alum; one more for good measure. */
const MOST_IONS = 4;

/**
 * The ions of a neutral salt, acid or base as its formula spells them, by the table of known ions: the fewest kinds
 * whose charges cancel. Water of a hydrate is told beside them. Null for a species that is no such formula, and for
 * water itself.
 *
 *     K2Cr2O7 = 2 K^+ + Cr2O7^2-     Fe2(SO4)3 = 2 Fe^3+ + 3 SO4^2-     CH3COONa = CH3COO^- + Na^+
 */
export const ionsOfSalt = (salt: Species): readonly Portion[] | null => {
  const [first, ...adducts] = salt.parts;
  if (first === undefined || !isZero(salt.charge) || salt.key === 'H2O') return null;
  const ions = fewestUnits(first.members);
  if (ions === null) return null;
  const state = salt.state === 's' ? null : salt.state;
  const told = ions.map(({ species, count }) => ({
    species: { ...species, state },
    count: count.mul(first.multiplier),
  }));
  const rest = adducts.map(({ multiplier, members }) => ({
    species: speciesOf([{ multiplier: ONE, members }], ZERO),
    count: multiplier,
  }));
  return [...told, ...rest];
};

/** The species of this formula and charge, in no stated state. */
export const speciesOf = (parts: Formula, charge: Rational): Species => ({
  formula: formulaText(parts),
  parts,
  composition: countAtoms(parts),
  charge,
  state: null,
  key: formulaKey(parts) + plainCharge(charge),
});

const fewestUnits = (members: readonly Member[]): readonly Portion[] | null => {
  for (let kinds = 2; kinds <= MOST_IONS; kinds += 1) {
    const found = partition(members, kinds, ZERO);
    if (found !== null && isLikely(found)) return found;
  }
  return null;
};

/** Peroxides and superoxides are those of the first two groups: MnO2 is no salt. Common practice, no source. */
const isLikely = (ions: readonly Portion[]): boolean =>
  !ions.some(({ species }) => species.formula === 'O2') ||
  ions.every(({ species }) => PEROXIDE_PARTNERS.has(species.key));

const PEROXIDE_PARTNERS = new Set('O2^2- O2^- H^+ Li^+ Na^+ K^+ Rb^+ Cs^+ Mg^2+ Ca^2+ Sr^2+ Ba^2+ NH4^+'.split(' '));

/**
 * `members` cut into `kinds` ions, the charge so far and theirs together 0.
 *
 *     Na2 S2 O3     an ion is one member taken as often as it counts (2 Na^+)
 *     ^^^ -----     or a run of members taken once (S2O3^2-)
 */
const partition = (members: readonly Member[], kinds: number, charge: Rational): readonly Portion[] | null => {
  if (members.length === 0) return kinds === 0 && isZero(charge) ? [] : null;
  if (kinds === 0) return null;
  for (let length = members.length - kinds + 1; length >= 1; length -= 1) {
    for (const unit of unitsOf(members.slice(0, length))) {
      const rest = partition(members.slice(length), kinds - 1, charge.add(unit.species.charge.mul(unit.count)));
      if (rest !== null) return [unit, ...rest];
    }
  }
  return null;
};

/** The ions that a run of members may be. */
const unitsOf = (run: readonly Member[]): readonly Portion[] => {
  const [only] = run;
  const asRun = knownIons(run, ONE);
  if (run.length !== 1 || only === undefined || only.count.equals(ONE)) return asRun;
  return [...knownIons(unbracketed({ ...only, count: ONE }), only.count), ...asRun];
};

/** A round bracket only counts, so it goes; a square one belongs to a complex and stays. */
const unbracketed = (member: Member): readonly Member[] =>
  member.kind === 'group' && member.bracket === '(' ? member.members : [member];

const knownIons = (members: readonly Member[], count: Rational): readonly Portion[] => {
  const [only] = members;
  const inside = members.length === 1 && only !== undefined && only.count.equals(ONE) ? unbracketed(only) : members;
  const parts = [{ multiplier: ONE, members: inside }];
  return (CHARGES.get(formulaKey(parts)) ?? []).map((charge) => ({
    species: speciesOf(parts, rational(charge)),
    count,
  }));
};
