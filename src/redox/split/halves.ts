import type { Reaction, Term } from '../../balance/reaction.ts';
import { type Rational, ONE, ZERO, isZero, signOf } from '../../exact/rational.ts';
import type { Species } from '../../species/species.ts';
import { HYDROXIDE, PROTON, WATER } from '../media.ts';
import type { Medium } from '../medium.ts';
import { hasTwoStates, sumOfTerms, termsOf } from './amounts.ts';
import { type SplitHalf, completeTerms, electronsOf, halfOfTerms, helpersOf } from './complete.ts';
import { type Background, type Component, backgroundOf, componentsOf, sidesOf } from './components.ts';
import { divide } from './divide.ts';
import { type Flow, elementsOf, flowsOf } from './flows.ts';
import { ionicForms } from './forms.ts';
import type { IonicReaction } from './ionic.ts';

/** The two halves of an overall reaction and the electrons that they exchange at its scale. */
export interface Halves {
  readonly oxidation: SplitHalf;
  readonly reduction: SplitHalf;
  readonly electrons: Rational;
}

/**
 * The oxidation and the reduction that add up to `reaction`, spectators aside: by connected elements, and by oxidation
 * numbers where both sides share an element. Null where no two halves give the reaction back. What only changes partners
 * is put into a half (Cu^2+ -> CuO beside NO3^- -> NO2) where nothing else helps.
 */
export const halvesOf = (reaction: Reaction, medium: Medium): Halves | null => {
  if (hasTwoStates(reaction)) return null;
  const forms = ionicForms(reaction, medium);
  const tries = [
    { hosts: null, ranked: false },
    { hosts: null, ranked: true },
    { hosts: reaction, ranked: false },
  ];
  for (const { hosts, ranked } of tries) {
    for (const form of forms) {
      const found = splitIonic(form, hosts, ranked);
      if (found !== null) return found;
    }
  }
  return null;
};

/**
 * `hosts`: the reaction whose formulas say with which half bystanders go; null: there may be none. `ranked`: of species that
 * hold like atoms those with elements of their own are reduced rather than those of the medium's elements, S2O8^2- before
 * H2O2.
 */
const splitIonic = ({ amounts, medium }: IonicReaction, hosts: Reaction | null, ranked: boolean): Halves | null => {
  const terms = termsOf(amounts);
  const background = backgroundOf(helpersOf(medium));
  const rank = (species: Species): number =>
    elementsOf(species).some((element) => !background.elements.has(element)) ? 0 : 1;
  const { flows, decided } = flowsOf(terms, ranked ? rank : undefined);
  const components = componentsOf(terms, flows, { ...background, keys: new Set(medium.helpers.map(({ key }) => key)) });
  const oxidised: Term[] = [];
  const reduced: Term[] = [];
  const bystanders: Component[] = [];
  let given = ZERO;
  for (const component of components) {
    const parts = partsOf(component, background, medium);
    if (parts === null) return null;
    given = given.add(parts.given);
    oxidised.push(...parts.oxidised);
    reduced.push(...parts.reduced);
    if (parts.oxidised.length + parts.reduced.length === 0) bystanders.push(component);
  }
  if (bystanders.length > 0 && hosts === null) return null;
  for (const one of bystanders) {
    const meets = (half: readonly Term[]): boolean => stoodTogether(one.terms, half, hosts, background);
    (meets(oxidised) && !meets(reduced) ? oxidised : reduced).push(...one.terms);
  }
  const halves = joined(oxidised, reduced, { amounts, medium });
  return halves === null || !decided || halves.electrons.equals(given) ? halves : null;
};

/** Elements of both, those of helpers aside, stand in one formula of the reaction: Cu and N in Cu(NO3)2. */
const stoodTogether = (
  one: readonly Term[],
  other: readonly Term[],
  hosts: Reaction | null,
  background: Background,
): boolean => {
  const own = (terms: readonly Term[]): readonly string[] =>
    terms.flatMap(({ species }) => elementsOf(species)).filter((element) => !background.elements.has(element));
  const [here, there] = [own(one), own(other)];
  return (hosts?.terms ?? []).some(({ species }) => {
    const elements = elementsOf(species);
    return elements.some((element) => here.includes(element)) && elements.some((element) => there.includes(element));
  });
};

interface Parts {
  readonly oxidised: readonly Term[];
  readonly reduced: readonly Term[];
  /** Electrons that the oxidised part gives, by the oxidation numbers. */
  readonly given: Rational;
}

/**
 * A component in which some atoms are oxidised and others reduced is divided; one that cannot be, and any other, goes to
 * one half as a whole by the electrons that it exchanges with the others, and to neither if with none.
 */
const partsOf = (component: Component, background: Background, medium: Medium): Parts | null => {
  const completed = completeTerms(component.terms, medium);
  if (completed === null) return null;
  const { flows, terms } = component;
  const sides = sidesOf(component, background);
  const net = signOf(electronsOf(completed));
  const isMixed = sides.includes(1n) && sides.includes(-1n);
  const divided = isMixed ? divide(component, sides, background) : null;
  if (divided !== null) return { ...divided, given: gainOf(flows.filter((_, at) => sides[at] === 1n)) };
  if (isMixed && net === 0n) return null;
  const gain = gainOf(flows);
  return {
    oxidised: net > 0n ? terms : [],
    reduced: net < 0n ? terms : [],
    given: signOf(gain) > 0n ? gain : ZERO,
  };
};

const gainOf = (flows: readonly Flow[]): Rational =>
  flows.reduce((sum, flow) => sum.add(flow.to.sub(flow.from).mul(flow.atoms)), ZERO);

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

/** True where the terms of halves add up to a reaction: the difference is nothing, or so often  H^+ + OH^- - H2O = 0. */
export const givesBack = (sum: readonly Term[], reaction: readonly Term[]): boolean => {
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
