import { isDigit, subscriptDigits, superscriptDigits } from "./characters.js";
import { chargeText } from "./mistaken-charge.js";
import type { FormulaStyle, Spelling, Token } from "./spelling.js";

/** Writes the composition of a formula without charge and state. */
export function writeComposition(tokens: readonly Token[], style: FormulaStyle): string {
  return withWaterApart(tokens)
    .map(({ kind, text }) => (kind === "count" && style === "unicode" ? raised(text, subscriptDigits) : text))
    .join("");
}

/** Writes the charge; empty for a neutral species. */
export function writeCharge(chargeNumber: number, style: FormulaStyle): string {
  if (chargeNumber === 0) return "";
  const text = chargeText(Math.abs(chargeNumber), chargeNumber > 0 ? "+" : "-");
  if (style === "ascii") return text;
  return raised(text.slice(1, -1), superscriptDigits) + (chargeNumber > 0 ? "⁺" : "⁻");
}

/** Writes a formula with charge, state and polymorph. */
export function writeSpelling(spelling: Spelling, style: FormulaStyle): string {
  const { tokens, chargeNumber, state, polymorph } = spelling;
  const suffix = state === undefined ? "" : `(${state}${polymorph === undefined ? "" : `,${polymorph}`})`;
  return writeComposition(tokens, style) + writeCharge(chargeNumber, style) + suffix;
}

/** A decimal count right before the H2O that ends a formula would read as a dot before water: a · keeps them apart. */
function withWaterApart(tokens: readonly Token[]): readonly Token[] {
  const water = tokens.length - 3;
  const before = tokens[water - 1];
  if (before?.kind !== "count" || !before.text.includes(".")) return tokens;
  const isWater = tokens[water]!.text === "H" && tokens[water + 1]!.text === "2" && tokens[water + 2]!.text === "O";
  return isWater ? [...tokens.slice(0, water), { kind: "separator", text: "·" }, ...tokens.slice(water)] : tokens;
}

function raised(digits: string, set: string): string {
  let text = "";
  for (const digit of digits) text += isDigit(digit) ? set.charAt(Number(digit)) : digit;
  return text;
}
