import { describeReceived, type Fault, type FaultPath } from "../errors/fault.js";
import { checkArray, checkNumber, checkObject, checkOption } from "../errors/input.js";
import { checkFigure } from "../quantity/check-figure.js";
import { checkForm } from "./check-form.js";
import type { PublishedInterval, PublishedSeries } from "./published-series.js";

/** Keys of a published series, for rooms that add keys of their own. */
export const seriesKeys = {
  required: ["kind", "form", "intervals"],
  optional: ["gasConstant", "unit", "powers", "decimalShifts", "anchor"],
} as const;

const endKinds: readonly PublishedInterval["endsAt"][] = ["fit", "first-order", "continuous"];

/**
 * Checks a published series whose keys were checked before, and collects every fault: intervals rising and joined,
 * coefficients finite and as many as the form has, what the form needs and what it does not take.
 */
export function checkSeries(
  members: { readonly [Key in keyof PublishedSeries]?: unknown },
  path: FaultPath,
  faults: Fault[],
): void {
  const before = faults.length;
  if (members.kind !== undefined) checkOption(members.kind, [...path, "kind"], faults, ["series"]);
  if (members.form !== undefined && typeof members.form !== "string") {
    faults.push({ code: "heat-capacity/unknown-form", path: [...path, "form"], message: "the form is not a text" });
  }
  if (members.gasConstant !== undefined) checkGasConstant(members.gasConstant, [...path, "gasConstant"], faults);
  if (members.unit !== undefined) {
    checkOption(members.unit, [...path, "unit"], faults, ["J/mol/K", "cal_th/mol/K"]);
  }
  if (members.powers !== undefined) checkNumbers(members.powers, [...path, "powers"], faults);
  if (members.decimalShifts !== undefined) checkShifts(members.decimalShifts, [...path, "decimalShifts"], faults);
  checkIntervals(members.intervals, [...path, "intervals"], faults);
  if (members.anchor !== undefined) checkAnchor(members.anchor, [...path, "anchor"], faults);
  const isWhole = members.form !== undefined && members.intervals !== undefined;
  if (isWhole && faults.length === before) checkForm(members as PublishedSeries, path, faults);
}

function checkGasConstant(value: unknown, path: FaultPath, faults: Fault[]): void {
  const gasConstant = checkNumber(value, path, faults);
  if (gasConstant === undefined || (gasConstant > 8.3 && gasConstant < 8.33)) return;
  faults.push({
    code: "input/unknown-option",
    path,
    message: `${gasConstant} is no molar gas constant in J/mol/K`,
    received: String(gasConstant),
    expected: "between 8.30 and 8.33 J/mol/K, as printed by the source",
  });
}

function checkIntervals(value: unknown, path: FaultPath, faults: Fault[]): void {
  if (value === undefined) return;
  const intervals = checkArray(value, path, faults, 100);
  if (intervals === undefined) return;
  if (intervals.length === 0) {
    faults.push({ code: "heat-capacity/intervals", path, message: "a fit has at least one interval" });
  }
  let end: number | undefined;
  intervals.forEach((entry, index) => {
    const here = [...path, index];
    const interval = checkObject(entry, here, faults, {
      required: ["from", "to", "coefficients", "endsAt"],
      optional: [],
    });
    if (interval === undefined) return;
    const from = interval.from === undefined ? undefined : checkNumber(interval.from, [...here, "from"], faults);
    const to = interval.to === undefined ? undefined : checkNumber(interval.to, [...here, "to"], faults);
    if (interval.coefficients !== undefined) checkNumbers(interval.coefficients, [...here, "coefficients"], faults);
    if (interval.endsAt !== undefined) checkOption(interval.endsAt, [...here, "endsAt"], faults, endKinds);
    if (from !== undefined && to !== undefined && !(from > 0 && from < to)) {
      faults.push({
        code: "heat-capacity/intervals",
        path: here,
        message: `an interval rises from above 0 K, got ${from} K to ${to} K`,
        expected: "from < to, in kelvin",
      });
    }
    if (end !== undefined && from !== undefined && from !== end) {
      faults.push({
        code: "heat-capacity/intervals",
        path: [...here, "from"],
        message: `the interval begins at ${from} K, the one before ends at ${end} K`,
        received: String(from),
        expected: `${end} K`,
      });
    }
    end = to;
  });
}

function checkNumbers(value: unknown, path: FaultPath, faults: Fault[]): void {
  checkArray(value, path, faults, 100)?.forEach((entry, index) => {
    checkNumber(entry, [...path, index], faults);
  });
}

function checkShifts(value: unknown, path: FaultPath, faults: Fault[]): void {
  checkArray(value, path, faults, 100)?.forEach((entry, index) => {
    if (Number.isInteger(entry) && Math.abs(entry as number) <= 30) return;
    faults.push({
      code: "input/unknown-option",
      path: [...path, index],
      message: `a decimal shift is a whole number from -30 to 30, got ${describeReceived(entry)}`,
      received: describeReceived(entry),
      expected: "3 where the heading says x 10^3",
    });
  });
}

function checkAnchor(value: unknown, path: FaultPath, faults: Fault[]): void {
  const anchor = checkObject(value, path, faults, { required: ["temperature", "enthalpy", "entropy"], optional: [] });
  if (anchor === undefined) return;
  if (anchor.temperature !== undefined)
    checkFigure(anchor.temperature, "temperature", [...path, "temperature"], faults);
  if (anchor.enthalpy !== undefined) checkFigure(anchor.enthalpy, "molarEnergy", [...path, "enthalpy"], faults);
  if (anchor.entropy !== undefined) checkFigure(anchor.entropy, "molarEntropy", [...path, "entropy"], faults);
}
