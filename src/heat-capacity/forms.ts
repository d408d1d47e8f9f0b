import { cut, type Fault, type FaultPath } from "../errors/fault.js";
import { lnDecimal } from "../numeric/decimal-functions.js";
import {
  addDecimals,
  decimalOf,
  type ExactDecimal,
  multiplyDecimals,
  negateDecimal,
} from "../numeric/exact-decimal.js";
import type { HeatCapacityTerm } from "./exact-series.js";
import type { HeatCapacityForm, PublishedInterval, PublishedSeries } from "./published-series.js";

/** Terms of one interval as published, and the constants where the form carries its own. */
export interface IntervalTerms {
  readonly terms: readonly HeatCapacityTerm[];
  readonly constants?: { readonly enthalpy: ExactDecimal; readonly entropy: ExactDecimal };
}

/** What a form asks of a record, and how it is read. */
interface FormAdapter {
  /** Numbers of coefficients that an interval may have. */
  readonly counts: readonly number[];
  /** Whether the coefficients are multiples of the gas constant. */
  readonly needsGasConstant: boolean;
  /** Whether the form carries the constants of H and S. */
  readonly carriesConstants: boolean;
  read(coefficients: readonly ExactDecimal[], published: PublishedSeries, digits: number): IntervalTerms;
}

const thermochemicalCalorie = decimalOf("4.184");
const kilo = decimalOf("1000");

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
  polynomial: {
    counts: [],
    needsGasConstant: false,
    carriesConstants: false,
    read: (coefficients, published) => readPowers(coefficients, published.powers ?? [], published),
  },
};

/** The forms that are read, in alphabetical order. */
export const heatCapacityForms: readonly HeatCapacityForm[] = (Object.keys(adapters) as HeatCapacityForm[]).sort();

/** Whether the form carries the constants of H and S, or needs an anchor. */
export function carriesConstants(form: HeatCapacityForm): boolean {
  return adapters[form].carriesConstants;
}

/** Reads the coefficients of one interval exactly, in J/mol and J/mol/K. */
export function readInterval(published: PublishedSeries, interval: PublishedInterval, digits: number): IntervalTerms {
  const decimals = interval.coefficients.map((value, index) => unshifted(decimalOf(value), published, index));
  return adapters[published.form].read(decimals, published, digits);
}

/** Collects what is wrong with the parts of a series that depend on its form. */
export function checkForm(published: PublishedSeries, path: FaultPath, faults: Fault[]): void {
  const adapter = Object.hasOwn(adapters, published.form) ? adapters[published.form] : undefined;
  if (adapter === undefined) {
    faults.push({
      code: "heat-capacity/unknown-form",
      path: [...path, "form"],
      message: `${cut(String(published.form))} is not a form of heat capacity that is read`,
      expected: heatCapacityForms.join(", "),
    });
    return;
  }
  if (adapter.needsGasConstant && published.gasConstant === undefined) {
    faults.push({
      code: "input/missing",
      path: [...path, "gasConstant"],
      message: `the ${published.form} form needs the gas constant it was printed with`,
      expected: "a number in J/mol/K",
      hint: "8.31451 for coefficients printed between 1986 and 2002",
    });
  }
  const powers = published.powers;
  if (published.form === "polynomial") checkPowers(powers, path, faults);
  else if (powers !== undefined) refuseKey("powers", published.form, path, faults);
  if (adapter.carriesConstants) {
    if (published.unit !== undefined) refuseKey("unit", published.form, path, faults);
    if (published.anchor !== undefined) refuseKey("anchor", published.form, path, faults);
  }
  if (!adapter.needsGasConstant && published.gasConstant !== undefined) {
    refuseKey("gasConstant", published.form, path, faults);
  }
  const shifts = published.decimalShifts;
  const counts = published.form === "polynomial" ? [powers?.length ?? 0] : adapter.counts;
  published.intervals.forEach((interval, index) => {
    const count = interval.coefficients.length;
    if (shifts !== undefined && shifts.length !== count) {
      faults.push({
        code: "heat-capacity/coefficient-count",
        path: [...path, "decimalShifts"],
        message: `interval ${index} has ${count} coefficients, decimalShifts has ${shifts.length} entries`,
        received: String(shifts.length),
        expected: String(count),
      });
    }
    if (counts.includes(count)) return;
    faults.push({
      code: "heat-capacity/coefficient-count",
      path: [...path, "intervals", index, "coefficients"],
      message: `the ${published.form} form has ${counts.join(" or ")} coefficients an interval`,
      received: String(count),
      expected: counts.join(" or "),
    });
  });
}

function checkPowers(powers: readonly number[] | undefined, path: FaultPath, faults: Fault[]): void {
  const good =
    powers !== undefined &&
    powers.length > 0 &&
    powers.every((value) => Number.isInteger(2 * value) && Math.abs(value) <= 20) &&
    new Set(powers).size === powers.length;
  if (good) return;
  faults.push({
    code: powers === undefined ? "input/missing" : "heat-capacity/unknown-form",
    path: [...path, "powers"],
    message: "a polynomial needs the exponents of T, one a coefficient, each once",
    expected: "multiples of 1/2 from -20 to 20, such as [0, 1, -2, -0.5]",
  });
}

function refuseKey(key: string, form: HeatCapacityForm, path: FaultPath, faults: Fault[]): void {
  faults.push({
    code: "input/unknown-key",
    path: [...path, key],
    message: `the ${form} form takes no ${key}`,
  });
}

function readDimensionless(
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
function readShomate(
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

function readPowers(
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

function unshifted(value: ExactDecimal, published: PublishedSeries, index: number): ExactDecimal {
  const shift = published.decimalShifts?.[index] ?? 0;
  return shift === 0 ? value : timesTenTo(value, -shift);
}

function timesTenTo(value: ExactDecimal, power: number): ExactDecimal {
  return { mantissa: value.mantissa, exponent: value.exponent + power };
}
