import { describeReceived, type Fault, type FaultPath } from "../errors/fault.js";
import type { ActivityModel, CompositionScale } from "./activity-model.js";

/** The scales that a model may name. */
export const compositionScales: readonly CompositionScale[] = ["molality", "mole-fraction"];

/** Checks that a value has the form of an activity model; collects "input/not-an-object". */
export function checkActivityModel(value: unknown, path: FaultPath, faults: Fault[]): ActivityModel | undefined {
  if (isActivityModel(value)) return value;
  const received = describeReceived(value);
  faults.push({
    code: "input/not-an-object",
    path,
    message: `${received} is no activity model`,
    received,
    expected: "{ name, parameters, scales, solution }, such as idealSolution()",
    ...(typeof value === "function" ? { hint: "call it: idealSolution(), not idealSolution" } : {}),
  });
  return undefined;
}

function isActivityModel(value: unknown): value is ActivityModel {
  if (typeof value !== "object" || value === null) return false;
  const { name, parameters, scales, solution } = value as Partial<Record<keyof ActivityModel, unknown>>;
  return (
    typeof name === "string" &&
    typeof parameters === "object" &&
    parameters !== null &&
    Array.isArray(scales) &&
    scales.length > 0 &&
    scales.every((scale) => (compositionScales as readonly unknown[]).includes(scale)) &&
    typeof solution === "function"
  );
}
