import { describe, expect, test } from "vitest";
import { compileReaction } from "../../src/compiled/index.js";
import { Ar_g, N2_g, referenceData } from "../../src/data/index.js";
import { formula } from "../../src/formula/formula.js";
import { virial } from "../../src/fugacity/virial.js";
import { seriesProperties } from "../../src/heat-capacity/series-properties.js";
import { evaluateToDigits } from "../../src/precision/index.js";
import { convert } from "../../src/quantity/convert.js";
import { parseQuantity } from "../../src/quantity/parse.js";
import { quantity } from "../../src/quantity/quantity.js";
import {
  equilibriumConstant,
  ledger,
  lnReactionQuotient,
  reaction,
  reactionDirection,
  reactionGibbsEnergy,
  standardReactionGibbsEnergy,
  standardReactionProperties,
  standardReactionRoundingBound,
  temperaturesAtGibbsEnergy,
} from "../../src/reaction/index.js";
import { formatLedger, formatReactionTable } from "../../src/report/index.js";
import { findSpecies, speciesCollection, speciesGrade, standardProperties } from "../../src/species/index.js";
import { faultsOf } from "../errors/faults-of.js";
import { collectionOf, polynomialRecord } from "../species/records.js";

/** Anything, as plain JavaScript may pass it. */
// biome-ignore lint/suspicious/noExplicitAny: the subject of this table is what types forbid
type Anything = any;

const K = (value: unknown) => ({ value, unit: "K" });
const bar = (value: unknown) => ({ value, unit: "bar" });
const synthesis = reaction("N2 + 3 H2 = 2 NH3", referenceData);
const fractions = { "N2(g)": 0.25, "H2(g)": 0.5, "NH3(g)": 0.25 };
const state: Anything = { temperature: K(700), pressure: bar(50), gas: { moleFractions: fractions } };
const huge = "x".repeat(1_000_000);
const withPrototype: Anything = JSON.parse('{ "__proto__": { "value": 1 }, "value": 700, "unit": "K" }');
const at = (temperature: unknown): Anything => ({ temperature });
const fit: Anything = {
  kind: "series",
  form: "seven-coefficient",
  gasConstant: 8.31451,
  intervals: [{ from: 200, to: 6000, coefficients: [2.5, 0, 0, 0, 0, -745.375, 4.37967491], endsAt: "fit" }],
};

interface Row {
  readonly name: string;
  readonly call: () => unknown;
  readonly code: string;
  readonly path: string;
  readonly hint?: string;
}

const quantities: Row[] = [
  {
    name: "unit near a right one",
    call: () => quantity(25, "degC" as Anything),
    code: "quantity/unknown-unit",
    path: "unit",
    hint: "Cel",
  },
  { name: "no unit", call: () => quantity(25, undefined as Anything), code: "quantity/unknown-unit", path: "unit" },
  { name: "huge unit", call: () => quantity(25, huge as Anything), code: "quantity/unknown-unit", path: "unit" },
  {
    name: "unit of the prototype",
    call: () => quantity(25, "__proto__" as Anything),
    code: "quantity/unknown-unit",
    path: "unit",
  },
  { name: "NaN", call: () => quantity(Number.NaN, "K"), code: "quantity/not-finite", path: "value" },
  {
    name: "infinite",
    call: () => quantity(Number.POSITIVE_INFINITY, "bar"),
    code: "quantity/not-finite",
    path: "value",
  },
  {
    name: "below absolute zero",
    call: () => quantity(-300, "Cel"),
    code: "quantity/below-absolute-zero",
    path: "value",
  },
  {
    name: "another dimension",
    call: () => convert(quantity(1, "bar"), "K" as Anything),
    code: "quantity/wrong-dimension",
    path: "unit",
  },
  { name: "text without unit", call: () => parseQuantity("25"), code: "quantity/syntax", path: "" },
];

