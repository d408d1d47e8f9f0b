import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { isGibbsLedgerError } from "../../src/errors/gibbs-ledger-error.js";
import type { GasState } from "../../src/fugacity/equation-of-state.js";
import { idealGas } from "../../src/fugacity/ideal-gas.js";
import { lewisFugacityRule } from "../../src/fugacity/lewis-fugacity-rule.js";
import { virial } from "../../src/fugacity/virial.js";
import { component, type GasLabel } from "./gases.js";

const labels: readonly GasLabel[] = ["N2(g)", "CH4(g)", "CO2(g)"];
const components = labels.map((label) => component(label));
const conditions = fc.record({
  temperatureK: fc.double({ min: 310, max: 1000, noNaN: true }),
  pressurePa: fc.double({ min: 1, max: 2e6, noNaN: true }),
  fractions: fc
    .tuple(fc.integer({ min: 1, max: 99 }), fc.integer({ min: 0, max: 99 }), fc.integer({ min: 0, max: 99 }))
    .map(([a, b, c]) => [a / (a + b + c), b / (a + b + c), c / (a + b + c)]),
});
const seeded = { seed: 20261201, numRuns: 2000 };

describe("the Lewis fugacity rule", () => {
  test("each component has the fugacity coefficient of the pure gas, and G/RT = sum of y ln phi, G = H - T S", () => {
    const pure = components.map((each) => virial().mixture([each]));
    const mixture = lewisFugacityRule(virial()).mixture(components);
    fc.assert(
      fc.property(conditions, ({ temperatureK, pressurePa, fractions }) => {
        const state = mixture.state(temperatureK, pressurePa, fractions);
        const alone = pure.map((each) => each.state(temperatureK, pressurePa, [1]));
        expect(state.lnFugacityCoefficients).toStrictEqual(alone.map((each) => each.lnFugacityCoefficients[0]!));
        const thermal = 8.31446261815324 * temperatureK;
        const products = fractions.map((y, index) => y * state.lnFugacityCoefficients[index]!);
        const scale = products.reduce((total, product) => total + Math.abs(product), 0);
        const sum = products.reduce((total, product) => total + product, 0);
        const { enthalpy, entropy, gibbsEnergy } = state.departure;
        expect(Math.abs(sum - gibbsEnergy / thermal)).toBeLessThanOrEqual(8 * Number.EPSILON * scale);
        const size = fractions.reduce((total, y, index) => {
          const { departure } = alone[index]!;
          return total + y * (Math.abs(departure.enthalpy) + Math.abs(temperatureK * departure.entropy));
        }, 0);
        expect(Math.abs(enthalpy - temperatureK * entropy - gibbsEnergy)).toBeLessThanOrEqual(
          8 * Number.EPSILON * size,
        );
        const volume = (total: number, each: GasState, index: number) => total + fractions[index]! * each.molarVolume;
        expect(state.molarVolume / alone.reduce(volume, 0)).toBeCloseTo(1, 14);
        expect((pressurePa * state.molarVolume) / thermal / state.compressibilityFactor).toBeCloseTo(1, 14);
      }),
      seeded,
    );
  });

  test("it differs from the mixture rule of the equation, unless that has no unlike interactions of its own", () => {
    const full = virial().mixture(components).state(320, 2e6, [0.1, 0.3, 0.6]);
    const rule = lewisFugacityRule(virial()).mixture(components).state(320, 2e6, [0.1, 0.3, 0.6]);
    expect(Math.abs(full.lnFugacityCoefficients[0]! - rule.lnFugacityCoefficients[0]!)).toBeGreaterThan(0.01);
    const ideal = lewisFugacityRule(idealGas()).mixture(components).state(320, 2e6, [0.25, 0.25, 0.5]);
    expect(ideal).toStrictEqual(idealGas().mixture(components).state(320, 2e6, [0.25, 0.25, 0.5]));
  });

  test("the order of the components changes no bit", () => {
    const one = lewisFugacityRule(virial()).mixture(components).state(320, 2e6, [0.1, 0.3, 0.6]);
    const other = lewisFugacityRule(virial()).mixture(components.toReversed()).state(320, 2e6, [0.6, 0.3, 0.1]);
    expect(other).toStrictEqual({ ...one, lnFugacityCoefficients: one.lnFugacityCoefficients.toReversed() });
  });

  test("it records what it wraps, frozen", () => {
    const rule = lewisFugacityRule(virial({ correlation: "abbott" }));
    expect(rule.name).toBe("lewisFugacityRule");
    expect(JSON.parse(JSON.stringify(rule.parameters))).toEqual({
      equationOfState: {
        name: "virial",
        parameters: { correlation: "abbott", binaryInteraction: {}, polar: {}, outsideValidity: "refuse" },
      },
    });
    expect(Object.isFrozen(rule)).toBe(true);
    expect(Object.isFrozen(rule.parameters.equationOfState)).toBe(true);
  });

  test("a pure component outside the validity is named in the path, or marked where the caller continues", () => {
    const at = (equation: ReturnType<typeof virial>) =>
      lewisFugacityRule(equation).mixture(components, ["gas"]).state(310, 9e6, [0.5, 0.5, 0]);
    let caught: unknown;
    try {
      at(virial());
    } catch (error) {
      caught = error;
    }
    expect(isGibbsLedgerError(caught, "fugacity/outside-validity")).toBe(true);
    expect(caught).toMatchObject({ path: ["gas", "CO2(g)"] });
    expect(at(virial({ outsideValidity: "continue" })).outsideValidity).toContain("CO2(g)");
  });
});
