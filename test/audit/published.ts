import { readFileSync } from 'node:fs';

const column = (file: string): readonly string[] =>
  readFileSync(new URL(`../../fixtures/published/${file}`, import.meta.url), 'utf8')
    .split('\n')
    .slice(1)
    .map((line) => line.split('\t')[0] ?? '')
    .filter((text) => text !== '');

/** Half-reactions of the published tables, each with its source in the file. */
export const publishedHalves = (): readonly string[] => column('standard-potentials.tsv');

/** Equilibria of the published tables. */
export const publishedEquilibria = (): readonly string[] => column('equilibria.tsv');
