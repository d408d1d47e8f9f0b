import { expectTypeOf } from "vitest";
import type {
  ActivityModel,
  CompositionScale,
  Solution,
  SolutionComponent,
  SolutionState,
  SolventComponent,
} from "../../src/activity/index.js";
import { idealSolution, solutionComponentOf } from "../../src/activity/index.js";
import type { Quantity } from "../../src/quantity/quantity.js";
import { quantity } from "../../src/quantity/quantity.js";
import type { Reaction, ReactionConditions, SolutionComposition } from "../../src/reaction/index.js";
import { affinity, ledger, reactionGibbsEnergy } from "../../src/reaction/index.js";
import type { SpeciesRecord } from "../../src/species/record.js";

declare const subject: Reaction;
declare const record: SpeciesRecord;

const temperature = quantity(25, "Cel");
const pressure = quantity(1, "bar");
const activityModel = idealSolution();
const solvent = "H2O(l)";
const water: SolventComponent = { label: "H2O(l)", chargeNumber: 0, molarMassKgPerMol: 0.018015 };
const prepared = activityModel.solution({ scale: "molality", solvent: water, solutes: [] });

expectTypeOf(idealSolution()).toEqualTypeOf<ActivityModel>();
expectTypeOf(activityModel.scales).toEqualTypeOf<readonly CompositionScale[]>();
expectTypeOf(solutionComponentOf(record)).toEqualTypeOf<SolutionComponent>();
expectTypeOf(prepared).toEqualTypeOf<Solution>();
expectTypeOf(prepared.state(300, 1e5, { solventMoleFraction: 1, solutes: [] })).toEqualTypeOf<SolutionState>();
prepared.state(300, 1e5, { solventMoleFraction: 1, solutes: new Float64Array(0) });

const molal: SolutionComposition = {
  solvent,
  molalities: { "Na^+(aq)": 0.1, "Cl^-(aq)": quantity(100, "mmol/kg") },
  activityModel,
};
const molar: SolutionComposition = {
  solvent,
  concentrations: { "Na^+(aq)": quantity(0.1, "mol/L") },
  density: quantity(1, "kg/L"),
  activityModel,
};
const mixed: SolutionComposition = { solvent, moleFractions: { "H2O(l)": 0.9, "Na^+(aq)": 0.1 }, activityModel };
for (const solution of [molal, molar, mixed]) {
  const conditions: ReactionConditions = { temperature, pressure, solution, inerts: [record] };
  expectTypeOf(affinity(subject, conditions)).toEqualTypeOf<Quantity<"molarEnergy", "J/mol">>();
  expectTypeOf(reactionGibbsEnergy(subject, conditions)).toEqualTypeOf<Quantity<"molarEnergy", "J/mol">>();
  expectTypeOf(ledger(subject, conditions).activityModel).toEqualTypeOf<string | undefined>();
}

/** A model of a user's own. */
const own: ActivityModel = {
  name: "own",
  parameters: { slope: 1 },
  scales: ["molality"],
  solution: ({ solutes }) => ({
    state: () => ({ lnActivityCoefficients: solutes.map(() => 0), lnSolventActivity: 0 }),
  }),
};
affinity(subject, { temperature, pressure, solution: { solvent, molalities: {}, activityModel: own } });

// @ts-expect-error a solution has an activity model
affinity(subject, { temperature, pressure, solution: { solvent, molalities: {} } });
// @ts-expect-error an activity model is made by calling idealSolution
affinity(subject, { temperature, pressure, solution: { solvent, molalities: {}, activityModel: idealSolution } });
// @ts-expect-error a solution has a solvent
affinity(subject, { temperature, pressure, solution: { molalities: {}, activityModel } });
// @ts-expect-error a solution has a composition
affinity(subject, { temperature, pressure, solution: { solvent, activityModel } });
// @ts-expect-error one scale, not two
affinity(subject, { temperature, pressure, solution: { ...molal, moleFractions: {} } });
// @ts-expect-error molalities need no density
affinity(subject, { temperature, pressure, solution: { ...molal, density: quantity(1, "kg/L") } });
// @ts-expect-error concentrations need a density
affinity(subject, { temperature, pressure, solution: { solvent, concentrations: {}, activityModel } });
// @ts-expect-error a bare concentration has no unit
affinity(subject, { temperature, pressure, solution: { ...molar, concentrations: { "Na^+(aq)": 0.1 } } });
// @ts-expect-error a concentration is no molality
affinity(subject, { temperature, pressure, solution: { ...molal, molalities: { "Na^+(aq)": quantity(1, "mol/L") } } });
// @ts-expect-error a density is a mass per volume
affinity(subject, { temperature, pressure, solution: { ...molar, density: quantity(1, "mol/L") } });
// @ts-expect-error mole fractions are numbers
affinity(subject, { temperature, pressure, solution: { ...mixed, moleFractions: { "H2O(l)": quantity(1, "1") } } });
// @ts-expect-error a solvent has a molar mass
activityModel.solution({ scale: "molality", solvent: { label: "H2O(l)", chargeNumber: 0 }, solutes: [] });
// @ts-expect-error the scales are a closed set
activityModel.solution({ scale: "molarity", solvent: water, solutes: [] });
// @ts-expect-error a real state needs a pressure
affinity(subject, { temperature, solution: molal });
