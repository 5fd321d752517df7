import { type CautionMode, type Scene, type Sides, mediaOf } from '../../src/caution/scene.ts';
import { mediumRow } from '../../src/redox/media.ts';
import type { Medium } from '../../src/redox/medium.ts';
import { type Species, isElectron } from '../../src/species/species.ts';
import { plain, plainEquation } from '../support/plain.ts';

/** What runs, as a table writes it. */
export interface Run {
  readonly anode?: string;
  readonly cathode?: string;
  readonly overall?: string;
  readonly medium?: string | readonly string[];
  readonly mode?: CautionMode;
  readonly divided?: boolean;
}

const sidesOf = (reaction: string | undefined): Sides => {
  if (reaction === undefined) return { reactants: [], products: [] };
  const { left, right } = plainEquation(reaction);
  const species = (terms: typeof left): readonly Species[] =>
    terms.map((term) => term.species).filter((one) => !isElectron(one));
  return { reactants: species(left), products: species(right) };
};

const mediumOf = (medium: Run['medium']): Medium | null => {
  if (medium === undefined) return null;
  if (typeof medium !== 'string') return { name: null, helpers: medium.map(plain) };
  const row = mediumRow(medium);
  if (row === undefined) throw new Error(`no medium ${medium}`);
  return row;
};

/** The scene of a run; with no medium written, nothing is known of it. */
export const sceneOf = ({ anode, cathode, overall, medium, mode, divided }: Run): Scene => ({
  anode: sidesOf(anode),
  cathode: sidesOf(cathode),
  overall: sidesOf(overall),
  media: medium === undefined ? [] : mediaOf(mediumOf(medium), []),
  mode: mode ?? null,
  divided: divided ?? null,
});
