import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { computeWitness } from "../../src/checks/witness-checks.js";
import { H2O_g, H2O_l, N2_g, referenceData } from "../../src/data/index.js";
import type { PublishedSeries } from "../../src/heat-capacity/published-series.js";
import { type Pressure, quantity } from "../../src/quantity/quantity.js";
import { reaction } from "../../src/reaction/reaction.js";
import { standardReactionProperties, standardReactionRoundingBound } from "../../src/reaction/standard-reaction.js";
import { checkRecord } from "../../src/species/check-record.js";
import type { SpeciesRecord, Witness } from "../../src/species/record.js";
import { standardProperties } from "../../src/species/standard-properties.js";
import {
  convertStandardPressure,
  formationGibbsEnergyAtStandardPressure,
  idealGasEntropyAtStandardPressure,
} from "../../src/standard-state/index.js";
import { placesOf } from "../errors/faults-of.js";
import { figure, randomSeries } from "../heat-capacity/random-series.js";
import { referenceSubjects } from "../properties/reference-states.js";
import { fitted, recordOf } from "../species/records.js";
import { conversionBound, numbersOf } from "./conversion-bound.js";

const eps = Number.EPSILON;
const atmosphere = quantity(1, "atm");
const bar = quantity(1, "bar");
const kelvin = (value: number) => ({ temperature: { value, unit: "K" } }) as const;
const anyForm = fc.oneof(...Object.values(randomSeries));
const pressures: fc.Arbitrary<Pressure> = fc.oneof(
  fc.constantFrom(atmosphere, bar, quantity(1, "[psi]"), quantity(760, "mm[Hg]"), quantity(0.1, "MPa")),
  fc.double({ min: -20, max: 20, noNaN: true }).map((ln) => quantity(Math.exp(ln), "bar")),
);

function expectSound(record: SpeciesRecord): void {
  const faults: never[] = [];
  expect(checkRecord(record, [], faults)).toBe(true);
  expect(JSON.parse(JSON.stringify(record))).toEqual(record);
}

