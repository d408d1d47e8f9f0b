import { cut } from "../errors/fault.js";
import { oneLine } from "./text.js";

/** A column of a text table. */
export interface TextColumn {
  readonly heading: string;
  /** Width in characters; longer cells are cut. */
  readonly width: number;
  readonly align: "left" | "right";
}

/** Lays out heading, rule and rows of a text table; columns are parted by one space, lines end without spaces. */
export function layOut(columns: readonly TextColumn[], rows: readonly (readonly string[])[]): string[] {
  const heading = row(
    columns,
    columns.map((column) => column.heading),
  );
  return [heading, rule(columns), ...rows.map((cells) => row(columns, cells))];
}

/** A line of hyphens under a heading or above a sum. */
export function rule(columns: readonly TextColumn[]): string {
  return "-".repeat(columns.reduce((sum, { width }) => sum + width, columns.length - 1));
}

/** One line of a text table. */
export function row(columns: readonly TextColumn[], cells: readonly string[]): string {
  return columns
    .map(({ width, align }, index) => {
      const text = cut(oneLine(cells[index] ?? ""), width);
      return align === "left" ? text.padEnd(width) : text.padStart(width);
    })
    .join(" ")
    .trimEnd();
}
