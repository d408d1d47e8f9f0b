import * as z from "zod";
import type { Fault } from "../errors/fault.js";
import { optional, withRule } from "../errors/schema.js";
import { figureSchema } from "../quantity/schema.js";
import { checkForm } from "./check-form.js";
import { adapterOf, heatCapacityForms } from "./forms.js";
import type { HeatCapacityForm, PublishedInterval, PublishedSeries } from "./published-series.js";
import { type RangePolicy, rangePolicies } from "./range-policy.js";

/**
 * Schema of what to do outside the range of a fit.
 *
 * @example
 * rangePolicySchema.safeParse("continue-fit").success; // => true
 */
export const rangePolicySchema: z.ZodType<RangePolicy> = z.enum(rangePolicies);

/** The most numbers of a list, as for the guards. */
const mostNumbers = 100;

/** A member that the form does not take. */
const absent = optional(z.never());

const anchor = z.strictObject({
  temperature: figureSchema("temperature"),
  enthalpy: figureSchema("molarEnergy"),
  entropy: figureSchema("molarEntropy"),
});

/**
 * Schema of a published heat-capacity fit; one shape a form, with its number of coefficients and the keys it takes.
 *
 * @example
 * const intervals = [{ from: 200, to: 6000, coefficients: [2.5, 0, 0, 0, 0, -745.375, 4.37967491], endsAt: "fit" }];
 * const fit = { kind: "series", form: "seven-coefficient", gasConstant: 8.31451, intervals };
 * publishedSeriesSchema.safeParse(fit).success; // => true
 * publishedSeriesSchema.safeParse({ ...fit, form: "shomate" }).success; // => false
 */
export const publishedSeriesSchema: z.ZodType<PublishedSeries> = seriesSchema({});

/** Schema of a published fit that has further members. */
export function seriesSchema<M extends z.core.$ZodLooseShape>(
  members: M,
): z.ZodType<PublishedSeries & z.output<z.ZodObject<M>>> {
  const [first, ...others] = heatCapacityForms.map((form) => formSchema(form, members));
  const schema = z.discriminatedUnion("form", [first!, ...others]);
  return schema as unknown as z.ZodType<PublishedSeries & z.output<z.ZodObject<M>>>;
}

/** Whether H and S of a fit have to come from figures at 298.15 K beside it. */
export function needsReferenceFigures({ form, anchor }: PublishedSeries): boolean {
  return anchor === undefined && adapterOf(form)?.carriesConstants === false;
}

function formSchema(form: HeatCapacityForm, members: z.core.$ZodLooseShape): z.ZodObject {
  const { counts, needsGasConstant, carriesConstants, powers } = adapterOf(form)!;
  const fewest = powers === undefined ? Math.min(...counts) : powers.coefficientsBefore + powers.fewest;
  const most = powers === undefined ? Math.max(...counts) : mostNumbers;
  const shape: z.ZodObject = z.strictObject({
    kind: z.literal("series"),
    form: z.literal(form),
    gasConstant: needsGasConstant ? z.number().gt(8.3).lt(8.33) : absent,
    unit: carriesConstants ? absent : optional(z.enum(["J/mol/K", "cal_th/mol/K"])),
    anchor: carriesConstants ? absent : optional(anchor),
    powers: powers === undefined ? absent : powersSchema(powers.fewest),
    decimalShifts: optional(z.array(z.int().min(-30).max(30)).max(mostNumbers)),
    intervals: z.array(intervalSchema(fewest, most)).min(1).max(mostNumbers),
    ...members,
  });
  const joined = withRule(shape, areJoined, "an interval begins where the one before ends", ["intervals"]);
  return withRule(joined, suitsItsForm, "numbers of coefficients, powers and decimal shifts do not suit the form");
}

function powersSchema(fewest: number): z.ZodType<readonly number[]> {
  return z.array(z.number().min(-20).max(20).multipleOf(0.5)).min(fewest).max(mostNumbers);
}

function intervalSchema(fewest: number, most: number): z.ZodType<PublishedInterval> {
  const shape = z.strictObject({
    from: z.number().positive(),
    to: z.number().positive(),
    coefficients: z.array(z.number()).min(fewest).max(most),
    endsAt: z.enum(["fit", "first-order", "continuous"]),
  });
  return withRule(shape, ({ from, to }) => from < to, "an interval rises");
}

function areJoined(series: unknown): boolean {
  const { intervals } = series as PublishedSeries;
  return intervals.every(({ from }, index) => index === 0 || from === intervals[index - 1]!.to);
}

function suitsItsForm(series: unknown): boolean {
  const faults: Fault[] = [];
  checkForm(series as PublishedSeries, [], faults);
  return faults.length === 0;
}
