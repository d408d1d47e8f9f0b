import type { Constant } from "./constant.js";

/** Molar gas constant R = k NA in J/mol/K. */
export const gasConstantJPerMolK: number = 8.31446261815324;
/** Standard pressure of 1 bar in Pa (IUPAC, since 1982). */
export const standardPressurePa: number = 100000;
/** The temperature 298.15 K to which tables of formation properties refer. */
export const referenceTemperatureK: number = 298.15;
/** Standard atmosphere in Pa. */
export const atmospherePa: number = 101325;
/** Faraday constant F = e NA in C/mol; the exact value 96485.3321233100184, rounded to a double. */
export const faradayConstantCPerMol: number = 96485.33212331001;
/** Thermochemical calorie in J. */
export const thermochemicalCalorieJ: number = 4.184;
/** Thermodynamic temperature of 0 degrees Celsius in K. */
export const zeroCelsiusK: number = 273.15;

/**
 * Molar gas constant R = k NA, exact since 2019.
 *
 * @example
 * gasConstant.value; // => 8.31446261815324
 */
export const gasConstant: Constant = /* @__PURE__ */ defined(gasConstantJPerMolK, "J/mol/K", "tiesinga2021");
/** Faraday constant F = e NA, exact since 2019; the double nearest to 96485.3321233100184 C/mol. */
export const faradayConstant: Constant = /* @__PURE__ */ defined(faradayConstantCPerMol, "C/mol", "tiesinga2021");
/** Avogadro constant. */
export const avogadroConstant: Constant = /* @__PURE__ */ defined(6.02214076e23, "mol-1", "bipm2019");
/** Boltzmann constant. */
export const boltzmannConstant: Constant = /* @__PURE__ */ defined(1.380649e-23, "J/K", "bipm2019");
/** Planck constant. */
export const planckConstant: Constant = /* @__PURE__ */ defined(6.62607015e-34, "J.s", "bipm2019");
/** Elementary charge. */
export const elementaryCharge: Constant = /* @__PURE__ */ defined(1.602176634e-19, "C", "bipm2019");
/** Speed of light in vacuum. */
export const speedOfLight: Constant = /* @__PURE__ */ defined(299792458, "m/s", "bipm2019");
/** Standard atmosphere. */
export const standardAtmosphere: Constant = /* @__PURE__ */ defined(atmospherePa, "Pa", "cohen2007");
/** Standard pressure of 1 bar, the IUPAC recommendation since 1982. */
export const standardPressure: Constant = /* @__PURE__ */ defined(standardPressurePa, "Pa", "cohen2007");
/** Thermodynamic temperature of 0 degrees Celsius. */
export const zeroCelsius: Constant = /* @__PURE__ */ defined(zeroCelsiusK, "K", "bipm2019");
/** The temperature to which tables of formation properties refer. */
export const referenceTemperature: Constant = /* @__PURE__ */ defined(referenceTemperatureK, "K", "cohen2007");
/** Thermochemical calorie. */
export const thermochemicalCalorie: Constant = /* @__PURE__ */ defined(thermochemicalCalorieJ, "J", "cohen2007");

function defined(value: number, unit: string, source: Constant["source"]): Constant {
  return Object.freeze({ value, unit, exact: true, source, origin: "memory" });
}
