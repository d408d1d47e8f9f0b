import { describeReceived, type Fault } from "../errors/fault.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import {
  addDecimals,
  decimalOf,
  decimalToNumber,
  type ExactDecimal,
  multiplyDecimals,
} from "../numeric/exact-decimal.js";
import type { Quantity } from "../quantity/quantity.js";
import { atomicWeightOf } from "./atomic-weights.js";
import type { Formula } from "./formula.js";
import { readGivenFormula } from "./formula-input.js";

/**
 * Molar mass of a formula: the sum of its counts times the standard atomic weights of 2021, the molar mass constant
 * taken as 1 g/mol (true to 1e-9). D and T weigh their isotopes. The electrons that an ion lacks or has in excess are
 * not counted (0.00055 g/mol each); the electron itself has no atomic weight and is refused.
 *
 * The result is the double nearest to the exact sum of the printed values. Its uncertainty follows from those of
 * `atomicWeights` and from the material, and is not attached.
 *
 * @param formula - a text, or what `formula` returned; of the latter the text is read again
 * @throws GibbsLedgerError "formula/no-atomic-weight" for elements without a standard atomic weight, and as
 * `formula`
 * @see `references.prohaska2022`
 * @example
 * const water = molarMass("H2O");
 * water.value; // => 18.015
 * water.unit; // => "g/mol"
 */
export function molarMass(formula: Formula | string): Quantity<"molarMass", "g/mol"> {
  const { text, counts } = readGivenFormula(formula);
  const faults: Fault[] = [];
  let sum: ExactDecimal = { mantissa: 0n, exponent: 0 };
  for (const { symbol, exact } of counts) {
    const weight = atomicWeightOf(symbol);
    if (weight === undefined) {
      faults.push({
        code: "formula/no-atomic-weight",
        path: [],
        message: `${symbol} has no standard atomic weight`,
        received: describeReceived(text),
        hint: "its isotopes vary with its origin: use the mass of the nuclide at hand",
      });
      continue;
    }
    sum = addDecimals(sum, multiplyDecimals(exact, decimalOf(weight.value)));
  }
  if (counts.length === 0) {
    faults.push({
      code: "formula/no-atomic-weight",
      path: [],
      message: "the electron has no atomic weight",
      received: describeReceived(text),
      hint: "its molar mass is 5.4858e-4 g/mol",
    });
  }
  failIfAny(faults);
  return { value: decimalToNumber(sum), unit: "g/mol" };
}
