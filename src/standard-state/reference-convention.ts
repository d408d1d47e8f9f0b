import { cut, type Fault } from "../errors/fault.js";
import type { SpeciesRecord } from "../species/record.js";
import type { EnthalpyReference } from "./enthalpy-reference.js";

/** The `convention` of records whose enthalpies are counted from the elements at 0 K. */
export const elementsAtZeroKelvin = "elements at 0 K in their reference phases of 298.15 K, H^+(aq) = 0";

/**
 * The temperature that the enthalpies of a record are counted from; undefined, after a fault, where its convention is
 * another one or is not among those asked for.
 */
export function checkReferenceOf(
  { label, convention }: SpeciesRecord,
  served: readonly EnthalpyReference[],
  faults: Fault[],
): EnthalpyReference | undefined {
  const reference = convention === undefined ? "298.15 K" : convention === elementsAtZeroKelvin ? "0 K" : undefined;
  if (reference !== undefined && served.includes(reference)) return reference;
  faults.push({
    code: "standard-state/other-convention",
    path: ["record", "convention"],
    message: `${label} follows the convention "${cut(convention ?? "", 200)}"`,
    received: cut(convention ?? ""),
    expected: served.length > 1 ? `none, or "${elementsAtZeroKelvin}"` : "elements at 298.15 K, which is no convention",
  });
  return undefined;
}
