import { expectTypeOf } from "vitest";
import { readCollection, readReaction, readSpecies } from "../../src/exchange/index.js";
import { type Reaction, standardReactionProperties } from "../../src/reaction/index.js";
import { type CollectionData, findSpecies, type SpeciesRecord, standardProperties } from "../../src/species/index.js";

declare const text: string;
declare const parsed: unknown;

// Anything goes in: that is what the readers are for. What comes out needs no cast.
expectTypeOf(readSpecies).parameters.toEqualTypeOf<[input: unknown]>();
expectTypeOf(readSpecies(text)).toEqualTypeOf<SpeciesRecord>();
expectTypeOf(readCollection(parsed)).toEqualTypeOf<CollectionData>();
expectTypeOf(readReaction(text)).toEqualTypeOf<Reaction>();
findSpecies(readCollection(text), "NH3(g)");
standardProperties(readSpecies(text), { temperature: { value: 25, unit: "Cel" } });
standardReactionProperties(readReaction(parsed), { temperature: { value: 25, unit: "Cel" } });

// @ts-expect-error something is read
readSpecies();
// @ts-expect-error a reader takes no options
readCollection(text, { strict: false });
// @ts-expect-error a reaction is no record
standardProperties(readReaction(text), { temperature: { value: 25, unit: "Cel" } });
// @ts-expect-error what is read is frozen, and readonly in type
readSpecies(text).label = "X";
