import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { type CompiledReaction, compileReaction } from "../../src/compiled/index.js";
import { referenceData } from "../../src/data/reference-data.js";
import { type Reaction, reaction, standardReactionProperties } from "../../src/reaction/index.js";
import { faultsOf, placesOf } from "../errors/faults-of.js";
import { temperaturesK } from "../heat-capacity/random-series.js";
import { randomTerms, reactionOf } from "../reaction/random-reactions.js";
import { collectionOf, recordOf } from "../species/records.js";

const names = ["heatCapacity", "enthalpy", "entropy", "gibbsEnergy", "lnK"] as const;
const synthesis = reaction("N2 + 3 H2 = 2 NH3", referenceData);
const compiled = compileReaction(synthesis);

type Name = (typeof names)[number];

function scalar(subject: Reaction, name: Name, value: number, rest: object = {}): number {
  const properties = standardReactionProperties(subject, { temperature: { value, unit: "K" }, ...rest });
  return name === "lnK" ? properties.lnK : properties[name]!.value;
}

function run(subject: CompiledReaction, name: Name, values: readonly number[]): number[] {
  return [...subject[name](Float64Array.from(values), new Float64Array(values.length))];
}

const arrays = fc.array(temperaturesK, { minLength: 0, maxLength: 40 });

describe("compiled functions give the bits of the scalar ones", () => {
  test("of random reactions of every form", () => {
    fc.assert(
      fc.property(randomTerms, arrays, (terms, values) => {
        const subject = reactionOf(terms);
        for (const name of names) {
          expect(run(compileReaction(subject), name, values)).toEqual(
            values.map((value) => scalar(subject, name, value)),
          );
        }
      }),
      { seed: 20261201, numRuns: 100 },
    );
  });

  test("across every break of the reference data, on it and beside it", () => {
    for (const text of ["N2 + 3 H2 = 2 NH3", "CaCO3(s) = CaO(s) + CO2", "C(s) + CO2 = 2 CO", "NO + ½ O2 = NO2"]) {
      const subject = reaction(text, referenceData);
      const { fromK, toK } = compileReaction(subject);
      const breaks = [200, 298.15, 300, 600, 1000, 1200, 1700, 6000];
      const near = breaks.flatMap((value) => [value * (1 - Number.EPSILON), value, value * (1 + Number.EPSILON)]);
      const values = near.filter((value) => value >= fromK && value <= toK);
      expect(values.length).toBeGreaterThan(3);
      for (const name of names) {
        expect(run(compileReaction(subject), name, values)).toEqual(
          values.map((value) => scalar(subject, name, value)),
        );
      }
    }
  });

  test("whatever the order and the chunks", () => {
    fc.assert(
      fc.property(arrays, fc.integer({ min: 1, max: 7 }), (values, size) => {
        const whole = run(compiled, "gibbsEnergy", values);
        const backward = run(compiled, "gibbsEnergy", [...values].reverse()).reverse();
        const chunks: number[] = [];
        for (let start = 0; start < values.length; start += size) {
          chunks.push(...run(compiled, "gibbsEnergy", values.slice(start, start + size)));
        }
        expect(backward).toEqual(whole);
        expect(chunks).toEqual(whole);
      }),
      { seed: 20261202, numRuns: 300 },
    );
  });

  test.each(["constant-heat-capacity", "continue-fit"] as const)("under the policy %s", (outsideRange) => {
    const wide = compileReaction(synthesis, { outsideRange });
    expect([wide.fromK, wide.toK]).toEqual([1, 100_000]);
    const values = [1, 100, 200, 300, 1000, 6000, 7000, 100_000];
    for (const name of names) {
      expect(run(wide, name, values)).toEqual(values.map((value) => scalar(synthesis, name, value, { outsideRange })));
    }
  });

  test("of a reaction from JSON", () => {
    const foreign = compileReaction(JSON.parse(JSON.stringify(synthesis)) as Reaction);
    expect(run(foreign, "lnK", [300, 700])).toEqual(run(compiled, "lnK", [300, 700]));
  });
});

