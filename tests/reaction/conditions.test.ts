import { describe, expect, test } from "vitest";
import { gasConstantJPerMolK } from "../../src/constants/constants.js";
import { Ar_g, CaCO3_cr_calcite, CaO_cr, CO2_g, He_g, N2_g, referenceData } from "../../src/data/index.js";
import { virial } from "../../src/fugacity/virial.js";
import {
  lnReactionQuotient,
  type ReactionConditions,
  reaction,
  reactionDirection,
  reactionGibbsEnergy,
  standardReactionGibbsEnergy,
} from "../../src/reaction/index.js";
import { faultsOf, placesOf } from "../errors/faults-of.js";
import { figure } from "../heat-capacity/random-series.js";
import { collectionOf, recordOf } from "../species/records.js";

const synthesis = reaction("N2 + 3 H2 = 2 NH3", referenceData);
const calcination = reaction("CaCO3(s) = CaO(s) + CO2", referenceData);
const dissolution = reaction(
  "AgCl(cr) = Ag^+(aq) + Cl^-(aq)",
  collectionOf(recordOf("AgCl(cr)"), recordOf("Ag^+(aq)"), recordOf("Cl^-(aq)")),
);

const state = { temperature: { value: 700, unit: "K" }, pressure: { value: 50, unit: "bar" } } as const;
const moleFractions = { "N2(g)": 0.2, "H2(g)": 0.6, "NH3(g)": 0.2 };
const conditions: ReactionConditions = { ...state, gas: { moleFractions } };

/** As plain JavaScript may pass them. */
function quotient(value: unknown, subject = synthesis): number {
  return lnReactionQuotient(subject, value as ReactionConditions);
}

describe("the quotient of gases", () => {
  // ln(0.2^2 / (0.2 x 0.6^3)) - 2 ln 50 = ln(0.2 / 0.216) - 2 ln 50
  const expected = Math.log(0.2 / 0.216) - 2 * Math.log(50);

  test("from mole fractions and pressure", () => {
    expect(lnReactionQuotient(synthesis, conditions)).toBeCloseTo(expected, 13);
    const energy = standardReactionGibbsEnergy(synthesis, state).value + gasConstantJPerMolK * 700 * expected;
    expect(reactionGibbsEnergy(synthesis, conditions)).toEqual({ value: expect.closeTo(energy, 8), unit: "J/mol" });
  });

  test("from partial pressures in any unit", () => {
    const partialPressures = {
      "N2(g)": { value: 10, unit: "bar" },
      "H2(g)": { value: 3000, unit: "kPa" },
      "NH3(g)": { value: 1e6, unit: "Pa" },
    } as const;
    expect(quotient({ ...state, gas: { partialPressures } })).toBeCloseTo(expected, 13);
  });

  test("from partial pressures with inerts, whose own may be zero", () => {
    const gas = {
      partialPressures: {
        "N2(g)": { value: 5, unit: "bar" },
        "H2(g)": { value: 15, unit: "bar" },
        "NH3(g)": { value: 5, unit: "bar" },
        "Ar(g)": { value: 25, unit: "bar" },
        "He(g)": { value: 0, unit: "bar" },
      },
    } as const;
    expect(quotient({ ...state, gas, inerts: [He_g, Ar_g] })).toBeCloseTo(Math.log(25 / (5 * 15 ** 3)), 13);
  });

  test("from activities given by the caller, with or without a gas phase", () => {
    const activities = { "N2(g)": 10, "H2(g)": 30, "NH3(g)": 10 };
    expect(quotient({ ...state, activities })).toBeCloseTo(expected, 13);
    const mixed = { ...state, gas: { moleFractions: { "N2(g)": 0.25, "H2(g)": 0.75 } }, activities: { "NH3(g)": 10 } };
    expect(quotient(mixed)).toBeCloseTo(Math.log(100 / (12.5 * 37.5 ** 3)), 12);
  });

  test("with inerts, whose fraction may be zero", () => {
    const inert = { "N2(g)": 0.1, "H2(g)": 0.3, "NH3(g)": 0.1, "Ar(g)": 0.5, "He(g)": 0 };
    const gas = { moleFractions: inert };
    expect(quotient({ ...state, gas, inerts: [Ar_g, He_g] })).toBeCloseTo(Math.log(0.1 / 0.027) - 2 * Math.log(50), 13);
  });

  test("with fugacity coefficients of an equation of state", () => {
    const components = { ...conditions, gas: { moleFractions, equationOfState: virial({ correlation: "abbott" }) } };
    const mixture = virial({ correlation: "abbott" });
    const departure = quotient(components) - quotient(conditions);
    expect(mixture.name).toBe("virial");
    expect(Math.abs(departure)).toBeGreaterThan(0.001);
    expect(Math.abs(departure)).toBeLessThan(0.2);
  });
});

