import { type Reaction, plainReaction } from '../balance/reaction.ts';
import { ONE, isZero, signOf } from '../exact/rational.ts';
import { sumOfTerms, termsOf } from '../redox/split/amounts.ts';
import { dissolvedIons } from '../redox/split/dissolve.ts';
import { type Portion, ionsOfSalt } from '../redox/split/salt.ts';
import { type Note, note } from '../report/note.ts';
import { type Species, plainSpecies } from '../species/species.ts';
import { combinationOf } from './combination.ts';

/** An overall equation taken apart into ions. */
interface Ionic {
  readonly reaction: Reaction;
  /** Ions that stand on both sides alike and go. */
  readonly spectators: readonly Species[];
}

type Dissociation = (species: Species) => readonly Portion[] | null;

/**
 * The note that names the spectators where an overall equation between molecules is, between ions, the sum of the
 * electrode equations: Zn + CuSO4 -> ZnSO4 + Cu. What the electrode equations hold stays whole. None where it is not.
 */
export const spectatorNotes = (anode: Reaction, cathode: Reaction, overall: Reaction): readonly Note[] => {
  const kept = new Set([...anode.terms, ...cathode.terms].map(({ species }) => species.key));
  const found = [dissolvedIons, ionsOfSalt]
    .map((dissociation) => ionicOf(overall, kept, dissociation))
    .find(({ reaction }) => combinationOf(anode, cathode, reaction) !== null);
  if (found === undefined) return [];
  const names = found.spectators.map(plainSpecies).join(', ');
  const idle = names === '' ? '' : ` without the spectators ${names}`;
  const text = `Taken apart into ions the overall equation is the sum${idle}: ${plainReaction(found.reaction)}.`;
  return [note('spectator', text)];
};

const ionicOf = ({ terms }: Reaction, kept: ReadonlySet<string>, dissociation: Dissociation): Ionic => {
  const lists = terms.map(({ species, nu }) => {
    const ions = kept.has(species.key) ? null : dissociation(species);
    return [(ions ?? [{ species, count: ONE }]).map((ion) => ({ species: ion.species, nu: ion.count })), nu] as const;
  });
  const net = sumOfTerms(lists);
  const all = new Map(lists.flatMap(([list]) => list.map((term) => [term.species.key, term.species])));
  const left = termsOf(net);
  return {
    reaction: { terms: [...left.filter(({ nu }) => signOf(nu) < 0n), ...left.filter(({ nu }) => signOf(nu) > 0n)] },
    spectators: [...all.values()].filter(({ key, charge }) => !isZero(charge) && !net.has(key)),
  };
};
