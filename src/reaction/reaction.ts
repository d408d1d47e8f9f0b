import { cut, describeReceived, type Fault, type FaultPath } from "../errors/fault.js";
import { frozenCopy } from "../errors/frozen-copy.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkArray, checkObject, checkText } from "../errors/input.js";
import type { SeriesPlan } from "../heat-capacity/merge.js";
import type { RangePolicy } from "../heat-capacity/range-policy.js";
import {
  addRationals,
  isZeroRational,
  negateRational,
  parseRational,
  type Rational,
  rationalToNumber,
  rationalToString,
} from "../numeric/rational.js";
import { checkConventions } from "../species/check-conventions.js";
import { collectSubstance } from "../species/find-substance.js";
import { collectHouseSubstance } from "../species/house-substance.js";
import type { CollectionData, Label } from "../species/record.js";
import type { Substance } from "../species/substance.js";
import { checkBalance, type Stoichiometry } from "./balance-check.js";
import { checkCoefficients } from "./check-coefficients.js";
import { type EquationTerm, maximumSpecies, parseEquation } from "./equation.js";
import { type StandardStates, standardStateOf } from "./standard-state.js";
import { writeEquation } from "./write-equation.js";

/** A species of a reaction with its stoichiometric number: negative for reactants, positive for products. */
export interface ReactionTerm {
  readonly label: Label;
  readonly coefficient: number;
  /** The same number exactly, as a whole number or a fraction such as `-3/2`. */
  readonly exactCoefficient: string;
  /** The record; or the stable sequence that the label names, or the electron. */
  readonly species: Substance;
}

/** A balanced reaction: plain data, frozen, with its own copies of its species' records. */
export interface Reaction {
  /** The equation in the library's own spelling. */
  readonly equation: string;
  /** Reactants, then products, in the order of the equation. */
  readonly terms: readonly ReactionTerm[];
  /** What was combined or resolved while reading the equation. */
  readonly notes: readonly string[];
}

/** What the house knows of a reaction: its merged series by range policy, made when first asked for. */
export interface ReactionPlans {
  readonly reaction: Reaction;
  readonly standardStates: StandardStates;
  /** The plan of the usual policy stands by itself: looking it up by name costs as much as evaluating it. */
  refuse: SeriesPlan | undefined;
  readonly others: Map<RangePolicy, SeriesPlan>;
}

/**
 * Where a reaction of the house carries its plans, hidden from JSON, clones and copies. A WeakMap would do, but the
 * bench shows that it costs half as much again as the evaluation itself.
 */
const plansKey: unique symbol = Symbol("plans");

type HouseReaction = Reaction & { readonly [plansKey]: ReactionPlans };

/** From a caller's object, such as a reaction of another copy of the package or from JSON, to the house's own. */
const adopted = new WeakMap<object, HouseReaction>();

/**
 * Reads a chemical equation against a collection and checks that it balances, elements and charge, exactly.
 *
 * Sides are joined by `=`, `->`, `<=>` or a Unicode arrow; coefficients are whole, decimal or fractional. A species may
 * be named by anything that `findSpecies` resolves; `Fe(cr)` names the stable sequence where the collection has one, and
 * `e^-` the electron by the standard-hydrogen convention, 1/2 H2(g) - H^+(aq). A species that stands twice, or on both
 * sides, is combined, and the notes say so. Energies of the reaction are per mole of reaction as written.
 *
 * @param equation - at most 4,000 characters and 200 species
 * @param collection - a collection, or plain `{ species }`
 * @throws GibbsLedgerError "reaction/syntax", "reaction/unbalanced" (one fault an element, what is short on which
 * side), "species/not-found", "species/ambiguous", and the faults of wrong records
 * @example
 * import { referenceData } from "gibbs-ledger/data";
 * const synthesis = reaction("N2 + 3 H2 -> 2 NH3", referenceData);
 * synthesis.equation; // => "N2(g) + 3 H2(g) = 2 NH3(g)"
 * reaction("N2 + H2 -> NH3", referenceData); // throws reaction/unbalanced
 */
export function reaction(equation: string, collection: CollectionData): Reaction {
  const { left, right } = parseEquation(equation);
  const faults: Fault[] = [];
  const notes: string[] = [];
  const sums = new Map<Label, { species: Substance; coefficient: Rational }>();
  const addSide = (terms: readonly EquationTerm[], isLeft: boolean): void => {
    for (const term of terms) {
      const species = collectSubstance(collection, term.name, ["equation"], faults);
      if (species === undefined) continue;
      const signed = isLeft ? negateRational(term.coefficient) : term.coefficient;
      const before = sums.get(species.label);
      if (before !== undefined) {
        const both = before.coefficient.numerator < 0n !== isLeft;
        notes.push(`${species.label} stands ${both ? "on both sides" : "twice on one side"} and was combined`);
      }
      sums.set(species.label, {
        species,
        coefficient: before === undefined ? signed : addRationals(before.coefficient, signed),
      });
    }
  };
  addSide(left, true);
  addSide(right, false);
  failIfAny(faults);
  const terms: Stoichiometry[] = [];
  for (const entry of sums.values()) {
    if (isZeroRational(entry.coefficient)) notes.push(`${entry.species.label} cancels and takes no part`);
    else terms.push(entry);
  }
  if (terms.length === 0) {
    faults.push({
      code: "reaction/trivial",
      path: ["equation"],
      message: `nothing is left of ${describeReceived(equation)} when both sides are combined`,
      received: cut(equation),
      expected: "an equation with a net change",
    });
  } else {
    checkCoefficients(terms, ["equation"], faults);
    checkBalance(terms, faults);
    checkConventions(
      terms.map(({ species }) => species),
      ["equation"],
      faults,
    );
  }
  failIfAny(faults);
  return registerReaction(terms, notes);
}

