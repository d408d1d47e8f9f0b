import { describeReceived, type Fault, type FaultPath } from "../errors/fault.js";
import { isAggregationState } from "./aggregation-states.js";
import { endOfRun, isOneOf, isSign, isSmallLetter, isSuperscript } from "./characters.js";
import { countElements, type ElementCount } from "./count-elements.js";
import { type Draft, emptyDraft } from "./draft.js";
import { endsComposition } from "./hydrate-dot.js";
import { maximumFormulaLength } from "./limits.js";
import { stopAtBareSign } from "./mistaken-charge.js";
import { stopAtMistakenGroup } from "./mistaken-group.js";
import { readBody } from "./read-body.js";
import { readCharge } from "./read-charge.js";
import { readState, type StateRead } from "./read-state.js";
import { type Reader, stop } from "./reader.js";
import type { Spelling } from "./spelling.js";

/** A formula that has been read. */
export interface FormulaRead extends Spelling {
  readonly text: string;
  /** The exact count of each element, in Hill order. */
  readonly counts: readonly ElementCount[];
}

/**
 * Reads a formula in one pass from left to right and collects its faults.
 *
 * @returns undefined where there is a fault
 */
export function readFormula(text: unknown, path: FaultPath, faults: Fault[]): FormulaRead | undefined {
  if (!isReadable(text, path, faults)) return undefined;
  const before = faults.length;
  const reader: Reader = { text, path, faults, position: 0, stopped: false };
  const draft = emptyDraft();
  if (isElectron(text)) readElectron(reader, draft);
  else readBody(reader, draft);
  const chargeNumber = reader.stopped ? 0 : readOptionalCharge(reader);
  if (!reader.stopped && draft.tokens[0]?.text === "e" && chargeNumber !== -1) stopAtElectron(reader);
  const state: StateRead | undefined = reader.stopped ? undefined : readOptionalState(reader);
  if (!reader.stopped && reader.position < text.length) stopBehindCharge(reader);
  if (faults.length > before) return undefined;
  const counts = countElements(reader, draft);
  return faults.length > before ? undefined : { text, tokens: draft.tokens, counts, chargeNumber, ...state };
}

function isReadable(text: unknown, path: FaultPath, faults: Fault[]): text is string {
  const received = describeReceived(text);
  if (typeof text !== "string") {
    faults.push({
      code: "input/not-a-string",
      path,
      message: `expected a formula, got ${received}`,
      received,
      expected: "a text such as CuSO4·5H2O or SO4^2-(aq)",
    });
    return false;
  }
  if (text.length > maximumFormulaLength) {
    faults.push({
      code: "formula/too-long",
      path,
      message: `the formula has ${text.length} characters, at most ${maximumFormulaLength} are read`,
      received,
      expected: `at most ${maximumFormulaLength} characters`,
    });
    return false;
  }
  if (text.trim() === "" || beginsWithState(text)) {
    faults.push({
      code: "formula/empty",
      path,
      message: `there is no formula in ${received}`,
      received,
      expected: "a text such as CuSO4·5H2O or SO4^2-(aq)",
    });
    return false;
  }
  return true;
}

function beginsWithState(text: string): boolean {
  const end = endOfRun(text, 1, isSmallLetter);
  return text.charAt(0) === "(" && isOneOf(text.charAt(end), ",)") && isAggregationState(text.slice(1, end));
}

function isElectron(text: string): boolean {
  return text.charAt(0) === "e" && endsComposition(text, 1);
}

function readElectron(reader: Reader, draft: Draft): void {
  draft.tokens.push({ kind: "symbol", text: "e" });
  reader.position = 1;
  if (isSign(reader.text.charAt(1))) {
    stop(reader, {
      code: "formula/charge-order",
      position: 1,
      message: "a charge is written after a caret",
      expected: "e^-",
      hint: "the electron is written e^-",
    });
  }
}

function stopAtElectron(reader: Reader): void {
  stop(reader, {
    code: "formula/syntax",
    position: 0,
    message: "e stands only for the electron, whose charge is -1",
    expected: "e^-",
    hint: "the electron is written e^-",
  });
}

function readOptionalCharge(reader: Reader): number {
  const next = reader.text.charAt(reader.position);
  if (next === "^" || isSuperscript(next)) return readCharge(reader);
  if (isSign(next)) stopAtBareSign(reader);
  return 0;
}

function readOptionalState(reader: Reader): StateRead | undefined {
  const { text, position } = reader;
  return text.charAt(position) === "(" && isSmallLetter(text.charAt(position + 1)) ? readState(reader) : undefined;
}

function stopBehindCharge(reader: Reader): void {
  const { text, position } = reader;
  if (text.charAt(position) === "(") stopAtMistakenGroup(reader);
  if (reader.stopped) return;
  stop(reader, {
    code: "formula/syntax",
    position,
    message: "only a state follows the charge",
    expected: "the end of the formula, or a state such as (aq)",
    hint: "the whole formula has one charge, at its end",
  });
}
