import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { computeWitness, recomputeWitnesses } from "../../src/checks/witness-checks.js";
import { CO2_g, Hg_l, Mg_cr, Mg_g, referenceData } from "../../src/data/index.js";
import { elementSequences } from "../../src/data/sequences.js";
import type { Figure } from "../../src/quantity/figure.js";
import { findSpecies } from "../../src/species/collection.js";
import type { CollectionData, Label, SpeciesRecord, Witness } from "../../src/species/record.js";
import { convertEnthalpyReference, formationEnthalpyAtZeroKelvin } from "../../src/standard-state/index.js";
import { figure } from "../heat-capacity/random-series.js";
import { collectionOf, recordOf } from "../species/records.js";

/** A witness of a formation, with figures in kJ/mol to compare with. */
function witnessOf(
  reaction: Readonly<Record<Label, number>>,
  against: Readonly<Record<string, number>> = { formationEnthalpyAt0K: 0 },
): Witness {
  return {
    group: "caloric",
    kind: "transcription",
    check: "formation-enthalpy-at-0-K",
    against: Object.fromEntries(Object.entries(against).map(([name, value]) => [name, figure(value, "kJ/mol")])),
    reaction,
    deviation: 0,
    tolerance: 1,
    source: { text: "invented" },
  };
}

const ofCarbonDioxide = { "C(cr,graphite)": -1, "O2(g)": -1, "CO2(g)": 1 };

/** The reference data with one record replaced. */
const withRecord = (record: SpeciesRecord): CollectionData => ({
  ...referenceData,
  species: referenceData.species.map((one) => (one.label === record.label ? record : one)),
});

/** Half-width of an increment in J/mol; of one without, its rounding. */
function spreadOf({ value, unit, uncertainty, ...others }: Figure): number {
  return uncertainty !== undefined && "halfWidth" in uncertainty
    ? uncertainty.halfWidth * 1000
    : roundingOf({ value, unit, ...others });
}

/** Half a unit of the last place in J/mol: 0.001 kJ/mol, or as the figure says. */
function roundingOf({ where }: Figure): number {
  const caloriesRounding = /kcal\/mol,? rounded to (0\.\d+)/.exec(where ?? "")?.[1];
  return caloriesRounding === undefined ? 0.5 : (Number(caloriesRounding) / 2) * 4184;
}

/** A record whose H(298.15 K) - H(0 K) is larger by some J/mol. */
function withIncrement(record: SpeciesRecord, joules: number): SpeciesRecord {
  const increment = record.enthalpyAbove0K!;
  const step = increment.unit === "kJ/mol" ? joules / 1000 : joules;
  return { ...record, enthalpyAbove0K: { ...increment, value: increment.value + step } };
}

