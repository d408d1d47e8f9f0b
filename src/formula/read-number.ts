import { decimalOf, type ExactDecimal } from "../numeric/exact-decimal.js";
import { endOfRun, isDigit, isOneOf, isSubscriptDigit, subscriptDigits } from "./characters.js";
import { one } from "./draft.js";
import { type HydrateTail, hydrateTail, spliced, stopAtAmbiguousDot } from "./hydrate-dot.js";
import { maximumCountDigits } from "./limits.js";
import { type Reader, report, stop } from "./reader.js";

/** A number of a formula. */
export interface NumberRead {
  readonly value: ExactDecimal;
  /** Plain digits without closing zeros of a fraction; empty for one. */
  readonly spelling: string;
  readonly hasPoint: boolean;
}

/**
 * Reads the number of a part, as in `·0.5H2O`: a dot in it is a decimal point.
 *
 * @returns undefined where the reading has stopped
 */
export function readMultiplier(reader: Reader): NumberRead | undefined {
  const { text, position } = reader;
  let end = endOfRun(text, position, isDigit);
  if (text.charAt(end) === "." && isDigit(text.charAt(end + 1))) end = endOfRun(text, end + 1, isDigit);
  return takeNumber(reader, end);
}

/**
 * Reads the count after a symbol or a bracket, in digits of the line or in subscripts. An ASCII dot in it is a decimal
 * point unless it separates the water that ends the formula.
 *
 * @param hasDot - whether the formula has a dot before this number
 * @returns undefined where the reading has stopped
 */
export function readCount(reader: Reader, hasDot: boolean): NumberRead | undefined {
  const { text, position } = reader;
  const belongs = isDigit(text.charAt(position)) ? isDigit : isSubscriptDigit;
  const dot = endOfRun(text, position, belongs);
  if (text.charAt(dot) !== "." || !belongs(text.charAt(dot + 1))) return takeNumber(reader, dot);
  if (belongs === isDigit) {
    const tail = hydrateTail(text, dot + 1);
    if (tail !== undefined) {
      if (!hasDot && !isZero(text.slice(position, dot)) && !isZero(tail.digits)) return takeNumber(reader, dot);
      stopAtAmbiguousDot(reader, dot, readingsOfOneDot(text, position, dot, tail, hasDot));
      return undefined;
    }
    const second = endOfRun(text, dot + 1, isDigit);
    if (text.charAt(second) === "." && (hydrateTail(text, second + 1)?.digits ?? "") !== "") {
      stopAtAmbiguousDot(reader, dot, [spliced(text, dot, 1, "·"), spliced(text, second, 1, "·")]);
      return undefined;
    }
  }
  return takeNumber(reader, endOfRun(text, dot + 1, belongs));
}

function readingsOfOneDot(text: string, count: number, dot: number, tail: HydrateTail, hasDot: boolean): string[] {
  const decimal = spliced(text, tail.water, 0, "·");
  if (isZero(text.slice(count, dot))) return [spliced(text, count, 0, "·"), decimal];
  return hasDot && !isZero(tail.digits) ? [spliced(text, dot, 1, "·"), decimal] : [decimal];
}

function isZero(digits: string): boolean {
  return digits !== "" && endOfRun(digits, 0, (digit) => digit === "0") === digits.length;
}

/** Takes the number that ends at an index and checks it. */
function takeNumber(reader: Reader, end: number): NumberRead | undefined {
  const { position } = reader;
  const digits = plainDigits(reader.text.slice(position, end));
  const hasPoint = digits.includes(".");
  reader.position = end;
  if (digits.length > 1 && digits.startsWith("0") && digits.charAt(1) !== ".") {
    stop(reader, {
      code: "formula/syntax",
      position,
      message: `the number ${shortened(digits)} begins with 0`,
      expected: "a number such as 2, 12 or 0.5",
      hint: "0 is the digit zero, O is oxygen",
    });
    return undefined;
  }
  if (digits.length - (hasPoint ? 1 : 0) > maximumCountDigits) {
    stop(reader, {
      code: "formula/count-out-of-range",
      position,
      message: `the number ${shortened(digits)} is longer than ${maximumCountDigits} digits`,
      expected: `at most ${maximumCountDigits} digits`,
    });
    return undefined;
  }
  const value = decimalOf(digits);
  if (value.mantissa === 0n) {
    report(reader, {
      code: "formula/zero-count",
      position,
      message: `the count is ${digits}`,
      expected: "a count above 0",
      hint: "leave out what is not there; 0 is the digit zero, O is oxygen",
    });
    return { value: one, spelling: "", hasPoint };
  }
  return { value, spelling: spellingOf(digits, hasPoint), hasPoint };
}

function spellingOf(digits: string, hasPoint: boolean): string {
  let end = digits.length;
  if (hasPoint) {
    while (digits.charAt(end - 1) === "0") end -= 1;
    if (digits.charAt(end - 1) === ".") end -= 1;
  }
  const spelling = digits.slice(0, end);
  return spelling === "1" ? "" : spelling;
}

function plainDigits(text: string): string {
  let digits = "";
  for (const character of text) {
    digits += isOneOf(character, subscriptDigits) ? String(subscriptDigits.indexOf(character)) : character;
  }
  return digits;
}

function shortened(digits: string): string {
  return digits.length <= 24 ? digits : `${digits.slice(0, 23)}…`;
}
