import type { Species } from '../species/species.ts';
import type { Companion, Parts } from './alongside.ts';
import type { AnswerUnits, Quantity } from './answered.ts';
import type { Circuit } from './branches.ts';
import type { Budget } from './budget.ts';
import type { Derived } from './derivation.ts';
import type { Given, GivenTexts } from './given.ts';
import type { Correlation } from './measured.ts';
import type { Problem } from './problem.ts';
import type { QuantityName } from './quantities.ts';
import type { Stack } from './stack.ts';

/**
 * What the desk asks of this floor. `given` and `want` are the texts of the ask. `cells` and `bypass` (a stack of n cells
 * in series; the part of the current that misses them), `correlations` (coefficients between inputs, by quantity name)
 * and `budget` go beyond the contract's fields and may be left out.
 */
export interface AmountsRequest extends Stack {
  readonly circuit: Circuit;
  readonly species: Species;
  readonly given: GivenTexts;
  readonly want?: Readonly<Record<string, string>>;
  readonly correlations?: readonly Correlation[];
  readonly budget?: boolean;
}

/** How a quantity came about: its relation and what entered it. */
export interface DerivedQuantity {
  readonly quantity: QuantityName;
  readonly relation: string;
}

/** The contract's answer to `amounts`, and how each quantity was derived; budgets on request. */
export interface AmountsAnswer {
  readonly quantities: Readonly<Record<string, Quantity>>;
  readonly alongside: Readonly<Record<string, Readonly<Record<string, Quantity>>>>;
  readonly electronsPerMole: Readonly<Record<string, string>>;
  readonly derived: readonly DerivedQuantity[];
  readonly budgets?: Readonly<Record<string, Budget>>;
}

/** Everything on the way from what was given to the answer. */
export interface Working {
  readonly request: AmountsRequest;
  readonly problem: Problem;
  readonly given: readonly Given[];
  readonly derived: Derived;
  readonly parts: Parts;
  readonly companions: readonly Companion[];
  readonly units: AnswerUnits;
}
