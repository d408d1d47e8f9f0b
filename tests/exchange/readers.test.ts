import { describe, expect, test } from "vitest";
import { referenceData } from "../../src/data/reference-data.js";
import { byteLength } from "../../src/exchange/byte-length.js";
import { readCollection, readReaction, readSpecies } from "../../src/exchange/index.js";
import { reaction } from "../../src/reaction/reaction.js";
import { findSpecies } from "../../src/species/collection.js";
import { houseRecord } from "../../src/species/house-record.js";
import type { CollectionData } from "../../src/species/record.js";
import { faultsOf, placesOf } from "../errors/faults-of.js";
import { figure, invented } from "../heat-capacity/random-series.js";
import { recordOf } from "../species/records.js";

const argon = recordOf("Ar(g)");
const text = JSON.stringify(argon);

describe("a species record", () => {
  test("from text or parsed JSON is the house's frozen copy", () => {
    for (const input of [text, JSON.parse(text), `\uFEFF${text}`, ` \r\n${JSON.stringify(argon, null, 2)}\n`]) {
      const record = readSpecies(input);
      expect(record).toEqual(argon);
      expect(Object.isFrozen(record.standardPressure)).toBe(true);
      expect(houseRecord(record)).toBe(record);
    }
  });

  test.each<[string, string, string[]]>([
    ["cut off", text.slice(0, -1), ["exchange/not-json at witnesses"]],
    ["two marks of encoding", `\uFEFF\uFEFF${text}`, ["exchange/not-json at "]],
    ["a key twice", text.replace('"name":', '"label":"Ar(g)","name":'), ["exchange/duplicate-key at label"]],
    [
      "a key that reaches a prototype",
      text.replace('"name":', '"__proto__":{"x":1},"name":'),
      ["input/forbidden-key at __proto__"],
    ],
    [
      "a key that reaches a prototype, deep in",
      text.replace('"unit":"bar"', '"unit":"bar","constructor":{}'),
      ["input/forbidden-key at standardPressure.constructor"],
    ],
    [
      "a number that no double holds",
      text.replace('"value":1,', '"value":1e999,'),
      ["input/not-finite at standardPressure.value"],
    ],
    ["another value", "[]", ["input/not-an-object at "]],
    ["a bare text", '"Ar(g)"', ["input/not-an-object at "]],
    ["null", "null", ["input/not-an-object at "]],
  ])("%s is refused", (_name, given, places) => {
    expect(placesOf(() => readSpecies(given))).toEqual(places);
  });

  test.each([undefined, null, 7, true, [], new Uint8Array(3), () => text])("%s is refused", (given) => {
    expect(faultsOf(() => readSpecies(given)).length).toBeGreaterThan(0);
  });

  test("what is wrong with the text and with the record is reported together", () => {
    const wrong = text
      .replace('"name":"invented Ar(g)"', '"name":"","name":"","chargeNumber":1e400')
      .replace('"value":200', '"value":-1e400')
      .replace('"state":"g"', '"state":"gas"');
    expect(placesOf(() => readSpecies(wrong))).toEqual([
      "exchange/duplicate-key at name",
      "input/not-finite at chargeNumber",
      "exchange/duplicate-key at chargeNumber",
      "input/not-finite at standardEntropy.value",
      "input/not-a-string at name",
      "input/unknown-option at state",
    ]);
  });
});

describe("the size of a text", () => {
  test.each([
    ["", 0],
    ["abc", 3],
    ["é", 2],
    ["€", 3],
    ["\u{1F9EA}", 4],
    ["\ud83e", 3],
    ["\udd2a\ud83e", 6],
    ["·½\u{10FFFF}x\uFFFF", 12],
  ])("%j has %i bytes", (given, bytes) => {
    expect(byteLength(given)).toBe(bytes);
    expect(new TextEncoder().encode(given)).toHaveLength(bytes);
  });

  test("64 MiB are read, a byte more is not, and bytes count, not characters", () => {
    const limit = 64 * 1024 * 1024;
    const fill = (size: number): string => text + " ".repeat(size - text.length);
    expect(readSpecies(fill(limit))).toEqual(argon);
    expect(placesOf(() => readSpecies(fill(limit + 1)))).toEqual(["input/too-large at "]);
    const wide = `"${"€".repeat((limit - 2) / 3)}`;
    expect(byteLength(`${wide}"`)).toBeLessThanOrEqual(limit);
    expect(placesOf(() => readSpecies(`${wide}"`))).toEqual(["input/not-an-object at "]);
    expect(placesOf(() => readSpecies(`${wide}€"`))).toEqual(["input/too-large at "]);
  });
});

