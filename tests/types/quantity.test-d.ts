import { expectTypeOf } from "vitest";
import { convert, numericalValue } from "../../src/quantity/convert.js";
import { parseQuantity } from "../../src/quantity/parse.js";
import {
  type MolarEnergy,
  type Pressure,
  type Quantity,
  quantity,
  type Temperature,
  type TemperatureDifference,
} from "../../src/quantity/quantity.js";
import type { UnitHint } from "../../src/quantity/unit-hints.js";
import { type Dimension, isUnitCode, type siUnits, type UnitCode, type UnitOf } from "../../src/quantity/units.js";

// The unit decides the type.
expectTypeOf(quantity(25, "Cel")).toEqualTypeOf<Quantity<"temperature", "Cel">>();
expectTypeOf(quantity(1, "bar")).toExtend<Pressure>();
expectTypeOf(quantity(1, "bar")).not.toExtend<Temperature>();
expectTypeOf<Pressure>().not.toExtend<Temperature>();
expectTypeOf<Temperature>().not.toExtend<TemperatureDifference>();
expectTypeOf(quantity(25, "C")).not.toExtend<Temperature>();
expectTypeOf<typeof siUnits>().toExtend<{ readonly [D in Dimension]: UnitOf<D> }>();

// A near miss does not compile, and the compiler names the right code.
// @ts-expect-error did you mean "Cel"?
quantity(25, "degC");
// @ts-expect-error did you mean "kcal_th/mol"?
quantity(25, "kcal/mol");
// @ts-expect-error no such unit code: furlong
quantity(25, "furlong");
expectTypeOf<UnitHint<"degC">>().toEqualTypeOf<'did you mean "Cel"?'>();
expectTypeOf<UnitHint<"J mol-1 K-1">>().toEqualTypeOf<'did you mean "J/mol/K"?'>();
expectTypeOf<UnitHint<"furlong">>().toEqualTypeOf<"no such unit code: furlong">();

// A unit from configuration has to be checked first.
declare const text: string;
// @ts-expect-error check a unit from configuration with isUnitCode(text) first
quantity(1, text);
if (isUnitCode(text)) expectTypeOf(quantity(1, text)).toExtend<Quantity<Dimension>>();
if (isUnitCode(text, "pressure")) {
  expectTypeOf(text).toEqualTypeOf<UnitOf<"pressure">>();
  expectTypeOf(quantity(1, text)).toExtend<Pressure>();
  expectTypeOf(quantity(1, text)).not.toExtend<Temperature>();
}

// A conversion stays in its dimension and fixes the unit.
declare const pressure: Pressure;
expectTypeOf(convert(pressure, "kPa")).toEqualTypeOf<Quantity<"pressure", "kPa">>();
expectTypeOf(convert({ value: 1, unit: "bar" }, "Pa")).toEqualTypeOf<Quantity<"pressure", "Pa">>();
// @ts-expect-error a pressure has no kelvin
convert(pressure, "K");
// @ts-expect-error a pressure has no kelvin, in a literal either
convert({ value: 1, unit: "bar" }, "K");
// @ts-expect-error a temperature is no difference of temperatures
convert(quantity(1, "K"), "K{difference}");
expectTypeOf(numericalValue(pressure, "bar")).toEqualTypeOf<number>();
// @ts-expect-error a pressure has no kelvin
numericalValue(pressure, "K");

// Assignments across dimensions, bare numbers and misspelt units do not compile.
// @ts-expect-error a pressure is no temperature
const wrong: Temperature = quantity(1, "bar");
// @ts-expect-error a number is no temperature
const bare: Temperature = 298.15;
// @ts-expect-error not a unit of temperature
const literal: Temperature = { value: 25, unit: "C" };
const fine: Temperature = { value: 25, unit: "Cel" };
expectTypeOf([wrong, bare, literal, fine]).items.toEqualTypeOf<Temperature>();

// A function of two quantities of one dimension does not widen over both.
declare function difference<D extends Dimension>(a: Quantity<D>, b: Quantity<NoInfer<D>>): void;
difference(quantity(1, "bar"), quantity(1, "atm"));
// @ts-expect-error a temperature is no pressure
difference(quantity(1, "bar"), quantity(1, "K"));

// A text is read into the dimension that is asked for.
expectTypeOf(parseQuantity("-32.9 kJ/mol", "molarEnergy")).toEqualTypeOf<MolarEnergy>();
expectTypeOf(parseQuantity("1 K").unit).toEqualTypeOf<UnitCode>();
