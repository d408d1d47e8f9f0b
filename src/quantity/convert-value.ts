import { decimalOf, roundRatio } from "../numeric/exact-decimal.js";
import { divideRationals, type Rational, rationalOfDecimal } from "../numeric/rational.js";
import { type UnitCode, unitEntry } from "./units.js";

/** How a value in one unit becomes a value in another: value * ratio + shift, as exact fractions and as doubles. */
interface Conversion {
  readonly ratioNumerator: bigint;
  readonly ratioDenominator: bigint;
  readonly shiftNumerator: bigint;
  readonly shiftDenominator: bigint;
  /** The ratio as a sum of two doubles, within 2^-106 of itself. */
  readonly ratioHigh: number;
  readonly ratioLow: number;
  /** One over the ratio, where that is exactly a double and the ratio is not; else 0. */
  readonly divisor: number;
  readonly shiftHigh: number;
  readonly shiftLow: number;
  /** Absolute zero on both scales, each as its nearest double; used where there is a shift, so for temperatures. */
  readonly lowest: number;
  readonly lowestThere: number;
}

const conversions = new Map<UnitCode, Map<UnitCode, Conversion>>();

/** 2^27 + 1: splits a double into two halves of 26 bits whose products are exact (Dekker). */
const splitter = 134217729;
/** The fast route is used between these magnitudes, where no intermediate product over- or underflows. */
const smallest = 1e-270;
const largest = 1e270;
/** Bound of the fast route's error relative to its terms: eight rounding errors of second order, 2^-106 each: 2^-100. */
const uncertain = 7.888609052210118e-31;

/**
 * A value in another unit of the same dimension: the double nearest to the exact result, halves to even.
 *
 * @param value - finite
 * @param from - unit of the value
 * @param to - unit of the result, of the same dimension
 * @returns the nearest double, never -0; Infinity or -Infinity where no double holds the result
 * @remarks The product and the sum are formed with their rounding errors (two-product, two-sum). Where the error
 * bound leaves the rounding open, the result comes from exact integers. The double nearest to absolute zero on one
 * scale (-273.15 Cel, -459.67 [degF]) stands for absolute zero and becomes it on another.
 */
export function convertValue(value: number, from: UnitCode, to: UnitCode): number {
  if (from === to) return value + 0;
  const conversion = conversionOf(from, to);
  return conversion.shiftHigh === 0 ? scale(value, conversion) : scaleAndShift(value, conversion);
}

/**
 * A difference of two values, or a standard uncertainty, in another unit: the factor is applied, the offset is not.
 *
 * @returns the nearest double, never -0; Infinity or -Infinity where no double holds the result
 */
export function convertDifference(difference: number, from: UnitCode, to: UnitCode): number {
  return from === to ? difference + 0 : scale(difference, conversionOf(from, to));
}

function scale(value: number, conversion: Conversion): number {
  const { ratioHigh, ratioLow, divisor } = conversion;
  if (ratioLow === 0) return value * ratioHigh + 0;
  if (divisor !== 0) return value / divisor + 0;
  const size = value < 0 ? -value : value;
  if (!(size > smallest && size < largest)) return exactResult(value, conversion, 0n, 1n);
  const high = value * ratioHigh;
  const low = productError(value, ratioHigh, high) + value * ratioLow;
  const bound = uncertain * (high < 0 ? -high : high);
  const result = high + (low - bound);
  return result === high + (low + bound) ? result : exactResult(value, conversion, 0n, 1n);
}

function scaleAndShift(value: number, conversion: Conversion): number {
  const { ratioHigh, ratioLow, shiftHigh, shiftLow } = conversion;
  if (value === conversion.lowest) return conversion.lowestThere;
  const size = value < 0 ? -value : value;
  if (size > smallest && size < largest) {
    const high = value * ratioHigh;
    const low = productError(value, ratioHigh, high) + value * ratioLow;
    const sum = high + shiftHigh;
    const back = sum - high;
    const rest = high - (sum - back) + (shiftHigh - back) + (low + shiftLow);
    const bound = uncertain * (Math.abs(high) + Math.abs(shiftHigh));
    const result = sum + (rest - bound);
    if (result === sum + (rest + bound)) return result + 0;
  }
  return exactResult(value, conversion, conversion.shiftNumerator, conversion.shiftDenominator);
}

