import { nearest } from "../errors/nearest.js";
import { type UnitCode, unitEntry, unitTable } from "./units.js";

/** Spellings that people use, and the code that is meant. */
export const nearMisses = {
  k: "K",
  kelvin: "K",
  degK: "K",
  "°K": "K",
  degC: "Cel",
  "°C": "Cel",
  "℃": "Cel",
  celsius: "Cel",
  Celsius: "Cel",
  cel: "Cel",
  F: "[degF]",
  degF: "[degF]",
  "°F": "[degF]",
  R: "[degR]",
  degR: "[degR]",
  "°R": "[degR]",
  "delta K": "K{difference}",
  pa: "Pa",
  kpa: "kPa",
  mpa: "MPa",
  Bar: "bar",
  ATM: "atm",
  psi: "[psi]",
  psia: "[psi]",
  mmHg: "mm[Hg]",
  torr: "mm[Hg]",
  Torr: "mm[Hg]",
  "J mol-1": "J/mol",
  "J.mol-1": "J/mol",
  "J/mole": "J/mol",
  "kJ mol-1": "kJ/mol",
  "kJ.mol-1": "kJ/mol",
  "kj/mol": "kJ/mol",
  "KJ/mol": "kJ/mol",
  "cal/mol": "cal_th/mol",
  "kcal/mol": "kcal_th/mol",
  "kcal mol-1": "kcal_th/mol",
  eV: "eV/{entity}",
  "J/(mol K)": "J/mol/K",
  "J/(mol.K)": "J/mol/K",
  "J/(mol*K)": "J/mol/K",
  "J/mol.K": "J/mol/K",
  "J/mol K": "J/mol/K",
  "J/K/mol": "J/mol/K",
  "J mol-1 K-1": "J/mol/K",
  "J.mol-1.K-1": "J/mol/K",
  "J K-1 mol-1": "J/mol/K",
  "kJ/(mol K)": "kJ/mol/K",
  "cal/(mol K)": "cal_th/mol/K",
  "cal/mol/K": "cal_th/mol/K",
  "m^3/mol": "m3/mol",
  "m³/mol": "m3/mol",
  "cm^3/mol": "cm3/mol",
  "cm³/mol": "cm3/mol",
  "cc/mol": "cm3/mol",
  "l/mol": "L/mol",
  "J/bar": "J/bar/mol",
  mole: "mol",
  moles: "mol",
  M: "mol/L",
  "mol/l": "mol/L",
  "mol/dm3": "mol/L",
  "mol/m^3": "mol/m3",
  molal: "mol/kg",
  percent: "%",
  ppm: "[ppm]",
  cal: "cal_th",
  kcal: "cal_th",
  "L.atm": "J",
  "L atm": "J",
  kWh: "kW.h",
  "kJ/g": "kJ/kg",
  "cal/g": "cal_th/g",
  "J/(g K)": "J/g/K",
  "J/(kg K)": "J/kg/K",
  "1/K": "K-1",
  "1/Pa": "Pa-1",
  "1/bar": "bar-1",
  "": "1",
} as const;

const notes: Readonly<Record<string, string>> = {
  F: "F is the farad",
  R: "R is the roentgen",
  torr: "a torr is 101325/760 Pa, 1.4e-7 smaller",
  Torr: "a torr is 101325/760 Pa, 1.4e-7 smaller",
  kcal: "1 kcal_th is 1000 cal_th",
  "L.atm": "1 L.atm is 101.325 J",
  "L atm": "1 L.atm is 101.325 J",
  "kJ/g": "1 kJ/g is 1000 kJ/kg",
};

/** What the compiler shows in place of a text that is no unit code. */
export type UnitHint<U extends string> = string extends U
  ? "check a unit from configuration with isUnitCode(text) first"
  : U extends keyof typeof nearMisses
    ? `did you mean "${(typeof nearMisses)[U]}"?`
    : `no such unit code: ${U}`;

/** The hint for a text that is no unit code; undefined where nothing is near. */
export function unitHint(text: string): string | undefined {
  const near = Object.hasOwn(nearMisses, text)
    ? nearMisses[text as keyof typeof nearMisses]
    : nearest(text.trim(), Object.keys(unitTable));
  if (near === undefined) return undefined;
  const note = Object.hasOwn(notes, text) ? ` (${notes[text]})` : "";
  return `did you mean "${near}"?${note}`;
}

/** The hint for a unit of another dimension than was expected. */
export function dimensionHint(unit: UnitCode, expected: string): string | undefined {
  if (unit === "C" && expected.startsWith("temperature")) return "C is the coulomb; degrees Celsius are Cel";
  if (expected === "temperatureDifference" && unitEntry(unit).dimension === "temperature") {
    return `a difference of temperature is "${unit}{difference}"`;
  }
  if (expected === "temperature" && unitEntry(unit).dimension === "temperatureDifference") {
    return `a difference is no temperature; a temperature is "${unit.replace("{difference}", "")}"`;
  }
  return undefined;
}
