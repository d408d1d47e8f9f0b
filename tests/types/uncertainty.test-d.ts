import { expectTypeOf } from "vitest";
import {
  type CombinedUncertainty,
  combineUncertainties,
  coverageFactor,
  normalQuantile,
  standardUncertaintyOf,
} from "../../src/uncertainty/index.js";

expectTypeOf(normalQuantile(0.975)).toEqualTypeOf<number>();
expectTypeOf(coverageFactor(0.95)).toEqualTypeOf<number>();
expectTypeOf(standardUncertaintyOf({ halfWidth: 0.1, coverage: 0.95 })).toEqualTypeOf<number>();
const combined = combineUncertainties([{ datum: "a", sensitivity: 1 }]);
expectTypeOf(combined).toEqualTypeOf<CombinedUncertainty>();
expectTypeOf(combined.data[0]!.component).toEqualTypeOf<number | undefined>();

// @ts-expect-error a coverage is stated
standardUncertaintyOf({ halfWidth: 0.1 });
// @ts-expect-error a number, not a text
coverageFactor("0.95");
// @ts-expect-error an unknown uncertainty is left out
combineUncertainties([{ datum: "a", sensitivity: 1, standardUncertainty: undefined }]);
// @ts-expect-error a datum has a name
combineUncertainties([{ sensitivity: 1, standardUncertainty: 1 }]);
// @ts-expect-error results are readonly
combined.standardUncertainty = 0;
