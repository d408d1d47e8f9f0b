import { fail } from "../errors/gibbs-ledger-error.js";
import {
  addDecimals,
  decimalOf,
  decimalRatioToNumber,
  type ExactDecimal,
  multiplyDecimals,
  negateDecimal,
  scaleDecimal,
} from "../numeric/exact-decimal.js";
import { log } from "../numeric/log.js";
import type { Rational } from "../numeric/rational.js";
import {
  absoluteTerms,
  type BasisName,
  type Columns,
  columns,
  type ExtraPower,
  emptyColumns,
  nameOfPower,
} from "./columns.js";
import { type ExactSeries, intervalAt, lowerEndK, type PiecewiseSeries, upperEndK } from "./exact-series.js";

/** A series with the coefficient it has in a sum, such as a stoichiometric number. */
export interface WeightedSeries {
  readonly coefficient: Rational;
  readonly series: PiecewiseSeries;
}

/** Cp, H, S and G of one temperature interval, each as a linear combination of the basis. */
export interface IntervalColumns {
  readonly heatCapacity: Columns;
  readonly enthalpy: Columns;
  readonly entropy: Columns;
  readonly gibbsEnergy: Columns;
}

/** One interval of a plan; the intervals above it hang on it, which is faster to walk than an array of ends. */
export interface PlanInterval extends IntervalColumns {
  /** Upper end in kelvin; it belongs to this interval. */
  readonly toK: number;
  readonly above: PlanInterval | undefined;
}

/** A sum of series over temperature, rounded once and ready to evaluate. */
export interface SeriesPlan {
  readonly fromK: number;
  readonly toK: number;
  /** In rising order. */
  readonly intervals: readonly PlanInterval[];
  /** The first of them, where a walk begins. */
  readonly lowest: PlanInterval;
  readonly heatCapacityKnown: boolean;
}

const zero: ExactDecimal = { mantissa: 0n, exponent: 0 };
const one: ExactDecimal = { mantissa: 1n, exponent: 0 };

/**
 * Sums series exactly, interval by interval over the range that all share, and rounds each coefficient once. The
 * result depends neither on the order of the sum nor on how it is grouped.
 *
 * @returns undefined where the ranges do not meet
 */
export function mergeSeries(parts: readonly WeightedSeries[]): SeriesPlan | undefined {
  const fromK = Math.max(...parts.map((part) => lowerEndK(part.series)));
  const toK = Math.min(...parts.map((part) => upperEndK(part.series)));
  if (!(fromK <= toK)) return undefined;
  const endsK = commonEnds(parts, fromK, toK);
  const denominator = parts.reduce((all, part) => leastCommonMultiple(all, part.coefficient.denominator), 1n);
  const weights = parts.map(({ coefficient }) => coefficient.numerator * (denominator / coefficient.denominator));
  const intervals = endsK.map((endK) =>
    roundedColumns(
      sumOf(
        parts.map((part) => intervalAt(part.series, endK)),
        weights,
      ),
      denominator,
    ),
  );
  intervals.forEach((interval, index) => {
    refuseOverflow(interval, index === 0 ? fromK : endsK[index - 1]!, endsK[index]!);
  });
  const chain = chained(intervals, endsK);
  return {
    fromK,
    toK,
    intervals: chain,
    lowest: chain[0]!,
    heatCapacityKnown: parts.every((part) => part.series.heatCapacityKnown),
  };
}

function chained(intervals: readonly IntervalColumns[], endsK: readonly number[]): readonly PlanInterval[] {
  const chain: PlanInterval[] = [];
  let above: PlanInterval | undefined;
  for (let index = intervals.length - 1; index >= 0; index -= 1) {
    const { heatCapacity, enthalpy, entropy, gibbsEnergy } = intervals[index]!;
    above = { toK: endsK[index]!, heatCapacity, enthalpy, entropy, gibbsEnergy, above };
    chain.unshift(above);
  }
  return chain;
}

/**
 * Each term is greatest at an end of its interval (or, |T ln T| below 1 K, smaller than the coefficient), so that
 * sums of absolute terms that a double holds there are held in between.
 */
function refuseOverflow(interval: IntervalColumns, fromK: number, toK: number): void {
  for (const combination of Object.values(interval)) {
    for (const temperatureK of [fromK, toK]) {
      if (absoluteTerms(combination, temperatureK, log(temperatureK)) < largestSum) continue;
      fail({
        code: "heat-capacity/overflow",
        path: [],
        message: `the terms of a series are too large for a double at ${temperatureK} K`,
        expected: `terms whose sum is below ${largestSum}`,
      });
    }
  }
}

