import { type Rational, ONE, ZERO, isZero, rational } from '../../exact/rational.ts';
import type { Formula, Member } from '../../notation/formula.ts';
import { formulaKey, formulaText } from '../../notation/print/formula-text.ts';
import { type Species, countAtoms, plainCharge } from '../../species/species.ts';

/** So many formula units of a species in one unit of another. */
export interface Portion {
  readonly species: Species;
  readonly count: Rational;
}

/** The ions that salts, acids and bases are made of; common practice, no source. */
const SALT_IONS = `
  H^+ Li^+ Na^+ K^+ Rb^+ Cs^+ NH4^+ N2H5^+ NH3OH^+ Be^2+ Mg^2+ Ca^2+ Sr^2+ Ba^2+ Al^3+ Ga^3+ In^3+ Tl^+ Tl^3+ Sn^2+
  Sn^4+ Pb^2+ Bi^3+ Sb^3+ Sc^3+ Y^3+ La^3+ Ce^3+ Ce^4+ Pr^3+ Nd^3+ Sm^3+ Eu^2+ Eu^3+ Gd^3+ Ti^3+ TiO^2+ Zr^4+ ZrO^2+
  V^2+ V^3+ VO^2+ VO2^+ Cr^2+ Cr^3+ Mn^2+ Mn^3+ Fe^2+ Fe^3+ Co^2+ Co^3+ Ni^2+ Cu^2+ Cu^+ Ag^+ Au^3+ Au^+ Zn^2+ Cd^2+
  Hg^2+ Hg2^2+ Pd^2+ Pt^2+ Rh^3+ Ru^3+ Ir^3+ Th^4+ U^3+ U^4+ UO2^2+ Cu(NH3)4^2+ Ag(NH3)2^+ Co(NH3)6^3+ Co(NH3)6^2+
  Ni(NH3)6^2+ Zn(NH3)4^2+ Cr(H2O)6^3+ Fe(H2O)6^2+ Fe(H2O)6^3+ N(CH3)4^+ N(C4H9)4^+
  F^- Cl^- Br^- I^- I3^- H^- OH^- HO^- CN^- SCN^- NCS^- CNS^- OCN^- NCO^- CNO^- N3^- S^2- HS^- S2^2- Se^2- Te^2- O^2- O2^2- O2^-
  ClO^- ClO2^- ClO3^- ClO4^- BrO^- BrO3^- BrO4^- IO^- IO3^- IO4^- OCl^- OBr^- OI^- HF2^-
  SO4^2- HSO4^- SO3^2- HSO3^- S2O3^2- S2O4^2- S2O5^2- S2O6^2- S2O7^2- S2O8^2- S3O6^2- S4O6^2- SeO4^2- SeO3^2- TeO4^2-
  TeO3^2- NO3^- NO2^- PO4^3- HPO4^2- H2PO4^- HPO3^2- H2PO2^- P2O7^4- AsO4^3- HAsO4^2- H2AsO4^- AsO3^3- AsO2^- SbO3^-
  SbO2^- BiO3^- CO3^2- HCO3^- C2O4^2- HC2O4^- HCOO^- CHO2^- CH3COO^- C2H3O2^- C4H4O6^2- C6H5O7^3- C6H5COO^- C6H5O^-
  SiO3^2- SiF6^2- B(OH)4^- BO2^- B4O7^2- BH4^- BF4^- PF6^- AlO2^- Al(OH)4^- AlH4^- AlF6^3- AlCl4^- SnO2^2- SnO3^2- Sn(OH)3^-
  Sn(OH)4^2- Sn(OH)6^2- SnCl6^2- PbO2^2- Pb(OH)3^- Pb(OH)4^2- VO3^- VO4^3- CrO4^2- Cr2O7^2- CrO2^- Cr(OH)4^- Cr(OH)6^3-
  MoO4^2- WO4^2- MnO4^- MnO4^2- FeO4^2- Fe(CN)6^3- Fe(CN)6^4- FeCl4^- Co(CN)6^3- CoCl4^2- Ni(CN)4^2- CuCl2^- CuCl4^2-
  Cu(CN)2^- Cu(CN)4^3- Ag(CN)2^- Ag(S2O3)2^3- Au(CN)2^- AuCl4^- Zn(OH)4^2- ZnO2^2- Zn(CN)4^2- Cd(CN)4^2- HgI4^2- HgCl4^2-
  PtCl6^2- PtCl4^2- PdCl4^2- IrCl6^2-
`;

/** Charge numbers of these ions by the key of their formula: Fe has 2 and 3. */
const CHARGES: ReadonlyMap<string, readonly bigint[]> = (() => {
  const charges = new Map<string, bigint[]>();
  for (const ion of SALT_IONS.trim().split(/\s+/u)) {
    const [formula = '', charge = ''] = ion.split('^');
    const size = BigInt(/^\d+/u.exec(charge)?.[0] ?? '1');
    charges.set(formula, [...(charges.get(formula) ?? []), charge.endsWith('-') ? -size : size]);
  }
  return charges;
})();

/** The most kinds of ion in one salt: potassium, aluminium and sulfate in alum; one more for good measure. */
const MOST_IONS = 4;

/**
 * The ions of a neutral salt, acid or base as its formula spells them: the fewest kinds
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

/** Oxides, peroxides and superoxides of ions are those of the first two groups: MnO2 is no salt. Common practice, no source. */
const isLikely = (ions: readonly Portion[]): boolean =>
  !ions.some(({ species }) => species.formula === 'O2' || species.key === 'O^2-') ||
  ions.every(({ species }) => OXIDE_PARTNERS.has(species.key));

const OXIDE_PARTNERS = new Set('O^2- O2^2- O2^- H^+ Li^+ Na^+ K^+ Rb^+ Cs^+ Mg^2+ Ca^2+ Sr^2+ Ba^2+ NH4^+'.split(' '));

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
  const asRun = saltIons(run, ONE);
  if (run.length !== 1 || only === undefined || only.count.equals(ONE)) return asRun;
  return [...saltIons(unbracketed({ ...only, count: ONE }), only.count), ...asRun];
};

/** A round bracket only counts, so it goes; a square one belongs to a complex and stays. */
const unbracketed = (member: Member): readonly Member[] =>
  member.kind === 'group' && member.bracket === '(' ? member.members : [member];

const saltIons = (members: readonly Member[], count: Rational): readonly Portion[] => {
  const [only] = members;
  const inside = members.length === 1 && only !== undefined && only.count.equals(ONE) ? unbracketed(only) : members;
  const parts = [{ multiplier: ONE, members: inside }];
  return (CHARGES.get(formulaKey(parts)) ?? []).map((charge) => ({
    species: speciesOf(parts, rational(charge)),
    count,
  }));
};
