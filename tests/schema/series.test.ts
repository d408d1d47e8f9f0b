import fc from "fast-check";
import { expect, test } from "vitest";
import type { Fault } from "../../src/errors/fault.js";
import { checkObject } from "../../src/errors/input.js";
import { checkSeries, seriesKeys } from "../../src/heat-capacity/check-series.js";
import { heatCapacityForms } from "../../src/heat-capacity/forms.js";
import { publishedSeriesSchema } from "../../src/schema.js";
import { randomSeries } from "../heat-capacity/random-series.js";
import { mutated } from "./mutated.js";
import { verdictsAgree } from "./verdicts.js";

function seriesFaults(value: unknown): Fault[] {
  const faults: Fault[] = [];
  const members = checkObject(value, [], faults, seriesKeys);
  if (members !== undefined) checkSeries(members, [], faults);
  return faults;
}

const twoIntervals = fc
  .tuple(fc.constantFrom("first-order", "continuous", "fit"), fc.constantFrom(7, 8))
  .map(([endsAt, count]) => ({
    kind: "series",
    form: "shomate",
    intervals: [
      { from: 200, to: 500, coefficients: Array.from({ length: count }, (_, index) => index), endsAt },
      { from: 500, to: 900, coefficients: Array.from({ length: count }, (_, index) => -index), endsAt: "fit" },
    ],
  }));

const words = [
  ...heatCapacityForms,
  ...["fit", "first-order", "continuous", "series", "reference-point", "J/mol/K", "cal_th/mol/K", "K", "Cel", "kJ/mol"],
  ...["page", "memory", "mcbride2002", "chase1998", { text: "notes" }],
  ...[200, 500, 3000, 8.31451, 3, -3, 0, 0.5, 20, 20.5, 31, [0, 1, -2], [0, 1], [3, 3, 3], [0, 0, 0, 0, 0, 0, 0]],
];

test.each(heatCapacityForms)("schema and guard give the same verdict on 2,000 fits of the form %s, changed", (form) => {
  const share = verdictsAgree(mutated(randomSeries[form], words), publishedSeriesSchema, seriesFaults, 2000);
  expect(share).toBeGreaterThan(0.2);
  expect(share).toBeLessThan(0.9);
});

test("schema and guard give the same verdict on 4,000 fits of two intervals, changed", () => {
  const share = verdictsAgree(mutated(twoIntervals, words), publishedSeriesSchema, seriesFaults, 4000);
  expect(share).toBeGreaterThan(0.2);
  expect(share).toBeLessThan(0.9);
});

test.each([undefined, null, 7, "shomate", [], () => 1])("%s is refused by both", (value) => {
  expect(seriesFaults(value)).not.toEqual([]);
  expect(publishedSeriesSchema.safeParse(value).success).toBe(false);
});