describe("condensed phases", () => {
  const gas = { moleFractions: { "CO2(g)": 1 } };
  const at = (pressure: number) => ({
    temperature: { value: 1000, unit: "K" } as const,
    pressure: { value: pressure, unit: "bar" } as const,
    gas,
  });

  test("have activity 1 at the standard pressure", () => {
    expect(lnReactionQuotient(calcination, at(1))).toBe(0);
    expect(lnReactionQuotient(calcination, at(10))).toBeCloseTo(Math.log(10), 2);
  });

  test("gain their volume work", () => {
    const volume = (record: typeof CaO_cr) => (record.volume?.molar.value ?? 0) * 1e-6;
    const work = (volume(CaO_cr) - volume(CaCO3_cr_calcite)) * (1000e5 - 1e5);
    const thermal = gasConstantJPerMolK * 1000;
    expect(lnReactionQuotient(calcination, at(1000)) - Math.log(1000)).toBeCloseTo(work / thermal, 10);
  });

  test("take an activity in place of it", () => {
    const given = { ...at(1000), activities: { "CaO(cr)": 1, "CaCO3(cr,calcite)": 0.5 } };
    expect(lnReactionQuotient(calcination, given)).toBeCloseTo(Math.log(1000) - Math.log(0.5), 13);
  });

  test("thermal expansion and compressibility enter the work", () => {
    const record = recordOf("W(cr)", {
      volume: {
        molar: figure(10, "cm3/mol"),
        thermalExpansion: figure(1e-4, "K-1"),
        compressibility: figure(1e-10, "Pa-1"),
      },
    });
    const change = reaction("W(cr) = W(l)", collectionOf(record, recordOf("W(l)")));
    const lnQ = lnReactionQuotient(change, {
      temperature: { value: 1298.15, unit: "K" },
      pressure: { value: 1e5 + 1e8, unit: "Pa" },
    });
    // -V (1 + 0.1) (1e8 - 1e-10 x 1e16 / 2) / RT
    expect(lnQ).toBeCloseTo((-1e-5 * 1.1 * (1e8 - 5e5)) / (gasConstantJPerMolK * 1298.15), 13);
  });
});

test("dissolved species need activities", () => {
  const at25 = { temperature: { value: 25, unit: "Cel" }, pressure: { value: 1, unit: "bar" } } as const;
  expect(placesOf(() => quotient(at25, dissolution))).toEqual([
    "conditions/missing-activity at activities.Ag^+(aq)",
    "conditions/missing-activity at activities.Cl^-(aq)",
  ]);
  const activities = { "Ag^+(aq)": 1e-5, "Cl^-(aq)": 1e-5 };
  expect(quotient({ ...at25, activities }, dissolution)).toBeCloseTo(-10 * Math.log(10), 12);
});

