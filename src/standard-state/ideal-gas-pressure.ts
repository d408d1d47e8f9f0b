import { gasConstantJPerMolK } from "../constants/constants.js";
import type { Fault } from "../errors/fault.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkQuantity } from "../quantity/guards.js";
import type { MolarEnergy, MolarEntropy, Quantity } from "../quantity/quantity.js";
import {
  changeMembers,
  checkPresent,
  checkPressureStep,
  type PressureStep,
  type StandardPressureChange,
  type StandardPressureChangeAtTemperature,
} from "./pressure-change.js";
import { shiftedQuantity } from "./shifted-quantity.js";

/**
 * Standard entropy of an ideal gas at another standard pressure: S(to) = S(from) - R ln(to / from), since
 * (dS/dp) at constant T is -R/p. From 1 atm to 1 bar it gains 0.1094 J/mol/K. The same holds for -[G - H(298.15 K)]/T
 * and -[G - H(0 K)]/T. H and Cp of an ideal gas do not depend on pressure.
 *
 * @param entropy - of any unit of molar entropy; its uncertainty is kept
 * @param change - standard pressures above 0 Pa
 * @returns J/mol/K
 * @throws GibbsLedgerError with every fault of the quantities at once; "quantity/overflow"
 * @remarks Arithmetic: within 2 eps of |S| + R |ln(to / from)|.
 * @see `references.freeman1984` `references.wagman1982`
 * @example
 * const atOneBar = idealGasEntropyAtStandardPressure(quantity(191.5, "J/mol/K"), {
 *   from: quantity(1, "atm"),
 *   to: quantity(1, "bar"),
 * });
 * atOneBar.value; // => 191.609...
 */
export function idealGasEntropyAtStandardPressure(
  entropy: MolarEntropy,
  change: StandardPressureChange,
): Quantity<"molarEntropy", "J/mol/K"> {
  const faults: Fault[] = [];
  const value = checkQuantity(entropy, "molarEntropy", ["entropy"], faults);
  const step = checkPressureStep(changeMembers(change, [], [], faults), faults);
  failIfAny(faults);
  const shift = -gasConstantJPerMolK * (step as PressureStep).lnRatio;
  return shiftedQuantity(entropy, value as number, "J/mol/K", shift, ["entropy"]);
}

/**
 * Standard Gibbs energy of an ideal gas at another standard pressure: G(to) = G(from) + RT ln(to / from), the integral
 * of V dp with V = RT/p. G may be counted from any zero that does not depend on pressure, as in G - H(298.15 K).
 *
 * A Gibbs energy of formation also moves with the gases among the elements: see
 * {@link formationGibbsEnergyAtStandardPressure}.
 *
 * @param gibbsEnergy - of any unit of molar energy; its uncertainty is kept
 * @param change - standard pressures above 0 Pa, temperature above 0 K
 * @returns J/mol
 * @throws GibbsLedgerError with every fault of the quantities at once; "quantity/overflow"
 * @remarks Arithmetic: within 3 eps of |G| + RT |ln(to / from)|.
 * @see `references.freeman1984`
 * @example
 * const atOneBar = idealGasGibbsEnergyAtStandardPressure(quantity(0, "J/mol"), {
 *   temperature: quantity(298.15, "K"),
 *   from: quantity(1, "atm"),
 *   to: quantity(1, "bar"),
 * });
 * atOneBar.value; // => -32.6...
 */
export function idealGasGibbsEnergyAtStandardPressure(
  gibbsEnergy: MolarEnergy,
  change: StandardPressureChangeAtTemperature,
): Quantity<"molarEnergy", "J/mol"> {
  const faults: Fault[] = [];
  const value = checkQuantity(gibbsEnergy, "molarEnergy", ["gibbsEnergy"], faults);
  const members = changeMembers(change, ["temperature"], [], faults);
  const temperatureK = checkPresent(members.temperature, "temperature", ["temperature"], faults);
  const step = checkPressureStep(members, faults);
  failIfAny(faults);
  const shift = gasConstantJPerMolK * (temperatureK as number) * (step as PressureStep).lnRatio;
  return shiftedQuantity(gibbsEnergy, value as number, "J/mol", shift, ["gibbsEnergy"]);
}
