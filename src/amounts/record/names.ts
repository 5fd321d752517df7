import { toFloat } from '../number.ts';
import { QUANTITIES } from '../quantities.ts';
import { readWantedUnit } from '../quantity.ts';

/** The two columns that a record must have. */
export type ColumnKind = 'time' | 'current';

const WORDS: Readonly<Record<ColumnKind, readonly string[]>> = {
  time: 't time times elapsed timestamp datetime date/time clock duration zeit temps tiempo'.split(' '),
  current: 'i current currents amperage strom courant corriente'.split(' '),
};

/** Words beside "current" or "time" that make it another quantity than the one that flows. */
const SPOILERS = /densit|dichte|limit|set|target|nominal|max|min\b|step time|offset|range/;

const CLOCK_UNIT = /^(?:[hdm]+:)?[hm]+:[ms]+(?:\.[sf]+)?$/i;

/** The factor of a unit; null for a pattern of clock times; undefined for no unit of this kind. */
export const factorOf = (unit: string, kind: ColumnKind): number | null | undefined => {
  if (kind === 'time' && CLOCK_UNIT.test(unit)) return null;
  const read = readWantedUnit(unit, QUANTITIES[kind]);
  return read.ok ? toFloat(read.value.factor) : undefined;
};

/** A name and its unit, as headers part them: t (min), I [mA], t / s, "Current, A", time_s, current in mA, mA. */
export const PARTINGS = [
  /^(.*?)\s*[[(]([^\])]*)[\])]$/,
  /^(.*?)\s*\/\s*(\S+)$/,
  /^(.*?)\s*,\s*(\S+)$/,
  /^(.*?)[_\s](?:in[_\s])?([^_\s]+)$/,
  /^()(\S+)$/,
];

/** What a name says of a column. */
export interface Candidate {
  /** 0 for the very word; the least is the best. */
  readonly rank: number;
  readonly unit: string;
  readonly factor: number | null;
}

const baseRank = (base: string, kind: ColumnKind, hasUnit: boolean): number | undefined => {
  const words = WORDS[kind];
  if (words.includes(base)) return 0;
  if (base === '') return 1;
  if (SPOILERS.test(base)) return undefined;
  return hasUnit && base.split(/[^a-zµ]+/).some((word) => words.includes(word)) ? 2 : undefined;
};

/** A unit in brackets that is of another quantity, as in T (°C); a zone is none. */
const FOREIGN_UNIT = /[[(][^\])]*[\])]$/;
const ZONE = /[[(](?:utc|gmt|local|zone|[a-z]+\/[a-z_]+|utc[+-]\d+)[^\])]*[\])]$/;

/** A date alone may hold the time of day too; a column of time goes before it. */
const DATES: readonly string[] = ['date', 'datum'];

/** A name with its unit, or a unit alone. */
const withUnit = (name: string, kind: ColumnKind): Candidate | undefined => {
  for (const parting of PARTINGS) {
    const [, base = '', unit = ''] = parting.exec(name) ?? [];
    const factor = unit === '' ? undefined : factorOf(unit, kind);
    const rank = factor === undefined ? undefined : baseRank(base.trim().toLowerCase(), kind, true);
    if (factor !== undefined && rank !== undefined) return { rank, unit, factor };
  }
  return undefined;
};

/** A name alone: of a current only where it is nothing else, of a time also among other words. */
const withoutUnit = (name: string, kind: ColumnKind): Candidate | undefined => {
  if (name === '' || (FOREIGN_UNIT.test(name) && !ZONE.test(name))) return undefined;
  const rank = kind === 'time' && DATES.includes(name) ? 3 : baseRank(name, kind, kind === 'time');
  return rank === undefined ? undefined : { rank, unit: '', factor: null };
};

/** How well a name in a header names this kind of column; undefined where it does not. */
export const candidateOf = (name: string, kind: ColumnKind): Candidate | undefined => {
  const lower = name.toLowerCase();
  if (WORDS[kind].includes(lower)) return { rank: 0, unit: '', factor: null };
  return withUnit(name, kind) ?? withoutUnit(lower, kind);
};