const species: Row[] = [
  {
    name: "unknown species",
    call: () => findSpecies(referenceData, "NH5(g)"),
    code: "species/not-found",
    path: "",
    hint: "NH3(g)",
  },
  {
    name: "ambiguous species",
    call: () => findSpecies(referenceData, "H2O"),
    code: "species/ambiguous",
    path: "",
    hint: "name the phase",
  },
  { name: "huge name", call: () => findSpecies(referenceData, huge), code: "species/not-found", path: "" },
  {
    name: "name of the prototype",
    call: () => findSpecies(referenceData, "__proto__"),
    code: "species/not-found",
    path: "",
  },
  {
    name: "null collection",
    call: () => findSpecies(null as Anything, "NH3(g)"),
    code: "input/not-an-object",
    path: "collection",
  },
  {
    name: "collection of text",
    call: () => speciesCollection("data" as Anything),
    code: "input/not-an-object",
    path: "collection",
  },
  {
    name: "grade of nothing",
    call: () => speciesGrade(undefined as Anything),
    code: "input/not-an-object",
    path: "record",
  },
  {
    name: "record by label",
    call: () => standardProperties("N2(g)" as Anything, at(K(300))),
    code: "input/not-an-object",
    path: "species",
  },
  {
    name: "outside the range",
    call: () => standardProperties(N2_g, at(K(7000))),
    code: "species/outside-range",
    path: "temperature",
    hint: "outsideRange",
  },
  {
    name: "far outside, going on",
    call: () => standardProperties(N2_g, { ...at(K(1e200)), outsideRange: "continue-fit" }),
    code: "species/outside-range",
    path: "temperature",
    hint: "100,000 K",
  },
  {
    name: "policy misspelt",
    call: () => standardProperties(N2_g, { ...at(K(300)), outsideRange: "refused" }),
    code: "input/unknown-option",
    path: "outsideRange",
    hint: "did you mean refuse?",
  },
  { name: "formula of nothing", call: () => formula(""), code: "formula/empty", path: "" },
  { name: "huge formula", call: () => formula(huge), code: "formula/too-long", path: "" },
];

const temperatures: [string, unknown, string, string, string?][] = [
  ["missing", undefined, "quantity/not-a-quantity", "temperature"],
  ["null", null, "quantity/not-a-quantity", "temperature"],
  ["a bare number", 700, "quantity/not-a-quantity", "temperature", 'quantity(700, "K")'],
  ["a text", "700 K", "quantity/not-a-quantity", "temperature", "parseQuantity"],
  ["a pressure", bar(1), "quantity/wrong-dimension", "temperature.unit"],
  ["a difference", { value: 1, unit: "K{difference}" }, "quantity/wrong-dimension", "temperature.unit"],
  ["in degC", { value: 25, unit: "degC" }, "quantity/unknown-unit", "temperature.unit", "Cel"],
  ["zero", K(0), "quantity/not-positive", "temperature.value"],
  ["negative", K(-1), "quantity/below-absolute-zero", "temperature.value", "Cel"],
  ["NaN", K(Number.NaN), "quantity/not-finite", "temperature.value"],
  ["infinite", K(Number.POSITIVE_INFINITY), "quantity/not-finite", "temperature.value"],
  ["a text in kelvin", K("700"), "quantity/not-finite", "temperature.value"],
  ["outside every range", K(1), "species/outside-range", "temperature", "outsideRange"],
];

const perTemperature: Row[] = (
  [
    ["standardReactionGibbsEnergy", (t) => standardReactionGibbsEnergy(synthesis, at(t))],
    ["standardReactionProperties", (t) => standardReactionProperties(synthesis, at(t))],
    ["standardReactionRoundingBound", (t) => standardReactionRoundingBound(synthesis, "gibbsEnergy", at(t))],
    ["equilibriumConstant", (t) => equilibriumConstant(synthesis, at(t))],
    ["standardProperties", (t) => standardProperties(N2_g, at(t))],
  ] as [string, (temperature: unknown) => unknown][]
).flatMap(([name, call]) =>
  temperatures.map(([what, temperature, code, path, hint]) => ({
    name: `${name} at a temperature that is ${what}`,
    call: () => call(temperature),
    code,
    path,
    ...(hint === undefined ? {} : { hint }),
  })),
);

