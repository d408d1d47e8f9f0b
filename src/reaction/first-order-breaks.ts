import { evaluateAll, intervalOf, type SeriesValues } from "../heat-capacity/evaluate.js";
import { figureInSi } from "../quantity/figure-value.js";
import type { Source } from "../references/source.js";
import { joinTemperaturesK, phaseMultiples } from "../species/join-phases.js";
import type { Label, SpeciesRecord } from "../species/record.js";
import { speciesPlan } from "../species/species-function.js";
import { isElectron, isSequence, type StableSequence, type Substance } from "../species/substance.js";
import { figureStandardUncertainty } from "../uncertainty/figure-uncertainty.js";

/** A step of H and S at a temperature, counted in the direction of the walk. */
export interface FirstOrderBreak {
  readonly atK: number;
  /** J/mol */
  readonly enthalpy: number;
  /** J/mol/K */
  readonly entropy: number;
  /** The phase beyond a join of a sequence, in the direction of the walk. */
  readonly into?: Label;
  /** Standard uncertainty of the published enthalpy of transition, J/mol. */
  readonly standardUncertainty: number | undefined;
  readonly source: Source;
}

/** The steps that a substance passes between two temperatures: its own first-order breaks and its changes of phase. */
export function firstOrderBreaks(substance: Substance, anchorK: number, temperatureK: number): FirstOrderBreak[] {
  if (isElectron(substance)) return [];
  const sign = temperatureK >= anchorK ? 1 : -1;
  const [lowerK, upperK] = sign > 0 ? [anchorK, temperatureK] : [temperatureK, anchorK];
  const isPassed = ({ atK }: FirstOrderBreak): boolean => atK >= lowerK && atK < upperK;
  const upward = isSequence(substance) ? breaksOfSequence(substance, sign) : breaksInside(substance);
  return upward.filter(isPassed).map((one) => ({ ...one, enthalpy: sign * one.enthalpy, entropy: sign * one.entropy }));
}

/** The first-order breaks within the fit of one phase, upward. */
function breaksInside(record: SpeciesRecord): FirstOrderBreak[] {
  const { gibbsFunction, transitions = [] } = record;
  if (gibbsFunction.kind !== "series") return [];
  const { intervals } = speciesPlan(record, "refuse");
  return gibbsFunction.intervals.slice(0, -1).flatMap(({ to, endsAt }, index) => {
    if (endsAt !== "first-order") return [];
    const published = transitions.find(({ temperature }) => figureInSi(temperature) === to);
    return [
      {
        ...step(evaluateAll(intervals[index]!, to), evaluateAll(intervals[index + 1]!, to)),
        atK: to,
        standardUncertainty: figureStandardUncertainty(published?.enthalpy),
        source: gibbsFunction.source,
      },
    ];
  });
}

/** The breaks inside the phases where they are stable, and the joins between them, upward. */
function breaksOfSequence(sequence: StableSequence, sign: number): FirstOrderBreak[] {
  const { phases, source } = sequence;
  const joinsK = joinTemperaturesK(sequence);
  const multiples = phaseMultiples(sequence).map(Number);
  return phases.flatMap((phase, index) => {
    const multiple = multiples[index]!;
    const [fromK, toK] = [joinsK[index - 1] ?? 0, joinsK[index] ?? Number.POSITIVE_INFINITY];
    const inside = breaksInside(phase)
      .filter(({ atK }) => atK > fromK && atK < toK)
      .map((one) => multiplied(one, multiple));
    const upper = phases[index + 1];
    if (upper === undefined) return inside;
    const below = multiplied(valuesAt(phase, toK), multiple);
    const above = multiplied(valuesAt(upper, toK), multiples[index + 1]!);
    const published = phase.transitions?.find(({ into }) => into === upper.label);
    const known = figureStandardUncertainty(published?.enthalpy);
    const join = {
      ...step(below, above),
      atK: toK,
      into: sign > 0 ? upper.label : phase.label,
      standardUncertainty: known === undefined ? undefined : known * multiple,
      source,
    };
    return [...inside, join];
  });
}

function valuesAt(record: SpeciesRecord, temperatureK: number): SeriesValues {
  return evaluateAll(intervalOf(speciesPlan(record, "refuse"), temperatureK)!, temperatureK);
}

type HeatAndEntropy = { readonly enthalpy: number; readonly entropy: number };

function step(below: HeatAndEntropy, above: HeatAndEntropy): HeatAndEntropy {
  return { enthalpy: above.enthalpy - below.enthalpy, entropy: above.entropy - below.entropy };
}

function multiplied<T extends HeatAndEntropy & { readonly standardUncertainty?: number | undefined }>(
  one: T,
  multiple: number,
): T {
  const { enthalpy, entropy, standardUncertainty } = one;
  return {
    ...one,
    enthalpy: multiple * enthalpy,
    entropy: multiple * entropy,
    ...(standardUncertainty === undefined ? {} : { standardUncertainty: multiple * standardUncertainty }),
  };
}
