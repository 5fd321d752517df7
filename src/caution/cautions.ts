import { type Species, plainSpecies, sameSpecies } from '../species/species.ts';
import { CAUTION_ROWS, type CautionRow } from './table.ts';
import { type Place, type Trigger, parseTrigger } from './trigger.ts';

/** A medium as the cautions see it. */
export type CautionMedium = 'acid' | 'base' | 'neutral' | 'molten' | 'nonaqueous';

/** What runs: the species by where they stand, and what else is known. null: the ask does not say. */
export interface Scene {
  readonly anode: Sides;
  readonly cathode: Sides;
  /** Reactants and products of the overall reaction, or of a lone half-reaction. */
  readonly overall: Sides;
  readonly medium: CautionMedium | null;
  readonly mode: 'electrolysis' | 'galvanic' | 'charging' | null;
  /** True where something keeps the two electrodes apart. */
  readonly divided: boolean | null;
}

export interface Sides {
  readonly reactants: readonly Species[];
  readonly products: readonly Species[];
}

/** A caution with the species or elements that raised it. */
export interface Caution {
  readonly text: string;
  readonly because: readonly string[];
  readonly basis: string;
}

/** Said wherever cautions are shown. */
export const ABSENCE =
  'That no caution is shown does not mean that it is safe: local codes, the SDS and licensed practice decide.';

interface Rule {
  readonly row: CautionRow;
  readonly trigger: Trigger;
}

/** Read once, at the first need: the table never changes. */
let rules: readonly Rule[] | undefined;
const allRules = (): readonly Rule[] =>
  (rules ??= CAUTION_ROWS.map((row) => ({ row, trigger: parseTrigger(row.trigger) })));

const everyone = (scene: Scene): readonly Species[] =>
  [scene.anode, scene.cathode, scene.overall].flatMap(({ reactants, products }) => [...reactants, ...products]);

const standing = (scene: Scene, place: Place, everywhere: readonly Species[]): readonly Species[] => {
  switch (place) {
    case 'any':
    case 'with':
      return everywhere;
    case 'reactant':
      return [scene.anode, scene.cathode, scene.overall].flatMap((sides) => sides.reactants);
    case 'product':
      return [scene.anode, scene.cathode, scene.overall].flatMap((sides) => sides.products);
    case 'anode':
      return [...scene.anode.reactants, ...scene.anode.products];
    case 'cathode':
      return [...scene.cathode.reactants, ...scene.cathode.products];
    case 'anode_product':
      return scene.anode.products;
    case 'cathode_product':
      return scene.cathode.products;
  }
};

/** An aqueous medium holds water whether or not a reaction uses it. */
const holdsWater = (scene: Scene): boolean =>
  scene.medium === 'acid' || scene.medium === 'base' || scene.medium === 'neutral';

/** The species that meet each clause, or undefined where one clause is met by none. */
const metSpecies = (trigger: Trigger, scene: Scene, everywhere: readonly Species[]): readonly string[] | undefined => {
  const because: string[] = [];
  for (const { place, species } of trigger.places) {
    const there = standing(scene, place, everywhere);
    const met = there.filter((one) => species.some((wanted) => sameSpecies(one, wanted)));
    const water = place === 'with' && holdsWater(scene) && species.some((wanted) => wanted.formula === 'H2O');
    if (met.length === 0 && !water) return undefined;
    because.push(...met.map(plainSpecies));
  }
  return because;
};

const metElements = (trigger: Trigger, everywhere: readonly Species[]): readonly string[] | undefined => {
  if (trigger.elements.length === 0) return [];
  const met = trigger.elements.filter((element) => everywhere.some((species) => species.composition.has(element)));
  return met.length === 0 ? undefined : met;
};

const spoken = (words: readonly string[]): string => {
  const plain = words.map((word) => word.replaceAll('-', ' '));
  return plain.length < 2 ? plain.join('') : `${plain.slice(0, -1).join(', ')} or ${plain.at(-1) ?? ''}`;
};

/** What the row needs and the scene does not say, in words; undefined where the scene says otherwise. */
const openConditions = (trigger: Trigger, scene: Scene): readonly string[] | undefined => {
  const open: string[] = [];
  if (trigger.media.length > 0) {
    if (scene.medium === null) open.push(`in a medium that is ${spoken(trigger.media)}`);
    else if (!trigger.media.includes(scene.medium)) return undefined;
  }
  if (trigger.modes.length > 0) {
    if (scene.mode === null) open.push(`in ${spoken(trigger.modes)}`);
    else if (!trigger.modes.includes(scene.mode)) return undefined;
  }
  const undividedOnly = trigger.conditions.length === 1 && trigger.conditions[0] === 'undivided-cell';
  if (undividedOnly && scene.divided === true) return undefined;
  if (trigger.conditions.length > 0 && !(undividedOnly && scene.divided === false))
    open.push(spoken(trigger.conditions));
  return open;
};

const cautionOf = ({ row, trigger }: Rule, scene: Scene, everywhere: readonly Species[]): Found | undefined => {
  const species = metSpecies(trigger, scene, everywhere);
  const elements = metElements(trigger, everywhere);
  const open = openConditions(trigger, scene);
  if (species === undefined || elements === undefined || open === undefined) return undefined;
  const because = [...new Set([...species, ...elements])];
  if (because.length === 0 && !isSaid(trigger, scene)) return undefined;
  const text = open.length === 0 ? row.text : `${row.text} (Applies: ${open.join('; ')}.)`;
  return { caution: { text, because, basis: row.basis }, gravity: gravityOf(row, open) };
};

/** A row without species or elements speaks only where the scene itself names its medium or mode. */
const isSaid = (trigger: Trigger, scene: Scene): boolean =>
  (trigger.media.length > 0 && scene.medium !== null) || (trigger.modes.length > 0 && scene.mode !== null);

interface Found {
  readonly caution: Caution;
  readonly gravity: number;
}

/** Gases that kill or explode at once come first, then what holds as it stands, then what depends on a condition. */
const AT_ONCE: readonly string[] = [
  'any=CN^-(aq)|HCN(aq)',
  'any=CN^-(aq);with=ClO^-',
  'anode_product=Cl2(g);mode',
  'any=ClO^-(aq)|HClO(aq);medium=acid',
  'any=H2(g);with=O2(g)',
  'product=H2(g);with=O2(g)',
];

const gravityOf = (row: CautionRow, open: readonly string[]): number => {
  if (AT_ONCE.some((start) => row.trigger.startsWith(start))) return 0;
  return open.length === 0 ? 1 : 2;
};

/** The cautions that `scene` raises, once each, the gravest first; in table order where they weigh the same. */
export const cautionsFor = (scene: Scene): readonly Caution[] => {
  const everywhere = everyone(scene);
  return allRules()
    .flatMap((rule) => cautionOf(rule, scene, everywhere) ?? [])
    .toSorted((a, b) => a.gravity - b.gravity)
    .map(({ caution }) => caution);
};
