import type { FaultPath } from "../errors/fault.js";
import { decimalToNumber } from "../numeric/exact-decimal.js";
import type { Figure } from "../quantity/figure.js";
import { exactFigureInSi, figureInSi } from "../quantity/figure-value.js";
import { type UnitCode, unitEntry } from "../quantity/units.js";
import { houseRecord } from "../species/house-record.js";
import type { SpeciesRecord } from "../species/record.js";
import type { CriticalConstants, GasComponent } from "./equation-of-state.js";

/**
 * The gas component of a species record: its label and its critical figures in coherent SI.
 *
 * @param record - a species record; its critical constants may be missing
 * @param path - where the record lies in the caller's input, for faults
 * @returns the component; each constant is the double nearest to the exact conversion of the published decimal
 * @throws GibbsLedgerError with every fault of the record
 * @example
 * const { label, critical } = gasComponentOf(N2_g);
 * label; // => "N2(g)"
 * critical?.pressurePa; // => 3400000
 */
export function gasComponentOf(record: SpeciesRecord, path: FaultPath = []): GasComponent {
  const { label, critical } = houseRecord(record, path);
  return critical === undefined ? { label } : { label, critical: constantsOf(critical) };
}

function constantsOf(critical: NonNullable<SpeciesRecord["critical"]>): CriticalConstants {
  const { temperature, pressure, acentricFactor, volume } = critical;
  return {
    temperatureK: inSi(temperature),
    pressurePa: inSi(pressure),
    ...(acentricFactor === undefined ? {} : { acentricFactor: inSi(acentricFactor) }),
    ...(volume === undefined ? {} : { volumeM3PerMol: inSi(volume) }),
  };
}

/** A published figure is a decimal: 73.74 bar are 7374000 Pa, which its nearest double times 1e5 is not. */
function inSi(figure: Figure): number {
  const { factor, offset } = unitEntry(figure.unit as UnitCode);
  const isDecimal = offset === undefined && !factor.includes("/");
  return isDecimal ? decimalToNumber(exactFigureInSi(figure)) : figureInSi(figure);
}
