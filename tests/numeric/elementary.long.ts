import type { Decimal } from "decimal.js";
import { expect, test } from "vitest";
import { exp } from "../../src/numeric/exp.js";
import { expm1 } from "../../src/numeric/expm1.js";
import { log } from "../../src/numeric/log.js";
import { log1p } from "../../src/numeric/log1p.js";
import { log10 } from "../../src/numeric/log10.js";
import { anyPositive, draw, nearOne, nearZero, worstError } from "./samples.js";

const cases: readonly [string, (x: number) => number, (x: Decimal) => Decimal, number, () => number[]][] = [
  ["log", log, (x) => x.ln(), 0.52, () => [...anyPositive(60_000, 101), ...nearOne(40_000, 102)]],
  ["log10", log10, (x) => x.log(10), 0.51, () => [...anyPositive(10_000, 103), ...nearOne(10_000, 104)]],
  ["log1p", log1p, (x) => x.plus(1).ln(), 0.52, () => nearZero(20_000, 105).filter((x) => x > -1)],
  ["exp", exp, (x) => x.exp(), 0.51, () => [...draw(60_000, 106, wholeRange), ...nearZero(40_000, 107)]],
  ["expm1", expm1, (x) => x.exp().minus(1), 0.51, () => nearZero(20_000, 108)],
];

test.each(cases)("%s keeps its bound over many arguments", (_name, computed, reference, bound, sample) => {
  expect(worstError(computed, reference, sample()).ulp).toBeLessThan(bound);
});

function wholeRange(random: () => number): number {
  return (random() * 2 - 1) * 708;
}
