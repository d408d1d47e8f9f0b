import { describeReceived, type Fault, type FaultPath } from "../errors/fault.js";
import { checkArray, checkNumber, checkObject, checkText } from "../errors/input.js";
import { exactSum } from "../numeric/compensated.js";
import type { Label } from "../species/record.js";
import { electronLabel } from "../species/substance.js";
import { readStatedLabel } from "./formed-species.js";

/**
 * Stoichiometric numbers by label, products positive, or what `reaction` returns. Labels have their state; the electron
 * of a half-reaction is `e^-`.
 */
export type StoichiometricNumbers =
  | Readonly<Record<Label, number>>
  | { readonly terms: readonly { readonly label: Label; readonly coefficient: number }[] };

/**
 * Sums of stoichiometric numbers. The electron is 1/2 H2(g) - H^+(aq) by the standard-hydrogen convention and counts
 * as half a gas and minus one solute.
 */
export interface StoichiometricSums {
  readonly gas: number;
  readonly solutes: number;
  readonly electrons: number;
}

/** The most species that are read. */
const mostSpecies = 200;

/** Reads stoichiometric numbers and sums them by kind, in any order to the same bits; undefined after a fault. */
export function readStoichiometry(value: unknown, path: FaultPath, faults: Fault[]): StoichiometricSums | undefined {
  const before = faults.length;
  const entries = entriesOf(value, path, faults);
  const gas: number[] = [];
  const solutes: number[] = [];
  const electrons: number[] = [];
  for (const { label, coefficient, place } of entries) {
    const number = checkNumber(coefficient, place.coefficient, faults);
    const name = checkText(label, place.label, faults);
    if (name === undefined) continue;
    const amount = number ?? 0;
    if (name === electronLabel) {
      electrons.push(amount);
      gas.push(amount / 2);
      solutes.push(-amount);
      continue;
    }
    const state = readStatedLabel(name, place.label, faults)?.state;
    if (state === "g") gas.push(amount);
    if (state === "aq" || state === "sln") solutes.push(amount);
  }
  if (faults.length > before) return undefined;
  return { gas: exactSum(gas), solutes: exactSum(solutes), electrons: exactSum(electrons) };
}

interface Entry {
  readonly label: unknown;
  readonly coefficient: unknown;
  readonly place: { readonly label: FaultPath; readonly coefficient: FaultPath };
}

function entriesOf(value: unknown, path: FaultPath, faults: Fault[]): Entry[] {
  const members = checkObject<never, string>(value, path, faults, { required: [], optional: "any" });
  if (Array.isArray(members?.["terms"])) {
    const here = [...path, "terms"];
    const terms = checkArray(members["terms"], here, faults, mostSpecies) ?? [];
    return terms.flatMap((term, index) => entryOfTerm(term, [...here, index], faults));
  }
  const entries = Object.entries(members ?? {});
  if (members !== undefined && (entries.length === 0 || entries.length > mostSpecies)) {
    faults.push({
      code: entries.length === 0 ? "input/missing" : "input/too-large",
      path,
      message: `expected the stoichiometric numbers of 1 to ${mostSpecies} species, got ${entries.length}`,
      received: describeReceived(value),
      expected: 'numbers by label, such as { "H2(g)": -2, "O2(g)": -1, "H2O(l)": 2 }',
    });
    return [];
  }
  return entries.map(([label, coefficient]) => ({
    label,
    coefficient,
    place: { label: [...path, label], coefficient: [...path, label] },
  }));
}

/** Other keys of a term, such as its record, are no business of a sum. */
function entryOfTerm(value: unknown, path: FaultPath, faults: Fault[]): Entry[] {
  const term = checkObject<"label" | "coefficient", string>(value, path, faults, {
    required: ["label", "coefficient"],
    optional: "any",
  });
  if (term?.label === undefined || term.coefficient === undefined) return [];
  const { label, coefficient } = term;
  return [{ label, coefficient, place: { label: [...path, "label"], coefficient: [...path, "coefficient"] } }];
}
