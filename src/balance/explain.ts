import type { Fault } from '../report/fault.ts';
import type { Span } from '../report/span.ts';
import { plainSpecies } from '../species/species.ts';
import { assemble } from './assemble.ts';
import { certificateOf } from './certificate.ts';
import { type Reaction, plainReaction, showReaction } from './reaction.ts';
import type { Verdict, Weights } from './solve.ts';
import type { Unknown } from './unknowns.ts';

/** The verdicts that are faults by themselves. */
export type Impossible = Exclude<Verdict, { readonly kind: 'unique' | 'family' }>;

/** The fault of an impossible skeleton, placed at the species that is meant where it is one. */
export const explain = (verdict: Impossible, unknowns: readonly Unknown[]): Fault => {
  if (verdict.kind === 'no-balance') return noBalance(verdict.weights, unknowns);
  if (verdict.kind === 'too-hard') return tooHard(verdict.limit, unknowns.length);
  const unknown = unknowns[verdict.index];
  if (unknown === undefined) throw new Error('a verdict must point at an unknown');
  if (verdict.kind === 'missing-element') return missingElement(verdict.element, unknown);
  if (verdict.kind === 'idle-species') return idleSpecies(unknown);
  return wrongSide(unknown, verdict.numbers, unknowns);
};

const tooHard = (limit: string, count: number): Fault => ({
  code: 'too-hard',
  limit,
  message: `Whether these ${String(count)} species can balance takes more than ${limit} to find out.`,
  hint: 'Take species out, or split the skeleton.',
});

const placed = (unknown: Unknown): { readonly span?: Span } =>
  unknown.span === undefined ? {} : { span: unknown.span };

const opposite = (side: Unknown['side']): string => (side === 'left' ? 'right' : 'left');

const missingElement = (element: string, unknown: Unknown): Fault => ({
  code: 'missing-element',
  element,
  message: `${element} stands on the ${unknown.side} only (${plainSpecies(unknown.species)}), and no helper of the medium holds it.`,
  hint: `Write a species with ${element} on the ${opposite(unknown.side)}, or give a medium with a helper that holds ${element}.`,
  ...placed(unknown),
});

const idleSpecies = (unknown: Unknown): Fault => {
  const species = plainSpecies(unknown.species);
  return {
    code: 'idle-species',
    species,
    message: `${species} takes no part: every balance of this skeleton leaves it out.`,
    hint: `Leave ${species} out.`,
    ...placed(unknown),
  };
};

const wrongSide = (unknown: Unknown, numbers: readonly bigint[], unknowns: readonly Unknown[]): Fault => {
  const species = plainSpecies(unknown.species);
  const reaction = assembleMoved(unknowns, numbers);
  return {
    code: 'wrong-side',
    species,
    reaction: showReaction(reaction),
    message: `${species} cannot stand on the ${unknown.side}: with it on the ${opposite(unknown.side)} this is ${plainReaction(reaction)}.`,
    hint: `Write ${species} on the ${opposite(unknown.side)}.`,
    ...placed(unknown),
  };
};

/** As if written where it ends: what keeps its side is printed before what changes it, helpers and electron stay last. */
const assembleMoved = (unknowns: readonly Unknown[], numbers: readonly bigint[]): Reaction => {
  const rank = (unknown: Unknown, nu: bigint): number =>
    !unknown.written ? 2 : unknown.side === (nu < 0n ? 'right' : 'left') ? 1 : 0;
  const pairs = unknowns.map((unknown, index) => ({ unknown, nu: numbers[index] ?? 0n }));
  const sorted = pairs.toSorted((a, b) => rank(a.unknown, a.nu) - rank(b.unknown, b.nu));
  return assemble(
    sorted.map(({ unknown }) => unknown),
    sorted.map(({ nu }) => nu),
  );
};

const noBalance = (weights: Weights, unknowns: readonly Unknown[]): Fault => {
  const certificate = certificateOf(weights, unknowns);
  return {
    code: 'no-balance',
    certificate,
    message: `This cannot be balanced: ${certificate.text}.`,
    hint: 'Check the products, or give a medium whose helpers carry what is missing.',
  };
};
