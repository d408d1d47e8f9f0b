import { describe, expect, test } from "vitest";
import { referenceData } from "../../src/data/index.js";
import { balance, combineReactions, reaction } from "../../src/reaction/index.js";
import { faultsOf } from "../errors/faults-of.js";

/** Anything, as plain JavaScript may pass it. */
// biome-ignore lint/suspicious/noExplicitAny: the subject of this table is what types forbid
type Anything = any;

const huge = "x".repeat(1_000_000);
const synthesis = reaction("N2 + 3 H2 = 2 NH3", referenceData);
const sides = (reactants: unknown, products: unknown): Anything => ({ reactants, products });

describe.each<[string, () => unknown, string, string?]>([
  ["nothing to balance", () => balance(undefined as Anything), "reaction/empty at equation"],
  ["a huge text", () => balance(huge), "reaction/too-long at equation"],
  ["a reaction, not an equation", () => balance(synthesis as Anything), "input/unknown-key at equation.terms"],
  ["a charge without a caret", () => balance("Na+ + Cl- = NaCl"), "reaction/syntax at equation", "caret"],
  ["the electron without a caret", () => balance("Fe^3+ + e- = Fe^2+"), "formula/charge-order at equation", "e^-"],
  ["a name without a collection", () => balance("ammonia = N2 + H2"), "formula/unknown-element at equation"],
  ["a lone side", () => balance(sides(["H2"], [])), "reaction/empty at equation.products"],
  ["a text for a side", () => balance(sides("H2", ["H"])), "input/not-an-array at equation.reactants"],
  ["huge names", () => balance(sides([huge], ["H"])), "input/too-large at equation.reactants.0"],
  [
    "a million names",
    () => balance(sides(Array(1_000_000).fill("H2"), ["H"])),
    "input/too-large at equation.reactants",
  ],
  ["a hole in a side", () => balance(sides(new Array(1), ["H"])), "input/not-a-string at equation.reactants.0"],
  [
    "a prototype",
    () => balance(JSON.parse('{ "__proto__": 1, "reactants": ["H2"], "products": ["H"] }')),
    "input/forbidden-key at equation.__proto__",
  ],
  ["a collection of text", () => balance("H2 = H", "data" as Anything), "input/not-an-object at collection"],
  ["an unknown species", () => balance("N2 + H2 = NH5(g)", referenceData), "species/not-found at equation", "NH3(g)"],
  ["what cannot be balanced", () => balance("Fe = FeO"), "reaction/not-balanceable at equation"],
  ["a reaction to combine by text", () => combineReactions("N2" as Anything), "input/not-an-array at parts"],
  [
    "an equation as a part",
    () => combineReactions([{ reaction: "N2 = 2 N" as Anything, coefficient: 1 }]),
    "reaction/not-a-reaction at parts.0.reaction",
    "reads an equation",
  ],
  [
    "a coefficient of text",
    () => combineReactions([{ reaction: synthesis, coefficient: huge }]),
    "reaction/syntax at parts.0.coefficient",
  ],
  [
    "an infinite coefficient",
    () => combineReactions([{ reaction: synthesis, coefficient: Number.NEGATIVE_INFINITY }]),
    "input/not-finite at parts.0.coefficient",
  ],
  [
    "a huge coefficient",
    () => combineReactions([{ reaction: synthesis, coefficient: "9".repeat(300) }]),
    "reaction/coefficient-out-of-range at parts",
  ],
])("%s", (_name, call, place, hint) => {
  test("is refused, in one readable line", () => {
    const faults = faultsOf(call);
    const found = faults.find(({ code, path }) => `${code} at ${path.join(".")}` === place);
    expect(faults.map(({ code, path }) => `${code} at ${path.join(".")}`)).toContain(place);
    if (hint !== undefined) expect(found?.hint).toContain(hint);
    for (const { message, received, expected } of faults) {
      expect(message.length).toBeLessThanOrEqual(500);
      expect(message).not.toContain("\n");
      expect(received?.length ?? 0).toBeLessThanOrEqual(250);
      expect(expected?.length ?? 0).toBeLessThanOrEqual(500);
    }
  });
});

test("a hundred species of long labels that take no part are told in one line", () => {
  const elements = ["Li", "Na", "K", "Rb", "Cs", "Be", "Mg", "Ca", "Sr", "Ba"];
  const reactants = elements.map((symbol) => `${symbol}(cr,${"polymorph".repeat(4)})`);
  const faults = faultsOf(() => balance({ reactants, products: ["N2"] }));
  expect(faults).toHaveLength(11);
  for (const { message, received } of faults) {
    expect(message.length).toBeLessThanOrEqual(300);
    expect(received?.length).toBeLessThanOrEqual(250);
  }
});
