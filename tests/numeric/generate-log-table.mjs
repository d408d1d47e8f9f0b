// Writes src/numeric/log-table.ts, with logarithms of 60 digits.
//   node tests/numeric/generate-log-table.mjs           rewrites the file
//   node tests/numeric/generate-log-table.mjs --print   prints it
//
// A mantissa z is nearest to one of the 128 centres m = 1 + i/128, with |z - m| <= 2^-8. c is near m, and 1/c is a
// whole
// multiple of 1/512, chosen so that r = (z - m) / c + (m / c - 1) = z / c - 1 is small and computed without rounding.
import { writeFileSync } from "node:fs";
import { pathToFileURL } from "node:url";
import { Decimal } from "decimal.js";

const D = Decimal.clone({ precision: 60 });

/** The nearest multiple of 2^-42, and the double nearest to the rest. Multiples up to 2^10 of the first are exact. */
function split(value) {
  const grid = new D(2).pow(42);
  const high = value.times(grid).round().div(grid);
  return [high.toNumber(), value.minus(high).toNumber()];
}

/** The greatest |r| of a row. */
function reach(centre, numerator) {
  const reciprocal = numerator / 512;
  return reciprocal / 256 + Math.abs(centre * reciprocal - 1);
}

/** The multiple of 1/512 with the least |r| among those that keep r exact: z is a multiple of 2^-52, r has 53 bits. */
function bestNumerator(centre) {
  const near = Math.round(512 / centre);
  const exact = [near - 1, near, near + 1].filter((n) => reach(centre, n) <= (n % 2 === 0 ? 2 ** -7 : 2 ** -8));
  return exact.reduce((best, n) => (reach(centre, n) < reach(centre, best) ? n : best));
}

export function logTableModule() {
  const columns = { reciprocals: [], offsets: [], logarithmsHigh: [], logarithmsLow: [] };
  for (let index = 0; index < 128; index += 1) {
    const centre = 1 + index / 128;
    const reciprocal = index === 0 ? 1 : bestNumerator(centre) / 512;
    const [high, low] = split(new D(reciprocal).ln().neg());
    columns.reciprocals.push(reciprocal);
    columns.offsets.push(centre * reciprocal - 1);
    columns.logarithmsHigh.push(high + 0);
    columns.logarithmsLow.push(low + 0);
  }
  const [ln2High, ln2Low] = split(new D(2).ln());
  return `// Written by tests/numeric/generate-log-table.mjs; do not edit.

/** 1/c for each centre m = 1 + i/128 of a mantissa, a multiple of 1/512. */
${array("reciprocals", columns.reciprocals)}
/** m/c - 1, exact. */
${array("offsets", columns.offsets)}
/** ln c as a multiple of 2^-42. */
${array("logarithmsHigh", columns.logarithmsHigh)}
/** ln c less {@link logarithmsHigh}. */
${array("logarithmsLow", columns.logarithmsLow)}
/** ln 2 as a multiple of 2^-42. */
export const ln2High = ${ln2High};

/** ln 2 less {@link ln2High}. */
export const ln2Low = ${ln2Low};
`;
}

function array(name, values) {
  const lines = [];
  for (let index = 0; index < values.length; index += 4) lines.push(`  ${values.slice(index, index + 4).join(", ")},`);
  return `export const ${name}: Float64Array = /* @__PURE__ */ new Float64Array([\n${lines.join("\n")}\n]);\n`;
}

if (import.meta.url === pathToFileURL(process.argv[1]).href) {
  if (process.argv.includes("--print")) process.stdout.write(logTableModule());
  else writeFileSync(new URL("../../src/numeric/log-table.ts", import.meta.url), logTableModule());
}