describe("the enthalpy of formation at 0 K", () => {
  test.each([
    ["CO2(g)", ofCarbonDioxide],
    ["H2O(g)", { "H2(g)": -1, "O2(g)": -0.5, "H2O(g)": 1 }],
    ["SO2(g)", { "S(cr,rhombic)": -1, "O2(g)": -1, "SO2(g)": 1 }],
    ["HBr(g)", { "H2(g)": -0.5, "Br2(l)": -0.5, "HBr(g)": 1 }],
  ] as const)("of %s is that of the room standard-state", (label, reaction) => {
    const record = findSpecies(referenceData, label);
    const atZero = formationEnthalpyAtZeroKelvin(record, referenceData);
    const computed = computeWitness(record, witnessOf(reaction), referenceData);
    // H(298.15 K) of the fits, against the figures of the records: the fits follow them within 0.2 J/mol.
    expect(Math.abs(computed - atZero.value)).toBeLessThan(0.2);
  });

  test("with both figures of one publication the increments alone are compared", () => {
    // JANAF: -393.522 and -393.151; increments of CODATA: graphite 1.050, O2 8.680, CO2 9.365 kJ/mol.
    const printed = { formationEnthalpy: -393.522, formationEnthalpyAt0K: -393.151 };
    const computed = computeWitness(CO2_g, witnessOf(ofCarbonDioxide, printed), referenceData);
    expect(computed).toBeCloseTo(-393522 - 9365 + 1050 + 8680 + 393151, 6);
    const moved = { ...CO2_g, formationEnthalpy: figure(-400, "kJ/mol") };
    expect(computeWitness(moved, witnessOf(ofCarbonDioxide, printed), withRecord(moved))).toBe(computed);
  });

  test("of a species without record, by the increment given", () => {
    // JANAF: 61.380 and 64.526; 5/2 RT = 6.197, and 9.342 of the liquid.
    const printed = { formationEnthalpy: 61.38, formationEnthalpyAt0K: 64.526, enthalpyAbove0K: 6.197 };
    expect(computeWitness(Hg_l, witnessOf({ "Hg(l)": -1 }, printed), referenceData)).toBeCloseTo(-1, 6);
    const recorded = recordOf("Hg(g)", { enthalpyAbove0K: figure(6.197, "kJ/mol") });
    const { enthalpyAbove0K: _left, ...pair } = printed;
    const witness = witnessOf({ "Hg(l)": -1, "Hg(g)": 1 }, pair);
    expect(computeWitness(recorded, witness, referenceData)).toBeCloseTo(-1, 6);
  });

  test("does not depend on where enthalpies are counted from", () => {
    const species = ["C(cr,graphite)", "O2(g)", "CO2(g)"].map((label) =>
      convertEnthalpyReference(findSpecies(referenceData, label), referenceData, "0 K"),
    );
    const [before, after] = [referenceData, { species }].map((collection) => {
      const record = collection.species.find(({ label }) => label === "CO2(g)")!;
      return computeWitness(record, witnessOf(ofCarbonDioxide), collection);
    });
    expect(Math.abs(after! - before!)).toBeLessThan(1e-8);
  });

  test("falls as the increment of the species rises, and rises with those of the elements", () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 0, max: 20_000 }),
        fc.integer({ min: 0, max: 20_000 }),
        fc.integer({ min: -500, max: 500 }),
        (ofElement, ofGas, atReference) => {
          const element = recordOf("Mg(cr)", { enthalpyAbove0K: figure(ofElement, "J/mol") });
          const gas = recordOf("Mg(g)", {
            enthalpyAbove0K: figure(ofGas, "J/mol"),
            formationEnthalpy: figure(atReference, "kJ/mol"),
          });
          const witness = witnessOf({ "Mg(cr)": -1, "Mg(g)": 1 }, { formationEnthalpyAt0K: 7 });
          const computed = computeWitness(gas, witness, collectionOf(element, gas));
          expect(computed).toBeCloseTo(atReference * 1000 - ofGas + ofElement - 7000, 8);
        },
      ),
      { seed: 20261221, numRuns: 200 },
    );
  });
});

test("the row 0 K of a table is held to H(298.15 K) - H(0 K), beside other rows", () => {
  const rows = (atZero: number): Witness => ({
    ...witnessOf({}),
    check: "tabulated-enthalpy-increment",
    against: { "0 K": figure(atZero, "kJ/mol"), "600 K": figure(2.1, "kJ/mol") },
  });
  const record = recordOf("Ar(g)", {
    enthalpyAbove0K: figure(6.197, "kJ/mol"),
    gibbsFunction: {
      kind: "series",
      form: "polynomial",
      powers: [0],
      intervals: [{ from: 298.15, to: 600, coefficients: [2000 / 301.85], endsAt: "fit" }],
      source: { text: "invented" },
      origin: "memory",
    },
  });
  expect(computeWitness(record, rows(-6.197), referenceData)).toBeCloseTo(-100, 8);
  expect(computeWitness(record, rows(-6.5), referenceData)).toBeCloseTo(303, 8);
});

