import { describe, expect, it } from 'vitest';
import { answerBatch } from '../../src/batch/batch.ts';
import { LONGEST_LINE } from '../../src/batch/lines.ts';

const bytes = (text: string): Uint8Array => new TextEncoder().encode(text);

/** The chunks as a stream. */
const stream = async function* (...chunks: readonly Uint8Array[]): AsyncGenerator<Uint8Array> {
  await Promise.resolve();
  yield* chunks;
};

const run = async (...chunks: readonly Uint8Array[]) => {
  const written: string[] = [];
  const tally = await answerBatch({
    input: stream(...chunks),
    write: (text) => {
      written.push(text);
      return Promise.resolve();
    },
  });
  const text = written.join('');
  const lines = text.split('\n').filter((line) => line !== '');
  return { tally, text, answers: lines.map((line): unknown => JSON.parse(line)) };
};

const species = (id: string): string => JSON.stringify({ id, ask: 'species', text: 'Fe' });

describe('a batch', () => {
  it('answers line by line in order', async () => {
    const { answers, tally } = await run(bytes(`${species('1')}\n${species('2')}\n${species('3')}\n`));
    expect(answers).toMatchObject([
      { id: '1', ok: true },
      { id: '2', ok: true },
      { id: '3', ok: true },
    ]);
    expect(tally).toEqual({ answered: 3, faulted: 0 });
  });

  it('gives a fault line for what is no JSON object and goes on', async () => {
    const { answers, tally } = await run(bytes(`{"ask": \n[1]\n"text"\nnull\n${species('a')}\n`));
    expect(answers).toHaveLength(5);
    for (const one of answers.slice(0, 4)) {
      expect(one).toMatchObject({ contract: 1, ask: null, ok: false, fault: { code: 'bad-ask' } });
    }
    expect(answers[4]).toMatchObject({ id: 'a', ok: true });
    expect(tally).toEqual({ answered: 1, faulted: 4 });
  });

  it('gives a fault line for a blank line, so that lines out stay in step with lines in', async () => {
    const { answers } = await run(bytes(`\n${species('1')}\n\t\r\n${species('2')}\n`));
    expect(answers).toMatchObject([
      { ask: null, ok: false, fault: { code: 'bad-ask' } },
      { id: '1' },
      { ask: null, ok: false },
      { id: '2' },
    ]);
  });

  it('takes the last line without a line end, line ends of two characters and a byte-order mark', async () => {
    const { answers } = await run(bytes(`\ufeff${species('1')}\r\n${species('2')}`));
    expect(answers).toMatchObject([
      { id: '1', ok: true },
      { id: '2', ok: true },
    ]);
  });

  it('joins a character that two chunks share', async () => {
    const whole = bytes(`${JSON.stringify({ id: 'é⁺', ask: 'species', text: 'SO₄²⁻' })}\n`);
    const pieces = [...whole].map((byte) => Uint8Array.of(byte));
    const { answers } = await run(...pieces);
    expect(answers).toMatchObject([{ id: 'é⁺', ok: true, answer: { species: { plain: 'SO4^2-' } } }]);
  });

  it('refuses a line that is too long without keeping it, and goes on', async () => {
    const long = bytes('x'.repeat(LONGEST_LINE / 2 + 1));
    const { answers } = await run(long, long, bytes(`\n${species('after')}\n`));
    expect(answers).toMatchObject([
      { ask: null, ok: false, fault: { code: 'too-long' } },
      { id: 'after', ok: true },
    ]);
  });

  it('refuses bytes that are not UTF-8', async () => {
    const { answers } = await run(Uint8Array.of(0xff, 0xfe, 0x0a), bytes(species('after')));
    expect(answers).toMatchObject([
      { ask: null, ok: false, fault: { code: 'bad-ask' } },
      { id: 'after', ok: true },
    ]);
  });

  it('writes what it has answered before it reads on, so that the other side may wait for it', async () => {
    const seen: string[] = [];
    const input = async function* (): AsyncGenerator<Uint8Array> {
      yield bytes(`${species('1')}\n`);
      await Promise.resolve();
      expect(seen.join('')).toContain('"id":"1"');
      yield bytes(`${species('2')}\n`);
      expect(seen.join('')).toContain('"id":"2"');
    };
    const write = (text: string): Promise<void> => {
      seen.push(text);
      return Promise.resolve();
    };
    await answerBatch({ input: input(), write });
    expect(seen).toHaveLength(2);
  });

  it('reads no further than a slow reader takes', async () => {
    let taken = 0;
    let open = 0;
    const input = async function* (): AsyncGenerator<Uint8Array> {
      for (let line = 0; line < 50; line += 1) {
        await Promise.resolve();
        taken += 1;
        expect(open).toBe(0);
        yield bytes(`${species(String(line))}\n`);
      }
    };
    const write = async (): Promise<void> => {
      open += 1;
      await new Promise((resolve) => setImmediate(resolve));
      open -= 1;
    };
    await answerBatch({ input: input(), write });
    expect(taken).toBe(50);
  });
});
