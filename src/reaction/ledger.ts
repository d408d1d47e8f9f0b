import { gasConstantJPerMolK, standardPressurePa } from "../constants/constants.js";
import { log } from "../numeric/log.js";
import type { Quantity } from "../quantity/quantity.js";
import { type SpeciesGrade, speciesGrade } from "../species/grade.js";
import type { Label } from "../species/record.js";
import { phaseAt } from "../species/substance-function.js";
import type { ReactionConditions } from "./conditions.js";
import { type LedgerEntry, type LedgerEntryName, type LedgerGroup, tagged } from "./ledger-entry.js";
import { type LedgerSum, sumOfEntries } from "./ledger-sum.js";
import type { Reaction } from "./reaction.js";
import { reactionPlans } from "./reaction.js";
import { gibbsEnergyOf, lnQuotientOf, stateOfPresent } from "./reaction-gibbs-energy.js";
import { labelsOutside } from "./reaction-plan.js";
import type { ReactionState } from "./reaction-state.js";
import { standardEntries } from "./standard-entries.js";
import type { StandardStates } from "./standard-state.js";
import { lacksVolume, type TermState } from "./term-state.js";

/** The itemised account of a Gibbs energy of reaction. */
export interface Ledger {
  readonly equation: string;
  readonly temperature: Quantity<"temperature", "K">;
  readonly pressure: Quantity<"pressure", "Pa">;
  readonly entries: readonly LedgerEntry[];
  readonly subtotals: Readonly<Record<LedgerGroup, LedgerSum>>;
  /** The sum of all entries, per mole of reaction as written. */
  readonly total: Quantity<"molarEnergy", "J/mol">;
  /** True where the uncertainty of the total is a lower bound. */
  readonly uncertaintyIsLowerBound: boolean;
  /** The same Gibbs energy from the merged series, the other route. */
  readonly directGibbsEnergy: Quantity<"molarEnergy", "J/mol">;
  readonly lnReactionQuotient: number;
  /** Name of the equation of state, where there is a gas. */
  readonly equationOfState?: string;
  /** Name of the activity model, where there is a solution. */
  readonly activityModel?: string;
  readonly standardStates: StandardStates;
  /** Grade of each species' data, by group of figures. */
  readonly grades: Readonly<Record<Label, SpeciesGrade>>;
  /** Labels of the species evaluated outside their own range. */
  readonly outsideRange: readonly Label[];
  readonly notes: readonly string[];
}

const groups: readonly LedgerGroup[] = ["formation", "temperature", "conditions"];

/**
 * Opens the Gibbs energy of a reaction at its real conditions into an itemised account: what each species contributes
 * by its enthalpy of formation, reference entropy, sensible heat, heat-capacity entropy, standard pressure, pressure,
 * composition, non-ideality and volume, each with unit, source and uncertainty. The entries sum to the total.
 *
 * @param reaction - what `reaction` returned
 * @param conditions - temperature, pressure, composition of gas and solution with their inerts, activities given by
 * the caller
 * @returns plain data; {@link formatLedger} prints it
 * @throws GibbsLedgerError as {@link reactionGibbsEnergy}
 * @remarks Arithmetic: the total equals the direct route within 1e-12 of the largest entry.
 * @example
 * import { referenceData } from "gibbs-ledger/data";
 * const synthesis = reaction("N2(g) + 3 H2(g) = 2 NH3(g)", referenceData);
 * const account = ledger(synthesis, {
 *   temperature: quantity(700, "K"),
 *   pressure: quantity(1, "bar"),
 *   gas: { moleFractions: { "N2(g)": 0.2, "H2(g)": 0.6, "NH3(g)": 0.2 } },
 * });
 * account.entries.length; // => 18
 */
export function ledger(reaction: Reaction, conditions: ReactionConditions): Ledger {
  const plans = reactionPlans(reaction);
  const house = plans.reaction;
  const state = stateOfPresent(house, conditions);
  const direct = gibbsEnergyOf(house, state);
  const entries = state.terms.flatMap((term) => [
    ...standardEntries(term.term, state.temperatureK, state.policy),
    ...conditionEntries(term, state),
  ]);
  const ordered = groups.flatMap((group) => entries.filter((entry) => entry.group === group));
  const sum = sumOfEntries(ordered);
  const subtotals = Object.fromEntries(
    groups.map((group) => [group, sumOfEntries(ordered.filter((entry) => entry.group === group))]),
  ) as Record<LedgerGroup, LedgerSum>;
  return {
    equation: house.equation,
    temperature: { value: state.temperatureK, unit: "K" },
    pressure: { value: state.pressurePa, unit: "Pa" },
    entries: ordered,
    subtotals,
    total: sum.value,
    uncertaintyIsLowerBound: sum.uncertaintyIsLowerBound,
    directGibbsEnergy: { value: direct, unit: "J/mol" },
    lnReactionQuotient: lnQuotientOf(state),
    ...(state.equationOfState === undefined ? {} : { equationOfState: state.equationOfState }),
    ...(state.activityModel === undefined ? {} : { activityModel: state.activityModel }),
    standardStates: plans.standardStates,
    grades: Object.fromEntries(
      house.terms.map(({ label, species }) => [label, speciesGrade(phaseAt(species, state.temperatureK))]),
    ),
    outsideRange: labelsOutside(house, state.temperatureK),
    notes: [...house.notes, ...state.notes, ...missingVolumes(state)],
  };
}

/** The entries that lead from the standard state to the real pressure and composition. */
function conditionEntries(state: TermState, { temperatureK, pressurePa }: ReactionState): LedgerEntry[] {
  const { label, coefficient } = state.term;
  const thermal = coefficient * gasConstantJPerMolK * temperatureK;
  const make = (entry: LedgerEntryName, value: number, uncertainty?: number): LedgerEntry => ({
    group: "conditions",
    entry,
    label,
    coefficient,
    value: tagged(value, uncertainty),
  });
  const volume = (work: number | undefined): LedgerEntry[] =>
    work === undefined ? [] : [make("volume", coefficient * work)];
  const nonIdeality = (ln: number): LedgerEntry[] => (ln === 0 ? [] : [make("non-ideality", thermal * ln)]);
  switch (state.kind) {
    case "electron":
      return [];
    case "given":
      return [make("activity", thermal * log(state.activity), 0)];
    case "pure":
      return volume(state.volumeWork);
    case "gas":
      return [
        make("pressure", thermal * log(pressurePa / standardPressurePa), 0),
        make("composition", thermal * log(state.moleFraction), 0),
        ...nonIdeality(state.lnFugacityCoefficient),
      ];
    case "solute":
      return [
        make("composition", thermal * log(state.amount), 0),
        ...nonIdeality(state.lnActivityCoefficient),
        ...volume(state.volumeWork),
      ];
    case "solvent":
      return [
        make("composition", thermal * state.lnIdealActivity, 0),
        ...nonIdeality(state.lnSolventActivity - state.lnIdealActivity),
        ...volume(state.volumeWork),
      ];
  }
}

function missingVolumes({ terms, pressurePa }: ReactionState): string[] {
  if (pressurePa === standardPressurePa) return [];
  return terms.filter(lacksVolume).map(({ term }) => `${term.label} has no molar volume; its volume work is left out`);
}
