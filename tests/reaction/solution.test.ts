import fc from "fast-check";
import { describe, expect, test } from "vitest";
import type { ActivityModel } from "../../src/activity/activity-model.js";
import { idealSolution } from "../../src/activity/ideal-solution.js";
import { solutionComponentOf } from "../../src/activity/solution-component-of.js";
import { faradayConstantCPerMol, gasConstantJPerMolK } from "../../src/constants/constants.js";
import { Ar_g, H2O_l } from "../../src/data/index.js";
import type { Quantity } from "../../src/quantity/quantity.js";
import {
  type LabelMap,
  type Ledger,
  ledger,
  lnReactionQuotient,
  type ReactionConditions,
  reaction,
  reactionDirection,
  reactionGibbsEnergy,
  standardReactionProperties,
  temperaturesAtGibbsEnergy,
} from "../../src/reaction/index.js";
import { formatLedger } from "../../src/report/index.js";
import type { SpeciesRecord } from "../../src/species/record.js";
import { chloride, hydron, hydroxide, silver, sodium, solutes, sucrose } from "../activity/solutes.js";
import { faultsOf, placesOf } from "../errors/faults-of.js";
import { figure } from "../heat-capacity/random-series.js";
import { collectionOf, recordOf } from "../species/records.js";

const ionisation = reaction("H2O(l) = H^+(aq) + OH^-(aq)", solutes);
const dissolution = reaction("AgCl(cr) = Ag^+(aq) + Cl^-(aq)", solutes);
const deposition = reaction("Ag^+(aq) + e^- = Ag(cr)", solutes);
const at25 = { temperature: { value: 25, unit: "Cel" }, pressure: { value: 1, unit: "bar" } } as const;
const thermal = gasConstantJPerMolK * 298.15;
/** Of water, in kg/mol. */
const molarMass = 0.018015;
const activityModel = idealSolution();
const runs = { seed: 20261201, numRuns: 300 };

const inWater = (molalities: LabelMap, rest: object = {}): ReactionConditions => ({
  ...at25,
  solution: { solvent: "H2O(l)", molalities, activityModel },
  ...rest,
});
/** Conditions with water, which a reaction without water has to be told of. */
const withWater = (molalities: LabelMap, inerts: readonly SpeciesRecord[] = []): ReactionConditions =>
  inWater(molalities, { inerts: [H2O_l, ...inerts] });

describe("the quotient of an ideal dilute solution", () => {
  test("by hand: m(Ag+) m(Cl-) at 0.01 and 0.02 mol/kg", () => {
    const lnQ = lnReactionQuotient(dissolution, withWater({ "Ag^+(aq)": 0.01, "Cl^-(aq)": 0.02 }));
    expect(lnQ).toBeCloseTo(Math.log(2e-4), 14);
  });

  test("a reacting solvent has ln a = -M sum of m, inert solutes included", () => {
    const conditions = inWater(
      { "H^+(aq)": 1e-7, "OH^-(aq)": 1e-7, "Na^+(aq)": 0.5, "Cl^-(aq)": 0.5 },
      { inerts: [sodium, chloride] },
    );
    expect(lnReactionQuotient(ionisation, conditions)).toBeCloseTo(Math.log(1e-14) + molarMass * (1 + 2e-7), 12);
  });

  test("molalities are numbers in mol/kg or quantities in any unit", () => {
    const plain = lnReactionQuotient(dissolution, withWater({ "Ag^+(aq)": 0.001, "Cl^-(aq)": 0.002 }));
    const tagged = lnReactionQuotient(dissolution, {
      ...at25,
      solution: {
        solvent: "H2O(l)",
        molalities: { "Ag^+(aq)": { value: 1, unit: "mmol/kg" }, "Cl^-(aq)": 0.002 },
        activityModel,
      },
      inerts: [H2O_l],
    });
    expect(tagged).toBe(plain);
  });

  test("concentrations with a density: m = c / (rho - sum of c M), by hand", () => {
    // 1 mol/L of NaCl at 1.036 kg/L: 58.44 g of salt (Na 22.98976928, Cl 35.45), so 977.56 g of water
    const salt = reaction("NaCl(cr) = Na^+(aq) + Cl^-(aq)", {
      species: [...solutes.species, recordOf("NaCl(cr)")],
    });
    const one = { value: 1, unit: "mol/L" } as const;
    const lnQ = lnReactionQuotient(salt, {
      ...at25,
      solution: {
        solvent: "H2O(l)",
        concentrations: { "Na^+(aq)": one, "Cl^-(aq)": one },
        density: { value: 1.036, unit: "g/cm3" },
        activityModel,
      },
      inerts: [H2O_l],
    });
    expect(lnQ).toBeCloseTo(2 * Math.log(1 / (1.036 - 0.02298976928 - 0.03545)), 13);
  });

  test("mole fractions of dissolved species: m = x / (x(solvent) M), by hand", () => {
    const lnQ = lnReactionQuotient(dissolution, {
      ...at25,
      solution: {
        solvent: "H2O(l)",
        moleFractions: { "H2O(l)": 0.98, "Ag^+(aq)": 0.01, "Cl^-(aq)": 0.01 },
        activityModel,
      },
      inerts: [H2O_l],
    });
    expect(lnQ).toBeCloseTo(2 * Math.log(0.01 / 0.98 / molarMass), 14);
  });

  test("three scales of one solution agree", () => {
    const molality = fc.double({ min: 1e-6, max: 5, noNaN: true });
    const labels = ["H^+(aq)", "OH^-(aq)", "Na^+(aq)", "Cl^-(aq)"];
    const records = [hydron, hydroxide, sodium, chloride];
    const masses = records.map((record) => solutionComponentOf(record).molarMassKgPerMol!);
    const ofLabels = <T>(values: readonly T[]): LabelMap<T> =>
      Object.fromEntries(labels.map((label, index) => [label, values[index]!]));
    fc.assert(
      fc.property(
        fc.tuple(molality, molality, molality, molality),
        fc.double({ min: 700, max: 2000, noNaN: true }),
        (values, density) => {
          const sum = values.reduce((total, value) => total + value, 0);
          const amount = 1 / molarMass + sum;
          const mass = values.reduce((total, value, index) => total + value * masses[index]!, 1);
          const common = { solvent: "H2O(l)", activityModel } as const;
          const quotient = (solution: object): number =>
            lnReactionQuotient(ionisation, {
              ...at25,
              inerts: [sodium, chloride],
              solution: { ...common, ...solution } as ReactionConditions["solution"] & object,
            });
          const expected = quotient({ molalities: ofLabels(values) });
          const fractions = { ...ofLabels(values.map((value) => value / amount)), "H2O(l)": 1 / molarMass / amount };
          const concentrations = ofLabels(
            values.map((value): Quantity<"concentration"> => ({ value: (value * density) / mass, unit: "mol/m3" })),
          );
          // Each scale rounds a molality some five times, and ln m is at most 14.
          const tolerance = 1e-14;
          expect(Math.abs(quotient({ moleFractions: fractions }) - expected)).toBeLessThan(tolerance);
          expect(
            Math.abs(quotient({ concentrations, density: { value: density, unit: "kg/m3" } }) - expected),
          ).toBeLessThan(tolerance);
        },
      ),
      runs,
    );
  });

  test("some dissolved species by activity, others by molality", () => {
    const lnQ = lnReactionQuotient(ionisation, inWater({ "OH^-(aq)": 1e-4 }, { activities: { "H^+(aq)": 1e-10 } }));
    expect(lnQ).toBeCloseTo(Math.log(1e-14) + molarMass * 1e-4, 12);
  });

  test("the solvent alone, and dissolved inerts of molality zero", () => {
    const evaporation = reaction("H2O(l) = H2O(g)", collectionOf(H2O_l, recordOf("H2O(g)")));
    const gas = { moleFractions: { "H2O(g)": 1 } };
    const pure = lnReactionQuotient(evaporation, { ...at25, gas });
    expect(lnReactionQuotient(evaporation, inWater({}, { gas }))).toBe(pure);
    expect(lnReactionQuotient(evaporation, inWater({ "C12H22O11(aq)": 0 }, { gas, inerts: [sucrose] }))).toBe(pure);
  });

  test("gas and solution stand side by side, each with its inerts", () => {
    const solubility = reaction("CO2(g) = CO2(aq)", collectionOf(recordOf("CO2(g)"), recordOf("CO2(aq)")));
    const lnQ = lnReactionQuotient(solubility, {
      ...at25,
      gas: { moleFractions: { "CO2(g)": 0.25, "Ar(g)": 0.75 } },
      solution: { solvent: "H2O(l)", molalities: { "CO2(aq)": 0.01, "C12H22O11(aq)": 1 }, activityModel },
      inerts: [H2O_l, sucrose, Ar_g],
    });
    expect(lnQ).toBeCloseTo(Math.log(0.01 / 0.25), 14);
  });
});

