import { expect, test } from "vitest";
import { log10 } from "../../src/numeric/log10.js";
import { anyPositive, logarithmBorders, nearOne, powersOfTwo, worstError } from "./samples.js";
import { D } from "./ulp.js";

const ln10 = new D(10).ln();

test.each([
  ["all doubles above zero, subnormals included", anyPositive(700, 11)],
  ["near 1", nearOne(700, 12)],
  ["borders and centres of the table's rows", logarithmBorders().slice(0, 700)],
  ["powers of two and their neighbours", powersOfTwo()],
])("log10 is within 0.51 ulp of 45 digits: %s", (_, sample) => {
  expect(worstError(log10, (x) => x.ln().div(ln10), sample).ulp).toBeLessThan(0.51);
});

test("log10 of every power of ten among the normal doubles is exact", () => {
  for (let exponent = -307; exponent <= 308; exponent += 1) expect(log10(Number(`1e${exponent}`))).toBe(exponent);
});

test("log10 outside its domain follows IEEE 754", () => {
  expect(log10(0)).toBe(Number.NEGATIVE_INFINITY);
  expect(log10(-1)).toBe(Number.NaN);
  expect(log10(Number.NaN)).toBe(Number.NaN);
  expect(log10(Number.POSITIVE_INFINITY)).toBe(Number.POSITIVE_INFINITY);
});
