import type { Fault } from "../errors/fault.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkObject } from "../errors/input.js";
import { checkParts } from "./check-parts.js";
import type { UnitHint } from "./unit-hints.js";
import type { Dimension, DimensionOf, UnitCode, UnitOf } from "./units.js";

/**
 * A number with its unit, as plain data: JSON writes and reads it unchanged. The unit decides the dimension, so a
 * pressure where a temperature belongs does not compile.
 */
export interface Quantity<D extends Dimension, U extends UnitOf<D> = UnitOf<D>> {
  readonly value: number;
  readonly unit: U;
  /** Standard uncertainty in the same unit; absent: unknown. */
  readonly standardUncertainty?: number;
}

/** The quantity type of a unit code; a union of quantities for a union of codes. */
export type QuantityOf<U extends string> = U extends UnitCode
  ? Quantity<DimensionOf<U>, U & UnitOf<DimensionOf<U>>>
  : never;

/** A thermodynamic temperature, on any scale. */
export type Temperature = Quantity<"temperature">;
/** A difference of two temperatures. */
export type TemperatureDifference = Quantity<"temperatureDifference">;
/** An absolute pressure. */
export type Pressure = Quantity<"pressure">;
/** Energy per amount of substance. */
export type MolarEnergy = Quantity<"molarEnergy">;
/** Entropy or heat capacity per amount of substance. */
export type MolarEntropy = Quantity<"molarEntropy">;
/** Volume per amount of substance. */
export type MolarVolume = Quantity<"molarVolume">;
/** Mass per amount of substance. */
export type MolarMass = Quantity<"molarMass">;
/** Amount of substance. */
export type Amount = Quantity<"amount">;
/** Mass. */
export type Mass = Quantity<"mass">;
/** Amount of solute per mass of solvent. */
export type Molality = Quantity<"molality">;
/** Amount of substance per volume. */
export type Concentration = Quantity<"concentration">;
/** Mass per volume. */
export type MassDensity = Quantity<"massDensity">;
/** A number of dimension one. */
export type Fraction = Quantity<"fraction">;
/** Electric potential difference. */
export type ElectricPotential = Quantity<"electricPotential">;
/** Electric charge. */
export type Charge = Quantity<"charge">;
/** Energy. */
export type Energy = Quantity<"energy">;
/** Energy per mass. */
export type SpecificEnergy = Quantity<"specificEnergy">;
/** Entropy or heat capacity per mass. */
export type SpecificEntropy = Quantity<"specificEntropy">;
/** Reciprocal temperature, as of a thermal expansion. */
export type ReciprocalTemperature = Quantity<"reciprocalTemperature">;
/** Reciprocal pressure, as of a compressibility. */
export type ReciprocalPressure = Quantity<"reciprocalPressure">;

/** What may be said beside value and unit. */
export interface QuantityOptions {
  /** Standard uncertainty in the unit of the value, not negative. */
  readonly standardUncertainty?: number;
}

interface PlainQuantity {
  readonly value: number;
  readonly unit: string;
  readonly standardUncertainty?: number;
}

/**
 * A quantity: a finite number with a unit code, checked.
 *
 * @param value - finite; a temperature at or above absolute zero; -0 becomes 0
 * @param unit - UCUM code of the unit table, case sensitive; the compiler shows the right code for a near miss
 * @param options - standard uncertainty in the same unit
 * @returns plain data with the unit in its type
 * @throws GibbsLedgerError "quantity/not-finite", "quantity/unknown-unit", "quantity/below-absolute-zero",
 * "quantity/negative-uncertainty", "input/unknown-key"
 * @example
 * const temperature = quantity(25, "Cel");
 * temperature.value; // => 25
 * temperature.unit; // => "Cel"
 */
export function quantity<const U extends string>(
  value: number,
  unit: U extends UnitCode ? U : UnitHint<U>,
  options?: QuantityOptions,
): QuantityOf<U>;
export function quantity(value: number, unit: string, options?: QuantityOptions): PlainQuantity {
  const faults: Fault[] = [];
  const standardUncertainty = readOptions(options, faults);
  checkParts(value, unit, standardUncertainty, undefined, [], faults);
  failIfAny(faults);
  if (standardUncertainty === undefined) return { value: value + 0, unit };
  return { value: value + 0, unit, standardUncertainty: (standardUncertainty as number) + 0 };
}

function readOptions(options: unknown, faults: Fault[]): unknown {
  if (options === undefined) return undefined;
  const keys = { required: [], optional: ["standardUncertainty"] } as const;
  return checkObject(options, ["options"], faults, keys)?.standardUncertainty;
}
