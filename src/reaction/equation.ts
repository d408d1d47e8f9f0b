import { cut, describeReceived, type Fault } from "../errors/fault.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { isZeroRational, parseRational, type Rational } from "../numeric/rational.js";

/** One term of an equation as written: what stands before the label, and the label. */
export interface EquationTerm {
  readonly coefficient: Rational;
  readonly name: string;
  /** Place of the term in the text, counted from 1. */
  readonly position: number;
}

/** Both sides of an equation as written. */
export interface Equation {
  readonly left: readonly EquationTerm[];
  readonly right: readonly EquationTerm[];
}

/** The longest equation that is read, in characters. */
export const maximumEquationLength = 4000;

/** The most terms of an equation. */
export const maximumSpecies = 200;

/** Longer arrows before the shorter ones that they contain. */
const arrows = ["<-->", "<=>", "<->", "-->", "->", "=>", "==", "=", "→", "⟶", "⇌", "⇄", "⇋", "↔", "⟷", "⇒", "⇔", "⟹"];

const vulgarFractions: Readonly<Record<string, string>> = {
  "½": "1/2",
  "⅓": "1/3",
  "⅔": "2/3",
  "¼": "1/4",
  "¾": "3/4",
  "⅕": "1/5",
  "⅖": "2/5",
  "⅗": "3/5",
  "⅘": "4/5",
  "⅙": "1/6",
  "⅚": "5/6",
  "⅛": "1/8",
  "⅜": "3/8",
  "⅝": "5/8",
  "⅞": "7/8",
};

interface Slice {
  readonly text: string;
  readonly start: number;
}

/**
 * Splits a chemical equation into its terms: `=`, `->`, `<=>` or a Unicode arrow between the sides, `+` between the
 * terms, a whole, decimal or fractional coefficient before a label. One pass over the text.
 *
 * @throws GibbsLedgerError "reaction/syntax", "reaction/too-long", "reaction/too-many-species", "reaction/empty"
 */
export function parseEquation(text: unknown): Equation {
  const faults: Fault[] = [];
  if (typeof text !== "string" || text.trim() === "") {
    faults.push({
      code: "reaction/empty",
      path: ["equation"],
      message: `expected a chemical equation, got ${describeReceived(text)}`,
      received: describeReceived(text),
      expected: 'a text such as "N2(g) + 3 H2(g) = 2 NH3(g)"',
    });
  } else if (text.length > maximumEquationLength) {
    faults.push({
      code: "reaction/too-long",
      path: ["equation"],
      message: `the equation has ${text.length} characters, at most ${maximumEquationLength} are read`,
      received: describeReceived(text),
      expected: `at most ${maximumEquationLength} characters`,
    });
  }
  failIfAny(faults);
  const sides = splitSides(text as string, faults);
  const read = sides.map((side) => side.map((slice) => readTerm(slice, faults)));
  const count = sides.reduce((sum, side) => sum + side.length, 0);
  if (count > maximumSpecies) {
    faults.push({
      code: "reaction/too-many-species",
      path: ["equation"],
      message: `the equation has ${count} terms, at most ${maximumSpecies} are read`,
      received: String(count),
      expected: `at most ${maximumSpecies} terms`,
    });
  }
  failIfAny(faults);
  const [left, right] = read as [EquationTerm[], EquationTerm[]];
  return { left, right };
}

/** Walks the text once; a plus or minus that belongs to a charge, as in Fe^3+, separates nothing. */
function splitSides(text: string, faults: Fault[]): Slice[][] {
  const sides: Slice[][] = [[]];
  let start = 0;
  let place = 0;
  const close = (end: number): void => {
    (sides.at(-1) as Slice[]).push({ text: text.slice(start, end), start });
  };
  while (place < text.length) {
    if (text[place] === "^") {
      place = endOfCharge(text, place);
      continue;
    }
    const arrow = arrows.find((candidate) => text.startsWith(candidate, place));
    if (arrow !== undefined) {
      close(place);
      sides.push([]);
      place += arrow.length;
      start = place;
    } else if (text[place] === "+") {
      close(place);
      place += 1;
      start = place;
    } else {
      place += 1;
    }
  }
  close(text.length);
  if (sides.length !== 2) {
    faults.push({
      code: "reaction/syntax",
      path: ["equation"],
      message:
        sides.length === 1
          ? `${describeReceived(text)} has no arrow between its sides`
          : `${describeReceived(text)} has ${sides.length - 1} arrows`,
      received: describeReceived(text),
      expected: "one of = -> <=> or a Unicode arrow, once",
    });
    failIfAny(faults);
  }
  return sides;
}

function endOfCharge(text: string, caret: number): number {
  let place = caret + 1;
  while (text[place] !== undefined && text[place]! >= "0" && text[place]! <= "9") place += 1;
  return text[place] === "+" || text[place] === "-" ? place + 1 : place;
}

function readTerm({ text, start }: Slice, faults: Fault[]): EquationTerm {
  const body = text.trim();
  const position = start + (text.length - text.trimStart().length) + 1;
  const { digits, rest } = splitCoefficient(body);
  const coefficient = digits === "" ? parseRational("1") : parseRational(digits);
  const name = rest.trim();
  if (name === "") {
    faults.push({
      code: "reaction/syntax",
      path: ["equation"],
      message:
        body === "" ? `a term is missing at character ${position}` : `${describeReceived(body)} names no species`,
      received: describeReceived(body),
      expected: "a coefficient and a species, such as 3 H2(g)",
      ...(body === "" ? { hint: "charges are written after a caret, as Fe^3+" } : {}),
    });
  } else if (coefficient === undefined || isZeroRational(coefficient) || coefficient.numerator < 0n) {
    faults.push({
      code: "reaction/syntax",
      path: ["equation"],
      message: `${cut(digits, 30)} before ${cut(name, 40)} is no positive coefficient`,
      received: cut(digits),
      expected: "a whole number, a decimal, or a fraction such as 1/2",
    });
  } else if (name.startsWith("-") || name.startsWith("−")) {
    faults.push({
      code: "reaction/syntax",
      path: ["equation"],
      message: `${describeReceived(body)} at character ${position} begins with a minus sign`,
      received: describeReceived(body),
      expected: "positive coefficients; put the species on the other side",
    });
  }
  return { coefficient: coefficient ?? { numerator: 1n, denominator: 1n }, name, position };
}

function splitCoefficient(body: string): { readonly digits: string; readonly rest: string } {
  const first = body[0] ?? "";
  const vulgar = vulgarFractions[first];
  if (vulgar !== undefined) return { digits: vulgar, rest: withoutTimes(body.slice(1)) };
  let end = 0;
  while (end < body.length && "0123456789./".includes(body[end]!)) end += 1;
  const mixed = vulgarFractions[body[end] ?? ""];
  if (end > 0 && mixed !== undefined && !body.slice(0, end).match(/[./]/)) {
    const [numerator, denominator] = mixed.split("/") as [string, string];
    const total = BigInt(body.slice(0, end)) * BigInt(denominator) + BigInt(numerator);
    return { digits: `${total}/${denominator}`, rest: withoutTimes(body.slice(end + 1)) };
  }
  return { digits: body.slice(0, end), rest: end === 0 ? body : withoutTimes(body.slice(end)) };
}

function withoutTimes(rest: string): string {
  const text = rest.trimStart();
  return text.startsWith("*") || text.startsWith("×") || text.startsWith("·") ? text.slice(1) : text;
}
