import type { EquationOfState } from "../fugacity/equation-of-state.js";
import type { RangePolicy } from "../heat-capacity/range-policy.js";
import type { Pressure, Temperature } from "../quantity/quantity.js";
import type { Label, SpeciesRecord } from "../species/record.js";

/** Numbers by label of a species. */
export type LabelMap<V = number> = Readonly<Record<Label, V>>;

/** Composition of the gas phase, inerts included, and how it departs from the ideal gas. */
export type GasComposition = (
  | { readonly moleFractions: LabelMap; readonly partialPressures?: never }
  | { readonly partialPressures: LabelMap<Pressure>; readonly moleFractions?: never }
) & {
  /** `idealGas()` when absent. */
  readonly equationOfState?: EquationOfState;
};

/** The real state that a reaction is looked at in. */
export interface ReactionConditions {
  /** Above 0 K. */
  readonly temperature: Temperature;
  /** Total pressure, above 0 Pa. */
  readonly pressure: Pressure;
  /** The gas phase: every gas of the reaction and every inert, fractions that sum to 1 within 1e-9. */
  readonly gas?: GasComposition;
  /** Activities given by the caller, for species that no phase here describes. */
  readonly activities?: LabelMap;
  /** Species of the gas phase that take no part in the reaction. */
  readonly inerts?: readonly SpeciesRecord[];
  /** `"refuse"` when absent. */
  readonly outsideRange?: RangePolicy;
}
