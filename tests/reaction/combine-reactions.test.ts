import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { referenceData } from "../../src/data/reference-data.js";
import { evaluateToDigits } from "../../src/precision/index.js";
import {
  combineReactions,
  type Reaction,
  type ReactionPart,
  reaction,
  standardReactionProperties,
} from "../../src/reaction/index.js";
import { faultsOf, placesOf } from "../errors/faults-of.js";
import { figure } from "../heat-capacity/random-series.js";
import { collectionOf, polynomialRecord, recordOf } from "../species/records.js";

const at1000 = { temperature: { value: 1000, unit: "K" } } as const;
const at298 = { temperature: { value: 298.15, unit: "K" } } as const;
const carbonMonoxide = reaction("2 CO + O2 = 2 CO2", referenceData);
const water = reaction("H2 + 1/2 O2 = H2O(g)", referenceData);
const synthesis = reaction("N2 + 3 H2 = 2 NH3", referenceData);

describe("Hess's law", () => {
  const shift = combineReactions([
    { reaction: carbonMonoxide, coefficient: "1/2" },
    { reaction: water, coefficient: -1 },
  ]);

  test("the sum is the reaction itself, to the last bit, and says what cancels", () => {
    const direct = reaction("CO + H2O(g) = CO2 + H2", referenceData);
    expect(shift.equation).toBe("CO(g) + H2O(g) = CO2(g) + H2(g)");
    expect(shift.notes).toEqual(["O2(g) cancels and takes no part"]);
    expect(standardReactionProperties(shift, at1000)).toEqual(standardReactionProperties(direct, at1000));
    expect(shift.terms.find(({ label }) => label === "CO(g)")?.species).toBe(
      direct.terms.find(({ label }) => label === "CO(g)")?.species,
    );
  });

  test("the cycle of G. H. Hess, combustion of carbon in two steps", () => {
    // CODATA Key Values (Cox 1989, from memory): -393.51 kJ/mol, half-width 0.13 kJ/mol.
    const steps = combineReactions([
      { reaction: reaction("C(cr,graphite) + 1/2 O2 = CO", referenceData), coefficient: 1 },
      { reaction: reaction("CO + 1/2 O2 = CO2", referenceData), coefficient: 1 },
    ]);
    expect(steps.equation).toBe("C(cr,graphite) + O2(g) = CO2(g)");
    expect(Math.abs(standardReactionProperties(steps, at298).enthalpy.value / 1000 + 393.51)).toBeLessThan(0.13);
  });

  test("the cycle of formation reactions gives the reaction of methane with water", () => {
    const parts: [string, string | number][] = [
      ["C(cr,graphite) + 2 H2 = CH4", -1],
      ["H2 + 1/2 O2 = H2O(g)", "-1"],
      ["2 C(cr,graphite) + O2 = 2 CO", 0.5],
    ];
    const reforming = combineReactions(
      parts.map(([text, coefficient]) => ({ reaction: reaction(text, referenceData), coefficient })),
    );
    expect(reforming.equation).toBe("CH4(g) + H2O(g) = 3 H2(g) + CO(g)");
    expect(standardReactionProperties(reforming, at1000)).toEqual(
      standardReactionProperties(reaction("CH4 + H2O(g) = 3 H2 + CO", referenceData), at1000),
    );
  });

  test("the result is a reaction of the house: frozen, and taken everywhere", () => {
    expect([shift, shift.terms, shift.notes, ...shift.terms].every(Object.isFrozen)).toBe(true);
    expect(evaluateToDigits(shift, { ...at1000, digits: 20 }).gibbsEnergy.digits).toMatch(/^-?\d/);
    const again = combineReactions([{ reaction: shift, coefficient: 2 }]);
    expect(again.equation).toBe("2 CO(g) + 2 H2O(g) = 2 CO2(g) + 2 H2(g)");
    expect(again.notes).toEqual(shift.notes);
  });

  test("a reaction from JSON agrees with one of the house where the records do", () => {
    const foreign = JSON.parse(JSON.stringify(water)) as Reaction;
    const sum = combineReactions([
      { reaction: water, coefficient: 1 },
      { reaction: foreign, coefficient: 1 },
    ]);
    expect(sum.equation).toBe("2 H2(g) + O2(g) = 2 H2O(g)");
    expect(sum.terms[0]?.species).toBe(water.terms[0]?.species);
  });
});

