import { expect, test } from "vitest";
import { logPair } from "../../src/numeric/log-pair.js";
import { anyPositive, logarithmBorders, nearOne } from "./samples.js";
import { exactDecimal } from "./ulp.js";

test("logPair is within 2^-68 of 45 digits, and its high part is the nearest double to the sum", () => {
  const sample = [...anyPositive(400, 21), ...nearOne(600, 22), ...logarithmBorders().slice(0, 500)];
  let worst = 0;
  for (const x of sample) {
    const { high, low } = logPair(x, 0);
    expect(high + low).toBe(high);
    const reference = exactDecimal(x).ln();
    const sum = exactDecimal(high).plus(exactDecimal(low));
    worst = Math.max(worst, sum.minus(reference).div(reference).abs().toNumber());
  }
  expect(worst).toBeLessThan(2 ** -68);
  expect(worst).toBeGreaterThan(0);
});
