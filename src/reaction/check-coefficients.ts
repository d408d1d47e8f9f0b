import { cut, type Fault, type FaultPath } from "../errors/fault.js";
import { rationalToNumber, rationalToString } from "../numeric/rational.js";
import type { Stoichiometry } from "./balance-check.js";

/** Stoichiometric numbers between these keep every sum within the range of doubles. */
const smallest = 1e-9;
const largest = 1e9;

/** Checks that each stoichiometric number has a size that a double can compute with. */
export function checkCoefficients(terms: readonly Stoichiometry[], path: FaultPath, faults: Fault[]): void {
  for (const { species, coefficient } of terms) {
    const size = Math.abs(rationalToNumber(coefficient));
    if (size >= smallest && size <= largest) continue;
    faults.push({
      code: "reaction/coefficient-out-of-range",
      path,
      message: `the stoichiometric number of ${cut(species.label, 40)} is ${size}`,
      received: cut(rationalToString(coefficient)),
      expected: `a size from ${smallest} to ${largest}`,
    });
  }
}
