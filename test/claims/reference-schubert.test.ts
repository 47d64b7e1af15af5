import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { printMonomial } from "../../src/polynomials/printing.js";
import { groebner, limit, schubertQuestion } from "../support/questions.js";
import { polynomials, termSets } from "../support/reading.js";

interface ReferenceCase {
  readonly w: string;
  readonly fulton_gb: boolean;
  readonly cdg_gb: boolean;
  readonly max_deg: number;
  readonly squarefree: boolean;
  readonly codim: number;
  readonly degree: number;
  readonly initial: string[];
  readonly gb: string[];
}

// Source: test/reference/general-purpose/SOURCE.md (SymPy 1.11.1), all of S_3 and S_4.
describe.each([
  ["schubert-antidiagonal.jsonl", "lex from ne by rows"],
  ["schubert-diagonal.jsonl", "lex from nw by rows"],
])("the reference bases of %s in %s", (file, phrase) => {
  const url = new URL(`../reference/general-purpose/${file}`, import.meta.url);
  const cases = readFileSync(url, "utf8")
    .trim()
    .split("\n")
    .map((line) => JSON.parse(line) as ReferenceCase);

  it("are all of S_3 and S_4", () => {
    expect(cases.map((c) => c.w).filter((w) => w.length === 3)).toHaveLength(6);
    expect(cases.map((c) => c.w).filter((w) => w.length === 4)).toHaveLength(24);
  });

  it.each(cases)("are reproduced for $w", (reference) => {
    const question = schubertQuestion(reference.w, phrase);
    const description = limit(question);
    const { ring } = question.ideal;
    const { basis, leadingIdeal } = description.limit;
    expect(termSets(basis.elements)).toEqual(termSets(polynomials(ring, reference.gb)));
    expect(leadingIdeal.generators.map((m) => printMonomial(ring, m)).sort()).toEqual(
      reference.initial.toSorted(),
    );
    expect(description).toMatchObject({
      codimension: reference.codim,
      degree: BigInt(reference.degree),
      squarefree: reference.squarefree,
    });
    const verdict = (set: string) => groebner(schubertQuestion(reference.w, phrase, set)).verdict;
    expect(verdict("fulton") === "holds").toBe(reference.fulton_gb);
    expect(verdict("cdg") === "holds").toBe(reference.cdg_gb);
  });
});
