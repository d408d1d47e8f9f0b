import ucum from "@lhncbc/ucum-lhc";
import { unit } from "mathjs";
import { expect, test } from "vitest";
import { convertValue } from "../../src/quantity/convert-value.js";
import type { UnitCode } from "../../src/quantity/units.js";
import { pairs } from "./oracle.js";

/** Relative difference of the two libraries' own double arithmetic; their factors are chains of products. */
const arithmetic = 1e-13;

const utils = ucum.UcumLhcUtils.getInstance();

function ucumValue(value: number, from: string, to: string): number | null {
  return utils.convertUnitTo(from, value, to).toVal ?? null;
}

const isDifference = (code: string) => code.includes("{difference}");
const deviating = new Set<string>(["mm[Hg]", "eV/{entity}"]);

test("every conversion agrees with @lhncbc/ucum-lhc, but for the listed deviations", () => {
  let compared = 0;
  for (const [from, to] of pairs) {
    if (isDifference(from) || deviating.has(from) || deviating.has(to)) continue;
    const theirs = ucumValue(300, from, to);
    const ours = convertValue(300, from, to);
    const label = `300 ${from} in ${to}`;
    expect(theirs, label).not.toBeNull();
    expect(Math.abs(theirs! - ours), label).toBeLessThanOrEqual(
      arithmetic * Math.max(Math.abs(ours), 500 * arithmetic),
    );
    compared += 1;
  }
  expect(compared).toBeGreaterThan(150);
});

// Codes of ours and names of mathjs; it has no thermochemical calorie.
const mathjsNames: readonly (readonly [UnitCode, string])[] = [
  ["K", "K"],
  ["Cel", "degC"],
  ["[degF]", "degF"],
  ["[degR]", "degR"],
  ["Pa", "Pa"],
  ["hPa", "hPa"],
  ["kPa", "kPa"],
  ["MPa", "MPa"],
  ["GPa", "GPa"],
  ["mbar", "mbar"],
  ["bar", "bar"],
  ["kbar", "kbar"],
  ["atm", "atm"],
  ["J/mol", "J/mol"],
  ["kJ/mol", "kJ/mol"],
  ["J/mol/K", "J/(mol K)"],
  ["kJ/mol/K", "kJ/(mol K)"],
  ["m3/mol", "m^3/mol"],
  ["cm3/mol", "cm^3/mol"],
  ["L/mol", "L/mol"],
  ["J/bar/mol", "J/(bar mol)"],
  ["kg/mol", "kg/mol"],
  ["g/mol", "g/mol"],
  ["mol", "mol"],
  ["mmol", "mmol"],
  ["kmol", "kmol"],
  ["kg", "kg"],
  ["g", "g"],
  ["mol/kg", "mol/kg"],
  ["mmol/kg", "mmol/kg"],
  ["mol/m3", "mol/m^3"],
  ["mol/L", "mol/L"],
  ["kg/m3", "kg/m^3"],
  ["g/cm3", "g/cm^3"],
  ["kg/L", "kg/L"],
  ["V", "V"],
  ["mV", "mV"],
  ["J", "J"],
  ["kJ", "kJ"],
  ["kW.h", "kWh"],
  ["J/kg", "J/kg"],
  ["J/g", "J/g"],
  ["kJ/kg", "kJ/kg"],
  ["J/kg/K", "J/(kg K)"],
  ["J/g/K", "J/(g K)"],
  ["Pa-1", "Pa^-1"],
  ["bar-1", "bar^-1"],
];

test("conversions agree with mathjs where it has the unit", () => {
  const names = new Map(mathjsNames);
  let compared = 0;
  for (const [from, to] of pairs) {
    const [name, nameThere] = [names.get(from), names.get(to)];
    if (name === undefined || nameThere === undefined) continue;
    const ours = convertValue(300, from, to);
    const theirs = unit(300, name).toNumber(nameThere);
    expect(Math.abs(theirs - ours), `300 ${from} in ${to}`).toBeLessThanOrEqual(arithmetic * Math.abs(ours));
    compared += 1;
  }
  expect(compared).toBeGreaterThan(120);
});

// The deviations of docs/units.md: ours by definition, theirs as their tables print it.
test("deviation: mm[Hg] is 133.322387415 Pa, in UCUM and in mathjs 133.322 Pa", () => {
  expect(convertValue(1, "mm[Hg]", "Pa")).toBe(133.322387415);
  expect(ucumValue(1, "mm[Hg]", "Pa")).toBeCloseTo(133.322, 9);
  expect(unit(1, "mmHg").toNumber("Pa")).toBeCloseTo(133.322, 9);
});

test("deviation: the electronvolt is 1.602176634e-19 J, in UCUM that of 1986, in mathjs that of 2010", () => {
  // e = 1.602176634e-19 C and NA = 6.02214076e23 mol-1 are exact since 2019
  expect(convertValue(1, "eV/{entity}", "J/mol") / 6.02214076e23).toBeCloseTo(1.602176634e-19, 30);
  expect(ucumValue(1, "eV", "J")! * 1e19).toBeCloseTo(1.60217733, 12);
  expect(unit(1, "eV").toNumber("J") * 1e19).toBeCloseTo(1.602176565, 12);
});

test("deviation: eV/{entity} is an energy per amount here, an energy in UCUM", () => {
  expect(convertValue(1, "eV/{entity}", "J/mol")).toBe(96485.33212331001);
  expect(ucumValue(1, "eV/{entity}", "J/mol")).toBeNull();
});

test("deviation: [psi] follows from pound, gravity and inch; mathjs has 6894.75729276459 Pa", () => {
  expect(convertValue(1, "[psi]", "Pa")).toBe(6894.757293168362);
  expect(ucumValue(1, "[psi]", "Pa")).toBeCloseTo(6894.757293168362, 9);
  expect(unit(1, "psi").toNumber("Pa")).toBeCloseTo(6894.75729276459, 9);
});

test("deviation: the annotation {difference} takes the offset away; to UCUM it is a comment", () => {
  expect(convertValue(1, "Cel{difference}", "K{difference}")).toBe(1);
  expect(ucumValue(1, "Cel{difference}", "K{difference}")).toBeCloseTo(274.15, 9);
  expect(convertValue(1, "K{difference}", "[degF]{difference}")).toBe(1.8);
  expect(ucumValue(1, "K{difference}", "[degF]{difference}")).toBeCloseTo(-457.87, 9);
});
