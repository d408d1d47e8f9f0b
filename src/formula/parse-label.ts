import type { Fault } from "../errors/fault.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { type FormulaRead, readFormula } from "./read-formula.js";
import { writeComposition, writeSpelling } from "./write-spelling.js";

/** The parts of a species label in their one spelling. */
export interface LabelParts {
  /** Formula without charge and state: plain digits, `·` between parts, counts without closing zeros. */
  readonly formula: string;
  /** Charge in units of the elementary charge. */
  readonly chargeNumber: number;
  /** Symbol of the state of aggregation, where the label has one. */
  readonly state?: string;
  /** Polymorph or structure in words, where the label has one. */
  readonly polymorph?: string;
  /** The label in its one spelling. */
  readonly label: string;
}

/**
 * Reads the label of a species and gives its one spelling: plain digits, the charge after a caret with the number
 * before the sign, the state at the end. Groups stay as they are written. The `·` between parts is the only character
 * outside ASCII.
 *
 * @param text - a formula as `formula` reads it, with or without a state
 * @throws GibbsLedgerError as `formula`
 * @example
 * parseLabel("SO₄²⁻(aq)").label; // => "SO4^2-(aq)"
 * parseLabel("CuSO4.5H2O(cr)").label; // => "CuSO4·5H2O(cr)"
 * parseLabel("C(cr,graphite)").formula; // => "C"
 */
export function parseLabel(text: string): LabelParts {
  const faults: Fault[] = [];
  const read = readFormula(text, [], faults);
  failIfAny(faults);
  return labelPartsOf(read as FormulaRead);
}

/** The parts of a label that has been read. */
export function labelPartsOf(read: FormulaRead): LabelParts {
  const { tokens, chargeNumber, state, polymorph } = read;
  return {
    formula: writeComposition(tokens, "ascii"),
    chargeNumber,
    ...(state === undefined ? {} : { state }),
    ...(polymorph === undefined ? {} : { polymorph }),
    label: writeSpelling(read, "ascii"),
  };
}
