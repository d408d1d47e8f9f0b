import type { Fault } from "../errors/fault.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkOption } from "../errors/input.js";
import { divideDecimals } from "../numeric/divide-decimals.js";
import { addDecimals, decimalOf, type ExactDecimal, negateDecimal, scaleDecimal } from "../numeric/exact-decimal.js";
import type { Figure } from "../quantity/figure.js";
import { exactFigureInSi } from "../quantity/figure-value.js";
import { collectHouseRecord } from "../species/house-record.js";
import type { CollectionData, SpeciesRecord, Witness } from "../species/record.js";
import { type ConversionNote, shiftFigure } from "./convert-figure.js";
import { type EnthalpyReference, enthalpyReferences } from "./enthalpy-reference.js";
import { collectElements, type ElementOfRecord, type ElementOptions } from "./formation-increments.js";
import { checkReferenceOf, elementsAtZeroKelvin } from "./reference-convention.js";
import { shiftGibbsFunction } from "./series-constants.js";

/** Digits of a quotient of atoms, well beyond those of a double. */
const digits = 40;

/**
 * A record whose enthalpies are counted from the elements at 0 K instead of 298.15 K, or back. H of the species, at
 * every temperature, gains the sum over its elements of n (H(298.15 K) - H(0 K)), as `enthalpyAbove0K` of their
 * reference phases at 298.15 K says; an ion gives half a mole of H2(g) for each unit of positive charge, in every
 * state, and H^+(aq) stays at zero. Entropies, heat capacities and Gibbs energies of formation do not move.
 * `convention` says which reference holds, `where` what was converted.
 *
 * What is added is linear in atoms and charge. So K of a balanced reaction is the same when all its species are
 * converted; `reaction` refuses a mixture of conventions. The record's `formationEnthalpy` is then H(298.15 K) of the
 * species relative to the elements at 0 K. For the enthalpy of formation at 0 K see
 * {@link formationEnthalpyAtZeroKelvin}.
 *
 * Uncertainties stay as they are: that of the reference cancels in every reaction.
 *
 * @param record - one that is not of the house is checked, copied and frozen once
 * @param collection - with the reference sequences of the elements and the records of their phases, of any convention
 * @param reference - `"0 K"` or `"298.15 K"`; a record that has it is returned as it is
 * @param options - `elementSource` where the collection has several sequences of one element
 * @returns plain data that the guards accept
 * @throws GibbsLedgerError with every fault at once: "standard-state/other-convention",
 * "standard-state/missing-enthalpy-increment", "species/no-reference", "species/ambiguous", "input/unknown-option", and
 * those of records
 * @remarks Arithmetic: each figure and coefficient is rounded once. There and back differs by one unit in the last
 * place of the larger number at most.
 * @see `references.chase1998` `references.cox1989`
 * @example
 * import { H2O_g, referenceData } from "gibbs-ledger/data";
 * const fromZero = convertEnthalpyReference(H2O_g, referenceData, "0 K");
 * fromZero.convention; // => "elements at 0 K in their reference phases of 298.15 K, H^+(aq) = 0"
 * fromZero.formationEnthalpy?.value; // => -229.01...
 */
export function convertEnthalpyReference(
  record: SpeciesRecord,
  collection: CollectionData,
  reference: EnthalpyReference,
  options: ElementOptions = {},
): SpeciesRecord {
  const faults: Fault[] = [];
  const house = collectHouseRecord(record, ["record"], faults);
  const wanted = checkOption(reference, ["reference"], faults, enthalpyReferences);
  const held = house && checkReferenceOf(house, enthalpyReferences, faults);
  const elements = house === undefined ? [] : collectElements(house, collection, options, faults);
  failIfAny(faults);
  if (held === wanted) return house as SpeciesRecord;
  const toZero = wanted === "0 K";
  const sum = sumOf(elements);
  const note = { kind: "converted from elements at", was: held as EnthalpyReference };
  return converted(house as SpeciesRecord, toZero ? sum : negateDecimal(sum), toZero, note);
}

function converted(house: SpeciesRecord, shift: ExactDecimal, toZero: boolean, note: ConversionNote): SpeciesRecord {
  const { convention: _left, ...record } = house;
  const { formationEnthalpy, gibbsFunction } = record;
  return {
    ...record,
    ...(toZero ? { convention: elementsAtZeroKelvin } : {}),
    ...(formationEnthalpy === undefined ? {} : { formationEnthalpy: shiftEnthalpy(formationEnthalpy, shift, note) }),
    gibbsFunction: shiftGibbsFunction(gibbsFunction, "enthalpy", shift, note),
    witnesses: record.witnesses.map((witness) => shiftWitness(witness, shift, note)),
  };
}

/** A zero without uncertainty is zero by convention; moved away from zero it says that it was exact. */
function shiftEnthalpy(figure: Figure, shift: ExactDecimal, note: ConversionNote): Figure {
  const isConvention = figure.value === 0 && figure.uncertainty === undefined && shift.mantissa !== 0n;
  const uncertainty = { halfWidth: 0, coverage: 0.95 };
  return shiftFigure(isConvention ? { ...figure, uncertainty } : figure, shift, note);
}

/** The enthalpy of formation of another source, which a witness compares with, moves with that of the record. */
function shiftWitness(witness: Witness, shift: ExactDecimal, note: ConversionNote): Witness {
  const compared = witness.check === "enthalpy-at-298.15-K" ? witness.against?.["formationEnthalpy"] : undefined;
  if (compared === undefined) return witness;
  return { ...witness, against: { ...witness.against, formationEnthalpy: shiftFigure(compared, shift, note) } };
}

/** The sum of n (H(298.15 K) - H(0 K)) over the elements, J/mol. */
function sumOf(elements: readonly ElementOfRecord[]): ExactDecimal {
  return elements
    .map(({ amount: { numerator, denominator }, figure }) =>
      divideDecimals(scaleDecimal(exactFigureInSi(figure), numerator), decimalOf(String(denominator)), digits),
    )
    .reduce(addDecimals, { mantissa: 0n, exponent: 0 });
}
