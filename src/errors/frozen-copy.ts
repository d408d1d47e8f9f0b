/**
 * A deep-frozen copy of checked plain data: objects, arrays, texts, numbers, booleans. Members that are undefined are
 * left out and -0 becomes 0, so that the copy is what JSON would give back.
 */
export function frozenCopy<T>(value: T): T {
  if (typeof value === "number") return (value + 0) as T;
  if (typeof value !== "object" || value === null) return value;
  if (Array.isArray(value)) return Object.freeze(value.map(frozenCopy)) as T;
  const copy: Record<string, unknown> = {};
  for (const [key, member] of Object.entries(value)) {
    if (member !== undefined) copy[key] = frozenCopy(member);
  }
  return Object.freeze(copy) as T;
}
