import { describe, expect, test } from "vitest";
import { type GibbsLedgerError, isGibbsLedgerError } from "../../src/errors/gibbs-ledger-error.js";
import type { GasComponent } from "../../src/fugacity/equation-of-state.js";
import { idealGas } from "../../src/fugacity/ideal-gas.js";
import { lewisFugacityRule } from "../../src/fugacity/lewis-fugacity-rule.js";
import { virial } from "../../src/fugacity/virial.js";
import { component } from "./gases.js";

const nitrogen = component("N2(g)");
const bare = { label: "X(g)" };

function faultsOf(call: () => unknown): readonly { code: string; path: string; hint: string | undefined }[] {
  try {
    call();
  } catch (error) {
    if (!isGibbsLedgerError(error)) throw error;
    return error.faults.map(({ code, path, hint }) => ({ code, path: path.join("."), hint }));
  }
  throw new Error("nothing was refused");
}

/** Anything as the options of virial, as plain JavaScript may pass. */
function options(value: unknown): Parameters<typeof virial>[0] {
  return value as Parameters<typeof virial>[0];
}

describe("options", () => {
  test.each([
    [null, "input/not-an-object", "options"],
    ["abbott", "input/not-an-object", "options"],
    [{ kij: 0.1 }, "input/unknown-key", "options.kij"],
    [{ corelation: "abbott" }, "input/unknown-key", "options.corelation"],
    [{ correlation: "Abbot" }, "input/unknown-option", "options.correlation"],
    [{ correlation: null }, "input/unknown-option", "options.correlation"],
    [{ outsideValidity: "ignore" }, "input/unknown-option", "options.outsideValidity"],
    [{ binaryInteraction: [] }, "input/not-an-object", "options.binaryInteraction"],
    [{ binaryInteraction: { A: 0.1 } }, "input/not-an-object", "options.binaryInteraction.A"],
    [{ binaryInteraction: { A: { B: "0.1" } } }, "fugacity/binary-interaction", "options.binaryInteraction.A.B"],
    [{ binaryInteraction: { A: { B: 1 } } }, "fugacity/binary-interaction", "options.binaryInteraction.A.B"],
    [{ binaryInteraction: { A: { B: Number.NaN } } }, "fugacity/binary-interaction", "options.binaryInteraction.A.B"],
    [{ binaryInteraction: { A: { A: 0.1 } } }, "fugacity/binary-interaction", "options.binaryInteraction.A.A"],
    [{ polar: { A: { a: 1 } } }, "input/missing", "options.polar.A.b"],
    [{ polar: { A: { a: Number.POSITIVE_INFINITY, b: 0 } } }, "input/not-finite", "options.polar.A.a"],
    [{ polar: 1 }, "input/not-an-object", "options.polar"],
    [{ polar: {}, correlation: "abbott" }, "fugacity/conflicting-options", "options.polar"],
    [{ secondVirialCoefficient: -1e-4 }, "fugacity/coefficient-function", "options.secondVirialCoefficient"],
    [JSON.parse('{"__proto__":{}}'), "input/forbidden-key", "options.__proto__"],
    [JSON.parse('{"polar":{"__proto__":{"a":1,"b":1}}}'), "input/forbidden-key", "options.polar.__proto__"],
  ])("%j: %s at %s", (given, code, path) => {
    expect(faultsOf(() => virial(options(given)))).toEqual(
      expect.arrayContaining([expect.objectContaining({ code, path })]),
    );
  });

  test("near misses get a hint", () => {
    expect(faultsOf(() => virial(options({ corelation: "abbott" })))[0]!.hint).toBe("did you mean correlation?");
    expect(faultsOf(() => virial(options({ correlation: "Abbot" })))[0]!.hint).toBe("did you mean abbott?");
  });

  test("two values for one pair are refused in both places", () => {
    const given = { binaryInteraction: { A: { B: 0.1 }, B: { A: 0.2 } } };
    expect(faultsOf(() => virial(given)).map(({ path }) => path)).toEqual([
      "options.binaryInteraction.A.B",
      "options.binaryInteraction.B.A",
    ]);
  });

  test("options beside the caller's function, and all other faults, are reported together", () => {
    const given = {
      correlation: "abbott",
      polar: {},
      binaryInteraction: {},
      secondVirialCoefficient: () => 0,
      outsideValidity: "no",
    };
    expect(faultsOf(() => virial(options(given))).map(({ code, path }) => `${code} ${path}`)).toEqual([
      "input/unknown-option options.outsideValidity",
      "fugacity/conflicting-options options.polar",
      "fugacity/conflicting-options options.correlation",
      "fugacity/conflicting-options options.binaryInteraction",
      "fugacity/conflicting-options options.polar",
    ]);
  });
});

