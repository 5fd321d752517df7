import type { Species } from '../species/species.ts';
import type { Scene, Sides } from './scene.ts';
import type { Clause, Place } from './trigger.ts';

/*
 * Where a species stands, one bit each: a caution asks a clause of every species of a scene, and an answer in a batch
 * has no time to gather the same lists again and again.
 */
const ANODE_REACTANT = 1;
const ANODE_PRODUCT = 2;
const CATHODE_REACTANT = 4;
const CATHODE_PRODUCT = 8;
const OVERALL_REACTANT = 16;
const OVERALL_PRODUCT = 32;
/** Takes no part. */
const PRESENT = 64;

const STANDS: Readonly<Record<Place, number>> = {
  any: 127,
  with: 127,
  reactant: ANODE_REACTANT | CATHODE_REACTANT | OVERALL_REACTANT,
  product: ANODE_PRODUCT | CATHODE_PRODUCT | OVERALL_PRODUCT,
  anode: ANODE_REACTANT | ANODE_PRODUCT,
  cathode: CATHODE_REACTANT | CATHODE_PRODUCT,
  anode_product: ANODE_PRODUCT,
  cathode_product: CATHODE_PRODUCT,
};

/** A species of a scene with all the places where it stands. */
export interface Actor {
  readonly species: Species;
  /** Its key with every nuclide taken as its element. */
  readonly key: string;
  places: number;
}

/** The element of a composition's label: "H" of "2H". */
export const elementOf = (label: string): string => (label < ':' ? label.replace(/^\d+/, '') : label);

/**
 * Isotopes of an element are alike in what they do to people: a species is looked up by its elements, D2 as H2.
 * Keys write a nuclide as {2H}; two like atoms side by side, {2H}{3H}, are counted together.
 */
const elementKey = ({ key }: Species): string =>
  key.includes('{') ? key.replace(/\{\d+([A-Z][a-z]?)\}/g, '$1').replace(/([A-Z][a-z]?)\1(?![a-z\d])/g, '$12') : key;

const join = (actors: Actor[], all: readonly Species[], place: number): void => {
  for (const species of all) {
    const there = actors.find((one) => one.species.key === species.key && one.species.state === species.state);
    if (there === undefined) actors.push({ species, key: elementKey(species), places: place });
    else there.places |= place;
  }
};

/** The species of a scene, each once: anode, cathode, what only the overall reaction names, what is only there. */
export const actorsOf = ({ anode, cathode, overall, present = [] }: Scene): readonly Actor[] => {
  const actors: Actor[] = [];
  const both = (sides: Sides, reactant: number, product: number): void => {
    join(actors, sides.reactants, reactant);
    join(actors, sides.products, product);
  };
  both(anode, ANODE_REACTANT, ANODE_PRODUCT);
  both(cathode, CATHODE_REACTANT, CATHODE_PRODUCT);
  both(overall, OVERALL_REACTANT, OVERALL_PRODUCT);
  join(actors, present, PRESENT);
  return actors;
};

/** The canonical spelling; a key ends in the charge that `plainSpecies` would have to spell out again. */
const spelling = ({ formula, key }: Species): string => {
  const caret = key.indexOf('^');
  return caret < 0 ? formula : formula + key.slice(caret);
};

/** The species that meet a clause: same formula and charge, and no two differing states; a missing one matches any. */
export const meeting = (actors: readonly Actor[], { place, wanted }: Clause): readonly string[] => {
  const met: string[] = [];
  for (const { species, key, places } of actors) {
    const states = (places & STANDS[place]) === 0 ? undefined : wanted.get(key);
    if (states === undefined) continue;
    if (species.state === null || states.some((state) => state === null || state === species.state))
      met.push(spelling(species));
  }
  return met;
};
