import { cut, describeReceived, type Fault, type FaultPath } from "../errors/fault.js";
import { frozenCopy } from "../errors/frozen-copy.js";
import { failIfAny, isGibbsLedgerError } from "../errors/gibbs-ledger-error.js";
import { checkArray, checkObject, checkText } from "../errors/input.js";
import { nearest } from "../errors/nearest.js";
import { formula as readFormula } from "../formula/formula.js";
import { hillFormula } from "../formula/hill-formula.js";
import { parseLabel } from "../formula/parse-label.js";
import { checkProvenance } from "../references/check-source.js";
import { collectHouseRecord, houseRecord } from "./house-record.js";
import type { CollectionData, Label, SpeciesRecord } from "./record.js";

interface Entry {
  readonly record: SpeciesRecord;
  readonly index: number;
}

/** What a collection is looked up by; the slower maps are made when a label alone does not answer. */
interface CollectionIndex {
  readonly byLabel: ReadonlyMap<Label, Entry>;
  bySubstance?: Map<string, Entry[]>;
}

const indices = new WeakMap<object, CollectionIndex>();

/**
 * A collection of the house: every record checked, copied and frozen, indexed by label, formula, CAS Registry Number
 * and name.
 *
 * @param data - records, and the stable sequences of phases
 * @throws GibbsLedgerError with the faults of all records at once, "species/duplicate-label"
 * @example
 * import { referenceData } from "gibbs-ledger/data";
 * const collection = speciesCollection(referenceData);
 * findSpecies(collection, "NH3(g)").name; // => "ammonia"
 */
export function speciesCollection(data: CollectionData): CollectionData {
  const faults: Fault[] = [];
  const members = checkObject(data, ["collection"], faults, { required: ["species"], optional: ["sequences"] });
  failIfAny(faults);
  const records = checkArray(members?.species, ["collection", "species"], faults) ?? [];
  const species = records.map((record, index) => collectHouseRecord(record, ["collection", "species", index], faults));
  if (members?.sequences !== undefined) checkSequences(members.sequences, ["collection", "sequences"], faults);
  failIfAny(faults);
  const collection: CollectionData = Object.freeze({
    species: Object.freeze(species as SpeciesRecord[]),
    ...(data.sequences === undefined ? {} : { sequences: frozenCopy(data.sequences) }),
  });
  indexOf(collection);
  return collection;
}

/**
 * The species that a text names: by label (`NH3(g)`), by CAS Registry Number, by formula where the collection holds
 * only one such phase (`NH3`, `CaCO3(s)`), or by name (`ammonia`).
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

/** The record of a label, as the house's copy; undefined where the collection has none. */
export function recordOfLabel(collection: CollectionData, label: Label): SpeciesRecord | undefined {
  const entry = indexOf(collection).byLabel.get(label);
  return entry === undefined ? undefined : houseRecord(entry.record, ["collection", "species", entry.index]);
}

function checkSequences(value: unknown, path: FaultPath, faults: Fault[]): void {
  checkArray(value, path, faults)?.forEach((entry, index) => {
    const here = [...path, index];
    const sequence = checkObject(entry, here, faults, {
      required: ["label", "phases", "source", "origin"],
      optional: [],
    });
    if (sequence === undefined) return;
    if (sequence.label !== undefined) checkText(sequence.label, [...here, "label"], faults);
    if (sequence.phases !== undefined) {
      checkArray(sequence.phases, [...here, "phases"], faults)?.forEach((phase, place) => {
        checkText(phase, [...here, "phases", place], faults);
      });
    }
    checkProvenance(sequence, here, faults);
  });
}

