import { type Rational, ONE, isWhole, rational, showDecimal, signOf } from '../exact/rational.ts';
import type { Group, Member, Part } from '../notation/formula.ts';
import { type Species, countAtoms, plainCharge } from '../species/species.ts';

const countText = (count: Rational): string => (count.equals(ONE) ? '' : showDecimal(count));

const CLOSING: Readonly<Record<Group['bracket'], string>> = { '(': ')', '[': ']', '{': '}' };

const spellMember = (member: Member): string => {
  switch (member.kind) {
    case 'atom':
      return (member.massNumber === null ? '' : `^${member.massNumber}`) + member.symbol + countText(member.count);
    case 'group':
      return (
        member.bracket + member.members.map(spellMember).join('') + CLOSING[member.bracket] + countText(member.count)
      );
    case 'named':
      return member.name + countText(member.count);
  }
};

const spellParts = (parts: readonly Part[]): string =>
  parts.map(({ multiplier, members }) => countText(multiplier) + members.map(spellMember).join('')).join('*');

/** `species` with another charge number, spelled alike. */
export const withCharge = (species: Species, charge: Rational): Species => {
  const bare = species.key.slice(0, species.key.length - plainCharge(species.charge).length);
  return { ...species, charge, key: bare + plainCharge(charge) };
};

/** `species` with other parts. */
const withParts = (species: Species, parts: readonly Part[]): Species => {
  const formula = spellParts(parts);
  const bare = formula
    .replace(/^\[([^[\]]*)\]$/, '$1')
    .replaceAll('[', '(')
    .replaceAll(']', ')');
  return { ...species, parts, formula, composition: countAtoms(parts), key: bare + plainCharge(species.charge) };
};

/** Every way to change one count in `species`, as (new count asked of `change`) -> species. */
interface Slot {
  /** Atoms that one more of this member brings. */
  readonly worth: ReadonlyMap<string, Rational>;
  readonly count: Rational;
  readonly set: (count: Rational) => Species;
}

const slotsIn = (
  members: readonly Member[],
  outer: Rational,
  rebuild: (changed: readonly Member[]) => Species,
): Slot[] =>
  members.flatMap((member, index) => {
    const replace = (changed: Member): Species => rebuild(members.map((other, at) => (at === index ? changed : other)));
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
    const zero = rational(0n);
    const gap = (wanted.get(element) ?? zero).sub(composition.get(element) ?? zero);
    const each = worth.get(element);
    if (each === undefined) {
      if (!gap.equals(zero)) return null;
      continue;
    }
    const step = gap.div(each);
    if (found !== null && !found.equals(step)) return null;
    found = step;
  }
  return found;
};
