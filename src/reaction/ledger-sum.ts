import { exactSum } from "../numeric/compensated.js";
import type { Quantity } from "../quantity/quantity.js";
import { combineUncertainties } from "../uncertainty/combine-uncertainties.js";
import { type LedgerEntry, tagged } from "./ledger-entry.js";

/** Sum of the entries of a group, with the standard uncertainty as far as it is known. */
export interface LedgerSum {
  readonly value: Quantity<"molarEnergy", "J/mol">;
  /** True where an entry of unknown uncertainty makes the stated one a lower bound. */
  readonly uncertaintyIsLowerBound: boolean;
}

/** Sums entries. Those of one datum stand or fall together; data are independent of each other. */
export function sumOfEntries(entries: readonly LedgerEntry[]): LedgerSum {
  const { standardUncertainty, isLowerBound } = combineUncertainties(
    entries.map(({ value: { standardUncertainty: u }, coefficient, datum }, index) => {
      const own = `entry ${index}`;
      // The entry's own uncertainty is the sensitivity to a datum of uncertainty 1; unknown ones never cancel.
      return u === undefined
        ? { datum: own, sensitivity: 1 }
        : { datum: datum ?? own, sensitivity: Math.sign(coefficient) * u, standardUncertainty: 1 };
    }),
  );
  return {
    value: tagged(exactSum(entries.map(({ value }) => value.value)), standardUncertainty),
    uncertaintyIsLowerBound: isLowerBound,
  };
}
