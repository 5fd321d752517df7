import { type Rational, ONE, ZERO } from '../exact/rational.ts';
import type { Member } from '../notation/formula.ts';
import { KNOWN_GROUPS, type KnownGroup } from './oxidation-groups.ts';
import { compositionKey, type Run } from './oxidation-spelling.ts';
import { isHalogen } from './oxidation-table.ts';
import { countAtoms } from './species.ts';

/** A formula taken apart: the known ions and ligands in it, and the atoms that are left. */
export interface Taken {
  readonly groups: readonly { readonly group: KnownGroup; readonly count: Rational }[];
  readonly counts: ReadonlyMap<string, Rational>;
  readonly oxoHalogens: ReadonlySet<string>;
}

/** Which known groups are looked for. */
export type Allowed = (group: KnownGroup) => boolean;

/** Counts by element: nuclides stand with their element. */
export const elementCounts = (members: readonly Member[]): ReadonlyMap<string, Rational> => {
  const counts = new Map<string, Rational>();
  for (const [key, count] of countAtoms([{ multiplier: ONE, members }])) {
    const element = key.replace(/^\d+/, '');
    counts.set(element, (counts.get(element) ?? ZERO).add(count));
  }
  return counts;
};

/**
 * The run stands in `members` from `at` on, count by count.   K S C N
 *                                                               ^       SCN from 1
 */
const standsAt = (run: Run, members: readonly Member[], at: number): boolean =>
  run.every(([element, count], index) => {
    const member = members[at + index];
    return member?.kind === 'atom' && member.symbol === element && member.count.equals(count);
  });

const isOxygen = (member: Member | undefined): boolean => member?.kind === 'atom' && member.symbol === 'O';

/** Takes known groups out of `members`, brackets by composition, runs by spelling, the first listed first. */
export const takeGroups = (members: readonly Member[], allowed: Allowed): Taken => {
  const listed = KNOWN_GROUPS.filter(allowed);
  const groups: { group: KnownGroup; count: Rational }[] = [];
  const counts = new Map<string, Rational>();
  const oxoHalogens = new Set<string>();

  const takeOne = (member: Member, next: Member | undefined, times: Rational): void => {
    const count = member.count.mul(times);
    if (member.kind === 'atom') {
      counts.set(member.symbol, (counts.get(member.symbol) ?? ZERO).add(count));
      if (isHalogen(member.symbol) && isOxygen(next)) oxoHalogens.add(member.symbol);
      return;
    }
    const key = compositionKey(elementCounts(member.members));
    const group = listed.find((known) => known.key === key);
    if (group === undefined) takeAll(member.members, count);
    else groups.push({ group, count });
  };

  const takeAll = (list: readonly Member[], times: Rational): void => {
    for (let at = 0; at < list.length; at += 1) {
      const member = list[at];
      if (member === undefined) return;
      const found = runAt(list, at, listed);
      if (found === undefined) takeOne(member, list[at + 1], times);
      else {
        groups.push({ group: found.group, count: times });
        at += found.run.length - 1;
      }
    }
  };

  takeAll(members, ONE);
  return { groups, counts, oxoHalogens };
};

const runAt = (
  members: readonly Member[],
  at: number,
  listed: readonly KnownGroup[],
): { readonly group: KnownGroup; readonly run: Run } | undefined => {
  for (const group of listed) {
    const run = group.runs.find((spelled) => standsAt(spelled, members, at));
    if (run !== undefined) return { group, run };
  }
  return undefined;
};
