import type { ActivityModel, SolutionComponents } from "../activity/activity-model.js";
import { lnDiluteSolvent } from "../activity/ideal-solution.js";
import { describeReceived, type FaultPath } from "../errors/fault.js";
import { fail } from "../errors/gibbs-ledger-error.js";
import { log } from "../numeric/log.js";
import type { Label } from "../species/record.js";

/** The composition of a solution, checked. */
export interface CheckedSolution {
  readonly model: ActivityModel;
  readonly components: SolutionComponents;
  readonly solventMoleFraction: number;
  /** Molalities in mol/kg, or mole fractions, sorted by label so that the order of a composition shows in no bit. */
  readonly amounts: readonly number[];
  /** Where the composition stands in the conditions. */
  readonly path: FaultPath;
  readonly notes: readonly string[];
}

/** A solution at its temperature and pressure. */
export interface SolutionPhase {
  readonly activityModel: string;
  readonly solvent: Label;
  /** By the ideal solution of the same composition. */
  readonly lnIdealActivity: number;
  readonly lnSolventActivity: number;
  readonly solutes: ReadonlyMap<Label, { readonly amount: number; readonly lnActivityCoefficient: number }>;
  /** Where the composition stands in the conditions. */
  readonly path: FaultPath;
  readonly notes: readonly string[];
}

/** Logarithms beyond this are of no activity, and energies made of them might overflow. */
const largestLogarithm = 1e12;

function isPhysical(logarithm: unknown): boolean {
  return typeof logarithm === "number" && Math.abs(logarithm) <= largestLogarithm;
}

/** Evaluates the activity model of a checked solution. */
export function evaluateSolution(solution: CheckedSolution, temperatureK: number, pressurePa: number): SolutionPhase {
  const { model, components, solventMoleFraction, amounts, path } = solution;
  const { scale, solvent, solutes } = components;
  const prepared = model.solution(components, path);
  const state = prepared.state(temperatureK, pressurePa, { solventMoleFraction, solutes: amounts });
  const { lnActivityCoefficients, lnSolventActivity, outsideValidity } = state;
  if (!isPhysical(lnSolventActivity)) failActivity(model.name, [...path, solvent.label]);
  solutes.forEach(({ label }, index) => {
    if (!isPhysical(lnActivityCoefficients[index])) failActivity(model.name, [...path, label]);
  });
  return {
    activityModel: model.name,
    solvent: solvent.label,
    lnIdealActivity:
      scale === "molality" ? lnDiluteSolvent(amounts, solvent.molarMassKgPerMol) : log(solventMoleFraction),
    lnSolventActivity: lnSolventActivity + 0,
    solutes: new Map(
      solutes.map(({ label }, index) => [
        label,
        { amount: amounts[index]!, lnActivityCoefficient: lnActivityCoefficients[index]! + 0 },
      ]),
    ),
    path,
    notes: [...solution.notes, ...(outsideValidity === undefined ? [] : [outsideValidity])],
  };
}

/** An activity model of the caller's own may give anything. */
function failActivity(name: string, path: FaultPath): never {
  return fail({
    code: "activity/unphysical",
    path,
    message: `the activity model ${describeReceived(name)} gives no finite activity of ${path.at(-1)}`,
    expected: "a finite logarithm of an activity coefficient for every solute, and of the activity of the solvent",
  });
}
