import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { idealSolution } from "../../src/activity/ideal-solution.js";
import { referenceData } from "../../src/data/reference-data.js";
import type { Fault } from "../../src/errors/fault.js";
import { isGibbsLedgerError } from "../../src/errors/gibbs-ledger-error.js";
import { idealGas } from "../../src/fugacity/ideal-gas.js";
import type { ReactionConditions } from "../../src/reaction/conditions.js";
import { houseReaction, type Reaction, reaction } from "../../src/reaction/reaction.js";
import { reactionState } from "../../src/reaction/reaction-state.js";
import { temperaturesAtGibbsEnergy } from "../../src/reaction/temperatures.js";
import { reactionConditionsSchema, reactionSchema, temperatureSearchSchema } from "../../src/schema.js";
import type { CollectionData } from "../../src/species/record.js";
import { figure, invented } from "../heat-capacity/random-series.js";
import { polynomialRecord, recordOf } from "../species/records.js";
import { mutated } from "./mutated.js";
import { verdictsAgree } from "./verdicts.js";

function faultsOfCall(call: () => unknown): readonly Fault[] {
  try {
    call();
    return [];
  } catch (error) {
    if (!isGibbsLedgerError(error)) throw error;
    return error.faults;
  }
}

/** Iron that rusts in sour water, invented: gas, solution, solid in two phases, ions and the electron. */
const transition = { temperature: figure(1200, "K"), into: "Fe(cr,gamma)", enthalpy: figure(1, "kJ/mol") };
const collection: CollectionData = {
  species: [
    polynomialRecord("Fe(cr,alpha)", 0, 27, [25], [0], { transitions: [transition] }),
    polynomialRecord("Fe(cr,gamma)", 5000, 32, [30], [0]),
    recordOf("Fe^2+(aq)"),
    recordOf("H^+(aq)"),
    recordOf("H2(g)"),
    recordOf("H2O(l)"),
    recordOf("O2(g)"),
    recordOf("N2(g)"),
    recordOf("Na^+(aq)"),
    recordOf("Cl^-(aq)"),
  ],
  sequences: [{ label: "Fe(cr)", phases: ["Fe(cr,alpha)", "Fe(cr,gamma)"], source: invented, origin: "memory" }],
};
const plain = (subject: Reaction): unknown => JSON.parse(JSON.stringify(subject));
const rusting = reaction("2 Fe(cr) + 4 H^+(aq) + O2(g) = 2 Fe^2+(aq) + 2 H2O(l)", collection);
const half = reaction("Fe^2+(aq) + 2 e^- = Fe(cr)", collection);
const synthesis = reaction("1/2 N2 + 3/2 H2 = NH3", referenceData);

describe("schema and guard give the same verdict on reactions", () => {
  const words = [
    ...["-1/2", "1/2", "-0.5", "2", "-3/2", "1/0", "e^-", "Fe(cr)", "H2(g)", "N2(g)", "Fe(cr,alpha)", "g", "cr"],
    ...[-0.5, 0.5, 1, 2, -2, -1.5, 1e10, recordOf("H2(g)"), recordOf("Fe(cr,alpha)"), { label: "e^-" }, "K", "kJ/mol"],
  ];

  test.each([
    ["a synthesis", synthesis],
    ["with a sequence", rusting],
    ["with the electron", half],
  ])("%s, changed, 1,000 times", (_name, subject) => {
    expect(reactionSchema.safeParse(subject).success).toBe(true);
    const values = mutated(fc.constant(plain(subject)), words);
    const share = verdictsAgree(
      values,
      reactionSchema,
      (value) => faultsOfCall(() => houseReaction(value as Reaction)),
      1000,
    );
    expect(share).toBeGreaterThan(0.1);
    expect(share).toBeLessThan(0.8);
  });

  test.each([undefined, null, 7, "N2 + 3 H2 = 2 NH3", [], {}])("on %s", (value) => {
    expect(faultsOfCall(() => houseReaction(value as Reaction))).not.toEqual([]);
    expect(reactionSchema.safeParse(value).success).toBe(false);
  });
});

