/**
 * What mutation tests run for every mutant: the tests of the floor that is mutated (`FLATLIMIT_FLOOR`), without
 * those that only add volume (long fuzzing, texts of megabytes, the hundred reference ideals).
 */
import { fileURLToPath } from "node:url";
import { defineConfig } from "vitest/config";

const floor = process.env["FLATLIMIT_FLOOR"] ?? "*";

export default defineConfig({
  root: fileURLToPath(new URL("..", import.meta.url)),
  cacheDir: "node_modules/.vite",
  test: {
    include: [`test/${floor}/**/*.test.ts`],
    exclude: [
      "test/slow/**",
      "test/cli/**",
      "test/**/*{fuzz,bounds,hostile,reference-ideals}*.test.ts",
    ],
    setupFiles: ["test/support/fixed-seed.ts"],
    allowOnly: false,
    testTimeout: 60_000,
    hookTimeout: 20_000,
  },
});
