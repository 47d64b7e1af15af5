/**
 * Mutation tests: each floor against its own tests, so that a mutant of a low floor does not run the tests of all
 * floors above it. `npm run mutate` takes all floors in turn, `npm run mutate -- arithmetic` just one.
 */
import { spawnSync } from "node:child_process";

const FLOORS = ["arithmetic", "components", "groebner", "hilbert", "polynomials"];

const chosen = process.argv.slice(2);
let failed = false;
for (const floor of chosen.length === 0 ? FLOORS : chosen) {
  if (!FLOORS.includes(floor)) {
    process.stderr.write(`mutate: unknown floor ${floor}; expected one of ${FLOORS.join(", ")}\n`);
    process.exit(2);
  }
  process.stdout.write(`\n== ${floor}\n`);
  const { status } = spawnSync(
    "npx",
    ["stryker", "run", ".config/stryker.config.json", "--mutate", `src/${floor}/**/*.ts`],
    { stdio: "inherit", env: { ...process.env, FLATLIMIT_FLOOR: floor } },
  );
  failed ||= status !== 0;
}
process.exitCode = failed ? 1 : 0;
