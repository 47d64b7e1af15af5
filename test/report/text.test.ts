import { describe, expect, it } from "vitest";
import {
  ringOfMatrices,
  ringOfVariables,
  type VariableIndex,
} from "../../src/polynomials/polynomial-ring.js";
import { readProblem } from "../../src/problems/problem.js";
import { groebnerJson, limitJson, tilingsClaimJson } from "../../src/report/claim-json.js";
import { groebnerText, limitText, tilingsClaimText } from "../../src/report/claim-text.js";
import { printFault } from "../../src/report/fault-text.js";
import { subspaceGrid } from "../../src/report/subspace-grid.js";
import { textTable } from "../../src/report/text-table.js";
import { groebner, limit, match, schubertQuestion } from "../support/questions.js";
import { accepted } from "../support/reading.js";

const code = "input-fault" as const;

describe("a fault as a message", () => {
  it("shows file, line, column, the line with a caret, and what would be right", () => {
    const text = printFault({
      code,
      message: "unknown variable w3",
      file: "note.yaml",
      place: { line: 3, column: 9 },
      excerpt: "- x1*x2 - w3",
      expected: "one of x1, x2, x3",
    });
    expect(text).toBe(
      [
        "flatlimit: note.yaml:3:9: unknown variable w3",
        "  3 | - x1*x2 - w3",
        "    |         ^",
        "  expected one of x1, x2, x3",
      ].join("\n"),
    );
  });

  it("needs nothing but the message", () => {
    expect(printFault({ code, message: "no" })).toBe("flatlimit: no");
    expect(printFault({ code, message: "no", file: "a.yaml" })).toBe("flatlimit: a.yaml: no");
    expect(printFault({ code, message: "no", place: { line: 2, column: 1 } })).toBe(
      "flatlimit: no",
    );
  });

  it("leaves line numbers out for what was typed", () => {
    const text = printFault({ code, message: "no", place: { line: 1, column: 2 }, excerpt: "ab" });
    expect(text).toBe("flatlimit: no\n  1 | ab\n    |  ^");
  });

  it("shows control characters and long lines without harm", () => {
    const place = { line: 1, column: 301 };
    const text = printFault({
      code,
      message: "no",
      place,
      excerpt: `${"a".repeat(300)}\u001b[31m\tb${"c".repeat(500)}`,
    });
    const [, excerpt = "", caret = ""] = text.split("\n");
    expect(excerpt).toContain("\u{fffd}[31m b");
    expect(excerpt.length).toBeLessThan(120);
    expect(excerpt[caret.indexOf("^")]).toBe("\u{fffd}");
  });
});

describe("subspaces in one line", () => {
  it("are drawn row by row for matrices, one matrix after the other", () => {
    const ring = ringOfMatrices([
      { name: "x", rows: 2, columns: 3 },
      { name: "y", rows: 1, columns: 2 },
    ]);
    expect(subspaceGrid(ring, [0, 4, 7] as VariableIndex[])).toBe("*·· ·*·   ·*");
  });

  it("are equations for listed variables", () => {
    const ring = ringOfVariables(["x", "y", "z"]);
    expect(subspaceGrid(ring, [0, 2] as VariableIndex[])).toBe("x = z = 0");
    expect(subspaceGrid(ring, [])).toBe("everything");
  });
});

describe("text tables", () => {
  it("align by character, numbers to the right", () => {
    const columns = [{ heading: "no.", right: true }, { heading: "what" }, { heading: "" }];
    expect(
      textTable(columns, [
        ["1", "·*", "x"],
        ["10", "abcdef", ""],
      ]),
    ).toEqual(["no.  what", "  1  ·*      x", " 10  abcdef"]);
  });
});

describe("claims as text and as JSON", () => {
  it("say the same of a failing generating set", () => {
    const claim = groebner(schubertQuestion("2143", "lex from nw by rows"), 5);
    const text = groebnerText(claim, 0.5).join("\n");
    expect(text).toContain("schubert:2143, 2 generators (fulton), lex from nw by rows");
    expect(text).toContain("reduced basis: 2 elements, degrees up to 3");
    expect(text).toContain("(0.50 s)");
    expect(groebnerJson(claim, 0.5)).toMatchObject({
      verdict: "fails",
      seconds: 0.5,
      basis: { size: 2 },
    });
    const without = groebner(schubertQuestion("2143", "lex from nw by rows"));
    expect(groebnerJson(without, 0.5)).toMatchObject({ basis: null });
    expect(groebnerText(without, 0.5).join("\n")).not.toContain("reduced basis");
  });

  it("cut long polynomials in text, not in JSON", () => {
    const claim = groebner(schubertQuestion("13254", "lex from nw by rows"), 5);
    const text = groebnerText(claim, 0).join("\n");
    expect(text).toMatch(/… \(\d+ terms\)/);
    expect(JSON.stringify(groebnerJson(claim, 0))).not.toContain("…");
  });

  it("name embedded components, and what is undecided", () => {
    const curve = accepted(
      readProblem(
        '{"variables":{"names":["x","y","z"]},"ideal":{"polynomials":["y-x^2","z-x^3"]},"order":"plain lex"}',
      ),
    );
    const text = limitText(limit(curve), 0).join("\n");
    expect(text).toContain("embedded");
    expect(text).toContain("there are embedded components");
    const partial = accepted(
      readProblem(
        '{"variables":{"names":["x","y"]},"ideal":{"polynomials":["x^2-y^2"]},"order":"weights (1,1) refined by graded lex"}',
      ),
    );
    expect(limitText(limit(partial), 0).join("\n")).toContain(
      "components undecided: the limit is not a monomial ideal",
    );
    expect(limitJson(limit(partial), 0)).toMatchObject({
      components: [],
      unmixed: null,
      undecided: expect.any(String) as string,
    });
  });

  it("call the unit ideal by its name, and give it no codimension", () => {
    const unit = accepted(
      readProblem('{"variables":{"names":["x"]},"ideal":{"polynomials":["x","x-1"]}}'),
    );
    expect(limitText(limit(unit), 0).join("\n")).toContain("the unit ideal");
    expect(limitJson(limit(unit), 0)).toMatchObject({ limit: { codimension: null, degree: "0" } });
  });

  it("list what does not match", () => {
    const claim = match(schubertQuestion("1432", "revlex from nw by rows"), "bumpless");
    const text = tilingsClaimText(claim, 0).join("\n");
    expect(text).toContain("no tiling");
    expect(text).toMatch(/tiling \d+ has no component:\n {4}\S{4}\n/);
    const json = tilingsClaimJson(claim, 0) as { unmatchedTilings: string[][] };
    expect(json.unmatchedTilings[0]).toHaveLength(4);
  });

  it("say when only the matching is undecided", () => {
    const claim = match(schubertQuestion("132", "revlex from nw by rows"));
    const open = {
      ...claim,
      matching: { kind: "undecided", limit: "seconds", reason: "after 1 s" },
    } as const;
    expect(tilingsClaimText(open, 0).join("\n")).toContain("undecided: after 1 s");
    expect(tilingsClaimJson(open, 0)).toMatchObject({
      verdict: "undecided",
      reason: "after 1 s",
      pairs: [],
    });
    const wrong = {
      ...claim,
      matching: {
        ...claim.matching,
        verdict: "fails",
        pairs: claim.matching.pairs.map((p) => ({ ...p, expected: 3n })),
      },
    } as const;
    expect(tilingsClaimText(wrong, 0).join("\n")).toContain("expected multiplicity 3");
  });
});
