import type { ShownCaution, ShownNote } from '../desk/schema/shape.ts';
import { hanging } from './block.ts';
import type { Look } from './look.ts';

/** The notes of an answer, one below the other. */
export const noteLines = (notes: readonly ShownNote[], look: Look): readonly string[] =>
  notes.flatMap(({ message }) => hanging('note', message, look.paint.warn));

const LAST_WORD =
  'That no caution is shown does not mean that it is safe: local codes, the SDS and licensed practice decide.';

/** The cautions of an answer with their basis, and the line that none shown does not mean safe. */
export const cautionLines = (cautions: readonly ShownCaution[], look: Look): readonly string[] =>
  cautions.length === 0
    ? []
    : [
        ...cautions.flatMap(({ text, because, basis }) => [
          ...hanging('caution', text, look.paint.bad),
          ...hanging('', `${because.join(', ')}; ${basis}`, look.paint.faint),
        ]),
        ...hanging('', LAST_WORD, look.paint.faint),
      ];
