import fc from "fast-check";
import { expect, test } from "vitest";
import { isGibbsLedgerError } from "../../src/errors/gibbs-ledger-error.js";
import { convert, numericalValue } from "../../src/quantity/convert.js";
import { quantity } from "../../src/quantity/quantity.js";
import type { UnitCode } from "../../src/quantity/units.js";
import { exactConversion, exactDouble, isNearest } from "./oracle.js";

/** `convert` as a caller without types sees it. */
const untyped = convert as (given: unknown, unit: unknown) => { value: number };

function codeOf(run: () => unknown): string {
  try {
    run();
  } catch (error) {
    if (isGibbsLedgerError(error)) return error.code;
    throw error;
  }
  return "none";
}

test("a conversion keeps the shape, and the uncertainty travels without the offset", () => {
  expect(convert(quantity(2, "atm"), "kPa")).toStrictEqual({ value: 202.65, unit: "kPa" });
  expect(convert(quantity(77, "[degF]", { standardUncertainty: 0.9 }), "Cel")).toStrictEqual({
    value: 25,
    unit: "Cel",
    standardUncertainty: 0.5,
  });
  expect(convert(quantity(1, "eV/{entity}", { standardUncertainty: 0 }), "J/mol")).toStrictEqual({
    value: 96485.33212331001,
    unit: "J/mol",
    standardUncertainty: 0,
  });
  expect(convert({ value: -0, unit: "Pa" }, "Pa")).toStrictEqual({ value: 0, unit: "Pa" });
});

test("the numerical value is the value of the conversion", () => {
  const codes: UnitCode[] = ["Pa", "bar", "atm", "[psi]", "mm[Hg]", "kbar"];
  const unit = fc.constantFrom(...codes);
  fc.assert(
    fc.property(
      fc.double({ noNaN: true, noDefaultInfinity: true, min: -1e290, max: 1e290 }),
      unit,
      unit,
      (value, from, to) => {
        const given = { value, unit: from };
        const number = numericalValue(given, to);
        expect(number).toBe(convert(given, to).value);
        expect(isNearest(number, exactConversion(exactDouble(value), from, to))).toBe(true);
      },
    ),
    { seed: 20261201, numRuns: 2000 },
  );
});

test.each([
  [{ value: 1, unit: "bar" }, "K", "quantity/wrong-dimension"],
  [{ value: 25, unit: "C" }, "Cel", "quantity/wrong-dimension"],
  [{ value: 1, unit: "K" }, "K{difference}", "quantity/wrong-dimension"],
  [{ value: 1, unit: "bar" }, "psi", "quantity/unknown-unit"],
  [{ value: 1, unit: "psi" }, "bar", "quantity/unknown-unit"],
  [{ value: Number.NaN, unit: "bar" }, "Pa", "quantity/not-finite"],
  [{ value: -1, unit: "K" }, "Cel", "quantity/below-absolute-zero"],
  [{ value: 1, unit: "bar", standardUncertainty: -1 }, "Pa", "quantity/negative-uncertainty"],
  [1, "Pa", "quantity/not-a-quantity"],
  [null, "Pa", "quantity/not-a-quantity"],
  [{ value: 1e308, unit: "V" }, "mV", "quantity/overflow"],
  [{ value: -1.7e300, unit: "GPa" }, "Pa", "quantity/overflow"],
  [{ value: 1, unit: "V", standardUncertainty: 1e308 }, "mV", "quantity/overflow"],
])("convert(%o, %j) is refused with %s", (given, unit, code) => {
  expect(codeOf(() => untyped(given, unit))).toBe(code);
});

test("the hint for a coulomb where a temperature belongs", () => {
  try {
    untyped({ value: 25, unit: "Cel" }, "C");
  } catch (error) {
    if (!isGibbsLedgerError(error, "quantity/wrong-dimension")) throw error;
    expect(error.faults[0]?.hint).toBe("C is the coulomb; degrees Celsius are Cel");
  }
  expect.assertions(1);
});
