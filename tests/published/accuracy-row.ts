/**
 * Why a computed value may differ from a published one:
 *
 * - `"same source"` the value stands in the source of the data used; the tolerance is its rounding and fit error;
 * - `"cross source"` it stands in another source; the tolerance is the combined uncertainty;
 * - `"identity"` a law holds exactly; the tolerance is the error of the arithmetic.
 */
export type AccuracyClass = "same source" | "cross source" | "identity";

/** A value from outside the library beside the value that the library computes. */
export interface AccuracyRow {
  /** Words joined by hyphens, unique over all topics: what is compared, and at which state. */
  readonly id: string;
  readonly class: AccuracyClass;
  /** Citation in words: authors, title or short title, year, table. */
  readonly source: string;
  /** Whether the published value was read from the page, recalled, or computed by an independent method. */
  readonly origin: "page" | "memory" | "computed";
  /** What it is, with unit and conditions. */
  readonly quantity: string;
  readonly expected: number;
  readonly computed: number;
  /** The largest difference that agrees, in the unit of the quantity. */
  readonly tolerance: number;
  readonly pass: boolean;
}

/** Completes a row: it passes where the difference is at most the tolerance. */
export function row(parts: Omit<AccuracyRow, "pass">): AccuracyRow {
  return { ...parts, pass: Math.abs(parts.computed - parts.expected) <= parts.tolerance };
}

/** What each module `tests/published/<topic>.rows.ts` exports. */
export interface RowsModule {
  rows(): readonly AccuracyRow[];
}
