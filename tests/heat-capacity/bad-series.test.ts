import { describe, expect, test } from "vitest";
import { seriesProperties } from "../../src/heat-capacity/series-properties.js";
import { faultsOf, placesOf } from "../errors/faults-of.js";
import { figure } from "./random-series.js";

const interval = { from: 200, to: 1000, coefficients: [2.5, 0, 0, 0, 0, -745.375, 4.38], endsAt: "fit" };
const good = { kind: "series", form: "seven-coefficient", gasConstant: 8.31451, intervals: [interval] };
const anchor = { temperature: figure(300, "K"), enthalpy: figure(0, "J/mol"), entropy: figure(1, "J/mol/K") };
const plain = {
  kind: "series",
  form: "polynomial",
  powers: [0, 1],
  anchor,
  intervals: [{ from: 200, to: 1000, coefficients: [20, 0.01], endsAt: "fit" }],
};

/** What plain JavaScript may pass as a fit. */
function properties(series: unknown): unknown {
  return seriesProperties(series as Parameters<typeof seriesProperties>[0], {
    temperature: { value: 500, unit: "K" },
  });
}

test("the two good fits are read", () => {
  expect(() => properties(good)).not.toThrow();
  expect(() => properties(plain)).not.toThrow();
});

/** An array without what stands at one place. */
function withHole<T>(entries: readonly T[], place: number): T[] {
  const copy = [...entries];
  delete copy[place];
  return copy;
}
const coefficientsWithHole = withHole(interval.coefficients, 1);
const intervalsWithHole = withHole([interval, interval], 0);

