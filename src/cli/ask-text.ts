/** The fields that an ask may have; unknown fields and wrong types are the desk's to find. */
export type AskFields = Readonly<Record<string, unknown>>;

/** The text that a fault's field names: of "anode[1]" the skeleton that stands there; null where there is none. */
export const textAt = (ask: unknown, field: string | undefined): string | null => {
  const steps = [...(field ?? '').matchAll(/\[(\d+)\]|([^.[\]]+)/g)].map(([, index, name]) => index ?? name ?? '');
  const found = steps.reduce<unknown>(
    (part, step) => (typeof part === 'object' && part !== null ? (part as AskFields)[step] : undefined),
    ask,
  );
  if (typeof found === 'string') return found;
  const inner = typeof found === 'object' && found !== null && 'skeleton' in found ? found.skeleton : undefined;
  return typeof inner === 'string' ? inner : null;
};
