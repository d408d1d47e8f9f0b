import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { plannedSeries, planOfSeries } from "../../src/heat-capacity/planned-series.js";
import type { PublishedInterval, PublishedSeries } from "../../src/heat-capacity/published-series.js";
import { exactPropertiesAt, readSeries } from "../../src/heat-capacity/read-series.js";
import { seriesProperties } from "../../src/heat-capacity/series-properties.js";
import { decimalToNumber } from "../../src/numeric/exact-decimal.js";
import { reaction } from "../../src/reaction/reaction.js";
import { temperaturesAtGibbsEnergy } from "../../src/reaction/temperatures.js";
import { collectionOf, fitted, recordOf } from "../species/records.js";
import { type Metal, metals } from "./metals.js";
import { randomSeries } from "./random-series.js";

const at = (temperatureK: number) => ({ temperature: { value: temperatureK, unit: "K" } }) as const;

const interval = (
  coefficients: readonly number[],
  from = 200,
  to = 3000,
  endsAt: PublishedInterval["endsAt"] = "fit",
): PublishedInterval => ({ from, to, coefficients, endsAt });

const series = (powers: readonly number[], ...intervals: PublishedInterval[]): PublishedSeries => ({
  kind: "series",
  form: "gibbs-energy",
  powers,
  intervals,
});

const metal = (symbol: string): Metal => metals.find((entry) => entry.symbol === symbol)!;

/** Cp, H, S and G at 400 K, where ln T is the only number that is no decimal. */
function at400(powers: readonly number[], coefficients: readonly number[]) {
  const { heatCapacity, enthalpy, entropy, gibbsEnergy } = seriesProperties(
    series(powers, interval(coefficients)),
    at(400),
  );
  return [heatCapacity.value, enthalpy.value, entropy.value, gibbsEnergy.value];
}

describe("each term by hand, at 400 K", () => {
  // [Cp, H, S, G] from S = -dG/dT, H = G + TS, Cp = T dS/dT
  test.each<[string, number[], number[], [number, number, number, number]]>([
    ["a", [], [1000, 0, 0], [0, 1000, 0, 1000]],
    ["b T", [], [0, 3, 0], [0, 0, -3, 1200]],
    ["d T^2", [2], [0, 0, 0, 0.01], [-8, -1600, -8, 1600]],
    ["d T^3", [3], [0, 0, 0, 1e-6], [-0.96, -128, -0.48, 64]],
    ["d / T", [-1], [0, 0, 0, 80000], [-1, 400, 0.5, 200]],
    ["d T^7", [7], [0, 0, 0, 1e-17], [-1.72032, -98.304, -0.28672, 16.384]],
    ["d T^-9", [-9], [0, 0, 0, 2.62144e25], [-22.5, 1000, 2.25, 100]],
    ["d T^(1/2)", [0.5], [0, 0, 0, 100], [1.25, 1000, -2.5, 2000]],
    ["d T^(-1/2)", [-0.5], [0, 0, 0, 4000], [-0.375, 300, 0.25, 200]],
    ["d T^(3/2)", [1.5], [0, 0, 0, 0.1], [-1.5, -400, -3, 800]],
  ])("%s", (_term, powers, coefficients, expected) => {
    const found = at400(powers, coefficients);
    // a function of one term is within 4 eps of it
    found.forEach((value, index) => {
      expect(Math.abs(value - expected[index]!)).toBeLessThanOrEqual(4 * Number.EPSILON * Math.abs(expected[index]!));
    });
  });

  test("c T ln T: Cp = -c, H = -c T, S = -c - c ln T", () => {
    const logarithm = 5.991464547107982; // ln 400
    const [heatCapacity, enthalpy, entropy, gibbsEnergy] = at400([], [0, 0, -24]);
    expect([heatCapacity, enthalpy]).toEqual([24, 9600]);
    expect(entropy).toBeCloseTo(24 + 24 * logarithm, 12);
    expect(gibbsEnergy).toBeCloseTo(-24 * 400 * logarithm, 9);
  });
});

test("what is evaluated for G are the printed coefficients themselves", () => {
  fc.assert(
    fc.property(randomSeries["gibbs-energy"], (fit) => {
      const printed = fit.intervals[0]!.coefficients.map((value, index) =>
        withoutShift(value, fit.decimalShifts?.[index] ?? 0),
      );
      const { gibbsEnergy } = planOfSeries(plannedSeries(readSeries(fit)), "refuse").lowest;
      const { constant, linear, linearLogarithm, square, cube, fourth, fifth } = gibbsEnergy;
      expect([constant, linear, linearLogarithm]).toEqual(printed.slice(0, 3));
      const named = new Map([
        [2, square],
        [3, cube],
        [4, fourth],
        [5, fifth],
        [-1, gibbsEnergy.inverse],
        [-2, gibbsEnergy.inverseSquare],
        [-3, gibbsEnergy.inverseCube],
        [0.5, gibbsEnergy.root],
        [-0.5, gibbsEnergy.inverseRoot],
        ...gibbsEnergy.extras.map(({ exponent, coefficient }) => [exponent, coefficient] as const),
      ]);
      expect(fit.powers!.map((power) => named.get(power) ?? 0)).toEqual(printed.slice(3));
    }),
    { seed: 20261201, numRuns: 300 },
  );
});

/** The double nearest to value * 10^-shift, read as a numeral. */
function withoutShift(value: number, shift: number): number {
  const [digits, exponent = "0"] = String(value).split("e");
  return Number(`${digits}e${Number(exponent) - shift}`);
}

