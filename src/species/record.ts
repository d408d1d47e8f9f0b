import type { PublishedSeries } from "../heat-capacity/published-series.js";
import type { Figure } from "../quantity/figure.js";
import type { Origin, Source } from "../references/source.js";

/** Name of a species and its phase: formula, charge after a caret, IUPAC state symbol, polymorph in words. */
export type Label = string;

/** IUPAC state symbols that a record may carry. */
export type StateSymbol = "g" | "l" | "cr" | "am" | "aq" | "s";

/** What a record's Gibbs energy over temperature is made from. */
export type PublishedGibbsFunction =
  | (PublishedSeries & { readonly source: Source; readonly origin: Origin; readonly where?: string })
  | { readonly kind: "reference-point" };

/** The check that computed a witness; each is a function of the room checks. */
export type WitnessCheckName =
  | "closure-at-breaks"
  | "entropy-at-298.15-K"
  | "tabulated-heat-capacity"
  | "tabulated-entropy"
  | "tabulated-enthalpy-increment"
  | "statistical-mechanics-entropy"
  | "statistical-mechanics-heat-content"
  | "enthalpy-at-298.15-K"
  | "reaction-enthalpy"
  | "dissociation-energy"
  | "formation-enthalpy-at-0-K"
  | "equilibrium-constant"
  | "equilibrium-pressure"
  | "reaction-entropy"
  | "formation-gibbs-energy"
  | "cell-potential"
  | "cell-temperature-coefficient"
  | "transition-enthalpy"
  | "transition-gibbs-energy"
  | "transition-temperature"
  | "critical-compressibility"
  | "acentric-factor-from-boiling-point"
  | "unit-cell-volume"
  | "molar-volume-from-density";

/** The group of figures that a witness speaks for. */
export type WitnessGroup = "caloric" | "formation" | "critical" | "volume";

/** Confirmation of a group of figures by something else: a redundancy of the source, or an independent measurement. */
export interface Witness {
  readonly group: WitnessGroup;
  /** A transcription witness shows that figures stand as printed, a physical one that they are true. */
  readonly kind: "transcription" | "physical";
  readonly check: WitnessCheckName;
  /** Figures from outside the record that the check compares with, by name. */
  readonly against?: Readonly<Record<string, Figure>>;
  /** Stoichiometric numbers by label, products positive, where the check is about a reaction. */
  readonly reaction?: Readonly<Record<Label, number>>;
  /** What the check computes, in its own unit. */
  readonly deviation: number;
  /** The largest deviation that confirms. */
  readonly tolerance: number;
  /** Temperatures in kelvin over which the witness speaks; absent: 298.15 K only. */
  readonly over?: readonly [from: number, to: number];
  readonly source: Source;
}

/** One phase of one substance: published figures, unchanged, with their sources and witnesses. */
export interface SpeciesRecord {
  readonly label: Label;
  /** Name in words. */
  readonly name: string;
  /** Chemical formula, without charge and state. */
  readonly formula: string;
  /** Charge in units of the elementary charge. */
  readonly chargeNumber: number;
  readonly state: StateSymbol;
  /** Polymorph or structure in words, such as `graphite`. */
  readonly polymorph?: string;
  /** Chemical Abstracts Service Registry Number. */
  readonly casNumber?: string;
  /** Pressure of the standard state that the figures refer to. */
  readonly standardPressure: Figure;
  /** Departure from the usual conventions; absent: elements at 298.15 K in their reference phases, H^+(aq) = 0. */
  readonly convention?: string;
  /** Enthalpy of formation at 298.15 K. */
  readonly formationEnthalpy?: Figure;
  /** Entropy at 298.15 K. */
  readonly standardEntropy?: Figure;
  /** Gibbs energy of formation at 298.15 K. */
  readonly formationGibbsEnergy?: Figure;
  /** H(298.15 K) - H(0 K). */
  readonly enthalpyAbove0K?: Figure;
  readonly gibbsFunction: PublishedGibbsFunction;
  /** Phase transitions out of this phase. */
  readonly transitions?: readonly {
    readonly temperature: Figure;
    readonly into: Label;
    readonly enthalpy: Figure;
  }[];
  /** Critical constants of the fluid. */
  readonly critical?: {
    readonly temperature: Figure;
    readonly pressure: Figure;
    readonly acentricFactor?: Figure;
    readonly volume?: Figure;
  };
  /** Volume of a condensed phase, for its volume work. */
  readonly volume?: {
    readonly molar: Figure;
    readonly thermalExpansion?: Figure;
    readonly compressibility?: Figure;
  };
  readonly witnesses: readonly Witness[];
}

/** Plain data that every function with a collection accepts. */
export interface CollectionData {
  readonly species: readonly SpeciesRecord[];
  /** Which phase of a substance is stable from which temperature on, each tagged with its source. */
  readonly sequences?: readonly PhaseSequence[];
}

/** The stable phases of a substance in rising order of temperature, joined at the transitions of their records. */
export interface PhaseSequence {
  /** Label without polymorph, such as `Fe(cr)`. */
  readonly label: Label;
  readonly phases: readonly Label[];
  readonly source: Source;
  readonly origin: Origin;
}
