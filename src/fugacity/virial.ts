import { gasConstantJPerMolK } from "../constants/constants.js";
import type { FaultPath } from "../errors/fault.js";
import { frozenCopy } from "../errors/frozen-copy.js";
import { fail } from "../errors/gibbs-ledger-error.js";
import { checkComponents } from "./check-components.js";
import { checkState } from "./check-state.js";
import { coefficientSource } from "./coefficient-source.js";
import type { EquationOfState, GasComponent, GasMixture } from "./equation-of-state.js";
import { completeConstants } from "./pair-constants.js";
import { refuseUnphysical, shortNumber } from "./unphysical.js";
import { checkVirialOptions, type VirialOptions, type VirialSettings } from "./virial-options.js";

/**
 * The virial equation in pressure, truncated after the second coefficient: Z = 1 + Bp/(RT), with
 * B = sum over i, j of y_i y_j B_ij, and with S_i = sum over j of y_j B_ij
 * - ln phi_i = (p/RT) (2 S_i - B)
 * - V = RT/p + B
 * - H - H(ideal) = p (B - T dB/dT), S - S(ideal) = -p dB/dT, G - G(ideal) = Bp
 *
 * B_ij comes from a generalised correlation of critical constants and acentric factors with Prausnitz's combining
 * rules, or from the caller. The default is "tsonopoulos": it follows the same measured coefficients as
 * "pitzer-curl", also at low reduced temperature, and is the only one with polar terms; "abbott" is the shorter one of
 * textbooks. Quantum gases (H2, He, Ne) need effective critical constants or the caller's function.
 *
 * Where the critical volume of a component is unknown it is estimated as (0.291 - 0.080 omega) R Tc/pc.
 *
 * @param options.correlation - "tsonopoulos" (default), "pitzer-curl" or "abbott"
 * @param options.binaryInteraction - k_ij in Tc_ij = sqrt(Tc_i Tc_j) (1 - k_ij); 0 where not given
 * @param options.polar - Tsonopoulos's a and b of polar substances; a pair of two polar ones has the means, a pair
 * with a nonpolar one none
 * @param options.secondVirialCoefficient - the caller's B_ij (m3/mol) and dB_ij/dT (m3/mol/K) in place of all that
 * @param options.outsideValidity - The series truncated after B holds up to about half the critical density. Denser
 * states are refused ("refuse", default) or computed and marked ("continue"). The critical volume of a mixture is the
 * sum of y_i Vc_i. With the caller's function and critical volumes unknown, the limit is |B|p/(RT) = 1/4, for beyond
 * it the series in pressure contradicts the series in density truncated after B, which has no root there.
 * @returns an equation of state
 * @throws GibbsLedgerError "input/unknown-key", "input/unknown-option", "fugacity/binary-interaction",
 * "fugacity/conflicting-options" and others of the options, all at once; from `mixture`,
 * "fugacity/missing-critical-constants" naming every component that lacks them; from `state`,
 * "fugacity/outside-validity", "fugacity/unphysical" (Z not above 0), "fugacity/coefficient-function"
 * @remarks Arithmetic: a pure B within 4 eps of the sum of its absolute terms and T dB/dT within 6 eps, 2,000 random
 * cases a correlation against 30-digit decimals (worst seen 2.7 and 4.3). Sums over components are correctly rounded,
 * so that their order does not matter to the bit.
 * @see `references.tsonopoulos1974` `references.pitzer1957` `references.smith2001`
 * `references.prausnitz1999`
 * @example
 * const nitrogen = { label: "N2(g)", critical: { temperatureK: 126.2, pressurePa: 3398000, acentricFactor: 0.037 } };
 * const state = virial({ correlation: "abbott" }).mixture([nitrogen]).state(300, 1e6, [1]);
 * state.compressibilityFactor; // => 0.9978...
 * state.lnFugacityCoefficients; // => [-0.002...]
 */
export function virial(options: VirialOptions = {}): EquationOfState {
  const settings = checkVirialOptions(options);
  return Object.freeze({
    name: "virial",
    parameters: parametersOf(settings),
    mixture: (components: readonly GasComponent[], path: FaultPath = []) => virialMixture(settings, components, path),
  });
}

function parametersOf(settings: VirialSettings): Readonly<Record<string, unknown>> {
  const { correlation, binaryInteraction, polar, secondVirialCoefficient, outsideValidity } = settings;
  if (secondVirialCoefficient !== undefined) {
    return frozenCopy({ secondVirialCoefficient: "caller's function", outsideValidity });
  }
  return frozenCopy({ correlation, binaryInteraction, polar, outsideValidity });
}

