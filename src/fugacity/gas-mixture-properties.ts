import type { Fault, FaultPath } from "../errors/fault.js";
import { fail, failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkArray, checkObject } from "../errors/input.js";
import { exp } from "../numeric/exp.js";
import { checkPositiveQuantity } from "../quantity/guards.js";
import type { Pressure, Quantity, Temperature } from "../quantity/quantity.js";
import { collectHouseRecord } from "../species/house-record.js";
import type { Label, SpeciesRecord } from "../species/record.js";
import { checkEquationOfState } from "./check-equation-of-state.js";
import { checkFraction, checkFractionSum, unknownLabel } from "./check-fractions.js";
import type { EquationOfState } from "./equation-of-state.js";
import { gasComponentOf } from "./gas-component-of.js";

/** Temperature, pressure and composition of a gas mixture. */
export interface GasMixtureConditions {
  readonly temperature: Temperature;
  readonly pressure: Pressure;
  /** By label; their sum is 1 within 1e-9. */
  readonly moleFractions: Readonly<Record<Label, number>>;
  /** The records of the components; others may stand among them and are not used. */
  readonly species: readonly SpeciesRecord[];
}

/** Properties of a gas mixture; departures are from the ideal gas at the same conditions, per mole of mixture. */
export interface GasMixtureProperties {
  /** Z = pV/(RT). */
  readonly compressibilityFactor: number;
  readonly molarVolume: Quantity<"molarVolume", "m3/mol">;
  /** ln phi by label. */
  readonly lnFugacityCoefficients: Readonly<Record<Label, number>>;
  /** f = y phi p by label. */
  readonly fugacities: Readonly<Record<Label, Quantity<"pressure", "Pa">>>;
  readonly departure: {
    readonly enthalpy: Quantity<"molarEnergy", "J/mol">;
    readonly entropy: Quantity<"molarEntropy", "J/mol/K">;
    readonly gibbsEnergy: Quantity<"molarEnergy", "J/mol">;
  };
  /** Present where the equation was allowed to continue outside its validity: what is exceeded. */
  readonly outsideValidity?: string;
}

const conditionKeys = {
  required: ["temperature", "pressure", "moleFractions", "species"],
  optional: [],
} as const;

/**
 * Properties of a gas mixture by an equation of state: compressibility factor, molar volume, fugacity coefficients,
 * fugacities f_i = y_i phi_i p, and departures of enthalpy, entropy and Gibbs energy from the ideal gas.
 *
 * @param equationOfState - such as idealGas() or virial()
 * @param conditions.temperature - above 0 K
 * @param conditions.pressure - above 0 Pa
 * @param conditions.moleFractions - each from 0 to 1, their sum 1 within 1e-9; nothing is renormalised
 * @param conditions.species - the records of at least these labels, all of them gases
 * @returns properties in coherent SI, per mole of mixture
 * @throws GibbsLedgerError with every fault of the conditions at once: "conditions/unknown-label",
 * "conditions/invalid-fraction", "conditions/fractions-do-not-sum", "conditions/missing-composition",
 * "species/duplicate-label", those of quantities and records; "quantity/overflow" for a fugacity beyond a double;
 * and those of the equation of state
 * @remarks Arithmetic: that of the equation of state, and two roundings and an exponential in each fugacity.
 * @see `references.prausnitz1999`
 * @example
 * const properties = gasMixtureProperties(virial(), {
 *   temperature: quantity(200, "K"),
 *   pressure: quantity(30, "bar"),
 *   moleFractions: { "N2(g)": 0.4, "CH4(g)": 0.6 },
 *   species: [N2_g, CH4_g],
 * });
 * properties.compressibilityFactor; // => 0.864...
 * properties.fugacities["N2(g)"]?.unit; // => "Pa"
 */
