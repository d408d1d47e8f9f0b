import fc from "fast-check";
import { describe, expect, test } from "vitest";
import type { HeatCapacityForm, PublishedInterval, PublishedSeries } from "../../src/heat-capacity/published-series.js";
import { exactPropertiesAt, readSeries } from "../../src/heat-capacity/read-series.js";
import { seriesProperties } from "../../src/heat-capacity/series-properties.js";
import { decimalOf, decimalToNumber, type ExactDecimal, subtractDecimals } from "../../src/numeric/exact-decimal.js";
import { bermanBrown, corundum, mineral } from "./minerals.js";
import { figure, randomSeries, temperaturesK } from "./random-series.js";

const at = (temperatureK: number) => ({ temperature: { value: temperatureK, unit: "K" } }) as const;

/** An invented fit from 100 K to 2000 K with H = 1000 J/mol and S = 10 J/mol/K at 100 K. */
function invented(form: HeatCapacityForm, coefficients: readonly number[]): PublishedSeries {
  return {
    kind: "series",
    form,
    intervals: [{ from: 100, to: 2000, coefficients, endsAt: "fit" }],
    anchor: { temperature: figure(100, "K"), enthalpy: figure(1000, "J/mol"), entropy: figure(10, "J/mol/K") },
  };
}

/** Cp, and the changes of H and S from 100 K to 400 K. */
function from100To400(series: PublishedSeries): [number, number, number] {
  const { heatCapacity, enthalpy, entropy } = seriesProperties(series, at(400));
  return [heatCapacity.value, enthalpy.value - 1000, entropy.value - 10];
}

const ln4 = 1.3862943611198906;

describe("each term by hand, from 100 K to 400 K, whose roots are 10 and 20", () => {
  // c T^n: Cp = c 400^n, H gains c (400^(n+1) - 100^(n+1))/(n+1), S gains c (400^n - 100^n)/n
  test.each<[HeatCapacityForm, string, number[], [number, number, number]]>([
    ["berman-brown", "k0", [20, 0, 0, 0], [20, 6000, 20 * ln4]],
    ["berman-brown", "k1 T^(-1/2)", [0, -200, 0, 0], [-10, -4000, -20]],
    ["berman-brown", "k2 T^-2", [0, 0, -1.6e6, 0], [-10, -12000, -75]],
    ["berman-brown", "k3 T^-3", [0, 0, 0, 6.4e8], [10, 30000, 210]],
    ["five-term", "a1", [20, 0, 0, 0, 0], [20, 6000, 20 * ln4]],
    ["five-term", "a2 T", [0, 0.01, 0, 0, 0], [4, 750, 3]],
    ["five-term", "a3 T^-2", [0, 0, -1.6e6, 0, 0], [-10, -12000, -75]],
    ["five-term", "a4 T^(-1/2)", [0, 0, 0, -200, 0], [-10, -4000, -20]],
    ["five-term", "a5 T^2", [0, 0, 0, 0, 1e-5], [1.6, 210, 0.75]],
    ["haas-fisher", "a", [20, 0, 0, 0, 0], [20, 6000, 20 * ln4]],
    ["haas-fisher", "2 b T", [0, 0.01, 0, 0, 0], [8, 1500, 6]],
    ["haas-fisher", "c T^-2", [0, 0, -1.6e6, 0, 0], [-10, -12000, -75]],
    ["haas-fisher", "f T^2", [0, 0, 0, 1e-5, 0], [1.6, 210, 0.75]],
    ["haas-fisher", "g T^(-1/2)", [0, 0, 0, 0, -200], [-10, -4000, -20]],
  ])("%s: %s", (form, _term, coefficients, expected) => {
    const [heatCapacity, enthalpy, entropy] = from100To400(invented(form, coefficients));
    expect(heatCapacity).toBeCloseTo(expected[0], 12);
    expect(enthalpy).toBeCloseTo(expected[1], 9);
    expect(entropy).toBeCloseTo(expected[2], 11);
  });

  test.each(["berman-brown", "five-term", "haas-fisher"] as const)("%s in calories is 4.184 times as much", (form) => {
    const coefficients = form === "berman-brown" ? [20, -200, -1.6e6, 6.4e8] : [20, 0.01, -1.6e6, 1e-5, 2e-5];
    const joules = from100To400(invented(form, coefficients));
    const calories = from100To400({ ...invented(form, coefficients), unit: "cal_th/mol/K" });
    calories.forEach((value, index) => {
      expect(value / joules[index]!).toBeCloseTo(4.184, 11);
    });
  });
});

