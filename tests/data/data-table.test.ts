import { readFileSync } from "node:fs";
import { expect, test } from "vitest";
import { referenceData } from "../../src/data/index.js";
import { dataTable } from "../tools/data-table.js";

test("docs/data.md holds the table of the reference data as it is", () => {
  const page = readFileSync(new URL("../../docs/data.md", import.meta.url), "utf8");
  expect(page).toContain(dataTable(referenceData));
});
