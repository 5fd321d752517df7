/** What the command line touches of its surroundings, so that it is tested without a process. */
export interface World {
  /** Standard output; resolves when more may be written. */
  readonly out: (text: string) => Promise<void>;
  /** Standard error. */
  readonly err: (text: string) => void;
  /** Standard input. */
  readonly input: AsyncIterable<Uint8Array>;
  /** The bytes of a file; fails as Node does where it cannot be read. */
  readonly open: (path: string) => AsyncIterable<Uint8Array>;
  /** Writes a file, or writes over it; fails as Node does where it cannot be written. */
  readonly save?: (path: string, text: string) => Promise<void>;
  /** True where standard output is a terminal: it gets Unicode, a pipe gets plain text. */
  readonly terminal: boolean;
  /** True where colour is wanted: a terminal, and NO_COLOR not set. */
  readonly colour: boolean;
  /** True where standard error is a terminal: only there a progress bar is drawn. */
  readonly errorTerminal?: boolean;
  /** The size of a file in bytes where it is known. */
  readonly sizeOf?: (path: string) => Promise<number | undefined>;
}

/** 0 answered; 1 a fault, or an audit that is `unbalanced`; 2 the command itself was wrong. */
export type ExitCode = 0 | 1 | 2;

/** A file that could not be read as it was asked, in words for the person at the keyboard. */
export class UnreadableFile extends Error {}

/** An option that nothing can be answered with, as a page for the person at the keyboard. */
export class WrongSetting extends Error {}

const WHY: Readonly<Record<string, string>> = {
  ENOENT: 'there is no such file',
  EISDIR: 'it is a folder',
  EACCES: 'it is not permitted',
  ENOTDIR: 'there is no such folder',
};

const codeOf = (problem: unknown): string =>
  typeof problem === 'object' && problem !== null && 'code' in problem ? String(problem.code) : '';

/** The bytes of `path`, or of standard input for "-". Throws `UnreadableFile`. */
export const bytesOf = async function* (world: World, path: string): AsyncGenerator<Uint8Array> {
  try {
    yield* path === '-' ? world.input : world.open(path);
  } catch (problem) {
    const code = codeOf(problem);
    if (code === '') throw problem;
    throw new UnreadableFile(`${path} cannot be read: ${WHY[code] ?? code}.`);
  }
};

/** Writes a text to `path`. Throws `UnreadableFile` where it cannot be written. */
export const saveText = async ({ save }: World, path: string, text: string): Promise<void> => {
  if (save === undefined) throw new UnreadableFile(`${path} cannot be written here.`);
  try {
    await save(path, text);
  } catch (problem) {
    const code = codeOf(problem);
    if (code === '') throw problem;
    throw new UnreadableFile(`${path} cannot be written: ${WHY[code] ?? code}.`);
  }
};