describe("arrays", () => {
  test("the result is the array that was handed in", () => {
    const out = new Float64Array(2);
    expect(compiled.enthalpy(Float64Array.of(300, 400), out)).toBe(out);
  });

  test("may be one and the same", () => {
    const values = Float64Array.of(1500, 300, 700);
    const expected = run(compiled, "lnK", [...values]);
    expect([...compiled.lnK(values, values)]).toEqual(expected);
  });

  test("may be views side by side of one buffer, but not overlap", () => {
    const memory = new Float64Array(6).fill(500);
    const beside = compiled.gibbsEnergy(memory.subarray(0, 3), memory.subarray(3, 6));
    expect([...beside]).toEqual(run(compiled, "gibbsEnergy", [500, 500, 500]));
    memory.fill(500);
    for (const [from, to] of [
      [0, 1],
      [1, 0],
      [0, 2],
    ] as const) {
      expect(
        placesOf(() => compiled.gibbsEnergy(memory.subarray(from, from + 3), memory.subarray(to, to + 3))),
      ).toEqual(["compiled/overlapping-arrays at out"]);
    }
    expect([...memory]).toEqual(Array(6).fill(500));
  });

  test("may be empty", () => {
    expect(run(compiled, "entropy", [])).toEqual([]);
  });
});

describe("what is wrong", () => {
  test.each<[string, number, number]>([
    ["below the range", 199.999, 2],
    ["above the range", 6000.001, 2],
    ["zero", 0, 2],
    ["negative", -300, 2],
    ["NaN", Number.NaN, 2],
    ["infinite", Number.POSITIVE_INFINITY, 2],
  ])("a temperature %s names its index, and nothing is written", (_name, value, place) => {
    for (const name of names) {
      const out = new Float64Array(5).fill(7);
      const [fault, ...others] = faultsOf(() => compiled[name](Float64Array.of(300, 400, value, 500, value), out));
      expect(others).toEqual([]);
      expect(fault).toMatchObject({ code: "heat-capacity/outside-range", path: ["temperaturesK", place] });
      expect([...out]).toEqual([7, 7, 7, 7, 7]);
    }
  });

  test.each<[string, unknown, unknown, string[]]>([
    [
      "an array in place of a Float64Array",
      [300],
      new Float64Array(1),
      ["compiled/not-a-float-array at temperaturesK"],
    ],
    ["single precision", new Float32Array(1), new Float64Array(1), ["compiled/not-a-float-array at temperaturesK"]],
    ["nothing", undefined, null, ["compiled/not-a-float-array at temperaturesK", "compiled/not-a-float-array at out"]],
    ["lengths that differ", new Float64Array(2), new Float64Array(3), ["compiled/length-mismatch at out"]],
  ])("%s", (_name, values, out, places) => {
    expect(placesOf(() => compiled.gibbsEnergy(values as Float64Array, out as Float64Array))).toEqual(places);
  });

  test("an array hints at Float64Array.from", () => {
    const [fault] = faultsOf(() => compiled.gibbsEnergy([300] as never, new Float64Array(1)));
    expect(fault?.hint).toBe("Float64Array.from(array)");
  });

  test.each<[string, unknown, string]>([
    ["null", null, "input/not-an-object at "],
    ["another policy", { outsideRange: "go on" }, "input/unknown-option at outsideRange"],
    ["a policy of the prototype", { outsideRange: "__proto__" }, "input/unknown-option at outsideRange"],
    ["an unknown key", { policy: "refuse" }, "input/unknown-key at policy"],
  ])("options: %s", (_name, options, place) => {
    expect(placesOf(() => compileReaction(synthesis, options as never))).toEqual([place]);
  });

  test("no reaction", () => {
    expect(placesOf(() => compileReaction("N2 = 2 N" as never))).toEqual(["reaction/not-a-reaction at reaction"]);
  });

  test("a reaction without a heat capacity has its other functions at 298.15 K", () => {
    const change = compileReaction(reaction("W(cr) = W(l)", collectionOf(recordOf("W(cr)"), recordOf("W(l)"))));
    expect([change.fromK, change.toK]).toEqual([298.15, 298.15]);
    expect(run(change, "gibbsEnergy", [298.15])).toEqual([0]);
    expect(placesOf(() => run(change, "heatCapacity", [298.15]))).toEqual(["heat-capacity/not-available at "]);
  });
});

test("a compiled reaction is frozen and says what it is of", () => {
  expect(Object.isFrozen(compiled)).toBe(true);
  expect(compiled.equation).toBe("N2(g) + 3 H2(g) = 2 NH3(g)");
  expect([compiled.fromK, compiled.toK]).toEqual([200, 6000]);
});
