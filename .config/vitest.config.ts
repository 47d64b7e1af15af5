/** The fast tests, and what `npm run coverage` measures: the branches of the core. */
import { fileURLToPath } from "node:url";
import { defineConfig } from "vitest/config";

export default defineConfig({
  root: fileURLToPath(new URL("..", import.meta.url)),
  cacheDir: "node_modules/.vite",
  test: {
    include: ["test/**/*.test.ts"],
    exclude: ["test/slow/**"],
    setupFiles: ["test/support/fixed-seed.ts"],
    allowOnly: false,
    testTimeout: 30_000,
    hookTimeout: 60_000,
    coverage: {
      provider: "v8",
      include: ["src/**/*.ts"],
      exclude: ["src/index.ts", "src/cli/**"],
      reporter: ["text", "html", "json-summary"],
      reportsDirectory: "coverage",
      thresholds: { branches: 90 },
    },
  },
});
