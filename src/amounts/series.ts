import { type Result, all, chain, failure, success } from '../report/result.ts';
import { computeAmounts } from './amounts.ts';
import type { Quantity } from './answered.ts';
import type { GivenTexts } from './given.ts';
import type { AmountsAnswer, AmountsRequest } from './working.ts';

/** Quantities that fix the charge through every cell of a series. */
const FLOWS = ['charge', 'current', 'time', 'record'] as const;

const chargeText = ({ value, unit, uncertainty }: Quantity): string =>
  `${String(value)} ${unit}${uncertainty === undefined ? '' : ` ± ${String(uncertainty)} ${unit}`}`;

const chargeOf = (request: AmountsRequest): string | undefined => {
  const answer = computeAmounts({ ...request, want: {} });
  const charge = answer.ok ? answer.value.quantities['charge'] : undefined;
  return charge === undefined ? undefined : chargeText(charge);
};

/** The first cell whose own figures give a charge measures it for all: a coulometer. */
const measuredCharge = (requests: readonly AmountsRequest[]): string | undefined => {
  for (const request of requests) {
    const charge = chargeOf(request);
    if (charge !== undefined) return charge;
  }
  return undefined;
};

const inCell = (result: Result<AmountsAnswer>, index: number): Result<AmountsAnswer> =>
  result.ok ? result : failure({ ...result.fault, field: `series[${String(index)}].${result.fault.field ?? 'given'}` });

/**
 * Cells in series: one charge flows through all of them. `common` is given for every cell; where it holds no charge,
 * the first cell whose own figures give one (a coulometer) measures it for the others. A cell's own figures stand above
 * the common ones. Faults: those of `computeAmounts`, with the field in `series[i]`.
 */
export const computeSeries = (
  requests: readonly AmountsRequest[],
  common: GivenTexts,
): Result<readonly AmountsAnswer[]> => {
  const own = requests.map((request) => ({ ...request, given: { ...common, ...request.given } }));
  const charge = measuredCharge(own);
  const flows = (given: GivenTexts): boolean => FLOWS.some((name) => given[name] !== undefined);
  const lent = own.map((request) =>
    charge === undefined || flows(request.given) ? request : { ...request, given: { ...request.given, charge } },
  );
  return chain(all(lent.map((request, index) => inCell(computeAmounts(request), index))), (answers) =>
    success(answers),
  );
};
