import { gasConstantJPerMolK, standardPressurePa } from "../constants/constants.js";
import { cut, describeReceived, type Fault, type FaultPath } from "../errors/fault.js";
import { fail, failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkArray, checkObject, checkOption } from "../errors/input.js";
import type { EquationOfState } from "../fugacity/equation-of-state.js";
import { gasComponentOf } from "../fugacity/gas-component-of.js";
import { idealGas } from "../fugacity/ideal-gas.js";
import { volumeWork } from "../fugacity/volume-work.js";
import { type RangePolicy, rangePolicies } from "../heat-capacity/range-policy.js";
import { exactSum } from "../numeric/compensated.js";
import { log } from "../numeric/log.js";
import { checkPositiveQuantity, checkQuantity } from "../quantity/guards.js";
import type { Pressure, Temperature } from "../quantity/quantity.js";
import { collectHouseRecord } from "../species/house-record.js";
import type { Label, SpeciesRecord } from "../species/record.js";
import type { Reaction, ReactionTerm } from "./reaction.js";

/** Numbers by label of a species. */
export type LabelMap<V = number> = Readonly<Record<Label, V>>;

/** Composition of the gas phase, inerts included, and how it departs from the ideal gas. */
export type GasComposition = (
  | { readonly moleFractions: LabelMap; readonly partialPressures?: never }
  | { readonly partialPressures: LabelMap<Pressure>; readonly moleFractions?: never }
) & {
  /** `idealGas()` when absent. */
  readonly equationOfState?: EquationOfState;
};

/** The real state that a reaction is looked at in. */
export interface ReactionConditions {
  /** Above 0 K. */
  readonly temperature: Temperature;
  /** Total pressure, above 0 Pa. */
  readonly pressure: Pressure;
  /** The gas phase: every gas of the reaction and every inert, fractions that sum to 1 within 1e-9. */
  readonly gas?: GasComposition;
  /** Activities given by the caller, for species that no phase here describes. */
  readonly activities?: LabelMap;
  /** Species of the gas phase that take no part in the reaction. */
  readonly inerts?: readonly SpeciesRecord[];
  /** `"refuse"` when absent. */
  readonly outsideRange?: RangePolicy;
}

/** What one species of the reaction contributes at the conditions. */
export interface TermState {
  readonly term: ReactionTerm;
  /** How its activity came about: as a gas, as a pure condensed phase, or given by the caller. */
  readonly kind: "gas" | "pure" | "given";
  /** Mole fraction of a gas. */
  readonly moleFraction?: number;
  /** Natural logarithm of the fugacity coefficient of a gas. */
  readonly lnFugacityCoefficient?: number;
  /** Activity given by the caller. */
  readonly activity?: number;
  /** Volume work on a pure condensed phase in J/mol; absent where the record has no volume. */
  readonly volumeWork?: number;
}

/** Checked conditions in raw doubles. */
export interface ReactionState {
  readonly temperatureK: number;
  readonly pressurePa: number;
  readonly policy: RangePolicy;
  /** In the order of the reaction's terms. */
  readonly terms: readonly TermState[];
  /** Name of the equation of state, where there is a gas. */
  readonly equationOfState?: string;
  /** What an equation of state says of its validity. */
  readonly notes: readonly string[];
}

/** Largest departure of a sum of fractions from 1. */
export const fractionTolerance = 1e-9;

const conditionKeys = {
  required: ["temperature", "pressure"],
  optional: ["gas", "activities", "inerts", "outsideRange"],
} as const;

/**
 * Checks conditions against a reaction of the house and evaluates the phases.
 *
 * @throws GibbsLedgerError with every fault of the conditions at once
 */
export function reactionState(reaction: Reaction, conditions: ReactionConditions): ReactionState {
  const faults: Fault[] = [];
  const members = checkObject(conditions, [], faults, conditionKeys);
  failIfAny(members === undefined ? faults : []);
  const temperatureK = collectPositive(members?.temperature, "temperature", faults);
  const pressurePa = collectPositive(members?.pressure, "pressure", faults);
  if (members?.outsideRange !== undefined) checkOption(members.outsideRange, ["outsideRange"], faults, rangePolicies);
  const before = faults.length;
  const inerts = collectInerts(members?.inerts, reaction, faults);
  const activities = collectActivities(members?.activities, reaction, faults);
  const gas =
    members?.gas === undefined ? undefined : collectGas(conditions, reaction, inerts, activities, pressurePa, faults);
  // What is missing shows only in phases that are sound, and partial pressures need the pressure.
  const isReadable = pressurePa !== undefined || members?.gas === undefined;
  if (faults.length === before && isReadable) requireActivities(reaction, gas, activities, faults);
  failIfAny(faults);
  const phase = gas === undefined ? undefined : evaluateGas(gas, temperatureK!, pressurePa!);
  return {
    temperatureK: temperatureK!,
    pressurePa: pressurePa!,
    policy: conditions.outsideRange ?? "refuse",
    terms: reaction.terms.map((term) => termState(term, phase, activities, temperatureK!, pressurePa!)),
    ...(phase === undefined ? {} : { equationOfState: phase.equationOfState }),
    notes: phase?.notes ?? [],
  };
}

