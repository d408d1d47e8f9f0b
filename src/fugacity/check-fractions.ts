import { cut, describeReceived, type Fault, type FaultPath } from "../errors/fault.js";
import { exactSum } from "../numeric/compensated.js";

/** Largest departure of a sum of fractions from 1. */
export const fractionTolerance = 1e-9;

/** Checks that a value is a mole fraction; collects "conditions/invalid-fraction". */
export function checkFraction(value: unknown, path: FaultPath, faults: Fault[]): number | undefined {
  if (typeof value === "number" && value >= 0 && value <= 1) return value + 0;
  faults.push({
    code: "conditions/invalid-fraction",
    path,
    message: `a mole fraction is a number from 0 to 1, got ${describeReceived(value)}`,
    received: describeReceived(value),
    expected: "a number from 0 to 1",
    ...(typeof value === "number" && value > 1 && value <= 100 ? { hint: `${value / 100} for ${value} per cent` } : {}),
  });
  return undefined;
}

/** What to list where fractions fall short of 1, by the phase that they describe. */
const completeList = { gas: "list inert gases too", solution: "list the solvent and inert species too" } as const;

/** Checks that fractions sum to 1 within 1e-9; collects "conditions/fractions-do-not-sum". */
export function checkFractionSum(
  fractions: Iterable<number>,
  path: FaultPath,
  faults: Fault[],
  phase: "gas" | "solution" = "gas",
): void {
  const sum = exactSum([...fractions]);
  if (Math.abs(sum - 1) <= fractionTolerance) return;
  faults.push({
    code: "conditions/fractions-do-not-sum",
    path,
    message: `the mole fractions of the ${phase} sum to ${sum}, not to 1`,
    received: String(sum),
    expected: `1 within ${fractionTolerance}`,
    hint: `${completeList[phase]}; nothing is renormalised`,
  });
}

/** The fault of a label that belongs nowhere; a bare key such as `N2` gets the label that it most likely means. */
export function unknownLabel(label: string, path: FaultPath, labels: readonly string[], expected: string): Fault {
  const meant = labels.find((candidate) => candidate.startsWith(`${label}(`) || candidate.startsWith(`${label}^`));
  return {
    code: "conditions/unknown-label",
    path,
    message: `${describeReceived(label)} belongs to no species here`,
    received: cut(label),
    expected: `${expected}: ${cut(labels.join(", "), 200)}`,
    ...(meant === undefined ? {} : { hint: `did you mean "${meant}"?` }),
  };
}
