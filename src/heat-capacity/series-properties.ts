import { cut, type Fault } from "../errors/fault.js";
import { frozenCopy } from "../errors/frozen-copy.js";
import { fail, failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkObject } from "../errors/input.js";
import { temperatureInKelvin } from "../quantity/guards.js";
import type { Quantity, Temperature } from "../quantity/quantity.js";
import { checkSeries, seriesKeys } from "./check-series.js";
import { evaluateAll, intervalOf, roundingBound, type SeriesFunction } from "./evaluate.js";
import { lowerEndK, type PiecewiseSeries, upperEndK } from "./exact-series.js";
import { type PlannedSeries, plannedSeries, planOfSeries } from "./planned-series.js";
import type { PublishedSeries } from "./published-series.js";
import { policyHint, type RangePolicy, rangePolicy } from "./range-policy.js";
import { anchorOfFigures, readSeries } from "./read-series.js";

/** At what temperature a fit is evaluated, and what to do outside its range. */
export interface SeriesConditions {
  /** Above 0 K. */
  readonly temperature: Temperature;
  /** `"refuse"` when absent. */
  readonly outsideRange?: RangePolicy;
}

/** Cp and its integrals, with the largest rounding error of each in the same unit. */
export interface SeriesProperties {
  readonly heatCapacity: Quantity<"molarEntropy", "J/mol/K">;
  readonly enthalpy: Quantity<"molarEnergy", "J/mol">;
  readonly entropy: Quantity<"molarEntropy", "J/mol/K">;
  /** H - T S. */
  readonly gibbsEnergy: Quantity<"molarEnergy", "J/mol">;
  /** 4 eps times the sum of the absolute terms, in the unit of the property. */
  readonly roundingBounds: Readonly<Record<SeriesFunction, number>>;
}

/** From a caller's fit to what was read of it. */
const readOnce = new WeakMap<object, PlannedSeries>();

/**
 * Cp, H, S and G of a published heat-capacity fit by itself, without a species record: the coefficients as printed, in
 * any of the forms of {@link HeatCapacityForm}, with analytic integrals.
 *
 * H and S carry the constants of the form, or those of the fit's `anchor`. A fit is read the first time it is seen;
 * changes made to it later are not seen.
 *
 * @param published - form, gas constant, intervals; an `anchor` where the form has no constants of its own
 * @param conditions - temperature above 0 K, within the fit unless `outsideRange` says otherwise
 * @throws GibbsLedgerError "heat-capacity/outside-range", "heat-capacity/intervals",
 * "heat-capacity/coefficient-count", "heat-capacity/unknown-form", "heat-capacity/no-anchor", all faults at once
 * @remarks Arithmetic: within the bounds that are returned, 4 eps times the sum of the absolute terms.
 * @see `references.mcbride2002` `references.chase1998` `references.dinsdale1991` `references.kelley1960`
 * `references.berman1985` `references.haas1976` `references.robie1978` `references.robie1995`
 * @example
 * const properties = seriesProperties(
 *   {
 *     kind: "series",
 *     form: "seven-coefficient",
 *     gasConstant: 8.31451,
 *     intervals: [{ from: 200, to: 6000, coefficients: [2.5, 0, 0, 0, 0, -745.375, 4.37967491], endsAt: "fit" }],
 *   },
 *   { temperature: quantity(298.15, "K") },
 * );
 * properties.heatCapacity.value; // => 20.786275
 */
export function seriesProperties(published: PublishedSeries, conditions: SeriesConditions): SeriesProperties {
  const read = readOf(published);
  const temperatureK = temperatureInKelvin(conditions?.temperature);
  const plan = planOfSeries(read, rangePolicy(conditions.outsideRange));
  const interval = intervalOf(plan, temperatureK);
  if (interval === undefined) return failOutside(read.series, temperatureK);
  const values = evaluateAll(interval, temperatureK);
  const bound = (name: SeriesFunction): number => roundingBound(interval, name, temperatureK);
  return {
    heatCapacity: { value: values.heatCapacity, unit: "J/mol/K" },
    enthalpy: { value: values.enthalpy, unit: "J/mol" },
    entropy: { value: values.entropy, unit: "J/mol/K" },
    gibbsEnergy: { value: values.gibbsEnergy, unit: "J/mol" },
    roundingBounds: {
      heatCapacity: bound("heatCapacity"),
      enthalpy: bound("enthalpy"),
      entropy: bound("entropy"),
      gibbsEnergy: bound("gibbsEnergy"),
    },
  };
}

function readOf(published: PublishedSeries): PlannedSeries {
  const known = typeof published === "object" && published !== null ? readOnce.get(published) : undefined;
  if (known !== undefined) return known;
  const faults: Fault[] = [];
  const members = checkObject(published, ["series"], faults, seriesKeys);
  if (members !== undefined) checkSeries(members, ["series"], faults);
  failIfAny(faults);
  const copy = frozenCopy(published);
  const { anchor } = copy;
  const series = readSeries(copy, anchor === undefined ? {} : { anchor: anchorOfFigures(anchor) });
  const read = plannedSeries(series);
  readOnce.set(published, read);
  return read;
}

function failOutside(series: PiecewiseSeries, temperatureK: number): never {
  const range = `${lowerEndK(series)} K to ${upperEndK(series)} K`;
  return fail({
    code: "heat-capacity/outside-range",
    path: ["temperature"],
    message: `the fit reaches from ${range}, not to ${cut(String(temperatureK))} K`,
    received: `${temperatureK} K`,
    expected: range,
    hint: policyHint,
  });
}
