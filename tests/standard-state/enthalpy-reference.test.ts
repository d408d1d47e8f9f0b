import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { CO2_g, H2O_g, referenceData } from "../../src/data/index.js";
import { type MolarEnergy, quantity } from "../../src/quantity/quantity.js";
import { reaction } from "../../src/reaction/reaction.js";
import { standardReactionProperties } from "../../src/reaction/standard-reaction.js";
import { findSpecies } from "../../src/species/collection.js";
import { standardProperties } from "../../src/species/standard-properties.js";
import {
  convertEnthalpyReference,
  type EnthalpyReference,
  formationEnthalpyAtReference,
  formationEnthalpyAtZeroKelvin,
  formationIncrements,
  gibbsFunctionAtReference,
  lnKFromGibbsFunction,
} from "../../src/standard-state/index.js";
import { placesOf } from "../errors/faults-of.js";
import { figure } from "../heat-capacity/random-series.js";
import { referenceSubjects } from "../properties/reference-states.js";
import { recordOf } from "../species/records.js";

const eps = Number.EPSILON;
const joules = (value: number): MolarEnergy => ({ value, unit: "J/mol" });
const energies = fc.integer({ min: -1_000_000_000, max: 1_000_000_000 }).map((value) => value / 1000);
const increments = fc.integer({ min: 0, max: 50_000_000 }).map((value) => value / 1000);
const references: readonly EnthalpyReference[] = ["0 K", "298.15 K"];

describe("enthalpies of formation by value", () => {
  test("there and back gives what was", () => {
    fc.assert(
      fc.property(energies, increments, increments, (value, ofSpecies, ofElement) => {
        const parts = {
          enthalpyAbove0K: joules(ofSpecies),
          elements: [{ amount: 1.5, enthalpyAbove0K: joules(ofElement) }],
        };
        const there = formationEnthalpyAtReference(joules(value), { ...parts, from: "298.15 K", to: "0 K" });
        const back = formationEnthalpyAtReference(there, { ...parts, from: "0 K", to: "298.15 K" });
        expect(Math.abs(back.value - value)).toBeLessThanOrEqual(eps * (Math.abs(value) + ofSpecies + 1.5 * ofElement));
        for (const reference of references) {
          const same = formationEnthalpyAtReference(joules(value), { ...parts, from: reference, to: reference });
          expect(same.value).toBe(value + 0);
        }
      }),
      { seed: 20261213, numRuns: 1000 },
    );
  });

  test("uncertainties add in quadrature where all are known", () => {
    const known = { enthalpyAbove0K: quantity(10, "kJ/mol", { standardUncertainty: 0.003 }), elements: [] };
    const given = quantity(-100, "kJ/mol", { standardUncertainty: 0.004 });
    const change = { from: "298.15 K", to: "0 K" } as const;
    expect(formationEnthalpyAtReference(given, { ...known, ...change }).standardUncertainty).toBeCloseTo(5, 12);
    const unknown = { ...known, elements: [{ amount: 1, enthalpyAbove0K: quantity(1, "kJ/mol") }] };
    expect(formationEnthalpyAtReference(given, { ...unknown, ...change }).standardUncertainty).toBeUndefined();
    expect(formationEnthalpyAtReference(given, { ...unknown, from: "0 K", to: "0 K" }).standardUncertainty).toBe(4);
  });

  test("every fault of a call is reported together", () => {
    const call = () =>
      formationEnthalpyAtReference(quantity(1, "J/mol/K") as never, {
        enthalpyAbove0K: 5 as never,
        elements: [{ amount: Number.NaN, enthalpyAbove0K: joules(1) }, { amount: 1 } as never],
        from: "0 C" as never,
        to: undefined as never,
      });
    expect(placesOf(call)).toEqual([
      "quantity/wrong-dimension at formationEnthalpy.unit",
      "input/missing at to",
      "input/unknown-option at from",
      "quantity/not-a-quantity at enthalpyAbove0K",
      "input/not-finite at elements.0.amount",
      "input/missing at elements.1.enthalpyAbove0K",
    ]);
  });
});

