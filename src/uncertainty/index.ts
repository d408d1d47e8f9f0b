export {
  type CombinedUncertainty,
  combineUncertainties,
  type DatumUncertainty,
  type UncertaintyContribution,
} from "./combine-uncertainties.js";
export { coverageFactor } from "./coverage-factor.js";
export { normalQuantile } from "./normal-quantile.js";
export { type CoverageInterval, standardUncertaintyOf } from "./standard-uncertainty.js";
