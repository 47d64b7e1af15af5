/**
 * The fast tests, those of the engine once with the compiled and once with the plain kernel, and what
 * `npm run coverage` measures: the branches of the core.
 */
import { fileURLToPath } from "node:url";
import { defineConfig } from "vitest/config";

export default defineConfig({
  root: fileURLToPath(new URL("..", import.meta.url)),
  cacheDir: "node_modules/.vite",
  test: {
    projects: [
      {
        extends: true,
        test: {
          name: "fast",
          include: ["test/**/*.test.ts"],
          exclude: ["test/slow/**"],
          setupFiles: ["test/support/fixed-seed.ts"],
        },
      },
      {
        extends: true,
        test: {
          name: "plain kernel",
          include: ["test/groebner/**/*.test.ts", "test/limits/**/*.test.ts"],
          setupFiles: ["test/support/fixed-seed.ts", "test/support/plain-kernel.ts"],
        },
      },
    ],
    allowOnly: false,
    testTimeout: 30_000,
    hookTimeout: 60_000,
    coverage: {
      provider: "v8",
      include: ["src/**/*.ts"],
      exclude: ["src/index.ts", "src/cli/**", "src/kernel/compiled.ts", "src/kernel/assembly/**"],
      reporter: ["text", "html", "json-summary"],
      reportsDirectory: "coverage",
      thresholds: { branches: 90 },
    },
  },
});