describe("enthalpies of formation of records", () => {
  test("increments name the reference phases at 298.15 K and how much of them is taken up", () => {
    const found = formationIncrements(CO2_g, referenceData);
    expect(found.elements.map(({ label, amount }) => [label, amount])).toEqual([
      ["C(cr,graphite)", 1],
      ["O2(g)", 1],
    ]);
    expect(found.elements[1]!.enthalpyAbove0K).toEqual({ value: 8680, unit: "J/mol", standardUncertainty: 1 });
    // The label S2 says that one mole of it is two of the solid.
    const dioxide = formationIncrements(findSpecies(referenceData, "SO2(g)"), referenceData);
    expect(dioxide.elements.map(({ label, amount }) => [label, amount])).toEqual([
      ["O2(g)", 1],
      ["S(cr,rhombic)", 1],
    ]);
  });

  test("an ion takes up half a mole of hydrogen less for each positive charge", () => {
    const ion = recordOf("OH^-(aq)", { enthalpyAbove0K: figure(1, "kJ/mol") });
    expect(formationIncrements(ion, referenceData).elements.map(({ label, amount }) => [label, amount])).toEqual([
      ["H2(g)", 1],
      ["O2(g)", 0.5],
    ]);
    const proton = recordOf("H^+(aq)", { enthalpyAbove0K: figure(0, "kJ/mol") });
    expect(formationIncrements(proton, referenceData).elements).toEqual([]);
  });

  test("back from 0 K by the same increments", () => {
    for (const record of referenceData.species) {
      if (record.enthalpyAbove0K === undefined || record.formationEnthalpy === undefined) continue;
      // Sodium publishes no increment.
      if (record.formula.includes("Na") || record.chargeNumber !== 0) continue;
      const atZero = formationEnthalpyAtZeroKelvin(record, referenceData);
      const parts = formationIncrements(record, referenceData);
      const back = formationEnthalpyAtReference(atZero, { ...parts, from: "0 K", to: "298.15 K" });
      const figureNow = record.formationEnthalpy.value * (record.formationEnthalpy.unit === "kJ/mol" ? 1000 : 1);
      expect(Math.abs(back.value - figureNow)).toBeLessThan(eps * 1e6);
    }
  });

  test("what is missing is named", () => {
    const noIncrement = recordOf("H2O(g)");
    expect(placesOf(() => formationIncrements(noIncrement, referenceData))).toEqual([
      "standard-state/missing-enthalpy-increment at record.enthalpyAbove0K",
    ]);
    const place = referenceData.species.findIndex(({ label }) => label === "O2(g)");
    const { enthalpyAbove0K: _left, ...oxygen } = referenceData.species[place]!;
    const without = { ...referenceData, species: referenceData.species.with(place, oxygen) };
    expect(placesOf(() => formationIncrements(H2O_g, without))).toEqual([
      `standard-state/missing-enthalpy-increment at collection.species.${place}.enthalpyAbove0K`,
    ]);
    expect(placesOf(() => formationIncrements(H2O_g, { ...referenceData, sequences: [] }))).toEqual([
      "species/no-reference at collection.sequences",
      "species/no-reference at collection.sequences",
    ]);
    const { formationEnthalpy: _none, ...noEnthalpy } = H2O_g;
    expect(placesOf(() => formationEnthalpyAtZeroKelvin(noEnthalpy, referenceData))).toEqual([
      "input/missing at record.formationEnthalpy",
    ]);
    const ion = recordOf("OH^-(g)", { enthalpyAbove0K: figure(8, "kJ/mol") });
    expect(placesOf(() => formationIncrements(ion, referenceData))).toEqual(["standard-state/charged-gas at record"]);
    expect(placesOf(() => formationIncrements(H2O_g, referenceData, { elementSource: "nobody" as never }))).toEqual([
      "input/unknown-option at options.elementSource",
    ]);
    const converted = convertEnthalpyReference(H2O_g, referenceData, "0 K");
    expect(placesOf(() => formationEnthalpyAtZeroKelvin(converted, referenceData))).toEqual([
      "standard-state/other-convention at record.convention",
    ]);
  });

  test("a source chooses among several reference sequences of one element", () => {
    const hydrogen = referenceData.sequences!.find(({ label }) => label === "H2")!;
    const second = { ...hydrogen, source: "cox1989" } as const;
    const both = { ...referenceData, sequences: [...referenceData.sequences!, second] };
    expect(placesOf(() => formationIncrements(H2O_g, both))).toEqual(["species/ambiguous at elementSource"]);
    expect(formationIncrements(H2O_g, both, { elementSource: "cox1989" }).elements).toHaveLength(2);
  });
});

