import { describe, expect, test } from "vitest";
import type { Figure } from "../../src/quantity/figure.js";
import { figureStandardUncertainty } from "../../src/uncertainty/figure-uncertainty.js";
import { type CoverageInterval, standardUncertaintyOf } from "../../src/uncertainty/standard-uncertainty.js";
import { placesOf } from "../errors/faults-of.js";
import { figure } from "../heat-capacity/random-series.js";

describe("JCGM 100:2008 (the Guide to the Expression of Uncertainty in Measurement), from memory", () => {
  test("4.3.3, example: a mass standard, 240 ug at the three standard deviation level: 80 ug", () => {
    expect(standardUncertaintyOf({ halfWidth: 240, coverage: 0.9973 })).toBe(80);
  });

  test("4.3.4, example: a resistor, 129 uohm at a level of confidence of 99 per cent: 50 uohm", () => {
    // Printed to two figures, with a factor of 2.58.
    expect(Math.abs(standardUncertaintyOf({ halfWidth: 129, coverage: 0.99 }) - 50)).toBeLessThanOrEqual(0.5);
  });

  test("4.3.5, example: half the values within 0.04 mm: 1.48 times 0.04 mm, 0.06 mm", () => {
    const u = standardUncertaintyOf({ halfWidth: 0.04, coverage: 0.5 });
    expect(Math.abs(u - 0.06)).toBeLessThanOrEqual(0.005);
    expect(Math.abs(u / 0.04 - 1.48)).toBeLessThanOrEqual(0.005);
  });
});

test("CODATA Key Values state about 95 per cent, and mean two standard deviations (Cox 1989, from memory)", () => {
  const formationEnthalpyOfCO2: Figure = {
    ...figure(-393.51, "kJ/mol"),
    uncertainty: { halfWidth: 0.13, coverage: 0.95 },
  };
  expect(figureStandardUncertainty(formationEnthalpyOfCO2)).toBe(65);
});

describe("figures", () => {
  test("without an uncertainty have none, but zero is zero by definition", () => {
    expect(figureStandardUncertainty(undefined)).toBeUndefined();
    expect(figureStandardUncertainty(figure(1, "kJ/mol"))).toBeUndefined();
    expect(figureStandardUncertainty(figure(0, "kJ/mol"))).toBe(0);
    expect(figureStandardUncertainty({ ...figure(0, "kJ/mol"), uncertainty: { halfWidth: 2, coverage: 0.68 } })).toBe(
      2000,
    );
  });

  test("convert to the coherent unit", () => {
    const stated = { ...figure(10, "cal_th/mol/K"), uncertainty: { halfWidth: 0.1, coverage: 0.9 } };
    expect(figureStandardUncertainty(stated)! / (0.4184 / 1.6448536269514722)).toBeCloseTo(1, 15);
  });
});

test("an interval of no width has no uncertainty, and never a negative zero", () => {
  for (const halfWidth of [0, -0]) {
    expect(Object.is(standardUncertaintyOf({ halfWidth, coverage: 0.9 }), 0)).toBe(true);
  }
});

test.each<[string, unknown, string[]]>([
  ["nothing", undefined, ["input/not-an-object at interval"]],
  ["a number", 0.13, ["input/not-an-object at interval"]],
  ["no members", {}, ["input/missing at interval.halfWidth", "input/missing at interval.coverage"]],
  [
    "wrong members, all at once",
    { halfWidth: -1, coverage: 95, unit: "kJ/mol" },
    [
      "input/unknown-key at interval.unit",
      "uncertainty/invalid-coverage at interval.coverage",
      "quantity/negative-uncertainty at interval.halfWidth",
    ],
  ],
  [
    "texts",
    { halfWidth: "1", coverage: "0.95" },
    ["input/not-finite at interval.coverage", "input/not-finite at interval.halfWidth"],
  ],
  ["a result beyond the doubles", { halfWidth: 1, coverage: 1e-320 }, ["uncertainty/overflow at interval"]],
  [
    "a prototype",
    JSON.parse('{ "__proto__": 1, "halfWidth": 1, "coverage": 0.95 }'),
    ["input/forbidden-key at interval.__proto__"],
  ],
])("refused: %s", (_name, value, places) => {
  expect(placesOf(() => standardUncertaintyOf(value as CoverageInterval))).toEqual(places);
});
