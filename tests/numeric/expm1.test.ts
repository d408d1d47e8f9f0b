import { expect, test } from "vitest";
import { expm1 } from "../../src/numeric/expm1.js";
import { draw, exponentialBorders, nearZero, worstError } from "./samples.js";
import { D } from "./ulp.js";

const wide = D.clone({ precision: 70 });

test.each([
  ["near 0", nearZero(800, 51)],
  ["the whole range", draw(300, 52, (random) => (random() * 2 - 1) * 709)],
  ["the range of the table", draw(300, 53, (random) => (random() * 2 - 1) * 41)],
  ["borders of the table's rows", exponentialBorders()],
  ["the ends of the range of the table", [40, -40, 39.99999999999999, -39.99999999999999]],
  // Worst seen while the function was made.
  ["stored worst cases", [0.0027881691863186862, 0.0027076061740622893, 0.0027854940333084817]],
])("expm1 is within 0.51 ulp of 45 digits or more: %s", (_, sample) => {
  expect(worstError(expm1, (x) => new wide(x).exp().minus(1), sample).ulp).toBeLessThan(0.51);
});

test("expm1 has exact values where it has limits, and 0 for -0", () => {
  expect(expm1(0)).toBe(0);
  expect(expm1(-0)).toBe(0);
  expect(expm1(5e-324)).toBe(5e-324);
  expect(expm1(-5e-324)).toBe(-5e-324);
  expect(expm1(-50)).toBe(-1);
  expect(expm1(Number.NEGATIVE_INFINITY)).toBe(-1);
  expect(expm1(Number.POSITIVE_INFINITY)).toBe(Number.POSITIVE_INFINITY);
  expect(expm1(Number.NaN)).toBe(Number.NaN);
});
