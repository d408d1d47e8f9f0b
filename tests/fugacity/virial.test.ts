import fc from "fast-check";
import { describe, expect, test } from "vitest";
import type { GasComponent, GasState } from "../../src/fugacity/equation-of-state.js";
import { virial } from "../../src/fugacity/virial.js";
import { component, componentOf } from "./gases.js";

const gasConstant = 8.31446261815324;
const seeded = { seed: 20261201, numRuns: 2000 };
const correlation = fc.constantFrom("abbott", "pitzer-curl", "tsonopoulos");
const critical = fc.record(
  {
    temperatureK: fc.double({ min: 30, max: 700, noNaN: true }),
    pressurePa: fc.double({ min: 2e6, max: 2e7, noNaN: true }),
    acentricFactor: fc.double({ min: -0.2, max: 0.8, noNaN: true }),
    volumeM3PerMol: fc.double({ min: 4e-5, max: 4e-4, noNaN: true }),
  },
  { requiredKeys: ["temperatureK", "pressurePa", "acentricFactor"] },
);

/** One to five components with fractions that sum to 1, at a state within the validity of the equation. */
const gasMixture = fc
  .array(fc.tuple(critical, fc.integer({ min: 0, max: 100 })), { minLength: 1, maxLength: 5 })
  .filter((parts) => parts.some(([, weight]) => weight > 0))
  .chain((parts) =>
    fc.record({
      components: fc.constant(parts.map(([each, _], index): GasComponent => ({ label: `X${index}`, critical: each }))),
      fractions: fc.constant(normalised(parts.map(([, weight]) => weight))),
      temperatureK: fc
        .double({ min: 0.7, max: 5, noNaN: true })
        .map((reduced) => reduced * Math.max(...parts.map(([each]) => each.temperatureK))),
      pressurePa: fc.double({ min: 1, max: 1e5, noNaN: true }),
      kij: fc.double({ min: -0.1, max: 0.2, noNaN: true }),
      correlation,
    }),
  );

function normalised(weights: readonly number[]): number[] {
  const total = weights.reduce((sum, weight) => sum + weight, 0);
  return weights.map((weight) => weight / total);
}

/** G departure over RT, extensive: for amounts that need not sum to 1. */
function totalGibbs(state: (fractions: number[]) => GasState, amounts: readonly number[], thermal: number): number {
  const total = amounts.reduce((sum, amount) => sum + amount, 0);
  return (total * state(normalised(amounts)).departure.gibbsEnergy) / thermal;
}

