import type { FaultCode } from "./codes.js";
import { type Fault, type FaultPath, maximumFaults } from "./fault.js";

const mark: unique symbol = Symbol.for("gibbs-ledger/error");

/**
 * The one error class of the library. Its `faults` are plain data; its own `code` and `path` are those of the first.
 *
 * Recognise it with {@link isGibbsLedgerError}, not with `instanceof`: two copies of the package may be loaded.
 */
export class GibbsLedgerError extends Error {
  override readonly name: string = "GibbsLedgerError";
  /** Everything that was found wrong, at least one and at most 100 faults. */
  readonly faults: readonly Fault[];
  /** The code of the first fault. */
  readonly code: FaultCode;
  /** The path of the first fault. */
  readonly path: FaultPath;

  /** @param faults - at least one; those after the hundredth are counted in the message only */
  constructor(faults: readonly [Fault, ...Fault[]]) {
    super(messageOf(faults));
    this.faults = faults.slice(0, maximumFaults);
    this.code = faults[0].code;
    this.path = faults[0].path;
    Object.defineProperty(this, mark, { value: true });
  }
}

/**
 * Tells whether a caught value is an error of this library, from whichever copy of the package, and optionally
 * whether any of its faults has the given code.
 *
 * @example
 * try {
 *   quantity(Number.NaN, "K");
 * } catch (error) {
 *   isGibbsLedgerError(error, "quantity/not-finite"); // => true
 * }
 */
export function isGibbsLedgerError(value: unknown, code?: FaultCode): value is GibbsLedgerError {
  if (typeof value !== "object" || value === null) return false;
  if ((value as { [mark]?: unknown })[mark] !== true) return false;
  return code === undefined || (value as GibbsLedgerError).faults.some((fault) => fault.code === code);
}

/**
 * The faults of a caught value as plain data that can be posted to another thread or written as JSON.
 *
 * @param value - anything that was caught
 * @returns the faults of an error of this library; an empty array for anything else
 */
export function toFaults(value: unknown): Fault[] {
  return isGibbsLedgerError(value) ? value.faults.map((fault) => ({ ...fault, path: [...fault.path] })) : [];
}

/** Throws one fault. */
export function fail(fault: Fault): never {
  throw new GibbsLedgerError([fault]);
}

/** Throws the collected faults, if there are any. */
export function failIfAny(faults: readonly Fault[]): void {
  const [first, ...others] = faults;
  if (first !== undefined) throw new GibbsLedgerError([first, ...others]);
}

function messageOf(faults: readonly Fault[]): string {
  const lines = faults.slice(0, maximumFaults).map(lineOf);
  if (lines.length === 1) return lines[0] as string;
  const rest = faults.length > maximumFaults ? ` (the first ${maximumFaults} are listed)` : "";
  return `${faults.length} faults${rest}:\n${lines.map((line) => `- ${line}`).join("\n")}`;
}

function lineOf(fault: Fault): string {
  const place = fault.path.length === 0 ? "" : `${fault.path.join(".")}: `;
  const hint = fault.hint === undefined ? "" : ` (${fault.hint})`;
  return `${place}${fault.message}${hint}`;
}
