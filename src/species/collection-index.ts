import { cut, describeReceived, type Fault } from "../errors/fault.js";
import { failIfAny, isGibbsLedgerError } from "../errors/gibbs-ledger-error.js";
import { checkArray, checkObject } from "../errors/input.js";
import { formula as readFormula } from "../formula/formula.js";
import { hillFormula } from "../formula/hill-formula.js";
import { parseLabel } from "../formula/parse-label.js";
import { houseRecord } from "./house-record.js";
import type { CollectionData, Label, SpeciesRecord } from "./record.js";

/** A record and its place in the collection. */
export interface Entry {
  readonly record: SpeciesRecord;
  readonly index: number;
}

/** What a collection is looked up by; the slower maps are made when a label alone does not answer. */
export interface CollectionIndex {
  readonly byLabel: ReadonlyMap<Label, Entry>;
  bySubstance?: Map<string, Entry[]>;
}

const indices = new WeakMap<object, CollectionIndex>();

/** The record of a label, as the house's copy; undefined where the collection has none. */
export function recordOfLabel(collection: CollectionData, label: Label): SpeciesRecord | undefined {
  const entry = indexOf(collection).byLabel.get(label);
  return entry === undefined ? undefined : houseRecord(entry.record, ["collection", "species", entry.index]);
}

/** The index of a collection, made when it is first asked for. */
export function indexOf(collection: CollectionData): CollectionIndex {
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

/** The records that a text may name. */
export function entriesNamed(index: CollectionIndex, key: string): readonly Entry[] {
  const exact = index.byLabel.get(key);
  if (exact !== undefined) return [exact];
  const bySubstance = substances(index);
  const named = bySubstance.get(nameKey(key));
  if (named !== undefined) return ownPhases(named);
  const parts = partsOf(key);
  if (parts === undefined) return [];
  const spelled = index.byLabel.get(parts.label);
  if (spelled !== undefined) return [spelled];
  const same =
    bySubstance.get(formulaKey(parts.formula, parts.chargeNumber)) ?? bySubstance.get(parts.composition) ?? [];
  const agreeing = same.filter(({ record }) => agrees(record, parts));
  return parts.state === undefined ? ownPhases(agreeing) : agreeing;
}

/** Without a state a text means a phase of the substance itself; a dissolved one is named with `(aq)`, if others exist. */
function ownPhases(entries: readonly Entry[]): readonly Entry[] {
  const own = entries.filter(({ record }) => record.state !== "aq");
  return own.length > 0 ? own : entries;
}

export interface KeyParts extends ReturnType<typeof parseLabel> {
  readonly composition: string;
}

/** The parts of a text that is a formula or label. */
export function partsOf(key: string): KeyParts | undefined {
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
