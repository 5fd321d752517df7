import type { Medium } from '../redox/medium.ts';
import { type Note, note } from '../report/note.ts';
import { type Species, isElectron, plainSpecies, sameSpecies } from '../species/species.ts';
import { isHydroxide, isProton } from './helper-ions.ts';
import { dimensionOf } from './dimension.ts';
import { redoxChangeOf } from './redox-change.ts';
import type { Draft } from './writing.ts';

/** What is known of an equation when its findings are drawn up. */
export interface Standing {
  readonly verdict: 'balanced' | 'not-lowest' | 'unbalanced';
  readonly dimension: number;
}

/** What else is wrong with an equation, whether it balances or not. */
export const findingsOf = (draft: Draft, standing: Standing, medium: Medium | undefined): readonly Note[] => [
  ...commonFactor(standing),
  ...notUnique(standing),
  ...mediumClash(draft, medium),
  ...bothSides(draft),
  ...states(draft),
  ...redox(draft, standing),
];

const commonFactor = ({ verdict }: Standing): readonly Note[] =>
  verdict === 'not-lowest' ? [note('common-factor', 'All coefficients share a common factor.')] : [];

const notUnique = ({ verdict, dimension }: Standing): readonly Note[] =>
  verdict === 'unbalanced' || dimension < 2
    ? []
    : [
        note(
          'not-unique',
          `The written species allow ${String(dimension)} independent reactions: their ratio is the writer's choice.`,
        ),
      ];

/** An ion foreign to the medium; without a medium, H^+ and OH^- on one line. */
const mediumClash = (draft: Draft, medium: Medium | undefined): readonly Note[] => {
  const ions = draft.map(({ species }) => species).filter((species) => isProton(species) || isHydroxide(species));
  if (medium === undefined) {
    const both = ions.some(isProton) && ions.some(isHydroxide);
    return both ? [note('medium-clash', 'Both H^+ and OH^- are written: one medium has only one of them.')] : [];
  }
  const [foreign] = ions.filter((ion) => !isLent(ion, medium));
  if (foreign === undefined) return [];
  const name = medium.name ?? 'given';
  return [note('medium-clash', `${plainSpecies(foreign)} is foreign to the ${name} medium.`)];
};

/** In a neutral medium water gives both of its ions; H3O^+ is at home where H^+ is. */
const isLent = (ion: Species, medium: Medium): boolean =>
  medium.name === 'neutral' ||
  medium.helpers.some((helper) => helper.key === ion.key || (isProton(helper) && isProton(ion)));

const bothSides = (draft: Draft): readonly Note[] =>
  draft
    .filter(({ side }) => side === 'left')
    .filter(({ species }) => draft.some((other) => other.side === 'right' && sameSpecies(other.species, species)))
    .map(({ species }) => note('both-sides', `${plainSpecies(species)} stands on both sides and could be cancelled.`));

/** States are all written or none; an ion is no solid, liquid or gas; one species keeps one state. */
const states = (draft: Draft): readonly Note[] => {
  const matter = draft.map(({ species }) => species).filter((species) => !isElectron(species));
  const bare = matter.filter(({ state }) => state === null);
  const missing =
    bare.length > 0 && bare.length < matter.length
      ? [note('state-missing', `Some species carry a state and ${bare.map(plainSpecies).join(', ')} none.`)]
      : [];
  return [...missing, ...clashes(matter)];
};

/** A change of state alone, Br2(l) -> Br2(aq), is no clash. */
const clashes = (matter: readonly Species[]): readonly Note[] => {
  if (matter.every((one) => one.key === matter[0]?.key)) return [];
  const twice = matter.find((one) => matter.some((other) => other.key === one.key && !sameSpecies(one, other)));
  return twice === undefined ? [] : [note('states-differ', `${plainSpecies(twice)} is written in two states.`)];
};

/** Electrons beside an oxidation and a reduction, or neither in an equation that conserves. */
const redox = (draft: Draft, { verdict }: Standing): readonly Note[] => {
  if (verdict === 'unbalanced') return [];
  const electrons = draft.some(({ species }) => isElectron(species));
  const change = redoxChangeOf(draft);
  if (electrons && change === 'both' && balancesWithout(draft)) {
    return [note('electrons-left', 'Electrons are left though something is oxidised and something reduced.')];
  }
  return !electrons && change === 'none' ? [note('not-redox', 'Nothing is oxidised or reduced.')] : [];
};

/** True where the species balance without electrons, alone or in part: then an overall reaction is written. */
const balancesWithout = (draft: Draft): boolean => dimensionOf(draft.filter(({ species }) => !isElectron(species))) > 0;
