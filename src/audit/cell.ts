import { type Reaction, plainReaction } from '../balance/reaction.ts';
import { type Rational, isZero, showRational, signOf } from '../exact/rational.ts';
import type { Medium } from '../redox/medium.ts';
import { type Note, note } from '../report/note.ts';
import { type Result, chain, inField, success } from '../report/result.ts';
import type { Equation } from '../species/equation.ts';
import { type Species, isElectron } from '../species/species.ts';
import { type Audit, type Verdict, auditEquation } from './audit.ts';
import { claimNotes } from './claimed-electrons.ts';
import { type Combination, type Composition, combinationOf, composed, electronsGiven } from './combination.ts';
import { spectatorNotes } from './spectators.ts';

/** A cell as somebody wrote it down: two electrode equations, the overall one, and the electron number claimed. */
export interface ClaimedCell {
  readonly anode: Equation;
  readonly cathode: Equation;
  readonly overall: Equation;
  /** At the scale of the overall equation. */
  readonly electrons?: Rational;
  readonly medium?: Medium;
}

/** What can fail. */
export type CellPart = 'anode' | 'cathode' | 'overall' | 'electrons';

/** The audits of the three equations. */
export type Parts = Readonly<Record<'anode' | 'cathode' | 'overall', Audit>>;

/** The audit of a whole cell. */
export interface CellAudit {
  /** `unbalanced` where anything failed. */
  readonly verdict: Verdict;
  readonly parts: Parts;
  /** What takes the electrode equations to the overall one; null where nothing does. */
  readonly multipliers: { readonly anode: Rational; readonly cathode: Rational } | null;
  readonly electrons: { readonly claimed: Rational | null; readonly found: Rational | null };
  readonly failed: readonly CellPart[];
  /** Moles of electrons per mole of each product of the overall reaction; empty where no electron number was found. */
  readonly electronsPerMole: readonly { readonly species: Species; readonly electrons: Rational }[];
}

/** A part as written, repaired, or turned around. */
interface Version {
  readonly reaction: Reaction;
  readonly asWritten: boolean;
}

interface Match {
  readonly anode: Version;
  readonly cathode: Version;
  readonly overall: Version;
  readonly combination: Combination;
}

/** The most repairs of one part that are tried against the other parts. */
const MOST_VERSIONS = 3;

/**
 * Which part of a claimed cell fails, how the electrode equations make the overall one, and the electrons of each
 * product. Where a part does not balance, that one of its likely repairs is taken that fits the other parts. Nothing
 * faults but what `auditEquation` does.
 */
export const auditCell = (claimed: ClaimedCell): Result<CellAudit> =>
  chain(auditOf(claimed, 'anode'), (anode) =>
    chain(auditOf(claimed, 'cathode'), (cathode) =>
      chain(auditOf(claimed, 'overall'), (overall) => judged({ anode, cathode, overall }, claimed.electrons ?? null)),
    ),
  );

/** The audit of one part, its notes with the name of the part. The medium is that of the electrodes. */
const auditOf = (claimed: ClaimedCell, part: keyof Parts): Result<Audit> => {
  const result = inField(auditEquation(claimed[part], part === 'overall' ? undefined : claimed.medium), part);
  if (!result.ok) return result;
  const notes = result.notes.filter(({ code }) => part !== 'overall' || code !== 'electrons-left');
  return success(
    result.value,
    [...notes, ...electronNotes(result.value, part)].map(({ code, message }) => note(code, `${part}: ${message}`)),
  );
};

const electronNotes = ({ reaction }: Audit, part: keyof Parts): readonly Note[] =>
  part === 'overall' && reaction.terms.some(({ species }) => isElectron(species))
    ? [note('electrons-left', 'Electrons are left in the overall equation.')]
    : [];

/** The cell that the parts make, or that the electrode equations alone make. */
interface Made {
  readonly match: Match | null;
  readonly overall: Reaction | null;
  readonly electrons: Rational | null;
}

const madeOf = (parts: Parts): Made => {
  const match = matchOf(parts);
  if (match !== null) return { match, overall: match.overall.reaction, electrons: match.combination.electrons };
  const sum = sumOfHalves(parts);
  return { match, overall: sum?.overall ?? null, electrons: sum?.combination.electrons ?? null };
};

