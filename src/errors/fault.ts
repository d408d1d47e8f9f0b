import type { FaultCode } from "./codes.js";

/** Where in the input a fault lies: property names and array indices from the outside in. */
export type FaultPath = readonly (string | number)[];

/** One thing that is wrong with an input, as plain data. */
export interface Fault {
  /** What kind of fault it is, from the closed table. */
  readonly code: FaultCode;
  /** Where it lies in the input; empty when the input as a whole is meant. */
  readonly path: FaultPath;
  /** One readable line: what was given, what was expected. */
  readonly message: string;
  /** The value that was given, in short form. */
  readonly received?: string;
  /** What would have been accepted. */
  readonly expected?: string;
  /** The likely fix. */
  readonly hint?: string;
}

/** The most faults that one error reports. */
export const maximumFaults = 100;

/** The longest echo of a given value, in characters. */
export const maximumEchoLength = 80;

/**
 * Describes a received value for a message, on one line and at most 80 characters long.
 *
 * Never runs code of the value: no getter, toJSON or toString of an object is called.
 */
export function describeReceived(value: unknown): string {
  if (value === null) return "null";
  switch (typeof value) {
    case "string":
      return cut(quoted(value.length > maximumEchoLength ? value.slice(0, maximumEchoLength) : value));
    case "number":
      return Object.is(value, -0) ? "-0" : String(value);
    case "boolean":
    case "undefined":
      return String(value);
    case "bigint":
      return cut(`${value}n`);
    case "function":
      return "a function";
    case "symbol":
      return "a symbol";
    default:
      return Array.isArray(value) ? `an array of ${value.length}` : "an object";
  }
}

/** Cuts a text to the longest echo, with an ellipsis where something is missing. */
export function cut(text: string, length: number = maximumEchoLength): string {
  return text.length <= length ? text : `${text.slice(0, length - 1)}…`;
}

function quoted(text: string): string {
  return JSON.stringify(text);
}