/** Natural logarithm of the activity of a term; -Infinity where its fraction or activity is zero. */
export function lnActivity(state: TermState, temperatureK: number, pressurePa: number): number {
  if (state.kind === "given") return log(state.activity!);
  if (state.kind === "pure") return (state.volumeWork ?? 0) / (gasConstantJPerMolK * temperatureK);
  return exactSum([log(state.moleFraction!), state.lnFugacityCoefficient!, log(pressurePa / standardPressurePa)]);
}

/** Collects a fault for each reacting species of zero activity, saying which way the reaction then runs. */
export function checkZeroActivities(state: ReactionState, faults: Fault[]): void {
  for (const { term, kind, moleFraction, activity } of state.terms) {
    if ((kind === "gas" ? moleFraction : activity) !== 0) continue;
    const forward = term.coefficient > 0;
    faults.push({
      code: "conditions/zero-activity",
      path: kind === "gas" ? ["gas", term.label] : ["activities", term.label],
      message: `${term.label} is absent, so the Gibbs energy of the reaction has no finite value`,
      received: "0",
      expected: "a positive fraction or activity of every reacting species",
      hint: `without ${term.label} the reaction can only run ${forward ? "forward" : "in reverse"}; reactionDirection answers without a number`,
    });
  }
}

function collectPositive(value: unknown, dimension: "temperature" | "pressure", faults: Fault[]): number | undefined {
  // Absent: the keys have been checked before.
  return value === undefined ? undefined : checkPositiveQuantity(value, dimension, [dimension], faults);
}

function collectInerts(value: unknown, reaction: Reaction, faults: Fault[]): SpeciesRecord[] {
  if (value === undefined) return [];
  const labels = new Set(reaction.terms.map(({ label }) => label));
  const inerts: SpeciesRecord[] = [];
  checkArray(value, ["inerts"], faults, 1000)?.forEach((entry, index) => {
    const record = collectHouseRecord(entry, ["inerts", index], faults);
    if (record === undefined) return;
    if (labels.has(record.label)) {
      faults.push({
        code: "conditions/duplicate-label",
        path: ["inerts", index],
        message: `${record.label} takes part in the reaction or is listed twice`,
        received: cut(record.label),
        expected: "species that take no part, each once",
      });
    } else if (record.state !== "g") {
      faults.push({
        code: "conditions/unknown-label",
        path: ["inerts", index],
        message: `the inert ${record.label} is no gas`,
        received: cut(record.label),
        expected: "gases, which dilute the gas phase",
      });
    }
    labels.add(record.label);
    inerts.push(record);
  });
  return inerts;
}

function collectActivities(value: unknown, reaction: Reaction, faults: Fault[]): ReadonlyMap<Label, number> {
  const activities = new Map<Label, number>();
  if (value === undefined) return activities;
  const members = checkObject(value, ["activities"], faults, { required: [], optional: "any" });
  if (members === undefined) return activities;
  const labels = reaction.terms.map(({ label }) => label);
  for (const [label, activity] of Object.entries(members)) {
    if (!labels.includes(label)) {
      faults.push(unknownLabel(label, ["activities", cut(label)], labels, "a species of the reaction"));
    } else if (typeof activity !== "number" || !(activity >= 0 && activity < Number.POSITIVE_INFINITY)) {
      faults.push({
        code: "conditions/invalid-fraction",
        path: ["activities", label],
        message: `an activity is a finite number from 0 up, got ${describeReceived(activity)}`,
        received: describeReceived(activity),
        expected: "a number of dimension one",
      });
    } else {
      activities.set(label, activity);
    }
  }
  return activities;
}

interface CheckedGas {
  readonly equationOfState: EquationOfState;
  /** Sorted by label, so that results do not depend on the order in which a composition is written. */
  readonly species: readonly SpeciesRecord[];
  readonly moleFractions: readonly number[];
}

