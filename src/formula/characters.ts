/** Subscript digits, each at the place of its value. */
export const subscriptDigits = "₀₁₂₃₄₅₆₇₈₉";

/** Superscript digits, each at the place of its value. */
export const superscriptDigits = "⁰¹²³⁴⁵⁶⁷⁸⁹";

/** The characters that always separate the parts of a formula; the first is the one that is written. */
export const separators = "·•⋅";

/** Whether a character is one of a set; the empty text past the end of a formula is in no set. */
export function isOneOf(character: string, set: string): boolean {
  return character !== "" && set.includes(character);
}

/** Whether a character is a digit 0 to 9. */
export function isDigit(character: string): boolean {
  return character >= "0" && character <= "9";
}

/** Whether a character is a subscript digit. */
export function isSubscriptDigit(character: string): boolean {
  return isOneOf(character, subscriptDigits);
}

/** Whether a character is a capital letter A to Z. */
export function isCapital(character: string): boolean {
  return character >= "A" && character <= "Z";
}

/** Whether a character is a small letter a to z. */
export function isSmallLetter(character: string): boolean {
  return character >= "a" && character <= "z";
}

/** Whether a character is a letter A to Z or a to z. */
export function isLetter(character: string): boolean {
  return isCapital(character) || isSmallLetter(character);
}

/** Whether a character is a sign on the line: plus, hyphen or minus. */
export function isSign(character: string): boolean {
  return isOneOf(character, "+-−");
}

/** Whether a character is a superscript digit or sign. */
export function isSuperscript(character: string): boolean {
  return isOneOf(character, "⁺⁻") || isOneOf(character, superscriptDigits);
}

/** Where a run of characters ends that begins at a position; the position itself where there is none. */
export function endOfRun(text: string, from: number, belongs: (character: string) => boolean): number {
  let end = from;
  while (end < text.length && belongs(text.charAt(end))) end += 1;
  return end;
}