function indexOf(collection: CollectionData): CollectionIndex {
  const known = typeof collection === "object" && collection !== null ? indices.get(collection) : undefined;
  if (known !== undefined) return known;
  const faults: Fault[] = [];
  const members = checkObject(collection, ["collection"], faults, { required: ["species"], optional: ["sequences"] });
  const records =
    members?.species === undefined ? [] : (checkArray(members.species, ["collection", "species"], faults) ?? []);
  const byLabel = new Map<Label, Entry>();
  records.forEach((record, index) => {
    const label = (record as { label?: unknown } | null)?.label;
    if (typeof label !== "string") {
      faults.push({
        code: "species/invalid-record",
        path: ["collection", "species", index],
        message: `expected a species record, got ${describeReceived(record)}`,
        received: describeReceived(record),
      });
    } else if (byLabel.has(label)) {
      faults.push({
        code: "species/duplicate-label",
        path: ["collection", "species", index, "label"],
        message: `the label ${describeReceived(label)} stands twice in the collection`,
        received: cut(label),
      });
    } else {
      byLabel.set(label, { record: record as SpeciesRecord, index });
    }
  });
  failIfAny(faults);
  const index: CollectionIndex = { byLabel };
  indices.set(collection, index);
  return index;
}

function entriesNamed(index: CollectionIndex, key: string): readonly Entry[] {
  const exact = index.byLabel.get(key);
  if (exact !== undefined) return [exact];
  const bySubstance = substances(index);
  const named = bySubstance.get(nameKey(key));
  if (named !== undefined) return named;
  const parts = partsOf(key);
  if (parts === undefined) return [];
  const spelled = index.byLabel.get(parts.label);
  if (spelled !== undefined) return [spelled];
  const same =
    bySubstance.get(formulaKey(parts.formula, parts.chargeNumber)) ?? bySubstance.get(parts.composition) ?? [];
  return same.filter(({ record }) => agrees(record, parts));
}

interface KeyParts extends ReturnType<typeof parseLabel> {
  readonly composition: string;
}

function partsOf(key: string): KeyParts | undefined {
  try {
    const parts = parseLabel(key);
    return { ...parts, composition: compositionKey(parts.formula, parts.chargeNumber) };
  } catch (error) {
    if (!isGibbsLedgerError(error)) throw error;
    // Not a formula: it may have been meant as a name, and is reported as not found.
    return undefined;
  }
}

/** `s` stands for any solid; a state without polymorph for any polymorph. */
function agrees(record: SpeciesRecord, parts: KeyParts): boolean {
  if (parts.state === undefined) return true;
  const sameState = parts.state === "s" ? ["cr", "am", "s"].includes(record.state) : parts.state === record.state;
  return sameState && (parts.polymorph === undefined || parts.polymorph === record.polymorph);
}

function substances(index: CollectionIndex): Map<string, Entry[]> {
  if (index.bySubstance !== undefined) return index.bySubstance;
  const map = new Map<string, Entry[]>();
  const add = (key: string, entry: Entry): void => {
    const entries = map.get(key);
    if (entries === undefined) map.set(key, [entry]);
    else if (!entries.includes(entry)) entries.push(entry);
  };
  for (const entry of index.byLabel.values()) {
    const { record } = entry;
    // A malformed record is reported when it is used; it is still found by its label.
    if (typeof record.formula === "string" && typeof record.chargeNumber === "number") {
      add(formulaKey(record.formula, record.chargeNumber), entry);
      try {
        add(compositionKey(record.formula, record.chargeNumber), entry);
      } catch (error) {
        if (!isGibbsLedgerError(error)) throw error;
      }
    }
    if (typeof record.name === "string") add(nameKey(record.name), entry);
    if (typeof record.casNumber === "string") add(nameKey(record.casNumber), entry);
  }
  index.bySubstance = map;
  return map;
}

function nameKey(name: string): string {
  return `name ${name.toLowerCase()}`;
}

function formulaKey(text: string, chargeNumber: number): string {
  return `formula ${text} ${chargeNumber}`;
}

function compositionKey(text: string, chargeNumber: number): string {
  return `composition ${hillFormula(readFormula(text).composition)} ${chargeNumber}`;
}

function listed(labels: readonly Label[]): string {
  return cut(labels.join(", "), 200);
}
