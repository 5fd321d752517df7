import { UnreadableFile, type World, bytesOf } from './world.ts';

type Bytes = Uint8Array;

/** A stretch of a file: its bytes, and the text that they complete. */
interface Stretch {
  readonly bytes: Bytes;
  readonly text: string;
}

/** UTF-16 says what it is by its first two bytes; everything else must be UTF-8. */
const encodingOf = ([first, second]: Bytes): string => {
  if (first === 0xff && second === 0xfe) return 'utf-16le';
  return first === 0xfe && second === 0xff ? 'utf-16be' : 'utf-8';
};

const joined = (one: Bytes, other: Bytes): Bytes => {
  const both = new Uint8Array(one.length + other.length);
  both.set(one);
  both.set(other, one.length);
  return both;
};

/** The same bytes, the first piece at least two long where there are two: by them the encoding is told. */
const headed = async function* (pieces: AsyncIterable<Bytes>): AsyncGenerator<Bytes> {
  let head: Bytes | null = new Uint8Array(0);
  for await (const piece of pieces) {
    const bytes: Bytes = head === null ? piece : joined(head, piece);
    if (head !== null && bytes.length < 2) head = bytes;
    else {
      head = null;
      yield bytes;
    }
  }
  if (head !== null && head.length > 0) yield head;
};

/** What is decoded; a text never holds U+0000, which most other files do. */
const decoded = (decoder: InstanceType<typeof TextDecoder>, bytes?: Bytes): string => {
  const text = bytes === undefined ? decoder.decode() : decoder.decode(bytes, { stream: true });
  if (text.includes('\0')) throw new TypeError('U+0000 in a text');
  return text;
};

const stretches = async function* (world: World, path: string): AsyncGenerator<Stretch> {
  let decoder: InstanceType<typeof TextDecoder> | null = null;
  try {
    for await (const bytes of headed(bytesOf(world, path))) {
      decoder ??= new TextDecoder(encodingOf(bytes), { fatal: true });
      yield { bytes, text: decoded(decoder, bytes) };
    }
    if (decoder !== null) yield { bytes: new Uint8Array(0), text: decoded(decoder) };
  } catch (problem) {
    if (!(problem instanceof TypeError)) throw problem;
    throw new UnreadableFile(`${path} cannot be read: it is not UTF-8 text. If it is a text, save it as UTF-8.`);
  }
};

/**
 * The text of `path`, or of standard input for "-", piece by piece: UTF-8, or UTF-16 where a byte-order mark says so.
 * Throws `UnreadableFile`, also for what is no text; nothing of that is repeated.
 */
export const textPieces = async function* (world: World, path: string): AsyncGenerator<string> {
  for await (const { text } of stretches(world, path)) yield text;
};

/** The bytes of `path` for a reader that decodes by itself, checked as `textPieces` does. Throws `UnreadableFile`. */
export const textBytes = async function* (world: World, path: string): AsyncGenerator<Uint8Array> {
  for await (const { bytes } of stretches(world, path)) yield bytes;
};

/** The whole text of `path`. Throws `UnreadableFile` as `textPieces` does. */
export const textOf = async (world: World, path: string): Promise<string> => {
  let text = '';
  for await (const piece of textPieces(world, path)) text += piece;
  return text;
};