describe("several intervals", () => {
  const first = interval([1000, 5, -20, -0.001], 200, 500);
  const second = interval([-500, 8, -21, 0], 500, 3000);

  test.each(["fit", "first-order", "continuous"] as const)(
    "each has its constants, whatever ends the first: %s",
    (end) => {
      const both = series([2], { ...first, endsAt: end }, second);
      for (const [temperatureK, alone] of [
        [400, first],
        [500, first],
        [500.001, second],
        [2000, second],
      ] as const) {
        const expected = seriesProperties(series([2], alone), at(temperatureK));
        expect(seriesProperties(both, at(temperatureK))).toEqual(expected);
      }
    },
  );

  // a and b are printed to 0.001 J/mol and 1e-6 J/mol/K, c to 1e-7, the coefficients of T^2 and T^3 to 1e-9 and 1e-12
  test.each([
    ["Al", 700],
    ["Sn", 250],
  ] as const)("the intervals of %s meet at %d K as closely as their digits allow", (symbol, breakK) => {
    const intervals = readSeries(metal(symbol).liquid).intervals;
    const index = intervals.findIndex(({ toK }) => toK === breakK);
    const [below, above] = [index, index + 1].map((place) => {
      const part = { intervals: [{ ...intervals[place]!, fromK: breakK, toK: breakK }], heatCapacityKnown: true };
      const { enthalpy, entropy } = exactPropertiesAt(part, breakK);
      return decimalToNumber(enthalpy) - breakK * decimalToNumber(entropy);
    });
    const digits =
      1e-3 + 1e-6 * breakK + 1e-7 * breakK * Math.log(breakK) + 1e-9 * breakK ** 2 + 1e-12 * breakK ** 3 + 1 / breakK;
    expect(Math.abs(below! - above!)).toBeLessThan(digits);
  });

  test("a power that an interval lacks has the coefficient 0 there, and changes nothing", () => {
    const short = seriesProperties(series([2], interval([1000, 5, -20, -0.001])), at(700));
    expect(seriesProperties(series([2, -9, 7], interval([1000, 5, -20, -0.001, 0, 0])), at(700))).toEqual(short);
  });

  test("the order of the powers does not show", () => {
    const straight = seriesProperties(series([2, 3, -1], interval([1000, 5, -20, -0.001, 1e-7, 5e4])), at(700));
    const turned = seriesProperties(series([-1, 2, 3], interval([1000, 5, -20, 5e4, -0.001, 1e-7])), at(700));
    expect(turned).toEqual(straight);
  });
});

test("decimal shifts: b x 10^3 under the heading, as any other coefficient", () => {
  const shifted = { ...series([2], interval([1, 5000, -2, -1])), decimalShifts: [-3, 3, -1, 3] };
  const plain = series([2], interval([1000, 5, -20, -0.001]));
  expect(seriesProperties(shifted, at(700))).toEqual(seriesProperties(plain, at(700)));
});

// Found here, not recalled: 8 of 8 enthalpies of fusion are whole numbers of calories, as if evaluated in them.
test.each([
  ["Al", 2560],
  ["Cu", 3170],
  ["Ag", 2700],
  ["Zn", 1750],
  ["Pb", 1141],
  ["Sn", 1680],
  ["Si", 12000],
  ["Mg", 2026],
] as const)("the enthalpy of fusion of %s is %d cal_th/mol", (symbol, calories) => {
  const { solid, liquid, meltingPointK } = metal(symbol);
  const [melt, crystal] = [liquid, solid].map((phase) => seriesProperties(phase, at(meltingPointK)));
  const fusion = melt!.enthalpy.value - crystal!.enthalpy.value;
  // a of either phase to 0.001 J/mol, the term in T^7, which H holds 6 times, and the melting point to 0.01 K
  const seventh = liquid.intervals[0]!.coefficients[3 + liquid.powers!.indexOf(7)]!;
  const digits =
    0.001 +
    6 * halfOfLastDigit(seventh) * meltingPointK ** 7 +
    0.005 * Math.abs(melt!.heatCapacity.value - crystal!.heatCapacity.value);
  expect(Math.abs(fusion / 4.184 - calories)).toBeLessThan(digits / 4.184);
});

/** Half a unit of the last digit of a number written as 1.234e-20. */
function halfOfLastDigit(value: number): number {
  const [digits, exponent] = String(value).split("e");
  return Number(`0.5e${Number(exponent) - (digits!.split(".")[1]?.length ?? 0)}`);
}

test("two records in this form melt where their Gibbs energies are equal, through the reaction", () => {
  const { solid, liquid, meltingPointK } = metal("Al");
  const data = collectionOf(
    recordOf("Al(cr)", { gibbsFunction: fitted(solid) }),
    recordOf("Al(l)", { gibbsFunction: fitted(liquid) }),
  );
  const [melting, ...more] = temperaturesAtGibbsEnergy(reaction("Al(cr) = Al(l)", data), {
    between: [
      { value: 400, unit: "K" },
      { value: 2000, unit: "K" },
    ],
  });
  expect(melting?.value).toBeCloseTo(meltingPointK, 2);
  expect(more).toEqual([]);
});

test("continued beyond its range", () => {
  const fit = series([2], interval([1000, 5, -20, -0.001], 300, 600));
  const policy = (outsideRange: "constant-heat-capacity" | "continue-fit") =>
    seriesProperties(fit, { ...at(800), outsideRange }).heatCapacity.value;
  expect(policy("continue-fit")).toBeCloseTo(20 + 0.002 * 800, 13);
  expect(policy("constant-heat-capacity")).toBeCloseTo(20 + 0.002 * 600, 13);
});
