/** A stretch of UTF-16 offsets, `to` exclusive. */
export interface Place {
  readonly from: number;
  readonly to: number;
}

const GLYPHS = '→⇌⇄⇆⇋⇒⇔↔⟶⟷⟹⟺➔➙➛➜➝➞⇀⇁↦⇨⇾⭢⥂';

/** Dashes and signs that people draw arrows with, the arrow characters, and the equals sign. */
const ARROW = new RegExp(`<[-=−–—]{1,4}>|[-−–—]{1,4}>|={1,3}>|[${GLYPHS}]|={1,3}`, 'gu');

/** A remark in a state, `(s, graphite)`, may hold any sign; so may nothing else. */
const REMARK = /\(\s*[a-z]{1,4}\s*,[^()]*\)/gu;

/** `text` with the remarks of states blanked out, at the same length. */
export const withoutRemarks = (text: string): string => text.replace(REMARK, (remark) => ' '.repeat(remark.length));

/** True where the arrow is an equals sign: it may also be a double bond beside a proper arrow. */
const isEquals = (text: string, { from, to }: Place): boolean => /^=+$/u.test(text.slice(from, to));

/** The places of the arrows in `text`, in order. Beside a proper arrow, equals signs are not arrows. */
export const arrowsIn = (text: string): readonly Place[] => {
  const found = [...withoutRemarks(text).matchAll(ARROW)].map(({ index, 0: arrow }) => ({
    from: index,
    to: index + arrow.length,
  }));
  const proper = found.filter((place) => !isEquals(text, place));
  return proper.length > 0 ? proper : found;
};

/**
 * Where an arrow can begin. Tight behind a formula the first dashes may be charges:
 *   Cl-->Cl2      from 2 (Cl --> Cl2) or from 3 (Cl- -> Cl2)
 */
export const startsOf = (text: string, arrow: Place): readonly number[] => {
  const dashes = /^[-−–—]+(?=>)/u.exec(text.slice(arrow.from, arrow.to))?.[0].length ?? 1;
  const tight = arrow.from > 0 && !/\s/u.test(text[arrow.from - 1] ?? ' ');
  return tight ? Array.from({ length: dashes }, (_, taken) => arrow.from + taken) : [arrow.from];
};

/** True where `text` points from right to left only. */
export const pointsLeft = (text: string): boolean => /<[-=]|[←⇐⟵⟸]/u.test(text);
