import { expect, test } from "vitest";
import { faradayConstantByAdjustment, gasConstantByAdjustment } from "../../src/constants/codata-adjustments.js";
import * as constants from "../../src/constants/constants.js";
import { references } from "../../src/references/bibliography.js";

/** Nearest double of a product of two decimals given as whole numbers and a power of ten. */
function product(a: bigint, b: bigint, exponent: number): number {
  return Number(`${a * b}e${exponent}`);
}

const {
  avogadroConstant,
  boltzmannConstant,
  elementaryCharge,
  faradayConstant,
  gasConstant,
  referenceTemperature,
  standardAtmosphere,
  standardPressure,
  thermochemicalCalorie,
  zeroCelsius,
} = constants;

const all = Object.values(constants).filter((constant) => typeof constant === "object");

test("R = k NA and F = e NA, exactly, rounded once", () => {
  expect(boltzmannConstant.value).toBe(Number("1380649e-29"));
  expect(avogadroConstant.value).toBe(Number("602214076e15"));
  expect(elementaryCharge.value).toBe(Number("1602176634e-28"));
  expect(gasConstant.value).toBe(product(1380649n, 602214076n, -14));
  expect(faradayConstant.value).toBe(product(1602176634n, 602214076n, -13));
});

test("the plain numbers are those of the constants", () => {
  expect(constants.gasConstantJPerMolK).toBe(gasConstant.value);
  expect(constants.faradayConstantCPerMol).toBe(faradayConstant.value);
  expect(constants.standardPressurePa).toBe(standardPressure.value);
  expect(constants.atmospherePa).toBe(standardAtmosphere.value);
  expect(constants.referenceTemperatureK).toBe(referenceTemperature.value);
  expect(constants.zeroCelsiusK).toBe(zeroCelsius.value);
  expect(constants.thermochemicalCalorieJ).toBe(thermochemicalCalorie.value);
});

test("every constant is frozen and names a source of the bibliography", () => {
  const old = [...Object.values(gasConstantByAdjustment), ...Object.values(faradayConstantByAdjustment)];
  expect(all.length).toBe(12);
  for (const constant of [...all, ...old]) {
    expect(Object.isFrozen(constant)).toBe(true);
    expect(Object.keys(references)).toContain(constant.source);
    expect(constant.value).toBeGreaterThan(0);
  }
});

test("a measured constant of an earlier adjustment is not exact, and lies within 3e-5 of today's", () => {
  for (const [year, constant] of Object.entries(gasConstantByAdjustment)) {
    expect(constant.exact, year).toBe(Number(year) >= 2018);
    expect(Math.abs(constant.value / gasConstant.value - 1), year).toBeLessThan(3e-5);
  }
  for (const [year, constant] of Object.entries(faradayConstantByAdjustment)) {
    expect(constant.exact, year).toBe(Number(year) >= 2018);
    expect(Math.abs(constant.value / faradayConstant.value - 1), year).toBeLessThan(3e-5);
  }
});
