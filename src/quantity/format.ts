import { describeReceived, type Fault } from "../errors/fault.js";
import { fail, failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkObject } from "../errors/input.js";
import { checkParts } from "./check-parts.js";
import type { QuantityIn } from "./convert.js";
import { notAQuantity } from "./guards.js";
import type { UnitCode } from "./units.js";

/** How many digits a formatted quantity shows; at most one of the two. */
export interface FormatOptions {
  /** Digits after the decimal point, 0 to 100; of value and standard uncertainty. */
  readonly digits?: number;
  /** Significant digits of the value, 1 to 100. */
  readonly significantDigits?: number;
}

/**
 * A quantity as text, the same in every locale and runtime. Without options the value has its shortest digits that
 * read back, or follows the standard uncertainty, which is rounded to at most two significant digits.
 *
 * @param quantity - any quantity
 * @param options - `digits` after the point or `significantDigits`; exact halves of the double go away from zero
 * @returns ASCII text that `parseQuantity` reads; never a negative zero
 * @throws GibbsLedgerError "input/unknown-option" for digits out of range or both given, and what `quantity` throws
 * @example
 * formatQuantity(quantity(298.15, "K")); // => "298.15 K"
 * formatQuantity(quantity(-32.9, "kJ/mol"), { digits: 2 }); // => "-32.90 kJ/mol"
 * formatQuantity(quantity(-285.83, "kJ/mol", { standardUncertainty: 0.04 })); // => "-285.83 +- 0.04 kJ/mol"
 */
export function formatQuantity(quantity: QuantityIn<UnitCode>, options: FormatOptions = {}): string {
  if (typeof quantity !== "object" || quantity === null) return fail(notAQuantity(quantity, undefined, []));
  const { value, unit, standardUncertainty } = quantity;
  const faults: Fault[] = [];
  checkParts(value, unit, standardUncertainty, undefined, [], faults);
  const { digits, significantDigits } = checkedOptions(options, faults);
  failIfAny(faults);
  if (standardUncertainty === undefined) return `${numeral(value, digits, significantDigits)} ${unit}`;
  const rounded = Number(standardUncertainty.toPrecision(2));
  if (digits !== undefined) return `${numeral(value, digits)} +- ${numeral(standardUncertainty, digits)} ${unit}`;
  if (significantDigits !== undefined) return `${numeral(value, undefined, significantDigits)} +- ${rounded} ${unit}`;
  const shown = decimalsOf(rounded);
  return `${numeral(value, shown)} +- ${numeral(rounded, shown)} ${unit}`;
}

function numeral(value: number, digits?: number, significantDigits?: number): string {
  const text =
    digits !== undefined
      ? value.toFixed(digits)
      : significantDigits !== undefined
        ? value.toPrecision(significantDigits)
        : String(value + 0);
  return /^-0(?:\.0*)?$/.test(text) ? text.slice(1) : text;
}

/** Digits after the point that the shortest form of a number needs; undefined for 0 and where there are too many. */
function decimalsOf(value: number): number | undefined {
  if (value === 0) return undefined;
  const [mantissa, exponent] = value.toExponential().split("e") as [string, string];
  const needed = Math.max(0, mantissa.length - 2) - Number(exponent);
  return needed > 100 ? undefined : Math.max(0, needed);
}

function checkedOptions(options: unknown, faults: Fault[]): FormatOptions {
  const members = checkObject(options, ["options"], faults, {
    required: [],
    optional: ["digits", "significantDigits"],
  });
  if (members === undefined) return {};
  const { digits, significantDigits } = members;
  checkDigits(digits, 0, "digits", faults);
  checkDigits(significantDigits, 1, "significantDigits", faults);
  if (digits !== undefined && significantDigits !== undefined) {
    faults.push({
      code: "input/unknown-option",
      path: ["options", "significantDigits"],
      message: "digits and significantDigits exclude each other",
      expected: "one of digits and significantDigits",
    });
  }
  return members as FormatOptions;
}

function checkDigits(value: unknown, least: number, name: string, faults: Fault[]): void {
  if (value === undefined || (Number.isInteger(value) && (value as number) >= least && (value as number) <= 100))
    return;
  faults.push({
    code: "input/unknown-option",
    path: ["options", name],
    message: `${name} is ${describeReceived(value)}, expected a whole number from ${least} to 100`,
    received: describeReceived(value),
    expected: `a whole number from ${least} to 100`,
  });
}
