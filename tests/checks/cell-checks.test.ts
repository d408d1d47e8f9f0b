import { describe, expect, test } from "vitest";
import { computeWitness, recomputeWitnesses } from "../../src/checks/witness-checks.js";
import {
  AgBr_cr,
  CaF2_cr,
  Cl_minus_aq,
  CO2_aq,
  HCO3_minus_aq,
  NH4_plus_aq,
  OH_minus_aq,
  referenceData,
} from "../../src/data/index.js";
import type { Figure } from "../../src/quantity/figure.js";
import { quantity } from "../../src/quantity/quantity.js";
import type { CollectionData, SpeciesRecord, Witness } from "../../src/species/record.js";
import { convertStandardPressure } from "../../src/standard-state/convert-standard-pressure.js";
import { placesOf } from "../errors/faults-of.js";
import { recordOf } from "../species/records.js";

const source = { text: "invented" };
const figure = (value: number, unit: string): Figure => ({ value, unit, source, origin: "memory" });

/** An invented substance known at 298.15 K. */
function point(label: string, enthalpy: number, entropy: number): SpeciesRecord {
  return recordOf(label, { formationEnthalpy: figure(enthalpy, "J/mol"), standardEntropy: figure(entropy, "J/mol/K") });
}

const hydrogen = point("H2(g)", 0, 130);
const metal = point("Na(cr)", 0, 50);
const ion = point("Na^+(aq)", -240000, 60);
const invented: CollectionData = {
  species: [hydrogen, metal, ion, point("H^+(aq)", 0, 0)],
  sequences: [
    { label: "Na", phases: ["Na(cr)"], source, origin: "memory" },
    { label: "H2", phases: ["H2(g)"], source, origin: "memory" },
  ],
};
const reduction = { "Na^+(aq)": -1, "e^-": -1, "Na(cr)": 1 };

function witness(check: Witness["check"], parts: Partial<Witness>): Witness {
  return { group: "formation", kind: "physical", check, deviation: 0, tolerance: 1, source, ...parts };
}

function computed(check: Witness["check"], parts: Partial<Witness>): number {
  return computeWitness(ion, witness(check, parts), invented);
}

