import { LIMITS } from '../notation/limits.ts';
import type { KeptReading } from './read-species.ts';

/**
 * Readings already made, the oldest use first. Reading is a pure function of its key, so that nothing can go stale, and
 * the number of entries is fixed: the same few species come again in every ask of a batch.
 */
const readings = new Map<string, KeptReading>();

/** The reading under `key`, made by `read` at its first use. Texts beyond the length of a species are not kept. */
export const remember = (key: string, read: () => KeptReading): KeptReading => {
  const kept = readings.get(key);
  const reading = kept ?? read();
  if (key.length > LIMITS.rememberedLength) return reading;
  if (kept !== undefined) readings.delete(key);
  readings.set(key, reading);
  const [oldest] = readings.keys();
  if (readings.size > LIMITS.remembered && oldest !== undefined) readings.delete(oldest);
  return reading;
};
