import { describeReceived } from "../errors/fault.js";
import { fail } from "../errors/gibbs-ledger-error.js";
import { bitLength, powerOfTwo } from "./double-bits.js";

/** An exact decimal number: mantissa * 10^exponent. Trailing zeros of the mantissa carry no meaning. */
export interface ExactDecimal {
  readonly mantissa: bigint;
  readonly exponent: number;
}

/** Decimal numerals as in JSON and in tables: sign, digits with or without a point, exponent of at most four digits. */
const numeral = /^([+-]?)(?:(\d+)(?:\.(\d*))?|\.(\d+))(?:[eE]([+-]?\d{1,4}))?$/;

/** The longest numeral that is read, in characters. */
const longestNumeral = 10_000;

/** 2^55: a quotient in units of 2^-1076 below it is a double below 2^-1021. */
const twoTo55 = 36028797018963968n;

/** Powers of ten that a double holds exactly, 10^0 to 10^22. */
const exactPowersOfTen: readonly number[] = [
  1, 1e1, 1e2, 1e3, 1e4, 1e5, 1e6, 1e7, 1e8, 1e9, 1e10, 1e11, 1e12, 1e13, 1e14, 1e15, 1e16, 1e17, 1e18, 1e19, 1e20,
  1e21, 1e22,
];

/** BigInt powers of ten in use so far; grows on demand up to 10^400. */
const powersOfTen: bigint[] = [1n];

/** 10^exponent for a whole exponent that is not negative. */
export function powerOfTen(exponent: number): bigint {
  if (exponent > 400) return 10n ** BigInt(exponent);
  while (powersOfTen.length <= exponent) powersOfTen.push(powersOfTen[powersOfTen.length - 1]! * 10n);
  return powersOfTen[exponent]!;
}

/**
 * The decimal that a number or a numeral stands for. A double is read as the shortest decimal that names it
 * (0.1 is one tenth), which is what a published coefficient means; see {@link exactDecimalOfDouble} for its binary
 * value.
 *
 * @param value - a finite double, or a numeral such as "-1.50e3" of at most 10,000 characters and a four-digit exponent
 * @throws GibbsLedgerError "numeric/not-a-decimal"
 */
export function decimalOf(value: number | string): ExactDecimal {
  if (typeof value === "number" && Number.isSafeInteger(value)) return { mantissa: BigInt(value), exponent: 0 };
  const text = typeof value === "number" ? String(value) : value;
  const parts = typeof text === "string" && text.length <= longestNumeral ? numeral.exec(text) : null;
  if (parts === null) {
    fail({
      code: "numeric/not-a-decimal",
      path: [],
      message: `expected a decimal number, got ${describeReceived(value)}`,
      received: describeReceived(value),
      expected: "a finite number or a numeral such as -1.5e3",
    });
  }
  const fraction = parts[3] ?? parts[4] ?? "";
  const magnitude = BigInt((parts[2] ?? "") + fraction);
  return {
    mantissa: parts[1] === "-" ? -magnitude : magnitude,
    exponent: (parts[5] === undefined ? 0 : Number(parts[5])) - fraction.length,
  };
}

/**
 * The exact value of a double as a decimal (0.1 is 0.1000000000000000055511151231257827...).
 *
 * @param value - finite
 * @throws GibbsLedgerError "numeric/not-a-decimal"
 */
export function exactDecimalOfDouble(value: number): ExactDecimal {
  if (Number.isInteger(value)) return { mantissa: BigInt(value), exponent: 0 };
  if (!Number.isFinite(value)) return decimalOf(value);
  // Doubling is exact, and ends at 2^1074 at the latest; steps of 2^32 make it short.
  let whole = value;
  let doublings = 0;
  while (!Number.isInteger(whole)) {
    const step = Math.abs(whole) < 1 ? 32 : 1;
    whole *= step === 32 ? 4294967296 : 2;
    doublings += step;
  }
  // value = whole / 2^n = whole * 5^n / 10^n
  return { mantissa: BigInt(whole) * 5n ** BigInt(doublings), exponent: -doublings };
}

/** The exact sum. */
export function addDecimals(a: ExactDecimal, b: ExactDecimal): ExactDecimal {
  const difference = a.exponent - b.exponent;
  if (difference === 0) return { mantissa: a.mantissa + b.mantissa, exponent: a.exponent };
  if (difference > 0) return { mantissa: a.mantissa * powerOfTen(difference) + b.mantissa, exponent: b.exponent };
  return { mantissa: a.mantissa + b.mantissa * powerOfTen(-difference), exponent: a.exponent };
}

/** The exact difference a - b. */
export function subtractDecimals(a: ExactDecimal, b: ExactDecimal): ExactDecimal {
  return addDecimals(a, negateDecimal(b));
}

/** The exact product. */
export function multiplyDecimals(a: ExactDecimal, b: ExactDecimal): ExactDecimal {
  return { mantissa: a.mantissa * b.mantissa, exponent: a.exponent + b.exponent };
}

/** The same decimal with the opposite sign. */
export function negateDecimal(a: ExactDecimal): ExactDecimal {
  return { mantissa: -a.mantissa, exponent: a.exponent };
}

