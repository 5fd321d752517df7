import { ABSENCE } from '../caution/cautions.ts';
import type { ShownCaution, ShownNote } from '../desk/schema/shape.ts';
import { hanging, wrapped } from './block.ts';
import type { Look, Paint } from './look.ts';
import { speciesText } from './spelling.ts';

/** A note begins with a capital where its first word is a word, and ends in a full stop. */
const sentence = (message: string): string => {
  const begun = message.replace(/^[a-z]{2,}(?= )/, (word) => word.slice(0, 1).toUpperCase() + word.slice(1));
  return /[.?!]$/.test(begun) ? begun : `${begun}.`;
};

/** The notes of an answer, one below the other. */
export const noteLines = (notes: readonly ShownNote[], look: Look): readonly string[] =>
  notes.flatMap(({ message }) => hanging('note', sentence(message), look.paint.warn));

/** A caution in one piece: its text, then in brackets what calls for it and its basis. */
const cautionText = ({ text, because, basis }: ShownCaution, look: Look): string => {
  const ground = [because.map((one) => speciesText(one, look)).join(', '), basis]
    .filter((part) => part !== '')
    .join('; ');
  return ground === '' ? text : `${text} (${ground})`;
};

const isGrave = ({ grave }: ShownCaution): boolean => grave === true;

const asIs: Paint['strong'] = (text) => text;

/** What can kill or explode at once: it stands before the answer, in every view. */
export const graveLines = (cautions: readonly ShownCaution[], look: Look): readonly string[] =>
  cautions.filter(isGrave).flatMap((one) => hanging('danger', cautionText(one, look), look.paint.bad));

/** Below the cautions: that none shown does not mean safe. */
export const absenceLines = (cautions: readonly ShownCaution[], look: Look): readonly string[] =>
  cautions.length === 0 ? [] : wrapped(ABSENCE).map((line) => look.paint.faint(line));

/** The other cautions, those that depend on a condition last. */
export const cautionLines = (cautions: readonly ShownCaution[], look: Look): readonly string[] => {
  const others = cautions.filter((one) => !isGrave(one));
  const lastOpen = [
    ...others.filter(({ conditional }) => conditional !== true),
    ...others.filter(({ conditional }) => conditional === true),
  ];
  return lastOpen.flatMap((one) => hanging('caution', cautionText(one, look), asIs, look.paint.warn));
};
