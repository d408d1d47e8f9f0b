import { fileURLToPath } from "node:url";
import { defineConfig } from "vitest/config";

/** The long random runs, 1e5 cases a function: tests named *.long.ts, outside the quick suite. */
export default defineConfig({
  root: fileURLToPath(new URL("..", import.meta.url)),
  test: {
    include: ["tests/**/*.long.ts"],
    testTimeout: 600_000,
  },
});
