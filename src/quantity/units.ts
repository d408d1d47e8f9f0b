/** What the table says of a unit. */
export interface UnitEntry {
  readonly dimension: string;
  /** Coherent SI value of one unit: an exact decimal, or the ratio of two. */
  readonly factor: string;
  /** Added to the value before the factor is applied; scales with a zero point of their own only. */
  readonly offset?: string;
}

/**
 * The one table of units: UCUM code (case sensitive) to its dimension and to its exact relation to the coherent SI
 * unit, SI = (value + offset) * factor.
 *
 * @see `references.bipm2019` `references.schadow2017`
 * @example
 * unitTable.atm.factor; // => "101325"
 */
export const unitTable = {
  K: { dimension: "temperature", factor: "1" },
  Cel: { dimension: "temperature", factor: "1", offset: "273.15" },
  "[degF]": { dimension: "temperature", factor: "5/9", offset: "459.67" },
  "[degR]": { dimension: "temperature", factor: "5/9" },
  "K{difference}": { dimension: "temperatureDifference", factor: "1" },
  "Cel{difference}": { dimension: "temperatureDifference", factor: "1" },
  "[degF]{difference}": { dimension: "temperatureDifference", factor: "5/9" },
  "[degR]{difference}": { dimension: "temperatureDifference", factor: "5/9" },
  Pa: { dimension: "pressure", factor: "1" },
  hPa: { dimension: "pressure", factor: "100" },
  kPa: { dimension: "pressure", factor: "1000" },
  MPa: { dimension: "pressure", factor: "1000000" },
  GPa: { dimension: "pressure", factor: "1000000000" },
  mbar: { dimension: "pressure", factor: "100" },
  bar: { dimension: "pressure", factor: "100000" },
  kbar: { dimension: "pressure", factor: "100000000" },
  atm: { dimension: "pressure", factor: "101325" },
  "[psi]": { dimension: "pressure", factor: "4.4482216152605/0.00064516" },
  "mm[Hg]": { dimension: "pressure", factor: "133.322387415" },
  "J/mol": { dimension: "molarEnergy", factor: "1" },
  "kJ/mol": { dimension: "molarEnergy", factor: "1000" },
  "cal_th/mol": { dimension: "molarEnergy", factor: "4.184" },
  "kcal_th/mol": { dimension: "molarEnergy", factor: "4184" },
  "eV/{entity}": { dimension: "molarEnergy", factor: "96485.3321233100184" },
  "J/mol/K": { dimension: "molarEntropy", factor: "1" },
  "kJ/mol/K": { dimension: "molarEntropy", factor: "1000" },
  "cal_th/mol/K": { dimension: "molarEntropy", factor: "4.184" },
  "m3/mol": { dimension: "molarVolume", factor: "1" },
  "cm3/mol": { dimension: "molarVolume", factor: "0.000001" },
  "L/mol": { dimension: "molarVolume", factor: "0.001" },
  "J/bar/mol": { dimension: "molarVolume", factor: "0.00001" },
  "kg/mol": { dimension: "molarMass", factor: "1" },
  "g/mol": { dimension: "molarMass", factor: "0.001" },
  mol: { dimension: "amount", factor: "1" },
  mmol: { dimension: "amount", factor: "0.001" },
  kmol: { dimension: "amount", factor: "1000" },
  kg: { dimension: "mass", factor: "1" },
  g: { dimension: "mass", factor: "0.001" },
  "mol/kg": { dimension: "molality", factor: "1" },
  "mmol/kg": { dimension: "molality", factor: "0.001" },
  "mol/m3": { dimension: "concentration", factor: "1" },
  "mol/L": { dimension: "concentration", factor: "1000" },
  "kg/m3": { dimension: "massDensity", factor: "1" },
  "g/cm3": { dimension: "massDensity", factor: "1000" },
  "kg/L": { dimension: "massDensity", factor: "1000" },
  "1": { dimension: "fraction", factor: "1" },
  "%": { dimension: "fraction", factor: "0.01" },
  "[ppm]": { dimension: "fraction", factor: "0.000001" },
  V: { dimension: "electricPotential", factor: "1" },
  mV: { dimension: "electricPotential", factor: "0.001" },
  C: { dimension: "charge", factor: "1" },
  J: { dimension: "energy", factor: "1" },
  kJ: { dimension: "energy", factor: "1000" },
  cal_th: { dimension: "energy", factor: "4.184" },
  "kW.h": { dimension: "energy", factor: "3600000" },
  "J/kg": { dimension: "specificEnergy", factor: "1" },
  "J/g": { dimension: "specificEnergy", factor: "1000" },
  "kJ/kg": { dimension: "specificEnergy", factor: "1000" },
  "cal_th/g": { dimension: "specificEnergy", factor: "4184" },
  "J/kg/K": { dimension: "specificEntropy", factor: "1" },
  "J/g/K": { dimension: "specificEntropy", factor: "1000" },
  "K-1": { dimension: "reciprocalTemperature", factor: "1" },
  "Pa-1": { dimension: "reciprocalPressure", factor: "1" },
  "bar-1": { dimension: "reciprocalPressure", factor: "0.00001" },
} as const;

