import type { Fault } from "../errors/fault.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkObject, checkOption } from "../errors/input.js";
import { type RangePolicy, rangePolicies } from "../heat-capacity/range-policy.js";
import { checkPositiveQuantity } from "../quantity/guards.js";
import type { Label, SpeciesRecord } from "../species/record.js";
import { isRecord } from "../species/substance.js";
import { collectActivities, requireActivities } from "./check-activities.js";
import { checkPlaces, collectInerts } from "./check-inerts.js";
import { checkSolution } from "./check-solution.js";
import type { ReactionConditions } from "./conditions.js";
import { type CheckedGas, checkGas, evaluateGas } from "./gas-phase.js";
import type { Reaction } from "./reaction.js";
import { evaluateSolution } from "./solution-phase.js";
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
  /** Name of the activity model, where there is a solution. */
  readonly activityModel?: string;
  /** What the phases say of themselves: validity of their models, charges that do not balance. */
  readonly notes: readonly string[];
}

const conditionKeys = {
  required: ["temperature", "pressure"],
  optional: ["gas", "solution", "activities", "inerts", "outsideRange"],
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
  const isStartSound = faults.length === before;
  const gas =
    members?.gas === undefined ? undefined : checkGas(members.gas, reaction, inerts, activities, pressurePa, faults);
  const afterGas = faults.length;
  const solution =
    members?.solution === undefined
      ? undefined
      : checkSolution(
          members.solution,
          { reacting: recordsOf(reaction), inerts, activities, inGas: labelsOf(gas) },
          faults,
        );
  // What is missing shows only in phases that are sound, and partial pressures need the pressure.
  const isPressureSound = pressurePa !== undefined || members?.gas === undefined;
  const isGasSound = isStartSound && isPressureSound && afterGas === before;
  const isSolutionSound = isStartSound && faults.length === afterGas;
  checkPlaces(inerts, members?.gas !== undefined, members?.solution !== undefined, faults);
  requireActivities(reaction, { gas, isGasSound, solution, isSolutionSound, activities }, faults);
  failIfAny(faults);
  const gasPhase = gas === undefined ? undefined : evaluateGas(gas, temperatureK!, pressurePa!);
  const solutionPhase = solution === undefined ? undefined : evaluateSolution(solution, temperatureK!, pressurePa!);
  const surroundings = {
    temperatureK: temperatureK!,
    pressurePa: pressurePa!,
    gas: gasPhase,
    solution: solutionPhase,
    activities,
  };
  return {
    temperatureK: temperatureK!,
    pressurePa: pressurePa!,
    policy: conditions.outsideRange ?? "refuse",
    terms: reaction.terms.map((term) => termState(term, surroundings)),
    ...(gasPhase === undefined ? {} : { equationOfState: gasPhase.equationOfState }),
    ...(solutionPhase === undefined ? {} : { activityModel: solutionPhase.activityModel }),
    notes: [...(gasPhase?.notes ?? []), ...(solutionPhase?.notes ?? [])],
  };
}

function recordsOf({ terms }: Reaction): readonly SpeciesRecord[] {
  return terms.map(({ species }) => species).filter(isRecord);
}

function labelsOf(gas: CheckedGas | undefined): ReadonlySet<Label> {
  return new Set(gas?.species.map(({ label }) => label));
}

function collectPositive(value: unknown, dimension: "temperature" | "pressure", faults: Fault[]): number | undefined {
  // Absent: the keys have been checked before.
  return value === undefined ? undefined : checkPositiveQuantity(value, dimension, [dimension], faults);
}
