import { gasConstantJPerMolK } from "../constants/constants.js";
import type { FaultPath } from "../errors/fault.js";
import { checkComponents } from "./check-components.js";
import { checkState } from "./check-state.js";
import type { EquationOfState, GasComponent, GasMixture } from "./equation-of-state.js";
import { refuseUnphysical } from "./unphysical.js";

/**
 * The ideal gas, pV = RT: every fugacity coefficient is 1 and every departure is 0. It needs no critical constants.
 *
 * @returns an equation of state; its states are exact but for the rounding of V = RT/p (two roundings)
 * @example
 * const mixture = idealGas().mixture([{ label: "N2(g)" }]);
 * const state = mixture.state(300, 1e5, [1]);
 * state.compressibilityFactor; // => 1
 * state.lnFugacityCoefficients; // => [0]
 */
export function idealGas(): EquationOfState {
  return equation;
}

const equation: EquationOfState = /* @__PURE__ */ Object.freeze({
  name: "idealGas",
  parameters: /* @__PURE__ */ Object.freeze({}),
  mixture: idealMixture,
});

function idealMixture(components: readonly GasComponent[], path: FaultPath = []): GasMixture {
  const count = checkComponents(components, path).length;
  return {
    state(temperatureK, pressurePa, moleFractions) {
      checkState(temperatureK, pressurePa, moleFractions, count, path);
      const molarVolume = (gasConstantJPerMolK * temperatureK) / pressurePa;
      if (!(molarVolume > 0 && molarVolume < Number.POSITIVE_INFINITY)) refuseUnphysical(1, molarVolume, path);
      return {
        compressibilityFactor: 1,
        molarVolume,
        lnFugacityCoefficients: new Array<number>(count).fill(0),
        departure: { enthalpy: 0, entropy: 0, gibbsEnergy: 0 },
      };
    },
  };
}
