import { describeReceived, type FaultPath } from "../errors/fault.js";
import { fail } from "../errors/gibbs-ledger-error.js";
import type { SolutionAmounts } from "./activity-model.js";

/**
 * Checks the raw doubles of a solution's state; sums are not looked at.
 *
 * @throws GibbsLedgerError "input/not-an-object", "quantity/not-positive", "conditions/missing-composition",
 * "conditions/invalid-amount"
 */
export function checkSolutionState(
  temperatureK: number,
  pressurePa: number,
  amounts: SolutionAmounts,
  count: number,
  path: FaultPath,
): void {
  if (typeof amounts?.solutes?.length !== "number") refuseAmounts(amounts, path);
  const { solventMoleFraction, solutes } = amounts;
  if (!isPositive(temperatureK)) refuse("temperatureK", temperatureK, " K", path);
  if (!isPositive(pressurePa)) refuse("pressurePa", pressurePa, " Pa", path);
  if (!(isPositive(solventMoleFraction) && solventMoleFraction <= 1)) {
    refuse("solventMoleFraction", solventMoleFraction, "", path);
  }
  if (solutes.length !== count) {
    fail({
      code: "conditions/missing-composition",
      path: [...path, "solutes"],
      message: `${solutes.length} amounts are given for ${count} solutes`,
      received: String(solutes.length),
      expected: `${count} amounts, in the order of the solutes`,
    });
  }
  for (let index = 0; index < count; index += 1) {
    const amount = solutes[index]!;
    if (amount !== 0 && !isPositive(amount)) refuseAmount(amount, [...path, "solutes", index]);
  }
}

/** Texts compare as numbers, and plain JavaScript may pass them. */
function isPositive(value: unknown): boolean {
  return typeof value === "number" && value > 0 && value < Number.POSITIVE_INFINITY;
}

function refuse(name: string, value: unknown, unit: string, path: FaultPath): never {
  const limit = name === "solventMoleFraction" ? " up to 1" : "";
  return fail({
    code: "quantity/not-positive",
    path: [...path, name],
    message: `${describeReceived(value)}${unit} is not a finite number above 0${unit}${limit}`,
    received: describeReceived(value),
    expected: `a finite number above 0${unit}${limit}`,
  });
}

function refuseAmounts(value: unknown, path: FaultPath): never {
  const expected = "{ solventMoleFraction, solutes }, one amount per solute";
  const received = describeReceived(value);
  return fail({
    code: "input/not-an-object",
    path,
    message: `expected ${expected}, got ${received}`,
    received,
    expected,
  });
}

function refuseAmount(value: unknown, path: FaultPath): never {
  return fail({
    code: "conditions/invalid-amount",
    path,
    message: `an amount of a solute is a finite number from 0 up, got ${describeReceived(value)}`,
    received: describeReceived(value),
    expected: "a finite number, at least 0",
  });
}