describe("by hand, from invented figures", () => {
  // Na^+ + 1/2 H2 = Na + H^+: dH = 240000 J/mol, dS = 50 - 60 - 65 = -75 J/mol/K, dG = 240000 + 298.15 * 75 J/mol
  const gibbsEnergy = 240000 + 298.15 * 75;
  const faraday = 96485.33212331;

  test("a half-reaction counts the electron as half a mole of hydrogen less the hydrogen ion", () => {
    const against = { cellPotential: figure(-2.7, "V") };
    expect(computed("cell-potential", { reaction: reduction, against })).toBeCloseTo(-gibbsEnergy / faraday + 2.7, 12);
  });

  test("a whole cell says how many electrons pass", () => {
    const reaction = { "Na^+(aq)": -2, "H2(g)": -1, "Na(cr)": 2, "H^+(aq)": 2 };
    const against = { cellPotential: figure(-2.7, "V"), electrons: figure(2, "1") };
    expect(computed("cell-potential", { reaction, against })).toBeCloseTo(-gibbsEnergy / faraday + 2.7, 12);
  });

  test("potentials at 1 atm lie 0.169 mV above those at 1 bar where hydrogen is the only gas", () => {
    const bar = computed("cell-potential", { reaction: reduction, against: { cellPotential: figure(-2.7, "V") } });
    const atm = computed("cell-potential", {
      reaction: reduction,
      against: { cellPotential: figure(-2.7, "V"), standardPressure: figure(1, "atm") },
    });
    expect(atm - bar).toBeCloseTo(0.000169, 6);
  });

  test("the temperature coefficient is dS / F; at 1 atm it is 0.00057 mV/K more", () => {
    const against = { temperatureCoefficient: figure(-0.7, "mV/K") };
    const bar = computed("cell-temperature-coefficient", { reaction: reduction, against });
    expect(bar).toBeCloseTo(-75 / faraday + 0.0007, 14);
    const atm = computed("cell-temperature-coefficient", {
      reaction: reduction,
      against: { ...against, standardPressure: figure(1, "atm") },
    });
    expect(1000 * (atm - bar)).toBeCloseTo(0.000567, 6);
  });

  test("the entropy of a reaction", () => {
    expect(
      computed("reaction-entropy", { reaction: reduction, against: { reactionEntropy: figure(-70, "J/mol/K") } }),
    ).toBeCloseTo(-5, 12);
  });

  test("the Gibbs energy of formation of an ion has half the entropy of hydrogen for its charge", () => {
    const own = { ...ion, formationGibbsEnergy: figure(-262, "kJ/mol") };
    const formation = -240000 - 298.15 * (60 - 50 + 65);
    expect(computeWitness(own, witness("formation-gibbs-energy", {}), invented)).toBeCloseTo(formation + 262000, 8);
    const against = { formationGibbsEnergy: figure(-262.1, "kJ/mol") };
    expect(computeWitness(own, witness("formation-gibbs-energy", { against }), invented)).toBeCloseTo(
      formation + 262100,
      8,
    );
  });

  test("the record's own Gibbs energy of formation refers to its standard pressure", () => {
    for (const { label } of [AgBr_cr, Cl_minus_aq, OH_minus_aq]) {
      const record = referenceData.species.find((one) => one.label === label) as SpeciesRecord;
      const atmosphere = convertStandardPressure(record, quantity(1, "atm"));
      const check = witness("formation-gibbs-energy", {});
      const before = computeWitness(record, check, referenceData);
      expect(computeWitness(atmosphere, check, referenceData)).toBeCloseTo(before, 8);
    }
    const against = { formationGibbsEnergy: figure(-262, "kJ/mol") };
    const bar = computeWitness(ion, witness("formation-gibbs-energy", { against }), invented);
    const atm = computeWitness(
      ion,
      witness("formation-gibbs-energy", { against: { ...against, standardPressure: figure(1, "atm") } }),
      invented,
    );
    // Na^+ takes up no gas but half a mole of hydrogen in its formation: RT ln(1.01325) / 2 = 16.3 J/mol.
    expect(Math.abs(atm - bar)).toBeCloseTo(16.32, 2);
  });

  test("an equilibrium between solutes and pure phases needs no unit of pressure, one with a gas does", () => {
    const reaction = { "Na(cr)": -1, "Na^+(aq)": 1, "H^+(aq)": -1 };
    const against = { "298.15 K": figure(40, "1") };
    const log10K = (240000 + 298.15 * 10) / (8.31446261815324 * 298.15 * Math.LN10);
    expect(computed("equilibrium-constant", { reaction, against })).toBeCloseTo(log10K - 40, 10);
    expect(
      placesOf(() => computed("equilibrium-constant", { reaction: { ...reaction, "H2(g)": 0.5 }, against })),
    ).toEqual(["checks/no-inputs at Na^+(aq).witnesses.equilibrium-constant"]);
  });
});