function virialMixture(settings: VirialSettings, components: readonly GasComponent[], path: FaultPath): GasMixture {
  const labels = checkComponents(components, path);
  const constants = components.map(({ critical }) => completeConstants(critical));
  const volumes = constants.map((known, index) => components[index]!.critical?.volumeM3PerMol ?? known?.volumeM3PerMol);
  const criticalVolumes = volumes.includes(undefined) ? undefined : Float64Array.from(volumes as number[]);
  const source = coefficientSource(settings, components, constants, path);
  const name = labels.length === 1 ? labels[0]! : "the mixture";
  const hint =
    settings.secondVirialCoefficient === undefined
      ? "lower the pressure, or use a cubic equation of state"
      : "lower the pressure; the function's B is in m3/mol: -388 cm3/mol is -388e-6";
  const count = labels.length;
  const sums = new Float64Array(count);
  // Sums run in the order of the labels, so that the order in which a mixture is written does not show in a bit.
  const order = labels.map((_, index) => index).sort((a, b) => (labels[a]! < labels[b]! ? -1 : 1));
  const weighted = (moleFractions: ArrayLike<number>, values: ArrayLike<number>): number => {
    let sum = 0;
    for (const index of order) sum += moleFractions[index]! * values[index]!;
    return sum;
  };
  return {
    state(temperatureK, pressurePa, moleFractions) {
      checkState(temperatureK, pressurePa, moleFractions, count, path);
      const { values, slopes } = source(temperatureK);
      const thermal = gasConstantJPerMolK * temperatureK;
      const perVolume = pressurePa / thermal;
      for (let index = 0; index < count; index += 1) sums[index] = weighted(moleFractions, slopes[index]!);
      const slope = weighted(moleFractions, sums);
      for (let index = 0; index < count; index += 1) sums[index] = weighted(moleFractions, values[index]!);
      const value = weighted(moleFractions, sums);
      const compressibilityFactor = 1 + value * perVolume;
      const molarVolume = thermal / pressurePa + value;
      // Adding 0 turns -0 into 0, which an underflowing product may be.
      const enthalpy = pressurePa * (value - temperatureK * slope) + 0;
      const entropy = 0 - pressurePa * slope;
      if (
        !(
          isPositive(compressibilityFactor) &&
          isPositive(molarVolume) &&
          Number.isFinite(enthalpy) &&
          Number.isFinite(entropy)
        )
      ) {
        return refuseUnphysical(compressibilityFactor, molarVolume, path, hint);
      }
      const exceeded =
        criticalVolumes === undefined
          ? beyondSeries(value * perVolume, name)
          : beyondDensity(molarVolume, 2 * weighted(moleFractions, criticalVolumes), name);
      if (exceeded !== undefined && settings.outsideValidity === "refuse") refuseOutside(exceeded, molarVolume, path);
      const lnFugacityCoefficients = new Array<number>(count);
      for (let index = 0; index < count; index += 1) {
        lnFugacityCoefficients[index] = perVolume * (2 * sums[index]! - value) + 0;
      }
      const departure = { enthalpy, entropy, gibbsEnergy: pressurePa * value + 0 };
      const state = { compressibilityFactor, molarVolume, lnFugacityCoefficients, departure };
      return exceeded === undefined ? state : { ...state, outsideValidity: exceeded };
    },
  };
}

function beyondDensity(molarVolume: number, limit: number, name: string): string | undefined {
  if (molarVolume >= limit) return undefined;
  return (
    `the virial equation truncated after B holds up to half the critical density, for ${name} down to a molar volume ` +
    `of ${shortNumber(limit)} m3/mol; here it is ${shortNumber(molarVolume)} m3/mol`
  );
}

function beyondSeries(correction: number, name: string): string | undefined {
  if (Math.abs(correction) <= 0.25) return undefined;
  return (
    `the virial equation truncated after B holds for ${name} up to |B|p/(RT) = 0.25 where critical volumes are ` +
    `unknown; here it is ${shortNumber(Math.abs(correction))}`
  );
}

function refuseOutside(message: string, molarVolume: number, path: FaultPath): never {
  return fail({
    code: "fugacity/outside-validity",
    path,
    message,
    received: `${shortNumber(molarVolume)} m3/mol`,
    expected: "a less dense gas",
    hint: 'lower the pressure, use a cubic equation of state, or virial({ outsideValidity: "continue" })',
  });
}

function isPositive(value: number): boolean {
  return value > 0 && value < Number.POSITIVE_INFINITY;
}
