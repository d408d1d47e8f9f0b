import { aggregationStates, isAggregationState, stateMeant } from "./aggregation-states.js";
import { endOfRun, isDigit, isLetter, isSign, isSubscriptDigit } from "./characters.js";
import { stopAtChargeInBrackets } from "./mistaken-charge.js";
import { type Reader, stop } from "./reader.js";

/** The longest text between brackets that is looked at. */
const longestContent = 16;

/**
 * Refuses what looks like a group and is meant as something else: a state in capitals (`(G)`, `(S)`), an oxidation
 * number (`Fe(III)`, which would read as iodine), a charge (`Fe(3+)`). The reader stands at the bracket.
 */
export function stopAtMistakenGroup(reader: Reader): void {
  const { text, position } = reader;
  const length = text.slice(position + 1, position + longestContent + 2).indexOf(")");
  if (length < 0) return;
  const end = position + 1 + length;
  const content = text.slice(position + 1, end);
  const after = text.charAt(end + 1);
  if (isCharge(content)) {
    stopAtChargeInBrackets(reader, content);
  } else if (content !== "" && endOfRun(content, 0, isRomanOfElements) === content.length && !isCountStart(after)) {
    stop(reader, {
      code: "formula/syntax",
      position,
      message: `is (${content}) an oxidation number?`,
      hint: "leave oxidation numbers out; iodine and vanadium need no brackets here",
    });
  } else {
    const meant = after === "" ? capitalStateMeant(content) : undefined;
    if (meant === undefined) return;
    stop(reader, {
      code: "formula/unknown-state",
      position: position + 1,
      message: `${content} is no symbol for a state`,
      expected: aggregationStates.join(", "),
      hint: `write (${meant}) for the state; symbols for states have small letters`,
    });
  }
}

function isCharge(content: string): boolean {
  const leading = endOfRun(content, 0, isSign);
  const digits = endOfRun(content, leading, isDigit);
  const trailing = endOfRun(content, digits, isSign);
  return trailing === content.length && leading + (trailing - digits) === 1 && digits - leading <= 3;
}

function isRomanOfElements(character: string): boolean {
  return character === "I" || character === "V";
}

function isCountStart(character: string): boolean {
  return isDigit(character) || isSubscriptDigit(character);
}

/** What a state in capitals means; words that could be made of elements only where they are a state symbol. */
function capitalStateMeant(content: string): string | undefined {
  const wordEnd = endOfRun(content, 0, isLetter);
  const word = content.slice(0, wordEnd).toLowerCase();
  const rest = content.slice(wordEnd);
  if (word === "" || (rest !== "" && !rest.startsWith(","))) return undefined;
  const meant = isAggregationState(word) || word.length > 2 ? stateMeant(word) : undefined;
  return meant === undefined ? undefined : meant + rest;
}
