import { fileURLToPath } from "node:url";
import { beforeAll, expect, test } from "vitest";
import { checkExamples } from "./tools/check-examples.js";
import { readExamples } from "./tools/examples.js";

const root = fileURLToPath(new URL("..", import.meta.url));
const examples = readExamples(root);
let faults: string[][];

beforeAll(() => {
  faults = checkExamples(root, examples);
});

test.each(examples.map(({ place }, index) => [place, index] as const))("the example at %s holds", (_, index) => {
  expect(faults[index]).toEqual([]);
});
