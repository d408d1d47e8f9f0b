import { expect, test } from "vitest";
import { isGibbsLedgerError } from "../../src/errors/gibbs-ledger-error.js";
import { formatQuantity } from "../../src/quantity/format.js";
import { quantity } from "../../src/quantity/quantity.js";

test.each([
  [298.15, undefined, undefined, "298.15"],
  [-0.001, undefined, { digits: 2 }, "0.00"],
  [-0.001, undefined, { digits: 0 }, "0"],
  [-32.9, undefined, { digits: 2 }, "-32.90"],
  [-32.9, undefined, { significantDigits: 2 }, "-33"],
  [101325, undefined, { significantDigits: 2 }, "1.0e+5"],
  [0, undefined, undefined, "0"],
  [1e-7, undefined, undefined, "1e-7"],
  [-285.83, 0.04, undefined, "-285.83 +- 0.04"],
  [-285.8312, 0.0412, undefined, "-285.831 +- 0.041"],
  [-0.001, 0.2, undefined, "0.0 +- 0.2"],
  [1234.5, 120, undefined, "1235 +- 120"],
  [10.25, 0.999, undefined, "10 +- 1"],
  [10.5, 0, undefined, "10.5 +- 0"],
  [5.5, 0.25, { digits: 3 }, "5.500 +- 0.250"],
  [5.5, 0.256, { significantDigits: 3 }, "5.50 +- 0.26"],
  [1e-200, 1e-201, undefined, "1e-200 +- 1e-201"],
])("%s with uncertainty %s and %o is %s", (value, standardUncertainty, options, expected) => {
  const given =
    standardUncertainty === undefined ? quantity(value, "kJ/mol") : quantity(value, "kJ/mol", { standardUncertainty });
  expect(formatQuantity(given, options)).toBe(`${expected} kJ/mol`);
});

test.each([
  { digits: -1 },
  { digits: 101 },
  { digits: 1.5 },
  { significantDigits: 0 },
  { digits: 1, significantDigits: 1 },
  { decimals: 2 },
  null,
])("the options %o are refused", (options) => {
  try {
    formatQuantity(quantity(1, "K"), options as { digits?: number });
  } catch (error) {
    expect(isGibbsLedgerError(error)).toBe(true);
  }
  expect.assertions(1);
});

test("something that is no quantity is refused", () => {
  expect(() => formatQuantity(1 as never)).toThrow(/expected a quantity/);
  expect(() => formatQuantity({ value: Number.NaN, unit: "K" })).toThrow(/NaN/);
});
