import { type CompensatedPair, twoProduct, twoSum } from "../numeric/compensated.js";

/**
 * The functions that every integral of a heat-capacity series is a linear combination of, and that have a place of
 * their own because the published forms use them, with the power of T that each is; undefined for the two with a
 * logarithm. Any other power of T, a multiple of 1/2, is an extra.
 */
export const basis = [
  ["constant", 0],
  ["linear", 1],
  ["square", 2],
  ["cube", 3],
  ["fourth", 4],
  ["fifth", 5],
  ["inverse", -1],
  ["inverseSquare", -2],
  ["inverseCube", -3],
  ["root", 0.5],
  ["inverseRoot", -0.5],
  ["logarithm", undefined],
  ["linearLogarithm", undefined],
] as const;

/** Name of a function of the basis. */
export type BasisName = (typeof basis)[number][0];

/** A power of T that has no place of its own in the basis. */
export interface ExtraPower {
  readonly exponent: number;
  readonly coefficient: number;
}

/** One function of temperature as a linear combination of the basis: a coefficient by name, and extra powers. */
export type Columns = Readonly<Record<BasisName, number>> & {
  readonly extras: readonly ExtraPower[];
  /** Whether inverse cube, roots and extras are all absent, as in the forms that are most used. */
  readonly isPlain: boolean;
};

/** Coefficients by name, all zero, to be filled. */
export function emptyColumns(): Record<BasisName, number> {
  return {
    constant: 0,
    linear: 0,
    square: 0,
    cube: 0,
    fourth: 0,
    fifth: 0,
    inverse: 0,
    inverseSquare: 0,
    inverseCube: 0,
    root: 0,
    inverseRoot: 0,
    logarithm: 0,
    linearLogarithm: 0,
  };
}

/** The function of the basis that is T^exponent, or undefined where that is an extra. */
export function nameOfPower(exponent: number): BasisName | undefined {
  return basis.find(([, power]) => power === exponent)?.[0];
}

/**
 * Puts columns together; extras with coefficient zero are left out. Written out member by member: a spread object keeps
 * most members out of line, and its numbers are slower to read.
 */
export function columns(coefficients: Readonly<Record<BasisName, number>>, extras: readonly ExtraPower[]): Columns {
  const { inverseCube, root, inverseRoot } = coefficients;
  const present = extras.filter((extra) => extra.coefficient !== 0);
  return {
    constant: coefficients.constant,
    linear: coefficients.linear,
    square: coefficients.square,
    cube: coefficients.cube,
    fourth: coefficients.fourth,
    fifth: coefficients.fifth,
    inverse: coefficients.inverse,
    inverseSquare: coefficients.inverseSquare,
    logarithm: coefficients.logarithm,
    linearLogarithm: coefficients.linearLogarithm,
    isPlain: inverseCube === 0 && root === 0 && inverseRoot === 0 && present.length === 0,
    inverseCube,
    root,
    inverseRoot,
    extras: present,
  };
}

/**
 * Value of a linear combination of the basis at one temperature; never -0, since no coefficient is.
 *
 * @param c - the coefficients
 * @param temperatureK - above 0 K
 * @param lnTemperature - natural logarithm of the same temperature
 */
export function evaluateColumns(c: Columns, temperatureK: number, lnTemperature: number): number {
  const r = 1 / temperatureK;
  const value =
    lnTemperature * (c.logarithm + temperatureK * c.linearLogarithm) +
    (c.constant +
      temperatureK *
        (c.linear +
          temperatureK * (c.square + temperatureK * (c.cube + temperatureK * (c.fourth + temperatureK * c.fifth)))) +
      r * (c.inverse + r * c.inverseSquare));
  return c.isPlain ? value : value + rareTerms(c, temperatureK, r);
}

function rareTerms(combination: Columns, temperatureK: number, reciprocal: number): number {
  const root = Math.sqrt(temperatureK);
  let value =
    combination.root * root +
    (combination.inverseRoot / root + combination.inverseCube * reciprocal * reciprocal * reciprocal);
  for (const extra of combination.extras) value += extra.coefficient * powerOf(temperatureK, extra.exponent);
  return value;
}

/**
 * Sum of the absolute values of the terms, the scale that the rounding of {@link evaluateColumns} is measured on.
 */
export function absoluteTerms(combination: Columns, temperatureK: number, lnTemperature: number): number {
  const logarithm = Math.abs(lnTemperature);
  let sum =
    Math.abs(combination.logarithm) * logarithm + Math.abs(combination.linearLogarithm) * temperatureK * logarithm;
  for (const [name, power] of basis) {
    if (power !== undefined) sum += Math.abs(combination[name]) * powerOf(temperatureK, power);
  }
  for (const extra of combination.extras) {
    sum += Math.abs(extra.coefficient) * powerOf(temperatureK, extra.exponent);
  }
  return sum;
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
