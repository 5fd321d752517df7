import { isZero, signOf } from '../exact/rational.ts';
import { WATER } from '../redox/media.ts';
import { type Species, ELECTRON, isElectron } from '../species/species.ts';
import { isHydroxide, isProton } from './helper-ions.ts';
import { type Candidate, type Problem, addedTerm } from './problem.ts';
import type { RepairKind } from './repair-kinds.ts';
import { bestScales } from './scale.ts';
import { balancesOf, completion, onlyOne } from './solve.ts';
import { type Draft, type DraftTerm, signedColumn } from './writing.ts';

/** Classes 4 and 5: helpers of the medium or electrons that were forgotten. */
export const additions = (problem: Problem): readonly Candidate[] =>
  forgotten(problem).flatMap((species) => additionOf(problem, species));

/** The sets of species that may have been forgotten together, the smallest first. */
const forgotten = (problem: Problem): readonly (readonly Species[])[] => {
  const isWritten = (species: Species): boolean => problem.draft.some((term) => term.species.key === species.key);
  const helpers = problem.helpers.filter((species) => !isWritten(species));
  const pairs = helpers.flatMap((second, index) => helpers.slice(0, index).map((first) => [first, second]));
  const sets = [...helpers.map((one) => [one]), ...pairs.filter((pair) => !isWaterTornApart(pair))];
  if (isWritten(ELECTRON)) return sets;
  const charged = problem.draft.some(({ species }) => !isZero(species.charge));
  return charged ? [...sets, [ELECTRON], ...sets.map((set) => [...set, ELECTRON])] : sets;
};

/** H^+ and OH^- together are water. */
const isWaterTornApart = (pair: readonly Species[]): boolean => pair.some(isProton) && pair.some(isHydroxide);

const additionOf = (problem: Problem, species: readonly Species[]): readonly Candidate[] => {
  const kind: RepairKind = species.some(isElectron) ? 'electrons' : 'helpers';
  const amounts = completion(
    problem.surplus,
    species.map((one) => problem.columns.of(one)),
  );
  if (amounts?.some(isZero) === true) return [];
  if (amounts === null) return resolvedWith(problem, species, kind);
  const added = species.flatMap((one, index) => {
    const amount = amounts[index];
    return amount === undefined
      ? []
      : [addedTerm(inState(one, problem), signOf(amount) > 0n ? 'right' : 'left', amount.abs())];
  });
  return [{ kind, draft: inserted(problem.draft, added) }];
};

/** `species` with the state that it has in solution, where all the rest is written with states. */
const inState = (species: Species, { draft }: Problem): Species => {
  const matter = draft.filter((term) => !isElectron(term.species));
  if (isElectron(species) || matter.some((term) => term.species.state === null)) return species;
  if (species.key === WATER.key) return { ...species, state: 'l' };
  return isZero(species.charge) ? species : { ...species, state: 'aq' };
};

/** The only balance of the written species with `species`, if it keeps every written one on its side. */
const resolvedWith = (problem: Problem, species: readonly Species[], kind: RepairKind): readonly Candidate[] => {
  const count = problem.draft.length;
  const signed = problem.draft.map((term) => signedColumn(problem.columns, term));
  const columns = [...signed, ...species.map((one) => problem.columns.of(one))];
  const found = onlyOne(balancesOf(columns, problem.columns.rowCount));
  if (found === null) return [];
  const numbers = (found[0] ?? 0n) < 0n ? found.map((value) => -value) : found;
  if (!numbers.every((value, index) => (index < count ? value > 0n : value !== 0n))) return [];
  const added = species.map((one, index) =>
    addedTerm(inState(one, problem), (numbers[count + index] ?? 0n) > 0n ? 'right' : 'left'),
  );
  const written = [...problem.draft.map(({ coefficient }) => coefficient), ...species.map(() => null)];
  const sizes = numbers.map((value) => (value < 0n ? -value : value));
  return bestScales(sizes, written, problem.denominator).map((scaled) => {
    const renumber = (term: DraftTerm, index: number): DraftTerm => ({
      ...term,
      coefficient: scaled[index] ?? term.coefficient,
    });
    const kept = problem.draft.map(renumber);
    return {
      kind,
      draft: inserted(
        kept,
        added.map((term, index) => renumber(term, count + index)),
      ),
    };
  });
};

/** `draft` with `added` at the end of their sides, before electrons that close a side. */
export const inserted = (draft: Draft, added: Draft): Draft =>
  (['left', 'right'] as const).flatMap((side) => {
    const here = draft.filter((term) => term.side === side);
    const coming = added.filter((term) => term.side === side);
    const closing = here.at(-1);
    const end = closing !== undefined && isElectron(closing.species) ? -1 : here.length;
    return [...here.slice(0, end), ...coming, ...here.slice(end)];
  });
