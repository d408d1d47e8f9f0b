import { Decimal as Shared } from "decimal.js";
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { referenceData } from "../../src/data/reference-data.js";
import { evaluateToDigits, type PreciseReactionProperties } from "../../src/precision/index.js";
import { reaction, standardReactionProperties } from "../../src/reaction/index.js";
import { faultsOf } from "../errors/faults-of.js";
import { binary, Decimal, type ExactValues, functionNames, valuesOf } from "../heat-capacity/oracle.js";
import { figure } from "../heat-capacity/random-series.js";
import { exactValues, type RandomTerm, randomTerms, reactionOf } from "../reaction/random-reactions.js";
import { collectionOf, polynomialRecord, recordOf } from "../species/records.js";

const kelvin = (value: number) => ({ temperature: { value, unit: "K" } }) as const;
const synthesis = reaction("N2 + 3 H2 = 2 NH3", referenceData);

/** Quarters of a kelvin: the same number in decimals and in binary. */
const quarters = fc.integer({ min: 800, max: 12_000 }).map((n) => n / 4);

/** The same decimal to as many significant digits, whatever way it is written. */
function expectSame(digits: string, exact: Shared, count: number): void {
  const error = new Decimal(digits).minus(exact).abs();
  expect(error.lte(exact.abs().times(`1e-${count - 1}`))).toBe(true);
  expect(
    digits
      .replace(/e.*$/, "")
      .replace(/[-.]/g, "")
      .replace(/^0+(?=[1-9])/, ""),
  ).toHaveLength(count);
}

test("random reactions agree with the oracle at 25 to 35 digits, and the error of the double is right", () => {
  fc.assert(
    fc.property(randomTerms, quarters, fc.integer({ min: 25, max: 35 }), (terms, temperatureK, count) => {
      const precise = evaluateToDigits(reactionOf(terms), { ...kelvin(temperatureK), digits: count });
      const exact = exactValues(terms, temperatureK);
      const lnK = exact.gibbsEnergy.div(new Decimal("8.31446261815324").times(temperatureK)).negated();
      for (const name of functionNames) {
        expectSame(precise[name]!.digits, exact[name], count);
        const error = binary(precise[name]!.double).minus(exact[name]).toNumber();
        expect(precise[name]!.errorOfDouble).toBeCloseTo(error, 25);
      }
      expectSame(precise.lnK.digits, lnK, count);
      expectSame(precise.log10K.digits, lnK.div(Decimal.ln(10)), count);
    }),
    { seed: 20261201, numRuns: 50 },
  );
});

describe("at 60 digits", () => {
  const Wide = Decimal.clone({ precision: 100 });

  test("a seven-coefficient pair, worked by hand in 100 digits", () => {
    // W(g) = W(l) with Cp/R of 5/2 and 3 + 1e-3 T
    const fitOf = (coefficients: number[]) =>
      ({
        kind: "series",
        form: "seven-coefficient",
        gasConstant: 8.31451,
        intervals: [{ from: 200, to: 3000, coefficients, endsAt: "fit" }],
      }) as const;
    const [gas, liquid] = [fitOf([2.5, 0, 0, 0, 0, -745.375, 4.37967491]), fitOf([3, 1e-3, 0, 0, 0, -800.25, 1.125])];
    const terms: RandomTerm[] = [
      { label: "W(g)", numerator: -1, denominator: 1, series: gas },
      { label: "W(l)", numerator: 1, denominator: 1, series: liquid },
    ];
    const precise = evaluateToDigits(reactionOf(terms), { ...kelvin(512.5), digits: 60 });
    const T = new Wide("512.5");
    const R = new Wide("8.31451");
    const enthalpy = R.times(new Wide("0.5").times(T).plus(T.pow(2).times("0.0005")).minus("54.875"));
    const entropy = R.times(new Wide("0.5").times(T.ln()).plus(T.times("0.001")).minus("3.25467491"));
    expect(precise.enthalpy.digits).toBe(enthalpy.toPrecision(60));
    expect(precise.entropy.digits).toBe(entropy.toPrecision(60));
    expect(precise.gibbsEnergy.digits).toBe(enthalpy.minus(T.times(entropy)).toPrecision(60));
    expect(precise.heatCapacity?.digits).toBe(R.times("1.0125").toPrecision(60));
  });

  test("more digits go on where fewer end", () => {
    const short = evaluateToDigits(synthesis, { ...kelvin(700), digits: 30 });
    const long = evaluateToDigits(synthesis, { ...kelvin(700), digits: 200 });
    for (const name of [...functionNames, "lnK", "log10K"] as const) {
      expect(new Wide(long[name]!.digits).toPrecision(30)).toBe(short[name]!.digits);
    }
  });
});

