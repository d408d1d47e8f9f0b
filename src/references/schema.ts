import * as z from "zod";
import { textSchema } from "../errors/schema.js";
import { type Citation, references } from "./bibliography.js";
import type { Origin, Source } from "./source.js";

/**
 * Schema of a source: a key of the bibliography, or `{ text }` in the user's own words.
 *
 * @example
 * sourceSchema.safeParse("chase1998").success; // => true
 * sourceSchema.safeParse({ text: "our own measurement, invented" }).success; // => true
 * sourceSchema.safeParse("our own measurement").success; // => false
 */
export const sourceSchema: z.ZodType<Source> = z.union([
  z.enum(Object.keys(references) as [Citation, ...Citation[]]),
  z.strictObject({ text: textSchema() }),
]);

/**
 * Schema of an origin: whether a figure was read from the page of its source or recalled.
 *
 * @example
 * originSchema.safeParse("memory").success; // => true
 */
export const originSchema: z.ZodType<Origin> = z.enum(["page", "memory"]);
