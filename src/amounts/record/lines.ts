/** Longest line that is kept, in characters; the rest of a longer one is passed over without being stored. */
export const LONGEST_RECORD_LINE = 10_000;

const LINE_END = /\r\n|[\r\n]/;

/** A line without its end; null where it is too long. `ended`: false for a last line without a line end. */
export type TakeLine = (text: string | null, ended: boolean) => void;

/**
 * Cuts pieces of text into lines that end in a line feed, a carriage return or both, mixed as they come. Where the text
 * is cut into pieces makes no difference.
 */
export class RecordLines {
  private held = '';
  private tooLong = false;
  /** The last piece ended in a carriage return: a line feed at the start of the next belongs to it. */
  private returned = false;
  private first = true;
  private readonly line: TakeLine;

  constructor(line: TakeLine) {
    this.line = line;
  }

  /** Gives every line that `piece` completes. */
  take(piece: string): void {
    if (piece === '') return;
    const parts = piece.slice(this.passedOver(piece)).split(LINE_END);
    this.first = false;
    this.returned = piece.endsWith('\r');
    const open = parts.pop() ?? '';
    for (const part of parts) this.release(part, true);
    this.hold(open);
  }

  /** Gives the last line where it has no line end. */
  rest(): void {
    if (this.held !== '' || this.tooLong) this.release('', false);
  }

  /** A byte-order mark at the very start, or the line feed of a return that ended the last piece. */
  private passedOver(piece: string): number {
    return (this.first && piece.startsWith('\ufeff')) || (this.returned && piece.startsWith('\n')) ? 1 : 0;
  }

  private hold(text: string): void {
    if (this.held.length + text.length > LONGEST_RECORD_LINE) {
      this.tooLong = true;
      this.held = '';
    } else if (!this.tooLong) this.held += text;
  }

  private release(text: string, ended: boolean): void {
    this.hold(text);
    const whole = this.tooLong ? null : this.held;
    this.held = '';
    this.tooLong = false;
    this.line(whole, ended);
  }
}
