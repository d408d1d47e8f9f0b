import * as z from "zod";
import { withRule } from "../errors/schema.js";
import type { ActivityModel } from "./activity-model.js";
import { checkActivityModel } from "./check-activity-model.js";

/** Schema of an activity model: an object that the caller hands in, which JSON cannot hold. */
export const activityModelSchema: z.ZodType<ActivityModel> = withRule(
  z.unknown() as z.ZodType<ActivityModel>,
  (value) => checkActivityModel(value, [], []) !== undefined,
  "no activity model { name, parameters, scales, solution }",
);
