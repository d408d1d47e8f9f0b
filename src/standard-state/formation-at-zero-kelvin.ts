import type { Fault } from "../errors/fault.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { figureInSi } from "../quantity/figure-value.js";
import type { Quantity } from "../quantity/quantity.js";
import { collectHouseRecord } from "../species/house-record.js";
import type { CollectionData, SpeciesRecord } from "../species/record.js";
import { figureStandardUncertainty } from "../uncertainty/figure-uncertainty.js";
import { formationEnthalpyAtReference } from "./enthalpy-reference.js";
import { type ElementOptions, formationIncrements } from "./formation-increments.js";
import { checkReferenceOf } from "./reference-convention.js";

/**
 * Enthalpy of formation of a record at 0 K: H(298.15 K) - h(species) + sum of n h(element), h = H(298.15 K) - H(0 K),
 * from the figures that the records publish. {@link formationEnthalpyAtReference} goes back with
 * {@link formationIncrements}.
 *
 * @param record - with `formationEnthalpy` and `enthalpyAbove0K`, relative to the elements at 298.15 K
 * @param collection - with the reference sequences of the elements and the records of their phases
 * @param options - `elementSource` where the collection has several sequences of one element
 * @returns J/mol; with a standard uncertainty where every figure has one
 * @throws GibbsLedgerError "input/missing" for a record without enthalpy of formation,
 * "standard-state/other-convention", and as {@link formationIncrements}
 * @see `references.chase1998` `references.cox1989`
 * @example
 * import { H2O_g, referenceData } from "gibbs-ledger/data";
 * formationEnthalpyAtZeroKelvin(H2O_g, referenceData).value; // => -238923...
 */
export function formationEnthalpyAtZeroKelvin(
  record: SpeciesRecord,
  collection: CollectionData,
  options: ElementOptions = {},
): Quantity<"molarEnergy", "J/mol"> {
  const faults: Fault[] = [];
  const house = collectHouseRecord(record, ["record"], faults);
  if (house !== undefined) checkReferenceOf(house, ["298.15 K"], faults);
  if (house !== undefined && house.formationEnthalpy === undefined) {
    faults.push({
      code: "input/missing",
      path: ["record", "formationEnthalpy"],
      message: `the enthalpy of formation of ${house.label} is not published in its record`,
      expected: "formationEnthalpy as a figure",
    });
  }
  failIfAny(faults);
  const { formationEnthalpy } = house as SpeciesRecord;
  const standardUncertainty = figureStandardUncertainty(formationEnthalpy);
  const figure = {
    value: figureInSi(formationEnthalpy as NonNullable<typeof formationEnthalpy>),
    unit: "J/mol",
    ...(standardUncertainty === undefined ? {} : { standardUncertainty }),
  } as const;
  const increments = formationIncrements(record, collection, options);
  return formationEnthalpyAtReference(figure, { ...increments, from: "298.15 K", to: "0 K" });
}
