import { gzipSync } from "node:zlib";
import { build } from "esbuild";
import { inject } from "vitest";

/** A bundle of a consumer's code with the installed package. */
export interface Bundle {
  readonly code: string;
  /** Files of which something is left in the bundle. */
  readonly inputs: readonly string[];
  /** Size after minifying and gzip, in bytes. */
  readonly gzipBytes: number;
}

/** Bundles a module of a consumer as for a browser. */
export async function bundleForUse(code: string): Promise<Bundle> {
  const bundled = async (minify: boolean): Promise<Bundle> => {
    const { outputFiles, metafile } = await build({
      stdin: { contents: code, resolveDir: inject("consumer"), loader: "ts" },
      absWorkingDir: inject("consumer"),
      bundle: true,
      minify,
      metafile: true,
      write: false,
      format: "esm",
      platform: "browser",
      target: "es2022",
      legalComments: "none",
    });
    const [output] = Object.values(metafile.outputs);
    const inputs = Object.entries(output?.inputs ?? {}).filter(([, { bytesInOutput }]) => bytesInOutput > 0);
    const text = outputFiles[0]?.text ?? "";
    return { code: text, inputs: inputs.map(([path]) => path), gzipBytes: gzipSync(text, { level: 9 }).length };
  };
  const { code: readable, inputs } = await bundled(false);
  const { gzipBytes } = await bundled(true);
  return { code: readable, inputs, gzipBytes };
}
