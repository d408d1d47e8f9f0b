import { describe, expect, test } from "vitest";
import { referenceData } from "../../src/data/reference-data.js";
import { findSpecies, speciesCollection } from "../../src/species/collection.js";
import { recordOfLabel } from "../../src/species/collection-index.js";
import type { CollectionData } from "../../src/species/record.js";
import { faultsOf, placesOf } from "../errors/faults-of.js";
import { invented } from "../heat-capacity/random-series.js";
import { collectionOf, recordOf } from "./records.js";

const iron = recordOf("Fe^3+(aq)");
const collection = speciesCollection(referenceData);

describe.each([
  ["plain data", referenceData],
  ["a collection", collection],
  ["data through JSON", JSON.parse(JSON.stringify(referenceData)) as CollectionData],
])("%s: a species is found", (_name, data) => {
  test.each([
    ["by label", "NH3(g)", "NH3(g)"],
    ["by a label spelled otherwise", "NH₃(g)", "NH3(g)"],
    ["by formula, where there is one phase", "NH3", "NH3(g)"],
    ["by a formula of the same atoms", "H3N", "NH3(g)"],
    ["by CAS Registry Number", "7664-41-7", "NH3(g)"],
    ["by name", "ammonia", "NH3(g)"],
    ["by name in other letters", "AMMONIA", "NH3(g)"],
    ["by formula and state, whatever the polymorph", "CaCO3(cr)", "CaCO3(cr,calcite)"],
    ["by formula and any solid state", "CaCO3(s)", "CaCO3(cr,calcite)"],
    ["by a formula with one solid among its phases", "C(s)", "C(cr,graphite)"],
  ])("%s", (_how, key, label) => {
    expect(findSpecies(data, key).label).toBe(label);
  });

  test("a formula of several phases lists the choices", () => {
    const [fault] = faultsOf(() => findSpecies(data, "H2O"));
    expect(fault).toMatchObject({ code: "species/ambiguous", path: [], received: "H2O" });
    expect(fault?.expected?.split(", ").sort()).toEqual(["H2O(cr)", "H2O(g)", "H2O(l)"]);
    expect(fault?.hint).toMatch(/^name the phase, such as H2O\((g|l|cr)\)$/);
  });

  test.each([
    ["NH3(q)", undefined],
    ["NH3(G)", "did you mean NH3(g)?"],
    ["nh3(g)", "did you mean NH3(g)?"],
    ["CaCO3(cr,calcit)", "did you mean CaCO3(cr,calcite)?"],
    ["unobtainium", undefined],
    ["NH3(l)", "did you mean NH3(g)?"],
    ["x".repeat(10_000), undefined],
  ])("%.20s is not found", (key, hint) => {
    const [fault, ...others] = faultsOf(() => findSpecies(data, key));
    expect(others).toEqual([]);
    expect(fault?.code).toBe("species/not-found");
    if (hint !== undefined) expect(fault?.hint).toBe(hint);
    expect(fault?.message.length).toBeLessThan(200);
  });
});

test.each([undefined, null, 7, "", {}])("%s names no species", (key) => {
  expect(placesOf(() => findSpecies(referenceData, key as string))).toEqual(["input/not-a-string at "]);
});

test("ions and neutral species of one formula are told apart", () => {
  const data = collectionOf(iron, recordOf("Fe^2+(aq)"), recordOf("Fe(g)"));
  expect(findSpecies(data, "Fe").label).toBe("Fe(g)");
  expect(findSpecies(data, "Fe^3+").label).toBe("Fe^3+(aq)");
  expect(findSpecies(data, "Fe³⁺(aq)").label).toBe("Fe^3+(aq)");
});

test("isomers are found by the spelling of their formula", () => {
  const data = collectionOf(recordOf("C2H5OH(g)"), recordOf("CH3OCH3(g)"));
  expect(findSpecies(data, "C2H5OH").label).toBe("C2H5OH(g)");
  expect(findSpecies(data, "CH3OCH3").label).toBe("CH3OCH3(g)");
  expect(placesOf(() => findSpecies(data, "C2H6O"))).toEqual(["species/ambiguous at "]);
});

