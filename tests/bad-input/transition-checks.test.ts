import { describe, expect, test } from "vitest";
import { computeWitness } from "../../src/checks/witness-checks.js";
import { Al_cr, Al_l, referenceData } from "../../src/data/index.js";
import type { Witness } from "../../src/species/record.js";
import { faultsOf } from "../errors/faults-of.js";

/** Anything, as plain JavaScript may pass it. */
// biome-ignore lint/suspicious/noExplicitAny: the subject of this table is what types forbid
type Anything = any;

const figure = (value: Anything, unit: Anything): Anything => ({ value, unit, source: "chase1998", origin: "memory" });
const fusion: Anything = {
  group: "formation",
  kind: "physical",
  check: "transition-temperature",
  against: { transitionTemperature: figure(933.47, "K"), transitionEnthalpy: figure(10.711, "kJ/mol") },
  reaction: { "Al(cr)": -1, "Al(l)": 1 },
  deviation: 0,
  tolerance: 1,
  source: "chase1998",
};
const checks: readonly Witness["check"][] = [
  "transition-enthalpy",
  "transition-gibbs-energy",
  "transition-temperature",
];
const run = (changes: Anything): unknown => computeWitness(Al_l, { ...fusion, ...changes }, referenceData);

describe.each(checks)("%s", (check) => {
  test.each([
    ["no figures at all", { against: undefined }, "checks/no-inputs"],
    ["no temperature", { against: { transitionEnthalpy: figure(10.711, "kJ/mol") } }, "checks/no-inputs"],
    ["no reaction", { reaction: undefined }, "checks/no-inputs"],
    ["an empty reaction", { reaction: {} }, "checks/no-inputs"],
    ["a phase that nobody has", { reaction: { "Al(cr)": -1, "Al(am)": 1 } }, "checks/no-inputs"],
    [
      "a unit that nobody knows",
      { against: { ...fusion.against, transitionTemperature: figure(933.47, "degrees") } },
      "quantity/unknown-unit",
    ],
  ])("%s", (_, changes, code) => {
    expect(faultsOf(() => run({ check, ...(changes as object) }))[0]!.code).toBe(code);
  });
});

test("no published enthalpy", () => {
  const against = { transitionTemperature: figure(933.47, "K") };
  const [fault] = faultsOf(() => run({ check: "transition-enthalpy", against }));
  expect(fault).toMatchObject({
    code: "checks/no-inputs",
    path: ["Al(l)", "witnesses", "transition-enthalpy"],
    expected: expect.stringContaining("transitionEnthalpy"),
  });
});

test("G is not compared outside the range of a phase", () => {
  const against = { transitionTemperature: figure(950, "K") };
  const witness = { ...fusion, check: "transition-gibbs-energy", against };
  expect(faultsOf(() => computeWitness(Al_cr, witness, referenceData))[0]!.code).toBe("species/outside-range");
});
