import { gasConstantJPerMolK, referenceTemperatureK, standardPressurePa } from "../constants/constants.js";
import { exp } from "../numeric/exp.js";
import { log } from "../numeric/log.js";
import { log10 } from "../numeric/log10.js";
import { quantity } from "../quantity/quantity.js";
import { formationProperties } from "../species/formation-properties.js";
import type { CollectionData, SpeciesRecord, Witness } from "../species/record.js";
import { formationGibbsEnergyAtStandardPressure } from "../standard-state/formation-pressure.js";
import { rowsByTemperature } from "./caloric-checks.js";
import { largest } from "./largest.js";
import { propertiesOf } from "./properties-of.js";
import { gasesFormed, sumOver, type Term, termsOf } from "./reaction-terms.js";
import { missing, optionalInput, requiredFigure, requiredInput } from "./witness-inputs.js";

/** H(298.15 K) of the fit less the record's formation enthalpy, or the `formationEnthalpy` compared with; J/mol. */
export function enthalpyAtReference(record: SpeciesRecord, witness: Witness): number {
  const expected =
    optionalInput(witness, "formationEnthalpy") ??
    requiredFigure(record, witness.check, "formationEnthalpy", record.formationEnthalpy);
  return propertiesOf(record, referenceTemperatureK).enthalpy - expected;
}

/** Enthalpy of a reaction at 298.15 K, or at `temperature`, less the measured `reactionEnthalpy`; J/mol. */
export function reactionEnthalpy(record: SpeciesRecord, witness: Witness, collection: CollectionData): number {
  const temperatureK = optionalInput(witness, "temperature") ?? referenceTemperatureK;
  const computed = sumOver(
    termsOf(record, witness, collection),
    (species) => propertiesOf(species, temperatureK).enthalpy,
  );
  return computed - requiredInput(record, witness, "reactionEnthalpy");
}

/** Entropy of a reaction at 298.15 K less the measured `reactionEntropy`; J/mol/K. */
export function reactionEntropy(record: SpeciesRecord, witness: Witness, collection: CollectionData): number {
  const computed = sumOver(
    termsOf(record, witness, collection),
    (species) => propertiesOf(species, referenceTemperatureK).entropy,
  );
  return computed - requiredInput(record, witness, "reactionEntropy");
}

/**
 * Gibbs energy of formation at 298.15 K from the record's enthalpy and entropy and the entropies of the elements, with
 * half that of H2(g) for each charge of an ion, less the record's own, which refers to the record's standard pressure, or
 * the `formationGibbsEnergy` compared with, at `standardPressure` or at 1 bar; J/mol.
 */
export function formationGibbsEnergy(record: SpeciesRecord, witness: Witness, collection: CollectionData): number {
  const compared = optionalInput(witness, "formationGibbsEnergy");
  const expected =
    compared ?? requiredFigure(record, witness.check, "formationGibbsEnergy", record.formationGibbsEnergy);
  const pressurePa =
    compared === undefined
      ? requiredFigure(record, witness.check, "standardPressure", record.standardPressure)
      : (optionalInput(witness, "standardPressure") ?? standardPressurePa);
  const temperature = quantity(referenceTemperatureK, "K");
  const atBar = formationGibbsEnergyAtStandardPressure(quantity(expected, "J/mol"), record, {
    temperature,
    from: quantity(pressurePa, "Pa"),
    to: quantity(standardPressurePa, "Pa"),
  });
  return formationProperties(record, { temperature }, collection).gibbsEnergy.value - atBar.value;
}

/** Enthalpy of dissociation at 0 K from H(298.15 K) and H(298.15 K) - H(0 K), less `dissociationEnergy`; J/mol. */
export function dissociationEnergy(record: SpeciesRecord, witness: Witness, collection: CollectionData): number {
  const terms = termsOf(record, witness, collection);
  const atReference = sumOver(terms, (species) => propertiesOf(species, referenceTemperatureK).enthalpy);
  return atReference - incrementOf(terms, witness) - requiredInput(record, witness, "dissociationEnergy");
}

