import { quantity } from "../quantity/quantity.js";
import type { SpeciesRecord } from "../species/record.js";
import { standardProperties } from "../species/standard-properties.js";
import { missing } from "./witness-inputs.js";

/** Standard properties as doubles in J/mol and J/mol/K. */
export function propertiesOf(
  record: SpeciesRecord,
  temperatureK: number,
): {
  readonly heatCapacity: number;
  readonly enthalpy: number;
  readonly entropy: number;
  readonly gibbsEnergy: number;
} {
  const { heatCapacity, enthalpy, entropy, gibbsEnergy } = standardProperties(record, {
    temperature: quantity(temperatureK, "K"),
  });
  return {
    heatCapacity: heatCapacity?.value ?? missing(record, "tabulated-heat-capacity", "a heat capacity"),
    enthalpy: enthalpy.value,
    entropy: entropy.value,
    gibbsEnergy: gibbsEnergy.value,
  };
}
