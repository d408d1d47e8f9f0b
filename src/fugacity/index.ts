export type { BinaryInteraction } from "./binary-interaction.js";
export type {
  CriticalConstants,
  EquationOfState,
  GasComponent,
  GasDeparture,
  GasMixture,
  GasState,
} from "./equation-of-state.js";
export { gasComponentOf } from "./gas-component-of.js";
export {
  type GasMixtureConditions,
  type GasMixtureProperties,
  gasMixtureProperties,
} from "./gas-mixture-properties.js";
export { idealGas } from "./ideal-gas.js";
export { lewisFugacityRule } from "./lewis-fugacity-rule.js";
export { secondVirialCoefficient } from "./second-virial-coefficient.js";
export { virial } from "./virial.js";
export type {
  PolarTerm,
  VirialCoefficient,
  VirialCoefficientFunction,
  VirialCorrelation,
  VirialOptions,
} from "./virial-options.js";
