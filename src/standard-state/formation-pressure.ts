import { gasConstantJPerMolK } from "../constants/constants.js";
import type { Fault } from "../errors/fault.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkQuantity } from "../quantity/guards.js";
import type { MolarEnergy, MolarEntropy, MolarVolume, Quantity } from "../quantity/quantity.js";
import type { Label, SpeciesRecord } from "../species/record.js";
import { type FormedSpecies, readFormedSpecies } from "./formed-species.js";
import { checkConvention, conventionKeys, type FormationConvention, gasChangeOf } from "./gaseous-elements.js";
import {
  changeMembers,
  checkPresent,
  checkPressureStep,
  type PressureStep,
  type StandardPressureChange,
  type StandardPressureChangeAtTemperature,
} from "./pressure-change.js";
import { shiftedQuantity } from "./shifted-quantity.js";

/** A change of the standard pressure of an entropy of formation. */
export interface FormationEntropyPressureChange extends StandardPressureChange, FormationConvention {}

/** A change of the standard pressure of a Gibbs energy of formation. */
export interface FormationGibbsEnergyPressureChange extends StandardPressureChangeAtTemperature, FormationConvention {
  /** Molar volume of a condensed phase, or partial molar volume of a solute, for its volume work; absent: left out. */
  readonly molarVolume?: MolarVolume;
}

/**
 * Gibbs energy of formation at another standard pressure, of a gas, a condensed phase or a dissolved species:
 *
 *     G(to) = G(from) + RT ln(to / from) (n(gas) of the species - n(gas) of the elements)
 *
 * The gases among the elements move it even where the species itself is no gas: H2O(l) rises by 0.049 kJ/mol from 1 atm
 * to 1 bar. `molarVolume` adds the volume work V (to - from) of the species, which between 1 atm and 1 bar is below
 * 0.1 J/mol for volumes up to 75 cm3/mol; that of condensed elements is left out.
 *
 * @param gibbsEnergy - of formation, in any unit of molar energy; its uncertainty is kept
 * @param species - a record, or a label with its state such as `"Cl^-(aq)"`; see {@link formationGasChange}
 * @param change - standard pressures, the temperature of the Gibbs energy, and what may be given beside
 * @returns J/mol
 * @throws GibbsLedgerError with every fault at once: "standard-state/no-state", "standard-state/invalid-molecule",
 * "standard-state/volume-of-gas", those of quantities, labels and records; "quantity/overflow"
 * @remarks Arithmetic: within 4 eps of the sum of the absolute terms.
 * @see `references.freeman1984` `references.wagman1982`
 * @example
 * const atOneBar = formationGibbsEnergyAtStandardPressure(quantity(-56.687, "kcal_th/mol"), "H2O(l)", {
 *   temperature: quantity(298.15, "K"),
 *   from: quantity(1, "atm"),
 *   to: quantity(1, "bar"),
 * });
 * atOneBar.value; // => -237129...
 */
export function formationGibbsEnergyAtStandardPressure(
  gibbsEnergy: MolarEnergy,
  species: SpeciesRecord | Label,
  change: FormationGibbsEnergyPressureChange,
): Quantity<"molarEnergy", "J/mol"> {
  const faults: Fault[] = [];
  const value = checkQuantity(gibbsEnergy, "molarEnergy", ["gibbsEnergy"], faults);
  const formed = readFormedSpecies(species, ["species"], faults);
  const members = changeMembers(change, ["temperature"], [...conventionKeys, "molarVolume"], faults);
  const temperatureK = checkPresent(members.temperature, "temperature", ["temperature"], faults);
  const step = checkPressureStep(members, faults);
  const convention = checkConvention(members, [], faults);
  const volume = checkVolume(members.molarVolume, formed, faults);
  failIfAny(faults);
  const { lnRatio, fromPa, toPa } = step as PressureStep;
  const gasChange = gasChangeOf(formed as FormedSpecies, convention);
  const shift = gasConstantJPerMolK * (temperatureK as number) * lnRatio * gasChange;
  const work = volume === 0 ? 0 : volume * (toPa - fromPa);
  return shiftedQuantity(gibbsEnergy, value as number, "J/mol", shift + work, ["gibbsEnergy"]);
}

/**
 * Entropy of formation at another standard pressure:
 * S(to) = S(from) - R ln(to / from) (n(gas) of the species - n(gas) of the elements).
 *
 * @param entropy - of formation, not of the species alone, in any unit of molar entropy; its uncertainty is kept
 * @param species - a record, or a label with its state; see {@link formationGasChange}
 * @param change - standard pressures, and what may be given beside
 * @returns J/mol/K
 * @throws GibbsLedgerError as {@link formationGibbsEnergyAtStandardPressure}
 * @remarks Arithmetic: within 3 eps of the sum of the absolute terms.
 * @see `references.freeman1984`
 * @example
 * const atOneBar = formationEntropyAtStandardPressure(quantity(-163.18, "J/mol/K"), "H2O(l)", {
 *   from: quantity(1, "atm"),
 *   to: quantity(1, "bar"),
 * });
 * atOneBar.value; // => -163.34...
 */
export function formationEntropyAtStandardPressure(
  entropy: MolarEntropy,
  species: SpeciesRecord | Label,
  change: FormationEntropyPressureChange,
): Quantity<"molarEntropy", "J/mol/K"> {
  const faults: Fault[] = [];
  const value = checkQuantity(entropy, "molarEntropy", ["entropy"], faults);
  const formed = readFormedSpecies(species, ["species"], faults);
  const members = changeMembers(change, [], conventionKeys, faults);
  const step = checkPressureStep(members, faults);
  const convention = checkConvention(members, [], faults);
  failIfAny(faults);
  const gasChange = gasChangeOf(formed as FormedSpecies, convention);
  const shift = -gasConstantJPerMolK * (step as PressureStep).lnRatio * gasChange;
  return shiftedQuantity(entropy, value as number, "J/mol/K", shift, ["entropy"]);
}

/** The volume in m3/mol; 0 where none is given, or after a fault. */
function checkVolume(value: unknown, formed: FormedSpecies | undefined, faults: Fault[]): number {
  if (value === undefined) return 0;
  const volume = checkQuantity(value, "molarVolume", ["molarVolume"], faults);
  if (formed?.state === "g") {
    faults.push({
      code: "standard-state/volume-of-gas",
      path: ["molarVolume"],
      message: `the pressure term of a gas is RT ln(to / from) and takes no volume`,
      expected: "a volume for a condensed phase or a dissolved species only",
    });
  }
  return volume ?? 0;
}