function collectGas(
  conditions: ReactionConditions,
  reaction: Reaction,
  inerts: readonly SpeciesRecord[],
  activities: ReadonlyMap<Label, number>,
  pressurePa: number | undefined,
  faults: Fault[],
): CheckedGas | undefined {
  const gas = checkObject(conditions.gas, ["gas"], faults, {
    required: [],
    optional: ["moleFractions", "partialPressures", "equationOfState"],
  });
  if (gas === undefined) return undefined;
  const equationOfState = collectEquationOfState(gas.equationOfState, faults);
  const species = new Map<Label, SpeciesRecord>();
  for (const { label, species: record } of reaction.terms) if (record.state === "g") species.set(label, record);
  for (const record of inerts) species.set(record.label, record);
  const fractions = collectFractions(gas, pressurePa, faults);
  if (fractions === undefined) return undefined;
  const labels = [...species.keys()];
  const inert = new Set(inerts.map(({ label }) => label));
  for (const label of fractions.keys()) {
    if (!species.has(label)) {
      faults.push(unknownLabel(label, ["gas", cut(label)], labels, "a gas of the reaction, or of inerts"));
    } else if (activities.has(label)) {
      faults.push({
        code: "conditions/duplicate-label",
        path: ["activities", label],
        message: `${label} is given in gas and in activities`,
        received: cut(label),
        expected: "each species once",
      });
    }
  }
  for (const label of inert) {
    if (!fractions.has(label)) {
      faults.push({
        code: "conditions/missing-composition",
        path: ["gas", label],
        message: `the inert ${label} has no fraction in gas`,
        expected: `a fraction of ${label}`,
      });
    }
  }
  if (equationOfState === undefined) return undefined;
  const present = labels.filter((label) => fractions.has(label)).sort();
  return {
    equationOfState,
    species: present.map((label) => species.get(label)!),
    moleFractions: present.map((label) => fractions.get(label)!),
  };
}

function collectEquationOfState(value: unknown, faults: Fault[]): EquationOfState | undefined {
  if (value === undefined) return idealGas();
  const model = value as Partial<EquationOfState> | null;
  if (typeof model === "object" && typeof model?.name === "string" && typeof model.mixture === "function") {
    return model as EquationOfState;
  }
  faults.push({
    code: "input/not-an-object",
    path: ["gas", "equationOfState"],
    message: `expected an equation of state, got ${describeReceived(value)}`,
    received: describeReceived(value),
    expected: "what idealGas(), virial() or another equation of state returns",
    ...(typeof value === "function" ? { hint: "call it: virial()" } : {}),
  });
  return undefined;
}

type FractionMembers = { readonly moleFractions?: unknown; readonly partialPressures?: unknown };

function collectFractions(
  gas: FractionMembers,
  pressurePa: number | undefined,
  faults: Fault[],
): ReadonlyMap<Label, number> | undefined {
  const given = (["moleFractions", "partialPressures"] as const).filter((key) => gas[key] !== undefined);
  if (given.length !== 1) {
    faults.push({
      code: given.length === 0 ? "conditions/missing-composition" : "conditions/duplicate-label",
      path: ["gas"],
      message: given.length === 0 ? "the gas has no composition" : "the gas has mole fractions and partial pressures",
      expected: "either moleFractions or partialPressures",
    });
    return undefined;
  }
  const key = given[0]!;
  const members = checkObject(gas[key], ["gas", key], faults, { required: [], optional: "any" });
  if (members === undefined) return undefined;
  const before = faults.length;
  const fractions = new Map<Label, number>();
  for (const [label, value] of Object.entries(members)) {
    const path = ["gas", key, cut(label)];
    const fraction =
      key === "moleFractions" ? fractionOf(value, path, faults) : fractionOfPressure(value, pressurePa, path, faults);
    if (fraction !== undefined) fractions.set(label, fraction);
  }
  if (faults.length === before && (key === "moleFractions" || pressurePa !== undefined)) {
    checkSum(fractions, key, pressurePa, faults);
  }
  return fractions;
}

function fractionOf(value: unknown, path: FaultPath, faults: Fault[]): number | undefined {
  if (typeof value === "number" && value >= 0 && value <= 1) return value;
  faults.push({
    code: "conditions/invalid-fraction",
    path,
    message: `a mole fraction is a number from 0 to 1, got ${describeReceived(value)}`,
    received: describeReceived(value),
    expected: "from 0 to 1",
    ...(typeof value === "number" && value > 1 && value <= 100 ? { hint: `${value / 100} for ${value} per cent` } : {}),
  });
  return undefined;
}

function fractionOfPressure(
  value: unknown,
  pressurePa: number | undefined,
  path: FaultPath,
  faults: Fault[],
): number | undefined {
  const before = faults.length;
  const partialPa = checkQuantity(value, "pressure", path, faults);
  if (partialPa === undefined || faults.length > before) return undefined;
  if (partialPa < 0) {
    faults.push({
      code: "conditions/invalid-fraction",
      path,
      message: "a partial pressure is not negative",
      received: `${partialPa} Pa`,
      expected: "at least 0 Pa",
    });
    return undefined;
  }
  return pressurePa === undefined ? undefined : partialPa / pressurePa;
}

