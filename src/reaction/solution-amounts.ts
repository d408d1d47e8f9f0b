import { cut, describeReceived, type Fault, type FaultPath } from "../errors/fault.js";
import { checkObject, type Members } from "../errors/input.js";
import { checkFraction, checkFractionSum } from "../fugacity/check-fractions.js";
import { checkPositiveQuantity, checkQuantity } from "../quantity/guards.js";
import type { Dimension } from "../quantity/units.js";
import type { Label } from "../species/record.js";

/** The scales that the composition of a solution may be given on, by the name of the field. */
export const solutionScales = ["molalities", "moleFractions", "concentrations"] as const;

/** One of the scales that the composition of a solution may be given on. */
export type SolutionScale = (typeof solutionScales)[number];

/** The composition of a solution as given, in coherent SI. */
export interface GivenAmounts {
  readonly scale: SolutionScale;
  /** Where the map by label stands in the conditions. */
  readonly path: FaultPath;
  /** What the map names, whether its value is sound or not. */
  readonly labels: readonly Label[];
  /** Mole fractions, mol/kg or mol/m3, of those labels whose value is sound. */
  readonly amounts: ReadonlyMap<Label, number>;
  /** In kg/m3, with concentrations. */
  readonly massDensity: number | undefined;
}

/** Reads the one scale of a solution, and collects every fault of it; undefined where there is none, or more than one. */
export function readAmounts(
  solution: Members<SolutionScale | "density">,
  path: FaultPath,
  faults: Fault[],
): GivenAmounts | undefined {
  const given = solutionScales.filter((scale) => solution[scale] !== undefined);
  const massDensity = readDensity(solution, path, faults);
  if (given.length !== 1) {
    faults.push({
      code: given.length === 0 ? "conditions/missing-composition" : "conditions/duplicate-label",
      path,
      message: given.length === 0 ? "the solution has no composition" : `the solution has ${given.join(" and ")}`,
      expected: `one of ${solutionScales.join(", ")}`,
    });
    return undefined;
  }
  const scale = given[0]!;
  const here: FaultPath = [...path, scale];
  const members = checkObject(solution[scale], here, faults, { required: [], optional: "any" });
  if (members === undefined) return undefined;
  const amounts = new Map<Label, number>();
  const labels = Object.keys(members);
  for (const label of labels) {
    const amount = readAmount(scale, members[label as keyof typeof members], [...here, cut(label)], faults);
    if (amount !== undefined) amounts.set(label, amount);
  }
  if (scale === "moleFractions" && amounts.size === labels.length) {
    checkFractionSum(amounts.values(), here, faults, "solution");
  }
  return { scale, path: here, labels, amounts, massDensity };
}

function readDensity(
  solution: Members<SolutionScale | "density">,
  path: FaultPath,
  faults: Fault[],
): number | undefined {
  const here: FaultPath = [...path, "density"];
  const { density, concentrations } = solution;
  if (density !== undefined && concentrations === undefined) {
    faults.push({
      code: "input/conflicting-options",
      path: here,
      message: "a density is read with concentrations only",
      received: describeReceived(density),
      hint: "leave it out; molalities and mole fractions need none",
    });
  }
  if (density !== undefined) return checkPositiveQuantity(density, "massDensity", here, faults);
  if (concentrations !== undefined) {
    faults.push({
      code: "input/missing",
      path: here,
      message: "concentrations need the density of the solution",
      expected: 'such as density: { value: 0.997, unit: "kg/L" }',
      hint: "molalities need none",
    });
  }
  return undefined;
}

function readAmount(scale: SolutionScale, value: unknown, path: FaultPath, faults: Fault[]): number | undefined {
  switch (scale) {
    case "moleFractions":
      return checkFraction(value, path, faults);
    case "molalities":
      return typeof value === "object" && value !== null
        ? readQuantity(value, "molality", path, faults)
        : notNegative(value, "molality", path, faults);
    case "concentrations":
      return readQuantity(value, "concentration", path, faults);
  }
}

function readQuantity(value: unknown, dimension: Dimension, path: FaultPath, faults: Fault[]): number | undefined {
  const si = checkQuantity(value, dimension, path, faults);
  return si === undefined ? undefined : notNegative(si, dimension, path, faults);
}

function notNegative(value: unknown, name: string, path: FaultPath, faults: Fault[]): number | undefined {
  if (typeof value === "number" && value >= 0 && value < Number.POSITIVE_INFINITY) return value + 0;
  faults.push({
    code: "conditions/invalid-amount",
    path,
    message: `a ${name} is a finite number from 0 up, got ${describeReceived(value)}`,
    received: describeReceived(value),
    expected:
      name === "molality" ? 'a number in mol/kg, or a quantity such as { value: 1, unit: "mol/kg" }' : "at least 0",
  });
  return undefined;
}
