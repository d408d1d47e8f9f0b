import { describe, expect, test } from "vitest";
import { evaluateAll, intervalOf, type SeriesValues } from "../../src/heat-capacity/evaluate.js";
import { plannedSeries, planOfSeries } from "../../src/heat-capacity/planned-series.js";
import type { PublishedInterval, PublishedSeries } from "../../src/heat-capacity/published-series.js";
import type { RangePolicy } from "../../src/heat-capacity/range-policy.js";
import {
  exactPropertiesAt,
  readSeries,
  type SeriesContext,
  startOfRange,
} from "../../src/heat-capacity/read-series.js";
import { seriesProperties } from "../../src/heat-capacity/series-properties.js";
import { decimalOf, decimalToNumber } from "../../src/numeric/exact-decimal.js";
import { figure } from "./random-series.js";

type Ends = PublishedInterval["endsAt"];

/** Cp = 20 up to 400 K, 30 up to 600 K, 40 + 0.01 T up to 900 K. */
function steps(first: Ends = "fit", second: Ends = "fit"): PublishedSeries {
  return {
    kind: "series",
    form: "polynomial",
    powers: [0, 1],
    intervals: [
      { from: 200, to: 400, coefficients: [20, 0], endsAt: first },
      { from: 400, to: 600, coefficients: [30, 0], endsAt: second },
      { from: 600, to: 900, coefficients: [40, 0.01], endsAt: "fit" },
    ],
  };
}

const anchorAt = (temperatureK: number) => ({
  temperatureK,
  enthalpy: decimalOf(1000),
  entropy: decimalOf(50),
});

function evaluate(
  series: PublishedSeries,
  context: SeriesContext,
  temperatureK: number,
  policy: RangePolicy = "refuse",
): SeriesValues {
  const plan = planOfSeries(plannedSeries(readSeries(series, context)), policy);
  return evaluateAll(intervalOf(plan, temperatureK)!, temperatureK);
}

describe("breaks", () => {
  test("belong to the interval below them", () => {
    const context = { anchor: anchorAt(298.15) };
    expect(evaluate(steps(), context, 400).heatCapacity).toBe(20);
    expect(evaluate(steps(), context, 400.0000001).heatCapacity).toBe(30);
    expect(evaluate(steps(), context, 600).heatCapacity).toBe(30);
    expect(evaluate(steps(), context, 900).heatCapacity).toBe(49);
  });

  test.each([
    ["fit", 0],
    ["continuous", 0],
    ["first-order", 1200],
  ] as const)("%s: H jumps by %d J/mol, S by H/T, G not at all", (kind, jump) => {
    const transitionEnthalpies = new Map([[400, decimalOf(1200)]]);
    for (const anchorK of [200, 298.15, 500, 600, 800]) {
      const context = { anchor: anchorAt(anchorK), transitionEnthalpies };
      const below = evaluate(steps(kind), context, 400);
      const above = evaluate(steps(kind), context, 400 + 1e-10);
      expect(above.enthalpy - below.enthalpy).toBeCloseTo(jump, 7);
      expect(above.entropy - below.entropy).toBeCloseTo(jump / 400, 9);
      expect(above.gibbsEnergy - below.gibbsEnergy).toBeCloseTo(0, 6);
    }
  });

  test.each([200, 298.15, 400, 400.5, 599, 600, 601, 900])("an anchor at %d K is met from either side", (anchorK) => {
    const { enthalpy, entropy } = evaluate(steps(), { anchor: anchorAt(anchorK) }, anchorK);
    expect(enthalpy).toBeCloseTo(1000, 9);
    expect(entropy).toBeCloseTo(50, 11);
  });

  test("two transitions add up, upward and downward alike", () => {
    const transitionEnthalpies = new Map([
      [400, decimalOf(1000)],
      [600, decimalOf(3000)],
    ]);
    const series = steps("first-order", "first-order");
    const upward = evaluate(series, { anchor: anchorAt(300), transitionEnthalpies }, 700);
    // 100 K of 20, 200 K of 30, 100 K of 40 + 0.01 T (mean 46.5), and both jumps
    expect(upward.enthalpy).toBeCloseTo(1000 + 2000 + 6000 + 4650 + 4000, 8);
    const downward = evaluate(series, { anchor: anchorAt(700), transitionEnthalpies }, 300);
    expect(downward.enthalpy - 1000).toBeCloseTo(-(upward.enthalpy - 1000), 8);
    expect(downward.entropy - 50).toBeCloseTo(-(upward.entropy - 50), 10);
  });

  test("a first-order break without its enthalpy is refused", () => {
    expect(() => readSeries(steps("first-order"), { anchor: anchorAt(300) })).toThrow(/transition at 400 K/);
  });

  test("an anchor outside the fit, or none, is refused", () => {
    expect(() => readSeries(steps(), { anchor: anchorAt(1000) })).toThrow(/outside the fit/);
    expect(() => readSeries(steps())).toThrow(/carries no constants/);
  });
});

describe("a fit that begins between 298.15 K and 300 K may be evaluated at 298.15 K", () => {
  test.each([
    [200, 200],
    [298.15, 298.15],
    [298.16, 298.15],
    [300, 298.15],
    [300.0001, 300.0001],
    [350, 350],
  ])("from %d K: range from %d K", (fromK, startK) => {
    expect(startOfRange(fromK)).toBe(startK);
    const series: PublishedSeries = {
      kind: "series",
      form: "seven-coefficient",
      gasConstant: 8.31451,
      intervals: [{ from: fromK, to: 1000, coefficients: [2.5, 0, 0, 0, 0, 0, 0], endsAt: "fit" }],
    };
    const at = (value: number) => ({ temperature: { value, unit: "K" } }) as const;
    expect(seriesProperties(series, at(startK)).heatCapacity.value).toBe(20.786275);
    expect(() => seriesProperties(series, at(startK - 0.001))).toThrow(/the fit reaches from/);
  });
});

