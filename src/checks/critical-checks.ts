import { atmospherePa, gasConstantJPerMolK } from "../constants/constants.js";
import { log } from "../numeric/log.js";
import type { SpeciesRecord, Witness } from "../species/record.js";
import { optionalInput, requiredFigure, requiredInput } from "./witness-inputs.js";

/** pc Vc / (R Tc) of the record less the printed `criticalCompressibility`. */
export function criticalCompressibility(record: SpeciesRecord, witness: Witness): number {
  const { temperature, pressure, volume } = criticalOf(record, witness);
  const volumeM3PerMol = requiredFigure(record, witness.check, "critical volume", volume);
  const computed = (pressure * volumeM3PerMol) / (gasConstantJPerMolK * temperature);
  return computed - requiredInput(record, witness, "criticalCompressibility");
}

/**
 * The acentric factor for which the vapour-pressure equation of Lee and Kesler passes through a measured point of the
 * saturation line, less the record's. `saturationTemperature` is at 1 atm unless `saturationPressure` is given.
 *
 * @see `references.lee1975`
 */
export function acentricFactorFromBoilingPoint(record: SpeciesRecord, witness: Witness): number {
  const { temperature, pressure, acentricFactor } = criticalOf(record, witness);
  const reduced = requiredInput(record, witness, "saturationTemperature") / temperature;
  const reducedPressure = (optionalInput(witness, "saturationPressure") ?? atmospherePa) / pressure;
  const sixth = reduced * reduced * reduced * reduced * reduced * reduced;
  const simple = 5.92714 - 6.09648 / reduced - 1.28862 * log(reduced) + 0.169347 * sixth;
  const correction = 15.2518 - 15.6875 / reduced - 13.4721 * log(reduced) + 0.43577 * sixth;
  const computed = (log(reducedPressure) - simple) / correction;
  return computed - requiredFigure(record, witness.check, "acentric factor", acentricFactor);
}

function criticalOf(record: SpeciesRecord, { check }: Witness) {
  return {
    temperature: requiredFigure(record, check, "critical temperature", record.critical?.temperature),
    pressure: requiredFigure(record, check, "critical pressure", record.critical?.pressure),
    acentricFactor: record.critical?.acentricFactor,
    volume: record.critical?.volume,
  };
}
