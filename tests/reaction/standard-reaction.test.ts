import { describe, expect, test } from "vitest";
import { referenceData } from "../../src/data/reference-data.js";
import {
  equilibriumConstant,
  reaction,
  standardReactionGibbsEnergy,
  standardReactionProperties,
  standardReactionRoundingBound,
} from "../../src/reaction/index.js";
import { faultsOf, placesOf } from "../errors/faults-of.js";
import { figure } from "../heat-capacity/random-series.js";
import { collectionOf, fitted, polynomialRecord, recordOf } from "../species/records.js";

const kelvin = (value: number) => ({ temperature: { value, unit: "K" } }) as const;
const synthesis = reaction("N2 + 3 H2 = 2 NH3", referenceData);

test("one call gives all standard properties, which agree with each other", () => {
  const properties = standardReactionProperties(synthesis, kelvin(700));
  expect(properties.gibbsEnergy).toEqual(standardReactionGibbsEnergy(synthesis, kelvin(700)));
  expect(properties.lnK).toBeCloseTo(-properties.gibbsEnergy.value / (8.31446261815324 * 700), 14);
  expect(properties.log10K).toBeCloseTo(properties.lnK / Math.LN10, 14);
  expect(properties.gibbsEnergy.value).toBeCloseTo(properties.enthalpy.value - 700 * properties.entropy.value, 8);
  expect(properties.standardStates).toEqual({
    "N2(g)": "ideal gas at 1 bar",
    "H2(g)": "ideal gas at 1 bar",
    "NH3(g)": "ideal gas at 1 bar",
  });
  expect(properties.outsideRange).toEqual([]);
  expect(equilibriumConstant(synthesis, kelvin(700))).toBeCloseTo(Math.exp(properties.lnK), 15);
});

test("log10 K of known equilibria, from the JANAF tables (Chase 1998), recalled from memory", () => {
  const log10K = (text: string, temperatureK: number): number =>
    standardReactionProperties(reaction(text, referenceData), kelvin(temperatureK)).log10K;
  // log Kf printed to 3 decimals: NH3 at 700 K -2.024, H2O(g) at 1000 K 10.062, CO2 at 1000 K 20.680, CO at 1000 K 10.459.
  // The reference data are of other compilations; their formation enthalpies differ by up to 0.1 kJ/mol, 0.005 in log10 K.
  expect(Math.abs(log10K("½ N2 + 1½ H2 = NH3", 700) + 2.024)).toBeLessThan(0.01);
  expect(Math.abs(log10K("H2 + ½ O2 = H2O(g)", 1000) - 10.062)).toBeLessThan(0.01);
  expect(Math.abs(log10K("C(s) + O2 = CO2", 1000) - 20.68)).toBeLessThan(0.01);
  expect(Math.abs(log10K("C(s) + ½ O2 = CO", 1000) - 10.459)).toBeLessThan(0.01);
});

describe("large constants", () => {
  // 20 mol of methane burnt at 200 K: G is about -801 kJ/mol each, ln K about 20 x 801000 / (8.314 x 200) = 9600.
  const combustion = reaction("20 CH4 + 40 O2 = 20 CO2 + 40 H2O(g)", referenceData);

  test("their logarithms are plain numbers, K itself is refused", () => {
    const { lnK, log10K } = standardReactionProperties(combustion, kelvin(200));
    expect(lnK).toBeGreaterThan(9000);
    expect(log10K).toBeCloseTo(lnK / Math.LN10, 9);
    const [fault] = faultsOf(() => equilibriumConstant(combustion, kelvin(200)));
    expect(fault).toMatchObject({ code: "reaction/constant-out-of-range", received: `ln K = ${lnK}` });
    expect(fault?.hint).toContain("log10K");
  });

  test("ln K of 2100", () => {
    const change = reaction(
      "W(cr) = W(l)",
      collectionOf(
        polynomialRecord("W(cr)", 2100 * 8.31446261815324 * 200, 0, [0]),
        polynomialRecord("W(l)", 0, 0, [0]),
      ),
    );
    expect(standardReactionProperties(change, kelvin(200)).lnK).toBeCloseTo(2100, 10);
    expect(placesOf(() => equilibriumConstant(change, kelvin(200)))).toEqual(["reaction/constant-out-of-range at "]);
  });

  test.each([
    [709.78, true],
    [709.79, false],
    [-708.39, true],
    [-708.4, false],
  ])("ln K of %d: a double holds K, %s", (lnK, isHeld) => {
    const enthalpy = -lnK * 8.31446261815324 * 298.15;
    const change = reaction(
      "W(cr) = W(l)",
      collectionOf(polynomialRecord("W(cr)", 0, 0, [0]), polynomialRecord("W(l)", enthalpy, 0, [0])),
    );
    const call = () => equilibriumConstant(change, kelvin(298.15));
    if (isHeld) expect(Math.log(call())).toBeCloseTo(lnK, 9);
    else expect(placesOf(call)).toEqual(["reaction/constant-out-of-range at "]);
  });
});

