import { describe, expect, test } from "vitest";
import { referenceData } from "../../src/data/reference-data.js";
import { type Reaction, reaction, standardReactionGibbsEnergy } from "../../src/reaction/index.js";
import { faultsOf, placesOf } from "../errors/faults-of.js";
import { collectionOf, polynomialRecord, recordOf } from "../species/records.js";

const synthesis = reaction("N2 + 3 H2 -> 2 NH3", referenceData);
const at700 = { temperature: { value: 700, unit: "K" } } as const;

const ions = collectionOf(
  ...[
    "Fe^3+(aq)",
    "Fe^2+(aq)",
    "H^+(aq)",
    "MnO4^-(aq)",
    "Mn^2+(aq)",
    "H2O(l)",
    "SO4^2-(aq)",
    "(NH4)2SO4(s)",
    "NH4^+(aq)",
  ].map((label) => recordOf(label)),
);

describe("an equation becomes a reaction", () => {
  test("in the library's spelling, with whole records", () => {
    expect(synthesis.equation).toBe("N2(g) + 3 H2(g) = 2 NH3(g)");
    expect(
      synthesis.terms.map(({ label, coefficient, exactCoefficient }) => [label, coefficient, exactCoefficient]),
    ).toEqual([
      ["N2(g)", -1, "-1"],
      ["H2(g)", -3, "-3"],
      ["NH3(g)", 2, "2"],
    ]);
    expect(synthesis.terms[2]?.species).toMatchObject({ name: "ammonia" });
    expect(synthesis.notes).toEqual([]);
  });

  test.each([
    ["½ N2 + 1½ H2 = NH3", "1/2 N2(g) + 3/2 H2(g) = NH3(g)"],
    ["0.5N2+1.5H2⇌NH3", "1/2 N2(g) + 3/2 H2(g) = NH3(g)"],
    ["nitrogen + 3 hydrogen = 2 ammonia", "N2(g) + 3 H2(g) = 2 NH3(g)"],
    ["CaCO3(s) = CaO(s) + CO2", "CaCO3(cr,calcite) = CaO(cr) + CO2(g)"],
    ["2 CO = C(s) + CO2", "2 CO(g) = C(cr,graphite) + CO2(g)"],
  ])("%s", (text, equation) => {
    expect(reaction(text, referenceData).equation).toBe(equation);
  });

  test.each([
    "5 Fe^2+(aq) + MnO4^-(aq) + 8 H^+(aq) = 5 Fe^3+(aq) + Mn^2+(aq) + 4 H2O(l)",
    "5Fe^2++MnO4^-+8H^+=5Fe^3++Mn^2++4H2O",
    "5 Fe²⁺(aq) + MnO₄⁻(aq) + 8 H⁺(aq) → 5 Fe³⁺(aq) + Mn²⁺(aq) + 4 H₂O(l)",
  ])("with ions: %s", (text) => {
    expect(reaction(text, ions).equation).toBe(
      "5 Fe^2+(aq) + MnO4^-(aq) + 8 H^+(aq) = 5 Fe^3+(aq) + Mn^2+(aq) + 4 H2O(l)",
    );
  });

  test("a coefficient before brackets", () => {
    expect(reaction("2(NH4)2SO4(s) = 4 NH4^+ + 2 SO4^2-", ions).equation).toBe(
      "2 (NH4)2SO4(s) = 4 NH4^+(aq) + 2 SO4^2-(aq)",
    );
  });

  test("is frozen to the depth", () => {
    expect([synthesis, synthesis.terms, synthesis.terms[0], synthesis.notes].every(Object.isFrozen)).toBe(true);
  });
});

describe("species that stand more than once", () => {
  test("are combined, and the notes say so", () => {
    const combined = reaction("N2 + H2 + 2 H2 + NH3 = 3 NH3", referenceData);
    expect(combined.equation).toBe("N2(g) + 3 H2(g) = 2 NH3(g)");
    expect(combined.notes).toEqual([
      "H2(g) stands twice on one side and was combined",
      "NH3(g) stands on both sides and was combined",
    ]);
  });

  test("cancel where both sides hold as much", () => {
    const spectator = reaction("N2 + 3 H2 + O2 = 2 NH3 + O2", referenceData);
    expect(spectator.equation).toBe("N2(g) + 3 H2(g) = 2 NH3(g)");
    expect(spectator.notes).toEqual(["O2(g) stands on both sides and was combined", "O2(g) cancels and takes no part"]);
  });

  test("change sides where the other holds more", () => {
    expect(reaction("2 NH3 + N2 + 3 H2 = 4 NH3", referenceData).equation).toBe("N2(g) + 3 H2(g) = 2 NH3(g)");
  });

  test("leave nothing", () => {
    expect(placesOf(() => reaction("N2 = N2", referenceData))).toEqual(["reaction/trivial at equation"]);
  });
});

