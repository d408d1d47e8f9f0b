import { describeReceived, type Fault } from "../errors/fault.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkArray, checkObject, checkOption } from "../errors/input.js";
import { evaluateColumns } from "../heat-capacity/columns.js";
import { intervalOf } from "../heat-capacity/evaluate.js";
import { type RangePolicy, rangePolicies } from "../heat-capacity/range-policy.js";
import { log } from "../numeric/log.js";
import { findRoot } from "../numeric/root.js";
import { checkPositiveQuantity, checkQuantity } from "../quantity/guards.js";
import type { MolarEnergy, Quantity, Temperature } from "../quantity/quantity.js";
import type { ReactionConditions } from "./conditions.js";
import type { Reaction } from "./reaction.js";
import { reactionPlans } from "./reaction.js";
import { gibbsEnergyOf, stateOfPresent } from "./reaction-gibbs-energy.js";
import { failReactionRange, reactionPlan } from "./reaction-plan.js";

/** Where to look for temperatures, and at what Gibbs energy and conditions. */
export interface TemperatureSearch {
  /** Gibbs energy of the reaction that is looked for; 0 when absent. */
  readonly gibbsEnergy?: MolarEnergy;
  /** Lower and upper end of the search, within the range of every species. */
  readonly between: readonly [from: Temperature, to: Temperature];
  /** Pressure and composition held; absent: the standard Gibbs energy is meant. */
  readonly conditions?: Omit<ReactionConditions, "temperature">;
  /** `"refuse"` when absent. Conditions have an `outsideRange` of their own, and beside them this one is refused. */
  readonly outsideRange?: RangePolicy;
}

/** Samples an interval of the series is cut into; the Gibbs energy of a fit turns far less often. */
const samplesPerInterval = 64;

/**
 * The temperatures at which the Gibbs energy of a reaction has a given value, in rising order: none, one or several.
 * At value 0 these are the temperatures at which the reaction turns.
 *
 * Every interval of the series is sampled, each change of sign is solved to the last bits, and where the curve turns
 * towards the value between two samples its extremum is looked up, so that a pair of near roots is not missed.
 *
 * @param reaction - what `reaction` returned
 * @param search - between which temperatures, at which Gibbs energy, and at which pressure and composition
 * @returns temperatures in kelvin; an empty array where the value is not met
 * @throws GibbsLedgerError "roots/empty-range", "species/outside-range", "input/conflicting-options" where
 * outsideRange stands beside conditions or these have a temperature, and the faults of conditions
 * @example
 * import { referenceData } from "gibbs-ledger/data";
 * const boudouard = reaction("C(cr,graphite) + CO2(g) = 2 CO(g)", referenceData);
 * const turns = temperaturesAtGibbsEnergy(boudouard, { between: [quantity(300, "K"), quantity(1500, "K")] });
 * turns.length; // => 1
 * turns[0]?.value; // => 973...
 */
export function temperaturesAtGibbsEnergy(
  reaction: Reaction,
  search: TemperatureSearch,
): Quantity<"temperature", "K">[] {
  const plans = reactionPlans(reaction);
  const { fromK, toK, target } = checkSearch(search);
  const { conditions } = search;
  const plan = reactionPlan(plans, conditions === undefined ? search.outsideRange : conditions.outsideRange);
  [fromK, toK].forEach((temperatureK, index) => {
    if (intervalOf(plan, temperatureK) === undefined)
      failReactionRange(plans.reaction, temperatureK, ["between", index]);
  });
  const distance = (temperatureK: number): number => {
    if (conditions !== undefined) {
      const temperature = { value: temperatureK, unit: "K" } as const;
      return gibbsEnergyOf(plans.reaction, stateOfPresent(plans.reaction, { ...conditions, temperature })) - target;
    }
    const { gibbsEnergy } = intervalOf(plan, temperatureK)!;
    return evaluateColumns(gibbsEnergy, temperatureK, log(temperatureK)) - target;
  };
  const inner = plan.intervals.map((interval) => interval.toK).filter((endK) => endK > fromK && endK < toK);
  const roots = rootsBetween(distance, samplePoints([fromK, ...inner, toK]));
  return roots.map((value) => ({ value, unit: "K" }));
}

interface CheckedSearch {
  readonly fromK: number;
  readonly toK: number;
  /** Gibbs energy in J/mol. */
  readonly target: number;
}

