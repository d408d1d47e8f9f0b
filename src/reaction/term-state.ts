import { gasConstantJPerMolK, standardPressurePa } from "../constants/constants.js";
import type { Fault, FaultPath } from "../errors/fault.js";
import { fail } from "../errors/gibbs-ledger-error.js";
import { volumeWork } from "../fugacity/volume-work.js";
import { exactSum } from "../numeric/compensated.js";
import { log } from "../numeric/log.js";
import type { Label } from "../species/record.js";
import { isElectron } from "../species/substance.js";
import { phaseAt } from "../species/substance-function.js";
import type { GasPhase } from "./gas-phase.js";
import type { ReactionTerm } from "./reaction.js";
import type { SolutionPhase } from "./solution-phase.js";

interface TermPlace {
  readonly term: ReactionTerm;
  /** Where the species stands in the conditions. */
  readonly path: FaultPath;
}

interface CondensedTerm extends TermPlace {
  /** Volume work in J/mol from the standard pressure on; absent where the record has no volume. */
  readonly volumeWork?: number;
}

/** A gas of the gas phase. */
export interface GasTerm extends TermPlace {
  readonly kind: "gas";
  readonly moleFraction: number;
  readonly lnFugacityCoefficient: number;
}

/** A pure condensed phase. */
export interface PureTerm extends CondensedTerm {
  readonly kind: "pure";
}

/** A component of the solution other than the solvent. */
export interface SoluteTerm extends CondensedTerm {
  readonly kind: "solute";
  /** Molality over 1 mol/kg, or mole fraction in a mixture of liquids. */
  readonly amount: number;
  readonly lnActivityCoefficient: number;
}

/** The solvent of the solution. */
export interface SolventTerm extends CondensedTerm {
  readonly kind: "solvent";
  /** Of the ideal solution of the same composition, relative to the pure liquid at the same pressure. */
  readonly lnIdealActivity: number;
  /** By the activity model, relative to the pure liquid at the same pressure. */
  readonly lnSolventActivity: number;
}

/** A species whose activity the caller gives. */
export interface GivenTerm extends TermPlace {
  readonly kind: "given";
  readonly activity: number;
}

/** The electron of the standard-hydrogen convention, of activity 1 and in no phase. */
export interface ElectronTerm extends TermPlace {
  readonly kind: "electron";
}

/** What one species of the reaction contributes at the conditions, by how its activity came about. */
export type TermState = GasTerm | PureTerm | SoluteTerm | SolventTerm | GivenTerm | ElectronTerm;

/** What is known of the state besides the reaction. */
export interface Surroundings {
  readonly temperatureK: number;
  readonly pressurePa: number;
  readonly gas: GasPhase | undefined;
  readonly solution: SolutionPhase | undefined;
  readonly activities: ReadonlyMap<Label, number>;
}

/** The state of one term: by a given activity first, then in the gas or the solution, else as a pure condensed phase. */
export function termState(term: ReactionTerm, surroundings: Surroundings): TermState {
  const { temperatureK, pressurePa, gas, solution, activities } = surroundings;
  const { label, species } = term;
  if (isElectron(species)) return { term, path: [], kind: "electron" };
  const activity = activities.get(label);
  if (activity !== undefined) return { term, path: ["activities", label], kind: "given", activity };
  const moleFraction = gas?.moleFractions.get(label);
  if (moleFraction !== undefined) {
    const lnFugacityCoefficient = gas!.lnFugacityCoefficients.get(label)!;
    return { term, path: [...gas!.path, label], kind: "gas", moleFraction, lnFugacityCoefficient };
  }
  const work = volumeWork(phaseAt(species, temperatureK), temperatureK, pressurePa);
  if (work !== undefined && !(Math.abs(work) <= largestWork)) refuseVolumeWork(label, pressurePa);
  const volume = work === undefined ? {} : { volumeWork: work };
  const solute = solution?.solutes.get(label);
  if (solute !== undefined) return { term, path: [...solution!.path, label], kind: "solute", ...solute, ...volume };
  if (label === solution?.solvent) {
    const { lnIdealActivity, lnSolventActivity } = solution;
    return { term, path: ["solution", "solvent"], kind: "solvent", lnIdealActivity, lnSolventActivity, ...volume };
  }
  return { term, path: [], kind: "pure", ...volume };
}

/** Volume work in J/mol below which no sum over a reaction overflows. */
const largestWork = 1e290;

function refuseVolumeWork(label: Label, pressurePa: number): never {
  return fail({
    code: "quantity/overflow",
    path: ["pressure"],
    message: `the volume work of ${label} at ${pressurePa} Pa is too large for a double`,
    received: `${pressurePa} Pa`,
    expected: "a pressure at which the volume of a condensed phase has a meaning",
  });
}

/** Natural logarithm of the activity of a term; -Infinity where the species is absent. */
export function lnActivity(state: TermState, temperatureK: number, pressurePa: number): number {
  if (isAbsent(state)) return Number.NEGATIVE_INFINITY;
  switch (state.kind) {
    case "electron":
      return 0;
    case "given":
      return log(state.activity);
    case "gas":
      return exactSum([log(state.moleFraction), state.lnFugacityCoefficient, log(pressurePa / standardPressurePa)]);
    case "pure":
      return lnVolume(state, temperatureK);
    case "solute":
      return exactSum([log(state.amount), state.lnActivityCoefficient, lnVolume(state, temperatureK)]);
    case "solvent":
      return exactSum([state.lnSolventActivity, lnVolume(state, temperatureK)]);
  }
}

function lnVolume(state: CondensedTerm, temperatureK: number): number {
  return (state.volumeWork ?? 0) / (gasConstantJPerMolK * temperatureK);
}

/** Whether the fraction, the molality or the activity of a species is zero. */
export function isAbsent(state: TermState): boolean {
  switch (state.kind) {
    case "gas":
      return state.moleFraction === 0;
    case "solute":
      return state.amount === 0;
    case "given":
      return state.activity === 0;
    default:
      return false;
  }
}

/** Whether the volume work of a condensed or dissolved species is left out because its record has no volume. */
export function lacksVolume(state: TermState): boolean {
  switch (state.kind) {
    case "pure":
    case "solute":
    case "solvent":
      return state.volumeWork === undefined;
    default:
      return false;
  }
}

/** Collects a fault for each reacting species of zero activity, saying which way the reaction then runs. */
export function checkZeroActivities(terms: readonly TermState[], faults: Fault[]): void {
  for (const state of terms) {
    if (!isAbsent(state)) continue;
    const { term, path } = state;
    const forward = term.coefficient > 0;
    faults.push({
      code: "conditions/zero-activity",
      path,
      message: `${term.label} is absent, so the Gibbs energy of the reaction has no finite value`,
      received: "0",
      expected: "a positive fraction, molality or activity of every reacting species",
      hint: `without ${term.label} the reaction can only run ${forward ? "forward" : "in reverse"}; reactionDirection answers without a number`,
    });
  }
}