describe("conditions that are wrong", () => {
  const withGas = (fractions: unknown, rest: object = {}) => ({ ...state, gas: { moleFractions: fractions }, ...rest });
  test.each<[string, unknown, string[]]>([
    ["nothing", undefined, ["input/not-an-object at "]],
    ["an array", [], ["input/not-an-object at "]],
    [
      "nothing in it",
      {},
      [
        "input/missing at temperature",
        "input/missing at pressure",
        "conditions/missing-composition at gas.moleFractions.N2(g)",
        "conditions/missing-composition at gas.moleFractions.H2(g)",
        "conditions/missing-composition at gas.moleFractions.NH3(g)",
      ],
    ],
    ["a misspelt key", { ...conditions, presure: 1 }, ["input/unknown-key at presure"]],
    [
      "temperature and pressure exchanged",
      { ...conditions, temperature: state.pressure, pressure: state.temperature },
      ["quantity/wrong-dimension at temperature.unit", "quantity/wrong-dimension at pressure.unit"],
    ],
    [
      "zero kelvin and zero bar",
      { ...conditions, temperature: { value: 0, unit: "K" }, pressure: { value: 0, unit: "bar" } },
      ["quantity/not-positive at temperature.value", "quantity/not-positive at pressure.value"],
    ],
    [
      "a negative pressure",
      { ...conditions, pressure: { value: -1, unit: "bar" } },
      ["quantity/not-positive at pressure.value"],
    ],
    ["another policy", { ...conditions, outsideRange: "extrapolate" }, ["input/unknown-option at outsideRange"]],
    ["no composition", { ...state, gas: {} }, ["conditions/missing-composition at gas"]],
    [
      "two compositions",
      { ...state, gas: { moleFractions, partialPressures: {} } },
      ["conditions/duplicate-label at gas"],
    ],
    ["a gas of text", { ...state, gas: "air" }, ["input/not-an-object at gas"]],
    [
      "fractions that do not sum",
      withGas({ ...moleFractions, "NH3(g)": 0.3 }),
      ["conditions/fractions-do-not-sum at gas.moleFractions"],
    ],
    [
      "a sum off by 2e-9",
      withGas({ ...moleFractions, "NH3(g)": 0.200000002 }),
      ["conditions/fractions-do-not-sum at gas.moleFractions"],
    ],
    [
      "per cent",
      withGas({ "N2(g)": 20, "H2(g)": 60, "NH3(g)": 20 }),
      Object.keys(moleFractions).map((label) => `conditions/invalid-fraction at gas.moleFractions.${label}`),
    ],
    [
      "a negative fraction",
      withGas({ ...moleFractions, "NH3(g)": -0.2 }),
      ["conditions/invalid-fraction at gas.moleFractions.NH3(g)"],
    ],
    [
      "a fraction of NaN",
      withGas({ ...moleFractions, "NH3(g)": Number.NaN }),
      ["conditions/invalid-fraction at gas.moleFractions.NH3(g)"],
    ],
    [
      "a species left out",
      withGas({ "N2(g)": 0.4, "H2(g)": 0.6 }),
      ["conditions/missing-composition at gas.moleFractions.NH3(g)"],
    ],
    [
      "a bare label",
      withGas({ N2: 0.2, "H2(g)": 0.6, "NH3(g)": 0.2 }),
      ["conditions/unknown-label at gas.moleFractions.N2"],
    ],
    ["a stranger", withGas({ ...moleFractions, "Ar(g)": 0 }), ["conditions/unknown-label at gas.moleFractions.Ar(g)"]],
    [
      "an inert without a fraction",
      { ...conditions, inerts: [Ar_g] },
      ["conditions/missing-composition at gas.moleFractions.Ar(g)"],
    ],
    ["an inert that reacts", { ...conditions, inerts: [N2_g] }, ["conditions/duplicate-label at inerts.0"]],
    [
      "an inert twice",
      withGas({ ...moleFractions, "Ar(g)": 0 }, { inerts: [Ar_g, Ar_g] }),
      ["conditions/duplicate-label at inerts.1"],
    ],
    ["a solid inert", { ...conditions, inerts: [CaO_cr] }, ["conditions/unknown-label at inerts.0"]],
    ["inerts by label", { ...conditions, inerts: ["Ar(g)"] }, ["input/not-an-object at inerts.0"]],
    [
      "a species in gas and activities",
      { ...conditions, activities: { "NH3(g)": 1 } },
      ["conditions/duplicate-label at activities.NH3(g)"],
    ],
    [
      "an activity of a stranger",
      { ...conditions, activities: { N2: 1 } },
      ["conditions/unknown-label at activities.N2"],
    ],
    [
      "a negative activity",
      { ...state, activities: { "N2(g)": -1, "H2(g)": 1, "NH3(g)": 1 } },
      ["conditions/invalid-fraction at activities.N2(g)"],
    ],
    [
      "an infinite activity",
      { ...state, activities: { "N2(g)": Number.POSITIVE_INFINITY, "H2(g)": 1, "NH3(g)": 1 } },
      ["conditions/invalid-fraction at activities.N2(g)"],
    ],
    [
      "an equation of state by name",
      { ...state, gas: { moleFractions, equationOfState: "virial" } },
      ["input/not-an-object at gas.equationOfState"],
    ],
    [
      "an equation of state not called",
      { ...state, gas: { moleFractions, equationOfState: virial } },
      ["input/not-an-object at gas.equationOfState"],
    ],
    [
      "no equation of state",
      { ...state, gas: { moleFractions, equationOfState: null } },
      ["input/not-an-object at gas.equationOfState"],
    ],
    [
      "a partial pressure below zero",
      { ...state, gas: { partialPressures: { "N2(g)": { value: -1, unit: "bar" } } } },
      ["conditions/invalid-fraction at gas.partialPressures.N2(g)"],
    ],
    [
      "partial pressures of another sum",
      { ...state, gas: { partialPressures: { "N2(g)": { value: 1, unit: "bar" } } } },
      ["conditions/pressure-mismatch at gas.partialPressures"],
    ],
    [
      "partial pressures without units",
      { ...state, gas: { partialPressures: { "N2(g)": 1 } } },
      ["quantity/not-a-quantity at gas.partialPressures.N2(g)"],
    ],
    [
      "partial pressures but no pressure",
      { temperature: state.temperature, gas: { partialPressures: { "N2(g)": { value: 1, unit: "bar" } } } },
      ["input/missing at pressure"],
    ],
    [
      "partial pressures of a stranger, a bare label, and one given in activities too",
      {
        ...state,
        gas: {
          partialPressures: {
            N2: { value: 10, unit: "bar" },
            "H2(g)": { value: 30, unit: "bar" },
            "CO2(g)": { value: 10, unit: "bar" },
          },
        },
        activities: { "H2(g)": 1 },
      },
      [
        "conditions/duplicate-label at activities.H2(g)",
        "conditions/unknown-label at gas.partialPressures.CO2(g)",
        "conditions/unknown-label at gas.partialPressures.N2",
      ],
    ],
    [
      "a partial pressure of zero",
      {
        ...state,
        gas: {
          partialPressures: {
            "N2(g)": { value: 0, unit: "bar" },
            "H2(g)": { value: 40, unit: "bar" },
            "NH3(g)": { value: 10, unit: "bar" },
          },
        },
      },
      ["conditions/zero-activity at gas.partialPressures.N2(g)"],
    ],
    [
      "inerts of a gas that is not there",
      { ...state, activities: { "N2(g)": 1, "H2(g)": 1, "NH3(g)": 1 }, inerts: [Ar_g] },
      ["conditions/missing-composition at gas"],
    ],
    [
      "an absent reactant",
      withGas({ "N2(g)": 0, "H2(g)": 0.8, "NH3(g)": 0.2 }),
      ["conditions/zero-activity at gas.moleFractions.N2(g)"],
    ],
    [
      "an activity of zero",
      { ...state, activities: { "N2(g)": 0, "H2(g)": 1, "NH3(g)": -0 } },
      ["conditions/zero-activity at activities.N2(g)", "conditions/zero-activity at activities.NH3(g)"],
    ],
    [
      "keys of a prototype",
      JSON.parse(
        '{ "temperature": { "value": 700, "unit": "K" }, "pressure": { "value": 1, "unit": "bar" }, "gas": { "moleFractions": { "N2(g)": 0.2, "H2(g)": 0.6, "NH3(g)": 0.2, "__proto__": 0 } } }',
      ),
      ["input/forbidden-key at gas.moleFractions.__proto__", "conditions/unknown-label at gas.moleFractions.__proto__"],
    ],
  ])("%s", (_name, value, places) => {
    expect(placesOf(() => quotient(value)).toSorted()).toEqual(places.toSorted());
  });

  test("all faults of every part at once", () => {
    const wrong = {
      temperature: { value: -5, unit: "K" },
      pressure: { value: 1, unit: "K" },
      gas: { moleFractions: { N2: 2, "H2(g)": "0.6" }, equationOfState: 7 },
      activities: { "NH3(g)": Number.NaN },
      inerts: [CO2_g, 3],
      outsideRange: "none",
      extra: true,
    };
    expect(placesOf(() => quotient(wrong)).toSorted()).toEqual([
      "conditions/invalid-fraction at activities.NH3(g)",
      "conditions/invalid-fraction at gas.moleFractions.H2(g)",
      "conditions/invalid-fraction at gas.moleFractions.N2",
      "conditions/missing-composition at gas.moleFractions.CO2(g)",
      "input/not-an-object at gas.equationOfState",
      "input/not-an-object at inerts.1",
      "input/unknown-key at extra",
      "input/unknown-option at outsideRange",
      "quantity/below-absolute-zero at temperature.value",
      "quantity/wrong-dimension at pressure.unit",
    ]);
  });

  test("hints", () => {
    const hint = (value: unknown): string | undefined => faultsOf(() => quotient(value))[0]?.hint;
    expect(hint(withGas({ N2: 0.2, "H2(g)": 0.6, "NH3(g)": 0.2 }))).toBe('did you mean "N2(g)"?');
    expect(hint(withGas({ "N2(g)": 20 }))).toBe("0.2 for 20 per cent");
    expect(hint(withGas({ ...moleFractions, "NH3(g)": 0.3 }))).toBe("list inert gases too; nothing is renormalised");
    expect(hint({ ...state, gas: { moleFractions, equationOfState: virial } })).toBe("call it: virial(), not virial");
    expect(hint({ ...conditions, presure: 1 })).toBe("did you mean pressure?");
    expect(hint(withGas({ "N2(g)": 0.25, "H2(g)": 0.75, "NH3(g)": 0 }))).toContain("only run forward");
    expect(hint(withGas({ "N2(g)": 0, "H2(g)": 0.8, "NH3(g)": 0.2 }))).toContain("only run in reverse");
  });

  test("sums within 1e-9 of 1 are taken as they are", () => {
    expect(quotient(withGas({ ...moleFractions, "NH3(g)": 0.2000000009 }))).toBeCloseTo(quotient(conditions), 7);
  });

  test("an equation of state that gives no number is refused", () => {
    for (const lnFugacityCoefficients of [[], [0, Number.NaN, 0], [0, 0, Number.POSITIVE_INFINITY]]) {
      const equationOfState = {
        name: "a caller's own",
        parameters: {},
        mixture: () => ({ state: () => ({ lnFugacityCoefficients }) }),
      };
      expect(faultsOf(() => quotient({ ...state, gas: { moleFractions, equationOfState } }))[0]?.code).toBe(
        "fugacity/unphysical",
      );
    }
  });

  test("critical constants that are missing are named", () => {
    const bare = { ...N2_g } as { critical?: unknown };
    delete bare.critical;
    const subject = reaction("N2(g) = 2 N(g)", {
      species: [bare as typeof N2_g, ...referenceData.species.slice(1).filter(({ label }) => label !== "N2(g)")],
    });
    const gas = { moleFractions: { "N2(g)": 0.5, "N(g)": 0.5 }, equationOfState: virial() };
    const faults = faultsOf(() => quotient({ ...state, gas }, subject));
    expect(faults.map(({ code }) => code)).toEqual(Array(2).fill("fugacity/missing-critical-constants"));
    expect(faults.map(({ path }) => path.at(-1))).toEqual(["N(g)", "N2(g)"]);
  });
});

