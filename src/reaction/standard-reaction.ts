import { fail } from "../errors/gibbs-ledger-error.js";
import { evaluateColumns } from "../heat-capacity/columns.js";
import { evaluateAll, intervalOf, roundingBound, type SeriesFunction } from "../heat-capacity/evaluate.js";
import type { RangePolicy } from "../heat-capacity/range-policy.js";
import { exp } from "../numeric/exp.js";
import { log } from "../numeric/log.js";
import { temperatureInKelvin } from "../quantity/guards.js";
import type { Quantity, Temperature } from "../quantity/quantity.js";
import { lnOfConstant, log10OfE } from "../species/ln-of-constant.js";
import type { Label } from "../species/record.js";
import type { Reaction } from "./reaction.js";
import { reactionPlans } from "./reaction.js";
import { failReactionRange, labelsOutside, reactionPlan } from "./reaction-plan.js";
import type { StandardStates } from "./standard-state.js";

/** Temperature of a standard reaction property, and what to do outside the range of a species. */
export interface StandardReactionConditions {
  /** Above 0 K. */
  readonly temperature: Temperature;
  /** `"refuse"` when absent. */
  readonly outsideRange?: RangePolicy;
}

/** Standard properties of a reaction, per mole of reaction as written. */
export interface StandardReactionProperties {
  /** Absent where a species publishes H and S at 298.15 K only. */
  readonly heatCapacity?: Quantity<"molarEntropy", "J/mol/K">;
  readonly enthalpy: Quantity<"molarEnergy", "J/mol">;
  readonly entropy: Quantity<"molarEntropy", "J/mol/K">;
  readonly gibbsEnergy: Quantity<"molarEnergy", "J/mol">;
  /** Natural logarithm of the equilibrium constant, -G / RT. */
  readonly lnK: number;
  /** Decimal logarithm of the equilibrium constant. */
  readonly log10K: number;
  /** The standard states that K refers to, by label. */
  readonly standardStates: StandardStates;
  /** Labels of the species evaluated outside their own range. */
  readonly outsideRange: readonly Label[];
}

/** Largest ln K whose exponential a double holds. */
const largestLnK = 709.782712893384;
const smallestLnK = -708.3964185322641;

/**
 * Standard Gibbs energy of a reaction, Delta_r G = sum of nu (H - T S), per mole of reaction as written, at 1 bar.
 *
 * The series of all species are summed exactly and rounded once, when the reaction is first evaluated; the result does
 * not depend on the order of the species, and reverses its sign exactly with the equation.
 *
 * @param reaction - what `reaction` returned, here, in another copy of the package, or through JSON
 * @param conditions - temperature above 0 K, in any unit of temperature, within the range of every species
 * @returns a quantity in J/mol
 * @throws GibbsLedgerError "species/outside-range" (one fault a species), "quantity/wrong-dimension",
 * "quantity/not-positive"
 * @remarks Arithmetic: within 4 eps of the sum of the absolute terms of the merged series.
 * @see `references.cohen2007`
 * @example
 * import { referenceData } from "gibbs-ledger/data";
 * const synthesis = reaction("N2 + 3 H2 = 2 NH3", referenceData);
 * const energy = standardReactionGibbsEnergy(synthesis, { temperature: quantity(25, "Cel") });
 * energy.unit; // => "J/mol"
 */
export function standardReactionGibbsEnergy(
  reaction: Reaction,
  conditions: StandardReactionConditions,
): Quantity<"molarEnergy", "J/mol"> {
  const plans = reactionPlans(reaction);
  const temperatureK = temperatureInKelvin(conditions?.temperature);
  const interval = intervalOf(reactionPlan(plans, conditions.outsideRange), temperatureK);
  if (interval === undefined) return failReactionRange(reaction, temperatureK);
  const value = evaluateColumns(interval.gibbsEnergy, temperatureK, log(temperatureK));
  return { value, unit: "J/mol" };
}

