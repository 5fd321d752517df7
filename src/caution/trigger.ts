import type { CautionMedium, CautionMode } from './scene.ts';
import { isCondition, isMedium, isMode } from './words.ts';

/** What a caution can ask of the species of a cell: where one stands. */
export type Place = 'any' | 'with' | 'reactant' | 'product' | 'anode' | 'cathode' | 'anode_product' | 'cathode_product';

/** Species of which one must stand in a place: their keys, each with the states that are meant. */
export interface Clause {
  readonly place: Place;
  readonly wanted: ReadonlyMap<string, readonly (string | null)[]>;
}

/** A trigger taken apart: every list is a choice (or), all that are there must hold (and). */
export interface Trigger {
  readonly places: readonly Clause[];
  readonly elements: readonly string[];
  readonly media: readonly CautionMedium[];
  readonly modes: readonly CautionMode[];
  readonly conditions: readonly string[];
}

const PLACES: readonly string[] = [
  'any',
  'with',
  'reactant',
  'product',
  'anode',
  'cathode',
  'anode_product',
  'cathode_product',
] satisfies readonly Place[];

const isPlace = (key: string): key is Place => PLACES.includes(key);
const isElement = (word: string): boolean => /^[A-Z][a-z]?$/.test(word);

/** A table that cannot be read is a broken program, not a fault of the ask. */
const broken = (what: string): never => {
  throw new Error(`caution table: ${what}`);
};

/**
 * The table keeps to canonical spelling, which without the state is a species' key, so that nothing needs the reader of
 * species: P(s,red) is P in state s.
 */
const wantedOf = (texts: readonly string[]): Clause['wanted'] => {
  const wanted = new Map<string, readonly (string | null)[]>();
  for (const text of texts) {
    const [, key, state] = /^(.+?)(?:\((s|l|g|aq)(?:,\w+)?\))?$/.exec(text) ?? [];
    if (key === undefined) return broken('a species is missing');
    wanted.set(key, [...(wanted.get(key) ?? []), state ?? null]);
  }
  return wanted;
};

const known = <Word extends string>(values: readonly string[], isKnown: (word: string) => word is Word): Word[] =>
  values.map((word) => (isKnown(word) ? word : broken(`${word} is unknown`)));

/** The trigger of a row's text. The grammar stands at `CautionRow.trigger`; throws on anything else. */
export const parseTrigger = (text: string): Trigger => {
  const clauses = text.split(';').map((clause) => {
    const [key = '', values = ''] = clause.split(/=(.*)/s);
    if (!isPlace(key) && !OTHER_KEYS.includes(key)) broken(`${key} in ${text}`);
    return { key, values: values.split('|') };
  });
  const valuesOf = (key: string): readonly string[] => clauses.find((clause) => clause.key === key)?.values ?? [];
  return {
    places: clauses.flatMap(({ key, values }) => (isPlace(key) ? [{ place: key, wanted: wantedOf(values) }] : [])),
    elements: known(valuesOf('element'), (word): word is string => isElement(word)),
    media: known(valuesOf('medium'), isMedium),
    modes: known(valuesOf('mode'), isMode),
    conditions: known(valuesOf('condition'), (word): word is string => isCondition(word)),
  };
};

const OTHER_KEYS: readonly string[] = ['element', 'medium', 'mode', 'condition'];
