import { describeReceived, type Fault } from "../errors/fault.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkObject } from "../errors/input.js";
import { decimalOf, decimalToString } from "../numeric/exact-decimal.js";
import { isSymbol } from "./element-symbols.js";
import { compareInHillOrder } from "./hill-order.js";
import type { Token } from "./spelling.js";
import { writeComposition } from "./write-spelling.js";

/**
 * Writes a composition as a formula in Hill order: carbon, hydrogen, then the others by alphabet; without carbon all
 * by alphabet. D and T stand where the alphabet puts them.
 *
 * @param composition - atoms of each element, from 1e-6 to 1e12
 * @throws GibbsLedgerError "formula/unknown-element", "formula/zero-count", "formula/count-out-of-range",
 * "formula/empty", "input/not-an-object"; the path names the symbol
 * @example
 * hillFormula({ O: 1, H: 6, C: 2 }); // => "C2H6O"
 * hillFormula({ O: 4, S: 1, H: 2 }); // => "H2O4S"
 */
export function hillFormula(composition: Readonly<Record<string, number>>): string {
  const faults: Fault[] = [];
  checkObject(composition, [], faults, { required: [], optional: "any" });
  failIfAny(faults);
  const entries = Object.entries(composition);
  for (const [symbol, count] of entries) checkEntry(symbol, count, faults);
  if (entries.length === 0) {
    faults.push({ code: "formula/empty", path: [], message: "the composition is empty", expected: "atoms by element" });
  }
  failIfAny(faults);
  const hasCarbon = Object.hasOwn(composition, "C");
  const tokens = entries
    .sort(([a], [b]) => compareInHillOrder(a, b, hasCarbon))
    .flatMap(([symbol, count]): Token[] => [
      { kind: "symbol", text: symbol },
      ...(count === 1 ? [] : [{ kind: "count", text: decimalToString(decimalOf(count)) } as const]),
    ]);
  return writeComposition(tokens, "ascii");
}

function checkEntry(symbol: string, count: unknown, faults: Fault[]): void {
  if (!isSymbol(symbol)) {
    faults.push({
      code: "formula/unknown-element",
      path: [symbol],
      message: `there is no element ${describeReceived(symbol)}`,
      received: describeReceived(symbol),
      expected: "the symbol of an element, D or T",
    });
  }
  if (typeof count === "number" && count >= 1e-6 && count <= 1e12) return;
  faults.push({
    code: count === 0 ? "formula/zero-count" : "formula/count-out-of-range",
    path: [symbol],
    message: `the count is ${describeReceived(count)}`,
    received: describeReceived(count),
    expected: "a count of 1e-6 to 1e12",
  });
}
