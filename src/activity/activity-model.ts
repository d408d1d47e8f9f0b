import type { FaultPath } from "../errors/fault.js";

/**
 * What the activity coefficients of solutes are counted on: `"molality"`, a = (m / 1 mol/kg) gamma, for dissolved
 * species whose standard state is the ideal solution of 1 mol/kg; `"mole-fraction"`, a = x gamma, for components of a
 * mixture whose standard state is the pure liquid.
 */
export type CompositionScale = "molality" | "mole-fraction";

/** One component as an activity model sees it. */
export interface SolutionComponent {
  /** Label of the species, unique within a solution. */
  readonly label: string;
  /** Charge in units of the elementary charge, a whole number. */
  readonly chargeNumber: number;
  /** In kilograms per mole, above 0; absent where an element has no standard atomic weight. */
  readonly molarMassKgPerMol?: number;
}

/** The solvent as an activity model sees it. */
export interface SolventComponent extends SolutionComponent {
  readonly chargeNumber: 0;
  readonly molarMassKgPerMol: number;
}

/** What a solution is made of. */
export interface SolutionComponents {
  /** The scale of the solutes, the same for all of them. */
  readonly scale: CompositionScale;
  /** On the mole-fraction scale any one of the components; the order of components changes no result. */
  readonly solvent: SolventComponent;
  /** None for the pure solvent. */
  readonly solutes: readonly SolutionComponent[];
}

/** How much there is of each component, as raw doubles. */
export interface SolutionAmounts {
  /** Above 0; on the molality scale 1 / (1 + M sum of m) with the molar mass M of the solvent. */
  readonly solventMoleFraction: number;
  /** One number per solute in their order: its molality in mol/kg of solvent, or its mole fraction; 0 is allowed. */
  readonly solutes: ArrayLike<number>;
}

/** A solution at one temperature, pressure and composition, as raw doubles. */
export interface SolutionState {
  /** ln gamma of each solute on the scale of its components, in the order of the solutes. */
  readonly lnActivityCoefficients: readonly number[];
  /** ln of the activity of the solvent relative to the pure liquid at the same pressure. */
  readonly lnSolventActivity: number;
  /** Present where the model was used outside its validity: what is exceeded, in one line. */
  readonly outsideValidity?: string;
}

/** An activity model with the constants of its components prepared. */
export interface Solution {
  /**
   * The state of the solution.
   *
   * @param temperatureK - in kelvin, above 0
   * @param pressurePa - in pascal, above 0
   * @param amounts - one number per solute, finite and not negative; sums are the caller's business
   */
  state(temperatureK: number, pressurePa: number, amounts: SolutionAmounts): SolutionState;
}

/**
 * A model of activity coefficients: plain data and one function, handed in by the caller with every solution.
 *
 * A user's own model is any object of this form. It should obey the Gibbs-Duhem equation, or the solvent's activity
 * contradicts those of the solutes: sum of m d ln a + (1/M) d ln a(solvent) = 0 at constant temperature and pressure.
 */
export interface ActivityModel {
  /** Name of the model. */
  readonly name: string;
  /** What the model was made from, as JSON-serialisable data. */
  readonly parameters: Readonly<Record<string, unknown>>;
  /** The scales on which the model gives coefficients, at least one. */
  readonly scales: readonly CompositionScale[];
  /**
   * Checks the components once and prepares their constants.
   *
   * @param components - the solvent, and solutes with different labels
   * @param path - where the components lie in the caller's input, for faults
   */
  solution(components: SolutionComponents, path?: FaultPath): Solution;
}
