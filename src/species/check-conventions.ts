import { cut, type Fault, type FaultPath } from "../errors/fault.js";
import type { SpeciesRecord } from "./record.js";
import { isElectron, isRecord, type Substance } from "./substance.js";

/** Collects a fault where substances that are to be summed follow different conventions of their references. */
export function checkConventions(substances: readonly Substance[], path: FaultPath, faults: Fault[]): void {
  const byConvention = new Map<string | undefined, string>();
  for (const substance of substances) {
    for (const record of recordsOf(substance)) {
      if (!byConvention.has(record.convention)) byConvention.set(record.convention, record.label);
    }
  }
  if (byConvention.size < 2) return;
  const said = [...byConvention].map(([convention, label]) => `${label} ${convention ?? "the usual convention"}`);
  faults.push({
    code: "species/mixed-conventions",
    path,
    message: `records of different conventions cannot be summed: ${cut(said.join("; "), 300)}`,
    expected: "records of one convention",
    hint: "gibbs-ledger/standard-state converts records",
  });
}

function recordsOf(substance: Substance): readonly SpeciesRecord[] {
  if (isRecord(substance)) return [substance];
  return isElectron(substance) ? [substance.hydrogen] : substance.phases;
}