const perCondition: Row[] = (
  [
    ["lnReactionQuotient", (c) => lnReactionQuotient(synthesis, c)],
    ["reactionGibbsEnergy", (c) => reactionGibbsEnergy(synthesis, c)],
    ["reactionDirection", (c) => reactionDirection(synthesis, c)],
    ["ledger", (c) => ledger(synthesis, c)],
  ] as [string, (conditions: Anything) => unknown][]
).flatMap(([name, call]): Row[] => [
  { name: `${name} without conditions`, call: () => call(undefined), code: "input/not-an-object", path: "" },
  { name: `${name} with null`, call: () => call(null), code: "input/not-an-object", path: "" },
  {
    name: `${name} in the wrong unit`,
    call: () => call({ ...state, pressure: K(1) }),
    code: "quantity/wrong-dimension",
    path: "pressure.unit",
  },
  {
    name: `${name} at zero pressure`,
    call: () => call({ ...state, pressure: bar(0) }),
    code: "quantity/not-positive",
    path: "pressure.value",
  },
  {
    name: `${name} at negative pressure`,
    call: () => call({ ...state, pressure: bar(-1) }),
    code: "quantity/not-positive",
    path: "pressure.value",
  },
  {
    name: `${name} at a pressure of NaN`,
    call: () => call({ ...state, pressure: bar(Number.NaN) }),
    code: "quantity/not-finite",
    path: "pressure.value",
  },
  {
    name: `${name} with a misspelt key`,
    call: () => call({ ...state, outsiderange: "refuse" }),
    code: "input/unknown-key",
    path: "outsiderange",
    hint: "did you mean outsideRange?",
  },
  {
    name: `${name} with a foreign key`,
    call: () => call({ ...state, volume: 1 }),
    code: "input/unknown-key",
    path: "volume",
  },
  {
    name: `${name} with a wrong policy`,
    call: () => call({ ...state, outsideRange: "continuefit" }),
    code: "input/unknown-option",
    path: "outsideRange",
    hint: "continue-fit",
  },
  {
    name: `${name} with fractions of 1.1`,
    call: () => call({ ...state, gas: { moleFractions: { ...fractions, "NH3(g)": 0.35 } } }),
    code: "conditions/fractions-do-not-sum",
    path: "gas.moleFractions",
    hint: "inert",
  },
  {
    name: `${name} with a bare key`,
    call: () => call({ ...state, gas: { moleFractions: { N2: 0.25, "H2(g)": 0.5, "NH3(g)": 0.25 } } }),
    code: "conditions/unknown-label",
    path: "gas.moleFractions.N2",
    hint: 'did you mean "N2(g)"?',
  },
  {
    name: `${name} with a huge key`,
    call: () => call({ ...state, gas: { moleFractions: { ...fractions, [huge]: 0 } } }),
    code: "conditions/unknown-label",
    path: `gas.moleFractions.${"x".repeat(79)}…`,
  },
  {
    name: `${name} with a key of the prototype`,
    call: () => call({ ...state, gas: JSON.parse('{ "__proto__": 1, "moleFractions": {} }') }),
    code: "input/forbidden-key",
    path: "gas.__proto__",
  },
  {
    name: `${name} with a temperature of the prototype`,
    call: () => call({ ...state, temperature: withPrototype }),
    code: "input/forbidden-key",
    path: "temperature.__proto__",
  },
  {
    name: `${name} with an inert that is none`,
    call: () => call({ ...state, inerts: [undefined] }),
    code: "input/not-an-object",
    path: "inerts.0",
  },
  {
    name: `${name} with inerts outside a list`,
    call: () => call({ ...state, inerts: Ar_g }),
    code: "input/not-an-array",
    path: "inerts",
  },
  {
    name: `${name} of a gas without critical constants`,
    call: () =>
      call({
        ...state,
        gas: { moleFractions: { ...fractions, "NH3(g)": 0.15, "C2(g)": 0.1 }, equationOfState: virial() },
        inerts: [polynomialRecord("C2(g)", 0, 1, [1])],
      }),
    code: "fugacity/missing-critical-constants",
    path: "gas.moleFractions.C2(g)",
  },
]);

