import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { referenceData } from "../../src/data/reference-data.js";
import { type Balance, type BalancedEquation, balance } from "../../src/reaction/balance.js";
import type { UnbalancedEquation } from "../../src/reaction/balance-participants.js";
import { reaction } from "../../src/reaction/reaction.js";
import { faultsOf, placesOf } from "../errors/faults-of.js";
import { collectionOf, recordOf } from "../species/records.js";
import { randomEquations, rankOfColumns, totalsOf } from "./random-compositions.js";

/** The one equation that a text balances to, without notes. */
function balanced(text: string): string | undefined {
  const { equation, isUnique, notes, basis } = balance(text);
  expect({ isUnique, notes, basis: basis.map((one) => one.equation) }).toEqual({
    isUnique: true,
    notes: [],
    basis: [equation],
  });
  return equation;
}

describe("published equations", () => {
  test.each([
    // Redox equations of general chemistry; common practice, no source.
    "2 KMnO4 + 16 HCl = 2 KCl + 2 MnCl2 + 8 H2O + 5 Cl2",
    "K2Cr2O7 + 14 HCl = 2 KCl + 2 CrCl3 + 7 H2O + 3 Cl2",
    "3 Cu + 8 HNO3 = 3 Cu(NO3)2 + 2 NO + 4 H2O",
    "Cu + 4 HNO3 = Cu(NO3)2 + 2 NO2 + 2 H2O",
    "2 C8H18 + 25 O2 = 16 CO2 + 18 H2O",
    "4 FeS2 + 11 O2 = 2 Fe2O3 + 8 SO2",
    "10 P2I4 + 13 P4 + 128 H2O = 40 PH4I + 32 H3PO4",
    "2 Ca3(PO4)2 + 6 SiO2 + 10 C = 6 CaSiO3 + 10 CO + P4",
    // R. Stout, J. Chem. Educ. 72, 1125 (1995), from memory; the second is its ionic form.
    "10 [Cr(N2H4CO)6]4[Cr(CN)6]3 + 1176 KMnO4 + 1399 H2SO4 = 35 K2Cr2O7 + 1176 MnSO4 + 420 CO2 + 660 KNO3 + 223 K2SO4 + 1879 H2O",
    "10 [Cr(N2H4CO)6]4[Cr(CN)6]3 + 1176 MnO4^- + 2798 H^+ = 35 Cr2O7^2- + 1176 Mn^2+ + 420 CO2 + 660 NO3^- + 1879 H2O",
    // A. J. Bard, R. Parsons, J. Jordan, Standard Potentials in Aqueous Solution (1985), from memory.
    "MnO4^-(aq) + 8 H^+(aq) + 5 e^- = Mn^2+(aq) + 4 H2O(l)",
    "Cr2O7^2-(aq) + 14 H^+(aq) + 6 e^- = 2 Cr^3+(aq) + 7 H2O(l)",
    "O2(g) + 4 H^+(aq) + 4 e^- = 2 H2O(l)",
    "PbO2(cr) + SO4^2-(aq) + 4 H^+(aq) + 2 e^- = PbSO4(cr) + 2 H2O(l)",
    "AgCl(cr) + e^- = Ag(cr) + Cl^-(aq)",
    "2 H2O(l) + 2 e^- = H2(g) + 2 OH^-(aq)",
    "5 Fe^2+(aq) + MnO4^-(aq) + 8 H^+(aq) = 5 Fe^3+(aq) + Mn^2+(aq) + 4 H2O(l)",
    // Polymorphs and states are species of their own.
    "C(cr,diamond) = C(cr,graphite)",
    "H2O(l) = H2O(g)",
    // 4 moles of wustite hold 3.788 of iron.
    "4000 Fe0.947O(cr) + 841 O2(g) = 1894 Fe2O3(cr)",
    "CuSO4·5H2O(cr) = CuSO4(cr) + 5 H2O(g)",
  ])("%s", (equation) => {
    expect(balanced(equation.replaceAll(/(^|[=+] )\d+ /g, "$1"))).toBe(equation);
  });

  test("the coefficients are exact texts, negative on the left", () => {
    const { coefficients, basis, equation } = balance("KMnO4 + HCl = KCl + MnCl2 + H2O + Cl2");
    expect(coefficients).toEqual({ KMnO4: "-2", HCl: "-16", KCl: "2", MnCl2: "2", H2O: "8", Cl2: "5" });
    expect(Object.keys(coefficients ?? {})).toEqual(["KMnO4", "HCl", "KCl", "MnCl2", "H2O", "Cl2"]);
    expect(basis).toEqual([{ equation, coefficients }]);
  });
});

