import * as z from "zod";
import { faultCodes } from "./codes.js";
import type { Fault } from "./fault.js";
import { isGibbsLedgerError } from "./gibbs-ledger-error.js";

/** Text that is neither empty nor longer than a limit, as `checkText` reads it. */
export function textSchema(longest: number = 1000): z.ZodType<string> {
  return z.string().min(1).max(longest);
}

/** An optional member: like the guards, it takes an undefined that is written out for absent. */
export function optional<T>(schema: z.ZodType<T>): z.ZodExactOptional<z.ZodType<T>> {
  return schema.optional() as unknown as z.ZodExactOptional<z.ZodType<T>>;
}

/** A schema with a rule that ties members together, which is looked at where all else is sound. */
export function withRule<S extends z.ZodType>(
  schema: S,
  holds: (value: z.output<S>) => boolean,
  message: string,
  path: PropertyKey[] = [],
): S {
  return schema.refine(holds, { message, path, when: ({ issues }) => issues.length === 0 });
}

/** Whether a call is made without a fault of the library. */
export function succeeds(call: () => unknown): boolean {
  try {
    call();
    return true;
  } catch (error) {
    if (!isGibbsLedgerError(error)) throw error;
    return false;
  }
}

// zod passes over an own __proto__ of a record, and leaves it out of what comes after: it is sought before.
const noPrototype = z
  .unknown()
  .refine((value) => typeof value !== "object" || value === null || !hasOwnPrototype(value), {
    message: "the key __proto__ is refused",
  });

function hasOwnPrototype(value: object): boolean {
  return Object.hasOwn(value, "__proto__");
}

/** A map of anything to what the schema describes; keys that reach a prototype are refused. */
export function mapSchema<V>(value: z.ZodType<V>): z.ZodType<Record<string, V>> {
  const key = z.string().regex(/^(?!(?:__proto__|constructor|prototype)$)/);
  return noPrototype.pipe(z.record(key, value));
}

/**
 * Schema of a fault, as `toFaults` gives it: for programs that receive faults from elsewhere.
 *
 * @example
 * faultSchema.safeParse({ code: "input/missing", path: ["label"], message: "label is missing" }).success; // => true
 */
export const faultSchema: z.ZodType<Fault> = z.strictObject({
  code: z.enum(faultCodes),
  path: z.array(z.union([z.string(), z.int().nonnegative()])),
  message: z.string(),
  received: optional(z.string()),
  expected: optional(z.string()),
  hint: optional(z.string()),
});
