import { describe, expect, test } from "vitest";
import { referenceData } from "../../src/data/reference-data.js";
import type { Fault } from "../../src/errors/fault.js";
import { checkRecord } from "../../src/species/check-record.js";
import { houseRecord } from "../../src/species/house-record.js";
import { standardProperties } from "../../src/species/standard-properties.js";
import { placesOf } from "../errors/faults-of.js";
import { figure } from "../heat-capacity/random-series.js";
import { fitted, polynomialRecord, recordOf } from "./records.js";

/** Code and path of each fault that a record has. */
function faultsIn(record: unknown): string[] {
  const faults: Fault[] = [];
  const isRecord = checkRecord(record, ["species"], faults);
  expect(isRecord).toBe(faults.length === 0);
  for (const fault of faults) expect(fault.message.length).toBeGreaterThan(0);
  return faults.map(({ code, path }) => `${code} at ${path.slice(1).join(".")}`);
}

const base = polynomialRecord("NH3(g)", -46000, 192, [30, 0.02]);
const witness = {
  group: "caloric",
  kind: "transcription",
  check: "closure-at-breaks",
  deviation: 0,
  tolerance: 1,
  source: "mcbride2002",
};

test("every record of the reference data is sound", () => {
  for (const record of referenceData.species) expect(faultsIn(record)).toEqual([]);
});

test("records through JSON and structuredClone are sound", () => {
  for (const record of referenceData.species) {
    expect(faultsIn(JSON.parse(JSON.stringify(record)))).toEqual([]);
    expect(faultsIn(structuredClone(record))).toEqual([]);
  }
});

const withoutLabel = Object.fromEntries(Object.entries(base).filter(([key]) => key !== "label"));
const twoIntervals = {
  kind: "series",
  form: "maier-kelley",
  intervals: [
    { from: 200, to: 500, coefficients: [20, 0, 0], endsAt: "first-order" },
    { from: 500, to: 900, coefficients: [30, 0, 0], endsAt: "fit" },
  ],
} as const;

