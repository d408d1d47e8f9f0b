import { expect, test } from "vitest";
import { log1p } from "../../src/numeric/log1p.js";
import { anyPositive, draw, nearZero, worstError } from "./samples.js";
import { D } from "./ulp.js";

const limit = 0.00390625;
const wide = D.clone({ precision: 80 });

test.each([
  ["near 0", nearZero(1000, 31).filter((x) => x > -1)],
  ["above 0", anyPositive(500, 32).filter((x) => x > 1e-20)],
  ["near -1", draw(400, 33, (random) => 2 ** (-53 * random()) - 1).filter((x) => x > -1 && x !== 0)],
  [
    "around the end of the series",
    draw(300, 34, (random) => (random() < 0.5 ? -1 : 1) * limit * (0.9 + 0.2 * random())),
  ],
  ["the greatest doubles", [1e18, 1.0000000000000001e18, 1e19, Number.MAX_VALUE]],
])("log1p is within 0.51 ulp of 45 digits or more: %s", (_, sample) => {
  expect(worstError(log1p, (x) => new wide(x).plus(1).ln(), sample).ulp).toBeLessThan(0.51);
});

test("log1p returns subnormals unchanged, and 0 for -0", () => {
  expect(log1p(5e-324)).toBe(5e-324);
  expect(log1p(-5e-324)).toBe(-5e-324);
  expect(log1p(-0)).toBe(0);
  expect(log1p(0)).toBe(0);
});

test("log1p outside its domain follows IEEE 754", () => {
  expect(log1p(-1)).toBe(Number.NEGATIVE_INFINITY);
  expect(log1p(-1.5)).toBe(Number.NaN);
  expect(log1p(Number.NaN)).toBe(Number.NaN);
  expect(log1p(Number.POSITIVE_INFINITY)).toBe(Number.POSITIVE_INFINITY);
});
