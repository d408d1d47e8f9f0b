import { expectTypeOf } from "vitest";
import type { EquationOfState, GasComponent } from "../../src/fugacity/equation-of-state.js";
import { gasComponentOf } from "../../src/fugacity/gas-component-of.js";
import { gasMixtureProperties } from "../../src/fugacity/gas-mixture-properties.js";
import { idealGas } from "../../src/fugacity/ideal-gas.js";
import { lewisFugacityRule } from "../../src/fugacity/lewis-fugacity-rule.js";
import { secondVirialCoefficient } from "../../src/fugacity/second-virial-coefficient.js";
import { virial } from "../../src/fugacity/virial.js";
import type { Quantity } from "../../src/quantity/quantity.js";
import { quantity } from "../../src/quantity/quantity.js";
import type { SpeciesRecord } from "../../src/species/record.js";

declare const species: readonly SpeciesRecord[];
declare const record: SpeciesRecord;

const temperature = quantity(300, "K");
const pressure = quantity(1, "bar");
const moleFractions = { "N2(g)": 1 };

expectTypeOf(idealGas()).toEqualTypeOf<EquationOfState>();
expectTypeOf(virial()).toEqualTypeOf<EquationOfState>();
expectTypeOf(lewisFugacityRule(virial())).toEqualTypeOf<EquationOfState>();
expectTypeOf(gasComponentOf(record)).toEqualTypeOf<GasComponent>();

const properties = gasMixtureProperties(virial(), { temperature, pressure, moleFractions, species });
expectTypeOf(properties.compressibilityFactor).toEqualTypeOf<number>();
expectTypeOf(properties.molarVolume).toEqualTypeOf<Quantity<"molarVolume", "m3/mol">>();
expectTypeOf(properties.departure.enthalpy).toEqualTypeOf<Quantity<"molarEnergy", "J/mol">>();
expectTypeOf(properties.departure.entropy).toEqualTypeOf<Quantity<"molarEntropy", "J/mol/K">>();
expectTypeOf(properties.departure.gibbsEnergy).toEqualTypeOf<Quantity<"molarEnergy", "J/mol">>();
expectTypeOf(properties.fugacities).toEqualTypeOf<Readonly<Record<string, Quantity<"pressure", "Pa">>>>();
expectTypeOf(secondVirialCoefficient(record, temperature)).toEqualTypeOf<Quantity<"molarVolume", "m3/mol">>();

// @ts-expect-error a pressure is no temperature
gasMixtureProperties(virial(), { temperature: pressure, pressure, moleFractions, species });
// @ts-expect-error a bare number has no unit
gasMixtureProperties(virial(), { temperature: 300, pressure, moleFractions, species });
// @ts-expect-error an equation of state is made by calling virial
gasMixtureProperties(virial, { temperature, pressure, moleFractions, species });
// @ts-expect-error the correlation is one of a closed set
virial({ correlation: "prausnitz" });
// @ts-expect-error polar terms have a and b
virial({ polar: { "H2O(g)": { a: 0.03 } } });
// @ts-expect-error the derivative is needed too
virial({ secondVirialCoefficient: () => ({ value: -1e-4 }) });
// @ts-expect-error a pressure is no temperature
secondVirialCoefficient(record, pressure);
