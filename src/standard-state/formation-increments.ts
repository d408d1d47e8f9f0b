import { referenceTemperatureK } from "../constants/constants.js";
import type { Fault, FaultPath } from "../errors/fault.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkObject } from "../errors/input.js";
import { multiplyRationals, negateRational, type Rational, rational, rationalToNumber } from "../numeric/rational.js";
import type { Figure } from "../quantity/figure.js";
import { figureInSi } from "../quantity/figure-value.js";
import type { Quantity } from "../quantity/quantity.js";
import { checkSource } from "../references/check-source.js";
import type { Source } from "../references/source.js";
import { indexOf } from "../species/collection-index.js";
import { elementShares } from "../species/element-shares.js";
import { collectHouseRecord } from "../species/house-record.js";
import { phaseMultiples } from "../species/join-phases.js";
import type { CollectionData, Label, SpeciesRecord } from "../species/record.js";
import { phaseAt } from "../species/substance-function.js";
import { figureStandardUncertainty } from "../uncertainty/figure-uncertainty.js";
import type { ElementIncrement, FormationIncrements } from "./enthalpy-reference.js";

/** Which references of the elements are meant. */
export interface ElementOptions {
  /** The source whose reference sequences are taken, where a collection holds several of one element. */
  readonly elementSource?: Source;
}

/** An element of a formation with the phase that is its reference at 298.15 K. */
export interface NamedElementIncrement extends ElementIncrement {
  /** Label of the reference phase. */
  readonly label: Label;
  readonly enthalpyAbove0K: Quantity<"molarEnergy", "J/mol">;
}

/** Increments of a species and of its elements, as {@link formationEnthalpyAtReference} takes them. */
export interface RecordIncrements extends FormationIncrements {
  readonly enthalpyAbove0K: Quantity<"molarEnergy", "J/mol">;
  readonly elements: readonly NamedElementIncrement[];
}

/**
 * H(298.15 K) - H(0 K) of a species and of the elements that it forms from, as the records publish them. The reference
 * phases at 298.15 K come from the sequences of the collection whose label is an element without state, such as `H2`.
 *
 * @param record - with `enthalpyAbove0K`; no gaseous ion, whose formation at 0 K depends on what is said of the
 * electron
 * @param collection - with the reference sequences and the records of their phases
 * @param options - `elementSource` where the collection has several sequences of one element
 * @returns J/mol, with standard uncertainties where the records have them
 * @throws GibbsLedgerError with every fault at once: "standard-state/missing-enthalpy-increment",
 * "standard-state/charged-gas", "species/no-reference", "species/ambiguous", and those of records
 * @see `references.cox1989`
 * @example
 * import { H2O_g, referenceData } from "gibbs-ledger/data";
 * const increments = formationIncrements(H2O_g, referenceData);
 * increments.enthalpyAbove0K.value; // => 9905
 * increments.elements[1]?.amount; // => 0.5
 */
export function formationIncrements(
  record: SpeciesRecord,
  collection: CollectionData,
  options: ElementOptions = {},
): RecordIncrements {
  const faults: Fault[] = [];
  const house = collectHouseRecord(record, ["record"], faults);
  if (house?.enthalpyAbove0K === undefined && house !== undefined) missingIncrement(house.label, ["record"], faults);
  if (house?.state === "g" && house.chargeNumber !== 0) refuseChargedGas(house.label, faults);
  const elements = house === undefined ? [] : collectElements(house, collection, options, faults);
  failIfAny(faults);
  return {
    enthalpyAbove0K: quantityOf((house as SpeciesRecord).enthalpyAbove0K as Figure),
    elements: elements.map(({ phase, amount, figure }) => ({
      label: phase.label,
      amount: rationalToNumber(amount),
      enthalpyAbove0K: quantityOf(figure),
    })),
  };
}

/** An element of a formation: its reference phase at 298.15 K, how much of it is taken up, its published increment. */
export interface ElementOfRecord {
  readonly phase: SpeciesRecord;
  readonly amount: Rational;
  readonly figure: Figure;
}

/** The elements that a record of the house forms from, an ion with half a mole of hydrogen a charge. */
export function collectElements(
  record: SpeciesRecord,
  collection: CollectionData,
  options: ElementOptions,
  faults: Fault[],
): ElementOfRecord[] {
  const members = checkObject(options, ["options"], faults, { required: [], optional: ["elementSource"] });
  if (members?.elementSource !== undefined) {
    checkSource(members.elementSource, ["options", "elementSource"], faults);
  }
  const shares = elementShares(record, collection, options?.elementSource, faults);
  return shares.flatMap(({ sequence, coefficient }) => {
    const phase = phaseAt(sequence, referenceTemperatureK);
    const multiple = phaseMultiples(sequence)[sequence.phases.indexOf(phase)]!;
    const figure = phase.enthalpyAbove0K;
    if (figure === undefined) {
      const place = indexOf(collection).byLabel.get(phase.label)!.index;
      missingIncrement(phase.label, ["collection", "species", place], faults);
      return [];
    }
    return [{ phase, amount: multiplyRationals(negateRational(coefficient), rational(multiple, 1n)), figure }];
  });
}

function quantityOf(figure: Figure): Quantity<"molarEnergy", "J/mol"> {
  const standardUncertainty = figureStandardUncertainty(figure);
  return {
    value: figureInSi(figure),
    unit: "J/mol",
    ...(standardUncertainty === undefined ? {} : { standardUncertainty }),
  };
}

function missingIncrement(label: Label, path: FaultPath, faults: Fault[]): void {
  faults.push({
    code: "standard-state/missing-enthalpy-increment",
    path: [...path, "enthalpyAbove0K"],
    message: `H(298.15 K) - H(0 K) of ${label} is not published in its record`,
    expected: "enthalpyAbove0K as a figure",
  });
}

function refuseChargedGas(label: Label, faults: Fault[]): void {
  faults.push({
    code: "standard-state/charged-gas",
    path: ["record"],
    message: `the formation of ${label} at 0 K depends on what is said of the enthalpy of the electron`,
    received: label,
    expected: "a species without charge",
    hint: "formationEnthalpyAtReference takes the increments of the elements and of the electron as you choose them",
  });
}
