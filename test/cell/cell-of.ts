import type { ElectrodeReaction } from '../../src/cell/cell-reaction.ts';
import type { Electrodes } from '../../src/cell/compose.ts';
import { ZERO, rationalFromText, signOf } from '../../src/exact/rational.ts';
import type { HalfReaction } from '../../src/redox/half-reaction.ts';
import type { Medium } from '../../src/redox/medium.ts';
import { isElectron } from '../../src/species/species.ts';
import { plain, plainEquation } from '../support/plain.ts';

/** The helpers that a half-reaction shows: acid, base, oxide or carbonate. */
const mediumShown = (keys: ReadonlySet<string>): Medium => {
  const helpers: string[] = [];
  if (keys.has('H^+')) helpers.push('H2O', 'H^+');
  if (keys.has('OH^-')) helpers.push('H2O', 'OH^-');
  if (keys.has('O^2-')) helpers.push('O^2-');
  if (keys.has('CO3^2-')) helpers.push('CO3^2-', 'CO2');
  return { name: null, helpers: helpers.map(plain) };
};

/** A half-reaction from its balanced plain spelling: it trusts the writer, who is checked by the count. */
export const halfOf = (text: string): HalfReaction => {
  const { left, right } = plainEquation(text);
  const terms = [
    ...left.map(({ coefficient, species }) => ({ species, nu: coefficient.neg() })),
    ...right.map(({ coefficient, species }) => ({ species, nu: coefficient })),
  ];
  const electrons = terms.find((term) => isElectron(term.species))?.nu ?? ZERO;
  return {
    reaction: { terms },
    kind: signOf(electrons) > 0n ? 'oxidation' : 'reduction',
    electrons: electrons.abs(),
    medium: mediumShown(new Set(terms.map((term) => term.species.key))),
    dimension: 1,
  };
};

/** `0.9 @ Zn -> Zn^2+ + 2 e^-`: a share, if any, and the half-reaction. */
export const electrodeReactionOf = (text: string): ElectrodeReaction => {
  const [half = '', share] = text.split(' @ ').reverse();
  return { half: halfOf(half), share: share === undefined ? null : rationalFromText(share) };
};

export const electrodesOf = (anode: readonly string[], cathode: readonly string[]): Electrodes => ({
  anode: anode.map(electrodeReactionOf),
  cathode: cathode.map(electrodeReactionOf),
});
