export { type AggregationState, aggregationStates } from "./aggregation-states.js";
export {
  type AtomicWeight,
  atomicWeights,
  atomicWeightsSource,
  isotopeMasses,
  isotopeMassesSource,
  type WeighedElementSymbol,
} from "./atomic-weights.js";
export { type ElementSymbol, elementSymbols, type HydrogenIsotope } from "./element-symbols.js";
export { type FormatFormulaOptions, formatFormula } from "./format-formula.js";
export { type Formula, formula } from "./formula.js";
export { hillFormula } from "./hill-formula.js";
export { molarMass } from "./molar-mass.js";
export { type LabelParts, parseLabel } from "./parse-label.js";
export type { FormulaStyle } from "./spelling.js";
