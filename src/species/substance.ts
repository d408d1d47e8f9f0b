import type { Origin, Source } from "../references/source.js";
import type { Label, SpeciesRecord, StateSymbol } from "./record.js";

/** Phases of one substance in rising order of temperature, each stable from where the one before ends. */
export interface StableSequence {
  /** Label without polymorph, such as `Fe(cr)`. */
  readonly label: Label;
  readonly formula: string;
  readonly chargeNumber: number;
  /** Absent where phases of several states follow each other, as in the reference sequence of an element. */
  readonly state?: StateSymbol;
  /** At least one. */
  readonly phases: readonly SpeciesRecord[];
  readonly source: Source;
  readonly origin: Origin;
}

/** The electron of a half-reaction by the standard-hydrogen convention: e^- = 1/2 H2(g) - H^+(aq). */
export interface HydrogenElectron {
  readonly label: "e^-";
  /** The record of H2(g) that it is resolved through. */
  readonly hydrogen: SpeciesRecord;
}

/** What a term of a reaction stands for: one phase, a stable sequence of phases, or the electron. */
export type Substance = SpeciesRecord | StableSequence | HydrogenElectron;

/** The label of the electron in equations. */
export const electronLabel = "e^-";

/** Whether a substance is one phase with a record. */
export function isRecord(substance: Substance): substance is SpeciesRecord {
  return "gibbsFunction" in substance;
}

/** Whether a substance is a stable sequence of phases. */
export function isSequence(substance: Substance): substance is StableSequence {
  return "phases" in substance;
}

/** Whether a substance is the electron of the standard-hydrogen convention. */
export function isElectron(substance: Substance): substance is HydrogenElectron {
  return "hydrogen" in substance;
}

/** The state symbol; undefined for the electron and for sequences over several states. */
export function stateOf(substance: Substance): StateSymbol | undefined {
  return isElectron(substance) ? undefined : substance.state;
}

/** The chemical formula without charge and state; undefined for the electron. */
export function formulaOf(substance: Substance): string | undefined {
  return isElectron(substance) ? undefined : substance.formula;
}

/** Charge in units of the elementary charge. */
export function chargeNumberOf(substance: Substance): number {
  return isElectron(substance) ? -1 : substance.chargeNumber;
}
