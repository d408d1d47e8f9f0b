import { quantity } from "../quantity/quantity.js";
import type { SpeciesRecord } from "../species/record.js";
import { standardProperties } from "../species/standard-properties.js";

/** Standard properties as doubles in J/mol and J/mol/K. */
export function propertiesOf(
  record: SpeciesRecord,
  temperatureK: number,
): {
  /** Absent where the record publishes H and S at 298.15 K only. */
  readonly heatCapacity: number | undefined;
  readonly enthalpy: number;
  readonly entropy: number;
  readonly gibbsEnergy: number;
} {
  const { heatCapacity, enthalpy, entropy, gibbsEnergy } = standardProperties(record, {
    temperature: quantity(temperatureK, "K"),
  });
  return {
    heatCapacity: heatCapacity?.value,
    enthalpy: enthalpy.value,
    entropy: entropy.value,
    gibbsEnergy: gibbsEnergy.value,
  };
}
