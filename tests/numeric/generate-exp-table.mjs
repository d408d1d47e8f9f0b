// Writes src/numeric/exp-table.ts, with powers of 60 digits.
//   node tests/numeric/generate-exp-table.mjs           rewrites the file
//   node tests/numeric/generate-exp-table.mjs --print   prints it
import { writeFileSync } from "node:fs";
import { pathToFileURL } from "node:url";
import { Decimal } from "decimal.js";

const D = Decimal.clone({ precision: 60 });

/** The exact value of a double; the constructor alone would take its shortest decimal. */
function exact(value) {
  const scaled = value * 2 ** 60;
  return new D(BigInt(scaled).toString()).div(new D(2).pow(60));
}

export function expTableModule() {
  const powersHigh = [];
  const powersLow = [];
  for (let index = 0; index < 128; index += 1) {
    const value = new D(2).pow(new D(index).div(128));
    const high = value.toNumber();
    powersHigh.push(high);
    powersLow.push(value.minus(exact(high)).toNumber() + 0);
  }
  const step = new D(2).ln().div(128);
  const grid = new D(2).pow(42);
  const high = step.times(grid).round().div(grid);
  return `// Written by tests/numeric/generate-exp-table.mjs; do not edit.

/** The double nearest to 2^(i/128), for i from 0 to 127. */
${array("rootsHigh", powersHigh)}
/** 2^(i/128) less {@link rootsHigh}. */
${array("rootsLow", powersLow)}
/** ln 2 / 128 as a multiple of 2^-42: 35 bits, so that multiples up to 2^18 are exact. */
export const stepHigh = ${high.toNumber()};

/** ln 2 / 128 less {@link stepHigh}. */
export const stepLow = ${step.minus(high).toNumber()};

/** 128 / ln 2. */
export const stepsPerUnit = ${new D(1).div(step).toNumber()};
`;
}

function array(name, values) {
  const lines = [];
  for (let index = 0; index < values.length; index += 4) lines.push(`  ${values.slice(index, index + 4).join(", ")},`);
  return `export const ${name}: Float64Array = /* @__PURE__ */ new Float64Array([\n${lines.join("\n")}\n]);\n`;
}

if (import.meta.url === pathToFileURL(process.argv[1]).href) {
  if (process.argv.includes("--print")) process.stdout.write(expTableModule());
  else writeFileSync(new URL("../../src/numeric/exp-table.ts", import.meta.url), expTableModule());
}
