import fc from "fast-check";
import { expect, test } from "vitest";
import type { Fault } from "../../src/errors/fault.js";
import { isGibbsLedgerError, toFaults } from "../../src/errors/gibbs-ledger-error.js";
import {
  checkPositiveQuantity,
  checkQuantity,
  pressureInPascal,
  siValue,
  temperatureInKelvin,
} from "../../src/quantity/guards.js";
import { siUnits, type UnitCode, unitCodesOf } from "../../src/quantity/units.js";
import { exactConversion, exactDouble, isNearest } from "./oracle.js";

const settings = { seed: 20261201, numRuns: 2000 };

function faultsOf(run: () => unknown): Fault[] {
  try {
    run();
  } catch (error) {
    return toFaults(error);
  }
  return [];
}

test("temperatures become the nearest kelvin, whatever their unit", () => {
  const unit = fc.constantFrom(...unitCodesOf("temperature"));
  fc.assert(
    fc.property(fc.double({ min: -273, max: 1e4, noNaN: true }), unit, (value, code) => {
      fc.pre(value > 0 || code === "Cel" || code === "[degF]");
      const kelvin = temperatureInKelvin({ value, unit: code });
      expect(isNearest(kelvin, exactConversion(exactDouble(value), code, "K"))).toBe(true);
    }),
    settings,
  );
  expect(temperatureInKelvin({ value: 25, unit: "Cel" })).toBe(298.15);
});

test("pressures become the nearest pascal, whatever their unit", () => {
  const unit = fc.constantFrom(...unitCodesOf("pressure"));
  fc.assert(
    fc.property(fc.double({ min: 5e-300, max: 1e290, noNaN: true }), unit, (value, code) => {
      const pascal = pressureInPascal({ value, unit: code });
      expect(isNearest(pascal, exactConversion(exactDouble(value), code, "Pa"))).toBe(true);
    }),
    settings,
  );
  expect(pressureInPascal({ value: 1, unit: "atm" })).toBe(101325);
});

test.each([
  [{ value: 0, unit: "K" }, "quantity/not-positive"],
  [{ value: -273.15, unit: "Cel" }, "quantity/not-positive"],
  [{ value: -459.67, unit: "[degF]" }, "quantity/not-positive"],
  [{ value: -1, unit: "K" }, "quantity/below-absolute-zero"],
  [{ value: -300, unit: "Cel" }, "quantity/below-absolute-zero"],
  [{ value: Number.NaN, unit: "K" }, "quantity/not-finite"],
  [{ value: Number.POSITIVE_INFINITY, unit: "Cel" }, "quantity/not-finite"],
  [{ value: Number.POSITIVE_INFINITY, unit: "[degF]" }, "quantity/not-finite"],
  [{ value: "298.15", unit: "K" }, "quantity/not-finite"],
  [{ value: 1, unit: "bar" }, "quantity/wrong-dimension"],
  [{ value: 1, unit: "K{difference}" }, "quantity/wrong-dimension"],
  [{ value: 25, unit: "C" }, "quantity/wrong-dimension"],
  [{ value: 25, unit: "degC" }, "quantity/unknown-unit"],
  [{ value: 25 }, "quantity/unknown-unit"],
  [{}, "quantity/not-finite"],
  [298.15, "quantity/not-a-quantity"],
  ["298.15 K", "quantity/not-a-quantity"],
  [null, "quantity/not-a-quantity"],
  [undefined, "quantity/not-a-quantity"],
])("the temperature %o is refused with %s", (value, code) => {
  const [fault] = faultsOf(() => temperatureInKelvin(value, ["conditions", "temperature"]));
  expect(fault?.code).toBe(code);
  expect(fault?.path.slice(0, 2)).toEqual(["conditions", "temperature"]);
});

