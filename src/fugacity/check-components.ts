import { describeReceived, type Fault, type FaultPath } from "../errors/fault.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkArray, checkObject, checkText, forbiddenKeys } from "../errors/input.js";
import type { GasComponent } from "./equation-of-state.js";

/** Acentric factors of real substances lie between -0.4 (helium) and about 1.5; beyond these bounds one is a slip. */
const acentricFactorBounds = { above: -1, below: 3 } as const;

/**
 * Checks the components of a mixture: at least one, different labels, critical constants that are positive.
 *
 * @returns the labels in order
 * @throws GibbsLedgerError with every fault at once: "input/not-an-array", "input/not-an-object",
 * "input/not-a-string", "input/missing", "input/unknown-key", "input/forbidden-key",
 * "conditions/missing-composition", "conditions/duplicate-label", "fugacity/invalid-critical-constants"
 */
export function checkComponents(components: readonly GasComponent[], path: FaultPath): readonly string[] {
  const faults: Fault[] = [];
  const given = checkArray(components, path, faults);
  if (given?.length === 0) {
    faults.push({
      code: "conditions/missing-composition",
      path,
      message: "a gas mixture has at least one component",
      received: describeReceived(given),
      expected: "at least one gas component",
    });
  }
  const labels: string[] = [];
  given?.forEach((component, index) => {
    const label = checkComponent(component, index, path, faults);
    if (label === undefined) return;
    if (labels.includes(label)) {
      faults.push({
        code: "conditions/duplicate-label",
        path: [...path, label],
        message: `${label} is given twice`,
        received: label,
        expected: "each component once",
      });
    }
    labels.push(label);
  });
  failIfAny(faults);
  return labels;
}

function checkComponent(component: unknown, index: number, path: FaultPath, faults: Fault[]): string | undefined {
  const keys = { required: ["label"], optional: ["critical"] } as const;
  const members = checkObject(component, [...path, index], faults, keys);
  if (members?.label === undefined) return undefined;
  const label = checkText(members.label, [...path, index, "label"], faults, 500);
  if (label === undefined) return undefined;
  if (forbiddenKeys.includes(label)) {
    faults.push({
      code: "input/forbidden-key",
      path: [...path, index, "label"],
      message: `the label ${label} is refused`,
      received: label,
    });
    return undefined;
  }
  if (members.critical !== undefined) checkCritical(members.critical, [...path, label, "critical"], faults);
  return label;
}

function checkCritical(critical: unknown, path: FaultPath, faults: Fault[]): void {
  const members = checkObject(critical, path, faults, {
    required: ["temperatureK", "pressurePa"],
    optional: ["acentricFactor", "volumeM3PerMol"],
  });
  if (members === undefined) return;
  const positives = { temperatureK: "K", pressurePa: "Pa", volumeM3PerMol: "m3/mol" } as const;
  for (const key of ["temperatureK", "pressurePa", "volumeM3PerMol"] as const) {
    const value = members[key];
    if (value === undefined || isBetween(value, 0, Number.POSITIVE_INFINITY)) continue;
    faults.push(invalid(value, [...path, key], `a finite number above 0, in ${positives[key]}`));
  }
  const { above, below } = acentricFactorBounds;
  const omega = members.acentricFactor;
  if (omega === undefined || isBetween(omega, above, below)) return;
  faults.push(invalid(omega, [...path, "acentricFactor"], `a number between ${above} and ${below}`));
}

function isBetween(value: unknown, above: number, below: number): boolean {
  return typeof value === "number" && value > above && value < below;
}

function invalid(value: unknown, path: FaultPath, expected: string): Fault {
  const received = describeReceived(value);
  const message = `${received} is no such critical constant; expected ${expected}`;
  return { code: "fugacity/invalid-critical-constants", path, message, received, expected };
}
