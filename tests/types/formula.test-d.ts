import { expectTypeOf, test } from "vitest";
import {
  type AtomicWeight,
  atomicWeights,
  type ElementSymbol,
  type Formula,
  formatFormula,
  formula,
  hillFormula,
  type LabelParts,
  molarMass,
  parseLabel,
  type WeighedElementSymbol,
} from "../../src/formula/index.js";
import type { MolarMass, Quantity, Temperature } from "../../src/quantity/quantity.js";

test("the types of formula", () => {
  expectTypeOf(formula("H2O")).toEqualTypeOf<Formula>();
  expectTypeOf(parseLabel("H2O(l)")).toEqualTypeOf<LabelParts>();
  expectTypeOf(molarMass("H2O")).toEqualTypeOf<Quantity<"molarMass", "g/mol">>();
  expectTypeOf(molarMass(formula("H2O"))).toExtend<MolarMass>();
  expectTypeOf(molarMass("H2O")).not.toExtend<Temperature>();
  expectTypeOf(hillFormula(formula("H2O").composition)).toEqualTypeOf<string>();
  expectTypeOf(atomicWeights.H).toEqualTypeOf<AtomicWeight>();
  expectTypeOf<WeighedElementSymbol>().toExtend<ElementSymbol>();
  expectTypeOf<"Tc">().not.toExtend<WeighedElementSymbol>();
  expectTypeOf<"D">().not.toExtend<ElementSymbol>();

  // @ts-expect-error a number is no formula
  formula(2);
  // @ts-expect-error technetium has no standard atomic weight
  atomicWeights.Tc;
  // @ts-expect-error a composition is read only
  formula("H2O").composition.H = 1;
  // @ts-expect-error there is no such style
  formatFormula("H2O", { style: "html" });
});
