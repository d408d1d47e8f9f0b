import * as z from "zod";
import { activityModelSchema } from "../activity/schema.js";
import type { Fault } from "../errors/fault.js";
import { mapSchema, optional, succeeds, textSchema, withRule } from "../errors/schema.js";
import { equationOfStateSchema, moleFractionsSchema } from "../fugacity/schema.js";
import { rangePolicySchema } from "../heat-capacity/schema.js";
import { nonNegativeQuantitySchema, positiveQuantitySchema, quantitySchema, valueInSi } from "../quantity/schema.js";
import type { Label } from "../species/record.js";
import { speciesRecordSchema, substanceSchema } from "../species/schema.js";
import type { GasComposition, LabelMap, ReactionConditions, SolutionComposition } from "./conditions.js";
import { maximumSpecies } from "./equation.js";
import { checkPressureSum } from "./gas-phase.js";
import { houseReaction, type Reaction, type ReactionTerm } from "./reaction.js";
import type { TemperatureSearch } from "./temperatures.js";

/**
 * Schema of numbers by label of a species.
 *
 * @example
 * labelMapSchema.safeParse({ "N2(g)": 0.79, "O2(g)": 0.21 }).success; // => true
 * labelMapSchema.safeParse({ "N2(g)": "79 %" }).success; // => false
 */
export const labelMapSchema: z.ZodType<LabelMap> = mapSchema(z.number());

const termSchema: z.ZodType<ReactionTerm> = z.strictObject({
  label: textSchema(),
  coefficient: z.number(),
  exactCoefficient: z.string().regex(/^-?[0-9./]+$/),
  species: substanceSchema,
} satisfies Record<keyof ReactionTerm, z.core.SomeType>);

/**
 * Schema of a reaction, as JSON holds what `reaction` returned: the same verdict as that of every function that takes a
 * reaction. JSON Schema made of it tells the shape, not whether the equation balances.
 *
 * @example
 * import { referenceData } from "gibbs-ledger/data";
 * const synthesis = reaction("N2 + 3 H2 = 2 NH3", referenceData);
 * reactionSchema.safeParse(synthesis).success; // => true
 * reactionSchema.safeParse({ ...synthesis, terms: synthesis.terms.slice(1) }).success; // => false
 */
export const reactionSchema: z.ZodType<Reaction> = withRule(
  z.strictObject({
    equation: textSchema(1_000_000),
    terms: z.array(termSchema).min(1).max(maximumSpecies),
    notes: z.array(textSchema()).max(10_000),
  } satisfies Record<keyof Reaction, z.core.SomeType>),
  (value) => succeeds(() => houseReaction(value)),
  "the terms balance, and say each number and label once",
);

/** A member that stands only where another does not. */
const absent = optional(z.never());

const gasMembers = { equationOfState: optional(equationOfStateSchema) };

const gasSchema: z.ZodType<GasComposition> = z.union([
  z.strictObject({ ...gasMembers, moleFractions: moleFractionsSchema, partialPressures: absent }),
  z.strictObject({
    ...gasMembers,
    partialPressures: mapSchema(nonNegativeQuantitySchema("pressure")),
    moleFractions: absent,
  }),
]);

const solutionMembers = { solvent: z.string(), activityModel: activityModelSchema };
const noScale = { molalities: absent, moleFractions: absent, concentrations: absent, density: absent };
const molality = z.union([z.number().nonnegative(), nonNegativeQuantitySchema("molality")]);

const solutionSchema: z.ZodType<SolutionComposition> = withRule(
  z.union([
    z.strictObject({ ...solutionMembers, ...noScale, molalities: mapSchema(molality) }),
    z.strictObject({ ...solutionMembers, ...noScale, moleFractions: moleFractionsSchema }),
    z.strictObject({
      ...solutionMembers,
      ...noScale,
      concentrations: mapSchema(nonNegativeQuantitySchema("concentration")),
      density: positiveQuantitySchema("massDensity"),
    }),
  ]) as z.ZodType<SolutionComposition>,
  ({ solvent, moleFractions, ...others }) =>
    moleFractions === undefined
      ? !Object.hasOwn(others.molalities ?? others.concentrations ?? {}, solvent)
      : Object.hasOwn(moleFractions, solvent) && moleFractions[solvent]! > 0,
  "the solvent has a mole fraction above 0, and neither molality nor concentration",
);

const heldMembers = {
  pressure: positiveQuantitySchema("pressure"),
  gas: optional(gasSchema),
  solution: optional(solutionSchema),
  activities: optional(mapSchema(z.number().nonnegative())),
  inerts: optional(z.array(speciesRecordSchema).max(1000)),
  outsideRange: optional(rangePolicySchema),
};

