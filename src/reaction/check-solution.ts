import type { ActivityModel, CompositionScale, SolventComponent } from "../activity/activity-model.js";
import { checkActivityModel } from "../activity/check-activity-model.js";
import { solutionComponentOf } from "../activity/solution-component-of.js";
import { cut, describeReceived, type Fault, type FaultPath } from "../errors/fault.js";
import { checkObject } from "../errors/input.js";
import { unknownLabel } from "../fugacity/check-fractions.js";
import type { Label, SpeciesRecord } from "../species/record.js";
import { chargeNotes } from "./charge-notes.js";
import { noMolarMass, scaledAmounts } from "./scaled-amounts.js";
import { type GivenAmounts, readAmounts } from "./solution-amounts.js";
import type { CheckedSolution } from "./solution-phase.js";

/** What a solution is checked against. */
export interface SolutionSurroundings {
  /** Records of the reaction. */
  readonly reacting: readonly SpeciesRecord[];
  readonly inerts: readonly SpeciesRecord[];
  readonly activities: ReadonlyMap<Label, number>;
  /** Labels that the gas names. */
  readonly inGas: ReadonlySet<Label>;
}

const here: FaultPath = ["solution"];

/** Checks the solution of conditions against the species of a reaction and its inerts, and collects every fault. */
export function checkSolution(
  given: unknown,
  surroundings: SolutionSurroundings,
  faults: Fault[],
): CheckedSolution | undefined {
  const before = faults.length;
  const solution = checkObject(given, here, faults, {
    required: ["solvent"],
    optional: ["molalities", "moleFractions", "concentrations", "density", "activityModel"],
  });
  if (solution === undefined) return undefined;
  const model = readModel(solution.activityModel, faults);
  const candidates = new Map(
    [...surroundings.reacting, ...surroundings.inerts]
      .filter(({ state }) => state === "aq" || state === "l")
      .map((record) => [record.label, record]),
  );
  const solvent = solution.solvent === undefined ? undefined : readSolvent(solution.solvent, candidates, faults);
  const amounts = readAmounts(solution, here, faults);
  if (amounts === undefined) return undefined;
  if (solvent !== undefined) checkSolventAmount(solvent, amounts, faults);
  checkLabels(amounts, solvent, candidates, surroundings, faults);
  if (solvent === undefined) return undefined;
  const solutes = amounts.labels
    .filter((label) => label !== solvent.label)
    .flatMap((label) => candidates.get(label) ?? [])
    .sort(byLabel);
  const scale = scaleOf(amounts, solutes, model, faults);
  if (scale === undefined || model === undefined) return undefined;
  if (!model.scales.includes(scale)) refuseScale(model, scale, faults);
  const component = solventComponent(solvent, faults);
  if (component === undefined || faults.length > before) return undefined;
  const values = solutes.map(({ label }) => amounts.amounts.get(label)!);
  const converted = scaledAmounts(amounts, values, scale, component, solutes, faults);
  if (converted === undefined) return undefined;
  return {
    model,
    components: { scale, solvent: component, solutes: solutes.map((record) => solutionComponentOf(record)) },
    ...converted,
    path: amounts.path,
    notes: scale === "molality" ? chargeNotes(solutes, converted.amounts) : [],
  };
}

function byLabel(a: SpeciesRecord, b: SpeciesRecord): number {
  return a.label < b.label ? -1 : 1;
}

function readModel(value: unknown, faults: Fault[]): ActivityModel | undefined {
  const path: FaultPath = [...here, "activityModel"];
  if (value !== undefined) return checkActivityModel(value, path, faults);
  faults.push({
    code: "conditions/missing-activity-model",
    path,
    message: "the solution has no activity model; none is taken for ideal in silence",
    expected: "an activity model",
    hint: "activityModel: idealSolution(), of gibbs-ledger/activity, takes every activity coefficient for 1",
  });
  return undefined;
}

function readSolvent(
  value: unknown,
  candidates: ReadonlyMap<Label, SpeciesRecord>,
  faults: Fault[],
): SpeciesRecord | undefined {
  const path: FaultPath = [...here, "solvent"];
  if (typeof value !== "string") {
    faults.push({
      code: "input/not-a-string",
      path,
      message: `a solvent is named by its label, got ${describeReceived(value)}`,
      received: describeReceived(value),
      expected: 'a label such as "H2O(l)"',
    });
    return undefined;
  }
  const record = candidates.get(value);
  if (record !== undefined && isSolvent(record)) return record;
  const liquids = [...candidates.values()].filter(isSolvent).map(({ label }) => label);
  const expected = "an uncharged liquid of the reaction, or of inerts";
  const fault = unknownLabel(value, path, liquids, expected);
  faults.push(record === undefined ? fault : { ...fault, message: `${record.label} is no uncharged liquid` });
  return undefined;
}

function isSolvent({ state, chargeNumber }: SpeciesRecord): boolean {
  return state === "l" && chargeNumber === 0;
}

