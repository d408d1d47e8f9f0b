import { describe, expect, test } from "vitest";
import { compileReaction } from "../../src/compiled/index.js";
import { evaluateToDigits } from "../../src/precision/index.js";
import { quantity } from "../../src/quantity/quantity.js";
import {
  type Ledger,
  ledger,
  type Reaction,
  reaction,
  standardReactionGibbsEnergy,
  standardReactionProperties,
} from "../../src/reaction/index.js";
import { formatLedger, formatReactionTable } from "../../src/report/index.js";
import type { CollectionData } from "../../src/species/index.js";
import { faultsOf, placesOf } from "../errors/faults-of.js";
import { figure } from "../heat-capacity/random-series.js";
import { ironData } from "../species/iron.js";
import { polynomialRecord, recordOf } from "../species/records.js";

const at = (temperatureK: number) => ({ temperature: quantity(temperatureK, "K") });
const inAir = { pressure: quantity(1, "bar"), gas: { moleFractions: { "O2(g)": 1 } } } as const;
const through = (subject: Reaction): Reaction => JSON.parse(JSON.stringify(subject));

describe("a stable sequence in a reaction", () => {
  const oxidation = reaction("2 Fe(cr) + O2 = 2 FeO(cr)", ironData);

  test.each(["2 Fe(s) + O2 = 2 FeO(cr)", "2 Fe(cr) + O2 = 2 FeO(s)"])("is named as in %s", (equation) => {
    expect(reaction(equation, ironData).equation).toBe("2 Fe(cr) + O2(g) = 2 FeO(cr)");
  });

  test.each([
    [500, "Fe(cr,alpha)"],
    [1185, "Fe(cr,alpha)"],
    [1400, "Fe(cr,gamma)"],
    [1800, "Fe(cr,delta)"],
  ])("at %d K is %s", (temperatureK, phase) => {
    const onePhase = reaction(`2 ${phase} + O2 = 2 FeO(cr)`, ironData);
    expect(standardReactionProperties(oxidation, at(temperatureK)).gibbsEnergy.value).toBeCloseTo(
      standardReactionProperties(onePhase, at(temperatureK)).gibbsEnergy.value,
      6,
    );
  });

  test("compiles and is evaluated to digits as one function", () => {
    const temperaturesK = Float64Array.of(500, 1185, 1400, 1800);
    const out = compileReaction(oxidation).gibbsEnergy(temperaturesK, new Float64Array(4));
    temperaturesK.forEach((temperatureK, index) => {
      expect(out[index]).toBe(standardReactionGibbsEnergy(oxidation, at(temperatureK)).value);
      const { gibbsEnergy } = evaluateToDigits(oxidation, { ...at(temperatureK), digits: 25 });
      expect(Math.abs(gibbsEnergy.errorOfDouble)).toBeLessThan(1e-8);
    });
  });

  const account = (temperatureK: number, subject: Reaction = oxidation): Ledger =>
    ledger(subject, { ...at(temperatureK), ...inAir });
  const transitions = (one: Ledger) => one.entries.filter(({ entry }) => entry === "transition");

  test.each([298.15, 500, 1185, 1400, 1700, 1811])("has a ledger that sums at %d K", (temperatureK) => {
    const one = account(temperatureK);
    const largest = Math.max(...one.entries.map(({ value }) => Math.abs(value.value)));
    expect(Math.abs(one.total.value - one.directGibbsEnergy.value)).toBeLessThan(1e-12 * largest);
  });

  test("has an entry for each transition that it passes", () => {
    expect(transitions(account(1185))).toEqual([]);
    expect(transitions(account(1400)).map(({ note, into }) => [note, into])).toEqual([["at 1185 K", "Fe(cr,gamma)"]]);
    const [, second] = transitions(account(1800));
    expect(second).toMatchObject({ note: "at 1667 K", into: "Fe(cr,delta)" });
    // 2 mol, half width 0.1 kJ/mol at 95 per cent; H - T S with S = H / 1667 K.
    expect(second?.value.standardUncertainty).toBeCloseTo(2 * 50 * (1800 / 1667 - 1), 9);
  });

  test("prints within 80 columns", () => {
    const text = `${formatLedger(account(1800))}\n${formatReactionTable(oxidation, { temperatures: [quantity(1800, "K")] })}`;
    expect(Math.max(...text.split("\n").map((line) => line.length))).toBeLessThanOrEqual(80);
    expect(text).toContain("transition at 1667 K  Fe(cr)");
  });

  test("is the same after JSON, to the last bit", () => {
    const copy = through(oxidation);
    expect(standardReactionProperties(copy, at(1500))).toEqual(standardReactionProperties(oxidation, at(1500)));
    expect(account(1500, copy)).toEqual(account(1500));
  });

  test("may stand beside one of its own phases", () => {
    const change = reaction("Fe(cr) = Fe(cr,gamma)", ironData);
    expect(standardReactionGibbsEnergy(change, at(1400)).value).toBe(0);
    expect(standardReactionGibbsEnergy(change, at(1150)).value).not.toBe(0);
  });

  test("of which a phase is wrong names the record", () => {
    const species = ironData.species.map((record) =>
      record.label === "Fe(cr,gamma)" ? { ...record, state: "l" } : record,
    );
    expect(placesOf(() => reaction("2 Fe(cr) + O2 = 2 FeO(cr)", { ...ironData, species } as CollectionData))).toEqual([
      "species/inconsistent at collection.species.1.label",
    ]);
  });
});

