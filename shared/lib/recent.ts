/** Remembers the values that were used last, up to a number of them. */
export interface Recent<Key, Value> {
  get(key: Key): Value | undefined;
  set(key: Key, value: Value): void;
  clear(): void;
}

/**
 * Makes an empty memory.
 * @param capacity how many values it holds, at least 1; the one longest not used goes first
 */
export function createRecent<Key, Value>(capacity: number): Recent<Key, Value> {
  // A map keeps the order in which keys were put in: the first is the one longest not used.
  const values = new Map<Key, Value>();
  return {
    get(key) {
      const value = values.get(key);
      if (value === undefined) return undefined;
      values.delete(key);
      values.set(key, value);
      return value;
    },
    set(key, value) {
      values.delete(key);
      values.set(key, value);
      if (values.size <= capacity) return;
      for (const oldest of values.keys()) {
        values.delete(oldest);
        return;
      }
    },
    clear: () => values.clear(),
  };
}
