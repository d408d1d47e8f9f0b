import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { computeWitness } from "../../src/checks/witness-checks.js";
import { CO2_g, H2_g, H2O_g, referenceData } from "../../src/data/index.js";
import type { PublishedSeries } from "../../src/heat-capacity/published-series.js";
import { reaction } from "../../src/reaction/reaction.js";
import { standardReactionProperties, standardReactionRoundingBound } from "../../src/reaction/standard-reaction.js";
import { checkRecord } from "../../src/species/check-record.js";
import { formationProperties } from "../../src/species/formation-properties.js";
import type { CollectionData, SpeciesRecord } from "../../src/species/record.js";
import { standardProperties } from "../../src/species/standard-properties.js";
import { convertEnthalpyReference, elementsAtZeroKelvin } from "../../src/standard-state/index.js";
import { placesOf } from "../errors/faults-of.js";
import { figure, invented, randomSeries } from "../heat-capacity/random-series.js";
import { referenceSubjects } from "../properties/reference-states.js";
import { fitted, recordOf } from "../species/records.js";
import { conversionBound, numbersOf } from "./conversion-bound.js";

const eps = Number.EPSILON;
const kelvin = (value: number) => ({ temperature: { value, unit: "K" } }) as const;
/** All but those of sodium, whose increment is not published in the data. */
const converts = ({ formula }: SpeciesRecord): boolean => !formula.includes("Na");
const convertAll = (given: CollectionData, reference: "0 K" | "298.15 K"): CollectionData => ({
  ...given,
  species: given.species.filter(converts).map((record) => convertEnthalpyReference(record, given, reference)),
});
const fromZero = convertAll(referenceData, "0 K");
const anyForm = fc.oneof(...Object.values(randomSeries));

function expectSound(record: SpeciesRecord): void {
  expect(checkRecord(record, [], [])).toBe(true);
  expect(JSON.parse(JSON.stringify(record))).toEqual(record);
}

describe("figures", () => {
  test("H of a species gains the increments of its elements, and says so", () => {
    const converted = convertEnthalpyReference(CO2_g, referenceData, "0 K");
    expectSound(converted);
    expect(converted.convention).toBe(elementsAtZeroKelvin);
    // CODATA: graphite 1.050, O2 8.680 kJ/mol.
    expect(converted.formationEnthalpy!.value).toBe(-393.51 + 1.05 + 8.68);
    expect(converted.formationEnthalpy!.where).toBe("converted from elements at 298.15 K");
    expect(converted.standardEntropy).toEqual(CO2_g.standardEntropy);
    const [before, after] = [CO2_g, converted].map((record) => standardProperties(record, kelvin(700)));
    expect(after!.enthalpy.value - before!.enthalpy.value).toBeCloseTo(9730, 8);
    expect(after!.entropy).toEqual(before!.entropy);
    expect(after!.heatCapacity).toEqual(before!.heatCapacity);
  });

  test("an element at 298.15 K has the enthalpy that it gained since 0 K, exact by convention", () => {
    const converted = convertEnthalpyReference(H2_g, referenceData, "0 K");
    expect(converted.formationEnthalpy).toMatchObject({ value: 8.468, uncertainty: { halfWidth: 0, coverage: 0.95 } });
  });

  test("ions follow the hydrogen convention: H^+(aq) stays at zero, OH^-(aq) gains a mole of hydrogen", () => {
    const proton = convertEnthalpyReference(recordOf("H^+(aq)"), referenceData, "0 K");
    expectSound(proton);
    expect(proton.formationEnthalpy!.value).toBe(0);
    const hydroxide = recordOf("OH^-(aq)", { formationEnthalpy: figure(-230.015, "kJ/mol") });
    const converted = convertEnthalpyReference(hydroxide, referenceData, "0 K");
    expect(converted.formationEnthalpy!.value).toBe(-230.015 + 8.468 + 4.34);
  });

  test.each([
    ["shomate", [5, 7], 1 / 1000],
    ["seven-coefficient", [5], 1 / 8.31451],
    ["nine-coefficient", [7], 1 / 8.31451],
    ["gibbs-energy", [0], 1],
  ] as const)("%s keeps the constant of H in its own coefficient", (form, places, perUnit) => {
    fc.assert(
      fc.property(randomSeries[form], (series) => {
        const record = recordOf("H2O(g)", { gibbsFunction: fitted(series) });
        const converted = convertEnthalpyReference(record, referenceData, "0 K").gibbsFunction as PublishedSeries;
        converted.intervals[0]!.coefficients.forEach((coefficient, index) => {
          const before = series.intervals[0]!.coefficients[index]!;
          const shift = (places as readonly number[]).includes(index) ? (8468 + 4340) * perUnit : 0;
          const power = 10 ** (series.decimalShifts?.[index] ?? 0);
          const allowed = shift === 0 ? 0 : 4 * eps * (Math.abs(before) + shift * power);
          expect(Math.abs(coefficient - before - shift * power)).toBeLessThanOrEqual(allowed);
        });
      }),
      { seed: 20261215, numRuns: 60 },
    );
  });

  test("the eighth coefficient of Shomate, a formation enthalpy, moves too", () => {
    const coefficients = [30, 0, 0, 0, 0, -250, 220, -241.826];
    const series = {
      kind: "series",
      form: "shomate",
      intervals: [{ from: 500, to: 1700, coefficients, endsAt: "fit" }],
    } as const;
    const record = recordOf("H2O(g)", { gibbsFunction: fitted(series) });
    const converted = convertEnthalpyReference(record, referenceData, "0 K").gibbsFunction as PublishedSeries;
    expect(converted.intervals[0]!.coefficients).toEqual([30, 0, 0, 0, 0, -250 + 12.808, 220, -241.826 + 12.808]);
  });
});

