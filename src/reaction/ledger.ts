import { gasConstantJPerMolK, referenceTemperatureK, standardPressurePa } from "../constants/constants.js";
import { evaluateAll, intervalOf, type SeriesValues } from "../heat-capacity/evaluate.js";
import { exactSum } from "../numeric/compensated.js";
import { decimalToNumber } from "../numeric/exact-decimal.js";
import { log } from "../numeric/log.js";
import type { Figure } from "../quantity/figure.js";
import { figureStandardUncertainty } from "../quantity/figure-value.js";
import type { Quantity } from "../quantity/quantity.js";
import type { Source } from "../references/source.js";
import { type SpeciesGrade, speciesGrade } from "../species/grade.js";
import type { Label, SpeciesRecord } from "../species/record.js";
import { speciesPlan, standardPressureEntropy } from "../species/species-function.js";
import type { ReactionConditions } from "./conditions.js";
import type { Reaction } from "./reaction.js";
import { reactionPlans } from "./reaction.js";
import { gibbsEnergyOf, lnQuotientOf, stateOfPresent } from "./reaction-gibbs-energy.js";
import { labelsOutside } from "./reaction-plan.js";
import type { ReactionState } from "./reaction-state.js";
import type { StandardStates } from "./standard-state.js";
import type { TermState } from "./term-state.js";

/** What an entry of a ledger accounts for. */
export type LedgerEntryName =
  | "formation enthalpy"
  | "reference entropy"
  | "sensible heat"
  | "heat-capacity entropy"
  | "transition"
  | "standard pressure"
  | "pressure"
  | "composition"
  | "activity"
  | "non-ideality"
  | "volume";

/** The three parts of a ledger: the species at 298.15 K, the way to the temperature, the way to the conditions. */
export type LedgerGroup = "formation" | "temperature" | "conditions";

/** One line of a ledger: what one species contributes to the Gibbs energy of the reaction, and why. */
export interface LedgerEntry {
  readonly group: LedgerGroup;
  readonly entry: LedgerEntryName;
  readonly label: Label;
  /** Stoichiometric number. */
  readonly coefficient: number;
  /** The contribution; its standard uncertainty is absent where none is published. */
  readonly value: Quantity<"molarEnergy", "J/mol">;
  /** Where the figure comes from; absent for terms that follow from the conditions. */
  readonly source?: Source;
  /** The published figure that gives the uncertainty, where its source is another one. */
  readonly secondSource?: Source;
  /** What the reader has to know of this line. */
  readonly note?: string;
}

/** Sum of the entries of a group, with the standard uncertainty as far as it is known. */
export interface LedgerSum {
  readonly value: Quantity<"molarEnergy", "J/mol">;
  /** True where an entry of unknown uncertainty makes the stated one a lower bound. */
  readonly uncertaintyIsLowerBound: boolean;
}

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
 * @param conditions - temperature, pressure, the composition of the gas with its inerts, activities given by the caller
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
  const entries = state.terms.flatMap((term) => [...standardEntries(term, state), ...conditionEntries(term, state)]);
  const ordered = groups.flatMap((group) => entries.filter((entry) => entry.group === group));
  const sum = sumOf(ordered);
  const subtotals = Object.fromEntries(
    groups.map((group) => [group, sumOf(ordered.filter((entry) => entry.group === group))]),
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
    standardStates: plans.standardStates,
    grades: Object.fromEntries(house.terms.map(({ label, species }) => [label, speciesGrade(species)])),
    outsideRange: labelsOutside(house, state.temperatureK),
    notes: [...house.notes, ...state.notes, ...missingVolumes(state)],
  };
}

