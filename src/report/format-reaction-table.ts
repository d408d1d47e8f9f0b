import { gasConstantJPerMolK } from "../constants/constants.js";
import { describeReceived, type Fault } from "../errors/fault.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { checkArray, checkObject, checkOption } from "../errors/input.js";
import { intervalOf } from "../heat-capacity/evaluate.js";
import { type RangePolicy, rangePolicies } from "../heat-capacity/range-policy.js";
import { checkPositiveQuantity } from "../quantity/guards.js";
import type { Temperature } from "../quantity/quantity.js";
import { sumOfEntries } from "../reaction/ledger-sum.js";
import { type Reaction, reactionPlans } from "../reaction/reaction.js";
import { failReactionRange, reactionPlan } from "../reaction/reaction-plan.js";
import { standardEntries } from "../reaction/standard-entries.js";
import { standardReactionProperties } from "../reaction/standard-reaction.js";
import { caution } from "./caution.js";
import { layOut, type TextColumn } from "./columns.js";
import { fitted, wrap } from "./text.js";

/** Which temperatures a reaction table shows. */
export interface ReactionTableOptions {
  /** At least one, at most 10,000; shown in kelvin. */
  readonly temperatures: readonly Temperature[];
  /** `"refuse"` when absent. */
  readonly outsideRange?: RangePolicy;
}

const columns: readonly TextColumn[] = [
  { heading: "T", width: 9, align: "right" },
  { heading: "log10 K", width: 11, align: "right" },
  { heading: "u", width: 8, align: "right" },
  { heading: "dG", width: 11, align: "right" },
  { heading: "dH", width: 11, align: "right" },
  { heading: "-T dS", width: 11, align: "right" },
  { heading: "dCp", width: 9, align: "right" },
];

const uncertaintyPlace = 2;
const units = ["K", "1", "1", "kJ/mol", "kJ/mol", "kJ/mol", "J/mol/K"];

/**
 * A table of a reaction over temperature as text of 80 columns: T, log10 K with its standard uncertainty as far as the
 * data publish one, and the standard Gibbs energy with its parts, per mole of reaction as written.
 *
 * @param reaction - what `reaction` returned
 * @param options - the temperatures
 * @returns lines joined by line feeds, each at most 80 characters long
 * @throws GibbsLedgerError "report/no-rows", and as {@link standardReactionProperties}
 * @example
 * import { referenceData } from "gibbs-ledger/data";
 * const shift = reaction("CO(g) + H2O(g) = CO2(g) + H2(g)", referenceData);
 * const text = formatReactionTable(shift, { temperatures: [quantity(500, "K"), quantity(1000, "K")] });
 * text.split("\n").length > 5; // => true
 */
export function formatReactionTable(reaction: Reaction, options: ReactionTableOptions): string {
  const plans = reactionPlans(reaction);
  const house = plans.reaction;
  const { temperaturesK, outsideRange } = checkOptions(options);
  const outside = new Set<string>();
  let lowerBound = false;
  const rows = temperaturesK.map((temperatureK, index) => {
    if (intervalOf(reactionPlan(plans, outsideRange), temperatureK) === undefined) {
      return failReactionRange(house, temperatureK, ["temperatures", index]);
    }
    const properties = standardReactionProperties(house, {
      temperature: { value: temperatureK, unit: "K" },
      ...(outsideRange === undefined ? {} : { outsideRange }),
    });
    for (const label of properties.outsideRange) outside.add(label);
    const uncertainty = uncertaintyOfLog10K(house, temperatureK, outsideRange);
    lowerBound ||= uncertainty.isLowerBound;
    const cells = [
      [temperatureK, 2],
      [properties.log10K, 4],
      [uncertainty.value, 4],
      [properties.gibbsEnergy.value / 1000, 3],
      [properties.enthalpy.value / 1000, 3],
      [(-temperatureK * properties.entropy.value) / 1000, 3],
      [properties.heatCapacity?.value, 3],
    ] as const;
    return cells.map(([value, decimals], place) => {
      const prefix = place === uncertaintyPlace && uncertainty.isLowerBound ? ">=" : "";
      return value === undefined ? "" : fitted(value, decimals, columns[place]!.width, prefix);
    });
  });
  const [heading, line, unitRow, ...body] = layOut(columns, [units, ...rows]);
  return [
    "Standard reaction properties, per mole of reaction as written, at 1 bar",
    ...wrap(house.equation, undefined, "  "),
    "",
    heading!,
    unitRow!,
    line!,
    ...body,
    "",
    ...(lowerBound ? ["u: of formation enthalpies, entropies, transitions; >= where one has no known u"] : []),
    ...(outside.size === 0 ? [] : wrap(`outside their range: ${[...outside].join(", ")}`)),
    ...wrap(caution),
  ].join("\n");
}

interface CheckedOptions {
  readonly temperaturesK: readonly number[];
  readonly outsideRange: RangePolicy | undefined;
}

function checkOptions(options: ReactionTableOptions): CheckedOptions {
  const faults: Fault[] = [];
  const members = checkObject(options, [], faults, { required: ["temperatures"], optional: ["outsideRange"] });
  failIfAny(members === undefined ? faults : []);
  const { temperatures, outsideRange } = members ?? {};
  const given = temperatures === undefined ? undefined : checkArray(temperatures, ["temperatures"], faults);
  if (given?.length === 0) {
    faults.push({
      code: "report/no-rows",
      path: ["temperatures"],
      message: `a table needs at least one temperature, got ${describeReceived(given)}`,
      expected: "at least one temperature",
    });
  }
  const temperaturesK = given?.map((value, index) =>
    checkPositiveQuantity(value, "temperature", ["temperatures", index], faults),
  );
  const policy =
    outsideRange === undefined ? undefined : checkOption(outsideRange, ["outsideRange"], faults, rangePolicies);
  failIfAny(faults);
  return { temperaturesK: temperaturesK as number[], outsideRange: policy };
}

/**
 * From the published uncertainties of enthalpies of formation, entropies at 298.15 K and enthalpies of transition, as
 * in a ledger; that of the heat capacity is not published with the fits.
 */
function uncertaintyOfLog10K(
  { terms }: Reaction,
  temperatureK: number,
  policy: RangePolicy = "refuse",
): { readonly value: number; readonly isLowerBound: boolean } {
  const entries = terms.flatMap((term) => standardEntries(term, temperatureK, policy));
  const sum = sumOfEntries(entries.filter(({ datum }) => datum !== undefined));
  return {
    value: (sum.value.standardUncertainty ?? 0) / (gasConstantJPerMolK * temperatureK * Math.LN10),
    isLowerBound: sum.uncertaintyIsLowerBound,
  };
}
