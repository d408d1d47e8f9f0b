import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { referenceData } from "../../src/data/reference-data.js";
import {
  type Reaction,
  reaction,
  reactionGibbsEnergy,
  standardReactionGibbsEnergy,
  type TemperatureSearch,
  temperaturesAtGibbsEnergy,
} from "../../src/reaction/index.js";
import { placesOf } from "../errors/faults-of.js";
import { collectionOf, polynomialRecord, recordOf } from "../species/records.js";

const kelvin = (value: number) => ({ value, unit: "K" }) as const;
const between = (from: number, to: number): TemperatureSearch => ({ between: [kelvin(from), kelvin(to)] });
const valuesOf = (subject: Reaction, search: TemperatureSearch): number[] =>
  temperaturesAtGibbsEnergy(subject, search).map(({ value }) => value);

/**
 * A change of phase whose Gibbs energy is a given polynomial of T: Cp = -T G", and at 298.15 K S = -G' and H = G + T S.
 */
function changeWith(coefficients: readonly number[]): Reaction {
  const at = (terms: readonly number[]): number => terms.reduceRight((sum, value) => sum * 298.15 + value, 0);
  const derivative = (terms: readonly number[]): number[] => terms.slice(1).map((value, index) => value * (index + 1));
  const first = derivative(coefficients);
  const entropy = -at(first);
  const enthalpy = at(coefficients) + 298.15 * entropy;
  const heatCapacity = [0, ...derivative(first).map((value) => -value)];
  return reaction(
    "W(cr) = W(l)",
    collectionOf(polynomialRecord("W(cr)", 0, 0, [0]), polynomialRecord("W(l)", enthalpy, entropy, heatCapacity)),
  );
}

/** Coefficients of factor (T - r1)(T - r2)... */
function withRoots(factor: number, ...roots: number[]): number[] {
  let terms = [factor];
  for (const root of roots) terms = [0, ...terms].map((value, index) => value - root * (terms[index] ?? 0));
  return terms;
}

describe("roots of known Gibbs energies", () => {
  test.each<[string, number[], number[]]>([
    ["none", [1000, 1], []],
    ["one", withRoots(-20, 700), [700]],
    ["two", withRoots(0.01, 500, 1500), [500, 1500]],
    ["three", withRoots(1e-5, 400, 900, 2500), [400, 900, 2500]],
    ["four", withRoots(1e-8, 300, 700, 1100, 2900), [300, 700, 1100, 2900]],
    ["a pair 2 K apart", withRoots(0.01, 1000, 1002), [1000, 1002]],
    ["a pair near the lower end", withRoots(0.01, 205, 206), [205, 206]],
    ["a pair near the upper end", withRoots(0.01, 2996, 2997), [2996, 2997]],
    ["a pair that just misses", [0.01 * 1e6 + 1e-3, -20, 0.01], []],
  ])("%s", (_name, coefficients, roots) => {
    const found = valuesOf(changeWith(coefficients), between(200, 3000));
    expect(found).toHaveLength(roots.length);
    roots.forEach((root, index) => {
      expect(found[index]).toBeCloseTo(root, 7);
    });
  });

  test("pairs however near are found anywhere", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 201.5, max: 2998.5, noNaN: true }),
        fc.double({ min: -3, max: 0, noNaN: true }),
        (centreK, magnitude) => {
          const half = 10 ** magnitude;
          const found = valuesOf(changeWith(withRoots(0.1, centreK - half, centreK + half)), between(200, 3000));
          // The coefficients are rounded to 1e-16 of 0.1 T^2, which moves a root by that over the slope there.
          const tolerance = (1e-15 * centreK * centreK) / half + 1e-9;
          expect(found).toHaveLength(2);
          expect(Math.abs(found[0]! - (centreK - half))).toBeLessThan(tolerance);
          expect(Math.abs(found[1]! - (centreK + half))).toBeLessThan(tolerance);
        },
      ),
      { seed: 20261201, numRuns: 300 },
    );
  });

  test("a target other than zero, in any unit", () => {
    const change = changeWith(withRoots(-20, 700));
    expect(valuesOf(change, { ...between(200, 3000), gibbsEnergy: { value: 2, unit: "kJ/mol" } })[0]).toBeCloseTo(
      600,
      9,
    );
    expect(valuesOf(change, { ...between(200, 3000), gibbsEnergy: { value: -2000, unit: "J/mol" } })[0]).toBeCloseTo(
      800,
      9,
    );
  });

  test("a root at an end of the search counts once", () => {
    const change = changeWith([-1024, 2]);
    const [root] = valuesOf(change, between(200, 3000));
    expect(root).toBeCloseTo(512, 9);
    expect(valuesOf(change, between(root!, 3000))).toEqual([root]);
    expect(valuesOf(change, between(200, root!))).toEqual([root]);
  });

  test("the last bit decides: the sign changes between neighbouring doubles", () => {
    const change = reaction("N2 + 3 H2 = 2 NH3", referenceData);
    const [root] = valuesOf(change, between(300, 1500));
    const at = (temperatureK: number): number =>
      standardReactionGibbsEnergy(change, { temperature: kelvin(temperatureK) }).value;
    const step = 4 * Number.EPSILON * root!;
    expect(at(root! - step) * at(root! + step)).toBeLessThanOrEqual(0);
  });
});

