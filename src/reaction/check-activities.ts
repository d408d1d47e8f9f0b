import { cut, describeReceived, type Fault } from "../errors/fault.js";
import { checkObject } from "../errors/input.js";
import { unknownLabel } from "../fugacity/check-fractions.js";
import type { Label } from "../species/record.js";
import { isElectron, stateOf } from "../species/substance.js";
import type { CheckedGas } from "./gas-phase.js";
import type { Reaction } from "./reaction.js";
import type { CheckedSolution } from "./solution-phase.js";

/** Reads the activities that the caller gives, and collects every fault. */
export function collectActivities(value: unknown, reaction: Reaction, faults: Fault[]): ReadonlyMap<Label, number> {
  const activities = new Map<Label, number>();
  if (value === undefined) return activities;
  const members = checkObject(value, ["activities"], faults, { required: [], optional: "any" });
  if (members === undefined) return activities;
  const labels = reaction.terms.filter(({ species }) => !isElectron(species)).map(({ label }) => label);
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

/** What describes the species of a reaction, and which of the phases can be trusted to be complete. */
export interface Described {
  readonly gas: CheckedGas | undefined;
  readonly isGasSound: boolean;
  readonly solution: CheckedSolution | undefined;
  readonly isSolutionSound: boolean;
  readonly activities: ReadonlyMap<Label, number>;
}

/** Collects a fault for each gas and dissolved species of the reaction that no phase and no activity describes. */
export function requireActivities(reaction: Reaction, described: Described, faults: Fault[]): void {
  const { gas, isGasSound, solution, isSolutionSound, activities } = described;
  const inGas = new Set(gas?.species.map(({ label }) => label));
  const dissolved = new Set(solution?.components.solutes.map(({ label }) => label));
  for (const { label, species } of reaction.terms) {
    const state = stateOf(species);
    if (activities.has(label)) continue;
    if (state === "g" && isGasSound && !inGas.has(label)) {
      faults.push({
        code: "conditions/missing-composition",
        path: [...(gas?.path ?? ["gas", "moleFractions"]), label],
        message: `${label} has neither a fraction in gas nor an activity`,
        expected: `gas: { moleFractions: { "${label}": ... } }`,
      });
    }
    if (state === "aq" && isSolutionSound && !dissolved.has(label)) faults.push(missingSolute(label, solution));
  }
}

function missingSolute(label: Label, solution: CheckedSolution | undefined): Fault {
  if (solution === undefined) {
    return {
      code: "conditions/missing-activity",
      path: ["activities", label],
      message: `the dissolved ${label} has no activity`,
      expected: `activities: { "${label}": ... }, or a solution that names it`,
    };
  }
  return {
    code: "conditions/missing-composition",
    path: [...solution.path, label],
    message: `the dissolved ${label} has neither an amount in solution nor an activity`,
    expected: `solution: { ${solution.path.at(-1)}: { "${label}": ... } }`,
  };
}
