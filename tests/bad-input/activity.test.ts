import { describe, expect, test } from "vitest";
import { idealSolution, solutionComponentOf } from "../../src/activity/index.js";
import { isGibbsLedgerError } from "../../src/errors/gibbs-ledger-error.js";
import { affinity, ledger, type ReactionConditions, reaction, reactionDirection } from "../../src/reaction/index.js";
import { chloride, sodium as sodiumIon, solutes } from "../activity/solutes.js";
import { faultsOf } from "../errors/faults-of.js";

/** Anything, as plain JavaScript may pass it. */
// biome-ignore lint/suspicious/noExplicitAny: the subject of this table is what types forbid
type Anything = any;

const water = { label: "H2O(l)", chargeNumber: 0, molarMassKgPerMol: 0.018015 };
const sodium = { label: "Na^+(aq)", chargeNumber: 1 };
const components: Anything = { scale: "molality", solvent: water, solutes: [sodium] };
const prepare = (parts: Anything) => idealSolution().solution({ ...components, ...parts }, ["here"]);
const state = (parts: Anything, temperatureK: Anything = 298.15, pressurePa: Anything = 1e5) =>
  idealSolution()
    .solution(components, ["here"])
    .state(temperatureK, pressurePa, { solventMoleFraction: 0.9, solutes: [1], ...parts });

describe.each<[string, () => unknown, string[]]>([
  ["nothing", () => idealSolution().solution(undefined as Anything), ["input/not-an-object at "]],
  [
    "nothing in it",
    () => idealSolution().solution({} as Anything, ["here"]),
    ["input/missing at here.scale", "input/missing at here.solvent", "input/missing at here.solutes"],
  ],
  ["another scale", () => prepare({ scale: "molarity" }), ["input/unknown-option at here.scale"]],
  ["a solvent by label", () => prepare({ solvent: "H2O(l)" }), ["input/not-an-object at here.solvent"]],
  [
    "a charged solvent",
    () => prepare({ solvent: { ...water, chargeNumber: 1 } }),
    ["activity/invalid-component at here.solvent.chargeNumber"],
  ],
  [
    "a solvent without a molar mass",
    () => prepare({ solvent: { label: "H2O(l)", chargeNumber: 0 } }),
    ["input/missing at here.solvent.molarMassKgPerMol"],
  ],
  [
    "molar masses of no size",
    () =>
      prepare({
        solvent: { ...water, molarMassKgPerMol: 0 },
        solutes: [
          { ...sodium, molarMassKgPerMol: -1 },
          { label: "X", chargeNumber: 0, molarMassKgPerMol: Number.NaN },
        ],
      }),
    [
      "activity/invalid-component at here.solvent.molarMassKgPerMol",
      "activity/invalid-component at here.solutes.0.molarMassKgPerMol",
      "activity/invalid-component at here.solutes.1.molarMassKgPerMol",
    ],
  ],
  [
    "half a charge",
    () => prepare({ solutes: [{ ...sodium, chargeNumber: 0.5 }] }),
    ["activity/invalid-component at here.solutes.0.chargeNumber"],
  ],
  [
    "a solute twice, and the solvent as a solute",
    () => prepare({ solutes: [sodium, sodium, { label: "H2O(l)", chargeNumber: 0 }] }),
    ["conditions/duplicate-label at here.solutes.1.label", "conditions/duplicate-label at here.solutes.2.label"],
  ],
  ["solutes as a map", () => prepare({ solutes: { "Na^+(aq)": 1 } }), ["input/not-an-array at here.solutes"]],
  [
    "a label of the prototype",
    () => prepare({ solutes: [{ ...sodium, label: "__proto__" }] }),
    ["input/forbidden-key at here.solutes.0.label"],
  ],
  [
    "a key of the prototype",
    () => prepare({ solutes: [JSON.parse('{ "label": "X", "chargeNumber": 0, "__proto__": 1 }')] }),
    ["input/forbidden-key at here.solutes.0.__proto__"],
  ],
  [
    "an unknown key",
    () => prepare({ solutes: [{ ...sodium, charge: 1 }] }),
    ["input/unknown-key at here.solutes.0.charge"],
  ],
  ["no label", () => prepare({ solutes: [{ chargeNumber: 1 }] }), ["input/missing at here.solutes.0.label"]],
  [
    "a huge label",
    () => prepare({ solutes: [{ ...sodium, label: "x".repeat(1e6) }] }),
    ["input/too-large at here.solutes.0.label"],
  ],
  ["no temperature", () => state({}, Number.NaN), ["quantity/not-positive at here.temperatureK"]],
  ["a temperature of text", () => state({}, "298.15"), ["quantity/not-positive at here.temperatureK"]],
  ["no pressure", () => state({}, 300, 0), ["quantity/not-positive at here.pressurePa"]],
  [
    "no amounts",
    () =>
      idealSolution()
        .solution(components, ["here"])
        .state(300, 1e5, undefined as Anything),
    ["input/not-an-object at here"],
  ],
  ["no solvent", () => state({ solventMoleFraction: 0 }), ["quantity/not-positive at here.solventMoleFraction"]],
  [
    "per cent of solvent",
    () => state({ solventMoleFraction: 90 }),
    ["quantity/not-positive at here.solventMoleFraction"],
  ],
  ["too few amounts", () => state({ solutes: [] }), ["conditions/missing-composition at here.solutes"]],
  ["too many amounts", () => state({ solutes: [1, 1] }), ["conditions/missing-composition at here.solutes"]],
  ["a negative amount", () => state({ solutes: [-1] }), ["conditions/invalid-amount at here.solutes.0"]],
  ["an amount of NaN", () => state({ solutes: [Number.NaN] }), ["conditions/invalid-amount at here.solutes.0"]],
  ["an amount of text", () => state({ solutes: ["1"] }), ["conditions/invalid-amount at here.solutes.0"]],
  [
    "molalities whose sum no double holds",
    () =>
      idealSolution()
        .solution({ ...components, solutes: [sodium, { label: "X", chargeNumber: 0 }] }, ["here"])
        .state(300, 1e5, { solventMoleFraction: 0.9, solutes: [1.7e308, 1.7e308] }),
    ["activity/unphysical at here"],
  ],
  ["a component of a text", () => solutionComponentOf("H2O(l)" as Anything), ["input/not-an-object at "]],
])("%s", (_name, call, places) => {
  test("is refused, with every fault at its place", () => {
    const faults = faultsOf(call);
    expect(faults.map(({ code, path }) => `${code} at ${path.join(".")}`)).toEqual(places);
    for (const { message, received, expected } of faults) {
      expect(message.length).toBeGreaterThan(0);
      expect(message.length).toBeLessThanOrEqual(500);
      expect(message).not.toContain("\n");
      expect(received?.length ?? 0).toBeLessThanOrEqual(250);
      expect(expected?.length ?? 0).toBeLessThanOrEqual(500);
    }
  });
});

