import { expectTypeOf } from "vitest";
import type * as z from "zod";
import type { Fault } from "../../src/errors/fault.js";
import type { PublishedSeries } from "../../src/heat-capacity/published-series.js";
import type { RangePolicy } from "../../src/heat-capacity/range-policy.js";
import type { Figure } from "../../src/quantity/figure.js";
import type { Pressure, Temperature } from "../../src/quantity/quantity.js";
import type { LabelMap, ReactionConditions } from "../../src/reaction/conditions.js";
import type { Reaction } from "../../src/reaction/reaction.js";
import type { TemperatureSearch } from "../../src/reaction/temperatures.js";
import type { Origin, Source } from "../../src/references/source.js";
import {
  type collectionSchema,
  type faultSchema,
  figureSchema,
  type formulaTextSchema,
  type labelMapSchema,
  type labelTextSchema,
  type originSchema,
  type phaseSequenceSchema,
  positiveQuantitySchema,
  type publishedSeriesSchema,
  quantitySchema,
  type rangePolicySchema,
  type reactionConditionsSchema,
  type reactionSchema,
  type sourceSchema,
  speciesRecordSchema,
  type standardConditionsSchema,
  type substanceSchema,
  type temperatureSearchSchema,
  type witnessSchema,
} from "../../src/schema.js";
import type { CollectionData, PhaseSequence, SpeciesRecord, Witness } from "../../src/species/record.js";
import type { StandardConditions } from "../../src/species/standard-properties.js";
import type { Substance } from "../../src/species/substance.js";

// What a schema infers is the public interface, no more and no less.
expectTypeOf<z.infer<typeof speciesRecordSchema>>().toEqualTypeOf<SpeciesRecord>();
expectTypeOf<z.infer<typeof collectionSchema>>().toEqualTypeOf<CollectionData>();
expectTypeOf<z.infer<typeof phaseSequenceSchema>>().toEqualTypeOf<PhaseSequence>();
expectTypeOf<z.infer<typeof witnessSchema>>().toEqualTypeOf<Witness>();
expectTypeOf<z.infer<typeof substanceSchema>>().toEqualTypeOf<Substance>();
expectTypeOf<z.infer<typeof publishedSeriesSchema>>().toEqualTypeOf<PublishedSeries>();
expectTypeOf<z.infer<typeof reactionSchema>>().toEqualTypeOf<Reaction>();
expectTypeOf<z.infer<typeof reactionConditionsSchema>>().toEqualTypeOf<ReactionConditions>();
expectTypeOf<z.infer<typeof temperatureSearchSchema>>().toEqualTypeOf<TemperatureSearch>();
expectTypeOf<z.infer<typeof standardConditionsSchema>>().toEqualTypeOf<StandardConditions>();
expectTypeOf<z.infer<typeof labelMapSchema>>().toEqualTypeOf<LabelMap>();
expectTypeOf<z.infer<typeof sourceSchema>>().toEqualTypeOf<Source>();
expectTypeOf<z.infer<typeof originSchema>>().toEqualTypeOf<Origin>();
expectTypeOf<z.infer<typeof rangePolicySchema>>().toEqualTypeOf<RangePolicy>();
expectTypeOf<z.infer<typeof faultSchema>>().toEqualTypeOf<Fault>();
expectTypeOf<z.infer<typeof formulaTextSchema>>().toEqualTypeOf<string>();
expectTypeOf<z.infer<typeof labelTextSchema>>().toEqualTypeOf<string>();
expectTypeOf(figureSchema("pressure").parse(0)).toEqualTypeOf<Figure>();
expectTypeOf(quantitySchema("pressure").parse(0)).toEqualTypeOf<Pressure>();
expectTypeOf(positiveQuantitySchema("temperature").parse(0)).toEqualTypeOf<Temperature>();

// @ts-expect-error no such dimension
figureSchema("flavour");
// @ts-expect-error a figure is of a dimension
figureSchema();
// @ts-expect-error a parsed record is readonly
speciesRecordSchema.parse({}).label = "X";
