import * as z from "zod";
import { optional, textSchema, withRule } from "../errors/schema.js";
import { originSchema, sourceSchema } from "../references/schema.js";
import { lowestValue } from "./check-parts.js";
import { convertValue } from "./convert-value.js";
import type { Figure } from "./figure.js";
import type { Quantity } from "./quantity.js";
import { type Dimension, siUnits, type UnitCode, unitCodesOf } from "./units.js";

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
  const fits = (given: Reading): boolean => Number.isFinite(valueInSi(given, dimension));
  const message = `too large for a double in ${siUnits[dimension]}`;
  return withRule(readings(dimension, uncertainValue), fits, message, ["value"]) as z.ZodType<Quantity<D>>;
}

/**
 * Schema of a quantity above zero, as temperature and pressure of conditions are.
 *
 * @param dimension - the dimension that the unit must have
 * @example
 * positiveQuantitySchema("temperature").safeParse({ value: 25, unit: "Cel" }).success; // => true
 * positiveQuantitySchema("temperature").safeParse({ value: 0, unit: "K" }).success; // => false
 */
export function positiveQuantitySchema<D extends Dimension>(dimension: D): z.ZodType<Quantity<D>> {
  const fits = (given: Reading): boolean => isFinitePositive(valueInSi(given, dimension));
  const message = `not above 0, or too large for a double, in ${siUnits[dimension]}`;
  return withRule(readings(dimension, uncertainValue, true), fits, message, ["value"]) as z.ZodType<Quantity<D>>;
}

/** Schema of a quantity that is not below zero, as partial pressures and concentrations are. */
export function nonNegativeQuantitySchema<D extends Dimension>(dimension: D): z.ZodType<Quantity<D>> {
  const fits = (given: Quantity<D>): boolean => valueInSi(given, dimension) >= 0;
  return withRule(quantitySchema(dimension), fits, `below 0 ${siUnits[dimension]}`, ["value"]);
}

/**
 * Schema of a published figure of a dimension: value and unit as printed, uncertainty, source and origin.
 *
 * @param dimension - the dimension that the unit must have
 * @example
 * const figure = { value: 154.846, unit: "J/mol/K", source: "cox1989", origin: "memory" };
 * figureSchema("molarEntropy").safeParse(figure).success; // => true
 * figureSchema("molarEnergy").safeParse(figure).success; // => false
 */
export function figureSchema(dimension: Dimension): z.ZodType<Figure> {
  const known = figures.get(dimension);
  if (known !== undefined) return known;
  const schema = readings(dimension, figureMembers);
  figures.set(dimension, schema);
  return schema;
}

/** One schema a dimension, so that JSON Schema names each once. */
const figures = new Map<Dimension, z.ZodType<Figure>>();

/** Schema of a published uncertainty. */
export const uncertaintySchema: z.ZodType<NonNullable<Figure["uncertainty"]>> = z.strictObject({
  halfWidth: z.number().nonnegative(),
  coverage: z.number().gt(0).lt(1),
});

const uncertainValue = { standardUncertainty: optional(z.number().nonnegative()) };

const figureMembers = {
  uncertainty: optional(uncertaintySchema),
  source: sourceSchema,
  origin: originSchema,
  where: optional(textSchema()),
};

/** Schema of the pressure that figures of a record refer to, above zero. */
export const standardPressureSchema: z.ZodType<Figure> = readings("pressure", figureMembers, true);

/** Schema of a published figure of any dimension, in a unit of the unit table or not. */
export const anyFigureSchema: z.ZodType<Figure> = z.strictObject({
  value: z.number(),
  unit: textSchema(),
  ...figureMembers,
});

interface Reading {
  readonly value: number;
  readonly unit: string;
}

/** Number and unit with further members; for temperatures one shape a unit, which says where absolute zero lies. */
function readings<M extends z.core.$ZodLooseShape>(
  dimension: Dimension,
  members: M,
  isPositive: boolean = false,
): z.ZodType<Reading & z.output<z.ZodObject<M>>> {
  const codes = unitCodesOf(dimension);
  const shapes = codes.map((code) =>
    z.strictObject({ value: numbersFrom(lowestValue(code), isPositive), unit: z.literal(code), ...members }),
  );
  const [first, ...others] = shapes;
  const shape =
    dimension === "temperature"
      ? z.discriminatedUnion("unit", [first!, ...others])
      : z.strictObject({ value: numbersFrom(Number.NEGATIVE_INFINITY, isPositive), unit: z.enum(codes), ...members });
  return shape as unknown as z.ZodType<Reading & z.output<z.ZodObject<M>>>;
}

function numbersFrom(lowest: number, isPositive: boolean): z.ZodType<number> {
  const hasZero = lowest > Number.NEGATIVE_INFINITY;
  if (isPositive) return z.number().gt(hasZero ? lowest : 0);
  return hasZero ? z.number().min(lowest) : z.number();
}

/** Value in the coherent SI unit, of what a schema has accepted. */
export function valueInSi({ value, unit }: Reading, dimension: Dimension): number {
  return convertValue(value, unit as UnitCode, siUnits[dimension]);
}

function isFinitePositive(value: number): boolean {
  return value > 0 && value < Number.POSITIVE_INFINITY;
}
