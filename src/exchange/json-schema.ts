import * as z from "zod";
import { anyFigureSchema, figureSchema, standardPressureSchema, uncertaintySchema } from "../quantity/schema.js";
import { type Dimension, siUnits } from "../quantity/units.js";
import { sourceSchema } from "../references/schema.js";
import { collectionSchema, phaseSequenceSchema, speciesRecordSchema, witnessSchema } from "../species/schema.js";

/** What is described once in a file, by the name that it has there. */
const parts: Readonly<Record<string, z.ZodType>> = {
  source: sourceSchema,
  uncertainty: uncertaintySchema,
  figure: anyFigureSchema,
  standardPressure: standardPressureSchema,
  ...Object.fromEntries(
    (Object.keys(siUnits) as Dimension[]).map((dimension) => [`${dimension}Figure`, figureSchema(dimension)]),
  ),
  witness: witnessSchema,
  phaseSequence: phaseSequenceSchema,
};

/**
 * The JSON Schema files of the package (draft 2020-12), by name: the shape of a species record and of a collection, for
 * editors and programs in other languages. What ties members together only the library checks.
 */
export function jsonSchemaFiles(): Readonly<Record<string, object>> {
  const comment = "The shape alone; readSpecies and readCollection of gibbs-ledger/exchange check all the rest.";
  return {
    "species-record.schema.json": {
      ...heading("species-record", "A species record of gibbs-ledger", comment),
      ...jsonSchemaOf(speciesRecordSchema, parts),
    },
    "species-collection.schema.json": {
      ...heading("species-collection", "A collection of species records of gibbs-ledger", comment),
      ...jsonSchemaOf(collectionSchema, { ...parts, speciesRecord: speciesRecordSchema }),
    },
  };
}

function heading(name: string, title: string, description: string): object {
  const $schema = "https://json-schema.org/draft/2020-12/schema";
  return { $schema, $id: `${name}.schema.json`, title, description };
}

function jsonSchemaOf(schema: z.ZodType, named: Readonly<Record<string, z.ZodType>>): object {
  const metadata = z.registry<{ id: string }>();
  for (const [id, part] of Object.entries(named)) metadata.add(part, { id });
  return z.toJSONSchema(schema, { metadata, target: "draft-2020-12" });
}
