/** How something is shown: a terminal gets Unicode and colour, a pipe gets plain text. */
export interface Look {
  /** Sub- and superscripts, arrows and dashes instead of the canonical plain spelling. */
  readonly unicode: boolean;
  readonly paint: Paint;
}

/** Colour, only where it carries meaning. Each takes text and gives it back, painted or not. */
export interface Paint {
  /** The result itself. */
  readonly strong: (text: string) => string;
  /** What frames it: labels, helpers, sources. */
  readonly faint: (text: string) => string;
  /** Holds. */
  readonly good: (text: string) => string;
  /** Needs a look. */
  readonly warn: (text: string) => string;
  /** Is wrong. */
  readonly bad: (text: string) => string;
  /** Where a repair changes the writer's text. */
  readonly mark: (text: string) => string;
}

const asIs = (text: string): string => text;

/** No colour at all. */
export const UNPAINTED: Paint = { strong: asIs, faint: asIs, good: asIs, warn: asIs, bad: asIs, mark: asIs };

/** What a pipe or a file gets. */
export const PLAIN_LOOK: Look = { unicode: false, paint: UNPAINTED };