/**
 * Enthalpy of formation at 0 K from that at 298.15 K and H(298.15 K) - H(0 K) of species and elements, less the
 * published `formationEnthalpyAt0K`; J/mol. The reaction forms one mole of the species from the reference phases of its
 * elements. With the `formationEnthalpy` at 298.15 K of the same publication, what is compared is their difference, and
 * so the increments alone. Of a species without record, the reaction names the elements alone, and `enthalpyAbove0K` is
 * its increment.
 */
export function formationEnthalpyAtZero(record: SpeciesRecord, witness: Witness, collection: CollectionData): number {
  const terms = termsOf(record, witness, collection);
  const ofUnrecorded = optionalInput(witness, "enthalpyAbove0K");
  const formed = terms.flatMap(([, stoichiometricNumber]) => (stoichiometricNumber > 0 ? [stoichiometricNumber] : []));
  if (ofUnrecorded === undefined ? formed.length !== 1 || formed[0] !== 1 : formed.length > 0) {
    return missing(record, witness.check, "the formation of one mole, or elements alone beside enthalpyAbove0K");
  }
  const atReference =
    ofUnrecorded === undefined && witness.against?.["formationEnthalpy"] === undefined
      ? sumOver(terms, (species) => propertiesOf(species, referenceTemperatureK).enthalpy)
      : requiredInput(record, witness, "formationEnthalpy");
  const increment = (ofUnrecorded ?? 0) + incrementOf(terms, witness);
  return atReference - increment - requiredInput(record, witness, "formationEnthalpyAt0K");
}

/** H(298.15 K) - H(0 K) of a reaction. */
function incrementOf(terms: readonly Term[], { check }: Witness): number {
  return sumOver(terms, (species) => requiredFigure(species, check, "enthalpyAbove0K", species.enthalpyAbove0K));
}

/**
 * log10 K of a reaction less measured values, the largest over rows named as "700 K": ideal gases, pure phases, and
 * solutes on the scale of molality with the standard state of 1 mol/kg. `unitPressure` is the unit in which the measured
 * K has its partial pressures; where no gas is formed or consumed on balance, none is needed.
 */
export function equilibriumConstant(record: SpeciesRecord, witness: Witness, collection: CollectionData): number {
  const terms = termsOf(record, witness, collection);
  const gases = gasesFormed(terms);
  const shift = gases === 0 ? 0 : gases * log10(requiredInput(record, witness, "unitPressure") / standardPressurePa);
  const perDecade = gasConstantJPerMolK * log(10);
  return largest(
    rowsByTemperature(record, witness).map(([temperatureK, measured]) => {
      const gibbsEnergy = sumOver(terms, (species) => propertiesOf(species, temperatureK).gibbsEnergy);
      return -gibbsEnergy / (perDecade * temperatureK) - (measured + shift);
    }),
  );
}

/**
 * Relative deviation of the equilibrium pressure of the one gas of a reaction of pure phases from measured ones, the
 * largest over rows named as "1000 K": ln(f / p0) = -dG/RT + dV (p - p0)/RT over the condensed phases, and
 * ln f = ln p + B p / RT with the gas's `secondVirialCoefficient`, or f = p without it.
 */
export function equilibriumPressure(record: SpeciesRecord, witness: Witness, collection: CollectionData): number {
  const terms = termsOf(record, witness, collection);
  const gases = terms.filter(([species]) => species.state === "g");
  if (gases.length !== 1 || gases[0]![1] !== 1) return missing(record, witness.check, "one mole of one gas formed");
  const condensedVolume = sumOver(terms, (species) =>
    species.state === "g" ? 0 : requiredFigure(species, witness.check, "molar volume", species.volume?.molar),
  );
  const virial = optionalInput(witness, "secondVirialCoefficient") ?? 0;
  return largest(
    rowsByTemperature(record, witness).map(([temperatureK, measuredPa]) => {
      const thermal = gasConstantJPerMolK * temperatureK;
      const gibbsEnergy = sumOver(terms, (species) => propertiesOf(species, temperatureK).gibbsEnergy);
      const volumeWork = condensedVolume * (measuredPa - standardPressurePa);
      const lnRatio = -(gibbsEnergy + volumeWork + virial * measuredPa) / thermal;
      return (standardPressurePa / measuredPa) * exp(lnRatio) - 1;
    }),
  );
}
