import { gasConstantJPerMolK, standardPressurePa } from "../constants/constants.js";
import type { Fault, FaultPath } from "../errors/fault.js";
import { volumeWork } from "../fugacity/volume-work.js";
import { exactSum } from "../numeric/compensated.js";
import { log } from "../numeric/log.js";
import type { Label } from "../species/record.js";
import type { GasPhase } from "./gas-phase.js";
import type { ReactionTerm } from "./reaction.js";

/** What one species of the reaction contributes at the conditions. */
export interface TermState {
  readonly term: ReactionTerm;
  /** Where the species stands in the conditions. */
  readonly path: FaultPath;
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

/** The state of one term: by a given activity first, then in the gas, else as a pure condensed phase. */
export function termState(
  term: ReactionTerm,
  phase: GasPhase | undefined,
  activities: ReadonlyMap<Label, number>,
  temperatureK: number,
  pressurePa: number,
): TermState {
  const activity = activities.get(term.label);
  if (activity !== undefined) return { term, path: ["activities", term.label], kind: "given", activity };
  const moleFraction = phase?.moleFractions.get(term.label);
  if (moleFraction !== undefined) {
    const lnFugacityCoefficient = phase!.lnFugacityCoefficients.get(term.label)!;
    return { term, path: [...phase!.path, term.label], kind: "gas", moleFraction, lnFugacityCoefficient };
  }
  const work = volumeWork(term.species, temperatureK, pressurePa);
  return { term, path: [], kind: "pure", ...(work === undefined ? {} : { volumeWork: work }) };
}

/** Natural logarithm of the activity of a term; -Infinity where its fraction or activity is zero. */
export function lnActivity(state: TermState, temperatureK: number, pressurePa: number): number {
  if (state.kind === "given") return log(state.activity!);
  if (state.kind === "pure") return (state.volumeWork ?? 0) / (gasConstantJPerMolK * temperatureK);
  return exactSum([log(state.moleFraction!), state.lnFugacityCoefficient!, log(pressurePa / standardPressurePa)]);
}

/** Collects a fault for each reacting species of zero activity, saying which way the reaction then runs. */
export function checkZeroActivities(terms: readonly TermState[], faults: Fault[]): void {
  for (const { term, path, moleFraction, activity } of terms) {
    if ((moleFraction ?? activity) !== 0) continue;
    const forward = term.coefficient > 0;
    faults.push({
      code: "conditions/zero-activity",
      path,
      message: `${term.label} is absent, so the Gibbs energy of the reaction has no finite value`,
      received: "0",
      expected: "a positive fraction or activity of every reacting species",
      hint: `without ${term.label} the reaction can only run ${forward ? "forward" : "in reverse"}; reactionDirection answers without a number`,
    });
  }
}
