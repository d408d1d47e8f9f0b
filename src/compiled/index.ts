export { type ArrayFunction, type CompiledReaction, type CompileOptions, compileReaction } from "./compile-reaction.js";
