import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { rationalBasis } from "../../src/groebner/rational-basis.js";
import { unlimited } from "../../src/outcomes/budget.js";
import { ringOfVariables } from "../../src/polynomials/polynomial-ring.js";
import { orderOf, polynomials, termSets } from "../support/reading.js";

interface ReferenceIdeal {
  readonly id: number;
  readonly vars: string[];
  readonly gens: string[];
  readonly gb: { readonly lex: string[]; readonly grlex: string[]; readonly grevlex: string[] };
}

describe("reduced bases over the rationals", () => {
  const references = readFileSync(
    new URL("../reference/general-purpose/random-ideals.jsonl", import.meta.url),
    "utf8",
  )
    .trim()
    .split("\n")
    .map((line) => JSON.parse(line) as ReferenceIdeal);

  // Source: test/reference/general-purpose/SOURCE.md (SymPy 1.11.1).
  it.each([
    ["plain lex", "lex"],
    ["graded lex", "grlex"],
    ["graded revlex", "grevlex"],
  ] as const)(
    "reproduce 100 random ideals of the reference library in %s",
    (phrase, key) => {
      expect(references).toHaveLength(100);
      for (const { id, vars, gens, gb } of references) {
        const r = ringOfVariables(vars);
        const basis = rationalBasis(polynomials(r, gens), orderOf(r, phrase), unlimited());
        if (basis.kind === "undecided") throw new Error(basis.reason);
        expect(termSets(basis.elements), `ideal ${id}`).toEqual(termSets(polynomials(r, gb[key])));
        expect(basis.evidence).toBe("proved");
      }
    },
    120_000,
  );
});
