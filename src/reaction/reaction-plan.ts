import { cut, type FaultPath } from "../errors/fault.js";
import { fail, GibbsLedgerError } from "../errors/gibbs-ledger-error.js";
import { mergeSeries, type SeriesPlan } from "../heat-capacity/merge.js";
import { extendSeries, policyHint, type RangePolicy, rangePolicy } from "../heat-capacity/range-policy.js";
import { parseRational, type Rational } from "../numeric/rational.js";
import type { Label } from "../species/record.js";
import { isInRange, outsideRangeFault } from "../species/standard-properties.js";
import { substancePlan, substanceSeries } from "../species/substance-function.js";
import type { Reaction, ReactionPlans } from "./reaction.js";

/** The merged series of a reaction under a policy; absent: refuse. */
export function reactionPlan(plans: ReactionPlans, policy: RangePolicy | undefined): SeriesPlan {
  return policy === undefined && plans.refuse !== undefined ? plans.refuse : otherPlan(plans, policy);
}

function otherPlan(plans: ReactionPlans, policy: RangePolicy | undefined): SeriesPlan {
  return plans.others.get(policy ?? "refuse") ?? makePlan(plans, rangePolicy(policy));
}

/** Labels of species evaluated outside their own range. */
export function labelsOutside(reaction: Reaction, temperatureK: number): readonly Label[] {
  const outside = reaction.terms.filter(({ species }) => !isInRange(species, temperatureK));
  return outside.length === 0 ? noLabels : outside.map(({ label }) => label);
}

/** Throws that a temperature lies outside the range of one or more species, naming each. */
export function failReactionRange(reaction: Reaction, temperatureK: number, path: FaultPath = ["temperature"]): never {
  const faults = reaction.terms
    .filter(({ species }) => !isInRange(species, temperatureK))
    .map(({ species }) => outsideRangeFault(species, temperatureK, path));
  const [first, ...others] = faults;
  if (first === undefined) return failNoCommonRange(reaction);
  throw new GibbsLedgerError([first, ...others]);
}

const noLabels: readonly Label[] = Object.freeze([]);

function makePlan(plans: ReactionPlans, policy: RangePolicy): SeriesPlan {
  const merged = mergeSeries(
    plans.reaction.terms.map(({ exactCoefficient, species }) => ({
      coefficient: parseRational(exactCoefficient) as Rational,
      series: extendSeries(substanceSeries(species), policy),
    })),
  );
  if (merged === undefined) return failNoCommonRange(plans.reaction);
  plans.others.set(policy, merged);
  if (policy === "refuse") plans.refuse = merged;
  return merged;
}

function failNoCommonRange(reaction: Reaction): never {
  const ranges = reaction.terms.map(({ label, species }) => {
    const { fromK, toK } = substancePlan(species, "refuse");
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
