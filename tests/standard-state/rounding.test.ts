import fc from "fast-check";
import { expect, test } from "vitest";
import {
  electrodePotentialAtStandardPressure,
  formationEnthalpyAtReference,
  formationEntropyAtStandardPressure,
  formationGibbsEnergyAtStandardPressure,
  gibbsFunctionAtReference,
  idealGasEntropyAtStandardPressure,
  idealGasGibbsEnergyAtStandardPressure,
  lnKAtStandardPressure,
  lnKFromGibbsFunction,
  lnKOnScale,
  standardGibbsEnergyOnScale,
} from "../../src/standard-state/index.js";
import { binary, Decimal } from "../heat-capacity/oracle.js";

/*
 * Each function against its equation in decimals of 40 digits and more, in units of eps times the sum of the absolute
 * terms: what the docstrings state.
 */

type Terms = readonly (typeof Decimal.prototype)[];

/** The rest of a product of doubles next to the smallest is no double: such values count as zero. */
const energies = fc.double({ min: -1e6, max: 1e6, noNaN: true }).map((value) => (Math.abs(value) < 1e-200 ? 0 : value));

const samples = fc.record({
  value: energies,
  other: energies,
  temperatureK: fc.double({ min: 1, max: 6000, noNaN: true }),
  fromPa: fc.double({ min: -46, max: 46, noNaN: true }).map(Math.exp),
  // One pressure in three lies near the other, where the logarithm cancels.
  ratio: fc.oneof(
    { weight: 2, arbitrary: fc.double({ min: -46, max: 46, noNaN: true }).map(Math.exp) },
    { weight: 1, arbitrary: fc.double({ min: 0.99, max: 1.02, noNaN: true }) },
  ),
});
type Sample = typeof samples extends fc.Arbitrary<infer T> ? T : never;

const R = binary(8.31446261815324);
const F = binary(96485.33212331001);
const pascal = (value: number) => ({ value, unit: "Pa" }) as const;
const kelvin = (value: number) => ({ value, unit: "K" }) as const;
const joules = (value: number) => ({ value, unit: "J/mol" }) as const;
const entropies = (value: number) => ({ value, unit: "J/mol/K" }) as const;
const water = { molarMass: { value: 0.018015, unit: "kg/mol" }, density: { value: 997.045, unit: "kg/m3" } } as const;

function expectWithin(multiple: number, evaluate: (sample: Sample) => readonly [computed: number, terms: Terms]): void {
  fc.assert(
    fc.property(samples, (sample) => {
      const [computed, terms] = evaluate(sample);
      const exact = terms.reduce((sum, term) => sum.plus(term), new Decimal(0));
      const scale = terms.reduce((sum, term) => sum.plus(term.abs()), new Decimal(0));
      const error = binary(computed).minus(exact).abs();
      expect(error.lte(scale.times(multiple * Number.EPSILON))).toBe(true);
    }),
    { seed: 20261205, numRuns: 500 },
  );
}

const stepOf = ({ fromPa, ratio }: Sample) => ({ from: pascal(fromPa), to: pascal(fromPa * ratio) });
const lnOf = ({ fromPa, ratio }: Sample) =>
  binary(fromPa * ratio)
    .div(binary(fromPa))
    .ln();

test("entropy of an ideal gas: 2 eps", () => {
  expectWithin(2, (sample) => [
    idealGasEntropyAtStandardPressure(entropies(sample.value), stepOf(sample)).value,
    [binary(sample.value), R.times(lnOf(sample)).neg()],
  ]);
});

test("Gibbs energy of an ideal gas: 3 eps", () => {
  expectWithin(3, (sample) => [
    idealGasGibbsEnergyAtStandardPressure(joules(sample.value), {
      ...stepOf(sample),
      temperature: kelvin(sample.temperatureK),
    }).value,
    [binary(sample.value), R.times(binary(sample.temperatureK)).times(lnOf(sample))],
  ]);
});

