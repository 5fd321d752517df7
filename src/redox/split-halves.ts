import type { Reaction, Term } from '../balance/reaction.ts';
import { type Rational, ONE, ZERO, isZero, signOf } from '../exact/rational.ts';
import type { Species } from '../species/species.ts';
import { HYDROXIDE, PROTON, WATER, mediumRow } from './media.ts';
import type { Medium } from './medium.ts';
import { hasTwoStates, sumOfTerms, termsOf } from './split-amounts.ts';
import { type SplitHalf, completeTerms, electronsOf, halfOfTerms, helpersOf } from './split-complete.ts';
import { type Background, type Component, backgroundOf, componentsOf, sidesOf } from './split-components.ts';
import { divide } from './split-divide.ts';
import { flowsOf } from './split-flows.ts';
import { speciesOf } from './split-salt.ts';
import { type IonicReaction, type Reach, ionicReaction } from './split-ionic.ts';

/** The two halves of an overall reaction and the electrons that they exchange at its scale. */
export interface Halves {
  readonly oxidation: SplitHalf;
  readonly reduction: SplitHalf;
  readonly electrons: Rational;
}

/**
 * The oxidation and the reduction that add up to `reaction`, spectators aside: by connected elements, and by oxidation
 * numbers where both sides share an element. Null where no two halves give the reaction back.
 */
export const halvesOf = (reaction: Reaction, medium: Medium): Halves | null => {
  if (hasTwoStates(reaction)) return null;
  for (const reach of ['dissolved', 'every salt'] as const) {
    for (const ionic of ionicForms(reaction, medium, reach)) {
      const found = splitIonic(ionic);
      if (found !== null) return found;
    }
  }
  return null;
};

/**
 * As the medium has it; where that lends no water but an ion of water is written, in acid or base; where carbonate gives
 * carbon dioxide, with these two as helpers; and with an alkali ion that one half hands to the other, as host to host.
 */
const ionicForms = (reaction: Reaction, medium: Medium, reach: Reach): readonly IonicReaction[] => {
  const ionic = ionicReaction(reaction, medium, reach);
  const has = (helper: Species): boolean => ionic.amounts.has(helper.key);
  const carbonate = mediumRow('molten-carbonate');
  const gives = carbonate?.helpers.every(has) === true;
  const handed = handedOver(ionic);
  const shown = has(PROTON) ? mediumRow('acid') : has(HYDROXIDE) ? mediumRow('base') : undefined;
  const lacks = shown !== undefined && !ionic.medium.helpers.some(({ key }) => key === WATER.key);
  return [
    ionic,
    ...(lacks ? [{ ...ionic, medium: { name: shown.name, helpers: shown.helpers } }] : []),
    ...(gives ? [{ ...ionic, medium: { name: carbonate.name, helpers: carbonate.helpers } }] : []),
    ...(handed === null ? [] : [{ ...ionic, medium: { name: null, helpers: [...ionic.medium.helpers, handed] } }]),
  ];
};

const ALKALI = ['Li', 'Na', 'K'];

/** The ion of an alkali metal that stands in several species but not as an ion. */
const handedOver = ({ amounts }: IonicReaction): Species | null => {
  const holders = (element: string): number =>
    termsOf(amounts).filter(({ species }) => species.composition.has(element)).length;
  const symbol = ALKALI.find((element) => holders(element) > 1 && !amounts.has(`${element}^+`));
  if (symbol === undefined) return null;
  return speciesOf([{ multiplier: ONE, members: [{ kind: 'atom', symbol, massNumber: null, count: ONE }] }], ONE);
};

const splitIonic = ({ amounts, medium }: IonicReaction): Halves | null => {
  const terms = termsOf(amounts);
  const background = backgroundOf(helpersOf(medium));
  const { flows, decided } = flowsOf(terms);
  const components = componentsOf(terms, flows, { ...background, keys: new Set(medium.helpers.map(({ key }) => key)) });
  const oxidised: Term[] = [];
  const reduced: Term[] = [];
  for (const component of components) {
    const parts = partsOf(component, background, medium);
    if (parts === null) return null;
    oxidised.push(...parts.oxidised);
    reduced.push(...parts.reduced);
  }
  const halves = joined(oxidised, reduced, { amounts, medium });
  const given = components.reduce((sum, component) => sum.add(givenBy(component, background)), ZERO);
  return halves === null || !decided || halves.electrons.equals(given) ? halves : null;
};

/** Electrons that the oxidised atoms of a component give, by their oxidation numbers. */
const givenBy = (component: Component, background: Background): Rational => {
  const sides = sidesOf(component, background);
  return component.flows
    .filter((_, at) => sides[at] === 1n)
    .reduce((sum, flow) => sum.add(flow.to.sub(flow.from).mul(flow.atoms)), ZERO);
};

interface Parts {
  readonly oxidised: readonly Term[];
  readonly reduced: readonly Term[];
}

/** A component goes to one half as a whole, or is divided, or exchanges no electrons and goes to neither. */
const partsOf = (component: Component, background: Background, medium: Medium): Parts | null => {
  const completed = completeTerms(component.terms, medium);
  if (completed === null) return null;
  const sides = sidesOf(component, background);
  if (sides.includes(1n) && sides.includes(-1n)) return divide(component, sides, background);
  const given = signOf(electronsOf(completed));
  return {
    oxidised: given > 0n ? component.terms : [],
    reduced: given < 0n ? component.terms : [],
  };
};

/** Both parts completed; they must exchange electrons one for one and give the ionic reaction back. */
const joined = (oxidised: readonly Term[], reduced: readonly Term[], ionic: IonicReaction): Halves | null => {
  const { amounts, medium } = ionic;
  const [left, right] = [completeTerms(oxidised, medium), completeTerms(reduced, medium)];
  if (left === null || right === null) return null;
  const electrons = electronsOf(left);
  if (signOf(electrons) <= 0n || !electronsOf(right).equals(electrons.neg())) return null;
  if (!givesBack([...left, ...right], termsOf(amounts))) return null;
  const spelled = termsOf(amounts).map(({ species }) => species);
  return {
    oxidation: halfOfTerms(left, medium, spelled),
    reduction: halfOfTerms(right, medium, spelled),
    electrons,
  };
};

/** The difference of both is nothing, or so often  H^+ + OH^- - H2O = 0. */
const givesBack = (sum: readonly Term[], reaction: readonly Term[]): boolean => {
  const rest = sumOfTerms([
    [sum, ONE],
    [reaction, ONE.neg()],
  ]);
  const ions = rest.get(PROTON.key)?.nu;
  if (ions === undefined) return rest.size === 0;
  const folded = sumOfTerms([
    [termsOf(rest), ONE],
    [
      [
        { species: PROTON, nu: ions.neg() },
        { species: HYDROXIDE, nu: ions.neg() },
        { species: WATER, nu: ions },
      ],
      ONE,
    ],
  ]);
  return termsOf(folded).every(({ nu }) => isZero(nu));
};
