import { run } from '../../src/cli/run.ts';
import type { ExitCode, World } from '../../src/cli/world.ts';

/** What a command printed and how it ended. */
export interface Outcome {
  readonly code: ExitCode;
  readonly out: string;
  readonly err: string;
}

/** A world without a process: files by path, standard input as text. */
export interface Surroundings {
  /** As text, or as bytes where they are none. */
  readonly files?: Readonly<Record<string, string | Uint8Array>>;
  readonly input?: string;
  readonly terminal?: boolean;
  readonly colour?: boolean;
}

const bytes = async function* (text: string | Uint8Array): AsyncGenerator<Uint8Array> {
  await Promise.resolve();
  yield typeof text === 'string' ? new TextEncoder().encode(text) : text;
};

const fileOf = async function* (
  files: Readonly<Record<string, string | Uint8Array>>,
  path: string,
): AsyncGenerator<Uint8Array> {
  const text = files[path];
  if (text === undefined) throw Object.assign(new Error(path), { code: 'ENOENT' });
  yield* bytes(text);
};

/** Runs a command line in a world of its own. */
export const couplet = async (argv: readonly string[], around: Surroundings = {}): Promise<Outcome> => {
  let out = '';
  let err = '';
  const world: World = {
    out: (text) => {
      out += text;
      return Promise.resolve();
    },
    err: (text) => {
      err += text;
    },
    input: bytes(around.input ?? ''),
    open: (path) => fileOf(around.files ?? {}, path),
    terminal: around.terminal ?? false,
    colour: around.colour ?? false,
  };
  const code = await run(argv, world);
  return { code, out, err };
};