describe("a collection", () => {
  test("from an object or an array of records is the house's own, indexed", () => {
    const whole = readCollection(JSON.stringify(referenceData));
    expect(whole).toEqual(readCollection(structuredClone(referenceData)));
    expect(findSpecies(whole, "NH3").label).toBe("NH3(g)");
    const bare = readCollection(JSON.stringify(referenceData.species));
    expect(bare.species).toEqual(whole.species);
    expect(bare.sequences).toBeUndefined();
    expect(Object.isFrozen(bare.species)).toBe(true);
    expect(readCollection("[]").species).toEqual([]);
  });

  const [alpha, gamma] = [recordOf("Fe(cr,alpha)"), recordOf("Fe(cr,gamma)")];
  const sequence = { label: "Fe(cr)", phases: ["Fe(cr,alpha)"], source: invented, origin: "memory" };

  test.each<[string, unknown, string[]]>([
    ["no object", "species", ["exchange/not-json at "]],
    ["no species", {}, ["input/missing at species"]],
    ["another key", { species: [], phases: [] }, ["input/unknown-key at phases"]],
    [
      "another key and a wrong record",
      { species: [{ ...argon, state: "gas" }], phases: [] },
      ["input/unknown-key at phases", "input/unknown-option at species.0.state"],
    ],
    ["another key in place of species", { records: [] }, ["input/unknown-key at records", "input/missing at species"]],
    ["a record that is none", [argon, 7], ["input/not-an-object at 1"]],
    ["a label twice", [argon, gamma, { ...argon }], ["species/duplicate-label at 2.label"]],
    [
      "a sequence of a phase that is not there",
      { species: [alpha], sequences: [{ ...sequence, phases: ["Fe(cr,alpha)", "Fe(cr,delta)"] }] },
      ["species/not-found at sequences.0.phases.1"],
    ],
    [
      "a sequence without a source",
      { species: [alpha], sequences: [{ ...sequence, source: undefined }] },
      ["input/missing at sequences.0.source"],
    ],
    [
      "a sequence of the electron",
      { species: [alpha], sequences: [{ ...sequence, label: "e^-" }] },
      ["species/inconsistent at sequences.0.label"],
    ],
    ["sequences in an object", { species: [], sequences: {} }, ["input/not-an-array at sequences"]],
  ])("with %s is refused", (_name, given, places) => {
    expect(placesOf(() => readCollection(given))).toEqual(places);
  });

  test("wrong records, labels that stand twice and phases that are missing are told at once", () => {
    const given = {
      species: [argon, { ...argon, state: "l" }, { ...alpha, standardPressure: figure(1, "K") }, { ...argon }],
      sequences: [{ ...sequence, phases: ["Fe(cr,alpha)", "Fe(cr,delta)"] }, sequence],
    };
    expect(placesOf(() => readCollection(JSON.stringify(given))).toSorted()).toEqual([
      "quantity/wrong-dimension at species.2.standardPressure.unit",
      "species/duplicate-label at sequences.1.label",
      "species/duplicate-label at species.1.label",
      "species/duplicate-label at species.3.label",
      "species/inconsistent at species.1.label",
      "species/not-found at sequences.0.phases.1",
    ]);
  });
});

describe("a reaction", () => {
  const synthesis = reaction("N2 + 3 H2 = 2 NH3", referenceData);
  const plain = JSON.parse(JSON.stringify(synthesis));

  test("from text or parsed JSON is the house's own", () => {
    for (const input of [JSON.stringify(synthesis), plain, structuredClone(plain)]) {
      const read = readReaction(input);
      expect(read).toEqual(synthesis);
      expect(Object.isFrozen(read.terms[0])).toBe(true);
    }
    expect(readReaction(synthesis)).toBe(synthesis);
  });

  test.each<[string, unknown, string[]]>([
    ["an equation alone", '"N2 + 3 H2 = 2 NH3"', ["reaction/not-a-reaction at "]],
    ["no terms", { ...plain, terms: [] }, ["reaction/invalid at terms"]],
    ["a term left out", { ...plain, terms: plain.terms.slice(1) }, ["reaction/unbalanced at equation"]],
    [
      "two coefficients",
      { ...plain, terms: [{ ...plain.terms[0], coefficient: -2 }, ...plain.terms.slice(1)] },
      ["reaction/invalid at terms.0.exactCoefficient"],
    ],
    [
      "a wrong record",
      { ...plain, terms: [{ ...plain.terms[0], species: { ...plain.terms[0].species, state: "gas" } }] },
      ["input/unknown-option at terms.0.species.state"],
    ],
    ["a note that is no text", { ...plain, notes: [7] }, ["input/not-a-string at notes.0"]],
  ])("with %s is refused", (_name, given, places) => {
    expect(placesOf(() => readReaction(given))).toEqual(places);
  });
});

test("an error of another kind is not swallowed", () => {
  const trap = new Proxy(
    {},
    {
      ownKeys: () => {
        throw new RangeError("not for reading");
      },
    },
  );
  expect(() => readSpecies(trap)).toThrow(RangeError);
  expect(() => readCollection([trap] as unknown as CollectionData)).toThrow(RangeError);
});
