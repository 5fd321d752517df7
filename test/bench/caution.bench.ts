import { bench, describe } from 'vitest';
import { cautionsFor } from '../../src/caution/cautions.ts';
import { sceneOf } from '../caution/scene-of.ts';

const COPPER = sceneOf({
  anode: '2 H2O -> O2 + 4 H^+ + 4 e^-',
  cathode: 'Cu^2+ + 2 e^- -> Cu',
  overall: '2 Cu^2+ + 2 H2O -> 2 Cu + O2 + 4 H^+',
  medium: 'acid',
});
const HARMLESS = sceneOf({ anode: 'Fe^2+ -> Fe^3+ + e^-', cathode: 'Ce^4+ + e^- -> Ce^3+' });

describe('the cautions of a cell', () => {
  bench('copper from acid', () => {
    cautionsFor(COPPER);
  });
  bench('nothing to say', () => {
    cautionsFor(HARMLESS);
  });
});