describe("figures", () => {
  test("the entropy of a gas and its constants move, and nothing else", () => {
    const converted = convertStandardPressure(N2_g, atmosphere);
    expectSound(converted);
    expect(converted.standardPressure).toMatchObject({ value: 1, unit: "atm", source: "mcbride2002" });
    const expected = idealGasEntropyAtStandardPressure(quantity(191.609, "J/mol/K"), { from: bar, to: atmosphere });
    expect(converted.standardEntropy?.value).toBe(expected.value);
    expect(converted.standardEntropy?.uncertainty).toEqual(N2_g.standardEntropy?.uncertainty);
    const moved = [...numbersOf(converted)].filter(([path, value]) => numbersOf(N2_g).get(path) !== value);
    expect(moved.map(([path]) => path)).toEqual([
      ".standardEntropy.value",
      ".gibbsFunction.intervals.0.coefficients.8",
      ".gibbsFunction.intervals.1.coefficients.8",
    ]);
  });

  test("a converted figure says what it was printed for, once", () => {
    const converted = convertStandardPressure(H2O_g, atmosphere);
    const note = "converted from a standard pressure of 1 bar";
    expect(converted.standardPressure.where).toBe(note);
    expect(converted.standardEntropy?.where).toBe(note);
    expect(converted.gibbsFunction).toMatchObject({ where: `${note}; gas constant 8.314510 J/mol/K` });
    const twice = convertStandardPressure(converted, quantity(5, "kPa"));
    expect(twice.standardEntropy?.where).toBe(note);
    expect(twice.gibbsFunction).toMatchObject({ where: `${note}; gas constant 8.314510 J/mol/K` });
  });

  test("a long note is cut to what a record takes", () => {
    const record = recordOf("N2(g)", { standardEntropy: { ...figure(191, "J/mol/K"), where: "x".repeat(1000) } });
    const { standardEntropy } = convertStandardPressure(record, atmosphere);
    expect(standardEntropy?.where).toHaveLength(1000);
    expect(standardEntropy?.where).toMatch(/^converted from a standard pressure of 1 bar; x+…$/);
  });

  test("of a condensed phase and a solute only the Gibbs energy of formation moves", () => {
    for (const label of ["H2O(l)", "SO4^2-(aq)", "CaCO3(cr,calcite)", "N2O4(g)"]) {
      const record = recordOf(label, { formationGibbsEnergy: figure(-237.129, "kJ/mol") });
      const converted = convertStandardPressure(record, atmosphere);
      expectSound(converted);
      const expected = formationGibbsEnergyAtStandardPressure(quantity(-237.129, "kJ/mol"), label, {
        temperature: quantity(298.15, "K"),
        from: bar,
        to: atmosphere,
      });
      expect(converted.formationGibbsEnergy!.value * 1000).toBeCloseTo(expected.value, 9);
      if (record.state === "g") continue;
      const { formationGibbsEnergy: _moved, standardPressure: _pressure, ...rest } = converted;
      const { formationGibbsEnergy: _before, standardPressure: _was, ...same } = record;
      expect(rest).toEqual(same);
    }
  });

  test("the same pressure in another unit moves no number", () => {
    const converted = convertStandardPressure(N2_g, quantity(100, "kPa"));
    expect(converted.standardPressure).toMatchObject({ value: 100, unit: "kPa" });
    expect({ ...converted, standardPressure: N2_g.standardPressure }).toEqual(N2_g);
  });

  test.each([
    ["shomate", [6], [1]],
    ["seven-coefficient", [6], [1 / 8.31451]],
    ["nine-coefficient", [8], [1 / 8.31451]],
    ["gibbs-energy", [1], [-1]],
  ] as const)("%s keeps the constant of S in one coefficient", (form, places, perUnit) => {
    fc.assert(
      fc.property(randomSeries[form], (series) => {
        const record = recordOf("N2(g)", { gibbsFunction: fitted(series) });
        const shift = -8.31446261815324 * Math.log(1.01325);
        const converted = convertStandardPressure(record, atmosphere).gibbsFunction as PublishedSeries;
        converted.intervals[0]!.coefficients.forEach((coefficient, index) => {
          const before = series.intervals[0]!.coefficients[index]!;
          const place = (places as readonly number[]).indexOf(index);
          const power = 10 ** (series.decimalShifts?.[index] ?? 0);
          if (place < 0) expect(coefficient).toBe(before);
          else {
            const expected = before + shift * perUnit[place]! * power;
            expect(Math.abs(coefficient - expected)).toBeLessThanOrEqual(4 * eps * (Math.abs(before) + power));
          }
        });
      }),
      { seed: 20261206, numRuns: 60 },
    );
  });

  test("a coefficient that was printed with a decimal shift moves by as many decimals", () => {
    const series = {
      kind: "series",
      form: "shomate",
      decimalShifts: [0, 0, 0, 0, 0, 0, 3],
      intervals: [{ from: 200, to: 3000, coefficients: [28, 0, 0, 0, 0, -8, 220_000], endsAt: "fit" }],
    } as const;
    const record = recordOf("N2(g)", { gibbsFunction: fitted(series) });
    const converted = convertStandardPressure(record, quantity(10, "bar")).gibbsFunction as PublishedSeries;
    expect(converted.intervals[0]!.coefficients[6]).toBeCloseTo(220_000 - 8314.46261815324 * Math.LN10, 8);
  });
});

