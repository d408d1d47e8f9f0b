import { expect, test } from "vitest";
import { faradayConstantByAdjustment, gasConstantByAdjustment } from "../../src/constants/codata-adjustments.js";
import {
  avogadroConstant,
  boltzmannConstant,
  elementaryCharge,
  faradayConstant,
  gasConstant,
  gasConstantJPerMolK,
  planckConstant,
  speedOfLight,
  standardAtmosphere,
  standardPressure,
  thermochemicalCalorie,
  zeroCelsius,
} from "../../src/constants/constants.js";
import { convertValue } from "../../src/quantity/convert-value.js";

// SI Brochure, 9th edition (BIPM 2019), defining constants; origin: memory
test.each([
  ["k", boltzmannConstant, 1.380649e-23],
  ["NA", avogadroConstant, 6.02214076e23],
  ["e", elementaryCharge, 1.602176634e-19],
  ["h", planckConstant, 6.62607015e-34],
  ["c", speedOfLight, 299792458],
])("defining constant %s", (_, constant, value) => {
  expect(constant.value).toBe(value);
});

// CODATA 2018 (Tiesinga et al. 2021), unchanged in 2022; exact products of defining constants; origin: memory
test("R and F of CODATA 2018", () => {
  expect(gasConstant.value).toBe(8.31446261815324);
  expect(faradayConstant.value).toBeCloseTo(96485.33212, 5); // printed as 96485.33212...
});

// IUPAC Green Book, 3rd edition (Cohen et al. 2007), chapter 7.2, conversion table; origin: memory
test.each([
  ["standard atmosphere in Pa", standardAtmosphere, 101325],
  ["standard pressure in Pa", standardPressure, 1e5],
  ["thermochemical calorie in J", thermochemicalCalorie, 4.184],
  ["zero of the Celsius scale in K", zeroCelsius, 273.15],
])("%s", (_, constant, value) => {
  expect(constant.value).toBe(value);
});

// CODATA adjustments: Cohen and DuMond 1965 (the adjustment of 1963), Cohen and Taylor 1973, 1987, Mohr et al. 2000,
// 2005, 2008, 2012, 2016; origin: memory
test.each([
  [1963, 8.3143],
  [1973, 8.31441],
  [1986, 8.31451],
  [1998, 8.314472],
  [2002, 8.314472],
  [2006, 8.314472],
  [2010, 8.3144621],
  [2014, 8.3144598],
  [2018, 8.31446261815324],
] as const)("R of the adjustment of %i", (year, value) => {
  expect(gasConstantByAdjustment[year].value).toBe(value);
});

test.each([
  [1973, 96484.56],
  [1986, 96485.309],
  [1998, 96485.3415],
  [2002, 96485.3383],
  [2006, 96485.3399],
  [2010, 96485.3365],
  [2014, 96485.33289],
] as const)("F of the adjustment of %i", (year, value) => {
  expect(faradayConstantByAdjustment[year].value).toBe(value);
});

// CODATA 2018, molar volumes of an ideal gas at 273.15 K, exact and printed cut off after 11 decimals; origin: memory
test.each([
  [standardPressure, 0.02271095464],
  [standardAtmosphere, 0.02241396954],
])("molar volume of an ideal gas, R T / p, at %o", (pressure, printed) => {
  const computed = (gasConstantJPerMolK * zeroCelsius.value) / pressure.value;
  expect(computed).toBeGreaterThanOrEqual(printed);
  expect(computed).toBeLessThan(printed + 1e-11);
});

// Derived from the above, the digits as commonly quoted; origin: memory
test("R in other units", () => {
  expect(convertValue(gasConstantJPerMolK, "J/mol/K", "cal_th/mol/K")).toBeCloseTo(1.987204258640832, 15);
  expect(gasConstantJPerMolK * 298.15).toBeCloseTo(2478.9570296, 7);
});

// NIST Special Publication 811 and the Green Book, conversion factors to the digits printed there; origin: memory
test("conversion factors", () => {
  expect(convertValue(1, "[psi]", "Pa")).toBeCloseTo(6894.757293168, 9);
  expect(convertValue(1, "mm[Hg]", "Pa")).toBe(133.322387415);
  expect(convertValue(1, "[degR]", "K")).toBeCloseTo(0.5555555555555556, 15);
  expect(convertValue(1, "kW.h", "J")).toBe(3.6e6);
});
