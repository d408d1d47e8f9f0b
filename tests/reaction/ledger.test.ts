import { describe, expect, test } from "vitest";
import { gasConstantJPerMolK } from "../../src/constants/constants.js";
import { Ar_g, CaO_cr, NH3_g, referenceData } from "../../src/data/index.js";
import { gasComponentOf } from "../../src/fugacity/gas-component-of.js";
import { virial } from "../../src/fugacity/virial.js";
import { type Ledger, type LedgerEntryName, ledger, reaction } from "../../src/reaction/index.js";
import { findSpecies } from "../../src/species/collection.js";
import { placesOf } from "../errors/faults-of.js";
import { figure, invented } from "../heat-capacity/random-series.js";
import { collectionOf, fitted, polynomialRecord, recordOf } from "../species/records.js";

const synthesis = reaction("N2 + 3 H2 = 2 NH3", referenceData);
const state = { temperature: { value: 427, unit: "Cel" }, pressure: { value: 50, unit: "bar" } } as const;
const moleFractions = { "N2(g)": 0.2, "H2(g)": 0.6, "NH3(g)": 0.1, "Ar(g)": 0.1 };
const account = ledger(synthesis, { ...state, gas: { moleFractions }, inerts: [Ar_g] });

const namesOf = ({ entries }: Ledger, label: string): LedgerEntryName[] =>
  entries.filter((entry) => entry.label === label).map(({ entry }) => entry);
const amountOf = ({ entries }: Ledger, label: string, name: LedgerEntryName): number =>
  entries.find((entry) => entry.label === label && entry.entry === name)?.value.value ?? Number.NaN;

describe("the entries", () => {
  test("stand in the order of groups, then of species", () => {
    expect(account.entries.map(({ group }) => group).filter((group, index, all) => group !== all[index - 1])).toEqual([
      "formation",
      "temperature",
      "conditions",
    ]);
    expect(namesOf(account, "NH3(g)")).toEqual([
      "formation enthalpy",
      "reference entropy",
      "sensible heat",
      "heat-capacity entropy",
      "pressure",
      "composition",
    ]);
    expect(account.entries.some(({ label }) => label === "Ar(g)")).toBe(false);
  });

  test("are what they say", () => {
    const thermal = 2 * gasConstantJPerMolK * 700.15;
    expect(amountOf(account, "NH3(g)", "formation enthalpy")).toBeCloseTo(2 * -45940, -1);
    expect(amountOf(account, "NH3(g)", "reference entropy")).toBeCloseTo(-2 * 700.15 * 192.77, -1);
    expect(amountOf(account, "NH3(g)", "pressure")).toBeCloseTo(thermal * Math.log(50), 8);
    expect(amountOf(account, "NH3(g)", "composition")).toBeCloseTo(thermal * Math.log(0.1), 8);
  });

  test("sum to subtotals, the total and the direct route", () => {
    const sum = (group?: string): number =>
      account.entries
        .filter((entry) => group === undefined || entry.group === group)
        .reduce((total, { value }) => total + value.value, 0);
    expect(account.total.value).toBeCloseTo(sum(), 8);
    for (const group of ["formation", "temperature", "conditions"] as const) {
      expect(account.subtotals[group].value.value).toBeCloseTo(sum(group), 8);
    }
    expect(account.total.value).toBeCloseTo(account.directGibbsEnergy.value, 7);
    expect([account.temperature, account.pressure]).toEqual([
      { value: 700.15, unit: "K" },
      { value: 5e6, unit: "Pa" },
    ]);
    expect(account.equationOfState).toBe("idealGas");
  });

  test("carry sources: that of the fit, and that of the uncertainty where it is another", () => {
    const formation = account.entries.find(({ label, entry }) => label === "NH3(g)" && entry === "formation enthalpy");
    expect(formation).toMatchObject({ source: "mcbride2002", secondSource: "cox1989", coefficient: 2 });
    expect(account.entries.find(({ entry }) => entry === "pressure")).not.toHaveProperty("source");
  });

  test("are plain data", () => {
    expect(JSON.parse(JSON.stringify(account))).toEqual(account);
    expect(structuredClone(account)).toEqual(account);
  });
});

describe("uncertainties", () => {
  test("are |nu| u, and add in quadrature", () => {
    const of = (name: LedgerEntryName): number | undefined =>
      account.entries.find(({ label, entry }) => label === "NH3(g)" && entry === name)?.value.standardUncertainty;
    // Cox (1989): 0.35 kJ/mol and 0.05 J/mol/K are 95 per cent, so u is half of each.
    expect(of("formation enthalpy")).toBeCloseTo(350, 9);
    expect(of("reference entropy")).toBeCloseTo(2 * 700.15 * 0.025, 9);
    expect(of("sensible heat")).toBeUndefined();
    expect(of("pressure")).toBe(0);
    const squares = account.entries.reduce((sum, { value }) => sum + (value.standardUncertainty ?? 0) ** 2, 0);
    expect(account.total.standardUncertainty).toBeCloseTo(Math.sqrt(squares), 9);
    expect(account.uncertaintyIsLowerBound).toBe(true);
    expect(account.subtotals.formation.uncertaintyIsLowerBound).toBe(false);
    expect(account.subtotals.conditions).toMatchObject({ uncertaintyIsLowerBound: false });
  });
});

