import { type Place, withoutRemarks } from './arrows.ts';
import { LIMITS } from './limits.ts';

/** How the plus signs of one side can be placed: the places of its terms, once for each way; or too many to try. */
export type Placements = readonly (readonly Place[])[] | 'too-many';

const OPEN = '([{';
const CLOSE = ')]}';

/** Offsets of the plus signs outside brackets. A bracket without a partner hides what follows; its own fault is found later. */
const plusSignsOf = (side: string): readonly number[] => {
  const found: number[] = [];
  let depth = 0;
  for (let at = 0; at < side.length; at += 1) {
    const char = side[at] ?? '';
    if (OPEN.includes(char)) depth += 1;
    else if (CLOSE.includes(char)) depth = Math.max(0, depth - 1);
    else if (char === '+' && depth === 0) found.push(at);
  }
  return found;
};

/**
 * A plus that can only separate: spaces on both sides, or the next formula starts right behind it.
 *   Fe^2+ + Cl2      Na+Cl      H2 +e-      but not   Ca2++2F-   Li1+xMn2O4   Fe^3+
 *         ^            ^           ^
 */
const mustSeparate = (side: string, at: number): boolean => {
  if (endsCharge(side, at)) return isSpaced(side, at);
  const before = side[at - 1] ?? ' ';
  const rest = side.slice(at + 1, at + 40);
  const spaced = isSpaced(side, at);
  const formulaFollows = /^\s*(?:[A-Z[]|e[-−^⁻])/u.test(rest) && before !== '^' && before !== '{';
  const numberFollows =
    /^\s*[\d½¼¾⅓⅔]/u.test(rest) && /[A-Za-z)\]}]/u.test(before) && /^\s*[\d./\s½¼¾⅓⅔]+[A-Z[(e]/u.test(rest);
  return spaced || formulaFollows || (numberFollows && !/[xyznm]/u.test(before));
};

/** The sign of a charge behind a caret: Fe^2+. */
const endsCharge = (side: string, at: number): boolean => /\^\d*$/u.test(side.slice(Math.max(0, at - 8), at));

const isSpaced = (side: string, at: number): boolean =>
  /\s/u.test(side[at - 1] ?? ' ') && /^(?:\s|$)/u.test(side.slice(at + 1, at + 2));

/** Doubtful plus signs between two that must separate, and the stretch they stand in. */
interface Chunk extends Place {
  readonly doubtful: readonly number[];
}

/** The stretches between the signs that must separate, in one pass over the signs. */
const chunksOf = (side: string): readonly Chunk[] => {
  const masked = withoutRemarks(side);
  const chunks: Chunk[] = [];
  let from = 0;
  let doubtful: number[] = [];
  for (const at of [...plusSignsOf(masked), side.length]) {
    if (at < side.length && !mustSeparate(masked, at)) {
      doubtful.push(at);
      continue;
    }
    chunks.push({ from, to: at, doubtful });
    from = at + 1;
    doubtful = [];
  }
  return chunks;
};

/** Ways to cut one chunk so that each piece reads. Piece after piece from the left; `LIMITS.placements` ways are enough. */
const waysOf = (side: string, chunk: Chunk, reads: (term: string) => boolean): readonly (readonly Place[])[] => {
  const cuts = [...chunk.doubtful, chunk.to];
  const memo = new Map<number, readonly (readonly Place[])[]>();
  const from = (start: number): readonly (readonly Place[])[] => {
    const known = memo.get(start);
    if (known !== undefined) return known;
    const ways: (readonly Place[])[] = [];
    for (const to of cuts.filter((cut) => cut >= start).slice(0, LIMITS.plusSigns)) {
      if (ways.length >= LIMITS.placements) break;
      if (!reads(side.slice(start, to))) continue;
      if (to === chunk.to) ways.push([{ from: start, to }]);
      else for (const rest of from(to + 1)) ways.push([{ from: start, to }, ...rest]);
    }
    const kept = ways.slice(0, LIMITS.placements);
    memo.set(start, kept);
    return kept;
  };
  return from(chunk.from);
};

/** Where nothing reads: a doubtful plus belongs to a charge before another plus or the end, else it separates. */
const fallback = (side: string, chunk: Chunk): readonly Place[] => {
  const cuts = chunk.doubtful.filter((at) => {
    if (endsCharge(side, at)) return false;
    const next = side.slice(at + 1, chunk.to);
    return !/^\s*(?:\+|$|[)}\]])/u.test(next) && !/^\s*\(/u.test(next);
  });
  return [...cuts, chunk.to].map((to, index) => ({ from: index === 0 ? chunk.from : (cuts[index - 1] ?? 0) + 1, to }));
};

/**
 * Every placement of the separating plus signs in one side of an equation, offsets within `side`. `reads` tells
 * whether a text is a term. Where no placement reads, the likeliest is given: its terms say what is wrong.
 */
export const placementsOf = (side: string, reads: (term: string) => boolean): Placements => {
  let placements: readonly Place[][] = [[]];
  for (const chunk of chunksOf(side)) {
    if (chunk.doubtful.length > LIMITS.doubtfulSigns) return 'too-many';
    const ways = chunk.doubtful.length === 0 ? [[{ from: chunk.from, to: chunk.to }]] : waysOf(side, chunk, reads);
    const [way = fallback(side, chunk), ...others] = ways;
    // One way is the rule: it is put behind what is there, without a copy of the terms before it.
    if (others.length === 0) for (const placement of placements) placement.push(...way);
    else
      placements = placements.flatMap((before) => ways.map((each) => [...before, ...each])).slice(0, LIMITS.placements);
  }
  return placements;
};
