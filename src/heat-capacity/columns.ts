import { type CompensatedPair, twoProduct, twoSum } from "../numeric/compensated.js";

/**
 * The basis that every integral of a heat-capacity series is written in. The first thirteen functions have a place of
 * their own because the published forms use them; any other power of T, a multiple of 1/2, is an extra.
 */
export const basis = [
  "1",
  "T",
  "T^2",
  "T^3",
  "T^4",
  "T^5",
  "T^-1",
  "T^-2",
  "T^-3",
  "ln T",
  "T ln T",
  "T^(1/2)",
  "T^(-1/2)",
] as const;

/** Places of the functions that are not whole powers. */
export const logarithmPlace = 9;
export const temperatureLogarithmPlace = 10;
const rootPlace = 11;
const reciprocalRootPlace = 12;

/** A power of T that has no place of its own in the basis. */
export interface ExtraPower {
  readonly exponent: number;
  readonly coefficient: number;
}

/** One function of temperature as a linear combination of the basis. */
export interface Columns {
  /** Coefficients in the order of {@link basis}. */
  readonly fixed: Float64Array;
  /** Whether a square root is needed. */
  readonly hasRoots: boolean;
  readonly extras: readonly ExtraPower[];
}

/** The place of T^exponent in the basis, or undefined where it is an extra. */
export function placeOfPower(exponent: number): number | undefined {
  if (Number.isInteger(exponent)) {
    if (exponent >= 0 && exponent <= 5) return exponent;
    if (exponent >= -3 && exponent <= -1) return 5 - exponent;
    return undefined;
  }
  if (exponent === 0.5) return rootPlace;
  return exponent === -0.5 ? reciprocalRootPlace : undefined;
}

/** Puts columns together; extras with coefficient zero are left out. */
export function columns(fixed: Float64Array, extras: readonly ExtraPower[]): Columns {
  return {
    fixed,
    hasRoots: fixed[rootPlace] !== 0 || fixed[reciprocalRootPlace] !== 0,
    extras: extras.filter((extra) => extra.coefficient !== 0),
  };
}

/**
 * Value of a linear combination of the basis at one temperature.
 *
 * @param temperatureK - above 0 K
 * @param lnTemperature - natural logarithm of the same temperature
 */
export function evaluateColumns(combination: Columns, temperatureK: number, lnTemperature: number): number {
  const c = combination.fixed;
  const t = temperatureK;
  const r = 1 / t;
  const value =
    lnTemperature * (c[9]! + t * c[10]!) +
    (c[0]! + t * (c[1]! + t * (c[2]! + t * (c[3]! + t * (c[4]! + t * c[5]!)))) +
      r * (c[6]! + r * (c[7]! + r * c[8]!)));
  return combination.hasRoots || combination.extras.length !== 0 ? value + rootsAndExtras(combination, t) : value;
}

function rootsAndExtras(combination: Columns, temperatureK: number): number {
  let value = 0;
  if (combination.hasRoots) {
    const root = Math.sqrt(temperatureK);
    value = combination.fixed[rootPlace]! * root + combination.fixed[reciprocalRootPlace]! / root;
  }
  for (const extra of combination.extras) value += extra.coefficient * powerOf(temperatureK, extra.exponent);
  return value;
}

/**
 * Sum of the absolute values of the terms, the scale that the rounding of {@link evaluateColumns} is measured on.
 */
export function absoluteTerms(combination: Columns, temperatureK: number, lnTemperature: number): number {
  const logarithm = Math.abs(lnTemperature);
  let sum = 0;
  for (let place = 0; place < combination.fixed.length; place += 1) {
    sum += Math.abs(combination.fixed[place]!) * basisValue(place, temperatureK, logarithm);
  }
  for (const extra of combination.extras) {
    sum += Math.abs(extra.coefficient) * powerOf(temperatureK, extra.exponent);
  }
  return sum;
}

function basisValue(place: number, temperatureK: number, logarithm: number): number {
  if (place <= 5) return powerOf(temperatureK, place);
  if (place <= 8) return powerOf(temperatureK, 5 - place);
  if (place === logarithmPlace) return logarithm;
  if (place === temperatureLogarithmPlace) return temperatureK * logarithm;
  const root = Math.sqrt(temperatureK);
  return place === rootPlace ? root : 1 / root;
}

/** T^n for n a multiple of 1/2, within 1 eps: by squaring in pairs of doubles, for squares double their error. */
function powerOf(temperatureK: number, exponent: number): number {
  const below = Math.floor(exponent);
  let power = wholePower(temperatureK, Math.abs(below));
  if (below < 0) power = reciprocal(power);
  return exponent === below ? power.value : power.value * Math.sqrt(temperatureK);
}

function wholePower(base: number, exponent: number): CompensatedPair {
  let result: CompensatedPair = { value: 1, error: 0 };
  let square: CompensatedPair = { value: base, error: 0 };
  for (let rest = exponent; rest > 0; rest = Math.floor(rest / 2)) {
    if (rest % 2 === 1) result = productOf(result, square);
    if (rest > 1) square = productOf(square, square);
  }
  return result;
}

function productOf(a: CompensatedPair, b: CompensatedPair): CompensatedPair {
  const { value, error } = twoProduct(a.value, b.value);
  return twoSum(value, error + (a.value * b.error + a.error * b.value));
}

function reciprocal({ value, error }: CompensatedPair): CompensatedPair {
  const first = 1 / value;
  const product = twoProduct(first, value);
  return twoSum(first, first * (1 - product.value - product.error - first * error));
}
