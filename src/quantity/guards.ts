import { describeReceived, type Fault, type FaultPath } from "../errors/fault.js";
import { fail, failIfAny } from "../errors/gibbs-ledger-error.js";
import { forbiddenKeys } from "../errors/input.js";
import { belowAbsoluteZero, checkParts, lowestValue, overflow } from "./check-parts.js";
import { convertValue } from "./convert-value.js";
import { type Dimension, isUnitCode, siUnits, type UnitCode } from "./units.js";

interface Reading {
  readonly value?: unknown;
  readonly unit?: unknown;
  readonly standardUncertainty?: unknown;
}

/** What null and undefined have for parts. */
const nothing: Reading = {};

const quantityKeys: readonly string[] = ["value", "unit", "standardUncertainty"];

/**
 * The thermodynamic temperature in kelvin of anything that may be a temperature. Costs a few nanoseconds where it is
 * one; reads `value` and `unit` once each and nothing else.
 *
 * @param value - a temperature above absolute zero
 * @param path - where the value lies in the caller's input; absent: at `temperature`
 * @returns kelvin, above 0 and finite, the double nearest to the exact conversion
 * @throws GibbsLedgerError "quantity/not-a-quantity", "quantity/not-finite", "quantity/unknown-unit",
 * "quantity/wrong-dimension", "quantity/below-absolute-zero", "quantity/not-positive", "quantity/overflow"
 * @example
 * temperatureInKelvin({ value: 25, unit: "Cel" }); // => 298.15
 */
export function temperatureInKelvin(value: unknown, path?: FaultPath): number {
  const parts: Reading = value ?? nothing;
  const number = parts.value;
  const unit = parts.unit;
  // The limits of the short ways are explained below. All else, faults included, goes the slow way.
  if (typeof number === "number" && number < 1e15) {
    if (unit === "K" && number > 0) return number;
    if (number * number > 1e-12 && number > -273) {
      if (unit === "Cel") return kelvinOfCelsius(number);
      const zero = unit === "[degF]" ? 459.67 : 0;
      if (zero !== 0 || (unit === "[degR]" && number > 0)) return kelvinOfNinths(number, zero);
    }
  }
  return positive(value, number, unit, "temperature", path);
}

/**
 * The pressure in pascal of anything that may be a pressure. Costs a few nanoseconds where it is one; reads `value`
 * and `unit` once each and nothing else.
 *
 * @param value - an absolute pressure above 0
 * @param path - where the value lies in the caller's input; absent: at `pressure`
 * @returns pascal, above 0 and finite, the double nearest to the exact conversion
 * @throws GibbsLedgerError "quantity/not-a-quantity", "quantity/not-finite", "quantity/unknown-unit",
 * "quantity/wrong-dimension", "quantity/not-positive", "quantity/overflow"
 * @example
 * pressureInPascal({ value: 1, unit: "atm" }); // => 101325
 */
export function pressureInPascal(value: unknown, path?: FaultPath): number {
  const parts: Reading = value ?? nothing;
  const number = parts.value;
  const unit = parts.unit;
  if (typeof number === "number" && number > 0 && number < 1e290) {
    // These factors are whole numbers, so one product is already the nearest double.
    switch (unit) {
      case "Pa":
        return number;
      case "bar":
        return number * 100000;
      case "kPa":
        return number * 1000;
      case "MPa":
        return number * 1000000;
      case "atm":
        return number * 101325;
      default:
    }
  }
  return positive(value, number, unit, "pressure", path);
}

/**
 * The value in the coherent SI unit of anything that may be a quantity of a dimension, of any sign.
 *
 * @param value - a quantity of the dimension; its value and unit are read and checked
 * @param dimension - the dimension that the unit must have
 * @param path - where the value lies in the caller's input
 * @returns the double nearest to the exact conversion
 * @throws GibbsLedgerError "quantity/not-a-quantity", "quantity/not-finite", "quantity/unknown-unit",
 * "quantity/wrong-dimension", "quantity/below-absolute-zero", "quantity/overflow"
 * @example
 * siValue({ value: -32.9, unit: "kJ/mol" }, "molarEnergy"); // => -32900
 */
export function siValue(value: unknown, dimension: Dimension, path: FaultPath = []): number {
  if (typeof value !== "object" || value === null) return fail(notAQuantity(value, dimension, path));
  const { value: number, unit } = value as Reading;
  return siOfParts(number, unit, dimension, path);
}

/**
 * Checks in full that something is a quantity of a dimension, and collects what is wrong instead of throwing: as
 * `siValue`, and no key beside value, unit and standardUncertainty. The schemas give the same verdict.
 *
 * @param value - anything
 * @param dimension - the dimension that the unit must have
 * @param path - where the value lies in the caller's input
 * @param faults - receives what is wrong
 * @returns the value in the coherent SI unit; undefined after a fault
 */
