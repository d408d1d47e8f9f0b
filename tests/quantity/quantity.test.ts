import { expect, test } from "vitest";
import { toFaults } from "../../src/errors/gibbs-ledger-error.js";
import { type QuantityOptions, quantity } from "../../src/quantity/quantity.js";
import { nearMisses, unitHint } from "../../src/quantity/unit-hints.js";
import { isUnitCode, siUnits, unitCodesOf, unitTable } from "../../src/quantity/units.js";

/** `quantity` as a caller without types sees it. */
const untyped = quantity as (value: unknown, unit: unknown, options?: unknown) => unknown;

function faultsOf(run: () => unknown) {
  try {
    run();
  } catch (error) {
    return toFaults(error);
  }
  return [];
}

test("a quantity is plain data", () => {
  expect(quantity(25, "Cel")).toStrictEqual({ value: 25, unit: "Cel" });
  expect(quantity(-285.83, "kJ/mol", { standardUncertainty: 0.04 })).toStrictEqual({
    value: -285.83,
    unit: "kJ/mol",
    standardUncertainty: 0.04,
  });
  expect(JSON.parse(JSON.stringify(quantity(1, "atm")))).toStrictEqual({ value: 1, unit: "atm" });
  expect(quantity(25, "C")).toStrictEqual({ value: 25, unit: "C" });
});

test("-0 becomes 0, in value and uncertainty", () => {
  const { value, standardUncertainty } = quantity(-0, "J/mol", { standardUncertainty: -0 });
  expect(Object.is(value, 0)).toBe(true);
  expect(Object.is(standardUncertainty, 0)).toBe(true);
});

test.each([
  [Number.NaN, "K", undefined, "quantity/not-finite", ["value"]],
  [Number.POSITIVE_INFINITY, "K", undefined, "quantity/not-finite", ["value"]],
  ["25", "K", undefined, "quantity/not-finite", ["value"]],
  [1n, "K", undefined, "quantity/not-finite", ["value"]],
  [1, "degC", undefined, "quantity/unknown-unit", ["unit"]],
  [1, "toString", undefined, "quantity/unknown-unit", ["unit"]],
  [1, "__proto__", undefined, "quantity/unknown-unit", ["unit"]],
  [1, null, undefined, "quantity/unknown-unit", ["unit"]],
  [-12, "K", undefined, "quantity/below-absolute-zero", ["value"]],
  [-273.2, "Cel", undefined, "quantity/below-absolute-zero", ["value"]],
  [-460, "[degF]", undefined, "quantity/below-absolute-zero", ["value"]],
  [-5e-324, "[degR]", undefined, "quantity/below-absolute-zero", ["value"]],
  [1, "K", { standardUncertainty: -1 }, "quantity/negative-uncertainty", ["standardUncertainty"]],
  [1, "K", { standardUncertainty: Number.NaN }, "quantity/not-finite", ["standardUncertainty"]],
  [1, "K", { standardUncertainty: "1" }, "quantity/not-finite", ["standardUncertainty"]],
  [1, "K", { uncertainty: 1 }, "input/unknown-key", ["options", "uncertainty"]],
  [1, "K", 0.5, "input/not-an-object", ["options"]],
])("quantity(%s, %s, %s) is refused with %s", (value, unit, options, code, path) => {
  const faults = faultsOf(() => untyped(value, unit, options));
  expect(faults.map((fault) => fault.code)).toEqual([code]);
  expect(faults[0]?.path).toEqual(path);
});

test("all faults are reported together", () => {
  const faults = faultsOf(() => untyped(Number.NaN, "degC", { standardUncertainty: -1 }));
  expect(faults.map((fault) => fault.code)).toEqual([
    "quantity/not-finite",
    "quantity/unknown-unit",
    "quantity/negative-uncertainty",
  ]);
});

test("absolute zero itself is a temperature, and a difference may be negative", () => {
  expect(quantity(0, "K").value).toBe(0);
  expect(quantity(-273.15, "Cel").value).toBe(-273.15);
  expect(quantity(-459.67, "[degF]").value).toBe(-459.67);
  expect(quantity(-500, "K{difference}").value).toBe(-500);
});

test("a negative kelvin is taken for degrees Celsius", () => {
  const [fault] = faultsOf(() => quantity(-12, "K"));
  expect(fault?.hint).toBe('-12 K: did you pass degrees Celsius? use quantity(-12, "Cel")');
  expect(faultsOf(() => quantity(-300, "K"))[0]?.hint).toBeUndefined();
});

test("an explicit undefined uncertainty is none", () => {
  const options = { standardUncertainty: undefined } as unknown as QuantityOptions;
  expect(quantity(1, "K", options)).toStrictEqual({ value: 1, unit: "K" });
});

test.each([
  ["degC", "Cel"],
  ["°C", "Cel"],
  ["F", "[degF]"],
  ["psi", "[psi]"],
  ["mmHg", "mm[Hg]"],
  ["torr", "mm[Hg]"],
  ["kcal/mol", "kcal_th/mol"],
  ["J/(mol K)", "J/mol/K"],
  ["J mol-1 K-1", "J/mol/K"],
  ["ppm", "[ppm]"],
  ["percent", "%"],
  ["Kj/mol", "kJ/mol"],
  ["kpa", "kPa"],
  [" bar", "bar"],
])("the near miss %j gets a hint for %j", (text, code) => {
  expect(unitHint(text)).toContain(`did you mean "${code}"?`);
  const [fault] = faultsOf(() => untyped(1, text));
  expect(fault?.hint).toContain(code);
});

test("every near miss is no code itself and leads to one; nothing near gives no hint", () => {
  for (const [text, code] of Object.entries(nearMisses)) {
    expect(isUnitCode(text), text).toBe(false);
    expect(isUnitCode(code), code).toBe(true);
  }
  expect(unitHint("furlong per fortnight")).toBeUndefined();
  expect(unitHint("torr")).toBe('did you mean "mm[Hg]"? (a torr is 101325/760 Pa, 1.4e-7 smaller)');
});

test("isUnitCode knows own codes of the table only, by dimension where asked", () => {
  expect(isUnitCode("kJ/mol")).toBe(true);
  expect(isUnitCode("kJ/mol", "molarEnergy")).toBe(true);
  expect(isUnitCode("kJ/mol", "pressure")).toBe(false);
  for (const text of ["kj/mol", "", "constructor", "hasOwnProperty", null, 1, ["K"], new String("K")]) {
    expect(isUnitCode(text)).toBe(false);
  }
});

test("each dimension has its coherent SI unit, with the factor 1 and no offset", () => {
  for (const [dimension, unit] of Object.entries(siUnits)) {
    expect(unitTable[unit]).toStrictEqual({ dimension, factor: "1" });
    expect(unitCodesOf(dimension as keyof typeof siUnits)[0]).toBe(unit);
  }
  expect(new Set(Object.values(unitTable).map((entry) => entry.dimension))).toEqual(new Set(Object.keys(siUnits)));
});