describe("range policies", () => {
  const context = { anchor: anchorAt(298.15) };

  test("refuse: nothing beyond the ends", () => {
    const plan = planOfSeries(plannedSeries(readSeries(steps(), context)), "refuse");
    expect([plan.fromK, plan.toK]).toEqual([200, 900]);
    for (const value of [199.999, 900.001, 0, Number.NaN, Number.POSITIVE_INFINITY]) {
      expect(intervalOf(plan, value)).toBeUndefined();
    }
  });

  test("constant-heat-capacity: Cp stays, H and S go on without a break", () => {
    const beyond = (temperatureK: number) => evaluate(steps(), context, temperatureK, "constant-heat-capacity");
    expect([beyond(100).heatCapacity, beyond(1).heatCapacity]).toEqual([20, 20]);
    expect([beyond(1000).heatCapacity, beyond(100_000).heatCapacity]).toEqual([49, 49]);
    for (const [endK, step] of [
      [200, -1e-9],
      [900, 1e-9],
    ] as const) {
      expect(beyond(endK + step).enthalpy).toBeCloseTo(beyond(endK).enthalpy, 6);
      expect(beyond(endK + step).entropy).toBeCloseTo(beyond(endK).entropy, 9);
    }
    expect(beyond(1000).enthalpy - beyond(900).enthalpy).toBeCloseTo(4900, 8);
    expect(beyond(1800).entropy - beyond(900).entropy).toBeCloseTo(49 * 0.6931471805599453, 10);
    expect(beyond(100).entropy - beyond(200).entropy).toBeCloseTo(-20 * 0.6931471805599453, 10);
  });

  test("continue-fit: the equations of the outer intervals go on", () => {
    const beyond = (temperatureK: number) => evaluate(steps(), context, temperatureK, "continue-fit");
    expect(beyond(100).heatCapacity).toBe(20);
    expect(beyond(1000).heatCapacity).toBe(50);
    expect(beyond(1000).enthalpy - beyond(900).enthalpy).toBeCloseTo(4950, 8);
  });

  test("inside the range every policy agrees", () => {
    for (const temperatureK of [250, 400, 555, 900]) {
      const inside = evaluate(steps(), context, temperatureK);
      expect(evaluate(steps(), context, temperatureK, "constant-heat-capacity")).toEqual(inside);
      expect(evaluate(steps(), context, temperatureK, "continue-fit")).toEqual(inside);
    }
  });

  test.each(["constant-heat-capacity", "continue-fit"] as const)("%s ends at 1 K and 100,000 K", (policy) => {
    const plan = planOfSeries(plannedSeries(readSeries(steps(), context)), policy);
    expect([plan.fromK, plan.toK]).toEqual([1, 100_000]);
  });

  test("a fit that reaches further than any continuation keeps its range", () => {
    const wide: PublishedSeries = {
      kind: "series",
      form: "seven-coefficient",
      gasConstant: 8.31451,
      intervals: [{ from: 0.5, to: 200_000, coefficients: [2.5, 0, 0, 0, 0, 0, 0], endsAt: "fit" }],
    };
    const plan = planOfSeries(plannedSeries(readSeries(wide)), "continue-fit");
    expect([plan.fromK, plan.toK]).toEqual([0.5, 200_000]);
  });
});

test("exact properties agree with evaluated ones", () => {
  const series = readSeries(steps(), { anchor: anchorAt(298.15) });
  const exact = exactPropertiesAt(series, 750);
  const { heatCapacity, enthalpy, entropy } = evaluate(steps(), { anchor: anchorAt(298.15) }, 750);
  expect(decimalToNumber(exact.heatCapacity)).toBe(heatCapacity);
  expect(decimalToNumber(exact.enthalpy)).toBeCloseTo(enthalpy, 9);
  expect(decimalToNumber(exact.entropy)).toBeCloseTo(entropy, 11);
});

describe("seriesProperties", () => {
  const anchor = {
    temperature: figure(298.15, "K"),
    enthalpy: figure(1, "kJ/mol"),
    entropy: figure(50, "J/mol/K"),
  };

  test("takes the anchor of the fit and gives G = H - T S", () => {
    const properties = seriesProperties({ ...steps(), anchor }, { temperature: { value: 25, unit: "Cel" } });
    expect(properties.enthalpy).toEqual({ value: expect.closeTo(1000, 9), unit: "J/mol" });
    expect(properties.gibbsEnergy.value).toBeCloseTo(1000 - 298.15 * 50, 9);
  });

  test("does not see changes made after the first call", () => {
    const series = { ...steps(), anchor };
    const before = seriesProperties(series, { temperature: { value: 500, unit: "K" } });
    (series.intervals[1]!.coefficients as number[])[0] = 99;
    expect(seriesProperties(series, { temperature: { value: 500, unit: "K" } })).toEqual(before);
  });

  test("goes on beyond the fit where it is told to", () => {
    const conditions = { temperature: { value: 1000, unit: "K" }, outsideRange: "constant-heat-capacity" } as const;
    expect(seriesProperties({ ...steps(), anchor }, conditions).heatCapacity.value).toBe(49);
  });
});
