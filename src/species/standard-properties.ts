import { cut, type Fault, type FaultPath } from "../errors/fault.js";
import { fail } from "../errors/gibbs-ledger-error.js";
import { evaluateAll, intervalOf } from "../heat-capacity/evaluate.js";
import { policyHint, type RangePolicy, rangePolicy } from "../heat-capacity/range-policy.js";
import { temperatureInKelvin } from "../quantity/guards.js";
import type { Quantity, Temperature } from "../quantity/quantity.js";
import { houseSubstance } from "./house-substance.js";
import type { Label, SpeciesRecord } from "./record.js";
import type { StableSequence, Substance } from "./substance.js";
import { substancePlan } from "./substance-function.js";

/** At what temperature, and what to do outside a record's range. */
export interface StandardConditions {
  /** Above 0 K. */
  readonly temperature: Temperature;
  /** `"refuse"` when absent. */
  readonly outsideRange?: RangePolicy;
}

/** Properties of a substance in its standard state at 1 bar, per mole. */
export interface StandardProperties {
  /** Cp; absent where the record publishes H and S at 298.15 K only. */
  readonly heatCapacity?: Quantity<"molarEntropy", "J/mol/K">;
  /** H relative to the elements in their reference phases at 298.15 K. */
  readonly enthalpy: Quantity<"molarEnergy", "J/mol">;
  readonly entropy: Quantity<"molarEntropy", "J/mol/K">;
  /** H - T S, H relative to the elements at 298.15 K; not the Gibbs energy of formation. */
  readonly gibbsEnergy: Quantity<"molarEnergy", "J/mol">;
  /** The label, where it was evaluated outside its range. */
  readonly outsideRange: readonly Label[];
}

const noLabels: readonly Label[] = Object.freeze([]);

/**
 * Heat capacity, enthalpy, entropy and Gibbs energy of one species in its standard state (ideal gas at 1 bar, pure
 * phase at 1 bar) from its published series, with analytic integrals.
 *
 * @param species - a record, or a stable sequence as `findSequence` returns it; one that is not of the house is checked,
 * copied and frozen once
 * @param conditions - temperature above 0 K, within the record's range unless `outsideRange` says otherwise
 * @throws GibbsLedgerError "species/outside-range", "quantity/wrong-dimension", and every fault of a wrong record
 * @remarks Arithmetic: within 4 eps of the sum of the absolute terms of the series.
 * @example
 * import { Ar_g } from "gibbs-ledger/data";
 * const argon = standardProperties(Ar_g, { temperature: quantity(298.15, "K") });
 * argon.entropy.value; // => 154.84...
 * argon.heatCapacity?.value; // => 20.78...
 */
export function standardProperties(
  species: SpeciesRecord | StableSequence,
  conditions: StandardConditions,
): StandardProperties {
  const record = houseSubstance(species, ["species"]);
  const temperatureK = temperatureInKelvin(conditions?.temperature);
  const policy = rangePolicy(conditions.outsideRange);
  const plan = substancePlan(record, policy);
  const interval = intervalOf(plan, temperatureK);
  if (interval === undefined) return failOutsideRange(record, temperatureK, ["temperature"]);
  const values = evaluateAll(interval, temperatureK);
  return {
    ...(plan.heatCapacityKnown ? { heatCapacity: { value: values.heatCapacity, unit: "J/mol/K" } as const } : {}),
    enthalpy: { value: values.enthalpy, unit: "J/mol" },
    entropy: { value: values.entropy, unit: "J/mol/K" },
    gibbsEnergy: { value: values.gibbsEnergy, unit: "J/mol" },
    outsideRange: isInRange(record, temperatureK) ? noLabels : [record.label],
  };
}

/** Whether a temperature lies in the range of a substance of the house. */
export function isInRange(substance: Substance, temperatureK: number): boolean {
  const plan = substancePlan(substance, "refuse");
  return temperatureK >= plan.fromK && temperatureK <= plan.toK;
}

/** The fault of a temperature outside a substance's range. */
export function failOutsideRange(substance: Substance, temperatureK: number, path: FaultPath): never {
  return fail(outsideRangeFault(substance, temperatureK, path));
}

/** Describes that a temperature lies outside a substance's range. */
export function outsideRangeFault(substance: Substance, temperatureK: number, path: FaultPath): Fault {
  const { fromK, toK } = substancePlan(substance, "refuse");
  const range = fromK === toK ? `only at ${fromK} K` : `from ${fromK} K to ${toK} K`;
  return {
    code: "species/outside-range",
    path,
    message: `${cut(substance.label, 40)} is known ${range}, not at ${temperatureK} K`,
    received: `${temperatureK} K`,
    expected: range,
    ...(fromK === toK ? {} : { hint: policyHint }),
  };
}
