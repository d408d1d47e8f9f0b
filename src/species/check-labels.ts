import { cut, describeReceived, type Fault, type FaultPath } from "../errors/fault.js";
import { missingPhase } from "./sequences.js";

/**
 * Collects labels that stand twice in a collection, and phases of its sequences that none of its species is. Reads what
 * may be malformed: other checks tell what is.
 */
export function checkLabels(species: readonly unknown[], sequences: unknown, path: FaultPath, faults: Fault[]): void {
  const labels = checkUnique(species, [...path, "species"], faults);
  if (!Array.isArray(sequences)) return;
  checkUnique(sequences, [...path, "sequences"], faults);
  sequences.forEach((sequence: unknown, index) => {
    const { label, phases } = (sequence ?? {}) as { readonly label?: unknown; readonly phases?: unknown };
    if (typeof label !== "string" || !Array.isArray(phases)) return;
    phases.forEach((phase: unknown, place) => {
      if (typeof phase !== "string" || phase === "" || labels.has(phase)) return;
      faults.push(missingPhase(label, phase, [...path, "sequences", index, "phases", place]));
    });
  });
}

function checkUnique(entries: readonly unknown[], path: FaultPath, faults: Fault[]): ReadonlySet<string> {
  const labels = new Set<string>();
  entries.forEach((entry, index) => {
    const label = (entry as { readonly label?: unknown } | null | undefined)?.label;
    if (typeof label !== "string") return;
    if (labels.has(label)) faults.push(duplicateLabel(label, [...path, index, "label"]));
    labels.add(label);
  });
  return labels;
}

/** The fault of a label that another entry of the collection has too. */
export function duplicateLabel(label: string, path: FaultPath): Fault {
  return {
    code: "species/duplicate-label",
    path,
    message: `the label ${describeReceived(label)} stands twice in the collection`,
    received: cut(label),
  };
}
