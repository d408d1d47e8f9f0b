import { describeReceived, type FaultPath } from "../errors/fault.js";
import { fail } from "../errors/gibbs-ledger-error.js";

/**
 * Checks the raw doubles of a state; the composition's sum is not looked at.
 *
 * @throws GibbsLedgerError "quantity/not-positive" or "conditions/missing-composition"
 */
export function checkState(
  temperatureK: number,
  pressurePa: number,
  moleFractions: ArrayLike<number>,
  count: number,
  path: FaultPath,
): void {
  if (!(temperatureK > 0 && temperatureK < Number.POSITIVE_INFINITY)) refuse("temperatureK", temperatureK, "K", path);
  if (!(pressurePa > 0 && pressurePa < Number.POSITIVE_INFINITY)) refuse("pressurePa", pressurePa, "Pa", path);
  if (moleFractions.length !== count) refuseCount(moleFractions, count, path);
}

function refuse(name: string, value: unknown, unit: string, path: FaultPath): never {
  return fail({
    code: "quantity/not-positive",
    path: [...path, name],
    message: `${describeReceived(value)} ${unit} is not a finite number above 0 ${unit}`,
    received: describeReceived(value),
    expected: `a finite number above 0, in ${unit}`,
  });
}

function refuseCount(moleFractions: ArrayLike<number>, count: number, path: FaultPath): never {
  return fail({
    code: "conditions/missing-composition",
    path: [...path, "moleFractions"],
    message: `${moleFractions.length} mole fractions are given for ${count} components`,
    received: String(moleFractions.length),
    expected: `${count} mole fractions, in the order of the components`,
  });
}