const equations: Row[] = [
  {
    name: "nothing",
    call: () => reaction(undefined as Anything, referenceData),
    code: "reaction/empty",
    path: "equation",
  },
  { name: "no arrow", call: () => reaction("N2 + O2", referenceData), code: "reaction/syntax", path: "equation" },
  { name: "huge equation", call: () => reaction(huge, referenceData), code: "reaction/too-long", path: "equation" },
  {
    name: "unknown species in an equation",
    call: () => reaction("N2 + 3 H2 = 2 NH4(g)", referenceData),
    code: "species/not-found",
    path: "equation",
    hint: "CH4(g)",
  },
  {
    name: "unbalanced equation",
    call: () => reaction("N2 + H2 = NH3", referenceData),
    code: "reaction/unbalanced",
    path: "equation",
  },
  {
    name: "charge without caret",
    call: () => reaction("Na+ + Cl- = NaCl(s)", referenceData),
    code: "reaction/syntax",
    path: "equation",
    hint: "caret",
  },
  {
    name: "reaction of text",
    call: () => standardReactionGibbsEnergy("N2 = 2 N" as Anything, at(K(500))),
    code: "reaction/not-a-reaction",
    path: "reaction",
    hint: "reaction(text",
  },
  {
    name: "reaction of null",
    call: () => compileReaction(null as Anything),
    code: "reaction/not-a-reaction",
    path: "reaction",
  },
];

const others: Row[] = [
  {
    name: "table without rows",
    call: () => formatReactionTable(synthesis, { temperatures: [] }),
    code: "report/no-rows",
    path: "temperatures",
  },
  {
    name: "table of null",
    call: () => formatReactionTable(synthesis, null as Anything),
    code: "input/not-an-object",
    path: "",
  },
  { name: "ledger of null", call: () => formatLedger(null as Anything), code: "input/not-an-object", path: "account" },
  {
    name: "search without ends",
    call: () => temperaturesAtGibbsEnergy(synthesis, {} as Anything),
    code: "input/missing",
    path: "between",
  },
  {
    name: "search with exchanged ends",
    call: () => temperaturesAtGibbsEnergy(synthesis, { between: [quantity(900, "K"), quantity(300, "K")] }),
    code: "roots/empty-range",
    path: "between",
  },
  {
    name: "search with a misspelt key",
    call: () =>
      temperaturesAtGibbsEnergy(synthesis, {
        betwen: 1,
        between: [quantity(300, "K"), quantity(900, "K")],
      } as Anything),
    code: "input/unknown-key",
    path: "betwen",
    hint: "between",
  },
  {
    name: "no digits",
    call: () => evaluateToDigits(synthesis, { ...at(K(500)), digits: -1 }),
    code: "precision/digits",
    path: "digits",
  },
  {
    name: "plain array for a compiled function",
    call: () => compileReaction(synthesis).lnK([500] as Anything, new Float64Array(1)),
    code: "compiled/not-a-float-array",
    path: "temperaturesK",
    hint: "Float64Array.from",
  },
  {
    name: "zero kelvin in an array",
    call: () => compileReaction(synthesis).lnK(Float64Array.of(300, 0), new Float64Array(2)),
    code: "heat-capacity/outside-range",
    path: "temperaturesK.1",
  },
  {
    name: "fit of null",
    call: () => seriesProperties(null as Anything, at(K(300))),
    code: "input/not-an-object",
    path: "series",
  },
  {
    name: "fit without its gas constant",
    call: () => seriesProperties({ ...fit, gasConstant: undefined }, at(K(300))),
    code: "input/missing",
    path: "series.gasConstant",
    hint: "8.31451",
  },
  {
    name: "fit outside its range",
    call: () => seriesProperties(fit, at(K(100))),
    code: "heat-capacity/outside-range",
    path: "temperature",
    hint: "outsideRange",
  },
  {
    name: "fit with a key of the prototype",
    call: () => seriesProperties(JSON.parse('{ "__proto__": 1 }') as Anything, at(K(300))),
    code: "input/forbidden-key",
    path: "series.__proto__",
  },
];

