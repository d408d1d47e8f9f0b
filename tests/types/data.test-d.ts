import { expectTypeOf } from "vitest";
import { Fe_cr_alpha, referenceData, S_l } from "../../src/data/index.js";
import { elementSequences, solidSequences } from "../../src/data/sequences.js";
import type { Figure } from "../../src/quantity/figure.js";
import type { Citation } from "../../src/references/bibliography.js";
import type { CollectionData, PhaseSequence, SpeciesRecord, WitnessCheckName } from "../../src/species/record.js";

expectTypeOf(referenceData).toEqualTypeOf<CollectionData>();
expectTypeOf(Fe_cr_alpha).toEqualTypeOf<SpeciesRecord>();
expectTypeOf(solidSequences).toEqualTypeOf<readonly PhaseSequence[]>();
expectTypeOf(elementSequences).toEqualTypeOf<readonly PhaseSequence[]>();

expectTypeOf<"transition-enthalpy">().toExtend<WitnessCheckName>();
expectTypeOf<"transition-gibbs-energy">().toExtend<WitnessCheckName>();
expectTypeOf<"transition-temperature">().toExtend<WitnessCheckName>();
expectTypeOf<"transition-pressure">().not.toExtend<WitnessCheckName>();

// @ts-expect-error records are read-only
S_l.label = "S(g)";
// @ts-expect-error so are their intervals
S_l.transitions?.push(Fe_cr_alpha.transitions![0]!);

/** In the records a source is a key of the bibliography. */
const cited: Citation = "dinsdale1991";
expectTypeOf(cited).toExtend<Figure["source"]>();
// @ts-expect-error a citation that does not exist
const missing: Citation = "dinsdale1990";
expectTypeOf(missing).toExtend<string>();
