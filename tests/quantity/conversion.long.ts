import { expect, test } from "vitest";
import { convertValue } from "../../src/quantity/convert-value.js";
import { temperatureInKelvin } from "../../src/quantity/guards.js";
import type { UnitCode } from "../../src/quantity/units.js";
import { exactConversion, exactDouble, isNearest, pairs, randomNumbers } from "./oracle.js";

test("temperatures become the nearest kelvin: 1e5 values on each scale", () => {
  const random = randomNumbers(20270101);
  for (const unit of ["K", "Cel", "[degF]", "[degR]"] as const) {
    const wrong: number[] = [];
    for (let count = 0; count < 100_000; count += 1) {
      // Ordinary temperatures, round ones, and those near the ends of the short way.
      const value = [random() * 5000 + 1, Math.round(random() * 20000) / 10 + 0.1, 1e-6 + random() * 1e-5][count % 3]!;
      const kelvin = temperatureInKelvin({ value, unit });
      if (!isNearest(kelvin, exactConversion(exactDouble(value), unit, "K"))) wrong.push(value);
    }
    expect(wrong, unit).toEqual([]);
  }
});

test("every pair of units gives the nearest double: 1e5 values over the pairs", () => {
  const random = randomNumbers(20270102);
  const wrong: [number, UnitCode, UnitCode][] = [];
  for (let count = 0; count < 100_000; count += 1) {
    const [from, to] = pairs[count % pairs.length]!;
    const value = random() * 10 ** Math.round(random() * 30 - 15);
    if (!isNearest(convertValue(value, from, to), exactConversion(exactDouble(value), from, to))) {
      wrong.push([value, from, to]);
    }
  }
  expect(wrong).toEqual([]);
});
