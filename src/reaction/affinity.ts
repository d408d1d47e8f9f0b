import type { Quantity } from "../quantity/quantity.js";
import type { ReactionConditions } from "./conditions.js";
import type { Reaction } from "./reaction.js";
import { reactionGibbsEnergy } from "./reaction-gibbs-energy.js";

/**
 * Affinity of a reaction at its real temperature, pressure and composition, as De Donder defined it by the extent xi:
 * A = -(dG/d xi) at constant T and p = -sum of nu mu, the negative of the Gibbs energy of reaction, per mole of
 * reaction as written. It is positive where the reaction runs forward, zero at equilibrium, and A times the rate of
 * reaction is never negative for a reaction that proceeds alone.
 *
 * @param reaction - what `reaction` returned
 * @param conditions - as of {@link reactionGibbsEnergy}
 * @returns a quantity in J/mol, RT (ln K - ln Q)
 * @throws GibbsLedgerError as {@link reactionGibbsEnergy}
 * @remarks Arithmetic: that of {@link reactionGibbsEnergy}; the sign is exact.
 * @see `references.dedonder1936` `references.cohen2007`
 * @example
 * import { referenceData } from "gibbs-ledger/data";
 * const shift = reaction("CO(g) + H2O(g) = CO2(g) + H2(g)", referenceData);
 * const driving = affinity(shift, {
 *   temperature: quantity(600, "K"),
 *   pressure: quantity(1, "bar"),
 *   gas: { moleFractions: { "CO(g)": 0.25, "H2O(g)": 0.25, "CO2(g)": 0.25, "H2(g)": 0.25 } },
 * });
 * driving.unit; // => "J/mol"
 * driving.value > 0; // => true
 */
export function affinity(reaction: Reaction, conditions: ReactionConditions): Quantity<"molarEnergy", "J/mol"> {
  return { value: 0 - reactionGibbsEnergy(reaction, conditions).value, unit: "J/mol" };
}
