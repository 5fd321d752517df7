import { bench, describe } from 'vitest';
import { parseSpecies } from '../../src/notation/parse-species.ts';
import { readEquation, readSpecies } from '../../src/species/read.ts';

/** Distinct spellings of one shape: no text comes twice before 10^9 readings. */
let next = 0;
const distinct = (): string => `C${String((next += 1))}H12O6^2-`;

describe('reading a species', () => {
  bench('a distinct species: lexed, parsed, counted, ranked', () => {
    readSpecies(distinct());
  });
  bench('a repeated species: looked up', () => {
    readSpecies('Cr2O7^2-');
  });
  bench('the parser alone', () => {
    parseSpecies('[Co(NH3)5Cl]^2+');
  });
});

describe('reading an equation', () => {
  bench('permanganate, its species known already', () => {
    readEquation('MnO4^- + 8 H^+ + 5 e^- -> Mn^2+ + 4 H2O');
  });
  bench('tight plus signs: every placement tried', () => {
    readEquation('2Na++2Cl-+Ca2++2F-->CaF2+2NaCl');
  });
  bench('10,000 terms', () => {
    readEquation(`${'H+'.repeat(9_990)}H->H`);
  });
  bench('200,000 characters', () => {
    readEquation('H'.repeat(200_000));
  });
});