describe("a mixture of liquids", () => {
  const acid = recordOf("CH3COOH(l)");
  const alcohol = recordOf("C2H5OH(l)");
  const ester = recordOf("CH3COOC2H5(l)");
  const water = recordOf("H2O(l)", { volume: { molar: figure(18, "cm3/mol") } });
  const esterification = reaction(
    "CH3COOH(l) + C2H5OH(l) = CH3COOC2H5(l) + H2O(l)",
    collectionOf(acid, alcohol, ester, water),
  );
  const moleFractions = { "CH3COOH(l)": 0.2, "C2H5OH(l)": 0.3, "CH3COOC2H5(l)": 0.1, "H2O(l)": 0.4 };
  const mixture = (solvent: string, fractions: LabelMap = moleFractions, bars: number = 1): ReactionConditions => ({
    ...at25,
    pressure: { value: bars, unit: "bar" },
    solution: { solvent, moleFractions: fractions, activityModel },
  });

  test("every activity is a mole fraction, whichever component is named the solvent", () => {
    for (const solvent of Object.keys(moleFractions)) {
      const lnQ = lnReactionQuotient(esterification, mixture(solvent));
      expect(lnQ).toBeCloseTo(Math.log((0.1 * 0.4) / (0.2 * 0.3)), 14);
    }
  });

  test("volume work goes on top of it, where a record has a volume", () => {
    const rise = (solvent: string) =>
      lnReactionQuotient(esterification, mixture(solvent, moleFractions, 1001)) -
      lnReactionQuotient(esterification, mixture(solvent));
    expect(rise("H2O(l)")).toBeCloseTo((18e-6 * 1e8) / thermal, 13);
    expect(rise("C2H5OH(l)")).toBeCloseTo((18e-6 * 1e8) / thermal, 13);
    expect(ledger(esterification, mixture("H2O(l)", moleFractions, 2)).notes).toEqual([
      "CH3COOH(l) has no molar volume; its volume work is left out",
      "C2H5OH(l) has no molar volume; its volume work is left out",
      "CH3COOC2H5(l) has no molar volume; its volume work is left out",
    ]);
  });

  test("a liquid of the reaction that the mixture does not name is a pure phase", () => {
    const fractions = { "CH3COOH(l)": 0.5, "C2H5OH(l)": 0.3, "CH3COOC2H5(l)": 0.2 };
    const lnQ = lnReactionQuotient(esterification, mixture("C2H5OH(l)", fractions));
    expect(lnQ).toBeCloseTo(Math.log(0.2 / 0.15), 14);
  });

  test("an absent component decides the direction; the solvent is never absent", () => {
    const without = { "CH3COOH(l)": 0.5, "C2H5OH(l)": 0.5, "CH3COOC2H5(l)": 0, "H2O(l)": 0 };
    expect(reactionDirection(esterification, mixture("C2H5OH(l)", without))).toEqual({
      direction: "forward",
      reason: "CH3COOC2H5(l), H2O(l) absent",
    });
    expect(placesOf(() => lnReactionQuotient(esterification, mixture("C2H5OH(l)", without)))).toEqual([
      "conditions/zero-activity at solution.moleFractions.CH3COOC2H5(l)",
      "conditions/zero-activity at solution.moleFractions.H2O(l)",
    ]);
    expect(placesOf(() => lnReactionQuotient(esterification, mixture("H2O(l)", without)))).toEqual([
      "conditions/invalid-fraction at solution.moleFractions.H2O(l)",
    ]);
  });

  test("liquids are not given by molality, nor beside dissolved species", () => {
    const molalities = { "CH3COOH(l)": 1, "C2H5OH(l)": 1, "CH3COOC2H5(l)": 1 };
    const solution = { solvent: "H2O(l)", molalities, activityModel };
    expect(placesOf(() => lnReactionQuotient(esterification, { ...at25, solution }))).toEqual(
      Object.keys(molalities)
        .sort()
        .map((label) => `conditions/mixed-standard-states at solution.molalities.${label}`),
    );
    const both = {
      ...mixture("H2O(l)", { ...moleFractions, "C2H5OH(l)": 0.2, "C12H22O11(aq)": 0.1 }),
      inerts: [sucrose],
    };
    expect(placesOf(() => lnReactionQuotient(esterification, both))).toEqual(
      ["CH3COOH(l)", "C2H5OH(l)", "CH3COOC2H5(l)"]
        .sort()
        .map((label) => `conditions/mixed-standard-states at solution.moleFractions.${label}`),
    );
  });
});

