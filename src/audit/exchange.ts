import { HYDROXIDE, PROTON } from '../redox/media.ts';
import { OXONIUM, isHydroxide, isProton } from './helper-ions.ts';
import type { Species } from '../species/species.ts';
import type { Candidate, Problem } from './problem.ts';
import { onRay } from './renumber.ts';
import { balancesOf, onlyOne } from './solve.ts';
import { type Draft, isConserved, signedColumn, surplusOf } from './writing.ts';

/** Class 3: H^+ typed for OH^- or back, the numbers kept where they then conserve, else solved anew. */
export const exchanges = (problem: Problem): readonly Candidate[] =>
  problem.draft.flatMap((term, index) =>
    counterparts(problem, term.species).flatMap((species) => exchangeAt(problem, index, species)),
  );

const counterparts = ({ draft }: Problem, species: Species): readonly Species[] => {
  if (isProton(species)) return [HYDROXIDE];
  if (!isHydroxide(species)) return [];
  return [draft.some((term) => term.species.key === OXONIUM.key) ? OXONIUM : PROTON];
};

const exchangeAt = (problem: Problem, index: number, species: Species): readonly Candidate[] => {
  if (problem.draft.some((term) => term.species.key === species.key)) return [];
  const draft: Draft = problem.draft.map((term, at) =>
    at === index ? { ...term, species: { ...species, state: term.species.state } } : term,
  );
  if (isConserved(surplusOf(draft, problem.columns))) return [{ kind: 'medium-ion', draft }];
  const balances = balancesOf(
    draft.map((term) => signedColumn(problem.columns, term)),
    problem.columns.rowCount,
  );
  const numbers = onlyOne(balances);
  if (numbers?.every((value) => value > 0n) !== true) return [];
  return onRay(problem, draft, numbers, 'medium-ion');
};
