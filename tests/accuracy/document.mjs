const classes = ["same source", "cross source", "identity"];

/**
 * The accuracy report as Markdown, the same on every machine and day.
 *
 * @param {{ topic: string, rows: object[] }[]} topics
 */
export function accuracyDocument(topics) {
  const rows = topics.flatMap((topic) => topic.rows);
  return `${[
    "# Accuracy beside published values",
    "",
    "Made by `npm run accuracy`; do not edit. Each row sets a value from outside the library beside the value that the",
    "library computes. A same-source value stands in the source of the data used, and its tolerance is that source's",
    "rounding and fit error; a cross-source value stands elsewhere, and its tolerance is the combined uncertainty; an",
    "identity holds exactly, and its tolerance is the error of the arithmetic. Origin tells whether the published value",
    "was read from the page, recalled from memory, or computed by an independent method.",
    "",
    "Values that were found to differ by more than their tolerance are not in these tables, so that all rows pass says",
    "less than it seems to: tests/published/README.md lists what was left out, by how much it differs, and why.",
    "",
    "Calculated values depend on the data and model chosen. They are no substitute for measured data, relief and hazard",
    "studies, local codes or the judgement of a qualified engineer.",
    "",
    "| class | values | within tolerance | largest difference / tolerance |",
    "| --- | --- | --- | --- |",
    ...classes.map((name) =>
      summaryRow(
        name,
        rows.filter((row) => row.class === name),
      ),
    ),
    ...topics.flatMap(topicSection),
  ].join("\n")}\n`;
}

function summaryRow(name, rows) {
  const largest = Math.max(0, ...rows.map(differenceInTolerances));
  const passed = rows.filter(({ pass }) => pass).length;
  return `| ${name} | ${rows.length} | ${passed} | ${rows.length === 0 ? "" : digits(largest, 2)} |`;
}

/** One table for each source of a topic; what is the same for all its rows stands above it, once. */
function topicSection({ topic, rows }) {
  const title = topic.replaceAll("-", " ");
  const groups = new Map();
  for (const row of rows) {
    const heading = `${row.source} (${row.class}, ${row.origin})`;
    groups.set(heading, [...(groups.get(heading) ?? []), row]);
  }
  const largest = Math.max(0, ...rows.map(differenceInTolerances));
  return [
    "",
    `## ${title[0].toUpperCase()}${title.slice(1)}`,
    "",
    `${rows.length} values; largest difference / tolerance ${digits(largest, 2)}.`,
    ...[...groups].flatMap(([heading, group]) => sourceTable(heading, group)),
  ];
}

function sourceTable(heading, rows) {
  return [
    "",
    `${heading}:`,
    "",
    "| id | quantity | expected | computed | tolerance |",
    "| --- | --- | --- | --- | --- |",
    ...rows.map(
      ({ id, quantity, expected, computed, tolerance }) =>
        `| ${id} | ${cell(quantity)} | ${expected} | ${digits(computed, 9)} | ${tolerance} |`,
    ),
  ];
}

function differenceInTolerances({ expected, computed, tolerance }) {
  return Math.abs(computed - expected) / tolerance;
}

function digits(value, count) {
  return String(Number(value.toPrecision(count)));
}

function cell(text) {
  return text.replaceAll("|", "\\|");
}
