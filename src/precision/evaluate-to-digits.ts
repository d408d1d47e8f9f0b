import { Decimal } from "decimal.js";
import { describeReceived, type Fault } from "../errors/fault.js";
import { fail, failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkObject } from "../errors/input.js";
import {
  type ExactSeries,
  intervalAt,
  lowerEndK,
  type PiecewiseSeries,
  upperEndK,
} from "../heat-capacity/exact-series.js";
import { type ExactDecimal, exactDecimalOfDouble } from "../numeric/exact-decimal.js";
import { parseRational, type Rational } from "../numeric/rational.js";
import { temperatureInKelvin } from "../quantity/guards.js";
import type { Temperature } from "../quantity/quantity.js";
import { houseReaction, type Reaction } from "../reaction/reaction.js";
import { failReactionRange } from "../reaction/reaction-plan.js";
import { standardReactionProperties } from "../reaction/standard-reaction.js";
import { exactSubstanceSeries } from "../species/substance-function.js";

/** At what temperature, and to how many significant digits. */
export interface DigitsConditions {
  /** Above 0 K and within the range of every species; the kelvin value is taken as the shortest decimal of its double. */
  readonly temperature: Temperature;
  /** Significant digits of each result, 1 to 200. */
  readonly digits: number;
}

/** One result to many digits, beside what the arithmetic of doubles gives. */
export interface PreciseValue {
  /** All digits asked for, as text. */
  readonly digits: string;
  /** Coherent SI unit. */
  readonly unit: "J/mol" | "J/mol/K" | "1";
  /** The double that standardReactionProperties returns. */
  readonly double: number;
  /** The double minus the precise value. */
  readonly errorOfDouble: number;
}

/** Standard reaction properties to many digits, per mole of reaction as written. */
export interface PreciseReactionProperties {
  /** Absent where a species publishes H and S at 298.15 K only. */
  readonly heatCapacity?: PreciseValue;
  readonly enthalpy: PreciseValue;
  readonly entropy: PreciseValue;
  readonly gibbsEnergy: PreciseValue;
  readonly lnK: PreciseValue;
  readonly log10K: PreciseValue;
}

/** Molar gas constant of the SI, exact. */
const gasConstant = "8.31446261815324";

/** Digits carried beyond those asked for; the terms of a series seldom cancel more than a dozen. */
const guardDigits = 30;

/** Where they do: a sum that cancels more than this is zero, as of coefficients printed with a score of digits. */
const wideGuardDigits = 120;

/** The most digits that are given. */
const mostDigits = 200;

/**
 * Standard properties of a reaction, re-evaluated from the published coefficients as printed to a requested number of
 * digits, each with the error of the double that {@link standardReactionProperties} returns.
 *
 * A route of its own: species after species, term after term in decimal arithmetic, without the merged series.
 *
 * @param reaction - what `reaction` returned
 * @param conditions - temperature and number of digits
 * @throws GibbsLedgerError "precision/digits", "species/outside-range"
 * @example
 * import { referenceData } from "gibbs-ledger/data";
 * const synthesis = reaction("N2 + 3 H2 = 2 NH3", referenceData);
 * const precise = evaluateToDigits(synthesis, { temperature: quantity(700, "K"), digits: 30 });
 * precise.gibbsEnergy.digits.length > 30; // => true
 * Math.abs(precise.gibbsEnergy.errorOfDouble) < 1e-9; // => true
 */
export function evaluateToDigits(reaction: Reaction, conditions: DigitsConditions): PreciseReactionProperties {
  const house = houseReaction(reaction);
  const digits = checkDigits(conditions);
  const temperatureK = temperatureInKelvin(conditions.temperature);
  const doubles = standardReactionProperties(house, { temperature: { value: temperatureK, unit: "K" } });
  // Where the terms cancel further, the digits are not enough, and what more of them cancel too is zero.
  const first = sumToDigits(house, temperatureK, digits + guardDigits);
  const sums = lostDigits(first) < guardDigits - 5 ? first : sumToDigits(house, temperatureK, digits + wideGuardDigits);
  const { Wide, temperature } = sums;
  const known = (value: WideDecimal, scale: WideDecimal): WideDecimal =>
    digitsBetween(value, scale) > wideGuardDigits - 5 ? new Wide(0) : value;
  const heatCapacityValue = known(sums.heatCapacity, sums.scale.heatCapacity);
  const enthalpy = known(sums.enthalpy, sums.scale.enthalpy);
  const entropy = known(sums.entropy, sums.scale.entropy);
  const gibbsEnergy = known(enthalpy.minus(temperature.times(entropy)), gibbsScale(sums));
  const lnK = gibbsEnergy.div(temperature.times(gasConstant)).negated();
  const log10K = lnK.div(Wide.ln(10));
  const precise = preciseValue(digits, Wide);
  const { heatCapacity } = doubles;
  return {
    ...(heatCapacity === undefined ? {} : { heatCapacity: precise(heatCapacityValue, heatCapacity) }),
    enthalpy: precise(enthalpy, doubles.enthalpy),
    entropy: precise(entropy, doubles.entropy),
    gibbsEnergy: precise(gibbsEnergy, doubles.gibbsEnergy),
    lnK: precise(lnK, { value: doubles.lnK, unit: "1" }),
    log10K: precise(log10K, { value: doubles.log10K, unit: "1" }),
  };
}