describe("laws", () => {
  test("G = H - T S, G/RT = sum of y ln phi, Z = pV/RT, and V - RT/p = B", () => {
    fc.assert(
      fc.property(gasMixture, ({ components, fractions, temperatureK, pressurePa, kij, correlation }) => {
        const equation = virial({ correlation, binaryInteraction: { X0: { X1: kij } } });
        const state = equation.mixture(components).state(temperatureK, pressurePa, fractions);
        const { enthalpy, entropy, gibbsEnergy } = state.departure;
        const terms = Math.abs(enthalpy) + Math.abs(temperatureK * entropy);
        expect(Math.abs(enthalpy - temperatureK * entropy - gibbsEnergy)).toBeLessThanOrEqual(
          4 * Number.EPSILON * terms,
        );
        const products = fractions.map((fraction, index) => fraction * state.lnFugacityCoefficients[index]!);
        const sum = products.reduce((total, product) => total + product, 0);
        const thermal = gasConstant * temperatureK;
        // ln phi is the difference of 2 S and B, so the scale is that of its terms.
        const scale =
          products.reduce((total, product) => total + Math.abs(product), 0) + 3 * Math.abs(gibbsEnergy / thermal);
        expect(Math.abs(sum - gibbsEnergy / thermal)).toBeLessThanOrEqual(8 * Number.EPSILON * scale);
        const { compressibilityFactor, molarVolume } = state;
        expect(Math.abs((pressurePa * molarVolume) / thermal - compressibilityFactor)).toBeLessThan(4 * Number.EPSILON);
        const idealVolume = thermal / pressurePa;
        const difference = molarVolume - idealVolume - gibbsEnergy / pressurePa;
        expect(Math.abs(difference)).toBeLessThanOrEqual(2 * Number.EPSILON * idealVolume);
      }),
      seeded,
    );
  });

  test("d(G/RT)/dp = (V - RT/p)/RT and d(G/RT)/dT = -H/RT^2, against central differences", () => {
    fc.assert(
      fc.property(gasMixture, ({ components, fractions, temperatureK, pressurePa, kij, correlation }) => {
        const equation = virial({ correlation, binaryInteraction: { X0: { X1: kij } }, outsideValidity: "continue" });
        const mixture = equation.mixture(components);
        const over = (t: number, p: number) => mixture.state(t, p, fractions).departure.gibbsEnergy / (gasConstant * t);
        const { departure, molarVolume } = mixture.state(temperatureK, pressurePa, fractions);
        const dp = pressurePa * 1e-4;
        const slopeInPressure = (over(temperatureK, pressurePa + dp) - over(temperatureK, pressurePa - dp)) / (2 * dp);
        const thermal = gasConstant * temperatureK;
        const idealVolume = thermal / pressurePa;
        // The right-hand side is a small difference of volumes: its rounding is eps of the ideal volume.
        expect(Math.abs(slopeInPressure * thermal - (molarVolume - idealVolume))).toBeLessThan(1e-10 * idealVolume);
        const dt = temperatureK * 1e-4;
        const slopeInTemperature =
          (over(temperatureK + dt, pressurePa) - over(temperatureK - dt, pressurePa)) / (2 * dt);
        const expected = -departure.enthalpy / (thermal * temperatureK);
        const scale = (Math.abs(departure.enthalpy) + Math.abs(departure.gibbsEnergy)) / (thermal * temperatureK);
        // Powers up to 9 of T: the central difference errs by some (1e-4)^2 100/6 of the terms, which partly cancel.
        expect(Math.abs(slopeInTemperature - expected)).toBeLessThan(1e-5 * scale + 1e-12 / temperatureK);
      }),
      { ...seeded, numRuns: 500 },
    );
  });

  test("ln phi_i is the derivative of the total Gibbs departure by the amount of i; Gibbs-Duhem", () => {
    fc.assert(
      fc.property(gasMixture, ({ components, fractions, temperatureK, pressurePa, kij, correlation }) => {
        const equation = virial({ correlation, binaryInteraction: { X0: { X1: kij } }, outsideValidity: "continue" });
        const mixture = equation.mixture(components);
        const state = (y: number[]) => mixture.state(temperatureK, pressurePa, y);
        const thermal = gasConstant * temperatureK;
        const { lnFugacityCoefficients } = state(fractions);
        const step = 1e-4;
        const moved = (index: number, by: number) => fractions.map((y, each) => (each === index ? y + by : y));
        fractions.forEach((fraction, index) => {
          if (fraction < 2 * step) return;
          const up = totalGibbs(state, moved(index, step), thermal);
          const down = totalGibbs(state, moved(index, -step), thermal);
          const difference = (up - down) / (2 * step);
          expect(Math.abs(difference - lnFugacityCoefficients[index]!)).toBeLessThan(1e-8);
          const above = state(normalised(moved(index, step))).lnFugacityCoefficients;
          const below = state(normalised(moved(index, -step))).lnFugacityCoefficients;
          const duhem = fractions.reduce((sum, y, each) => sum + (y * (above[each]! - below[each]!)) / (2 * step), 0);
          expect(Math.abs(duhem)).toBeLessThan(1e-8);
        });
      }),
      { ...seeded, numRuns: 500 },
    );
  });

  test("the order of the components changes no bit", () => {
    const shuffled = gasMixture.chain((given) =>
      fc.record({
        given: fc.constant(given),
        order: fc.shuffledSubarray(
          given.fractions.map((_, index) => index),
          { minLength: given.fractions.length },
        ),
      }),
    );
    fc.assert(
      fc.property(shuffled, ({ given, order }) => {
        const { components, fractions, temperatureK, pressurePa, kij, correlation } = given;
        const equation = virial({ correlation, binaryInteraction: { X0: { X1: kij } } });
        const one = equation.mixture(components).state(temperatureK, pressurePa, fractions);
        const other = equation.mixture(order.map((index) => components[index]!)).state(
          temperatureK,
          pressurePa,
          order.map((index) => fractions[index]!),
        );
        expect(other.departure).toStrictEqual(one.departure);
        expect(other.molarVolume).toBe(one.molarVolume);
        expect(other.compressibilityFactor).toBe(one.compressibilityFactor);
        expect(other.lnFugacityCoefficients).toStrictEqual(order.map((index) => one.lnFugacityCoefficients[index]!));
      }),
      seeded,
    );
  });

  test("a pair of substances with the same constants is the pure substance", () => {
    fc.assert(
      fc.property(critical, correlation, fc.double({ min: 0, max: 1, noNaN: true }), (each, name, y) => {
        const equation = virial({ correlation: name });
        const t = 1.2 * each.temperatureK;
        const pure = equation.mixture([{ label: "A", critical: each }]).state(t, 1e4, [1]);
        const pair = equation.mixture(["A", "B"].map((label) => ({ label, critical: each }))).state(t, 1e4, [y, 1 - y]);
        const scale = (1e4 / (gasConstant * t)) * ((gasConstant * each.temperatureK) / each.pressurePa);
        for (const value of pair.lnFugacityCoefficients) {
          // Cube roots, cube, Zc and pc of the pair round; the reduced coefficient is at most about 1.
          expect(Math.abs(value - pure.lnFugacityCoefficients[0]!)).toBeLessThan(40 * Number.EPSILON * scale);
        }
      }),
      seeded,
    );
  });
});

