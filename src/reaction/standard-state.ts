import type { Label, SpeciesRecord } from "../species/record.js";

/** The state that a species' activity is measured against. */
export type StandardState = "ideal gas at 1 bar" | "pure phase at 1 bar" | "ideal solution of 1 mol/kg at 1 bar";

/** Standard states by label. */
export type StandardStates = Readonly<Record<Label, StandardState>>;

/** The standard state of a record's phase. */
export function standardStateOf(record: SpeciesRecord): StandardState {
  if (record.state === "g") return "ideal gas at 1 bar";
  return record.state === "aq" ? "ideal solution of 1 mol/kg at 1 bar" : "pure phase at 1 bar";
}
