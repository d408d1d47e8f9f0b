import { expect, test } from "vitest";
import { referenceData } from "../../src/data/index.js";
import { quantity } from "../../src/quantity/quantity.js";
import { reaction } from "../../src/reaction/index.js";
import { findSequence, formationProperties, standardProperties } from "../../src/species/index.js";
import { faultsOf } from "../errors/faults-of.js";
import { ironData, ironOxide } from "../species/iron.js";

/** Anything, as plain JavaScript may pass it. */
// biome-ignore lint/suspicious/noExplicitAny: the subject of this table is what types forbid
type Anything = any;

const warm = { temperature: quantity(500, "K") };
const iron = findSequence(ironData, "Fe(cr)");
const altered = (change: object): Anything => ({ ...JSON.parse(JSON.stringify(iron)), ...change });
const electron: Anything = { label: "e^-", hydrogen: ironOxide };

test.each<[string, () => unknown, string, string]>([
  [
    "a sequence that is asked of nothing",
    () => findSequence(undefined as Anything, "Fe(cr)"),
    "input/not-an-object",
    "collection",
  ],
  ["a sequence by a number", () => findSequence(ironData, 7 as Anything), "species/not-found", ""],
  [
    "sequences that are no array",
    () => findSequence({ ...ironData, sequences: 7 as Anything }, "Fe(cr)"),
    "input/not-an-array",
    "collection.sequences",
  ],
  [
    "a sequence without phases",
    () => standardProperties(altered({ phases: [] }), warm),
    "input/missing",
    "species.phases",
  ],
  [
    "a sequence whose phases are labels",
    () => standardProperties(altered({ phases: ["Fe(cr,alpha)"] }), warm),
    "input/not-an-object",
    "species.phases.0",
  ],
  [
    "a sequence of another formula",
    () => standardProperties(altered({ formula: "Ni" }), warm),
    "species/inconsistent",
    "species.formula",
  ],
  [
    "a sequence with a stray key",
    () => standardProperties(altered({ stable: true }), warm),
    "input/unknown-key",
    "species.stable",
  ],
  [
    "a formation of nothing",
    () => formationProperties(null as Anything, warm, ironData),
    "input/not-an-object",
    "species",
  ],
  [
    "a formation without conditions",
    () => formationProperties(ironOxide, undefined as Anything, ironData),
    "quantity/not-a-quantity",
    "temperature",
  ],
  [
    "a formation at a pressure",
    () => formationProperties(ironOxide, { temperature: quantity(1, "bar") } as Anything, ironData),
    "quantity/wrong-dimension",
    "temperature.unit",
  ],
  [
    "a formation without a collection",
    () => formationProperties(ironOxide, warm, undefined as Anything),
    "input/not-an-object",
    "collection",
  ],
  [
    "a formation by an unknown policy",
    () => formationProperties(ironOxide, { ...warm, outsideRange: "guess" } as Anything, ironData),
    "input/unknown-option",
    "outsideRange",
  ],
  ["an electron of another gas", () => standardProperties(electron, warm), "species/inconsistent", "species"],
  [
    "an electron written e-",
    () => reaction("H^+(aq) + e- = 1/2 H2(g)", referenceData),
    "species/not-found",
    "equation",
  ],
])("%s", (_name, call, code, path) => {
  const [first] = faultsOf(call);
  expect([first?.code, first?.path.join(".")]).toEqual([code, path]);
});
