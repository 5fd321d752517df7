/** Values by text, of which only the `size` last used are kept. */
export interface Memory<T> {
  /** The value under `key`, made by `make` at its first use. */
  readonly recall: (key: string, make: () => T) => T;
}

/**
 * A memory of fixed size: two generations, so that neither use nor forgetting ever walks through the entries. When the
 * young one holds half the size it becomes the old one, and what was old and not used since is forgotten.
 */
export const createMemory = <T>(size: number): Memory<T> => {
  let young = new Map<string, T>();
  let old = new Map<string, T>();
  const recall = (key: string, make: () => T): T => {
    const known = young.get(key);
    if (known !== undefined) return known;
    const value = old.get(key) ?? make();
    young.set(key, value);
    if (young.size >= size / 2) {
      old = young;
      young = new Map();
    }
    return value;
  };
  return { recall };
};
