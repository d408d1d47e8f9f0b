import { exactSum } from "../numeric/compensated.js";
import type { Quantity } from "../quantity/quantity.js";
import { type LedgerEntry, tagged } from "./ledger-entry.js";

/** Sum of the entries of a group, with the standard uncertainty as far as it is known. */
export interface LedgerSum {
  readonly value: Quantity<"molarEnergy", "J/mol">;
  /** True where an entry of unknown uncertainty makes the stated one a lower bound. */
  readonly uncertaintyIsLowerBound: boolean;
}

/** Sums entries. Those of one datum add with their signs; data are independent of each other and add in quadrature. */
export function sumOfEntries(entries: readonly LedgerEntry[]): LedgerSum {
  const byDatum = new Map<string, number>();
  let known = 0;
  entries.forEach(({ value: { standardUncertainty: u }, coefficient, datum }, index) => {
    if (u === undefined) return;
    known += 1;
    const key = datum ?? `entry ${index}`;
    byDatum.set(key, (byDatum.get(key) ?? 0) + Math.sign(coefficient) * u);
  });
  const squares = exactSum([...byDatum.values()].map((u) => u * u));
  return {
    value: tagged(exactSum(entries.map(({ value }) => value.value)), Math.sqrt(squares)),
    uncertaintyIsLowerBound: known < entries.length,
  };
}
