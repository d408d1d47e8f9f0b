import { lnDecimal, sqrtDecimal } from "../numeric/decimal-functions.js";
import { divideDecimals } from "../numeric/divide-decimals.js";
import { addDecimals, decimalOf, type ExactDecimal, multiplyDecimals } from "../numeric/exact-decimal.js";
import type { HeatCapacityTerm } from "./exact-series.js";

/** Cp and the integrals of Cp dT and Cp/T dT without their constants, to the digits asked for. */
export interface ExactIntegrals {
  readonly heatCapacity: ExactDecimal;
  readonly enthalpy: ExactDecimal;
  readonly entropy: ExactDecimal;
}

const zero: ExactDecimal = { mantissa: 0n, exponent: 0 };

/**
 * Evaluates a series of Cp and its integrals at one temperature.
 *
 * @param temperature - above 0 K
 * @param digits - significant digits of each term
 */
export function integralsAt(
  terms: readonly HeatCapacityTerm[],
  temperature: ExactDecimal,
  digits: number,
): ExactIntegrals {
  let heatCapacity = zero;
  let enthalpy = zero;
  let entropy = zero;
  const logarithm = terms.some(({ exponent }) => exponent === 0 || exponent === -1)
    ? lnDecimal(temperature, digits)
    : zero;
  for (const { exponent, coefficient } of terms) {
    if (coefficient.mantissa === 0n) continue;
    const term = multiplyDecimals(coefficient, powerOfDecimal(temperature, exponent, digits));
    const next = multiplyDecimals(term, temperature);
    heatCapacity = addDecimals(heatCapacity, term);
    enthalpy = addDecimals(
      enthalpy,
      exponent === -1
        ? multiplyDecimals(coefficient, logarithm)
        : divideDecimals(next, decimalOf(exponent + 1), digits),
    );
    entropy = addDecimals(
      entropy,
      exponent === 0 ? multiplyDecimals(coefficient, logarithm) : divideDecimals(term, decimalOf(exponent), digits),
    );
  }
  return { heatCapacity, enthalpy, entropy };
}

/** T^n for n a multiple of 1/2. */
function powerOfDecimal(base: ExactDecimal, exponent: number, digits: number): ExactDecimal {
  const below = Math.floor(exponent);
  const whole = wholePower(base, Math.abs(below));
  const power = below < 0 ? divideDecimals({ mantissa: 1n, exponent: 0 }, whole, digits) : whole;
  return exponent === below ? power : multiplyDecimals(power, sqrtDecimal(base, digits));
}

function wholePower(base: ExactDecimal, exponent: number): ExactDecimal {
  return { mantissa: base.mantissa ** BigInt(exponent), exponent: base.exponent * exponent };
}
