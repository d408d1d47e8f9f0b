import { describeReceived, type Fault, type FaultPath } from "../errors/fault.js";
import { dimensionHint, unitHint } from "./unit-hints.js";
import { type Dimension, isUnitCode, siUnits, type UnitCode, unitCodesOf, unitEntry, unitTable } from "./units.js";

/**
 * Checks value, unit and standard uncertainty of a would-be quantity and collects what is wrong.
 *
 * @param dimension - the dimension that the unit must have; undefined: any
 * @returns whether value and unit are sound, so that they may be converted
 */
export function checkParts(
  value: unknown,
  unit: unknown,
  standardUncertainty: unknown,
  dimension: Dimension | undefined,
  path: FaultPath,
  faults: Fault[],
): boolean {
  const isNumber = checkNumber(value, path, faults);
  const isUnit = checkUnit(unit, dimension, path, faults);
  if (standardUncertainty !== undefined) checkUncertainty(standardUncertainty, path, faults);
  if (!isNumber || !isUnit) return false;
  if ((value as number) >= lowestValue(unit as UnitCode)) return true;
  faults.push(belowAbsoluteZero(value as number, unit as UnitCode, path));
  return false;
}

/** The coherent SI unit of a unit's dimension. */
export function siUnitOf(code: UnitCode): UnitCode {
  return siUnits[unitTable[code].dimension];
}

/** The lowest value in a unit: absolute zero as the nearest double, -Infinity for units of other dimensions. */
export function lowestValue(unit: UnitCode): number {
  switch (unit) {
    case "K":
    case "[degR]":
      return 0;
    case "Cel":
      return -273.15;
    case "[degF]":
      return -459.67;
    default:
      return Number.NEGATIVE_INFINITY;
  }
}

/** The fault of a result that no double holds. */
export function overflow(value: number, from: UnitCode, to: UnitCode, path: FaultPath): Fault {
  return {
    code: "quantity/overflow",
    path,
    message: `${value} ${from} in ${to} is too large for a double`,
    received: `${value} ${from}`,
    expected: `at most 1.7976931348623157e+308 ${to}`,
  };
}

/** The fault of a temperature below absolute zero, with a hint where degrees Celsius may have been meant. */
export function belowAbsoluteZero(value: number, unit: UnitCode, path: FaultPath): Fault {
  const celsius = unit === "K" && value >= -273.15;
  return {
    code: "quantity/below-absolute-zero",
    path: [...path, "value"],
    message: `${value} ${unit} lies below absolute zero`,
    received: `${value} ${unit}`,
    expected: `at least ${lowestValue(unit)} ${unit}`,
    ...(celsius && { hint: `${value} K: did you pass degrees Celsius? use quantity(${value}, "Cel")` }),
  };
}

function checkNumber(value: unknown, path: FaultPath, faults: Fault[]): boolean {
  if (typeof value === "number" && value - value === 0) return true;
  faults.push({
    code: "quantity/not-finite",
    path: [...path, "value"],
    message: `the value is ${describeReceived(value)}, expected a finite number`,
    received: describeReceived(value),
    expected: "a finite number",
    ...(typeof value === "string" && { hint: "parseQuantity(text) reads a text" }),
  });
  return false;
}

/** Checks that a unit is a code of the table, and of the dimension where one is given. */
export function checkUnit(unit: unknown, dimension: Dimension | undefined, path: FaultPath, faults: Fault[]): boolean {
  if (!isUnitCode(unit)) {
    faults.push(unknownUnit(unit, dimension, path));
    return false;
  }
  const found = unitEntry(unit).dimension;
  if (dimension === undefined || found === dimension) return true;
  const expected = expectedUnits(dimension);
  const hint = dimensionHint(unit, dimension);
  faults.push({
    code: "quantity/wrong-dimension",
    path: [...path, "unit"],
    message: `"${unit}" is a unit of ${found}, expected ${expected}`,
    received: unit,
    expected,
    ...(hint !== undefined && { hint }),
  });
  return false;
}

function unknownUnit(unit: unknown, dimension: Dimension | undefined, path: FaultPath): Fault {
  const expected = dimension === undefined ? "a UCUM code of the unit table" : expectedUnits(dimension);
  const hint = typeof unit === "string" ? unitHint(unit) : undefined;
  return {
    code: "quantity/unknown-unit",
    path: [...path, "unit"],
    message: `${describeReceived(unit)} is no unit code, expected ${expected}`,
    received: describeReceived(unit),
    expected,
    ...(hint !== undefined && { hint }),
  };
}

function expectedUnits(dimension: Dimension): string {
  return `a unit of ${dimension}: ${unitCodesOf(dimension).join(" ")}`;
}

function checkUncertainty(value: unknown, path: FaultPath, faults: Fault[]): void {
  if (typeof value === "number" && value >= 0 && value < Infinity) return;
  const negative = typeof value === "number" && value < 0;
  faults.push({
    code: negative ? "quantity/negative-uncertainty" : "quantity/not-finite",
    path: [...path, "standardUncertainty"],
    message: `the standard uncertainty is ${describeReceived(value)}, expected a finite number that is not negative`,
    received: describeReceived(value),
    expected: "a finite number, at least 0",
  });
}
