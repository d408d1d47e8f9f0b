import {
  faradayConstantCPerMol,
  gasConstantJPerMolK,
  referenceTemperatureK,
  standardPressurePa,
} from "../constants/constants.js";
import { log } from "../numeric/log.js";
import type { CollectionData, SpeciesRecord, Witness } from "../species/record.js";
import { electronLabel } from "../species/substance.js";
import { propertiesOf } from "./properties-of.js";
import { gasesFormed, sumOver, type Term, termsOf } from "./reaction-terms.js";
import { missing, optionalInput, requiredInput } from "./witness-inputs.js";

/**
 * Standard potential E = -dG / (z F) of a half-reaction, or of a cell, at 298.15 K less the published `cellPotential`;
 * V. Electrons stand in a half-reaction with a negative number, as in a reduction; for a whole cell the figure
 * `electrons` says how many pass. `standardPressure` is the pressure of the gases that the published potential refers
 * to, 1 bar when absent: the hydrogen of the reference electrode counts among them.
 */
export function cellPotential(record: SpeciesRecord, witness: Witness, collection: CollectionData): number {
  const terms = termsOf(record, witness, collection);
  const gibbsEnergy =
    sumOver(terms, (species) => propertiesOf(species, referenceTemperatureK).gibbsEnergy) +
    referenceTemperatureK * entropyOfCompression(terms, witness);
  return -gibbsEnergy / chargePerMole(record, witness) - requiredInput(record, witness, "cellPotential");
}

/**
 * Temperature coefficient dE/dT = dS / (z F) of the same at 298.15 K less the published `temperatureCoefficient`, which
 * is that of the cell against a hydrogen electrode at the same temperature; V/K.
 */
export function cellTemperatureCoefficient(
  record: SpeciesRecord,
  witness: Witness,
  collection: CollectionData,
): number {
  const terms = termsOf(record, witness, collection);
  const entropy =
    sumOver(terms, (species) => propertiesOf(species, referenceTemperatureK).entropy) -
    entropyOfCompression(terms, witness);
  return entropy / chargePerMole(record, witness) - requiredInput(record, witness, "temperatureCoefficient");
}

/** R ln(p / 1 bar) for each mole of gas formed, for the standard pressure of the published figure; J/mol/K. */
function entropyOfCompression(terms: readonly Term[], witness: Witness): number {
  const pressurePa = optionalInput(witness, "standardPressure");
  if (pressurePa === undefined) return 0;
  return gasConstantJPerMolK * gasesFormed(terms) * log(pressurePa / standardPressurePa);
}

/** z F in C/mol. */
function chargePerMole(record: SpeciesRecord, witness: Witness): number {
  const inReaction = witness.reaction?.[electronLabel];
  const electrons = inReaction === undefined ? optionalInput(witness, "electrons") : -inReaction;
  if (electrons === undefined || electrons <= 0) {
    return missing(record, witness.check, 'electrons on the left-hand side, or the figure "electrons" of a cell');
  }
  return electrons * faradayConstantCPerMol;
}
