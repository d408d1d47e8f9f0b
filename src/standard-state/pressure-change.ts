import type { Fault, FaultPath } from "../errors/fault.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkObject, type Members } from "../errors/input.js";
import { checkPositiveQuantity } from "../quantity/guards.js";
import type { Pressure, Temperature } from "../quantity/quantity.js";
import { lnOfRatio } from "./ln-of-ratio.js";

/** A standard pressure that figures refer to, and the one they are wanted at. */
export interface StandardPressureChange {
  /** Above 0 Pa. */
  readonly from: Pressure;
  /** Above 0 Pa. */
  readonly to: Pressure;
}

/** A change of standard pressure at a temperature. */
export interface StandardPressureChangeAtTemperature extends StandardPressureChange {
  /** Above 0 K. */
  readonly temperature: Temperature;
}

/** A checked change: pressures in pascal and ln(to / from). */
export interface PressureStep {
  readonly fromPa: number;
  readonly toPa: number;
  readonly lnRatio: number;
}

/**
 * The members of options that hold a change of standard pressure.
 *
 * @throws GibbsLedgerError at once where they are no object, with the faults collected before
 */
export function changeMembers<R extends string, O extends string>(
  options: unknown,
  required: readonly R[],
  optional: readonly O[],
  faults: Fault[],
): Members<R | O | "from" | "to"> {
  const members = checkObject(options, [], faults, { required: ["from", "to", ...required], optional });
  if (members === undefined) failIfAny(faults);
  return members as Members<R | O | "from" | "to">;
}

/** Checks both pressures; undefined after a fault. A missing one is a fault of the members already. */
export function checkPressureStep(members: Members<"from" | "to">, faults: Fault[]): PressureStep | undefined {
  const fromPa = checkPresent(members.from, "pressure", ["from"], faults);
  const toPa = checkPresent(members.to, "pressure", ["to"], faults);
  if (fromPa === undefined || toPa === undefined) return undefined;
  return { fromPa, toPa, lnRatio: lnOfRatio(toPa, fromPa) };
}

/** Checks a positive quantity that may be missing, which is reported elsewhere. */
export function checkPresent(
  value: unknown,
  dimension: "molarMass" | "massDensity" | "pressure" | "temperature",
  path: FaultPath,
  faults: Fault[],
): number | undefined {
  return value === undefined ? undefined : checkPositiveQuantity(value, dimension, path, faults);
}
