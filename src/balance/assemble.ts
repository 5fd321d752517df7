import { rational, signOf } from '../exact/rational.ts';
import { isElectron } from '../species/species.ts';
import type { Reaction } from './reaction.ts';
import type { Unknown } from './unknowns.ts';

/**
 * The reaction of `numbers`, in printing order: reactants, then products, each in the order of the unknowns with the
 * electron last. What has number 0 is left out.
 */
export const assemble = (unknowns: readonly Unknown[], numbers: readonly bigint[]): Reaction => {
  const terms = unknowns.flatMap(({ species }, index) => {
    const nu = numbers[index] ?? 0n;
    return nu === 0n ? [] : [{ species, nu: rational(nu) }];
  });
  return inPrintingOrder({ terms });
};

/** `reaction` with its reactants first and the electron last on its side; the order is kept otherwise. */
export const inPrintingOrder = (reaction: Reaction): Reaction => {
  const side = (left: boolean, electron: boolean): Reaction['terms'] =>
    reaction.terms.filter((term) => signOf(term.nu) < 0n === left && isElectron(term.species) === electron);
  return { terms: [...side(true, false), ...side(true, true), ...side(false, false), ...side(false, true)] };
};