describe("no result of a solution is NaN, infinite or a negative zero", () => {
  /** Every number in a result, however deep. */
  function numbersIn(value: unknown): number[] {
    if (typeof value === "number") return [value];
    return typeof value === "object" && value !== null ? Object.values(value).flatMap(numbersIn) : [];
  }

  const ionisation = reaction("H2O(l) = H^+(aq) + OH^-(aq)", solutes);
  const sizes = [0, 5e-324, 1e-300, 1e-9, 1, 1e6, 1e12, 1.1e12, 1e300, 1.7e308];
  const pressures = [5e-324, 1, 1e5, 1e10, 1e300];
  const expectedCodes = (size: number, pressurePa: number): string[] => {
    if (size > 1e12) return ["conditions/invalid-amount"];
    // The volume work of water would be 1.8e295 J/mol.
    if (pressurePa === 1e300) return ["quantity/overflow"];
    return size === 0 ? ["conditions/zero-activity"] : [];
  };

  test.each(sizes.flatMap((size) => pressures.map((pressurePa) => [size, pressurePa] as const)))(
    "at %d mol/kg and %d Pa",
    (size, pressurePa) => {
      const conditions: ReactionConditions = {
        temperature: { value: 298.15, unit: "K" },
        pressure: { value: pressurePa, unit: "Pa" },
        solution: {
          solvent: "H2O(l)",
          molalities: { "H^+(aq)": size, "OH^-(aq)": 1, "Na^+(aq)": size, "Cl^-(aq)": 0 },
          activityModel: idealSolution(),
        },
        inerts: [sodiumIon, chloride],
      };
      const codes = new Set<string>();
      const results = [ledger, affinity, reactionDirection].map((call) => {
        try {
          return call(ionisation, conditions);
        } catch (error) {
          if (!isGibbsLedgerError(error)) throw error;
          for (const { code } of error.faults) codes.add(code);
          return undefined;
        }
      });
      expect([...codes]).toEqual(expectedCodes(size, pressurePa));
      for (const number of numbersIn(results)) {
        expect(Number.isFinite(number)).toBe(true);
        expect(Object.is(number, -0)).toBe(false);
      }
    },
  );
});