describe("a wrong fit is refused", () => {
  test.each<[string, unknown, string]>([
    ["nothing", undefined, "input/not-an-object at series"],
    ["null", null, "input/not-an-object at series"],
    ["an array", [], "input/not-an-object at series"],
    ["no kind", { ...good, kind: undefined }, "input/missing at series.kind"],
    ["no form", { ...good, form: undefined }, "input/missing at series.form"],
    ["no list of intervals", { ...good, intervals: undefined }, "input/missing at series.intervals"],
    ["another kind", { ...good, kind: "model" }, "input/unknown-option at series.kind"],
    ["another form", { ...good, form: "seven" }, "heat-capacity/unknown-form at series.form"],
    ["a form of the prototype", { ...good, form: "constructor" }, "heat-capacity/unknown-form at series.form"],
    ["a form that is no text", { ...good, form: 7 }, "heat-capacity/unknown-form at series.form"],
    ["no gas constant", { ...good, gasConstant: undefined }, "input/missing at series.gasConstant"],
    ["a gas constant in calories", { ...good, gasConstant: 1.987 }, "input/unknown-option at series.gasConstant"],
    ["no intervals", { ...good, intervals: [] }, "heat-capacity/intervals at series.intervals"],
    ["intervals that are no array", { ...good, intervals: {} }, "input/not-an-array at series.intervals"],
    ["too many intervals", { ...good, intervals: Array(101).fill(interval) }, "input/too-large at series.intervals"],
    [
      "a hole among the intervals",
      { ...good, intervals: intervalsWithHole },
      "input/not-an-object at series.intervals.0",
    ],
    [
      "a hole among the coefficients",
      { ...good, intervals: [{ ...interval, coefficients: coefficientsWithHole }] },
      "input/not-finite at series.intervals.0.coefficients.1",
    ],
    [
      "a falling interval",
      { ...good, intervals: [{ ...interval, from: 1000, to: 200 }] },
      "heat-capacity/intervals at series.intervals.0",
    ],
    [
      "an interval from 0 K",
      { ...good, intervals: [{ ...interval, from: 0 }] },
      "heat-capacity/intervals at series.intervals.0",
    ],
    [
      "a gap",
      { ...good, intervals: [interval, { ...interval, from: 1001, to: 2000 }] },
      "heat-capacity/intervals at series.intervals.1.from",
    ],
    [
      "a coefficient as a text",
      { ...good, intervals: [{ ...interval, coefficients: ["2.5", 0, 0, 0, 0, 0, 0] }] },
      "input/not-finite at series.intervals.0.coefficients.0",
    ],
    [
      "six coefficients",
      { ...good, intervals: [{ ...interval, coefficients: [1, 2, 3, 4, 5, 6] }] },
      "heat-capacity/coefficient-count at series.intervals.0.coefficients",
    ],
    [
      "another kind of end",
      { ...good, intervals: [{ ...interval, endsAt: "smooth" }] },
      "input/unknown-option at series.intervals.0.endsAt",
    ],
    ["powers with constants of its own", { ...good, powers: [0] }, "input/unknown-key at series.powers"],
    ["a unit with constants of its own", { ...good, unit: "J/mol/K" }, "input/unknown-key at series.unit"],
    ["an anchor with constants of its own", { ...good, anchor }, "input/unknown-key at series.anchor"],
    ["a gas constant that is not needed", { ...plain, gasConstant: 8.314 }, "input/unknown-key at series.gasConstant"],
    ["a polynomial without powers", { ...plain, powers: undefined }, "input/missing at series.powers"],
    ["a power of a third", { ...plain, powers: [0, 1 / 3] }, "heat-capacity/unknown-form at series.powers"],
    ["a power too high", { ...plain, powers: [0, 21] }, "heat-capacity/unknown-form at series.powers"],
    ["a power twice", { ...plain, powers: [1, 1] }, "heat-capacity/unknown-form at series.powers"],
    [
      "powers of another number",
      { ...plain, powers: [0, 1, 2] },
      "heat-capacity/coefficient-count at series.intervals.0.coefficients",
    ],
    [
      "shifts of another number",
      { ...plain, decimalShifts: [0] },
      "heat-capacity/coefficient-count at series.decimalShifts",
    ],
    ["a broken shift", { ...plain, decimalShifts: [0, 0.5] }, "input/unknown-option at series.decimalShifts.1"],
    [
      "a shift without a text",
      { ...plain, decimalShifts: [0, Object.create(null)] },
      "input/unknown-option at series.decimalShifts.1",
    ],
    ["no anchor", { ...plain, anchor: undefined }, "heat-capacity/no-anchor at series.anchor"],
    [
      "an anchor outside",
      { ...plain, anchor: { ...anchor, temperature: figure(2000, "K") } },
      "heat-capacity/no-anchor at series.anchor.temperature",
    ],
    [
      "an anchor in the wrong unit",
      { ...plain, anchor: { ...anchor, entropy: figure(1, "J/mol") } },
      "quantity/wrong-dimension at series.anchor.entropy.unit",
    ],
    ["an unknown key", { ...good, gasconstant: 8.3 }, "input/unknown-key at series.gasconstant"],
    [
      "terms that overflow",
      { ...plain, intervals: [{ from: 200, to: 1000, coefficients: [1e299, 1e299], endsAt: "fit" }] },
      "heat-capacity/overflow at ",
    ],
  ])("%s", (_name, series, place) => {
    expect(placesOf(() => properties(series))).toContain(place);
  });

  test("all faults at once", () => {
    const wrong = {
      ...good,
      kind: "serie",
      gasConstant: "8.31",
      intervals: [{ ...interval, from: Number.NaN, endsAt: "fits" }],
      extra: 1,
    };
    expect(placesOf(() => properties(wrong))).toEqual([
      "input/unknown-key at series.extra",
      "input/unknown-option at series.kind",
      "input/not-finite at series.gasConstant",
      "input/not-finite at series.intervals.0.from",
      "input/unknown-option at series.intervals.0.endsAt",
    ]);
    const faults = faultsOf(() => properties(wrong));
    expect(faults[1]?.hint).toBe("did you mean series?");
    expect(faults[4]?.hint).toBe("did you mean fit?");
  });
});