/** The entries that lead from the elements at 298.15 K to the standard state at the temperature. */
function standardEntries(term: TermState, state: ReactionState): LedgerEntry[] {
  const { species, coefficient, label } = term.term;
  const { temperatureK, policy } = state;
  const plan = speciesPlan(species, policy);
  const ownPlan = speciesPlan(species, "refuse");
  const anchorK =
    referenceTemperatureK >= ownPlan.fromK && referenceTemperatureK <= ownPlan.toK
      ? referenceTemperatureK
      : ownPlan.fromK;
  const atAnchor = evaluateAll(intervalOf(plan, anchorK)!, anchorK);
  const here = evaluateAll(intervalOf(plan, temperatureK)!, temperatureK);
  const shift = standardPressureEntropy(species);
  const shiftEntropy = shift === undefined ? 0 : decimalToNumber(shift);
  const jumps = transitionsBetween(species, anchorK, temperatureK);
  const jumpEnthalpy = exactSum(jumps.map(({ enthalpy }) => enthalpy));
  const jumpEntropy = exactSum(jumps.map(({ entropy }) => entropy));
  const source = sourceOf(species);
  const note = anchorK === referenceTemperatureK ? {} : { note: `at ${anchorK} K` };
  const make = (
    group: LedgerGroup,
    entry: LedgerEntryName,
    value: number,
    rest: Partial<LedgerEntry> = {},
    uncertainty?: number,
  ): LedgerEntry => ({
    group,
    entry,
    label,
    coefficient,
    value: tagged(coefficient * value, uncertainty === undefined ? undefined : Math.abs(coefficient * uncertainty)),
    ...rest,
  });
  const entropyUncertainty = figureStandardUncertainty(species.standardEntropy);
  const entries = [
    make(
      "formation",
      "formation enthalpy",
      atAnchor.enthalpy,
      { ...source, ...secondSource(species, species.formationEnthalpy), ...note },
      figureStandardUncertainty(species.formationEnthalpy),
    ),
    make(
      "formation",
      "reference entropy",
      -temperatureK * (atAnchor.entropy - shiftEntropy),
      { ...source, ...secondSource(species, species.standardEntropy), ...note },
      entropyUncertainty === undefined ? undefined : temperatureK * entropyUncertainty,
    ),
    make("temperature", "sensible heat", here.enthalpy - atAnchor.enthalpy - jumpEnthalpy, source),
    make(
      "temperature",
      "heat-capacity entropy",
      -temperatureK * (here.entropy - atAnchor.entropy - jumpEntropy),
      source,
    ),
    ...jumps.map((jump) =>
      make("temperature", "transition", jump.enthalpy - temperatureK * jump.entropy, {
        ...source,
        note: `at ${jump.temperatureK} K`,
      }),
    ),
  ];
  if (shift !== undefined) {
    entries.push(make("conditions", "standard pressure", -temperatureK * shiftEntropy, {}, 0));
  }
  return entries;
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
  if (state.kind === "given") return [make("activity", thermal * log(state.activity!), 0)];
  if (state.kind === "pure") {
    return state.volumeWork === undefined ? [] : [make("volume", coefficient * state.volumeWork)];
  }
  const nonIdeality = thermal * state.lnFugacityCoefficient!;
  return [
    make("pressure", thermal * log(pressurePa / standardPressurePa), 0),
    make("composition", thermal * log(state.moleFraction!), 0),
    ...(nonIdeality === 0 ? [] : [make("non-ideality", nonIdeality)]),
  ];
}

/** Jumps of H and S at first-order breaks between two temperatures, counted upward. */
function transitionsBetween(
  species: SpeciesRecord,
  anchorK: number,
  temperatureK: number,
): { readonly temperatureK: number; readonly enthalpy: number; readonly entropy: number }[] {
  const { gibbsFunction } = species;
  if (gibbsFunction.kind !== "series") return [];
  const plan = speciesPlan(species, "refuse");
  const sign = temperatureK >= anchorK ? 1 : -1;
  const [lowerK, upperK] = sign > 0 ? [anchorK, temperatureK] : [temperatureK, anchorK];
  return gibbsFunction.intervals.flatMap(({ to, endsAt }, index) => {
    if (endsAt !== "first-order" || index + 1 === gibbsFunction.intervals.length) return [];
    if (!(to >= lowerK && to < upperK)) return [];
    const below: SeriesValues = evaluateAll(plan.intervals[index]!, to);
    const above: SeriesValues = evaluateAll(plan.intervals[index + 1]!, to);
    return [
      {
        temperatureK: to,
        enthalpy: sign * (above.enthalpy - below.enthalpy),
        entropy: sign * (above.entropy - below.entropy),
      },
    ];
  });
}

function missingVolumes({ terms, pressurePa }: ReactionState): string[] {
  if (pressurePa === standardPressurePa) return [];
  return terms
    .filter(({ kind, volumeWork }) => kind === "pure" && volumeWork === undefined)
    .map(({ term }) => `${term.label} has no molar volume; its volume work is left out`);
}

function sourceOf({ gibbsFunction, formationEnthalpy }: SpeciesRecord): { readonly source?: Source } {
  const source = gibbsFunction.kind === "series" ? gibbsFunction.source : formationEnthalpy?.source;
  return source === undefined ? {} : { source };
}

function secondSource(species: SpeciesRecord, figure: Figure | undefined): { readonly secondSource?: Source } {
  const first = sourceOf(species).source;
  return figure === undefined || isSameSource(figure.source, first) ? {} : { secondSource: figure.source };
}

/** Sources in a user's own words are the same where the words are. */
function isSameSource(a: Source, b: Source | undefined): boolean {
  return typeof a === "object" && typeof b === "object" ? a.text === b.text : a === b;
}

/** Independent entries add in quadrature: each datum stands in one entry only. */
function sumOf(entries: readonly LedgerEntry[]): LedgerSum {
  const known = entries.map(({ value }) => value.standardUncertainty).filter((u) => u !== undefined);
  const squares = exactSum(known.map((u) => u * u));
  return {
    value: tagged(exactSum(entries.map(({ value }) => value.value)), Math.sqrt(squares)),
    uncertaintyIsLowerBound: known.length < entries.length,
  };
}

function tagged(value: number, standardUncertainty: number | undefined): Quantity<"molarEnergy", "J/mol"> {
  const base = { value: value + 0, unit: "J/mol" } as const;
  return standardUncertainty === undefined ? base : { ...base, standardUncertainty };
}
