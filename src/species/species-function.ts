import { gasConstantJPerMolK, referenceTemperatureK, standardPressurePa } from "../constants/constants.js";
import type { PiecewiseSeries } from "../heat-capacity/exact-series.js";
import type { SeriesPlan } from "../heat-capacity/merge.js";
import { type PlannedSeries, plannedSeries, planOfSeries } from "../heat-capacity/planned-series.js";
import type { RangePolicy } from "../heat-capacity/range-policy.js";
import {
  type Anchor,
  anchorOfFigures,
  defaultDigits,
  readSeries,
  referencePoint,
  shiftEntropy,
} from "../heat-capacity/read-series.js";
import { lnDecimal } from "../numeric/decimal-functions.js";
import { divideDecimals } from "../numeric/divide-decimals.js";
import { decimalOf, type ExactDecimal, multiplyDecimals } from "../numeric/exact-decimal.js";
import { exactFigureInSi, figureInSi } from "../quantity/figure-value.js";
import type { SpeciesRecord } from "./record.js";

const plannedRecords = new WeakMap<SpeciesRecord, PlannedSeries>();

/**
 * The exact series of a record of the house, at the standard pressure of the library, 1 bar. H is relative to the
 * elements at 298.15 K.
 */
export function speciesSeries(record: SpeciesRecord): PiecewiseSeries {
  return plannedRecord(record).series;
}

/** The merged plan of one species under a range policy. */
export function speciesPlan(record: SpeciesRecord, policy: RangePolicy): SeriesPlan {
  return planOfSeries(plannedRecord(record), policy);
}

/** The series of a record with its constants solved to a number of digits. */
export function exactSpeciesSeries(record: SpeciesRecord, digits: number): PiecewiseSeries {
  const published = publishedSeriesOf(record, digits);
  const shift = standardPressureEntropy(record, digits);
  return shift === undefined ? published : shiftEntropy(published, shift);
}

/**
 * What a gas's entropy gains when its published standard pressure is exchanged for 1 bar: R ln(p / 1 bar), exact.
 * Undefined where nothing changes: at 1 bar, and for phases that are no gas, whose volume work between 1 atm and 1 bar
 * is below 0.1 J/mol.
 */
export function standardPressureEntropy(
  record: SpeciesRecord,
  digits: number = defaultDigits,
): ExactDecimal | undefined {
  if (record.state !== "g") return undefined;
  const pressurePa = figureInSi(record.standardPressure);
  if (pressurePa === standardPressurePa) return undefined;
  const ratio = divideDecimals(exactFigureInSi(record.standardPressure), decimalOf(standardPressurePa), digits);
  return multiplyDecimals(decimalOf(gasConstantJPerMolK), lnDecimal(ratio, digits));
}

function plannedRecord(record: SpeciesRecord): PlannedSeries {
  let planned = plannedRecords.get(record);
  if (planned === undefined) {
    planned = plannedSeries(exactSpeciesSeries(record, defaultDigits));
    plannedRecords.set(record, planned);
  }
  return planned;
}

function publishedSeriesOf(record: SpeciesRecord, digits: number): PiecewiseSeries {
  const { gibbsFunction } = record;
  if (gibbsFunction.kind === "reference-point") return referencePoint(anchorOf(record) as Anchor);
  const anchor = gibbsFunction.anchor;
  return readSeries(gibbsFunction, {
    digits,
    anchor: anchor === undefined ? anchorOf(record) : anchorOfFigures(anchor),
    transitionEnthalpies: new Map(
      (record.transitions ?? []).map(({ temperature, enthalpy }) => [
        figureInSi(temperature),
        exactFigureInSi(enthalpy),
      ]),
    ),
  });
}

function anchorOf(record: SpeciesRecord): Anchor | undefined {
  const { formationEnthalpy, standardEntropy } = record;
  if (formationEnthalpy === undefined || standardEntropy === undefined) return undefined;
  return {
    temperatureK: referenceTemperatureK,
    enthalpy: exactFigureInSi(formationEnthalpy),
    entropy: exactFigureInSi(standardEntropy),
  };
}
