import { cut, type Fault } from "../errors/fault.js";
import { checkArray } from "../errors/input.js";
import { collectHouseRecord } from "../species/house-record.js";
import type { SpeciesRecord } from "../species/record.js";
import type { Reaction } from "./reaction.js";

/** Reads the species that stand in a phase and take no part in the reaction, and collects every fault. */
export function collectInerts(value: unknown, reaction: Reaction, faults: Fault[]): SpeciesRecord[] {
  if (value === undefined) return [];
  const labels = new Set(reaction.terms.map(({ label }) => label));
  const inerts: SpeciesRecord[] = [];
  checkArray(value, ["inerts"], faults, 1000)?.forEach((entry, index) => {
    const record = collectHouseRecord(entry, ["inerts", index], faults);
    if (record === undefined) return;
    if (labels.has(record.label)) {
      faults.push({
        code: "conditions/duplicate-label",
        path: ["inerts", index],
        message: `${record.label} takes part in the reaction or is listed twice`,
        received: cut(record.label),
        expected: "species that take no part, each once",
      });
    } else if (!["g", "aq", "l"].includes(record.state)) {
      faults.push({
        code: "conditions/unknown-label",
        path: ["inerts", index],
        message: `the inert ${record.label} stands in neither gas nor solution`,
        received: cut(record.label),
        expected: "gases, dissolved species and liquids",
      });
    }
    labels.add(record.label);
    inerts.push(record);
  });
  return inerts;
}

/** Refuses inerts of a phase that the conditions do not have: they would be passed over in silence. */
export function checkPlaces(
  inerts: readonly SpeciesRecord[],
  hasGas: boolean,
  hasSolution: boolean,
  faults: Fault[],
): void {
  for (const { label, state } of inerts) {
    const phase = state === "g" ? "gas" : "solution";
    const isSolid = state !== "g" && state !== "aq" && state !== "l";
    if (isSolid || (phase === "gas" ? hasGas : hasSolution)) continue;
    faults.push({
      code: "conditions/missing-composition",
      path: [phase],
      message: `the inert ${label} stands in no phase: the conditions have no ${phase}`,
      received: cut(label),
      expected: `${phase} with ${cut(label)}, or no such inert`,
    });
  }
}