/**
 * Standard heat capacity, enthalpy, entropy and Gibbs energy of a reaction and the logarithms of its equilibrium
 * constant, with the standard states that the constant refers to.
 *
 * @param reaction - what `reaction` returned, here, in another copy of the package, or through JSON
 * @param conditions - temperature above 0 K, within the range of every species unless `outsideRange` says otherwise
 * @throws GibbsLedgerError as {@link standardReactionGibbsEnergy}
 * @remarks Arithmetic: each property within 4 eps of the sum of the absolute terms of its series.
 * @example
 * import { referenceData } from "gibbs-ledger/data";
 * const shift = reaction("CO(g) + H2O(g) = CO2(g) + H2(g)", referenceData);
 * const properties = standardReactionProperties(shift, { temperature: quantity(1000, "K") });
 * properties.log10K; // => 0.15...
 */
export function standardReactionProperties(
  reaction: Reaction,
  conditions: StandardReactionConditions,
): StandardReactionProperties {
  const plans = reactionPlans(reaction);
  const temperatureK = temperatureInKelvin(conditions?.temperature);
  const policy = conditions.outsideRange;
  const plan = reactionPlan(plans, policy);
  const interval = intervalOf(plan, temperatureK);
  if (interval === undefined) return failReactionRange(plans.reaction, temperatureK);
  const values = evaluateAll(interval, temperatureK);
  const lnK = lnOfConstant(values.gibbsEnergy, temperatureK);
  const heatCapacity: Quantity<"molarEntropy", "J/mol/K"> = { value: values.heatCapacity, unit: "J/mol/K" };
  const properties = {
    heatCapacity,
    enthalpy: { value: values.enthalpy, unit: "J/mol" },
    entropy: { value: values.entropy, unit: "J/mol/K" },
    gibbsEnergy: { value: values.gibbsEnergy, unit: "J/mol" },
    lnK,
    log10K: lnK * log10OfE + 0,
    standardStates: plans.standardStates,
    outsideRange: policy === undefined || policy === "refuse" ? noLabels : labelsOutside(plans.reaction, temperatureK),
  } as const;
  return plan.heatCapacityKnown ? properties : withoutHeatCapacity(properties);
}

/**
 * Equilibrium constant K = exp(-G / RT), where a double can hold it.
 *
 * @returns a number of dimension one; its standard states are those of {@link standardReactionProperties}
 * @throws GibbsLedgerError "reaction/constant-out-of-range" below 2.3e-308 and above 1.7e308: use `log10K`
 * @example
 * import { referenceData } from "gibbs-ledger/data";
 * const shift = reaction("CO(g) + H2O(g) = CO2(g) + H2(g)", referenceData);
 * equilibriumConstant(shift, { temperature: quantity(1000, "K") }); // => 1.4...
 */
export function equilibriumConstant(reaction: Reaction, conditions: StandardReactionConditions): number {
  const { value } = standardReactionGibbsEnergy(reaction, conditions);
  const temperatureK = temperatureInKelvin(conditions.temperature);
  const lnK = lnOfConstant(value, temperatureK);
  if (lnK > smallestLnK && lnK < largestLnK) return exp(lnK);
  return fail({
    code: "reaction/constant-out-of-range",
    path: [],
    message: `K = exp(${lnK}) cannot be held by a double`,
    received: `ln K = ${lnK}`,
    expected: `ln K from ${smallestLnK} to ${largestLnK}`,
    hint: "lnK and log10K of standardReactionProperties are exact enough at any size",
  });
}

/**
 * Largest rounding error of a standard property of a reaction: 4 eps times the sum of the absolute terms of the series
 * that is evaluated.
 *
 * @param property - which property
 * @returns in the coherent unit of the property, J/mol or J/mol/K
 * @throws GibbsLedgerError as {@link standardReactionGibbsEnergy}
 */
export function standardReactionRoundingBound(
  reaction: Reaction,
  property: SeriesFunction,
  conditions: StandardReactionConditions,
): number {
  const plans = reactionPlans(reaction);
  const temperatureK = temperatureInKelvin(conditions?.temperature);
  const plan = reactionPlan(plans, conditions.outsideRange);
  const interval = intervalOf(plan, temperatureK);
  if (interval === undefined) return failReactionRange(plans.reaction, temperatureK);
  return roundingBound(interval, property, temperatureK);
}

const noLabels: readonly Label[] = Object.freeze([]);

function withoutHeatCapacity(properties: StandardReactionProperties): StandardReactionProperties {
  const { heatCapacity: _unknown, ...known } = properties;
  return known;
}
