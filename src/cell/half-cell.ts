import { assemble } from '../balance/assemble.ts';
import { explain } from '../balance/explain.ts';
import { minimalBalances } from '../balance/family.ts';
import { speciesMatrix } from '../balance/matrix.ts';
import { type Reaction, plainReaction, showReaction } from '../balance/reaction.ts';
import { proved } from '../balance/recount.ts';
import { type Verdict, solve } from '../balance/solve.ts';
import type { Unknown } from '../balance/unknowns.ts';
import { type Meter, startMeter } from '../exact/bounds.ts';
import { nullSpace } from '../exact/matrix.ts';
import { ZERO } from '../exact/rational.ts';
import type { HalfReaction } from '../redox/half-reaction.ts';
import { WATER, mediumRow } from '../redox/media.ts';
import type { Medium } from '../redox/medium.ts';
import { MOST_SHOWN, cutSentence } from '../redox/coupling/several.ts';
import { type Result, failure, success } from '../report/result.ts';
import { type Species, ELECTRON, isElectron, sameSpecies } from '../species/species.ts';
import type { Electrode } from './cell-reaction.ts';
import { dissociate } from './electrolyte.ts';

/** What stands at one electrode of a diagram. */
export interface HalfCell {
  readonly electrode: Electrode;
  readonly species: readonly Species[];
  /** Terminals that conduct only, where the rest reacts without them. */
  readonly terminals: readonly Species[];
}

/** The half-reaction of a half-cell, what of it stayed idle, and the terminal that was taken as inert. */
export interface HalfCellReaction {
  readonly half: HalfReaction;
  readonly idle: readonly Species[];
  readonly inert: readonly Species[];
}

/** One set of species that may react, with what conservation says of it. */
interface Trial {
  readonly unknowns: readonly Unknown[];
  readonly verdict: Verdict;
  readonly inert: readonly Species[];
}

/**
 * The one half-reaction that the species of a half-cell allow, free in sign: an oxidation at the anode, a reduction at
 * the cathode. Tried in this order: without the terminal and with it; the species as written, then dissolved salts as
 * their ions. Water is implied beside H^+ or OH^-.
 * Faults: `no-electrons`, `several-balances` or `too-hard`, `no-balance`.
 */
export const reactHalfCell = (halfCell: HalfCell): Result<HalfCellReaction> => {
  const meter = startMeter();
  const trials = trialsOf(halfCell, meter);
  const settled = trials.find(({ verdict }) => verdict.kind === 'unique' || verdict.kind === 'family');
  const last = trials.at(-1);
  if (last === undefined) throw new Error('a half-cell is tried at least once');
  if (settled === undefined) return noReaction(last);
  if (settled.verdict.kind === 'unique') return success(reacted(halfCell, settled, settled.verdict.numbers));
  return severalReactions(settled, meter);
};

const trialsOf = ({ electrode, species, terminals }: HalfCell, meter: Meter): readonly Trial[] => {
  const isTerminal = (one: Species): boolean => terminals.some((terminal) => sameSpecies(terminal, one));
  const written = distinct(species);
  const split = distinct(species.flatMap((one) => dissociate(one) ?? [one]));
  const forms = split.some((one) => !written.includes(one)) ? [written, split] : [written];
  const trials = forms.flatMap((form) => [
    { form: form.filter((one) => !isTerminal(one)), inert: form.filter(isTerminal) },
    ...(form.some(isTerminal) ? [{ form, inert: [] }] : []),
  ]);
  return trials.map(({ form, inert }) => {
    const unknowns = unknownsAt(electrode, form);
    return { unknowns, verdict: solve(unknowns, meter), inert };
  });
};

const distinct = (species: readonly Species[]): readonly Species[] =>
  species.filter((one, at) => species.findIndex((other) => sameSpecies(other, one)) === at);

/** The electron stands on the right at the anode, on the left at the cathode, and must take part. */
const unknownsAt = (electrode: Electrode, species: readonly Species[]): readonly Unknown[] => {
  const free = (one: Species, written: boolean): Unknown => ({ species: one, side: 'free', written, helper: !written });
  const ionic = species.some((one) => one.key === 'H^+' || one.key === 'OH^-');
  const water = ionic && !species.some((one) => one.key === WATER.key) ? [free(WATER, false)] : [];
  const side = electrode === 'anode' ? 'right' : 'left';
  const listed = electrode === 'anode' ? species : species.toReversed();
  const isIon = (one: Species): boolean => ['H^+', 'OH^-', 'H2O'].includes(one.key);
  const inOrder = [...listed.filter((one) => !isIon(one)), ...species.filter(isIon)];
  const electron: Unknown = { species: ELECTRON, side, written: false, helper: false };
  return [...inOrder.map((one) => free(one, true)), ...water, electron];
};

const reacted = (halfCell: HalfCell, { unknowns, inert }: Trial, numbers: readonly bigint[]): HalfCellReaction => {
  const reaction = proved(assemble(unknowns, numbers));
  const takesPart = (one: Species): boolean => reaction.terms.some((term) => term.species.key === one.key);
  return {
    half: {
      reaction,
      kind: halfCell.electrode === 'anode' ? 'oxidation' : 'reduction',
      electrons: (reaction.terms.find((term) => isElectron(term.species))?.nu ?? ZERO).abs(),
      medium: mediumOf(unknowns),
      dimension: 1,
    },
    idle: unknowns.filter((one) => one.written && !takesPart(one.species)).map((one) => one.species),
    inert,
  };
};

const mediumOf = (unknowns: readonly Unknown[]): Medium => {
  const has = (key: string): boolean => unknowns.some((one) => one.species.key === key);
  const name = has('H^+') ? 'acid' : has('OH^-') ? 'base' : 'none';
  return { name, helpers: mediumRow(name)?.helpers ?? [] };
};

/** Where the species balance without electrons that balance is told; else why none exists. */
const noReaction = ({ unknowns, verdict }: Trial): Result<never> => {
  if (verdict.kind === 'unique' || verdict.kind === 'family') throw new Error('this half-cell reacts');
  if (verdict.kind === 'too-hard') return failure(explain(verdict, unknowns));
  const matrix = speciesMatrix(unknowns.map((one) => one.species));
  const [line] = nullSpace(matrix.rows, unknowns.length);
  return line === undefined ? failure(explain(verdict, unknowns)) : noElectrons(proved(assemble(unknowns, line)));
};

const noElectrons = (reaction: Reaction): Result<never> =>
  failure({
    code: 'no-electrons',
    message: `this half-cell exchanges no electrons; its species balance as ${plainReaction(reaction)}`,
    hint: 'name both the oxidised and the reduced form beside the electrode',
    reaction: showReaction(reaction),
  });

const severalReactions = ({ unknowns, verdict }: Trial, meter: Meter): Result<never> => {
  const dimension = verdict.kind === 'family' ? verdict.dimension : 2;
  const family = minimalBalances(unknowns, meter);
  if (family.kind === 'too-hard') {
    return failure({
      code: 'too-hard',
      message: 'the reactions that this half-cell allows are too many to list',
      limit: family.limit,
    });
  }
  return failure({
    code: 'several-balances',
    message: `this half-cell allows ${String(dimension)} independent reactions.${cutSentence(family)}`,
    hint: 'name only the oxidised and the reduced form of one couple at each electrode',
    dimension,
    family: family.members.slice(0, MOST_SHOWN).map((numbers) => showReaction(proved(assemble(unknowns, numbers)))),
    couplings: [],
  });
};
