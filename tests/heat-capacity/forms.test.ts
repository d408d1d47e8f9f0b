import { describe, expect, test } from "vitest";
import { heatCapacityForms } from "../../src/heat-capacity/forms.js";
import type { PublishedSeries } from "../../src/heat-capacity/published-series.js";
import { seriesProperties } from "../../src/heat-capacity/series-properties.js";
import { figure } from "./random-series.js";

const at = (temperatureK: number) => ({ temperature: { value: temperatureK, unit: "K" } }) as const;

test("the forms are listed in alphabetical order", () => {
  expect(heatCapacityForms).toEqual([
    "berman-brown",
    "five-term",
    "gibbs-energy",
    "haas-fisher",
    "maier-kelley",
    "nine-coefficient",
    "polynomial",
    "seven-coefficient",
    "shomate",
  ]);
});

// Every figure below is recalled from memory; the tolerance is half a unit of the last printed digit, or as stated.
describe("each form gives the figures printed beside its coefficients", () => {
  // M. W. Chase, NIST-JANAF Thermochemical Tables, 4th ed. (1998): the equation fitted to its table of N2, 100 to 500 K.
  const nitrogenByShomate: PublishedSeries = {
    kind: "series",
    form: "shomate",
    intervals: [
      {
        from: 100,
        to: 500,
        coefficients: [28.98641, 1.853978, -9.647459, 16.63537, 0.000117, -8.671914, 226.4168, 0],
        endsAt: "fit",
      },
    ],
  };

  test("shomate: nitrogen", () => {
    const properties = seriesProperties(nitrogenByShomate, at(298.15));
    expect(properties.heatCapacity.value).toBeCloseTo(29.12, 2); // table: 29.124
    expect(properties.entropy.value).toBeCloseTo(191.61, 2); // table: 191.609
    expect(Math.abs(properties.enthalpy.value)).toBeLessThan(5); // the table's zero; H is printed to 1 J/mol
  });

  test("shomate: the eighth coefficient, H at 298.15 K, changes nothing", () => {
    const [interval] = nitrogenByShomate.intervals;
    const withoutH: PublishedSeries = {
      ...nitrogenByShomate,
      intervals: [{ ...interval!, coefficients: interval!.coefficients.slice(0, 7) }],
    };
    expect(seriesProperties(withoutH, at(400))).toEqual(seriesProperties(nitrogenByShomate, at(400)));
  });

  test("seven-coefficient: argon", () => {
    // B. J. McBride, M. J. Zehe, S. Gordon, NASA/TP-2002-211556 (2002): S at 298.15 K is 154.845, H is 0.
    const properties = seriesProperties(
      {
        kind: "series",
        form: "seven-coefficient",
        gasConstant: 8.31451,
        intervals: [{ from: 200, to: 6000, coefficients: [2.5, 0, 0, 0, 0, -745.375, 4.37967491], endsAt: "fit" }],
      },
      at(298.15),
    );
    expect(properties.heatCapacity.value).toBe(20.786275); // 5/2 R, exactly in decimals
    expect(properties.enthalpy.value).toBeCloseTo(0, 8);
    expect(properties.entropy.value).toBeCloseTo(154.845, 2);
  });

  test("nine-coefficient: nitrogen", () => {
    // The same report: Cp at 298.15 K is 29.124, S is 191.610, H is 0.
    const properties = seriesProperties(
      {
        kind: "series",
        form: "nine-coefficient",
        gasConstant: 8.31451,
        intervals: [
          {
            from: 200,
            to: 1000,
            coefficients: [
              22103.71497, -381.846182, 6.08273836, -0.00853091441, 1.384646189e-5, -9.62579362e-9, 2.519705809e-12,
              710.846086, -10.76003744,
            ],
            endsAt: "fit",
          },
        ],
      },
      at(298.15),
    );
    expect(properties.heatCapacity.value).toBeCloseTo(29.124, 3);
    expect(properties.entropy.value).toBeCloseTo(191.61, 2);
    expect(Math.abs(properties.enthalpy.value)).toBeLessThan(0.01);
  });

  test("maier-kelley: quartz, with the powers of ten of its heading, in calories", () => {
    // K. K. Kelley, Bulletin 584, U.S. Bureau of Mines (1960): Cp = 11.22 + 8.20e-3 T - 2.70e5 T^-2 cal/mol/K, and the
    // table of heat contents (cal/mol) it reproduces within its 0.3 per cent. S and H at 298.15 K are of the test.
    const quartz: PublishedSeries = {
      kind: "series",
      form: "maier-kelley",
      unit: "cal_th/mol/K",
      decimalShifts: [0, 3, -5],
      intervals: [{ from: 298, to: 848, coefficients: [11.22, 8.2, -2.7], endsAt: "first-order" }],
      anchor: {
        temperature: figure(298.15, "K"),
        enthalpy: figure(0, "kJ/mol"),
        entropy: figure(10, "cal_th/mol/K"),
      },
    };
    const properties = seriesProperties(quartz, at(298.15));
    // R. A. Robie, B. S. Hemingway, USGS Bulletin 2131 (1995): 44.59, which the old equation meets within 0.5 per cent.
    expect(Math.abs(properties.heatCapacity.value - 44.59)).toBeLessThan(0.22);
    expect(properties.enthalpy.value).toBeCloseTo(0, 9);
    expect(properties.entropy.value).toBeCloseTo(41.84, 12);
    // By hand: 11.22 x 501.85 + 4.1e-3 (800^2 - 298.15^2) + 2.70e5 (1/800 - 1/298.15) = 7322.0 cal/mol
    expect(seriesProperties(quartz, at(800)).enthalpy.value / 4.184).toBeCloseTo(7322.0, 0);
  });

  test("polynomial: calcite", () => {
    // R. A. Robie, B. S. Hemingway, USGS Bulletin 2131 (1995): Cp at 298.15 K is 83.5, S is 91.7.
    const calcite: PublishedSeries = {
      kind: "series",
      form: "polynomial",
      powers: [0, 1, -2],
      intervals: [{ from: 298.15, to: 1200, coefficients: [99.715, 0.02692, -2157600], endsAt: "fit" }],
      anchor: {
        temperature: figure(298.15, "K"),
        enthalpy: figure(-1207.4, "kJ/mol"),
        entropy: figure(91.7, "J/mol/K"),
      },
    };
    expect(seriesProperties(calcite, at(298.15)).heatCapacity.value).toBeCloseTo(83.5, 1);
    expect(seriesProperties(calcite, at(298.15)).enthalpy.value).toBeCloseTo(-1207400, 6);
    expect(seriesProperties(calcite, at(298.15)).entropy.value).toBeCloseTo(91.7, 12);
    // By hand: 99.715 + 26.92 - 2.1576
    expect(seriesProperties(calcite, at(1000)).heatCapacity.value).toBeCloseTo(124.4774, 9);
  });

  test("polynomial: a reciprocal root, coefficients in kJ/mol/K and with powers of ten", () => {
    // T. J. B. Holland, R. Powell's form, J. Metamorph. Geol. 29, 333 (2011): a + bT + c/T^2 + d/T^(1/2), lime.
    // Cox, Wagman, Medvedev, CODATA Key Values (1989), S at 298.15 K of CaO: 38.1.
    const lime: PublishedSeries = {
      kind: "series",
      form: "polynomial",
      powers: [0, 1, -2, -0.5],
      decimalShifts: [-3, 2, -3, -3],
      intervals: [{ from: 298.15, to: 1700, coefficients: [0.0524, 0.3673, -750.7, -0.051], endsAt: "fit" }],
      anchor: {
        temperature: figure(298.15, "K"),
        enthalpy: figure(-634.92, "kJ/mol"),
        entropy: figure(38.1, "J/mol/K"),
      },
    };
    // By hand at 400 K: 52.4 + 1.4692 - 4.691875 - 51/20
    expect(seriesProperties(lime, at(400)).heatCapacity.value).toBeCloseTo(46.627325, 10);
    // R. A. Robie, B. S. Hemingway (1995): 42.1 to 42.8 at 298.15 K; the fit is smooth to about 1 per cent.
    expect(Math.abs(seriesProperties(lime, at(298.15)).heatCapacity.value - 42.4)).toBeLessThan(0.6);
  });
});

test("a polynomial of c T^-1 integrates to logarithms", () => {
  const series: PublishedSeries = {
    kind: "series",
    form: "polynomial",
    powers: [-1],
    intervals: [{ from: 100, to: 1000, coefficients: [500], endsAt: "fit" }],
    anchor: { temperature: figure(200, "K"), enthalpy: figure(0, "J/mol"), entropy: figure(0, "J/mol/K") },
  };
  const properties = seriesProperties(series, at(400));
  expect(properties.heatCapacity.value).toBe(1.25);
  expect(properties.enthalpy.value).toBeCloseTo(500 * 0.6931471805599453, 11);
  expect(properties.entropy.value).toBeCloseTo(500 / 200 - 500 / 400, 13);
});
