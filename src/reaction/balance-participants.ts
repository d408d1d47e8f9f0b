import { describeReceived, type Fault, type FaultPath } from "../errors/fault.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkArray, checkObject, checkText } from "../errors/input.js";
import { formula } from "../formula/formula.js";
import { maximumFormulaLength } from "../formula/limits.js";
import { labelPartsOf } from "../formula/parse-label.js";
import { readFormula } from "../formula/read-formula.js";
import { parseRational, type Rational, rationalOfDecimal } from "../numeric/rational.js";
import { collectSubstance } from "../species/find-substance.js";
import type { CollectionData, Label } from "../species/record.js";
import { chargeNumberOf, formulaOf } from "../species/substance.js";
import { maximumEquationLength, maximumSpecies, parseEquation } from "./equation.js";

/** The species on either side of an equation without coefficients. */
export interface UnbalancedEquation {
  /** At least one label; with a collection, anything that `findSpecies` resolves. */
  readonly reactants: readonly string[];
  /** At least one label; with a collection, anything that `findSpecies` resolves. */
  readonly products: readonly string[];
}

/** A species of an equation that is to be balanced. */
export interface Participant {
  readonly label: Label;
  /** The side where it stands first. */
  readonly isLeft: boolean;
  readonly isOnBothSides: boolean;
  /** Atoms of each element. */
  readonly counts: ReadonlyMap<string, Rational>;
  readonly chargeNumber: number;
}

/** What has been read of an equation that is to be balanced: each species once, in the order of the equation. */
export interface Participants {
  readonly species: readonly Participant[];
  readonly notes: readonly string[];
}

type Parts = Omit<Participant, "isLeft" | "isOnBothSides">;

interface Named {
  readonly name: unknown;
  readonly isLeft: boolean;
  readonly path: FaultPath;
}

/**
 * Reads the species of an equation, or of two lists of names; coefficients that stand in a text are passed over.
 *
 * @throws GibbsLedgerError with every fault
 */
export function readParticipants(
  equation: string | UnbalancedEquation,
  collection: CollectionData | undefined,
): Participants {
  const notes: string[] = [];
  const names = typeof equation === "object" && equation !== null ? ofLists(equation) : ofText(equation, notes);
  const faults: Fault[] = [];
  const found = new Map<Label, Participant>();
  for (const { name, isLeft, path } of names) {
    const parts =
      collection === undefined ? partsOfLabel(name, path, faults) : partsInCollection(collection, name, path, faults);
    if (parts === undefined) continue;
    const before = found.get(parts.label);
    const isOnBothSides = before !== undefined && (before.isOnBothSides || before.isLeft !== isLeft);
    found.set(parts.label, { ...parts, isLeft: before?.isLeft ?? isLeft, isOnBothSides });
    if (before !== undefined) {
      notes.push(`${parts.label} stands ${before.isLeft === isLeft ? "twice" : "on both sides"} and was taken once`);
    }
  }
  failIfAny(faults);
  return { species: [...found.values()], notes };
}

function ofText(equation: unknown, notes: string[]): Named[] {
  const { left, right } = parseEquation(equation);
  const isWritten = [...left, ...right].some(
    ({ coefficient: { numerator, denominator } }) => numerator !== denominator,
  );
  if (isWritten) notes.push("the coefficients as written were passed over");
  return [
    ...left.map(({ name }) => ({ name, isLeft: true, path: ["equation"] })),
    ...right.map(({ name }) => ({ name, isLeft: false, path: ["equation"] })),
  ];
}

function ofLists(equation: UnbalancedEquation): Named[] {
  const faults: Fault[] = [];
  const members = checkObject(equation, ["equation"], faults, { required: ["reactants", "products"], optional: [] });
  const side = (key: "reactants" | "products"): Named[] => {
    const path = ["equation", key];
    if (members?.[key] === undefined) return [];
    const names = checkArray(members[key], path, faults);
    if (names?.length === 0) {
      faults.push({
        code: "reaction/empty",
        path,
        message: `there are no ${key}`,
        received: describeReceived(members[key]),
        expected: "at least one label",
      });
    }
    return (names ?? []).map((name, index) => ({ name, isLeft: key === "reactants", path: [...path, index] }));
  };
  const names = [...side("reactants"), ...side("products")];
  if (names.length > maximumSpecies) {
    faults.push({
      code: "reaction/too-many-species",
      path: ["equation"],
      message: `the equation has ${names.length} species, at most ${maximumSpecies} are read`,
      received: String(names.length),
      expected: `at most ${maximumSpecies} species`,
    });
  } else {
    const texts = names.map(({ name, path }) => checkText(name, path, faults, maximumFormulaLength));
    const length = texts.reduce((sum, text) => sum + (text?.length ?? 0), 0);
    if (length > maximumEquationLength) {
      faults.push({
        code: "reaction/too-long",
        path: ["equation"],
        message: `the names have ${length} characters, at most ${maximumEquationLength} are read`,
        received: String(length),
        expected: `at most ${maximumEquationLength} characters`,
      });
    }
  }
  failIfAny(faults);
  return names;
}

function partsOfLabel(name: unknown, path: FaultPath, faults: Fault[]): Parts | undefined {
  const read = readFormula(name, path, faults);
  if (read === undefined) return undefined;
  const { label, chargeNumber } = labelPartsOf(read);
  return {
    label,
    chargeNumber,
    counts: new Map(read.counts.map(({ symbol, exact }) => [symbol, rationalOfDecimal(exact)])),
  };
}

function partsInCollection(
  collection: CollectionData,
  name: unknown,
  path: FaultPath,
  faults: Fault[],
): Parts | undefined {
  const substance = collectSubstance(collection, name, path, faults);
  if (substance === undefined) return undefined;
  const written = formulaOf(substance);
  const counts = written === undefined ? [] : Object.entries(formula(written).exactCounts);
  return {
    label: substance.label,
    chargeNumber: chargeNumberOf(substance),
    counts: new Map(counts.map(([symbol, text]) => [symbol, parseRational(text) as Rational])),
  };
}
