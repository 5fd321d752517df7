/** One line of a stream of bytes: its text, or why it has none. */
export type Line =
  { readonly kind: 'text'; readonly text: string } | { readonly kind: 'too-long' } | { readonly kind: 'not-utf-8' };

/** Longest line that is kept, in bytes; the rest of a longer one is passed over without being stored. */
export const LONGEST_LINE = 1_000_000;

const FEED = 0x0a;
const RETURN = 0x0d;

/**
 * Cuts a stream of bytes into lines. UTF-8 never has a line feed inside a character, so the cut is made on bytes
 * and each line is decoded by itself: a chunk may end in the middle of a character.
 */
export class LineCutter {
  private held: Uint8Array[] = [];
  private length = 0;
  private first = true;
  private readonly decoder = new TextDecoder('utf-8', { fatal: true, ignoreBOM: true });

  /** The lines that `chunk` completes. */
  public *take(chunk: Uint8Array): Generator<Line> {
    let from = 0;
    // chunk:  ...tail of a held line \n a whole line \n head of the next...
    //                                ^ feed
    for (let feed = chunk.indexOf(FEED); feed !== -1; feed = chunk.indexOf(FEED, from)) {
      this.hold(chunk.subarray(from, feed));
      yield this.release();
      from = feed + 1;
    }
    this.hold(chunk.subarray(from));
  }

  /** The last line, where the stream does not end in a line feed. */
  public *rest(): Generator<Line> {
    if (this.length > 0) yield this.release();
  }

  private hold(bytes: Uint8Array): void {
    this.length += bytes.length;
    if (this.length > LONGEST_LINE) this.held = [];
    else if (bytes.length > 0) this.held.push(bytes.slice());
  }

  private release(): Line {
    const { held, length, first } = this;
    this.held = [];
    this.length = 0;
    this.first = false;
    if (length > LONGEST_LINE) return { kind: 'too-long' };
    const [only] = held;
    const bytes = held.length === 1 && only !== undefined ? only : joined(held, length);
    const end = bytes.at(-1) === RETURN ? bytes.length - 1 : bytes.length;
    return this.decode(bytes.subarray(0, end), first);
  }

  private decode(bytes: Uint8Array, first: boolean): Line {
    try {
      const text = this.decoder.decode(bytes);
      return { kind: 'text', text: first && text.startsWith('\ufeff') ? text.slice(1) : text };
    } catch {
      return { kind: 'not-utf-8' };
    }
  }
}

const joined = (pieces: readonly Uint8Array[], length: number): Uint8Array => {
  const whole = new Uint8Array(length);
  let at = 0;
  for (const piece of pieces) {
    whole.set(piece, at);
    at += piece.length;
  }
  return whole;
};
