import { describe, expect, test } from "vitest";
import { log } from "../../src/numeric/log.js";
import { anyPositive, draw, logarithmBorders, nearOne, powersOfTwo, worstError } from "./samples.js";

describe("log is within 0.52 ulp of the logarithm of 45 digits", () => {
  test.each([
    ["all doubles above zero, subnormals included", anyPositive(700, 1)],
    ["near 1", nearOne(700, 2)],
    ["within three per cent of 1", draw(300, 3, (random) => 0.97 + 0.06 * random())],
    [
      "the ends of the rows next to 1, where the series is cut hardest",
      draw(300, 5, (random) => 1 + (random() < 0.5 ? -1 : 1) * 0.00390625 * (0.85 + 0.17 * random())),
    ],
    ["0.5 to 2.5", draw(300, 4, (random) => 0.5 + 2 * random())],
    ["borders and centres of the table's rows", logarithmBorders()],
    ["powers of two and their neighbours", powersOfTwo()],
    [
      "the ends of the short way and of the range",
      [
        2 ** -63,
        2 ** -63 * (1 - 2 ** -53),
        2 ** 63,
        2 ** 63 * (1 - 2 ** -53),
        5e-324,
        2.225073858507201e-308,
        2.2250738585072014e-308,
        Number.MAX_VALUE,
      ],
    ],
    // Worst seen in longer runs.
    [
      "stored worst cases",
      [
        1.0038840927028905, 1.0037215863842035, 1.0275959362654798, 1.012458465151755, 0.9999999999999998,
        0.9993369435006141, 12.75,
      ],
    ],
  ])("%s", (_, sample) => {
    expect(worstError(log, (x) => x.ln(), sample).ulp).toBeLessThan(0.52);
  });
});

test("log of 1 is 0, and not -0", () => {
  expect(log(1)).toBe(0);
});

test("log outside its domain follows IEEE 754", () => {
  expect(log(0)).toBe(Number.NEGATIVE_INFINITY);
  expect(log(-0)).toBe(Number.NEGATIVE_INFINITY);
  expect(log(-1)).toBe(Number.NaN);
  expect(log(Number.NaN)).toBe(Number.NaN);
  expect(log(Number.NEGATIVE_INFINITY)).toBe(Number.NaN);
  expect(log(Number.POSITIVE_INFINITY)).toBe(Number.POSITIVE_INFINITY);
});

test("log rises wherever the table changes rows", () => {
  const borders = logarithmBorders().sort((a, b) => a - b);
  for (let index = 1; index < borders.length; index += 1) {
    expect(log(borders[index]!)).toBeGreaterThanOrEqual(log(borders[index - 1]!));
  }
});
