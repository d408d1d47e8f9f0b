import type { Citation } from "../references/bibliography.js";
import type { Origin } from "../references/source.js";

/** A physical constant or a conventional value: number, unit, and where it comes from. */
export interface Constant {
  readonly value: number;
  /** UCUM code of the unit. */
  readonly unit: string;
  /** Whether the value is exact by definition; a product of exact values is exact before it is rounded to a double. */
  readonly exact: boolean;
  /** Key of the bibliography. */
  readonly source: Citation;
  readonly origin: Origin;
}
