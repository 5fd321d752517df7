import { isEveryday, isUnlisted } from './known.ts';
import type { Ranked } from './rank.ts';
import type { Species } from '../species/species.ts';

/** A species that a repair takes for another. */
interface Respelling {
  readonly was: Species;
  readonly is: Species;
}

const respellingsOf = ({ changes }: Ranked): readonly Respelling[] =>
  changes.flatMap((change) =>
    change.kind === 'respelled' ? [{ was: change.was.species, is: change.is.species }] : [],
  );

/** True for an everyday species taken for one that is none: Na for Na^-, O2 for O. */
const leavesTheEveryday = (repair: Ranked): boolean =>
  respellingsOf(repair).some(({ was, is }) => isEveryday(was) && !isEveryday(is));

/** True for a repair that brings in a species in no table. */
const bringsUnlisted = (repair: Ranked): boolean => respellingsOf(repair).some(({ is }) => isUnlisted(is));

/** True for a probable repair that takes no everyday species for an odd one. */
export const isSensible = (repair: Ranked): boolean => !repair.improbable && !leavesTheEveryday(repair);

const isKnownThroughout = (repair: Ranked): boolean =>
  isSensible(repair) && !repair.reaction.terms.some(({ species }) => isUnlisted(species));

/**
 * `found` without the respellings that a chemist would wave away. Once there is a sensible repair, no everyday species is
 * taken for an odd one; once there is one of listed species throughout, nothing unlisted is brought in. Where an
 * unlisted species stands in every repair, another unlisted one may still be what was meant.
 */
export const withoutNonsense = (found: readonly Ranked[]): readonly Ranked[] => {
  const [sensible, known] = [found.some(isSensible), found.some(isKnownThroughout)];
  return found.filter((repair) => !(sensible && leavesTheEveryday(repair)) && !(known && bringsUnlisted(repair)));
};
