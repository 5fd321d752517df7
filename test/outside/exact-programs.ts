import { spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import type { IntegerMatrix } from '../../src/exact/matrix.ts';
import { readTable } from '../support/table.ts';
import { plain } from '../support/plain.ts';
import { numeratorOf } from '../../src/exact/rational.ts';
import type { System } from '../exact/generators.ts';

/** Whether a program answers on this machine. */
export const isInstalled = (program: string): boolean => spawnSync(program, ['--version']).status === 0;

/** The lines that PARI/GP (Debian package pari-gp) prints for `script`. */
export const askPari = (script: string): readonly string[] => {
  const { stdout, status } = spawnSync('gp', ['-q', '-f', '--default', 'parisizemax=200M'], {
    input: `${script}\nquit\n`,
    encoding: 'utf8',
  });
  if (status !== 0) throw new Error('gp failed');
  return stdout.split('\n').filter((line) => line !== '');
};

/** A matrix as PARI/GP writes it; the number of columns counts where there is no row. */
export const asPari = (matrix: IntegerMatrix, columnCount: number): string =>
  matrix.length === 0
    ? `matrix(0,${String(columnCount)})`
    : `matrix(${String(matrix.length)},${String(columnCount)},i,j,[${matrix
        .map((row) => `[${row.map(String).join(',')}]`)
        .join(',')}][i][j])`;

/** What Normaliz (Debian package normaliz) finds of a system, each vector [x | h]. */
export interface Normalized {
  readonly rays: IntegerMatrix;
  readonly irreducible: IntegerMatrix;
}

/** The extreme rays and the Hilbert basis of { (x, h) : A_S x + A_H h = 0, x >= 0 } by Normaliz. */
export const askNormaliz = ({ strict, free }: System): Normalized => {
  const [width, freeWidth] = [strict[0]?.length ?? 0, free[0]?.length ?? 0];
  const folder = mkdtempSync(path.join(tmpdir(), 'couplet-'));
  try {
    const rows = strict.map((row, index) => [...row, ...(free[index] ?? [])].map(String).join(' '));
    const signs = Array.from({ length: width }, (_, at) =>
      Array.from({ length: width + freeWidth }, (_, column) => (column === at ? '1' : '0')).join(' '),
    );
    const input = [
      `amb_space ${String(width + freeWidth)}`,
      `equations ${String(rows.length)}`,
      ...rows,
      `inequalities ${String(width)}`,
      ...signs,
    ];
    writeFileSync(path.join(folder, 'cone.in'), `${input.join('\n')}\n`);
    const { status, stderr } = spawnSync('normaliz', ['-a', '--HilbertBasis', '--ExtremeRays', 'cone.in'], {
      cwd: folder,
      encoding: 'utf8',
    });
    if (status !== 0) throw new Error(`normaliz failed: ${stderr}`);
    return {
      rays: readVectors(path.join(folder, 'cone.ext')),
      irreducible: readVectors(path.join(folder, 'cone.gen')),
    };
  } finally {
    rmSync(folder, { recursive: true });
  }
};

/** Number of rows, number of columns, then the rows. */
const readVectors = (file: string): IntegerMatrix => {
  const [rows = '0', , ...lines] = readFileSync(file, 'utf8').trim().split('\n');
  return lines.slice(0, Number(rows)).map((line) => line.trim().split(/\s+/).map(BigInt));
};

/** The skeletons of `fixtures/exact/skeletons.tsv` as systems: reactants counted negative, helpers free. */
export const skeletonSystems = (): readonly { readonly name: string; readonly system: System }[] =>
  readTable('exact/skeletons.tsv').map(({ left = '', right = '', helpers = '' }) => {
    const species = (text: string): readonly string[] => text.split(' ').filter((word) => word !== '');
    const counted = [...species(left), ...species(right), ...species(helpers)].map(plain);
    const labels = [...new Set(counted.flatMap(({ composition }) => [...composition.keys()]))];
    const sides = species(left).length;
    const strictWidth = sides + species(right).length;
    const rows = [
      ...labels.map((label) => counted.map(({ composition }) => composition.get(label))),
      counted.map(({ charge }) => charge),
    ].map((row) => row.map((value, at) => (at < sides ? -1n : 1n) * (value === undefined ? 0n : numeratorOf(value))));
    return {
      name: `${left} -> ${right} with ${helpers === '' ? 'nothing' : helpers}`,
      system: { strict: rows.map((row) => row.slice(0, strictWidth)), free: rows.map((row) => row.slice(strictWidth)) },
    };
  });