describe.each([
  ["quantities", quantities],
  ["species", species],
  ["temperatures", perTemperature],
  ["conditions", perCondition],
  ["equations", equations],
  ["other functions", others],
])("%s", (_topic, rows) => {
  test.each(rows.map((row) => [row.name, row] as const))("%s", (_name, { call, code, path, hint }) => {
    const faults = faultsOf(call);
    const found = faults.find((fault) => fault.code === code && fault.path.join(".") === path);
    expect(faults.map((fault) => `${fault.code} at ${fault.path.join(".")}`)).toContain(`${code} at ${path}`);
    if (hint !== undefined) expect(found?.hint).toContain(hint);
    for (const { message, received, expected } of faults) {
      expect(message.length).toBeGreaterThan(0);
      expect(message.length).toBeLessThanOrEqual(500);
      expect(message).not.toContain("\n");
      expect(received?.length ?? 0).toBeLessThanOrEqual(250);
      expect(expected?.length ?? 0).toBeLessThanOrEqual(500);
    }
  });
});

describe("no result is NaN, infinite or a negative zero", () => {
  /** Every number in a result, however deep. */
  function numbersIn(value: unknown): number[] {
    if (typeof value === "number") return [value];
    if (value instanceof Float64Array) return [...value];
    return typeof value === "object" && value !== null ? Object.values(value).flatMap(numbersIn) : [];
  }

  const extremes = [1, 1.0000001, 199, 200, 298.15, 1000, 6000, 99_999, 100_000];
  const policies = ["constant-heat-capacity", "continue-fit"] as const;
  // A figure at 298.15 K stays one under every policy.
  const fitted = referenceData.species.filter(({ gibbsFunction }) => gibbsFunction.kind === "series");
  const calls = policies.flatMap((outsideRange) =>
    extremes.map((value) => [`${outsideRange} at ${value} K`, { ...at(K(value)), outsideRange }] as const),
  );

  test.each(calls)("%s", (_name, conditions) => {
    const results = [
      ...fitted.map((record) => standardProperties(record, conditions)),
      standardReactionProperties(synthesis, conditions),
      standardReactionRoundingBound(synthesis, "gibbsEnergy", conditions),
      ledger(synthesis, { ...state, ...conditions }),
      ledger(synthesis, { ...state, ...conditions, pressure: { value: 1e-300, unit: "Pa" } }),
      reactionDirection(synthesis, {
        ...state,
        ...conditions,
        pressure: { value: 1e300, unit: "Pa" },
        gas: undefined,
        activities: { "N2(g)": 5e-324, "H2(g)": 1e308, "NH3(g)": 1 },
      }),
      seriesProperties(fit, conditions),
    ];
    const numbers = numbersIn(results);
    expect(numbers.length).toBeGreaterThan(100);
    for (const number of numbers) {
      expect(Number.isFinite(number)).toBe(true);
      expect(Object.is(number, -0)).toBe(false);
    }
  });

  test("figures of any finite size are computed with or refused", () => {
    for (const size of [5e-324, 1e-300, 1e100, 1e280, 1e300, 1.7e308]) {
      const data = collectionOf(
        polynomialRecord("W(cr)", -size, size, [size]),
        polynomialRecord("W(l)", size, -size, [0, size]),
      );
      const change = reaction("9 W(cr) = 9 W(l)", data);
      const call = () => standardReactionProperties(change, at(K(2999)));
      if (size < 1e290) for (const number of numbersIn(call())) expect(Number.isFinite(number)).toBe(true);
      else expect(faultsOf(call)[0]?.code).toBe("heat-capacity/overflow");
    }
  });
});
