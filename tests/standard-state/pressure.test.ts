import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { gasConstantJPerMolK } from "../../src/constants/constants.js";
import { referenceData } from "../../src/data/index.js";
import { quantity } from "../../src/quantity/quantity.js";
import { reaction } from "../../src/reaction/reaction.js";
import {
  electrodePotentialAtStandardPressure,
  formationEntropyAtStandardPressure,
  formationGasChange,
  formationGibbsEnergyAtStandardPressure,
  gaseousElements,
  idealGasEntropyAtStandardPressure,
  idealGasGibbsEnergyAtStandardPressure,
  lnKAtStandardPressure,
} from "../../src/standard-state/index.js";
import { lnOfRatio } from "../../src/standard-state/ln-of-ratio.js";
import { placesOf } from "../errors/faults-of.js";

const runs = { seed: 20261201, numRuns: 1000 };
const eps = Number.EPSILON;
const pascal = (value: number) => ({ value, unit: "Pa" }) as const;
const kelvin = (value: number) => ({ value, unit: "K" }) as const;
/** Pressures over forty orders of magnitude. */
const pressures = fc.double({ min: -46, max: 46, noNaN: true }).map(Math.exp);
const temperatures = fc.double({ min: 1, max: 6000, noNaN: true });
const energies = fc.double({ min: -1e6, max: 1e6, noNaN: true });
/** Gas, condensed, dissolved, ion, element and electron, with their changes of gas by hand. */
const changes = [
  ["H2O(l)", -1.5],
  ["H2O(g)", -0.5],
  ["CO2(g)", 0],
  ["CO(g)", 0.5],
  ["N2O4(g)", -2],
  ["C(cr,graphite)", 0],
  ["H2(g)", 0],
  ["O(g)", 0.5],
  ["O3(g)", -0.5],
  ["He(g)", 0],
  ["Br2(l)", 0],
  ["Br2(g)", 1],
  ["I(g)", 1],
  ["Hg(g)", 1],
  ["HBr(g)", 0.5],
  ["NaCl(cr)", -0.5],
  ["XeF6(cr)", -4],
  ["CuSO4·5H2O(cr)", -9.5],
  ["Fe0.947O(cr)", -0.5],
  ["D2O(l)", -1.5],
  ["H^+(aq)", 0],
  ["Cl^-(aq)", -1],
  ["OH^-(aq)", -1.5],
  ["SO4^2-(aq)", -3],
  ["NH4^+(aq)", -2],
  ["Fe^3+(aq)", 1.5],
  ["CO2(aq)", -1],
  ["Na^+(g)", 1.5],
  ["Cl^-(g)", 0],
] as const;
const changeOf = fc.constantFrom(...changes);

describe("gas formed from the elements", () => {
  test.each(changes)("%s: %d", (label, expected) => {
    expect(formationGasChange(label)).toBe(expected);
  });

  test("a record counts as its label does", () => {
    for (const record of referenceData.species) {
      expect(formationGasChange(record)).toBe(formationGasChange(record.label));
    }
  });

  test("other elements may be gases, and electrons a gas", () => {
    expect(formationGasChange("HBr(g)", { gaseousElements: { ...gaseousElements, Br: 2 } })).toBe(0);
    expect(formationGasChange("SO2(g)", { gaseousElements: { ...gaseousElements, S: 2 } })).toBe(-0.5);
    expect(formationGasChange("H2O(l)", { gaseousElements: {} })).toBe(0);
    expect(formationGasChange("Na^+(g)", { electron: "gas" })).toBe(2);
    expect(formationGasChange("Cl^-(g)", { electron: "gas" })).toBe(-0.5);
    expect(formationGasChange("e^-(g)", { electron: "gas" })).toBe(0);
  });

  test("wrong input is refused", () => {
    expect(placesOf(() => formationGasChange("H2O"))).toEqual(["standard-state/no-state at species"]);
    expect(placesOf(() => formationGasChange("Xq(g)"))).toEqual(["formula/unknown-element at species"]);
    expect(placesOf(() => formationGasChange("H2O(l)", { gaseousElements: { O: 0, H: 1.5 } }))).toEqual([
      "standard-state/invalid-molecule at convention.gaseousElements.O",
      "standard-state/invalid-molecule at convention.gaseousElements.H",
    ]);
    expect(placesOf(() => formationGasChange("H2O(l)", { electron: "proton" as "gas" }))).toEqual([
      "input/unknown-option at convention.electron",
    ]);
  });
});