describe("limits", () => {
  const equation = virial();
  const air = equation.mixture([component("N2(g)"), component("O2(g)")]);

  test("a mixture of one component is the pure gas to the bit", () => {
    const pure = equation.mixture([component("N2(g)")]).state(250, 1e6, [1]);
    const inMixture = air.state(250, 1e6, [1, 0]);
    expect(inMixture.lnFugacityCoefficients[0]).toBe(pure.lnFugacityCoefficients[0]);
    expect(inMixture.departure).toStrictEqual(pure.departure);
    expect(inMixture.molarVolume).toBe(pure.molarVolume);
  });

  test.each([1e-3, 1e-100, 1e-290])("at %d Pa the gas is ideal", (pressurePa) => {
    const { compressibilityFactor, lnFugacityCoefficients, departure } = air.state(300, pressurePa, [0.79, 0.21]);
    expect(compressibilityFactor).toBeCloseTo(1, 11);
    for (const value of [...lnFugacityCoefficients, ...Object.values(departure)]) {
      expect(Math.abs(value)).toBeLessThan(1e-7);
      expect(Object.is(value, -0)).toBe(false);
    }
  });

  test("coefficients of zero give an ideal gas without -0", () => {
    const zero = virial({ secondVirialCoefficient: () => ({ value: 0, temperatureDerivative: 0 }) });
    const state = zero.mixture([{ label: "A" }, { label: "B" }]).state(300, 1e5, [0.5, 0.5]);
    expect(state.departure).toStrictEqual({ enthalpy: 0, entropy: 0, gibbsEnergy: 0 });
    expect(state.lnFugacityCoefficients).toStrictEqual([0, 0]);
  });
});