interface Three {
  readonly heatCapacity: WideDecimal;
  readonly enthalpy: WideDecimal;
  readonly entropy: WideDecimal;
}

/** Cp, H and S of the reaction, and of each the sum of its absolute terms. */
interface Sums extends Three {
  readonly scale: Three;
  readonly temperature: WideDecimal;
  readonly Wide: typeof Decimal;
}

function sumToDigits(house: Reaction, temperatureK: number, working: number): Sums {
  // A clone of its own, with nothing inherited: the settings of the shared constructor belong to the user.
  const Wide = Decimal.clone({ defaults: true, precision: working, rounding: Decimal.ROUND_HALF_EVEN });
  const temperature = new Wide(temperatureK);
  const sum = { heatCapacity: new Wide(0), enthalpy: new Wide(0), entropy: new Wide(0) };
  const scale = { ...sum };
  for (const { exactCoefficient, species } of house.terms) {
    const series = exactSubstanceSeries(species, working);
    if (temperatureK < lowerEndK(series) || temperatureK > upperEndK(series)) failReactionRange(house, temperatureK);
    const { numerator, denominator } = parseRational(exactCoefficient) as Rational;
    const coefficient = new Wide(numerator.toString()).div(denominator.toString());
    const terms = termsOf(series, temperature, temperatureK, Wide);
    for (const key of ["heatCapacity", "enthalpy", "entropy"] as const) {
      for (const term of terms[key]) {
        const part = coefficient.times(term);
        sum[key] = sum[key].plus(part);
        scale[key] = scale[key].plus(part.abs());
      }
    }
  }
  return { ...sum, scale, temperature, Wide };
}

/** The most digits that cancel in any of the sums. */
function lostDigits(sums: Sums): number {
  const { heatCapacity, enthalpy, entropy, scale, temperature } = sums;
  return Math.max(
    digitsBetween(heatCapacity, scale.heatCapacity),
    digitsBetween(enthalpy, scale.enthalpy),
    digitsBetween(entropy, scale.entropy),
    digitsBetween(enthalpy.minus(temperature.times(entropy)), gibbsScale(sums)),
  );
}

function gibbsScale({ scale, temperature }: Sums): WideDecimal {
  return scale.enthalpy.plus(temperature.times(scale.entropy));
}

/** How many places a value lies below its scale. */
function digitsBetween(value: WideDecimal, scale: WideDecimal): number {
  if (scale.isZero()) return 0;
  return value.isZero() ? Number.POSITIVE_INFINITY : scale.e - value.e;
}

function checkDigits(conditions: DigitsConditions): number {
  const faults: Fault[] = [];
  const members = checkObject(conditions, [], faults, {
    required: ["temperature", "digits"],
    optional: [],
  });
  failIfAny(faults);
  const digits = members?.digits;
  if (typeof digits === "number" && Number.isInteger(digits) && digits >= 1 && digits <= mostDigits) return digits;
  return fail({
    code: "precision/digits",
    path: ["digits"],
    message: `expected a whole number of digits from 1 to ${mostDigits}, got ${describeReceived(digits)}`,
    received: describeReceived(digits),
    expected: `1 to ${mostDigits}`,
  });
}

type WideDecimal = InstanceType<typeof Decimal>;

/** The terms of Cp, H and S of one species, the constants of H and S included. */
function termsOf(
  series: PiecewiseSeries,
  temperature: WideDecimal,
  temperatureK: number,
  Wide: typeof Decimal,
): Readonly<Record<keyof Three, readonly WideDecimal[]>> {
  const interval: ExactSeries = intervalAt(series, temperatureK);
  const heatCapacity: WideDecimal[] = [];
  const enthalpy = [wide(interval.enthalpyConstant, Wide)];
  const entropy = [wide(interval.entropyConstant, Wide)];
  for (const { exponent, coefficient } of interval.terms) {
    const term = wide(coefficient, Wide).times(temperature.pow(exponent));
    heatCapacity.push(term);
    enthalpy.push(
      exponent === -1
        ? wide(coefficient, Wide).times(temperature.ln())
        : term.times(temperature).div(new Wide(exponent).plus(1)),
    );
    entropy.push(exponent === 0 ? wide(coefficient, Wide).times(temperature.ln()) : term.div(exponent));
  }
  return { heatCapacity, enthalpy, entropy };
}

function preciseValue(digits: number, Wide: typeof Decimal) {
  return <U extends PreciseValue["unit"]>(
    value: WideDecimal,
    double: { readonly value: number; readonly unit: U },
  ): PreciseValue => ({
    digits: value.toPrecision(digits),
    unit: double.unit,
    double: double.value,
    // Binary-exact: the shortest decimal of the double would fake an error of its own.
    errorOfDouble: wide(exactDecimalOfDouble(double.value), Wide).minus(value).toNumber() + 0,
  });
}

/** A decimal in full: the constructor rounds nothing. */
function wide({ mantissa, exponent }: ExactDecimal, Wide: typeof Decimal): WideDecimal {
  return new Wide(`${mantissa}e${exponent}`);
}