describe("an ideal gas", () => {
  test("the entropy is additive over pressures: one step is two steps", () => {
    fc.assert(
      fc.property(energies, pressures, pressures, pressures, (value, p, q, r) => {
        const step = (entropy: number, from: number, to: number): number =>
          idealGasEntropyAtStandardPressure({ value: entropy, unit: "J/mol/K" }, { from: pascal(from), to: pascal(to) })
            .value;
        // Two eps a step of |S| + R |ln|, S itself moved on the way; |ln| is below 92.
        const scale = Math.abs(value) + 4 * gasConstantJPerMolK * 92;
        expect(Math.abs(step(step(value, p, q), q, r) - step(value, p, r))).toBeLessThanOrEqual(6 * eps * scale);
        expect(step(value, p, p)).toBe(value + 0);
      }),
      runs,
    );
  });

  test("dG/dT = -S, and the entropy moves by -(change of G)/T", () => {
    fc.assert(
      fc.property(temperatures, pressures, pressures, (temperatureK, from, to) => {
        const change = { from: pascal(from), to: pascal(to) };
        const entropy = idealGasEntropyAtStandardPressure(quantity(0, "J/mol/K"), change).value;
        const energy = idealGasGibbsEnergyAtStandardPressure(quantity(0, "J/mol"), {
          ...change,
          temperature: kelvin(temperatureK),
        }).value;
        expect(Math.abs(energy + temperatureK * entropy)).toBeLessThanOrEqual(2 * eps * Math.abs(energy));
      }),
      runs,
    );
  });

  test("the Gibbs energy is additive over pressures", () => {
    fc.assert(
      fc.property(energies, temperatures, pressures, pressures, pressures, (value, temperatureK, p, q, r) => {
        const step = (energy: number, from: number, to: number): number =>
          idealGasGibbsEnergyAtStandardPressure(
            { value: energy, unit: "J/mol" },
            { temperature: kelvin(temperatureK), from: pascal(from), to: pascal(to) },
          ).value;
        const scale = Math.abs(value) + 4 * gasConstantJPerMolK * temperatureK * 92;
        expect(Math.abs(step(step(value, p, q), q, r) - step(value, p, r))).toBeLessThanOrEqual(8 * eps * scale);
      }),
      runs,
    );
  });

  test("the uncertainty is kept, in the unit of the result", () => {
    const change = { from: quantity(1, "atm"), to: quantity(1, "bar") };
    const given = quantity(45.77, "cal_th/mol/K", { standardUncertainty: 0.005 });
    const atOneBar = idealGasEntropyAtStandardPressure(given, change);
    expect(atOneBar.standardUncertainty).toBeCloseTo(0.02092, 15);
    expect(Object.keys(idealGasEntropyAtStandardPressure(quantity(1, "J/mol/K"), change))).toEqual(["value", "unit"]);
  });
});