export function gasMixtureProperties(
  equationOfState: EquationOfState,
  conditions: GasMixtureConditions,
): GasMixtureProperties {
  const faults: Fault[] = [];
  checkEquationOfState(equationOfState, ["equationOfState"], faults);
  checkObject(conditions, [], faults, conditionKeys);
  failIfAny(typeof conditions === "object" && conditions !== null ? [] : faults);
  const temperatureK = positive(conditions.temperature, "temperature", faults);
  const pressurePa = positive(conditions.pressure, "pressure", faults);
  const records = checkSpecies(conditions.species, faults);
  const labels = checkFractions(conditions.moleFractions, records, faults);
  failIfAny(faults);
  const components = labels.map((label) => gasComponentOf(records.get(label)!));
  const fractions = labels.map((label) => conditions.moleFractions[label]!);
  const mixture = equationOfState.mixture(components, ["species"]);
  const state = mixture.state(temperatureK!, pressurePa!, fractions);
  const lnFugacityCoefficients: Record<Label, number> = {};
  const fugacities: Record<Label, Quantity<"pressure", "Pa">> = {};
  labels.forEach((label, index) => {
    const lnPhi = state.lnFugacityCoefficients[index]!;
    lnFugacityCoefficients[label] = lnPhi;
    fugacities[label] = { value: fugacity(label, fractions[index]!, lnPhi, pressurePa!), unit: "Pa" };
  });
  const { compressibilityFactor, molarVolume, departure, outsideValidity } = state;
  return {
    compressibilityFactor,
    molarVolume: { value: molarVolume, unit: "m3/mol" },
    lnFugacityCoefficients,
    fugacities,
    departure: {
      enthalpy: { value: departure.enthalpy, unit: "J/mol" },
      entropy: { value: departure.entropy, unit: "J/mol/K" },
      gibbsEnergy: { value: departure.gibbsEnergy, unit: "J/mol" },
    },
    ...(outsideValidity === undefined ? {} : { outsideValidity }),
  };
}

/** A missing quantity is a fault of the object's keys already. */
function positive(value: unknown, dimension: "temperature" | "pressure", faults: Fault[]): number | undefined {
  return value === undefined ? undefined : checkPositiveQuantity(value, dimension, [dimension], faults);
}

function checkSpecies(species: unknown, faults: Fault[]): ReadonlyMap<Label, SpeciesRecord> {
  const records = new Map<Label, SpeciesRecord>();
  if (species === undefined) return records;
  const path: FaultPath = ["species"];
  checkArray(species, path, faults)?.forEach((given, index) => {
    const record = collectHouseRecord(given, [...path, index], faults);
    if (record === undefined) return;
    if (records.has(record.label)) {
      faults.push({
        code: "species/duplicate-label",
        path: [...path, index],
        message: `${record.label} is given twice`,
        received: record.label,
        expected: "each species once",
      });
    }
    records.set(record.label, record);
  });
  return records;
}

function checkFractions(
  moleFractions: unknown,
  records: ReadonlyMap<Label, SpeciesRecord>,
  faults: Fault[],
): readonly Label[] {
  if (moleFractions === undefined) return [];
  const path: FaultPath = ["moleFractions"];
  const given = checkObject(moleFractions, path, faults, { required: [], optional: "any" });
  if (given === undefined) return [];
  const entries = Object.entries(given);
  const fractions: number[] = [];
  for (const [label, value] of entries) {
    checkLabel(label, records, [...path, label], faults);
    const fraction = checkFraction(value, [...path, label], faults);
    if (fraction !== undefined) fractions.push(fraction);
  }
  if (entries.length === 0) {
    faults.push({
      code: "conditions/missing-composition",
      path,
      message: "no mole fraction is given",
      expected: "at least one label with its mole fraction",
    });
  } else if (fractions.length === entries.length) {
    checkFractionSum(fractions, path, faults);
  }
  return entries.map(([label]) => label);
}

function checkLabel(label: string, records: ReadonlyMap<Label, SpeciesRecord>, path: FaultPath, faults: Fault[]): void {
  const record = records.get(label);
  if (record?.state === "g") return;
  const gases = [...records.values()].filter(({ state }) => state === "g").map((each) => each.label);
  if (record === undefined) faults.push(unknownLabel(label, path, gases, "the label of a gas among the species"));
  else
    faults.push({
      ...unknownLabel(record.formula, path, gases, "a gas"),
      message: `${label} is not a gas`,
      received: label,
    });
}

function fugacity(label: Label, fraction: number, lnPhi: number, pressurePa: number): number {
  const value = fraction * (exp(lnPhi) * pressurePa) + 0;
  if (value < Number.POSITIVE_INFINITY) return value;
  return fail({
    code: "quantity/overflow",
    path: ["moleFractions", label],
    message: `the fugacity of ${label} is too large for a double: its ln phi is ${lnPhi}`,
    received: String(lnPhi),
    expected: "a fugacity below 1.7976931348623157e+308 Pa",
  });
}
