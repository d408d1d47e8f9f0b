import { describe, expect, test } from "vitest";
import {
  combineUncertainties,
  coverageFactor,
  normalQuantile,
  standardUncertaintyOf,
} from "../../src/uncertainty/index.js";
import { faultsOf } from "../errors/faults-of.js";

/** Anything, as plain JavaScript may pass it. */
// biome-ignore lint/suspicious/noExplicitAny: the subject of this table is what types forbid
type Anything = any;

const huge = "x".repeat(1_000_000);
const line = { datum: "a", sensitivity: 1, standardUncertainty: 1 };
const interval = (parts: Anything): Anything => ({ halfWidth: 1, coverage: 0.95, ...parts });
const withPrototype: Anything = JSON.parse('{ "__proto__": 1, "halfWidth": 1, "coverage": 0.95 }');

describe.each<[string, () => unknown, string, string?]>([
  ["a certain probability", () => normalQuantile(1), "numeric/outside-domain at probability"],
  ["a probability of text", () => normalQuantile(huge as Anything), "numeric/outside-domain at probability"],
  ["a coverage in per cent", () => coverageFactor(99.7), "uncertainty/invalid-coverage at coverage", "0.997"],
  ["a coverage of 100 per cent", () => coverageFactor(100), "uncertainty/invalid-coverage at coverage"],
  ["a coverage that is a factor", () => coverageFactor(2), "uncertainty/invalid-coverage at coverage"],
  ["no coverage", () => coverageFactor(undefined as Anything), "input/not-finite at coverage"],
  ["an interval of text", () => standardUncertaintyOf(huge as Anything), "input/not-an-object at interval"],
  ["an array", () => standardUncertaintyOf([1, 0.95] as Anything), "input/not-an-object at interval"],
  [
    "a negative half width",
    () => standardUncertaintyOf(interval({ halfWidth: -0.1 })),
    "quantity/negative-uncertainty at interval.halfWidth",
  ],
  [
    "an infinite half width",
    () => standardUncertaintyOf(interval({ halfWidth: Number.POSITIVE_INFINITY })),
    "input/not-finite at interval.halfWidth",
  ],
  [
    "the largest half width and hardly a coverage",
    () => standardUncertaintyOf({ halfWidth: 1.7e308, coverage: 1e-5 }),
    "uncertainty/overflow at interval",
  ],
  [
    "a key near a right one",
    () => standardUncertaintyOf(interval({ halfwidth: 1 })),
    "input/unknown-key at interval.halfwidth",
    "halfWidth",
  ],
  ["a prototype", () => standardUncertaintyOf(withPrototype), "input/forbidden-key at interval.__proto__"],
  ["contributions of text", () => combineUncertainties(huge as Anything), "input/not-an-array at contributions"],
  ["one contribution by itself", () => combineUncertainties(line as Anything), "input/not-an-array at contributions"],
  [
    "a datum of a million characters",
    () => combineUncertainties([{ ...line, datum: huge }]),
    "input/too-large at contributions.0.datum",
  ],
  [
    "a datum by number",
    () => combineUncertainties([{ ...line, datum: 1 as Anything }]),
    "input/not-a-string at contributions.0.datum",
  ],
  [
    "a sign in the uncertainty",
    () => combineUncertainties([{ ...line, standardUncertainty: -1 }]),
    "quantity/negative-uncertainty at contributions.0.standardUncertainty",
    "sign belongs to the sensitivity",
  ],
  [
    "an uncertainty of null",
    () => combineUncertainties([{ ...line, standardUncertainty: null as Anything }]),
    "input/not-finite at contributions.0.standardUncertainty",
  ],
  [
    "two uncertainties of one datum",
    () => combineUncertainties([line, { ...line, standardUncertainty: 2 }]),
    "uncertainty/inconsistent-datum at contributions.1.standardUncertainty",
    "name two data",
  ],
  [
    "sensitivities that overflow",
    () =>
      combineUncertainties([
        { ...line, sensitivity: 1e308 },
        { ...line, sensitivity: 1e308 },
      ]),
    "uncertainty/overflow at contributions",
  ],
])("%s", (_name, call, place, hint) => {
  test("is refused, in one readable line", () => {
    const faults = faultsOf(call);
    const found = faults.find(({ code, path }) => `${code} at ${path.join(".")}` === place);
    expect(faults.map(({ code, path }) => `${code} at ${path.join(".")}`)).toContain(place);
    if (hint !== undefined) expect(found?.hint).toContain(hint);
    for (const { message, received, expected } of faults) {
      expect(message.length).toBeLessThanOrEqual(500);
      expect(message).not.toContain("\n");
      expect(received?.length ?? 0).toBeLessThanOrEqual(250);
      expect(expected?.length ?? 0).toBeLessThanOrEqual(500);
    }
  });
});

test("results are finite and never a negative zero, whatever the size", () => {
  const sizes = [0, 5e-324, 1e-300, 1e-150, 1, 1e150, 1e300];
  for (const halfWidth of sizes) {
    for (const coverage of [1e-7, 0.5, 0.95, 1 - 2 ** -53]) {
      const u = standardUncertaintyOf({ halfWidth: -halfWidth === 0 ? -0 : halfWidth, coverage });
      expect(Number.isFinite(u) && !Object.is(u, -0)).toBe(true);
    }
    for (const sensitivity of [-1, -0, 0, 1]) {
      const { standardUncertainty, data } = combineUncertainties([
        { datum: "a", sensitivity, standardUncertainty: halfWidth },
        { datum: "b", sensitivity: -sensitivity, standardUncertainty: halfWidth / 3 },
      ]);
      const numbers = [
        standardUncertainty,
        ...data.flatMap((one) => [one.component, one.sensitivity, one.varianceShare]),
      ];
      for (const number of numbers) expect(Number.isFinite(number) && !Object.is(number, -0)).toBe(true);
    }
  }
});
