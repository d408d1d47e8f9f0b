import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { quantity } from "../../src/quantity/quantity.js";
import { type SolutionMeasured, solutionComposition } from "../../src/standard-state/index.js";
import { placesOf } from "../errors/faults-of.js";
import { binary, Decimal } from "../heat-capacity/oracle.js";

const eps = Number.EPSILON;
/** Molar masses of the labels' formulas in kg/mol: sums of standard atomic weights, exact decimals. */
const molarMasses = { "Na^+(aq)": "0.02298976928", "Cl^-(aq)": "0.03545", "CH3OH(aq)": "0.032042" } as const;
const waterMass = "0.018015";
const labels = Object.keys(molarMasses) as (keyof typeof molarMasses)[];

const molalities = fc.tuple(
  ...labels.map(() =>
    fc.oneof(
      fc.constant(0),
      fc.double({ min: 1e-9, max: 1, noNaN: true }),
      fc.double({ min: 1, max: 60, noNaN: true }),
    ),
  ),
);
const densities = fc.double({ min: 0.7, max: 1.6, noNaN: true });
const runs = { seed: 20261212, numRuns: 500 };

const molalityMap = (values: readonly number[]) =>
  Object.fromEntries(labels.map((label, index) => [label, { value: values[index]!, unit: "mol/kg" } as const]));

test("a hand calculation: 1 mol/kg of sodium chloride, 1.036 g/cm3", () => {
  const { concentrations, moleFractions } = solutionComposition({
    solvent: "H2O(l)",
    molalities: { "NaCl(aq)": quantity(1, "mol/kg") },
    density: quantity(1.036, "g/cm3"),
  });
  // 1036 g/L over 1058.44 g of solution that hold one mole; one of 1000/18.015 + 1 moles.
  expect(concentrations!["NaCl(aq)"]!.value).toBeCloseTo((1036 / 1058.44) * 1000, 1);
  expect(moleFractions["NaCl(aq)"]).toBeCloseTo(1 / 56.5093, 6);
  expect(moleFractions["H2O(l)"]).toBeCloseTo(55.5093 / 56.5093, 6);
});

test("the relations hold in decimals of 45 digits, within 8 eps", () => {
  fc.assert(
    fc.property(molalities, densities, (values, density) => {
      const result = solutionComposition({
        solvent: "H2O(l)",
        molalities: molalityMap(values),
        density: { value: density, unit: "kg/L" },
      });
      const exact = values.map((value) => binary(value));
      const amount = exact.reduce((sum, value) => sum.plus(value), new Decimal(1).div(waterMass));
      const mass = exact.reduce(
        (sum, value, index) => sum.plus(value.times(molarMasses[labels[index]!])),
        new Decimal(1),
      );
      labels.forEach((label, index) => {
        const close = (computed: number, expected: typeof Decimal.prototype) =>
          expect(
            binary(computed)
              .minus(expected)
              .abs()
              .lte(expected.times(8 * eps)),
          ).toBe(true);
        close(result.molalities[label]!.value, exact[index]!);
        close(result.moleFractions[label]!, exact[index]!.div(amount));
        close(result.concentrations![label]!.value, binary(density).times(1000).times(exact[index]!).div(mass));
      });
    }),
    runs,
  );
});

test("from any scale back to any other gives what was", () => {
  fc.assert(
    fc.property(molalities, densities, (values, value) => {
      const density = { value, unit: "kg/L" } as const;
      const first = solutionComposition({ solvent: "H2O(l)", molalities: molalityMap(values), density });
      const { concentrations, moleFractions } = first;
      const others = [
        solutionComposition({ solvent: "H2O(l)", moleFractions, density }),
        solutionComposition({ solvent: "H2O(l)", concentrations: concentrations!, density }),
      ];
      // The mass of solvent, rho less the solutes, is at least an eighth of rho for 60 mol/kg of each.
      const amplification = 10;
      for (const other of others) {
        for (const label of labels) {
          for (const [got, wanted] of [
            [other.molalities[label]!.value, first.molalities[label]!.value],
            [other.moleFractions[label]!, first.moleFractions[label]!],
            [other.concentrations![label]!.value, first.concentrations![label]!.value],
          ] as const) {
            expect(Math.abs(got - wanted)).toBeLessThanOrEqual(16 * amplification * eps * wanted);
          }
        }
      }
    }),
    runs,
  );
});

test("fractions sum to 1, and the order of solutes shows in no bit", () => {
  fc.assert(
    fc.property(molalities, (values) => {
      const given = molalityMap(values);
      const forward = solutionComposition({ solvent: "H2O(l)", molalities: given });
      const reversed = Object.fromEntries(Object.entries(given).reverse());
      expect(solutionComposition({ solvent: "H2O(l)", molalities: reversed })).toEqual(forward);
      const sum = Object.values(forward.moleFractions).reduce((total, fraction) => total + fraction, 0);
      expect(Math.abs(sum - 1)).toBeLessThanOrEqual(4 * eps);
      expect(forward.concentrations).toBeUndefined();
    }),
    runs,
  );
});

