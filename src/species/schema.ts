import * as z from "zod";
import type { Fault } from "../errors/fault.js";
import { mapSchema, optional, textSchema, withRule } from "../errors/schema.js";
import { needsReferenceFigures, rangePolicySchema, seriesSchema } from "../heat-capacity/schema.js";
import { anyFigureSchema, figureSchema, positiveQuantitySchema, standardPressureSchema } from "../quantity/schema.js";
import { originSchema, sourceSchema } from "../references/schema.js";
import { checkContinuation } from "./check-continuation.js";
import { checkLabels } from "./check-labels.js";
import { checkLabel, stateSymbols } from "./check-record.js";
import { hydrogenLabel, sequenceOf } from "./house-substance.js";
import type { CollectionData, PhaseSequence, PublishedGibbsFunction, SpeciesRecord, Witness } from "./record.js";
import type { StandardConditions } from "./standard-properties.js";
import { electronLabel, type HydrogenElectron, type StableSequence, type Substance } from "./substance.js";

const shortText = textSchema(500);

/**
 * Schema of a witness of a record.
 *
 * @example
 * const witness = { group: "caloric", kind: "physical", check: "statistical-mechanics-entropy" };
 * const found = { deviation: 0.002, tolerance: 0.01, source: { text: "invented" } };
 * witnessSchema.safeParse({ ...witness, ...found }).success; // => true
 * witnessSchema.safeParse(witness).success; // => false
 */
export const witnessSchema: z.ZodType<Witness> = z.strictObject({
  group: z.enum(["caloric", "formation", "critical", "volume"]),
  kind: z.enum(["transcription", "physical"]),
  check: textSchema() as z.ZodType<Witness["check"]>,
  against: optional(mapSchema(anyFigureSchema)),
  reaction: optional(mapSchema(z.number())),
  deviation: z.number(),
  tolerance: z.number(),
  over: optional(withRule(z.tuple([z.number(), z.number()]), ([from, to]) => from <= to, "a range does not fall")),
  source: sourceSchema,
});

const gibbsFunctionSchema: z.ZodType<PublishedGibbsFunction> = z.union([
  z.strictObject({ kind: z.literal("reference-point") }),
  seriesSchema({ source: sourceSchema, origin: originSchema, where: optional(textSchema()) }),
]);

const transitionSchema = z.strictObject({
  temperature: figureSchema("temperature"),
  into: textSchema(),
  enthalpy: figureSchema("molarEnergy"),
});

const criticalSchema = z.strictObject({
  temperature: figureSchema("temperature"),
  pressure: figureSchema("pressure"),
  acentricFactor: optional(figureSchema("fraction")),
  volume: optional(figureSchema("molarVolume")),
});

const volumeSchema = z.strictObject({
  molar: figureSchema("molarVolume"),
  thermalExpansion: optional(figureSchema("reciprocalTemperature")),
  compressibility: optional(figureSchema("reciprocalPressure")),
});

const recordShape: z.ZodType<SpeciesRecord> = z.strictObject({
  label: shortText,
  name: shortText,
  formula: shortText,
  chargeNumber: z.int().min(-20).max(20),
  state: z.enum(stateSymbols),
  polymorph: optional(shortText),
  casNumber: optional(shortText),
  standardPressure: standardPressureSchema,
  convention: optional(shortText),
  formationEnthalpy: optional(figureSchema("molarEnergy")),
  standardEntropy: optional(figureSchema("molarEntropy")),
  formationGibbsEnergy: optional(figureSchema("molarEnergy")),
  enthalpyAbove0K: optional(figureSchema("molarEnergy")),
  gibbsFunction: gibbsFunctionSchema,
  transitions: optional(z.array(transitionSchema).max(100)),
  critical: optional(criticalSchema),
  volume: optional(volumeSchema),
  witnesses: z.array(witnessSchema).max(1000),
} satisfies Record<keyof SpeciesRecord, z.core.SomeType>);

const recordRules: readonly (readonly [message: string, member: string, holds: (record: SpeciesRecord) => boolean])[] =
  [
    [
      "the label says the same as formula, charge, state and polymorph",
      "label",
      (record) => findsNothing((faults) => checkLabel(record, [], faults)),
    ],
    [
      "a form without constants, and a reference point, need enthalpy of formation and entropy at 298.15 K",
      "gibbsFunction",
      hasReferenceFigures,
    ],
    [
      "enthalpy and entropy can be carried from where they are known through every interval",
      "gibbsFunction",
      (record) => findsNothing((faults) => checkContinuation(record, [], faults)),
    ],
  ];

/**
 * Schema of a species record: the same verdict as that of every function that takes one. JSON Schema made of it tells
 * the shape; what ties several members together (the label and the formula, a break and its transition) it leaves out.
 *
 * @example
 * import { Ar_g } from "gibbs-ledger/data";
 * speciesRecordSchema.safeParse(Ar_g).success; // => true
 * speciesRecordSchema.safeParse({ ...Ar_g, chargeNumber: 1 }).success; // => false
 */