function checkSum(
  fractions: ReadonlyMap<Label, number>,
  key: "moleFractions" | "partialPressures",
  pressurePa: number | undefined,
  faults: Fault[],
): void {
  const sum = exactSum([...fractions.values()]);
  if (Math.abs(sum - 1) <= fractionTolerance) return;
  faults.push(
    key === "moleFractions"
      ? {
          code: "conditions/fractions-do-not-sum",
          path: ["gas", key],
          message: `the mole fractions of the gas sum to ${sum}, not to 1`,
          received: String(sum),
          expected: `1 within ${fractionTolerance}`,
          hint: "list inert gases too; nothing is renormalised",
        }
      : {
          code: "conditions/pressure-mismatch",
          path: ["gas", key],
          message: `the partial pressures sum to ${sum * (pressurePa ?? 1)} Pa, the pressure is ${pressurePa} Pa`,
          received: `${sum * (pressurePa ?? 1)} Pa`,
          expected: `${pressurePa} Pa within a relative ${fractionTolerance}`,
          hint: "list inert gases too; nothing is renormalised",
        },
  );
}

function requireActivities(
  reaction: Reaction,
  gas: CheckedGas | undefined,
  activities: ReadonlyMap<Label, number>,
  faults: Fault[],
): void {
  const inGas = new Set(gas?.species.map(({ label }) => label));
  for (const { label, species } of reaction.terms) {
    if (activities.has(label) || inGas.has(label)) continue;
    if (species.state === "g") {
      faults.push({
        code: "conditions/missing-composition",
        path: ["gas", label],
        message: `${label} has neither a fraction in gas nor an activity`,
        expected: `gas: { moleFractions: { "${label}": ... } }`,
      });
    } else if (species.state === "aq") {
      faults.push({
        code: "conditions/missing-activity",
        path: ["activities", label],
        message: `the dissolved ${label} has no activity`,
        expected: `activities: { "${label}": ... }`,
      });
    }
  }
}

interface GasPhase {
  readonly equationOfState: string;
  readonly moleFractions: ReadonlyMap<Label, number>;
  readonly lnFugacityCoefficients: ReadonlyMap<Label, number>;
  readonly notes: readonly string[];
}

function evaluateGas(gas: CheckedGas, temperatureK: number, pressurePa: number): GasPhase {
  const components = gas.species.map((record) => gasComponentOf(record, ["gas", record.label]));
  const mixture = gas.equationOfState.mixture(components, ["gas"]);
  const { lnFugacityCoefficients, outsideValidity } = mixture.state(temperatureK, pressurePa, gas.moleFractions);
  gas.species.forEach(({ label }, index) => {
    if (!Number.isFinite(lnFugacityCoefficients[index])) failFugacity(gas.equationOfState.name, label);
  });
  return {
    equationOfState: gas.equationOfState.name,
    moleFractions: new Map(gas.species.map(({ label }, index) => [label, gas.moleFractions[index]!])),
    lnFugacityCoefficients: new Map(gas.species.map(({ label }, index) => [label, lnFugacityCoefficients[index]!])),
    notes: outsideValidity === undefined ? [] : [outsideValidity],
  };
}

/** An equation of state of the caller's own may give anything. */
function failFugacity(name: string, label: Label): never {
  return fail({
    code: "fugacity/unphysical",
    path: ["gas", label],
    message: `the equation of state ${describeReceived(name)} gives no finite fugacity coefficient of ${label}`,
    expected: "the logarithm of a fugacity coefficient for every gas",
  });
}

function termState(
  term: ReactionTerm,
  phase: GasPhase | undefined,
  activities: ReadonlyMap<Label, number>,
  temperatureK: number,
  pressurePa: number,
): TermState {
  const activity = activities.get(term.label);
  if (activity !== undefined) return { term, kind: "given", activity };
  const moleFraction = phase?.moleFractions.get(term.label);
  if (moleFraction !== undefined) {
    return { term, kind: "gas", moleFraction, lnFugacityCoefficient: phase!.lnFugacityCoefficients.get(term.label)! };
  }
  const work = volumeWork(term.species, temperatureK, pressurePa);
  return { term, kind: "pure", ...(work === undefined ? {} : { volumeWork: work }) };
}

/** A bare key such as `N2` gets the label that it most likely means. */
function unknownLabel(label: string, path: FaultPath, labels: readonly Label[], expected: string): Fault {
  const meant = labels.find((candidate) => candidate.startsWith(`${label}(`) || candidate.startsWith(`${label}^`));
  return {
    code: "conditions/unknown-label",
    path,
    message: `${describeReceived(label)} belongs to no species here`,
    received: cut(label),
    expected: `${expected}: ${cut(labels.join(", "), 200)}`,
    ...(meant === undefined ? {} : { hint: `did you mean "${meant}"?` }),
  };
}