test("molar masses may be given, of species whose label is no formula too", () => {
  const result = solutionComposition({
    solvent: "H2O(l)",
    molalities: { dextran: quantity(1, "mmol/kg") },
    molarMasses: { dextran: quantity(40, "kg/mol") },
    density: quantity(1, "kg/L"),
  });
  expect(result.concentrations!["dextran"]!.value).toBeCloseTo(1 / 1.04, 12);
});

test("pure solvent, and other solvents than water", () => {
  expect(solutionComposition({ solvent: "H2O(l)", molalities: {} }).moleFractions).toEqual({ "H2O(l)": 1 });
  const { molalities: inMethanol } = solutionComposition({
    solvent: "CH3OH(l)",
    moleFractions: { "CH3OH(l)": 0.9, "NaI(sln)": 0.1 },
  });
  expect(inMethanol["NaI(sln)"]!.value).toBeCloseTo(0.1 / 0.9 / 0.032042, 10);
});

describe("wrong input", () => {
  const refused = (measured: unknown) => placesOf(() => solutionComposition(measured as SolutionMeasured));
  const one = quantity(1, "mol/kg");

  test.each([
    ["nothing", undefined, ["input/not-an-object at "]],
    ["no scale", { solvent: "H2O(l)" }, ["input/missing at "]],
    ["no solvent", { molalities: {} }, ["input/missing at solvent"]],
    [
      "two scales",
      { solvent: "H2O(l)", molalities: {}, concentrations: {} },
      ["input/conflicting-options at concentrations"],
    ],
    [
      "the solvent among the solutes",
      { solvent: "H2O(l)", molalities: { "H2O(l)": one } },
      ["standard-state/invalid-composition at molalities.H2O(l)"],
    ],
    [
      "amounts below zero, of another dimension, of a bare number",
      {
        solvent: "H2O(l)",
        molalities: { "NaCl(aq)": quantity(-1, "mol/kg"), "KCl(aq)": quantity(1, "mol/L"), "KBr(aq)": 1 },
      },
      [
        "standard-state/invalid-composition at molalities.NaCl(aq)",
        "quantity/wrong-dimension at molalities.KCl(aq).unit",
        "quantity/not-a-quantity at molalities.KBr(aq)",
      ],
    ],
    [
      "fractions that do not sum to 1, or are none",
      { solvent: "H2O(l)", moleFractions: { "H2O(l)": 0.9, "NaCl(aq)": 0.2 } },
      ["standard-state/invalid-composition at moleFractions"],
    ],
    [
      "a fraction above 1",
      { solvent: "H2O(l)", moleFractions: { "H2O(l)": 98, "NaCl(aq)": 0.02 } },
      ["standard-state/invalid-composition at moleFractions.H2O(l)"],
    ],
    [
      "fractions without the solvent",
      { solvent: "H2O(l)", moleFractions: { "NaCl(aq)": 1 } },
      ["input/missing at moleFractions.H2O(l)"],
    ],
    [
      "no solvent left in fractions",
      { solvent: "H2O(l)", moleFractions: { "H2O(l)": 0, "NaCl(aq)": 1 } },
      ["standard-state/no-solvent at moleFractions.H2O(l)"],
    ],
    [
      "no solvent left in concentrations",
      {
        solvent: "H2O(l)",
        concentrations: { "NaCl(aq)": quantity(20, "mol/L") },
        density: quantity(1, "kg/L"),
      },
      ["standard-state/no-solvent at concentrations"],
    ],
    [
      "concentrations without a density",
      { solvent: "H2O(l)", concentrations: { "NaCl(aq)": quantity(1, "mol/L") } },
      ["input/missing at density"],
    ],
    [
      "labels that are no formula, and masses of nothing there",
      {
        solvent: "H2O(l)",
        molalities: { salt: one, "Tc(aq)": one },
        molarMasses: { "KCl(aq)": quantity(74.55, "g/mol"), "H2O(l)": quantity(0, "g/mol") },
        density: quantity(0, "kg/L"),
      },
      [
        "quantity/not-positive at density.value",
        "standard-state/invalid-composition at molarMasses.KCl(aq)",
        "quantity/not-positive at molarMasses.H2O(l).value",
        "formula/unknown-element at molalities.salt",
        "formula/no-atomic-weight at molalities.Tc(aq)",
      ],
    ],
    [
      "amounts too large for a double",
      {
        solvent: "H2O(l)",
        moleFractions: { "H2O(l)": 5e-324, "NaCl(aq)": 1 },
      },
      ["quantity/overflow at moleFractions"],
    ],
    [
      "a key of the prototype",
      JSON.parse('{ "solvent": "H2O(l)", "molalities": { "__proto__": 1 } }'),
      ["input/forbidden-key at molalities.__proto__", "quantity/not-a-quantity at molalities.__proto__"],
    ],
  ])("%s", (_name, measured, expected) => {
    expect(refused(measured)).toEqual(expected);
  });
});