describe("the electron", () => {
  test("has activity 1 and no place in conditions: the potential of silver falls by 59.16 mV a decade", () => {
    const potential = (molality: number): number =>
      -reactionGibbsEnergy(deposition, withWater({ "Ag^+(aq)": molality })).value / faradayConstantCPerMol;
    expect(potential(0.1) - potential(0.01)).toBeCloseTo((thermal * Math.LN10) / faradayConstantCPerMol, 12);
    expect(potential(1)).toBeCloseTo(
      -standardReactionProperties(deposition, at25).gibbsEnergy.value / faradayConstantCPerMol,
      12,
    );
  });

  test("is refused in activities", () => {
    const conditions = { ...at25, activities: { "Ag^+(aq)": 1, "e^-": 1 } };
    expect(placesOf(() => lnReactionQuotient(deposition, conditions))).toEqual([
      "conditions/unknown-label at activities.e^-",
    ]);
  });

  test("has no entry among the conditions of a ledger", () => {
    const { entries } = ledger(deposition, withWater({ "Ag^+(aq)": 0.01 }));
    expect(entries.some(({ label }) => label === "e^-")).toBe(true);
    expect(entries.filter(({ label, group }) => label === "e^-" && group === "conditions")).toEqual([]);
  });
});

test("a stable sequence does the volume work of the phase that is stable at the temperature", () => {
  const phase = (label: string, from: number, to: number, volume: number) =>
    recordOf(label, {
      volume: { molar: figure(volume, "cm3/mol") },
      transitions: label.includes("alpha")
        ? [{ temperature: figure(500, "K"), into: "W(cr,beta)", enthalpy: figure(1, "kJ/mol") }]
        : [],
      gibbsFunction: {
        kind: "series",
        form: "maier-kelley",
        ...(from > 300
          ? {
              anchor: { temperature: figure(500, "K"), enthalpy: figure(6, "kJ/mol"), entropy: figure(212, "J/mol/K") },
            }
          : {}),
        intervals: [{ from, to, coefficients: [25, 0, 0], endsAt: "fit" }],
        source: { text: "invented for a test" },
        origin: "memory",
      },
    });
  const data = {
    species: [phase("W(cr,alpha)", 298.15, 500, 10), phase("W(cr,beta)", 500, 1000, 12), recordOf("W^2+(aq)"), hydron],
    sequences: [
      {
        label: "W(cr)",
        phases: ["W(cr,alpha)", "W(cr,beta)"],
        source: { text: "invented for a test" },
        origin: "memory" as const,
      },
    ],
  };
  const change = reaction("W(cr) + 2 H^+(aq) = W^2+(aq) + H2(g)", {
    ...data,
    species: [...data.species, recordOf("H2(g)")],
  });
  const work = (temperatureK: number): number =>
    lnReactionQuotient(change, {
      temperature: { value: temperatureK, unit: "K" },
      pressure: { value: 1001, unit: "bar" },
      activities: { "H^+(aq)": 1, "W^2+(aq)": 1, "H2(g)": 1 },
    });
  expect(work(400)).toBeCloseTo(-(10e-6 * 1e8) / (gasConstantJPerMolK * 400), 13);
  expect(work(600)).toBeCloseTo(-(12e-6 * 1e8) / (gasConstantJPerMolK * 600), 13);
});

const entriesOf = ({ entries }: Ledger, label: string): [string, number][] =>
  entries
    .filter((entry) => entry.label === label && entry.group === "conditions")
    .map(({ entry, value }) => [entry, value.value]);