describe("the electron in a half-reaction", () => {
  // CODATA Key Values (1989), from memory; kJ/mol and J/mol/K.
  const codata = (label: string, enthalpy: number, entropy: number, halfWidth: number) =>
    recordOf(label, {
      formationEnthalpy: figure(enthalpy, "kJ/mol"),
      standardEntropy: { ...figure(entropy, "J/mol/K"), uncertainty: { halfWidth, coverage: 0.95 } },
    });
  const hydrogen = polynomialRecord("H2(g)", 0, 130.68, [28.8], [0], {
    standardEntropy: { ...figure(130.68, "J/mol/K"), uncertainty: { halfWidth: 0.003, coverage: 0.95 } },
  });
  const data: CollectionData = {
    species: [
      codata("AgCl(cr)", -127.01, 96.25, 0.2),
      codata("Ag(cr)", 0, 42.55, 0.2),
      codata("Ag^+(aq)", 105.79, 73.45, 0.4),
      codata("Cl^-(aq)", -167.08, 56.6, 0.2),
      recordOf("H^+(aq)", { standardEntropy: figure(0, "J/mol/K") }),
      hydrogen,
    ],
  };
  const potential = (equation: string, electrons: number): number =>
    -standardReactionGibbsEnergy(reaction(equation, data), at(298.15)).value / (electrons * 96485.33212);

  test("gives standard potentials: silver and silver chloride", () => {
    // Bates and Bower (1954): 0.22234 V; the accepted potential of silver: 0.7996 V. From memory; tables give 2 mV.
    expect(potential("AgCl(cr) + e^- = Ag(cr) + Cl^-(aq)", 1)).toBeCloseTo(0.22234, 4);
    expect(Math.abs(potential("Ag^+(aq) + e^- = Ag(cr)", 1) - 0.7996)).toBeLessThan(0.002);
  });

  test("is the same as the whole cell against hydrogen", () => {
    expect(potential("2 AgCl(cr) + H2(g) = 2 Ag(cr) + 2 Cl^-(aq) + 2 H^+(aq)", 2)).toBeCloseTo(
      potential("AgCl(cr) + e^- = Ag(cr) + Cl^-(aq)", 1),
      14,
    );
  });

  test("leaves nothing of the hydrogen electrode, and no uncertainty: one datum", () => {
    const electrode = reaction("2 H^+(aq) + 2 e^- = H2(g)", data);
    expect(electrode.equation).toBe("2 H^+(aq) + 2 e^- = H2(g)");
    expect(standardReactionGibbsEnergy(electrode, at(298.15)).value).toBe(0);
    const account = ledger(electrode, {
      ...at(298.15),
      pressure: quantity(1, "bar"),
      gas: { moleFractions: { "H2(g)": 1 } },
      activities: { "H^+(aq)": 1 },
    });
    expect(account.total.value).toBe(0);
    expect(account.subtotals.formation.value.standardUncertainty).toBe(0);
    expect(account.standardStates["e^-"]).toBe("electron of the standard hydrogen electrode");
  });

  test("balances charge", () => {
    expect(placesOf(() => reaction("AgCl(cr) + 2 e^- = Ag(cr) + Cl^-(aq)", data))).toEqual([
      "reaction/unbalanced at equation",
    ]);
  });

  test("is written with a caret", () => {
    const [fault] = faultsOf(() => reaction("Ag^+(aq) + e- = Ag(cr)", data));
    expect(fault).toMatchObject({ code: "species/not-found", hint: "the electron is written e^-" });
    expect(reaction("Ag^+(aq) + e⁻ = Ag(cr)", data).equation).toBe("Ag^+(aq) + e^- = Ag(cr)");
  });

  test("needs H2(g), and survives JSON", () => {
    const without = { species: data.species.filter(({ label }) => label !== "H2(g)") };
    expect(placesOf(() => reaction("Ag^+(aq) + e^- = Ag(cr)", without))).toEqual(["species/not-found at equation"]);
    const silver = reaction("Ag^+(aq) + e^- = Ag(cr)", data);
    expect(standardReactionGibbsEnergy(through(silver), at(298.15))).toEqual(
      standardReactionGibbsEnergy(silver, at(298.15)),
    );
    const wrong = JSON.parse(
      JSON.stringify(silver).replaceAll('"H2(g)"', '"H2(l)"').replaceAll('"state":"g"', '"state":"l"'),
    );
    expect(placesOf(() => standardReactionGibbsEnergy(wrong, at(298.15)))).toContain(
      "species/inconsistent at reaction.terms.1.species",
    );
  });

  test("records of different conventions are not summed", () => {
    const mixed = {
      species: data.species.map((one) => (one.label === "Ag(cr)" ? { ...one, convention: "other" } : one)),
    };
    expect(placesOf(() => reaction("Ag^+(aq) + e^- = Ag(cr)", mixed))).toEqual([
      "species/mixed-conventions at equation",
    ]);
  });
});