describe("ranges", () => {
  const calcination = reaction("CaCO3(s) = CaO(s) + CO2", referenceData);

  test("each species that is left is named", () => {
    const faults = faultsOf(() => standardReactionProperties(calcination, kelvin(1500)));
    expect(faults.map(({ code, path, message }) => [code, path, message])).toEqual([
      ["species/outside-range", ["temperature"], "CaCO3(cr,calcite) is known from 298.15 K to 1200 K, not at 1500 K"],
    ]);
    expect(placesOf(() => standardReactionGibbsEnergy(calcination, kelvin(100)))).toHaveLength(3);
  });

  test.each(["constant-heat-capacity", "continue-fit"] as const)("%s goes on and lists the labels", (outsideRange) => {
    const properties = standardReactionProperties(calcination, { ...kelvin(1500), outsideRange });
    expect(properties.outsideRange).toEqual(["CaCO3(cr,calcite)"]);
    expect(Number.isFinite(properties.gibbsEnergy.value)).toBe(true);
    expect(placesOf(() => standardReactionProperties(calcination, { ...kelvin(1e6), outsideRange }))).toHaveLength(3);
  });

  test("ranges that do not meet", () => {
    const low = fitted({
      kind: "series",
      form: "seven-coefficient",
      gasConstant: 8.3145,
      intervals: [{ from: 100, to: 500, coefficients: [3, 0, 0, 0, 0, 0, 0], endsAt: "fit" }],
    });
    const high = fitted({
      kind: "series",
      form: "seven-coefficient",
      gasConstant: 8.3145,
      intervals: [{ from: 600, to: 900, coefficients: [3, 0, 0, 0, 0, 0, 0], endsAt: "fit" }],
    });
    const change = reaction(
      "W(cr) = W(l)",
      collectionOf(recordOf("W(cr)", { gibbsFunction: low }), recordOf("W(l)", { gibbsFunction: high })),
    );
    const [fault] = faultsOf(() => standardReactionGibbsEnergy(change, kelvin(550)));
    expect(fault).toMatchObject({ code: "reaction/no-common-range", path: ["reaction"] });
    expect(fault?.message).toContain("W(cr) 100 K to 500 K, W(l) 600 K to 900 K");
    const outsideRange = "constant-heat-capacity";
    expect(standardReactionProperties(change, { ...kelvin(550), outsideRange }).outsideRange).toEqual([
      "W(cr)",
      "W(l)",
    ]);
  });

  test("ranges that share one point are known there", () => {
    const part = (from: number, to: number) =>
      fitted({
        kind: "series",
        form: "seven-coefficient",
        gasConstant: 8.3145,
        intervals: [{ from, to, coefficients: [3, 0, 0, 0, 0, 0, 0], endsAt: "fit" }],
      });
    const change = reaction(
      "W(cr) = W(l)",
      collectionOf(
        recordOf("W(cr)", { gibbsFunction: part(100, 500) }),
        recordOf("W(l)", { gibbsFunction: part(500, 900) }),
      ),
    );
    expect(standardReactionGibbsEnergy(change, kelvin(500)).value).toBe(0);
    expect(placesOf(() => standardReactionGibbsEnergy(change, kelvin(500.1)))).toEqual([
      "species/outside-range at temperature",
    ]);
  });

  test("with a reference point: at 298.15 K, without a heat capacity", () => {
    const data = collectionOf(
      recordOf("Ag^+(aq)", { formationEnthalpy: figure(105.79, "kJ/mol"), standardEntropy: figure(73.45, "J/mol/K") }),
      recordOf("Cl^-(aq)", { formationEnthalpy: figure(-167.08, "kJ/mol"), standardEntropy: figure(56.6, "J/mol/K") }),
      polynomialRecord("AgCl(cr)", -127010, 96.25, [50]),
    );
    const dissolution = reaction("AgCl(cr) = Ag^+(aq) + Cl^-(aq)", data);
    const properties = standardReactionProperties(dissolution, kelvin(298.15));
    expect(properties).not.toHaveProperty("heatCapacity");
    // CODATA Key Values (Cox 1989), from memory: H = 65.72 kJ/mol, S = 33.8 J/mol/K; textbooks print pK = 9.75.
    expect(properties.enthalpy.value).toBeCloseTo(65720, 8);
    expect(properties.entropy.value).toBeCloseTo(33.8, 10);
    expect(properties.log10K).toBeCloseTo(-9.75, 2);
    expect(properties.standardStates).toEqual({
      "AgCl(cr)": "pure phase at 1 bar",
      "Ag^+(aq)": "ideal solution of 1 mol/kg at 1 bar",
      "Cl^-(aq)": "ideal solution of 1 mol/kg at 1 bar",
    });
    expect(placesOf(() => standardReactionProperties(dissolution, kelvin(310)))).toEqual([
      "species/outside-range at temperature",
      "species/outside-range at temperature",
    ]);
  });
});

test("the rounding bound is positive and small, for each property", () => {
  for (const property of ["heatCapacity", "enthalpy", "entropy", "gibbsEnergy"] as const) {
    const bound = standardReactionRoundingBound(synthesis, property, kelvin(700));
    expect(bound).toBeGreaterThan(0);
    expect(bound).toBeLessThan(1e-8);
  }
  expect(placesOf(() => standardReactionRoundingBound(synthesis, "gibbsEnergy", kelvin(7)))).toHaveLength(3);
});

test("a pair of equal phases gives plain zeros", () => {
  const change = reaction(
    "W(cr) = W(l)",
    collectionOf(polynomialRecord("W(cr)", 5, 7, [20, 0.1]), polynomialRecord("W(l)", 5, 7, [20, 0.1])),
  );
  const properties = standardReactionProperties(change, kelvin(777));
  for (const value of [
    properties.heatCapacity?.value,
    properties.enthalpy.value,
    properties.entropy.value,
    properties.gibbsEnergy.value,
    properties.lnK,
    properties.log10K,
  ]) {
    expect(value).toBe(0);
  }
});