type Held = Omit<ReactionConditions, "temperature">;

/**
 * Schema of the conditions of a reaction at its real state: all that can be said without the reaction, whose species
 * decide which labels belong in which phase. JSON cannot hold equations of state and activity models.
 *
 * @example
 * const gas = { moleFractions: { "N2(g)": 0.25, "H2(g)": 0.75 } };
 * const conditions = { temperature: { value: 700, unit: "K" }, pressure: { value: 250, unit: "bar" }, gas };
 * reactionConditionsSchema.safeParse(conditions).success; // => true
 * reactionConditionsSchema.safeParse({ ...conditions, gas: { moleFractions: { "N2(g)": 0.25 } } }).success; // => false
 */
export const reactionConditionsSchema: z.ZodType<ReactionConditions> = withPhaseRules(
  z.strictObject({
    temperature: positiveQuantitySchema("temperature"),
    ...heldMembers,
  } satisfies Record<keyof ReactionConditions, z.core.SomeType>),
);

const heldSchema: z.ZodType<Held> = withPhaseRules(
  z.strictObject(heldMembers satisfies Record<keyof Held, z.core.SomeType>),
);

function withPhaseRules<T extends Held>(schema: z.ZodType<T>): z.ZodType<T> {
  const summed = withRule(schema, hasItsPressure, "partial pressures sum to the pressure", ["gas", "partialPressures"]);
  const once = withRule(summed, hasEachLabelOnce, "each label stands in one phase, or among the activities");
  return withRule(once, hasInertsInPlace, "inerts stand once, in a phase that names them", ["inerts"]);
}

function hasItsPressure({ pressure, gas }: Held): boolean {
  if (gas?.partialPressures === undefined) return true;
  const pressurePa = valueInSi(pressure, "pressure");
  const partial = Object.values(gas.partialPressures).map((one) => valueInSi(one, "pressure") / pressurePa);
  const faults: Fault[] = [];
  checkPressureSum(partial, pressurePa, faults);
  return faults.length === 0;
}

function hasEachLabelOnce({ gas, solution, activities }: Held): boolean {
  const places = [labelsOfGas(gas), labelsOfSolution(solution), new Set(Object.keys(activities ?? {}))];
  const total = places.reduce((sum, labels) => sum + labels.size, 0);
  return new Set(places.flatMap((labels) => [...labels])).size === total;
}

function hasInertsInPlace({ gas, solution, inerts = [] }: Held): boolean {
  const [inGas, inSolution] = [labelsOfGas(gas), labelsOfSolution(solution)];
  const areInPlace = inerts.every(({ label, state }) => {
    if (state === "g") return inGas.has(label);
    return (state === "aq" || state === "l") && inSolution.has(label);
  });
  return areInPlace && new Set(inerts.map(({ label }) => label)).size === inerts.length;
}

function labelsOfGas(gas: GasComposition | undefined): ReadonlySet<Label> {
  return new Set(Object.keys(gas?.moleFractions ?? gas?.partialPressures ?? {}));
}

function labelsOfSolution(solution: SolutionComposition | undefined): ReadonlySet<Label> {
  if (solution === undefined) return new Set();
  const { solvent, molalities, moleFractions, concentrations } = solution;
  return new Set([solvent, ...Object.keys(molalities ?? moleFractions ?? concentrations ?? {})]);
}

/**
 * Schema of a search for temperatures: between which, at which Gibbs energy, and at which conditions held.
 *
 * @example
 * const between = [{ value: 300, unit: "K" }, { value: 1500, unit: "K" }];
 * temperatureSearchSchema.safeParse({ between }).success; // => true
 * temperatureSearchSchema.safeParse({ between: between.toReversed() }).success; // => false
 */
export const temperatureSearchSchema: z.ZodType<TemperatureSearch> = withRule(
  withRule(
    z.strictObject({
      gibbsEnergy: optional(quantitySchema("molarEnergy")),
      between: z.tuple([positiveQuantitySchema("temperature"), positiveQuantitySchema("temperature")]),
      conditions: optional(heldSchema),
      outsideRange: optional(rangePolicySchema),
    } satisfies Record<keyof TemperatureSearch, z.core.SomeType>),
    ({ between: [from, to] }) => valueInSi(from, "temperature") < valueInSi(to, "temperature"),
    "a search goes from a lower to a higher temperature",
    ["between"],
  ),
  ({ conditions, outsideRange }) => conditions === undefined || outsideRange === undefined,
  "conditions have an outsideRange of their own",
  ["outsideRange"],
);
