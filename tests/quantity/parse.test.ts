import fc from "fast-check";
import { expect, test } from "vitest";
import { toFaults } from "../../src/errors/gibbs-ledger-error.js";
import { formatQuantity } from "../../src/quantity/format.js";
import { parseQuantity } from "../../src/quantity/parse.js";
import { type UnitCode, unitTable } from "../../src/quantity/units.js";

test.each([
  ["25 Cel", { value: 25, unit: "Cel" }],
  ["  1.013e5   Pa ", { value: 101300, unit: "Pa" }],
  ["-32.90 kJ/mol", { value: -32.9, unit: "kJ/mol" }],
  [".5 1", { value: 0.5, unit: "1" }],
  ["5. %", { value: 5, unit: "%" }],
  ["+1E-3 mol/kg", { value: 0.001, unit: "mol/kg" }],
  ["-0 J", { value: 0, unit: "J" }],
  ["-285.83 +- 0.04 kJ/mol", { value: -285.83, unit: "kJ/mol", standardUncertainty: 0.04 }],
])("%j is read", (text, expected) => {
  expect(parseQuantity(text)).toStrictEqual(expected);
});

test.each([
  ["25", "quantity/syntax", "a unit is missing"],
  ["1.013 25 Pa", "quantity/syntax", undefined],
  ["25Cel", "quantity/syntax", "Cel"],
  ["25°C", "quantity/syntax", 'did you mean "Cel"?'],
  ["1,5 K", "quantity/syntax", "decimal sign"],
  ["\u221212 Cel", "quantity/syntax", "minus sign"],
  ["0x10 K", "quantity/syntax", undefined],
  ["1_000 K", "quantity/syntax", undefined],
  ["1 k Pa", "quantity/syntax", undefined],
  ["1e10000 K", "quantity/syntax", undefined],
  ["NaN K", "quantity/syntax", undefined],
  ["", "quantity/syntax", undefined],
  ["K", "quantity/syntax", undefined],
  ["1e9999 K", "quantity/not-finite", undefined],
  ["25 degC", "quantity/unknown-unit", 'did you mean "Cel"?'],
  ["-12 K", "quantity/below-absolute-zero", "Celsius"],
  ["1 +- -1 K", "quantity/negative-uncertainty", undefined],
  [`${"1".repeat(100)} K`, "input/too-large", undefined],
  [25, "input/not-a-string", undefined],
])("%j is refused with %s", (text, code, hint) => {
  let faults: ReturnType<typeof toFaults> = [];
  try {
    parseQuantity(text as string);
  } catch (error) {
    faults = toFaults(error);
  }
  expect(faults.map((fault) => fault.code)).toEqual([code]);
  if (hint !== undefined) expect(faults[0]?.hint).toContain(hint);
});

test("the dimension is checked where it is given", () => {
  expect(parseQuantity("1 bar", "pressure").value).toBe(1);
  expect(() => parseQuantity("1 bar", "temperature")).toThrow(/unit of pressure, expected a unit of temperature/);
});

test("what formatQuantity writes is read back to the bit", () => {
  fc.assert(
    fc.property(
      fc.double({ min: 0, max: 1e300, noNaN: true }),
      fc.constantFrom(...(Object.keys(unitTable) as UnitCode[])),
      (value, unit) => {
        expect(parseQuantity(formatQuantity({ value, unit }))).toStrictEqual({ value, unit });
      },
    ),
    { seed: 20261201, numRuns: 2000 },
  );
});
