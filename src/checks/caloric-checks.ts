import { gasConstantJPerMolK, referenceTemperatureK } from "../constants/constants.js";
import { exactPropertiesAt, readSeries } from "../heat-capacity/read-series.js";
import { decimalToNumber, subtractDecimals } from "../numeric/exact-decimal.js";
import type { SpeciesRecord, Witness } from "../species/record.js";
import { standardPressureEntropy } from "../species/species-function.js";
import { largest } from "./largest.js";
import { readMolecularConstants } from "./molecular-constants.js";
import { molecularFunctions } from "./molecular-functions.js";
import { propertiesOf } from "./properties-of.js";
import { missing, optionalInput, requiredFigure } from "./witness-inputs.js";

/** Where statistical mechanics is compared with a fit, in kelvin, as far as the witness speaks. */
const molecularTemperaturesK: readonly number[] = [298.15, 500, 1000, 2000, 3000, 6000];

/**
 * The largest step of Cp/R, H/RT and S/R at the breaks between the intervals of a fit with constants of its own.
 * Exact decimals are compared, so that no rounding of the evaluation shows.
 */
export function closureAtBreaks(record: SpeciesRecord, witness: Witness): number {
  const { gibbsFunction } = record;
  if (gibbsFunction.kind !== "series" || gibbsFunction.intervals.length < 2) {
    return missing(record, witness.check, "a fit of two intervals or more");
  }
  const gasConstant = gibbsFunction.gasConstant ?? gasConstantJPerMolK;
  const steps = gibbsFunction.intervals.slice(1).flatMap((interval, index) => {
    const temperatureK = interval.from;
    const [below, above] = [gibbsFunction.intervals[index]!, interval].map((side) =>
      exactPropertiesAt(readSeries({ ...gibbsFunction, intervals: [side] }), temperatureK),
    );
    const step = (name: "heatCapacity" | "enthalpy" | "entropy"): number =>
      decimalToNumber(subtractDecimals(above![name], below![name])) / gasConstant;
    return [step("heatCapacity"), step("enthalpy") / temperatureK, step("entropy")];
  });
  return largest(steps);
}

/**
 * S(298.15 K) of the fit less the record's figure, brought from its standard pressure to 1 bar, or less the
 * `standardEntropy` at 1 bar compared with; J/mol/K.
 */
export function entropyAtReference(record: SpeciesRecord, witness: Witness): number {
  const expected = optionalInput(witness, "standardEntropy") ?? ownEntropy(record, witness);
  return propertiesOf(record, referenceTemperatureK).entropy - expected;
}

function ownEntropy(record: SpeciesRecord, { check }: Witness): number {
  const shift = standardPressureEntropy(record);
  const printed = requiredFigure(record, check, "standardEntropy", record.standardEntropy);
  return printed + (shift === undefined ? 0 : decimalToNumber(shift));
}

/** The largest deviation of Cp from the rows of a table, named as "500 K"; J/mol/K. */
export function tabulatedHeatCapacity(record: SpeciesRecord, witness: Witness): number {
  return largestOfRows(
    record,
    witness,
    (temperatureK) =>
      propertiesOf(record, temperatureK).heatCapacity ?? missing(record, witness.check, "a heat capacity"),
  );
}

/** The largest deviation of S from the rows of a table, named as "500 K"; J/mol/K. */
export function tabulatedEntropy(record: SpeciesRecord, witness: Witness): number {
  return largestOfRows(record, witness, (temperatureK) => propertiesOf(record, temperatureK).entropy);
}

/**
 * The largest deviation of H(T) - H(298.15 K) from the rows of a table, named as "500 K"; J/mol. The row "0 K" is held to
 * the record's H(298.15 K) - H(0 K).
 */
export function tabulatedEnthalpyIncrement(record: SpeciesRecord, witness: Witness): number {
  const reference = propertiesOf(record, referenceTemperatureK).enthalpy;
  return largestOfRows(record, witness, (temperatureK) =>
    temperatureK === 0
      ? -requiredFigure(record, witness.check, "enthalpyAbove0K", record.enthalpyAbove0K)
      : propertiesOf(record, temperatureK).enthalpy - reference,
  );
}

/** S of the fit less S from molecular constants, the largest over 298.15, 500, 1000, ... K in the range; J/mol/K. */
export function statisticalMechanicsEntropy(record: SpeciesRecord, witness: Witness): number {
  const constants = readMolecularConstants(record, witness);
  const [from, to] = witness.over ?? [referenceTemperatureK, referenceTemperatureK];
  return largest(
    molecularTemperaturesK
      .filter((temperatureK) => temperatureK >= from && temperatureK <= to)
      .map(
        (temperatureK) =>
          propertiesOf(record, temperatureK).entropy - molecularFunctions(constants, temperatureK).entropy,
      ),
  );
}

/** The record's H(298.15 K) - H(0 K) less the same from molecular constants; J/mol. */
export function statisticalMechanicsHeatContent(record: SpeciesRecord, witness: Witness): number {
  const constants = readMolecularConstants(record, witness);
  const figure = requiredFigure(record, witness.check, "enthalpyAbove0K", record.enthalpyAbove0K);
  return figure - molecularFunctions(constants, referenceTemperatureK).enthalpy;
}

function largestOfRows(record: SpeciesRecord, witness: Witness, computed: (temperatureK: number) => number): number {
  const rows = rowsByTemperature(record, witness);
  return largest(rows.map(([temperatureK, expected]) => computed(temperatureK) - expected));
}

/** The figures named as a temperature, such as "500 K". */
export function rowsByTemperature(record: SpeciesRecord, witness: Witness): [temperatureK: number, value: number][] {
  const rows: [number, number][] = [];
  for (const name of Object.keys(witness.against ?? {})) {
    const temperatureK = /^(\d+(?:\.\d+)?) K$/.exec(name)?.[1];
    if (temperatureK !== undefined) rows.push([Number(temperatureK), optionalInput(witness, name) as number]);
  }
  return rows.length > 0 ? rows : missing(record, witness.check, 'figures named by temperature, such as "500 K"');
}
