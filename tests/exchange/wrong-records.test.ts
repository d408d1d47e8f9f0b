import { readFileSync } from "node:fs";
import { expect, test } from "vitest";
import { readCollection } from "../../src/exchange/read-collection.js";
import { readSpecies } from "../../src/exchange/read-species.js";
import { faultsOf, placesOf } from "../errors/faults-of.js";

const text = readFileSync(new URL("wrong-records.json", import.meta.url), "utf8");
const records = JSON.parse(text) as { name: string }[];

/** The one fault of each record of the file, in its order. */
const expected: readonly (readonly [name: string, code: string, path: string])[] = [
  ["the state is missing", "input/missing", "state"],
  ["a key is misspelt", "input/unknown-key", "formationEntalpy"],
  ["the label says liquid, the record gas", "species/inconsistent", "label"],
  ["the charge of the label is that of another ion", "species/inconsistent", "label"],
  ["no such element", "formula/unknown-element", "label"],
  ["the unit of the enthalpy is that of an entropy", "quantity/wrong-dimension", "formationEnthalpy.unit"],
  ["the calorie is not said to be thermochemical", "quantity/unknown-unit", "formationEnthalpy.unit"],
  ["the entropy is a text", "quantity/not-finite", "standardEntropy.value"],
  ["the source is no key of the bibliography", "input/unknown-option", "standardEntropy.source"],
  ["the origin is hearsay", "input/unknown-option", "standardPressure.origin"],
  ["the standard pressure is zero", "quantity/not-positive", "standardPressure.value"],
  ["the coverage is in per cent", "input/unknown-option", "formationEnthalpy.uncertainty.coverage"],
  ["a coefficient is missing", "heat-capacity/coefficient-count", "gibbsFunction.intervals.0.coefficients"],
  ["the interval is turned round", "heat-capacity/intervals", "gibbsFunction.intervals.0"],
  ["there is a gap between two intervals", "heat-capacity/intervals", "gibbsFunction.intervals.1.from"],
  ["the gas constant is missing", "input/missing", "gibbsFunction.gasConstant"],
  ["there is no such form", "heat-capacity/unknown-form", "gibbsFunction.form"],
  ["a reference point without entropy", "heat-capacity/no-anchor", "standardEntropy"],
  ["a transition has no enthalpy", "heat-capacity/no-anchor", "gibbsFunction.intervals.0.endsAt"],
  ["a witness without a deviation", "input/missing", "witnesses.0.deviation"],
];

test("twenty wrong records in one file: every fault is named at once", () => {
  const found = placesOf(() => readCollection(text));
  expect(found).toEqual(expected.map(([, code, path], index) => `${code} at ${index}.${path}`));
});

test("in a collection the paths begin with species", () => {
  const found = placesOf(() => readCollection(`{ "species": ${text}, "sequences": [] }`));
  expect(found).toEqual(expected.map(([, code, path], index) => `${code} at species.${index}.${path}`));
});

test.each(expected.map(([name, code, path], index) => [name, index, `${code} at ${path}`] as const))(
  "%s",
  (name, index, place) => {
    expect(records[index]?.name).toBe(name);
    expect(placesOf(() => readSpecies(JSON.stringify(records[index])))).toEqual([place]);
  },
);

test("a hundred faults at most are listed, the first ones", () => {
  const many = JSON.stringify(Array.from({ length: 10 }, () => records).flat());
  const faults = faultsOf(() => readCollection(many));
  expect(faults).toHaveLength(100);
  expect(faults.at(-1)?.path[0]).toBe(99);
});
