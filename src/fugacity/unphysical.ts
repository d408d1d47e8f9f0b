import type { FaultPath } from "../errors/fault.js";
import { fail } from "../errors/gibbs-ledger-error.js";

/**
 * Refuses a state whose compressibility factor or molar volume is not a positive number that a double can hold, or
 * whose departures a double cannot hold.
 *
 * @throws GibbsLedgerError "fugacity/unphysical"
 */
export function refuseUnphysical(
  compressibilityFactor: number,
  molarVolume: number,
  path: FaultPath,
  hint: string = "use a temperature and a pressure nearer to those of a gas",
): never {
  return fail({
    code: "fugacity/unphysical",
    path,
    message:
      `the equation of state gives no state of a gas: a compressibility factor of ` +
      `${shortNumber(compressibilityFactor)} and a molar volume of ${shortNumber(molarVolume)} m3/mol`,
    received: `Z = ${shortNumber(compressibilityFactor)}`,
    expected: "a finite compressibility factor and molar volume above 0, and finite departures",
    hint,
  });
}

/** A number for a message, to four significant digits. */
export function shortNumber(value: number): string {
  return Number.isFinite(value) ? String(Number(value.toPrecision(4))) : String(value);
}