describe("coefficients", () => {
  test.each<[number | string, string]>([
    [1, "N2(g) + 3 H2(g) = 2 NH3(g)"],
    [-1, "2 NH3(g) = N2(g) + 3 H2(g)"],
    [0.5, "1/2 N2(g) + 3/2 H2(g) = NH3(g)"],
    [0.1, "1/10 N2(g) + 3/10 H2(g) = 1/5 NH3(g)"],
    ["1/3", "1/3 N2(g) + H2(g) = 2/3 NH3(g)"],
    ["-0.25", "1/2 NH3(g) = 1/4 N2(g) + 3/4 H2(g)"],
    ["+2", "2 N2(g) + 6 H2(g) = 4 NH3(g)"],
  ])("%s", (coefficient, equation) => {
    const { equation: found, notes } = combineReactions([{ reaction: synthesis, coefficient }]);
    expect([found, notes]).toEqual([equation, []]);
  });

  test("a reaction that is taken no time leaves its species with 0", () => {
    const sum = combineReactions([
      { reaction: synthesis, coefficient: 0 },
      { reaction: water, coefficient: 1 },
    ]);
    expect([sum.equation, sum.notes]).toEqual([
      "H2(g) + 1/2 O2(g) = H2O(g)",
      ["N2(g) cancels and takes no part", "NH3(g) cancels and takes no part"],
    ]);
  });
});

describe("laws", () => {
  const texts = [
    "N2 + 3 H2 = 2 NH3",
    "2 CO + O2 = 2 CO2",
    "H2 + 1/2 O2 = H2O(g)",
    "CO + H2O(g) = CO2 + H2",
    "CH4 + 2 O2 = CO2 + 2 H2O(g)",
    "4 NH3 + 5 O2 = 4 NO + 6 H2O(g)",
    "N2 + O2 = 2 NO",
  ];
  const reactions = texts.map((text) => reaction(text, referenceData));
  const part = fc.record({
    place: fc.integer({ min: 0, max: texts.length - 1 }),
    numerator: fc.integer({ min: -6, max: 6 }),
    denominator: fc.integer({ min: 1, max: 5 }),
  });

  function partsOf(drafts: readonly { place: number; numerator: number; denominator: number }[]): ReactionPart[] {
    return drafts.map(({ place, numerator, denominator }) => ({
      reaction: reactions[place]!,
      coefficient: `${numerator}/${denominator}`,
    }));
  }

  /** Exact stoichiometric numbers in sixtieths. */
  function numbersOf(parts: readonly ReactionPart[]): Map<string, bigint> {
    const sums = new Map<string, bigint>();
    for (const { reaction: one, coefficient } of parts) {
      const [numerator, denominator] = String(coefficient).split("/").map(BigInt) as [bigint, bigint];
      for (const { label, exactCoefficient } of one.terms) {
        const [top, bottom = 1n] = exactCoefficient.split("/").map(BigInt) as [bigint, bigint?];
        sums.set(label, (sums.get(label) ?? 0n) + (120n * numerator * top) / (denominator * bottom));
      }
    }
    return sums;
  }

  test("numbers add exactly, energies add, the order does not matter, opposite signs reverse", () => {
    let combined = 0;
    fc.assert(
      fc.property(fc.array(part, { minLength: 1, maxLength: 6 }), (drafts) => {
        const parts = partsOf(drafts);
        const expected = numbersOf(parts);
        if ([...expected.values()].every((count) => count === 0n)) {
          expect(placesOf(() => combineReactions(parts))).toEqual(["reaction/trivial at parts"]);
          return;
        }
        combined += 1;
        const sum = combineReactions(parts);
        const found = new Map(sum.terms.map(({ label, exactCoefficient }) => [label, exactCoefficient]));
        for (const [label, count] of expected) {
          const [top, bottom = 1n] = (found.get(label) ?? "0").split("/").map(BigInt) as [bigint, bigint?];
          expect((120n * top) / bottom).toBe(count);
        }
        const properties = standardReactionProperties(sum, at1000);
        const parted = parts.reduce((total, { reaction: one, coefficient }) => {
          const [numerator, denominator] = String(coefficient).split("/").map(Number) as [number, number];
          return total + (numerator / denominator) * standardReactionProperties(one, at1000).gibbsEnergy.value;
        }, 0);
        // Both are rounded sums of terms of some 1e6 J/mol.
        expect(Math.abs(properties.gibbsEnergy.value - parted)).toBeLessThan(1e-6);
        const reversed = [...parts].reverse();
        expect(standardReactionProperties(combineReactions(reversed), at1000)).toEqual(properties);
        const back = combineReactions([{ reaction: sum, coefficient: -1 }]);
        expect(standardReactionProperties(back, at1000).gibbsEnergy.value).toBe(-properties.gibbsEnergy.value + 0);
      }),
      { seed: 20261201, numRuns: 300 },
    );
    expect(combined).toBeGreaterThan(200);
  });
});