describe("properties", () => {
  test("of random fits of every form, H moves by the increments and S does not", () => {
    fc.assert(
      fc.property(anyForm, fc.constantFrom("H2O(g)", "H2O(l)"), (series, label) => {
        const record = recordOf(label, { gibbsFunction: fitted(series) });
        const converted = convertEnthalpyReference(record, referenceData, "0 K");
        expectSound(converted);
        const [before, after] = [record, converted].map((each) => standardProperties(each, kelvin(1000)));
        expect(after!.entropy).toEqual(before!.entropy);
        expect(after!.heatCapacity).toEqual(before!.heatCapacity);
        const error = Math.abs(after!.enthalpy.value - before!.enthalpy.value - 12808);
        expect(error).toBeLessThanOrEqual(conversionBound(record, converted, "enthalpy", 1000) + 2 * eps * 12808);
      }),
      { seed: 20261216, numRuns: 120 },
    );
  });

  test("K of every reaction stays when all its species are converted", () => {
    const equations = [...referenceSubjects.map(({ equation }) => equation), "H2O(l) = H2O(g)", "H2 + ½ O2 = H2O(l)"];
    for (const equation of equations) {
      const [before, after] = [referenceData, fromZero].map((each) => reaction(equation, each));
      for (const temperatureK of [298.15, 350, 500, 600]) {
        const { lnK } = standardReactionProperties(before!, kelvin(temperatureK));
        const bound = standardReactionRoundingBound(before!, "gibbsEnergy", kelvin(temperatureK));
        // Beside the two evaluations, each species' constant, below 1.3e6 J/mol, was rounded once to half an eps.
        const allowed = (2 * bound + 6 * 0.5 * eps * 1.3e6) / (8.31446261815324 * temperatureK);
        const converted = standardReactionProperties(after!, kelvin(temperatureK));
        expect(Math.abs(converted.lnK - lnK)).toBeLessThanOrEqual(allowed);
      }
    }
  });

  test("and so does the Gibbs energy of formation", () => {
    for (const label of ["H2O(g)", "CO2(g)", "NH3(g)", "SO2(g)"]) {
      const [before, after] = [referenceData, fromZero].map((each) => {
        const record = each.species.find((species) => species.label === label)!;
        return formationProperties(record, kelvin(298.15), each).gibbsEnergy.value;
      });
      expect(Math.abs(after! - before!)).toBeLessThan(20 * eps * 1e6);
    }
  });

  test("and the witnesses of the reference data", () => {
    const labels = new Set(fromZero.species.map(({ label }) => label));
    let compared = 0;
    for (const record of fromZero.species) {
      const original = referenceData.species.find(({ label }) => label === record.label);
      original?.witnesses.forEach((witness, place) => {
        // Molecules, cells and volumes know nothing of where enthalpies are counted from.
        if (witness.group === "critical" || witness.group === "volume") return;
        if (witness.check.startsWith("statistical-mechanics")) return;
        // Reactions with electrons or species of sodium are left out.
        if (!Object.keys(witness.reaction ?? {}).every((label) => labels.has(label))) return;
        const [before, after] = [
          computeWitness(original, witness, referenceData),
          computeWitness(record, record.witnesses[place]!, fromZero),
        ];
        // Differences of energies of 1e6 J/mol, rounded to 1e-9; the terms of alpha iron reach 1e8 J/mol.
        const isStiff = record.label === "Fe(cr,alpha)" || witness.reaction?.["Fe(cr,alpha)"] !== undefined;
        expect(Math.abs(after - before)).toBeLessThan(isStiff ? 1e-6 : 1e-8);
        compared += 1;
      });
    }
    expect(compared).toBeGreaterThan(100);
  });

  test("a mixture of conventions is refused by reaction", () => {
    const mixed = {
      species: [
        ...fromZero.species.filter(({ label }) => label === "H2O(g)"),
        referenceData.species.find(({ label }) => label === "H2O(l)")!,
      ],
    };
    expect(placesOf(() => reaction("H2O(l) = H2O(g)", mixed)).join()).toContain("species/mixed-conventions");
  });
});