/** The rounding error of product = a * b, exactly. */
function productError(a: number, b: number, product: number): number {
  const aScaled = a * splitter;
  const aHigh = aScaled - (aScaled - a);
  const aLow = a - aHigh;
  const bScaled = b * splitter;
  const bHigh = bScaled - (bScaled - b);
  const bLow = b - bHigh;
  return aLow * bLow - (product - aHigh * bHigh - aLow * bHigh - aHigh * bLow);
}

function exactResult(value: number, conversion: Conversion, shiftNumerator: bigint, shiftDenominator: bigint): number {
  const { numerator, denominator } = fractionOfDouble(value);
  const scaledNumerator = numerator * conversion.ratioNumerator;
  const scaledDenominator = denominator * conversion.ratioDenominator;
  return roundRatio(
    scaledNumerator * shiftDenominator + shiftNumerator * scaledDenominator,
    scaledDenominator * shiftDenominator,
  );
}

function conversionOf(from: UnitCode, to: UnitCode): Conversion {
  let fromThere = conversions.get(from);
  if (fromThere === undefined) {
    fromThere = new Map();
    conversions.set(from, fromThere);
  }
  let conversion = fromThere.get(to);
  if (conversion === undefined) {
    conversion = prepare(from, to);
    fromThere.set(to, conversion);
  }
  return conversion;
}

/** From SI = (value + offset) * factor on both sides: ratio = factor / factor', shift = offset * ratio - offset'. */
function prepare(from: UnitCode, to: UnitCode): Conversion {
  const source = unitEntry(from);
  const target = unitEntry(to);
  const sourceFactor = fractionOf(source.factor);
  const targetFactor = fractionOf(target.factor);
  const sourceOffset = fractionOf(source.offset ?? "0");
  const targetOffset = fractionOf(target.offset ?? "0");
  const ratioNumerator = sourceFactor.numerator * targetFactor.denominator;
  const ratioDenominator = sourceFactor.denominator * targetFactor.numerator;
  const movedDenominator = sourceOffset.denominator * ratioDenominator;
  const shiftNumerator =
    sourceOffset.numerator * ratioNumerator * targetOffset.denominator - targetOffset.numerator * movedDenominator;
  const shiftDenominator = movedDenominator * targetOffset.denominator;
  const [ratioHigh, ratioLow] = twoDoubles(ratioNumerator, ratioDenominator);
  const [shiftHigh, shiftLow] = twoDoubles(shiftNumerator, shiftDenominator);
  const [inverseHigh, inverseLow] = twoDoubles(ratioDenominator, ratioNumerator);
  return {
    ratioNumerator,
    ratioDenominator,
    shiftNumerator,
    shiftDenominator,
    ratioHigh,
    ratioLow,
    divisor: inverseLow === 0 ? inverseHigh : 0,
    shiftHigh,
    shiftLow,
    lowest: 0 - Number(source.offset ?? 0),
    lowestThere: 0 - Number(target.offset ?? 0),
  };
}

/** A fraction as its nearest double and the double nearest to what is left. */
function twoDoubles(numerator: bigint, denominator: bigint): [high: number, low: number] {
  const high = roundRatio(numerator, denominator);
  const rounded = fractionOfDouble(high);
  const left = numerator * rounded.denominator - rounded.numerator * denominator;
  return [high, roundRatio(left, denominator * rounded.denominator)];
}

/** A finite double as an exact fraction whose denominator is a power of two. */
function fractionOfDouble(value: number): Rational {
  const bits = new DataView(new ArrayBuffer(8));
  bits.setFloat64(0, value);
  const word = bits.getBigUint64(0);
  const field = Number((word >> 52n) & 0x7ffn);
  const fraction = word & 0xfffffffffffffn;
  const size = field === 0 ? fraction : fraction | 0x10000000000000n;
  const exponent = (field === 0 ? 1 : field) - 1075;
  const signed = word >> 63n === 1n ? -size : size;
  return exponent >= 0
    ? { numerator: signed << BigInt(exponent), denominator: 1n }
    : { numerator: signed, denominator: 1n << BigInt(-exponent) };
}

/** Reads "101325", "0.001" or "5/9" exactly; both sides of the stroke may be decimals. */
function fractionOf(text: string): Rational {
  const [above, below] = text.split("/") as [string, string?];
  const top = rationalOfDecimal(decimalOf(above));
  return below === undefined ? top : divideRationals(top, rationalOfDecimal(decimalOf(below)));
}
