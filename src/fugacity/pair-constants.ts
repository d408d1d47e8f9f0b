import { gasConstantJPerMolK } from "../constants/constants.js";
import { power } from "../numeric/power.js";
import type { CriticalConstants } from "./equation-of-state.js";

/** Critical constants of a substance that a corresponding-states correlation needs, complete. */
export interface CompleteConstants {
  readonly temperatureK: number;
  readonly pressurePa: number;
  readonly acentricFactor: number;
  readonly volumeM3PerMol: number;
  readonly compressibilityFactor: number;
}

/** Pseudocritical constants of a pair of substances. */
export interface PairConstants {
  readonly temperatureK: number;
  readonly pressurePa: number;
  readonly acentricFactor: number;
}

/**
 * Completes critical constants. Where the critical volume is unknown it is Vc = Zc R Tc/pc with Pitzer's
 * Zc = 0.291 - 0.080 omega; where it is known, Zc = pc Vc/(R Tc).
 *
 * @returns undefined where the acentric factor is unknown
 * @see `references.pitzer1957`
 */
export function completeConstants(critical: CriticalConstants | undefined): CompleteConstants | undefined {
  if (critical?.acentricFactor === undefined) return undefined;
  const { temperatureK, pressurePa, acentricFactor } = critical;
  const idealVolume = (gasConstantJPerMolK * temperatureK) / pressurePa;
  const compressibilityFactor =
    critical.volumeM3PerMol === undefined ? 0.291 - 0.08 * acentricFactor : critical.volumeM3PerMol / idealVolume;
  const volumeM3PerMol = critical.volumeM3PerMol ?? compressibilityFactor * idealVolume;
  return { temperatureK, pressurePa, acentricFactor, volumeM3PerMol, compressibilityFactor };
}

/**
 * Prausnitz's combining rules: Tc = sqrt(Tci Tcj) (1 - kij), Vc = ((Vci^(1/3) + Vcj^(1/3))/2)^3, Zc and omega the
 * means, pc = Zc R Tc/Vc. The same bits in either order of the two.
 *
 * @see `references.prausnitz1999`
 */
export function pairConstants(
  first: CompleteConstants,
  second: CompleteConstants,
  interactionParameter: number,
): PairConstants {
  const temperatureK = Math.sqrt(first.temperatureK * second.temperatureK) * (1 - interactionParameter);
  const edge = (power(first.volumeM3PerMol, 1 / 3) + power(second.volumeM3PerMol, 1 / 3)) / 2;
  const compressibilityFactor = (first.compressibilityFactor + second.compressibilityFactor) / 2;
  return {
    temperatureK,
    pressurePa: (compressibilityFactor * gasConstantJPerMolK * temperatureK) / (edge * edge * edge),
    acentricFactor: (first.acentricFactor + second.acentricFactor) / 2,
  };
}
