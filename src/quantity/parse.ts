import { describeReceived, type Fault } from "../errors/fault.js";
import { fail, failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkParts } from "./check-parts.js";
import type { Quantity } from "./quantity.js";
import { unitHint } from "./unit-hints.js";
import type { Dimension } from "./units.js";

/** The longest text that is read, in characters. */
const longestText = 100;

const number = String.raw`[+-]?(?:\d+(?:\.\d*)?|\.\d+)(?:[eE][+-]?\d{1,4})?`;
const layout = new RegExp(`^(${number})(?: +\\+- +(${number}))? +(\\S+)$`);
const numberAndRest = new RegExp(`^(${number})(.*)$`, "s");

/**
 * Reads a quantity from a text: a decimal number with an optional exponent, spaces, a unit code; between number and
 * unit, `+-` and a standard uncertainty may stand. Nothing else is read: no digit grouping, no decimal comma.
 *
 * @param text - at most 100 characters, the exponent at most four digits
 * @param dimension - the dimension that the unit must have; absent: any
 * @returns the quantity, checked as `quantity` checks it
 * @throws GibbsLedgerError "quantity/syntax", "input/not-a-string", "input/too-large", "quantity/not-finite",
 * "quantity/unknown-unit", "quantity/wrong-dimension", "quantity/below-absolute-zero", "quantity/negative-uncertainty"
 * @example
 * const temperature = parseQuantity("25 Cel", "temperature");
 * temperature.value; // => 25
 * parseQuantity("-285.83 +- 0.04 kJ/mol").standardUncertainty; // => 0.04
 */
export function parseQuantity<D extends Dimension = Dimension>(text: string, dimension?: D): Quantity<D> {
  const [, value, uncertainty, unit] = layout.exec(checkedText(text)) ?? failSyntax(text);
  const parsed = Number(value) + 0;
  const standardUncertainty = uncertainty === undefined ? undefined : Number(uncertainty) + 0;
  const faults: Fault[] = [];
  checkParts(parsed, unit, standardUncertainty, dimension, [], faults);
  failIfAny(faults);
  const result = { value: parsed, unit } as Quantity<D>;
  return standardUncertainty === undefined ? result : { ...result, standardUncertainty };
}

function checkedText(text: unknown): string {
  const received = describeReceived(text);
  if (typeof text !== "string") {
    const expected = 'a text such as "25 Cel"';
    return fail({
      code: "input/not-a-string",
      path: [],
      message: `expected ${expected}, received ${received}`,
      received,
      expected,
    });
  }
  if (text.length <= longestText) return text.trim();
  return fail({
    code: "input/too-large",
    path: [],
    message: `the text has ${text.length} characters, at most ${longestText} are read`,
    received,
    expected: `at most ${longestText} characters`,
  });
}

function failSyntax(text: string): never {
  const hint = syntaxHint(text.trim());
  return fail({
    code: "quantity/syntax",
    path: [],
    message: `${describeReceived(text)} is no number with a unit`,
    received: describeReceived(text),
    expected: 'a decimal number, a space and a unit code, such as "25 Cel"',
    ...(hint !== undefined && { hint }),
  });
}

function syntaxHint(text: string): string | undefined {
  if (/^[+-]?\d+,\d/.test(text)) return "the decimal sign is a point, and digits are not grouped";
  if (/^[\u2212\u2013]/.test(text)) return "the minus sign is the ASCII hyphen";
  const [, value, rest] = numberAndRest.exec(text) ?? [];
  if (value === undefined || rest === undefined) return undefined;
  if (rest === "") return "a unit is missing; a pure number has the unit 1";
  return unitHint(rest.trim()) ?? `a space between number and unit: "${value} ${rest.trim()}"`;
}
