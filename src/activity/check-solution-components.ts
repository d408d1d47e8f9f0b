import { describeReceived, type Fault, type FaultPath } from "../errors/fault.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkArray, checkObject, checkOption, checkText, forbiddenKeys } from "../errors/input.js";
import type { SolutionComponents } from "./activity-model.js";
import { compositionScales } from "./check-activity-model.js";

/**
 * Checks the components of a solution: a scale, an uncharged solvent with its molar mass, solutes with different
 * labels.
 *
 * @throws GibbsLedgerError with every fault at once: "input/not-an-object", "input/not-an-array",
 * "input/not-a-string", "input/missing", "input/unknown-key", "input/unknown-option", "input/forbidden-key",
 * "conditions/duplicate-label", "activity/invalid-component"
 */
export function checkSolutionComponents(components: SolutionComponents, path: FaultPath): void {
  const faults: Fault[] = [];
  const members = checkObject(components, path, faults, { required: ["scale", "solvent", "solutes"], optional: [] });
  if (members?.scale !== undefined) checkOption(members.scale, [...path, "scale"], faults, compositionScales);
  const labels = new Set<string>();
  if (members?.solvent !== undefined) checkComponent(members.solvent, [...path, "solvent"], labels, faults, true);
  if (members?.solutes !== undefined) {
    checkArray(members.solutes, [...path, "solutes"], faults)?.forEach((solute, index) => {
      checkComponent(solute, [...path, "solutes", index], labels, faults, false);
    });
  }
  failIfAny(faults);
}

function checkComponent(
  value: unknown,
  path: FaultPath,
  labels: Set<string>,
  faults: Fault[],
  isSolvent: boolean,
): void {
  const members = checkObject(value, path, faults, {
    required: isSolvent ? ["label", "chargeNumber", "molarMassKgPerMol"] : ["label", "chargeNumber"],
    optional: ["molarMassKgPerMol"],
  });
  if (members === undefined) return;
  if (members.label !== undefined) checkLabel(members.label, [...path, "label"], labels, faults);
  const { chargeNumber, molarMassKgPerMol } = members;
  if (chargeNumber !== undefined && !(isSolvent ? chargeNumber === 0 : Number.isInteger(chargeNumber))) {
    faults.push(invalid(chargeNumber, [...path, "chargeNumber"], isSolvent ? "0" : "a whole number"));
  }
  const isMass = typeof molarMassKgPerMol === "number" && molarMassKgPerMol > 0 && Number.isFinite(molarMassKgPerMol);
  if (molarMassKgPerMol !== undefined && !isMass) {
    faults.push(invalid(molarMassKgPerMol, [...path, "molarMassKgPerMol"], "a finite number above 0, in kg/mol"));
  }
}

function checkLabel(value: unknown, path: FaultPath, labels: Set<string>, faults: Fault[]): void {
  const label = checkText(value, path, faults, 500);
  if (label === undefined) return;
  if (forbiddenKeys.includes(label)) {
    faults.push({ code: "input/forbidden-key", path, message: `the label ${label} is refused`, received: label });
  } else if (labels.has(label)) {
    faults.push({
      code: "conditions/duplicate-label",
      path,
      message: `${describeReceived(label)} is given twice`,
      received: describeReceived(label),
      expected: "each component once",
    });
  }
  labels.add(label);
}

function invalid(value: unknown, path: FaultPath, expected: string): Fault {
  const received = describeReceived(value);
  const message = `${received} is no such figure of a component; expected ${expected}`;
  return { code: "activity/invalid-component", path, message, received, expected };
}