describe("the ledger of a solution", () => {
  const molalities = { "H^+(aq)": 0.1, "OH^-(aq)": 0.2, "Na^+(aq)": 0.3, "Cl^-(aq)": 0.2 };
  const account = ledger(ionisation, {
    ...inWater(molalities, { inerts: [sodium, chloride] }),
    pressure: { value: 101, unit: "bar" },
  });

  test("composition of the solutes, composition and volume of the solvent, no non-ideality", () => {
    expect(entriesOf(account, "H^+(aq)")).toEqual([["composition", expect.closeTo(thermal * Math.log(0.1), 9)]]);
    expect(entriesOf(account, "OH^-(aq)")).toEqual([["composition", expect.closeTo(thermal * Math.log(0.2), 9)]]);
    expect(entriesOf(account, "H2O(l)")).toEqual([
      ["composition", expect.closeTo(thermal * molarMass * 0.8, 9)],
      ["volume", expect.any(Number)],
    ]);
    // Water has some 18 cm3/mol; its record's own figure is used.
    expect(entriesOf(account, "H2O(l)")[1]?.[1]).toBeCloseTo(-18.07e-6 * 1e7, 0);
  });

  test("names the model, notes volumes that are missing, and sums to the direct route", () => {
    expect(account.activityModel).toBe("idealSolution");
    expect(account).not.toHaveProperty("equationOfState");
    expect(account.notes).toEqual([
      "H^+(aq) has no molar volume; its volume work is left out",
      "OH^-(aq) has no molar volume; its volume work is left out",
    ]);
    expect(Math.abs(account.total.value - account.directGibbsEnergy.value)).toBeLessThan(1e-12 * 285_830);
    expect(account.lnReactionQuotient).toBeCloseTo(
      account.subtotals.conditions.value.value / (gasConstantJPerMolK * 298.15),
      11,
    );
    expect(formatLedger(account).split("\n")[2]).toBe("T = 298.15 K, p = 101 bar, solution: idealSolution");
    expect(JSON.parse(JSON.stringify(account))).toEqual(account);
  });

  test("a volume of a dissolved species counts, as its standard partial molar volume", () => {
    const heavy = recordOf("OH^-(aq)", { volume: { molar: figure(-4, "cm3/mol") } });
    const other = reaction("H2O(l) = H^+(aq) + OH^-(aq)", collectionOf(H2O_l, hydron, heavy));
    const conditions = { ...inWater({ "H^+(aq)": 1, "OH^-(aq)": 1 }), pressure: { value: 101, unit: "bar" } as const };
    expect(entriesOf(ledger(other, conditions), "OH^-(aq)")).toEqual([
      ["composition", 0],
      ["volume", expect.closeTo(-4e-6 * 1e7, 9)],
    ]);
  });

  test("sums to the direct route within 1e-12 of the largest entry, at any composition", () => {
    const amount = fc.double({ min: 1e-12, max: 20, noNaN: true });
    fc.assert(
      fc.property(amount, amount, amount, fc.double({ min: 0.01, max: 1e4, noNaN: true }), (h, oh, salt, bars) => {
        const { entries, total, directGibbsEnergy } = ledger(ionisation, {
          ...inWater(
            { "H^+(aq)": h, "OH^-(aq)": oh, "Na^+(aq)": salt, "Cl^-(aq)": salt },
            { inerts: [sodium, chloride] },
          ),
          pressure: { value: bars, unit: "bar" },
        });
        const largest = Math.max(...entries.map(({ value }) => Math.abs(value.value)));
        expect(Math.abs(total.value - directGibbsEnergy.value)).toBeLessThan(1e-12 * largest);
      }),
      runs,
    );
  });
});

describe("laws", () => {
  const amount = fc.double({ min: 1e-9, max: 10, noNaN: true });
  const compositions = fc.tuple(amount, amount, amount, amount);
  const labels = ["H^+(aq)", "OH^-(aq)", "Na^+(aq)", "Cl^-(aq)"];
  const mapOf = (values: readonly number[], order: readonly number[] = [0, 1, 2, 3]): LabelMap =>
    Object.fromEntries(order.map((index) => [labels[index]!, values[index]!]));
  const backward = reaction("OH^-(aq) + H^+(aq) = H2O(l)", solutes);

  test("the quotient reverses its sign exactly with the equation", () => {
    fc.assert(
      fc.property(compositions, (values) => {
        const conditions = inWater(mapOf(values), { inerts: [sodium, chloride] });
        const lnQ = lnReactionQuotient(ionisation, conditions);
        expect(lnReactionQuotient(backward, conditions)).toBe(0 - lnQ);
      }),
      runs,
    );
  });

  test("the order of a composition and of inerts shows in no bit, on any scale", () => {
    const shuffled = fc.shuffledSubarray([0, 1, 2, 3], { minLength: 4, maxLength: 4 });
    const inLitres = (values: LabelMap) =>
      Object.fromEntries(Object.entries(values).map(([label, value]) => [label, { value, unit: "mol/L" } as const]));
    fc.assert(
      fc.property(compositions, shuffled, (values, order) => {
        const one = inWater(mapOf(values), { inerts: [sodium, chloride] });
        const other = inWater(mapOf(values, order), { inerts: [chloride, sodium] });
        expect(lnReactionQuotient(ionisation, other)).toBe(lnReactionQuotient(ionisation, one));
        const dense = (map: LabelMap): number =>
          lnReactionQuotient(ionisation, {
            ...one,
            solution: {
              solvent: "H2O(l)",
              concentrations: inLitres(map),
              density: { value: 3, unit: "kg/L" },
              activityModel,
            },
          });
        expect(dense(mapOf(values, order))).toBe(dense(mapOf(values)));
      }),
      runs,
    );
  });
});

/** A model of a caller's own: ln gamma = -A z^2 sqrt(I), and phi = 1 - (A/3) sum of m z^2 sqrt(I) / sum of m. */
const limitingLaw = (lnSlope: number): ActivityModel => ({
  name: "limiting law of a test",
  parameters: { lnSlope },
  scales: ["molality"],
  solution: ({ solvent, solutes: members }) => ({
    state: (_temperatureK, _pressurePa, { solutes: molalities }) => {
      const sum = members.reduce((total, _, index) => total + molalities[index]!, 0);
      const charges = members.reduce(
        (total, { chargeNumber }, index) => total + molalities[index]! * chargeNumber ** 2,
        0,
      );
      const root = Math.sqrt(charges / 2);
      return {
        lnActivityCoefficients: members.map(({ chargeNumber }) => -lnSlope * chargeNumber ** 2 * root),
        lnSolventActivity: -solvent.molarMassKgPerMol * (sum - (lnSlope / 3) * charges * root),
        ...(root > 0.1 ? { outsideValidity: `ionic strength ${charges / 2} mol/kg is above 0.01 mol/kg` } : {}),
      };
    },
  }),
});

