import { gasConstantJPerMolK } from "../constants/constants.js";
import type { Fault } from "../errors/fault.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { evaluateColumns } from "../heat-capacity/columns.js";
import { intervalOf, roundingBound } from "../heat-capacity/evaluate.js";
import { exactDot } from "../numeric/compensated.js";
import { log } from "../numeric/log.js";
import type { Quantity } from "../quantity/quantity.js";
import type { ReactionConditions } from "./conditions.js";
import type { Reaction } from "./reaction.js";
import { reactionPlans } from "./reaction.js";
import { failReactionRange, reactionPlan } from "./reaction-plan.js";
import { type ReactionState, reactionState } from "./reaction-state.js";
import { checkZeroActivities, isAbsent, lnActivity } from "./term-state.js";

/** Which way a reaction runs at a composition, and why. */
export interface ReactionDirection {
  /**
   * `"undetermined"`: a reactant and a product are both absent; `"at-equilibrium"`: the Gibbs energy is zero within
   * the rounding of the arithmetic.
   */
  readonly direction: "forward" | "reverse" | "at-equilibrium" | "undetermined";
  /** Absent where a reacting species is absent. */
  readonly gibbsEnergy?: Quantity<"molarEnergy", "J/mol">;
  /** The reason in words. */
  readonly reason: string;
}

/**
 * Natural logarithm of the reaction quotient, ln Q = sum of nu ln a, at a real composition and pressure.
 *
 * The activity of a gas is y phi p / 1 bar, of a pure condensed phase exp(V (p - 1 bar) / RT), of a dissolved species
 * m gamma / (1 mol/kg), of a liquid of a mixture x gamma and of the solvent what the activity model says, both with
 * their volume work, of the electron 1; of any other species it is what the caller gives.
 *
 * @param reaction - what `reaction` returned
 * @param conditions - temperature, pressure, composition of gas and solution with their inerts, activities given by
 * the caller
 * @returns a number of dimension one; at equilibrium it equals ln K
 * @throws GibbsLedgerError "conditions/zero-activity", "conditions/unknown-label",
 * "conditions/fractions-do-not-sum" and other faults of the conditions, all at once
 * @example
 * import { referenceData } from "gibbs-ledger/data";
 * const shift = reaction("CO(g) + H2O(g) = CO2(g) + H2(g)", referenceData);
 * const lnQ = lnReactionQuotient(shift, {
 *   temperature: quantity(900, "K"),
 *   pressure: quantity(1, "bar"),
 *   gas: { moleFractions: { "CO(g)": 0.25, "H2O(g)": 0.25, "CO2(g)": 0.25, "H2(g)": 0.25 } },
 * });
 * lnQ; // => 0
 */
export function lnReactionQuotient(reaction: Reaction, conditions: ReactionConditions): number {
  return lnQuotientOf(stateOfPresent(reactionPlans(reaction).reaction, conditions));
}

/**
 * Gibbs energy of a reaction at its real temperature, pressure and composition, G = G(standard) + RT ln Q, per mole of
 * reaction as written.
 *
 * @param reaction - what `reaction` returned
 * @param conditions - temperature, pressure, composition of gas and solution with their inerts, activities given by
 * the caller
 * @returns a quantity in J/mol; negative where the reaction runs forward
 * @throws GibbsLedgerError as {@link lnReactionQuotient}, and "species/outside-range"
 * @example
 * import { referenceData } from "gibbs-ledger/data";
 * const synthesis = reaction("N2(g) + 3 H2(g) = 2 NH3(g)", referenceData);
 * const energy = reactionGibbsEnergy(synthesis, {
 *   temperature: quantity(700, "K"),
 *   pressure: quantity(1, "bar"),
 *   gas: { moleFractions: { "N2(g)": 0.2, "H2(g)": 0.6, "NH3(g)": 0.2 } },
 * });
 * energy.unit; // => "J/mol"
 */
export function reactionGibbsEnergy(
  reaction: Reaction,
  conditions: ReactionConditions,
): Quantity<"molarEnergy", "J/mol"> {
  const { reaction: house } = reactionPlans(reaction);
  return { value: gibbsEnergyOf(house, stateOfPresent(house, conditions)), unit: "J/mol" };
}