describe("balance", () => {
  test("every element that is short is named, with the side", () => {
    const faults = faultsOf(() => reaction("N2 + H2 = 3 NH3", referenceData));
    expect(faults.map(({ code, message }) => [code, message])).toEqual([
      ["reaction/unbalanced", "N does not balance: 2 on the left, 3 on the right; the left side is 1 short"],
      ["reaction/unbalanced", "H does not balance: 2 on the left, 9 on the right; the left side is 7 short"],
    ]);
  });

  test("is exact: a difference of 1e-18 is seen", () => {
    expect(reaction("⅓ N2 + H2 = 2/3 NH3", referenceData).equation).toBe("1/3 N2(g) + H2(g) = 2/3 NH3(g)");
    const [fault] = faultsOf(() => reaction("0.333333333333333333 N2 + H2 = 2/3 NH3", referenceData));
    expect(fault?.message).toContain("the left side is 1/1500000000000000000 short");
  });

  test("counts charge", () => {
    expect(faultsOf(() => reaction("Fe^2+ = Fe^3+", ions)).map(({ message }) => message)).toEqual([
      "the charge does not balance: 2 on the left, 3 on the right",
    ]);
  });

  test("an element on one side only", () => {
    expect(faultsOf(() => reaction("N2 = O2", referenceData)).map(({ received }) => received)).toEqual([
      "2 on the left, 0 on the right",
      "0 on the left, 2 on the right",
    ]);
  });
});

