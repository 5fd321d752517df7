import { describe, expect, it } from 'vitest';
import { USUAL_BOUNDS, startMeter } from '../../src/exact/bounds.ts';

describe('a meter', () => {
  it('stays passed, and names the bound that was passed first', () => {
    const meter = startMeter({ vectors: 2, steps: 10, digits: 3 });
    expect([meter.step(10), meter.hold([999n], 2), meter.passed()]).toEqual([true, true, undefined]);
    expect([meter.hold([-1000n], 1), meter.step(1), meter.hold([1n], 1)]).toEqual([false, false, false]);
    expect(meter.passed()).toEqual({ kind: 'too-hard', limit: '3 digits' });
  });

  it('counts a longer number for more', () => {
    const room = { ...USUAL_BOUNDS, steps: 2_000 };
    expect(startMeter(room).write(1, 100, 7n)).toBe(true);
    expect(startMeter(room).write(1, 100, 2n ** 640n)).toBe(false);
  });

  it('counts on the whole that it is a part of, whose bounds then hold too', () => {
    const whole = startMeter({ ...USUAL_BOUNDS, steps: 30 });
    const [first, second] = [startMeter({ ...USUAL_BOUNDS, steps: 25 }, whole), startMeter(USUAL_BOUNDS, whole)];
    expect([first.step(20), second.step(10), whole.passed()]).toEqual([true, true, undefined]);
    expect(second.step(1)).toBe(false);
    expect(second.passed()).toEqual({ kind: 'too-hard', limit: '30 steps' });
    expect(first.step(1)).toBe(false);
  });

  it('leaves the whole standing where only its own bound was passed', () => {
    const whole = startMeter({ ...USUAL_BOUNDS, steps: 30 });
    expect(startMeter({ ...USUAL_BOUNDS, steps: 5 }, whole).step(6)).toBe(false);
    expect(whole.step(20)).toBe(true);
  });
});
