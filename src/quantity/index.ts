export { convert, numericalValue, type QuantityIn } from "./convert.js";
export type { Figure } from "./figure.js";
export { type FormatOptions, formatQuantity } from "./format.js";
export {
  checkPositiveQuantity,
  checkQuantity,
  pressureInPascal,
  siValue,
  temperatureInKelvin,
} from "./guards.js";
export { parseQuantity } from "./parse.js";
export {
  type Amount,
  type Charge,
  type Concentration,
  type ElectricPotential,
  type Energy,
  type Fraction,
  type Mass,
  type MassDensity,
  type Molality,
  type MolarEnergy,
  type MolarEntropy,
  type MolarMass,
  type MolarVolume,
  type Pressure,
  type Quantity,
  type QuantityOf,
  type QuantityOptions,
  quantity,
  type ReciprocalPressure,
  type ReciprocalTemperature,
  type SpecificEnergy,
  type SpecificEntropy,
  type Temperature,
  type TemperatureDifference,
} from "./quantity.js";
export type { UnitHint } from "./unit-hints.js";
export {
  type Dimension,
  type DimensionOf,
  isUnitCode,
  siUnits,
  type UnitCode,
  type UnitOf,
  unitCodesOf,
  unitTable,
} from "./units.js";
