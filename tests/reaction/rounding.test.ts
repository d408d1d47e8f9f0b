import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { referenceData } from "../../src/data/reference-data.js";
import type { PublishedSeries } from "../../src/heat-capacity/published-series.js";
import { evaluateToDigits } from "../../src/precision/evaluate-to-digits.js";
import {
  type Reaction,
  reaction,
  standardReactionProperties,
  standardReactionRoundingBound,
} from "../../src/reaction/index.js";
import { binary, type ExactValues, functionNames } from "../heat-capacity/oracle.js";
import { randomSeries, temperaturesK } from "../heat-capacity/random-series.js";
import { exactValues, randomTerms, reactionOf } from "./random-reactions.js";

/** The worst error over the returned bound, which is 4 eps times the sum of the absolute terms of the merged series. */
function worstShare(subject: Reaction, exact: ExactValues, temperatureK: number): number {
  const conditions = { temperature: { value: temperatureK, unit: "K" } } as const;
  const properties = standardReactionProperties(subject, conditions);
  const shares = functionNames.map((name) => {
    const error = binary(properties[name]!.value).minus(exact[name]).abs();
    return error.isZero() ? 0 : error.div(standardReactionRoundingBound(subject, name, conditions)).toNumber();
  });
  return Math.max(...shares);
}

describe("standard properties are within 4 eps of the sum of the absolute terms", () => {
  test("of random reactions of every form", () => {
    fc.assert(
      fc.property(randomTerms, temperaturesK, (terms, temperatureK) => {
        expect(worstShare(reactionOf(terms), exactValues(terms, temperatureK), temperatureK)).toBeLessThanOrEqual(1);
      }),
      { seed: 20261201, numRuns: 200 },
    );
  });

  const perturbed = fc
    .tuple(
      fc.oneof(...Object.values(randomSeries)),
      fc.nat(8),
      fc.integer({ min: -9, max: 9 }).filter((n) => n !== 0),
    )
    .map(([series, place, digits]) => [series, nudged(series, place, digits)] as const);

  test("of two species that differ in a last digit only", () => {
    fc.assert(
      fc.property(perturbed, temperaturesK, ([series, other], temperatureK) => {
        const change = [
          { label: "C2(g)", numerator: -1, denominator: 1, series },
          { label: "C2(l)", numerator: 1, denominator: 1, series: other },
        ];
        expect(worstShare(reactionOf(change), exactValues(change, temperatureK), temperatureK)).toBeLessThanOrEqual(1);
        const mixture = [
          { label: "C2(g)", numerator: -1, denominator: 1, series },
          { label: "C3(l)", numerator: -1, denominator: 1, series: other },
          { label: "C4(cr)", numerator: 5, denominator: 4, series },
        ];
        expect(worstShare(reactionOf(mixture), exactValues(mixture, temperatureK), temperatureK)).toBeLessThanOrEqual(
          1,
        );
      }),
      { seed: 20261202, numRuns: 150 },
    );
  });

  test("of reactions of the reference data, against decimals", () => {
    const equations = [
      "N2 + 3 H2 = 2 NH3",
      "CO + H2O(g) = CO2 + H2",
      "CH4 + 2 O2 = CO2 + 2 H2O(g)",
      "2 SO2 + O2 = 2 SO3",
    ];
    const reactions = equations.map((text) => reaction(text, referenceData));
    fc.assert(
      fc.property(fc.constantFrom(...reactions), fc.integer({ min: 2000, max: 60000 }), (subject, tenths) => {
        // Quarters of a kelvin are the same in decimals and in binary.
        const conditions = { temperature: { value: Math.round((tenths / 10) * 4) / 4, unit: "K" } } as const;
        const precise = evaluateToDigits(subject, { ...conditions, digits: 25 });
        for (const name of functionNames) {
          const bound = standardReactionRoundingBound(subject, name, conditions);
          expect(Math.abs(precise[name]!.errorOfDouble)).toBeLessThanOrEqual(bound);
        }
      }),
      { seed: 20261203, numRuns: 150 },
    );
  });
});

/** A fit with a few units added to the last printed digit of one coefficient. */
function nudged(series: PublishedSeries, place: number, digits: number): PublishedSeries {
  const [interval] = series.intervals;
  const at = place % interval!.coefficients.length;
  const coefficients = interval!.coefficients.map((value, index) =>
    index === at ? Number((value * (1 + digits * 1e-9)).toPrecision(12)) : value,
  );
  return { ...series, intervals: [{ ...interval!, coefficients }] };
}
