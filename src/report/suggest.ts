/**
 * Edits that take `a` to `b`: insert, delete, replace or swap two neighbours (optimal string alignment).
 * Case counts. Row by row: `row[j]` is the distance between the first i letters of `a` and the first j of `b`.
 */
export const editDistance = (a: string, b: string): number => {
  const from = Array.from(a);
  const to = Array.from(b);
  let before: readonly number[] = [];
  let above: readonly number[] = Array.from({ length: to.length + 1 }, (_, j) => j);
  from.forEach((letter, i) => {
    const row: number[] = [i + 1];
    to.forEach((other, j) => {
      const at = (line: readonly number[], index: number): number => line[index] ?? Infinity;
      const replaced = at(above, j) + (letter === other ? 0 : 1);
      const swapped = letter === to[j - 1] && other === from[i - 1] ? at(before, j - 1) + 1 : Infinity;
      row.push(Math.min(replaced, at(above, j + 1) + 1, at(row, j) + 1, swapped));
    });
    before = above;
    above = row;
  });
  return above[to.length] ?? 0;
};

/**
 * The candidates nearest to `text`, at most `limit`: first those that differ in case only, then by edit distance
 * (case aside) up to `within`; ties keep the order of the candidates.
 */
export const nearest = (text: string, candidates: Iterable<string>, within = 2, limit = 3): readonly string[] => {
  const lower = text.toLowerCase();
  return [...candidates]
    .map((word) => ({ word, distance: editDistance(lower, word.toLowerCase()) }))
    .filter(({ distance }) => distance <= within)
    .sort((a, b) => a.distance - b.distance)
    .slice(0, limit)
    .map(({ word }) => word);
};

/** "Did you mean Xe?", "Did you mean Zn or Zr?"; undefined where nothing is near. */
export const didYouMean = (words: readonly string[]): string | undefined => {
  const last = words.at(-1);
  if (last === undefined) return undefined;
  const rest = words.slice(0, -1);
  return `Did you mean ${rest.length === 0 ? last : `${rest.join(', ')} or ${last}`}?`;
};