test.each([
  [{ value: 0, unit: "bar" }, "quantity/not-positive"],
  [{ value: -1, unit: "mm[Hg]" }, "quantity/not-positive"],
  [{ value: 1e300, unit: "GPa" }, "quantity/overflow"],
  [{ value: Number.NaN, unit: "Pa" }, "quantity/not-finite"],
  [{ value: 1, unit: "K" }, "quantity/wrong-dimension"],
  [{ value: 1, unit: "psi" }, "quantity/unknown-unit"],
  [1e5, "quantity/not-a-quantity"],
])("the pressure %o is refused with %s", (value, code) => {
  const [fault] = faultsOf(() => pressureInPascal(value, ["pressure"]));
  expect(fault?.code).toBe(code);
  expect(fault?.path[0]).toBe("pressure");
});

test("a bare number is told how to get a unit, a coulomb what it is", () => {
  expect(faultsOf(() => temperatureInKelvin(298.15))[0]?.hint).toBe(
    'a bare number has no unit: use quantity(298.15, "K")',
  );
  expect(faultsOf(() => temperatureInKelvin({ value: 25, unit: "C" }))[0]?.hint).toBe(
    "C is the coulomb; degrees Celsius are Cel",
  );
});

test("siValue takes any sign and every dimension", () => {
  expect(siValue({ value: -32.9, unit: "kJ/mol" }, "molarEnergy")).toBe(-32900);
  for (const dimension of Object.keys(siUnits) as (keyof typeof siUnits)[]) {
    for (const unit of unitCodesOf(dimension)) {
      const si = siValue({ value: 3, unit }, dimension);
      expect(isNearest(si, exactConversion(exactDouble(3), unit, siUnits[dimension])), unit).toBe(true);
    }
  }
  expect(
    isGibbsLedgerError(
      caught(() => siValue({ value: 1, unit: "K" }, "pressure", [3])),
      "quantity/wrong-dimension",
    ),
  ).toBe(true);
});

function caught(run: () => unknown): unknown {
  try {
    return run();
  } catch (error) {
    return error;
  }
}

test("each property is read once", () => {
  const reads: string[] = [];
  const spy = (value: unknown, unit: UnitCode) =>
    new Proxy(
      { value, unit },
      {
        get(target, key, receiver) {
          reads.push(String(key));
          return Reflect.get(target, key, receiver);
        },
      },
    );
  temperatureInKelvin(spy(25, "Cel"));
  temperatureInKelvin(spy(25, "[degF]"));
  pressureInPascal(spy(1, "mm[Hg]"));
  siValue(spy(1, "J"), "energy");
  faultsOf(() => temperatureInKelvin(spy(Number.NaN, "K")));
  expect(reads).toEqual(Array.from({ length: 5 }, () => ["value", "unit"]).flat());
  reads.length = 0;
  checkQuantity(spy(1, "J"), "energy", [], []);
  expect(reads).toEqual(["value", "unit", "standardUncertainty"]);
});

test("the full check collects, with paths, and returns SI", () => {
  const faults: Fault[] = [];
  expect(checkQuantity({ value: 25, unit: "Cel", standardUncertainty: 0.1 }, "temperature", ["t"], faults)).toBe(
    298.15,
  );
  expect(checkQuantity({ value: 0, unit: "K" }, "temperature", ["t"], faults)).toBe(0);
  expect(faults).toEqual([]);
  const bad = JSON.parse('{ "value": "1", "unit": "bar", "standardUncertainty": -1, "note": 1, "__proto__": {} }');
  expect(checkQuantity(bad, "temperature", ["t"], faults)).toBeUndefined();
  expect(faults.map(({ code, path }) => [code, path.join(".")])).toEqual([
    ["input/unknown-key", "t.note"],
    ["input/forbidden-key", "t.__proto__"],
    ["quantity/not-finite", "t.value"],
    ["quantity/wrong-dimension", "t.unit"],
    ["quantity/negative-uncertainty", "t.standardUncertainty"],
  ]);
});

test("a positive quantity is above zero", () => {
  const faults: Fault[] = [];
  expect(checkPositiveQuantity({ value: 1, unit: "bar" }, "pressure", [], faults)).toBe(1e5);
  expect(faults).toEqual([]);
  expect(checkPositiveQuantity({ value: 0, unit: "bar" }, "pressure", ["p"], faults)).toBeUndefined();
  expect(faults.map((fault) => fault.code)).toEqual(["quantity/not-positive"]);
});