describe("the direction of a reaction", () => {
  const direction = (fractions: Record<string, number>, rest: object = {}) =>
    reactionDirection(synthesis, { ...state, gas: { moleFractions: fractions }, ...rest } as ReactionConditions);

  test("forward and reverse by the sign of the Gibbs energy", () => {
    const forward = direction({ "N2(g)": 0.25, "H2(g)": 0.7499, "NH3(g)": 0.0001 });
    expect(forward).toMatchObject({ direction: "forward", gibbsEnergy: { unit: "J/mol" } });
    expect(forward.gibbsEnergy?.value).toBeLessThan(0);
    const reverse = direction({ "N2(g)": 0.0001, "H2(g)": 0.0003, "NH3(g)": 0.9996 });
    expect(reverse.direction).toBe("reverse");
    expect(reverse.gibbsEnergy?.value).toBeGreaterThan(0);
  });

  test("without a number where a side is absent", () => {
    expect(direction({ "N2(g)": 0.25, "H2(g)": 0.75, "NH3(g)": 0 })).toEqual({
      direction: "forward",
      reason: "NH3(g) absent",
    });
    expect(direction({ "N2(g)": 0, "H2(g)": 0, "NH3(g)": 1 })).toEqual({
      direction: "reverse",
      reason: "N2(g), H2(g) absent",
    });
    expect(direction({ "N2(g)": 0, "H2(g)": 1, "NH3(g)": 0 })).toEqual({
      direction: "undetermined",
      reason: "N2(g) and NH3(g) are absent",
    });
  });

  test("at equilibrium within rounding", () => {
    const isomers = reaction(
      "A = B".replace("A", "C2H5OH(g)").replace("B", "CH3OCH3(g)"),
      collectionOf(recordOf("C2H5OH(g)"), recordOf("CH3OCH3(g)")),
    );
    const answer = reactionDirection(isomers, {
      temperature: { value: 298.15, unit: "K" },
      pressure: { value: 3, unit: "bar" },
      gas: { moleFractions: { "C2H5OH(g)": 0.5, "CH3OCH3(g)": 0.5 } },
    });
    expect(answer.direction).toBe("at-equilibrium");
    expect(answer.gibbsEnergy?.value).toBe(0);
  });

  test("refuses what is wrong", () => {
    expect(placesOf(() => direction({ "N2(g)": 1, "H2(g)": 1, "NH3(g)": 1 }))).toEqual([
      "conditions/fractions-do-not-sum at gas.moleFractions",
    ]);
    expect(placesOf(() => direction(moleFractions, { temperature: { value: 100, unit: "K" } }))).toEqual([
      "species/outside-range at temperature",
      "species/outside-range at temperature",
      "species/outside-range at temperature",
    ]);
  });
});
