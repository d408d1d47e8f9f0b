import { endOfRun, isDigit, isOneOf, isSign, isSuperscript, superscriptDigits } from "./characters.js";
import { maximumChargeDigits } from "./limits.js";
import { chargeText } from "./mistaken-charge.js";
import { type Reader, stop } from "./reader.js";

/**
 * Reads a charge: after a caret a number and a sign (`^2-`, `^+`), or both as superscripts (`²⁻`, `⁺`).
 *
 * @returns the charge number; 0 where the reading has stopped
 */
export function readCharge(reader: Reader): number {
  const { text } = reader;
  const start = reader.position;
  const hasCaret = text.charAt(start) === "^";
  const from = hasCaret ? start + 1 : start;
  const end = endOfRun(text, from, hasCaret ? (character) => isDigit(character) || isSign(character) : isSuperscript);
  const charge = plainCharge(text.slice(from, end));
  const digitsEnd = endOfRun(charge, 0, isDigit);
  const digits = charge.slice(0, digitsEnd);
  const signs = charge.slice(digitsEnd);
  const head = text.slice(0, start);
  const tail = text.slice(end);
  if (charge === "" || (digits !== "" && signs === "")) {
    stop(reader, {
      code: "formula/syntax",
      position: end,
      message: digits === "" ? "a charge follows the caret" : "the charge has no sign",
      expected: "a number and a sign, as in ^2-, or a sign alone",
      hint: hintWithoutSign(head, digits, text.charAt(end)),
    });
    return 0;
  }
  if (signs.length > 1) {
    const meant = digits === "" ? chargeMeant(signs) : undefined;
    stop(reader, {
      code: "formula/charge-order",
      position: from + digitsEnd,
      message: "the number of a charge stands before its one sign",
      expected: "a number and a sign, as in ^2-, or a sign alone",
      hint: meant === undefined ? "write the charge as in SO4^2- or Na^+" : `write ${head}${meant}${tail}`,
    });
    return 0;
  }
  if (digits.startsWith("0") || digits.length > maximumChargeDigits) {
    const isZero = digits.startsWith("0");
    stop(reader, {
      code: isZero ? "formula/syntax" : "formula/count-out-of-range",
      position: from,
      message: isZero
        ? "the number of a charge begins with 0"
        : `the charge has more than ${maximumChargeDigits} digits`,
      expected: "a charge number of 1 to 999",
      ...(isZero ? { hint: "leave out the charge of a neutral species" } : {}),
    });
    return 0;
  }
  reader.position = end;
  const magnitude = digits === "" ? 1 : Number(digits);
  return signs === "+" ? magnitude : -magnitude;
}

function hintWithoutSign(head: string, digits: string, next: string): string {
  if (next === "{") return "write the charge as in SO4^2-, without braces";
  if (digits.startsWith("0")) return "leave out the charge of a neutral species";
  return digits === "" ? "write the charge as in SO4^2- or Na^+" : `write ${head}^${digits}+ or ${head}^${digits}-`;
}

/** What a charge with its sign first (`-2`) or with repeated signs (`+++`) means. */
function chargeMeant(signs: string): string | undefined {
  const sign = signs.charAt(0);
  const repeated = endOfRun(signs, 0, (character) => character === sign);
  const digits = signs.slice(repeated);
  if (repeated === signs.length) return chargeText(repeated, sign);
  const isNumber = endOfRun(digits, 0, isDigit) === digits.length && !digits.startsWith("0");
  return repeated === 1 && isNumber && digits.length <= maximumChargeDigits
    ? chargeText(Number(digits), sign)
    : undefined;
}

function plainCharge(text: string): string {
  let plain = "";
  for (const character of text) {
    if (isOneOf(character, superscriptDigits)) plain += String(superscriptDigits.indexOf(character));
    else if (isOneOf(character, "⁻−-")) plain += "-";
    else plain += character === "⁺" ? "+" : character;
  }
  return plain;
}
