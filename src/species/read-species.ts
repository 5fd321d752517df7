import type { Lexer } from 'moo';
import type { Rational } from '../exact/rational.ts';
import { showRational } from '../exact/rational.ts';
import { lexer as plainLexer, lexerWith, UNKNOWN_SUBSCRIPTS } from '../notation/lexer.ts';
import { LIMITS } from '../notation/limits.ts';
import { parseSpecies } from '../notation/parse-species.ts';
import { remarkOf } from '../notation/state.ts';
import type { SpeciesSyntax } from '../notation/syntax.ts';
import { type Note, note } from '../report/note.ts';
import { type Result, all, chain, failure, success } from '../report/result.ts';
import { wholeSpan } from '../report/span.ts';
import { didYouMean } from '../report/suggest.ts';
import type { Definitions } from './definitions.ts';
import { buildSpecies } from './read-build.ts';
import { ionsNear, isKnownIon } from './ions.ts';
import { createMemory } from './read-cache.ts';
import { type Ranking, type Reading, rankReadings } from './read-ranking.ts';
import { type Species, plainSpecies } from './species.ts';

/** How to read: values of unknown subscripts, names with their formulas, and whether any ambiguity is a fault. */
export interface ReadingOptions {
  readonly where?: ReadonlyMap<string, Rational>;
  readonly define?: Definitions;
  readonly strict?: boolean;
}

/** The species taken, and every reading that the spelling allows, the one taken first. */
export interface SpeciesReading {
  readonly species: Species;
  readonly readings: readonly Species[];
}

const NO_UNKNOWNS: ReadonlyMap<string, Rational> = new Map();

/** Lexers made for the names of an ask; each of its species needs the same one. */
const lexers = createMemory<Lexer>(LIMITS.rememberedLexers);

/** Names of unknowns that the lexer must be told: letters alone, and not the electron's. */
const newUnknowns = (where: ReadonlyMap<string, Rational>): readonly string[] =>
  [...where.keys()].filter((name) => /^\p{L}+$/u.test(name) && name !== 'e' && !UNKNOWN_SUBSCRIPTS.includes(name));

const lexerFor = ({ where = NO_UNKNOWNS, define }: ReadingOptions): Lexer => {
  const names = define === undefined ? [] : [...define.members.keys()];
  const unknowns = newUnknowns(where);
  if (names.length + unknowns.length === 0) return plainLexer;
  return lexers.recall(JSON.stringify([names, unknowns]), () => lexerWith(names, unknowns));
};

const buildReadings = (text: string, options: ReadingOptions) => (parsed: readonly SpeciesSyntax[]) => {
  const context = {
    text,
    unknowns: options.where ?? NO_UNKNOWNS,
    names: options.define?.members ?? new Map<string, never>(),
  };
  return all(
    parsed.map((syntax): Result<Reading> => {
      const built = buildSpecies(context, syntax);
      return built.ok ? success({ syntax, species: built.value }) : built;
    }),
  );
};

/** The same atoms, charge and state: `[²H]` as a nuclide in its brackets, or as a group of one, is one reading. */
const identityOf = ({ composition, charge, state }: Species): string =>
  JSON.stringify([[...composition].map(([atom, count]) => [atom, showRational(count)]), showRational(charge), state]);

const lengthOf = ({ species }: Reading): number => plainSpecies(species).length;

/** One of each species, in its shortest spelling. */
const distinct = (readings: readonly Reading[]): readonly Reading[] => {
  if (readings.length < 2) return readings;
  const kept = new Map<string, Reading>();
  for (const reading of readings) {
    const identity = identityOf(reading.species);
    const before = kept.get(identity);
    if (before === undefined || lengthOf(reading) < lengthOf(before)) kept.set(identity, reading);
  }
  return [...kept.values()];
};

const severalReadings = (text: string, species: readonly Species[]): Result<never> => {
  const readings = species.map(plainSpecies);
  const message = `${text.trim()} can be read as ${readings.join(' or ')}`;
  return failure({
    code: 'several-readings',
    message,
    span: wholeSpan(text),
    hint: 'write the charge with a caret',
    readings,
  });
};

const notesOn = (text: string, ranking: Ranking, chosen: Reading): readonly Note[] => {
  const notes: Note[] = [];
  const others = ranking.readings.slice(1).map(({ species }) => plainSpecies(species));
  if (others.length > 0) {
    const taken = `${text.trim()} was read as ${plainSpecies(chosen.species)}`;
    notes.push(note('reading-chosen', `${taken}: ${ranking.because ?? ''}; it could also be ${others.join(' or ')}`));
  }
  if (chosen.syntax.radical !== null)
    notes.push(note('remark-dropped', `the dot of a radical in ${text.trim()} was dropped`));
  const remark = remarkOf(chosen.syntax.state);
  if (remark !== null)
    notes.push(note('remark-dropped', `the remark ${remark} after ${plainSpecies(chosen.species)} was dropped`));
  return notes;
};

const choose = (text: string, options: ReadingOptions, readings: readonly Reading[]): Result<SpeciesReading> => {
  const isKnown = (species: Species): boolean =>
    isKnownIon(species) || options.define?.spellings.has(plainSpecies(species)) === true;
  const ranking = rankReadings(distinct(readings), isKnown);
  const species = ranking.readings.map((reading) => reading.species);
  const [chosen] = ranking.readings;
  if (chosen === undefined || ranking.contested || (options.strict === true && species.length > 1))
    return severalReadings(text, species);
  return success({ species: chosen.species, readings: species }, notesOn(text, ranking, chosen));
};

/** One spelling as kept for reuse: whether it parses at all, and what reading makes of it. */
export interface KeptReading {
  readonly spells: boolean;
  readonly result: Result<SpeciesReading>;
}

/** A letter fault with the ion that was meant, where the whole text differs from one in case only. */
const withIonMeant = <T>(text: string, result: Result<T>): Result<T> => {
  if (result.ok || result.fault.code !== 'unknown-element') return result;
  const hint = didYouMean(ionsNear(text));
  return hint === undefined ? result : failure({ ...result.fault, hint });
};

const readAnew = (text: string, options: ReadingOptions): KeptReading => {
  const parsed = withIonMeant(text, parseSpecies(text, lexerFor(options)));
  const readings = chain(parsed, buildReadings(text, options));
  return { spells: parsed.ok, result: chain(readings, (built) => choose(text, options, built)) };
};

const signatureOf = ({ where = NO_UNKNOWNS, define, strict }: ReadingOptions): string =>
  where.size === 0 && define === undefined
    ? String(strict === true)
    : JSON.stringify([
        strict === true,
        [...where].map(([name, value]) => [name, showRational(value)]),
        define?.signature,
      ]);

/**
 * Readings already made. Reading is a pure function of text and options, so that nothing in here can go stale, and the
 * number of entries is fixed: the same few species come again in every ask of a batch.
 */
const memory = createMemory<KeptReading>(LIMITS.remembered);

const kept = (text: string, options: ReadingOptions): KeptReading =>
  text.length > LIMITS.rememberedLength
    ? readAnew(text, options)
    : memory.recall(`${signatureOf(options)}|${text}`, () => readAnew(text, options));

/** True where `text` parses as a species, whatever a closer look finds. */
export const spells = (text: string, options: ReadingOptions): boolean => kept(text, options).spells;

/**
 * The species that `text` spells, with all its readings. Notes: `reading-chosen`, `remark-dropped`. Faults: the codes of
 * reading with their span in code points of `text`, `several-readings`, `too-hard`.
 */
export const readSpecies = (text: string, options: ReadingOptions = {}): Result<SpeciesReading> =>
  kept(text, options).result;
