import { fileURLToPath } from "node:url";
import { expect, test } from "vitest";
import { checkExamples } from "./check-examples.js";
import { example, fencedBlocks } from "./examples.js";

const root = fileURLToPath(new URL("../..", import.meta.url));
const imports = 'import { toFaults, GibbsLedgerError } from "gibbs-ledger/errors";';
const fault = '{ code: "input/missing", path: [], message: "nothing given" }';

const holding = `
const two = 1 + 1; // => 2
[two, "a"]; // => [2, "a"]
2 / 3; // => 0.666...
({ two, text: "a" });
// => { two: 2, ... }
refuse(); // throws input/missing
for (const x of [1, 1]) {
  x + 1; // => 2
}
await Promise.resolve(); // an ordinary comment
"long\\n text"; // => \`long
//     text\`
10n * 2n; // => 20n
undefined; // => undefined
function refuse(): void {
  throw new GibbsLedgerError([${fault}]);
}
`;

const failing: readonly (readonly [why: string, code: string, fault: RegExp])[] = [
  ["a wrong value", "1 + 1; // => 3", /the value is 2, the example shows 3/],
  ["a wrong digit", "2 / 3; // => 0.667...", /is 0.6666666666666666, the example shows "0.667"/],
  ["a wrong value of a constant", "const x = 1; // => 2", /is 1, the example shows 2/],
  ["no error", "1; // throws input/missing", /throws nothing/],
  ["another error", `throw new GibbsLedgerError([${fault}]); // throws input/not-finite`, /throws input\/missing/],
  ["an error not shown", `throw new GibbsLedgerError([${fault}]);`, /nothing given/],
  ["a value never reached", "if (toFaults(1).length > 0) {\n  1; // => 1\n}", /line 2: is never reached/],
  ["a type error", 'const x: number = "a";\nx;', /line 1: Type 'string' is not assignable/],
  ["an unknown name", "typeof unknownName;", /line 1: Cannot find name 'unknownName'/],
];

test("values, digits, errors and repeated values are checked", () => {
  const read = example("a.md", 1, holding, imports);
  expect(read.shown).toHaveLength(9);
  expect(checkExamples(root, [read])).toEqual([[]]);
});

test("an example that does not hold tells why", () => {
  const outcomes = checkExamples(
    root,
    failing.map(([why, code]) => example(`${why}.md`, 1, code, imports)),
  );
  failing.forEach(([, , message], index) => {
    expect(outcomes[index]).toEqual([expect.stringMatching(message)]);
  });
});

test("a shown value that cannot be read is refused with its place", () => {
  expect(() => example("a.md", 7, "1;\n2; // => about two", "")).toThrow(/^a\.md:8: expected a value at "about two"/);
});

test("blocks of a document begin at their lines, and a continued block keeps them", () => {
  const markdown = "# A\n\n```ts\na();\n```\n\ntext\n\n<!-- continued -->\n\n```ts\nb();\n```\n\n```ts\nc();\n```\n";
  expect(fencedBlocks(markdown)).toEqual([
    { code: "a();\n\n\n\n\n\n\n\nb();\n", line: 4 },
    { code: "c();\n", line: 16 },
  ]);
});
