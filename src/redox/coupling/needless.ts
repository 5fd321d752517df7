import { type Result, failure } from '../../report/result.ts';

/** The fault `bad-ask` for a `settle` where conservation alone settles the skeleton. */
export const needless = (settle: string): Result<never> =>
  failure({
    code: 'bad-ask',
    field: 'settle',
    message: `Nothing is to be settled by ${JSON.stringify(settle)}: here conservation leaves one balance.`,
    hint: 'Leave settle out.',
  });
