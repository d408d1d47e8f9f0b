import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { referenceData } from "../../src/data/reference-data.js";
import type { Fault } from "../../src/errors/fault.js";
import { isGibbsLedgerError } from "../../src/errors/gibbs-ledger-error.js";
import { collectionSchema, speciesRecordSchema } from "../../src/schema.js";
import { checkRecord } from "../../src/species/check-record.js";
import { speciesCollection } from "../../src/species/collection.js";
import type { CollectionData, PhaseSequence } from "../../src/species/record.js";
import { figure, invented } from "../heat-capacity/random-series.js";
import { fitted, polynomialRecord, recordOf } from "../species/records.js";
import { mutated } from "./mutated.js";
import { randomRecords } from "./random-records.js";
import { verdictsAgree } from "./verdicts.js";

function recordFaults(value: unknown): Fault[] {
  const faults: Fault[] = [];
  checkRecord(value, [], faults);
  return faults;
}

function collectionFaults(value: unknown): readonly Fault[] {
  try {
    speciesCollection(value as CollectionData);
    return [];
  } catch (error) {
    if (!isGibbsLedgerError(error)) throw error;
    return error.faults;
  }
}

const words = [
  ...["g", "l", "cr", "am", "aq", "s", "gas", "alpha", "graphite", "NH3", "NH3(g)", "H2O", "H₂O(g)", "Fe^3+(aq)", "C"],
  ...["bar", "Pa", "K", "Cel", "[degF]", "kJ/mol", "J/mol", "J/mol/K", "cm3/mol", "1", "K-1", "Pa-1", "kcal/mol"],
  ...["page", "memory", "cox1989", "chase1998", "nobody1900", { text: "own words" }],
  ...["caloric", "formation", "critical", "volume", "physical", "transcription", "closure-at-breaks"],
  ...["series", "reference-point", "fit", "first-order", "continuous", "shomate", "maier-kelley", "polynomial"],
  ...[0, 1, 2, -1, 21, 200, 298.15, 500, 3000, 0.95, -300, [300, 600], [600, 300], [300, 300], [300]],
  { kind: "reference-point" },
  figure(1, "K"),
  figure(500, "K"),
  figure(-500, "J/mol"),
  figure(1, "bar"),
];

describe("schema and guard give the same verdict", () => {
  test("on every record of the reference data, and on the whole", () => {
    for (const record of referenceData.species) expect(speciesRecordSchema.safeParse(record).success).toBe(true);
    expect(collectionSchema.parse(referenceData)).toEqual(referenceData);
  });

  test("on 2,000 records of the reference data, changed", () => {
    const values = mutated(fc.constantFrom(...referenceData.species), words);
    const share = verdictsAgree(values, speciesRecordSchema, recordFaults, 2000);
    expect(share).toBeGreaterThan(0.2);
    expect(share).toBeLessThan(0.8);
  });

  test("on 2,000 random records with all that a record may have, changed", () => {
    const share = verdictsAgree(mutated(randomRecords, words), speciesRecordSchema, recordFaults, 2000);
    expect(share).toBeGreaterThan(0.15);
    expect(share).toBeLessThan(0.8);
  });

  test.each([undefined, null, 7, "NH3(g)", [], [recordOf("NH3(g)")], () => 1])("on %s", (value) => {
    expect(recordFaults(value)).not.toEqual([]);
    expect(speciesRecordSchema.safeParse(value).success).toBe(false);
    expect(collectionSchema.safeParse(value).success).toBe(false);
  });
});

/** Iron in three phases, invented: two meet at a transition, two share the end of their ranges. */
const transition = { temperature: figure(1200, "K"), into: "Fe(cr,gamma)", enthalpy: figure(1, "kJ/mol") };
const liquid = fitted({
  kind: "series",
  form: "polynomial",
  powers: [0],
  intervals: [{ from: 3000, to: 4000, coefficients: [40], endsAt: "fit" }],
  anchor: { temperature: figure(3500, "K"), enthalpy: figure(100, "kJ/mol"), entropy: figure(100, "J/mol/K") },
});
const iron: CollectionData = {
  species: [
    polynomialRecord("Fe(cr,alpha)", 0, 27, [25], [0], { transitions: [transition] }),
    polynomialRecord("Fe(cr,gamma)", 5000, 32, [30], [0]),
    recordOf("Fe(l)", { gibbsFunction: liquid }),
    recordOf("Fe^3+(aq)"),
  ],
  sequences: [
    { label: "Fe(cr)", phases: ["Fe(cr,alpha)", "Fe(cr,gamma)"], source: invented, origin: "memory" },
    { label: "Fe", phases: ["Fe(cr,alpha)", "Fe(cr,gamma)", "Fe(l)"], source: invented, origin: "memory" },
  ],
};
const ironWords = [
  ...words,
  ...["Fe(cr,alpha)", "Fe(cr,gamma)", "Fe(cr,delta)", "Fe(l)", "Fe", "Fe2", "Fe(cr)", "S2", 1200, 4000, 2500],
];

describe("schema and speciesCollection give the same verdict", () => {
  test("on 1,000 collections with sequences, changed", () => {
    const share = verdictsAgree(mutated(fc.constant(iron), ironWords), collectionSchema, collectionFaults, 1000);
    expect(share).toBeGreaterThan(0.2);
    expect(share).toBeLessThan(0.8);
  });

  test("on 1,000 sequences, changed", () => {
    const sequences = mutated(fc.constant(iron.sequences as PhaseSequence[]), ironWords);
    const values = sequences.map((changed) => ({ ...iron, sequences: changed }));
    const share = verdictsAgree(values, collectionSchema, collectionFaults, 1000);
    expect(share).toBeGreaterThan(0.1);
    expect(share).toBeLessThan(0.8);
  });
});