function solventComponent(record: SpeciesRecord, faults: Fault[]): SolventComponent | undefined {
  const { label, molarMassKgPerMol } = solutionComponentOf(record);
  if (molarMassKgPerMol !== undefined) return { label, chargeNumber: 0, molarMassKgPerMol };
  faults.push(noMolarMass(label, [...here, "solvent"]));
  return undefined;
}

/** The solvent is a component of mole fractions, and what molalities and concentrations are counted in. */
function checkSolventAmount(
  { label }: SpeciesRecord,
  { scale, path, labels, amounts }: GivenAmounts,
  faults: Fault[],
): void {
  const isNamed = labels.includes(label);
  if (scale !== "moleFractions") {
    if (!isNamed) return;
    faults.push({
      code: "conditions/duplicate-label",
      path: [...path, label],
      message: `${label} is the solvent; ${scale} are those of the solutes`,
      received: label,
      expected: "solutes only",
    });
  } else if (!isNamed) {
    faults.push({
      code: "conditions/missing-composition",
      path: [...path, label],
      message: `the solvent ${label} has no mole fraction`,
      expected: `a mole fraction of ${label}`,
    });
  } else if (amounts.get(label) === 0) {
    faults.push({
      code: "conditions/invalid-fraction",
      path: [...path, label],
      message: `the mole fraction of the solvent ${label} is 0`,
      received: "0",
      expected: "a mole fraction of the solvent above 0",
      hint: "name a liquid that is present as the solvent",
    });
  }
}

function checkLabels(
  { scale, path, labels }: GivenAmounts,
  solvent: SpeciesRecord | undefined,
  candidates: ReadonlyMap<Label, SpeciesRecord>,
  { reacting, inerts, activities, inGas }: SolutionSurroundings,
  faults: Fault[],
): void {
  const others = new Set([...reacting, ...inerts].map(({ label }) => label));
  const named = new Set(solvent === undefined ? labels : [...labels, solvent.label]);
  for (const label of named) {
    if (activities.has(label)) faults.push(twice(label, ["activities", label], "solution and in activities"));
    else if (inGas.has(label)) faults.push(twice(label, [...path, cut(label)], "gas and in solution"));
    else if (!candidates.has(label)) {
      const expected = "a dissolved species or liquid of the reaction, or of inerts";
      const fault = unknownLabel(label, [...path, cut(label)], [...candidates.keys()], expected);
      faults.push(others.has(label) ? { ...fault, message: `${label} is neither dissolved nor liquid` } : fault);
    }
  }
  for (const { label, state } of inerts) {
    // Where the solvent is at fault, a liquid may be meant for it.
    if (!candidates.has(label) || named.has(label) || (solvent === undefined && state === "l")) continue;
    faults.push({
      code: "conditions/missing-composition",
      path: [...path, label],
      message: `the inert ${label} is not in the solution`,
      expected: `${scale} with ${label}`,
    });
  }
}

function twice(label: Label, path: FaultPath, places: string): Fault {
  return {
    code: "conditions/duplicate-label",
    path,
    message: `${cut(label)} is given in ${places}`,
    received: cut(label),
    expected: "each species once",
  };
}

/** Solutes with the standard state of 1 mol/kg take molalities, liquids whose standard state is pure mole fractions. */
function scaleOf(
  { scale, path }: GivenAmounts,
  solutes: readonly SpeciesRecord[],
  model: ActivityModel | undefined,
  faults: Fault[],
): CompositionScale | undefined {
  const liquids = solutes.filter(({ state }) => state === "l");
  if (solutes.length === 0) return model?.scales[0];
  if (liquids.length === 0) return "molality";
  if (scale === "moleFractions" && liquids.length === solutes.length) return "mole-fraction";
  for (const { label } of liquids) {
    faults.push({
      code: "conditions/mixed-standard-states",
      path: [...path, label],
      message:
        scale === "moleFractions"
          ? `${label} refers to the pure liquid, other solutes to the ideal solution of 1 mol/kg`
          : `${label} refers to the pure liquid, which ${scale} do not describe`,
      received: label,
      expected: "dissolved species beside the solvent, or mole fractions of liquids alone",
      hint: `as a solute, ${label} needs a record of its own with the state aq`,
    });
  }
  return undefined;
}

function refuseScale({ name, scales }: ActivityModel, scale: CompositionScale, faults: Fault[]): void {
  faults.push({
    code: "activity/scale-not-served",
    path: [...here, "activityModel"],
    message: `the activity model ${describeReceived(name)} gives no coefficients on the scale ${scale}`,
    received: scales.join(", "),
    expected: `a model for the scale ${scale}`,
    hint:
      scale === "molality"
        ? "dissolved species (aq) have the ideal solution of 1 mol/kg as their standard state"
        : "a mixture of liquids (l) has the pure liquids as its standard states",
  });
}