describe("conditions", () => {
  test("non-ideality, from an equation of state", () => {
    const real = ledger(synthesis, {
      ...state,
      gas: { moleFractions: { "N2(g)": 0.2, "H2(g)": 0.6, "NH3(g)": 0.2 }, equationOfState: virial() },
    });
    expect(namesOf(real, "NH3(g)")).toContain("non-ideality");
    const labels = ["H2(g)", "N2(g)", "NH3(g)"];
    const components = labels.map((label) => gasComponentOf(findSpecies(referenceData, label)));
    const { lnFugacityCoefficients } = virial().mixture(components).state(700.15, 5e6, [0.6, 0.2, 0.2]);
    labels.forEach((label, index) => {
      const coefficient = real.entries.find((entry) => entry.label === label)?.coefficient ?? Number.NaN;
      const thermal = coefficient * gasConstantJPerMolK * 700.15;
      expect(amountOf(real, label, "non-ideality")).toBeCloseTo(thermal * lnFugacityCoefficients[index]!, 10);
    });
    expect(real.equationOfState).toBe("virial");
    expect(real.uncertaintyIsLowerBound).toBe(true);
  });

  test("volume work, and a note where the volume is unknown", () => {
    const bare = { ...CaO_cr } as { volume?: unknown };
    delete bare.volume;
    const data = collectionOf(
      ...referenceData.species.filter(({ label }) => label !== "CaO(cr)"),
      bare as typeof CaO_cr,
    );
    const conditions = {
      temperature: { value: 1000, unit: "K" },
      pressure: { value: 100, unit: "bar" },
      gas: { moleFractions: { "CO2(g)": 1 } },
    } as const;
    const known = ledger(reaction("CaCO3(s) = CaO(s) + CO2", referenceData), conditions);
    const unknown = ledger(reaction("CaCO3(s) = CaO(s) + CO2", data), conditions);
    expect(namesOf(known, "CaO(cr)")).toContain("volume");
    expect(namesOf(unknown, "CaO(cr)")).not.toContain("volume");
    expect(known.notes).toEqual([]);
    expect(unknown.notes).toEqual(["CaO(cr) has no molar volume; its volume work is left out"]);
    expect(
      ledger(reaction("CaCO3(s) = CaO(s) + CO2", data), { ...conditions, pressure: { value: 1, unit: "bar" } }).notes,
    ).toEqual([]);
  });

  test("activities", () => {
    const given = ledger(synthesis, { ...state, activities: { "N2(g)": 1, "H2(g)": 2, "NH3(g)": 3 } });
    expect(namesOf(given, "H2(g)").at(-1)).toBe("activity");
    expect(amountOf(given, "H2(g)", "activity")).toBeCloseTo(-3 * gasConstantJPerMolK * 700.15 * Math.log(2), 9);
    expect(given).not.toHaveProperty("equationOfState");
    expect(amountOf(given, "N2(g)", "activity")).toBe(0);
  });

  test("the change of the standard pressure has an entry of its own", () => {
    const inAtm = polynomialRecord("He(g)", 0, 126, [20.8], [0], { standardPressure: figure(1, "atm") });
    const change = reaction("He(g) = He(l)", collectionOf(inAtm, polynomialRecord("He(l)", 0, 50, [20])));
    const one = ledger(change, {
      temperature: { value: 500, unit: "K" },
      pressure: { value: 1, unit: "atm" },
      gas: { moleFractions: { "He(g)": 1 } },
    });
    expect(amountOf(one, "He(g)", "standard pressure")).toBeCloseTo(500 * gasConstantJPerMolK * Math.log(1.01325), 9);
    // At 1 atm the two entries of pressure cancel.
    expect(amountOf(one, "He(g)", "standard pressure") + amountOf(one, "He(g)", "pressure")).toBeCloseTo(0, 9);
    expect(amountOf(one, "He(g)", "reference entropy")).toBeCloseTo(500 * 126, 9);
    expect(one.total.value).toBeCloseTo(one.directGibbsEnergy.value, 8);
  });
});

