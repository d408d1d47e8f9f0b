import { endOfRun, isDigit, isSign, isSmallLetter, isSuperscript } from "./characters.js";
import { type Reader, stop } from "./reader.js";

/** Where water ends a formula. */
export interface HydrateTail {
  /** Digits before the H, possibly none. */
  readonly digits: string;
  /** Index of the H. */
  readonly water: number;
}

/** Whether the composition ends at a position: at the end, a charge, or a state. */
export function endsComposition(text: string, position: number): boolean {
  const character = text.charAt(position);
  if (character === "" || character === "^") return true;
  if (character === "(") return isSmallLetter(text.charAt(position + 1));
  return isSuperscript(character) || isSign(character);
}

/** The water that ends a formula, read from behind an ASCII dot: an optional integer and H2O. */
export function hydrateTail(text: string, from: number): HydrateTail | undefined {
  const water = endOfRun(text, from, isDigit);
  const two = text.charAt(water + 1);
  if (text.charAt(water) !== "H" || (two !== "2" && two !== "₂") || text.charAt(water + 2) !== "O") return undefined;
  return endsComposition(text, water + 3) ? { digits: text.slice(from, water), water } : undefined;
}

/** Refuses an ASCII dot that could be a decimal point or a separator, and writes out both readings. */
export function stopAtAmbiguousDot(reader: Reader, dot: number, readings: readonly string[]): void {
  stop(reader, {
    code: "formula/ambiguous-dot",
    position: dot,
    message: "the dot may be a decimal point or may separate the water",
    expected: "· (U+00B7) between the parts of a formula",
    hint: `separate with ·: write ${readings.join(" or ")}`,
  });
}

/** A text with some of its characters replaced by another text. */
export function spliced(text: string, at: number, length: number, by: string): string {
  return text.slice(0, at) + by + text.slice(at + length);
}
