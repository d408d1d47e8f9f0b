import { describeReceived, type Fault } from "../errors/fault.js";
import { fail, failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkObject } from "../errors/input.js";
import { evaluateColumns } from "../heat-capacity/columns.js";
import type { SeriesFunction } from "../heat-capacity/evaluate.js";
import type { SeriesPlan } from "../heat-capacity/merge.js";
import type { RangePolicy } from "../heat-capacity/range-policy.js";
import { log } from "../numeric/log.js";
import type { Reaction } from "../reaction/reaction.js";
import { reactionPlans } from "../reaction/reaction.js";
import { reactionPlan } from "../reaction/reaction-plan.js";
import { lnOfConstant } from "../species/ln-of-constant.js";

/** What is fixed when a reaction is compiled. */
export interface CompileOptions {
  /** `"refuse"` when absent. */
  readonly outsideRange?: RangePolicy;
}

/**
 * Evaluates one standard property over an array of temperatures in kelvin.
 *
 * @param temperaturesK - each above 0 K and within the range, in any order
 * @param out - takes the results, as long as `temperaturesK`; may be the same array, but not overlap it otherwise
 * @returns `out`
 */
export type ArrayFunction = (temperaturesK: Float64Array, out: Float64Array) => Float64Array;

/** A reaction compiled to functions over arrays; each gives the bits of the scalar functions of the same name. */
export interface CompiledReaction {
  readonly equation: string;
  /** Lower end of the range in kelvin. */
  readonly fromK: number;
  /** Upper end of the range in kelvin; 100,000 K where the policy goes on beyond the fits. */
  readonly toK: number;
  /** Heat capacity of reaction in J/mol/K. */
  readonly heatCapacity: ArrayFunction;
  /** Enthalpy of reaction in J/mol. */
  readonly enthalpy: ArrayFunction;
  /** Entropy of reaction in J/mol/K. */
  readonly entropy: ArrayFunction;
  /** Gibbs energy of reaction in J/mol. */
  readonly gibbsEnergy: ArrayFunction;
  /** Natural logarithm of the equilibrium constant. */
  readonly lnK: ArrayFunction;
}

/**
 * Compiles a reaction to functions over typed arrays: the series of its species are merged once, exactly, so that the
 * cost of a temperature does not grow with the number of species. Nothing is allocated per call.
 *
 * @param reaction - what `reaction` returned
 * @param options - the range policy
 * @throws GibbsLedgerError "reaction/no-common-range"; the functions throw "compiled/not-a-float-array",
 * "compiled/length-mismatch", "compiled/overlapping-arrays" and "heat-capacity/outside-range" with the index of the
 * first offending temperature, before anything is written
 * @remarks Arithmetic: the bits of `standardReactionProperties`, whatever the length or order of the array.
 * @example
 * import { referenceData } from "gibbs-ledger/data";
 * const compiled = compileReaction(reaction("N2 + 3 H2 = 2 NH3", referenceData));
 * const out = compiled.gibbsEnergy(Float64Array.of(300, 700, 1100), new Float64Array(3));
 * out.length; // => 3
 */
export function compileReaction(reaction: Reaction, options: CompileOptions = {}): CompiledReaction {
  const faults: Fault[] = [];
  checkObject(options, [], faults, { required: [], optional: ["outsideRange"] });
  failIfAny(faults);
  const plans = reactionPlans(reaction);
  const plan = reactionPlan(plans, options.outsideRange);
  return Object.freeze({
    equation: plans.reaction.equation,
    fromK: plan.fromK,
    toK: plan.toK,
    heatCapacity: plan.heatCapacityKnown ? arrayFunction(plan, "heatCapacity") : noHeatCapacity,
    enthalpy: arrayFunction(plan, "enthalpy"),
    entropy: arrayFunction(plan, "entropy"),
    gibbsEnergy: arrayFunction(plan, "gibbsEnergy"),
    lnK: arrayFunction(plan, "gibbsEnergy", lnOfConstant),
  });
}

function arrayFunction(
  plan: SeriesPlan,
  name: SeriesFunction,
  finish?: (value: number, temperatureK: number) => number,
): ArrayFunction {
  const combinations = plan.intervals.map((interval) => interval[name]);
  const ends = plan.intervals.map(({ toK }) => toK);
  return (temperaturesK, out) => {
    checkArrays(temperaturesK, out);
    checkTemperatures(plan, temperaturesK);
    for (let place = 0; place < temperaturesK.length; place += 1) {
      const temperatureK = temperaturesK[place]!;
      let index = 0;
      while (temperatureK > ends[index]!) index += 1;
      const value = evaluateColumns(combinations[index]!, temperatureK, log(temperatureK));
      out[place] = finish === undefined ? value : finish(value, temperatureK);
    }
    return out;
  };
}

function noHeatCapacity(): never {
  return fail({
    code: "heat-capacity/not-available",
    path: [],
    message: "a species of the reaction publishes H and S at 298.15 K only",
    expected: "species with a heat capacity",
  });
}

function checkArrays(temperaturesK: unknown, out: unknown): void {
  const faults: Fault[] = [];
  for (const [name, value] of [
    ["temperaturesK", temperaturesK],
    ["out", out],
  ] as const) {
    if (value instanceof Float64Array) continue;
    faults.push({
      code: "compiled/not-a-float-array",
      path: [name],
      message: `expected a Float64Array, got ${describeReceived(value)}`,
      received: describeReceived(value),
      expected: "a Float64Array",
      ...(Array.isArray(value) ? { hint: "Float64Array.from(array)" } : {}),
    });
  }
  failIfAny(faults);
  const [given, taken] = [temperaturesK as Float64Array, out as Float64Array];
  if (given.length !== taken.length) {
    fail({
      code: "compiled/length-mismatch",
      path: ["out"],
      message: `out has ${taken.length} places for ${given.length} temperatures`,
      received: String(taken.length),
      expected: String(given.length),
    });
  }
  const distance = Math.abs(given.byteOffset - taken.byteOffset);
  if (given.buffer !== taken.buffer || distance === 0 || distance >= given.byteLength) return;
  fail({
    code: "compiled/overlapping-arrays",
    path: ["out"],
    message: "out overlaps temperaturesK, so that results would overwrite temperatures still to be read",
    expected: "the same array, or one that shares no memory with it",
  });
}

function checkTemperatures(plan: SeriesPlan, temperaturesK: Float64Array): void {
  const { fromK, toK } = plan;
  for (let place = 0; place < temperaturesK.length; place += 1) {
    const temperatureK = temperaturesK[place]!;
    if (temperatureK >= fromK && temperatureK <= toK) continue;
    fail({
      code: "heat-capacity/outside-range",
      path: ["temperaturesK", place],
      message: `${temperatureK} K at index ${place} lies outside the range of the reaction`,
      received: `${temperatureK} K`,
      expected: `${fromK} K to ${toK} K`,
    });
  }
}
