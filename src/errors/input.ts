import { cut, describeReceived, type Fault, type FaultPath } from "./fault.js";
import { nearest } from "./nearest.js";

/** Keys that could reach the prototype of an object and are refused wherever they stand. */
export const forbiddenKeys: readonly string[] = ["__proto__", "constructor", "prototype"];

/** An object whose shape is known, its values not yet. */
export type Members<K extends string = string> = { readonly [Name in K]?: unknown };

/** What keys an object has to have and may have; `optional: "any"` for maps by label. */
export interface Keys<R extends string = string, O extends string = string> {
  readonly required: readonly R[];
  readonly optional: readonly O[] | "any";
}

/**
 * Checks that a value is a plain object with the given keys, and collects every fault of its shape.
 *
 * @returns the object, or undefined where the value is none
 */
export function checkObject<R extends string, O extends string>(
  value: unknown,
  path: FaultPath,
  faults: Fault[],
  keys: Keys<R, O>,
): Members<R | O> | undefined {
  if (typeof value !== "object" || value === null || Array.isArray(value)) {
    faults.push({
      code: "input/not-an-object",
      path,
      message: `expected an object, got ${describeReceived(value)}`,
      received: describeReceived(value),
      expected: keys.required.length === 0 ? "an object" : `an object with ${keys.required.join(", ")}`,
    });
    return undefined;
  }
  const members = value as Members<R | O>;
  const { optional } = keys;
  const known: readonly string[] = optional === "any" ? keys.required : [...keys.required, ...optional];
  for (const key of Object.keys(value)) {
    if (forbiddenKeys.includes(key)) {
      faults.push({
        code: "input/forbidden-key",
        path: [...path, key],
        message: `the key ${key} is refused`,
        received: key,
      });
    } else if (optional !== "any" && !known.includes(key)) {
      const near = nearest(key, known);
      faults.push({
        code: "input/unknown-key",
        path: [...path, cut(key)],
        message: `there is no ${describeReceived(key)} here`,
        received: cut(key),
        expected: known.join(", "),
        ...(near === undefined ? {} : { hint: `did you mean ${near}?` }),
      });
    }
  }
  for (const key of keys.required) {
    if (!Object.hasOwn(value, key) || members[key] === undefined) {
      faults.push({ code: "input/missing", path: [...path, key], message: `${key} is missing`, expected: key });
    }
  }
  return members;
}

/** Checks that a value is a finite number. */
export function checkNumber(value: unknown, path: FaultPath, faults: Fault[]): number | undefined {
  if (typeof value === "number" && Number.isFinite(value)) return value;
  faults.push({
    code: "input/not-finite",
    path,
    message: `expected a finite number, got ${describeReceived(value)}`,
    received: describeReceived(value),
    expected: "a finite number",
    ...(typeof value === "string" ? { hint: "a number, not a text" } : {}),
  });
  return undefined;
}

/** Checks that a value is a text that is neither empty nor longer than a limit. */
export function checkText(
  value: unknown,
  path: FaultPath,
  faults: Fault[],
  longest: number = 1000,
): string | undefined {
  if (typeof value !== "string" || value === "") {
    faults.push({
      code: "input/not-a-string",
      path,
      message: `expected a text, got ${describeReceived(value)}`,
      received: describeReceived(value),
      expected: "a text that is not empty",
    });
    return undefined;
  }
  if (value.length <= longest) return value;
  faults.push({
    code: "input/too-large",
    path,
    message: `the text has ${value.length} characters, at most ${longest} are read`,
    received: describeReceived(value),
    expected: `at most ${longest} characters`,
  });
  return undefined;
}

/** Checks that a value is one of a closed set of words. */
export function checkOption<W extends string>(
  value: unknown,
  path: FaultPath,
  faults: Fault[],
  words: readonly W[],
): W | undefined {
  if (typeof value === "string" && (words as readonly string[]).includes(value)) return value as W;
  const near = typeof value === "string" ? nearest(value, words) : undefined;
  faults.push({
    code: "input/unknown-option",
    path,
    message: `expected one of ${words.join(", ")}, got ${describeReceived(value)}`,
    received: describeReceived(value),
    expected: words.join(", "),
    ...(near === undefined ? {} : { hint: `did you mean ${near}?` }),
  });
  return undefined;
}

/** Checks that a value is an array within a limit of length. */
export function checkArray(
  value: unknown,
  path: FaultPath,
  faults: Fault[],
  longest: number = 10_000,
): readonly unknown[] | undefined {
  if (!Array.isArray(value)) {
    faults.push({
      code: "input/not-an-array",
      path,
      message: `expected an array, got ${describeReceived(value)}`,
      received: describeReceived(value),
      expected: "an array",
    });
    return undefined;
  }
  // A copy without holes: what stands nowhere is visited as undefined.
  if (value.length <= longest) return Array.from(value);
  faults.push({
    code: "input/too-large",
    path,
    message: `the array has ${value.length} entries, at most ${longest} are read`,
    expected: `at most ${longest} entries`,
  });
  return undefined;
}
