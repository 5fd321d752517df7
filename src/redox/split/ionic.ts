import type { Reaction, Term } from '../../balance/reaction.ts';
import { ONE, isZero, signOf } from '../../exact/rational.ts';
import type { Species } from '../../species/species.ts';
import { HYDROXIDE, PROTON, WATER, mediumRow } from '../media.ts';
import type { Medium } from '../medium.ts';
import { type Amounts, sumOfTerms, termsOf } from './amounts.ts';
import { inHydroxide } from './complete.ts';
import { dissolvedIons } from './dissolve.ts';
import { type Portion, ionsOfSalt, speciesOf } from './salt.ts';

/** A reaction between ions, spectators gone, with the medium that its halves are completed in. */
export interface IonicReaction {
  readonly amounts: Amounts;
  readonly medium: Medium;
}

/** How far salts are taken apart: what dissolves, or every salt. */
export type Reach = 'dissolved' | 'every salt';

/**
 * `reaction` between ions: salts that dissolve and strong acids and bases replaced by their ions, what stands on both
 * sides struck out. The medium is the one given, unless the reaction is molecular: then it is base where hydroxide
 * ions stand in it and acid else.
 */
export const ionicReaction = (reaction: Reaction, medium: Medium, reach: Reach): IonicReaction => {
  const molecular = reaction.terms.every(({ species }) => isZero(species.charge));
  const amounts = ionicAmounts(reaction.terms, reach, molecular);
  return { amounts, medium: molecular ? mediumShown(reaction, medium) : medium };
};

/** A half of a molecular reaction between ions: what dissolves taken apart, and OH^- in place of H^+ in base. */
export const ionicHalf = (half: Reaction, medium: Medium): readonly Term[] => {
  const terms = termsOf(ionicAmounts(half.terms, 'dissolved', true));
  return medium.helpers.some(({ key }) => key === HYDROXIDE.key) ? inHydroxide(terms) : terms;
};

const ionicAmounts = (terms: readonly Term[], reach: Reach, molecular: boolean): Amounts => {
  const lists = terms.map(({ species, nu }): readonly [readonly Term[], typeof nu] => [
    portionsOf(species, reach, molecular).map((portion) => ({ species: portion.species, nu: portion.count })),
    nu,
  ]);
  return foldedIons(sumOfTerms(lists));
};

const portionsOf = (species: Species, reach: Reach, molecular: boolean): readonly Portion[] => {
  const ions = (reach === 'dissolved' ? dissolvedIons(species) : ionsOfSalt(species)) ?? [{ species, count: ONE }];
  return ions.flatMap((portion) => partsOfIon(portion, molecular));
};

/** Oxonium is H^+ with water; hydrogensulfate between molecules is H^+ with sulfate. */
const partsOfIon = (portion: Portion, molecular: boolean): readonly Portion[] => {
  const { species, count } = portion;
  if (species.key === 'H3O^+') return [PROTON, WATER].map((part) => ({ species: part, count }));
  if (species.key !== 'HSO4^-' || !molecular) return [portion];
  return [
    { species: PROTON, count },
    { species: sulfateOf(species), count },
  ];
};

/** SO4^2- of HSO4^-: the members after the hydrogen. */
const sulfateOf = (hydrogensulfate: Species): Species => {
  const members = (hydrogensulfate.parts[0]?.members ?? []).slice(1);
  return speciesOf([{ multiplier: ONE, members }], hydrogensulfate.charge.sub(ONE));
};

/** H^+ and OH^- on one side are water. */
const foldedIons = (amounts: Amounts): Amounts => {
  const [acid, base] = [amounts.get(PROTON.key), amounts.get(HYDROXIDE.key)];
  if (acid === undefined || base === undefined || signOf(acid.nu) !== signOf(base.nu)) return amounts;
  const folded = acid.nu.abs().compare(base.nu.abs()) < 0 ? acid.nu : base.nu;
  const change = [acid.species, base.species].map((species) => ({ species, nu: folded.neg() }));
  return sumOfTerms([
    [[...amounts.values()], ONE],
    [[...change, { species: WATER, nu: folded }], ONE],
  ]);
};

/** Base where hydroxide ions stand in a molecular reaction, dissolved or not, and no strong acid does; acid else. */
const mediumShown = (reaction: Reaction, medium: Medium): Medium => {
  if (medium.name === null || medium.name.startsWith('molten')) return medium;
  const has = (ion: Species, ions: (species: Species) => readonly Portion[] | null): boolean =>
    reaction.terms.some(({ species }) => ions(species)?.some((portion) => portion.species.key === ion.key) ?? false);
  const acid = has(PROTON, dissolvedIons);
  const name = !acid && (medium.name === 'base' || has(HYDROXIDE, ionsOfSalt)) ? 'base' : 'acid';
  return { name, helpers: mediumRow(name)?.helpers ?? [] };
};
