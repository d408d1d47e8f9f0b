import { beforeAll, expect, test } from "vitest";
import { runInConsumer, subPaths, writeConsumerFile } from "./consumer.js";

const versions = { oldest: "5.4.5", newest: "6.0.3" };

const use = `
import { convert, quantity, reaction, standardReactionProperties, type Quantity } from "gibbs-ledger";
import { isGibbsLedgerError, type FaultCode } from "gibbs-ledger/errors";
import { referenceData } from "gibbs-ledger/data";

const synthesis = reaction("N2(g) + 3 H2(g) = 2 NH3(g)", referenceData);
const standard = standardReactionProperties(synthesis, { temperature: quantity(700, "K") });
export const energy: Quantity<"molarEnergy", "kJ/mol"> = convert(standard.gibbsEnergy, "kJ/mol");
export const log10K: number = standard.log10K;
export const code = (error: unknown): FaultCode | undefined => (isGibbsLedgerError(error) ? error.code : undefined);

// @ts-expect-error a pressure is no temperature
standardReactionProperties(synthesis, { temperature: quantity(1, "bar") });
// @ts-expect-error an energy is not converted to a pressure
convert(standard.gibbsEnergy, "bar");
`;

const everything = subPaths
  .map((subPath, index) => `import * as room${index} from "gibbs-ledger${subPath}";\nexport { room${index} };\n`)
  .join("");

beforeAll(() => {
  const packages = Object.entries(versions).map(([name, version]) => `typescript-${name}@npm:typescript@${version}`);
  runInConsumer("npm", "install", "--no-audit", "--no-fund", "--prefer-offline", ...packages);
  for (const extension of ["mts", "cts"]) {
    writeConsumerFile(`types/use.${extension}`, use);
    writeConsumerFile(`types/everything.${extension}`, everything);
  }
});

const cases = Object.keys(versions).flatMap((version) =>
  [
    { module: "node16", moduleResolution: "node16", files: ["use.mts", "everything.mts", "use.cts", "everything.cts"] },
    { module: "esnext", moduleResolution: "bundler", files: ["use.mts", "everything.mts"] },
  ].map((settings) => ({ version, ...settings })),
);

test.each(cases)("TypeScript $version accepts right use, refuses wrong use: $moduleResolution", (settings) => {
  const { version, module, moduleResolution, files } = settings;
  const name = `types/tsconfig.${version}-${moduleResolution}.json`;
  const compilerOptions = {
    module,
    moduleResolution,
    target: "es2022",
    // The types of zod name URL and File.
    lib: ["es2022", "dom"],
    types: [],
    strict: true,
    exactOptionalPropertyTypes: true,
    noUncheckedIndexedAccess: true,
    skipLibCheck: false,
    noEmit: true,
  };
  writeConsumerFile(name, JSON.stringify({ compilerOptions, files }));
  expect(runInConsumer(process.execPath, `node_modules/typescript-${version}/bin/tsc`, "-p", name)).toBe("");
});
