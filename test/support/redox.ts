import { expect } from 'vitest';
import { showRational } from '../../src/exact/rational.ts';
import { plainReaction } from '../../src/balance/reaction.ts';
import type { MediumChoice } from '../../src/redox/choose-medium.ts';
import { completeHalf } from '../../src/redox/half.ts';
import { balanceOverall } from '../../src/redox/overall.ts';
import type { Fault } from '../../src/report/fault.ts';
import { plain, plainEquation } from './plain.ts';

const NAMED = /^[a-z-]+$/;

/** A medium as a table writes it: a name, a list of helpers parted by commas, or nothing. */
export const mediumOf = (text: string): MediumChoice => {
  if (text === '') return undefined;
  return NAMED.test(text) ? text : { helpers: text.split(/,\s*/).map(plain) };
};

/** What completing a half-reaction gives, in plain words. */
export interface HalfOutcome {
  readonly reaction: string;
  readonly kind: string;
  readonly electrons: string;
  readonly dimension: number;
  readonly notes: readonly string[];
}

/** The half-reaction of a plain skeleton, or its fault. */
export const half = (skeleton: string, medium = '', settle?: string): HalfOutcome | Fault => {
  const result = completeHalf(plainEquation(skeleton), mediumOf(medium), settle);
  if (!result.ok) return result.fault;
  const { reaction, kind, electrons, dimension } = result.value;
  const notes = result.notes.map(({ code }) => code);
  return { reaction: plainReaction(reaction), kind, electrons: showRational(electrons), dimension, notes };
};

/** What balancing an overall reaction gives, in plain words. */
export interface OverallOutcome {
  readonly reaction: string;
  readonly dimension: number;
  readonly notes: readonly string[];
}

/** The overall reaction of a plain skeleton, or its fault. */
export const overall = (skeleton: string, medium = '', settle?: string): OverallOutcome | Fault => {
  const result = balanceOverall(plainEquation(skeleton), mediumOf(medium), settle);
  if (!result.ok) return result.fault;
  const { reaction, dimension } = result.value;
  return { reaction: plainReaction(reaction), dimension, notes: result.notes.map(({ code }) => code) };
};

/** `outcome` is a fault with this code, and is given back as such. */
export const faultWith = <Code extends Fault['code']>(
  outcome: Fault | object,
  code: Code,
): Fault & { readonly code: Code } => {
  expect(outcome).toMatchObject({ code });
  return outcome as Fault & { readonly code: Code };
};
