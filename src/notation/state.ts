import type { Token } from 'moo';

/** The state that a state token names: "s" in `(s, graphite)`; null for none and for the marks of gas and precipitate. */
export const stateOf = (token: Token | null): string | null =>
  token?.type === 'state' ? (/[a-z]+/u.exec(token.text)?.[0] ?? null) : null;

/** What else stands in a state token: "graphite" in `(s, graphite)`, the arrow of `CO2↑`; null for nothing. */
export const remarkOf = (token: Token | null): string | null => {
  if (token === null) return null;
  if (token.type !== 'state') return token.text;
  const comma = token.text.indexOf(',');
  return comma < 0 ? null : token.text.slice(comma + 1, -1).trim();
};
