import fc from "fast-check";
import { expect } from "vitest";
import type * as z from "zod";
import type { Fault } from "../../src/errors/fault.js";

/**
 * Holds a schema to a guard on random values.
 *
 * @returns the share of values that both accept
 */
export function verdictsAgree(
  values: fc.Arbitrary<unknown>,
  schema: z.ZodType,
  faultsOf: (value: unknown) => readonly Fault[],
  numRuns: number,
): number {
  let accepted = 0;
  fc.assert(
    fc.property(values, (value) => {
      const faults = faultsOf(value);
      const result = schema.safeParse(value);
      expect({ faults, accepted: result.success, issues: result.error?.issues }).toMatchObject(
        faults.length === 0 ? { accepted: true } : { accepted: false },
      );
      if (result.success) accepted += 1;
    }),
    { seed: 20270302, numRuns },
  );
  return accepted / numRuns;
}