const judged = (parts: Parts, claimed: Rational | null): Result<CellAudit> => {
  const made = madeOf(parts);
  const wrongNumber = claimNotes(claimed, made.electrons);
  const failed = [...failedParts(parts, made), ...wrongNumber.map(() => 'electrons' as const)];
  const audit: CellAudit = {
    verdict: failed.length > 0 ? 'unbalanced' : parts.overall.verdict,
    parts,
    multipliers: made.match === null ? null : made.match.combination,
    electrons: { claimed, found: made.electrons },
    failed,
    electronsPerMole: perMole(made),
  };
  return success(audit, [...directionNotes(parts), ...sumNotes(made), ...ionicNotes(parts, made), ...wrongNumber]);
};

/** As written where it balances, else its likely repairs; an electrode also turned around. */
const versionsOf = ({ residual, reaction, repairs }: Audit): readonly Version[] =>
  residual.size === 0
    ? [{ reaction, asWritten: true }]
    : repairs.slice(0, MOST_VERSIONS).map((repair) => ({ reaction: repair.reaction, asWritten: false }));

const turned = ({ reaction }: Version): Version => ({
  reaction: { terms: reaction.terms.map(({ species, nu }) => ({ species, nu: nu.neg() })) },
  asWritten: false,
});

/** The first versions of the parts that make one cell, as many as possible as written. */
const matchOf = (parts: Parts): Match | null => {
  const electrode = (audit: Audit, direction: bigint): readonly Version[] =>
    versionsOf(audit).map((version) =>
      signOf(electronsGiven(version.reaction)) === -direction ? turned(version) : version,
    );
  // electrons that are left over make no overall equation, though multiples of the electrodes may add up to it
  const whole = versionsOf(parts.overall).filter(({ reaction }) => isZero(electronsGiven(reaction)));
  for (const overall of whole) {
    for (const anode of electrode(parts.anode, 1n)) {
      for (const cathode of electrode(parts.cathode, -1n)) {
        const combination = combinationOf(anode.reaction, cathode.reaction, overall.reaction);
        if (combination !== null) return { anode, cathode, overall, combination };
      }
    }
  }
  return null;
};

/** What the electrode equations make of themselves, each as written or as first repaired. */
const sumOfHalves = ({ anode, cathode }: Parts): Composition | null => {
  const [first] = versionsOf(anode);
  const [second] = versionsOf(cathode);
  return first === undefined || second === undefined ? null : composed(first.reaction, second.reaction);
};

const failedParts = (parts: Parts, { match, overall }: Made): readonly CellPart[] => {
  const runs = { anode: 1n, cathode: -1n } as const;
  const electrodes = (['anode', 'cathode'] as const).filter(
    (part) => parts[part].verdict === 'unbalanced' || signOf(electronsGiven(parts[part].reaction)) !== runs[part],
  );
  // where the electrodes make nothing, they cannot speak against the overall equation
  const refuted = match === null && overall !== null;
  return parts.overall.verdict === 'unbalanced' || refuted ? [...electrodes, 'overall'] : electrodes;
};

const directionNotes = (parts: Parts): readonly Note[] => {
  const wrong = (part: 'anode' | 'cathode', sign: bigint): boolean =>
    parts[part].residual.size === 0 && signOf(electronsGiven(parts[part].reaction)) === sign;
  return [
    ...(wrong('anode', -1n) ? [note('electrode-turned', 'A reduction is written at the anode.')] : []),
    ...(wrong('cathode', 1n) ? [note('electrode-turned', 'An oxidation is written at the cathode.')] : []),
  ];
};

const sumNotes = ({ match, overall, electrons }: Made): readonly Note[] => {
  if (match !== null) return [];
  const start = 'No multiples of the electrode equations make the overall equation';
  if (overall === null || electrons === null) return [note('not-the-sum', `${start}.`)];
  const text = overall.terms.length === 0 ? 'nothing' : plainReaction(overall);
  return [note('not-the-sum', `${start}: they make ${text} with ${showRational(electrons)} electrons.`)];
};

/** Where an overall equation that conserves is the sum only once it is taken apart into ions. */
const ionicNotes = ({ anode, cathode, overall }: Parts, { match }: Made): readonly Note[] => {
  const [first] = versionsOf(anode);
  const [second] = versionsOf(cathode);
  if (match !== null || overall.residual.size > 0 || first === undefined || second === undefined) return [];
  return spectatorNotes(first.reaction, second.reaction, overall.reaction);
};

const perMole = ({ overall, electrons }: Made): CellAudit['electronsPerMole'] =>
  (overall?.terms ?? []).flatMap(({ species, nu }) =>
    signOf(nu) > 0n && !isElectron(species) && electrons !== null ? [{ species, electrons: electrons.div(nu) }] : [],
  );