/** The table for look-ups with a text that may be anything. */
const entries: ReadonlyMap<unknown, UnitEntry> = /* @__PURE__ */ new Map(Object.entries(unitTable));

/** A UCUM code that the library knows. */
export type UnitCode = keyof typeof unitTable;

/** What a quantity measures; each unit code belongs to one dimension. */
export type Dimension = (typeof unitTable)[UnitCode]["dimension"];

type UnitsByDimension = {
  [U in UnitCode as (typeof unitTable)[U]["dimension"]]: U;
};

/** The unit codes of a dimension. */
export type UnitOf<D extends Dimension> = UnitsByDimension[D];

/** The dimension of a unit code. */
export type DimensionOf<U extends UnitCode> = (typeof unitTable)[U]["dimension"];

/**
 * Tells whether a text is a unit code: for units that come from configuration.
 *
 * @param text - anything; own codes of the table only, case sensitive
 * @example
 * isUnitCode("kJ/mol"); // => true
 * isUnitCode("degC"); // => false
 */
export function isUnitCode(text: unknown): text is UnitCode;
/**
 * Tells whether a text is a unit code of one dimension.
 *
 * @param text - anything; own codes of the table only, case sensitive
 * @param dimension - the dimension that the unit must have
 * @example
 * isUnitCode("kJ/mol", "molarEnergy"); // => true
 * isUnitCode("kJ/mol", "pressure"); // => false
 */
export function isUnitCode<D extends Dimension>(text: unknown, dimension: D): text is UnitOf<D>;
export function isUnitCode(text: unknown, dimension?: Dimension): boolean {
  const entry = entries.get(text);
  return entry !== undefined && (dimension === undefined || entry.dimension === dimension);
}

/** The coherent SI unit of each dimension. */
export const siUnits = {
  temperature: "K",
  temperatureDifference: "K{difference}",
  pressure: "Pa",
  molarEnergy: "J/mol",
  molarEntropy: "J/mol/K",
  molarVolume: "m3/mol",
  molarMass: "kg/mol",
  amount: "mol",
  mass: "kg",
  molality: "mol/kg",
  concentration: "mol/m3",
  massDensity: "kg/m3",
  fraction: "1",
  electricPotential: "V",
  charge: "C",
  energy: "J",
  specificEnergy: "J/kg",
  specificEntropy: "J/kg/K",
  reciprocalTemperature: "K-1",
  reciprocalPressure: "Pa-1",
} as const;

/** The unit codes of a dimension, the coherent SI unit first. */
export function unitCodesOf<D extends Dimension>(dimension: D): UnitOf<D>[] {
  return (Object.keys(unitTable) as UnitCode[]).filter((code): code is UnitOf<D> => isUnitCode(code, dimension));
}

/** The entry of a unit code, with its offset where it has one. */
export function unitEntry(code: UnitCode): UnitEntry {
  return entries.get(code)!;
}