/** The exact product with a whole number. */
export function scaleDecimal(a: ExactDecimal, factor: bigint): ExactDecimal {
  return { mantissa: a.mantissa * factor, exponent: a.exponent };
}

/** Negative where a < b, 0 where they are equal in value, positive where a > b. */
export function compareDecimals(a: ExactDecimal, b: ExactDecimal): number {
  const { mantissa } = subtractDecimals(a, b);
  return mantissa < 0n ? -1 : mantissa > 0n ? 1 : 0;
}

/**
 * The double nearest to a decimal, ties to even. Beyond the range of doubles it is Infinity with the decimal's sign;
 * 0 is never negative.
 */
export function decimalToNumber(a: ExactDecimal): number {
  const { mantissa, exponent } = a;
  if (mantissa === 0n) return 0;
  // Both factors exact in doubles: one rounding only (W. D. Clinger 1990).
  const approximate = Number(mantissa);
  if (exponent >= -22 && exponent <= 22 && Number.isSafeInteger(approximate)) {
    return exponent < 0 ? approximate / exactPowersOfTen[-exponent]! : approximate * exactPowersOfTen[exponent]!;
  }
  return exponent < 0 ? roundRatio(mantissa, powerOfTen(-exponent)) : roundRatio(mantissa * powerOfTen(exponent), 1n);
}

/** The double nearest to a / divisor, ties to even; the divisor is not zero. */
export function decimalRatioToNumber(a: ExactDecimal, divisor: ExactDecimal): number {
  const difference = a.exponent - divisor.exponent;
  return difference < 0
    ? roundRatio(a.mantissa, divisor.mantissa * powerOfTen(-difference))
    : roundRatio(a.mantissa * powerOfTen(difference), divisor.mantissa);
}

/**
 * The double nearest to numerator / denominator, ties to even, subnormal results included. Beyond the range of doubles
 * it is Infinity with the ratio's sign; a result that rounds to zero is 0, never -0.
 *
 * @throws GibbsLedgerError "numeric/division-by-zero"
 */
export function roundRatio(numerator: bigint, denominator: bigint): number {
  if (denominator === 0n) {
    fail({
      code: "numeric/division-by-zero",
      path: [],
      message: "the denominator is zero",
      received: "0",
      expected: "a denominator other than 0",
    });
  }
  if (numerator === 0n) return 0;
  const n = Number(numerator);
  const d = Number(denominator);
  if (Number.isSafeInteger(n) && Number.isSafeInteger(d)) return n / d;
  const negative = n < 0 !== d < 0;
  const top = n < 0 ? -numerator : numerator;
  const bottom = d < 0 ? -denominator : denominator;
  // The quotient of top * 2^shift has at least 60 bits, unless the unit 2^-1076 cuts it short.
  const wanted = 65 - (bitLength(top, Math.abs(n)) - bitLength(bottom, Math.abs(d)));
  if (wanted < -970) return negative ? Number.NEGATIVE_INFINITY : Number.POSITIVE_INFINITY;
  if (wanted > 1200) return 0;
  const shift = Math.min(wanted, 1076);
  const dividend = shift > 0 ? top << BigInt(shift) : top;
  const divisor = shift < 0 ? bottom << BigInt(-shift) : bottom;
  const quotient = dividend / divisor;
  // The last bit says "inexact": what looks like a tie and is none is rounded the right way.
  const sticky = quotient * divisor === dividend ? quotient : quotient | 1n;
  let magnitude: number;
  if (shift === 1076 && sticky < twoTo55) {
    // The unit in the last place is 2^-1074, two bits up: round by hand, the product is then exact.
    const rest = sticky & 3n;
    let units = sticky >> 2n;
    if (rest === 3n || (rest === 2n && (units & 1n) === 1n)) units += 1n;
    magnitude = Number(units) * Number.MIN_VALUE;
  } else {
    // Number() of a BigInt rounds to nearest, ties to even; the products with powers of two are exact.
    const half = Math.trunc(-shift / 2);
    magnitude = Number(sticky) * powerOfTwo(half) * powerOfTwo(-shift - half);
  }
  return negative && magnitude !== 0 ? -magnitude : magnitude;
}

/**
 * The decimal as a numeral, without trailing zeros: plain where short ("-0.0015"), else with an exponent
 * ("1.5e-30").
 */
export function decimalToString(a: ExactDecimal): string {
  if (a.mantissa === 0n) return "0";
  const negative = a.mantissa < 0n;
  const all = (negative ? -a.mantissa : a.mantissa).toString();
  let length = all.length;
  while (all.charCodeAt(length - 1) === 48) length -= 1;
  const digits = all.slice(0, length);
  // value = 0.digits * 10^point
  const point = all.length + a.exponent;
  let text: string;
  if (point > 21 || point < -5) {
    const fraction = digits.length > 1 ? `.${digits.slice(1)}` : "";
    text = `${digits[0]}${fraction}e${point - 1 < 0 ? "-" : "+"}${Math.abs(point - 1)}`;
  } else if (point <= 0) {
    text = `0.${"0".repeat(-point)}${digits}`;
  } else if (point >= digits.length) {
    text = digits + "0".repeat(point - digits.length);
  } else {
    text = `${digits.slice(0, point)}.${digits.slice(point)}`;
  }
  return negative ? `-${text}` : text;
}