describe("components", () => {
  const critical = { temperatureK: 126.2, pressurePa: 3398000, acentricFactor: 0.037 };
  const cases: [unknown, string, string][] = [
    ["N2(g)", "input/not-an-array", "gas"],
    [[], "conditions/missing-composition", "gas"],
    [[null], "input/not-an-object", "gas.0"],
    [["N2(g)"], "input/not-an-object", "gas.0"],
    [[{}], "input/missing", "gas.0.label"],
    [[{ label: "" }], "input/not-a-string", "gas.0.label"],
    [[{ label: "__proto__" }], "input/forbidden-key", "gas.0.label"],
    [[nitrogen, nitrogen], "conditions/duplicate-label", "gas.N2(g)"],
    [[{ label: "A", critical: 1 }], "input/not-an-object", "gas.A.critical"],
    [[{ label: "A", critical: {} }], "input/missing", "gas.A.critical.temperatureK"],
    [[{ label: "A", critical: { ...critical, omega: 0 } }], "input/unknown-key", "gas.A.critical.omega"],
    ...(
      [
        ["temperatureK", 0],
        ["temperatureK", Number.NaN],
        ["pressurePa", -1],
        ["pressurePa", "33.98 bar"],
        ["acentricFactor", 37],
        ["acentricFactor", Number.NaN],
        ["volumeM3PerMol", 0],
        ["volumeM3PerMol", Number.POSITIVE_INFINITY],
      ] as const
    ).map(([key, value]): [unknown, string, string] => [
      [{ label: "A", critical: { ...critical, [key]: value } }],
      "fugacity/invalid-critical-constants",
      `gas.A.critical.${key}`,
    ]),
  ];
  test.each(cases)("%j: %s at %s", (given, code, path) => {
    const components = given as readonly GasComponent[];
    for (const equation of [virial(), idealGas(), lewisFugacityRule(virial())]) {
      expect(faultsOf(() => equation.mixture(components, ["gas"]))).toEqual(
        expect.arrayContaining([expect.objectContaining({ code, path })]),
      );
    }
  });

  test("every component that lacks critical constants is named at once", () => {
    const withoutOmega = { label: "Y(g)", critical: { temperatureK: 300, pressurePa: 5e6 } };
    for (const equation of [virial(), lewisFugacityRule(virial({ correlation: "abbott" }))]) {
      expect(
        faultsOf(() => equation.mixture([bare, nitrogen, withoutOmega], ["gas"])).map(({ code, path }) => [code, path]),
      ).toEqual([
        ["fugacity/missing-critical-constants", "gas.X(g)"],
        ["fugacity/missing-critical-constants", "gas.Y(g)"],
      ]);
    }
  });

  test("parameters under a bare formula are refused with the label", () => {
    const equation = virial({ binaryInteraction: { N2: { "CH4(g)": 0.03 } }, polar: { N2: { a: 0, b: 0 } } });
    expect(faultsOf(() => equation.mixture([nitrogen]))).toEqual([
      { code: "conditions/unknown-label", path: "options.binaryInteraction.N2", hint: 'did you mean "N2(g)"?' },
      { code: "conditions/unknown-label", path: "options.polar.N2", hint: 'did you mean "N2(g)"?' },
    ]);
  });
});

describe("states", () => {
  test.each([
    [Number.NaN, 1e5, [1], "quantity/not-positive", "gas.temperatureK"],
    [0, 1e5, [1], "quantity/not-positive", "gas.temperatureK"],
    [Number.POSITIVE_INFINITY, 1e5, [1], "quantity/not-positive", "gas.temperatureK"],
    [300, 0, [1], "quantity/not-positive", "gas.pressurePa"],
    [300, Number.NaN, [1], "quantity/not-positive", "gas.pressurePa"],
    [300, 1e5, [], "conditions/missing-composition", "gas.moleFractions"],
    [300, 1e5, [0.5, 0.5], "conditions/missing-composition", "gas.moleFractions"],
    [1e300, 1e-300, [1], "fugacity/unphysical", "gas"],
  ])("%d K, %d Pa, %j: %s at %s", (temperatureK, pressurePa, fractions, code, path) => {
    for (const equation of [virial(), idealGas()]) {
      const mixture = equation.mixture([nitrogen], ["gas"]);
      expect(faultsOf(() => mixture.state(temperatureK, pressurePa, fractions))).toEqual([
        expect.objectContaining({ code, path }),
      ]);
    }
  });

  test.each([
    [1e-300, 1e5],
    [1e-30, 1e-30],
    [20, 1e6],
    [300, 1e300],
  ])("at %d K and %d Pa the virial equation gives no gas, and continuing does not help", (temperatureK, pressurePa) => {
    const mixture = virial({ outsideValidity: "continue" }).mixture([component("CO2(g)")], ["gas"]);
    expect(faultsOf(() => mixture.state(temperatureK, pressurePa, [1]))).toEqual([
      expect.objectContaining({ code: "fugacity/unphysical", path: "gas" }),
    ]);
  });

  test("NaN among the fractions is no state", () => {
    const mixture = virial().mixture([nitrogen]);
    expect(faultsOf(() => mixture.state(300, 1e5, [Number.NaN]))[0]!.code).toBe("fugacity/unphysical");
  });
});