describe("equations of more than one way", () => {
  test("copper with nitric acid gives NO and NO2 in any ratio: two independent equations", () => {
    const result = balance("Cu + HNO3 = Cu(NO3)2 + NO + NO2 + H2O");
    expect(result).toEqual({
      isUnique: false,
      notes: [],
      basis: [
        {
          equation: "Cu + 4 HNO3 = Cu(NO3)2 + 2 NO2 + 2 H2O",
          coefficients: { Cu: "-1", HNO3: "-4", "Cu(NO3)2": "1", NO2: "2", H2O: "2" },
        },
        {
          equation: "3 Cu + 8 HNO3 = 3 Cu(NO3)2 + 2 NO + 4 H2O",
          coefficients: { Cu: "-3", HNO3: "-8", "Cu(NO3)2": "3", NO: "2", H2O: "4" },
        },
      ],
    });
    expect(result.equation).toBeUndefined();
  });

  test("permanganate with hydrogen peroxide, which also decomposes alone", () => {
    const { basis } = balance("KMnO4 + H2O2 + H2SO4 = K2SO4 + MnSO4 + H2O + O2");
    expect(basis.map(({ equation }) => equation)).toEqual([
      "2 H2O2 = 2 H2O + O2",
      "4 KMnO4 + 6 H2SO4 = 2 K2SO4 + 4 MnSO4 + 6 H2O + 5 O2",
    ]);
  });

  test("fifteen species of four elements: the formation reactions of eleven compounds", () => {
    const { basis, notes } = balance(
      "C + O2 + H2 + N2 = CO + CO2 + H2O + NO + NO2 + CH4 + NH3 + C2H6 + C2H4 + C2H2 + HCN",
    );
    expect(basis).toHaveLength(11);
    expect(notes).toEqual([]);
    expect(basis.map(({ equation }) => equation)).toContain("2 C + H2 + N2 = 2 HCN");
  });

  test("where the species cannot stay on their sides, the notes name those that change", () => {
    // 2 H + 2 O atoms of hydrogen peroxide and oxygen are more oxygen than hydrogen and water hold.
    const { basis, notes } = balance("H2 + H2O = O2 + H2O2");
    expect(basis.map(({ equation }) => equation)).toEqual(["2 H2O = H2 + H2O2", "2 H2O = 2 H2 + O2"]);
    expect(notes).toEqual(["H2 changes sides in 2 H2O = H2 + H2O2", "H2 changes sides in 2 H2O = 2 H2 + O2"]);
  });

  test("equations that keep the sides come first, by size, and others fill up", () => {
    const oxides = balance("H2 + O2 + H2O2 = H2O + O3 + H2O4");
    expect(oxides.notes).toEqual([]);
    expect(oxides.basis.map(({ equation }) => equation)).toEqual([
      "O2 + H2O2 = H2O4",
      "H2 + H2O2 = 2 H2O",
      "H2 + 2 O2 = H2O4",
      "3 O2 = 2 O3",
    ]);
    const dimer = balance("NO2 + N2O4 + C + O2 = CO2");
    expect(dimer.basis.map(({ equation }) => equation)).toEqual(["C + O2 = CO2", "2 NO2 = N2O4"]);
    expect(dimer.notes).toEqual(["N2O4 changes sides in 2 NO2 = N2O4"]);
  });

  test("above 30 species the basis is that of the elimination", () => {
    const chains = Array.from({ length: 40 }, (_value, index) => `C${index + 1}`);
    const { basis } = balance({ reactants: chains.slice(0, 1), products: chains.slice(1) });
    expect(basis).toHaveLength(39);
    expect(basis.map(({ equation }) => equation)).toContain("40 C = C40");
  });
});

