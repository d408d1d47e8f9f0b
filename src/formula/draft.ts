import type { ExactDecimal } from "../numeric/exact-decimal.js";
import type { Token } from "./spelling.js";

/** The number one. */
export const one: ExactDecimal = { mantissa: 1n, exponent: 0 };

/** One symbol with its count inside its group. */
export interface Atom {
  readonly symbol: string;
  /** Index in the text. */
  readonly position: number;
  readonly group: number;
  count: ExactDecimal;
}

/** Something that multiplies what is inside: a bracket with its count, or a part with its multiplier. */
export interface Group {
  /** Index of the group around it, always smaller than its own; the outermost group is its own parent. */
  readonly parent: number;
  factor: ExactDecimal;
}

/** What has been read of a formula so far. */
export interface Draft {
  readonly atoms: Atom[];
  readonly groups: Group[];
  readonly tokens: Token[];
  /** Whether a dot of any kind has been read: after one, an ASCII dot before water is ambiguous. */
  hasDot: boolean;
}

/** An empty draft with its outermost group. */
export function emptyDraft(): Draft {
  return { atoms: [], groups: [{ parent: 0, factor: one }], tokens: [], hasDot: false };
}
