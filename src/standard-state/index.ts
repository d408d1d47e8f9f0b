export { convertEnthalpyReference } from "./convert-enthalpy-reference.js";
export { convertStandardPressure } from "./convert-standard-pressure.js";
export { electrodePotentialAtStandardPressure } from "./electrode-potential.js";
export {
  type ElementIncrement,
  type EnthalpyReference,
  type FormationEnthalpyChange,
  type FormationIncrements,
  formationEnthalpyAtReference,
} from "./enthalpy-reference.js";
export { formationEnthalpyAtZeroKelvin } from "./formation-at-zero-kelvin.js";
export {
  type ElementOptions,
  formationIncrements,
  type NamedElementIncrement,
  type RecordIncrements,
} from "./formation-increments.js";
export {
  type FormationEntropyPressureChange,
  type FormationGibbsEnergyPressureChange,
  formationEntropyAtStandardPressure,
  formationGibbsEnergyAtStandardPressure,
} from "./formation-pressure.js";
export {
  type FormationConvention,
  formationGasChange,
  type GaseousElements,
  gaseousElements,
} from "./gaseous-elements.js";
export {
  type GibbsFunctionChange,
  type GibbsFunctionConditions,
  gibbsFunctionAtReference,
  lnKFromGibbsFunction,
} from "./gibbs-function.js";
export { idealGasEntropyAtStandardPressure, idealGasGibbsEnergyAtStandardPressure } from "./ideal-gas-pressure.js";
export { lnKAtStandardPressure } from "./ln-k-pressure.js";
export type { StandardPressureChange, StandardPressureChangeAtTemperature } from "./pressure-change.js";
export { elementsAtZeroKelvin } from "./reference-convention.js";
export { lnKOnScale, type SoluteScaleChangeAtTemperature, standardGibbsEnergyOnScale } from "./solute-scale.js";
export { type SolutionComposition, type SolutionMeasured, solutionComposition } from "./solution-composition.js";
export type { SoluteScale, SoluteScaleChange, SolventProperties } from "./solvent.js";
export type { StoichiometricNumbers } from "./stoichiometry.js";