describe("what is passed over, joined or moved is told", () => {
  test("coefficients of the text", () => {
    const { equation, notes } = balance("7 H2 + 1/2 O2 = H2O");
    expect(equation).toBe("2 H2 + O2 = 2 H2O");
    expect(notes).toEqual(["the coefficients as written were passed over"]);
  });

  test("a species that stands twice, or on both sides", () => {
    const twice = balance("H2 + O2 + H2 = H2O");
    expect([twice.equation, twice.notes]).toEqual(["2 H2 + O2 = 2 H2O", ["H2 stands twice and was taken once"]]);
    const acid = balance("Cu + HNO3 + HNO3 = Cu(NO3)2 + NO + H2O + HNO3");
    expect([acid.equation, acid.notes]).toEqual([
      "3 Cu + 8 HNO3 = 3 Cu(NO3)2 + 2 NO + 4 H2O",
      ["HNO3 stands twice and was taken once", "HNO3 stands on both sides and was taken once"],
    ]);
  });

  test.each([
    ["MnO4^- + Fe^2+ + H2O = Mn^2+ + Fe^3+ + H^+", "MnO4^- + 5 Fe^2+ + 8 H^+ = 4 H2O + Mn^2+ + 5 Fe^3+"],
    // The first species is one of those that move: the direction is that of the others.
    ["H2O + MnO4^- + Fe^2+ = H^+ + Mn^2+ + Fe^3+", "MnO4^- + 5 Fe^2+ + 8 H^+ = 4 H2O + Mn^2+ + 5 Fe^3+"],
  ])("%s", (text, equation) => {
    const result = balance(text);
    expect(result.equation).toBe(equation);
    expect([...result.notes].sort()).toEqual(["H2O changes sides", "H^+ changes sides"].sort());
    expect(result.isUnique).toBe(true);
  });

  test("where both directions move as many, the first species stays", () => {
    const { equation, notes } = balance("CH4 + CO2 = O2 + H2O");
    expect(equation).toBe("CH4 + 2 O2 = CO2 + 2 H2O");
    expect(notes).toEqual(["CO2 changes sides", "O2 changes sides"]);
    expect(balance("CO2 + CH4 = O2 + H2O").equation).toBe("CO2 + 2 H2O = CH4 + 2 O2");
  });

  test("spellings are brought to one", () => {
    expect(balance("SO₄²⁻(aq) + Ba²⁺(aq) → BaSO₄(cr)").equation).toBe("SO4^2-(aq) + Ba^2+(aq) = BaSO4(cr)");
  });
});

describe("with a collection", () => {
  test("names become labels, and the equation is one that reaction reads", () => {
    const { equation } = balance("methane + O2 = CO2 + H2O(g)", referenceData);
    expect(equation).toBe("CH4(g) + 2 O2(g) = CO2(g) + 2 H2O(g)");
    expect(reaction(equation as string, referenceData).terms.map(({ exactCoefficient }) => exactCoefficient)).toEqual([
      "-1",
      "-2",
      "1",
      "2",
    ]);
  });

  test("the electron is resolved, and balanced by charge", () => {
    const ions = collectionOf(...["H2(g)", "H^+(aq)", "O2(g)", "H2O(l)"].map((label) => recordOf(label)));
    expect(balance("O2 + H^+ + e^- = H2O", ions).equation).toBe("O2(g) + 4 H^+(aq) + 4 e^- = 2 H2O(l)");
  });

  test("two names of one species are one", () => {
    expect(balance("N2 + nitrogen + H2 = NH3", referenceData)).toMatchObject({
      equation: "N2(g) + 3 H2(g) = 2 NH3(g)",
      notes: ["N2(g) stands twice and was taken once"],
    });
  });

  test("unknown and ambiguous names are reported together", () => {
    expect(placesOf(() => balance("H2O + Xx = NH3", referenceData))).toEqual([
      "species/ambiguous at equation",
      "species/not-found at equation",
    ]);
    expect(placesOf(() => balance({ reactants: ["H2O"], products: ["NH5(g)"] }, referenceData))).toEqual([
      "species/ambiguous at equation.reactants.0",
      "species/not-found at equation.products.0",
    ]);
  });
});

