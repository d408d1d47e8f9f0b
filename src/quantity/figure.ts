import type { Origin, Source } from "../references/source.js";

/** A published number: value and unit as printed, its uncertainty, and where it comes from. */
export interface Figure {
  /** The number as printed. */
  readonly value: number;
  /** UCUM code of the unit as printed. */
  readonly unit: string;
  /** As published: half the width of the interval in the same unit, and the probability that it covers. */
  readonly uncertainty?: { readonly halfWidth: number; readonly coverage: number };
  readonly source: Source;
  readonly origin: Origin;
  /** Table, page or equation number; digits that a number cannot carry. */
  readonly where?: string;
}
