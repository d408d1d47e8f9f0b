import { expectTypeOf } from "vitest";
import type { HeatCapacityForm, PublishedSeries, RangePolicy, SeriesFunction } from "../../src/heat-capacity/index.js";
import { heatCapacityForms, rangePolicies, seriesProperties } from "../../src/heat-capacity/index.js";
import type { Quantity } from "../../src/quantity/quantity.js";
import { quantity } from "../../src/quantity/quantity.js";

declare const series: PublishedSeries;

const properties = seriesProperties(series, { temperature: quantity(300, "K") });
expectTypeOf(properties.heatCapacity).toEqualTypeOf<Quantity<"molarEntropy", "J/mol/K">>();
expectTypeOf(properties.enthalpy).toEqualTypeOf<Quantity<"molarEnergy", "J/mol">>();
expectTypeOf(properties.roundingBounds).toEqualTypeOf<Readonly<Record<SeriesFunction, number>>>();
expectTypeOf<SeriesFunction>().toEqualTypeOf<"heatCapacity" | "enthalpy" | "entropy" | "gibbsEnergy">();
expectTypeOf(heatCapacityForms).toEqualTypeOf<readonly HeatCapacityForm[]>();
expectTypeOf(rangePolicies).toEqualTypeOf<readonly RangePolicy[]>();
expectTypeOf<RangePolicy>().toEqualTypeOf<"refuse" | "constant-heat-capacity" | "continue-fit">();
expectTypeOf<HeatCapacityForm>().toEqualTypeOf<
  | "shomate"
  | "seven-coefficient"
  | "nine-coefficient"
  | "gibbs-energy"
  | "maier-kelley"
  | "berman-brown"
  | "five-term"
  | "haas-fisher"
  | "polynomial"
>();
expectTypeOf({
  kind: "series",
  form: "gibbs-energy",
  powers: [2, 3, -1],
  intervals: [{ from: 298.15, to: 700, coefficients: [0, 0, -24, 0, 0, 0], endsAt: "first-order" }],
} as const).toExtend<PublishedSeries>();

// @ts-expect-error a pressure is no temperature
seriesProperties(series, { temperature: quantity(1, "bar") });
// @ts-expect-error the forms are a closed set
seriesProperties({ ...series, form: "seven" }, { temperature: quantity(300, "K") });
// @ts-expect-error forms are spelled in full words
seriesProperties({ ...series, form: "gibbs" }, { temperature: quantity(300, "K") });
// @ts-expect-error powers are numbers
seriesProperties({ ...series, form: "gibbs-energy", powers: ["2"] }, { temperature: quantity(300, "K") });
// @ts-expect-error an interval says what its upper end is
seriesProperties({ ...series, intervals: [{ from: 1, to: 2, coefficients: [] }] }, { temperature: quantity(300, "K") });
// @ts-expect-error fits are readonly
series.intervals.push();
