import { describe, expect, test } from "vitest";
import { referenceData } from "../../src/data/index.js";
import { readCollection, readReaction, readSpecies } from "../../src/exchange/index.js";
import { reaction } from "../../src/reaction/index.js";
import {
  collectionSchema,
  faultSchema,
  reactionConditionsSchema,
  reactionSchema,
  speciesRecordSchema,
  temperatureSearchSchema,
} from "../../src/schema.js";
import { faultsOf } from "../errors/faults-of.js";
import { recordOf } from "../species/records.js";

const record = JSON.stringify(recordOf("NH3(g)"));
const synthesis = JSON.stringify(reaction("N2 + 3 H2 = 2 NH3", referenceData));
const huge = "x".repeat(1_000_000);

interface Row {
  readonly name: string;
  readonly call: () => unknown;
  readonly code: string;
  readonly path: string;
  readonly hint?: string;
}

const rows: Row[] = [
  {
    name: "a comma after the last entry",
    call: () => readSpecies(`${record.slice(0, -1)},}`),
    code: "exchange/not-json",
    path: "witnesses",
    hint: "comma",
  },
  {
    name: "texts in single quotes",
    call: () => readSpecies("{ \"label\": 'NH3(g)' }"),
    code: "exchange/not-json",
    path: "label",
    hint: "double quotes",
  },
  {
    name: "a comment",
    call: () => readCollection("// our data\n[]"),
    code: "exchange/not-json",
    path: "",
    hint: "no comments",
  },
  {
    name: "NaN as a program writes it",
    call: () => readSpecies('{ "chargeNumber": NaN }'),
    code: "exchange/not-json",
    path: "chargeNumber",
    hint: "true, false and null",
  },
  { name: "a huge text that is no JSON", call: () => readCollection(huge), code: "exchange/not-json", path: "" },
  { name: "an empty text", call: () => readReaction(""), code: "exchange/not-json", path: "" },
  { name: "a name of a file", call: () => readCollection("species.json"), code: "exchange/not-json", path: "" },
  {
    name: "a hundred thousand brackets",
    call: () => readCollection("[".repeat(100_000)),
    code: "exchange/too-deep",
    path: Array.from({ length: 100 }, () => "0").join("."),
  },
  {
    name: "more than 64 MiB",
    call: () => readSpecies(" ".repeat(67_108_865)),
    code: "input/too-large",
    path: "",
  },
  {
    name: "a key twice",
    call: () => readSpecies(record.replace('"state"', '"formula":"N2","state"')),
    code: "exchange/duplicate-key",
    path: "formula",
  },
  {
    name: "a key that reaches a prototype",
    call: () => readCollection(`[${record.replace('"state"', '"__proto__":{"state":"l"},"state"')}]`),
    code: "input/forbidden-key",
    path: "0.__proto__",
  },
  {
    name: "such a key in an object that JSON.parse made",
    call: () => readSpecies(JSON.parse(record.replace('"state"', '"__proto__":{},"state"'))),
    code: "input/forbidden-key",
    path: "__proto__",
  },
  {
    name: "an exponent that no double has",
    call: () => readSpecies(record.replace('"value":200', '"value":2e999')),
    code: "input/not-finite",
    path: "standardEntropy.value",
  },
  { name: "nothing", call: () => readSpecies(undefined), code: "input/not-an-object", path: "" },
  { name: "an equation", call: () => readReaction("N2 + 3 H2 = 2 NH3"), code: "exchange/not-json", path: "" },
  {
    name: "an equation in quotes",
    call: () => readReaction('"N2 + 3 H2 = 2 NH3"'),
    code: "reaction/not-a-reaction",
    path: "",
    hint: "reaction(text, referenceData)",
  },
  {
    name: "an equation that is no text",
    call: () => readReaction({ ...JSON.parse(synthesis), equation: 7 }),
    code: "input/not-a-string",
    path: "equation",
  },
  {
    name: "a reaction without notes",
    call: () => readReaction(synthesis.replace(',"notes":[]', "")),
    code: "input/missing",
    path: "notes",
  },
  {
    name: "a reaction that does not balance",
    call: () =>
      readReaction(
        synthesis.replaceAll('"coefficient":2,"exactCoefficient":"2"', '"coefficient":3,"exactCoefficient":"3"'),
      ),
    code: "reaction/unbalanced",
    path: "equation",
  },
  { name: "a record as a collection", call: () => readCollection(record), code: "input/unknown-key", path: "label" },
  {
    name: "a collection as a record",
    call: () => readSpecies('{ "species": [] }'),
    code: "input/unknown-key",
    path: "species",
  },
];

describe("what is no record, collection or reaction is refused with a code and a path", () => {
  test.each(rows)("$name", ({ call, code, path, hint }) => {
    const [first] = faultsOf(call);
    expect({ code: first?.code, path: first?.path.join(".") }).toEqual({ code, path });
    if (hint !== undefined) expect(first?.hint).toContain(hint);
  });

  test.each(rows)("in short words: $name", ({ call }) => {
    for (const fault of faultsOf(call)) {
      expect(fault.message.length).toBeGreaterThan(10);
      expect(fault.message.length).toBeLessThanOrEqual(500);
      expect(fault.received?.length ?? 0).toBeLessThanOrEqual(80);
      expect(faultSchema.safeParse(fault).success).toBe(true);
    }
  });
});

describe("schemas refuse without throwing", () => {
  const schemas = {
    collectionSchema,
    reactionConditionsSchema,
    reactionSchema,
    speciesRecordSchema,
    temperatureSearchSchema,
  };
  const odd = [
    undefined,
    null,
    0,
    Number.NaN,
    "",
    huge,
    [],
    [[]],
    {},
    { label: huge },
    () => 1,
    Symbol("x"),
    1n,
    new Map(),
  ];

  test.each(Object.entries(schemas))("%s", (_name, schema) => {
    for (const value of odd) {
      const { success, error } = schema.safeParse(value);
      expect(success).toBe(false);
      expect(error?.issues.length).toBeGreaterThan(0);
    }
  });
});
