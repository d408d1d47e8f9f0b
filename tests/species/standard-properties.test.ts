import { describe, expect, test } from "vitest";
import { CaCO3_cr_calcite, N2_g, referenceData } from "../../src/data/index.js";
import { isInRange, standardProperties } from "../../src/species/standard-properties.js";
import { faultsOf } from "../errors/faults-of.js";
import { figure } from "../heat-capacity/random-series.js";
import { fitted, polynomialRecord, recordOf } from "./records.js";

const kelvin = (value: number) => ({ value, unit: "K" }) as const;

describe("at 298.15 K the reference data give their own figures", () => {
  // Phases of higher temperatures do not reach down to it.
  const known = referenceData.species.filter((record) => isInRange(record, 298.15));
  test("most of them reach it", () => {
    expect(known.length).toBeGreaterThan(0.85 * referenceData.species.length);
  });

  test.each(known.map((record) => [record.label, record] as const))("%s", (_label, record) => {
    const properties = standardProperties(record, { temperature: kelvin(298.15) });
    const { formationEnthalpy, standardEntropy } = record;
    // Other compilations than that of the fit: 0.1 kJ/mol and 0.1 J/mol/K are the coarsest of their uncertainties.
    if (formationEnthalpy !== undefined) {
      const joules = formationEnthalpy.value * (formationEnthalpy.unit === "kJ/mol" ? 1000 : 1);
      expect(Math.abs(properties.enthalpy.value - joules)).toBeLessThan(200);
    }
    if (standardEntropy !== undefined) {
      expect(Math.abs(properties.entropy.value - standardEntropy.value)).toBeLessThan(0.2);
    }
    expect(properties.outsideRange).toEqual([]);
  });
});

test("a reference point has H, S and G at 298.15 K and no heat capacity", () => {
  const ion = recordOf("Fe^3+(aq)", {
    formationEnthalpy: figure(-48.5, "kJ/mol"),
    standardEntropy: figure(-315.9, "J/mol/K"),
  });
  const properties = standardProperties(ion, { temperature: { value: 25, unit: "Cel" } });
  expect(properties).toEqual({
    enthalpy: { value: -48500, unit: "J/mol" },
    entropy: { value: -315.9, unit: "J/mol/K" },
    gibbsEnergy: { value: expect.closeTo(-48500 + 298.15 * 315.9, 9), unit: "J/mol" },
    outsideRange: [],
  });
  expect(Object.hasOwn(properties, "heatCapacity")).toBe(false);
  for (const outsideRange of ["refuse", "constant-heat-capacity", "continue-fit"] as const) {
    const [fault] = faultsOf(() => standardProperties(ion, { temperature: kelvin(300), outsideRange }));
    expect(fault).toMatchObject({ code: "species/outside-range", path: ["temperature"], expected: "only at 298.15 K" });
    expect(fault?.hint).toBeUndefined();
  }
});

test("a gas published at 1 atm gains R ln(atm/bar) of entropy, a condensed phase nothing", () => {
  const at = (label: string, pressure: number) =>
    standardProperties(polynomialRecord(label, 0, 100, [30], [0], { standardPressure: figure(pressure, "atm") }), {
      temperature: kelvin(500),
    }).entropy.value;
  const inBar = (label: string) =>
    standardProperties(polynomialRecord(label, 0, 100, [30]), { temperature: kelvin(500) }).entropy.value;
  // R ln 1.01325 = 8.31446261815324 x 0.013163004 = 0.10944
  expect(at("He(g)", 1) - inBar("He(g)")).toBeCloseTo(0.10944, 5);
  expect(at("Fe(cr)", 1)).toBe(inBar("Fe(cr)"));
  expect(
    standardProperties(polynomialRecord("Ne(g)", 0, 100, [30], [0], { standardPressure: figure(100, "kPa") }), {
      temperature: kelvin(500),
    }).entropy.value,
  ).toBe(inBar("Ne(g)"));
});

