import { ION_GROUPS } from './ions-table.ts';
import type { Species } from './species.ts';

const spellingsOf = (text: string): readonly string[] => text.split(' ');

/** Plain spellings of the known ions, in the order of the table, nuclides left out. */
export const KNOWN_IONS: readonly string[] = [...new Set(Object.values(ION_GROUPS).flatMap(spellingsOf))].filter(
  (spelling) => !spelling.includes('{'),
);

const KEYS: ReadonlySet<string> = new Set(Object.values(ION_GROUPS).flatMap(spellingsOf));

/** True where the table of ions holds this species; its state and the shapes of its brackets do not matter. */
export const isKnownIon = (species: Species): boolean => KEYS.has(species.key);

/** Letters, digits and signs alone, all small: what is left of a spelling when case, brackets and carets are forgotten. */
const skeletonOf = (text: string): string =>
  text
    .normalize('NFKC')
    .toLowerCase()
    .replaceAll(/[−‐‑–—]/gu, '-')
    .replaceAll(/[^a-z0-9+-]/gu, '');

const BY_SKELETON: ReadonlyMap<string, readonly string[]> = KNOWN_IONS.reduce(
  (known, ion) => known.set(skeletonOf(ion), [...(known.get(skeletonOf(ion)) ?? []), ion]),
  new Map<string, readonly string[]>(),
);

/** Known ions that differ from `text` in capital and small letters, brackets or carets only: `Mno4-` is near MnO4^-. */
export const ionsNear = (text: string): readonly string[] => BY_SKELETON.get(skeletonOf(text)) ?? [];
