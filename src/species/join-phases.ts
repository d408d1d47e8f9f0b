import type { Fault, FaultPath } from "../errors/fault.js";
import { formula } from "../formula/formula.js";
import { lowerEndK, upperEndK } from "../heat-capacity/exact-series.js";
import {
  compareRationals,
  divideRationals,
  isZeroRational,
  parseRational,
  type Rational,
} from "../numeric/rational.js";
import { figureInSi } from "../quantity/figure-value.js";
import type { SpeciesRecord } from "./record.js";
import { speciesSeries } from "./species-function.js";
import type { StableSequence } from "./substance.js";

/** What says in what order phases follow each other, and of how much substance. */
type PhasesOf = Pick<StableSequence, "label" | "formula" | "chargeNumber" | "phases">;

/**
 * The temperatures at which the phases of a checked sequence meet: that of the lower phase's transition into the upper
 * one, or the point that their ranges share.
 */
export function joinTemperaturesK({ phases }: PhasesOf): number[] {
  return phases.slice(1).map((upper, index) => joinTemperatureK(phases[index]!, upper)!);
}

/** How often the formula of each phase of a checked sequence goes into that of the sequence. */
export function phaseMultiples(sequence: PhasesOf): bigint[] {
  return sequence.phases.map((phase) => multipleOf(sequence, phase)!);
}

/**
 * Checks that phases can be joined: each phase's formula goes a whole number of times into that of the sequence, and
 * neighbours meet at a temperature in the ranges of both, above the one before.
 */
export function checkJoins(sequence: PhasesOf, path: FaultPath, faults: Fault[]): void {
  let beforeK = 0;
  sequence.phases.forEach((phase, index) => {
    const here = [...path, "phases", index];
    if (multipleOf(sequence, phase) === undefined) {
      faults.push({
        code: "species/inconsistent",
        path: here,
        message: `${phase.label} does not go a whole number of times into ${sequence.label}`,
        received: phase.label,
        expected: `phases of ${sequence.formula}`,
      });
    }
    if (index === 0) return;
    const lower = sequence.phases[index - 1]!;
    const joinK = joinTemperatureK(lower, phase);
    if (joinK === undefined) {
      faults.push({
        code: "species/no-join",
        path: here,
        message: `nothing says at what temperature ${lower.label} turns into ${phase.label}`,
        expected: `an entry of transitions of ${lower.label} into ${phase.label}, or ranges that share one point`,
      });
      return;
    }
    const [fromK, toK] = [lowerEndK(speciesSeries(phase)), upperEndK(speciesSeries(lower))];
    if (!(joinK >= fromK && joinK <= toK && joinK > beforeK && joinK < upperEndK(speciesSeries(phase)))) {
      faults.push({
        code: "species/no-join",
        path: here,
        message: `${lower.label}, known to ${toK} K, cannot meet ${phase.label}, known from ${fromK} K, at ${joinK} K`,
        received: `${joinK} K`,
        expected: "a temperature in the ranges of both, above the join before",
      });
    }
    beforeK = joinK;
  });
}

function joinTemperatureK(lower: SpeciesRecord, upper: SpeciesRecord): number | undefined {
  const transition = lower.transitions?.find(({ into }) => into === upper.label);
  if (transition !== undefined) return figureInSi(transition.temperature);
  const endK = upperEndK(speciesSeries(lower));
  return lowerEndK(speciesSeries(upper)) === endK ? endK : undefined;
}

function multipleOf(sequence: PhasesOf, phase: SpeciesRecord): bigint | undefined {
  const whole = countsOf(sequence);
  const part = countsOf(phase);
  let multiple: Rational | undefined;
  for (const [element, count] of whole) {
    const other = part.get(element);
    if (other === undefined || isZeroRational(other)) return undefined;
    const ratio = divideRationals(count, other);
    if (multiple !== undefined && compareRationals(ratio, multiple) !== 0) return undefined;
    multiple = ratio;
  }
  if (multiple === undefined || multiple.denominator !== 1n || part.size !== whole.size) return undefined;
  const chargeAgrees = BigInt(phase.chargeNumber) * multiple.numerator === BigInt(sequence.chargeNumber);
  return chargeAgrees ? multiple.numerator : undefined;
}

function countsOf({ formula: text }: { readonly formula: string }): Map<string, Rational> {
  const { exactCounts } = formula(text);
  return new Map(Object.entries(exactCounts).map(([element, count]) => [element, parseRational(count) as Rational]));
}
