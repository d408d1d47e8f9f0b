export type { SeriesFunction } from "./evaluate.js";
export { heatCapacityForms } from "./forms.js";
export type { HeatCapacityForm, PublishedInterval, PublishedSeries } from "./published-series.js";
export { type RangePolicy, rangePolicies } from "./range-policy.js";
export { type SeriesConditions, type SeriesProperties, seriesProperties } from "./series-properties.js";
