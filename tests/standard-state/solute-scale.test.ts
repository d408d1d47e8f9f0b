import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { gasConstantJPerMolK } from "../../src/constants/constants.js";
import { quantity } from "../../src/quantity/quantity.js";
import {
  lnKOnScale,
  type SoluteScale,
  solutionComposition,
  standardGibbsEnergyOnScale,
} from "../../src/standard-state/index.js";
import { placesOf } from "../errors/faults-of.js";

const eps = Number.EPSILON;
const scales: readonly SoluteScale[] = ["molality", "concentration", "mole-fraction"];
const solvents = fc.record({
  molarMass: fc.double({ min: 2, max: 400, noNaN: true }).map((value) => ({ value, unit: "g/mol" }) as const),
  density: fc.double({ min: 0.5, max: 3, noNaN: true }).map((value) => ({ value, unit: "g/cm3" }) as const),
});
const temperatures = fc.double({ min: 200, max: 600, noNaN: true });
const scale = fc.constantFrom(...scales);
const runs = { seed: 20261211, numRuns: 500 };
const water = { molarMass: quantity(18.015, "g/mol"), density: quantity(0.997045, "g/cm3") };

test("in water G(x) is 9.957 kJ/mol and G(c) 0.0073 kJ/mol above G(m) at 298.15 K", () => {
  const shift = (to: SoluteScale): number =>
    standardGibbsEnergyOnScale(quantity(0, "J/mol"), {
      temperature: quantity(298.15, "K"),
      from: "molality",
      to,
      solvent: water,
    }).value;
  expect(shift("mole-fraction")).toBeCloseTo(8.31446261815324 * 298.15 * Math.log(1 / 0.018015), 8);
  expect(shift("concentration")).toBeCloseTo(8.31446261815324 * 298.15 * Math.log(1 / 0.997045), 8);
  expect(shift("molality")).toBe(0);
});

test("every way between two scales is the same, and back gives what was", () => {
  fc.assert(
    fc.property(scale, scale, scale, solvents, temperatures, (a, b, c, solvent, temperatureK) => {
      const temperature = { value: temperatureK, unit: "K" } as const;
      const step = (value: number, from: SoluteScale, to: SoluteScale): number =>
        standardGibbsEnergyOnScale({ value, unit: "J/mol" }, { temperature, from, to, solvent }).value;
      // |ln| is below 7, so that all numbers on the way are below 1e4 + 2 * 35e3 J/mol.
      expect(Math.abs(step(step(1e4, a, b), b, c) - step(1e4, a, c))).toBeLessThanOrEqual(8 * eps * 8e4);
      expect(Math.abs(step(step(1e4, a, b), b, a) - 1e4)).toBeLessThanOrEqual(8 * eps * 8e4);
    }),
    runs,
  );
});

test("ln K follows from the Gibbs energies of the solutes", () => {
  const numbers = { "CaCO3(cr,calcite)": -1, "CO2(g)": -1, "H2O(l)": -1, "Ca^2+(aq)": 1, "HCO3^-(aq)": 2 };
  fc.assert(
    fc.property(scale, scale, solvents, temperatures, (from, to, solvent, temperatureK) => {
      const temperature = { value: temperatureK, unit: "K" } as const;
      const { value } = standardGibbsEnergyOnScale(quantity(0, "J/mol"), { temperature, from, to, solvent });
      const expected = 12.5 - (3 * value) / (gasConstantJPerMolK * temperatureK);
      expect(Math.abs(lnKOnScale(12.5, numbers, { from, to, solvent }) - expected)).toBeLessThanOrEqual(8 * eps * 40);
    }),
    runs,
  );
});

test("the standard states agree with compositions at infinite dilution: mu is the same on every scale", () => {
  // 1e-9 mol/kg: sums of amounts and densities differ from those of the pure solvent by 1e-9 at most.
  const { concentrations, moleFractions } = solutionComposition({
    solvent: "H2O(l)",
    molalities: { "NH3(aq)": quantity(1e-9, "mol/kg") },
    density: water.density,
  });
  const amounts = {
    molality: 1e-9,
    concentration: concentrations!["NH3(aq)"]!.value / 1000,
    "mole-fraction": moleFractions["NH3(aq)"]!,
  } as const;
  const potentials = scales.map((to) => {
    const change = { temperature: quantity(298.15, "K"), from: "molality", to, solvent: water } as const;
    const standard = standardGibbsEnergyOnScale(quantity(-26500, "J/mol"), change).value;
    return standard + gasConstantJPerMolK * 298.15 * Math.log(amounts[to]);
  });
  for (const potential of potentials) expect(Math.abs(potential - potentials[0]!)).toBeLessThan(2479 * 2e-9);
});

test("the electron of a half-reaction takes the place of H^+(aq)", () => {
  const change = { from: "molality", to: "mole-fraction", solvent: water } as const;
  const half = lnKOnScale(1, { "Fe^3+(aq)": -1, "e^-": -1, "Fe^2+(aq)": 1 }, change);
  const whole = lnKOnScale(1, { "Fe^3+(aq)": -1, "H2(g)": -0.5, "Fe^2+(aq)": 1, "H^+(aq)": 1 }, change);
  expect(half).toBe(whole);
});

describe("wrong input", () => {
  const change = { temperature: quantity(298.15, "K"), from: "molality", to: "concentration" } as const;
  const energy = quantity(0, "J/mol");

  test("what a scale needs of the solvent is asked for, and nothing else", () => {
    expect(placesOf(() => standardGibbsEnergyOnScale(energy, { ...change, solvent: {} }))).toEqual([
      "input/missing at solvent.density",
    ]);
    expect(
      placesOf(() => standardGibbsEnergyOnScale(energy, { ...change, from: "mole-fraction", solvent: {} })),
    ).toEqual(["input/missing at solvent.molarMass", "input/missing at solvent.density"]);
    expect(standardGibbsEnergyOnScale(energy, { ...change, to: "molality", solvent: {} }).value).toBe(0);
  });

  test("all faults are reported together", () => {
    const call = () =>
      lnKOnScale(Number.POSITIVE_INFINITY, { "NH3(aq)": 1, NH3: -1 }, {
        from: "molarity",
        to: "molality",
        solvent: { molarMass: quantity(0, "g/mol"), density: quantity(1, "bar") },
        temperature: quantity(300, "K"),
      } as never);
    expect(placesOf(call)).toEqual([
      "input/not-finite at lnK",
      "standard-state/no-state at stoichiometry.NH3",
      "input/unknown-key at temperature",
      "input/unknown-option at from",
      "quantity/not-positive at solvent.molarMass.value",
      "quantity/wrong-dimension at solvent.density.unit",
    ]);
  });
});