describe("what cannot be balanced", () => {
  test("names each element that stands on one side only", () => {
    expect(faultsOf(() => balance("N2 + H2 = H2O"))).toMatchObject([
      {
        code: "reaction/not-balanceable",
        path: ["equation"],
        message: "N stands on the left only, in N2",
        received: "N2",
        expected: "N on both sides",
      },
      { code: "reaction/not-balanceable", message: "O stands on the right only, in H2O" },
    ]);
  });

  test("a forgotten product is no equation without its source", () => {
    expect(faultsOf(() => balance("CH4 + NH3 + O2 = CO2 + H2O"))).toMatchObject([
      {
        message: "N stands on the left only, in NH3",
        hint: "without NH3: CH4 + 2 O2 = CO2 + 2 H2O",
      },
    ]);
  });

  test("a charge on one side only", () => {
    expect(faultsOf(() => balance("Fe = Fe^3+"))).toMatchObject([
      { message: "the charge stands on the right only, in Fe^3+", hint: "a half-reaction needs e^-" },
    ]);
    expect(balance("Na^+ + Cl^- = NaCl").equation).toBe("Na^+ + Cl^- = NaCl");
  });

  test("elements on both sides in proportions that do not meet", () => {
    expect(faultsOf(() => balance("H2O + CO2 = C2H6O"))).toMatchObject([
      { message: "no coefficients but 0 balance H2O, CO2, C2H6O" },
    ]);
    expect(faultsOf(() => balance("H2O = H2O"))).toMatchObject([{ message: "no coefficients but 0 balance H2O" }]);
    expect(faultsOf(() => balance("Fe + FeO = Fe"))).toMatchObject([{ message: "O stands on the left only, in FeO" }]);
  });

  test("a species that the others cannot be made of", () => {
    expect(faultsOf(() => balance("H2 + O2 + CO = H2O + CO"))).toMatchObject([
      { message: "no coefficients but 0 balance CO", hint: "without CO: 2 H2 + O2 = 2 H2O" },
    ]);
  });
});

describe("what is no equation", () => {
  test.each<[string, unknown, string[]]>([
    ["nothing", undefined, ["reaction/empty at equation"]],
    ["null", null, ["reaction/empty at equation"]],
    ["a number", 7, ["reaction/empty at equation"]],
    ["no arrow", "H2 + O2", ["reaction/syntax at equation"]],
    [
      "unknown elements, all of them",
      "Xx + H2 = Yy",
      ["formula/unknown-element at equation", "formula/unknown-element at equation"],
    ],
    ["an array", ["H2"], ["input/not-an-object at equation"]],
    ["no members", {}, ["input/missing at equation.reactants", "input/missing at equation.products"]],
    [
      "empty sides",
      { reactants: [], products: [] },
      ["reaction/empty at equation.reactants", "reaction/empty at equation.products"],
    ],
    [
      "names that are none",
      { reactants: ["H2", 7, ""], products: [null] },
      [
        "input/not-a-string at equation.reactants.1",
        "input/not-a-string at equation.reactants.2",
        "input/not-a-string at equation.products.0",
      ],
    ],
    [
      "sides that are no arrays",
      { reactants: "H2", products: 1, arrow: "=" },
      [
        "input/unknown-key at equation.arrow",
        "input/not-an-array at equation.reactants",
        "input/not-an-array at equation.products",
      ],
    ],
    ["coefficients in names", { reactants: ["2 H2"], products: ["H"] }, ["formula/syntax at equation.reactants.0"]],
    ["201 species", { reactants: Array(200).fill("H2"), products: ["H"] }, ["reaction/too-many-species at equation"]],
    [
      "4001 characters",
      { reactants: Array(16).fill("H2".repeat(125)), products: ["H"] },
      ["reaction/too-long at equation"],
    ],
    ["a long name", { reactants: ["H".repeat(501)], products: ["H"] }, ["input/too-large at equation.reactants.0"]],
    [
      "a prototype",
      JSON.parse('{ "__proto__": 1, "reactants": ["H2"], "products": ["H"] }'),
      ["input/forbidden-key at equation.__proto__"],
    ],
  ])("%s", (_name, value, places) => {
    expect(placesOf(() => balance(value as UnbalancedEquation))).toEqual(places);
  });

  test("a collection that is none", () => {
    expect(placesOf(() => balance("H2 = H", null as never))).toEqual(["input/not-an-object at collection"]);
  });
});