describe("the forms say the same in other words", () => {
  test("a five-term fit is a Haas-Fisher fit of half the linear coefficient, the last two exchanged, bit by bit", () => {
    fc.assert(
      fc.property(randomSeries["haas-fisher"], temperaturesK, (fit, temperatureK) => {
        const [a, b, c, f, g] = fit.intervals[0]!.coefficients as [number, number, number, number, number];
        // twice a number of ten digits has eleven at most, which a double names exactly
        const coefficients = [a, 2 * b, c, g, f];
        const other: PublishedSeries = {
          ...fit,
          form: "five-term",
          intervals: [{ ...fit.intervals[0]!, coefficients }],
        };
        expect(seriesProperties(other, at(temperatureK))).toEqual(seriesProperties(fit, at(temperatureK)));
      }),
      { seed: 20261201, numRuns: 200 },
    );
  });

  test.each([
    ["berman-brown", [0, -0.5, -2, -3]],
    ["five-term", [0, 1, -2, -0.5, 2]],
  ] as const)("a %s fit is a polynomial, bit by bit", (form, powers) => {
    fc.assert(
      fc.property(randomSeries[form], temperaturesK, (fit, temperatureK) => {
        const polynomial: PublishedSeries = { ...fit, form: "polynomial", powers };
        expect(seriesProperties(polynomial, at(temperatureK))).toEqual(seriesProperties(fit, at(temperatureK)));
      }),
      { seed: 20261201, numRuns: 200 },
    );
  });
});

test("decimal shifts: the coefficients under the powers of ten of a heading", () => {
  // Berman (1988) heads his columns k1 x 10^-2, k2 x 10^-5, k3 x 10^-7 (recalled)
  const [interval] = bermanBrown.forsterite.intervals;
  const printed: PublishedSeries = {
    ...bermanBrown.forsterite,
    decimalShifts: [0, -2, -5, -7],
    intervals: [{ ...interval!, coefficients: [238.64, -20.013, 0, -11.624] }],
  };
  expect(seriesProperties(printed, at(1000))).toEqual(seriesProperties(bermanBrown.forsterite, at(1000)));
});

// Bulletin 1452 (1978) and Berman (1988) fitted the same measurements of corundum and forsterite; between the two fits
// lie 1 per cent of Cp and of its integrals, the error of the calorimetry (common practice, no source).
test.each([
  ["corundum", corundum, bermanBrown.corundum],
  ["forsterite", mineral("forsterite"), bermanBrown.forsterite],
] as const)("two forms agree on %s from 298.15 K to 1700 K", (_name, fiveTerm, other) => {
  const gains = (series: PublishedSeries, temperatureK: number): number[] => {
    const [here, start] = [temperatureK, 298.15].map((T) => seriesProperties(series, at(T)));
    return [
      here!.heatCapacity.value,
      here!.enthalpy.value - start!.enthalpy.value,
      here!.entropy.value - start!.entropy.value,
    ];
  };
  for (const temperatureK of [400, 600, 800, 1000, 1200, 1500, 1700]) {
    const expected = gains(fiveTerm, temperatureK);
    gains(other, temperatureK).forEach((value, index) => {
      expect(Math.abs(value / expected[index]! - 1)).toBeLessThan(0.01);
    });
  }
});

describe("intervals join exactly", () => {
  const forms: [HeatCapacityForm, number[], number[]][] = [
    ["berman-brown", [60, -300, -1.1e6, 7e7], [71, -210, 3e5, -2e7]],
    ["five-term", [81.1, 0.018, -1.8e5, -698.4, 5.4e-6], [57.9, 0.0093, 1.8e6, 12, -1e-7]],
    ["haas-fisher", [81.1, 0.009, -1.8e5, 5.4e-6, -698.4], [57.9, 0.0047, 1.8e6, -1e-7, 12]],
    ["maier-kelley", [46.9, 0.0343, -1.13e6], [60.3, 0.0081, 0]],
  ];

  test.each(forms)("%s: H and S go on, or jump by the enthalpy of transition, to 30 digits", (form, lower, upper) => {
    for (const [endsAt, jump] of [
      ["fit", 0],
      ["continuous", 0],
      ["first-order", 760],
    ] as const) {
      const intervals: PublishedInterval[] = [
        { from: 200, to: 800, coefficients: lower, endsAt },
        { from: 800, to: 1700, coefficients: upper, endsAt: "fit" },
      ];
      for (const anchorK of [298.15, 1200]) {
        const read = readSeries(
          { kind: "series", form, intervals },
          {
            anchor: { temperatureK: anchorK, enthalpy: decimalOf(-910700), entropy: decimalOf("41.46") },
            transitionEnthalpies: new Map([[800, decimalOf(760)]]),
          },
        );
        const [below, above] = read.intervals.map((interval) =>
          exactPropertiesAt({ ...read, intervals: [{ ...interval, fromK: 800, toK: 800 }] }, 800),
        );
        const change = (name: "enthalpy" | "entropy"): ExactDecimal => subtractDecimals(above![name], below![name]);
        expect(decimalToNumber(subtractDecimals(change("enthalpy"), decimalOf(jump)))).toBeCloseTo(0, 30);
        expect(decimalToNumber(subtractDecimals(change("entropy"), decimalOf(jump / 800)))).toBeCloseTo(0, 30);
      }
    }
  });
});