describe("in the reference data", () => {
  const witnesses = referenceData.species.flatMap((record) =>
    record.witnesses
      .filter(({ check }) => check === "formation-enthalpy-at-0-K")
      .map((witness) => [`${record.label}: ${JSON.stringify(witness.reaction)}`, record, witness] as const),
  );

  test.each(witnesses)("an increment beyond the tolerance is found, %s", (_, record, { deviation, tolerance }) => {
    for (const sign of [1, -1]) {
      // Half a mole of the element is the least that a reaction takes up.
      const wrong = withIncrement(record, sign * 2 * (tolerance + Math.abs(deviation) + 1));
      const failing = recomputeWitnesses(wrong, withRecord(wrong)).filter(({ confirms }) => !confirms);
      expect(failing.map(({ witness: { check } }) => check)).toContain("formation-enthalpy-at-0-K");
    }
  });

  test.each(witnesses)("no tolerance is wider than half-widths and rounding add up to, %s", (_, record, witness) => {
    const { against, reaction, tolerance } = witness;
    const increments = Object.entries(reaction!).map(([label, stoichiometricNumber]) => {
      const species = label === record.label ? record : findSpecies(referenceData, label);
      return Math.abs(stoichiometricNumber) * spreadOf(species.enthalpyAbove0K!);
    });
    const compared = Object.values(against!).map((one) => (one.source === "cox1989" ? 1 : roundingOf(one)));
    const sum = [...increments, ...compared].reduce((total, part) => total + part, 0);
    expect(tolerance).toBeLessThanOrEqual(sum + 1e-9);
    expect(tolerance).toBeGreaterThan(sum - 1);
  });

  test("every increment of an element has a witness of its own", () => {
    const vouching = (record: SpeciesRecord): Witness[] =>
      record.witnesses.filter(
        ({ check, against }) =>
          check === "formation-enthalpy-at-0-K" ||
          check === "statistical-mechanics-heat-content" ||
          (check === "tabulated-enthalpy-increment" && against?.["0 K"] !== undefined),
      );
    const elements = elementSequences.map(({ phases }) => findSpecies(referenceData, phases[0]!));
    const published = elements.filter(({ enthalpyAbove0K }) => enthalpyAbove0K !== undefined);
    for (const record of published) expect(vouching(record).length, record.label).toBeGreaterThan(0);
    expect(elements.filter((record) => !published.includes(record)).map(({ label }) => label)).toEqual(["Na(cr)"]);
  });
});

describe("what the check lacks is a fault", () => {
  const pair = { formationEnthalpy: 147.1, formationEnthalpyAt0K: 145.901 };
  const bare = (record: SpeciesRecord): SpeciesRecord => {
    const { enthalpyAbove0K: _left, ...others } = record;
    return others;
  };
  const ofMagnesium = { "Mg(cr)": -1, "Mg(g)": 1 };

  test.each([
    ["no figure at 0 K", ofMagnesium, {}, "formationEnthalpyAt0K"],
    ["nothing formed", { "Mg(cr)": -1 }, pair, "the formation of one mole"],
    ["two moles formed", { "Mg(cr)": -2, "Mg(g)": 2 }, pair, "the formation of one mole"],
    ["two species formed", { "Mg(cr)": -2, "Mg(g)": 1, "H2(g)": 1 }, pair, "the formation of one mole"],
    ["formed beside another", ofMagnesium, { ...pair, enthalpyAbove0K: 6.197 }, "elements alone"],
    [
      "no figure at 298.15 K of a species without record",
      { "Mg(cr)": -1 },
      { formationEnthalpyAt0K: 145.901, enthalpyAbove0K: 6.197 },
      '"formationEnthalpy"',
    ],
  ])("%s", (_, reaction, against, words) => {
    expect(() => computeWitness(Mg_cr, witnessOf(reaction, against), referenceData)).toThrow(
      expect.objectContaining({ code: "checks/no-inputs", message: expect.stringContaining(words) }),
    );
  });

  test("no increment of the element, or of the species", () => {
    for (const [record, other] of [
      [bare(Mg_cr), Mg_g],
      [bare(Mg_g), Mg_cr],
    ] as const) {
      expect(() => computeWitness(record, witnessOf(ofMagnesium, pair), collectionOf(record, other))).toThrow(
        expect.objectContaining({
          code: "checks/no-inputs",
          path: [record.label, "witnesses", "formation-enthalpy-at-0-K"],
          message: expect.stringContaining("enthalpyAbove0K"),
        }),
      );
    }
  });

  test("no increment beside the row 0 K", () => {
    const witness: Witness = {
      ...witnessOf({}),
      check: "tabulated-enthalpy-increment",
      against: { "0 K": figure(-5, "kJ/mol") },
    };
    expect(() => computeWitness(bare(Mg_cr), witness, referenceData)).toThrow(
      expect.objectContaining({ code: "checks/no-inputs", message: expect.stringContaining("enthalpyAbove0K") }),
    );
  });
});
