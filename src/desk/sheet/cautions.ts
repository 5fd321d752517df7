import type { ShownCaution } from '../schema/shape.ts';
import type { SheetCaution } from './answer.ts';

/** "... Applies in an undivided cell." names what the sheet leaves open; it stands behind the row's own text. */
const CONDITION = / Applies (?:(?! Applies ).)+$/;
const APPLIES = ' Applies ';

/** What the row says, and under which condition: "in an undivided cell"; null where it holds as it stands. */
const splitCaution = ({ text, conditional }: ShownCaution): Pick<SheetCaution, 'says' | 'when'> => {
  const at = conditional === true ? text.search(CONDITION) : -1;
  if (at < 0) return { says: text, when: null };
  // The full stop of the sentence goes, that of an abbreviation stays.
  return { says: text.slice(0, at), when: text.slice(at + APPLIES.length).replace(/(?<!\.\w)\.$/, '') };
};

/** The cautions of all tanks, each once with its tanks, the gravest first; the order of the tanks' own lists stays. */
export const gatherCautions = (
  parts: readonly { readonly name: string; readonly cautions: readonly ShownCaution[] }[],
): readonly SheetCaution[] => {
  const gathered = new Map<string, SheetCaution>();
  for (const { name, cautions } of parts) {
    for (const caution of cautions) {
      const before = gathered.get(caution.text);
      const because = [...new Set([...(before?.because ?? []), ...caution.because])];
      gathered.set(caution.text, {
        ...caution,
        because,
        tanks: [...(before?.tanks ?? []), name],
        ...splitCaution(caution),
      });
    }
  }
  const weight = ({ grave, conditional }: SheetCaution): number =>
    (grave === true ? 0 : 2) + (conditional === true ? 1 : 0);
  return [...gathered.values()].sort((one, other) => weight(one) - weight(other));
};
