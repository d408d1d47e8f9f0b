import { gasConstantJPerMolK, referenceTemperatureK } from "../constants/constants.js";
import type { Fault } from "../errors/fault.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { lnDecimal } from "../numeric/decimal-functions.js";
import { divideDecimals } from "../numeric/divide-decimals.js";
import { decimalOf, type ExactDecimal, multiplyDecimals, negateDecimal } from "../numeric/exact-decimal.js";
import type { Figure } from "../quantity/figure.js";
import { exactFigureInSi } from "../quantity/figure-value.js";
import { checkPositiveQuantity } from "../quantity/guards.js";
import type { Pressure } from "../quantity/quantity.js";
import { collectHouseRecord } from "../species/house-record.js";
import type { SpeciesRecord } from "../species/record.js";
import { type ConversionNote, noteBefore, shiftOptional } from "./convert-figure.js";
import { type FormedSpecies, readFormedSpecies } from "./formed-species.js";
import { gasChangeOf, usualConvention } from "./gaseous-elements.js";
import { shiftGibbsFunction } from "./series-constants.js";

/** Digits of logarithms and quotients, as in the evaluation of a record. */
const digits = 40;

/**
 * A record whose figures refer to another standard pressure. Of a gas the standard entropy, the constants of S in every
 * form and the entropy of an anchor lose R ln(to / from); of every species the Gibbs energy of formation gains
 * RT ln(to / from) (n(gas) of the species - n(gas) of the elements) at 298.15 K. `where` says what was converted.
 *
 * The library evaluates every record at 1 bar, so that the properties computed from the new record, and K of every
 * reaction, are those of the old one. The volume work of condensed phases and of solutes is left out, as it is there:
 * for water it is 0.02 J/mol from 1 atm to 1 bar and 1.8 kJ/mol at 1000 bar. Transition temperatures stay: they are
 * measured at the pressure that their `where` says. R is the exact constant of today, whatever the record was made
 * with.
 *
 * @param record - one that is not of the house is checked, copied and frozen once
 * @param pressure - the new standard pressure, above 0 Pa
 * @returns plain data that the guards accept
 * @throws GibbsLedgerError with every fault of the record and of the pressure at once
 * @remarks Arithmetic: each figure and coefficient is rounded once. There and back differs by one unit in the last
 * place of the larger number at most.
 * @see `references.freeman1984` `references.wagman1982`
 * @example
 * import { N2_g } from "gibbs-ledger/data";
 * const atOneAtmosphere = convertStandardPressure(N2_g, quantity(1, "atm"));
 * atOneAtmosphere.standardEntropy?.value; // => 191.499...
 * atOneAtmosphere.standardEntropy?.where; // => "converted from a standard pressure of 1 bar"
 */
export function convertStandardPressure(record: SpeciesRecord, pressure: Pressure): SpeciesRecord {
  const faults: Fault[] = [];
  const house = collectHouseRecord(record, ["record"], faults);
  checkPositiveQuantity(pressure, "pressure", ["pressure"], faults);
  const formed = house && readFormedSpecies(house.label, ["record", "label"], faults);
  failIfAny(faults);
  return converted(house as SpeciesRecord, formed as FormedSpecies, pressure);
}

function converted(record: SpeciesRecord, formed: FormedSpecies, { value, unit }: Pressure): SpeciesRecord {
  const before = record.standardPressure;
  const note = { kind: "converted from a standard pressure of", was: `${before.value} ${before.unit}` };
  const standardPressure: Figure = { ...before, value, unit, where: noteBefore(before.where, note) };
  const ratio = divideDecimals(exactFigureInSi(standardPressure), exactFigureInSi(before), digits);
  const shift = multiplyDecimals(decimalOf(gasConstantJPerMolK), lnDecimal(ratio, digits));
  if (shift.mantissa === 0n) return { ...record, standardPressure: { ...before, value, unit } };
  const formationShift = multiplyDecimals(
    multiplyDecimals(shift, decimalOf(referenceTemperatureK)),
    decimalOf(gasChangeOf(formed, usualConvention)),
  );
  const formationGibbsEnergy = shiftOptional(record.formationGibbsEnergy, formationShift, note);
  return {
    ...(record.state === "g" ? withEntropyShift(record, negateDecimal(shift), note) : record),
    standardPressure,
    ...(formationGibbsEnergy === undefined ? {} : { formationGibbsEnergy }),
  };
}

function withEntropyShift(record: SpeciesRecord, shift: ExactDecimal, note: ConversionNote): SpeciesRecord {
  const standardEntropy = shiftOptional(record.standardEntropy, shift, note);
  const { gibbsFunction } = record;
  return {
    ...record,
    ...(standardEntropy === undefined ? {} : { standardEntropy }),
    gibbsFunction: shiftGibbsFunction(gibbsFunction, "entropy", shift, note),
  };
}
