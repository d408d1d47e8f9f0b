import type { Fault } from "../errors/fault.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkNumber } from "../errors/input.js";
import { finite } from "./finite.js";
import { changeMembers, checkPressureStep, type PressureStep, type StandardPressureChange } from "./pressure-change.js";
import { readStoichiometry, type StoichiometricNumbers, type StoichiometricSums } from "./stoichiometry.js";

/**
 * Natural logarithm of an equilibrium constant at another standard pressure: ln K(to) = ln K(from) - nu ln(to / from),
 * nu the sum of the stoichiometric numbers of the gases. It follows from RT ln K = -(sum of nu G) with
 * G(to) = G(from) + RT ln(to / from) for each gas, whatever the temperature.
 *
 * @param lnK - finite
 * @param stoichiometry - numbers by label, or a reaction; `e^-` counts as half a mole of hydrogen
 * @param change - standard pressures above 0 Pa
 * @throws GibbsLedgerError with every fault at once: "input/not-finite", "standard-state/no-state", those of
 * quantities and labels; "quantity/overflow"
 * @remarks Arithmetic: within 2 eps of |ln K| + |nu ln(to / from)|.
 * @see `references.cohen2007`
 * @example
 * const numbers = { "N2(g)": -1, "H2(g)": -3, "NH3(g)": 2 };
 * lnKAtStandardPressure(0, numbers, { from: quantity(1, "atm"), to: quantity(1, "bar") }); // => -0.0263...
 */
export function lnKAtStandardPressure(
  lnK: number,
  stoichiometry: StoichiometricNumbers,
  change: StandardPressureChange,
): number {
  const faults: Fault[] = [];
  checkNumber(lnK, ["lnK"], faults);
  const sums = readStoichiometry(stoichiometry, ["stoichiometry"], faults);
  const step = checkPressureStep(changeMembers(change, [], [], faults), faults);
  failIfAny(faults);
  return finite(lnK - (sums as StoichiometricSums).gas * (step as PressureStep).lnRatio, ["lnK"]);
}
