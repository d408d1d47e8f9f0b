import type { Label } from "../species/record.js";
import { isElectron, type Substance, stateOf } from "../species/substance.js";

/** The state that a species' activity is measured against. */
export type StandardState =
  | "ideal gas at 1 bar"
  | "pure phase at 1 bar"
  | "ideal solution of 1 mol/kg at 1 bar"
  | "electron of the standard hydrogen electrode";

/** Standard states by label. */
export type StandardStates = Readonly<Record<Label, StandardState>>;

/** The standard state of a substance. */
export function standardStateOf(substance: Substance): StandardState {
  if (isElectron(substance)) return "electron of the standard hydrogen electrode";
  const state = stateOf(substance);
  if (state === "g") return "ideal gas at 1 bar";
  return state === "aq" ? "ideal solution of 1 mol/kg at 1 bar" : "pure phase at 1 bar";
}
