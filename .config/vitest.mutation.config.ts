/**
 * What mutation tests run for every mutant: the tests of the mutated floors, without those that only add
 * volume (long fuzzing, texts of megabytes, the hundred reference ideals).
 */
import { fileURLToPath } from "node:url";
import { defineConfig } from "vitest/config";

export default defineConfig({
  root: fileURLToPath(new URL("..", import.meta.url)),
  cacheDir: "node_modules/.vite",
  test: {
    include: [
      "test/{arithmetic,components,groebner,kernel,laws,outcomes,polynomials}/**/*.test.ts",
    ],
    exclude: ["test/**/*{fuzz,bounds,hostile,reference-ideals}*.test.ts"],
    setupFiles: ["test/support/fixed-seed.ts"],
    allowOnly: false,
    testTimeout: 30_000,
    hookTimeout: 60_000,
  },
});
