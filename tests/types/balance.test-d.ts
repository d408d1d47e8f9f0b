import { expectTypeOf } from "vitest";
import { type Balance, balance, combineReactions, type Reaction } from "../../src/reaction/index.js";
import type { CollectionData } from "../../src/species/record.js";

declare const collection: CollectionData;
declare const subject: Reaction;

const result = balance("H2 + O2 = H2O");
expectTypeOf(result).toEqualTypeOf<Balance>();
expectTypeOf(balance({ reactants: ["H2", "O2"], products: ["H2O"] }, collection)).toEqualTypeOf<Balance>();
expectTypeOf(result.equation).toEqualTypeOf<string | undefined>();
expectTypeOf(result.notes).toEqualTypeOf<readonly string[]>();
if (result.isUnique) expectTypeOf(result.equation).toEqualTypeOf<string>();
else expectTypeOf(result.coefficients).toEqualTypeOf<undefined>();
if (result.isUnique) expectTypeOf(result.coefficients).toEqualTypeOf<Readonly<Record<string, string>>>();

expectTypeOf(combineReactions([{ reaction: subject, coefficient: "-1/2" }])).toEqualTypeOf<Reaction>();
expectTypeOf(combineReactions([{ reaction: subject, coefficient: -1 }])).toEqualTypeOf<Reaction>();

// @ts-expect-error both sides
balance({ reactants: ["H2"] });
// @ts-expect-error names, not reactions
balance(subject);
// @ts-expect-error a collection is no array
balance("H2 + O2 = H2O", []);
// @ts-expect-error a part has a coefficient
combineReactions([{ reaction: subject }]);
// @ts-expect-error an equation is no reaction
combineReactions([{ reaction: "H2 + O2 = H2O", coefficient: 1 }]);
// @ts-expect-error parts stand in an array
combineReactions({ reaction: subject, coefficient: 1 });
// @ts-expect-error results are readonly
result.isUnique = false;
