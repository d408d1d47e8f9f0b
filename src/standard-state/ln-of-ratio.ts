import { log } from "../numeric/log.js";
import { log1p } from "../numeric/log1p.js";

/**
 * ln(numerator / denominator) of positive doubles. Where they lie within a factor of two their difference is exact, so
 * that the logarithm keeps its relative accuracy as the ratio nears 1.
 */
export function lnOfRatio(numerator: number, denominator: number): number {
  const ratio = numerator / denominator;
  if (ratio >= 0.5 && ratio <= 2) return log1p((numerator - denominator) / denominator);
  // Past these limits the ratio over- or underflows, or loses digits.
  return ratio > 1e-300 && ratio < 1e300 ? log(ratio) : log(numerator) - log(denominator);
}
