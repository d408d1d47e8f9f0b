import type { ExactDecimal } from "./exact-decimal.js";

/**
 * The quotient of two decimals to a number of significant digits, truncated.
 *
 * @param divisor - not zero
 * @param digits - at least 1; one more or less digit may be returned
 */
export function divideDecimals(dividend: ExactDecimal, divisor: ExactDecimal, digits: number): ExactDecimal {
  if (dividend.mantissa === 0n) return { mantissa: 0n, exponent: 0 };
  const have = lengthOf(dividend.mantissa) - lengthOf(divisor.mantissa);
  const shift = Math.max(0, digits + 1 - have);
  return {
    mantissa: (dividend.mantissa * 10n ** BigInt(shift)) / divisor.mantissa,
    exponent: dividend.exponent - divisor.exponent - shift,
  };
}

function lengthOf(mantissa: bigint): number {
  return (mantissa < 0n ? -mantissa : mantissa).toString().length;
}