describe("phases and their ranges", () => {
  const iron = (from: number) =>
    recordOf("Fe(cr)", {
      formationEnthalpy: figure(1, "kJ/mol"),
      standardEntropy: figure(27, "J/mol/K"),
      transitions: [{ temperature: figure(1000, "K"), into: "Fe(cr,beta)", enthalpy: figure(900, "J/mol") }],
      gibbsFunction: fitted({
        kind: "series",
        form: "maier-kelley",
        ...(from > 300
          ? {
              anchor: { temperature: figure(from, "K"), enthalpy: figure(5, "kJ/mol"), entropy: figure(40, "J/mol/K") },
            }
          : {}),
        intervals: [
          { from, to: 1000, coefficients: [25, 0, 0], endsAt: "first-order" },
          { from: 1000, to: 1500, coefficients: [35, 0, 0], endsAt: "fit" },
        ],
      }),
    });
  const accountOf = (record: typeof Ar_g, temperatureK: number) =>
    ledger(reaction("Fe(cr) = Fe(l)", collectionOf(record, polynomialRecord("Fe(l)", 14000, 35, [40]))), {
      temperature: { value: temperatureK, unit: "K" },
      pressure: { value: 1, unit: "bar" },
    });

  test("a transition between anchor and temperature has an entry: H - T H/T of the break", () => {
    expect(namesOf(accountOf(iron(298.15), 900), "Fe(cr)")).not.toContain("transition");
    expect(namesOf(accountOf(iron(298.15), 1000), "Fe(cr)")).not.toContain("transition");
    const above = accountOf(iron(298.15), 1200);
    const entry = above.entries.find((each) => each.entry === "transition");
    expect(entry).toMatchObject({ group: "temperature", label: "Fe(cr)", note: "at 1000 K" });
    expect(entry?.value.value).toBeCloseTo(-(900 - 1200 * 0.9), 8);
    expect(amountOf(above, "Fe(cr)", "sensible heat")).toBeCloseTo(-(25 * 701.85 + 35 * 200), 8);
    expect(above.total.value).toBeCloseTo(above.directGibbsEnergy.value, 8);
  });

  test("a range without 298.15 K opens at its lower end, and the row says so", () => {
    const high = accountOf(iron(500), 800);
    const first = high.entries.find(({ label }) => label === "Fe(cr)");
    expect(first).toMatchObject({ entry: "formation enthalpy", note: "at 500 K" });
    expect(first?.value.value).toBeCloseTo(-5000, 9);
    expect(high.total.value).toBeCloseTo(high.directGibbsEnergy.value, 8);
  });

  test("labels outside their range are listed", () => {
    const change = reaction("CaCO3(s) = CaO(s) + CO2", referenceData);
    const hot = ledger(change, {
      temperature: { value: 1500, unit: "K" },
      pressure: { value: 1, unit: "bar" },
      gas: { moleFractions: { "CO2(g)": 1 } },
      outsideRange: "constant-heat-capacity",
    });
    expect(hot.outsideRange).toEqual(["CaCO3(cr,calcite)"]);
    expect(hot.total.value).toBeCloseTo(hot.directGibbsEnergy.value, 6);
  });
});

test("notes of the reaction are passed on, grades are of the records", () => {
  const combined = ledger(reaction("N2 + 3 H2 + NH3 = 3 NH3", referenceData), {
    ...state,
    gas: { moleFractions },
    inerts: [Ar_g],
  });
  expect(combined.notes).toEqual(["NH3(g) stands on both sides and was combined"]);
  expect(combined.grades["NH3(g)"]).toEqual({ caloric: "B", formation: "A", critical: "A" });
});

test("a source in the user's own words", () => {
  const own = ledger(
    reaction("W(cr) = W(l)", collectionOf(polynomialRecord("W(cr)", 0, 1, [1]), polynomialRecord("W(l)", 0, 1, [1]))),
    {
      temperature: { value: 300, unit: "K" },
      pressure: { value: 1, unit: "bar" },
    },
  );
  expect(own.entries[0]?.source).toEqual(invented);
});

test("what is wrong is refused", () => {
  expect(
    placesOf(() =>
      ledger(synthesis, {
        ...state,
        gas: { moleFractions: { ...moleFractions, "NH3(g)": 0, "Ar(g)": 0.2 } },
        inerts: [Ar_g],
      }),
    ),
  ).toEqual(["conditions/zero-activity at gas.moleFractions.NH3(g)"]);
  expect(
    placesOf(() =>
      ledger(synthesis, {
        ...state,
        temperature: { value: 100, unit: "K" },
        gas: { moleFractions: { "N2(g)": 0.2, "H2(g)": 0.6, "NH3(g)": 0.2 } },
      }),
    ),
  ).toHaveLength(3);
  expect(placesOf(() => ledger(NH3_g as never, { ...state, activities: {} }))).toEqual([
    "reaction/not-a-reaction at reaction",
  ]);
});
