import { cut, type Fault, type FaultPath } from "../errors/fault.js";
import { readFormula } from "../formula/read-formula.js";
import { collectHouseRecord } from "../species/house-record.js";

/** What is formed from the elements: atoms, charge and state of aggregation. */
export interface FormedSpecies {
  readonly label: string;
  readonly atoms: readonly { readonly symbol: string; readonly count: number }[];
  readonly chargeNumber: number;
  readonly state: string;
}

/** Reads a record, or a label with its state; undefined after a fault. */
export function readFormedSpecies(value: unknown, path: FaultPath, faults: Fault[]): FormedSpecies | undefined {
  if (typeof value === "string") return readStatedLabel(value, path, faults);
  const record = collectHouseRecord(value, path, faults);
  return record === undefined ? undefined : readStatedLabel(record.label, path, faults);
}

/** Reads a label that has to name its state of aggregation. */
export function readStatedLabel(label: string, path: FaultPath, faults: Fault[]): FormedSpecies | undefined {
  const read = readFormula(label, path, faults);
  if (read === undefined) return undefined;
  const { counts, chargeNumber, state } = read;
  if (state !== undefined) return { label, atoms: counts, chargeNumber, state };
  faults.push({
    code: "standard-state/no-state",
    path,
    message: `${cut(label, 60)} names no state of aggregation`,
    received: cut(label),
    expected: `a label such as ${cut(label, 60)}(g)`,
  });
  return undefined;
}
