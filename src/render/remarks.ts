import type { ShownCaution, ShownNote } from '../desk/schema/shape.ts';
import { hanging } from './block.ts';
import type { Look } from './look.ts';

/** The notes of an answer, one below the other. */
export const noteLines = (notes: readonly ShownNote[], look: Look): readonly string[] =>
  notes.flatMap(({ message }) => hanging('note', message, look.paint.warn));

const LAST_WORD =
  'That no caution is shown does not mean that it is safe: local codes, the SDS and licensed practice decide.';

const basisText = ({ because, basis }: ShownCaution): string =>
  [because.join(', '), basis].filter((part) => part !== '').join('; ');

const cautionBlock = (caution: ShownCaution, label: string, look: Look): readonly string[] => [
  ...hanging(label, caution.text, look.paint.bad),
  ...hanging('', basisText(caution), look.paint.faint),
];

/** The cautions of an answer with their basis, and the line that none shown does not mean safe. */
export const cautionLines = (cautions: readonly ShownCaution[], look: Look): readonly string[] =>
  cautions.length === 0
    ? []
    : [...cautions.flatMap((one) => cautionBlock(one, 'caution', look)), ...hanging('', LAST_WORD, look.paint.faint)];

/** Cautions of several parts, each once with the names of the parts that call for it. */
export const gatheredCautions = (
  parts: readonly { readonly name: string; readonly cautions: readonly ShownCaution[] }[],
  look: Look,
): readonly (readonly string[])[] => {
  // Each part brings its gravest first; so does the whole.
  const all = parts.flatMap(({ cautions }) => cautions.map((caution, rank) => ({ caution, rank })));
  const distinct = all
    .toSorted((one, other) => one.rank - other.rank)
    .map(({ caution }) => caution)
    .filter((one, at, list) => list.findIndex((other) => other.text === one.text) === at);
  const namesOf = (caution: ShownCaution): string =>
    parts
      .filter(({ cautions }) => cautions.some((one) => one.text === caution.text))
      .map(({ name }) => name)
      .join(', ');
  const blocks = distinct.map((caution) => [
    look.paint.strong(namesOf(caution)),
    ...cautionBlock(caution, '', look).map((line) => line.trim()),
  ]);
  return distinct.length === 0 ? [] : [...blocks, [look.paint.faint(LAST_WORD)]];
};