describe("formation", () => {
  test("the Gibbs energy moves by RT ln for each mole of gas formed, and is additive over pressures", () => {
    fc.assert(
      fc.property(changeOf, energies, temperatures, pressures, pressures, pressures, (change, value, T, p, q, r) => {
        const [label, moles] = change;
        const step = (energy: number, from: number, to: number): number =>
          formationGibbsEnergyAtStandardPressure({ value: energy, unit: "J/mol" }, label, {
            temperature: kelvin(T),
            from: pascal(from),
            to: pascal(to),
          }).value;
        const scale = Math.abs(value) + 4 * Math.abs(moles) * gasConstantJPerMolK * T * 92;
        expect(Math.abs(step(step(value, p, q), q, r) - step(value, p, r))).toBeLessThanOrEqual(8 * eps * scale);
        const expected = value + moles * gasConstantJPerMolK * T * Math.log(q / p);
        // The logarithm of the ratio formed here has an error of eps beside 1.
        expect(Math.abs(step(value, p, q) - expected)).toBeLessThanOrEqual(8 * eps * scale);
      }),
      runs,
    );
  });

  test("the entropy of formation moves by -(change of G)/T", () => {
    fc.assert(
      fc.property(changeOf, temperatures, pressures, pressures, ([label], T, from, to) => {
        const change = { from: pascal(from), to: pascal(to) };
        const entropy = formationEntropyAtStandardPressure(quantity(0, "J/mol/K"), label, change).value;
        const energy = formationGibbsEnergyAtStandardPressure(quantity(0, "J/mol"), label, {
          ...change,
          temperature: kelvin(T),
        }).value;
        expect(Math.abs(energy + T * entropy)).toBeLessThanOrEqual(4 * eps * Math.abs(energy));
      }),
      runs,
    );
  });

  test("sums over a balanced reaction leave the gases of the reaction: the elements cancel", () => {
    const equations = ["H2O(l) = H2O(g)", "CaCO3(s) = CaO(s) + CO2", "CH4 + H2O(g) = CO + 3 H2", "C(s) + CO2 = 2 CO"];
    for (const equation of equations) {
      const { terms } = reaction(equation, referenceData);
      const formed = terms.reduce((sum, { coefficient, label }) => sum + coefficient * formationGasChange(label), 0);
      const gas = terms.reduce((sum, { coefficient, label }) => sum + (label.endsWith("(g)") ? coefficient : 0), 0);
      expect(formed).toBe(gas);
    }
    // H2O(l) = H^+ + OH^-, AgCl(cr) = Ag^+ + Cl^-: no gas, and the hydrogen of the ions cancels too.
    const changeIn = (labels: readonly string[]) => labels.reduce((sum, label) => sum + formationGasChange(label), 0);
    expect(changeIn(["H^+(aq)", "OH^-(aq)"])).toBe(changeIn(["H2O(l)"]));
    expect(changeIn(["Ag^+(aq)", "Cl^-(aq)"])).toBe(changeIn(["AgCl(cr)"]));
  });

  test("the volume work of water between 1 atm and 1 bar is -0.0239 J/mol", () => {
    const change = { temperature: quantity(298.15, "K"), from: quantity(1, "atm"), to: quantity(1, "bar") } as const;
    const value = quantity(-237178.4, "J/mol");
    const without = formationGibbsEnergyAtStandardPressure(value, "H2O(l)", change).value;
    const molarVolume = quantity(18.07, "cm3/mol");
    const within = formationGibbsEnergyAtStandardPressure(value, "H2O(l)", { ...change, molarVolume }).value;
    expect(within - without).toBeCloseTo(18.07e-6 * -1325, 9);
  });

  test("every fault of a call is reported together", () => {
    const call = () =>
      formationGibbsEnergyAtStandardPressure({ value: Number.NaN, unit: "J/mol" }, "H2O(g)", {
        temperature: quantity(0, "K"),
        from: quantity(0, "bar"),
        to: quantity(300, "K") as never,
        molarVolume: quantity(1, "cm3/mol"),
        electron: "no" as never,
        unknown: 1,
      } as never);
    expect(placesOf(call)).toEqual([
      "quantity/not-finite at gibbsEnergy.value",
      "input/unknown-key at unknown",
      "quantity/not-positive at temperature.value",
      "quantity/not-positive at from.value",
      "quantity/wrong-dimension at to.unit",
      "input/unknown-option at electron",
      "standard-state/volume-of-gas at molarVolume",
    ]);
  });
});

