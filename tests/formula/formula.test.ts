import { describe, expect, test } from "vitest";
import { type Formula, formula } from "../../src/formula/formula.js";

const good: readonly (readonly [text: string, composition: Record<string, number>, chargeNumber: number])[] = [
  ["H2O", { H: 2, O: 1 }, 0],
  ["Co", { Co: 1 }, 0],
  ["CO", { C: 1, O: 1 }, 0],
  ["C2H5OH", { C: 2, H: 6, O: 1 }, 0],
  ["Fe2(SO4)3", { Fe: 2, O: 12, S: 3 }, 0],
  ["K4[Fe(CN)6]", { C: 6, Fe: 1, K: 4, N: 6 }, 0],
  ["{[Co(NH3)5]2(OH)}Cl5", { Cl: 5, Co: 2, H: 31, N: 10, O: 1 }, 0],
  ["Ca₃(PO₄)₂", { Ca: 3, O: 8, P: 2 }, 0],
  ["Fe0.947O", { Fe: 0.947, O: 1 }, 0],
  ["Fe₀.₉₄₇O", { Fe: 0.947, O: 1 }, 0],
  ["Na₀.₅H₂O", { H: 2, Na: 0.5, O: 1 }, 0],
  ["Fe1.0O", { Fe: 1, O: 1 }, 0],
  // separators
  ["CuSO4·5H2O", { Cu: 1, H: 10, O: 9, S: 1 }, 0],
  ["CuSO4•5H2O", { Cu: 1, H: 10, O: 9, S: 1 }, 0],
  ["CuSO4⋅5H2O", { Cu: 1, H: 10, O: 9, S: 1 }, 0],
  ["CuSO₄·5H₂O", { Cu: 1, H: 10, O: 9, S: 1 }, 0],
  ["CuSO4.5H2O", { Cu: 1, H: 10, O: 9, S: 1 }, 0],
  ["CuSO₄.5H₂O(cr)", { Cu: 1, H: 10, O: 9, S: 1 }, 0],
  ["CuSO4.H2O", { Cu: 1, H: 2, O: 5, S: 1 }, 0],
  ["Na2CO3.10H2O(s)", { C: 1, H: 20, Na: 2, O: 13 }, 0],
  ["K4[Fe(CN)6].3H2O", { C: 6, H: 6, Fe: 1, K: 4, N: 6, O: 3 }, 0],
  ["CuSO4.5H2O1", { Cu: 1, H: 2, O: 5.5, S: 1 }, 0],
  ["CaSO4·0.5H2O", { Ca: 1, H: 1, O: 4.5, S: 1 }, 0],
  ["Na0.5·H2O", { H: 2, Na: 0.5, O: 1 }, 0],
  ["3CaO·Al2O3·6H2O", { Al: 2, Ca: 3, H: 12, O: 12 }, 0],
  ["(2NaCl·H2O)2·H2O", { Cl: 4, H: 6, Na: 4, O: 3 }, 0],
  ["Fe0.947O·H2O", { Fe: 0.947, H: 2, O: 2 }, 0],
  // charges
  ["SO4^2-", { O: 4, S: 1 }, -2],
  ["SO₄²⁻", { O: 4, S: 1 }, -2],
  ["SO4^2−", { O: 4, S: 1 }, -2],
  ["Fe^3+", { Fe: 1 }, 3],
  ["Na^+", { Na: 1 }, 1],
  ["Na^1+", { Na: 1 }, 1],
  ["Cl⁻", { Cl: 1 }, -1],
  ["Hg2^2+(aq)", { Hg: 2 }, 2],
  ["[Fe(CN)6]^4-", { C: 6, Fe: 1, N: 6 }, -4],
  ["e^-", {}, -1],
  ["e⁻", {}, -1],
  ["H^+", { H: 1 }, 1],
  // isotopes of hydrogen
  ["D2O", { D: 2, O: 1 }, 0],
  ["HDO", { D: 1, H: 1, O: 1 }, 0],
  ["CDCl3", { C: 1, Cl: 3, D: 1 }, 0],
  ["T2", { T: 2 }, 0],
  // elements that end the list, and look-alikes
  ["Og", { Og: 1 }, 0],
  ["NO", { N: 1, O: 1 }, 0],
  ["No", { No: 1 }, 0],
  ["Hf", { Hf: 1 }, 0],
  ["HF", { F: 1, H: 1 }, 0],
  ["Cr2(S)3", { Cr: 2, S: 3 }, 0],
  ["Cu(I)2", { Cu: 1, I: 2 }, 0],
];

test.each(good)("%s is %j with charge %i", (text, composition, chargeNumber) => {
  const read = formula(text);
  expect(read.text).toBe(text);
  expect(read.composition).toEqual(composition);
  expect(read.chargeNumber).toBe(chargeNumber);
  expect(Object.is(read.chargeNumber, -0)).toBe(false);
  expect(JSON.parse(JSON.stringify(read))).toEqual(read);
});

describe("state and polymorph", () => {
  test.each([
    ["NH3(g)", "g", undefined],
    ["H2O(l)", "l", undefined],
    ["Fe^3+(aq)", "aq", undefined],
    ["SO₄²⁻(aq)", "aq", undefined],
    ["C(cr,graphite)", "cr", "graphite"],
    ["H2O(cr,ice-Ih)", "cr", "ice-Ih"],
    ["Fe(cr,alpha)", "cr", "alpha"],
    ["SiO2(vit)", "vit", undefined],
    ["e^-(g)", "g", undefined],
    ["NH3", undefined, undefined],
  ])("%s", (text, state, polymorph) => {
    const read: Formula = formula(text);
    expect(read.state).toBe(state);
    expect(read.polymorph).toBe(polymorph);
    expect("state" in read).toBe(state !== undefined);
    expect("polymorph" in read).toBe(polymorph !== undefined);
  });

  test.each(["g", "l", "s", "cr", "am", "aq", "vit", "lc", "sln", "ads", "mon", "pol", "fl", "cd"])(
    "the symbol %s of the Green Book is read",
    (state) => {
      expect(formula(`Fe(${state})`).state).toBe(state);
    },
  );
});

test("exact counts are reduced fractions", () => {
  expect(formula("Fe0.947O").exactCounts).toEqual({ Fe: "947/1000", O: "1" });
  expect(formula("(Fe0.1)3").exactCounts).toEqual({ Fe: "3/10" });
  expect(formula("(Fe0.1)3").composition.Fe).toBe(0.3);
});

test("sums of decimal counts are exact before they are rounded", () => {
  expect(formula("Fe0.1OFe0.2").composition.Fe).toBe(0.3);
});

test.each([
  ["OH6C2", ["C", "H", "O"]],
  ["SO4H2", ["H", "O", "S"]],
  ["ClCD3", ["C", "Cl", "D"]],
  ["OTDHC", ["C", "H", "D", "O", "T"]],
  ["BrH", ["Br", "H"]],
])("the composition of %s stands in Hill order", (text, order) => {
  expect(Object.keys(formula(text).composition)).toEqual(order);
  expect(Object.keys(formula(text).exactCounts)).toEqual(order);
});
