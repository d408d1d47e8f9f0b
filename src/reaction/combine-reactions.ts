import { cut, describeReceived, type Fault, type FaultPath } from "../errors/fault.js";
import { failIfAny, isGibbsLedgerError } from "../errors/gibbs-ledger-error.js";
import { checkArray, checkNumber, checkObject } from "../errors/input.js";
import { decimalOf } from "../numeric/exact-decimal.js";
import {
  addRationals,
  isZeroRational,
  multiplyRationals,
  parseRational,
  type Rational,
  rationalOfDecimal,
} from "../numeric/rational.js";
import { checkConventions } from "../species/check-conventions.js";
import type { Label } from "../species/record.js";
import { isElectron, isRecord, type Substance } from "../species/substance.js";
import type { Stoichiometry } from "./balance-check.js";
import { checkCoefficients } from "./check-coefficients.js";
import { maximumSpecies } from "./equation.js";
import { houseReaction, type Reaction, registerReaction } from "./reaction.js";
import { firstDifference, isSameData } from "./same-data.js";

/** A reaction and how often it is taken. */
export interface ReactionPart {
  readonly reaction: Reaction;
  /**
   * How often the reaction runs, backwards where negative: a number, which stands for the shortest decimal that names
   * it, or exactly as a text such as `"-1/2"`.
   */
  readonly coefficient: number | string;
}

/**
 * Adds multiples of reactions (Hess's law). The stoichiometric numbers are added exactly, species that cancel are left
 * out, and the notes say so; notes of the parts are kept. The energies of the result are the same sum of the energies
 * of the parts, computed from series that are merged anew.
 *
 * @param parts - 1 to 200; the reactions have to agree in the record of each label that they share
 * @returns a reaction like any other, per mole as its own equation is written
 * @throws GibbsLedgerError "reaction/different-records" where a label stands for two records, "reaction/trivial" where
 * everything cancels, "reaction/empty", "reaction/syntax" for a text that is no fraction,
 * "reaction/coefficient-out-of-range", "reaction/too-many-species", "species/mixed-conventions", and the faults of
 * wrong reactions, all at once
 * @example
 * import { referenceData } from "gibbs-ledger/data";
 * const shift = combineReactions([
 *   { reaction: reaction("2 CO + O2 = 2 CO2", referenceData), coefficient: "1/2" },
 *   { reaction: reaction("H2 + 1/2 O2 = H2O(g)", referenceData), coefficient: -1 },
 * ]);
 * shift.equation; // => "CO(g) + H2O(g) = CO2(g) + H2(g)"
 * shift.notes; // => ["O2(g) cancels and takes no part"]
 */
export function combineReactions(parts: readonly ReactionPart[]): Reaction {
  const faults: Fault[] = [];
  const read = readParts(parts, faults);
  failIfAny(faults);
  const sums = addParts(read, faults);
  failIfAny(faults);
  const notes = new Set(read.flatMap(({ reaction }) => reaction.notes));
  const terms: Stoichiometry[] = [];
  for (const { species, coefficient } of sums) {
    if (isZeroRational(coefficient)) notes.add(`${species.label} cancels and takes no part`);
    else terms.push({ species, coefficient });
  }
  checkTerms(terms, faults);
  failIfAny(faults);
  // A sum of balanced reactions balances: there is nothing to check.
  return registerReaction(terms, [...notes]);
}

/** As many as an equation has species at most: more would be no account that anyone reads. */
const mostParts = maximumSpecies;

interface PartRead {
  readonly reaction: Reaction;
  readonly coefficient: Rational;
}

/** What a label stands for, and where it was met first. */
interface Met {
  readonly substance: Substance;
  readonly path: FaultPath;
}

