import type { FaultPath } from "../errors/fault.js";
import { fail } from "../errors/gibbs-ledger-error.js";
import { exactSum } from "../numeric/compensated.js";
import { log } from "../numeric/log.js";
import type { ActivityModel, Solution, SolutionComponents } from "./activity-model.js";
import { checkSolutionComponents } from "./check-solution-components.js";
import { checkSolutionState } from "./check-solution-state.js";

/**
 * The ideal solution on the scale of the standard states: every activity coefficient is 1.
 *
 * On the molality scale it is the ideal dilute solution, a = m / (1 mol/kg), and the Gibbs-Duhem equation then gives
 * the solvent ln a = -M sum of m with its molar mass M: the osmotic coefficient is 1. For a mixture of liquids it is
 * Raoult's law, a = x for every component. A real solution comes near the first as it is diluted (ions by the square
 * root of their concentration: gamma is 0.965 at 0.001 mol/kg of a 1:1 electrolyte in water at 25 degrees Celsius),
 * and near the second as its components resemble each other.
 *
 * @returns an activity model for both scales
 * @remarks Arithmetic: the sum of molalities is rounded once, and so independent of their order; two roundings in
 * ln a of the solvent, or one logarithm.
 * @see `references.robinson1959` `references.prausnitz1999`
 * @example
 * const water = { label: "H2O(l)", chargeNumber: 0, molarMassKgPerMol: 0.018015 } as const;
 * const salt = [{ label: "Na^+(aq)", chargeNumber: 1 }, { label: "Cl^-(aq)", chargeNumber: -1 }];
 * const brine = idealSolution().solution({ scale: "molality", solvent: water, solutes: salt });
 * const state = brine.state(298.15, 1e5, { solventMoleFraction: 0.965, solutes: [1, 1] });
 * state.lnActivityCoefficients; // => [0, 0]
 * state.lnSolventActivity; // => -0.03603
 */
export function idealSolution(): ActivityModel {
  return model;
}

const model: ActivityModel = /* @__PURE__ */ Object.freeze({
  name: "idealSolution",
  parameters: /* @__PURE__ */ Object.freeze({}),
  scales: /* @__PURE__ */ Object.freeze(["molality", "mole-fraction"] as const),
  solution: prepare,
});

function prepare(components: SolutionComponents, path: FaultPath = []): Solution {
  checkSolutionComponents(components, path);
  const { scale, solvent } = components;
  const count = components.solutes.length;
  const molarMass = solvent.molarMassKgPerMol;
  return {
    state(temperatureK, pressurePa, amounts) {
      checkSolutionState(temperatureK, pressurePa, amounts, count, path);
      const lnSolventActivity =
        scale === "molality" ? lnDiluteSolvent(amounts.solutes, molarMass) : log(amounts.solventMoleFraction);
      if (!Number.isFinite(lnSolventActivity)) refuseTooMuch(path);
      return { lnActivityCoefficients: new Array<number>(count).fill(0), lnSolventActivity };
    },
  };
}

/**
 * ln a of the solvent of an ideal dilute solution, -M sum of m, which integrates sum of m d ln m + (1/M) d ln a = 0
 * from the pure solvent on.
 */
export function lnDiluteSolvent(molalities: ArrayLike<number>, molarMassKgPerMol: number): number {
  return -molarMassKgPerMol * exactSum(molalities) + 0;
}

function refuseTooMuch(path: FaultPath): never {
  return fail({
    code: "activity/unphysical",
    path,
    message: "the molalities are too large for the activity of the solvent to be a double",
    expected: "molalities whose sum a double can hold",
  });
}
