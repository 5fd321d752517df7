import { type Rational, ZERO, showRational, signOf } from '../exact/rational.ts';
import { type Label, CHARGE, amountOf } from './matrix.ts';
import type { Reaction } from './reaction.ts';

/** Atoms of each element and the charge: on the left and on the right. Elements as they appear, the charge last. */
export type Ledger = ReadonlyMap<Label, readonly [Rational, Rational]>;

/** The ledger of `reaction`; the charge is always in it. */
export const ledgerOf = (reaction: Reaction): Ledger => {
  const elements = new Set(reaction.terms.flatMap((term) => [...term.species.composition.keys()]));
  return new Map([...elements, CHARGE].map((label) => [label, [sum(reaction, label, -1n), sum(reaction, label, 1n)]]));
};

const sum = (reaction: Reaction, label: Label, sign: bigint): Rational =>
  reaction.terms
    .filter((term) => signOf(term.nu) === sign)
    .reduce((total, term) => total.add(term.nu.abs().mul(amountOf(term.species, label))), ZERO);

/** True where left and right agree in every line. */
export const isEven = (ledger: Ledger): boolean => [...ledger.values()].every(([left, right]) => left.equals(right));

/** The contract's LEDGER. */
export const showLedger = (ledger: Ledger): Readonly<Record<string, readonly [string, string]>> =>
  Object.fromEntries([...ledger].map(([label, [left, right]]) => [label, [showRational(left), showRational(right)]]));