describe("a model of the caller's own", () => {
  const lnSlope = 1.1758;
  const model = limitingLaw(lnSlope);
  const molalities = { "H^+(aq)": 0.001, "OH^-(aq)": 0.001, "Na^+(aq)": 0.003, "Cl^-(aq)": 0.003 };
  const conditions = (activity: ActivityModel, map: LabelMap = molalities): ReactionConditions => ({
    ...at25,
    solution: { solvent: "H2O(l)", molalities: map, activityModel: activity },
    inerts: [sodium, chloride],
  });

  test("its coefficients are entries of non-ideality, the solvent's beside its ideal part", () => {
    const account = ledger(ionisation, conditions(model));
    const root = Math.sqrt(0.004);
    expect(entriesOf(account, "H^+(aq)")).toEqual([
      ["composition", expect.closeTo(thermal * Math.log(0.001), 9)],
      ["non-ideality", expect.closeTo(-thermal * lnSlope * root, 9)],
    ]);
    // The solvent stands on the left: ln a + M sum of m = M (A/3) 2 I sqrt(I)
    expect(entriesOf(account, "H2O(l)")).toEqual([
      ["composition", expect.closeTo(thermal * molarMass * 0.008, 9)],
      ["non-ideality", expect.closeTo(-thermal * molarMass * (lnSlope / 3) * 0.008 * root, 9)],
      ["volume", 0],
    ]);
    expect(account.activityModel).toBe("limiting law of a test");
    expect(Math.abs(account.total.value - account.directGibbsEnergy.value)).toBeLessThan(1e-12 * 285_830);
    expect(account.notes).toEqual([]);
  });

  test("what it says of its validity is a note", () => {
    const strong = { "H^+(aq)": 1, "OH^-(aq)": 1, "Na^+(aq)": 0, "Cl^-(aq)": 0 };
    expect(ledger(ionisation, conditions(model, strong)).notes).toEqual([
      "ionic strength 1 mol/kg is above 0.01 mol/kg",
    ]);
  });

  test("its components are sorted by label and carry charge numbers and molar masses", () => {
    const seen: unknown[] = [];
    const watching: ActivityModel = {
      ...model,
      solution: (components, path) => {
        seen.push(components, path);
        return model.solution(components, path);
      },
    };
    lnReactionQuotient(ionisation, conditions(watching));
    expect(seen).toEqual([
      {
        scale: "molality",
        solvent: { label: "H2O(l)", chargeNumber: 0, molarMassKgPerMol: 0.018015 },
        solutes: [chloride, hydron, sodium, hydroxide].map((record) => solutionComponentOf(record)),
      },
      ["solution", "molalities"],
    ]);
  });

  test("a scale that it does not serve is refused", () => {
    const mixing: ActivityModel = { ...idealSolution(), scales: ["mole-fraction"] };
    expect(placesOf(() => lnReactionQuotient(ionisation, conditions(mixing)))).toEqual([
      "activity/scale-not-served at solution.activityModel",
    ]);
  });

  test("what is no finite number is refused", () => {
    const states = [
      { lnActivityCoefficients: [0, 0, 0], lnSolventActivity: 0 },
      { lnActivityCoefficients: [0, 0, Number.NaN, 0], lnSolventActivity: 0 },
      { lnActivityCoefficients: [0, 0, 0, 0], lnSolventActivity: Number.NEGATIVE_INFINITY },
      { lnActivityCoefficients: [0, 0, 0, 0] },
      { lnActivityCoefficients: [0, 1e300, 0, 0], lnSolventActivity: 0 },
    ];
    const wrong = states.map((state) => {
      const own = { ...model, solution: () => ({ state: () => state as never }) };
      return placesOf(() => lnReactionQuotient(ionisation, conditions(own)));
    });
    expect(wrong).toEqual([
      ["activity/unphysical at solution.molalities.OH^-(aq)"],
      ["activity/unphysical at solution.molalities.Na^+(aq)"],
      ["activity/unphysical at solution.molalities.H2O(l)"],
      ["activity/unphysical at solution.molalities.H2O(l)"],
      ["activity/unphysical at solution.molalities.H^+(aq)"],
    ]);
  });
});

describe("charges", () => {
  const notesOf = (molalities: LabelMap) =>
    ledger(ionisation, inWater(molalities, { inerts: [sodium, chloride] })).notes;

  test("that do not balance are a note, no fault", () => {
    expect(notesOf({ "H^+(aq)": 0.1, "OH^-(aq)": 0.2, "Na^+(aq)": 0.3, "Cl^-(aq)": 0.1 })).toEqual([
      "the charges of the solution do not balance: 0.4 mol/kg of positive and 0.3 mol/kg of negative charge",
    ]);
  });

  test("balance within a relative 1e-6", () => {
    const off = (share: number) => ({ "H^+(aq)": 1, "OH^-(aq)": 1 - 2 * share, "Na^+(aq)": 0, "Cl^-(aq)": 0 });
    expect(notesOf(off(9.9e-7))).toEqual([]);
    expect(notesOf(off(1.1e-6))).toHaveLength(1);
  });
});

describe("the direction of a reaction in solution", () => {
  const direction = (molalities: LabelMap) => reactionDirection(dissolution, withWater(molalities));

  test("by the sign of the Gibbs energy about the solubility product", () => {
    expect(direction({ "Ag^+(aq)": 1e-6, "Cl^-(aq)": 1e-6 }).direction).toBe("forward");
    expect(direction({ "Ag^+(aq)": 1e-4, "Cl^-(aq)": 1e-4 }).direction).toBe("reverse");
  });

  test("without a number where a solute is absent", () => {
    expect(direction({ "Ag^+(aq)": 0, "Cl^-(aq)": 1 })).toEqual({ direction: "forward", reason: "Ag^+(aq) absent" });
    expect(faultsOf(() => lnReactionQuotient(dissolution, withWater({ "Ag^+(aq)": 0, "Cl^-(aq)": 1 })))).toMatchObject([
      { code: "conditions/zero-activity", path: ["solution", "molalities", "Ag^+(aq)"] },
    ]);
  });
});

