import { describe, expect, it } from "vitest";
import { containsPattern } from "../../src/combinatorics/pattern-containment.js";
import {
  type Permutation,
  permutation,
  permutationsOf,
  printPermutation,
} from "../../src/combinatorics/permutation.js";
import { printMonomial } from "../../src/polynomials/printing.js";
import { componentsOf, groebner, limit, match, schubertQuestion } from "../support/questions.js";

const ANTIDIAGONAL = ["revlex from nw by rows", "lex from ne by rows"];
const CORNER_ORDERS = ["revlex from nw by rows", "lex from nw by rows"];

function failing(n: number, phrase: string, generators: string): string[] {
  const found: string[] = [];
  for (const w of permutationsOf(n)) {
    if (groebner(schubertQuestion(w, phrase, generators)).verdict === "fails")
      found.push(printPermutation(w));
  }
  return found;
}

function containing(n: number, patterns: readonly string[]): string[] {
  const parsed = patterns.map((p) => permutation(Array.from(p, Number)));
  return [...permutationsOf(n)]
    .filter((w) => parsed.some((p) => containsPattern(w, p)))
    .map(printPermutation);
}

describe("Fulton generators", () => {
  // Knutson, Miller, Gröbner geometry of Schubert polynomials, Ann. of Math. 161 (2005).
  it.each(ANTIDIAGONAL)("are a Gröbner basis for all of S_1 … S_5 in %s", (phrase) => {
    for (let n = 1; n <= 5; n++) expect(failing(n, phrase, "fulton")).toEqual([]);
  });

  // Knutson, Miller, Yong, J. reine angew. Math. 630 (2009): exactly when w avoids 2143.
  it.each(["lex from nw by rows", "lex from se by rows"])(
    "are a Gröbner basis in %s exactly for the permutations that avoid 2143, up to S_5",
    (phrase) => {
      for (let n = 3; n <= 5; n++)
        expect(failing(n, phrase, "fulton")).toEqual(containing(n, ["2143"]));
    },
  );

  it("fail for 2143 with a witness", () => {
    const claim = groebner(schubertQuestion("2143", "lex from nw by rows"), 10);
    expect(claim).toMatchObject({
      verdict: "fails",
      evidence: "proved",
      basis: { size: 2, maxDegree: 3 },
    });
    const { witness, ideal } = claim;
    if (witness === undefined) throw new Error("expected a witness");
    expect(witness.pair).toEqual([0, 1]);
    expect(printMonomial(ideal.ring, witness.leadingMonomial)).toBe("z12*z21*z33");
  });
});

describe("CDG generators", () => {
  // Klein, Diagonal degenerations of matrix Schubert varieties, Algebraic Combinatorics 6 (2023).
  it("fail in diagonal orders exactly for 13254 and 21543 in S_5", () => {
    expect(failing(5, "lex from nw by rows", "cdg")).toEqual(["13254", "21543"]);
  });

  it("hold for 2143 in the diagonal order, and give the size of the reduced basis at once", () => {
    expect(groebner(schubertQuestion("2143", "lex from nw by rows", "cdg"))).toMatchObject({
      verdict: "holds",
      witness: undefined,
      basis: { size: 2, maxDegree: 3 },
    });
  });

  it("generate the same ideal as the Fulton and the defining minors: the same limits on S_4", () => {
    for (const w of permutationsOf(4)) {
      const limits = ["fulton", "cdg", "defining"].map((set) =>
        limit(schubertQuestion(w, "lex from nw by rows", set)).limit.leadingIdeal.generators.map(
          String,
        ),
      );
      expect(limits[1]).toEqual(limits[0]);
      expect(limits[2]).toEqual(limits[0]);
    }
  });
});

describe("limits of matrix Schubert varieties", () => {
  // Knutson, Miller 2005 (ordinary); Klein, Weigandt, arXiv 2108.08370 [from memory] (bumpless).
  it.each(CORNER_ORDERS)("match their pipe dreams for all of S_5 in %s", (phrase) => {
    for (const w of permutationsOf(5)) {
      const { matching, description, tilings } = match(schubertQuestion(w, phrase));
      expect(matching.verdict, printPermutation(w)).toBe("holds");
      expect(description.degree).toBe(BigInt(tilings.length));
      expect(description.evidence).toBe("proved");
      const total = componentsOf(description).reduce((sum, c) => sum + (c.multiplicity ?? 0n), 0n);
      expect(total).toBe(description.degree);
    }
  });

  // Klein, Weigandt [from memory]: the smallest multiplicity above 1.
  it.each([
    "lex from se by rows",
    "lex from se by columns",
    "lex from nw by rows",
    "lex from nw by columns",
    "revlex from ne by rows",
    "revlex from ne by columns",
    "revlex from sw by rows",
  ])("have for 214365 14 components of 15 bumpless pipe dreams in %s", (phrase) => {
    const { matching, description, tilingKind } = match(schubertQuestion("214365", phrase));
    expect(tilingKind).toBe("bumpless");
    expect(matching.verdict).toBe("holds");
    expect(description).toMatchObject({
      degree: 15n,
      codimension: 3,
      squarefree: false,
      unmixed: true,
    });
    const multiplicities = componentsOf(description).map((c) => c.multiplicity);
    expect(multiplicities.toSorted()).toEqual([...new Array(13).fill(1n), 2n]);
  });

  it.each([
    "lex from ne by rows",
    "lex from sw by columns",
    "revlex from nw by columns",
    "revlex from se by rows",
  ])("have for 214365 15 components of 15 ordinary pipe dreams in %s", (phrase) => {
    const { matching, description, tilingKind } = match(schubertQuestion("214365", phrase));
    expect(tilingKind).toBe("ordinary");
    expect(matching.verdict).toBe("holds");
    expect(matching.pairs.map((p) => p.multiplicity)).toEqual(new Array(15).fill(1n));
    expect(description.squarefree).toBe(true);
  });

  it("do not match the tilings of the other kind", () => {
    const { matching } = match(schubertQuestion("1432", "lex from nw by rows"), "ordinary");
    expect(matching.verdict).toBe("fails");
    expect(matching.unmatchedComponents.length + matching.unmatchedTilings.length).toBeGreaterThan(
      0,
    );
  });

  it("are everything for the identity, and a point's worth of equations for the longest element", () => {
    const all = match(schubertQuestion("12", "lex from nw by rows"));
    expect(all.matching.pairs).toEqual([
      { component: 0, tilings: [0], multiplicity: 1n, expected: 1n },
    ]);
    const longest = limit(schubertQuestion("4321" as string, "lex from nw by rows"));
    expect(longest).toMatchObject({ codimension: 6, degree: 1n });
  });
});

describe("all generators", () => {
  it("of one permutation in one order do not change the verdict when they are permuted", () => {
    const w: Permutation = permutation([2, 1, 5, 4, 3]);
    const question = schubertQuestion(w, "lex from nw by rows");
    const polynomials = question.generators.polynomials();
    for (const order of [polynomials, polynomials.toReversed()]) {
      const generators = { ...question.generators, polynomials: () => order };
      expect(groebner({ ...question, generators }).verdict).toBe("fails");
    }
  });
});
