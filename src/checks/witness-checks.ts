import type { Fault } from "../errors/fault.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkArray, checkObject } from "../errors/input.js";
import type { CollectionData, SpeciesRecord, Witness, WitnessCheckName } from "../species/record.js";
import {
  closureAtBreaks,
  entropyAtReference,
  statisticalMechanicsEntropy,
  statisticalMechanicsHeatContent,
  tabulatedEnthalpyIncrement,
  tabulatedEntropy,
  tabulatedHeatCapacity,
} from "./caloric-checks.js";
import { cellPotential, cellTemperatureCoefficient } from "./cell-checks.js";
import { acentricFactorFromBoilingPoint, criticalCompressibility } from "./critical-checks.js";
import {
  dissociationEnergy,
  enthalpyAtReference,
  equilibriumConstant,
  equilibriumPressure,
  formationEnthalpyAtZero,
  formationGibbsEnergy,
  reactionEnthalpy,
  reactionEntropy,
} from "./formation-checks.js";
import { transitionEnthalpy, transitionGibbsEnergy, transitionTemperature } from "./transition-checks.js";
import { molarVolumeFromDensity, unitCellVolume } from "./volume-checks.js";
import { missing } from "./witness-inputs.js";

type WitnessCheck = (record: SpeciesRecord, witness: Witness, collection: CollectionData) => number;

const witnessChecks: Readonly<Record<WitnessCheckName, WitnessCheck>> = {
  "closure-at-breaks": closureAtBreaks,
  "entropy-at-298.15-K": entropyAtReference,
  "tabulated-heat-capacity": tabulatedHeatCapacity,
  "tabulated-entropy": tabulatedEntropy,
  "tabulated-enthalpy-increment": tabulatedEnthalpyIncrement,
  "statistical-mechanics-entropy": statisticalMechanicsEntropy,
  "statistical-mechanics-heat-content": statisticalMechanicsHeatContent,
  "enthalpy-at-298.15-K": enthalpyAtReference,
  "reaction-enthalpy": reactionEnthalpy,
  "dissociation-energy": dissociationEnergy,
  "formation-enthalpy-at-0-K": formationEnthalpyAtZero,
  "equilibrium-constant": equilibriumConstant,
  "equilibrium-pressure": equilibriumPressure,
  "reaction-entropy": reactionEntropy,
  "formation-gibbs-energy": formationGibbsEnergy,
  "cell-potential": cellPotential,
  "cell-temperature-coefficient": cellTemperatureCoefficient,
  "transition-enthalpy": transitionEnthalpy,
  "transition-gibbs-energy": transitionGibbsEnergy,
  "transition-temperature": transitionTemperature,
  "critical-compressibility": criticalCompressibility,
  "acentric-factor-from-boiling-point": acentricFactorFromBoilingPoint,
  "unit-cell-volume": unitCellVolume,
  "molar-volume-from-density": molarVolumeFromDensity,
};

/** A witness with its deviation computed anew. */
export interface RecomputedWitness {
  readonly witness: Witness;
  /** The deviation that the named check computes now, in the check's own unit. */
  readonly computed: number;
  /** Whether it lies within the witness's tolerance. */
  readonly confirms: boolean;
}

/**
 * The deviation that the named check of a witness computes, in the check's own unit: J/mol, J/mol/K, K, V, V/K, or a
 * plain number for closures, logarithms, factors and relative deviations.
 *
 * @param record - whose figures are checked
 * @param witness - one of the record's, or another with the figures its check compares with
 * @param collection - where the other species of a reaction are found
 * @throws GibbsLedgerError "checks/no-inputs" where a figure is missing; "species/outside-range", "species/no-reference";
 * every fault of what is no record, witness or collection
 * @example
 * import { N2_g, referenceData } from "gibbs-ledger/data";
 * const [closure] = N2_g.witnesses;
 * closure.check; // => "closure-at-breaks"
 * Math.abs(computeWitness(N2_g, closure, referenceData)) < 1e-7; // => true
 */
export function computeWitness(record: SpeciesRecord, witness: Witness, collection: CollectionData): number {
  const faults: Fault[] = [];
  checkObject(record, ["record"], faults, { required: ["label"], optional: "any" });
  checkObject(witness, ["witness"], faults, { required: ["check"], optional: "any" });
  const members = checkObject(collection, ["collection"], faults, { required: ["species"], optional: ["sequences"] });
  if (members?.species !== undefined) checkArray(members.species, ["collection", "species"], faults);
  failIfAny(faults);
  const check = Object.hasOwn(witnessChecks, witness.check) ? witnessChecks[witness.check] : undefined;
  if (check === undefined) return missing(record, witness.check, `a check of a known name, not "${witness.check}"`);
  return check(record, witness, collection);
}

/**
 * Computes every witness of a record anew.
 *
 * @param record - whose figures are checked
 * @param collection - where the other species of its reactions are found
 * @throws GibbsLedgerError "checks/no-inputs" where a figure is missing; "species/outside-range", "species/no-reference";
 * every fault of what is no record, witness or collection
 * @example
 * import { H2O_g, referenceData } from "gibbs-ledger/data";
 * recomputeWitnesses(H2O_g, referenceData).every(({ confirms }) => confirms); // => true
 */
export function recomputeWitnesses(record: SpeciesRecord, collection: CollectionData): RecomputedWitness[] {
  const faults: Fault[] = [];
  const members = checkObject(record, ["record"], faults, { required: ["label", "witnesses"], optional: "any" });
  if (members?.witnesses !== undefined) checkArray(members.witnesses, ["record", "witnesses"], faults, 1000);
  failIfAny(faults);
  return record.witnesses.map((witness) => {
    const computed = computeWitness(record, witness, collection);
    return { witness, computed, confirms: Math.abs(computed) <= witness.tolerance };
  });
}
