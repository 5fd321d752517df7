import { type Audit, auditEquation } from '../audit/audit.ts';
import { type CellAudit, auditCell } from '../audit/cell.ts';
import { type MediumChoice, chooseMedium } from '../redox/choose-medium.ts';
import type { Medium } from '../redox/medium.ts';
import { type Result, chain, inField, map, success } from '../report/result.ts';
import type { Equation } from '../species/equation.ts';
import { type DeskOptions, readWritten } from './hydronium.ts';
import { allByRank } from '../report/precedence.ts';
import type { AskOf } from './schema/ask.ts';
import { readExact, readMedium } from './settings.ts';

type AuditAsk = AskOf<'audit'>;
type EquationAsk = Extract<AuditAsk, { readonly equation: string }>;
type CellAsk = Exclude<AuditAsk, EquationAsk>;

/** In an audit a medium is only a check: left out, none is assumed. */
const statedMedium = (choice: MediumChoice, equation: Equation): Result<Medium | undefined> =>
  choice === undefined ? success(undefined) : chooseMedium(choice, equation);

/** An audit with the equation it is of, for what else is said of that. */
export interface AuditOf<Written, Judged> {
  readonly written: Written;
  readonly audit: Judged;
}

/** The three equations of a cell. */
export type CellEquations = Readonly<Record<'anode' | 'cathode' | 'overall', Equation>>;

/** One equation as written: read, then audited. */
export const auditOfEquation = (ask: EquationAsk, options: DeskOptions): Result<AuditOf<Equation, Audit>> =>
  chain(inField(readWritten(ask.equation, options), 'equation'), (written) =>
    chain(readMedium(ask.medium, options), (choice) =>
      chain(statedMedium(choice, written), (medium) =>
        map(inField(auditEquation(written, medium), 'equation'), (audit) => ({ written, audit })),
      ),
    ),
  );

/** The three equations of a cell and its electron number as claimed: read, then audited together. */
export const auditOfCell = (ask: CellAsk, options: DeskOptions): Result<AuditOf<CellEquations, CellAudit>> => {
  const texts = [ask.anode, ask.cathode, ask.overall];
  const fields = ['anode', 'cathode', 'overall'];
  const equations = allByRank(texts.map((text, at) => inField(readWritten(text, options), fields[at] ?? '')));
  return chain(equations, ([anode, cathode, overall]) => {
    if (anode === undefined || cathode === undefined || overall === undefined) throw new RangeError('three equations');
    return chain(claimOf(ask), (claim) =>
      chain(readMedium(ask.medium, options), (choice) =>
        chain(statedMedium(choice, anode), (medium) => {
          const written = { anode, cathode, overall };
          const claimed = { ...written, ...claim, ...(medium === undefined ? {} : { medium }) };
          return map(auditCell(claimed), (audit) => ({ written, audit }));
        }),
      ),
    );
  });
};

const claimOf = ({ electrons }: CellAsk) =>
  electrons === undefined
    ? success({})
    : map(readExact(electrons, 'electrons', '"2"'), (claimed) => ({ electrons: claimed }));