describe("equilibrium constants", () => {
  const numbers = { "N2(g)": -1, "H2(g)": -3, "NH3(g)": 2 };

  test("ln K moves by -nu ln(to / from), is additive over pressures and agrees with the Gibbs energies", () => {
    fc.assert(
      fc.property(energies, temperatures, pressures, pressures, pressures, (value, T, p, q, r) => {
        const lnK = value / 1e4;
        const step = (start: number, from: number, to: number): number =>
          lnKAtStandardPressure(start, numbers, { from: pascal(from), to: pascal(to) });
        const scale = Math.abs(lnK) + 8 * 92;
        expect(Math.abs(step(step(lnK, p, q), q, r) - step(lnK, p, r))).toBeLessThanOrEqual(6 * eps * scale);
        const energy = (moles: number): number =>
          moles *
          idealGasGibbsEnergyAtStandardPressure(quantity(0, "J/mol"), {
            temperature: kelvin(T),
            from: pascal(p),
            to: pascal(q),
          }).value;
        const ofEnergies = -(energy(-1) + energy(-3) + energy(2)) / (gasConstantJPerMolK * T);
        expect(Math.abs(step(0, p, q) - ofEnergies)).toBeLessThanOrEqual(8 * eps * 6 * 92);
      }),
      runs,
    );
  });

  test("a reaction is read as its numbers are; the order and the direction of a sum show in no bit", () => {
    const change = { from: quantity(1, "atm"), to: quantity(1, "bar") };
    const synthesis = reaction("N2 + 3 H2 = 2 NH3", referenceData);
    const expected = lnKAtStandardPressure(0, numbers, change);
    expect(lnKAtStandardPressure(0, synthesis, change)).toBe(expected);
    expect(lnKAtStandardPressure(0, { "NH3(g)": 2, "H2(g)": -3, "N2(g)": -1 }, change)).toBe(expected);
    expect(lnKAtStandardPressure(0, { "N2(g)": 1, "H2(g)": 3, "NH3(g)": -2 }, change)).toBe(-expected);
    expect(expected).toBeCloseTo(2 * Math.log(1 / 1.01325), 15);
  });

  test("condensed and dissolved species do not count; an electron counts as half a mole of hydrogen", () => {
    const change = { from: quantity(1, "bar"), to: quantity(10, "bar") };
    expect(lnKAtStandardPressure(3, { "AgCl(cr)": -1, "Ag^+(aq)": 1, "Cl^-(aq)": 1 }, change)).toBe(3);
    const half = lnKAtStandardPressure(0, { "Ag^+(aq)": -1, "e^-": -1, "Ag(cr)": 1 }, change);
    const whole = lnKAtStandardPressure(0, { "Ag^+(aq)": -1, "H2(g)": -0.5, "Ag(cr)": 1, "H^+(aq)": 1 }, change);
    expect(half).toBe(whole);
    expect(half).toBeCloseTo(0.5 * Math.log(10), 15);
  });

  test("wrong input is refused, all faults together", () => {
    const change = { from: quantity(1, "atm"), to: quantity(1, "bar") };
    expect(placesOf(() => lnKAtStandardPressure(Number.NaN, { H2O: 1, "N2(g)": Number.NaN }, change))).toEqual([
      "input/not-finite at lnK",
      "standard-state/no-state at stoichiometry.H2O",
      "input/not-finite at stoichiometry.N2(g)",
    ]);
    expect(placesOf(() => lnKAtStandardPressure(0, {}, change))).toEqual(["input/missing at stoichiometry"]);
    expect(placesOf(() => lnKAtStandardPressure(0, { terms: [{ label: "N2(g)" }] as never }, change))).toEqual([
      "input/missing at stoichiometry.terms.0.coefficient",
    ]);
    const far = { from: quantity(1, "Pa"), to: quantity(1e300, "Pa") };
    expect(placesOf(() => lnKAtStandardPressure(0, { "N2(g)": -1.7e308 }, far))).toEqual(["quantity/overflow at lnK"]);
  });
});

