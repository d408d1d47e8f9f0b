import { expectTypeOf } from "vitest";
import type { CompiledReaction } from "../../src/compiled/index.js";
import { compileReaction } from "../../src/compiled/index.js";
import type { Reaction } from "../../src/reaction/index.js";

declare const subject: Reaction;

const compiled = compileReaction(subject, { outsideRange: "constant-heat-capacity" });
expectTypeOf(compiled).toEqualTypeOf<CompiledReaction>();
expectTypeOf(compiled.gibbsEnergy).parameters.toEqualTypeOf<[Float64Array, Float64Array]>();
expectTypeOf(compiled.gibbsEnergy(new Float64Array(1), new Float64Array(1))).toEqualTypeOf<Float64Array>();
expectTypeOf(compiled.fromK).toEqualTypeOf<number>();

// @ts-expect-error results need a place
compiled.lnK(new Float64Array(1));
// @ts-expect-error doubles, not an array
compiled.lnK([300], new Float64Array(1));
// @ts-expect-error doubles, not singles
compiled.lnK(new Float32Array(1), new Float64Array(1));
// @ts-expect-error an equation is no reaction
compileReaction("N2 = 2 N");
// @ts-expect-error the policies are a closed set
compileReaction(subject, { outsideRange: "extrapolate" });
// @ts-expect-error a compiled reaction is readonly
compiled.fromK = 0;
