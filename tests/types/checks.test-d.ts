import { expectTypeOf } from "vitest";
import type { RecomputedWitness } from "../../src/checks/index.js";
import { computeWitness, recomputeWitnesses } from "../../src/checks/index.js";
import type { CollectionData, SpeciesRecord, Witness, WitnessCheckName } from "../../src/species/index.js";

declare const record: SpeciesRecord;
declare const witness: Witness;
declare const collection: CollectionData;

expectTypeOf(computeWitness(record, witness, collection)).toEqualTypeOf<number>();
expectTypeOf(recomputeWitnesses(record, collection)).toEqualTypeOf<RecomputedWitness[]>();

expectTypeOf<"cell-potential">().toExtend<WitnessCheckName>();
expectTypeOf<"cell-temperature-coefficient">().toExtend<WitnessCheckName>();
expectTypeOf<"reaction-entropy">().toExtend<WitnessCheckName>();
expectTypeOf<"formation-gibbs-energy">().toExtend<WitnessCheckName>();
expectTypeOf<"formation-enthalpy-at-0-K">().toExtend<WitnessCheckName>();

// @ts-expect-error a check that nobody knows
const unknown: WitnessCheckName = "electrode-potential";
void unknown;
// @ts-expect-error the name says 0 K, with a space in no place
const spaced: WitnessCheckName = "formation-enthalpy-at-0 K";
void spaced;
// @ts-expect-error a collection is needed
computeWitness(record, witness);
// @ts-expect-error a label is no record
computeWitness("Cl^-(aq)", witness, collection);
