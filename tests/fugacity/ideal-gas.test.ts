import { expect, test } from "vitest";
import { idealGas } from "../../src/fugacity/ideal-gas.js";

test("every fugacity coefficient is 1, every departure 0, and V = RT/p", () => {
  const state = idealGas()
    .mixture([{ label: "A" }, { label: "B" }])
    .state(300, 1e5, [0.25, 0.75]);
  expect(state).toStrictEqual({
    compressibilityFactor: 1,
    molarVolume: (8.31446261815324 * 300) / 1e5,
    lnFugacityCoefficients: [0, 0],
    departure: { enthalpy: 0, entropy: 0, gibbsEnergy: 0 },
  });
});

test("it is one frozen object without parameters", () => {
  expect(idealGas()).toBe(idealGas());
  expect(Object.isFrozen(idealGas())).toBe(true);
  expect(Object.isFrozen(idealGas().parameters)).toBe(true);
  expect(idealGas().parameters).toEqual({});
  expect(idealGas().name).toBe("idealGas");
});

test("a state belongs to the caller", () => {
  const mixture = idealGas().mixture([{ label: "A" }]);
  (mixture.state(300, 1e5, [1]).lnFugacityCoefficients as number[])[0] = 5;
  expect(mixture.state(300, 1e5, [1]).lnFugacityCoefficients).toEqual([0]);
});
