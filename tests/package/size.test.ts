import { expect, test } from "vitest";
import { bundleForUse } from "./bundle.js";
import { subPaths } from "./consumer.js";
import budgets from "./size-budget.json" with { type: "json" };

const budgetOf: Readonly<Record<string, number>> = budgets;

test("each sub-path has a budget, and no other has", () => {
  expect(Object.keys(budgetOf).sort()).toEqual(subPaths.map((subPath) => `.${subPath}`).sort());
});

test.each(subPaths)("gibbs-ledger%s stays within its budget of gzip bytes", async (subPath) => {
  const budget = budgetOf[`.${subPath}`] ?? 0;
  const { gzipBytes } = await bundleForUse(`import * as all from "gibbs-ledger${subPath}";\nconsole.log(all);`);
  expect(gzipBytes).toBeLessThanOrEqual(budget);
  // A budget far above what is used would allow anything: it is lowered when the code shrinks.
  expect(gzipBytes).toBeGreaterThan(budget * 0.75);
});
