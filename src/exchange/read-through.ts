import type { Fault, FaultPath } from "../errors/fault.js";
import { failIfAny, isGibbsLedgerError } from "../errors/gibbs-ledger-error.js";
import { readJson } from "./read-json.js";

/**
 * Reads JSON and hands its value to a guard; what is wrong with the text and what is wrong with the value are reported
 * together, with paths from the top of the text.
 *
 * @param guard - returns the house's own copy, or throws every fault of the value
 * @param toPlace - from a path of the guard to the place in the text
 */
export function readThrough<T>(
  input: unknown,
  guard: (value: unknown) => T,
  toPlace: (path: FaultPath) => FaultPath,
): T {
  const ofText: Fault[] = [];
  const value = readJson(input, ofText);
  const ofValue: Fault[] = [];
  const result = guarded(guard, value, ofValue);
  const placed = ofValue.map((fault) => ({ ...fault, path: toPlace(fault.path) }));
  failIfAny([...ofText, ...placed.filter((fault) => !ofText.some((known) => isSame(known, fault)))]);
  return result as T;
}

function guarded<T>(guard: (value: unknown) => T, value: unknown, faults: Fault[]): T | undefined {
  try {
    return guard(value);
  } catch (error) {
    if (!isGibbsLedgerError(error)) throw error;
    faults.push(...error.faults);
    return undefined;
  }
}

/** Whether the text has already told what the guard finds. */
function isSame(known: Fault, fault: Fault): boolean {
  const isSameCode = known.code === fault.code || [known, fault].every(({ code }) => code.endsWith("/not-finite"));
  return (
    isSameCode &&
    known.path.length === fault.path.length &&
    known.path.every((step, index) => step === fault.path[index])
  );
}
