import { expect, inject, test } from "vitest";
import { bundleForUse } from "./bundle.js";
import { runInConsumer, subPaths, writeConsumerFile } from "./consumer.js";

const heavy = /node_modules\/(?:zod|decimal\.js)\//;

/** Sub-paths that are allowed to load a package, and which. */
const loads: Readonly<Record<string, RegExp>> = {
  "/schema": /node_modules\/zod\//,
  "/precision": /node_modules\/decimal\.js\//,
};

test.each(subPaths)("importing gibbs-ledger%s loads no package beyond its own needs", async (subPath) => {
  const { inputs } = await bundleForUse(`import * as all from "gibbs-ledger${subPath}";\nconsole.log(all);`);
  const loaded = inputs.filter((path) => heavy.test(path) && !loads[subPath]?.test(path));
  expect(inputs.some((path) => path.includes("gibbs-ledger/dist/"))).toBe(true);
  expect(loaded).toEqual([]);
});

test("the root holds no reference data, in a bundle of everything it exports", async () => {
  const { code } = await bundleForUse('import * as all from "gibbs-ledger";\nconsole.log(all);');
  const { code: data } = await bundleForUse(
    'import { referenceData } from "gibbs-ledger/data";\nconsole.log(referenceData);',
  );
  expect(data).toContain('label: "NH3(g)"');
  expect(code).not.toContain('label: "NH3(g)"');
});

test("the root loads neither zod nor decimal.js in Node", () => {
  const hook = `
    import { register } from "node:module";
    register("data:text/javascript," + encodeURIComponent(\`
      export async function load(url, context, next) {
        process._rawDebug(url);
        return next(url, context);
      }
    \`));
  `;
  const path = writeConsumerFile("loaded.mjs", 'import "gibbs-ledger";\n');
  const register = writeConsumerFile("register.mjs", hook);
  const printed = runInConsumer("sh", "-c", `"${process.execPath}" --import "${register}" "${path}" 2>&1`);
  expect(printed).toContain("gibbs-ledger/dist/index.js");
  expect(printed).not.toMatch(heavy);
  expect(printed).toContain(inject("consumer"));
});

test("one species pulls no other species into a bundle", async () => {
  const { code } = await bundleForUse('import { NH3_g } from "gibbs-ledger/data";\nconsole.log(NH3_g);');
  expect(code).toContain("NH3(g)");
  expect(code).not.toContain("H2O(g)");
  expect(code).not.toContain("CO2(g)");
});

test("quantity alone pulls neither other rooms, nor data, into a bundle", async () => {
  const { code, inputs } = await bundleForUse(
    'import { quantity } from "gibbs-ledger";\nconsole.log(quantity(1, "K"));',
  );
  expect(code).toContain("quantity/unknown-unit");
  for (const word of ["reaction/unbalanced", "compiled/length-mismatch", "heat-capacity/intervals"]) {
    expect(code).not.toContain(word);
  }
  expect(inputs.filter((path) => heavy.test(path))).toEqual([]);
});
