import type { ExactSeries, PiecewiseSeries } from "../heat-capacity/exact-series.js";
import type { SeriesPlan } from "../heat-capacity/merge.js";
import { type PlannedSeries, plannedSeries, planOfSeries } from "../heat-capacity/planned-series.js";
import type { RangePolicy } from "../heat-capacity/range-policy.js";
import { defaultDigits } from "../heat-capacity/read-series.js";
import { decimalOf, decimalToNumber, type ExactDecimal, multiplyDecimals } from "../numeric/exact-decimal.js";
import { joinTemperaturesK, phaseMultiples } from "./join-phases.js";
import type { SpeciesRecord } from "./record.js";
import { exactSpeciesSeries, speciesPlan, speciesSeries, standardPressureEntropy } from "./species-function.js";
import { isElectron, isRecord, type StableSequence, type Substance } from "./substance.js";

const plannedSubstances = new WeakMap<Substance, PlannedSeries>();

const half: ExactDecimal = decimalOf(0.5);

/** The exact series of a substance of the house at 1 bar: of its record, of its phases joined, or of 1/2 H2(g). */
export function substanceSeries(substance: Substance): PiecewiseSeries {
  return isRecord(substance) ? speciesSeries(substance) : plannedSubstance(substance).series;
}

/** The merged plan of one substance under a range policy. */
export function substancePlan(substance: Substance, policy: RangePolicy): SeriesPlan {
  return isRecord(substance) ? speciesPlan(substance, policy) : planOfSeries(plannedSubstance(substance), policy);
}

/** The series of a substance with its constants solved to a number of digits. */
export function exactSubstanceSeries(substance: Substance, digits: number): PiecewiseSeries {
  if (isRecord(substance)) return exactSpeciesSeries(substance, digits);
  if (isElectron(substance)) return multiplied(exactSpeciesSeries(substance.hydrogen, digits), half);
  return joined(substance, digits);
}

/** The record that a substance is at a temperature: itself, the stable phase, or H2(g) for the electron. */
export function phaseAt(substance: Substance, temperatureK: number): SpeciesRecord {
  if (isRecord(substance)) return substance;
  if (isElectron(substance)) return substance.hydrogen;
  const joinsK = joinTemperaturesK(substance);
  const index = joinsK.findIndex((joinK) => temperatureK <= joinK);
  return substance.phases[index < 0 ? substance.phases.length - 1 : index]!;
}

/** The record whose figures at 298.15 K a substance opens with, and how much of it. */
export function openingRecord(substance: Substance): { readonly record: SpeciesRecord; readonly share: number } {
  if (isRecord(substance)) return { record: substance, share: 1 };
  if (isElectron(substance)) return { record: substance.hydrogen, share: 0.5 };
  return { record: substance.phases[0]!, share: Number(phaseMultiples(substance)[0]!) };
}

/** What the entropy of a substance gains by the change of its standard pressure to 1 bar; J/mol/K. */
export function standardPressureShift(substance: Substance): number | undefined {
  const { record, share } = openingRecord(substance);
  const shift = standardPressureEntropy(record);
  return shift === undefined ? undefined : share * decimalToNumber(shift);
}

function plannedSubstance(substance: Substance): PlannedSeries {
  let planned = plannedSubstances.get(substance);
  if (planned === undefined) {
    planned = plannedSeries(exactSubstanceSeries(substance, defaultDigits));
    plannedSubstances.set(substance, planned);
  }
  return planned;
}

/** Each phase's series, cut to where the phase is stable; a join belongs to the phase below it. */
function joined(sequence: StableSequence, digits: number): PiecewiseSeries {
  const joinsK = joinTemperaturesK(sequence);
  const multiples = phaseMultiples(sequence);
  const parts = sequence.phases.map((phase, index) => {
    const lowerK = index === 0 ? 0 : joinsK[index - 1]!;
    const upperK = joinsK[index] ?? Number.POSITIVE_INFINITY;
    const series = multiplied(exactSpeciesSeries(phase, digits), { mantissa: multiples[index]!, exponent: 0 });
    const inside = series.intervals.filter(({ fromK, toK }) => fromK < upperK && (toK > lowerK || fromK === toK));
    return {
      intervals: inside.map((interval) => ({
        ...interval,
        fromK: Math.max(interval.fromK, lowerK),
        toK: Math.min(interval.toK, upperK),
      })),
      heatCapacityKnown: series.heatCapacityKnown,
    };
  });
  return {
    intervals: parts.flatMap(({ intervals }) => intervals),
    heatCapacityKnown: parts.every(({ heatCapacityKnown }) => heatCapacityKnown),
  };
}

function multiplied(series: PiecewiseSeries, factor: ExactDecimal): PiecewiseSeries {
  const times = (value: ExactDecimal): ExactDecimal => multiplyDecimals(value, factor);
  return {
    ...series,
    intervals: series.intervals.map(
      (interval): ExactSeries => ({
        ...interval,
        terms: interval.terms.map(({ exponent, coefficient }) => ({ exponent, coefficient: times(coefficient) })),
        enthalpyConstant: times(interval.enthalpyConstant),
        entropyConstant: times(interval.entropyConstant),
      }),
    ),
  };
}
