import { describe, expect, test } from "vitest";
import { recomputeWitnesses } from "../../src/checks/witness-checks.js";
import * as data from "../../src/data/index.js";
import type { Fault } from "../../src/errors/fault.js";
import { references } from "../../src/references/bibliography.js";
import { checkRecord } from "../../src/species/check-record.js";
import { speciesGrade } from "../../src/species/grade.js";
import type { SpeciesRecord } from "../../src/species/record.js";

const { referenceData, ...others } = data;
const exported: Readonly<Record<string, SpeciesRecord>> = others;

/** The rule of the names of exports: runs of other characters become "_", the charge is written in words. */
function exportName(label: string): string {
  return label
    .replace(/\^(\d*)([+-])/g, (_, size: string, sign: string) => `_${size}${sign === "+" ? "plus" : "minus"}`)
    .replace(/[^A-Za-z0-9]+/g, "_")
    .replace(/^_|_$/g, "");
}

/** Every value of a key anywhere in plain data. */
function valuesOf(value: unknown, key: string): unknown[] {
  if (typeof value !== "object" || value === null) return [];
  return Object.entries(value).flatMap(([name, member]) => [
    ...(name === key ? [member] : []),
    ...valuesOf(member, key),
  ]);
}

test("the collection holds every exported record once, under the name that follows from its label", () => {
  expect(referenceData.species).toHaveLength(Object.keys(exported).length);
  for (const record of referenceData.species) expect(exported[exportName(record.label)]).toBe(record);
  expect(new Set(referenceData.species.map(({ label }) => label)).size).toBe(referenceData.species.length);
});

test("the names of exports follow the rule for charges and polymorphs", () => {
  expect(exportName("Fe^3+(aq)")).toBe("Fe_3plus_aq");
  expect(exportName("SO4^2-(aq)")).toBe("SO4_2minus_aq");
  expect(exportName("C(cr,graphite)")).toBe("C_cr_graphite");
});

describe.each(referenceData.species.map((record) => [record.label, record] as const))("%s", (label, record) => {
  test("is a valid record", () => {
    const faults: Fault[] = [];
    expect(checkRecord(record, [label], faults)).toBe(true);
    expect(faults).toEqual([]);
  });

  test("has a CAS Registry Number with the right check digit", () => {
    const [, first, second, check] = /^(\d{2,7})-(\d{2})-(\d)$/.exec(record.casNumber ?? "") ?? [];
    const digits = [...`${first}${second}`].reverse();
    const sum = digits.reduce((total, digit, index) => total + Number(digit) * (index + 1), 0);
    expect(sum % 10).toBe(Number(check));
  });

  test("cites only the bibliography, and says of every figure where it comes from", () => {
    const sources = valuesOf(record, "source");
    expect(sources.length).toBeGreaterThan(0);
    for (const source of sources) expect(Object.hasOwn(references, source as string)).toBe(true);
    // A fit names its origin besides those of the figures; a reference point is made of figures alone.
    const fits = record.gibbsFunction.kind === "reference-point" ? 0 : 1;
    expect(valuesOf(record, "origin")).toHaveLength(valuesOf(record, "value").length + fits);
  });

  test("is confirmed by every witness, with the stored deviation", () => {
    for (const { witness, computed, confirms } of recomputeWitnesses(record, referenceData)) {
      expect(confirms, witness.check).toBe(true);
      // Stored to four digits, and as 0 below a ten-millionth of the tolerance, where rounding begins.
      const slack = 1e-3 * Math.abs(witness.deviation) + 1e-7 * witness.tolerance;
      expect(Math.abs(computed - witness.deviation), witness.check).toBeLessThanOrEqual(slack);
    }
  });

  test("has a physical witness or two of transcription for every group of figures it publishes", () => {
    // The hydrogen ion has no figures to confirm: enthalpy and entropy are zero by convention.
    if (label === "H^+(aq)") return;
    const grade = speciesGrade(record);
    expect(["A", "B"]).toContain(grade.caloric);
    const isElement = record.formationEnthalpy?.value === 0;
    if (!isElement) expect(["A", "B"]).toContain(grade.formation);
    if (record.critical !== undefined) expect(["A", "B"]).toContain(grade.critical);
    if (record.volume !== undefined) expect(["A", "B"]).toContain(grade.volume);
  });
});

test("the data are plain: a copy through JSON is the same", () => {
  expect(JSON.parse(JSON.stringify(referenceData))).toEqual(referenceData);
});

test("intervals follow each other without gap, and no fit goes beyond 6000 K", () => {
  for (const { gibbsFunction } of referenceData.species) {
    if (gibbsFunction.kind !== "series") continue;
    gibbsFunction.intervals.slice(1).forEach((interval, index) => {
      expect(interval.from).toBe(gibbsFunction.intervals[index]!.to);
    });
    expect(gibbsFunction.intervals[gibbsFunction.intervals.length - 1]!.to).toBeLessThanOrEqual(6000);
  }
});
