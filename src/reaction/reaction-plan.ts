import { cut, type FaultPath } from "../errors/fault.js";
import { fail, GibbsLedgerError } from "../errors/gibbs-ledger-error.js";
import { mergeSeries, type SeriesPlan } from "../heat-capacity/merge.js";
import { extendSeries, policyHint, type RangePolicy, rangePolicy } from "../heat-capacity/range-policy.js";
import { parseRational, type Rational } from "../numeric/rational.js";
import { speciesPlan, speciesSeries } from "../species/species-function.js";
import { isInRange, outsideRangeFault } from "../species/standard-properties.js";
import type { Label } from "../species/record.js";
import { houseReaction, type Reaction } from "./reaction.js";
import { type StandardStates, standardStateOf } from "./standard-state.js";

/** What the house knows of a reaction: its merged series by range policy, made when first asked for. */
export interface ReactionPlans {
  readonly reaction: Reaction;
  readonly standardStates: StandardStates;
  /** The plan of the usual policy stands by itself: looking it up by name would cost as much as evaluating it. */
  refuse: SeriesPlan | undefined;
  readonly others: Map<RangePolicy, SeriesPlan>;
}

const plansOfReaction = new WeakMap<Reaction, ReactionPlans>();

/** The plans of a reaction; one that is not of the house is checked, copied and frozen first. */
export function reactionPlans(reaction: Reaction): ReactionPlans {
  return plansOfReaction.get(reaction) ?? makePlans(reaction);
}

/** The merged series of a reaction under a policy; absent: refuse. */
export function reactionPlan(plans: ReactionPlans, policy: RangePolicy | undefined): SeriesPlan {
  if (policy === undefined && plans.refuse !== undefined) return plans.refuse;
  return plans.others.get(policy ?? "refuse") ?? makePlan(plans, rangePolicy(policy));
}

/** Labels of species evaluated outside their own range. */
export function labelsOutside(reaction: Reaction, temperatureK: number): readonly Label[] {
  const outside = reaction.terms.filter(({ species }) => !isInRange(species, temperatureK));
  return outside.length === 0 ? noLabels : outside.map(({ label }) => label);
}

/** Throws that a temperature lies outside the range of one or more species, naming each. */
export function failReactionRange(
  reaction: Reaction,
  temperatureK: number,
  path: FaultPath = ["temperature"],
): never {
  const faults = reaction.terms
    .filter(({ species }) => !isInRange(species, temperatureK))
    .map(({ species }) => outsideRangeFault(species, temperatureK, path));
  const [first, ...others] = faults;
  if (first === undefined) return failNoCommonRange(reaction);
  throw new GibbsLedgerError([first, ...others]);
}

const noLabels: readonly Label[] = Object.freeze([]);

function makePlans(value: Reaction): ReactionPlans {
  const reaction = houseReaction(value);
  let plans = plansOfReaction.get(reaction);
  if (plans === undefined) {
    const states = reaction.terms.map(({ label, species }) => [label, standardStateOf(species)] as const);
    plans = { reaction, standardStates: Object.freeze(Object.fromEntries(states)), refuse: undefined, others: new Map() };
    plansOfReaction.set(reaction, plans);
  }
  if (value !== reaction) plansOfReaction.set(value, plans);
  return plans;
}

function makePlan(plans: ReactionPlans, policy: RangePolicy): SeriesPlan {
  const merged = mergeSeries(
    plans.reaction.terms.map(({ exactCoefficient, species }) => ({
      coefficient: parseRational(exactCoefficient) as Rational,
      series: extendSeries(speciesSeries(species), policy),
    })),
  );
  if (merged === undefined) return failNoCommonRange(plans.reaction);
  plans.others.set(policy, merged);
  if (policy === "refuse") plans.refuse = merged;
  return merged;
}

function failNoCommonRange(reaction: Reaction): never {
  const ranges = reaction.terms.map(({ label, species }) => {
    const { fromK, toK } = speciesPlan(species, "refuse");
    return `${label} ${fromK} K to ${toK} K`;
  });
  return fail({
    code: "reaction/no-common-range",
    path: ["reaction"],
    message: `the ranges of the species do not meet: ${cut(ranges.join(", "), 300)}`,
    expected: "a temperature at which every species is known",
    hint: policyHint,
  });
}
