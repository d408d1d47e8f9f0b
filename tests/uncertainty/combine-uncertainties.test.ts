import { Decimal } from "decimal.js";
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { combineUncertainties, type UncertaintyContribution } from "../../src/uncertainty/combine-uncertainties.js";
import { placesOf } from "../errors/faults-of.js";
import { exactDecimal } from "../numeric/ulp.js";

const P = Decimal.clone({ precision: 60, toExpNeg: -9e15, toExpPos: 9e15 });

function of(datum: string, sensitivity: number, standardUncertainty?: number): UncertaintyContribution {
  return { datum, sensitivity, ...(standardUncertainty === undefined ? {} : { standardUncertainty }) };
}

describe("JCGM 100:2008 (the Guide to the Expression of Uncertainty in Measurement), from memory", () => {
  test("5.2.2, example: ten resistors of 1000 ohm calibrated with one standard, 100 mohm each, in series: 1 ohm", () => {
    const resistors = Array.from({ length: 10 }, () => of("standard resistor", 1, 0.1));
    // Exactly ten times the double 0.1, rounded once.
    expect(combineUncertainties(resistors).standardUncertainty).toBe(1);
  });

  test("5.2.2, example: as if they were independent, 0.32 ohm", () => {
    const resistors = Array.from({ length: 10 }, (_value, index) => of(`resistor ${index}`, 1, 0.1));
    // Printed to two figures.
    expect(Math.abs(combineUncertainties(resistors).standardUncertainty - 0.32)).toBeLessThanOrEqual(0.005);
  });

  test("H.1, end gauge: 25, 9.7, 2.9 and 16.6 nm combine to 32 nm", () => {
    const { standardUncertainty, data } = combineUncertainties([
      of("length of the standard", 1, 25),
      of("difference", 1, 9.7),
      of("difference of the expansion coefficients", 1, 2.9),
      of("difference of the temperatures", 1, 16.6),
    ]);
    expect(Math.abs(standardUncertainty - 32)).toBeLessThanOrEqual(0.5);
    expect(data.map(({ varianceShare = 0 }) => Math.round(100 * varianceShare))).toEqual([62, 9, 1, 27]);
  });
});

describe("one datum in several places", () => {
  test("adds with its signs, and cancels exactly", () => {
    const third = 1 / 3;
    const result = combineUncertainties([
      of("a", 2, 0.5),
      of("b", third, 7),
      of("a", -3, 0.5),
      of("b", -third, 7),
      of("c", 0, 3),
    ]);
    expect(result).toEqual({
      standardUncertainty: 0.5,
      isLowerBound: false,
      data: [
        { datum: "a", sensitivity: -1, component: -0.5, varianceShare: 1 },
        { datum: "b", sensitivity: 0, component: 0, varianceShare: 0 },
        { datum: "c", sensitivity: 0, component: 0, varianceShare: 0 },
      ],
    });
  });

  test("sensitivities that nearly cancel keep their digits", () => {
    const { standardUncertainty } = combineUncertainties([of("a", 1e16, 1), of("a", 1, 1), of("a", -1e16, 1)]);
    expect(standardUncertainty).toBe(1);
  });
});

describe("unknown uncertainties", () => {
  test("make the result a lower bound", () => {
    expect(combineUncertainties([of("a", 3, 1), of("b", 1), of("c", -4, 1)])).toEqual({
      standardUncertainty: 5,
      isLowerBound: true,
      data: [
        { datum: "a", sensitivity: 3, component: 3, varianceShare: 0.36 },
        { datum: "b", sensitivity: 1 },
        { datum: "c", sensitivity: -4, component: -4, varianceShare: 0.64 },
      ],
    });
  });

  test("do not where they cancel", () => {
    expect(combineUncertainties([of("a", 0.1), of("a", 0.2), of("a", -0.1), of("a", -0.2)])).toEqual({
      standardUncertainty: 0,
      isLowerBound: false,
      data: [{ datum: "a", sensitivity: 0, component: 0, varianceShare: 0 }],
    });
    expect(combineUncertainties([])).toEqual({ standardUncertainty: 0, isLowerBound: false, data: [] });
  });
});

