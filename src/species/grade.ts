import { houseRecord } from "./house-record.js";
import type { SpeciesRecord, Witness, WitnessGroup } from "./record.js";

/**
 * What a group of figures rests on: `"A"` a physical witness, `"B"` two or more transcription witnesses, `"C"` less
 * than that. The caloric figures are graded where their witnesses speak for temperatures: see {@link speciesGrade}.
 */
export type Grade = "A" | "B" | "C";

/** Grades by group of figures; a group without a confirming witness has none. */
export interface SpeciesGrade {
  readonly caloric?: Grade;
  readonly formation?: Grade;
  readonly critical?: Grade;
  readonly volume?: Grade;
}

/** The temperatures over which caloric witnesses must speak, as far as the record reaches; tables begin at 500 K. */
const gradedFromK = 500;
const gradedToK = 1000;

/**
 * The grades of a record, derived from those of its witnesses whose deviation lies within their tolerance.
 *
 * Caloric figures: A by one physical witness that speaks from 500 K or below to 1000 K or above, or as far as the fit
 * reaches within that; B by two transcription witnesses, at least one of which speaks over that range; C otherwise,
 * which vouches for 298.15 K only. Other figures: A by a physical witness, B by two transcription witnesses, C by one.
 *
 * The stored deviations are taken as they are; `recomputeWitnesses` of the room checks computes them anew.
 *
 * @param record - with its witnesses; one that is not of the house is checked, copied and frozen once
 * @throws GibbsLedgerError with every fault of a wrong record
 * @example
 * import { Ar_g, NH3_g } from "gibbs-ledger/data";
 * speciesGrade(Ar_g).caloric; // => "A"
 * speciesGrade(NH3_g).caloric; // => "B"
 */
export function speciesGrade(record: SpeciesRecord): SpeciesGrade {
  const house = houseRecord(record, ["record"]);
  const confirming = house.witnesses.filter(({ deviation, tolerance }) => Math.abs(deviation) <= tolerance);
  const caloric = gradeOf(confirming, "caloric", (witness) => speaksOverRange(house, witness));
  const formation = gradeOf(confirming, "formation");
  const critical = gradeOf(confirming, "critical");
  const volume = gradeOf(confirming, "volume");
  return {
    ...(caloric === undefined ? {} : { caloric }),
    ...(formation === undefined ? {} : { formation }),
    ...(critical === undefined ? {} : { critical }),
    ...(volume === undefined ? {} : { volume }),
  };
}

function gradeOf(
  witnesses: readonly Witness[],
  group: WitnessGroup,
  counts: (witness: Witness) => boolean = () => true,
): Grade | undefined {
  const own = witnesses.filter((witness) => witness.group === group);
  if (own.length === 0) return undefined;
  if (own.some((witness) => witness.kind === "physical" && counts(witness))) return "A";
  return own.length >= 2 && own.some(counts) ? "B" : "C";
}

function speaksOverRange({ gibbsFunction }: SpeciesRecord, { over }: Witness): boolean {
  // A reference point reaches no further than 298.15 K, for which every witness speaks.
  if (gibbsFunction.kind === "reference-point") return true;
  if (over === undefined) return false;
  const start = gibbsFunction.intervals[0]!.from;
  const end = gibbsFunction.intervals[gibbsFunction.intervals.length - 1]!.to;
  return over[0] <= Math.max(gradedFromK, start) && over[1] >= Math.min(gradedToK, end);
}
