/**
 * The floors of the house as rules: a folder of src/ imports only from itself and from the folders
 * below it. The core knows no platform: `node:` modules appear in the shell folders alone.
 */

/** Bottom up. */
const FLOORS = [
  "outcomes",
  "arithmetic",
  "polynomials",
  "kernel",
  "hilbert",
  "groebner",
  "combinatorics",
  "families",
  "problems",
  "limits",
  "components",
  "tilings",
  "classes",
  "claims",
  "certificates",
  "recheck",
  "survey",
  "report",
  "cli",
];
const SHELL = ["survey", "cli"];

const anyOf = (/** @type {readonly string[]} */ folders) => `^src/(?:${folders.join("|")})/`;

/** A rule a floor: nothing from the floors above it. */
const floorRules = FLOORS.slice(0, -1).map((floor, height) => ({
  name: `floor-${floor}`,
  comment: `src/${floor} imports only from the folders below it`,
  severity: "error",
  from: { path: anyOf([floor]) },
  to: { path: anyOf(FLOORS.slice(height + 1)) },
}));

/** @type {import("dependency-cruiser").IConfiguration} */
export default {
  forbidden: [
    .../** @type {import("dependency-cruiser").IForbiddenRuleType[]} */ (floorRules),
    {
      name: "recheck-stands-alone",
      comment: "the independent checker shares no code with what it checks",
      severity: "error",
      from: { path: anyOf(["recheck"]) },
      to: { path: "^src/", pathNot: anyOf(["recheck"]) },
    },
    {
      name: "every-file-on-a-floor",
      comment: "src/ holds the public entry and the floors, nothing else",
      severity: "error",
      from: {},
      to: { path: "^src/", pathNot: ["^src/index\\.ts$", anyOf(FLOORS)] },
    },
    {
      name: "file-outside-the-floors",
      comment: "src/ holds the public entry and the floors, nothing else",
      severity: "error",
      from: { path: "^src/", pathNot: ["^src/index\\.ts$", anyOf(FLOORS)] },
      to: {},
    },
    {
      name: "entry-is-the-roof",
      comment: "src/index.ts is what users import; inside the house import the file itself",
      severity: "error",
      from: { path: "^src/" },
      to: { path: "^src/index\\.ts$" },
    },
    {
      name: "core-knows-no-platform",
      comment: "the core runs in a browser too: built-in modules of Node belong in the shell",
      severity: "error",
      from: { path: "^src/", pathNot: anyOf(SHELL) },
      to: { dependencyTypes: ["core"] },
    },
    {
      name: "no-tests-in-src",
      comment: "src/ does not depend on what is only there to check or to show it",
      severity: "error",
      from: { path: "^src/" },
      to: { path: "^(?:test|benchmarks|examples|\\.config|dist)/" },
    },
    {
      name: "no-development-dependencies",
      comment: "what is installed with the package must do",
      severity: "error",
      from: { path: "^src/" },
      to: { dependencyTypes: ["npm-dev", "npm-no-pkg", "npm-unknown"] },
    },
    {
      name: "no-cycles",
      comment: "two files that need each other are one file, or hide a third",
      severity: "error",
      from: {},
      to: { circular: true },
    },
    {
      name: "resolvable",
      comment: "every import leads somewhere",
      severity: "error",
      from: {},
      to: { couldNotResolve: true },
    },
  ],
  options: {
    tsPreCompilationDeps: true,
    tsConfig: { fileName: "tsconfig.json" },
    doNotFollow: { path: "node_modules" },
    enhancedResolveOptions: {
      exportsFields: ["exports"],
      conditionNames: ["import", "types", "node", "default"],
    },
  },
};
