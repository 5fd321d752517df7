import { ELEMENTS } from '../elements/table.ts';

/** Element symbols and the hydrogen isotopes D and T, longest first: `Co` before `C`. */
export const ELEMENTS_BY_LENGTH: readonly string[] = [...ELEMENTS.map((element) => element.symbol), 'D', 'T'].sort(
  (a, b) => b.length - a.length,
);
