import { expect, test } from "vitest";
import { computeWitness } from "../../src/checks/index.js";
import { Mg_g, referenceData } from "../../src/data/index.js";
import { faultsOf } from "../errors/faults-of.js";

/** Anything, as plain JavaScript may pass it. */
// biome-ignore lint/suspicious/noExplicitAny: the subject of this table is what types forbid
type Anything = any;

const figure = (value: Anything, unit: Anything): Anything => ({ value, unit, source: "chase1998", origin: "memory" });
const atZero: Anything = {
  group: "caloric",
  kind: "transcription",
  check: "formation-enthalpy-at-0-K",
  against: { formationEnthalpy: figure(147.1, "kJ/mol"), formationEnthalpyAt0K: figure(145.901, "kJ/mol") },
  reaction: { "Mg(cr)": -1, "Mg(g)": 1 },
  deviation: 0,
  tolerance: 1,
  source: "chase1998",
};
const against = (changes: Anything): Anything => ({ against: { ...atZero.against, ...changes } });
const row = (value: Anything): Anything => ({
  check: "tabulated-enthalpy-increment",
  against: { "0 K": figure(value, "kJ/mol") },
});

test.each<[string, Anything, string]>([
  ["no figures at all", { against: undefined }, "checks/no-inputs"],
  ["no figure at 0 K", against({ formationEnthalpyAt0K: undefined }), "checks/no-inputs"],
  ["no reaction", { reaction: undefined }, "checks/no-inputs"],
  ["an empty reaction", { reaction: {} }, "checks/no-inputs"],
  ["a phase that nobody has", { reaction: { "Mg(am)": -1, "Mg(g)": 1 } }, "checks/no-inputs"],
  ["amounts that are no numbers", { reaction: { "Mg(cr)": "-1", "Mg(g)": 1 } }, "checks/no-inputs"],
  ["an amount that is not finite", { reaction: { "Mg(cr)": -Infinity, "Mg(g)": 1 } }, "checks/no-inputs"],
  ["a species that has no increment", { reaction: { "Na(cr)": -1, "Mg(g)": 1 } }, "checks/no-inputs"],
  ["an increment besides", against({ enthalpyAbove0K: figure(6.197, "kJ/mol") }), "checks/no-inputs"],
  ["a figure that is not finite", against({ formationEnthalpyAt0K: figure(Number.NaN, "kJ/mol") }), "input/not-finite"],
  ["a text for a figure", against({ formationEnthalpyAt0K: figure("145.901", "kJ/mol") }), "input/not-finite"],
  ["a unit that nobody knows", against({ formationEnthalpy: figure(1, "kilojoules") }), "quantity/unknown-unit"],
  ["a row at 0 K that is not finite", row(Number.POSITIVE_INFINITY), "input/not-finite"],
])("%s", (_, changes, code) => {
  const [fault] = faultsOf(() => computeWitness(Mg_g, { ...atZero, ...changes }, referenceData));
  expect(fault).toMatchObject({ code, message: expect.stringMatching(/\S/) });
});

test("a row at 0 K of a record without the increment", () => {
  const { enthalpyAbove0K: _left, ...bare } = Mg_g;
  const [fault] = faultsOf(() => computeWitness(bare, { ...atZero, ...row(-6.197) }, referenceData));
  expect(fault).toMatchObject({
    code: "checks/no-inputs",
    path: ["Mg(g)", "witnesses", "tabulated-enthalpy-increment"],
    expected: expect.stringContaining("enthalpyAbove0K"),
  });
});
