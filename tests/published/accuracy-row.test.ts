import { expect, test } from "vitest";
import { row } from "./accuracy-row.js";

const parts = {
  id: "a",
  class: "same source",
  source: "a table",
  origin: "computed",
  quantity: "x in J/mol",
  expected: 10,
  tolerance: 0.5,
} as const;

test.each([
  [10.5, true],
  [9.5, true],
  [10.500001, false],
  [Number.NaN, false],
  [Number.POSITIVE_INFINITY, false],
])("a computed value of %d beside 10 +- 0.5: pass is %s", (computed, pass) => {
  expect(row({ ...parts, computed }).pass).toBe(pass);
});
