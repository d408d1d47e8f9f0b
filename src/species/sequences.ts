import { cut, describeReceived, type Fault, type FaultPath } from "../errors/fault.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkArray, checkObject, checkText } from "../errors/input.js";
import { checkProvenance } from "../references/check-source.js";
import { indexOf } from "./collection-index.js";
import { collectHouseRecord } from "./house-record.js";
import { sequenceOf } from "./house-substance.js";
import type { CollectionData, Label, PhaseSequence, SpeciesRecord } from "./record.js";
import type { StableSequence } from "./substance.js";

/** The sequences of a collection that have been joined, by their place in it. */
const joinedSequences = new WeakMap<CollectionData, Map<number, StableSequence>>();

/**
 * The stable sequence of phases that a label names, such as `Fe(cr)`: one function of temperature through all its
 * phases, with the transitions between them.
 *
 * @param collection - with the sequence among its `sequences`, and the records of its phases
 * @throws GibbsLedgerError "species/not-found" where the collection has no such sequence, "species/no-join" where two
 * phases of a sequence do not meet
 */
export function findSequence(collection: CollectionData, label: Label): StableSequence {
  const faults: Fault[] = [];
  const given = sequencesGiven(collection, faults);
  const place = given.findIndex((sequence) => sequence.label === label);
  if (place < 0 && faults.length === 0) {
    faults.push({
      code: "species/not-found",
      path: [],
      message: `the collection holds no sequence ${describeReceived(label)}`,
      received: describeReceived(label),
      expected: given.length === 0 ? "a collection with sequences" : cut(given.map((one) => one.label).join(", "), 200),
    });
  }
  failIfAny(faults);
  const found = collectSequence(collection, place, faults);
  failIfAny(faults);
  return found as StableSequence;
}

/** The sequences as they stand in a collection, their shape checked; none after a fault. */
export function sequencesGiven(collection: CollectionData, faults: Fault[]): readonly PhaseSequence[] {
  indexOf(collection);
  const { sequences } = collection;
  if (sequences === undefined) return [];
  const before = faults.length;
  if (!shapedSequences.has(sequences)) checkSequences(sequences, sequencesPath, faults);
  if (faults.length > before) return [];
  shapedSequences.add(sequences);
  return sequences;
}

/** Joins every sequence of a collection and collects their faults. */
export function checkAllSequences(collection: CollectionData, faults: Fault[]): void {
  sequencesGiven(collection, faults).forEach((_sequence, place) => {
    collectSequence(collection, place, faults);
  });
}

/** The sequence at a place of a collection, joined when it is first asked for; undefined after a fault. */
export function collectSequence(
  collection: CollectionData,
  place: number,
  faults: Fault[],
): StableSequence | undefined {
  const known = joinedSequences.get(collection) ?? new Map<number, StableSequence>();
  const before = known.get(place);
  if (before !== undefined) return before;
  const sequence = sequencesGiven(collection, faults)[place]!;
  const path = [...sequencesPath, place];
  const index = indexOf(collection);
  const phases = sequence.phases.map((label, at) => {
    const entry = index.byLabel.get(label);
    if (entry !== undefined) return collectHouseRecord(entry.record, ["collection", "species", entry.index], faults);
    faults.push(missingPhase(sequence.label, label, [...path, "phases", at]));
    return undefined;
  });
  if (!phases.every((phase) => phase !== undefined)) return undefined;
  const joined = sequenceOf(sequence, phases as SpeciesRecord[], path, faults);
  if (joined !== undefined) joinedSequences.set(collection, known.set(place, joined));
  return joined;
}

const sequencesPath: FaultPath = ["collection", "sequences"];

/** Arrays of sequences whose shape has been checked. */
const shapedSequences = new WeakSet<readonly PhaseSequence[]>();

/** Checks the shape of sequences as they stand in a collection. */
export function checkSequences(value: unknown, path: FaultPath, faults: Fault[]): void {
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

/** The fault of a phase of a sequence that the collection lacks. */
export function missingPhase(sequenceLabel: Label, label: Label, path: FaultPath): Fault {
  return {
    code: "species/not-found",
    path,
    message: `the collection holds no species ${describeReceived(label)} of the sequence ${cut(sequenceLabel, 40)}`,
    received: cut(label),
    expected: "labels of species of the collection",
  };
}
