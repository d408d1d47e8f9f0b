import { fail } from "../errors/gibbs-ledger-error.js";
import { type ExactDecimal, powerOfTen, roundRatio } from "./exact-decimal.js";

/** An exact fraction in lowest terms, its denominator above zero. */
export interface Rational {
  readonly numerator: bigint;
  readonly denominator: bigint;
}

/** What is read as a rational: "2", "-3/2", "0.5". */
const text = /^([+-]?)(?:(\d{1,300})\/(\d{1,300})|(\d{1,300})(?:\.(\d{1,300}))?|\.(\d{1,300}))$/;

/**
 * The fraction numerator / denominator in lowest terms.
 *
 * @throws GibbsLedgerError "numeric/division-by-zero"
 */
export function rational(numerator: bigint, denominator: bigint): Rational {
  if (denominator === 0n) {
    fail({
      code: "numeric/division-by-zero",
      path: [],
      message: "the denominator is zero",
      received: "0",
      expected: "a denominator other than 0",
    });
  }
  if (denominator === 1n) return { numerator, denominator };
  const divisor = greatestCommonDivisor(numerator, denominator);
  const sign = denominator < 0n ? -divisor : divisor;
  return { numerator: numerator / sign, denominator: denominator / sign };
}

/**
 * Reads "2", "-3/2" or "0.5" exactly; undefined for anything else ("1/0" and exponents too).
 * Each run of digits has at most 300.
 */
export function parseRational(input: string): Rational | undefined {
  const parts = text.exec(input);
  if (parts === null) return undefined;
  const [, sign, over, under, whole = "", decimals, bare] = parts;
  const fraction = decimals ?? bare ?? "";
  const magnitude = BigInt(over ?? whole + fraction);
  const denominator = under === undefined ? powerOfTen(fraction.length) : BigInt(under);
  return denominator === 0n ? undefined : rational(sign === "-" ? -magnitude : magnitude, denominator);
}

/** The same number as a fraction in lowest terms. */
export function rationalOfDecimal(value: ExactDecimal): Rational {
  return value.exponent < 0
    ? rational(value.mantissa, powerOfTen(-value.exponent))
    : { numerator: value.mantissa * powerOfTen(value.exponent), denominator: 1n };
}

/** The exact sum. */
export function addRationals(a: Rational, b: Rational): Rational {
  return rational(a.numerator * b.denominator + b.numerator * a.denominator, a.denominator * b.denominator);
}

/** The exact product. */
export function multiplyRationals(a: Rational, b: Rational): Rational {
  return rational(a.numerator * b.numerator, a.denominator * b.denominator);
}

/**
 * The exact quotient a / b.
 *
 * @throws GibbsLedgerError "numeric/division-by-zero"
 */
export function divideRationals(a: Rational, b: Rational): Rational {
  return rational(a.numerator * b.denominator, a.denominator * b.numerator);
}

/** The same fraction with the opposite sign. */
export function negateRational(a: Rational): Rational {
  return { numerator: -a.numerator, denominator: a.denominator };
}

/** Negative where a < b, 0 where they are equal, positive where a > b. */
export function compareRationals(a: Rational, b: Rational): number {
  const left = a.numerator * b.denominator;
  const right = b.numerator * a.denominator;
  return left < right ? -1 : left > right ? 1 : 0;
}

/** Whether a fraction is zero. */
export function isZeroRational(a: Rational): boolean {
  return a.numerator === 0n;
}

/** The nearest double, ties to even; Infinity beyond the range of doubles, never -0. */
export function rationalToNumber(a: Rational): number {
  return roundRatio(a.numerator, a.denominator);
}

/** "3/2", "-1/3"; a whole number without a denominator: "2". */
export function rationalToString(a: Rational): string {
  return a.denominator === 1n ? String(a.numerator) : `${a.numerator}/${a.denominator}`;
}

/** Euclid's algorithm; the result is above zero where b is not zero. */
function greatestCommonDivisor(a: bigint, b: bigint): bigint {
  let left = a < 0n ? -a : a;
  let right = b < 0n ? -b : b;
  while (right !== 0n) [left, right] = [right, left % right];
  return left;
}
