import fc from "fast-check";
import { expect, test } from "vitest";
import * as z from "zod";
import { checkQuantity } from "../../src/quantity/guards.js";
import { type Dimension, siUnits, unitTable } from "../../src/quantity/units.js";
import { quantitySchema } from "../../src/schema.js";

const dimensions = Object.keys(siUnits) as Dimension[];
const schemas = new Map(dimensions.map((dimension) => [dimension, quantitySchema(dimension)]));

const sound = fc.oneof(
  fc.double({ noNaN: true, noDefaultInfinity: true }),
  fc.double({ min: -500, max: 500, noNaN: true }),
  fc.constantFrom(0, -0, -273.15, -273.16, -459.67, -459.68, 1e308, -1e308, 5e-324),
);
const anything = fc.oneof(
  fc.constantFrom(Number.NaN, Number.POSITIVE_INFINITY, null, undefined, "1", "", [], [1], {}, true, 1n),
  fc.anything(),
);
const unit = fc.oneof(
  { weight: 12, arbitrary: fc.constantFrom(...Object.keys(unitTable)) },
  { weight: 1, arbitrary: fc.constantFrom("degC", "k", "toString", "__proto__", "") },
  { weight: 1, arbitrary: anything },
);
const uncertainty = fc.oneof(
  { weight: 5, arbitrary: fc.double({ min: 0, max: 10, noNaN: true }) },
  { weight: 5, arbitrary: fc.constant(undefined) },
  { weight: 1, arbitrary: fc.constant(-1) },
  { weight: 1, arbitrary: anything },
);
const extra = fc.constantFrom("note", "Value", "__proto__", "constructor", "prototype", "0", "");

/** What JSON or a careless caller may hand over in place of a quantity. */
const candidate = fc.oneof(
  { weight: 1, arbitrary: anything },
  {
    weight: 8,
    arbitrary: fc
      .record(
        {
          value: fc.oneof({ weight: 9, arbitrary: sound }, { weight: 1, arbitrary: anything }),
          unit,
          standardUncertainty: uncertainty,
        },
        { requiredKeys: ["value", "unit"] },
      )
      .chain((object) =>
        fc.oneof({ weight: 4, arbitrary: fc.constant(undefined) }, { weight: 1, arbitrary: extra }).map((key) => {
          const copy: object = { ...object };
          if (key !== undefined) {
            Object.defineProperty(copy, key, { value: 1, enumerable: true, writable: true, configurable: true });
          }
          return copy;
        }),
      ),
  },
);

test("schema and guard give the same verdict on 10,000 candidates", () => {
  let accepted = 0;
  fc.assert(
    fc.property(candidate, fc.constantFrom(...dimensions), fc.boolean(), (value, other, own) => {
      const code = (value as { unit?: unknown } | null | undefined)?.unit;
      const known = typeof code === "string" && Object.hasOwn(unitTable, code);
      const dimension = own && known ? unitTable[code as keyof typeof unitTable].dimension : other;
      const guard = checkQuantity(value, dimension, [], []) !== undefined;
      expect(schemas.get(dimension)!.safeParse(value).success).toBe(guard);
      if (guard) accepted += 1;
    }),
    { seed: 20261201, numRuns: 10_000 },
  );
  expect(accepted).toBeGreaterThan(2000);
});

test.each([
  ["an own __proto__ key", JSON.parse('{ "value": 1, "unit": "K", "__proto__": 1 }')],
  ["an own constructor key", { value: 1, unit: "K", constructor: 1 }],
  ["an inherited enumerable key", Object.assign(Object.create({ note: 1 }), { value: 1, unit: "K" })],
  ["a temperature below absolute zero", { value: -273.16, unit: "Cel" }],
  ["a value that overflows in SI", { value: 1.7e308, unit: "K", standardUncertainty: Number.POSITIVE_INFINITY }],
])("%s is refused by both", (_, value) => {
  expect(checkQuantity(value, "temperature", [], [])).toBeUndefined();
  expect(schemas.get("temperature")!.safeParse(value).success).toBe(false);
});

test("a class instance, an explicit undefined and an inherited value are accepted by both", () => {
  class Reading {
    value = 1;
    unit = "K";
    standardUncertainty = undefined;
  }
  for (const value of [new Reading(), Object.create({ value: 1, unit: "K" })]) {
    expect(checkQuantity(value, "temperature", [], [])).toBe(1);
    expect(schemas.get("temperature")!.safeParse(value).success).toBe(true);
  }
});

test("JSON Schema comes from the schemas, absolute zero included", () => {
  expect(z.toJSONSchema(quantitySchema("pressure"))).toMatchObject({
    type: "object",
    properties: { value: { type: "number" }, unit: { enum: expect.arrayContaining(["Pa", "bar", "[psi]"]) } },
    required: ["value", "unit"],
    additionalProperties: false,
  });
  const text = JSON.stringify(z.toJSONSchema(quantitySchema("temperature")));
  expect(text).toContain('"minimum":-273.15');
  for (const dimension of dimensions) expect(() => z.toJSONSchema(quantitySchema(dimension))).not.toThrow();
});