describe("random species", () => {
  const options = { seed: 20261201, numRuns: 800 };

  test("what balances does so exactly, in smallest numbers, in as many ways as species less rank", () => {
    let unique = 0;
    let ambiguous = 0;
    let refused = 0;
    fc.assert(
      fc.property(randomEquations, (sides) => {
        const compositions = [...sides.reactants, ...sides.products];
        const rank = rankOfColumns(compositions);
        // Without a species that takes no part, the rest has a lower rank.
        const idle = compositions.filter((one) => rankOfColumns(compositions.filter((other) => other !== one)) < rank);
        const call = (): Balance => balance(labelsOf(sides));
        if (idle.length > 0) {
          refused += 1;
          expect(new Set(placesOf(call))).toEqual(new Set(["reaction/not-balanceable at equation"]));
          return;
        }
        const result = call();
        expect(result.basis).toHaveLength(compositions.length - rank);
        expect(result.isUnique).toBe(result.basis.length === 1);
        if (result.isUnique) unique += 1;
        else ambiguous += 1;
        for (const { coefficients } of result.basis) {
          const counts = compositions.map(({ label }) => BigInt(coefficients[label] ?? "0"));
          expect(totalsOf(compositions, counts).every((total) => total === 0n)).toBe(true);
          expect(counts.reduce(greatestCommonDivisor, 0n)).toBe(1n);
        }
        // Independent: as columns of a matrix, the equations have full rank.
        const columns = result.basis.map(({ coefficients }) => ({
          label: "",
          amounts: compositions.map(({ label }) => Number(coefficients[label] ?? "0")),
        }));
        expect(rankOfColumns(columns)).toBe(columns.length);
        if (!result.notes.some((note) => note.includes("changes sides"))) {
          for (const { coefficients } of result.basis) {
            for (const { label } of sides.reactants) expect(BigInt(coefficients[label] ?? "0") <= 0n).toBe(true);
            for (const { label } of sides.products) expect(BigInt(coefficients[label] ?? "0") >= 0n).toBe(true);
          }
        }
      }),
      options,
    );
    expect(Math.min(unique, ambiguous, refused)).toBeGreaterThan(50);
  });

  test("the order of the species does not matter, and exchanged sides reverse the signs", () => {
    let kept = 0;
    fc.assert(
      fc.property(randomEquations, fc.integer({ min: 1, max: 1000 }), (sides, shuffle) => {
        const labels = labelsOf(sides);
        const other = { reactants: shuffled(labels.reactants, shuffle), products: shuffled(labels.products, shuffle) };
        if (isRefused(labels)) {
          expect(isRefused(other)).toBe(true);
          return;
        }
        const result = balance(labels);
        expect(signless(balance(other))).toEqual(signless(result));
        // Each equation of the basis by itself is written as it should be, and has one form.
        for (const { coefficients } of result.basis) {
          const own = sidesOf(coefficients);
          const turned = balance({
            reactants: shuffled(own.products, shuffle),
            products: shuffled(own.reactants, shuffle),
          });
          expect(turned).toMatchObject({ isUnique: true, notes: [] });
          expect(texts(turned, -1n)).toEqual(texts({ basis: [{ coefficients }] }));
        }
        if (result.notes.length > 0) return;
        kept += 1;
        expect(new Set(texts(balance(other)))).toEqual(new Set(texts(result)));
        const back = balance({ reactants: labels.products, products: labels.reactants });
        expect(back.notes).toEqual([]);
        expect(new Set(texts(back, -1n))).toEqual(new Set(texts(result)));
      }),
      options,
    );
    expect(kept).toBeGreaterThan(30);
  });

  test("what is balanced balances to itself, and reaction agrees", () => {
    let checked = 0;
    fc.assert(
      fc.property(randomEquations, (sides) => {
        const labels = labelsOf(sides);
        if (isRefused(labels)) return;
        const { equation } = balance(labels);
        if (equation === undefined) return;
        checked += 1;
        expect(balance(equation).equation).toBe(equation);
        const records = [...labels.reactants, ...labels.products].map((label) => recordOf(label));
        expect(reaction(equation, collectionOf(...records)).equation).toBe(equation);
      }),
      options,
    );
    expect(checked).toBeGreaterThan(50);
  });
});

