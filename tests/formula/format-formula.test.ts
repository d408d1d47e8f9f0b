import { expect, test } from "vitest";
import { toFaults } from "../../src/errors/gibbs-ledger-error.js";
import { formatFormula } from "../../src/formula/format-formula.js";
import { formula } from "../../src/formula/formula.js";

test.each([
  ["SO4^2-", "SO4^2-", "SO₄²⁻"],
  ["Fe^3+(aq)", "Fe^3+(aq)", "Fe³⁺(aq)"],
  ["Na^+", "Na^+", "Na⁺"],
  ["[Fe(CN)6]^4-", "[Fe(CN)6]^4-", "[Fe(CN)₆]⁴⁻"],
  ["CuSO4.5H2O", "CuSO4·5H2O", "CuSO₄·5H₂O"],
  ["CaSO4·0.5H2O(cr,alpha)", "CaSO4·0.5H2O(cr,alpha)", "CaSO₄·0.5H₂O(cr,alpha)"],
  ["Fe0.947O", "Fe0.947O", "Fe₀.₉₄₇O"],
  ["e^-", "e^-", "e⁻"],
  ["C60^10+", "C60^10+", "C₆₀¹⁰⁺"],
])("%s is written %s and %s", (text, ascii, unicode) => {
  expect(formatFormula(text)).toBe(ascii);
  expect(formatFormula(formula(text), { style: "ascii" })).toBe(ascii);
  expect(formatFormula(formula(text), { style: "unicode" })).toBe(unicode);
  expect(formatFormula(unicode)).toBe(ascii);
});

test.each([
  [{ style: "html" }, "input/unknown-option", ["options", "style"]],
  [{ styl: "unicode" }, "input/unknown-key", ["options", "styl"]],
  [null, "input/not-an-object", ["options"]],
])("the options %j are refused", (options, code, path) => {
  try {
    formatFormula("H2O", options as object);
    expect.unreachable();
  } catch (error) {
    expect(toFaults(error)[0]).toMatchObject({ code, path });
  }
});