/** Without the reaction, nobody can say which labels belong where, nor what its species are. */
const dependsOnReaction = (fault: Fault): boolean =>
  [
    "conditions/unknown-label",
    "conditions/missing-activity",
    "conditions/mixed-standard-states",
    "conditions/invalid-density",
    "activity/scale-not-served",
    "formula/no-atomic-weight",
  ].includes(fault.code) ||
  (fault.code === "conditions/missing-composition" && rusting.terms.some(({ label }) => label === fault.path.at(-1))) ||
  fault.message.includes("takes part in the reaction");

const at = { temperature: { value: 25, unit: "Cel" }, pressure: { value: 2, unit: "bar" } };
const ions = { "Fe^2+(aq)": 0.01, "H^+(aq)": 1e-3 };
const salt = { "Na^+(aq)": 0.1, "Cl^-(aq)": 0.121 };
const water = { solvent: "H2O(l)", activityModel: idealSolution() };
const air = { moleFractions: { "N2(g)": 0.79, "O2(g)": 0.21 } };
const nitrogen = recordOf("N2(g)");
const inSolution = { "Fe^2+(aq)": 0.001, "H^+(aq)": 0.002, "H2O(l)": 0.997 };
const soundConditions: readonly unknown[] = [
  { ...at, gas: air, inerts: [nitrogen], activities: ions },
  { ...at, gas: { ...air, equationOfState: idealGas() }, inerts: [nitrogen], solution: { ...water, molalities: ions } },
  {
    ...at,
    gas: { partialPressures: { "N2(g)": { value: 1.5, unit: "bar" }, "O2(g)": { value: 50, unit: "kPa" } } },
    inerts: [nitrogen, recordOf("Na^+(aq)"), recordOf("Cl^-(aq)")],
    solution: { ...water, molalities: { ...ions, ...salt, "H^+(aq)": { value: 1, unit: "mmol/kg" } } },
    outsideRange: "continue-fit",
  },
  { ...at, activities: { "O2(g)": 0.2 }, solution: { ...water, moleFractions: inSolution } },
  {
    ...at,
    activities: { "O2(g)": 0 },
    solution: {
      ...water,
      concentrations: { "Fe^2+(aq)": { value: 0.01, unit: "mol/L" }, "H^+(aq)": { value: 20, unit: "mol/m3" } },
      density: { value: 1, unit: "kg/L" },
    },
  },
  { ...at, activities: { ...ions, "O2(g)": 1, "H2O(l)": 1, "Fe(cr)": 1 }, inerts: [] },
];
const conditionWords = [
  ...["H2O(l)", "N2(g)", "O2(g)", "Fe^2+(aq)", "K", "Cel", "bar", "kPa", "mol/kg", "mol/L", "kg/L", "refuse"],
  ...[0, -0, 1, -1, 0.21, 0.79, 0.5, 2, 1e-9, 1.0000000001, idealGas(), idealSolution(), idealSolution, air, salt],
  ...[recordOf("Ar(g)"), recordOf("Na^+(aq)"), recordOf("Fe(cr,alpha)"), { value: 1, unit: "mol/kg" }],
  { value: -1e-323, unit: "mmol/kg" },
];

