import type { Circuit } from '../amounts/branches.ts';
import type { AmountsAnswer, AmountsRequest } from '../amounts/working.ts';
import { type Species, plainSpecies, sameSpecies } from '../species/species.ts';
import type { Quantity } from './schema/shape.ts';

/** A quantity as the text of an ask. */
export const asText = ({ value, unit, uncertainty }: Quantity): string =>
  `${String(value)} ${unit}${uncertainty === undefined ? '' : ` ± ${String(uncertainty)} ${unit}`}`;

/** The share that an answer shows for a reaction: that of a species which takes part in no other. */
const shareIn = ({ species, circuit }: AmountsRequest, answer: AmountsAnswer, at: number): Quantity | undefined => {
  if (circuit.kind !== 'electrode') return undefined;
  const holds = (one: Species): boolean =>
    circuit.reactions.every(
      ({ reaction }, index) => (index === at) === reaction.terms.some((term) => sameSpecies(term.species, one)),
    );
  if (holds(species)) return answer.quantities['share'];
  const terms = circuit.reactions[at]?.reaction.terms ?? [];
  const shown = terms.filter((term) => holds(term.species)).map((term) => answer.alongside[plainSpecies(term.species)]);
  return shown.flatMap((quantities) => quantities?.['share'] ?? [])[0];
};

/** Reactions in parallel without shares: what was measured has given them, and one takes the rest. */
export const withFoundShares = (request: AmountsRequest, answer: AmountsAnswer): Circuit => {
  const { circuit } = request;
  if (circuit.kind !== 'electrode') return circuit;
  const shares = circuit.reactions.map((_, at) => shareIn(request, answer, at));
  const open = circuit.reactions.flatMap(({ share }, at) => (share === undefined ? [at] : []));
  const rest = open.find((at) => shares[at] === undefined) ?? open.at(-1);
  const reactions = circuit.reactions.map((one, at) => {
    const share = shares[at];
    return one.share !== undefined || at === rest || share === undefined ? one : { ...one, share: asText(share) };
  });
  return { kind: 'electrode', reactions };
};
