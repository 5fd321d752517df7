import type { Audit } from '../../audit/audit.ts';
import { type Contribution, contributionsOf } from '../../audit/contributions.ts';
import type { CellAudit } from '../../audit/cell.ts';
import { showLedger } from '../../balance/ledger.ts';
import { showReaction } from '../../balance/reaction.ts';
import { type Rational, ONE, showRational } from '../../exact/rational.ts';
import type { Equation } from '../../species/equation.ts';
import { plainSpecies, plainWithState } from '../../species/species.ts';
import type { CellEquations } from '../audits.ts';
import type { CellAuditAnswer, EquationAuditAnswer } from '../schema/answer.ts';

/** What one term of an equation puts into the ledger. */
const showContribution = ({ species, side, coefficient, amounts }: Contribution): ShownContribution => ({
  term: `${coefficient.equals(ONE) ? '' : `${showRational(coefficient)} `}${plainWithState(species)}`,
  side,
  amounts: Object.fromEntries([...amounts].map(([label, amount]) => [label, showRational(amount)])),
});

type ShownContribution = NonNullable<EquationAuditAnswer['contributions']>[number];

/** The answer to an audit of one equation; with what each term of `written` puts into the ledger, where one is given. */
export const showAudit = (audit: Audit, written: Equation | null = null): EquationAuditAnswer => ({
  verdict: audit.verdict,
  residual: Object.fromEntries([...audit.residual].map(([label, off]) => [label, showRational(off)])),
  dimension: audit.dimension,
  ledger: showLedger(audit.ledger),
  repairs: audit.repairs.map(({ kind, reaction, edits, improbable }) => ({
    kind,
    reaction: showReaction(reaction),
    edits,
    ...(improbable ? { improbable: true as const } : {}),
  })),
  ...(written === null ? {} : { contributions: contributionsOf(written).map(showContribution) }),
});

const showNumber = (value: Rational | null): string | null => (value === null ? null : showRational(value));

/** The answer to an audit of a whole cell; `written` as in `showAudit`. */
export const showCellAudit = (
  { verdict, parts, multipliers, electrons, failed, electronsPerMole }: CellAudit,
  written: CellEquations | null = null,
): CellAuditAnswer => ({
  verdict,
  parts: {
    anode: showAudit(parts.anode, written?.anode),
    cathode: showAudit(parts.cathode, written?.cathode),
    overall: showAudit(parts.overall, written?.overall),
  },
  ...(multipliers === null
    ? {}
    : { multipliers: { anode: showRational(multipliers.anode), cathode: showRational(multipliers.cathode) } }),
  electrons: { claimed: showNumber(electrons.claimed), found: showNumber(electrons.found) },
  failed,
  electronsPerMole: Object.fromEntries(
    electronsPerMole.map(({ species, electrons: each }) => [plainSpecies(species), showRational(each)]),
  ),
});
