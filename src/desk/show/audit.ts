import type { Audit } from '../../audit/audit.ts';
import type { CellAudit } from '../../audit/cell.ts';
import { showLedger } from '../../balance/ledger.ts';
import { showReaction } from '../../balance/reaction.ts';
import { type Rational, showRational } from '../../exact/rational.ts';
import { plainSpecies } from '../../species/species.ts';
import type { CellAuditAnswer, EquationAuditAnswer } from '../schema/answer.ts';

/** The answer to an audit of one equation. */
export const showAudit = (audit: Audit): EquationAuditAnswer => ({
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
});

const showNumber = (value: Rational | null): string | null => (value === null ? null : showRational(value));

/** The answer to an audit of a whole cell. */
export const showCellAudit = ({
  verdict,
  parts,
  multipliers,
  electrons,
  failed,
  electronsPerMole,
}: CellAudit): CellAuditAnswer => ({
  verdict,
  parts: { anode: showAudit(parts.anode), cathode: showAudit(parts.cathode), overall: showAudit(parts.overall) },
  ...(multipliers === null
    ? {}
    : { multipliers: { anode: showRational(multipliers.anode), cathode: showRational(multipliers.cathode) } }),
  electrons: { claimed: showNumber(electrons.claimed), found: showNumber(electrons.found) },
  failed,
  electronsPerMole: Object.fromEntries(
    electronsPerMole.map(({ species, electrons: each }) => [plainSpecies(species), showRational(each)]),
  ),
});
