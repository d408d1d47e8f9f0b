import type { Fault } from "../errors/fault.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { rationalOfDecimal, rationalToString } from "../numeric/rational.js";
import { type FormulaRead, readFormula } from "./read-formula.js";

/** A chemical formula that has been read, as plain data. */
export interface Formula {
  /** The text that was read. */
  readonly text: string;
  /** Atoms of each element, D and T by their own symbols, in Hill order. */
  readonly composition: Readonly<Record<string, number>>;
  /** The same as exact fractions, such as `"947/1000"`. */
  readonly exactCounts: Readonly<Record<string, string>>;
  /** Charge in units of the elementary charge. */
  readonly chargeNumber: number;
  /** Symbol of the state of aggregation, where the text has one. */
  readonly state?: string;
  /** Polymorph or structure in words, where the text has one. */
  readonly polymorph?: string;
}

/**
 * Reads a chemical formula: composition, charge, state.
 *
 * Groups in ( ), [ ] or { } up to 20 deep; decimal counts; parts separated by `·` (also • and ⋅), each with a number
 * before it; charge after a caret (`^2-`) or in superscripts; subscript digits; the electron `e^-`; a state of the
 * Green Book and a polymorph at the end (`C(cr,graphite)`). An ASCII dot separates where an optional integer and H2O
 * end the formula and no other dot comes before it (`CuSO4.5H2O`); where the dot could also be a decimal point
 * (`CaSO4.0.5H2O`, `Na0.5H2O`) it is refused.
 *
 * D and T count as symbols of their own, not as hydrogen. The electron has an empty composition. Counts are exact; the
 * numbers of the composition are the doubles nearest to them. The time grows in proportion to the length.
 *
 * @param text - at most 500 characters, without spaces
 * @returns plain data
 * @throws GibbsLedgerError "formula/syntax", "formula/unknown-element", "formula/unknown-state",
 * "formula/charge-order", "formula/ambiguous-dot", "formula/zero-count", "formula/count-out-of-range" (1e-6 to 1e12 atoms
 * of an element, 24 digits), "formula/empty", "formula/too-long", "formula/too-deep", "input/not-a-string"; the
 * message names the column, counted from 1
 * @see `references.cohen2007`
 * @example
 * formula("CuSO4·5H2O").composition; // => { Cu: 1, H: 10, O: 9, S: 1 }
 * formula("SO₄²⁻").chargeNumber; // => -2
 * formula("Fe0.947O").exactCounts; // => { Fe: "947/1000", O: "1" }
 * formula("C(cr,graphite)").polymorph; // => "graphite"
 */
export function formula(text: string): Formula {
  const faults: Fault[] = [];
  const read = readFormula(text, [], faults);
  failIfAny(faults);
  return formulaOf(read as FormulaRead);
}

/** The plain data of a formula that has been read. */
export function formulaOf(read: FormulaRead): Formula {
  const { text, counts, chargeNumber, state, polymorph } = read;
  return {
    text,
    composition: Object.fromEntries(counts.map(({ symbol, count }) => [symbol, count])),
    exactCounts: Object.fromEntries(
      counts.map(({ symbol, exact }) => [symbol, rationalToString(rationalOfDecimal(exact))]),
    ),
    chargeNumber,
    ...(state === undefined ? {} : { state }),
    ...(polymorph === undefined ? {} : { polymorph }),
  };
}
