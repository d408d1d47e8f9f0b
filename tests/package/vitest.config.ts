import { fileURLToPath } from "node:url";
import { defineConfig } from "vitest/config";

/** Tests of the packed package as its users install it; slow and with downloads, so outside the quick suite. */
export default defineConfig({
  root: fileURLToPath(new URL("../..", import.meta.url)),
  test: {
    include: ["tests/package/*.test.ts"],
    globalSetup: ["tests/package/install-package.ts"],
    testTimeout: 300_000,
    hookTimeout: 300_000,
    fileParallelism: false,
  },
});