export function checkQuantity(
  value: unknown,
  dimension: Dimension,
  path: FaultPath,
  faults: Fault[],
): number | undefined {
  if (typeof value !== "object" || value === null || Array.isArray(value)) {
    faults.push(notAQuantity(value, dimension, path));
    return undefined;
  }
  const before = faults.length;
  checkKeys(value, path, faults);
  const { value: number, unit, standardUncertainty } = value as Reading;
  if (!checkParts(number, unit, standardUncertainty, dimension, path, faults)) return undefined;
  const si = convertValue(number as number, unit as UnitCode, siUnits[dimension]);
  if (si - si !== 0) faults.push(overflow(number as number, unit as UnitCode, siUnits[dimension], [...path, "value"]));
  return faults.length === before ? si : undefined;
}

/**
 * As `checkQuantity`, and the value in the coherent SI unit is above 0: for temperatures and pressures of conditions.
 *
 * @param value - anything
 * @param dimension - the dimension that the unit must have
 * @param path - where the value lies in the caller's input
 * @param faults - receives what is wrong
 * @returns the value in the coherent SI unit; undefined after a fault
 */
export function checkPositiveQuantity(
  value: unknown,
  dimension: Dimension,
  path: FaultPath,
  faults: Fault[],
): number | undefined {
  const si = checkQuantity(value, dimension, path, faults);
  if (si === undefined || si > 0) return si;
  faults.push(notPositive(si, dimension, path));
  return undefined;
}

/** The fault of something that is no quantity at all. */
export function notAQuantity(value: unknown, dimension: Dimension | undefined, path: FaultPath): Fault {
  const unit = dimension === undefined ? "K" : siUnits[dimension];
  const kind = dimension === undefined ? "a quantity" : `a quantity of ${dimension}`;
  const received = describeReceived(value);
  return {
    code: "quantity/not-a-quantity",
    path,
    message: `expected ${kind}, received ${received}`,
    received,
    expected: `${kind}, such as { value: 1, unit: "${unit}" }`,
    ...(typeof value === "number" && { hint: `a bare number has no unit: use quantity(${received}, "${unit}")` }),
    ...(typeof value === "string" && { hint: "parseQuantity(text) reads a text" }),
  };
}

/*
 * The short ways to kelvin round right for 1e-6 < |value| < 1e15 and value > -273. Their errors of second order, some
 * 2^-100 of the value, are smaller than the distance of the exact result from the nearest midpoint between two
 * doubles: that is a multiple of the last place of the value divided by 180, and not zero, for 273.15 and 459.67 are no
 * binary fractions, and five ninths of a double are never a midpoint. The small numbers are what 273.15 has beyond
 * its nearest double, and what 459.67 has as a part of it.
 */

/** value + 273.15, from the sum and its rounding error. */
function kelvinOfCelsius(value: number): number {
  const sum = value + 273.15;
  const back = sum - value;
  return sum + (value - (sum - back) + (273.15 - back) + 2.2737367544323207e-14);
}

/**
 * (value + zero) 5/9 with zero 459.67 or none: the sum, its rounding error, the nearest double to sum 5/9, and the
 * exact remainder 5 sum - 9 quotient.
 */
function kelvinOfNinths(value: number, zero: number): number {
  const sum = value + zero;
  const back = sum - value;
  const rest = value - (sum - back) + (zero - back) + zero * -3.4625181719551513e-17;
  const quotient = sum * (5 / 9);
  return quotient + (4 * sum - 8 * quotient + (sum - quotient) + 5 * rest) * (1 / 9);
}

/** The slow way through a positive quantity whose parts were read: rarer units, and every fault. */
function positive(
  whole: unknown,
  value: unknown,
  unit: unknown,
  dimension: Dimension,
  path: FaultPath = [dimension],
): number {
  if (typeof whole !== "object" || whole === null) return fail(notAQuantity(whole, dimension, path));
  const si = siOfParts(value, unit, dimension, path);
  return si > 0 ? si : fail(notPositive(si, dimension, path));
}

function siOfParts(value: unknown, unit: unknown, dimension: Dimension, path: FaultPath): number {
  if (typeof value === "number" && value - value === 0 && isUnitCode(unit, dimension) && value >= lowestValue(unit)) {
    const si = convertValue(value, unit, siUnits[dimension]);
    return si - si === 0 ? si : fail(overflow(value, unit, siUnits[dimension], [...path, "value"]));
  }
  const faults: Fault[] = [];
  checkParts(value, unit, undefined, dimension, path, faults);
  failIfAny(faults);
  return fail(belowAbsoluteZero(value as number, unit as UnitCode, path));
}

function notPositive(si: number, dimension: Dimension, path: FaultPath): Fault {
  return {
    code: "quantity/not-positive",
    path: [...path, "value"],
    message: `the ${dimension} is ${si} ${siUnits[dimension]}, expected a value above 0`,
    received: `${si} ${siUnits[dimension]}`,
    expected: `above 0 ${siUnits[dimension]}`,
  };
}

function checkKeys(value: object, path: FaultPath, faults: Fault[]): void {
  // Inherited enumerable keys count, as they do for the schemas.
  for (const key in value) {
    if (quantityKeys.includes(key)) continue;
    const forbidden = forbiddenKeys.includes(key);
    faults.push({
      code: forbidden ? "input/forbidden-key" : "input/unknown-key",
      path: [...path, key],
      message: `the key ${describeReceived(key)} is ${forbidden ? "forbidden" : "unknown"}`,
      received: describeReceived(key),
      expected: "value, unit, standardUncertainty",
    });
  }
}
