import { readFileSync } from 'node:fs';
import type { IntegerMatrix } from '../../src/exact/matrix.ts';

/** The rows of a table in `fixtures/exact/`, split at tabs; lines that begin with # are its source. */
export const casesOf = (name: string): readonly (readonly string[])[] =>
  readFileSync(new URL(`../../fixtures/exact/${name}`, import.meta.url), 'utf8')
    .split('\n')
    .filter((line) => line !== '' && !line.startsWith('#'))
    .map((line) => line.split('\t'));

/** "1 2; 3 4" as a matrix; an empty text has no rows. */
export const matrixOf = (text: string): IntegerMatrix =>
  text.trim() === '' ? [] : text.split(';').map((row) => vectorOf(row));

/** "1 -2" as a vector. */
export const vectorOf = (text: string): readonly bigint[] =>
  text.trim() === '' ? [] : text.trim().split(/\s+/).map(BigInt);

/** Vectors as sorted text: sets of vectors compare like this. */
export const asSet = (vectors: IntegerMatrix): readonly string[] =>
  vectors.map((vector) => vector.map(String).join(' ')).toSorted();
