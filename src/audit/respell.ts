import { type Rational, ONE, ZERO, isWhole, isZero, signOf } from '../exact/rational.ts';
import type { Formula, Member } from '../notation/formula.ts';
import { formulaKey, formulaText } from '../notation/print/formula-text.ts';
import { type Species, countAtoms, plainCharge } from '../species/species.ts';

/** `species` with another charge number, spelled alike. */
export const withCharge = (species: Species, charge: Rational): Species => ({
  ...species,
  charge,
  key: formulaKey(species.parts) + plainCharge(charge),
});

const withParts = (species: Species, parts: Formula): Species => ({
  ...species,
  parts,
  formula: formulaText(parts),
  composition: countAtoms(parts),
  key: formulaKey(parts) + plainCharge(species.charge),
});

/** A subscript of a species. */
interface Slot {
  /** Atoms that one more of this member brings. */
  readonly worth: ReadonlyMap<string, Rational>;
  readonly count: Rational;
  readonly set: (count: Rational) => Species;
}

/** A round bracket that counts once goes: CuNO3, not Cu(NO3). */
const bare = (member: Member): readonly Member[] =>
  member.kind === 'group' && member.bracket === '(' && member.count.equals(ONE) ? member.members : [member];

const slotsIn = (
  members: readonly Member[],
  outer: Rational,
  rebuild: (changed: readonly Member[]) => Species,
): Slot[] =>
  members.flatMap((member, index) => {
    const replace = (changed: Member): Species =>
      rebuild(members.flatMap((other, at) => (at === index ? bare(changed) : [other])));
    const one = { ...member, count: ONE };
    const own: Slot = {
      worth: countAtoms([{ multiplier: outer, members: [one] }]),
      count: member.count,
      set: (count) => replace({ ...member, count }),
    };
    if (member.kind === 'atom') return [own];
    const inside = slotsIn(member.members, outer.mul(member.count), (changed) =>
      replace({ ...member, members: changed }),
    );
    return [own, ...inside];
  });

const slotsOf = (species: Species): readonly Slot[] =>
  species.parts.flatMap((part, index) =>
    slotsIn(part.members, part.multiplier, (changed) =>
      withParts(
        species,
        species.parts.map((other, at) => (at === index ? { ...part, members: changed } : other)),
      ),
    ),
  );

/**
 * The species that differ from `species` in one subscript and have the atoms `wanted`, the charge kept.
 * A slot of worth w (atoms) and count n reaches the wanted atoms where  wanted - have = k w;  its count becomes n + k.
 */
export const withOneSubscript = (species: Species, wanted: ReadonlyMap<string, Rational>): readonly Species[] =>
  slotsOf(species).flatMap((slot) => {
    const step = multipleOf(species, wanted, slot.worth);
    if (step === null) return [];
    const count = slot.count.add(step);
    const fits = signOf(count) > 0n && (isWhole(count) || !isWhole(slot.count));
    return fits ? [slot.set(count)] : [];
  });

const multipleOf = (
  { composition }: Species,
  wanted: ReadonlyMap<string, Rational>,
  worth: ReadonlyMap<string, Rational>,
): Rational | null => {
  let found: Rational | null = null;
  for (const element of new Set([...composition.keys(), ...wanted.keys()])) {
    const gap = (wanted.get(element) ?? ZERO).sub(composition.get(element) ?? ZERO);
    const each = worth.get(element);
    if (each === undefined) {
      if (!isZero(gap)) return null;
      continue;
    }
    const step = gap.div(each);
    if (found !== null && !found.equals(step)) return null;
    found = step;
  }
  return found;
};
