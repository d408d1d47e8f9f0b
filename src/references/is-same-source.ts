import type { Source } from "./source.js";

/** Whether two sources are the same: one citation, or the same words of a user's own. */
export function isSameSource(a: Source, b: Source | undefined): boolean {
  return typeof a === "object" && typeof b === "object" ? a.text === b.text : a === b;
}
