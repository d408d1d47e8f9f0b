import type { Fault } from "../errors/fault.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkOption } from "../errors/input.js";
import { lnDecimal } from "../numeric/decimal-functions.js";
import { decimalOf, type ExactDecimal, multiplyDecimals, subtractDecimals } from "../numeric/exact-decimal.js";
import { type ExactSeries, intervalAt, lowerEndK, type PiecewiseSeries, upperEndK } from "./exact-series.js";
import { defaultDigits, exactPropertiesAt } from "./read-series.js";

/**
 * What to do at a temperature outside the range of a fit: refuse (the default everywhere), go on with the heat
 * capacity at the end of the range, or go on with the fit itself.
 */
export type RangePolicy = "refuse" | "constant-heat-capacity" | "continue-fit";

/** The policies by name. */
export const rangePolicies: readonly RangePolicy[] = ["refuse", "constant-heat-capacity", "continue-fit"];

/**
 * Checks the name of a range policy; absent: refuse.
 *
 * @throws GibbsLedgerError "input/unknown-option"
 */
export function rangePolicy(policy: RangePolicy | undefined): RangePolicy {
  if (policy === undefined || rangePolicies.includes(policy)) return policy ?? "refuse";
  const faults: Fault[] = [];
  checkOption(policy, ["outsideRange"], faults, rangePolicies);
  failIfAny(faults);
  return policy;
}

/** Where any continuation ends: beyond lies no chemistry, and powers of the temperature would overflow a double. */
const lowestContinuedK = 1;
const highestContinuedK = 100_000;

/** The hint of a fault outside a range. */
export const policyHint: string =
  'outsideRange: "constant-heat-capacity" or "continue-fit" goes on beyond, from 1 K to 100,000 K';

/** A series made to reach from 1 K to 100,000 K, as the policy says; a reference point stays a point. */
export function extendSeries(series: PiecewiseSeries, policy: RangePolicy): PiecewiseSeries {
  if (policy === "refuse" || !series.heatCapacityKnown) return series;
  const [startK, endK] = [lowerEndK(series), upperEndK(series)];
  const below = policy === "continue-fit" ? series.intervals[0]! : constantFrom(series, startK);
  const above = policy === "continue-fit" ? series.intervals.at(-1)! : constantFrom(series, endK);
  return {
    ...series,
    intervals: [
      ...(startK > lowestContinuedK ? [{ ...below, fromK: lowestContinuedK, toK: startK }] : []),
      ...series.intervals,
      ...(endK < highestContinuedK ? [{ ...above, fromK: endK, toK: highestContinuedK }] : []),
    ],
  };
}

/** H and S of a constant heat capacity: H0 = H - Cp T and S0 = S - Cp ln T at the end of the fit. */
function constantFrom(series: PiecewiseSeries, endK: number): ExactSeries {
  const interval = intervalAt(series, endK);
  const { heatCapacity, enthalpy, entropy } = exactPropertiesAt(series, endK);
  const end: ExactDecimal = decimalOf(endK);
  return {
    fromK: interval.fromK,
    toK: interval.toK,
    terms: [{ exponent: 0, coefficient: heatCapacity }],
    enthalpyConstant: subtractDecimals(enthalpy, multiplyDecimals(heatCapacity, end)),
    entropyConstant: subtractDecimals(entropy, multiplyDecimals(heatCapacity, lnDecimal(end, defaultDigits))),
  };
}
