import type { ActivityModel } from "../activity/activity-model.js";
import type { EquationOfState } from "../fugacity/equation-of-state.js";
import type { RangePolicy } from "../heat-capacity/range-policy.js";
import type { Concentration, MassDensity, Molality, Pressure, Temperature } from "../quantity/quantity.js";
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

/**
 * Composition of a liquid solution, inert solutes included, on exactly one scale, and the model of its activity
 * coefficients. Molalities and concentrations are of the solutes; mole fractions are of all components, the solvent
 * among them.
 */
export type SolutionComposition = (
  | {
      /** Amount of each solute per mass of solvent: numbers in mol/kg, or quantities. */
      readonly molalities: LabelMap<number | Molality>;
      readonly moleFractions?: never;
      readonly concentrations?: never;
      readonly density?: never;
    }
  | {
      /** Of the solvent and the solutes; fractions that sum to 1 within 1e-9. Liquids alone make a mixture. */
      readonly moleFractions: LabelMap;
      readonly molalities?: never;
      readonly concentrations?: never;
      readonly density?: never;
    }
  | {
      /** Amount of each solute per volume of solution. */
      readonly concentrations: LabelMap<Concentration>;
      /** Of the whole solution at the temperature and pressure. */
      readonly density: MassDensity;
      readonly molalities?: never;
      readonly moleFractions?: never;
    }
) & {
  /** Label of an uncharged liquid of the reaction, or of inerts. */
  readonly solvent: Label;
  /** Such as `idealSolution()`; no solution is taken for ideal in silence. */
  readonly activityModel: ActivityModel;
};

/** The real state that a reaction is looked at in. */
export interface ReactionConditions {
  /** Above 0 K. */
  readonly temperature: Temperature;
  /** Total pressure, above 0 Pa. */
  readonly pressure: Pressure;
  /** The gas phase: every gas of the reaction and every inert, fractions that sum to 1 within 1e-9. */
  readonly gas?: GasComposition;
  /** The liquid solution: dissolved species of the reaction, inert ones, and the solvent. */
  readonly solution?: SolutionComposition;
  /** Activities given by the caller, for species that no phase here describes. */
  readonly activities?: LabelMap;
  /** Gases, dissolved species and liquids of the phases above that take no part in the reaction. */
  readonly inerts?: readonly SpeciesRecord[];
  /** `"refuse"` when absent. */
  readonly outsideRange?: RangePolicy;
}
