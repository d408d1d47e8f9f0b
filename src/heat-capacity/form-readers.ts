import { lnDecimal } from "../numeric/decimal-functions.js";
import {
  addDecimals,
  decimalOf,
  type ExactDecimal,
  multiplyDecimals,
  negateDecimal,
  scaleDecimal,
} from "../numeric/exact-decimal.js";
import type { HeatCapacityTerm } from "./exact-series.js";
import type { PublishedSeries } from "./published-series.js";

/** Terms of one interval as published, and the constants where the form carries its own. */
export interface IntervalTerms {
  readonly terms: readonly HeatCapacityTerm[];
  readonly constants?: { readonly enthalpy: ExactDecimal; readonly entropy: ExactDecimal };
}

const thermochemicalCalorie = decimalOf("4.184");
const kilo = decimalOf("1000");

/** Multiples of the gas constant, the constants of H and S last. */
export function readDimensionless(
  coefficients: readonly ExactDecimal[],
  exponents: readonly number[],
  published: PublishedSeries,
): IntervalTerms {
  const gasConstant = decimalOf(published.gasConstant ?? Number.NaN);
  const scaled = coefficients.map((coefficient) => multiplyDecimals(coefficient, gasConstant));
  return {
    terms: exponents.map((exponent, index) => ({ exponent, coefficient: scaled[index]! })),
    constants: { enthalpy: scaled.at(-2)!, entropy: scaled.at(-1)! },
  };
}

/** With t = T / 1000 K: S = A ln t + ... + G, so the constant of S in ln T is G - A ln 1000. */
export function readShomate(
  coefficients: readonly ExactDecimal[],
  _published: PublishedSeries,
  digits: number,
): IntervalTerms {
  const [a, b, c, d, e, f, g] = coefficients as [
    ExactDecimal,
    ExactDecimal,
    ExactDecimal,
    ExactDecimal,
    ExactDecimal,
    ExactDecimal,
    ExactDecimal,
  ];
  return {
    terms: [
      { exponent: 0, coefficient: a },
      { exponent: 1, coefficient: timesTenTo(b, -3) },
      { exponent: 2, coefficient: timesTenTo(c, -6) },
      { exponent: 3, coefficient: timesTenTo(d, -9) },
      { exponent: -2, coefficient: timesTenTo(e, 6) },
    ],
    constants: {
      enthalpy: timesTenTo(f, 3),
      entropy: addDecimals(g, negateDecimal(multiplyDecimals(a, lnDecimal(kilo, digits)))),
    },
  };
}

/** Coefficients of the powers of T in Cp, in J/mol/K or cal_th/mol/K. */
export function readPowers(
  coefficients: readonly ExactDecimal[],
  exponents: readonly number[],
  published: PublishedSeries,
): IntervalTerms {
  const inJoules = published.unit !== "cal_th/mol/K";
  return {
    terms: coefficients.map((coefficient, index) => ({
      exponent: exponents[index]!,
      coefficient: inJoules ? coefficient : multiplyDecimals(coefficient, thermochemicalCalorie),
    })),
  };
}

/**
 * Cp = a + 2 b T + c T^-2 + f T^2 + g T^(-1/2). The factor 2, which makes H = a T + b T^2 - ..., is recalled from the
 * paper (1976); a source that prints the linear coefficient of Cp itself is `"five-term"` or `"polynomial"`.
 */
export function readHaasFisher(coefficients: readonly ExactDecimal[], published: PublishedSeries): IntervalTerms {
  const doubled = coefficients.map((coefficient, index) => (index === 1 ? scaleDecimal(coefficient, 2n) : coefficient));
  return readPowers(doubled, [0, 1, -2, 2, -0.5], published);
}

/**
 * S = -dG/dT = -b - c - c ln T - sum of n d T^(n - 1) and H = G + T S = a - c T - sum of (n - 1) d T^n, so that Cp has
 * the term -c and, for each n, -n (n - 1) d T^(n - 1).
 */
export function readGibbsEnergy(coefficients: readonly ExactDecimal[], powers: readonly number[]): IntervalTerms {
  const [a, b, c, ...rest] = coefficients as [ExactDecimal, ExactDecimal, ExactDecimal, ...ExactDecimal[]];
  return {
    terms: [
      { exponent: 0, coefficient: negateDecimal(c) },
      ...powers.map((n, index) => ({
        exponent: n - 1,
        // n (n - 1) is a multiple of 1/4 below 421, which a double holds
        coefficient: multiplyDecimals(decimalOf(-n * (n - 1)), rest[index]!),
      })),
    ],
    constants: { enthalpy: a, entropy: negateDecimal(addDecimals(b, c)) },
  };
}

/** The number times 10^power, exactly. */
export function timesTenTo(value: ExactDecimal, power: number): ExactDecimal {
  return { mantissa: value.mantissa, exponent: value.exponent + power };
}
