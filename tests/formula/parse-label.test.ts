import { expect, test } from "vitest";
import { parseLabel } from "../../src/formula/parse-label.js";

test.each([
  ["NH3(g)", "NH3", 0, "g", undefined, "NH3(g)"],
  ["Fe^3+(aq)", "Fe", 3, "aq", undefined, "Fe^3+(aq)"],
  ["Fe³⁺(aq)", "Fe", 3, "aq", undefined, "Fe^3+(aq)"],
  ["SO₄²⁻", "SO4", -2, undefined, undefined, "SO4^2-"],
  ["SO4^2−", "SO4", -2, undefined, undefined, "SO4^2-"],
  ["Na^1+(aq)", "Na", 1, "aq", undefined, "Na^+(aq)"],
  ["C(cr,graphite)", "C", 0, "cr", "graphite", "C(cr,graphite)"],
  ["NH3", "NH3", 0, undefined, undefined, "NH3"],
  ["CuSO4.5H2O(cr)", "CuSO4·5H2O", 0, "cr", undefined, "CuSO4·5H2O(cr)"],
  ["CuSO4•5H2O(cr)", "CuSO4·5H2O", 0, "cr", undefined, "CuSO4·5H2O(cr)"],
  ["CaSO4·0.50H2O", "CaSO4·0.5H2O", 0, undefined, undefined, "CaSO4·0.5H2O"],
  ["CuSO4·1H2O", "CuSO4·H2O", 0, undefined, undefined, "CuSO4·H2O"],
  ["Fe0.9470O1", "Fe0.947O", 0, undefined, undefined, "Fe0.947O"],
  ["Na₀.₅H₂O", "Na0.5·H2O", 0, undefined, undefined, "Na0.5·H2O"],
  ["B4.5H2O1", "B4.5·H2O", 0, undefined, undefined, "B4.5·H2O"],
  ["(S)1", "(S)1", 0, undefined, undefined, "(S)1"],
  ["e⁻", "e", -1, undefined, undefined, "e^-"],
])("%s", (text, formula, chargeNumber, state, polymorph, label) => {
  expect(parseLabel(text)).toEqual({
    formula,
    chargeNumber,
    ...(state === undefined ? {} : { state }),
    ...(polymorph === undefined ? {} : { polymorph }),
    label,
  });
  expect(parseLabel(label).label).toBe(label);
});
