import { referenceTemperatureK, standardPressurePa } from "../constants/constants.js";
import { figureInSi } from "../quantity/figure-value.js";
import type { SpeciesRecord } from "../species/record.js";

/**
 * Volume work on a pure condensed phase from the standard pressure of 1 bar to a pressure p:
 * V (1 + alpha (T - 298.15 K)) ((p - p0) - kappa (p - p0)^2 / 2), the integral of V dp.
 *
 * @param species - thermal expansion and compressibility count as zero where the record has none
 * @param temperatureK - above 0 K
 * @param pressurePa - above 0 Pa
 * @returns J/mol; undefined where the record has no molar volume
 */
export function volumeWork(species: SpeciesRecord, temperatureK: number, pressurePa: number): number | undefined {
  if (species.volume === undefined) return undefined;
  const { molar, thermalExpansion, compressibility } = species.volume;
  const expansion = thermalExpansion === undefined ? 0 : figureInSi(thermalExpansion);
  const compression = compressibility === undefined ? 0 : figureInSi(compressibility);
  const volume = figureInSi(molar) * (1 + expansion * (temperatureK - referenceTemperatureK));
  const pressure = pressurePa - standardPressurePa;
  return volume * (pressure - (compression * pressure * pressure) / 2) + 0;
}
