/**
 * Whether two values are the same plain data: objects, arrays, texts and numbers in depth, functions by identity. The
 * order of keys does not matter, and a member that is undefined is as good as none.
 */
export function isSameData(a: unknown, b: unknown): boolean {
  if (Object.is(a, b)) return true;
  if (typeof a !== "object" || typeof b !== "object" || a === null || b === null) return a === b;
  if (Array.isArray(a) !== Array.isArray(b)) return false;
  return keysOfEither(a, b).every((key) => isSameData(memberOf(a, key), memberOf(b, key)));
}

/** The first member, in the order of the keys, in which two objects differ. */
export function firstDifference(a: object, b: object): string | undefined {
  return keysOfEither(a, b).find((key) => !isSameData(memberOf(a, key), memberOf(b, key)));
}

function keysOfEither(a: object, b: object): string[] {
  return [...new Set([...Object.keys(a), ...Object.keys(b)])];
}

function memberOf(value: object, key: string): unknown {
  return Object.hasOwn(value, key) ? (value as Readonly<Record<string, unknown>>)[key] : undefined;
}
