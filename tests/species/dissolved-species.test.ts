import { describe, expect, test } from "vitest";
import { Cl_minus_aq, CO2_aq, H_plus_aq, NH3_aq, NH3_g, referenceData } from "../../src/data/index.js";
import { quantity } from "../../src/quantity/quantity.js";
import { reaction } from "../../src/reaction/reaction.js";
import { findSpecies, speciesCollection } from "../../src/species/collection.js";
import { speciesGrade } from "../../src/species/grade.js";
import type { SpeciesRecord, Witness } from "../../src/species/record.js";
import { standardProperties } from "../../src/species/standard-properties.js";
import { placesOf } from "../errors/faults-of.js";

describe("names of dissolved species", () => {
  const both = speciesCollection({ species: [NH3_aq, NH3_g] });

  test("a formula or a CAS number without state means a phase of the substance itself, in any order", () => {
    for (const collection of [both, { species: [NH3_g, NH3_aq] }]) {
      expect(findSpecies(collection, "NH3").label).toBe("NH3(g)");
      expect(findSpecies(collection, "H3N").label).toBe("NH3(g)");
      expect(findSpecies(collection, "7664-41-7").label).toBe("NH3(g)");
      expect(findSpecies(collection, "NH3(aq)").label).toBe("NH3(aq)");
      expect(findSpecies(collection, "dissolved ammonia").label).toBe("NH3(aq)");
    }
  });

  test("a dissolved species that stands alone needs no state", () => {
    expect(findSpecies({ species: [NH3_aq] }, "NH3").label).toBe("NH3(aq)");
    expect(findSpecies({ species: [CO2_aq] }, "124-38-9").label).toBe("CO2(aq)");
    expect(findSpecies(referenceData, "Cl^-").label).toBe("Cl^-(aq)");
    expect(findSpecies(referenceData, "H^+").label).toBe("H^+(aq)");
  });

  test("two phases of the substance itself stay ambiguous", () => {
    expect(placesOf(() => findSpecies(referenceData, "H2O"))).toEqual(["species/ambiguous at "]);
  });

  test("equations of gases read as before", () => {
    expect(reaction("N2 + 3 H2 = 2 NH3", referenceData).equation).toBe("N2(g) + 3 H2(g) = 2 NH3(g)");
    expect(reaction("CO2(aq) + H2O(l) = H^+ + HCO3^-", referenceData).equation).toBe(
      "CO2(aq) + H2O(l) = H^+(aq) + HCO3^-(aq)",
    );
  });
});

describe("reference points", () => {
  test("have enthalpy and entropy at 298.15 K and no heat capacity, and refuse other temperatures", () => {
    const { heatCapacity, enthalpy, entropy } = standardProperties(Cl_minus_aq, { temperature: quantity(298.15, "K") });
    expect(heatCapacity).toBeUndefined();
    expect([enthalpy.value, entropy.value]).toEqual([-167080, 56.6]);
    expect(placesOf(() => standardProperties(Cl_minus_aq, { temperature: quantity(300, "K") }))).toEqual([
      "species/outside-range at temperature",
    ]);
  });

  test("the hydrogen ion is zero", () => {
    const { enthalpy, entropy, gibbsEnergy } = standardProperties(H_plus_aq, { temperature: quantity(298.15, "K") });
    expect([enthalpy.value, entropy.value, gibbsEnergy.value]).toEqual([0, 0, 0]);
  });

  test("are graded at 298.15 K, as far as they reach", () => {
    const witnessOf = (kind: Witness["kind"]): Witness => ({
      group: "caloric",
      kind,
      check: "reaction-entropy",
      deviation: 0,
      tolerance: 1,
      source: { text: "invented" },
    });
    const graded = (...witnesses: Witness[]): unknown =>
      speciesGrade({ ...(structuredClone(Cl_minus_aq) as SpeciesRecord), witnesses }).caloric;
    expect(graded(witnessOf("physical"))).toBe("A");
    expect(graded(witnessOf("transcription"), witnessOf("transcription"))).toBe("B");
    expect(graded(witnessOf("transcription"))).toBe("C");
    expect(graded({ ...witnessOf("physical"), deviation: 2 })).toBeUndefined();
  });
});
