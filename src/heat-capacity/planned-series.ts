import type { PiecewiseSeries } from "./exact-series.js";
import { mergeSeries, type SeriesPlan } from "./merge.js";
import { extendSeries, type RangePolicy } from "./range-policy.js";

/** A series with its plans, made by range policy when first asked for. */
export interface PlannedSeries {
  readonly series: PiecewiseSeries;
  readonly byPolicy: { [P in RangePolicy]?: SeriesPlan };
}

/** A series without plans yet. */
export function plannedSeries(series: PiecewiseSeries): PlannedSeries {
  return { series, byPolicy: {} };
}

/** The plan of one series by itself under a policy. */
export function planOfSeries({ series, byPolicy }: PlannedSeries, policy: RangePolicy): SeriesPlan {
  const known = byPolicy[policy];
  if (known !== undefined) return known;
  const plan = mergeSeries([
    { coefficient: { numerator: 1n, denominator: 1n }, series: extendSeries(series, policy) },
  ]) as SeriesPlan;
  byPolicy[policy] = plan;
  return plan;
}
