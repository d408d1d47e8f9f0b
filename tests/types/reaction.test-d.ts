import { expectTypeOf } from "vitest";
import type { FaultCode } from "../../src/errors/codes.js";
import type { GibbsLedgerError } from "../../src/errors/gibbs-ledger-error.js";
import { isGibbsLedgerError } from "../../src/errors/gibbs-ledger-error.js";
import { virial } from "../../src/fugacity/virial.js";
import type { PreciseReactionProperties } from "../../src/precision/index.js";
import { evaluateToDigits } from "../../src/precision/index.js";
import type { Quantity } from "../../src/quantity/quantity.js";
import { quantity } from "../../src/quantity/quantity.js";
import type { Ledger, Reaction, ReactionDirection } from "../../src/reaction/index.js";
import {
  equilibriumConstant,
  ledger,
  lnReactionQuotient,
  reaction,
  reactionDirection,
  reactionGibbsEnergy,
  standardReactionGibbsEnergy,
  standardReactionProperties,
  standardReactionRoundingBound,
  temperaturesAtGibbsEnergy,
} from "../../src/reaction/index.js";
import { formatLedger, formatReactionTable } from "../../src/report/index.js";
import type { CollectionData, SpeciesRecord } from "../../src/species/record.js";

declare const collection: CollectionData;
declare const record: SpeciesRecord;
declare const caught: unknown;

const temperature = quantity(700, "K");
const pressure = quantity(50, "bar");
const gas = { moleFractions: { "N2(g)": 1 } };
const subject = reaction("N2(g) + 3 H2(g) = 2 NH3(g)", collection);

expectTypeOf(subject).toEqualTypeOf<Reaction>();
expectTypeOf(standardReactionGibbsEnergy(subject, { temperature })).toEqualTypeOf<Quantity<"molarEnergy", "J/mol">>();
const properties = standardReactionProperties(subject, {
  temperature: quantity(25, "Cel"),
  outsideRange: "continue-fit",
});
expectTypeOf(properties.heatCapacity).toEqualTypeOf<Quantity<"molarEntropy", "J/mol/K"> | undefined>();
expectTypeOf(properties.enthalpy).toEqualTypeOf<Quantity<"molarEnergy", "J/mol">>();
expectTypeOf(properties.entropy).toEqualTypeOf<Quantity<"molarEntropy", "J/mol/K">>();
expectTypeOf(properties.lnK).toEqualTypeOf<number>();
expectTypeOf(equilibriumConstant(subject, { temperature })).toEqualTypeOf<number>();
expectTypeOf(standardReactionRoundingBound(subject, "enthalpy", { temperature })).toEqualTypeOf<number>();
expectTypeOf(lnReactionQuotient(subject, { temperature, pressure, gas })).toEqualTypeOf<number>();
expectTypeOf(reactionGibbsEnergy(subject, { temperature, pressure, gas })).toEqualTypeOf<
  Quantity<"molarEnergy", "J/mol">
>();
expectTypeOf(reactionDirection(subject, { temperature, pressure, gas })).toEqualTypeOf<ReactionDirection>();
expectTypeOf(ledger(subject, { temperature, pressure, gas, inerts: [record] })).toEqualTypeOf<Ledger>();
expectTypeOf(temperaturesAtGibbsEnergy(subject, { between: [temperature, temperature] })).toEqualTypeOf<
  Quantity<"temperature", "K">[]
>();
expectTypeOf(formatLedger(ledger(subject, { temperature, pressure }))).toEqualTypeOf<string>();
expectTypeOf(formatReactionTable(subject, { temperatures: [temperature] })).toEqualTypeOf<string>();
expectTypeOf(evaluateToDigits(subject, { temperature, digits: 30 })).toEqualTypeOf<PreciseReactionProperties>();

if (isGibbsLedgerError(caught, "reaction/unbalanced")) {
  expectTypeOf(caught).toEqualTypeOf<GibbsLedgerError>();
  expectTypeOf(caught.code).toEqualTypeOf<FaultCode>();
}

// @ts-expect-error a pressure is no temperature
standardReactionGibbsEnergy(subject, { temperature: pressure });
// @ts-expect-error a bare number has no unit
standardReactionGibbsEnergy(subject, { temperature: 700 });
// @ts-expect-error a difference of temperatures is no temperature
standardReactionGibbsEnergy(subject, { temperature: quantity(1, "K{difference}") });
// @ts-expect-error an equation is no reaction
standardReactionGibbsEnergy("N2 = 2 N", { temperature });
// @ts-expect-error the policies are a closed set
standardReactionGibbsEnergy(subject, { temperature, outsideRange: "extrapolate" });
// @ts-expect-error the standard state fixes the pressure
standardReactionGibbsEnergy(subject, { temperature, pressure });
// @ts-expect-error a real state needs a pressure
reactionGibbsEnergy(subject, { temperature, gas });
// @ts-expect-error a temperature is no pressure
reactionGibbsEnergy(subject, { temperature, pressure: temperature, gas });
reactionGibbsEnergy(subject, {
  temperature,
  pressure,
  // @ts-expect-error mole fractions or partial pressures, not both
  gas: { moleFractions: { "N2(g)": 1 }, partialPressures: { "N2(g)": pressure } },
});
// @ts-expect-error a partial pressure has a unit
reactionGibbsEnergy(subject, { temperature, pressure, gas: { partialPressures: { "N2(g)": 1 } } });
// @ts-expect-error an equation of state is made by calling virial
reactionGibbsEnergy(subject, { temperature, pressure, gas: { ...gas, equationOfState: virial } });
// @ts-expect-error inerts are records, not labels
reactionGibbsEnergy(subject, { temperature, pressure, gas, inerts: ["Ar(g)"] });
// @ts-expect-error no such property
standardReactionRoundingBound(subject, "volume", { temperature });
// @ts-expect-error two ends
temperaturesAtGibbsEnergy(subject, { between: [temperature] });
// @ts-expect-error the target is a molar energy
temperaturesAtGibbsEnergy(subject, { between: [temperature, temperature], gibbsEnergy: pressure });
// @ts-expect-error reactions are readonly
subject.equation = "";
// @ts-expect-error no such code
isGibbsLedgerError(caught, "reaction/nonsense");