test("a label is looked up as it stands", () => {
  expect(recordOfLabel(referenceData, "N2(g)")?.name).toBe("nitrogen");
  expect(recordOfLabel(referenceData, "N2")).toBeUndefined();
});

describe("a collection", () => {
  test("is frozen to the depth, sequences too", () => {
    const sequences = [{ label: "Fe(cr)", phases: ["Fe(cr)"], source: invented, origin: "memory" as const }];
    const house = speciesCollection({ species: [recordOf("Fe(cr)")], sequences });
    expect(Object.isFrozen(house)).toBe(true);
    expect(Object.isFrozen(house.species)).toBe(true);
    expect(Object.isFrozen(house.species[0]?.witnesses)).toBe(true);
    expect(Object.isFrozen(house.sequences?.[0]?.phases)).toBe(true);
    sequences[0]!.label = "changed";
    expect(house.sequences?.[0]?.label).toBe("Fe(cr)");
    expect(speciesCollection(house).species[0]).toBe(house.species[0]);
  });

  test("does not see changes made later", () => {
    const species = [recordOf("He(g)")];
    const house = speciesCollection({ species });
    species.push(recordOf("Ar(g)"));
    expect(house.species).toHaveLength(1);
    expect(placesOf(() => findSpecies(house, "Ar(g)"))).toEqual(["species/not-found at "]);
  });

  test("has every label once", () => {
    expect(placesOf(() => speciesCollection(collectionOf(iron, { ...iron })))).toEqual([
      "species/duplicate-label at collection.species.1.label",
    ]);
    expect(placesOf(() => findSpecies(collectionOf(iron, { ...iron }), "Fe^3+(aq)"))).toEqual([
      "species/duplicate-label at collection.species.1.label",
    ]);
  });

  test("reports the faults of all records", () => {
    const wrong = {
      species: [iron, { ...iron, label: "Fe^2+(aq)" }, { ...iron, state: "solution" }, 7],
      sequences: {},
    };
    expect(placesOf(() => speciesCollection(wrong as never))).toEqual([
      "species/inconsistent at collection.species.1.label",
      "input/unknown-option at collection.species.2.state",
      "input/not-an-object at collection.species.3",
      "input/not-an-array at collection.sequences",
      "species/duplicate-label at collection.species.2.label",
    ]);
  });

  test.each<[unknown, string]>([
    [undefined, "input/not-an-object at collection"],
    [null, "input/not-an-object at collection"],
    [[iron], "input/not-an-object at collection"],
    [{}, "input/missing at collection.species"],
    [{ species: {} }, "input/not-an-array at collection.species"],
    [{ species: [], records: [] }, "input/unknown-key at collection.records"],
    [{ species: [null] }, "species/invalid-record at collection.species.0"],
    [{ species: [{ label: 7 }] }, "species/invalid-record at collection.species.0"],
  ])("plain data %j is refused when a species is sought", (data, place) => {
    expect(placesOf(() => findSpecies(data as CollectionData, "NH3(g)"))).toEqual([place]);
  });

  test("a wrong record is reported when it is used, and only then", () => {
    const data = collectionOf(iron, { ...recordOf("He(g)"), formula: 7, chargeNumber: {} } as never);
    expect(findSpecies(data, "Fe^3+").label).toBe("Fe^3+(aq)");
    expect(placesOf(() => findSpecies(data, "He(g)"))).toEqual([
      "input/not-a-string at collection.species.1.formula",
      "input/not-finite at collection.species.1.chargeNumber",
    ]);
  });
});

test("a misspelt name gets the name as a hint", () => {
  const [fault] = faultsOf(() => findSpecies(referenceData, "ammonai"));
  expect(fault?.code).toBe("species/not-found");
  expect(fault?.hint).toBe("did you mean ammonia?");
});