describe("options", () => {
  const pair = [component("N2(g)"), component("CH4(g)")];

  test("k_ij in either order, and in both, gives the same bits; and it lowers the attraction", () => {
    const state = (binaryInteraction: Record<string, Record<string, number>>) =>
      virial({ binaryInteraction }).mixture(pair).state(200, 1e6, [0.5, 0.5]);
    const one = state({ "N2(g)": { "CH4(g)": 0.03 } });
    expect(state({ "CH4(g)": { "N2(g)": 0.03 } })).toStrictEqual(one);
    expect(state({ "CH4(g)": { "N2(g)": 0.03 }, "N2(g)": { "CH4(g)": 0.03 } })).toStrictEqual(one);
    expect(one.compressibilityFactor).toBeGreaterThan(state({}).compressibilityFactor);
  });

  test("the default is Tsonopoulos's correlation, refused outside", () => {
    expect(virial().parameters).toEqual({
      correlation: "tsonopoulos",
      binaryInteraction: {},
      polar: {},
      outsideValidity: "refuse",
    });
    const state = virial().mixture(pair).state(200, 1e6, [0.5, 0.5]);
    expect(virial({ correlation: "tsonopoulos" }).mixture(pair).state(200, 1e6, [0.5, 0.5])).toStrictEqual(state);
  });

  test("an equation of state is frozen plain data that JSON keeps", () => {
    const options = { binaryInteraction: { "N2(g)": { "CH4(g)": 0.03 } }, polar: { "H2O(g)": { a: 0.03, b: 0.02 } } };
    const equation = virial(options);
    options.binaryInteraction["N2(g)"]["CH4(g)"] = 0.5;
    expect(JSON.parse(JSON.stringify(equation.parameters))).toEqual({
      correlation: "tsonopoulos",
      binaryInteraction: { "N2(g)": { "CH4(g)": 0.03 } },
      polar: { "H2O(g)": { a: 0.03, b: 0.02 } },
      outsideValidity: "refuse",
    });
    expect(Object.isFrozen(equation)).toBe(true);
    expect(Object.isFrozen(equation.parameters)).toBe(true);
    expect(Object.isFrozen(equation.parameters.binaryInteraction)).toBe(true);
    expect(virial({ secondVirialCoefficient: () => ({ value: 0, temperatureDerivative: 0 }) }).parameters).toEqual({
      secondVirialCoefficient: "caller's function",
      outsideValidity: "refuse",
    });
  });

  test("polar terms act on the polar gas and on pairs of two polar gases with their mean, on no others", () => {
    const [water, ammonia, nitrogen] = [component("H2O(g)"), component("NH3(g)"), component("N2(g)")];
    // Invented polar terms.
    const polar = { "H2O(g)": { a: 0.03, b: 0.02 }, "NH3(g)": { a: -0.01, b: 0.005 } };
    const fractions = [0.3, 0.3, 0.4];
    const at = (options: Parameters<typeof virial>[0]) =>
      virial(options).mixture([water, ammonia, nitrogen]).state(500, 1e5, fractions).lnFugacityCoefficients;
    const [with_, without] = [at({ polar }), at({})];
    const pressureOverThermal = 1e5 / (gasConstant * 500);
    const term = (pc: number, tc: number, a: number, b: number) =>
      ((gasConstant * tc) / pc) * (a * (tc / 500) ** 6 - b * (tc / 500) ** 8);
    const waterTerm = term(220.64e5, 647.14, 0.03, 0.02);
    const ammoniaTerm = term(113.53e5, 405.4, -0.01, 0.005);
    const tc = Math.sqrt(647.14 * 405.4);
    const volume = ((Math.cbrt(55.95) + Math.cbrt(72.47)) / 2) ** 3 * 1e-6;
    const zOf = (pc: number, v: number, t: number) => (pc * v) / (gasConstant * t);
    const z = (zOf(220.64e5, 55.95e-6, 647.14) + zOf(113.53e5, 72.47e-6, 405.4)) / 2;
    const pairTerm = term((z * gasConstant * tc) / volume, tc, 0.01, 0.0125);
    const mixed = 0.09 * waterTerm + 0.09 * ammoniaTerm + 0.18 * pairTerm;
    const expected = [0.3 * waterTerm + 0.3 * pairTerm, 0.3 * pairTerm + 0.3 * ammoniaTerm, 0].map(
      (sum) => pressureOverThermal * (2 * sum - mixed),
    );
    expected.forEach((value, index) => {
      expect(with_[index]! - without[index]!).toBeCloseTo(value, 14);
    });
  });

  test("the caller's function is asked once a pair and state, with labels in order", () => {
    const asked: string[] = [];
    const equation = virial({
      secondVirialCoefficient: (temperatureK, first, second) => {
        asked.push(`${first} ${second} ${temperatureK}`);
        return { value: -1e-4, temperatureDerivative: 1e-6 };
      },
    });
    const state = equation.mixture([{ label: "B" }, { label: "A" }]).state(300, 1e5, [0.5, 0.5]);
    expect(asked.toSorted()).toEqual(["A A 300", "A B 300", "B B 300"]);
    expect(state.departure.gibbsEnergy).toBeCloseTo(-10, 12);
    expect(state.departure.entropy).toBeCloseTo(-0.1, 14);
    expect(state.departure.enthalpy).toBeCloseTo(-40, 12);
  });

  test("a caller's function that asks the mixture itself for a state disturbs nothing", () => {
    let depth = 0;
    const equation = virial({
      secondVirialCoefficient: (temperatureK, first, second) => {
        if (depth === 0) {
          depth += 1;
          mixture.state(2 * temperatureK, 1e5, [0.1, 0.9]);
          depth -= 1;
        }
        return { value: -(first + second).length * 1e-5, temperatureDerivative: temperatureK * 1e-9 };
      },
    });
    const mixture = equation.mixture([{ label: "A" }, { label: "BBB" }]);
    const state = mixture.state(300, 1e5, [0.5, 0.5]);
    expect(state.departure.gibbsEnergy).toBeCloseTo(-1e5 * 1e-5 * (2 / 4 + 4 / 2 + 6 / 4), 12);
    expect(state.departure.entropy).toBeCloseTo(-1e5 * 300e-9, 12);
  });
});

describe("a state does not depend on the states before it", () => {
  test("temperatures in any order", () => {
    const mixture = virial().mixture([component("N2(g)"), component("CO2(g)")]);
    const at = (t: number) => mixture.state(t, 1e5, [0.4, 0.6]);
    const first = at(300);
    at(700);
    expect(at(300)).toStrictEqual(first);
    expect(
      virial()
        .mixture([component("N2(g)"), component("CO2(g)")])
        .state(300, 1e5, [0.4, 0.6]),
    ).toStrictEqual(first);
  });
});

describe("missing critical volume", () => {
  test("is estimated with Zc = 0.291 - 0.080 omega", () => {
    const printed = { temperature: 304.12, pressure: 73.74, acentricFactor: 0.225 };
    const volume = ((0.291 - 0.08 * 0.225) * gasConstant * 304.12) / 73.74e5;
    const other = component("N2(g)");
    const state = (gas: GasComponent) => virial().mixture([gas, other]).state(300, 1e6, [0.5, 0.5]);
    const estimated = state(componentOf("CO2(g)", printed));
    const given = state(componentOf("CO2(g)", { ...printed, volume: volume * 1e6 }));
    expect(estimated.molarVolume / given.molarVolume).toBeCloseTo(1, 14);
  });
});
