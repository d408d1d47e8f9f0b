import fc from "fast-check";
import { describe, expect, test } from "vitest";
import type { CompositionScale, Solution, SolventComponent } from "../../src/activity/activity-model.js";
import { idealSolution } from "../../src/activity/ideal-solution.js";

const water: SolventComponent = { label: "H2O(l)", chargeNumber: 0, molarMassKgPerMol: 0.018015 };
const runs = { seed: 20261201, numRuns: 500 };

function solutionOf(scale: CompositionScale, count: number): Solution {
  const solutes = Array.from({ length: count }, (_, index) => ({ label: `X${index}(aq)`, chargeNumber: index - 1 }));
  return idealSolution().solution({ scale, solvent: water, solutes });
}

const molalities = fc.array(fc.double({ min: 0, max: 20, noNaN: true }), { minLength: 1, maxLength: 6 });

test("it is one frozen object without parameters, for both scales", () => {
  expect(idealSolution()).toBe(idealSolution());
  expect(Object.isFrozen(idealSolution())).toBe(true);
  expect(Object.isFrozen(idealSolution().parameters)).toBe(true);
  expect(Object.isFrozen(idealSolution().scales)).toBe(true);
  const { name, parameters, scales } = idealSolution();
  expect({ name, parameters, scales }).toEqual({
    name: "idealSolution",
    parameters: {},
    scales: ["molality", "mole-fraction"],
  });
});

describe("on the molality scale", () => {
  test("every coefficient is 1 and ln a(solvent) = -M sum of m: 1 mol/kg of a 1:1 electrolyte, by hand", () => {
    const state = solutionOf("molality", 2).state(298.15, 1e5, { solventMoleFraction: 0.965, solutes: [1, 1] });
    // 2 mol/kg x 0.018015 kg/mol
    expect(state).toStrictEqual({ lnActivityCoefficients: [0, 0], lnSolventActivity: -0.03603 });
  });

  test("the pure solvent has activity 1, without a negative zero", () => {
    const empty = solutionOf("molality", 0).state(298.15, 1e5, { solventMoleFraction: 1, solutes: [] });
    expect(empty).toStrictEqual({ lnActivityCoefficients: [], lnSolventActivity: 0 });
    const none = solutionOf("molality", 1).state(298.15, 1e5, { solventMoleFraction: 1, solutes: [0] });
    expect(none.lnSolventActivity).toBe(0);
  });

  test("Gibbs-Duhem: sum of m d ln(m gamma) + (1/M) d ln a(solvent) = 0 in any direction", () => {
    const directions = fc.array(fc.double({ min: -1, max: 1, noNaN: true }), { minLength: 6, maxLength: 6 });
    const present = fc.array(fc.double({ min: 1e-3, max: 20, noNaN: true }), { minLength: 1, maxLength: 6 });
    fc.assert(
      fc.property(present, directions, (middle, direction) => {
        const step = 1e-4;
        const solution = solutionOf("molality", middle.length);
        const at = (sign: number) => {
          const solutes = middle.map((m, index) => m * (1 + sign * step * direction[index]!));
          const { lnActivityCoefficients, lnSolventActivity } = solution.state(300, 1e5, {
            solventMoleFraction: 0.5,
            solutes,
          });
          return { ln: solutes.map((m, index) => Math.log(m) + lnActivityCoefficients[index]!), lnSolventActivity };
        };
        const [after, before] = [at(1), at(-1)];
        const ofSolutes = middle.reduce((sum, m, index) => sum + m * (after.ln[index]! - before.ln[index]!), 0);
        const ofSolvent = (after.lnSolventActivity - before.lnSolventActivity) / water.molarMassKgPerMol;
        const size = middle.reduce((sum, m) => sum + m, 0);
        // The central difference of ln m is off by step^2 / 3 of 2 step, and each logarithm is rounded.
        expect(Math.abs(ofSolutes + ofSolvent)).toBeLessThan(size * (step ** 3 + 1e-14));
      }),
      runs,
    );
  });

  test("the order of solutes shows in no bit", () => {
    fc.assert(
      fc.property(
        molalities.chain((values) =>
          fc.tuple(
            fc.constant(values),
            fc.shuffledSubarray(values, { minLength: values.length, maxLength: values.length }),
          ),
        ),
        ([values, shuffled]) => {
          const solution = solutionOf("molality", values.length);
          const of = (solutes: number[]) => solution.state(300, 1e5, { solventMoleFraction: 0.5, solutes });
          expect(of(shuffled)).toEqual(of(values));
        },
      ),
      runs,
    );
  });

  test("temperature and pressure change nothing", () => {
    const amounts = { solventMoleFraction: 0.9, solutes: [0.3, 0.4] };
    const solution = solutionOf("molality", 2);
    expect(solution.state(500, 1e8, amounts)).toEqual(solution.state(280, 1, amounts));
  });
});

describe("on the mole-fraction scale", () => {
  test("every activity is a mole fraction, the solvent's too: Raoult's law", () => {
    const state = solutionOf("mole-fraction", 2).state(350, 1e5, { solventMoleFraction: 0.25, solutes: [0.5, 0.25] });
    expect(state.lnActivityCoefficients).toEqual([0, 0]);
    expect(state.lnSolventActivity).toBeCloseTo(-2 * Math.LN2, 15);
  });

  test("a pure component has activity 1", () => {
    const state = solutionOf("mole-fraction", 1).state(350, 1e5, { solventMoleFraction: 1, solutes: [0] });
    expect(state).toStrictEqual({ lnActivityCoefficients: [0], lnSolventActivity: 0 });
  });
});

test("both scales meet at infinite dilution: ln x(solvent) = -M sum of m within its square", () => {
  fc.assert(
    fc.property(fc.double({ min: 1e-6, max: 0.1, noNaN: true }), (m) => {
      const share = water.molarMassKgPerMol * m;
      const amounts = { solventMoleFraction: 1 / (1 + share), solutes: [m] };
      const dilute = solutionOf("molality", 1).state(300, 1e5, amounts).lnSolventActivity;
      const mixture = solutionOf("mole-fraction", 1).state(300, 1e5, amounts).lnSolventActivity;
      expect(Math.abs(dilute - mixture)).toBeLessThan(share * share + 1e-15);
    }),
    runs,
  );
});

test("a state belongs to the caller", () => {
  const solution = solutionOf("molality", 1);
  const amounts = { solventMoleFraction: 0.9, solutes: [1] };
  (solution.state(300, 1e5, amounts).lnActivityCoefficients as number[])[0] = 5;
  expect(solution.state(300, 1e5, amounts).lnActivityCoefficients).toEqual([0]);
});
