import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { exactDot, exactSum, twoProduct, twoSum } from "../../src/numeric/compensated.js";
import { parts, seeded } from "./ulp.js";

/** An exact binary number: value * 2^-2200. */
const scale = 2200;

function exact(x: number): bigint {
  const { significand, exponent } = parts(x);
  return significand << BigInt(exponent + scale);
}

function exactProduct(a: number, b: number): bigint {
  const left = parts(a);
  const right = parts(b);
  return (left.significand * right.significand) << BigInt(left.exponent + right.exponent + scale);
}

/** The nearest double, ties to even, by comparing exactly with the neighbours of an estimate. */
function nearest(value: bigint): number {
  if (value === 0n) return 0;
  const negative = value < 0n;
  const magnitude = negative ? -value : value;
  const length = magnitude.toString(2).length;
  const drop = Math.max(length - 53, scale - 1074);
  const unit = 1n << BigInt(drop);
  let quotient = magnitude / unit;
  const twice = (magnitude % unit) * 2n;
  if (twice > unit || (twice === unit && quotient % 2n === 1n)) quotient += 1n;
  const result = Number(quotient) * 2 ** Math.ceil((drop - scale) / 2) * 2 ** Math.floor((drop - scale) / 2);
  return negative && result !== 0 ? -result : result;
}

function shuffled<T>(values: readonly T[], random: () => number): T[] {
  const copy = [...values];
  for (let index = copy.length - 1; index > 0; index -= 1) {
    const other = Math.floor(random() * (index + 1));
    [copy[index], copy[other]] = [copy[other]!, copy[index]!];
  }
  return copy;
}

/** Magnitudes over some 200 binades, most of them cancelled by a neighbour of opposite sign. */
function nearCancelling(random: () => number): number[] {
  const values: number[] = [];
  const count = 1 + Math.floor(random() * 12);
  for (let index = 0; index < count; index += 1) {
    const value = (random() * 2 - 1) * 2 ** Math.floor(random() * 200 - 100);
    values.push(value);
    if (random() < 0.8) values.push(-value * (1 + Math.floor(random() * 3 - 1) * 2 ** -52));
  }
  return values;
}

const finite = fc.double({ noNaN: true, noDefaultInfinity: true, min: -1e150, max: 1e150 });

describe("exactSum", () => {
  test("is the double nearest to the exact sum of near-cancelling terms, in whatever order", () => {
    const random = seeded(101);
    for (let round = 0; round < 2000; round += 1) {
      const values = nearCancelling(random);
      const expected = nearest(values.reduce((sum, value) => sum + exact(value), 0n));
      expect(exactSum(values)).toBe(expected);
      expect(exactSum(shuffled(values, random))).toBe(expected);
    }
  });

  test("is the double nearest to the exact sum of any doubles", () => {
    fc.assert(
      fc.property(fc.array(finite, { maxLength: 20 }), (values) => {
        expect(exactSum(values)).toBe(nearest(values.reduce((sum, value) => sum + exact(value), 0n)));
      }),
      { seed: 20261201, numRuns: 2000 },
    );
  });

  test("rounds ties to even, and what only looks like a tie the right way", () => {
    const half = 2 ** -53;
    expect(exactSum([1, half])).toBe(1);
    expect(exactSum([1, half, 2 ** -200])).toBe(1 + 2 ** -52);
    expect(exactSum([1, half, -(2 ** -200)])).toBe(1);
    expect(exactSum([1 + 2 ** -52, half])).toBe(1 + 2 ** -51);
    expect(exactSum([1 + 2 ** -52, half, -(2 ** -200)])).toBe(1 + 2 ** -52);
    expect(exactSum([-1, -half, -(2 ** -200)])).toBe(-1 - 2 ** -52);
  });

  test("is 0, never -0, where nothing is left", () => {
    expect(exactSum([])).toBe(0);
    expect(exactSum([-0])).toBe(0);
    expect(exactSum([-0, -0])).toBe(0);
    expect(exactSum([1e300, 1, -1e300, -1])).toBe(0);
    expect(exactSum(new Float64Array([0.1, 0.2, -0.3]))).toBe(2.7755575615628914e-17);
  });
});

describe("exactDot", () => {
  test("is the double nearest to the exact sum of products, in whatever order", () => {
    const random = seeded(103);
    for (let round = 0; round < 2000; round += 1) {
      const pairs = nearCancelling(random).map((value) => [value, Math.floor(random() * 19 - 9) / 2] as const);
      // The last product nearly cancels the rest.
      const rest = exactDot(
        pairs.map(([a]) => a),
        pairs.map(([, b]) => b),
      );
      const all = [...pairs, [-rest / 3, 3] as const];
      const expected = nearest(all.reduce((sum, [a, b]) => sum + exactProduct(a, b), 0n));
      const other = shuffled(all, random);
      expect(
        exactDot(
          all.map(([a]) => a),
          all.map(([, b]) => b),
        ),
      ).toBe(expected);
      expect(
        exactDot(
          other.map(([a]) => a),
          other.map(([, b]) => b),
        ),
      ).toBe(expected);
    }
  });

  test("is 0, never -0, where nothing is left", () => {
    expect(exactDot([], [])).toBe(0);
    expect(exactDot([-1], [0])).toBe(0);
    expect(exactDot([0.1, -0.3], [0.3, 0.1])).toBe(0);
  });
});

test("twoSum and twoProduct leave nothing over", () => {
  fc.assert(
    fc.property(finite, finite, (a, b) => {
      const sum = twoSum(a, b);
      expect(sum.value).toBe(a + b);
      expect(exact(sum.value) + exact(sum.error)).toBe(exact(a) + exact(b));
      const product = twoProduct(a, b);
      expect(product.value).toBe(a * b);
      if (a * b === 0 ? a === 0 || b === 0 : Math.abs(a * b) >= 2 ** -969) {
        expect(exact(product.value) + exact(product.error)).toBe(exactProduct(a, b));
      }
    }),
    { seed: 20261201, numRuns: 2000 },
  );
});