describe("there and back", () => {
  test("every number comes back within a unit in the last place of the larger number", () => {
    fc.assert(
      fc.property(anyForm, fc.integer({ min: -1_000_000, max: 1_000_000 }), (series, enthalpy) => {
        const record = recordOf("H2O(g)", {
          formationEnthalpy: figure(enthalpy / 1000, "kcal_th/mol"),
          gibbsFunction: fitted(series),
        });
        const there = convertEnthalpyReference(record, referenceData, "0 K");
        const back = convertEnthalpyReference(there, referenceData, "298.15 K");
        expect(back.convention).toBeUndefined();
        const [before, between, after] = [record, there, back].map((each) => numbersOf(each));
        for (const [path, value] of before!) {
          const larger = Math.max(Math.abs(value), Math.abs(between!.get(path)!));
          expect(Math.abs(after!.get(path)! - value)).toBeLessThanOrEqual(eps * larger);
        }
      }),
      { seed: 20261217, numRuns: 120 },
    );
  });

  test("back through the converted collection too", () => {
    const back = convertAll(fromZero, "298.15 K");
    for (const [index, record] of back.species.entries()) {
      expect(record.convention).toBeUndefined();
      const original = referenceData.species.filter(converts)[index]!;
      const [was, is] = [original.formationEnthalpy, record.formationEnthalpy];
      if (was !== undefined)
        expect(Math.abs(is!.value - was.value)).toBeLessThanOrEqual(eps * (Math.abs(was.value) + 60_000));
    }
  });

  test("a record that has the reference is returned as it is", () => {
    expect(convertEnthalpyReference(H2O_g, referenceData, "298.15 K")).toEqual(H2O_g);
    const converted = convertEnthalpyReference(H2O_g, referenceData, "0 K");
    expect(convertEnthalpyReference(converted, referenceData, "0 K")).toEqual(converted);
  });

  test("the figure of another source that a witness compares with moves with the record", () => {
    const witness = {
      group: "formation",
      kind: "transcription",
      check: "enthalpy-at-298.15-K",
      against: { formationEnthalpy: figure(-57.796, "kcal_th/mol") },
      deviation: 0,
      tolerance: 40,
      source: invented,
    } as const;
    const { witnesses } = convertEnthalpyReference(recordOf("H2O(g)", { witnesses: [witness] }), referenceData, "0 K");
    expect(witnesses[0]!.against!["formationEnthalpy"]!.value).toBeCloseTo(-57.796 + 12.808 / 4.184, 12);
  });
});

test("wrong input is refused, all faults together", () => {
  expect(placesOf(() => convertEnthalpyReference({ ...H2O_g, name: "" }, referenceData, "25 C" as never))).toEqual([
    "input/not-a-string at record.name",
    "input/unknown-option at reference",
  ]);
  const other = { ...H2O_g, convention: "absolute enthalpies" };
  expect(placesOf(() => convertEnthalpyReference(other, { ...referenceData, sequences: [] }, "0 K"))).toEqual([
    "standard-state/other-convention at record.convention",
    "species/no-reference at collection.sequences",
    "species/no-reference at collection.sequences",
  ]);
  expect(placesOf(() => convertEnthalpyReference(H2O_g, null as never, "0 K"))).toEqual([
    "input/not-an-object at collection",
  ]);
  expect(placesOf(() => convertEnthalpyReference(H2O_g, referenceData, "0 K", { source: 1 } as never))).toEqual([
    "input/unknown-key at options.source",
  ]);
});
