import { mkdtempSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { describe, expect, it } from "vitest";
import { flatlimit, flatlimitJson } from "../support/program.js";

describe("flatlimit verify", () => {
  const diagonal = ["--order", "lex from nw by rows"];

  it("fails for the Fulton generators of 2143 in the diagonal order, with a witness", () => {
    const { status, json, stderr } = flatlimitJson(
      "verify",
      "schubert:2143",
      "--generators",
      "fulton",
      ...diagonal,
    );
    expect(status).toBe(1);
    expect(stderr).toBe("");
    expect(json).toMatchObject({
      ideal: "schubert:2143",
      order: "lex from nw by rows",
      generators: { kind: "fulton", count: 2 },
      verdict: "fails",
      evidence: "proved",
      witness: {
        pair: [1, 2],
        remainder: "z12*z21*z33 - z12*z23*z31 - z13*z21*z32 + z13*z22*z31",
        leadingMonomial: "z12*z21*z33",
      },
      basis: { size: 2, maxDegree: 3 },
      seconds: expect.any(Number) as number,
    });
  });

  it("holds for its CDG generators", () => {
    const run = flatlimitJson("verify", "schubert:2143", "--generators", "cdg", ...diagonal);
    expect(run.status).toBe(0);
    expect(run.json).toMatchObject({ verdict: "holds", evidence: "proved", basis: { size: 2 } });
    expect(run.json).not.toHaveProperty("witness");
  });

  it("tells a person the same", () => {
    const { status, stdout } = flatlimit("verify", "schubert:2143", ...diagonal);
    expect(status).toBe(1);
    expect(stdout).toContain("fails: the generators are no Gröbner basis");
    expect(stdout).toContain("no leading monomial of a generator divides z12*z21*z33");
    expect(stdout).toContain("proved over the rationals: 1 S-pair reduced exactly");
  });
});

describe("flatlimit limit", () => {
  it("gives limit, components and all the keys that were promised", () => {
    const { status, json } = flatlimitJson("limit", "schubert:1432");
    expect(status).toBe(0);
    expect(json).toMatchObject({
      ideal: "schubert:1432",
      order: "revlex from nw by rows",
      evidence: "proved",
      basis: { size: 5, maxDegree: 2 },
      limit: { monomial: true, squarefree: true, codimension: 3, degree: "5" },
      unmixed: true,
    });
    expect((json["limit"] as { generators: string[] }).generators).toHaveLength(5);
    expect(json["components"]).toHaveLength(5);
    expect((json["components"] as unknown[])[0]).toEqual({
      variables: ["z12", "z13", "z22"],
      equations: [],
      codimension: 3,
      degree: "1",
      multiplicity: "1",
      embedded: false,
    });
  });

  it("draws each component in a line", () => {
    const { stdout } = flatlimit("limit", "schubert:1432");
    expect(stdout).toContain("limit: 5 generators, squarefree monomial, codimension 3, degree 5");
    expect(stdout).toMatch(/^ +1 {2}·\*\*· ·\*·· ···· ···· +3 +1$/m);
    expect(stdout).toContain("no embedded components");
  });

  it("reports embedded components of a curve in plain lex", () => {
    const { json } = flatlimitJson("limit", "examples/twisted-curve.yaml", "--order", "plain lex");
    expect(json).toMatchObject({ unmixed: false, limit: { degree: "3", codimension: 2 } });
    expect(json["components"]).toMatchObject([
      { variables: ["x", "y"], multiplicity: "3", embedded: false },
      { variables: ["x", "y", "z"], multiplicity: null, embedded: true },
    ]);
  });
});

describe("flatlimit match", () => {
  it("finds for 214365 15 tilings, 14 components, one of multiplicity 2", () => {
    const { status, json } = flatlimitJson(
      "match",
      "schubert:214365",
      "--order",
      "lex from se by rows",
    );
    expect(status).toBe(0);
    expect(json).toMatchObject({
      verdict: "holds",
      tilings: { kind: "bumpless", count: 15, weightedCount: "15" },
      limit: { degree: "15", squarefree: false },
      unmatchedComponents: [],
      unmatchedTilings: [],
    });
    const pairs = json["pairs"] as {
      multiplicity: string;
      expected: string;
      tilings: string[][];
    }[];
    expect(pairs).toHaveLength(14);
    const double = pairs.filter((p) => p.multiplicity === "2");
    expect(double).toHaveLength(1);
    expect(double[0]?.tilings).toHaveLength(2);
    expect(double[0]?.tilings[0]).toHaveLength(6);
  });

  it("fails with status 1 against the wrong tilings, and says what is unmatched", () => {
    const args = ["match", "schubert:1432", "--tilings", "bumpless"];
    const { status, json } = flatlimitJson(...args);
    expect(status).toBe(1);
    expect(json["verdict"]).toBe("fails");
    expect(flatlimit(...args).stdout).toMatch(
      /fails: 5 bumpless pipe dreams, \d components? without a tiling/,
    );
  });

  it("runs on a problem file with a permutation", () => {
    const { status, json } = flatlimitJson("match", "examples/corner-note/double-component.yaml");
    expect(status).toBe(0);
    expect(json).toMatchObject({ verdict: "holds", tilings: { count: 15 } });
    expect(json["problem"]).toHaveProperty("title", "The first multiplicity above 1");
  });
});

describe("flatlimit tilings", () => {
  it("lists tile letters, draws boxes, counts", () => {
    expect(flatlimit("tilings", "132", "--kind", "ordinary").stdout).toBe(
      "%+J\n%J.\nJ..\n\n%%J\n+J.\nJ..\n",
    );
    expect(flatlimit("tilings", "21", "--kind", "bumpless", "--draw").stdout).toBe("· ╭─\n╭─┼─\n");
    expect(flatlimit("tilings", "1,5,4,3,2", "--kind", "ordinary", "--count").stdout).toBe("14\n");
  });

  it("prints JSON with the keys that were promised", () => {
    const { status, json } = flatlimitJson("tilings", "2143", "--kind", "bumpless");
    expect(status).toBe(0);
    expect(json).toMatchObject({ permutation: "2143", kind: "bumpless", count: "3", degree: "3" });
    expect(json["tilings"]).toHaveLength(3);
    expect(flatlimitJson("tilings", "2143", "--kind", "ordinary", "--count").json).toEqual({
      permutation: "2143",
      kind: "ordinary",
      count: "3",
      degree: "3",
    });
  });

  // Robbins numbers: all bumpless pipe dreams of S_3 are the 7 alternating sign matrices.
  it("takes bumpless pipe dreams that are not reduced too", () => {
    const counts = ["123", "132", "213", "231", "312", "321"].map((w) =>
      Number(flatlimit("tilings", w, "--kind", "bumpless", "--all", "--count").stdout),
    );
    expect(counts.reduce((a, b) => a + b)).toBe(7);
  });
});

describe("the problem inside JSON output", () => {
  const folder = mkdtempSync(join(tmpdir(), "flatlimit-"));

  it.each([
    [["verify", "schubert:2143", "--order", "lex from nw by rows"]],
    [["verify", "examples/twisted-curve.yaml"]],
    [["match", "examples/corner-note/double-component.yaml", "--order", "lex from se by columns"]],
    [["limit", "partial:2,0,1/4", "--generators", "defining"]],
    [["limit", "asm:0+0/+-+/0+0"]],
    [
      [
        "verify",
        "determinantal:3,4,1",
        "--order",
        "cells lex (z11,z12,z13,z14,z21,z22,z23,z24) revlex (z34,z33,z32,z31)",
      ],
    ],
  ])("runs again to the same result: %s", (args) => {
    const first = flatlimitJson(...args);
    const file = join(folder, "again.json");
    writeFileSync(file, JSON.stringify(first.json["problem"]));
    const again = flatlimitJson(args[0] as string, file);
    expect(again.status).toBe(first.status);
    const { ideal, seconds, problem, generators, ...rest } = first.json;
    expect(again.json).toMatchObject(rest);
    expect([ideal, seconds, problem].every((x) => x !== undefined)).toBe(true);
    expect(generators === undefined).toBe(again.json["generators"] === undefined);
  });
});

describe("help", () => {
  it.each(["verify", "limit", "match", "tilings"])(
    "of %s shows an example that works",
    (command) => {
      const { status, stdout } = flatlimit(command, "--help");
      expect(status).toBe(0);
      const example = /Example:\n {2}flatlimit (.*)/.exec(stdout)?.[1];
      if (example === undefined) throw new Error("expected an example");
      const words = Array.from(example.matchAll(/"([^"]*)"|(\S+)/g), (m) => m[1] ?? m[2] ?? "");
      const run = flatlimit(...words);
      expect(run.status).toBe(0);
      expect(run.stderr).toBe("");
    },
  );

  it("of the program lists the commands and what exit statuses mean", () => {
    for (const args of [[], ["--help"], ["-h"], ["help"]]) {
      const { status, stdout } = flatlimit(...args);
      expect(status).toBe(0);
      for (const command of ["verify", "limit", "match", "tilings"])
        expect(stdout).toContain(command);
      expect(stdout).toContain("Exit status: 0 the claim holds");
    }
    expect(flatlimit("--version").stdout).toMatch(/^\d+\.\d+\.\d+\n$/);
  });
});
