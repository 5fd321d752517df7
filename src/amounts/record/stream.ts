import type { Result } from '../../report/result.ts';
import type { RecordOptions } from './options.ts';
import { openRecord } from './reader.ts';
import type { RecordSummary } from './summary.ts';

/** UTF-16 says what it is by its first two bytes; everything else is read as UTF-8. */
const encodingOf = ([first, second]: Uint8Array): string => {
  if (first === 0xff && second === 0xfe) return 'utf-16le';
  return first === 0xfe && second === 0xff ? 'utf-16be' : 'utf-8';
};

const joined = (a: Uint8Array, b: Uint8Array): Uint8Array => {
  const both = new Uint8Array(a.length + b.length);
  both.set(a);
  both.set(b, a.length);
  return both;
};

type Decoder = InstanceType<typeof TextDecoder>;

/** Decodes the bytes of a text piece by piece; a piece may end inside a character. */
class RecordText {
  private head = new Uint8Array(0) as Uint8Array;
  private decoder: Decoder | null = null;

  take(bytes: Uint8Array): string {
    if (this.decoder !== null) return this.decoder.decode(bytes, { stream: true });
    this.head = joined(this.head, bytes);
    return this.head.length < 2 ? '' : this.start().decode(this.head, { stream: true });
  }

  rest(): string {
    return this.decoder === null ? this.start().decode(this.head) : this.decoder.decode();
  }

  private start(): Decoder {
    return (this.decoder = new TextDecoder(encodingOf(this.head)));
  }
}

/**
 * Reads and integrates a record from its bytes as they come, in constant memory. `onBytes` hears how many were read
 * after each piece. Faults: those of `openRecord` and of `RecordReader.end`.
 */
export const readRecordStream = async (
  bytes: AsyncIterable<Uint8Array>,
  options: RecordOptions = {},
  onBytes: (read: number) => void = () => undefined,
): Promise<Result<RecordSummary>> => {
  const opened = openRecord(options);
  if (!opened.ok) return opened;
  const reader = opened.value;
  const text = new RecordText();
  let read = 0;
  for await (const piece of bytes) {
    reader.take(text.take(piece));
    read += piece.length;
    onBytes(read);
    if (reader.failed) return reader.end();
  }
  reader.take(text.rest());
  return reader.end();
};