describe("a wrong record is refused", () => {
  test.each<[string, unknown, string[]]>([
    ["nothing", undefined, ["input/not-an-object at "]],
    ["a text", "NH3(g)", ["input/not-an-object at "]],
    ["no label", withoutLabel, ["input/missing at label"]],
    ["an unknown key", { ...base, formationEntalpy: figure(0, "J/mol") }, ["input/unknown-key at formationEntalpy"]],
    ["a label of no formula", { ...base, label: "Q9(g)" }, ["formula/unknown-element at label"]],
    ["an empty name", { ...base, name: "" }, ["input/not-a-string at name"]],
    ["a name too long", { ...base, name: "a".repeat(501) }, ["input/too-large at name"]],
    ["a broken charge", { ...base, chargeNumber: 0.5 }, ["species/invalid-record at chargeNumber"]],
    ["a charge of text", { ...base, chargeNumber: "0" }, ["input/not-finite at chargeNumber"]],
    ["another state", { ...base, state: "gas" }, ["input/unknown-option at state"]],
    ["a formula that differs", { ...base, formula: "NH4" }, ["species/inconsistent at label"]],
    ["a charge that differs", { ...base, chargeNumber: 1 }, ["species/inconsistent at label"]],
    ["a state that differs", { ...base, state: "l" }, ["species/inconsistent at label"]],
    ["a polymorph that differs", { ...base, polymorph: "ice" }, ["species/inconsistent at label"]],
    ["a label in another spelling", { ...base, label: "NH₃(g)" }, ["species/inconsistent at label"]],
    [
      "a pressure in kelvin",
      { ...base, standardPressure: figure(1, "K") },
      ["quantity/wrong-dimension at standardPressure.unit"],
    ],
    [
      "a pressure of zero",
      { ...base, standardPressure: figure(0, "bar") },
      ["quantity/not-positive at standardPressure.value"],
    ],
    [
      "an enthalpy of NaN",
      { ...base, formationEnthalpy: figure(Number.NaN, "J/mol") },
      ["quantity/not-finite at formationEnthalpy.value"],
    ],
    [
      "an entropy without source",
      { ...base, standardEntropy: { value: 1, unit: "J/mol/K", origin: "memory" } },
      ["input/missing at standardEntropy.source"],
    ],
    [
      "a source that is no key",
      { ...base, standardEntropy: { ...figure(1, "J/mol/K"), source: "table" } },
      ["input/unknown-option at standardEntropy.source"],
    ],
    [
      "an origin of hearsay",
      { ...base, standardEntropy: { ...figure(1, "J/mol/K"), origin: "hearsay" } },
      ["input/unknown-option at standardEntropy.origin"],
    ],
    [
      "a coverage in per cent",
      { ...base, standardEntropy: { ...figure(1, "J/mol/K"), uncertainty: { halfWidth: 1, coverage: 95 } } },
      ["input/unknown-option at standardEntropy.uncertainty.coverage"],
    ],
    [
      "no kind of Gibbs function",
      { ...base, gibbsFunction: { ...base.gibbsFunction, kind: undefined } },
      ["input/missing at gibbsFunction.kind"],
    ],
    ["a Gibbs function that is none", { ...base, gibbsFunction: null }, ["input/not-an-object at gibbsFunction"]],
    [
      "a fit without intervals",
      { ...base, gibbsFunction: { ...base.gibbsFunction, intervals: undefined } },
      ["input/missing at gibbsFunction.intervals"],
    ],
    [
      "a fit without a form",
      { ...base, gibbsFunction: { ...base.gibbsFunction, form: undefined } },
      ["input/missing at gibbsFunction.form"],
    ],
    [
      "another kind of Gibbs function",
      { ...base, gibbsFunction: { ...base.gibbsFunction, kind: "fit" } },
      ["input/unknown-option at gibbsFunction.kind"],
    ],
    [
      "a reference point without H and S",
      { ...base, gibbsFunction: { kind: "reference-point" }, formationEnthalpy: undefined, standardEntropy: undefined },
      ["heat-capacity/no-anchor at formationEnthalpy", "heat-capacity/no-anchor at standardEntropy"],
    ],
    [
      "a fit without constants nor S",
      { ...base, standardEntropy: undefined },
      ["heat-capacity/no-anchor at standardEntropy"],
    ],
    [
      "a transition without its enthalpy",
      { ...base, gibbsFunction: fitted(twoIntervals) },
      ["heat-capacity/no-anchor at gibbsFunction.intervals.0.endsAt"],
    ],
    [
      "a fit that does not reach its anchor",
      {
        ...base,
        gibbsFunction: fitted({
          ...twoIntervals,
          intervals: [{ from: 600, to: 900, coefficients: [20, 0, 0], endsAt: "fit" }],
        }),
      },
      ["heat-capacity/no-anchor at gibbsFunction.anchor"],
    ],
    ["transitions that are no array", { ...base, transitions: {} }, ["input/not-an-array at transitions"]],
    [
      "a transition into nothing",
      { ...base, transitions: [{ temperature: figure(300, "K"), enthalpy: figure(1, "J/mol") }] },
      ["input/missing at transitions.0.into"],
    ],
    [
      "critical constants without pressure",
      { ...base, critical: { temperature: figure(400, "K") } },
      ["input/missing at critical.pressure"],
    ],
    [
      "a volume in the wrong unit",
      { ...base, volume: { molar: figure(1, "mol") } },
      ["quantity/wrong-dimension at volume.molar.unit"],
    ],
    ["no witnesses", { ...base, witnesses: undefined }, ["input/missing at witnesses"]],
    [
      "a witness of another kind",
      { ...base, witnesses: [{ ...witness, kind: "hearsay" }] },
      ["input/unknown-option at witnesses.0.kind"],
    ],
    [
      "a witness without a deviation",
      { ...base, witnesses: [{ ...witness, deviation: undefined }] },
      ["input/missing at witnesses.0.deviation"],
    ],
    [
      "a witness over nothing",
      { ...base, witnesses: [{ ...witness, over: null }] },
      ["input/not-an-array at witnesses.0.over"],
    ],
    [
      "a witness over a falling range",
      { ...base, witnesses: [{ ...witness, over: [900, 300] }] },
      ["species/invalid-record at witnesses.0.over"],
    ],
    [
      "a witness against no figures",
      { ...base, witnesses: [{ ...witness, against: { value: 1 } }] },
      ["input/not-an-object at witnesses.0.against.value"],
    ],
    [
      "a witness against a figure of coverage 95",
      {
        ...base,
        witnesses: [
          { ...witness, against: { x: { ...figure(1, "J/mol"), uncertainty: { halfWidth: -1, coverage: 95 } } } },
        ],
      },
      [
        "quantity/negative-uncertainty at witnesses.0.against.x.uncertainty.halfWidth",
        "input/unknown-option at witnesses.0.against.x.uncertainty.coverage",
      ],
    ],
    [
      "a witness about no numbers",
      { ...base, witnesses: [{ ...witness, reaction: { "NH3(g)": "1" } }] },
      ["input/not-finite at witnesses.0.reaction.NH3(g)"],
    ],
  ])("%s", (_name, record, places) => {
    expect(faultsIn(record)).toEqual(places);
  });

  test.each([
    ["at the top", '{ "__proto__": { "label": "X" } }', "input/forbidden-key at __proto__"],
    ["in a figure", '{ "standardPressure": { "__proto__": 1 } }', "input/forbidden-key at standardPressure.__proto__"],
    [
      "in a witness",
      '{ "witnesses": [{ "against": { "constructor": 1 } }] }',
      "input/forbidden-key at witnesses.0.against.constructor",
    ],
  ])("keys that reach a prototype %s", (_name, text, place) => {
    expect(faultsIn(JSON.parse(text))).toContain(place);
  });

  test("all faults at once, the label's too", () => {
    const record = {
      ...base,
      chargeNumber: 2,
      standardPressure: figure(-1, "bar"),
      casNumber: 7664417,
      witnesses: [{ ...witness, tolerance: "1" }],
    };
    expect(faultsIn(record)).toEqual([
      "input/not-a-string at casNumber",
      "quantity/not-positive at standardPressure.value",
      "input/not-finite at witnesses.0.tolerance",
      "species/inconsistent at label",
    ]);
  });

  test("of a hundred thousand faults a hundred are reported", () => {
    const witnesses = Array.from({ length: 1000 }, () => ({}));
    expect(placesOf(() => houseRecord({ ...base, witnesses } as never))).toHaveLength(100);
  });
});

describe("the house's own copy", () => {
  test("is frozen to the depth and made once", () => {
    const record = structuredClone(base);
    const house = houseRecord(record);
    expect(houseRecord(record)).toBe(house);
    expect(houseRecord(house)).toBe(house);
    expect(house).not.toBe(record);
    expect(house).toEqual(record);
    expect(everyObject(house).every(Object.isFrozen)).toBe(true);
  });

  test("does not see changes made later", () => {
    const record = structuredClone(base) as { label: string; standardEntropy: { value: number } };
    const before = standardProperties(record as never, { temperature: { value: 500, unit: "K" } });
    record.standardEntropy.value = 999;
    record.label = "nonsense";
    expect(standardProperties(record as never, { temperature: { value: 500, unit: "K" } })).toEqual(before);
  });

  test("leaves members out that are undefined", () => {
    const house = houseRecord({ ...recordOf("He(g)"), casNumber: undefined } as never);
    expect(Object.keys(house)).not.toContain("casNumber");
  });
});

function everyObject(value: unknown): object[] {
  if (typeof value !== "object" || value === null) return [];
  return [value, ...Object.values(value).flatMap(everyObject)];
}
