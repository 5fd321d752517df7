import type { Reaction } from '../../balance/reaction.ts';
import { ONE, isZero } from '../../exact/rational.ts';
import type { Member } from '../../notation/formula.ts';
import type { Species } from '../../species/species.ts';
import { HYDROXIDE, OXIDE, PROTON, WATER, mediumRow } from '../media.ts';
import type { Medium, MediumName } from '../medium.ts';
import { termsOf } from './amounts.ts';
import { type IonicReaction, type Reach, ionicReaction } from './ionic.ts';
import { ionsOfSalt, speciesOf } from './salt.ts';

/**
 * `reaction` between ions, in each medium in which its halves may be completed, the likeliest first: among dry oxides
 * with O^2-; salts that dissolve taken apart; every salt taken apart.
 */
export const ionicForms = (reaction: Reaction, medium: Medium): readonly IonicReaction[] => [
  ...dryOxides(reaction, medium),
  ...formsIn(reaction, medium, 'dissolved'),
  ...formsIn(reaction, medium, 'every salt'),
];

/**
 * As the medium has it; where that lends no water but an ion of water is written, in acid or base; where carbonate gives
 * carbon dioxide, with these two as helpers; with an alkali ion that one half hands to the other, as host to host; and
 * where all hydrogen is a heavy nuclide, with helpers of that nuclide.
 */
const formsIn = (reaction: Reaction, medium: Medium, reach: Reach): readonly IonicReaction[] => {
  const ionic = ionicReaction(reaction, medium, reach);
  const has = (helper: Species): boolean => ionic.amounts.has(helper.key);
  const shown = has(PROTON) ? 'acid' : has(HYDROXIDE) ? 'base' : undefined;
  const lacks = !ionic.medium.helpers.some(({ key }) => key === WATER.key);
  const gives = mediumRow('molten-carbonate')?.helpers.every(has) === true;
  const handed = handedOver(ionic);
  const heavy = heavyHelpers(reaction, ionic.medium);
  return [
    ionic,
    ...(lacks && shown !== undefined ? [{ ...ionic, medium: rowOf(shown) }] : []),
    ...(gives ? [{ ...ionic, medium: rowOf('molten-carbonate') }] : []),
    ...(handed === null ? [] : [{ ...ionic, medium: { name: null, helpers: [...ionic.medium.helpers, handed] } }]),
    ...(heavy === null ? [] : [{ ...ionic, medium: { name: null, helpers: heavy } }]),
  ];
};

const rowOf = (name: MediumName): Medium => ({ name, helpers: mediumRow(name)?.helpers ?? [] });

/** A molecular reaction without hydrogen in which an oxide of ions stands, as Na2O: no water, but O^2-, as in a melt. */
const dryOxides = (reaction: Reaction, { name }: Medium): readonly IonicReaction[] => {
  if (name === null || name.startsWith('molten')) return [];
  const dry = reaction.terms.every(({ species }) => isZero(species.charge) && !species.composition.has('H'));
  const oxide = reaction.terms.some(({ species }) => ionsOfSalt(species)?.some((ion) => ion.species.key === OXIDE.key));
  return dry && oxide ? [ionicReaction(reaction, rowOf('molten-oxide'), 'every salt')] : [];
};

const ALKALI = ['Li', 'Na', 'K'];

/** The ion of an alkali metal that stands in several species but not as an ion. */
const handedOver = ({ amounts }: IonicReaction): Species | null => {
  const holders = (element: string): number =>
    termsOf(amounts).filter(({ species }) => species.composition.has(element)).length;
  const symbol = ALKALI.find((element) => holders(element) > 1 && !amounts.has(`${element}^+`));
  if (symbol === undefined) return null;
  return speciesOf([{ multiplier: ONE, members: [{ kind: 'atom', symbol, massNumber: null, count: ONE }] }], ONE);
};

const HEAVY = [
  { massNumber: '2', spelled: 'D' },
  { massNumber: '3', spelled: 'T' },
] as const;

/** The helpers of `medium` with the one nuclide that all hydrogen of the reaction is: D2O for H2O; null for ordinary hydrogen. */
const heavyHelpers = (reaction: Reaction, medium: Medium): readonly Species[] | null => {
  const has = (key: string): boolean => reaction.terms.some(({ species }) => species.composition.has(key));
  const [nuclide, mixed] = HEAVY.filter(({ massNumber }) => has(`${massNumber}H`));
  if (nuclide === undefined || mixed !== undefined || has('H')) return null;
  const heavy = (member: Member): Member =>
    member.kind === 'atom' && member.symbol === 'H' ? { ...member, ...nuclide } : member;
  return medium.helpers.map(({ parts, charge }) =>
    speciesOf(
      parts.map((part) => ({ ...part, members: part.members.map(heavy) })),
      charge,
    ),
  );
};
