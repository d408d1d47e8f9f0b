import type { FaultPath } from "../errors/fault.js";
import { convertDifference } from "../quantity/convert-value.js";
import type { Quantity } from "../quantity/quantity.js";
import type { Dimension, UnitOf } from "../quantity/units.js";
import { finite } from "./finite.js";

/**
 * A quantity in coherent SI after an exactly known amount was added: the value moves, its uncertainty stays.
 *
 * @param given - the quantity, checked
 * @param valueSi - its value in the unit
 * @param shift - what is added, in the unit
 */
export function shiftedQuantity<D extends Dimension, U extends UnitOf<D>>(
  given: Quantity<D>,
  valueSi: number,
  unit: U,
  shift: number,
  path: FaultPath,
): Quantity<D, U> {
  const value = finite(valueSi + shift, path);
  if (given.standardUncertainty === undefined) return { value, unit };
  const standardUncertainty = finite(convertDifference(given.standardUncertainty, given.unit, unit), path);
  return { value, unit, standardUncertainty };
}
