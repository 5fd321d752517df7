/** A private-use character that no chemistry is written with. */
const SHIELD = '\ue000';

/** "-> Cu" would be taken for an option: a shield is put before it, so that the reader can say what is missing. */
export const shielded = (argument: string): string => (/^-+>/.test(argument) ? SHIELD + argument : argument);

/** The same value with every shield taken away again. */
export const unshielded = (value: unknown): unknown => {
  if (typeof value === 'string') return value.startsWith(SHIELD) ? value.slice(SHIELD.length) : value;
  if (Array.isArray(value)) return value.map(unshielded);
  if (typeof value !== 'object' || value === null) return value;
  return Object.fromEntries(Object.entries(value).map(([name, part]) => [name, unshielded(part)]));
};
