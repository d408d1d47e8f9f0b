import { expectTypeOf } from "vitest";
import type { Quantity } from "../../src/quantity/quantity.js";
import { quantity } from "../../src/quantity/quantity.js";
import type { Reaction } from "../../src/reaction/reaction.js";
import type { CollectionData, SpeciesRecord } from "../../src/species/record.js";
import {
  convertEnthalpyReference,
  convertStandardPressure,
  electrodePotentialAtStandardPressure,
  formationEnthalpyAtReference,
  formationEnthalpyAtZeroKelvin,
  formationEntropyAtStandardPressure,
  formationGasChange,
  formationGibbsEnergyAtStandardPressure,
  formationIncrements,
  gaseousElements,
  gibbsFunctionAtReference,
  idealGasEntropyAtStandardPressure,
  idealGasGibbsEnergyAtStandardPressure,
  lnKAtStandardPressure,
  lnKFromGibbsFunction,
  lnKOnScale,
  type SolutionComposition,
  solutionComposition,
  standardGibbsEnergyOnScale,
} from "../../src/standard-state/index.js";

declare const record: SpeciesRecord;
declare const collection: CollectionData;
declare const subject: Reaction;

const temperature = quantity(298.15, "K");
const step = { from: quantity(1, "atm"), to: quantity(1, "bar") };
const change = { ...step, temperature };
const energy = quantity(-237, "kJ/mol");
const entropy = quantity(191.6, "J/mol/K");
const scales = { from: "molality", to: "concentration", solvent: { density: quantity(1, "kg/L") } } as const;
type Energy = Quantity<"molarEnergy", "J/mol">;
type Entropy = Quantity<"molarEntropy", "J/mol/K">;

expectTypeOf(idealGasEntropyAtStandardPressure(entropy, step)).toEqualTypeOf<Entropy>();
expectTypeOf(idealGasGibbsEnergyAtStandardPressure(energy, change)).toEqualTypeOf<Energy>();
expectTypeOf(formationGibbsEnergyAtStandardPressure(energy, "H2O(l)", change)).toEqualTypeOf<Energy>();
expectTypeOf(formationEntropyAtStandardPressure(entropy, record, step)).toEqualTypeOf<Entropy>();
expectTypeOf(formationGasChange(record, { gaseousElements: { ...gaseousElements, Br: 2 } })).toEqualTypeOf<number>();
expectTypeOf(lnKAtStandardPressure(1, subject, step)).toEqualTypeOf<number>();
expectTypeOf(lnKAtStandardPressure(1, { "N2(g)": -1 }, step)).toEqualTypeOf<number>();
expectTypeOf(electrodePotentialAtStandardPressure(quantity(0.2, "V"), { "e^-": -1 }, change)).toEqualTypeOf<
  Quantity<"electricPotential", "V">
>();
expectTypeOf(convertStandardPressure(record, quantity(1, "atm"))).toEqualTypeOf<SpeciesRecord>();
expectTypeOf(convertEnthalpyReference(record, collection, "0 K")).toEqualTypeOf<SpeciesRecord>();
expectTypeOf(formationEnthalpyAtZeroKelvin(record, collection)).toEqualTypeOf<Energy>();
expectTypeOf(standardGibbsEnergyOnScale(energy, { ...scales, temperature })).toEqualTypeOf<Energy>();
expectTypeOf(lnKOnScale(1, subject, scales)).toEqualTypeOf<number>();
expectTypeOf(solutionComposition({ solvent: "H2O(l)", molalities: {} })).toEqualTypeOf<SolutionComposition>();

// Increments of a record are what the change of reference takes.
const increments = formationIncrements(record, collection);
const there = { from: "298.15 K", to: "0 K" } as const;
expectTypeOf(formationEnthalpyAtReference(energy, { ...increments, ...there })).toEqualTypeOf<Energy>();
const ofSpecies = { temperature, enthalpyAbove0K: increments.enthalpyAbove0K, ...there };
expectTypeOf(gibbsFunctionAtReference(entropy, ofSpecies)).toEqualTypeOf<Entropy>();
expectTypeOf(
  lnKFromGibbsFunction({ temperature, reactionEnthalpy: energy, reactionGibbsFunction: entropy }),
).toEqualTypeOf<number>();

// @ts-expect-error an entropy is no energy
idealGasGibbsEnergyAtStandardPressure(entropy, change);
// @ts-expect-error a temperature is no pressure
idealGasEntropyAtStandardPressure(entropy, { from: temperature, to: step.to });
// @ts-expect-error a Gibbs energy moves with the temperature
idealGasGibbsEnergyAtStandardPressure(energy, step);
// @ts-expect-error the species decides
formationGibbsEnergyAtStandardPressure(energy, change);
// @ts-expect-error a bare pressure has no unit
convertStandardPressure(record, 101325);
// @ts-expect-error the reference is one of two
convertEnthalpyReference(record, collection, "25 Cel");
// @ts-expect-error a scale is one of three
lnKOnScale(1, subject, { ...scales, from: "molarity" });
// @ts-expect-error a concentration is no molality
solutionComposition({ solvent: "H2O(l)", molalities: { "NH3(aq)": quantity(1, "mol/L") } });
// @ts-expect-error a mass density is no concentration
solutionComposition({ solvent: "H2O(l)", molalities: {}, density: quantity(1, "mol/L") });
// @ts-expect-error the table of elements is readonly
gaseousElements["Br"] = 2;