describe("records that differ", () => {
  const data = (enthalpy: number) =>
    collectionOf(
      polynomialRecord("C2(g)", enthalpy, 200, [30]),
      polynomialRecord("C3(g)", 1, 200, [40]),
      polynomialRecord("C4(g)", 2, 200, [50]),
    );
  const first = reaction("3 C2(g) = 2 C3(g)", data(100));

  test("are a fault that says what and where", () => {
    const other = reaction("2 C2(g) = C4(g)", data(101));
    expect(
      faultsOf(() =>
        combineReactions([
          { reaction: first, coefficient: 1 },
          { reaction: other, coefficient: -1 },
        ]),
      ),
    ).toMatchObject([
      {
        code: "reaction/different-records",
        path: ["parts", 1, "reaction", "terms", 0, "species"],
        message:
          "C2(g) stands for another record here than at parts.0.reaction.terms.0.species: formationEnthalpy differs",
        received: "C2(g)",
      },
    ]);
  });

  test("are none where another copy says the same, whatever the order of keys", () => {
    const turned = data(100).species.map((record) => Object.fromEntries(Object.entries(record).reverse()) as never);
    const same = reaction("2 C2(g) = C4(g)", collectionOf(...turned));
    expect(
      combineReactions([
        { reaction: first, coefficient: 1 },
        { reaction: same, coefficient: "-3/2" },
      ]).equation,
    ).toBe("3/2 C4(g) = 2 C3(g)");
  });

  test("are seen within the electron too", () => {
    const ions = (entropy: number) =>
      collectionOf(
        recordOf("H2(g)", { standardEntropy: figure(entropy, "J/mol/K") }),
        recordOf("H^+(aq)"),
        recordOf("Cl^-(aq)"),
        recordOf("Cl2(g)"),
      );
    const half = reaction("H^+(aq) + e^- = 1/2 H2(g)", ions(130));
    const other = reaction("1/2 Cl2(g) + e^- = Cl^-(aq)", ions(131));
    const places = placesOf(() =>
      combineReactions([
        { reaction: half, coefficient: -1 },
        { reaction: other, coefficient: 1 },
      ]),
    );
    expect(new Set(places)).toEqual(new Set(["reaction/different-records at parts.1.reaction.terms.1.species"]));
    const cell = combineReactions([
      { reaction: half, coefficient: -1 },
      { reaction: reaction("1/2 Cl2(g) + e^- = Cl^-(aq)", ions(130)), coefficient: 1 },
    ]);
    expect(cell.equation).toBe("1/2 H2(g) + 1/2 Cl2(g) = H^+(aq) + Cl^-(aq)");
    expect(cell.notes).toContain("e^- cancels and takes no part");
  });
});

