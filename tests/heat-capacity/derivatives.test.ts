import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { absoluteTerms } from "../../src/heat-capacity/columns.js";
import { heatCapacityForms } from "../../src/heat-capacity/forms.js";
import { plannedSeries, planOfSeries } from "../../src/heat-capacity/planned-series.js";
import type { PublishedSeries } from "../../src/heat-capacity/published-series.js";
import { anchorOfFigures, exactPropertiesAt, readSeries } from "../../src/heat-capacity/read-series.js";
import {
  addDecimals,
  decimalOf,
  decimalToNumber,
  multiplyDecimals,
  negateDecimal,
  subtractDecimals,
} from "../../src/numeric/exact-decimal.js";
import { randomSeries } from "./random-series.js";

/** Multiples of the step, so that the neighbours are decimals that a double prints in full. */
const step = 1 / 1024;
const temperaturesK = fc.integer({ min: 201 * 1024, max: 2999 * 1024 }).map((steps) => steps * step);

/**
 * Slope of a function by central difference, in 40 digits. For a term T^n it is off by n (n - 1) (n - 2)/6 (step/T)^2 of
 * the term over T: at |n| = 22 and 200 K 4.6e-8 / T.
 */
const differenceError = 5e-8;

function readOf(fit: PublishedSeries) {
  return readSeries(fit, fit.anchor === undefined ? {} : { anchor: anchorOfFigures(fit.anchor) });
}

describe.each(heatCapacityForms)("%s", (form) => {
  test("dH/dT = Cp, dS/dT = Cp/T and dG/dT = -S", () => {
    fc.assert(
      fc.property(randomSeries[form], temperaturesK, (fit, temperatureK) => {
        const read = readOf(fit);
        const [low, middle, high] = [temperatureK - step, temperatureK, temperatureK + step].map((T) => {
          const { heatCapacity, enthalpy, entropy } = exactPropertiesAt(read, T);
          const gibbsEnergy = addDecimals(enthalpy, negateDecimal(multiplyDecimals(decimalOf(T), entropy)));
          return { heatCapacity, enthalpy, entropy, gibbsEnergy };
        });
        const slope = (name: "enthalpy" | "entropy" | "gibbsEnergy"): number =>
          decimalToNumber(subtractDecimals(high![name], low![name])) / (2 * step);
        const { lowest } = planOfSeries(plannedSeries(read), "refuse");
        const allowed = (name: "enthalpy" | "entropy" | "gibbsEnergy"): number =>
          (differenceError * absoluteTerms(lowest[name], temperatureK, Math.log(temperatureK))) / temperatureK;
        const heatCapacity = decimalToNumber(middle!.heatCapacity);
        expect(Math.abs(slope("enthalpy") - heatCapacity)).toBeLessThanOrEqual(allowed("enthalpy"));
        expect(Math.abs(slope("entropy") - heatCapacity / temperatureK)).toBeLessThanOrEqual(allowed("entropy"));
        expect(Math.abs(slope("gibbsEnergy") + decimalToNumber(middle!.entropy))).toBeLessThanOrEqual(
          allowed("gibbsEnergy"),
        );
      }),
      { seed: 20261201, numRuns: 150 },
    );
  });
});
