import { type CautionRow, CAUTION_ROWS } from './table.ts';
import { type Trigger, parseTrigger } from './trigger.ts';
import { type Actor, elementOf } from './actors.ts';

/** A row of the table with its trigger read. */
export interface Rule {
  readonly row: CautionRow;
  readonly trigger: Trigger;
  /** Place in the table, from 0. */
  readonly at: number;
}

/** Rules by what must be there before they can speak. */
interface RuleIndex {
  /** Rules whose first clause names this species; most scenes meet a handful of the table. */
  readonly bySpecies: ReadonlyMap<string, readonly Rule[]>;
  /** Rules that ask for no species, by element. */
  readonly byElement: ReadonlyMap<string, readonly Rule[]>;
  /** Rules of a medium or a mode alone. */
  readonly always: readonly Rule[];
}

const indexed = (): RuleIndex => {
  const bySpecies = new Map<string, Rule[]>();
  const byElement = new Map<string, Rule[]>();
  const always: Rule[] = [];
  const file = (map: Map<string, Rule[]>, key: string, rule: Rule): void => {
    const list = map.get(key) ?? [];
    if (list.at(-1) !== rule) map.set(key, [...list, rule]);
  };
  CAUTION_ROWS.forEach((row, at) => {
    const rule = { row, trigger: parseTrigger(row.trigger), at };
    const [first] = rule.trigger.places;
    for (const key of first?.wanted.keys() ?? []) file(bySpecies, key, rule);
    if (first !== undefined) return;
    for (const element of rule.trigger.elements) file(byElement, element, rule);
    if (rule.trigger.elements.length === 0) always.push(rule);
  });
  return { bySpecies, byElement, always };
};

/** Read once, at the first need: the table never changes. */
let index: RuleIndex | undefined;

/** The rules that may speak where these species are, each once, in the order of the table. */
export const rulesFor = (actors: readonly Actor[]): readonly Rule[] => {
  index ??= indexed();
  const found = new Set<Rule>(index.always);
  for (const { key, species } of actors) {
    for (const rule of index.bySpecies.get(key) ?? []) found.add(rule);
    for (const label of species.composition.keys())
      for (const rule of index.byElement.get(elementOf(label)) ?? []) found.add(rule);
  }
  return [...found].sort((a, b) => a.at - b.at);
};
