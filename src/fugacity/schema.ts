import * as z from "zod";
import type { Fault } from "../errors/fault.js";
import { mapSchema, withRule } from "../errors/schema.js";
import { checkEquationOfState } from "./check-equation-of-state.js";
import { checkFractionSum } from "./check-fractions.js";
import type { EquationOfState } from "./equation-of-state.js";

/** Schema of an equation of state: an object that the caller hands in, which JSON cannot hold. */
export const equationOfStateSchema: z.ZodType<EquationOfState> = withRule(
  z.unknown() as z.ZodType<EquationOfState>,
  (value) => {
    const faults: Fault[] = [];
    checkEquationOfState(value, [], faults);
    return faults.length === 0;
  },
  "no equation of state { name, parameters, mixture }",
);

/** Schema of mole fractions by label, which sum to 1. */
export const moleFractionsSchema: z.ZodType<Record<string, number>> = withRule(
  mapSchema(z.number().min(0).max(1)),
  (fractions) => {
    const faults: Fault[] = [];
    checkFractionSum(Object.values(fractions), [], faults);
    return faults.length === 0;
  },
  "the mole fractions of a phase sum to 1 within 1e-9",
);
