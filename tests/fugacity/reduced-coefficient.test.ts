import type { Decimal as SharedDecimal } from "decimal.js";
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { virial } from "../../src/fugacity/virial.js";
import type { PolarTerm, VirialCorrelation } from "../../src/fugacity/virial-options.js";
import { Decimal, exact } from "./exact.js";

type Terms = readonly (readonly [coefficient: string, exponent: string])[];

/** f0 and f1 as printed, in powers of Tr. */
const printed: Readonly<Record<VirialCorrelation, readonly [Terms, Terms]>> = {
  abbott: [
    [
      ["0.083", "0"],
      ["-0.422", "-1.6"],
    ],
    [
      ["0.139", "0"],
      ["-0.172", "-4.2"],
    ],
  ],
  "pitzer-curl": [
    [
      ["0.1445", "0"],
      ["-0.330", "-1"],
      ["-0.1385", "-2"],
      ["-0.0121", "-3"],
    ],
    [
      ["0.073", "0"],
      ["0.46", "-1"],
      ["-0.50", "-2"],
      ["-0.097", "-3"],
      ["-0.0073", "-8"],
    ],
  ],
  tsonopoulos: [
    [
      ["0.1445", "0"],
      ["-0.330", "-1"],
      ["-0.1385", "-2"],
      ["-0.0121", "-3"],
      ["-0.000607", "-8"],
    ],
    [
      ["0.0637", "0"],
      ["0.331", "-2"],
      ["-0.423", "-3"],
      ["-0.008", "-8"],
    ],
  ],
};

const correlations = ["abbott", "pitzer-curl", "tsonopoulos"] as const;
const criticalK = fc.double({ min: 5, max: 700, noNaN: true });
const criticalPa = fc.double({ min: 1e5, max: 2.5e7, noNaN: true });
const omega = fc.double({ min: -0.4, max: 1, noNaN: true });
const reducedTemperature = fc.double({ min: 0.4, max: 20, noNaN: true });
const polarTerm = fc.record({
  a: fc.double({ min: -0.05, max: 0.1, noNaN: true }),
  b: fc.double({ min: 0, max: 0.1, noNaN: true }),
});
const seeded = { seed: 20261201, numRuns: 2000 };

/** B and T dB/dT in m3/mol at 1 Pa, where p B = B; and the sums of the absolute terms of both. */
function thirtyDigits(
  correlation: VirialCorrelation,
  [tc, pc, w, t]: readonly [number, number, number, number],
  polar: PolarTerm | undefined,
) {
  const reduced = exact(t).div(exact(tc));
  const scale = new Decimal("8.31446261815324").mul(exact(tc)).div(exact(pc));
  const [simple, correction] = printed[correlation];
  const terms: [SharedDecimal, SharedDecimal][] = [];
  // One logarithm for both of Abbott's powers: decimals are slow.
  const logarithm = correlation === "abbott" ? reduced.ln() : undefined;
  const power = (exponent: string) => logarithm?.mul(exponent).exp() ?? reduced.pow(exponent);
  const add = (factor: SharedDecimal, exponent: string) => {
    terms.push([factor.mul(scale).mul(power(exponent)), new Decimal(exponent)]);
  };
  for (const [coefficient, exponent] of simple) add(new Decimal(coefficient), exponent);
  for (const [coefficient, exponent] of correction) add(new Decimal(coefficient).mul(exact(w)), exponent);
  if (polar !== undefined) {
    add(exact(polar.a), "-6");
    add(exact(polar.b).neg(), "-8");
  }
  const total = (values: SharedDecimal[]) => values.reduce((sum, value) => sum.add(value), new Decimal(0));
  return {
    value: total(terms.map(([term]) => term)),
    slope: total(terms.map(([term, exponent]) => term.mul(exponent))),
    absolute: total(terms.map(([term]) => term.abs())),
    absoluteSlope: total(terms.map(([term, exponent]) => term.mul(exponent).abs())),
  };
}

describe.each(correlations)("%s", (correlation) => {
  const polarOrNot = correlation === "tsonopoulos" ? fc.option(polarTerm, { nil: undefined }) : fc.constant(undefined);

  test("B and dB/dT against 30-digit decimals: within 4 and 6 eps of the absolute terms, as the docstring says", () => {
    fc.assert(
      fc.property(criticalK, criticalPa, omega, reducedTemperature, polarOrNot, (tc, pc, w, tr, polar) => {
        const t = tc * tr;
        const options = { correlation, outsideValidity: "continue", ...(polar && { polar: { X: polar } }) } as const;
        const component = { label: "X", critical: { temperatureK: tc, pressurePa: pc, acentricFactor: w } };
        const { departure } = virial(options).mixture([component]).state(t, 1, [1]);
        const oracle = thirtyDigits(correlation, [tc, pc, w, t], polar);
        const error = exact(departure.gibbsEnergy).sub(oracle.value).abs().div(oracle.absolute);
        expect(error.toNumber() / Number.EPSILON).toBeLessThan(4);
        // At 1 Pa the entropy is -dB/dT, so that -T S is T dB/dT.
        const slope = exact(departure.entropy).mul(exact(t)).neg();
        const slopeError = slope.sub(oracle.slope).abs().div(oracle.absoluteSlope);
        expect(slopeError.toNumber() / Number.EPSILON).toBeLessThan(6);
      }),
      seeded,
    );
  });

  test("dB/dT is the derivative of B, against central differences", () => {
    fc.assert(
      fc.property(criticalK, criticalPa, omega, reducedTemperature, polarOrNot, (tc, pc, w, tr, polar) => {
        const options = { correlation, outsideValidity: "continue", ...(polar && { polar: { X: polar } }) } as const;
        const component = { label: "X", critical: { temperatureK: tc, pressurePa: pc, acentricFactor: w } };
        const mixture = virial(options).mixture([component]);
        const at = (temperatureK: number) => mixture.state(temperatureK, 1e-3, [1]).departure;
        const t = tc * tr;
        const step = t * 1e-4;
        const difference = (at(t + step).gibbsEnergy - at(t - step).gibbsEnergy) / (2 * step);
        const scale = thirtyDigits(correlation, [tc, pc, w, t], polar).absoluteSlope.toNumber() / t / 1e3;
        // Central differences err by (1e-4)^2 n^2/6 of a term of power n, and by rounding over the step.
        expect(Math.abs(difference + at(t).entropy) / scale).toBeLessThan(3e-7);
      }),
      { ...seeded, numRuns: 300 },
    );
  });
});

test("Pitzer-Curl and Tsonopoulos share f0 but for the term in Tr^-8", () => {
  const component = { label: "X", critical: { temperatureK: 150, pressurePa: 5e6, acentricFactor: 0 } };
  const at = (correlation: VirialCorrelation) =>
    virial({ correlation }).mixture([component]).state(120, 1, [1]).departure.gibbsEnergy;
  const scale = (8.31446261815324 * 150) / 5e6;
  expect((at("pitzer-curl") - at("tsonopoulos")) / scale).toBeCloseTo(0.000607 / 0.8 ** 8, 15);
});