describe("the library evaluates at 1 bar", () => {
  test("so the properties of random fits of every form stay, whatever the standard pressure", () => {
    fc.assert(
      fc.property(anyForm, pressures, fc.constantFrom("N2(g)", "N2(l)", "N2(aq)"), (series, pressure, label) => {
        const record = recordOf(label, { gibbsFunction: fitted(series) });
        const converted = convertStandardPressure(record, pressure);
        expectSound(converted);
        const [before, after] = [record, converted].map((each) => standardProperties(each, kelvin(1000)));
        expect(after!.heatCapacity).toEqual(before!.heatCapacity);
        expect(after!.enthalpy).toEqual(before!.enthalpy);
        const error = Math.abs(after!.entropy.value - before!.entropy.value);
        expect(error).toBeLessThanOrEqual(conversionBound(record, converted, "entropy", 1000));
      }),
      { seed: 20261207, numRuns: 150 },
    );
  });

  test("K of every reaction stays when its species are converted, each to a pressure of its own", () => {
    const equations = [...referenceSubjects.map(({ equation }) => equation), "H2O(l) = H2O(g)", "H2 + ½ O2 = H2O(l)"];
    fc.assert(
      fc.property(
        fc.constantFrom(...equations),
        fc.array(pressures, { minLength: 1, maxLength: 5 }),
        fc.double({ min: 300, max: 600, noNaN: true }),
        (equation, chosen, temperatureK) => {
          const before = reaction(equation, referenceData);
          // The species of the equation alone: a collection of them all would be checked anew in each run.
          const species = before.terms.map((term, index) =>
            convertStandardPressure(term.species as SpeciesRecord, chosen[index % chosen.length]!),
          );
          const after = reaction(equation, { species });
          const bound = standardReactionRoundingBound(before, "gibbsEnergy", kelvin(temperatureK));
          expect(after.terms.map(({ label }) => label)).toEqual(before.terms.map(({ label }) => label));
          const [a, b] = [before, after].map((each) => standardReactionProperties(each, kelvin(temperatureK)));
          // Each coefficient that moved was rounded once: less than the bound of one evaluation.
          const allowed = (3 * bound) / (8.31446261815324 * temperatureK);
          expect(Math.abs(a!.lnK - b!.lnK)).toBeLessThanOrEqual(allowed);
        },
      ),
      { seed: 20261208, numRuns: 50 },
    );
  });

  test("and so do the witnesses of the reference data", () => {
    const species = referenceData.species.map((record) => convertStandardPressure(record, atmosphere));
    const collection = { ...referenceData, species };
    // Sums over molecular levels take long, and S of the fit is what the other witnesses of a gas compare as well.
    const isQuick = ({ group, check }: Witness): boolean =>
      (group === "caloric" || group === "formation") && !check.startsWith("statistical-mechanics");
    let compared = 0;
    for (const [index, record] of species.entries()) {
      const original = referenceData.species[index]!;
      record.witnesses.forEach((witness, place) => {
        if (!isQuick(witness)) return;
        const before = computeWitness(original, original.witnesses[place]!, referenceData);
        const after = computeWitness(record, witness, collection);
        // Differences of energies of 1e6 J/mol, rounded to 1e-9.
        expect(Math.abs(after - before)).toBeLessThan(1e-8);
        compared += 1;
      });
    }
    expect(compared).toBeGreaterThan(100);
  });
});

describe("there and back", () => {
  test("every number comes back within a unit in the last place of the larger number", () => {
    fc.assert(
      fc.property(anyForm, pressures, pressures, (series, start, pressure) => {
        const record = recordOf("N2(g)", {
          standardPressure: figure(start.value, start.unit),
          standardEntropy: figure(45.77, "cal_th/mol/K"),
          formationGibbsEnergy: figure(12.3, "kJ/mol"),
          gibbsFunction: fitted(series),
        });
        const there = convertStandardPressure(record, pressure);
        const back = convertStandardPressure(there, start);
        const [before, between, after] = [record, there, back].map((each) => numbersOf(each));
        for (const [path, value] of before!) {
          const larger = Math.max(Math.abs(value), Math.abs(between!.get(path)!));
          expect(Math.abs(after!.get(path)! - value)).toBeLessThanOrEqual(eps * larger);
        }
      }),
      { seed: 20261209, numRuns: 120 },
    );
  });

  test("one step is two steps", () => {
    fc.assert(
      fc.property(pressures, pressures, (middle, end) => {
        const direct = numbersOf(convertStandardPressure(H2O_g, end));
        const indirect = numbersOf(convertStandardPressure(convertStandardPressure(H2O_g, middle), end));
        // Below 400 J/mol/K and 50 units of R.
        for (const [path, value] of direct) {
          const size = Math.max(Math.abs(value), path.includes("coefficients") ? 50 : 400);
          expect(Math.abs(indirect.get(path)! - value)).toBeLessThanOrEqual(2 * eps * size);
        }
      }),
      { seed: 20261210, numRuns: 40 },
    );
  });
});

test("a record of 1 atm is what the library has always converted on use", () => {
  const published = recordOf("N2(g)", {
    standardPressure: figure(1, "atm"),
    standardEntropy: figure(45.77, "cal_th/mol/K"),
  });
  const converted = convertStandardPressure(published, bar);
  const evaluated = standardProperties(published, kelvin(298.15)).entropy.value;
  expect(Math.abs(converted.standardEntropy!.value * 4.184 - evaluated)).toBeLessThan(4 * eps * 200);
});

test("wrong input is refused, all faults together", () => {
  expect(placesOf(() => convertStandardPressure({ ...H2O_l, name: "" }, quantity(0, "bar")))).toEqual([
    "input/not-a-string at record.name",
    "quantity/not-positive at pressure.value",
  ]);
  expect(placesOf(() => convertStandardPressure(H2O_l, quantity(1, "K") as never))).toEqual([
    "quantity/wrong-dimension at pressure.unit",
  ]);
});
