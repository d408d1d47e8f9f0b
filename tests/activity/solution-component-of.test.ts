import { expect, test } from "vitest";
import { solutionComponentOf } from "../../src/activity/solution-component-of.js";
import { H2O_l } from "../../src/data/index.js";
import { placesOf } from "../errors/faults-of.js";
import { recordOf } from "../species/records.js";
import { sodium } from "./solutes.js";

test("label, charge number and molar mass; standard atomic weights of 2021: Na 22.98976928, H 1.008, O 15.999", () => {
  expect(solutionComponentOf(sodium)).toEqual({ label: "Na^+(aq)", chargeNumber: 1, molarMassKgPerMol: 0.02298976928 });
  expect(solutionComponentOf(H2O_l)).toEqual({ label: "H2O(l)", chargeNumber: 0, molarMassKgPerMol: 0.018015 });
});

test("an element without a standard atomic weight leaves the molar mass out", () => {
  expect(solutionComponentOf(recordOf("TcO4^-(aq)"))).toEqual({ label: "TcO4^-(aq)", chargeNumber: -1 });
});

test("the same record gives the same frozen component", () => {
  expect(solutionComponentOf(sodium)).toBe(solutionComponentOf(sodium));
  expect(Object.isFrozen(solutionComponentOf(sodium))).toBe(true);
});

test("a wrong record is refused with its faults", () => {
  expect(placesOf(() => solutionComponentOf(3 as never))).toEqual(["input/not-an-object at "]);
  expect(placesOf(() => solutionComponentOf({ ...sodium, chargeNumber: 2 }, ["x"]))).toEqual([
    "species/inconsistent at x.label",
  ]);
});
