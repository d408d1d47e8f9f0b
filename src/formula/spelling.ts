/** A piece of a formula as it is written. */
export interface Token {
  readonly kind: "symbol" | "bracket" | "count" | "multiplier" | "separator";
  /** The piece in plain characters; counts without closing zeros, a count of one is no piece. */
  readonly text: string;
}

/** The pieces of a formula, its charge and its state. */
export interface Spelling {
  readonly tokens: readonly Token[];
  readonly chargeNumber: number;
  readonly state?: string;
  readonly polymorph?: string;
}

/** How a formula is written: with carets and plain digits, or with subscripts and superscripts. */
export const formulaStyles = ["ascii", "unicode"] as const;

/** One of the ways in which a formula is written. */
export type FormulaStyle = (typeof formulaStyles)[number];
