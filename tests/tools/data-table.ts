import type { Source } from "../../src/references/source.js";
import { type SpeciesGrade, speciesGrade } from "../../src/species/grade.js";
import type { CollectionData, SpeciesRecord } from "../../src/species/record.js";

const groups: readonly (keyof SpeciesGrade)[] = ["caloric", "formation", "critical", "volume"];

/** The table of the reference data in docs/data.md: ranges, sources and grades, one row a species. */
export function dataTable({ species }: CollectionData): string {
  const head = [
    "| species | range / K | fit | formation enthalpy | entropy | caloric | formation | critical | volume |",
    "| --- | --- | --- | --- | --- | --- | --- | --- | --- |",
  ];
  return [...head, ...species.map(rowOf)].join("\n");
}

function rowOf(record: SpeciesRecord): string {
  const { gibbsFunction } = record;
  const series = gibbsFunction.kind === "series" ? gibbsFunction : undefined;
  const range = series === undefined ? "298.15" : `${series.intervals[0]!.from} to ${series.intervals.at(-1)!.to}`;
  const grade = speciesGrade(record);
  const cells = [
    `\`${record.label}\``,
    range,
    sourceText(series?.source),
    sourceText(record.formationEnthalpy?.source),
    sourceText(record.standardEntropy?.source),
    ...groups.map((group) => grade[group] ?? ""),
  ];
  return `| ${cells.join(" | ")} |`;
}

function sourceText(source: Source | undefined): string {
  if (source === undefined) return "";
  return typeof source === "string" ? source : source.text;
}