function readParts(parts: unknown, faults: Fault[]): PartRead[] {
  const entries = checkArray(parts, ["parts"], faults, mostParts);
  if (entries?.length === 0) {
    faults.push({
      code: "reaction/empty",
      path: ["parts"],
      message: "there are no reactions to combine",
      expected: "at least one reaction with its coefficient",
    });
  }
  return (entries ?? []).flatMap((entry, index): PartRead[] => {
    const path = ["parts", index];
    const members = checkObject(entry, path, faults, { required: ["reaction", "coefficient"], optional: [] });
    if (members === undefined) return [];
    const coefficient =
      members.coefficient === undefined ? undefined : readCoefficient(members.coefficient, path, faults);
    const reaction = members.reaction === undefined ? undefined : readReaction(members.reaction, path, faults);
    return coefficient === undefined || reaction === undefined ? [] : [{ reaction, coefficient }];
  });
}

function readCoefficient(value: unknown, path: FaultPath, faults: Fault[]): Rational | undefined {
  const here = [...path, "coefficient"];
  if (typeof value !== "string") {
    const number = checkNumber(value, here, faults);
    return number === undefined ? undefined : rationalOfDecimal(decimalOf(number));
  }
  const fraction = parseRational(value);
  if (fraction === undefined) {
    faults.push({
      code: "reaction/syntax",
      path: here,
      message: `${describeReceived(value)} is no coefficient`,
      received: describeReceived(value),
      expected: 'a whole number, a decimal, or a fraction such as "-1/2"',
    });
  }
  return fraction;
}

/** The house's own reaction; its faults are told with the place of the part. */
function readReaction(value: unknown, path: FaultPath, faults: Fault[]): Reaction | undefined {
  try {
    return houseReaction(value as Reaction);
  } catch (error) {
    if (!isGibbsLedgerError(error)) throw error;
    faults.push(...error.faults.map((fault) => ({ ...fault, path: [...path, ...fault.path] })));
    return undefined;
  }
}

function addParts(parts: readonly PartRead[], faults: Fault[]): Stoichiometry[] {
  const known = new Map<Label, Met>();
  const sums = new Map<Label, Stoichiometry>();
  for (const [index, { reaction, coefficient }] of parts.entries()) {
    for (const [place, { label, exactCoefficient, species }] of reaction.terms.entries()) {
      const path = ["parts", index, "reaction", "terms", place, "species"];
      for (const substance of [species, ...recordsWithin(species)]) checkSame(known, { substance, path }, faults);
      const share = multiplyRationals(coefficient, parseRational(exactCoefficient) as Rational);
      const before = sums.get(label);
      sums.set(
        label,
        before === undefined
          ? { species, coefficient: share }
          : { ...before, coefficient: addRationals(before.coefficient, share) },
      );
    }
  }
  return [...sums.values()];
}

/** The records that a sequence or the electron is made of. */
function recordsWithin(substance: Substance): readonly Substance[] {
  if (isRecord(substance)) return [];
  return isElectron(substance) ? [substance.hydrogen] : substance.phases;
}

/** Collects a fault where a label was met before with other data. */
function checkSame(known: Map<Label, Met>, { substance, path }: Met, faults: Fault[]): void {
  const { label } = substance;
  const before = known.get(label);
  if (before === undefined) known.set(label, { substance, path });
  if (before === undefined || isSameData(before.substance, substance)) return;
  const place = before.path.join(".");
  const member = firstDifference(before.substance, substance);
  faults.push({
    code: "reaction/different-records",
    path,
    message: `${cut(label, 60)} stands for another record here than at ${place}: ${member} differs`,
    received: cut(label),
    expected: "one record for each label",
    hint: "read all reactions against one collection",
  });
}

function checkTerms(terms: readonly Stoichiometry[], faults: Fault[]): void {
  if (terms.length === 0) {
    faults.push({
      code: "reaction/trivial",
      path: ["parts"],
      message: "nothing is left when the reactions are combined",
      expected: "a sum with a net change",
    });
  }
  if (terms.length > maximumSpecies) {
    faults.push({
      code: "reaction/too-many-species",
      path: ["parts"],
      message: `the sum has ${terms.length} species, at most ${maximumSpecies} are combined`,
      received: String(terms.length),
      expected: `at most ${maximumSpecies} species`,
    });
  }
  checkCoefficients(terms, ["parts"], faults);
  checkConventions(
    terms.map(({ species }) => species),
    ["parts"],
    faults,
  );
}
