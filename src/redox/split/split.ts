import { type Reaction, type Term, plainReaction, showReaction } from '../../balance/reaction.ts';
import { type Rational, isZero } from '../../exact/rational.ts';
import { type Note, note } from '../../report/note.ts';
import { type Result, failure, success } from '../../report/result.ts';
import { PROTON, mediumRow } from '../media.ts';
import type { Medium } from '../medium.ts';
import { termsOf } from './amounts.ts';
import { type SplitHalf, electronsOf, halfOfTerms } from './complete.ts';
import { type Flow, type OxidationChange, distinctChanges, elementsOf, flowsOf, increaseIn } from './flows.ts';
import { type Halves, givesBack, halvesOf } from './halves.ts';
import { ionicHalf, ionicReaction } from './ionic.ts';

/** What is split: an overall reaction in its medium, with the halves of a coupling where one settled it. */
export interface Unsplit {
  readonly reaction: Reaction;
  readonly medium: Medium;
  /** Whole and primitive, with their electrons; null where conservation gave the reaction or a ratio settled it. */
  readonly halves: { readonly oxidation: Reaction; readonly reduction: Reaction } | null;
  /** Exchanged between those halves at the scale of the reaction. */
  readonly exchanged: Rational | null;
}

/** How an overall reaction comes of an oxidation and a reduction. */
export interface RedoxSplit {
  /** Exchanged between the halves at the scale of the reaction; without halves the sum of all increases. */
  readonly electrons: Rational;
  /** Null where no two halves add up to the reaction. */
  readonly oxidation: SplitHalf | null;
  readonly reduction: SplitHalf | null;
  readonly changes: readonly OxidationChange[];
}

/**
 * The halves, the electrons and the changes of oxidation number of an overall reaction.
 * Fault: `no-electrons` where nothing is oxidised or reduced. Notes: `halves-omitted`, `no-oxidation-numbers`.
 */
export const splitReaction = (unsplit: Unsplit): Result<RedoxSplit> => {
  const { reaction, medium } = unsplit;
  const { flows, decided } = flowsOf(reaction.terms);
  const halves = chosenHalves(unsplit, halvesOf(reaction, medium));
  const electrons = halves?.electrons ?? increaseIn(flows);
  if (isZero(electrons)) return noElectrons(reaction, decided);
  const split = {
    electrons,
    oxidation: halves?.oxidation ?? null,
    reduction: halves?.reduction ?? null,
    changes: distinctChanges(halves === null ? flows : flowsInHalves(halves, reaction)),
  };
  return success(split, [...(halves === null ? [halvesOmitted()] : []), ...(decided ? [] : [undecided()])]);
};

/** A coupling's own halves count if they add up, but where those found exchange as many electrons they are better spelled. */
const chosenHalves = ({ reaction, medium, halves, exchanged }: Unsplit, found: Halves | null): Halves | null => {
  if (halves === null || exchanged === null || found?.electrons.equals(exchanged) === true) return found;
  const scaled = [halves.oxidation, halves.reduction].flatMap(({ terms }) =>
    terms.map(({ species, nu }) => ({ species, nu: nu.mul(exchanged.div(electronsOf(terms).abs())) })),
  );
  if (!givesBack(scaled, reaction.terms)) return found;
  const molecular = reaction.terms.every(({ species }) => isZero(species.charge));
  const ionic = ionicReaction(reaction, medium, 'dissolved');
  const spelled = [...termsOf(ionic.amounts), ...reaction.terms].map(({ species }) => species);
  const taken = (own: Reaction): SplitHalf => {
    const terms = molecular ? ionicHalf(own, ionic.medium) : own.terms;
    const { half } = halfOfTerms(terms, mediumOf(terms, ionic.medium), spelled);
    return { half, multiplier: exchanged.div(half.electrons) };
  };
  return { oxidation: taken(halves.oxidation), reduction: taken(halves.reduction), electrons: exchanged };
};

/** Acid where a half hands H^+ to the other though the medium lends none. */
const mediumOf = (half: readonly Term[], medium: Medium): Medium => {
  const acid = mediumRow('acid');
  const handsOver = half.some(({ species }) => species.key === PROTON.key);
  if (acid === undefined || !handsOver || medium.helpers.some(({ key }) => key === PROTON.key)) return medium;
  return { name: acid.name, helpers: acid.helpers };
};

/** The changes in each half by itself, the elements in the order of the reaction: what two halves show, the sum may hide. */
const flowsInHalves = ({ oxidation, reduction }: Halves, reaction: Reaction): readonly Flow[] => {
  const elements = [...new Set(reaction.terms.flatMap(({ species }) => elementsOf(species)))];
  return [oxidation, reduction]
    .flatMap(({ half }) => flowsOf(half.reaction.terms).flows)
    .toSorted((a, b) => elements.indexOf(a.element) - elements.indexOf(b.element));
};

const noElectrons = (reaction: Reaction, decided: boolean): Result<never> => {
  const plain = plainReaction(reaction);
  const open = decided ? '' : ' as far as convention decides the oxidation numbers';
  return failure({
    code: 'no-electrons',
    message: `Nothing is oxidised or reduced${open}: this balances as ${plain}.`,
    hint: 'Write a product in which an element has another oxidation number.',
    reaction: showReaction(reaction),
  });
};

const halvesOmitted = (): Note =>
  note('halves-omitted', 'No two half-reactions were found that add up to the overall reaction.');

const undecided = (): Note =>
  note(
    'no-oxidation-numbers',
    'Convention does not decide the oxidation numbers of every species: changes of their elements are left out.',
  );
