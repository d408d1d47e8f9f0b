import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { referenceData } from "../../src/data/reference-data.js";
import { ledger, reaction, standardReactionProperties } from "../../src/reaction/index.js";
import { caution, formatLedger, formatReactionTable } from "../../src/report/index.js";
import { faultsOf, placesOf } from "../errors/faults-of.js";
import { figure } from "../heat-capacity/random-series.js";
import { referenceStates, referenceSubjects } from "../properties/reference-states.js";
import { collectionOf, fitted, polynomialRecord, recordOf } from "../species/records.js";

const kelvin = (value: number) => ({ value, unit: "K" }) as const;

/** What holds of every report. */
function expectReport(text: string): void {
  for (const line of text.split("\n")) {
    expect(line.length).toBeLessThanOrEqual(80);
    expect(line).toBe(line.trimEnd());
  }
  expect(text).not.toMatch(/-0\.0*(?![0-9])/);
  expect(text).not.toMatch(/NaN|Infinity|undefined|null|\[object/);
  expect(text.replace(/\s+/g, " ").endsWith(caution)).toBe(true);
}

describe("a ledger", () => {
  // W(cr) = W(l): H of 10 and 12 kJ/mol, S of 30 and 35 J/mol/K, Cp of 20 and 30 J/mol/K, with 1 J/mol of u.
  const uncertain = (value: number, unit: string, halfWidth: number) => ({
    ...figure(value, unit),
    uncertainty: { halfWidth, coverage: 0.95 },
  });
  const solid = polynomialRecord("W(cr)", 0, 0, [20], [0], {
    formationEnthalpy: uncertain(10, "kJ/mol", 0.6),
    standardEntropy: uncertain(30, "J/mol/K", 0.2),
  });
  const liquid = polynomialRecord("W(l)", 0, 0, [30], [0], {
    formationEnthalpy: uncertain(12, "kJ/mol", 0.8),
    standardEntropy: uncertain(35, "J/mol/K", 0.4),
  });
  const account = ledger(reaction("2 W(cr) = 2 W(l)", collectionOf(solid, liquid)), {
    temperature: kelvin(596.3),
    pressure: { value: 1, unit: "bar" },
    activities: { "W(l)": 0.5 },
  });

  test("is laid out as worked by hand", () => {
    // 2 x 12 and -2 x 10; 596.3 x 2 x 35 and 30; 2 x 298.15 x 30 and 20; 2 x 596.3 x 30 ln 2; 2 R 596.3 ln 0.5
    expect(formatLedger(account).split("\n").slice(0, 24)).toEqual([
      "Gibbs energy of reaction, per mole of reaction as written",
      "2 W(cr) = 2 W(l)",
      "T = 596.3 K, p = 1 bar",
      "",
      "entry                 species          nu    kJ/mol       u source",
      "--------------------------------------------------------------------------------",
      "formation enthalpy    W(cr)            -2   -20.000   0.600 invented for a test",
      "reference entropy     W(cr)            -2    35.778   0.119 invented for a test",
      "formation enthalpy    W(l)              2    24.000   0.800 invented for a test",
      "reference entropy     W(l)              2   -41.741   0.239 invented for a test",
      "formation             sum                    -1.963   1.035",
      "--------------------------------------------------------------------------------",
      "sensible heat         W(cr)            -2   -11.926         invented for a test",
      "heat-capacity entropy W(cr)            -2    16.533         invented for a test",
      "sensible heat         W(l)              2    17.889         invented for a test",
      "heat-capacity entropy W(l)              2   -24.799         invented for a test",
      "temperature           sum                    -2.303 >=0.000",
      "--------------------------------------------------------------------------------",
      "activity              W(l)              2    -6.873   0.000",
      "conditions            sum                    -6.873   0.000",
      "--------------------------------------------------------------------------------",
      "total                 sum                   -11.140 >=1.035",
      "",
      "ln Q = -1.38629; standard states: pure phase at 1 bar",
    ]);
    expectReport(formatLedger(account));
  });

  test("of any reaction and state keeps to 80 columns and shows its sums", () => {
    fc.assert(
      fc.property(referenceStates, ({ subject, conditions }) => {
        const text = formatLedger(ledger(subject, conditions));
        expectReport(text);
        expect(text.match(/^(formation|temperature|conditions|total) +sum /gm)).toHaveLength(4);
      }),
      { seed: 20261201, numRuns: 100 },
    );
  });

  test("with long labels, equations, notes and sources keeps to 80 columns", () => {
    const polymorph = "tetragonal-disphenoidal-and-more-words-than-any-column-has-room-for";
    const label = `C12H22O11(cr,${polymorph})`;
    const source = { text: `A source\nover lines, ${"and very long ".repeat(20)}` };
    const long = recordOf(label, {
      formationEnthalpy: { ...figure(-2221.2, "kJ/mol"), source },
      standardEntropy: { ...figure(360, "J/mol/K"), source: { text: "another" } },
    });
    const isomer = recordOf("C12H22O11(aq)", { formationEnthalpy: { ...figure(-2215, "kJ/mol"), source } });
    const subject = reaction(`⅓ ${label} + ¼ ${label} = 7/12 C12H22O11(aq)`, collectionOf(long, isomer));
    const text = formatLedger(
      ledger(subject, {
        temperature: kelvin(298.15),
        pressure: { value: 123.456, unit: "bar" },
        activities: { "C12H22O11(aq)": 1e-5 },
      }),
    );
    expectReport(text);
    expect(text).toContain("and was combined");
    expect(text).toContain("has no molar volume");
    expect(text).toContain("C12H22O11(cr,…");
    expect(text).toMatch(/^formation enthalpy +C12H22O11\(cr,… -0\.5833 /m);
    expect(text).toMatch(/^formation enthalpy +C12H22O11\(aq\) +0\.5833 /m);
  });

  test("names the temperature of an anchor below the table where the row has no room for it", () => {
    const high = recordOf("Fe(cr)", {
      gibbsFunction: fitted({
        kind: "series",
        form: "maier-kelley",
        anchor: { temperature: figure(500, "K"), enthalpy: figure(5, "kJ/mol"), entropy: figure(40, "J/mol/K") },
        intervals: [
          { from: 500, to: 800, coefficients: [25, 0, 0], endsAt: "first-order" },
          { from: 800, to: 1500, coefficients: [30, 0, 0], endsAt: "fit" },
        ],
      }),
      transitions: [{ temperature: figure(800, "K"), into: "Fe(cr,beta)", enthalpy: figure(1, "kJ/mol") }],
    });
    const subject = reaction("Fe(cr) = Fe(l)", collectionOf(high, polynomialRecord("Fe(l)", 14000, 35, [40])));
    const text = formatLedger(ledger(subject, { temperature: kelvin(900), pressure: { value: 1, unit: "bar" } }));
    expectReport(text);
    expect(text).toMatch(/^transition at 800 K +Fe\(cr\) +-1 /m);
    expect(text).toContain("note: Fe(cr): formation enthalpy at 500 K");
    expect(text).toContain("note: Fe(cr): reference entropy at 500 K");
  });

  test("lists what was evaluated outside its range, and the notes of an equation of state", () => {
    const hot = ledger(reaction("CaCO3(s) = CaO(s) + CO2", referenceData), {
      temperature: kelvin(1500),
      pressure: { value: 1, unit: "bar" },
      gas: { moleFractions: { "CO2(g)": 1 } },
      outsideRange: "continue-fit",
    });
    expect(formatLedger(hot)).toContain("outside their range: CaCO3(cr,calcite)");
  });
});

describe("a reaction table", () => {
  const subject = reaction(
    "W(cr) = W(l)",
    collectionOf(polynomialRecord("W(cr)", 0, 0, [20]), polynomialRecord("W(l)", 1000, 2, [25])),
  );

  test("is laid out as worked by hand", () => {
    // At 400 K: dH = 1000 + 5 x 101.85, dS = 2 + 5 ln(400/298.15), dG = dH - 400 dS, log10 K = -dG / (R T ln 10)
    expect(
      formatReactionTable(subject, { temperatures: [kelvin(400), { value: 526.85, unit: "Cel" }] })
        .split("\n")
        .slice(0, 9),
    ).toEqual([
      "Standard reaction properties, per mole of reaction as written, at 1 bar",
      "W(cr) = W(l)",
      "",
      "        T     log10 K        u          dG          dH       -T dS       dCp",
      "        K           1        1      kJ/mol      kJ/mol      kJ/mol   J/mol/K",
      "----------------------------------------------------------------------------",
      "   400.00     -0.0159 >=0.0000       0.122       1.509      -1.388     5.000",
      "   800.00      0.1331 >=0.0000      -2.039       3.509      -5.548     5.000",
      "",
    ]);
  });

  test("of the reference reactions keeps to 80 columns over their whole range", () => {
    for (const each of referenceSubjects) {
      const text = formatReactionTable(each, {
        temperatures: [1, 200, 298.15, 1000, 1200, 6000, 100_000].map(kelvin),
        outsideRange: "constant-heat-capacity",
      });
      expectReport(text);
      expect(text).toContain("outside their range: ");
    }
  });

  test("shows what standardReactionProperties gives", () => {
    const [synthesis] = referenceSubjects;
    const properties = standardReactionProperties(synthesis!, { temperature: kelvin(700) });
    const row = formatReactionTable(synthesis!, { temperatures: [kelvin(700)] }).split("\n")[6];
    expect(row?.trim().split(/ +/)).toEqual([
      "700.00",
      properties.log10K.toFixed(4),
      "0.0262", // sqrt(350^2 + (700 x 0.05)^2 + ...) / (R 700 ln 10), from the uncertainties of Cox (1989)
      (properties.gibbsEnergy.value / 1000).toFixed(3),
      (properties.enthalpy.value / 1000).toFixed(3),
      (-0.7 * properties.entropy.value).toFixed(3),
      properties.heatCapacity?.value.toFixed(3),
    ]);
  });

  test("leaves the heat capacity blank where there is none", () => {
    const change = reaction("W(cr) = W(l)", collectionOf(recordOf("W(cr)"), recordOf("W(l)")));
    const text = formatReactionTable(change, { temperatures: [{ value: 25, unit: "Cel" }] });
    expect(text.split("\n")[6]).toBe("   298.15      0.0000 >=0.0000       0.000       0.000       0.000");
    expectReport(text);
  });

  test("with huge numbers shows them whole", () => {
    const huge = reaction(
      "W(cr) = W(l)",
      collectionOf(polynomialRecord("W(cr)", 0, 0, [20]), polynomialRecord("W(l)", -1e80, 2, [25])),
    );
    const text = formatReactionTable(huge, { temperatures: [kelvin(400)] });
    expectReport(text);
    expect(text).toMatch(/ -1e\+77 /);
  });

  test.each<[string, unknown, string[]]>([
    ["no options", undefined, ["input/not-an-object at "]],
    ["no temperatures", {}, ["input/missing at temperatures"]],
    ["an empty list", { temperatures: [] }, ["report/no-rows at temperatures"]],
    ["one temperature outside a list", { temperatures: kelvin(300) }, ["input/not-an-array at temperatures"]],
    ["too many", { temperatures: Array(10_001).fill(kelvin(300)) }, ["input/too-large at temperatures"]],
    [
      "numbers",
      { temperatures: [300, kelvin(300), null] },
      ["quantity/not-a-quantity at temperatures.0", "quantity/not-a-quantity at temperatures.2"],
    ],
    ["a misspelt key", { temperatures: [kelvin(300)], outsiderange: "refuse" }, ["input/unknown-key at outsiderange"]],
    ["another policy", { temperatures: [kelvin(300)], outsideRange: "no" }, ["input/unknown-option at outsideRange"]],
    [
      "a temperature outside the range",
      { temperatures: [kelvin(300), kelvin(3001)] },
      ["species/outside-range at temperatures.1", "species/outside-range at temperatures.1"],
    ],
  ])("%s is refused", (_name, options, places) => {
    expect(placesOf(() => formatReactionTable(subject, options as never))).toEqual(places);
  });

  test("the hint of a misspelt key", () => {
    const [fault] = faultsOf(() => formatReactionTable(subject, { temperatures: [], outsiderange: 1 } as never));
    expect(fault?.hint).toBe("did you mean outsideRange?");
  });
});

test.each([undefined, null, "a ledger", {}])("formatLedger refuses %s", (account) => {
  expect(placesOf(() => formatLedger(account as never))[0]).toMatch(/^input\/(not-an-object|missing) at account/);
});
