import { describeReceived } from "../errors/fault.js";
import { isDigit, isSubscriptDigit, isSuperscript } from "./characters.js";
import { type Reader, stop } from "./reader.js";

/** Refuses a character that begins nothing of a formula, with a hint for the likely slips. */
export function stopAtUnexpected(reader: Reader, inBrackets: boolean): void {
  const { text, position } = reader;
  const hint = hintFor(text, position, inBrackets);
  stop(reader, {
    code: "formula/syntax",
    position,
    message: `unexpected ${describeReceived(String.fromCodePoint(text.codePointAt(position) ?? 0))}`,
    expected: "the symbol of an element, a count, a bracket or ·",
    ...(hint === undefined ? {} : { hint }),
  });
}

function hintFor(text: string, position: number, inBrackets: boolean): string | undefined {
  const character = text.charAt(position);
  if (character.trim() === "") return "write the formula without spaces";
  if (character === "*") return "separate the parts of a formula with · (U+00B7)";
  if (character === "/") return "write a fraction as a decimal, such as 0.5";
  if (character === ",") return "a comma stands only in a state with small letters, as in (cr,graphite)";
  if (character === "₊" || character === "₋") return "write the charge as in SO4^2- or SO₄²⁻";
  if (inBrackets && (character === "^" || isSuperscript(character)))
    return "the charge stands at the end, behind all brackets";
  if (isDigit(character) || isSubscriptDigit(character))
    return "a count stands behind a symbol or a bracket, in one kind of digits";
  return undefined;
}