describe("what is no reaction", () => {
  test("unknown and ambiguous species are reported together", () => {
    const faults = faultsOf(() => reaction("N2 + H2O + Xx = NH3(G)", referenceData));
    expect(faults.map(({ code, path, hint }) => [code, path.join("."), hint])).toEqual([
      ["species/ambiguous", "equation", expect.stringMatching(/^name the phase, such as H2O\(/)],
      ["species/not-found", "equation", undefined],
      ["species/not-found", "equation", "did you mean NH3(g)?"],
    ]);
  });

  test.each([
    ["1e-10", "0.0000000001 N2 + 0.0000000003 H2 = 0.0000000002 NH3"],
    ["1e300", `${"9".repeat(300)} N2 = ${"9".repeat(300)} N2 + N2`],
    ["2e9", "1000000001 N2 + 3000000003 H2 = 2000000002 NH3"],
  ])("coefficients of %s", (_size, text) => {
    expect(faultsOf(() => reaction(text, referenceData)).map(({ code }) => code)).toContain(
      text.startsWith("9") ? "reaction/unbalanced" : "reaction/coefficient-out-of-range",
    );
  });

  test("a decimal before a vulgar fraction", () => {
    expect(placesOf(() => reaction("1.0½ O2 = 3 O", referenceData))).toEqual(["species/not-found at equation"]);
  });

  test("the faults of a wrong record come through", () => {
    const wrong = collectionOf({ ...recordOf("He(g)"), state: "gas" } as never);
    expect(placesOf(() => reaction("He(g) = 2 He(g)", wrong))).toEqual([
      "input/unknown-option at collection.species.0.state",
      "input/unknown-option at collection.species.0.state",
    ]);
  });

  test.each([undefined, null, 7, "data"])("the collection %s", (collection) => {
    expect(placesOf(() => reaction("N2 = 2 N", collection as never))).toEqual(["input/not-an-object at collection"]);
  });
});

describe("a reaction from elsewhere", () => {
  const expected = standardReactionGibbsEnergy(synthesis, at700);
  const copies: [string, () => Reaction][] = [
    ["JSON", () => JSON.parse(JSON.stringify(synthesis)) as Reaction],
    ["structuredClone", () => structuredClone(synthesis)],
    ["a literal", () => ({ ...synthesis, equation: "anything", terms: [...synthesis.terms].reverse() })],
  ];

  test.each(copies)("%s gives the same bits", (_name, copy) => {
    expect(standardReactionGibbsEnergy(copy(), at700)).toEqual(expected);
  });

  test.each(copies)("%s is adopted once, and changes made later are not seen", (_name, copy) => {
    const foreign = copy() as { terms: { coefficient: number }[] } & Reaction;
    standardReactionGibbsEnergy(foreign, at700);
    if (!Object.isFrozen(foreign.terms)) (foreign.terms as unknown[]).length = 0;
    expect(standardReactionGibbsEnergy(foreign, at700)).toEqual(expected);
  });

  const [first, second, third] = synthesis.terms as [Reaction["terms"][0], Reaction["terms"][0], Reaction["terms"][0]];

  test.each<[string, unknown, string[]]>([
    ["nothing", undefined, ["reaction/not-a-reaction at reaction"]],
    ["a text", "N2 + 3 H2 = 2 NH3", ["reaction/not-a-reaction at reaction"]],
    ["no terms", { equation: "", notes: [] }, ["reaction/not-a-reaction at reaction"]],
    ["empty terms", { ...synthesis, terms: [] }, ["reaction/invalid at reaction.terms"]],
    ["an unknown key", { ...synthesis, name: "x" }, ["input/unknown-key at reaction.name"]],
    [
      "no notes",
      { ...synthesis, notes: undefined },
      ["input/missing at reaction.notes", "input/not-an-array at reaction.notes"],
    ],
    ["a note of a number", { ...synthesis, notes: [1] }, ["input/not-a-string at reaction.notes.0"]],
    [
      "another coefficient",
      { ...synthesis, terms: [{ ...first, coefficient: -2 }, second, third] },
      ["reaction/invalid at reaction.terms.0.exactCoefficient"],
    ],
    [
      "a coefficient of zero",
      { ...synthesis, terms: [{ ...first, coefficient: 0, exactCoefficient: "0" }, second, third] },
      ["reaction/invalid at reaction.terms.0.exactCoefficient"],
    ],
    [
      "a coefficient of NaN",
      { ...synthesis, terms: [{ ...first, coefficient: Number.NaN }, second, third] },
      ["reaction/invalid at reaction.terms.0.exactCoefficient"],
    ],
    [
      "another label",
      { ...synthesis, terms: [{ ...first, label: "O2(g)" }, second, third] },
      ["reaction/invalid at reaction.terms.0.label"],
    ],
    [
      "no record",
      { ...synthesis, terms: [{ ...first, species: undefined }, second, third] },
      ["input/missing at reaction.terms.0.species"],
    ],
    [
      "a wrong record",
      { ...synthesis, terms: [first, { ...second, species: { ...second.species, state: "q" } }, third] },
      ["input/unknown-option at reaction.terms.1.species.state"],
    ],
    ["a species twice", { ...synthesis, terms: [first, first, second, third] }, ["reaction/invalid at reaction.terms"]],
    ["no balance", { ...synthesis, terms: [second, third] }, ["reaction/unbalanced at equation"]],
    [
      "terms that are none",
      { ...synthesis, terms: [null, 7] },
      ["input/not-an-object at reaction.terms.0", "input/not-an-object at reaction.terms.1"],
    ],
    ["a hole", { ...synthesis, terms: new Array(1) }, ["input/not-an-object at reaction.terms.0"]],
    ["201 terms", { ...synthesis, terms: Array(201).fill(first) }, ["input/too-large at reaction.terms"]],
    [
      "a prototype",
      JSON.parse('{ "__proto__": 1, "equation": "A = B", "terms": [], "notes": [] }'),
      ["input/forbidden-key at reaction.__proto__"],
    ],
  ])("%s is refused", (_name, value, places) => {
    expect(placesOf(() => standardReactionGibbsEnergy(value as Reaction, at700))).toEqual(places);
  });

  test("a text hints at reaction()", () => {
    const [fault] = faultsOf(() => standardReactionGibbsEnergy("A = B" as never, at700));
    expect(fault?.hint).toBe("reaction(text, referenceData) reads an equation");
  });
});

test("200 species are merged", () => {
  const labels = Array.from({ length: 200 }, (_value, index) => `C${index + 2}(g)`);
  const data = collectionOf(...labels.map((label, index) => polynomialRecord(label, index, 100 + index, [20 + index])));
  // 2 + ... + 101 = 5150 carbon atoms against 102 + ... + 201 = 15150; of C2 there are 5000 more.
  const left = labels.slice(0, 100).map((label, index) => (index === 0 ? `5001 ${label}` : label));
  const right = labels.slice(100);
  const big = reaction(`${[...left].join("+")} = ${right.join("+")}`, data);
  expect(big.terms).toHaveLength(200);
  expect(Number.isFinite(standardReactionGibbsEnergy(big, at700).value)).toBe(true);
});