test("temperatures at which a reaction in solution turns", () => {
  const change = reaction(
    "C6H12O6(cr) = C6H12O6(aq)",
    collectionOf(
      recordOf("C6H12O6(cr)", {
        formationEnthalpy: figure(-10, "kJ/mol"),
        gibbsFunction: constant(50),
      }),
      recordOf("C6H12O6(aq)", { standardEntropy: figure(230, "J/mol/K"), gibbsFunction: constant(50) }),
    ),
  );
  // dH = 10 kJ/mol and dS = 30 J/mol/K at every temperature: T = dH / (dS - R ln m)
  const turnsAt = (molality: number) =>
    temperaturesAtGibbsEnergy(change, {
      between: [
        { value: 250, unit: "K" },
        { value: 400, unit: "K" },
      ],
      conditions: {
        pressure: at25.pressure,
        solution: { solvent: "H2O(l)", molalities: { "C6H12O6(aq)": molality }, activityModel },
        inerts: [H2O_l],
      },
    });
  expect(turnsAt(1)).toEqual([{ value: expect.closeTo(10000 / 30, 9), unit: "K" }]);
  expect(turnsAt(0.5)).toEqual([
    { value: expect.closeTo(10000 / (30 - gasConstantJPerMolK * Math.log(0.5)), 9), unit: "K" },
  ]);
});

function constant(heatCapacity: number): SpeciesRecord["gibbsFunction"] {
  return {
    kind: "series",
    form: "maier-kelley",
    intervals: [{ from: 200, to: 1000, coefficients: [heatCapacity, 0, 0], endsAt: "fit" }],
    source: { text: "invented for a test" },
    origin: "memory",
  };
}