describe("electrode potentials", () => {
  const change = { temperature: quantity(298.15, "K"), from: quantity(1, "atm"), to: quantity(1, "bar") } as const;
  const shiftOf = (numbers: Readonly<Record<string, number>>): number =>
    electrodePotentialAtStandardPressure(quantity(0, "V"), numbers, change).value * 1000;
  /** RT/F ln(1.01325) at 298.15 K in mV. */
  const unit = 0.338191;

  test.each([
    ["silver", { "Ag^+(aq)": -1, "e^-": -1, "Ag(cr)": 1 }, -unit / 2],
    ["zinc, two electrons", { "Zn^2+(aq)": -1, "e^-": -2, "Zn(cr)": 1 }, -unit / 2],
    ["hydrogen", { "H^+(aq)": -2, "e^-": -2, "H2(g)": 1 }, 0],
    ["chlorine", { "Cl2(g)": -1, "e^-": -2, "Cl^-(aq)": 2 }, -unit],
    ["oxygen", { "O2(g)": -1, "H^+(aq)": -4, "e^-": -4, "H2O(l)": 2 }, -0.75 * unit],
    ["oxygen, written once with half of it", { "O2(g)": -0.5, "H^+(aq)": -2, "e^-": -2, "H2O(l)": 1 }, -0.75 * unit],
    ["silver, reversed", { "Ag^+(aq)": 1, "e^-": 1, "Ag(cr)": -1 }, -unit / 2],
  ])("%s", (_name, numbers, expected) => {
    expect(shiftOf(numbers)).toBeCloseTo(expected, 5);
  });

  test("it is ln K of the half-reaction times RT/nF", () => {
    fc.assert(
      fc.property(temperatures, pressures, pressures, fc.integer({ min: 1, max: 8 }), (T, from, to, electrons) => {
        const numbers = { "O2(g)": -0.25 * electrons, "e^-": -electrons, "O^2-(aq)": 0.5 * electrons };
        const step = { from: pascal(from), to: pascal(to) };
        const lnK = lnKAtStandardPressure(0, numbers, step);
        const { value } = electrodePotentialAtStandardPressure(quantity(0, "V"), numbers, {
          ...step,
          temperature: kelvin(T),
        });
        const expected = (gasConstantJPerMolK * T * lnK) / (electrons * 96485.33212331001);
        expect(Math.abs(value - expected)).toBeLessThanOrEqual(6 * eps * Math.abs(expected));
      }),
      runs,
    );
  });

  test("a reaction without electrons is no half-reaction", () => {
    expect(placesOf(() => shiftOf({ "H2O(l)": -1, "H2O(g)": 1 }))).toEqual([
      "standard-state/no-electrons at halfReaction",
    ]);
  });
});

test("ln of a ratio keeps its digits near 1 and does not overflow", () => {
  // 1 + 2^-40 against ln(1 + x) = x - x^2/2 + ...
  expect(lnOfRatio(1 + 2 ** -40, 1)).toBe(2 ** -40 - 2 ** -81);
  expect(lnOfRatio(1e308, 1e-308)).toBeCloseTo(616 * Math.LN10, 12);
  expect(lnOfRatio(5e-324, 1.7e308)).toBeCloseTo(
    -1074 * Math.LN2 - 1023 * Math.LN2 - Math.log(1.7e308 / 2 ** 1023),
    12,
  );
  fc.assert(
    fc.property(pressures, pressures, (a, b) => {
      const [there, back] = [lnOfRatio(a, b), lnOfRatio(b, a)];
      expect(Math.abs(there + back)).toBeLessThanOrEqual(2 * eps * Math.max(1, Math.abs(there)));
      expect(Object.is(lnOfRatio(a, a), 0)).toBe(true);
    }),
    runs,
  );
});
