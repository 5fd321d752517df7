/** The front door of reading: text in, species, equations and definitions out. Every fault has its span. */
export { readDefinitions } from './read-definitions.ts';
export { readEquation } from './read-equation.ts';
export { type ReadingOptions, type SpeciesReading, readSpecies } from './read-species.ts';
