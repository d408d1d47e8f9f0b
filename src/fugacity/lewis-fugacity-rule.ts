import type { Fault, FaultPath } from "../errors/fault.js";
import { frozenCopy } from "../errors/frozen-copy.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { exactDot } from "../numeric/compensated.js";
import { checkEquationOfState } from "./check-equation-of-state.js";
import { checkState } from "./check-state.js";
import type { EquationOfState, GasComponent, GasMixture } from "./equation-of-state.js";

/**
 * The Lewis fugacity rule: each component has the fugacity coefficient that it has pure at the temperature and
 * pressure of the mixture, phi_i = phi_i(pure, T, p). So volumes and departures are mole-fraction sums of the pure
 * ones: V = sum of y_i V_i.
 *
 * An approximation that ignores interactions between unlike molecules. It is poor for components in small amount, and
 * a component that is liquid when pure at that temperature and pressure may be outside the wrapped equation's
 * validity. Nothing in the library applies it by itself.
 *
 * @param equationOfState - evaluates each pure component
 * @returns an equation of state
 * @throws GibbsLedgerError "input/not-an-object"; from `mixture` and `state`, the faults of the wrapped equation, with
 * the component's label in their path
 * @see `references.prausnitz1999`
 * @example
 * const rule = lewisFugacityRule(virial());
 * rule.name; // => "lewisFugacityRule"
 */
export function lewisFugacityRule(equationOfState: EquationOfState): EquationOfState {
  const faults: Fault[] = [];
  checkEquationOfState(equationOfState, ["equationOfState"], faults);
  failIfAny(faults);
  const { name, parameters } = equationOfState;
  return Object.freeze({
    name: "lewisFugacityRule",
    parameters: frozenCopy({ equationOfState: { name, parameters } }),
    mixture: (components: readonly GasComponent[], path: FaultPath = []) =>
      pureMixtures(equationOfState, components, path),
  });
}

function pureMixtures(
  equationOfState: EquationOfState,
  components: readonly GasComponent[],
  path: FaultPath,
): GasMixture {
  // The mixture of all is prepared only to report the faults of all components together.
  equationOfState.mixture(components, path);
  const pure = components.map((component) => equationOfState.mixture([component], [...path, component.label]));
  const one = [1];
  return {
    state(temperatureK, pressurePa, moleFractions) {
      checkState(temperatureK, pressurePa, moleFractions, pure.length, path);
      const states = pure.map((mixture) => mixture.state(temperatureK, pressurePa, one));
      const mean = (values: readonly number[]) => exactDot(moleFractions, values);
      const state = {
        compressibilityFactor: mean(states.map(({ compressibilityFactor }) => compressibilityFactor)),
        molarVolume: mean(states.map(({ molarVolume }) => molarVolume)),
        lnFugacityCoefficients: states.map(({ lnFugacityCoefficients }) => lnFugacityCoefficients[0]!),
        departure: {
          enthalpy: mean(states.map(({ departure }) => departure.enthalpy)),
          entropy: mean(states.map(({ departure }) => departure.entropy)),
          gibbsEnergy: mean(states.map(({ departure }) => departure.gibbsEnergy)),
        },
      };
      const exceeded = states.flatMap(({ outsideValidity }) => outsideValidity ?? []);
      return exceeded.length === 0 ? state : { ...state, outsideValidity: exceeded.join("; ") };
    },
  };
}
