import type { Fault } from "../../src/errors/fault.js";
import { isGibbsLedgerError } from "../../src/errors/gibbs-ledger-error.js";

/** The faults that a call throws; anything else that it does is an error of the test. */
export function faultsOf(call: () => unknown): readonly Fault[] {
  try {
    call();
  } catch (error) {
    if (!isGibbsLedgerError(error)) throw error;
    return error.faults;
  }
  throw new Error("nothing was refused");
}

/** Code and path of each fault, as `code at path`. */
export function placesOf(call: () => unknown): readonly string[] {
  return faultsOf(call).map(({ code, path }) => `${code} at ${path.join(".")}`);
}