test("formation: 4 eps of the Gibbs energy with its volume work, 3 eps of the entropy", () => {
  expectWithin(4, (sample) => [
    formationGibbsEnergyAtStandardPressure(joules(sample.value), "CO3^2-(aq)", {
      ...stepOf(sample),
      temperature: kelvin(sample.temperatureK),
      molarVolume: { value: -3.9e-6, unit: "m3/mol" },
    }).value,
    [
      binary(sample.value),
      R.times(binary(sample.temperatureK)).times(lnOf(sample)).times(-2.5),
      binary(-3.9e-6).times(binary(sample.fromPa * sample.ratio)),
      binary(3.9e-6).times(binary(sample.fromPa)),
    ],
  ]);
  expectWithin(3, (sample) => [
    formationEntropyAtStandardPressure(entropies(sample.value), "CO3^2-(aq)", stepOf(sample)).value,
    [binary(sample.value), R.times(lnOf(sample)).times(2.5)],
  ]);
});

test("ln K at another standard pressure: 2 eps", () => {
  expectWithin(2, (sample) => [
    lnKAtStandardPressure(sample.value / 1e4, { "N2(g)": -1, "H2(g)": -3, "NH3(g)": 2 }, stepOf(sample)),
    [binary(sample.value / 1e4), lnOf(sample).times(2)],
  ]);
});

test("electrode potential: 4 eps", () => {
  expectWithin(4, (sample) => [
    electrodePotentialAtStandardPressure(
      { value: sample.value / 1e6, unit: "V" },
      { "O2(g)": -1, "H^+(aq)": -4, "e^-": -4, "H2O(l)": 2 },
      { ...stepOf(sample), temperature: kelvin(sample.temperatureK) },
    ).value,
    [binary(sample.value / 1e6), R.times(binary(sample.temperatureK)).times(lnOf(sample)).times(0.75).div(F)],
  ]);
});

test("change of scale: 4 eps of the Gibbs energy and of ln K", () => {
  // ln(rho/1000) lies near zero; ln M does not.
  const lnOfScales = {
    "mole-fraction": binary(0.018015).ln(),
    concentration: binary(997.045).div(1000).ln(),
  } as const;
  for (const to of ["mole-fraction", "concentration"] as const) {
    expectWithin(4, (sample) => [
      standardGibbsEnergyOnScale(joules(sample.value), {
        temperature: kelvin(sample.temperatureK),
        from: "molality",
        to,
        solvent: water,
      }).value,
      [binary(sample.value), R.times(binary(sample.temperatureK)).times(lnOfScales[to]).neg()],
    ]);
    expectWithin(4, (sample) => [
      lnKOnScale(
        sample.value / 1e4,
        { "AgCl(cr)": -1, "Ag^+(aq)": 1, "Cl^-(aq)": 1 },
        { from: "molality", to, solvent: water },
      ),
      [binary(sample.value / 1e4), lnOfScales[to].times(2)],
    ]);
  }
});

test("enthalpy references: one rounding of the formation enthalpy, 2 eps of the Gibbs function, 4 eps of ln K", () => {
  expectWithin(0.5, (sample) => [
    formationEnthalpyAtReference(joules(sample.value), {
      enthalpyAbove0K: joules(sample.other),
      elements: [{ amount: 1.5, enthalpyAbove0K: joules(sample.temperatureK) }],
      from: "0 K",
      to: "298.15 K",
    }).value,
    [binary(sample.value), binary(sample.other), binary(sample.temperatureK).times(-1.5)],
  ]);
  expectWithin(2, (sample) => [
    gibbsFunctionAtReference(entropies(sample.value), {
      temperature: kelvin(sample.temperatureK),
      enthalpyAbove0K: joules(sample.other),
      from: "298.15 K",
      to: "0 K",
    }).value,
    [binary(sample.value), binary(sample.other).div(binary(sample.temperatureK)).neg()],
  ]);
  expectWithin(4, (sample) => [
    lnKFromGibbsFunction({
      temperature: kelvin(sample.temperatureK),
      reactionEnthalpy: joules(sample.other),
      reactionGibbsFunction: entropies(sample.value),
    }),
    [binary(sample.value).div(R), binary(sample.other).div(binary(sample.temperatureK)).div(R).neg()],
  ]);
});