describe("what is missing is a fault", () => {
  const against = { cellPotential: figure(1, "V") };
  const without = (label: string): CollectionData => ({
    ...invented,
    species: invented.species.filter((record) => record.label !== label),
  });

  test.each<readonly [name: string, Witness, CollectionData]>([
    ["a potential", witness("cell-potential", { reaction: reduction }), invented],
    ["a reaction", witness("cell-potential", { against }), invented],
    ["electrons", witness("cell-potential", { reaction: { "Na^+(aq)": -1, "Na(cr)": 1 }, against }), invented],
    [
      "electrons on the left",
      witness("cell-potential", { reaction: { "Na(cr)": -1, "Na^+(aq)": 1, "e^-": 1 }, against }),
      invented,
    ],
    ["hydrogen", witness("cell-potential", { reaction: reduction, against }), without("H2(g)")],
    ["the hydrogen ion", witness("cell-potential", { reaction: reduction, against }), without("H^+(aq)")],
    ["a coefficient", witness("cell-temperature-coefficient", { reaction: reduction }), invented],
    ["an entropy", witness("reaction-entropy", { reaction: reduction }), invented],
    ["a Gibbs energy", witness("formation-gibbs-energy", {}), invented],
  ])("%s", (_, asked, collection) => {
    expect(placesOf(() => computeWitness(ion, asked, collection))).toEqual([
      `checks/no-inputs at Na^+(aq).witnesses.${asked.check}`,
    ]);
  });

  test("the reference phase of an element", () => {
    const asked = witness("formation-gibbs-energy", { against: { formationGibbsEnergy: figure(-262, "kJ/mol") } });
    expect(placesOf(() => computeWitness(ion, asked, { species: invented.species }))).toEqual([
      "species/no-reference at collection.sequences",
      "species/no-reference at collection.sequences",
    ]);
  });

  test("a heat capacity of a reference point", () => {
    const asked = witness("tabulated-heat-capacity", { against: { "500 K": figure(30, "J/mol/K") } });
    const point298 = { ...asked, against: { "298.15 K": figure(30, "J/mol/K") } };
    expect(placesOf(() => computeWitness(ion, point298, invented))).toEqual([
      "checks/no-inputs at Na^+(aq).witnesses.tabulated-heat-capacity",
    ]);
  });
});

describe("mutations of the reference data are caught", () => {
  type Changes = { readonly enthalpy?: number; readonly entropy?: number };
  const changed = (record: SpeciesRecord, { enthalpy = 0, entropy = 0 }: Changes): SpeciesRecord => {
    const copy = structuredClone(record);
    (copy.formationEnthalpy as { value: number }).value += enthalpy;
    (copy.standardEntropy as { value: number }).value += entropy;
    return copy;
  };
  const failing = (record: SpeciesRecord): string[] =>
    recomputeWitnesses(record, referenceData)
      .filter(({ confirms }) => !confirms)
      .map(({ witness: { check } }) => check);

  test.each([
    ["chloride, 0.5 kJ/mol", Cl_minus_aq, { enthalpy: 0.5 }, "cell-potential"],
    ["chloride, 1.5 J/mol/K", Cl_minus_aq, { entropy: 1.5 }, "cell-temperature-coefficient"],
    ["chloride, digits of the entropy exchanged", Cl_minus_aq, { entropy: 65.6 - 56.6 }, "formation-gibbs-energy"],
    ["hydroxide, digits of the enthalpy exchanged", OH_minus_aq, { enthalpy: 0.135 }, "formation-gibbs-energy"],
    ["hydroxide, 1 J/mol/K", OH_minus_aq, { entropy: 1 }, "reaction-entropy"],
    ["ammonium, 1 kJ/mol", NH4_plus_aq, { enthalpy: 1 }, "equilibrium-constant"],
    ["hydrogencarbonate, 1 kJ/mol", HCO3_minus_aq, { enthalpy: 1 }, "equilibrium-constant"],
    ["carbon dioxide, the gas's entropy", CO2_aq, { entropy: 213.785 - 119.36 }, "reaction-entropy"],
    ["silver bromide, 1 kJ/mol", AgBr_cr, { enthalpy: 1 }, "cell-potential"],
    ["fluorite, 8 kJ/mol as in another table", CaF2_cr, { enthalpy: 8.4 }, "equilibrium-constant"],
  ] as const)("%s", (_, record, changes, check) => {
    expect(failing(record)).toEqual([]);
    expect(failing(changed(record, changes))).toContain(check);
  });

  test("the half entropy of hydrogen left out of an ion is 19.48 kJ/mol and never passes", () => {
    const own = Cl_minus_aq.witnesses.find(({ check }) => check === "formation-gibbs-energy") as Witness;
    const forgotten = { ...own, against: { formationGibbsEnergy: figure(-150.7, "kJ/mol") } };
    expect(computeWitness(Cl_minus_aq, forgotten, referenceData)).toBeCloseTo(19480, -2);
  });
});
