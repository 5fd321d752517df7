/** A made-up record as a logger would write it, in pieces of bytes: a reading each second, now and then a pause. */
export async function* madeUpRecord(rows: number): AsyncGenerator<Uint8Array> {
  const encoder = new TextEncoder();
  const each = 2_000;
  let state = 1;
  yield encoder.encode('time_s,current_A\n');
  for (let at = 0; at < rows; at += each) {
    const lines: string[] = [];
    for (let row = at; row < Math.min(rows, at + each); row += 1) {
      state = (state * 48_271) % 2_147_483_647;
      lines.push(`${String(row)},${row % 5_000 < 200 ? '0' : (250 + (state % 1_000) / 1_000).toFixed(3)}`);
    }
    yield encoder.encode(`${lines.join('\n')}\n`);
    await Promise.resolve();
  }
}
