#!/usr/bin/env node
import { createReadStream } from 'node:fs';
import { stat, writeFile } from 'node:fs/promises';
import process from 'node:process';
import { run } from './run.ts';
import type { World } from './world.ts';

/** Resolves when the stream takes more, so that a fast batch waits for a slow reader. */
const write = (text: string): Promise<void> =>
  new Promise((resolve) => {
    if (process.stdout.write(text)) resolve();
    else process.stdout.once('drain', resolve);
  });

const { NO_COLOR, TERM } = process.env;
const terminal = process.stdout.isTTY;

const world: World = {
  out: write,
  err: (text) => {
    process.stderr.write(text);
  },
  input: process.stdin,
  open: (path) => createReadStream(path),
  save: (path, text) => writeFile(path, text),
  terminal,
  errorTerminal: process.stderr.isTTY,
  sizeOf: (path) =>
    stat(path).then(
      ({ size }) => size,
      () => undefined,
    ),
  colour: terminal && (NO_COLOR === undefined || NO_COLOR === '') && TERM !== 'dumb',
};

/** The reader of a pipe went away (`| head`): that is no fault of ours, and there is nobody to tell. */
process.stdout.on('error', (problem: NodeJS.ErrnoException) => {
  if (problem.code !== 'EPIPE') process.stderr.write(`Standard output cannot be written: ${problem.code ?? ''}.\n`);
  process.exit(problem.code === 'EPIPE' ? 0 : 1);
});

/** Nobody reads the faults either. */
process.stderr.on('error', () => process.exit(1));

process.exitCode = await run(process.argv.slice(2), world);
