import { endOfRun, isDigit, isLetter, isSign, isSubscriptDigit } from "./characters.js";
import { isSymbol } from "./element-symbols.js";
import { maximumChargeDigits } from "./limits.js";
import { type Reader, stop } from "./reader.js";

/** A charge as canonical text: the number before the sign, no number for one. */
export function chargeText(magnitude: number, sign: string): string {
  return `^${magnitude === 1 ? "" : magnitude}${sign === "+" ? "+" : "-"}`;
}

/** Refuses a sign without a caret, as in `Na+`, `Fe+3`, `Fe+++`, `Fe3+`, and writes out what is likely meant. */
export function stopAtBareSign(reader: Reader): void {
  const { text, position } = reader;
  const sign = text.charAt(position);
  const signsEnd = endOfRun(text, position, (character) => character === sign);
  const end = endOfRun(text, signsEnd, isDigit);
  const hint = restIsState(text, end) ? hintAt(text, position, signsEnd, end) : undefined;
  if (hint === undefined && (isLetter(text.charAt(end)) || text.charAt(end) === "(")) {
    stop(reader, {
      code: "formula/syntax",
      position,
      message: `${sign} inside a formula`,
      hint: "bonds are not written; the charge ends the formula, as in SO4^2-",
    });
    return;
  }
  stop(reader, {
    code: "formula/charge-order",
    position,
    message: "a charge is written after a caret, the number before the sign",
    expected: "a charge such as ^2- or ^+",
    hint: hint ?? "write the charge as in SO4^2- or Na^+",
  });
}

/** Refuses a charge in brackets, as in `Fe(3+)`; `content` is the text between them. */
export function stopAtChargeInBrackets(reader: Reader, content: string): void {
  const { text, position } = reader;
  const digits = content.slice(endOfRun(content, 0, isSign), endOfRun(content, endOfRun(content, 0, isSign), isDigit));
  const sign = isSign(content.charAt(0)) ? content.charAt(0) : content.charAt(content.length - 1);
  const charge = chargeText(Number(digits === "" ? "1" : digits), sign);
  stop(reader, {
    code: "formula/charge-order",
    position,
    message: "a charge is written after a caret, without brackets",
    expected: "a charge such as ^2- or ^+",
    hint:
      position === 0
        ? "the charge ends the formula, as in SO4^2-"
        : `write ${text.slice(0, position)}${charge}${text.slice(position + content.length + 2)}`,
  });
}

function hintAt(text: string, position: number, signsEnd: number, end: number): string | undefined {
  const head = text.slice(0, position);
  const tail = text.slice(end);
  const sign = text.charAt(position);
  const signs = signsEnd - position;
  const digits = text.slice(signsEnd, end);
  if (head === "" || digits.length > maximumChargeDigits || (signs > 1 && digits !== "")) return undefined;
  if (Number(digits) === 0 && digits !== "") return undefined;
  if (digits !== "" || signs > 1) {
    return `write ${head}${chargeText(digits === "" ? signs : Number(digits), sign)}${tail}`;
  }
  const alone = `${head}${chargeText(1, sign)}${tail}`;
  const last = head.charAt(head.length - 1);
  if (!isDigit(last) || last === "0" || isSubscriptDigit(last)) return `write ${alone}`;
  const shorter = head.slice(0, -1);
  const readings = [
    `${shorter}${chargeText(Number(last), sign)}${tail} for the charge ${last}${sign}`,
    `${alone} for the charge 1${sign}`,
  ];
  // the likelier one first: Fe3+, SO42-, [Fe(CN)6]3- as against NO3-, NH4+
  const beforeLast = shorter.charAt(shorter.length - 1);
  const isLikelyCharge = isSymbol(shorter) || isDigit(beforeLast) || beforeLast === "]";
  return `write ${(isLikelyCharge ? readings : readings.reverse()).join(", ")}`;
}

function restIsState(text: string, position: number): boolean {
  return position === text.length || (text.charAt(position) === "(" && text.indexOf(")", position) === text.length - 1);
}
