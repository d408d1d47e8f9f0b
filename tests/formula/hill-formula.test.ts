import { expect, test } from "vitest";
import { toFaults } from "../../src/errors/gibbs-ledger-error.js";
import { formula } from "../../src/formula/formula.js";
import { hillFormula } from "../../src/formula/hill-formula.js";

test.each([
  [{ O: 1, H: 6, C: 2 }, "C2H6O"],
  [{ O: 4, S: 1, H: 2 }, "H2O4S"],
  [{ Cl: 3, D: 1, C: 1 }, "CCl3D"],
  [{ Br: 1, C: 1, H: 3 }, "CH3Br"],
  [{ O: 1, Fe: 0.947 }, "Fe0.947O"],
  [{ B: 4.5, H: 2, O: 1 }, "B4.5·H2O"],
  [{ H: 1e-6, O: 1e12 }, "H0.000001O1000000000000"],
  [{ H: 1 / 3 }, "H0.3333333333333333"],
])("%j is %s", (composition, text) => {
  expect(hillFormula(composition as Record<string, number>)).toBe(text);
  expect(formula(text).composition).toEqual(composition);
});

test.each([
  [{}, "formula/empty", []],
  [null, "input/not-an-object", []],
  [{ Xx: 1 }, "formula/unknown-element", ["Xx"]],
  [{ H: 0 }, "formula/zero-count", ["H"]],
  [{ H: -1 }, "formula/count-out-of-range", ["H"]],
  [{ H: Number.NaN }, "formula/count-out-of-range", ["H"]],
  [{ H: "2" }, "formula/count-out-of-range", ["H"]],
])("%j is refused with %s", (composition, code, path) => {
  try {
    hillFormula(composition as Record<string, number>);
    expect.unreachable();
  } catch (error) {
    expect(toFaults(error)[0]).toMatchObject({ code, path });
  }
});
