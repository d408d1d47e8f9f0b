import { fail } from "../errors/gibbs-ledger-error.js";
import { decimalToString, type ExactDecimal, powerOfTen } from "./exact-decimal.js";

/** Bits carried beyond those asked for: room for the rounding of each term of a series. */
const guardBits = 32;

/**
 * The natural logarithm of a decimal, to a number of significant digits.
 *
 * x = 2^k y with y near 1; ln y = 2 artanh((y - 1) / (y + 1)) in fixed point.
 *
 * @param x - above zero
 * @param digits - significant digits of the result, from 1 to 10,000
 * @returns within 0.51 units of its last digit; 0 for x = 1
 * @throws GibbsLedgerError "numeric/outside-domain"
 */
export function lnDecimal(x: ExactDecimal, digits: number): ExactDecimal {
  checkDigits(digits);
  if (x.mantissa <= 0n) refuse("the logarithm of a number that is not above zero", decimalToString(x), "above zero");
  const top = x.exponent > 0 ? x.mantissa * powerOfTen(x.exponent) : x.mantissa;
  const bottom = x.exponent < 0 ? powerOfTen(-x.exponent) : 1n;
  if (top === bottom) return { mantissa: 0n, exponent: 0 };
  // Near x = 1 the result is as small as x - 1: as many bits more are carried.
  const distance = top > bottom ? top - bottom : bottom - top;
  const lost = Math.max(0, bitsOf(bottom) - bitsOf(distance));
  const bits = Math.ceil(digits * 3.3219280948873626) + guardBits + 2 * bitsOf(BigInt(digits)) + lost;
  // 2^k y with y between 2/3 and 4/3 or so: the argument of artanh stays below 1/5.
  let k = bitsOf(top) - bitsOf(bottom);
  if (3n * shifted(bottom, k) > 4n * shifted(top, -k) || (k === 1 && 3n * top < 4n * bottom)) k -= 1;
  const scaledTop = k < 0 ? top << BigInt(-k) : top;
  const scaledBottom = k > 0 ? bottom << BigInt(k) : bottom;
  const one = 1n << BigInt(bits);
  const argument = ((scaledTop - scaledBottom) * one) / (scaledTop + scaledBottom);
  let sum = 2n * artanh(argument, one);
  if (k !== 0) sum += BigInt(k) * ln2(one);
  return roundedBinary(sum, bits, digits);
}

/**
 * The square root of a decimal, to a number of significant digits, correctly rounded (ties do not occur).
 *
 * @param x - not below zero
 * @param digits - significant digits of the result, from 1 to 10,000
 * @throws GibbsLedgerError "numeric/outside-domain"
 */
export function sqrtDecimal(x: ExactDecimal, digits: number): ExactDecimal {
  checkDigits(digits);
  if (x.mantissa < 0n) refuse("the square root of a number below zero", decimalToString(x), "not below zero");
  if (x.mantissa === 0n) return { mantissa: 0n, exponent: 0 };
  let shift = Math.max(0, 2 * (digits + 2) - x.mantissa.toString().length);
  if ((x.exponent - shift) % 2 !== 0) shift += 1;
  const radicand = x.mantissa * powerOfTen(shift);
  const root = integerSquareRoot(radicand);
  // One digit more says whether something is left over.
  const inexact = root * root !== radicand;
  return roundedDecimal(root * 10n + (inexact ? 1n : 0n), (x.exponent - shift) / 2 - 1, digits);
}

/** z + z^3/3 + z^5/5 + ... in fixed point with the given unit. */
function artanh(z: bigint, one: bigint): bigint {
  const bits = BigInt(one.toString(2).length - 1);
  const square = (z * z) >> bits;
  let power = z;
  let sum = z;
  for (let n = 3n; power !== 0n && power !== -1n; n += 2n) {
    power = (power * square) >> bits;
    sum += power / n;
  }
  return sum;
}

/** ln 2 = 18 artanh(1/26) - 2 artanh(1/4801) + 8 artanh(1/8749), a formula of Machin's kind. */
function ln2(one: bigint): bigint {
  return 18n * artanhOfReciprocal(26n, one) - 2n * artanhOfReciprocal(4801n, one) + 8n * artanhOfReciprocal(8749n, one);
}

function artanhOfReciprocal(n: bigint, one: bigint): bigint {
  const square = n * n;
  let power = one / n;
  let sum = power;
  for (let divisor = 3n; power !== 0n; divisor += 2n) {
    power /= square;
    sum += power / divisor;
  }
  return sum;
}

/** floor(sqrt(n)) by Newton's method from above. */
function integerSquareRoot(n: bigint): bigint {
  let root = 1n << BigInt((bitsOf(n) + 1) >> 1);
  for (;;) {
    const next = (root + n / root) >> 1n;
    if (next >= root) return root;
    root = next;
  }
}

/** value / 2^bits to a number of significant digits. */
function roundedBinary(value: bigint, bits: number, digits: number): ExactDecimal {
  const magnitude = value < 0n ? -value : value;
  // Digits before the point, or zeros behind it (negative): one too many does no harm.
  const leading = Math.floor((bitsOf(magnitude) - bits) * 0.3010299956639812);
  const places = Math.max(0, digits + 2 - leading);
  return roundedDecimal((value * powerOfTen(places)) >> BigInt(bits), -places, digits);
}

/** A decimal to a number of significant digits, half away from zero. */
function roundedDecimal(mantissa: bigint, exponent: number, digits: number): ExactDecimal {
  const negative = mantissa < 0n;
  const magnitude = negative ? -mantissa : mantissa;
  const surplus = magnitude.toString().length - digits;
  if (surplus <= 0) return { mantissa, exponent };
  const unit = powerOfTen(surplus);
  const rounded = (magnitude + unit / 2n) / unit;
  if (rounded === powerOfTen(digits)) return { mantissa: negative ? -1n : 1n, exponent: exponent + surplus + digits };
  return { mantissa: negative ? -rounded : rounded, exponent: exponent + surplus };
}

function bitsOf(value: bigint): number {
  const hexadecimal = value.toString(16);
  return hexadecimal.length * 4 - (Math.clz32(Number.parseInt(hexadecimal[0]!, 16)) - 28);
}

/** value * 2^k where k > 0, else value. */
function shifted(value: bigint, k: number): bigint {
  return k > 0 ? value << BigInt(k) : value;
}

function checkDigits(digits: number): void {
  if (Number.isInteger(digits) && digits >= 1 && digits <= 10_000) return;
  refuse("the number of digits", String(digits), "a whole number from 1 to 10000");
}

function refuse(what: string, received: string, expected: string): never {
  const short = received.length > 80 ? `${received.slice(0, 79)}…` : received;
  fail({
    code: "numeric/outside-domain",
    path: [],
    message: `${what}: got ${short}, expected ${expected}`,
    received: short,
    expected,
  });
}
