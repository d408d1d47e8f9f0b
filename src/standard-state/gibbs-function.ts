import { gasConstantJPerMolK } from "../constants/constants.js";
import type { Fault } from "../errors/fault.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkObject } from "../errors/input.js";
import { checkQuantity } from "../quantity/guards.js";
import type { MolarEnergy, MolarEntropy, Quantity, Temperature } from "../quantity/quantity.js";
import { directionOf, type EnthalpyReference } from "./enthalpy-reference.js";
import { finite } from "./finite.js";
import { checkPresent } from "./pressure-change.js";
import { shiftedQuantity } from "./shifted-quantity.js";

/** A change of the enthalpy that a Gibbs function is counted from. */
export interface GibbsFunctionChange {
  /** Above 0 K. */
  readonly temperature: Temperature;
  /** H(298.15 K) - H(0 K) of the species, or its sum over a reaction. */
  readonly enthalpyAbove0K: MolarEnergy;
  readonly from: EnthalpyReference;
  readonly to: EnthalpyReference;
}

/** What the third-law expression for ln K is made of; enthalpy and Gibbs function have the same reference. */
export interface GibbsFunctionConditions {
  /** Above 0 K. */
  readonly temperature: Temperature;
  /** Enthalpy of the reaction at the reference temperature. */
  readonly reactionEnthalpy: MolarEnergy;
  /** Sum of nu times -[G - H(reference)]/T over the reaction. */
  readonly reactionGibbsFunction: MolarEntropy;
}

/**
 * The tabulated function -[G - H(0 K)]/T from -[G - H(298.15 K)]/T, and back:
 * -[G - H(0 K)]/T = -[G - H(298.15 K)]/T - (H(298.15 K) - H(0 K))/T.
 *
 * @param gibbsFunction - of a species, or its sum over a reaction, in any unit of molar entropy; its uncertainty is
 * kept
 * @param change - temperature above 0 K, the increment of enthalpy, and both references
 * @returns J/mol/K
 * @throws GibbsLedgerError with every fault at once: "input/missing", "input/unknown-option", those of quantities;
 * "quantity/overflow"
 * @remarks Arithmetic: within 2 eps of the sum of the absolute terms. The uncertainty of the increment is not added.
 * @see `references.chase1998`
 * @example
 * const fromZero = gibbsFunctionAtReference(quantity(228.608, "J/mol/K"), {
 *   temperature: quantity(298.15, "K"),
 *   enthalpyAbove0K: quantity(9.904, "kJ/mol"),
 *   from: "298.15 K",
 *   to: "0 K",
 * });
 * fromZero.value; // => 195.389...
 */
export function gibbsFunctionAtReference(
  gibbsFunction: MolarEntropy,
  change: GibbsFunctionChange,
): Quantity<"molarEntropy", "J/mol/K"> {
  const faults: Fault[] = [];
  const value = checkQuantity(gibbsFunction, "molarEntropy", ["gibbsFunction"], faults);
  const members = checkObject(change, [], faults, {
    required: ["temperature", "enthalpyAbove0K", "from", "to"],
    optional: [],
  });
  const temperatureK = checkPresent(members?.temperature, "temperature", ["temperature"], faults);
  const increment =
    members?.enthalpyAbove0K === undefined
      ? undefined
      : checkQuantity(members.enthalpyAbove0K, "molarEnergy", ["enthalpyAbove0K"], faults);
  const direction = members === undefined ? 0 : directionOf(members, faults);
  failIfAny(faults);
  const shift = direction === 0 ? 0 : -direction * ((increment as number) / (temperatureK as number));
  return shiftedQuantity(gibbsFunction, value as number, "J/mol/K", shift, ["gibbsFunction"]);
}

/**
 * ln K of a reaction from its enthalpy at a reference temperature and tabulated functions:
 * ln K = (sum of nu (-[G - H(ref)]/T) - H(ref)/T) / R. Both referred to 0 K or both to 298.15 K give the same.
 *
 * @param conditions - temperature above 0 K, enthalpy and Gibbs function of the reaction
 * @throws GibbsLedgerError with every fault at once: "input/missing", those of quantities; "quantity/overflow"
 * @remarks Arithmetic: within 4 eps of the sum of the absolute terms.
 * @see `references.chase1998`
 * @example
 * const lnK = lnKFromGibbsFunction({
 *   temperature: quantity(298.15, "K"),
 *   reactionEnthalpy: quantity(-241.826, "kJ/mol"),
 *   reactionGibbsFunction: quantity(-44.42, "J/mol/K"),
 * });
 * lnK / Math.LN10; // => 40.04...
 */
export function lnKFromGibbsFunction(conditions: GibbsFunctionConditions): number {
  const faults: Fault[] = [];
  const members = checkObject(conditions, [], faults, {
    required: ["temperature", "reactionEnthalpy", "reactionGibbsFunction"],
    optional: [],
  });
  const temperatureK = checkPresent(members?.temperature, "temperature", ["temperature"], faults);
  const [enthalpy, gibbsFunction] = (
    [
      ["reactionEnthalpy", "molarEnergy"],
      ["reactionGibbsFunction", "molarEntropy"],
    ] as const
  ).map(([key, dimension]) =>
    members?.[key] === undefined ? undefined : checkQuantity(members[key], dimension, [key], faults),
  );
  failIfAny(faults);
  const ofEnthalpy = (enthalpy as number) / (temperatureK as number);
  return finite(((gibbsFunction as number) - ofEnthalpy) / gasConstantJPerMolK, ["reactionEnthalpy"]);
}