/**
 * Which way a reaction runs at a composition. Where a product is absent it can only run forward, where a reactant is
 * absent only in reverse, and no number is needed.
 *
 * @param reaction - what `reaction` returned
 * @param conditions - as of {@link reactionGibbsEnergy}; fractions, molalities and activities of reacting species may be
 * zero
 * @throws GibbsLedgerError as {@link reactionGibbsEnergy}, but for "conditions/zero-activity"
 * @example
 * import { referenceData } from "gibbs-ledger/data";
 * const synthesis = reaction("N2(g) + 3 H2(g) = 2 NH3(g)", referenceData);
 * const answer = reactionDirection(synthesis, {
 *   temperature: quantity(700, "K"),
 *   pressure: quantity(1, "bar"),
 *   gas: { moleFractions: { "N2(g)": 0.25, "H2(g)": 0.75, "NH3(g)": 0 } },
 * });
 * answer.direction; // => "forward"
 */
export function reactionDirection(reaction: Reaction, conditions: ReactionConditions): ReactionDirection {
  const { reaction: house } = reactionPlans(reaction);
  const state = reactionState(house, conditions);
  const absent = state.terms.filter(isAbsent);
  const reactants = absent.filter(({ term }) => term.coefficient < 0).map(({ term }) => term.label);
  const products = absent.filter(({ term }) => term.coefficient > 0).map(({ term }) => term.label);
  if (reactants.length > 0 && products.length > 0) {
    const reason = `${reactants.join(", ")} and ${products.join(", ")} are absent`;
    return { direction: "undetermined", reason };
  }
  if (products.length > 0) return { direction: "forward", reason: `${products.join(", ")} absent` };
  if (reactants.length > 0) return { direction: "reverse", reason: `${reactants.join(", ")} absent` };
  const value = gibbsEnergyOf(house, state);
  const gibbsEnergy = { value, unit: "J/mol" } as const;
  if (Math.abs(value) <= gibbsEnergyBound(house, state)) {
    return { direction: "at-equilibrium", gibbsEnergy, reason: "the Gibbs energy is zero within rounding" };
  }
  return value < 0
    ? { direction: "forward", gibbsEnergy, reason: "the Gibbs energy of the reaction is negative" }
    : { direction: "reverse", gibbsEnergy, reason: "the Gibbs energy of the reaction is positive" };
}

/** Gibbs energy in J/mol at a checked state in which every reacting species is present. */
export function gibbsEnergyOf(reaction: Reaction, state: ReactionState): number {
  const { temperatureK } = state;
  const plan = reactionPlan(reactionPlans(reaction), state.policy);
  const interval = intervalOf(plan, temperatureK);
  if (interval === undefined) return failReactionRange(reaction, temperatureK);
  const standard = evaluateColumns(interval.gibbsEnergy, temperatureK, log(temperatureK));
  return standard + gasConstantJPerMolK * temperatureK * lnQuotientOf(state) + 0;
}

/** Checks conditions in which no reacting species may be absent. */
export function stateOfPresent(reaction: Reaction, conditions: ReactionConditions): ReactionState {
  const state = reactionState(reaction, conditions);
  const faults: Fault[] = [];
  checkZeroActivities(state.terms, faults);
  failIfAny(faults);
  return state;
}

/** ln Q, correctly rounded from its terms and so independent of their order. */
export function lnQuotientOf({ terms, temperatureK, pressurePa }: ReactionState): number {
  return exactDot(
    terms.map(({ term }) => term.coefficient),
    terms.map((state) => lnActivity(state, temperatureK, pressurePa)),
  );
}

function gibbsEnergyBound(reaction: Reaction, state: ReactionState): number {
  const plan = reactionPlan(reactionPlans(reaction), state.policy);
  const { temperatureK, pressurePa } = state;
  const interval = intervalOf(plan, temperatureK)!;
  const standard = roundingBound(interval, "gibbsEnergy", temperatureK);
  const logarithms = state.terms.reduce(
    (sum, entry) => sum + Math.abs(entry.term.coefficient * lnActivity(entry, temperatureK, pressurePa)),
    0,
  );
  return standard + 4 * Number.EPSILON * gasConstantJPerMolK * temperatureK * logarithms;
}
