/** The slow tests: whole families, reference tables, long fuzzing. Run by `npm run test:slow`. */
import { mergeConfig } from "vite";
import { defineConfig } from "vitest/config";
import fast from "./vitest.config.js";

const { projects: _projects, ...shared } = fast.test ?? {};

export default mergeConfig(
  defineConfig({ ...fast, test: shared }),
  defineConfig({
    test: {
      include: ["test/slow/**/*.slow.test.ts"],
      testTimeout: 1_800_000,
      hookTimeout: 1_800_000,
    },
  }),
);
