import { gasConstantJPerMolK } from "../constants/constants.js";
import type { Fault } from "../errors/fault.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkNumber, checkObject } from "../errors/input.js";
import { checkQuantity } from "../quantity/guards.js";
import type { MolarEnergy, Quantity, Temperature } from "../quantity/quantity.js";
import { finite } from "./finite.js";
import { checkPresent } from "./pressure-change.js";
import { shiftedQuantity } from "./shifted-quantity.js";
import { checkScaleChange, type SoluteScaleChange } from "./solvent.js";
import { readStoichiometry, type StoichiometricNumbers, type StoichiometricSums } from "./stoichiometry.js";

/** A change of scale at a temperature. */
export interface SoluteScaleChangeAtTemperature extends SoluteScaleChange {
  /** Above 0 K. */
  readonly temperature: Temperature;
}

/**
 * Standard Gibbs energy of a solute on another scale of composition. The chemical potential itself does not change, and
 * all activity coefficients are 1 at infinite dilution, where x = M m and c = rho m with molar mass M and density rho
 * of the pure solvent:
 *
 *     G(c) = G(m) - RT ln(rho (1 mol/kg) / (1 mol/L)),   G(x) = G(m) - RT ln(M (1 mol/kg))
 *
 * In water at 298.15 K G(c) is 0.007 kJ/mol and G(x) 9.96 kJ/mol above G(m).
 *
 * @param gibbsEnergy - standard or of formation, in any unit of molar energy; its uncertainty is kept
 * @param change - both scales, the temperature, and of the pure solvent what they need
 * @returns J/mol
 * @throws GibbsLedgerError with every fault at once: "input/missing", "input/unknown-option", those of quantities;
 * "quantity/overflow"
 * @remarks Arithmetic: within 4 eps of |G| + RT |ln|. Enthalpies keep their value between molality and mole fraction;
 * on the scale of concentration they differ by the thermal expansion of the solvent, which is not computed here.
 * @see `references.cohen2007`
 * @example
 * const onMoleFraction = standardGibbsEnergyOnScale(quantity(0, "J/mol"), {
 *   temperature: quantity(298.15, "K"),
 *   from: "molality",
 *   to: "mole-fraction",
 *   solvent: { molarMass: quantity(18.015, "g/mol") },
 * });
 * onMoleFraction.value; // => 9956...
 */
export function standardGibbsEnergyOnScale(
  gibbsEnergy: MolarEnergy,
  change: SoluteScaleChangeAtTemperature,
): Quantity<"molarEnergy", "J/mol"> {
  const faults: Fault[] = [];
  const value = checkQuantity(gibbsEnergy, "molarEnergy", ["gibbsEnergy"], faults);
  const members = checkObject(change, [], faults, { required: ["temperature", "from", "to", "solvent"], optional: [] });
  const temperatureK = checkPresent(members?.temperature, "temperature", ["temperature"], faults);
  const scaleChange = members && checkScaleChange(members, faults);
  failIfAny(faults);
  const lnFactor = scaleChange?.lnFactor as number;
  const shift = -gasConstantJPerMolK * (temperatureK as number) * lnFactor;
  return shiftedQuantity(gibbsEnergy, value as number, "J/mol", shift, ["gibbsEnergy"]);
}

/**
 * ln K of a reaction whose solutes are counted on another scale: ln K(c) = ln K(m) + nu ln(rho (1 mol/kg) / (1 mol/L)),
 * ln K(x) = ln K(m) + nu ln(M (1 mol/kg)), nu the sum of the stoichiometric numbers of the solutes. The solvent, gases
 * and pure phases keep their own standard states.
 *
 * @param lnK - finite
 * @param stoichiometry - numbers by label, or a reaction; solutes are the species of state `aq` or `sln`, and `e^-`
 * takes the place of H^+(aq) with the opposite sign
 * @param change - both scales, and of the pure solvent what they need
 * @throws GibbsLedgerError with every fault at once: "input/missing", "input/not-finite", "input/unknown-option",
 * "standard-state/no-state", those of quantities and labels; "quantity/overflow"
 * @remarks Arithmetic: within 4 eps of |ln K| + |nu ln|.
 * @see `references.cohen2007`
 * @example
 * const ionisation = { "H2O(l)": -1, "H^+(aq)": 1, "OH^-(aq)": 1 };
 * const solvent = { density: quantity(0.997045, "g/cm3") };
 * lnKOnScale(0, ionisation, { from: "molality", to: "concentration", solvent }); // => -0.00591...
 */
export function lnKOnScale(lnK: number, stoichiometry: StoichiometricNumbers, change: SoluteScaleChange): number {
  const faults: Fault[] = [];
  checkNumber(lnK, ["lnK"], faults);
  const sums = readStoichiometry(stoichiometry, ["stoichiometry"], faults);
  const members = checkObject(change, [], faults, { required: ["from", "to", "solvent"], optional: [] });
  const scaleChange = members && checkScaleChange(members, faults);
  failIfAny(faults);
  return finite(lnK + (sums as StoichiometricSums).solutes * (scaleChange?.lnFactor as number), ["lnK"]);
}
