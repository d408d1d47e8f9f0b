import { faradayConstantCPerMol, gasConstantJPerMolK } from "../constants/constants.js";
import type { Fault } from "../errors/fault.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkQuantity } from "../quantity/guards.js";
import type { ElectricPotential, Quantity } from "../quantity/quantity.js";
import {
  changeMembers,
  checkPresent,
  checkPressureStep,
  type PressureStep,
  type StandardPressureChangeAtTemperature,
} from "./pressure-change.js";
import { shiftedQuantity } from "./shifted-quantity.js";
import { readStoichiometry, type StoichiometricNumbers, type StoichiometricSums } from "./stoichiometry.js";

/**
 * Standard potential of a half-reaction against the standard hydrogen electrode at another standard pressure:
 *
 *     E(to) = E(from) - (RT / nF) (nu(gas) - n/2) ln(to / from)
 *
 * with n electrons taken up and nu the sum of the stoichiometric numbers of the gases of the half-reaction; n/2 is the
 * hydrogen of the reference electrode. A half-reaction without gas loses 0.169 mV from 1 atm to 1 bar at 298.15 K; the
 * hydrogen electrode stays at zero.
 *
 * @param potential - in any unit of electric potential; its uncertainty is kept
 * @param halfReaction - numbers by label, products positive, with `e^-` on one side; it may be multiplied or reversed
 * @param change - standard pressures above 0 Pa, temperature above 0 K
 * @returns V
 * @throws GibbsLedgerError with every fault at once: "standard-state/no-electrons", "standard-state/no-state", those of
 * quantities and labels; "quantity/overflow"
 * @remarks Arithmetic: within 4 eps of |E| and the term. Activities of liquids and solids are taken as unchanged.
 * @see `references.freeman1984`
 * @example
 * const silver = { "Ag^+(aq)": -1, "e^-": -1, "Ag(cr)": 1 };
 * const atOneBar = electrodePotentialAtStandardPressure(quantity(0.79933, "V"), silver, {
 *   temperature: quantity(298.15, "K"),
 *   from: quantity(1, "atm"),
 *   to: quantity(1, "bar"),
 * });
 * atOneBar.value; // => 0.79916...
 */
export function electrodePotentialAtStandardPressure(
  potential: ElectricPotential,
  halfReaction: StoichiometricNumbers,
  change: StandardPressureChangeAtTemperature,
): Quantity<"electricPotential", "V"> {
  const faults: Fault[] = [];
  const value = checkQuantity(potential, "electricPotential", ["potential"], faults);
  const sums = readStoichiometry(halfReaction, ["halfReaction"], faults);
  const members = changeMembers(change, ["temperature"], [], faults);
  const temperatureK = checkPresent(members.temperature, "temperature", ["temperature"], faults);
  const step = checkPressureStep(members, faults);
  if (sums?.electrons === 0) {
    faults.push({
      code: "standard-state/no-electrons",
      path: ["halfReaction"],
      message: "a half-reaction has electrons on one side",
      expected: 'the number of "e^-", negative where electrons are taken up',
    });
  }
  failIfAny(faults);
  const { gas, electrons } = sums as StoichiometricSums;
  const thermalVoltage = (gasConstantJPerMolK * (temperatureK as number)) / faradayConstantCPerMol;
  const shift = thermalVoltage * (gas / electrons) * (step as PressureStep).lnRatio;
  return shiftedQuantity(potential, value as number, "V", shift, ["potential"]);
}
