import { describe, expect, test } from "vitest";
import { coverageFactor } from "../../src/uncertainty/coverage-factor.js";
import { normalQuantile } from "../../src/uncertainty/normal-quantile.js";
import { faultsOf } from "../errors/faults-of.js";
import { exactDecimal, neighbour, seeded } from "../numeric/ulp.js";
import { quantileErrorInUlp } from "./normal-oracle.js";

describe("published quantiles", () => {
  // M. J. Wichura, Appl. Stat. 37, 477 (1988), values for checking an implementation to about 16 figures; from memory.
  test.each([
    [0.25, -0.6744897501960817],
    [0.001, -3.090232306167814],
    [1e-20, -9.262340089798408],
  ])("Wichura 1988: %f", (probability, published) => {
    expect(Math.abs(normalQuantile(probability) / published - 1)).toBeLessThan(5e-16);
  });

  // Percentage points as tables print them; common practice, no source.
  test.each([
    [0.975, 1.959963984540054],
    [0.95, 1.644853626951473],
    [0.995, 2.575829303548901],
    [0.9, 1.2815515655446],
    [0.99, 2.326347874040841],
    [0.75, 0.674489750196082],
  ])("%f", (probability, published) => {
    // Half a unit of the 15th decimal, and 3 ulp.
    expect(Math.abs(normalQuantile(probability) - published)).toBeLessThan(5e-16 + 3 * Number.EPSILON * published);
  });
});

describe("beside 60 digits", () => {
  const random = seeded(26);
  const probabilities = [
    ...Array.from({ length: 600 }, () => random()),
    ...Array.from({ length: 100 }, () => 0.5 + (random() - 0.5) * 0.01),
    ...Array.from({ length: 200 }, () => 0.5 + (random() - 0.5) * 10 ** (-15 * random())),
    ...Array.from({ length: 200 }, () => 10 ** (-323 * random())),
    ...Array.from({ length: 400 }, () => 1 - 10 ** (-15.9 * random())),
    ...[0.1, 0.9, neighbour(0.1, -1), neighbour(0.9, 1), 5e-324, 1 - 2 ** -53, 0.5 - 2 ** -54, 0.5 + 2 ** -53],
  ].filter((p) => p > 0 && p < 1 && p !== 0.5);

  test("within 3 ulp", () => {
    const worst = probabilities.reduce(
      (most, p) => Math.max(most, quantileErrorInUlp(normalQuantile(p), exactDecimal(p))),
      0,
    );
    expect(probabilities.length).toBeGreaterThan(1400);
    expect(worst).toBeLessThan(3);
    expect(worst).toBeGreaterThan(0.5);
  });

  test("opposite at p and 1 - p, and rising", () => {
    for (const p of probabilities.filter((value) => 1 - (1 - value) === value)) {
      expect(normalQuantile(1 - p)).toBe(-normalQuantile(p));
    }
    const sorted = [...new Set(probabilities)].sort((a, b) => a - b);
    for (const [index, p] of sorted.entries()) {
      if (index > 0) expect(normalQuantile(p)).toBeGreaterThanOrEqual(normalQuantile(sorted[index - 1]!));
    }
  });

  test("the middle is 0, and the ends are finite", () => {
    expect(Object.is(normalQuantile(0.5), 0)).toBe(true);
    expect(normalQuantile(5e-324)).toBeGreaterThan(-38.5);
    expect(normalQuantile(1 - 2 ** -53)).toBeLessThan(8.3);
  });
});

test.each([0, 1, -0.1, 1.5, 95, Number.NaN, Number.POSITIVE_INFINITY, "0.5", undefined, null])(
  "the probability %s is refused",
  (probability) => {
    expect(faultsOf(() => normalQuantile(probability as number))).toMatchObject([
      { code: "numeric/outside-domain", path: ["probability"] },
    ]);
  },
);

describe("coverage factors", () => {
  // JCGM 100:2008 (the Guide to the Expression of Uncertainty in Measurement), table G.1; from memory.
  test.each([
    [0.6827, 1, 5e-4],
    [0.9, 1.645, 5e-4],
    [0.9545, 2, 5e-4],
    [0.99, 2.576, 5e-4],
    [0.9973, 3, 5e-4],
  ])("table G.1: %f", (coverage, published, rounding) => {
    expect(Math.abs(coverageFactor(coverage) - published)).toBeLessThanOrEqual(rounding);
  });

  test("table G.1 has 1.960 at 95 per cent, which is the quantile; what evaluators publish as 95 per cent is 2", () => {
    expect(Math.abs(normalQuantile(0.975) - 1.96)).toBeLessThan(5e-4);
    expect([0.95, 0.954, 0.9545].map(coverageFactor)).toEqual([2, 2, 2]);
    expect([0.68, 0.683, 0.6827].map(coverageFactor)).toEqual([1, 1, 1]);
    expect([0.997, 0.9973].map(coverageFactor)).toEqual([3, 3]);
  });

  test("the whole factors are the normal ones within the rounding of the coverage as stated", () => {
    for (const [coverage, digit] of [
      [0.6827, 5e-5],
      [0.683, 5e-4],
      [0.68, 5e-3],
      [0.9545, 5e-5],
      [0.954, 6e-4],
      [0.9973, 5e-5],
      [0.997, 5e-4],
    ] as const) {
      const factor = coverageFactor(coverage);
      const ends = [coverage - digit, coverage + digit].map((c) => normalQuantile(0.5 + c / 2));
      expect(ends[0]).toBeLessThan(factor);
      expect(ends[1]).toBeGreaterThan(factor);
    }
  });

  test("any other coverage is the normal distribution's, within 3 ulp", () => {
    for (const c of [1e-9, 0.1, 0.5, 0.6, 0.8, neighbour(0.8, 1), 0.85, 0.94, 0.951, 0.98, 1 - 1e-15]) {
      expect(quantileErrorInUlp(coverageFactor(c), exactDecimal(c).div(2).plus(0.5))).toBeLessThan(3);
    }
    // The probable error, half of all: 0.6745 sigma. Near 0 the density is 1/sqrt(2 pi).
    expect(coverageFactor(0.5)).toBeCloseTo(0.6744897501960817, 15);
    expect(Math.abs(coverageFactor(1e-300) / (1e-300 * Math.sqrt(Math.PI / 2)) - 1)).toBeLessThan(1e-15);
    expect(coverageFactor(5e-324)).toBe(5e-324);
  });

  test.each([
    [0, "uncertainty/invalid-coverage"],
    [1, "uncertainty/invalid-coverage"],
    [-0.5, "uncertainty/invalid-coverage"],
    [95, "uncertainty/invalid-coverage"],
    [Number.NaN, "input/not-finite"],
    ["0.95", "input/not-finite"],
    [undefined, "input/not-finite"],
  ])("the coverage %s is refused", (coverage, code) => {
    const faults = faultsOf(() => coverageFactor(coverage as number));
    expect(faults).toMatchObject([{ code, path: ["coverage"] }]);
    if (coverage === 95) expect(faults[0]?.hint).toBe("0.95 for 95 per cent");
  });
});
