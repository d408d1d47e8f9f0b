import type { Fault } from "../errors/fault.js";
import { fail, failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkParts, checkUnit, overflow } from "./check-parts.js";
import { convertDifference, convertValue } from "./convert-value.js";
import { notAQuantity } from "./guards.js";
import type { Quantity } from "./quantity.js";
import { type DimensionOf, type UnitCode, type UnitOf, unitTable } from "./units.js";

/** What can be converted: a quantity whose unit is known to the compiler. */
export interface QuantityIn<U extends UnitCode> {
  readonly value: number;
  readonly unit: U;
  readonly standardUncertainty?: number;
}

/**
 * A quantity in another unit of its dimension. Value and standard uncertainty are each the double nearest to the
 * exact result; an offset moves the value, not the uncertainty.
 *
 * @param quantity - any quantity
 * @param unit - a unit code of the same dimension
 * @returns a new quantity in that unit
 * @throws GibbsLedgerError "quantity/wrong-dimension", "quantity/unknown-unit", "quantity/overflow", and what
 * `quantity` throws
 * @example
 * const pressure = convert(quantity(2, "atm"), "kPa");
 * pressure.value; // => 202.65
 * const warm = convert(quantity(77, "[degF]", { standardUncertainty: 0.9 }), "Cel");
 * warm.value; // => 25
 * warm.standardUncertainty; // => 0.5
 */
export function convert<F extends UnitCode, U extends UnitOf<DimensionOf<F>>>(
  quantity: QuantityIn<F>,
  unit: U,
): Quantity<DimensionOf<F>, U> {
  const { value, unit: from, standardUncertainty } = checked(quantity);
  const to: UnitCode = checkedUnit(unit, from);
  const result = { value: converted(value, from, to), unit };
  if (standardUncertainty === undefined) return result;
  const uncertainty = convertDifference(standardUncertainty, from, to);
  if (uncertainty === Infinity) fail(overflow(standardUncertainty, from, to, ["standardUncertainty"]));
  return { ...result, standardUncertainty: uncertainty };
}

/**
 * The number that a quantity has in a unit: the double nearest to the exact result.
 *
 * @param quantity - any quantity
 * @param unit - a unit code of the same dimension
 * @throws GibbsLedgerError as `convert`
 * @example
 * numericalValue(quantity(25, "Cel"), "K"); // => 298.15
 */
export function numericalValue<F extends UnitCode>(quantity: QuantityIn<F>, unit: UnitOf<DimensionOf<F>>): number {
  const { value, unit: from } = checked(quantity);
  return converted(value, from, checkedUnit(unit, from));
}

interface Parts {
  readonly value: number;
  readonly unit: UnitCode;
  readonly standardUncertainty?: number;
}

/** Reads each property once; further keys are no business of a conversion. */
function checked(given: QuantityIn<UnitCode>): Parts {
  const faults: Fault[] = [];
  if (typeof given !== "object" || given === null) fail(notAQuantity(given, undefined, []));
  const { value, unit, standardUncertainty } = given;
  checkParts(value, unit, standardUncertainty, undefined, [], faults);
  failIfAny(faults);
  return standardUncertainty === undefined ? { value, unit } : { value, unit, standardUncertainty };
}

function checkedUnit(unit: UnitCode, from: UnitCode): UnitCode {
  const faults: Fault[] = [];
  checkUnit(unit, unitTable[from].dimension, [], faults);
  failIfAny(faults);
  return unit;
}

function converted(value: number, from: UnitCode, to: UnitCode): number {
  const result = convertValue(value, from, to);
  if (result === Infinity || result === -Infinity) fail(overflow(value, from, to, ["value"]));
  return result;
}
