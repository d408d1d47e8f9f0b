import { log } from "../numeric/log.js";
import { absoluteTerms, evaluateColumns } from "./columns.js";
import type { IntervalColumns, SeriesPlan } from "./merge.js";

/** The functions of temperature that a series gives. */
export type SeriesFunction = keyof IntervalColumns;

/** The four functions at one temperature: J/mol for H and G, J/mol/K for Cp and S. */
export interface SeriesValues {
  readonly heatCapacity: number;
  readonly enthalpy: number;
  readonly entropy: number;
  readonly gibbsEnergy: number;
}

/** Index of the interval that a temperature belongs to; -1 outside the range. */
export function intervalIndex(plan: SeriesPlan, temperatureK: number): number {
  if (!(temperatureK >= plan.fromK && temperatureK <= plan.toK)) return -1;
  let index = 0;
  while (temperatureK > plan.endsK[index]!) index += 1;
  return index;
}

/**
 * One function of a merged series at a temperature within its range.
 *
 * @remarks Arithmetic: within 4 eps of the sum of the absolute terms; {@link roundingBound} gives that sum.
 */
export function evaluateAt(
  plan: SeriesPlan,
  name: SeriesFunction,
  index: number,
  temperatureK: number,
  lnTemperature: number,
): number {
  return evaluateColumns(plan.intervals[index]![name], temperatureK, lnTemperature);
}

/** All four functions at a temperature within the range. */
export function evaluateAll(plan: SeriesPlan, index: number, temperatureK: number): SeriesValues {
  const interval = plan.intervals[index]!;
  const lnTemperature = log(temperatureK);
  return {
    heatCapacity: evaluateColumns(interval.heatCapacity, temperatureK, lnTemperature),
    enthalpy: evaluateColumns(interval.enthalpy, temperatureK, lnTemperature),
    entropy: evaluateColumns(interval.entropy, temperatureK, lnTemperature),
    gibbsEnergy: evaluateColumns(interval.gibbsEnergy, temperatureK, lnTemperature),
  };
}

/**
 * Largest rounding error of an evaluation: 4 eps times the sum of the absolute terms, in the unit of the function.
 */
export function roundingBound(plan: SeriesPlan, name: SeriesFunction, index: number, temperatureK: number): number {
  return 4 * Number.EPSILON * absoluteTerms(plan.intervals[index]![name], temperatureK, log(temperatureK));
}