describe("schema and guard give the same verdict on conditions", () => {
  test.each(soundConditions.map((conditions, index) => [index, conditions] as const))(
    "sound ones, %i",
    (_, conditions) => {
      expect(faultsOfCall(() => reactionState(rusting, conditions as ReactionConditions))).toEqual([]);
      expect(reactionConditionsSchema.safeParse(conditions).success).toBe(true);
    },
  );

  test("4,000 sound ones, changed, as far as the reaction has no say", () => {
    let decided = 0;
    let accepted = 0;
    fc.assert(
      fc.property(mutated(fc.constantFrom(...soundConditions), conditionWords), (value) => {
        const faults = faultsOfCall(() => reactionState(rusting, value as ReactionConditions));
        const others = faults.filter((fault) => !dependsOnReaction(fault));
        const result = reactionConditionsSchema.safeParse(value);
        const told = { faults, issues: result.error?.issues };
        if (others.length > 0) expect({ ...told, accepted: result.success }).toMatchObject({ accepted: false });
        if (faults.length > others.length) return;
        expect({ ...told, accepted: result.success }).toMatchObject({ accepted: faults.length === 0 });
        decided += 1;
        if (result.success) accepted += 1;
      }),
      { seed: 20270303, numRuns: 4000 },
    );
    expect(decided).toBeGreaterThan(2500);
    expect(accepted).toBeGreaterThan(600);
    expect(accepted).toBeLessThan(0.8 * decided);
  });

  test.each([undefined, null, 7, [], "700 K"])("%s", (value) => {
    expect(faultsOfCall(() => reactionState(rusting, value as never))).not.toEqual([]);
    expect(reactionConditionsSchema.safeParse(value).success).toBe(false);
  });
});

describe("schema and guard give the same verdict on searches for temperatures", () => {
  const { temperature: _, ...held } = soundConditions[5] as Record<string, unknown>;
  const gas = { moleFractions: { "N2(g)": 0.25, "H2(g)": 0.5, "NH3(g)": 0.25 } };
  const between = [
    { value: 300, unit: "K" },
    { value: 700, unit: "Cel" },
  ];
  const searches = [
    { between },
    { between, gibbsEnergy: { value: -1, unit: "kJ/mol" }, outsideRange: "continue-fit" },
    { between, conditions: { pressure: { value: 1, unit: "bar" }, gas } },
    { between, conditions: { pressure: { value: 1, unit: "bar" }, gas, outsideRange: "refuse" } },
  ];
  const words = [...conditionWords, 250, 1000, "J/mol", { value: 400, unit: "K" }, { value: 1, unit: "J/mol" }, held];
  const ofOthers = ["species/outside-range", "conditions/zero-activity"];

  test("with a temperature among the conditions held", () => {
    const search = { between, conditions: { ...at, gas } };
    expect(faultsOfCall(() => temperaturesAtGibbsEnergy(synthesis, search as never))).toMatchObject([
      { code: "input/conflicting-options", path: ["conditions", "temperature"] },
    ]);
    expect(temperatureSearchSchema.safeParse(search).success).toBe(false);
  });

  test("2,000 sound ones, changed, as far as the reaction has no say", () => {
    let decided = 0;
    let accepted = 0;
    fc.assert(
      fc.property(mutated(fc.constantFrom(...searches), words), (value) => {
        const faults = faultsOfCall(() => temperaturesAtGibbsEnergy(synthesis, value as never));
        const others = faults.filter((fault) => !dependsOnReaction(fault) && !ofOthers.includes(fault.code));
        const labels = synthesis.terms.map(({ label }) => label);
        const isOurs = (fault: Fault): boolean =>
          !(fault.code === "conditions/missing-composition" && labels.includes(String(fault.path.at(-1))));
        const result = temperatureSearchSchema.safeParse(value);
        const told = { faults, issues: result.error?.issues, accepted: result.success };
        if (others.filter(isOurs).length > 0) expect(told).toMatchObject({ accepted: false });
        if (faults.length > others.filter(isOurs).length) return;
        expect(told).toMatchObject({ accepted: faults.length === 0 });
        decided += 1;
        if (result.success) accepted += 1;
      }),
      { seed: 20270304, numRuns: 2000 },
    );
    expect(decided).toBeGreaterThan(1200);
    expect(accepted).toBeGreaterThan(300);
    expect(accepted).toBeLessThan(0.8 * decided);
  });
});
