/** Keeps the last results of a costly function of one number; forgets all when full, so that it cannot grow. */
export function remember<T>(make: (key: number) => T, room = 64): (key: number) => T {
  const kept = new Map<number, T>();
  return (key) => {
    const known = kept.get(key);
    if (known !== undefined) return known;
    if (kept.size >= room) kept.clear();
    const made = make(key);
    kept.set(key, made);
    return made;
  };
}