describe("validity", () => {
  // Vc = 94.07 cm3/mol, so the limit is 188.14 cm3/mol.
  const carbonDioxide = virial().mixture([component("CO2(g)")], ["gas"]);
  const volumeAt = (mixture: typeof carbonDioxide, pressurePa: number) =>
    mixture.state(350, pressurePa, [1]).molarVolume;

  test("holds up to half the critical density and not beyond", () => {
    // V = RT/p + B = 2 Vc at the limit; B at 1 Pa is the Gibbs energy departure.
    const b = carbonDioxide.state(350, 1, [1]).departure.gibbsEnergy;
    const limitPa = (8.31446261815324 * 350) / (188.14e-6 - b);
    expect(volumeAt(carbonDioxide, limitPa * (1 - 1e-12))).toBeGreaterThan(188.14e-6);
    expect(faultsOf(() => volumeAt(carbonDioxide, limitPa * (1 + 1e-12)))[0]).toMatchObject({
      code: "fugacity/outside-validity",
      path: "gas",
    });
  });

  test("the message says the volume and the limit, the hint the ways out", () => {
    let caught: unknown;
    try {
      carbonDioxide.state(350, 1.2e7, [1]);
    } catch (error) {
      caught = error;
    }
    const [fault] = (caught as GibbsLedgerError).faults;
    expect(fault!.message).toContain("0.0001881 m3/mol");
    expect(fault!.message).toContain("0.0001577 m3/mol");
    expect(fault!.hint).toMatch(/lower the pressure.*cubic equation of state.*outsideValidity: "continue"/);
  });

  test("continuing gives the state and says so", () => {
    const state = virial({ outsideValidity: "continue" })
      .mixture([component("CO2(g)")])
      .state(350, 1.2e7, [1]);
    expect(state.outsideValidity).toContain("half the critical density");
    expect(state.molarVolume).toBeCloseTo(0.0001577, 6);
    expect(carbonDioxide.state(350, 1e6, [1])).not.toHaveProperty("outsideValidity");
  });

  test("with the caller's function and no critical volume the limit is |B|p/RT = 1/4", () => {
    const own = (b: number) =>
      virial({ secondVirialCoefficient: () => ({ value: b, temperatureDerivative: 0 }) }).mixture([bare]);
    const thermal = 8.31446261815324 * 300;
    expect(own(-0.249 * thermal).state(300, 1, [1]).compressibilityFactor).toBeCloseTo(0.751, 12);
    expect(own(0.249 * thermal).state(300, 1, [1]).compressibilityFactor).toBeCloseTo(1.249, 12);
    for (const factor of [-0.251, 0.251]) {
      expect(faultsOf(() => own(factor * thermal).state(300, 1, [1]))[0]!.code).toBe("fugacity/outside-validity");
    }
  });
});

describe("the caller's function", () => {
  test.each([
    [undefined, "gas.X(g)"],
    [-1e-4, "gas.X(g)"],
    [{}, "gas.X(g)"],
    [{ value: Number.NaN, temperatureDerivative: 0 }, "gas.X(g)"],
    [{ value: -1e-4 }, "gas.X(g)"],
    [{ value: -1e-4, temperatureDerivative: Number.POSITIVE_INFINITY }, "gas.X(g)"],
    [{ value: "-1e-4", temperatureDerivative: 0 }, "gas.X(g)"],
    [Promise.resolve({ value: -1e-4, temperatureDerivative: 0 }), "gas.X(g)"],
  ])("that gives %j is refused at %s", (answer, path) => {
    const given = options({ secondVirialCoefficient: () => answer });
    const mixture = virial(given).mixture([bare], ["gas"]);
    expect(faultsOf(() => mixture.state(300, 1e5, [1]))).toEqual([
      expect.objectContaining({ code: "fugacity/coefficient-function", path }),
    ]);
  });

  test("that gives cm3/mol is refused with a hint", () => {
    const mixture = virial({ secondVirialCoefficient: () => ({ value: -388, temperatureDerivative: 0 }) }).mixture([
      bare,
    ]);
    expect(faultsOf(() => mixture.state(473.15, 1e6, [1]))).toEqual([
      { code: "fugacity/unphysical", path: "", hint: expect.stringContaining("-388e-6") },
    ]);
  });

  test("that throws is not caught", () => {
    const own = new RangeError("mine");
    const equation = virial({
      secondVirialCoefficient: () => {
        throw own;
      },
    });
    expect(() => equation.mixture([bare]).state(300, 1e5, [1])).toThrow(own);
  });
});

test.each([undefined, null, 1, virial, {}, { name: "x", parameters: {} }])("%j is no equation of state", (given) => {
  expect(faultsOf(() => lewisFugacityRule(given as ReturnType<typeof virial>))).toEqual([
    {
      code: "input/not-an-object",
      path: "equationOfState",
      hint: given === virial ? "call it: virial(), not virial" : undefined,
    },
  ]);
});
