import { describe, expect, test } from "vitest";
import { seriesProperties } from "../../src/heat-capacity/series-properties.js";
import { faultsOf } from "../errors/faults-of.js";
import { figure } from "../heat-capacity/random-series.js";

/** Anything, as plain JavaScript may pass it. */
// biome-ignore lint/suspicious/noExplicitAny: the subject of this table is what types forbid
type Anything = any;

const anchor = { temperature: figure(300, "K"), enthalpy: figure(0, "J/mol"), entropy: figure(1, "J/mol/K") };

function fitOf(form: string, coefficients: unknown, parts: object = {}): Anything {
  return { kind: "series", form, intervals: [{ from: 200, to: 1000, coefficients, endsAt: "fit" }], ...parts };
}

const gibbs = (parts: object = {}): Anything =>
  fitOf("gibbs-energy", [1, 2, 3, 4, 5, 6], { powers: [2, 3, -1], ...parts });
const bermanBrown = (parts: object = {}): Anything => fitOf("berman-brown", [60, -300, 0, 0], { anchor, ...parts });
const fiveTerm = (parts: object = {}): Anything => fitOf("five-term", [60, 0, 0, 0, 0], { anchor, ...parts });
const haasFisher = (parts: object = {}): Anything => fitOf("haas-fisher", [60, 0, 0, 0, 0], { anchor, ...parts });
const withCoefficients = (fit: Anything, coefficients: unknown): Anything => ({
  ...fit,
  intervals: [{ ...fit.intervals[0], coefficients }],
});

test("the good fits are read", () => {
  for (const fit of [gibbs(), gibbs({ powers: [0.5, -0.5, 20] }), bermanBrown(), fiveTerm(), haasFisher()]) {
    expect(seriesProperties(fit, { temperature: { value: 500, unit: "K" } }).heatCapacity.unit).toBe("J/mol/K");
  }
  expect(() =>
    seriesProperties(fitOf("gibbs-energy", [1, 2, 3], { powers: [] }), { temperature: { value: 500, unit: "K" } }),
  ).not.toThrow();
});

const rows: [string, unknown, string, string?][] = [
  ["no powers", gibbs({ powers: undefined }), "input/missing at series.powers"],
  ["the power 0", gibbs({ powers: [2, 3, 0] }), "heat-capacity/unknown-form at series.powers", "but 0 and 1"],
  ["the power 1", gibbs({ powers: [1, 3, -1] }), "heat-capacity/unknown-form at series.powers", "but 0 and 1"],
  ["the power -0", gibbs({ powers: [2, 3, -0] }), "heat-capacity/unknown-form at series.powers"],
  ["a power of a third", gibbs({ powers: [2, 3, 1 / 3] }), "heat-capacity/unknown-form at series.powers"],
  ["a power too high", gibbs({ powers: [2, 3, 20.5] }), "heat-capacity/unknown-form at series.powers"],
  ["a power too low", gibbs({ powers: [2, 3, -21] }), "heat-capacity/unknown-form at series.powers"],
  ["a power twice", gibbs({ powers: [2, 2, -1] }), "heat-capacity/unknown-form at series.powers"],
  ["a power of NaN", gibbs({ powers: [2, 3, Number.NaN] }), "input/not-finite at series.powers.2"],
  ["powers as a text", gibbs({ powers: "2, 3, -1" }), "input/not-an-array at series.powers"],
  [
    "a power more than coefficients",
    gibbs({ powers: [2, 3, -1, 7] }),
    "heat-capacity/coefficient-count at series.intervals.0.coefficients",
    "7",
  ],
  [
    "fewer coefficients than a, b, c",
    withCoefficients(gibbs({ powers: [] }), [1, 2]),
    "heat-capacity/coefficient-count at series.intervals.0.coefficients",
    "3",
  ],
  [
    "a second interval without one power",
    gibbs({
      intervals: [
        { from: 200, to: 500, coefficients: [1, 2, 3, 4, 5, 6], endsAt: "fit" },
        { from: 500, to: 900, coefficients: [1, 2, 3, 4, 5], endsAt: "fit" },
      ],
    }),
    "heat-capacity/coefficient-count at series.intervals.1.coefficients",
    "6",
  ],
  [
    "decimal shifts for the powers alone",
    gibbs({ decimalShifts: [3, 6, -5] }),
    "heat-capacity/coefficient-count at series.decimalShifts",
  ],
  ["an anchor beside constants", gibbs({ anchor }), "input/unknown-key at series.anchor"],
  ["a unit beside J/mol", gibbs({ unit: "cal_th/mol/K" }), "input/unknown-key at series.unit"],
  ["a gas constant", gibbs({ gasConstant: 8.314 }), "input/unknown-key at series.gasConstant"],
  [
    "a coefficient as a text",
    withCoefficients(gibbs(), ["1", 2, 3, 4, 5, 6]),
    "input/not-finite at series.intervals.0.coefficients.0",
  ],
  ["terms that overflow", withCoefficients(gibbs(), [0, 0, 0, 1e299, 0, 0]), "heat-capacity/overflow at "],
  [
    "a key of the prototype",
    JSON.parse('{ "__proto__": 1, "form": "gibbs-energy" }'),
    "input/forbidden-key at series.__proto__",
  ],
  [
    "berman-brown: three coefficients",
    withCoefficients(bermanBrown(), [1, 2, 3]),
    "heat-capacity/coefficient-count at series.intervals.0.coefficients",
    "4",
  ],
  ["berman-brown: powers", bermanBrown({ powers: [0, -0.5, -2, -3] }), "input/unknown-key at series.powers"],
  ["berman-brown: no anchor", bermanBrown({ anchor: undefined }), "heat-capacity/no-anchor at series.anchor"],
  ["berman-brown: a gas constant", bermanBrown({ gasConstant: 8.314 }), "input/unknown-key at series.gasConstant"],
  [
    "five-term: four coefficients",
    withCoefficients(fiveTerm(), [1, 2, 3, 4]),
    "heat-capacity/coefficient-count at series.intervals.0.coefficients",
    "5",
  ],
  ["five-term: powers", fiveTerm({ powers: [0, 1, -2, -0.5, 2] }), "input/unknown-key at series.powers"],
  ["five-term: no anchor", fiveTerm({ anchor: undefined }), "heat-capacity/no-anchor at series.anchor"],
  ["five-term: another unit", fiveTerm({ unit: "kJ/mol/K" }), "input/unknown-option at series.unit"],
  [
    "haas-fisher: six coefficients",
    withCoefficients(haasFisher(), [1, 2, 3, 4, 5, 6]),
    "heat-capacity/coefficient-count at series.intervals.0.coefficients",
    "5",
  ],
  ["haas-fisher: powers", haasFisher({ powers: [0] }), "input/unknown-key at series.powers"],
  ["haas-fisher: no anchor", haasFisher({ anchor: undefined }), "heat-capacity/no-anchor at series.anchor"],
  ["a form by half its name", fitOf("gibbs", [1, 2, 3]), "heat-capacity/unknown-form at series.form", "gibbs-energy"],
];

