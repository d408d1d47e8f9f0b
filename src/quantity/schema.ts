import * as z from "zod";
import { lowestValue } from "./check-parts.js";
import { convertValue } from "./convert-value.js";
import type { Quantity } from "./quantity.js";
import { type Dimension, isUnitCode, siUnits, unitCodesOf } from "./units.js";

/**
 * Schema of a quantity of a dimension: the same verdicts as the guards, without transforms, so that JSON Schema can
 * be made of it.
 *
 * @param dimension - the dimension that the unit must have
 * @example
 * quantitySchema("pressure").safeParse({ value: 1, unit: "bar" }).success; // => true
 * quantitySchema("pressure").safeParse({ value: 1, unit: "K" }).success; // => false
 */
export function quantitySchema<D extends Dimension>(dimension: D): z.ZodType<Quantity<D>> {
  const shape = dimension === "temperature" ? temperatures() : plain(dimension);
  return shape.refine((given) => fitsInSi(given, dimension), {
    path: ["value"],
    message: `too large for a double in ${siUnits[dimension]}`,
  }) as z.ZodType<Quantity<D>>;
}

const standardUncertainty = z.number().nonnegative().optional();

function plain(dimension: Dimension): z.ZodType<{ value: number; unit: string }> {
  return z.strictObject({ value: z.number(), unit: z.enum(unitCodesOf(dimension)), standardUncertainty });
}

/** One shape a unit, so that JSON Schema says where absolute zero lies. */
function temperatures(): z.ZodType<{ value: number; unit: string }> {
  const [first, ...others] = unitCodesOf("temperature").map((code) =>
    z.strictObject({ value: z.number().min(lowestValue(code)), unit: z.literal(code), standardUncertainty }),
  );
  return z.discriminatedUnion("unit", [first!, ...others]);
}

function fitsInSi(given: { value: number; unit: string }, dimension: Dimension): boolean {
  return (
    !isUnitCode(given.unit, dimension) || Number.isFinite(convertValue(given.value, given.unit, siUnits[dimension]))
  );
}
