import * as z from "zod";
import { withRule } from "../errors/schema.js";
import { maximumFormulaLength } from "./limits.js";
import { labelPartsOf } from "./parse-label.js";
import { readFormula } from "./read-formula.js";

const text = z.string().min(1).max(maximumFormulaLength);

/**
 * Schema of the text of a chemical formula, with or without charge and state: what `formula` reads.
 *
 * @example
 * formulaTextSchema.safeParse("CuSO4·5H2O").success; // => true
 * formulaTextSchema.safeParse("Qq2").success; // => false
 */
export const formulaTextSchema: z.ZodType<string> = withRule(
  text,
  (given) => readFormula(given, [], []) !== undefined,
  "no chemical formula",
);

/**
 * Schema of the label of a species in its one spelling: what `parseLabel` reads and would write the same way.
 *
 * @example
 * labelTextSchema.safeParse("SO4^2-(aq)").success; // => true
 * labelTextSchema.safeParse("SO₄²⁻(aq)").success; // => false
 */
export const labelTextSchema: z.ZodType<string> = withRule(
  text,
  isInItsOneSpelling,
  "no label of a species in its one spelling",
);

function isInItsOneSpelling(given: string): boolean {
  const read = readFormula(given, [], []);
  return read !== undefined && labelPartsOf(read).label === given;
}