test("the doubles are those of standardReactionProperties, the units coherent", () => {
  const precise = evaluateToDigits(synthesis, { ...kelvin(700), digits: 20 });
  const properties = standardReactionProperties(synthesis, kelvin(700));
  for (const name of functionNames) {
    expect(precise[name]).toMatchObject({ double: properties[name]!.value, unit: properties[name]!.unit });
  }
  expect([precise.lnK, precise.log10K]).toMatchObject([
    { double: properties.lnK, unit: "1" },
    { double: properties.log10K, unit: "1" },
  ]);
});

test("one digit", () => {
  expect(evaluateToDigits(synthesis, { ...kelvin(700), digits: 1 }).gibbsEnergy.digits).toBe("5e+4");
});

describe("sums that cancel", () => {
  test("to zero exactly give zeros, though a third is no decimal", () => {
    const subject = reaction(
      "⅓ C3(g) + 2/3 C3(l) = 1/7 C3(cr) + 6/7 C3(am)",
      collectionOf(
        ...["C3(g)", "C3(l)", "C3(cr)", "C3(am)"].map((label) => polynomialRecord(label, 300, 30, [10, 0.01])),
      ),
    );
    const precise = evaluateToDigits(subject, { ...kelvin(500), digits: 20 });
    for (const name of [...functionNames, "lnK", "log10K"] as const) {
      expect(Number(precise[name]!.digits)).toBe(0);
      expect(precise[name]!.digits.startsWith("-")).toBe(false);
      expect(precise[name]!.errorOfDouble).toBe(0);
    }
  });

  test("all but to zero keep their digits", () => {
    const phaseWith = (constant: number) =>
      recordOf(`C2(${constant === 0 ? "g" : "l"})`, {
        formationEnthalpy: figure(1e6 + constant, "J/mol"),
        standardEntropy: figure(100, "J/mol/K"),
      });
    const subject = reaction("1/3 C2(g) = 1/3 C2(l)", collectionOf(phaseWith(0), phaseWith(1e-9)));
    const precise = evaluateToDigits(subject, { ...kelvin(298.15), digits: 15 });
    // The double 1e6 + 1e-9 is printed 1000000.000000001.
    expect(precise.enthalpy.digits).toBe("3.33333333333333e-10");
    expect(precise.gibbsEnergy.digits).toBe("3.33333333333333e-10");
    expect(precise).not.toHaveProperty("heatCapacity");
  });
});

test("a shared decimal constructor is neither used nor changed", () => {
  const before = [Shared.precision, Shared.rounding, Shared.maxE, Shared.toExpNeg];
  const expected: PreciseReactionProperties = evaluateToDigits(synthesis, { ...kelvin(700), digits: 40 });
  expect([Shared.precision, Shared.rounding, Shared.maxE, Shared.toExpNeg]).toEqual(before);
  try {
    Shared.set({ precision: 3, rounding: 0, toExpNeg: 0, toExpPos: 0, maxE: 5, minE: -5 });
    expect(evaluateToDigits(synthesis, { ...kelvin(700), digits: 40 })).toEqual(expected);
  } finally {
    Shared.set({ defaults: true });
  }
});

test.each<[string, unknown, string]>([
  ["no conditions", undefined, "input/not-an-object at "],
  ["no digits", kelvin(700), "input/missing at digits"],
  ["no temperature", { digits: 5 }, "input/missing at temperature"],
  ["zero digits", { ...kelvin(700), digits: 0 }, "precision/digits at digits"],
  ["201 digits", { ...kelvin(700), digits: 201 }, "precision/digits at digits"],
  ["half a digit", { ...kelvin(700), digits: 1.5 }, "precision/digits at digits"],
  ["digits as a text", { ...kelvin(700), digits: "30" }, "precision/digits at digits"],
  ["a bare temperature", { temperature: 700, digits: 30 }, "quantity/not-a-quantity at temperature"],
  ["a policy", { ...kelvin(700), digits: 30, outsideRange: "continue-fit" }, "input/unknown-key at outsideRange"],
  ["outside a range", { ...kelvin(100), digits: 30 }, "species/outside-range at temperature"],
])("%s is refused", (_name, conditions, place) => {
  const [fault] = faultsOf(() => evaluateToDigits(synthesis, conditions as never));
  expect(`${fault?.code} at ${fault?.path.join(".")}`).toBe(place);
});

test("the oracle itself: H - T S of one fit by hand", () => {
  const series = {
    kind: "series",
    form: "maier-kelley",
    intervals: [{ from: 200, to: 900, coefficients: [20, 0, 0], endsAt: "fit" }],
    anchor: { temperature: figure(300, "K"), enthalpy: figure(0, "J/mol"), entropy: figure(0, "J/mol/K") },
  } as const;
  const values: ExactValues = valuesOf(series, series.intervals[0], new Decimal(600));
  expect(values.enthalpy.toNumber()).toBe(6000);
  expect(values.entropy.toNumber()).toBeCloseTo(20 * Math.LN2, 13);
});
