import { CAUTION_ROWS } from '../caution/table.ts';
import type { ShownCaution } from './schema/shape.ts';
import type { SheetCaution } from './sheet-answer.ts';

const GRAVE = new Set(
  CAUTION_ROWS.filter(({ atOnce }) => atOnce === true).map(({ basis, text }) => `${text}|${basis}`),
);

/** "... Applies in an undivided cell." names what the sheet leaves open; it stands behind the row's own text. */
const CONDITION = / Applies [^.]+\.$/;

/** True for what kills or explodes at once, whether or not a condition is left open. */
export const isGrave = ({ text, basis }: ShownCaution): boolean =>
  GRAVE.has(`${text}|${basis}`) || GRAVE.has(`${text.replace(CONDITION, '')}|${basis}`);

/** The cautions of all tanks, each once with its tanks, the gravest first; the order of the tanks' own lists stays. */
export const gatherCautions = (
  parts: readonly { readonly name: string; readonly cautions: readonly ShownCaution[] }[],
): readonly SheetCaution[] => {
  const gathered = new Map<string, SheetCaution>();
  for (const { name, cautions } of parts) {
    for (const caution of cautions) {
      const before = gathered.get(caution.text);
      const because = [...new Set([...(before?.because ?? []), ...caution.because])];
      const tanks = [...(before?.tanks ?? []), name];
      gathered.set(caution.text, { ...caution, because, tanks, grave: isGrave(caution) });
    }
  }
  const weight = ({ grave, text }: SheetCaution): number => (grave ? 0 : 2) + (CONDITION.test(text) ? 1 : 0);
  return [...gathered.values()].sort((one, other) => weight(one) - weight(other));
};
