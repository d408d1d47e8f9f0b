import { Ajv2020 } from "ajv/dist/2020.js";
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { referenceData } from "../../src/data/reference-data.js";
import type { Fault } from "../../src/errors/fault.js";
import { jsonSchemaFiles } from "../../src/exchange/json-schema.js";
import { checkRecord } from "../../src/species/check-record.js";
import { figure, invented } from "../heat-capacity/random-series.js";
import { polynomialRecord, recordOf } from "../species/records.js";
import { mutated } from "./mutated.js";
import { randomRecords } from "./random-records.js";

const files = jsonSchemaFiles();
// An independent reader of JSON Schema. Members of a kind that a form does not take have no type.
const validator = new Ajv2020({ strict: true, strictTypes: false, allErrors: false });
const isRecord = validator.compile(files["species-record.schema.json"]!);
const isCollection = validator.compile(files["species-collection.schema.json"]!);

const throughJson = (value: unknown): unknown => JSON.parse(JSON.stringify(value));

describe("the files", () => {
  test("are of draft 2020-12, say what they are, and name each part once", () => {
    for (const [name, file] of Object.entries(files)) {
      expect(file).toMatchObject({
        $schema: "https://json-schema.org/draft/2020-12/schema",
        $id: name,
        title: expect.stringContaining("gibbs-ledger"),
        type: "object",
        additionalProperties: false,
      });
      const text = JSON.stringify(file);
      expect(text).not.toContain("__schema");
      expect(text).not.toMatch(/\d{4}-\d{2}-\d{2}T/);
      expect(text.length).toBeLessThan(100_000);
      expect(jsonSchemaFiles()[name]).toEqual(file);
      expect(JSON.stringify(jsonSchemaFiles()[name])).toBe(text);
      expect(validator.validateSchema(file)).toBe(true);
    }
    expect(Object.keys(files)).toEqual(["species-record.schema.json", "species-collection.schema.json"]);
  });
});

describe("an independent validator", () => {
  test("accepts the reference data", () => {
    for (const record of referenceData.species) {
      expect({ label: record.label, is: isRecord(throughJson(record)), errors: isRecord.errors }).toMatchObject({
        is: true,
      });
    }
    expect(isCollection(throughJson(referenceData))).toBe(true);
  });

  const base = polynomialRecord("NH3(g)", -46000, 192, [30, 0.02]);
  const fit = base.gibbsFunction as unknown as Record<string, unknown>;
  const interval = { from: 200, to: 3000, coefficients: [1, 2, 3, 4, 5, 6, 7], endsAt: "fit" };
  const shomate = { kind: "series", form: "shomate", intervals: [interval], source: invented, origin: "memory" };
  const without = (key: string): object => Object.fromEntries(Object.entries(base).filter(([name]) => name !== key));

  test.each<[string, unknown]>([
    ["a polynomial", base],
    ["a reference point", recordOf("Fe^3+(aq)")],
    ["seven Shomate coefficients", { ...base, gibbsFunction: shomate }],
  ])("accepts a record with %s", (_name, record) => {
    expect(isRecord(throughJson(record))).toBe(true);
  });

  test.each<[string, unknown]>([
    ["an array", [base]],
    ["null", null],
    ["no label", without("label")],
    ["no witnesses", without("witnesses")],
    ["no Gibbs function", without("gibbsFunction")],
    ["an unknown key", { ...base, formationEntalpy: figure(0, "J/mol") }],
    ["an empty name", { ...base, name: "" }],
    ["a broken charge", { ...base, chargeNumber: 0.5 }],
    ["a charge too large", { ...base, chargeNumber: 21 }],
    ["another state", { ...base, state: "gas" }],
    ["a pressure in kelvin", { ...base, standardPressure: figure(1, "K") }],
    ["a pressure of zero", { ...base, standardPressure: figure(0, "bar") }],
    ["an entropy of text", { ...base, standardEntropy: { ...figure(1, "J/mol/K"), value: "1" } }],
    ["a source that is no key", { ...base, standardEntropy: { ...figure(1, "J/mol/K"), source: "table" } }],
    ["an origin of hearsay", { ...base, standardEntropy: { ...figure(1, "J/mol/K"), origin: "hearsay" } }],
    [
      "a coverage in per cent",
      { ...base, standardEntropy: { ...figure(1, "J/mol/K"), uncertainty: { halfWidth: 1, coverage: 95 } } },
    ],
    ["another form", { ...base, gibbsFunction: { ...fit, form: "quartic" } }],
    ["no intervals", { ...base, gibbsFunction: { ...fit, intervals: [] } }],
    ["no powers", { ...base, gibbsFunction: { ...fit, powers: undefined } }],
    ["a power of a third", { ...base, gibbsFunction: { ...fit, powers: [0, 1 / 3] } }],
    ["a gas constant that nobody measured", { ...base, gibbsFunction: { ...shomate, gasConstant: 8.31451 } }],
    ["no gas constant", { ...base, gibbsFunction: { ...shomate, form: "seven-coefficient" } }],
    [
      "too few coefficients",
      { ...base, gibbsFunction: { ...shomate, intervals: [{ ...interval, coefficients: [1] }] } },
    ],
    ["an end of another kind", { ...base, gibbsFunction: { ...shomate, intervals: [{ ...interval, endsAt: "gap" }] } }],
    ["a transition below absolute zero", { ...base, transitions: [{ temperature: figure(-300, "Cel"), into: "x" }] }],
    ["critical constants without pressure", { ...base, critical: { temperature: figure(400, "K") } }],
    ["a witness without deviation", { ...base, witnesses: [{ group: "caloric", kind: "physical", check: "x" }] }],
    ["a key that reaches a prototype", { ...base, constructor: 1 }],
  ])("refuses a record with %s", (_name, record) => {
    expect(isRecord(throughJson(record))).toBe(false);
  });

  test.each<[string, unknown]>([
    ["an array of records", [base]],
    ["no species", {}],
    ["a wrong record", { species: [without("label")] }],
    ["a sequence without a source", { species: [base], sequences: [{ label: "N", phases: [], origin: "page" }] }],
  ])("refuses a collection with %s", (_name, collection) => {
    expect(isCollection(throughJson(collection))).toBe(false);
  });

  test("accepts, of 2,000 random records, changed, at least those that the guards accept", () => {
    const words = ["g", "l", "K", "J/mol", "memory", "cox1989", "shomate", 0, 1, -1, 0.5, 500];
    let [both, shapeAlone, refused] = [0, 0, 0];
    fc.assert(
      fc.property(mutated(randomRecords, words).filter(isPlain), (value) => {
        const json = throughJson(value);
        const faults: Fault[] = [];
        checkRecord(json, [], faults);
        const accepted = isRecord(json);
        if (faults.length === 0) expect({ accepted, errors: isRecord.errors }).toMatchObject({ accepted: true });
        if (!accepted) refused += 1;
        else if (faults.length === 0) both += 1;
        else shapeAlone += 1;
      }),
      { seed: 20270306, numRuns: 2000 },
    );
    expect(both).toBeGreaterThan(400);
    // Most of what the guards refuse shows in the shape.
    expect(refused).toBeGreaterThan(2 * shapeAlone);
  });
});

/** Whether JSON can hold a value at all. */
function isPlain(value: unknown): boolean {
  if (typeof value === "bigint") return false;
  if (typeof value !== "object" || value === null)
    return value !== undefined && typeof value !== "symbol" && typeof value !== "function";
  return Object.values(value).every((member) =>
    typeof member !== "object" || member === null ? typeof member !== "bigint" : isPlain(member),
  );
}
