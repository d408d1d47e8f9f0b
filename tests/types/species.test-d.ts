import { expectTypeOf } from "vitest";
import type { Quantity } from "../../src/quantity/quantity.js";
import { quantity } from "../../src/quantity/quantity.js";
import type {
  CollectionData,
  FormationProperties,
  SpeciesGrade,
  SpeciesRecord,
  StableSequence,
  StateSymbol,
} from "../../src/species/index.js";
import {
  findSequence,
  findSpecies,
  formationProperties,
  speciesCollection,
  speciesGrade,
  standardProperties,
} from "../../src/species/index.js";

declare const record: SpeciesRecord;

expectTypeOf(speciesCollection({ species: [record] })).toEqualTypeOf<CollectionData>();
expectTypeOf(findSpecies({ species: [record] }, "NH3(g)")).toEqualTypeOf<SpeciesRecord>();
expectTypeOf(speciesGrade(record)).toEqualTypeOf<SpeciesGrade>();
expectTypeOf<StateSymbol>().toEqualTypeOf<"g" | "l" | "cr" | "am" | "aq" | "s">();

const properties = standardProperties(record, { temperature: quantity(25, "Cel") });
expectTypeOf(properties.heatCapacity).toEqualTypeOf<Quantity<"molarEntropy", "J/mol/K"> | undefined>();
expectTypeOf(properties.gibbsEnergy).toEqualTypeOf<Quantity<"molarEnergy", "J/mol">>();
expectTypeOf(properties.outsideRange).toEqualTypeOf<readonly string[]>();

const iron = findSequence({ species: [record] }, "Fe(cr)");
expectTypeOf(iron).toEqualTypeOf<StableSequence>();
expectTypeOf(iron.phases).toEqualTypeOf<readonly SpeciesRecord[]>();
expectTypeOf(standardProperties(iron, { temperature: quantity(300, "K") })).toEqualTypeOf<typeof properties>();
const formation = formationProperties(record, { temperature: quantity(300, "K") }, { species: [record] });
expectTypeOf(formation).toEqualTypeOf<FormationProperties>();
expectTypeOf(formation.gibbsEnergy).toEqualTypeOf<Quantity<"molarEnergy", "J/mol">>();
expectTypeOf(formation.log10K).toEqualTypeOf<number>();

// @ts-expect-error a formation needs the collection that holds the elements
formationProperties(record, { temperature: quantity(300, "K") });
// @ts-expect-error a source is a citation or a text of one's own
formationProperties(record, { temperature: quantity(300, "K"), elementSource: "nobody1900" }, { species: [] });
// @ts-expect-error a pressure is no temperature
standardProperties(record, { temperature: quantity(1, "bar") });
// @ts-expect-error a label is no record
standardProperties("NH3(g)", { temperature: quantity(300, "K") });
// @ts-expect-error a collection is an object with species
findSpecies([record], "NH3(g)");
// @ts-expect-error records are readonly
record.label = "X";
// @ts-expect-error a record has a source
const bare: SpeciesRecord["standardPressure"] = { value: 1, unit: "bar", origin: "memory" };
// @ts-expect-error a citation that does not exist
const cited: SpeciesRecord["standardPressure"]["source"] = "nobody1900";

export { bare, cited };
