import { expect, test } from "vitest";
import { runScript, subPaths } from "./consumer.js";

const calculation = `
const synthesis = reaction("N2(g) + 3 H2(g) = 2 NH3(g)", referenceData);
const { gibbsEnergy, log10K } = standardReactionProperties(synthesis, { temperature: quantity(427, "Cel") });
console.log(JSON.stringify({ gibbsEnergy, log10K }));
`;
const esm = `
import { quantity, reaction, standardReactionProperties } from "gibbs-ledger";
import { referenceData } from "gibbs-ledger/data";
`;
const cjs = `
const { quantity, reaction, standardReactionProperties } = require("gibbs-ledger");
const { referenceData } = require("gibbs-ledger/data");
`;

test("every sub-path exports the same names as ESM and as CommonJS", () => {
  const script = `
    import { createRequire } from "node:module";
    const require = createRequire(import.meta.url);
    const names = [];
    for (const subPath of ${JSON.stringify(subPaths)}) {
      const specifier = "gibbs-ledger" + subPath;
      names.push([subPath, Object.keys(await import(specifier)).sort(), Object.keys(require(specifier)).sort()]);
    }
    console.log(JSON.stringify(names));
  `;
  const names = runScript("names.mjs", script) as [string, string[], string[]][];
  expect(names.map(([subPath]) => subPath)).toEqual(subPaths);
  for (const [subPath, fromEsm, fromCjs] of names) {
    expect(fromEsm.length, subPath).toBeGreaterThan(0);
    expect(fromCjs, subPath).toEqual(fromEsm);
  }
});

test("ESM and CommonJS compute the same bits", () => {
  const fromEsm = runScript("calculation.mjs", esm + calculation) as { gibbsEnergy: { value: number; unit: string } };
  expect(fromEsm.gibbsEnergy.unit).toBe("J/mol");
  // log10 Kf of NH3(g) at 700 K is -2.029 (Chase 1998, from memory), so 2 x 27.19 kJ/mol.
  expect(fromEsm.gibbsEnergy.value / 1000).toBeCloseTo(54.4, 0);
  expect(runScript("calculation.cjs", cjs + calculation)).toEqual(fromEsm);
});

test("a reaction of one copy of the package, or out of JSON, is accepted by another copy", () => {
  const script = `
    import { createRequire } from "node:module";
    import { quantity, reaction, standardReactionProperties } from "gibbs-ledger";
    import { referenceData } from "gibbs-ledger/data";
    const other = createRequire(import.meta.url)("gibbs-ledger");
    const at = { temperature: quantity(700, "K") };
    const equation = "CO(g) + H2O(g) = CO2(g) + H2(g)";
    const own = reaction(equation, referenceData);
    const theirs = other.reaction(equation, referenceData);
    const values = [own, theirs, JSON.parse(JSON.stringify(own)), JSON.parse(JSON.stringify(theirs))].map(
      (subject) => standardReactionProperties(subject, at).gibbsEnergy.value,
    );
    console.log(JSON.stringify(values));
  `;
  const [own, ...others] = runScript("copies.mjs", script) as number[];
  expect(own).toBeTypeOf("number");
  expect(others).toEqual([own, own, own]);
});

test("what one copy of the package wrote as JSON, the readers of both read with the same bits", () => {
  const script = `
    import { createRequire } from "node:module";
    import { reaction } from "gibbs-ledger";
    import { referenceData } from "gibbs-ledger/data";
    import { readCollection, readReaction } from "gibbs-ledger/exchange";
    const other = createRequire(import.meta.url)("gibbs-ledger/exchange");
    const data = JSON.stringify(referenceData);
    const synthesis = JSON.stringify(reaction("N2(g) + 3 H2(g) = 2 NH3(g)", referenceData));
    const read = [readCollection(data), other.readCollection(data), other.readCollection(readCollection(data))];
    const reactions = [readReaction(synthesis), other.readReaction(synthesis), readReaction(other.readReaction(synthesis))];
    console.log(JSON.stringify([
      read.map((collection) => JSON.stringify(collection) === data),
      reactions.map((subject) => JSON.stringify(subject) === synthesis),
    ]));
  `;
  expect(runScript("exchange.mjs", script)).toEqual([
    [true, true, true],
    [true, true, true],
  ]);
});

test("the JSON Schema files are read by their names", () => {
  const script = `
    import record from "gibbs-ledger/species-record.schema.json" with { type: "json" };
    import { createRequire } from "node:module";
    const collection = createRequire(import.meta.url)("gibbs-ledger/species-collection.schema.json");
    console.log(JSON.stringify([record.$id, collection.$id]));
  `;
  expect(runScript("schema-files.mjs", script)).toEqual([
    "species-record.schema.json",
    "species-collection.schema.json",
  ]);
});

test("an error of one copy is recognised by the other", () => {
  const script = `
    import { createRequire } from "node:module";
    import { quantity } from "gibbs-ledger";
    const { isGibbsLedgerError, GibbsLedgerError } = createRequire(import.meta.url)("gibbs-ledger/errors");
    try {
      quantity(Number.NaN, "K");
    } catch (error) {
      console.log(JSON.stringify([isGibbsLedgerError(error, "quantity/not-finite"), error instanceof GibbsLedgerError]));
    }
  `;
  expect(runScript("errors.mjs", script)).toEqual([true, false]);
});
