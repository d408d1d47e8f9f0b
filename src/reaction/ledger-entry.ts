import type { Quantity } from "../quantity/quantity.js";
import type { Source } from "../references/source.js";
import type { Label } from "../species/record.js";

/** What an entry of a ledger accounts for. */
export type LedgerEntryName =
  | "formation enthalpy"
  | "reference entropy"
  | "sensible heat"
  | "heat-capacity entropy"
  | "transition"
  | "standard pressure"
  | "pressure"
  | "composition"
  | "activity"
  | "non-ideality"
  | "volume";

/** The three parts of a ledger: the species at 298.15 K, the way to the temperature, the way to the conditions. */
export type LedgerGroup = "formation" | "temperature" | "conditions";

/** One line of a ledger: what one species contributes to the Gibbs energy of the reaction, and why. */
export interface LedgerEntry {
  readonly group: LedgerGroup;
  readonly entry: LedgerEntryName;
  readonly label: Label;
  /** Stoichiometric number. */
  readonly coefficient: number;
  /** The contribution; its standard uncertainty is absent where none is published. */
  readonly value: Quantity<"molarEnergy", "J/mol">;
  /**
   * The published figure that the uncertainty comes from, such as `H2(g) standardEntropy`. Entries of one datum stand or
   * fall together: they add before they are squared.
   */
  readonly datum?: string;
  /** Where the figure comes from; absent for terms that follow from the conditions. */
  readonly source?: Source;
  /** The published figure that gives the uncertainty, where its source is another one. */
  readonly secondSource?: Source;
  /** The phase beyond a transition of a stable sequence. */
  readonly into?: Label;
  /** What the reader has to know of this line. */
  readonly note?: string;
}

/** A contribution in J/mol; an unknown uncertainty is left out. */
export function tagged(value: number, standardUncertainty: number | undefined): Quantity<"molarEnergy", "J/mol"> {
  const base = { value: value + 0, unit: "J/mol" } as const;
  return standardUncertainty === undefined ? base : { ...base, standardUncertainty };
}
