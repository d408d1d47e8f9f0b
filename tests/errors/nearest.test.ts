import { expect, test } from "vitest";
import { nearest } from "../../src/errors/nearest.js";

const words = ["temperature", "pressure", "gas", "inerts", "outsideRange"];

test.each([
  ["temperature", "temperature"],
  ["Temperature", "temperature"],
  ["temprature", "temperature"],
  ["tempratur", "temperature"],
  ["tmpratur", undefined],
  ["outsiderange", "outsideRange"],
  ["gass", "gas"],
  ["gsa", undefined],
  ["ga", undefined],
  ["", undefined],
  ["volume", undefined],
  ["x".repeat(61), undefined],
])("nearest to %s is %s", (word, expected) => {
  expect(nearest(word, words)).toBe(expected);
});

test("of equally near candidates the first is named", () => {
  expect(nearest("NH4(g)", ["NH3(g)", "NH2(g)"])).toBe("NH3(g)");
});

test("there may be no candidates", () => {
  expect(nearest("word", [])).toBeUndefined();
});
