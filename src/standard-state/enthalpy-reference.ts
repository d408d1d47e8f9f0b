import type { Fault } from "../errors/fault.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkArray, checkNumber, checkObject, checkOption, type Members } from "../errors/input.js";
import { exactDot } from "../numeric/compensated.js";
import { convertDifference } from "../quantity/convert-value.js";
import { checkQuantity } from "../quantity/guards.js";
import type { MolarEnergy, Quantity } from "../quantity/quantity.js";
import { finite } from "./finite.js";

/** The temperature at which enthalpies are counted from the elements. */
export type EnthalpyReference = "0 K" | "298.15 K";

/** The references, for checks. */
export const enthalpyReferences: readonly EnthalpyReference[] = ["0 K", "298.15 K"];

/** Enthalpy increments H(298.15 K) - H(0 K) of a species and of the elements that it forms from. */
export interface FormationIncrements {
  /** H(298.15 K) - H(0 K) of the species. */
  readonly enthalpyAbove0K: MolarEnergy;
  readonly elements: readonly ElementIncrement[];
}

/** One element in its reference state. */
export interface ElementIncrement {
  /** Moles of the reference state taken up by one mole of the species: 0.5 of O2(g) for H2O(g). */
  readonly amount: number;
  /** H(298.15 K) - H(0 K) of the reference state, per mole of `amount`. */
  readonly enthalpyAbove0K: MolarEnergy;
}

/** A change of the temperature that an enthalpy of formation is for. */
export interface FormationEnthalpyChange extends FormationIncrements {
  readonly from: EnthalpyReference;
  readonly to: EnthalpyReference;
}

/**
 * Enthalpy of formation at 0 K from that at 298.15 K, and back:
 *
 *     H(0 K) = H(298.15 K) - h(species) + sum of n h(element),  h = H(298.15 K) - H(0 K)
 *
 * @param formationEnthalpy - in any unit of molar energy
 * @param change - the increments, see {@link formationIncrements}, and both references
 * @returns J/mol; with a standard uncertainty where every quantity has one, added in quadrature as independent
 * @throws GibbsLedgerError with every fault at once: "input/missing", "input/unknown-option", "input/not-finite", those
 * of quantities; "quantity/overflow"
 * @remarks Arithmetic: the exact sum of products of doubles, rounded once (products above 1e-290 J/mol).
 * @see `references.chase1998`
 * @example
 * const atZero = formationEnthalpyAtReference(quantity(-241.826, "kJ/mol"), {
 *   enthalpyAbove0K: quantity(9.904, "kJ/mol"),
 *   elements: [
 *     { amount: 1, enthalpyAbove0K: quantity(8.467, "kJ/mol") },
 *     { amount: 0.5, enthalpyAbove0K: quantity(8.683, "kJ/mol") },
 *   ],
 *   from: "298.15 K",
 *   to: "0 K",
 * });
 * atZero.value; // => -238921.5
 */
export function formationEnthalpyAtReference(
  formationEnthalpy: MolarEnergy,
  change: FormationEnthalpyChange,
): Quantity<"molarEnergy", "J/mol"> {
  const faults: Fault[] = [];
  const value = checkQuantity(formationEnthalpy, "molarEnergy", ["formationEnthalpy"], faults);
  const members = checkObject(change, [], faults, {
    required: ["enthalpyAbove0K", "elements", "from", "to"],
    optional: [],
  });
  const direction = members === undefined ? 0 : directionOf(members, faults);
  const terms = members === undefined ? [] : termsOf(members, faults);
  failIfAny(faults);
  const all = [{ amount: 1, value: value as number, given: formationEnthalpy }].concat(
    terms.map((term) => ({ ...term, amount: direction * term.amount })),
  );
  const sum = exactDot(
    all.map(({ amount }) => amount),
    all.map((term) => term.value),
  );
  const uncertainty = direction === 0 ? uncertaintyOf(all.slice(0, 1)) : uncertaintyOf(all);
  return {
    value: finite(sum, ["formationEnthalpy"]),
    unit: "J/mol",
    ...(uncertainty === undefined ? {} : { standardUncertainty: finite(uncertainty, ["formationEnthalpy"]) }),
  };
}

/** 1 from 298.15 K to 0 K, -1 back, 0 where nothing changes. */
export function directionOf(members: Members<"from" | "to">, faults: Fault[]): number {
  const [from, to] = (["from", "to"] as const).map((key) =>
    members[key] === undefined ? undefined : checkOption(members[key], [key], faults, enthalpyReferences),
  );
  return from === to ? 0 : to === "0 K" ? 1 : -1;
}

interface Term {
  readonly amount: number;
  readonly value: number;
  readonly given: MolarEnergy;
}

/** What an enthalpy of formation at 298.15 K gains: the increments of the elements, less that of the species. */
function termsOf(members: Members<"enthalpyAbove0K" | "elements">, faults: Fault[]): Term[] {
  const terms: Term[] = [];
  const add = (amount: number | undefined, given: unknown, path: readonly (string | number)[]): void => {
    const value = given === undefined ? undefined : checkQuantity(given, "molarEnergy", path, faults);
    if (amount !== undefined && value !== undefined) terms.push({ amount, value, given: given as MolarEnergy });
  };
  add(-1, members.enthalpyAbove0K, ["enthalpyAbove0K"]);
  const elements = members.elements === undefined ? undefined : checkArray(members.elements, ["elements"], faults, 200);
  elements?.forEach((entry, index) => {
    const path = ["elements", index];
    // Labels may stand beside, as formationIncrements gives them.
    const element = checkObject(entry, path, faults, { required: ["amount", "enthalpyAbove0K"], optional: ["label"] });
    const amount = element?.amount === undefined ? undefined : checkNumber(element.amount, [...path, "amount"], faults);
    add(amount, element?.enthalpyAbove0K, [...path, "enthalpyAbove0K"]);
  });
  return terms;
}

/** In J/mol; undefined where one of the quantities has none. */
function uncertaintyOf(terms: readonly Term[]): number | undefined {
  const parts: number[] = [];
  for (const { amount, given } of terms) {
    if (given.standardUncertainty === undefined) return undefined;
    parts.push(amount * convertDifference(given.standardUncertainty, given.unit, "J/mol"));
  }
  return Math.sqrt(exactDot(parts, parts));
}
