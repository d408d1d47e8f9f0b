import type { PublishedSeries } from "../../src/heat-capacity/published-series.js";
import { seriesProperties } from "../../src/heat-capacity/series-properties.js";
import { binary, Decimal, functionNames, valuesOf } from "./oracle.js";

/** The worst error over the returned bound, which is 4 eps times the sum of the absolute terms. */
export function worstShare(series: PublishedSeries, temperatureK: number): number {
  const properties = seriesProperties(series, { temperature: { value: temperatureK, unit: "K" } });
  const exact = valuesOf(series, series.intervals[0]!, binary(temperatureK));
  const shares = functionNames.map((name) => {
    const error = binary(properties[name].value).minus(exact[name]).abs();
    return error.isZero() ? 0 : error.div(properties.roundingBounds[name]).toNumber();
  });
  return Math.max(...shares);
}

/** The same fit with H shifted so that G is zero to the digits of a double. */
export function cancelled(series: PublishedSeries, temperatureK: number): PublishedSeries {
  const [interval] = series.intervals;
  const { gibbsEnergy } = valuesOf(series, interval!, new Decimal(temperatureK));
  if (series.anchor !== undefined) {
    const { enthalpy } = series.anchor;
    const value = new Decimal(enthalpy.value).minus(gibbsEnergy).toNumber();
    return { ...series, anchor: { ...series.anchor, enthalpy: { ...enthalpy, value } } };
  }
  const place = series.form === "gibbs-energy" ? 0 : interval!.coefficients.length - 2;
  const unit = series.form === "shomate" ? 1000 : (series.gasConstant ?? 1);
  const constant = new Decimal(interval!.coefficients[place]!).minus(gibbsEnergy.div(unit)).toNumber();
  const coefficients = interval!.coefficients.map((value, index) => (index === place ? constant : value));
  return { ...series, intervals: [{ ...interval!, coefficients }] };
}
