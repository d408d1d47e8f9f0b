import { cut, describeReceived, type Fault } from "../errors/fault.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkArray, checkObject, checkOption } from "../errors/input.js";
import { unknownLabel } from "../fugacity/check-fractions.js";
import { type RangePolicy, rangePolicies } from "../heat-capacity/range-policy.js";
import { checkPositiveQuantity } from "../quantity/guards.js";
import { collectHouseRecord } from "../species/house-record.js";
import type { Label, SpeciesRecord } from "../species/record.js";
import type { ReactionConditions } from "./conditions.js";
import { type CheckedGas, checkGas, evaluateGas } from "./gas-phase.js";
import type { Reaction } from "./reaction.js";
import { type TermState, termState } from "./term-state.js";

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
    members?.gas === undefined ? undefined : checkGas(members.gas, reaction, inerts, activities, pressurePa, faults);
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
        path: [...(gas?.path ?? ["gas", "moleFractions"]), label],
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
