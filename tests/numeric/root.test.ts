import { describe, expect, test } from "vitest";
import { isGibbsLedgerError } from "../../src/errors/gibbs-ledger-error.js";
import { findRoot } from "../../src/numeric/root.js";
import { neighbour, seeded } from "./ulp.js";

function counted(f: (x: number) => number): { f: (x: number) => number; count: () => number } {
  let calls = 0;
  return {
    f: (x) => {
      calls += 1;
      return f(x);
    },
    count: () => calls,
  };
}

function codeOf(action: () => unknown): string | undefined {
  try {
    action();
  } catch (error) {
    return isGibbsLedgerError(error) ? error.code : "another error";
  }
  return undefined;
}

const cases: [string, (x: number) => number, number, number, number][] = [
  ["x^2 - 2", (x) => x * x - 2, 0, 2, Math.SQRT2],
  ["x^3 - 2x - 5 (Wallis)", (x) => x * x * x - 2 * x - 5, 2, 3, 2.0945514815423265],
  ["1 - 1/x, an end far off", (x) => 1 - 1 / x, 1e-8, 1e8, 1],
  ["x - 1e-200 over the whole positive range", (x) => x - 1e-200, 0, 1e300, 1e-200],
  ["x + 12345 over all doubles", (x) => x + 12345, -Number.MAX_VALUE, Number.MAX_VALUE, -12345],
  ["a step at 0.3", (x) => (x < 0.3 ? -1 : 1), 0, 1, 0.3],
  ["a flat triple root", (x) => (x - 0.7) ** 3, 0, 1, 0.7],
  ["a steep exponential", (x) => Math.exp(50 * x) - Math.exp(25), -10, 10, 0.5],
  ["an infinite end", (x) => Math.log(x) + 3, 0, 10, Math.exp(-3)],
];

describe("findRoot", () => {
  test.each(cases)("%s, ends in either order, in at most 130 evaluations", (_, f, lower, upper, root) => {
    for (const [a, b] of [
      [lower, upper],
      [upper, lower],
    ] as const) {
      const { f: watched, count } = counted(f);
      const x = findRoot(watched, a, b);
      expect(Math.abs(x - root)).toBeLessThanOrEqual(4 * Number.EPSILON * Math.abs(root));
      expect(count()).toBeLessThanOrEqual(130);
      // To the last bits: a zero, or a change of sign to one of the neighbours.
      const signs = [neighbour(x, -1), x, neighbour(x, 1)].map((at) => Math.sign(f(at)));
      expect(signs[1] === 0 || signs[0] !== signs[1] || signs[1] !== signs[2]).toBe(true);
    }
  });

  test("takes few evaluations where the function is smooth", () => {
    const random = seeded(131);
    let total = 0;
    for (let round = 0; round < 200; round += 1) {
      const root = 300 + 3000 * random();
      const curvature = random();
      // Like a reaction's Gibbs energy over temperature, in invented numbers.
      const { f, count } = counted(
        (x) => (x - root) * (1 + (curvature * x) / 1000) + 1e-3 * (x - root) * Math.log(x / 298),
      );
      const x = findRoot(f, 200, 6000);
      expect(Math.abs(x - root)).toBeLessThanOrEqual(2 * Number.EPSILON * root);
      total += count();
    }
    expect(total / 200).toBeLessThan(16);
  });

  test("a zero at an end is the root, and never -0", () => {
    expect(findRoot((x) => x - 3, 3, 10)).toBe(3);
    expect(findRoot((x) => x - 10, 3, 10)).toBe(10);
    expect(findRoot((x) => x, -0, 1)).toBe(0);
    expect(findRoot((x) => x, -1, 1)).toBe(0);
    expect(findRoot((x) => (x >= 0 ? 1 : -1), -1, 1)).toBeCloseTo(0, 300);
    expect(
      Object.is(
        findRoot((x) => (x >= 0 ? 1 : -2), -1, 1),
        -0,
      ),
    ).toBe(false);
  });

  test("refuses ends of the same sign, ends that are not finite, and functions that are not numbers", () => {
    expect(codeOf(() => findRoot((x) => x * x + 1, -1, 1))).toBe("roots/not-bracketed");
    expect(codeOf(() => findRoot((x) => x - 5, 1, 1))).toBe("roots/not-bracketed");
    expect(codeOf(() => findRoot((x) => (Math.abs(x) < 0.9 ? Number.NaN : x), -1, 1))).toBe("roots/not-bracketed");
    expect(codeOf(() => findRoot((x) => x, Number.NaN, 1))).toBe("input/not-finite");
    expect(codeOf(() => findRoot((x) => x, -1, Number.POSITIVE_INFINITY))).toBe("input/not-finite");
  });
});
