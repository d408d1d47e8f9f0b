import type { Fault } from "../errors/fault.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkPositiveQuantity } from "../quantity/guards.js";
import type { Quantity, Temperature } from "../quantity/quantity.js";
import { collectHouseRecord } from "../species/house-record.js";
import type { SpeciesRecord } from "../species/record.js";
import { coefficientSource } from "./coefficient-source.js";
import { gasComponentOf } from "./gas-component-of.js";
import { completeConstants } from "./pair-constants.js";
import { refuseUnphysical } from "./unphysical.js";
import { checkVirialOptions, type VirialOptions } from "./virial-options.js";

/**
 * The second virial coefficient B of a pure gas at a temperature, by a generalised correlation of its critical
 * constants and acentric factor, as in {@link virial}.
 *
 * @param species - a record with critical temperature, critical pressure and acentric factor
 * @param temperature - above 0 K
 * @param options.correlation - "tsonopoulos" (default), "pitzer-curl" or "abbott"
 * @param options.polar - Tsonopoulos's polar terms by label
 * @returns B in m3/mol
 * @throws GibbsLedgerError "fugacity/missing-critical-constants", "fugacity/unphysical" (B is beyond a double at an
 * extreme temperature), and the faults of the options, the record and the temperature
 * @remarks Arithmetic: within 4 eps of the sum of the absolute terms, 2,000 random cases a correlation against
 * 30-digit decimals. Against measured coefficients the correlation for nonpolar gases is mostly within 3 cm3/mol or
 * 5 %.
 * @see `references.tsonopoulos1974` `references.pitzer1957` `references.smith2001`
 * @example
 * const coefficient = secondVirialCoefficient(CO2_g, quantity(300, "K"));
 * convert(coefficient, "cm3/mol").value; // => -121.9...
 */
export function secondVirialCoefficient(
  species: SpeciesRecord,
  temperature: Temperature,
  options: Pick<VirialOptions, "correlation" | "polar"> = {},
): Quantity<"molarVolume", "m3/mol"> {
  const settings = checkVirialOptions(options);
  const faults: Fault[] = [];
  collectHouseRecord(species, ["species"], faults);
  const temperatureK = checkPositiveQuantity(temperature, "temperature", ["temperature"], faults);
  failIfAny(faults);
  const component = gasComponentOf(species);
  const source = coefficientSource(settings, [component], [completeConstants(component.critical)], ["species"]);
  const value = source(temperatureK!).values[0]![0]! + 0;
  if (!Number.isFinite(value)) refuseUnphysical(value, value, ["temperature"]);
  return { value, unit: "m3/mol" };
}