export const speciesRecordSchema: z.ZodType<SpeciesRecord> = recordRules.reduce(
  (schema, [message, member, holds]) => withRule(schema, holds, message, [member]),
  recordShape,
);

function hasReferenceFigures({ gibbsFunction, formationEnthalpy, standardEntropy }: SpeciesRecord): boolean {
  if (gibbsFunction.kind === "series" && !needsReferenceFigures(gibbsFunction)) return true;
  return formationEnthalpy !== undefined && standardEntropy !== undefined;
}

/** Whether a check of the guards finds nothing. */
function findsNothing(check: (faults: Fault[]) => void): boolean {
  const faults: Fault[] = [];
  check(faults);
  return faults.length === 0;
}

/**
 * Schema of the stable phases of a substance, as a collection has them.
 *
 * @example
 * const sequence = { label: "Fe(cr)", phases: ["Fe(cr,alpha)", "Fe(cr,gamma)"], source: "dinsdale1991" };
 * phaseSequenceSchema.safeParse({ ...sequence, origin: "memory" }).success; // => true
 * phaseSequenceSchema.safeParse(sequence).success; // => false
 */
export const phaseSequenceSchema: z.ZodType<PhaseSequence> = z.strictObject({
  label: textSchema(),
  phases: z.array(textSchema()).max(10_000),
  source: sourceSchema,
  origin: originSchema,
} satisfies Record<keyof PhaseSequence, z.core.SomeType>);

/**
 * Schema of a collection of records, with the stable sequences of phases: the same verdict as `speciesCollection`.
 *
 * @example
 * import { referenceData } from "gibbs-ledger/data";
 * collectionSchema.safeParse(referenceData).success; // => true
 * collectionSchema.safeParse({ species: [...referenceData.species, ...referenceData.species] }).success; // => false
 */
export const collectionSchema: z.ZodType<CollectionData> = withRule(
  withRule(
    z.strictObject({
      species: z.array(speciesRecordSchema).max(10_000),
      sequences: optional(z.array(phaseSequenceSchema).max(10_000)),
    } satisfies Record<keyof CollectionData, z.core.SomeType>),
    hasEachLabelOnce,
    "each label stands once, and sequences name phases of the collection",
  ),
  areSequencesJoined,
  "the phases of a sequence meet",
  ["sequences"],
);

function hasEachLabelOnce({ species, sequences }: CollectionData): boolean {
  return findsNothing((faults) => checkLabels(species, sequences, [], faults));
}

function areSequencesJoined({ species, sequences = [] }: CollectionData): boolean {
  const records = new Map(species.map((record) => [record.label, record]));
  return findsNothing((faults) => {
    for (const sequence of sequences) {
      const phases = sequence.phases.map((label) => records.get(label)!);
      sequenceOf(sequence, phases, [], faults);
    }
  });
}

const stableSequenceShape: z.ZodType<StableSequence> = z.strictObject({
  label: shortText,
  formula: shortText,
  chargeNumber: z.int().min(-20).max(20),
  state: optional(z.enum(stateSymbols)),
  phases: z.array(speciesRecordSchema).min(1).max(50),
  source: sourceSchema,
  origin: originSchema,
} satisfies Record<keyof StableSequence, z.core.SomeType>);

const hydrogenElectronShape: z.ZodType<HydrogenElectron> = z.strictObject({
  label: z.literal(electronLabel),
  hydrogen: speciesRecordSchema,
} satisfies Record<keyof HydrogenElectron, z.core.SomeType>);

/**
 * Schema of what a term of a reaction stands for: a record, a stable sequence of phases, or the electron.
 *
 * @example
 * import { H2_g } from "gibbs-ledger/data";
 * substanceSchema.safeParse(H2_g).success; // => true
 * substanceSchema.safeParse({ label: "e^-", hydrogen: H2_g }).success; // => true
 */
export const substanceSchema: z.ZodType<Substance> = z.union([
  speciesRecordSchema,
  withRule(stableSequenceShape, isSoundSequence, "the phases of a sequence meet, and its label says what it is"),
  withRule(
    hydrogenElectronShape,
    ({ hydrogen }) => hydrogen.label === hydrogenLabel,
    `the electron is resolved through ${hydrogenLabel}`,
  ),
]);

function isSoundSequence(given: StableSequence): boolean {
  const house = sequenceOf(given, given.phases, [], []);
  return (
    house !== undefined && (["formula", "chargeNumber", "state"] as const).every((key) => house[key] === given[key])
  );
}

/**
 * Schema of the conditions of a standard property: temperature, and what to do outside the range of a record.
 *
 * @example
 * standardConditionsSchema.safeParse({ temperature: { value: 25, unit: "Cel" } }).success; // => true
 * standardConditionsSchema.safeParse({ temperature: { value: -1, unit: "K" } }).success; // => false
 */
export const standardConditionsSchema: z.ZodType<StandardConditions> = z.strictObject({
  temperature: positiveQuantitySchema("temperature"),
  outsideRange: optional(rangePolicySchema),
} satisfies Record<keyof StandardConditions, z.core.SomeType>);
