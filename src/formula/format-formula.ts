import type { Fault } from "../errors/fault.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkObject, checkOption } from "../errors/input.js";
import type { Formula } from "./formula.js";
import { readGivenFormula } from "./formula-input.js";
import { type FormulaStyle, formulaStyles } from "./spelling.js";
import { writeSpelling } from "./write-spelling.js";

/** How a formula is written. */
export interface FormatFormulaOptions {
  /** Plain digits and a caret, or subscripts and superscripts; plain by default. */
  readonly style?: FormulaStyle;
}

/**
 * Writes a formula with its charge and state, in plain characters or with subscripts and superscripts. Both spellings
 * read back to the same composition.
 *
 * @param formula - a text, or what `formula` returned; of the latter the text is read again
 * @throws GibbsLedgerError "input/unknown-option", "input/unknown-key", and as `formula`
 * @example
 * formatFormula("SO4^2-(aq)", { style: "unicode" }); // => "SO₄²⁻(aq)"
 * formatFormula("Fe₂(SO₄)₃", { style: "ascii" }); // => "Fe2(SO4)3"
 */
export function formatFormula(formula: Formula | string, options: FormatFormulaOptions = {}): string {
  const faults: Fault[] = [];
  const given = checkObject(options, ["options"], faults, { required: [], optional: ["style"] })?.style ?? "ascii";
  const style = checkOption(given, ["options", "style"], faults, formulaStyles);
  failIfAny(faults);
  return writeSpelling(readGivenFormula(formula), style as FormulaStyle);
}