describe("fits in the forms of minerals and metals", () => {
  test.each(rows)("%s is refused", (_name, fit, place, expected) => {
    const faults = faultsOf(() => seriesProperties(fit as Anything, { temperature: { value: 500, unit: "K" } }));
    const found = faults.find((fault) => `${fault.code} at ${fault.path.join(".")}` === place);
    expect(faults.map((fault) => `${fault.code} at ${fault.path.join(".")}`)).toContain(place);
    if (expected !== undefined) expect(found?.expected).toContain(expected);
    for (const { message } of faults) {
      expect(message.length).toBeGreaterThan(0);
      expect(message.length).toBeLessThanOrEqual(500);
      expect(message).not.toContain("\n");
    }
  });

  test("missing powers are one fault, not a wrong number of coefficients as well", () => {
    const faults = faultsOf(() =>
      seriesProperties(gibbs({ powers: undefined }), { temperature: { value: 500, unit: "K" } }),
    );
    expect(faults.map(({ code }) => code)).toEqual(["input/missing"]);
  });

  test("all faults at once", () => {
    const wrong = gibbs({ powers: [2, 1], unit: "J/mol/K", anchor, gasConstant: 8.314, decimalShifts: [1] });
    const faults = faultsOf(() => seriesProperties(wrong, { temperature: { value: 500, unit: "K" } }));
    expect(faults.map((fault) => `${fault.code} at ${fault.path.join(".")}`)).toEqual([
      "heat-capacity/unknown-form at series.powers",
      "input/unknown-key at series.unit",
      "input/unknown-key at series.anchor",
      "input/unknown-key at series.gasConstant",
      "heat-capacity/coefficient-count at series.decimalShifts",
      "heat-capacity/coefficient-count at series.intervals.0.coefficients",
    ]);
  });
});

test("no result is NaN, infinite or a negative zero", () => {
  const zeros = withCoefficients(gibbs(), [0, 0, 0, 0, 0, 0]);
  const negative = withCoefficients(gibbs(), [-0, -0, -0, -0, -0, -0]);
  const fits = [gibbs(), zeros, negative, bermanBrown(), fiveTerm(), haasFisher()];
  for (const fit of fits) {
    for (const outsideRange of ["constant-heat-capacity", "continue-fit"] as const) {
      for (const value of [1, 1.0000001, 199, 200, 298.15, 1000, 99_999, 100_000]) {
        const { heatCapacity, enthalpy, entropy, gibbsEnergy, roundingBounds } = seriesProperties(fit, {
          temperature: { value, unit: "K" },
          outsideRange,
        });
        const numbers = [heatCapacity.value, enthalpy.value, entropy.value, gibbsEnergy.value];
        for (const number of [...numbers, ...Object.values(roundingBounds)]) {
          expect(Number.isFinite(number)).toBe(true);
          expect(Object.is(number, -0)).toBe(false);
        }
      }
    }
  }
});
