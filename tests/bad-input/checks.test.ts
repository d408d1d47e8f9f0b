import { expect, test } from "vitest";
import { computeWitness, recomputeWitnesses } from "../../src/checks/index.js";
import { Cl_minus_aq, referenceData } from "../../src/data/index.js";
import { faultsOf } from "../errors/faults-of.js";

/** Anything, as plain JavaScript may pass it. */
// biome-ignore lint/suspicious/noExplicitAny: the subject of this table is what types forbid
type Anything = any;

const potential = Cl_minus_aq.witnesses.find(({ check }) => check === "cell-potential") as Anything;
const place = "Cl^-(aq).witnesses.cell-potential";
const asked = (change: object): (() => unknown) => {
  return () => computeWitness(Cl_minus_aq, { ...potential, ...change }, referenceData);
};
const against = (change: object): object => ({ against: { ...potential.against, ...change } });

test.each<[string, () => unknown, string, string]>([
  ["no record", () => computeWitness(null as Anything, potential, referenceData), "input/not-an-object", "record"],
  ["no witness", () => computeWitness(Cl_minus_aq, 7 as Anything, referenceData), "input/not-an-object", "witness"],
  ["no collection", () => computeWitness(Cl_minus_aq, potential, [] as Anything), "input/not-an-object", "collection"],
  [
    "species that are no array",
    () => computeWitness(Cl_minus_aq, potential, { species: 7 } as Anything),
    "input/not-an-array",
    "collection.species",
  ],
  [
    "a record without witnesses",
    () => recomputeWitnesses({ label: "Cl^-(aq)" } as Anything, referenceData),
    "input/missing",
    "record.witnesses",
  ],
  ["a name of the prototype", asked({ check: "__proto__" }), "checks/no-inputs", "Cl^-(aq).witnesses.__proto__"],
  ["a reaction that is a number", asked({ reaction: 7 }), "checks/no-inputs", place],
  ["a stoichiometric text", asked({ reaction: { ...potential.reaction, "e^-": "-1" } }), "checks/no-inputs", place],
  ["not a number of electrons", asked({ reaction: { "e^-": Number.NaN } }), "checks/no-inputs", place],
  ["no electrons at all", asked({ reaction: { "e^-": 0, "Cl^-(aq)": 1 } }), "checks/no-inputs", place],
  ["a species that nobody holds", asked({ reaction: { "e^-": -1, "Xx(aq)": 1 } }), "checks/no-inputs", place],
  ["figures that are a number", asked({ against: 7 }), "checks/no-inputs", place],
  ["a figure that is a number", asked(against({ cellPotential: 7 })), "input/not-finite", "against"],
  ["a figure that is null", asked(against({ cellPotential: null })), "input/not-finite", "against"],
  [
    "an infinite potential",
    asked(against({ cellPotential: { value: Number.POSITIVE_INFINITY, unit: "V" } })),
    "input/not-finite",
    "against",
  ],
  [
    "an unknown unit",
    asked(against({ cellPotential: { value: 1, unit: "volt" } })),
    "quantity/unknown-unit",
    "against",
  ],
])("%s", (_, call, code, path) => {
  const [fault] = faultsOf(call);
  expect([fault?.code, fault?.path.join(".")]).toEqual([code, path]);
});
