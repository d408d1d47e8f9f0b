import { log } from "../numeric/log.js";
import { absoluteTerms, evaluateColumns } from "./columns.js";
import type { IntervalColumns, PlanInterval, SeriesPlan } from "./merge.js";

/** The functions of temperature that a series gives. */
export type SeriesFunction = keyof IntervalColumns;

/** The four functions at one temperature: J/mol for H and G, J/mol/K for Cp and S. */
export interface SeriesValues {
  readonly heatCapacity: number;
  readonly enthalpy: number;
  readonly entropy: number;
  readonly gibbsEnergy: number;
}

/** The interval that a temperature belongs to; undefined outside the range, and for what is no temperature. */
export function intervalOf(plan: SeriesPlan, temperatureK: number): PlanInterval | undefined {
  let interval: PlanInterval | undefined = plan.lowest;
  while (interval !== undefined && temperatureK > interval.toK) interval = interval.above;
  return temperatureK >= plan.fromK ? interval : undefined;
}

/** All four functions at a temperature of an interval. */
export function evaluateAll(interval: IntervalColumns, temperatureK: number): SeriesValues {
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
export function roundingBound(interval: IntervalColumns, name: SeriesFunction, temperatureK: number): number {
  return 4 * Number.EPSILON * absoluteTerms(interval[name], temperatureK, log(temperatureK));
}