test("200 species of 4000 characters take no more than seconds", () => {
  const started = performance.now();
  const formulas = Array.from({ length: 130 }, (_value, index) => {
    const [a, b, c] = [elements[index % 59]!, elements[(index * 7 + 3) % 59]!, elements[(index * 13 + 5) % 59]!];
    return `${a}0.${(index * 7919) % 99991}1${b}0.${(index * 104729) % 99991}3${c}0.${(index * 1299709) % 9973}7`;
  });
  expect(formulas.join("").length).toBeGreaterThan(3000);
  const { basis } = balance({ reactants: formulas.slice(0, 65), products: formulas.slice(65) });
  expect(basis.length).toBeGreaterThan(60);
  expect(performance.now() - started).toBeLessThan(20_000);
});

const elements =
  "H He Li Be B C N O F Ne Na Mg Al Si P S Cl Ar K Ca Sc Ti V Cr Mn Fe Co Ni Cu Zn Ga Ge As Se Br Kr Rb Sr Y Zr Nb Mo Tc Ru Rh Pd Ag Cd In Sn Sb Te I Xe Cs Ba La Ce Pr".split(
    " ",
  );

interface Sides {
  readonly reactants: readonly { readonly label: string }[];
  readonly products: readonly { readonly label: string }[];
}

function labelsOf({ reactants, products }: Sides): UnbalancedEquation {
  return { reactants: reactants.map(({ label }) => label), products: products.map(({ label }) => label) };
}

function sidesOf(coefficients: Readonly<Record<string, string>>): UnbalancedEquation {
  const labels = Object.keys(coefficients);
  const isLeft = (label: string): boolean => coefficients[label]!.startsWith("-");
  return { reactants: labels.filter(isLeft), products: labels.filter((label) => !isLeft(label)) };
}

function isRefused(labels: UnbalancedEquation): boolean {
  try {
    balance(labels);
    return false;
  } catch {
    return faultsOf(() => balance(labels)).every(({ code }) => code === "reaction/not-balanceable");
  }
}

/** The equations as texts of labels and coefficients in the order of the labels. */
function texts(
  { basis }: { readonly basis: readonly Pick<BalancedEquation, "coefficients">[] },
  sign: bigint = 1n,
): string[] {
  return basis.map(({ coefficients }) =>
    Object.entries(coefficients)
      .map(([label, count]) => `${sign * BigInt(count)} ${label}`)
      .sort()
      .join(", "),
  );
}

/** The same whichever way each equation runs. */
function signless(result: Balance): Set<string> {
  const [forward, backward] = [texts(result), texts(result, -1n)];
  return new Set(forward.map((text, index) => [text, backward[index]!].sort().join(" or ")));
}

function shuffled(labels: readonly string[], step: number): string[] {
  const left = [...labels];
  const result: string[] = [];
  while (left.length > 0) result.push(...left.splice(step % left.length, 1));
  return result;
}

function greatestCommonDivisor(a: bigint, b: bigint): bigint {
  return b === 0n ? (a < 0n ? -a : a) : greatestCommonDivisor(b, a % b);
}
