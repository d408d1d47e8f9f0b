import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { rationalToString } from "../../src/numeric/rational.js";
import { parseEquation } from "../../src/reaction/equation.js";
import { faultsOf } from "../errors/faults-of.js";

/** Both sides as lists of coefficient and name. */
function read(text: string): string[][] {
  const { left, right } = parseEquation(text);
  return [left, right].map((side) => side.map(({ coefficient, name }) => `${rationalToString(coefficient)} ${name}`));
}

const arrows = ["<-->", "<=>", "<->", "-->", "->", "=>", "==", "=", "→", "⟶", "⇌", "⇄", "⇋", "↔", "⟷", "⇒", "⇔", "⟹"];

describe("arrows", () => {
  test.each(arrows)("%s", (arrow) => {
    for (const text of [`N2 + 3 H2 ${arrow} 2 NH3`, `N2+3H2${arrow}2NH3`, `\tN2  +3 H2${arrow}\n2 NH3 `]) {
      expect(read(text)).toEqual([["1 N2", "3 H2"], ["2 NH3"]]);
    }
  });

  test("stand beside charges without a space", () => {
    for (const arrow of arrows) {
      expect(read(`Fe^3++e^-${arrow}Fe^2+`)).toEqual([["1 Fe^3+", "1 e^-"], ["1 Fe^2+"]]);
      expect(read(`SO4^2-${arrow}SO4^2-`)).toEqual([["1 SO4^2-"], ["1 SO4^2-"]]);
    }
  });
});

describe("coefficients", () => {
  test.each([
    ["O2", "1 O2"],
    ["2O2", "2 O2"],
    ["2 O2", "2 O2"],
    ["2*O2", "2 O2"],
    ["2 × O2", "2 O2"],
    ["2·CuSO4·5H2O(cr)", "2 CuSO4·5H2O(cr)"],
    ["0.5 O2", "1/2 O2"],
    [".5 O2", "1/2 O2"],
    ["1/2 O2", "1/2 O2"],
    ["3/2O2", "3/2 O2"],
    ["4/2 O2", "2 O2"],
    ["½ O2", "1/2 O2"],
    ["½O2", "1/2 O2"],
    ["1½ O2", "3/2 O2"],
    ["12⅞O2", "103/8 O2"],
    ["⅓ O2", "1/3 O2"],
    ["007 O2", "7 O2"],
    ["2(NH4)2SO4(s)", "2 (NH4)2SO4(s)"],
    ["(NH4)2SO4(s)", "1 (NH4)2SO4(s)"],
    ["2 [Fe(CN)6]^4-(aq)", "2 [Fe(CN)6]^4-(aq)"],
    ["C(cr,graphite)", "1 C(cr,graphite)"],
  ])("%s", (term, meaning) => {
    expect(read(`${term} = A`)).toEqual([[meaning], ["1 A"]]);
    expect(read(`A -> B + ${term}`)).toEqual([["1 A"], ["1 B", meaning]]);
  });

  test("thirds are exact", () => {
    expect(read("1/3 A + 0.333333333333333333 B = ⅔ C")).toEqual([
      ["1/3 A", "333333333333333333/1000000000000000000 B"],
      ["2/3 C"],
    ]);
  });

  test.each([
    ["0 O2", "0 before O2"],
    ["0.0 O2", "0.0 before O2"],
    ["1/0 O2", "1/0 before O2"],
    ["1.2.3 O2", "1.2.3 before O2"],
    ["1/2/3 O2", "1/2/3 before O2"],
    [". O2", ". before O2"],
    ["2. O2", "2. before O2"],
    ["/2 O2", "/2 before O2"],
  ])("%s is none", (term, words) => {
    const [fault] = faultsOf(() => parseEquation(`${term} = A`));
    expect(fault).toMatchObject({ code: "reaction/syntax", path: ["equation"] });
    expect(fault?.message).toContain(words);
  });
});

describe("what is no equation", () => {
  test.each<[string, unknown, string, string]>([
    ["nothing", undefined, "reaction/empty", "got undefined"],
    ["a number", 7, "reaction/empty", "got 7"],
    ["an empty text", "", "reaction/empty", 'got ""'],
    ["spaces", "   ", "reaction/empty", "expected a chemical equation"],
    ["no arrow", "N2 + 3 H2", "reaction/syntax", "no arrow"],
    ["two arrows", "A = B = C", "reaction/syntax", "2 arrows"],
    ["a missing term", "A + = B", "reaction/syntax", "a term is missing at character 5"],
    ["a missing side", "A =", "reaction/syntax", "a term is missing"],
    ["a coefficient alone", "2 = B", "reaction/syntax", '"2" names no species'],
    ["a charge without a caret", "Na+ + Cl = NaCl", "reaction/syntax", "a term is missing"],
    ["a minus", "-A = B", "reaction/syntax", "begins with a minus sign"],
    ["a Unicode minus", "2 −A = B", "reaction/syntax", "begins with a minus sign"],
    ["4001 characters", `${"A".repeat(3997)} = B`.padEnd(4001), "reaction/too-long", "4001 characters"],
  ])("%s", (_name, text, code, words) => {
    const [fault] = faultsOf(() => parseEquation(text));
    expect(fault).toMatchObject({ code, path: ["equation"] });
    expect(fault?.message).toContain(words);
    expect(fault?.message.length).toBeLessThan(200);
  });

  test("a missing term hints at the caret of charges", () => {
    expect(faultsOf(() => parseEquation("Na+ + Cl- = NaCl"))[0]?.hint).toBe(
      "charges are written after a caret, as Fe^3+",
    );
  });

  test("every wrong term is reported", () => {
    expect(faultsOf(() => parseEquation("0 A + + B = -C + 2")).map(({ code }) => code)).toEqual(
      Array(4).fill("reaction/syntax"),
    );
  });
});

test("4000 characters and 200 terms are read, one more is not", () => {
  expect(parseEquation(`${"A".repeat(3996)} = B`).left[0]?.name).toHaveLength(3996);
  const side = (count: number): string => Array(count).fill("A").join("+");
  expect(parseEquation(`${side(100)}=${side(100)}`).right).toHaveLength(100);
  expect(faultsOf(() => parseEquation(`${side(101)}=${side(100)}`))).toMatchObject([
    { code: "reaction/too-many-species", received: "201" },
  ]);
});

test("any text is read or refused with a typed fault, in one pass", () => {
  const pieces = fc.constantFrom("+", "^", "-", "=", "->", "½", "1", "/", ".", "2", "H", "(g)", " ", "e^-", "·", "^3+");
  const texts = fc.oneof(
    fc.string({ unit: "binary" }),
    fc.array(pieces).map((parts) => parts.join("")),
  );
  fc.assert(
    fc.property(texts, (text) => {
      let count = 0;
      try {
        const { left, right } = parseEquation(text);
        count = left.length + right.length;
      } catch {
        count = faultsOf(() => parseEquation(text)).length;
      }
      expect(count).toBeGreaterThan(0);
    }),
    { seed: 20261201, numRuns: 1000 },
  );
});

test("the longest texts are refused at once", () => {
  const started = performance.now();
  for (const piece of ["+", "^", "-", "1", "½", "(", "<"]) faultsOf(() => parseEquation(piece.repeat(4000)));
  expect(performance.now() - started).toBeLessThan(2000);
});
