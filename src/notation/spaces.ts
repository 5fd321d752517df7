import type { Place } from './arrows.ts';

/** Spaces of every width and line ends, inside a character class. Other characters that do not show are never skipped. */
export const SPACE_CLASS = ' \\t\\r\\n\\u00a0\\u2000-\\u200a\\u202f\\u205f\\u3000';

const LEADING = new RegExp(`^[${SPACE_CLASS}]+`, 'u');
const ONLY = new RegExp(`^[${SPACE_CLASS}]*$`, 'u');
const SPACE = new RegExp(`[${SPACE_CLASS}]`, 'u');

/** True where the text is empty or spaces only. */
export const isBlank = (text: string): boolean => ONLY.test(text);

/** `place` without the spaces at its ends; empty at its start where there is nothing else. */
export const trimPlace = (text: string, { from, to }: Place): Place => {
  const start = Math.min(to, from + (LEADING.exec(text.slice(from, to))?.[0].length ?? 0));
  let end = to;
  while (end > start && SPACE.test(text[end - 1] ?? '')) end -= 1;
  return { from: start, to: end };
};
