export { computeWitness, type RecomputedWitness, recomputeWitnesses } from "./witness-checks.js";
