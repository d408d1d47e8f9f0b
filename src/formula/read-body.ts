import type { ExactDecimal } from "../numeric/exact-decimal.js";
import { isCapital, isDigit, isOneOf, isSign, isSmallLetter, isSubscriptDigit, separators } from "./characters.js";
import { type Draft, one } from "./draft.js";
import { endsComposition, hydrateTail, spliced, stopAtAmbiguousDot } from "./hydrate-dot.js";
import { maximumNesting } from "./limits.js";
import { stopAtBareSign } from "./mistaken-charge.js";
import { stopAtMistakenGroup } from "./mistaken-group.js";
import { readCount, readMultiplier } from "./read-number.js";
import { readSymbol } from "./read-symbol.js";
import { type Reader, stop } from "./reader.js";
import { refuseSmallLetters } from "./small-letters.js";
import { stopAtUnexpected } from "./unexpected.js";

/** A bracket that is open, or the formula as a whole. */
interface Frame {
  readonly bracket: string;
  /** Index of the bracket in the text. */
  readonly position: number;
  /** The group that the bracket makes. */
  readonly group: number;
  /** The group of the part that is being read. */
  part: number;
  parts: number;
  /** Symbols and brackets in the part so far. */
  items: number;
  /** Where a number opens the first part, else -1. */
  leadingNumber: number;
}

const closing: Readonly<Record<string, string>> = { "(": ")", "[": "]", "{": "}" };

/** Reads symbols, counts, brackets and parts up to the charge, the state or the end. */
export function readBody(reader: Reader, draft: Draft): void {
  const { text } = reader;
  const frames: Frame[] = [openFrame(reader, draft, "", 0, 0)];
  let bare: string | undefined;
  while (!reader.stopped && reader.position < text.length) {
    const frame = frames[frames.length - 1]!;
    const character = text.charAt(reader.position);
    if (frames.length === 1 && endsComposition(text, reader.position)) {
      if (character === "(" && frame.items === 0) stopAtStateWithoutFormula(reader);
      break;
    }
    const previous = bare;
    bare = undefined;
    if (isCapital(character)) {
      const start = reader.position;
      const symbol = readSymbol(reader, previous);
      frame.items += 1;
      draft.tokens.push({ kind: "symbol", text: symbol });
      const count = readItemCount(reader, draft);
      draft.atoms.push({ symbol, position: start, group: frame.part, count });
      if (draft.tokens[draft.tokens.length - 1]!.kind === "symbol") bare = symbol;
    } else if (closing[character] !== undefined) {
      openBracket(reader, draft, frames);
    } else if (isOneOf(character, ")]}")) {
      closeBracket(reader, draft, frames);
    } else if (isOneOf(character, separators)) {
      startPart(reader, draft, frame);
    } else if (character === ".") {
      readSeparatingDot(reader, draft, frame, frames.length);
    } else if (isSmallLetter(character)) {
      refuseSmallLetters(reader);
      frame.items += 1;
    } else if (isSign(character)) {
      stopAtBareSign(reader);
    } else {
      stopAtUnexpected(reader, frames.length > 1);
    }
  }
  if (!reader.stopped) endFrames(reader, frames);
}

/** Small letters in brackets with nothing before them, as in `(oh)2`. */
function stopAtStateWithoutFormula(reader: Reader): void {
  reader.position += 1;
  refuseSmallLetters(reader);
  reader.stopped = true;
}

function openFrame(reader: Reader, draft: Draft, bracket: string, position: number, group: number): Frame {
  const frame = { bracket, position, group, part: group, parts: 1, items: 0, leadingNumber: -1 };
  if (isDigit(reader.text.charAt(reader.position))) {
    frame.leadingNumber = reader.position;
    frame.part = readPartNumber(reader, draft, group);
  }
  return frame;
}

/** Reads the number before a part and makes its group. */
function readPartNumber(reader: Reader, draft: Draft, parent: number): number {
  const number = readMultiplier(reader);
  draft.groups.push({ parent, factor: number?.value ?? one });
  if (number !== undefined && number.spelling !== "") draft.tokens.push({ kind: "multiplier", text: number.spelling });
  if (number?.hasPoint === true) draft.hasDot = true;
  return draft.groups.length - 1;
}

function readItemCount(reader: Reader, draft: Draft): ExactDecimal {
  const next = reader.text.charAt(reader.position);
  if (!isDigit(next) && !isSubscriptDigit(next)) return one;
  const number = readCount(reader, draft.hasDot);
  if (number === undefined) return one;
  if (number.hasPoint) draft.hasDot = true;
  const isAfterBracket = draft.tokens[draft.tokens.length - 1]?.kind === "bracket";
  if (number.spelling !== "") draft.tokens.push({ kind: "count", text: number.spelling });
  // (S) alone would read as a state
  else if (isAfterBracket) draft.tokens.push({ kind: "count", text: "1" });
  return number.value;
}