/** Room for the factors of a conversion. */
const largestSum = 1e300;

function commonEnds(parts: readonly WeightedSeries[], fromK: number, toK: number): number[] {
  const ends = new Set([toK]);
  for (const { series } of parts) {
    for (const interval of series.intervals) {
      if (interval.toK > fromK && interval.toK < toK) ends.add(interval.toK);
    }
  }
  return [...ends].sort((a, b) => a - b);
}

interface SeriesSum {
  readonly terms: ReadonlyMap<number, ExactDecimal>;
  readonly enthalpyConstant: ExactDecimal;
  readonly entropyConstant: ExactDecimal;
}

function sumOf(intervals: readonly ExactSeries[], weights: readonly bigint[]): SeriesSum {
  const terms = new Map<number, ExactDecimal>();
  let enthalpyConstant = zero;
  let entropyConstant = zero;
  intervals.forEach((interval, index) => {
    const weight = weights[index]!;
    for (const { exponent, coefficient } of interval.terms) {
      terms.set(exponent, addDecimals(terms.get(exponent) ?? zero, scaleDecimal(coefficient, weight)));
    }
    enthalpyConstant = addDecimals(enthalpyConstant, scaleDecimal(interval.enthalpyConstant, weight));
    entropyConstant = addDecimals(entropyConstant, scaleDecimal(interval.entropyConstant, weight));
  });
  return { terms, enthalpyConstant, entropyConstant };
}

/**
 * The integrals of the summed terms. For c T^n: H has c T^(n+1)/(n+1) and S has c T^n/n, logarithms where a divisor
 * is zero, and G = H - T S.
 */
function roundedColumns(sum: SeriesSum, denominator: bigint): IntervalColumns {
  const heatCapacity = draft();
  const enthalpy = draft();
  const entropy = draft();
  const gibbsEnergy = draft();
  const set = (target: ColumnDraft, name: BasisName, value: ExactDecimal): void => {
    target.coefficients[name] = decimalRatioToNumber(value, { mantissa: denominator, exponent: 0 });
  };
  const addPower = (target: ColumnDraft, exponent: number, value: ExactDecimal, divisor: ExactDecimal): void => {
    const coefficient = decimalRatioToNumber(value, scaleDecimal(divisor, denominator));
    const name = nameOfPower(exponent);
    if (name === undefined) target.extras.push({ exponent, coefficient });
    else target.coefficients[name] = coefficient;
  };
  let gibbsConstant = sum.enthalpyConstant;
  let gibbsSlope = negateDecimal(sum.entropyConstant);
  set(enthalpy, "constant", sum.enthalpyConstant);
  set(entropy, "constant", sum.entropyConstant);
  for (const [exponent, c] of sum.terms) {
    if (c.mantissa === 0n) continue;
    addPower(heatCapacity, exponent, c, one);
    if (exponent === 0) {
      set(enthalpy, "linear", c);
      set(entropy, "logarithm", c);
      set(gibbsEnergy, "linearLogarithm", negateDecimal(c));
      gibbsSlope = addDecimals(gibbsSlope, c);
    } else if (exponent === -1) {
      set(enthalpy, "logarithm", c);
      addPower(entropy, -1, negateDecimal(c), one);
      set(gibbsEnergy, "logarithm", c);
      gibbsConstant = addDecimals(gibbsConstant, c);
    } else {
      const n = decimalOf(exponent);
      const next = addDecimals(n, one);
      addPower(enthalpy, exponent + 1, c, next);
      addPower(entropy, exponent, c, n);
      addPower(gibbsEnergy, exponent + 1, negateDecimal(c), multiplyDecimals(n, next));
    }
  }
  set(gibbsEnergy, "constant", gibbsConstant);
  set(gibbsEnergy, "linear", gibbsSlope);
  return {
    heatCapacity: finished(heatCapacity),
    enthalpy: finished(enthalpy),
    entropy: finished(entropy),
    gibbsEnergy: finished(gibbsEnergy),
  };
}

interface ColumnDraft {
  readonly coefficients: Record<BasisName, number>;
  readonly extras: ExtraPower[];
}

function draft(): ColumnDraft {
  return { coefficients: emptyColumns(), extras: [] };
}

function finished({ coefficients, extras }: ColumnDraft): Columns {
  return columns(
    coefficients,
    extras.sort((a, b) => a.exponent - b.exponent),
  );
}

function leastCommonMultiple(a: bigint, b: bigint): bigint {
  let [x, y] = [a, b];
  while (y !== 0n) [x, y] = [y, x % y];
  return (a / x) * b;
}
