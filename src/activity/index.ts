export type {
  ActivityModel,
  CompositionScale,
  Solution,
  SolutionAmounts,
  SolutionComponent,
  SolutionComponents,
  SolutionState,
  SolventComponent,
} from "./activity-model.js";
export { idealSolution } from "./ideal-solution.js";
export { solutionComponentOf } from "./solution-component-of.js";