function openBracket(reader: Reader, draft: Draft, frames: Frame[]): void {
  const frame = frames[frames.length - 1]!;
  const { position } = reader;
  const bracket = reader.text.charAt(position);
  if (bracket === "(") stopAtMistakenGroup(reader);
  if (reader.stopped) return;
  if (frames.length > maximumNesting) {
    stop(reader, {
      code: "formula/too-deep",
      position,
      message: `brackets lie more than ${maximumNesting} deep`,
      expected: `at most ${maximumNesting} brackets within each other`,
    });
    return;
  }
  frame.items += 1;
  draft.groups.push({ parent: frame.part, factor: one });
  draft.tokens.push({ kind: "bracket", text: bracket });
  reader.position += 1;
  frames.push(openFrame(reader, draft, bracket, position, draft.groups.length - 1));
}

function closeBracket(reader: Reader, draft: Draft, frames: Frame[]): void {
  const frame = frames[frames.length - 1]!;
  const { position } = reader;
  const bracket = reader.text.charAt(position);
  const expected = closing[frame.bracket];
  if (bracket !== expected) {
    stop(reader, {
      code: "formula/syntax",
      position,
      message:
        expected === undefined
          ? `${bracket} closes no bracket`
          : `${bracket} closes the ${frame.bracket} of column ${frame.position + 1}`,
      ...(expected === undefined ? {} : { expected }),
    });
    return;
  }
  endPart(reader, frame);
  checkLeadingNumber(reader, frame);
  if (reader.stopped) return;
  frames.pop();
  draft.tokens.push({ kind: "bracket", text: bracket });
  reader.position += 1;
  draft.groups[frame.group]!.factor = readItemCount(reader, draft);
}

function startPart(reader: Reader, draft: Draft, frame: Frame): void {
  endPart(reader, frame);
  if (reader.stopped) return;
  draft.hasDot = true;
  draft.tokens.push({ kind: "separator", text: "·" });
  reader.position += 1;
  frame.parts += 1;
  frame.items = 0;
  frame.part = frame.group;
  if (isDigit(reader.text.charAt(reader.position))) frame.part = readPartNumber(reader, draft, frame.group);
}

/** Takes an ASCII dot that stands behind no number: a separator before the water that ends the formula, or a fault. */
function readSeparatingDot(reader: Reader, draft: Draft, frame: Frame, depth: number): void {
  const { text, position } = reader;
  const tail = depth === 1 && frame.items > 0 ? hydrateTail(text, position + 1) : undefined;
  if (tail !== undefined && !draft.hasDot) {
    startPart(reader, draft, frame);
  } else if (tail !== undefined && tail.digits !== "") {
    stopAtAmbiguousDot(reader, position, [
      spliced(text, position, 1, "·"),
      `${text.slice(0, position)}0${text.slice(position, tail.water)}·${text.slice(tail.water)}`,
    ]);
  } else {
    const isFraction = isDigit(text.charAt(position + 1));
    stop(reader, {
      code: "formula/syntax",
      position,
      message: isFraction ? "no digit before the decimal point" : "a dot separates only the water that ends a formula",
      expected: "· (U+00B7) between the parts of a formula",
      hint: `write · to separate: ${spliced(text, position, 1, "·")}${isFraction ? ", or a decimal as 0.5" : ""}`,
    });
  }
}

function endFrames(reader: Reader, frames: readonly Frame[]): void {
  const frame = frames[frames.length - 1]!;
  if (frames.length > 1) {
    stop(reader, {
      code: "formula/syntax",
      position: frame.position,
      message: `the bracket ${frame.bracket} is not closed`,
      expected: closing[frame.bracket]!,
    });
    return;
  }
  endPart(reader, frame);
  checkLeadingNumber(reader, frame);
}

function endPart(reader: Reader, frame: Frame): void {
  if (frame.items > 0) return;
  stop(reader, {
    code: "formula/syntax",
    position: reader.position,
    message: frame.bracket === "" || frame.parts > 1 ? "no element stands here" : "nothing is in the brackets",
    expected: "the symbol of an element, D or T",
  });
}

/** A number opens a formula only where it counts the first of several parts, as in `3CaO·Al2O3`. */
function checkLeadingNumber(reader: Reader, frame: Frame): void {
  if (reader.stopped || frame.leadingNumber < 0 || frame.parts > 1) return;
  stop(reader, {
    code: "formula/syntax",
    position: frame.leadingNumber,
    message: "a number opens the formula",
    expected: "the symbol of an element, D or T",
    hint: "a coefficient belongs to the equation; a count stands behind what it counts",
  });
}
