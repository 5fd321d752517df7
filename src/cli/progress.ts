import type { World } from './world.ts';

/** Cells of the bar, and how far apart two drawings are where the whole size is not known. */
const CELLS = 30;
const MEGABYTE = 1_000_000;
const STEP = 4 * MEGABYTE;

const CLEAR = '\r\u001b[K';

const bar = (read: number, size: number): string => {
  const part = Math.min(1, read / size);
  const full = Math.round(part * CELLS);
  return `${'='.repeat(full)}${'.'.repeat(CELLS - full)} ${String(Math.floor(part * 100)).padStart(3)} %`;
};

/** A progress bar on standard error while a file is read; nothing where that is no terminal. */
export interface Progress {
  readonly read: (bytes: number) => void;
  readonly done: () => void;
}

/** Draws each whole per cent of `size` bytes, or the megabytes read where the size is not known. */
export const progressOn = ({ err, errorTerminal }: World, size: number | undefined): Progress => {
  if (errorTerminal !== true) return { read: () => undefined, done: () => undefined };
  let drawn = -1;
  const known = size !== undefined && size > 0 ? size : undefined;
  return {
    read: (bytes) => {
      const mark = known === undefined ? Math.floor(bytes / STEP) : Math.floor((bytes / known) * 100);
      if (mark === drawn) return;
      drawn = mark;
      const text = known === undefined ? `${String(Math.floor(bytes / MEGABYTE))} MB read` : bar(bytes, known);
      err(`${CLEAR}${text}`);
    },
    done: () => {
      if (drawn >= 0) err(CLEAR);
    },
  };
};