/**
 * The house's own copy of a reaction: from another copy of the package, from JSON, or a literal. An object that is
 * seen for the first time is checked in full, copied and frozen; changes made to it later are not seen.
 *
 * @throws GibbsLedgerError "reaction/not-a-reaction", "reaction/invalid", "reaction/unbalanced", and the faults of
 * wrong records
 */
export function houseReaction(value: Reaction): Reaction {
  return reactionPlans(value).reaction;
}

/** The plans of a reaction; one that is not of the house is checked, copied and frozen first. */
export function reactionPlans(value: Reaction): ReactionPlans {
  return (value as HouseReaction | null | undefined)?.[plansKey] ?? foreignPlans(value);
}

function foreignPlans(value: unknown): ReactionPlans {
  const known = typeof value === "object" && value !== null ? adopted.get(value) : undefined;
  return (known ?? adoptReaction(value))[plansKey];
}

function adoptReaction(value: unknown): HouseReaction {
  const faults: Fault[] = [];
  if (typeof value !== "object" || value === null || !Array.isArray((value as { terms?: unknown }).terms)) {
    faults.push({
      code: "reaction/not-a-reaction",
      path: ["reaction"],
      message: `expected a reaction, got ${describeReceived(value)}`,
      received: describeReceived(value),
      expected: "what reaction(equation, collection) returns",
      ...(typeof value === "string" ? { hint: "reaction(text, referenceData) reads an equation" } : {}),
    });
    failIfAny(faults);
  }
  const members = checkObject(value, ["reaction"], faults, { required: ["equation", "terms", "notes"], optional: [] });
  // The terms decide, and the equation is written anew from them.
  if (members?.equation !== undefined) checkText(members.equation, ["reaction", "equation"], faults, 1_000_000);
  const notes = checkArray(members?.notes, ["reaction", "notes"], faults) ?? [];
  notes.forEach((note, index) => {
    checkText(note, ["reaction", "notes", index], faults);
  });
  const entries = checkArray(members?.terms, ["reaction", "terms"], faults, maximumSpecies) ?? [];
  const terms = entries.flatMap((entry, index) => checkTerm(entry, ["reaction", "terms", index], faults));
  const labels = new Set(terms.map((term) => term.species.label));
  if (faults.length === 0 && (terms.length === 0 || labels.size !== terms.length)) {
    faults.push({
      code: "reaction/invalid",
      path: ["reaction", "terms"],
      message: terms.length === 0 ? "a reaction has at least one term" : "a species stands twice in the terms",
    });
  }
  if (faults.length === 0) {
    checkCoefficients(terms, ["reaction", "terms"], faults);
    checkBalance(terms, faults);
    checkConventions(
      terms.map(({ species }) => species),
      ["reaction", "terms"],
      faults,
    );
  }
  failIfAny(faults);
  const house = registerReaction(terms, notes as string[]);
  adopted.set(value as object, house);
  return house;
}

function checkTerm(value: unknown, path: FaultPath, faults: Fault[]): Stoichiometry[] {
  const term = checkObject(value, path, faults, {
    required: ["label", "coefficient", "exactCoefficient", "species"],
    optional: [],
  });
  if (term?.species === undefined) return [];
  const species = collectHouseSubstance(term.species, [...path, "species"], faults);
  const exact = typeof term.exactCoefficient === "string" ? parseRational(term.exactCoefficient) : undefined;
  if (exact === undefined || isZeroRational(exact) || rationalToNumber(exact) !== term.coefficient) {
    faults.push({
      code: "reaction/invalid",
      path: [...path, "exactCoefficient"],
      message: `coefficient ${describeReceived(term.coefficient)} and exactCoefficient ${describeReceived(term.exactCoefficient)} do not say the same`,
      received: describeReceived(term.exactCoefficient),
      expected: 'the same number twice, such as -1.5 and "-3/2"',
    });
    return [];
  }
  if (species === undefined) return [];
  if (term.label !== species.label) {
    faults.push({
      code: "reaction/invalid",
      path: [...path, "label"],
      message: `the label ${describeReceived(term.label)} is not that of the record, ${species.label}`,
      received: describeReceived(term.label),
      expected: species.label,
    });
    return [];
  }
  return [{ species, coefficient: exact }];
}

/** The house's reaction of terms that have been checked. */
export function registerReaction(stoichiometry: readonly Stoichiometry[], notes: readonly string[]): HouseReaction {
  const ordered = [
    ...stoichiometry.filter(({ coefficient }) => coefficient.numerator < 0n),
    ...stoichiometry.filter(({ coefficient }) => coefficient.numerator > 0n),
  ];
  const terms = ordered.map(({ species, coefficient }) =>
    Object.freeze({
      label: species.label,
      coefficient: rationalToNumber(coefficient),
      exactCoefficient: rationalToString(coefficient),
      species,
    }),
  );
  const written = ordered.map(({ species: { label }, coefficient }) => ({ label, coefficient }));
  const house = { equation: writeEquation(written), terms: Object.freeze(terms), notes: frozenCopy(notes) };
  const states = terms.map(({ label, species }) => [label, standardStateOf(species)] as const);
  const plans: ReactionPlans = {
    reaction: house,
    standardStates: Object.freeze(Object.fromEntries(states)),
    refuse: undefined,
    others: new Map(),
  };
  return Object.freeze(Object.defineProperty(house, plansKey, { value: plans }) as HouseReaction);
}
