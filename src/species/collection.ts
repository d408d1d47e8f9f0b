import { cut, describeReceived, type Fault, type FaultPath } from "../errors/fault.js";
import { frozenCopy } from "../errors/frozen-copy.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkArray, checkObject } from "../errors/input.js";
import { nearest } from "../errors/nearest.js";
import { checkLabels } from "./check-labels.js";
import { type CollectionIndex, entriesNamed, indexOf } from "./collection-index.js";
import { collectHouseRecord } from "./house-record.js";
import type { CollectionData, Label, SpeciesRecord } from "./record.js";
import { checkAllSequences, checkSequences } from "./sequences.js";

/**
 * A collection of the house: every record checked, copied and frozen, indexed by label, formula, CAS Registry Number
 * and name.
 *
 * @param data - records, and the stable sequences of phases
 * @throws GibbsLedgerError with the faults of all records at once, "species/duplicate-label", "species/not-found" where
 * a sequence names a phase that is missing, and, where all records are sound, "species/no-join"
 * @example
 * import { referenceData } from "gibbs-ledger/data";
 * const collection = speciesCollection(referenceData);
 * findSpecies(collection, "NH3(g)").name; // => "ammonia"
 */
export function speciesCollection(data: CollectionData): CollectionData {
  const faults: Fault[] = [];
  const members = checkObject(data, ["collection"], faults, { required: ["species"], optional: ["sequences"] });
  const given = members?.species === undefined ? [] : checkArray(members.species, ["collection", "species"], faults);
  const records = given ?? [];
  const species = records.map((record, index) => collectHouseRecord(record, ["collection", "species", index], faults));
  if (members?.sequences !== undefined) checkSequences(members.sequences, ["collection", "sequences"], faults);
  checkLabels(records, members?.sequences, ["collection"], faults);
  failIfAny(faults);
  const collection: CollectionData = Object.freeze({
    species: Object.freeze(species as SpeciesRecord[]),
    ...(data.sequences === undefined ? {} : { sequences: frozenCopy(data.sequences) }),
  });
  indexOf(collection);
  checkAllSequences(collection, faults);
  failIfAny(faults);
  return collection;
}

/**
 * The species that a text names: by label (`NH3(g)`), by CAS Registry Number, by formula where the collection holds
 * only one such phase (`NH3`, `CaCO3(s)`), or by name (`ammonia`). A text without a state means a phase of the substance
 * itself, where there is one, and not the dissolved substance.
 *
 * @returns the house's own copy of the record
 * @throws GibbsLedgerError "species/not-found", "species/ambiguous" with the choices listed
 * @example
 * import { referenceData } from "gibbs-ledger/data";
 * findSpecies(referenceData, "7664-41-7").label; // => "NH3(g)"
 * findSpecies(referenceData, "H2O"); // throws species/ambiguous
 */
export function findSpecies(collection: CollectionData, key: string): SpeciesRecord {
  const faults: Fault[] = [];
  const found = collectSpecies(collection, key, [], faults);
  failIfAny(faults);
  return found as SpeciesRecord;
}

/** Like {@link findSpecies}, but collects the faults; undefined after a fault. */
export function collectSpecies(
  collection: CollectionData,
  key: unknown,
  path: FaultPath,
  faults: Fault[],
): SpeciesRecord | undefined {
  const index = indexOf(collection);
  if (typeof key !== "string" || key === "") {
    faults.push({
      code: "input/not-a-string",
      path,
      message: `a species is named by a text, got ${describeReceived(key)}`,
      received: describeReceived(key),
      expected: 'a label such as "NH3(g)"',
    });
    return undefined;
  }
  const entries = entriesNamed(index, key);
  const [only] = entries;
  if (only !== undefined && entries.length === 1) {
    return collectHouseRecord(only.record, ["collection", "species", only.index], faults);
  }
  const labels = entries.map((entry) => entry.record.label);
  if (entries.length > 1) {
    faults.push({
      code: "species/ambiguous",
      path,
      message: `${describeReceived(key)} may be ${listed(labels)}`,
      received: cut(key),
      expected: listed(labels),
      hint: `name the phase, such as ${labels[0]}`,
    });
    return undefined;
  }
  const near = nearest(key, labelsAndNames(index));
  faults.push({
    code: "species/not-found",
    path,
    message: `the collection holds no species ${describeReceived(key)}`,
    received: cut(key),
    expected: "a label, formula, name or CAS Registry Number of the collection",
    ...(near === undefined ? {} : { hint: `did you mean ${near}?` }),
  });
  return undefined;
}

function labelsAndNames(index: CollectionIndex): string[] {
  return [...index.byLabel].flatMap(([label, { record }]) => [label, String(record.name)]);
}

function listed(labels: readonly Label[]): string {
  return cut(labels.join(", "), 200);
}
