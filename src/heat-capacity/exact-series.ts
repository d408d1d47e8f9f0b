import type { ExactDecimal } from "../numeric/exact-decimal.js";

/** A term c T^n of a heat capacity, with the coefficient as published. */
export interface HeatCapacityTerm {
  readonly exponent: number;
  readonly coefficient: ExactDecimal;
}

/**
 * The series of one temperature interval in exact decimals, J/mol/K and J/mol: Cp is the sum of the terms, and the two
 * constants fix H and S.
 */
export interface ExactSeries {
  readonly fromK: number;
  /** Upper end; it belongs to this interval. */
  readonly toK: number;
  readonly terms: readonly HeatCapacityTerm[];
  readonly enthalpyConstant: ExactDecimal;
  readonly entropyConstant: ExactDecimal;
}

/** The series of a phase over its whole range: intervals in rising order, each beginning where the one before ends. */
export interface PiecewiseSeries {
  readonly intervals: readonly ExactSeries[];
  /** False where only H and S at one temperature are published. */
  readonly heatCapacityKnown: boolean;
}

/** Lower end of the range in kelvin. */
export function lowerEndK(series: PiecewiseSeries): number {
  return (series.intervals[0] as ExactSeries).fromK;
}

/** Upper end of the range in kelvin. */
export function upperEndK(series: PiecewiseSeries): number {
  return (series.intervals.at(-1) as ExactSeries).toK;
}

/** The interval that a temperature within the range belongs to; a break belongs to the interval below it. */
export function intervalAt(series: PiecewiseSeries, temperatureK: number): ExactSeries {
  return series.intervals.find((interval) => temperatureK <= interval.toK) ?? (series.intervals.at(-1) as ExactSeries);
}
