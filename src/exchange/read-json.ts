import type { Fault } from "../errors/fault.js";
import { failIfAny } from "../errors/gibbs-ledger-error.js";
import { byteLength } from "./byte-length.js";
import { maximumJsonBytes } from "./limits.js";
import { scanJson } from "./scan-json.js";

/** A file may begin with the mark of its encoding. */
const byteOrderMark = "\uFEFF";

/**
 * The value of a JSON text; anything but a text is taken for a value that was parsed before.
 *
 * @param faults - receives what is wrong with a text that is JSON
 * @throws GibbsLedgerError "exchange/not-json", "exchange/too-deep", "input/too-large"
 */
export function readJson(input: unknown, faults: Fault[]): unknown {
  if (typeof input !== "string") return input;
  checkSize(input, faults);
  const text = input.startsWith(byteOrderMark) ? input.slice(1) : input;
  if (!scanJson(text, faults)) failIfAny(faults);
  return JSON.parse(text);
}

function checkSize(text: string, faults: Fault[]): void {
  // Neither fewer bytes than characters, nor more than three each.
  if (3 * text.length <= maximumJsonBytes) return;
  const bytes = text.length > maximumJsonBytes ? text.length : byteLength(text);
  if (bytes <= maximumJsonBytes) return;
  faults.push({
    code: "input/too-large",
    path: [],
    message: `the text has more than ${maximumJsonBytes} bytes`,
    received: `a text of ${text.length} characters`,
    expected: `at most ${maximumJsonBytes} bytes, 64 MiB`,
  });
  failIfAny(faults);
}