function checkSearch(search: TemperatureSearch): CheckedSearch {
  const faults: Fault[] = [];
  const members = checkObject(search, [], faults, {
    required: ["between"],
    optional: ["gibbsEnergy", "conditions", "outsideRange"],
  });
  failIfAny(members === undefined ? faults : []);
  const { gibbsEnergy, outsideRange, conditions } = members ?? {};
  if (conditions !== undefined) checkObject(conditions, ["conditions"], faults, { required: [], optional: "any" });
  if ((conditions as Partial<ReactionConditions> | null | undefined)?.temperature !== undefined) {
    faults.push({
      code: "input/conflicting-options",
      path: ["conditions", "temperature"],
      message: "the conditions of a search have no temperature: it is what is sought",
      expected: "between, for the temperatures to look at",
    });
  }
  if (conditions !== undefined && outsideRange !== undefined) {
    faults.push({
      code: "input/conflicting-options",
      path: ["outsideRange"],
      message: "outsideRange is given beside conditions, which have their own",
      received: describeReceived(outsideRange),
      expected: "conditions: { ..., outsideRange }",
    });
  }
  if (outsideRange !== undefined) checkOption(outsideRange, ["outsideRange"], faults, rangePolicies);
  const target = gibbsEnergy === undefined ? 0 : checkQuantity(gibbsEnergy, "molarEnergy", ["gibbsEnergy"], faults);
  const between = members?.between === undefined ? undefined : checkArray(members.between, ["between"], faults, 2);
  const [fromK, toK] = between === undefined ? [] : [0, 1].map((end) => collectEnd(between[end], end, faults));
  if (fromK !== undefined && toK !== undefined && !(fromK < toK)) {
    faults.push({
      code: "roots/empty-range",
      path: ["between"],
      message: `the search from ${describeReceived(fromK)} K to ${describeReceived(toK)} K is empty`,
      expected: "a lower and a higher temperature",
    });
  }
  failIfAny(faults);
  return { fromK: fromK!, toK: toK!, target: target! };
}

function collectEnd(value: unknown, end: number, faults: Fault[]): number | undefined {
  return checkPositiveQuantity(value, "temperature", ["between", end], faults);
}

function samplePoints(breaksK: readonly number[]): number[] {
  const points = [breaksK[0]!];
  for (let index = 1; index < breaksK.length; index += 1) {
    const lowerK = breaksK[index - 1]!;
    const upperK = breaksK[index]!;
    for (let step = 1; step < samplesPerInterval; step += 1) {
      points.push(lowerK + ((upperK - lowerK) * step) / samplesPerInterval);
    }
    points.push(upperK);
  }
  return points;
}

function rootsBetween(distance: (temperatureK: number) => number, pointsK: readonly number[]): number[] {
  const roots = new Set<number>();
  const values = pointsK.map(distance);
  const solve = (lowerK: number, upperK: number): void => {
    roots.add(findRoot(distance, lowerK, upperK));
  };
  for (let index = 0; index < pointsK.length; index += 1) {
    const here = values[index]!;
    if (here === 0) roots.add(pointsK[index]!);
    const next = values[index + 1];
    if (next !== undefined && here * next < 0) solve(pointsK[index]!, pointsK[index + 1]!);
    // At an end of the search the curve may turn between the end and its one neighbour.
    const [lower, upper] = [Math.max(0, index - 1), Math.min(pointsK.length - 1, index + 1)];
    const neighbours = [values[lower]!, values[upper]!];
    const isNearest = neighbours.every((value) => value * here > 0 && Math.abs(here) <= Math.abs(value));
    if (!isNearest) continue;
    const turnK = nearestApproach(distance, pointsK[lower]!, pointsK[upper]!);
    if (distance(turnK) * here <= 0) {
      solve(pointsK[lower]!, turnK);
      solve(turnK, pointsK[upper]!);
    }
  }
  return [...roots].sort((a, b) => a - b);
}

/** Golden-section search for the temperature where a curve of one sign comes nearest to zero, or crosses it. */
function nearestApproach(distance: (temperatureK: number) => number, lowerK: number, upperK: number): number {
  const sign = Math.sign(distance(lowerK));
  const ratio = (Math.sqrt(5) - 1) / 2;
  let [low, high] = [lowerK, upperK];
  let [left, right] = [high - ratio * (high - low), low + ratio * (high - low)];
  let [atLeft, atRight] = [sign * distance(left), sign * distance(right)];
  while (high - low > 1e-9 * high && atLeft > 0 && atRight > 0) {
    if (atLeft < atRight) {
      high = right;
      [right, atRight] = [left, atLeft];
      left = high - ratio * (high - low);
      atLeft = sign * distance(left);
    } else {
      low = left;
      [left, atLeft] = [right, atRight];
      right = low + ratio * (high - low);
      atRight = sign * distance(right);
    }
  }
  return atLeft < atRight ? left : right;
}
