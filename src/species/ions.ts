import { IONS_TEXT } from './ions-table.ts';
import type { Species } from './species.ts';

/** Plain spellings of the known ions, in the order of the table. */
export const KNOWN_IONS: readonly string[] = [...new Set(IONS_TEXT.split(/\s+/u).filter((word) => word !== ''))];

/** A spelling without an outer pair of square brackets, round inside: how a species' key writes it. */
const keyOf = (spelling: string): string =>
  spelling
    .replace(/^\[(.*)\](\^.*)$/u, '$1$2')
    .replaceAll('[', '(')
    .replaceAll(']', ')');

const KEYS: ReadonlySet<string> = new Set(KNOWN_IONS.map(keyOf));

/** True where the table of ions holds this species; state and bracket shapes do not matter. */
export const isKnownIon = (species: Species): boolean => KEYS.has(species.key);
