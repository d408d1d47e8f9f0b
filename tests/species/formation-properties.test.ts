import { describe, expect, test } from "vitest";
import { quantity } from "../../src/quantity/quantity.js";
import {
  type CollectionData,
  formationProperties,
  type SpeciesRecord,
  standardProperties,
} from "../../src/species/index.js";
import { placesOf } from "../errors/faults-of.js";
import { figure } from "../heat-capacity/random-series.js";
import { alpha, gamma, ironData, ironOxide, liquid, oxygen, sequence } from "./iron.js";
import { polynomialRecord, recordOf } from "./records.js";

const at = (temperatureK: number) => ({ temperature: quantity(temperatureK, "K") });
const gibbs = (record: SpeciesRecord, temperatureK: number): number =>
  standardProperties(record, at(temperatureK)).gibbsEnergy.value;

describe("a formation from the elements", () => {
  test.each([
    [500, alpha],
    [1500, gamma],
    [2000, liquid],
  ])("at %d K refers to the phases that are stable there", (temperatureK, iron) => {
    const formation = formationProperties(ironOxide, at(temperatureK), ironData);
    const expected = gibbs(ironOxide, temperatureK) - gibbs(iron, temperatureK) - gibbs(oxygen, temperatureK) / 2;
    expect(formation.gibbsEnergy.value).toBeCloseTo(expected, 7);
    expect(formation.lnK).toBeCloseTo(-expected / (8.31446261815324 * temperatureK), 10);
    expect(formation.log10K).toBeCloseTo(formation.lnK / Math.LN10, 12);
    expect(formation.elements).toMatchObject([
      { element: "Fe", phase: iron.label, coefficient: -1, sequence: "Fe" },
      { element: "O", phase: "O2(g)", coefficient: -0.5, sequence: "O2" },
    ]);
  });

  test("at 298.15 K has the enthalpy of formation of the record", () => {
    expect(formationProperties(ironOxide, at(298.15), ironData).enthalpy.value).toBeCloseTo(-272_000, 6);
  });

  test("of an element in its reference phase is nothing, to the last bit", () => {
    const { enthalpy, entropy, gibbsEnergy, lnK } = formationProperties(gamma, at(1500), ironData);
    expect([enthalpy.value, entropy.value, gibbsEnergy.value, lnK]).toEqual([0, 0, 0, 0]);
  });

  test("outside the range of an element names the element", () => {
    const short = { ...ironData, sequences: [sequence("Fe", "Fe(cr,alpha)"), sequence("O2", "O2(g)")] };
    expect(formationProperties(ironOxide, at(2500), short).outsideRange).toEqual([]);
    const cut = { ...ironData, sequences: [sequence("Fe", "Fe(cr,gamma)"), sequence("O2", "O2(g)")] };
    expect(placesOf(() => formationProperties(ironOxide, at(500), cut))).toEqual([
      "species/outside-range at temperature",
    ]);
    expect(formationProperties(ironOxide, { ...at(500), outsideRange: "continue-fit" }, cut).outsideRange).toEqual([
      "Fe",
    ]);
  });
});

describe("faults of formations", () => {
  test("no reference sequence, or several", () => {
    expect(placesOf(() => formationProperties(ironOxide, at(500), { species: [] }))).toEqual([
      "species/no-reference at collection.sequences",
      "species/no-reference at collection.sequences",
    ]);
    const other = { ...sequence("O2", "O2(g)"), source: { text: "another" } };
    const two: CollectionData = { ...ironData, sequences: [...ironData.sequences!, other] };
    expect(placesOf(() => formationProperties(ironOxide, at(500), two))).toEqual([
      "species/ambiguous at elementSource",
    ]);
    const chosen = formationProperties(ironOxide, { ...at(500), elementSource: { text: "another" } }, two);
    expect(chosen.elements.map(({ source }) => source)).toContainEqual({ text: "another" });
    expect(chosen.gibbsEnergy).toEqual(formationProperties(ironOxide, at(500), ironData).gibbsEnergy);
  });

  test("records of different conventions", () => {
    const converted = { ...ironOxide, convention: "elements at 0 K" };
    expect(placesOf(() => formationProperties(converted, at(500), ironData))).toEqual([
      "species/mixed-conventions at species",
    ]);
  });
});

describe("the formation of an ion", () => {
  // CODATA Key Values (1989), from memory; kJ/mol and J/mol/K.
  const data: CollectionData = {
    species: [
      recordOf("Cl^-(aq)", { formationEnthalpy: figure(-167.08, "kJ/mol"), standardEntropy: figure(56.6, "J/mol/K") }),
      recordOf("Ca^2+(aq)", { formationEnthalpy: figure(-543, "kJ/mol"), standardEntropy: figure(-56.2, "J/mol/K") }),
      recordOf("OH^-(aq)", {
        formationEnthalpy: figure(-230.015, "kJ/mol"),
        standardEntropy: figure(-10.9, "J/mol/K"),
      }),
      recordOf("H^+(aq)", { formationEnthalpy: figure(0, "kJ/mol"), standardEntropy: figure(0, "J/mol/K") }),
      recordOf("Cl2(g)", { standardEntropy: figure(223.081, "J/mol/K") }),
      recordOf("Ca(cr)", { standardEntropy: figure(41.59, "J/mol/K") }),
      polynomialRecord("H2(g)", 0, 130.68, [28], [0]),
      recordOf("O2(g)", { standardEntropy: figure(205.152, "J/mol/K") }),
    ],
    sequences: [sequence("H2", "H2(g)"), sequence("Cl2", "Cl2(g)"), sequence("Ca", "Ca(cr)"), sequence("O2", "O2(g)")],
  };
  const energyOf = (label: string): number =>
    formationProperties(data.species.find((record) => record.label === label)!, at(298.15), data).gibbsEnergy.value /
    1000;

  test.each([
    ["Cl^-(aq)", -131.2],
    ["Ca^2+(aq)", -552.8],
    ["OH^-(aq)", -157.2],
  ])("counts half the entropy of hydrogen a charge: %s", (label, published) => {
    expect(energyOf(label)).toBeCloseTo(published, 1);
  });

  test("of the hydrogen ion is zero, with no elements left", () => {
    const ion = formationProperties(data.species[3]!, at(298.15), data);
    expect(ion.gibbsEnergy.value).toBe(0);
    expect(ion.elements).toEqual([]);
  });
});
