import { spawnSync } from "node:child_process";
import { describe, expect, it } from "vitest";
import { closedAfterFirstPiece, flatlimit, interrupted, PROGRAM } from "../support/program.js";

/** A case that takes minutes. */
const HARD = ["match", "schubert:2143765", "--order", "lex from nw by rows"];

describe("Ctrl-C and its like", () => {
  it.each<[NodeJS.Signals, number]>([
    ["SIGINT", 130],
    ["SIGTERM", 143],
  ])(
    "%s ends at once with status %i and a line that says what was reached",
    async (signal, status) => {
      const run = await interrupted(signal, ...HARD);
      expect(run.status).toBe(status);
      expect(run.stdout).toBe("");
      expect(run.stderr).toMatch(/^flatlimit: interrupted after \d+\.\d s: .+$/m);
    },
  );
});

describe("budgets", () => {
  it("end as undecided with status 3 when the seconds are over", () => {
    const { status, stdout, stderr } = flatlimit(...HARD, "--seconds", "1", "--json");
    expect(status).toBe(3);
    expect(JSON.parse(stdout)).toMatchObject({
      ideal: "schubert:2143765",
      verdict: "undecided",
      evidence: "undecided",
      limit: "seconds",
      reason: expect.stringMatching(/^after \d/) as string,
      problem: { ideal: { family: "schubert:2143765" } },
    });
    expect(stderr).toMatch(/^flatlimit: undecided: after \d+\.\d s/);
  });

  it("end as undecided with status 3 when the memory is used up", () => {
    const { status, stdout } = flatlimit(...HARD, "--memory", "130MiB", "--json");
    expect(status).toBe(3);
    expect(JSON.parse(stdout)).toMatchObject({ verdict: "undecided" });
  });

  it("end as undecided while generators are written out", () => {
    const large = "schubert:2,1,4,3,6,5,8,7,10,9,12,11,14,13";
    const { status, stdout } = flatlimit("verify", large, "--seconds", "1", "--json");
    expect(status).toBe(3);
    expect(JSON.parse(stdout)).toMatchObject({ verdict: "undecided" });
  });

  it("end counting and listing of tilings too", () => {
    const w = Array.from({ length: 40 }, (_, i) => ((17 * (i + 1)) % 41).toString()).join(",");
    const { status, stderr } = flatlimit(
      "tilings",
      w,
      "--kind",
      "bumpless",
      "--all",
      "--count",
      "--seconds",
      "1",
    );
    expect(status).toBe(3);
    expect(stderr).toMatch(/^flatlimit: undecided: /);
  });

  it("leave a partial limit undecided with what was computed", () => {
    const { status, stdout } = flatlimit(
      "limit",
      "examples/twisted-curve.yaml",
      "--order",
      "weights (1,1,1) refined by graded revlex",
    );
    expect(status).toBe(3);
    expect(stdout).toContain("components undecided: the limit is not a monomial ideal");
  });
});

describe("a reader that goes away", () => {
  it("does not disturb: head takes one line", () => {
    const { status, stdout, stderr } = spawnSync(
      "bash",
      ["-c", 'set -o pipefail; "$0" "$1" limit schubert:1432 | head -1', process.execPath, PROGRAM],
      { encoding: "utf8" },
    );
    expect(stdout).toBe("schubert:1432, revlex from nw by rows\n");
    expect(stderr).toBe("");
    expect(status).toBe(0);
  });

  it("ends an endless list quietly", async () => {
    const run = await closedAfterFirstPiece(
      "tilings",
      "1,12,11,10,9,8,7,6,5,4,3,2",
      "--kind",
      "ordinary",
    );
    expect(run.stdout).not.toBe("");
    expect(run.stderr).toBe("");
    expect(run.status).toBe(0);
  });

  it("does not disturb when standard output is closed from the start", () => {
    const { status, stderr } = spawnSync(
      "bash",
      ["-c", '"$0" "$1" limit schubert:1432 >&-', process.execPath, PROGRAM],
      { encoding: "utf8" },
    );
    expect(stderr).not.toMatch(/^ +at /m);
    expect(status).toBe(0);
  });
});

describe("progress", () => {
  it("is silent where standard error is no terminal", () => {
    expect(
      flatlimit(...HARD, "--seconds", "1")
        .stderr.trim()
        .split("\n"),
    ).toHaveLength(1);
  });

  it("comes line by line when asked for, and never with --quiet", () => {
    const asked = flatlimit(...HARD, "--seconds", "3", "--progress").stderr;
    expect(asked).toMatch(/^\d+\.\d s {2}.+$/m);
    const quiet = flatlimit(...HARD, "--seconds", "2", "--progress", "--quiet").stderr;
    expect(quiet.trim().split("\n")).toHaveLength(1);
  });
});