describe("beside 60 digits", () => {
  const size = fc
    .tuple(fc.double({ min: 1, max: 10, noNaN: true }), fc.integer({ min: -50, max: 50 }))
    .map(([mantissa, exponent]) => mantissa * 10 ** exponent);
  const entries = fc.array(
    fc.record({
      datum: fc.integer({ min: 0, max: 6 }),
      sensitivity: fc.tuple(size, fc.constantFrom(1, -1)).map(([s, sign]) => s * sign),
    }),
    { minLength: 1, maxLength: 30 },
  );
  const cases = fc.tuple(entries, fc.array(size, { minLength: 7, maxLength: 7 }), fc.constantFrom(1, 1e-150, 1e150));

  test("within 2 eps, the same bits in any order", () => {
    let worst = 0;
    fc.assert(
      fc.property(cases, ([terms, uncertainties, scale]) => {
        const contributions = terms.map(({ datum, sensitivity }) =>
          of(`datum ${datum}`, sensitivity, uncertainties[datum]! * scale),
        );
        const result = combineUncertainties(contributions);
        const sums = new Map<string, Decimal>();
        for (const { datum, sensitivity, standardUncertainty = 0 } of contributions) {
          const part = new P(exactDecimal(sensitivity)).times(exactDecimal(standardUncertainty));
          sums.set(datum, (sums.get(datum) ?? new P(0)).plus(part));
        }
        const exact = [...sums.values()].reduce((sum, part) => sum.plus(part.times(part)), new P(0)).sqrt();
        const error = new P(exactDecimal(result.standardUncertainty)).div(exact).minus(1).abs();
        worst = Math.max(worst, error.toNumber() / Number.EPSILON);
        expect(combineUncertainties([...contributions].reverse()).standardUncertainty).toBe(result.standardUncertainty);
        const shares = result.data.reduce((sum, { varianceShare = 0 }) => sum + varianceShare, 0);
        expect(Math.abs(shares - 1)).toBeLessThan(1e-13);
      }),
      { seed: 20261201, numRuns: 2000 },
    );
    expect(worst).toBeLessThan(2);
    expect(worst).toBeGreaterThan(0.3);
  });

  test("scaling by a power of two scales the result, also at the ends of the doubles", () => {
    const terms = [of("a", 3, 1), of("b", -1.7, 0.3), of("a", 0.1, 1)];
    const { standardUncertainty } = combineUncertainties(terms);
    for (const exponent of [-1000, -700, -401, -399, 399, 401, 700, 1020]) {
      const scaled = terms.map(({ datum, sensitivity, standardUncertainty: u }) =>
        of(datum, sensitivity, u! * 2 ** exponent),
      );
      expect(combineUncertainties(scaled).standardUncertainty).toBe(standardUncertainty * 2 ** exponent);
    }
    expect(combineUncertainties([of("a", 1, 5e-324)]).standardUncertainty).toBe(5e-324);
  });
});

describe("what is refused", () => {
  test.each<[string, unknown, string[]]>([
    ["nothing", undefined, ["input/not-an-array at contributions"]],
    ["an object", {}, ["input/not-an-array at contributions"]],
    ["a number", [1], ["input/not-an-object at contributions.0"]],
    ["a hole", new Array(1), ["input/not-an-object at contributions.0"]],
    ["10,001 lines", Array(10_001).fill(of("a", 1, 1)), ["input/too-large at contributions"]],
    [
      "missing members",
      [{}],
      ["input/missing at contributions.0.datum", "input/missing at contributions.0.sensitivity"],
    ],
    [
      "wrong members, all at once",
      [
        { datum: "", sensitivity: "1", standardUncertainty: -1 },
        { ...of("b", Number.NaN), unit: "J" },
      ],
      [
        "input/not-a-string at contributions.0.datum",
        "input/not-finite at contributions.0.sensitivity",
        "quantity/negative-uncertainty at contributions.0.standardUncertainty",
        "input/unknown-key at contributions.1.unit",
        "input/not-finite at contributions.1.sensitivity",
      ],
    ],
    [
      "an infinite uncertainty",
      [of("a", 1, Number.POSITIVE_INFINITY)],
      ["input/not-finite at contributions.0.standardUncertainty"],
    ],
    [
      "two uncertainties of one datum",
      [of("a", 1, 1), of("b", 1, 1), of("a", 1, 2), of("b", 1)],
      [
        "uncertainty/inconsistent-datum at contributions.2.standardUncertainty",
        "uncertainty/inconsistent-datum at contributions.3.standardUncertainty",
      ],
    ],
    ["a product beyond the doubles", [of("a", 1e200, 1e200)], ["uncertainty/overflow at contributions"]],
    ["a sum beyond the doubles", [of("a", 1.7e308, 1), of("a", 1.7e308, 1)], ["uncertainty/overflow at contributions"]],
    [
      "a root beyond the doubles",
      [of("a", 1.7e308, 1), of("b", 1.7e308, 1)],
      ["uncertainty/overflow at contributions"],
    ],
    [
      "a prototype",
      [JSON.parse('{ "__proto__": 1, "datum": "a", "sensitivity": 1 }')],
      ["input/forbidden-key at contributions.0.__proto__"],
    ],
  ])("%s", (_name, value, places) => {
    expect(placesOf(() => combineUncertainties(value as UncertaintyContribution[]))).toEqual(places);
  });

  test("a datum named like a prototype is a datum", () => {
    expect(combineUncertainties([of("__proto__", 1, 2), of("constructor", 1, 0)]).standardUncertainty).toBe(2);
  });
});
