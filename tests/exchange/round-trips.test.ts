import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { referenceData } from "../../src/data/reference-data.js";
import { readCollection, readReaction, readSpecies } from "../../src/exchange/index.js";
import { type Reaction, reaction } from "../../src/reaction/reaction.js";
import { standardReactionProperties } from "../../src/reaction/standard-reaction.js";
import { findSpecies, speciesCollection } from "../../src/species/collection.js";
import { houseRecord } from "../../src/species/house-record.js";
import type { CollectionData } from "../../src/species/record.js";
import { standardProperties } from "../../src/species/standard-properties.js";
import { figure, invented } from "../heat-capacity/random-series.js";
import { randomTerms, reactionOf } from "../reaction/random-reactions.js";
import { randomRecords } from "../schema/random-records.js";
import { polynomialRecord, recordOf } from "../species/records.js";

const layouts = fc.constantFrom(undefined, 1, 2, "\t");

// toEqual compares numbers with Object.is: the same bits, the sign of zero too.
describe("what is written is read back with the same bits", () => {
  test("random records: as text in any layout, written by hand or by the house, and as structured clones", () => {
    fc.assert(
      fc.property(randomRecords, layouts, (record, layout) => {
        const house = houseRecord(record);
        expect(readSpecies(JSON.stringify(record, null, layout))).toEqual(house);
        expect(readSpecies(JSON.stringify(house, null, layout))).toEqual(house);
        expect(readSpecies(structuredClone(record))).toEqual(house);
        expect(JSON.stringify(readSpecies(JSON.stringify(house)))).toBe(JSON.stringify(house));
      }),
      { seed: 20270307, numRuns: 1000 },
    );
  });

  test("random collections", () => {
    const records = fc.uniqueArray(randomRecords, { selector: ({ label }) => label, maxLength: 4 });
    fc.assert(
      fc.property(records, layouts, (species, layout) => {
        const house = speciesCollection({ species });
        expect(readCollection(JSON.stringify(house, null, layout))).toEqual(house);
        expect(readCollection(JSON.stringify(species, null, layout))).toEqual(house);
        expect(readCollection(structuredClone(house))).toEqual(house);
      }),
      { seed: 20270308, numRuns: 200 },
    );
  });

  test("random reactions, and what is computed from them", () => {
    fc.assert(
      fc.property(randomTerms, fc.double({ min: 200, max: 3000, noNaN: true }), layouts, (terms, value, layout) => {
        const written = reactionOf(terms);
        const at = { temperature: { value, unit: "K" } } as const;
        const before = standardReactionProperties(written, at);
        for (const input of [JSON.stringify(written, null, layout), structuredClone(written)]) {
          const read = readReaction(input);
          expect(read).toEqual(written);
          expect(standardReactionProperties(read, at)).toEqual(before);
        }
      }),
      { seed: 20270309, numRuns: 100 },
    );
  });

  test("the reference data, and what is computed from them", () => {
    const read = readCollection(JSON.stringify(referenceData));
    expect(read).toEqual(speciesCollection(referenceData));
    const at = { temperature: { value: 700, unit: "K" } } as const;
    for (const label of ["NH3(g)", "H2O(g)", "CO2(g)", "C(cr,graphite)"]) {
      const [theirs, own] = [read, referenceData].map((collection) => findSpecies(collection, label));
      expect(standardProperties(theirs!, at)).toEqual(standardProperties(own!, at));
    }
  });

  const transition = { temperature: figure(1200, "K"), into: "Fe(cr,gamma)", enthalpy: figure(1, "kJ/mol") };
  const collection: CollectionData = {
    species: [
      polynomialRecord("Fe(cr,alpha)", 0, 27, [25], [0], { transitions: [transition] }),
      polynomialRecord("Fe(cr,gamma)", 5000, 32, [30], [0]),
      recordOf("Fe^2+(aq)"),
      recordOf("H2(g)"),
    ],
    sequences: [{ label: "Fe(cr)", phases: ["Fe(cr,alpha)", "Fe(cr,gamma)"], source: invented, origin: "memory" }],
  };

  test("a reaction with a stable sequence and the electron", () => {
    const half = reaction("Fe^2+(aq) + 2 e^- = Fe(cr)", collection);
    const read = readReaction(JSON.stringify(half));
    expect(read).toEqual(half);
    const at = { temperature: { value: 298.15, unit: "K" } } as const;
    expect(standardReactionProperties(read, at)).toEqual(standardReactionProperties(half, at));
    expect(readCollection(JSON.stringify(collection))).toEqual(speciesCollection(collection));
  });

  test("-0 is read as 0", () => {
    const text = JSON.stringify(recordOf("Ar(g)")).replace('"chargeNumber":0', '"chargeNumber":-0');
    expect(text).toContain("-0");
    expect(Object.is(readSpecies(text).chargeNumber, 0)).toBe(true);
    expect(readSpecies(recordOf("Ar(g)", { chargeNumber: -0 })).chargeNumber).toBe(0);
  });
});

test("the order of terms decides nothing but the order", () => {
  const synthesis = reaction("N2 + 3 H2 = 2 NH3", referenceData);
  const turned: Reaction = { ...synthesis, terms: synthesis.terms.toReversed(), notes: [] };
  const read = readReaction(JSON.stringify(turned));
  expect(read.equation).toBe("3 H2(g) + N2(g) = 2 NH3(g)");
  const at = { temperature: { value: 700, unit: "K" } } as const;
  expect(standardReactionProperties(read, at).gibbsEnergy).toEqual(
    standardReactionProperties(synthesis, at).gibbsEnergy,
  );
});