test("outside its range a record is refused, or goes on as told and says so", () => {
  const [fault] = faultsOf(() => standardProperties(N2_g, { temperature: kelvin(100) }));
  expect(fault).toMatchObject({
    code: "species/outside-range",
    path: ["temperature"],
    received: "100 K",
    expected: "from 200 K to 6000 K",
  });
  expect(fault?.hint).toContain("constant-heat-capacity");
  for (const outsideRange of ["constant-heat-capacity", "continue-fit"] as const) {
    const properties = standardProperties(N2_g, { temperature: kelvin(199), outsideRange });
    expect(properties.outsideRange).toEqual(["N2(g)"]);
    expect(standardProperties(N2_g, { temperature: kelvin(300), outsideRange }).outsideRange).toEqual([]);
    for (const value of [0.99, 100_001, 1e300]) {
      expect(faultsOf(() => standardProperties(N2_g, { temperature: kelvin(value), outsideRange }))[0]?.code).toBe(
        "species/outside-range",
      );
    }
    expect(Object.values(standardProperties(N2_g, { temperature: kelvin(100_000), outsideRange }).gibbsEnergy)).toEqual(
      [expect.any(Number), "J/mol"],
    );
  }
});

test("figures in calories and a transition inside the fit", () => {
  const record = recordOf("FeS(cr)", {
    formationEnthalpy: figure(-24, "kcal_th/mol"),
    standardEntropy: figure(14.4, "cal_th/mol/K"),
    transitions: [{ temperature: figure(411, "K"), into: "FeS(cr,beta)", enthalpy: figure(0.57, "kcal_th/mol") }],
    gibbsFunction: fitted({
      kind: "series",
      form: "maier-kelley",
      unit: "cal_th/mol/K",
      intervals: [
        { from: 298, to: 411, coefficients: [5, 0.02, 0], endsAt: "first-order" },
        { from: 411, to: 600, coefficients: [17, 0, 0], endsAt: "fit" },
      ],
    }),
  });
  const below = standardProperties(record, { temperature: kelvin(411) });
  const above = standardProperties(record, { temperature: kelvin(411.0000000001) });
  expect(standardProperties(record, { temperature: kelvin(298.15) }).enthalpy.value).toBeCloseTo(-24 * 4184, 8);
  expect(above.enthalpy.value - below.enthalpy.value).toBeCloseTo(570 * 4.184, 5);
  expect(above.entropy.value - below.entropy.value).toBeCloseTo((570 * 4.184) / 411, 8);
});

test.each<[string, unknown, unknown, string]>([
  ["no record", undefined, { temperature: kelvin(300) }, "input/not-an-object at species"],
  ["a label in place of a record", "N2(g)", { temperature: kelvin(300) }, "input/not-an-object at species"],
  ["no conditions", N2_g, undefined, "quantity/not-a-quantity at temperature"],
  ["null", N2_g, null, "quantity/not-a-quantity at temperature"],
  ["a bare number", N2_g, { temperature: 300 }, "quantity/not-a-quantity at temperature"],
  ["a pressure", N2_g, { temperature: { value: 1, unit: "bar" } }, "quantity/wrong-dimension at temperature.unit"],
  ["zero", N2_g, { temperature: kelvin(0) }, "quantity/not-positive at temperature.value"],
  ["NaN", N2_g, { temperature: kelvin(Number.NaN) }, "quantity/not-finite at temperature.value"],
  [
    "a policy of the prototype",
    N2_g,
    { temperature: kelvin(300), outsideRange: "__proto__" },
    "input/unknown-option at outsideRange",
  ],
  [
    "another policy",
    CaCO3_cr_calcite,
    { temperature: kelvin(300), outsideRange: "extrapolate" },
    "input/unknown-option at outsideRange",
  ],
])("%s is refused", (_name, record, conditions, place) => {
  const [fault] = faultsOf(() => standardProperties(record as never, conditions as never));
  expect(`${fault?.code} at ${fault?.path.join(".")}`).toBe(place);
});
