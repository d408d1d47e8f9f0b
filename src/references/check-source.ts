import { describeReceived, type Fault, type FaultPath } from "../errors/fault.js";
import { checkObject, checkOption, checkText } from "../errors/input.js";
import { references } from "./bibliography.js";

/** Checks a source: a key of the bibliography, or `{ text }` in the user's own words. */
export function checkSource(value: unknown, path: FaultPath, faults: Fault[]): void {
  if (typeof value === "string") {
    if (Object.hasOwn(references, value)) return;
    faults.push({
      code: "input/unknown-option",
      path,
      message: `${describeReceived(value)} is no key of the bibliography`,
      received: describeReceived(value),
      expected: "a key of references, or { text } in your own words",
      hint: `{ text: ${describeReceived(value)} }`,
    });
    return;
  }
  const source = checkObject(value, path, faults, { required: ["text"], optional: [] });
  if (source?.text !== undefined) checkText(source.text, [...path, "text"], faults);
}

/** Checks the members `source`, `origin` and `where` of a figure or fit. */
export function checkProvenance(
  members: { readonly source?: unknown; readonly origin?: unknown; readonly where?: unknown },
  path: FaultPath,
  faults: Fault[],
): void {
  if (members.source !== undefined) checkSource(members.source, [...path, "source"], faults);
  if (members.origin !== undefined) checkOption(members.origin, [...path, "origin"], faults, ["page", "memory"]);
  if (members.where !== undefined) checkText(members.where, [...path, "where"], faults);
}
