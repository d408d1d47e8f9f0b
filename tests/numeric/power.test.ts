import { describe, expect, test } from "vitest";
import { power } from "../../src/numeric/power.js";
import { D, exactDecimal, randomPositive, seeded, ulpError } from "./ulp.js";

const wide = D.clone({ precision: 50 });

/** The greatest error in ulp for bases of every binade and bases around 1. */
function worst(count: number, seed: number, range: (ln: number) => [number, number]): number {
  const random = seeded(seed);
  let found = 0;
  for (let seen = 0; seen < count; seen += 1) {
    const base = seen % 2 === 0 ? randomPositive(random) : 0.01 + 3 * random();
    const [lowest, highest] = range(Math.log(base));
    const exponent = lowest + (highest - lowest) * random();
    const logarithm = exactDecimal(base).ln().times(exactDecimal(exponent));
    const ulp = ulpError(power(base, exponent), new wide(logarithm).exp());
    if (!(ulp <= found)) found = ulp;
  }
  return found;
}

describe("power against 45 digits", () => {
  test.each([1, 10, 100, 1000])("is within 0.51 ulp for exponents up to %d", (greatest) => {
    const within = (ln: number): [number, number] => {
      const end = Math.min(greatest, 708 / Math.abs(ln));
      return [-end, end];
    };
    expect(worst(500, 60 + greatest, within)).toBeLessThan(0.51);
  });

  test("is within 0.76 ulp where the result is subnormal", () => {
    expect(worst(300, 71, (ln) => [-744 / ln, -708.4 / ln])).toBeLessThan(0.76);
  });

  test("is within 0.51 ulp for bases next to 1 and huge exponents", () => {
    for (const [base, exponent] of [
      [1 + 2 ** -52, 1e18],
      [1 - 2 ** -53, 1e18],
      [1 + 2 ** -30, 3e11],
    ] as const) {
      const reference = new wide(exactDecimal(base).ln().times(exactDecimal(exponent))).exp();
      expect(ulpError(power(base, exponent), reference)).toBeLessThan(0.51);
    }
  });
});

test("power is exact where the result is a double", () => {
  for (let exponent = 0; exponent <= 22; exponent += 1) expect(power(10, exponent)).toBe(Number(`1e${exponent}`));
  for (let exponent = -1074; exponent <= 1023; exponent += 1) {
    const exact = exponent < -1022 ? Number.MIN_VALUE * 2 ** (exponent + 1074) : 2 ** exponent;
    expect(power(2, exponent)).toBe(exact);
  }
  for (let base = 1; base <= 200; base += 1) {
    expect(power(base * base, 0.5)).toBe(base);
    expect(power(base, 3)).toBe(base * base * base);
  }
});

test("power at its ends", () => {
  expect(power(7, 0)).toBe(1);
  expect(power(1, 1e300)).toBe(1);
  expect(power(3, 1e-300)).toBe(1);
  expect(power(10, 400)).toBe(Number.POSITIVE_INFINITY);
  expect(power(10, -400)).toBe(0);
  expect(power(10, 1e300)).toBe(Number.POSITIVE_INFINITY);
  expect(power(0.5, 1e300)).toBe(0);
  expect(power(-2, 2)).toBe(Number.NaN);
  expect(power(0, 2)).toBe(Number.NaN);
  expect(power(2, Number.NaN)).toBe(Number.NaN);
});
