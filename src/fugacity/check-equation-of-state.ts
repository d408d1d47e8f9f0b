import { describeReceived, type Fault, type FaultPath } from "../errors/fault.js";
import type { EquationOfState } from "./equation-of-state.js";

/** Checks that a value has the form of an equation of state; collects "input/not-an-object". */
export function checkEquationOfState(value: unknown, path: FaultPath, faults: Fault[]): void {
  if (typeof value === "object" && value !== null) {
    const { name, parameters, mixture } = value as Partial<Record<keyof EquationOfState, unknown>>;
    if (typeof name === "string" && typeof parameters === "object" && typeof mixture === "function") return;
  }
  const received = describeReceived(value);
  faults.push({
    code: "input/not-an-object",
    path,
    message: `${received} is no equation of state`,
    received,
    expected: "{ name, parameters, mixture }, such as idealGas() or virial()",
    ...(typeof value === "function" ? { hint: "call it: virial(), not virial" } : {}),
  });
}
