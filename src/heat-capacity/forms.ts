import { decimalOf, type ExactDecimal } from "../numeric/exact-decimal.js";
import {
  type IntervalTerms,
  readDimensionless,
  readGibbsEnergy,
  readHaasFisher,
  readPowers,
  readShomate,
  timesTenTo,
} from "./form-readers.js";
import type { HeatCapacityForm, PublishedInterval, PublishedSeries } from "./published-series.js";

/** What a form asks of a record, and how it is read. */
export interface FormAdapter {
  /** Numbers of coefficients that an interval may have; empty where the powers say it. */
  readonly counts: readonly number[];
  /** Whether the coefficients are multiples of the gas constant. */
  readonly needsGasConstant: boolean;
  /** Whether the form carries the constants of H and S. */
  readonly carriesConstants: boolean;
  /** Where the record names the exponents of T. */
  readonly powers?: PowersRule;
  read(coefficients: readonly ExactDecimal[], published: PublishedSeries, digits: number): IntervalTerms;
}

/** What the exponents that a record names may be. */
export interface PowersRule {
  /** Coefficients that stand before those of the powers. */
  readonly coefficientsBefore: number;
  /** Exponents that the form has a place for already. */
  readonly excluded: readonly number[];
  /** The fewest exponents that make a fit. */
  readonly fewest: number;
  readonly message: string;
  readonly expected: string;
}

const adapters: Readonly<Record<HeatCapacityForm, FormAdapter>> = {
  shomate: {
    counts: [7, 8],
    needsGasConstant: false,
    carriesConstants: true,
    read: readShomate,
  },
  "seven-coefficient": {
    counts: [7],
    needsGasConstant: true,
    carriesConstants: true,
    read: (coefficients, published) => readDimensionless(coefficients, [0, 1, 2, 3, 4], published),
  },
  "nine-coefficient": {
    counts: [9],
    needsGasConstant: true,
    carriesConstants: true,
    read: (coefficients, published) => readDimensionless(coefficients, [-2, -1, 0, 1, 2, 3, 4], published),
  },
  "maier-kelley": {
    counts: [3],
    needsGasConstant: false,
    carriesConstants: false,
    read: (coefficients, published) => readPowers(coefficients, [0, 1, -2], published),
  },
  "berman-brown": {
    counts: [4],
    needsGasConstant: false,
    carriesConstants: false,
    read: (coefficients, published) => readPowers(coefficients, [0, -0.5, -2, -3], published),
  },
  "five-term": {
    counts: [5],
    needsGasConstant: false,
    carriesConstants: false,
    read: (coefficients, published) => readPowers(coefficients, [0, 1, -2, -0.5, 2], published),
  },
  "haas-fisher": {
    counts: [5],
    needsGasConstant: false,
    carriesConstants: false,
    read: readHaasFisher,
  },
  "gibbs-energy": {
    counts: [],
    needsGasConstant: false,
    carriesConstants: true,
    powers: {
      coefficientsBefore: 3,
      excluded: [0, 1],
      fewest: 0,
      message: "a Gibbs energy needs the exponents of T after a + b T + c T ln T, each once, without 0 and 1",
      expected: "multiples of 1/2 from -20 to 20 but 0 and 1, such as [2, 3, -1]",
    },
    read: (coefficients, published) => readGibbsEnergy(coefficients, published.powers ?? []),
  },
  polynomial: {
    counts: [],
    needsGasConstant: false,
    carriesConstants: false,
    powers: {
      coefficientsBefore: 0,
      excluded: [],
      fewest: 1,
      message: "a polynomial needs the exponents of T, one a coefficient, each once",
      expected: "multiples of 1/2 from -20 to 20, such as [0, 1, -2, -0.5]",
    },
    read: (coefficients, published) => readPowers(coefficients, published.powers ?? [], published),
  },
};

/** The forms that are read, in alphabetical order. */
export const heatCapacityForms: readonly HeatCapacityForm[] = (Object.keys(adapters) as HeatCapacityForm[]).sort();

/** The adapter of a form; undefined for a name that is none. */
export function adapterOf(form: string): FormAdapter | undefined {
  return Object.hasOwn(adapters, form) ? adapters[form as HeatCapacityForm] : undefined;
}

/** Whether the form carries the constants of H and S, or needs an anchor. */
export function carriesConstants(form: HeatCapacityForm): boolean {
  return adapters[form].carriesConstants;
}

/** Reads the coefficients of one interval exactly, in J/mol and J/mol/K. */
export function readInterval(published: PublishedSeries, interval: PublishedInterval, digits: number): IntervalTerms {
  const decimals = interval.coefficients.map((value, index) => unshifted(decimalOf(value), published, index));
  return adapters[published.form].read(decimals, published, digits);
}

function unshifted(value: ExactDecimal, published: PublishedSeries, index: number): ExactDecimal {
  const shift = published.decimalShifts?.[index] ?? 0;
  return shift === 0 ? value : timesTenTo(value, -shift);
}
