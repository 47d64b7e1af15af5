import { describe, expect, it } from "vitest";
import { decideGroebner } from "../../src/claims/groebner-claim.js";
import { describeLimit } from "../../src/claims/limit-description.js";
import { matchTilings, suggestedTilings } from "../../src/claims/tilings-claim.js";
import { type Budget, LimitReached, startBudget, unlimited } from "../../src/outcomes/budget.js";
import { ringOfMatrices } from "../../src/polynomials/polynomial-ring.js";
import { readProblem } from "../../src/problems/problem.js";
import { schubertQuestion } from "../support/questions.js";
import { accepted, orderOf } from "../support/reading.js";

/** A budget that ends as soon as a stage is reached whose name has a word. */
function until(word: string): Budget {
  return {
    elapsed: () => 0,
    spend(stage) {
      if (!stage().includes(word)) return;
      throw new LimitReached({ kind: "undecided", limit: "cancelled", reason: stage() });
    },
  };
}

/** A new ideal every time: what is once proved of an ideal is remembered. */
const asked = () => schubertQuestion("21543", "lex from nw by rows");

describe("claims that meet a limit", () => {
  it("are undecided when the generators cannot be written out", () => {
    expect(decideGroebner(asked(), until("minor"))).toMatchObject({ kind: "undecided" });
    expect(describeLimit(asked(), until("minor"))).toMatchObject({ kind: "undecided" });
  });

  it("are undecided when the verification or the basis is not reached", () => {
    expect(decideGroebner(asked(), until("S-pair"))).toMatchObject({ kind: "undecided" });
    expect(describeLimit(asked(), until("degree"))).toMatchObject({ kind: "undecided" });
    expect(matchTilings({ ...asked(), tilingKind: "bumpless" }, until("reducing"))).toMatchObject({
      kind: "undecided",
    });
  });

  it("keep the limit when only the tilings are not reached", () => {
    const claim = matchTilings({ ...asked(), tilingKind: "bumpless" }, until("tilings"));
    expect(claim).toMatchObject({
      kind: "tilings-claim",
      description: { degree: 14n },
      tilings: [],
      matching: { kind: "undecided" },
    });
  });

  it("keep the limit when only the components are not reached", () => {
    const square = schubertQuestion("1432", "revlex from nw by rows");
    const claim = matchTilings({ ...square, tilingKind: "ordinary" }, until("minimal primes"));
    expect(claim).toMatchObject({
      description: { degree: 5n, components: { kind: "undecided" }, unmixed: null },
      matching: { kind: "undecided" },
    });
  });

  it("are undecided when the time is up from the start", () => {
    const hard = schubertQuestion("2143765", "lex from nw by rows");
    expect(describeLimit(hard, startBudget({ seconds: 0.01 }))).toMatchObject({ limit: "seconds" });
  });

  it("leave out the reduced basis when it may take no time", () => {
    expect(decideGroebner(asked(), unlimited())).toMatchObject({
      verdict: "fails",
      basis: undefined,
    });
  });

  it("compute the basis where its degrees cannot be read off leading monomials", () => {
    const problem = accepted(
      readProblem(
        '{"variables":{"names":["y","z","x"]},"ideal":{"polynomials":["y-x^2","z-x^3"]},"order":"plain lex"}',
      ),
    );
    expect(decideGroebner(problem, unlimited(), 10)).toMatchObject({
      verdict: "holds",
      basis: { size: 2, maxDegree: 3 },
    });
  });
});

describe("partial orders", () => {
  // By hand: the n = 2 identity component of the lower-upper scheme under the dual order.
  it("give the limit, and leave its components undecided", () => {
    const problem = accepted(
      readProblem(`
variables:
  matrices: [{name: x, rows: 2, columns: 2}, {name: y, rows: 2, columns: 2}]
  pair: [x, y]
ideal:
  polynomials: [x11*y12 + x12*y22, y21*x11 + y22*x21, x12*y21 - y12*x21]
order: dual from nw by rows
`),
    );
    expect(describeLimit(problem, unlimited())).toMatchObject({
      limit: { monomial: false },
      codimension: 2,
      degree: 3n,
      components: { limit: "method" },
      unmixed: null,
    });
  });
});

describe("the tilings that an order suggests", () => {
  const ring = ringOfMatrices([{ name: "z", rows: 3, columns: 3 }]);

  it("are ordinary for antidiagonal orders, bumpless for diagonal ones, none for mixed ones", () => {
    expect(suggestedTilings(orderOf(ring, "revlex from nw by rows"))).toBe("ordinary");
    expect(suggestedTilings(orderOf(ring, "lex from nw by rows"))).toBe("bumpless");
    expect(
      suggestedTilings(orderOf(ring, "cells lex (z12,z11,z13,z21,z22,z23,z31,z32,z33)")),
    ).toBeUndefined();
  });

  it("are ordinary where there are no minors to look at", () => {
    const tiny = ringOfMatrices([{ name: "z", rows: 1, columns: 1 }]);
    expect(suggestedTilings(orderOf(tiny, "lex from nw by rows"))).toBe("ordinary");
  });
});