describe("Gibbs functions", () => {
  test("there and back gives what was", () => {
    fc.assert(
      fc.property(
        energies,
        increments,
        fc.double({ min: 1, max: 6000, noNaN: true }),
        (value, increment, temperatureK) => {
          const parts = {
            temperature: { value: temperatureK, unit: "K" },
            enthalpyAbove0K: joules(increment),
          } as const;
          const given = { value, unit: "J/mol/K" } as const;
          const there = gibbsFunctionAtReference(given, { ...parts, from: "0 K", to: "298.15 K" });
          const back = gibbsFunctionAtReference(there, { ...parts, from: "298.15 K", to: "0 K" });
          expect(Math.abs(back.value - value)).toBeLessThanOrEqual(
            2 * eps * (Math.abs(value) + increment / temperatureK),
          );
          expect(gibbsFunctionAtReference(given, { ...parts, from: "0 K", to: "0 K" }).value).toBe(value + 0);
        },
      ),
      { seed: 20261214, numRuns: 1000 },
    );
  });

  test("ln K is the same from 0 K, from 298.15 K and from the merged series", () => {
    for (const { equation } of referenceSubjects) {
      const subject = reaction(equation, referenceData);
      const atoms = subject.terms.every(({ species }) => "enthalpyAbove0K" in species);
      // CaO and calcite publish no H(298.15 K) - H(0 K).
      if (!atoms) continue;
      for (const temperatureK of [298.15, 400, 600, 1000]) {
        const temperature = { value: temperatureK, unit: "K" } as const;
        const sums = { enthalpy: 0, gibbs: 0, increment: 0 };
        for (const { coefficient, label } of subject.terms) {
          const species = findSpecies(referenceData, label);
          const reference = standardProperties(species, { temperature: quantity(298.15, "K") });
          const here = standardProperties(species, { temperature });
          const { value, unit } = species.enthalpyAbove0K!;
          sums.enthalpy += coefficient * reference.enthalpy.value;
          sums.gibbs += coefficient * -((here.gibbsEnergy.value - reference.enthalpy.value) / temperatureK);
          sums.increment += coefficient * value * (unit === "kJ/mol" ? 1000 : 1);
        }
        const from298 = lnKFromGibbsFunction({
          temperature,
          reactionEnthalpy: joules(sums.enthalpy),
          reactionGibbsFunction: { value: sums.gibbs, unit: "J/mol/K" },
        });
        const from0 = lnKFromGibbsFunction({
          temperature,
          reactionEnthalpy: joules(sums.enthalpy - sums.increment),
          reactionGibbsFunction: gibbsFunctionAtReference(
            { value: sums.gibbs, unit: "J/mol/K" },
            { temperature, enthalpyAbove0K: joules(sums.increment), from: "298.15 K", to: "0 K" },
          ),
        });
        const { lnK } = standardReactionProperties(subject, { temperature });
        // Sums of numbers below 2e6 J/mol over RT, some twenty roundings.
        const allowed = (40 * eps * 2e6) / (8.31446261815324 * temperatureK);
        expect(Math.abs(from0 - from298)).toBeLessThanOrEqual(allowed);
        expect(Math.abs(from298 - lnK)).toBeLessThanOrEqual(allowed);
      }
    }
  });

  test("every fault of a call is reported together", () => {
    expect(placesOf(() => gibbsFunctionAtReference(joules(1) as never, {} as never))).toEqual([
      "quantity/wrong-dimension at gibbsFunction.unit",
      "input/missing at temperature",
      "input/missing at enthalpyAbove0K",
      "input/missing at from",
      "input/missing at to",
    ]);
    expect(placesOf(() => lnKFromGibbsFunction({ temperature: quantity(0, "K") } as never))).toEqual([
      "input/missing at reactionEnthalpy",
      "input/missing at reactionGibbsFunction",
      "quantity/not-positive at temperature.value",
    ]);
    expect(placesOf(() => lnKFromGibbsFunction(null as never))).toEqual(["input/not-an-object at "]);
    const tiny = {
      temperature: quantity(1e-300, "K"),
      reactionEnthalpy: joules(1e300),
      reactionGibbsFunction: quantity(0, "J/mol/K"),
    };
    expect(placesOf(() => lnKFromGibbsFunction(tiny))).toEqual(["quantity/overflow at reactionEnthalpy"]);
  });
});
