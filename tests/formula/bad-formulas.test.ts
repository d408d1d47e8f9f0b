import { expect, test } from "vitest";
import { isGibbsLedgerError, toFaults } from "../../src/errors/gibbs-ledger-error.js";
import { formula } from "../../src/formula/formula.js";
import { parseLabel } from "../../src/formula/parse-label.js";

function faultsOf(text: unknown, read: (text: string) => unknown = formula): ReturnType<typeof toFaults> {
  try {
    read(text as string);
  } catch (error) {
    expect(isGibbsLedgerError(error)).toBe(true);
    return toFaults(error);
  }
  throw new Error(`${String(text)} was read`);
}

// text, code of the first fault, its column, a part of its hint
const bad: readonly (readonly [text: string, code: string, column: number, hint: string | undefined])[] = [
  // dots
  ["CaSO4.0.5H2O", "formula/ambiguous-dot", 6, "write CaSO4·0.5H2O or CaSO4.0·5H2O"],
  ["CaSO4.2.5H2O(cr)", "formula/ambiguous-dot", 6, "write CaSO4·2.5H2O(cr) or CaSO4.2·5H2O(cr)"],
  ["Na0.5H2O", "formula/ambiguous-dot", 4, "write Na·0.5H2O or Na0.5·H2O"],
  ["Na0.5H₂O(s)", "formula/ambiguous-dot", 4, "·"],
  ["Na0.5SO4.5H2O", "formula/ambiguous-dot", 9, "write Na0.5SO4·5H2O or Na0.5SO4.5·H2O"],
  ["Fe0.95O.5H2O", "formula/ambiguous-dot", 8, "write Fe0.95O·5H2O or Fe0.95O0.5·H2O"],
  ["Na2O·SiO2.5H2O", "formula/ambiguous-dot", 10, "Na2O·SiO2·5H2O"],
  ["N1.0H2O", "formula/ambiguous-dot", 3, "N1.0·H2O"],
  ["Fe0.947O.H2O", "formula/syntax", 9, "Fe0.947O·H2O"],
  ["CaSO4.NH3", "formula/syntax", 6, "CaSO4·NH3"],
  ["FeO.5N", "formula/syntax", 4, "0.5"],
  ["(CuSO.H2O)2", "formula/syntax", 6, "·"],
  ["CuSO4.", "formula/syntax", 6, "·"],
  ["Fe1.2.3O", "formula/syntax", 6, "·"],
  ["CO2*H2O", "formula/syntax", 4, "·"],
  ["CuSO4·", "formula/syntax", 7, undefined],
  ["·H2O", "formula/syntax", 1, undefined],
  ["CuSO4··H2O", "formula/syntax", 7, undefined],
  ["CaSO4·1/2H2O", "formula/syntax", 8, "0.5"],
  // counts
  ["H0", "formula/zero-count", 2, "oxygen"],
  ["Fe0.00O", "formula/zero-count", 3, "leave out"],
  ["Ca(OH)0", "formula/zero-count", 7, "leave out"],
  ["CuSO4·0H2O", "formula/zero-count", 7, "leave out"],
  ["H₀O", "formula/zero-count", 2, "leave out"],
  ["C02", "formula/syntax", 2, "O is oxygen"],
  ["2H2O", "formula/syntax", 1, "coefficient"],
  ["(2NaCl)3", "formula/syntax", 2, "coefficient"],
  ["H2₂", "formula/syntax", 3, "one kind of digits"],
  ["H1234567890123456789012345", "formula/count-out-of-range", 2, undefined],
  ["H10000000000000", "formula/count-out-of-range", 1, undefined],
  ["NH0.00000001", "formula/count-out-of-range", 2, undefined],
  ["((((H1000)1000)1000)1000)1000", "formula/count-out-of-range", 5, undefined],
  // charges
  ["Fe+3", "formula/charge-order", 3, "write Fe^3+"],
  ["SO4-2", "formula/charge-order", 4, "write SO4^2-"],
  ["SO4-2(aq)", "formula/charge-order", 4, "write SO4^2-(aq)"],
  ["SO4−2", "formula/charge-order", 4, "write SO4^2-"],
  ["Fe+++", "formula/charge-order", 3, "write Fe^3+"],
  ["SO4--", "formula/charge-order", 4, "write SO4^2-"],
  ["Na+", "formula/charge-order", 3, "write Na^+"],
  ["Na+(aq)", "formula/charge-order", 3, "write Na^+(aq)"],
  ["Cl-", "formula/charge-order", 3, "write Cl^-"],
  ["Fe3+", "formula/charge-order", 4, "write Fe^3+ for the charge 3+, Fe3^+ for the charge 1+"],
  ["SO42-", "formula/charge-order", 5, "write SO4^2- for the charge 2-"],
  ["NH4+", "formula/charge-order", 4, "write NH4^+ for the charge 1+"],
  ["[Fe(CN)6]3-", "formula/charge-order", 11, "write [Fe(CN)6]^3- for the charge 3-"],
  ["SO4^-2", "formula/charge-order", 5, "write SO4^2-"],
  ["SO4^-2(aq)", "formula/charge-order", 5, "write SO4^2-(aq)"],
  ["Fe^+++", "formula/charge-order", 4, "write Fe^3+"],
  ["Fe^2++", "formula/charge-order", 5, "SO4^2-"],
  ["SO4⁻²", "formula/charge-order", 4, "write SO4^2-"],
  ["Fe(3+)", "formula/charge-order", 3, "write Fe^3+"],
  ["Fe(+3)(aq)", "formula/charge-order", 3, "write Fe^3+(aq)"],
  ["Na(+)", "formula/charge-order", 3, "write Na^+"],
  ["(2+)", "formula/charge-order", 1, "SO4^2-"],
  ["Fe^3", "formula/syntax", 5, "write Fe^3+ or Fe^3-"],
  ["Fe³", "formula/syntax", 4, "write Fe^3+ or Fe^3-"],
  ["Fe^", "formula/syntax", 4, "Na^+"],
  ["Fe^{3+}", "formula/syntax", 4, "without braces"],
  ["Fe^0", "formula/syntax", 5, "neutral"],
  ["Fe^0+", "formula/syntax", 4, "neutral"],
  ["Fe^1000+", "formula/count-out-of-range", 4, undefined],
  ["Na^+Cl^-", "formula/syntax", 5, "one charge"],
  ["(NH4^+)2", "formula/syntax", 5, "at the end"],
  ["(NH4+)2", "formula/charge-order", 5, "SO4^2-"],
  ["^2+", "formula/syntax", 1, undefined],
  ["CH3-CH3", "formula/syntax", 4, "bonds"],
  ["SO₄₋", "formula/syntax", 4, "SO₄²⁻"],
  // the electron
  ["e", "formula/syntax", 1, "e^-"],
  ["e-", "formula/charge-order", 2, "e^-"],
  ["e^+", "formula/syntax", 1, "e^-"],
  ["e^2-", "formula/syntax", 1, "e^-"],
  ["e(g)", "formula/syntax", 1, "e^-"],
  // elements
  ["Xx", "formula/unknown-element", 1, undefined],
  ["NaXy2", "formula/unknown-element", 3, undefined],
  ["FE", "formula/unknown-element", 2, "Fe"],
  ["NACL", "formula/unknown-element", 2, "Na"],
  ["ALN", "formula/unknown-element", 1, "Al"],
  ["NaOh", "formula/unknown-element", 3, "OH"],
  ["Nacl", "formula/unknown-element", 1, "Na"],
  ["h2o", "formula/unknown-element", 1, "capital"],
  ["Ca(oh)2", "formula/unknown-element", 4, "capital"],
  ["(oh)2", "formula/unknown-element", 2, "capital"],
  ["Al2(SO4(oh))3", "formula/unknown-element", 9, "capital"],
  // brackets
  ["(OH", "formula/syntax", 1, undefined],
  ["Ca(OH", "formula/syntax", 3, undefined],
  ["OH)", "formula/syntax", 3, undefined],
  ["[OH)2", "formula/syntax", 4, undefined],
  ["Ca()2", "formula/syntax", 4, undefined],
  ["Fe(III)Cl3", "formula/syntax", 3, "oxidation"],
  ["Cu(I)", "formula/syntax", 3, "oxidation"],
  // states
  ["H2O(G)", "formula/unknown-state", 5, "write (g)"],
  ["H2O(L)", "formula/unknown-state", 5, "write (l)"],
  ["NaCl(S)", "formula/unknown-state", 6, "write (s)"],
  ["NaCl(AQ)", "formula/unknown-state", 6, "write (aq)"],
  ["Na^+(AQ)", "formula/unknown-state", 6, "write (aq)"],
  ["Fe(CR,alpha)", "formula/unknown-state", 4, "write (cr,alpha)"],
  ["H2O(Liq)", "formula/unknown-state", 5, "write (l)"],
  ["H2O(liq)", "formula/unknown-state", 5, "write (l)"],
  ["H2O(gas)", "formula/unknown-state", 5, "write (g)"],
  ["C(c,graphite)", "formula/unknown-state", 3, "write (cr,graphite)"],
  ["NaCl(aqq)", "formula/unknown-state", 6, "write (aq)"],
  ["NaCl(xyz)", "formula/unknown-state", 6, undefined],
  ["AgCl(cr", "formula/syntax", 5, undefined],
  ["Fe(cr,)", "formula/syntax", 7, undefined],
  ["Fe(cr,α)", "formula/syntax", 7, "alpha"],
  ["Fe(cr,alpha,2)", "formula/syntax", 12, undefined],
  ["Fe(cr, alpha)", "formula/syntax", 7, undefined],
  ["Fe2O3(s)(l)", "formula/syntax", 9, "ends the formula"],
  ["Na(aq)^+", "formula/syntax", 7, "Na^+(aq)"],
  // other characters
  ["H2O (l)", "formula/syntax", 4, "without spaces"],
  [" H2O", "formula/syntax", 1, "without spaces"],
  ["H2O\n", "formula/syntax", 4, "without spaces"],
  ["Fe,O", "formula/syntax", 3, "comma"],
  ["H2O=", "formula/syntax", 4, undefined],
  ["😀", "formula/syntax", 1, undefined],
  ["Н2O", "formula/syntax", 1, undefined], // a Cyrillic letter
];

