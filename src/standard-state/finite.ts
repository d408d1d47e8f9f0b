import type { FaultPath } from "../errors/fault.js";
import { fail } from "../errors/gibbs-ledger-error.js";

/**
 * The value itself, where a double holds it; never -0.
 *
 * @throws GibbsLedgerError "quantity/overflow"
 */
export function finite(value: number, path: FaultPath): number {
  if (value - value === 0) return value + 0;
  return fail({
    code: "quantity/overflow",
    path,
    message: "the result is too large for a double",
    expected: "a result below 1.7976931348623157e+308",
  });
}
