import { type Actor, actorsOf, elementOf, meeting } from './actors.ts';
import { type Rule, rulesFor } from './rules.ts';
import { type Scene, WATER_MEDIA, isWatery } from './scene.ts';
import type { Clause, Trigger } from './trigger.ts';
import { appliesSentence, conditionsPhrase, mediaPhrase, modesPhrase } from './words.ts';

/** A caution with the species or elements that raised it. */
export interface Caution {
  readonly text: string;
  readonly because: readonly string[];
  readonly basis: string;
  /** What can kill or explode at once: it stands before every answer. */
  readonly grave?: true;
  /** It holds only where what the end of its text names holds too. */
  readonly conditional?: true;
}

/** Said wherever cautions are shown. */
export const ABSENCE =
  'That no caution is shown does not mean that it is safe: local codes, the SDS and licensed practice decide.';

/** What met a part of a trigger, or undefined where nothing did. `open`: what would have to hold besides. */
interface Met {
  readonly because: readonly string[];
  readonly open: readonly string[];
}

/** A watery medium holds water whether or not a reaction uses it; an unknown one may. */
const waterIn = ({ media }: Scene): Met | undefined => {
  if (media.length > 0) return media.some(isWatery) ? { because: [], open: [] } : undefined;
  return { because: [], open: ['where water is present'] };
};

const metClause = (clause: Clause, actors: readonly Actor[], scene: Scene): Met | undefined => {
  const because = meeting(actors, clause);
  if (because.length > 0) return { because, open: [] };
  return clause.place === 'with' && clause.wanted.has('H2O') ? waterIn(scene) : undefined;
};

const metPlaces = ({ places }: Trigger, scene: Scene, actors: readonly Actor[]): Met | undefined => {
  const because: string[] = [];
  let open: readonly string[] = [];
  for (const clause of places) {
    const met = metClause(clause, actors, scene);
    if (met === undefined) return undefined;
    because.push(...met.because);
    if (met.open.length > 0) open = met.open;
  }
  return { because, open };
};

const metElements = ({ elements }: Trigger, _: Scene, actors: readonly Actor[]): Met | undefined => {
  if (elements.length === 0) return NOTHING_ASKED;
  const because = elements.filter((element) =>
    actors.some(
      ({ species: { composition } }) =>
        composition.has(element) || [...composition.keys()].some((label) => elementOf(label) === element),
    ),
  );
  return because.length === 0 ? undefined : { because, open: [] };
};

/** A medium that only some of the possible media are leaves a condition open; one that none is rules the row out. */
const metMedium = ({ media }: Trigger, scene: Scene): Met | undefined => {
  if (media.length === 0) return NOTHING_ASKED;
  const fitting = scene.media.filter((medium) => media.includes(medium));
  if (fitting.length < scene.media.length && fitting.length === 0) return undefined;
  const certain = scene.media.length > 0 && fitting.length === scene.media.length;
  return { because: [], open: certain ? [] : [mediaPhrase(fitting.length > 0 ? fitting : media)] };
};

const metMode = ({ modes }: Trigger, scene: Scene): Met | undefined => {
  if (modes.length === 0) return NOTHING_ASKED;
  if (scene.mode === null) return { because: [], open: [modesPhrase(modes)] };
  return modes.includes(scene.mode) ? NOTHING_ASKED : undefined;
};

const UNDIVIDED = 'undivided-cell';

const metConditions = ({ conditions }: Trigger, { divided }: Scene): Met | undefined => {
  if (conditions.length === 0 || (divided === false && conditions.includes(UNDIVIDED))) return NOTHING_ASKED;
  const open = divided === true ? conditions.filter((condition) => condition !== UNDIVIDED) : conditions;
  return open.length === 0 ? undefined : { because: [], open: [conditionsPhrase(open)] };
};

const NOTHING_ASKED: Met = { because: [], open: [] };

/**
 * A row of a medium or a mode alone speaks only where the scene itself says one: it would else stand everywhere. Water
 * of which nothing more is known may be acid, base and neutral, and says none.
 */
const isSaid = ({ places, elements, media, modes }: Trigger, scene: Scene): boolean =>
  places.length + elements.length > 0 ||
  (media.length > 0 && scene.media.length > 0 && !WATER_MEDIA.every((medium) => scene.media.includes(medium))) ||
  (modes.length > 0 && scene.mode !== null);

/** All parts of a trigger, or undefined as soon as one is not met. */
const metTrigger = (trigger: Trigger, actors: readonly Actor[], scene: Scene): Met | undefined => {
  if (!isSaid(trigger, scene)) return undefined;
  const because: string[] = [];
  const open: string[] = [];
  for (const ask of ASKS) {
    const met = ask(trigger, scene, actors);
    if (met === undefined) return undefined;
    if (met === NOTHING_ASKED) continue;
    because.push(...met.because);
    open.push(...met.open);
  }
  return { because: because.length < 2 ? because : [...new Set(because)], open };
};

/** What a trigger asks; what only the scene answers comes first, it is the cheapest. */
const ASKS = [metMedium, metMode, metConditions, metPlaces, metElements] as const;

interface Found {
  readonly caution: Caution;
  readonly gravity: number;
}

/** What kills or explodes at once comes first; of equals, what holds as it stands before what depends on a condition. */
const gravityOf = ({ row }: Rule, { open }: Met): number => (row.atOnce === true ? 0 : 2) + (open.length > 0 ? 1 : 0);

const foundBy = (rule: Rule, actors: readonly Actor[], scene: Scene): Found | undefined => {
  const met = metTrigger(rule.trigger, actors, scene);
  if (met === undefined) return undefined;
  const { text, basis } = rule.row;
  const whole = met.open.length === 0 ? text : `${text} ${appliesSentence(met.open)}`;
  const marks = {
    ...(rule.row.atOnce === true ? { grave: true as const } : {}),
    ...(met.open.length > 0 ? { conditional: true as const } : {}),
  };
  return { caution: { text: whole, because: met.because, basis, ...marks }, gravity: gravityOf(rule, met) };
};

/**
 * The cautions that `scene` raises, once each, the gravest first; in table order where they weigh the same. What a row
 * asks and the scene leaves open (a medium, a mode, a condition) is named at the end of its text.
 */
export const cautionsFor = (scene: Scene): readonly Caution[] => {
  const actors = actorsOf(scene);
  return rulesFor(actors)
    .flatMap((rule) => foundBy(rule, actors, scene) ?? [])
    .sort((a, b) => a.gravity - b.gravity)
    .map(({ caution }) => caution);
};