test.each(bad)("%s is refused with %s at column %i, hint %s", (text, code, column, hint) => {
  const [fault] = faultsOf(text);
  expect(fault).toMatchObject({ code, path: [] });
  expect(fault?.message).toContain(`column ${column} of ${JSON.stringify(text)}: `);
  if (hint === undefined) expect(fault?.message).not.toBe("");
  else expect(fault?.hint).toContain(hint);
  expect(faultsOf(text, parseLabel)).toEqual(faultsOf(text));
});

test.each(["", " ", "\t", "(g)", "(cr,graphite)"])("%j has no formula", (text) => {
  expect(faultsOf(text)[0]).toMatchObject({ code: "formula/empty", path: [] });
});

test.each([undefined, null, 5, {}, ["H2O"]])("%j is no text", (value) => {
  expect(faultsOf(value)[0]).toMatchObject({ code: "input/not-a-string", path: [] });
});

test("the faults of one formula are reported together", () => {
  expect(faultsOf("XxH0YyO0").map(({ code, message }) => [code, message.slice(0, 8)])).toEqual([
    ["formula/unknown-element", "column 1"],
    ["formula/zero-count", "column 4"],
    ["formula/unknown-element", "column 5"],
    ["formula/zero-count", "column 8"],
  ]);
});

test("500 characters are read, 501 are not", () => {
  expect(formula("H".repeat(500)).composition).toEqual({ H: 500 });
  expect(faultsOf("H".repeat(501))[0]).toMatchObject({ code: "formula/too-long", path: [] });
});

test("brackets lie 20 deep, not 21", () => {
  const nested = (depth: number) => `${"(".repeat(depth)}H${")2".repeat(depth)}`;
  expect(formula(nested(20)).composition).toEqual({ H: 2 ** 20 });
  const [fault] = faultsOf(nested(21));
  expect(fault?.code).toBe("formula/too-deep");
  expect(fault?.message).toContain("column 21 of ");
});

test("echoes and hints stay short", () => {
  const long = `${"Fe".repeat(240)}+3`;
  for (const text of [long, "Zz".repeat(249), `H${"9".repeat(480)}`, `Fe(cr,${"α".repeat(400)})`]) {
    for (const fault of faultsOf(text)) {
      expect(fault.received?.length).toBeLessThanOrEqual(80);
      expect(fault.message.length).toBeLessThanOrEqual(200);
      expect(fault.hint?.length ?? 0).toBeLessThanOrEqual(240);
    }
  }
});
