import { describe, expect, test } from "vitest";
import { exp } from "../../src/numeric/exp.js";
import { draw, exponentialBorders, nearZero, worstError } from "./samples.js";
import { neighbour } from "./ulp.js";

describe("exp against 45 digits", () => {
  test.each([
    ["the whole range of normal results", draw(700, 41, (random) => (random() * 2 - 1) * 708)],
    ["the short way", draw(300, 42, (random) => (random() * 2 - 1) * 45)],
    ["near 0", nearZero(500, 43)],
    ["borders of the table's rows", exponentialBorders()],
    [
      "the ends of the short way",
      [44, -44, neighbour(44, -1), neighbour(-44, 1), 709.782712893384, -708.3964185322641],
    ],
    // Worst seen in longer runs.
    ["stored worst cases", [134.79289939256765, -0.014800731000748697]],
  ])("is within 0.51 ulp: %s", (_, sample) => {
    expect(worstError(exp, (x) => x.exp(), sample).ulp).toBeLessThan(0.51);
  });

  test("is within 0.76 ulp where the result is subnormal", () => {
    const sample = draw(300, 44, (random) => -708.4 - 36.7 * random());
    expect(worstError(exp, (x) => x.exp(), sample).ulp).toBeLessThan(0.76);
  });
});

test("exp has exact values at 0 and at the ends, as IEEE 754 has it", () => {
  expect(exp(0)).toBe(1);
  expect(exp(-0)).toBe(1);
  expect(exp(709.782712893384)).toBeLessThan(Number.POSITIVE_INFINITY);
  expect(exp(709.7827128933841)).toBe(Number.POSITIVE_INFINITY);
  expect(exp(1e300)).toBe(Number.POSITIVE_INFINITY);
  expect(exp(Number.POSITIVE_INFINITY)).toBe(Number.POSITIVE_INFINITY);
  expect(exp(-745.1332191019411)).toBe(5e-324);
  expect(exp(-745.1332191019412)).toBe(0);
  expect(exp(-1e300)).toBe(0);
  expect(exp(Number.NEGATIVE_INFINITY)).toBe(0);
  expect(exp(Number.NaN)).toBe(Number.NaN);
});