describe("reactions of the reference data", () => {
  test.each<[string, number, number, number]>([
    // Textbook values of the temperature where K = 1, recalled from memory and wide by the scatter of tables:
    // ammonia 456 K to 465 K, Boudouard about 973 K, water-gas shift about 1090 K to 1100 K, calcination at 1 bar 1150 K to 1170 K.
    ["N2 + 3 H2 = 2 NH3", 300, 1500, 460],
    ["C(s) + CO2 = 2 CO", 300, 1500, 973],
    ["CO + H2O(g) = CO2 + H2", 500, 1500, 1095],
    ["CaCO3(s) = CaO(s) + CO2", 300, 1200, 1160],
  ])("%s turns once", (text, from, to, aboutK) => {
    const [root, ...others] = valuesOf(reaction(text, referenceData), between(from, to));
    expect(others).toEqual([]);
    expect(Math.abs(root! - aboutK)).toBeLessThan(12);
  });

  test("at conditions, where the real Gibbs energy is zero", () => {
    const calcination = reaction("CaCO3(s) = CaO(s) + CO2", referenceData);
    const conditions = {
      pressure: { value: 1, unit: "bar" },
      gas: { moleFractions: { "CO2(g)": 1 } },
    } as const;
    const [standard] = valuesOf(calcination, between(300, 1200));
    expect(valuesOf(calcination, { ...between(300, 1200), conditions })).toEqual([standard]);
    const thin = { ...conditions, pressure: { value: 0.01, unit: "bar" } } as const;
    const [lower] = valuesOf(calcination, { ...between(300, 1200), conditions: thin });
    expect(lower).toBeLessThan(standard! - 100);
    const energy = reactionGibbsEnergy(calcination, { ...thin, temperature: kelvin(lower!) });
    expect(Math.abs(energy.value)).toBeLessThan(1e-8);
  });

  test("beyond the range of a species only as told", () => {
    const calcination = reaction("CaCO3(s) = CaO(s) + CO2", referenceData);
    expect(placesOf(() => valuesOf(calcination, between(300, 2000)))).toEqual([
      "species/outside-range at between.1",
      "species/outside-range at between.1",
    ]);
    const search = { ...between(250, 2000), outsideRange: "constant-heat-capacity" } as const;
    expect(valuesOf(calcination, search)).toHaveLength(1);
  });
});

describe("a search that is wrong", () => {
  const change = changeWith([1000, 1]);
  test.each<[string, unknown, string[]]>([
    ["nothing", undefined, ["input/not-an-object at "]],
    ["no ends", {}, ["input/missing at between"]],
    ["one end", { between: [kelvin(300)] }, ["quantity/not-a-quantity at between.1"]],
    ["three ends", { between: [kelvin(300), kelvin(400), kelvin(500)] }, ["input/too-large at between"]],
    ["equal ends", between(300, 300), ["roots/empty-range at between"]],
    ["ends exchanged", between(500, 300), ["roots/empty-range at between"]],
    [
      "bare numbers",
      { between: [300, 500] },
      ["quantity/not-a-quantity at between.0", "quantity/not-a-quantity at between.1"],
    ],
    [
      "a target in kelvin",
      { ...between(300, 500), gibbsEnergy: kelvin(1) },
      ["quantity/wrong-dimension at gibbsEnergy.unit"],
    ],
    ["another policy", { ...between(300, 500), outsideRange: "go on" }, ["input/unknown-option at outsideRange"]],
    [
      "a policy beside conditions, which have their own",
      {
        ...between(300, 500),
        outsideRange: "continue-fit",
        conditions: { pressure: { value: 1, unit: "bar" }, outsideRange: "refuse" },
      },
      ["input/conflicting-options at outsideRange"],
    ],
    ["null as conditions", { ...between(300, 500), conditions: null }, ["input/not-an-object at conditions"]],
    ["conditions without a pressure", { ...between(300, 500), conditions: {} }, ["input/missing at pressure"]],
    ["an unknown key", { ...between(300, 500), target: 1 }, ["input/unknown-key at target"]],
    [
      "all at once",
      { between: [kelvin(0), 5], gibbsEnergy: 1, outsideRange: 1, conditions: 1 },
      [
        "input/not-an-object at conditions",
        "input/conflicting-options at outsideRange",
        "input/unknown-option at outsideRange",
        "quantity/not-a-quantity at gibbsEnergy",
        "quantity/not-positive at between.0.value",
        "quantity/not-a-quantity at between.1",
      ],
    ],
  ])("%s", (_name, search, places) => {
    expect(placesOf(() => valuesOf(change, search as TemperatureSearch))).toEqual(places);
  });

  test("a species known at 298.15 K only has no range to search", () => {
    const change298 = reaction("W(cr) = W(l)", collectionOf(recordOf("W(cr)"), recordOf("W(l)")));
    expect(placesOf(() => valuesOf(change298, between(298.15, 400)))).toEqual([
      "species/outside-range at between.1",
      "species/outside-range at between.1",
    ]);
  });
});
