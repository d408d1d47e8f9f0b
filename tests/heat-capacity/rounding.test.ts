import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { heatCapacityForms } from "../../src/heat-capacity/forms.js";
import type { PublishedSeries } from "../../src/heat-capacity/published-series.js";
import { seriesProperties } from "../../src/heat-capacity/series-properties.js";
import { randomSeries, temperaturesK } from "./random-series.js";
import { cancelled, worstShare } from "./worst-share.js";

describe("Cp, H, S and G are within 4 eps of the sum of their absolute terms", () => {
  for (const form of heatCapacityForms) {
    test(`random fits of the form ${form}`, () => {
      fc.assert(
        fc.property(randomSeries[form], temperaturesK, (series, temperatureK) => {
          expect(worstShare(series, temperatureK)).toBeLessThanOrEqual(1);
        }),
        { seed: 20261201, numRuns: 400 },
      );
    });

    test(`fits of the form ${form} whose G all but cancels`, () => {
      fc.assert(
        fc.property(randomSeries[form], temperaturesK, (series, temperatureK) => {
          expect(worstShare(cancelled(series, temperatureK), temperatureK)).toBeLessThanOrEqual(1);
        }),
        { seed: 20261202, numRuns: 200 },
      );
    });
  }
});

test("the returned bound is 4 eps times the sum of the absolute terms", () => {
  const series: PublishedSeries = {
    kind: "series",
    form: "nine-coefficient",
    gasConstant: 8.3125,
    intervals: [{ from: 200, to: 1000, coefficients: [4e4, -200, 3, -0.001, 0, 0, 0, -1000, 5], endsAt: "fit" }],
  };
  const { roundingBounds } = seriesProperties(series, { temperature: { value: 200, unit: "K" } });
  // Cp/R: 4e4/200^2 = 1, -200/200 = -1, 3, -0.2; H/R: -200, -200 ln 200, 600, -20, -1000; S/R: -0.5, 1, 3 ln 200, -0.2, 5
  const unit = 4 * 8.3125 * Number.EPSILON;
  const logarithm = 5.298317366548036;
  expect(roundingBounds.heatCapacity / unit).toBeCloseTo(5.2, 12);
  expect(roundingBounds.enthalpy / unit).toBeCloseTo(1820 + 200 * logarithm, 9);
  expect(roundingBounds.entropy / unit).toBeCloseTo(6.7 + 3 * logarithm, 12);
  // G/R: a1/(2T), a2 ln T, (3 - 5) T - 3 T ln T, 0.0005 T^2, a2 - 1000 (H's constant with that of a2 ln T)
  expect(roundingBounds.gibbsEnergy / unit).toBeCloseTo(100 + 200 * logarithm + 400 + 600 * logarithm + 20 + 1200, 9);
});

test("high powers keep the bound over many temperatures", () => {
  const powers = [-20, -9, 7, 9, 19.5, 20];
  const anchor = {
    temperature: { value: 298.15, unit: "K", source: { text: "invented" }, origin: "memory" },
    enthalpy: { value: 0, unit: "J/mol", source: { text: "invented" }, origin: "memory" },
    entropy: { value: 0, unit: "J/mol/K", source: { text: "invented" }, origin: "memory" },
  } as const;
  fc.assert(
    fc.property(fc.constantFrom(...powers), temperaturesK, (power, temperatureK) => {
      const series: PublishedSeries = {
        kind: "series",
        form: "polynomial",
        powers: [power],
        anchor,
        intervals: [{ from: 200, to: 3000, coefficients: [Number(`3e${Math.round(-3 * power)}`)], endsAt: "fit" }],
      };
      expect(worstShare(series, temperatureK)).toBeLessThanOrEqual(1);
    }),
    { seed: 20261203, numRuns: 1000 },
  );
});
