import { faradayConstantCPerMol, gasConstantJPerMolK } from "../../src/constants/constants.js";
import { referenceData } from "../../src/data/reference-data.js";
import type { Figure } from "../../src/quantity/figure.js";
import { figureInSi } from "../../src/quantity/figure-value.js";
import { quantity } from "../../src/quantity/quantity.js";
import { type Reaction, reaction } from "../../src/reaction/reaction.js";
import { standardReactionProperties } from "../../src/reaction/standard-reaction.js";
import type { SpeciesRecord } from "../../src/species/record.js";
import { isElectron, isSequence, type Substance, stateOf } from "../../src/species/substance.js";

/** The temperature at which ions are known. */
const referenceK = 298.15;

/** Enthalpy and Gibbs energy in J/mol, entropy in J/mol/K of a reaction at 298.15 K, with the spread of each. */
export interface AtReference {
  readonly subject: Reaction;
  readonly enthalpy: number;
  readonly entropy: number;
  readonly gibbsEnergy: number;
  readonly log10K: number;
  /** Half-widths (95 percent) of the figures, added up. */
  readonly spread: { readonly enthalpy: number; readonly entropy: number; readonly gibbsEnergy: number };
  /** Moles of gas formed; an electron counts as half a mole of hydrogen. */
  readonly gasesFormed: number;
}

/** A reaction at 298.15 K as the library computes it from the reference data. */
export function atReference(equation: string): AtReference {
  const subject = reaction(equation, referenceData);
  const computed = standardReactionProperties(subject, { temperature: quantity(referenceK, "K") });
  const over = (property: (substance: Substance) => number): number =>
    subject.terms.reduce((sum, { coefficient, species }) => sum + coefficient * property(species), 0);
  const apart = (property: (substance: Substance) => number): number =>
    subject.terms.reduce((sum, { coefficient, species }) => sum + Math.abs(coefficient) * property(species), 0);
  return {
    subject,
    enthalpy: computed.enthalpy.value,
    entropy: computed.entropy.value,
    gibbsEnergy: computed.gibbsEnergy.value,
    log10K: computed.log10K,
    spread: {
      enthalpy: apart((substance) => halfWidth(recordAt(substance)?.formationEnthalpy)),
      entropy: apart((substance) => halfWidth(recordAt(substance)?.standardEntropy)),
      gibbsEnergy: apart((substance) => gibbsHalfWidth(recordAt(substance))),
    },
    gasesFormed: over((substance) => (isElectron(substance) ? 0.5 : stateOf(substance) === "g" ? 1 : 0)),
  };
}

/** Half-width of the Gibbs energy of a species: as stated, else of enthalpy and entropy added up; J/mol. */
export function gibbsHalfWidth(record: SpeciesRecord | undefined): number {
  const own = record?.formationGibbsEnergy;
  if (own?.uncertainty !== undefined) return halfWidth(own);
  return halfWidth(record?.formationEnthalpy) + referenceK * halfWidth(record?.standardEntropy);
}

/**
 * Half-width of a figure in SI units. The NBS tables state the uncertainty of theirs as 8 to 80 units of the last digit:
 * the 8 are taken. Other figures without a stated uncertainty count as exact.
 */
export function halfWidth(figure: Figure | undefined): number {
  if (figure === undefined || figure.value === 0) return 0;
  const { uncertainty, value, unit, source } = figure;
  const perUnit = figureInSi({ ...figure, value: 1, unit });
  if (uncertainty !== undefined && "halfWidth" in uncertainty) return uncertainty.halfWidth * perUnit;
  return source === "wagman1982" ? 8 * lastDigit(value) * perUnit : 0;
}

/** One unit of the last digit of a number as it is printed. */
export function lastDigit(printed: number | string): number {
  return 10 ** -(String(printed).split(".")[1]?.length ?? 0);
}

/** Electrons on the left-hand side of a half-reaction. */
export function electronsOf({ subject }: AtReference): number {
  return -subject.terms.reduce((sum, { coefficient, species }) => (isElectron(species) ? sum + coefficient : sum), 0);
}

/** Volts of a Gibbs energy in J/mol. */
export function voltsOf(gibbsEnergy: number, electrons: number): number {
  return gibbsEnergy / (electrons * faradayConstantCPerMol);
}

/** What a potential gains when the standard pressure is lowered from 1 atm to 1 bar, in V. */
export function voltsFromAtmosphereToBar({ gasesFormed }: AtReference, electrons: number): number {
  return voltsOf(gasesFormed * gasConstantJPerMolK * referenceK * Math.log(1.01325), electrons);
}

function recordAt(substance: Substance): SpeciesRecord | undefined {
  if (isElectron(substance)) return undefined;
  return isSequence(substance) ? substance.phases[0] : substance;
}