describe("what is refused", () => {
  const part = { reaction: synthesis, coefficient: 1 };

  test.each<[string, unknown, string[]]>([
    ["nothing", undefined, ["input/not-an-array at parts"]],
    ["a reaction", synthesis, ["input/not-an-array at parts"]],
    ["no parts", [], ["reaction/empty at parts"]],
    ["201 parts", Array(201).fill(part), ["input/too-large at parts"]],
    ["numbers and holes", [1, undefined], ["input/not-an-object at parts.0", "input/not-an-object at parts.1"]],
    ["no members", [{}], ["input/missing at parts.0.reaction", "input/missing at parts.0.coefficient"]],
    [
      "wrong members, all at once",
      [
        { reaction: "N2 = 2 N", coefficient: Number.NaN },
        { reaction: { ...synthesis, terms: [] }, coefficient: "1/0", name: "x" },
        { reaction: synthesis, coefficient: "half" },
        { reaction: synthesis, coefficient: 1n },
      ],
      [
        "input/not-finite at parts.0.coefficient",
        "reaction/not-a-reaction at parts.0.reaction",
        "input/unknown-key at parts.1.name",
        "reaction/syntax at parts.1.coefficient",
        "reaction/invalid at parts.1.reaction.terms",
        "reaction/syntax at parts.2.coefficient",
        "input/not-finite at parts.3.coefficient",
      ],
    ],
    ["a sum of nothing", [part, { reaction: synthesis, coefficient: -1 }], ["reaction/trivial at parts"]],
    [
      "numbers that no double carries well",
      [{ reaction: synthesis, coefficient: 1e-10 }],
      Array(3).fill("reaction/coefficient-out-of-range at parts"),
    ],
    [
      "a prototype",
      [JSON.parse('{ "__proto__": 1, "coefficient": 1 }')],
      ["input/forbidden-key at parts.0.__proto__", "input/missing at parts.0.reaction"],
    ],
  ])("%s", (_name, value, places) => {
    expect(placesOf(() => combineReactions(value as ReactionPart[]))).toEqual(places);
  });

  test("more than 200 species", () => {
    const labels = Array.from({ length: 202 }, (_value, index) => `C${index + 2}(g)`);
    const data = collectionOf(...labels.map((label) => recordOf(label)));
    const parts = Array.from({ length: 101 }, (_value, index) => ({
      reaction: reaction(`${index + 103} C${index + 2}(g) = ${index + 2} C${index + 103}(g)`, data),
      coefficient: 1,
    }));
    expect(combineReactions(parts.slice(0, 100)).terms).toHaveLength(200);
    expect(placesOf(() => combineReactions(parts))).toEqual(["reaction/too-many-species at parts"]);
  });

  test("records of different conventions", () => {
    const data = (convention?: string) =>
      collectionOf(
        recordOf("C2(g)", convention === undefined ? {} : ({ convention } as never)),
        recordOf("C4(g)", convention === undefined ? {} : ({ convention } as never)),
        recordOf("N2(g)", convention === undefined ? {} : ({ convention } as never)),
        recordOf("N(g)", convention === undefined ? {} : ({ convention } as never)),
      );
    const parts = [
      { reaction: reaction("2 C2(g) = C4(g)", data()), coefficient: 1 },
      { reaction: reaction("N2(g) = 2 N(g)", data("elements at 0 K")), coefficient: 1 },
    ];
    expect(placesOf(() => combineReactions(parts))).toEqual(["species/mixed-conventions at parts"]);
  });
});