describe("solutions that are wrong", () => {
  const good = { solvent: "H2O(l)", molalities: { "Ag^+(aq)": 0.1, "Cl^-(aq)": 0.1 }, activityModel };
  const given = (parts: object, rest: object = {}): unknown => ({
    ...at25,
    inerts: [H2O_l],
    solution: { ...good, ...parts },
    ...rest,
  });
  const only = (solution: unknown, rest: object = {}): unknown => ({ ...at25, inerts: [H2O_l], solution, ...rest });
  const molar = (value: unknown) => ({ value, unit: "mol/L" });
  const litre = { "Ag^+(aq)": molar(0.1), "Cl^-(aq)": molar(0.1) };
  const dense = { value: 1, unit: "kg/L" };
  const { molalities: _molalities, ...withoutScale } = good;
  const { activityModel: _model, ...withoutModel } = good;
  const { solvent: _solvent, ...withoutSolvent } = good;

  test.each<[string, unknown, string[]]>([
    ["a text", only("water"), ["input/not-an-object at solution"]],
    ["null", only(null), ["input/not-an-object at solution"]],
    [
      "nothing in it",
      only({}),
      [
        "input/missing at solution.solvent",
        "conditions/missing-activity-model at solution.activityModel",
        "conditions/missing-composition at solution",
      ],
    ],
    ["a misspelt key", given({ molality: 1 }), ["input/unknown-key at solution.molality"]],
    ["no model", only(withoutModel), ["conditions/missing-activity-model at solution.activityModel"]],
    ["a model by name", given({ activityModel: "ideal" }), ["input/not-an-object at solution.activityModel"]],
    ["a model not called", given({ activityModel: idealSolution }), ["input/not-an-object at solution.activityModel"]],
    ["null for a model", given({ activityModel: null }), ["input/not-an-object at solution.activityModel"]],
    [
      "a model of unknown scales",
      given({ activityModel: { ...activityModel, scales: ["molarity"] } }),
      ["input/not-an-object at solution.activityModel"],
    ],
    [
      "a model without scales",
      given({ activityModel: { ...activityModel, scales: [] } }),
      ["input/not-an-object at solution.activityModel"],
    ],
    ["no solvent", only(withoutSolvent), ["input/missing at solution.solvent"]],
    ["a bare solvent", given({ solvent: "H2O" }), ["conditions/unknown-label at solution.solvent"]],
    [
      "a solvent of the reaction's other side",
      given({ solvent: "Ag^+(aq)" }),
      ["conditions/unknown-label at solution.solvent"],
    ],
    ["a solvent as a record", given({ solvent: H2O_l }), ["input/not-a-string at solution.solvent"]],
    ["a solvent that nobody named", given({}, { inerts: [] }), ["conditions/unknown-label at solution.solvent"]],
    [
      "a charged liquid for a solvent",
      given({ solvent: "Na^+(l)" }, { inerts: [recordOf("Na^+(l)")] }),
      ["conditions/unknown-label at solution.solvent"],
    ],
    [
      "a solvent without a molar mass",
      given({ solvent: "Tc(l)" }, { inerts: [recordOf("Tc(l)")] }),
      ["formula/no-atomic-weight at solution.solvent"],
    ],
    [
      "the solvent among the solutes",
      given({ molalities: { ...good.molalities, "H2O(l)": 55.5 } }),
      ["conditions/duplicate-label at solution.molalities.H2O(l)"],
    ],
    ["no scale", only(withoutScale), ["conditions/missing-composition at solution"]],
    ["two scales", given({ moleFractions: { "H2O(l)": 1 } }), ["conditions/duplicate-label at solution"]],
    ["molalities of text", given({ molalities: "0.1" }), ["input/not-an-object at solution.molalities"]],
    [
      "values that are none",
      given({ molalities: { "Ag^+(aq)": -1, "Cl^-(aq)": Number.NaN } }),
      [
        "conditions/invalid-amount at solution.molalities.Ag^+(aq)",
        "conditions/invalid-amount at solution.molalities.Cl^-(aq)",
      ],
    ],
    [
      "infinite and text values",
      given({ molalities: { "Ag^+(aq)": Number.POSITIVE_INFINITY, "Cl^-(aq)": "0.1" } }),
      [
        "conditions/invalid-amount at solution.molalities.Ag^+(aq)",
        "conditions/invalid-amount at solution.molalities.Cl^-(aq)",
      ],
    ],
    [
      "molalities in other units, below zero",
      given({ molalities: { "Ag^+(aq)": molar(0.1), "Cl^-(aq)": { value: -1, unit: "mmol/kg" } } }),
      [
        "quantity/wrong-dimension at solution.molalities.Ag^+(aq).unit",
        "conditions/invalid-amount at solution.molalities.Cl^-(aq)",
      ],
    ],
    [
      "a solute left out",
      given({ molalities: { "Ag^+(aq)": 0.1 } }),
      ["conditions/missing-composition at solution.molalities.Cl^-(aq)"],
    ],
    [
      "a bare label",
      given({ molalities: { Ag: 0.1, "Cl^-(aq)": 0.1 } }),
      ["conditions/unknown-label at solution.molalities.Ag"],
    ],
    [
      "a stranger",
      given({ molalities: { ...good.molalities, "Na^+(aq)": 0.1 } }),
      ["conditions/unknown-label at solution.molalities.Na^+(aq)"],
    ],
    [
      "a solid of the reaction",
      given({ molalities: { ...good.molalities, "AgCl(cr)": 0.1 } }),
      ["conditions/unknown-label at solution.molalities.AgCl(cr)"],
    ],
    [
      "the electron",
      given({ molalities: { ...good.molalities, "e^-": 0.1 } }),
      ["conditions/unknown-label at solution.molalities.e^-"],
    ],
    [
      "a species in solution and activities",
      given({}, { activities: { "Ag^+(aq)": 1 } }),
      ["conditions/duplicate-label at activities.Ag^+(aq)"],
    ],
    [
      "a solvent in solution and activities",
      given({}, { activities: { "H2O(l)": 1 } }),
      ["conditions/unknown-label at activities.H2O(l)"],
    ],
    [
      "a gas in gas and solution",
      given(
        { molalities: { ...good.molalities, "Ar(g)": 0.1 } },
        { inerts: [H2O_l, Ar_g], gas: { moleFractions: { "Ar(g)": 1 } } },
      ),
      ["conditions/duplicate-label at solution.molalities.Ar(g)"],
    ],
    [
      "an inert that is not in the solution",
      given({}, { inerts: [H2O_l, sodium] }),
      ["conditions/missing-composition at solution.molalities.Na^+(aq)"],
    ],
    [
      "an inert of a phase that is not there",
      given({}, { inerts: [H2O_l, Ar_g] }),
      ["conditions/missing-composition at gas"],
    ],
    [
      "inerts of a solution that is not there",
      { ...at25, activities: { "Ag^+(aq)": 1, "Cl^-(aq)": 1 }, inerts: [sodium] },
      ["conditions/missing-composition at solution"],
    ],
    ["an inert that reacts", given({}, { inerts: [H2O_l, silver] }), ["conditions/duplicate-label at inerts.1"]],
    ["a density for molalities", given({ density: dense }), ["input/conflicting-options at solution.density"]],
    [
      "concentrations without a density",
      only({ ...withoutScale, concentrations: litre }),
      ["input/missing at solution.density"],
    ],
    [
      "a density that is none",
      only({ ...withoutScale, concentrations: litre, density: { value: 0, unit: "kg/L" } }),
      ["quantity/not-positive at solution.density.value"],
    ],
    [
      "a density of another dimension",
      only({ ...withoutScale, concentrations: litre, density: { value: 1, unit: "mol/L" } }),
      ["quantity/wrong-dimension at solution.density.unit"],
    ],
    [
      "bare and negative concentrations",
      only({ ...withoutScale, concentrations: { "Ag^+(aq)": 0.1, "Cl^-(aq)": molar(-1) }, density: dense }),
      [
        "quantity/not-a-quantity at solution.concentrations.Ag^+(aq)",
        "conditions/invalid-amount at solution.concentrations.Cl^-(aq)",
      ],
    ],
    [
      "solutes heavier than the solution",
      only({ ...withoutScale, concentrations: litre, density: { value: 1, unit: "kg/m3" } }),
      ["conditions/invalid-density at solution.density"],
    ],
    [
      "a concentration of a solute without a molar mass",
      only(
        { ...withoutScale, concentrations: { ...litre, "TcO4^-(aq)": molar(0.1) }, density: dense },
        { inerts: [H2O_l, recordOf("TcO4^-(aq)")] },
      ),
      ["formula/no-atomic-weight at solution.concentrations.TcO4^-(aq)"],
    ],
    [
      "mole fractions with hardly any solvent",
      only({ ...withoutScale, moleFractions: { "H2O(l)": 1e-320, "Ag^+(aq)": 0.5, "Cl^-(aq)": 0.5 } }),
      [
        "conditions/invalid-amount at solution.moleFractions.Ag^+(aq)",
        "conditions/invalid-amount at solution.moleFractions.Cl^-(aq)",
      ],
    ],
    [
      "mole fractions without the solvent",
      only({ ...withoutScale, moleFractions: { "Ag^+(aq)": 0.5, "Cl^-(aq)": 0.5 } }),
      ["conditions/missing-composition at solution.moleFractions.H2O(l)"],
    ],
    [
      "mole fractions that do not sum",
      only({ ...withoutScale, moleFractions: { "H2O(l)": 0.9, "Ag^+(aq)": 0.1, "Cl^-(aq)": 0.1 } }),
      ["conditions/fractions-do-not-sum at solution.moleFractions"],
    ],
    [
      "a sum off by 2e-9",
      only({ ...withoutScale, moleFractions: { "H2O(l)": 0.8, "Ag^+(aq)": 0.1, "Cl^-(aq)": 0.100000002 } }),
      ["conditions/fractions-do-not-sum at solution.moleFractions"],
    ],
    [
      "per cent",
      only({ ...withoutScale, moleFractions: { "H2O(l)": 80, "Ag^+(aq)": 10, "Cl^-(aq)": 10 } }),
      ["H2O(l)", "Ag^+(aq)", "Cl^-(aq)"].map(
        (label) => `conditions/invalid-fraction at solution.moleFractions.${label}`,
      ),
    ],
    [
      "keys of a prototype",
      given({ molalities: JSON.parse('{ "Ag^+(aq)": 0.1, "Cl^-(aq)": 0.1, "__proto__": 0.1 }') }),
      [
        "input/forbidden-key at solution.molalities.__proto__",
        "conditions/unknown-label at solution.molalities.__proto__",
      ],
    ],
  ])("%s", (_name, conditions, places) => {
    expect(placesOf(() => lnReactionQuotient(dissolution, conditions as ReactionConditions)).toSorted()).toEqual(
      places.toSorted(),
    );
  });

  test("all faults of gas, solution and activities at once", () => {
    const wrong = {
      temperature: { value: 0, unit: "K" },
      pressure: { value: 1, unit: "bar" },
      gas: { moleFractions: { "Ar(g)": 2 } },
      solution: { solvent: "H2O", molalities: { "Ag^+(aq)": -1, Cl: 0.1 }, density: 1 },
      activities: { "Cl^-(aq)": Number.NaN },
      inerts: [H2O_l, Ar_g, 5],
    };
    const places = placesOf(() => lnReactionQuotient(dissolution, wrong as unknown as ReactionConditions));
    expect(places.toSorted()).toEqual([
      "conditions/invalid-amount at solution.molalities.Ag^+(aq)",
      "conditions/invalid-fraction at activities.Cl^-(aq)",
      "conditions/invalid-fraction at gas.moleFractions.Ar(g)",
      "conditions/missing-activity-model at solution.activityModel",
      "conditions/unknown-label at solution.molalities.Cl",
      "conditions/unknown-label at solution.solvent",
      "input/conflicting-options at solution.density",
      "input/not-an-object at inerts.2",
      "quantity/not-a-quantity at solution.density",
      "quantity/not-positive at temperature.value",
    ]);
  });

  test("what is missing in a sound solution shows beside a gas that is at fault", () => {
    const conditions = given(
      { molalities: { "Ag^+(aq)": 0.1 } },
      { inerts: [H2O_l, Ar_g], gas: { moleFractions: { "Ar(g)": 2 } } },
    );
    expect(placesOf(() => lnReactionQuotient(dissolution, conditions as ReactionConditions))).toEqual([
      "conditions/invalid-fraction at gas.moleFractions.Ar(g)",
      "conditions/missing-composition at solution.molalities.Cl^-(aq)",
    ]);
  });

  test("a solvent of the reaction is not given in activities too", () => {
    const conditions = inWater({ "H^+(aq)": 1, "OH^-(aq)": 1 }, { activities: { "H2O(l)": 1 } });
    expect(placesOf(() => lnReactionQuotient(ionisation, conditions))).toEqual([
      "conditions/duplicate-label at activities.H2O(l)",
    ]);
  });

  test("hints", () => {
    const hint = (conditions: unknown): string | undefined =>
      faultsOf(() => lnReactionQuotient(dissolution, conditions as ReactionConditions))[0]?.hint;
    expect(hint(only(withoutModel))).toContain("idealSolution()");
    expect(hint(given({ activityModel: idealSolution }))).toBe("call it: idealSolution(), not idealSolution");
    expect(hint(given({ solvent: "H2O" }))).toBe('did you mean "H2O(l)"?');
    expect(hint(given({ molalities: { Ag: 0.1, "Cl^-(aq)": 0.1 } }))).toBe('did you mean "Ag^+(aq)"?');
    expect(hint(given({ molalities: { "Ag^+": 0.1, "Cl^-(aq)": 0.1 } }))).toBe('did you mean "Ag^+(aq)"?');
    expect(hint(only({ ...withoutScale, moleFractions: { "H2O(l)": 0.9, "Ag^+(aq)": 0, "Cl^-(aq)": 0 } }))).toBe(
      "list the solvent and inert species too; nothing is renormalised",
    );
    expect(hint(given({ molalities: { "Ag^+(aq)": 0, "Cl^-(aq)": 1 } }))).toContain("only run forward");
  });

  test("sums within 1e-9 of 1 are taken as they are", () => {
    const moleFractions = { "H2O(l)": 0.8, "Ag^+(aq)": 0.1, "Cl^-(aq)": 0.1000000009 };
    const lnQ = lnReactionQuotient(dissolution, only({ ...withoutScale, moleFractions }) as ReactionConditions);
    expect(lnQ).toBeCloseTo(Math.log((0.1 * 0.1000000009) / (0.8 * molarMass) ** 2), 13);
  });

  test("a molality is enough for a solute without a molar mass", () => {
    const conditions = inWater(
      { "H^+(aq)": 1, "OH^-(aq)": 1, "TcO4^-(aq)": 0.5 },
      { inerts: [recordOf("TcO4^-(aq)")] },
    );
    expect(lnReactionQuotient(ionisation, conditions)).toBeCloseTo(2.5 * molarMass, 15);
  });

  test("pressures beyond the volume work that a double holds are refused", () => {
    const volume = { molar: figure(18, "cm3/mol"), compressibility: figure(4.5e-10, "Pa-1") };
    const change = reaction("H2O(cr) = H2O(l)", collectionOf(recordOf("H2O(cr)"), recordOf("H2O(l)", { volume })));
    const conditions = { ...at25, pressure: { value: 1e300, unit: "Pa" } as const };
    expect(placesOf(() => lnReactionQuotient(change, conditions))).toEqual(["quantity/overflow at pressure"]);
  });
});
