import { describe, expect, it } from "vitest";
import { matchSubspaces } from "../../src/claims/subspace-matching.js";
import type { VariableIndex } from "../../src/polynomials/polynomial-ring.js";

const vars = (...list: number[]) => list as VariableIndex[];
const component = (multiplicity: bigint | null, ...prime: number[]) => ({
  prime: vars(...prime),
  multiplicity,
  embedded: multiplicity === null,
});
const tiling = (...vanishing: number[]) => ({ vanishing: vars(...vanishing) });

describe("matching components with tilings", () => {
  it("holds when every subspace carries as many tilings as its multiplicity", () => {
    const found = matchSubspaces(
      [component(1n, 0, 1), component(2n, 2, 3)],
      [tiling(3, 2), tiling(1, 0), tiling(2, 3)],
    );
    expect(found).toEqual({
      verdict: "holds",
      pairs: [
        { component: 0, tilings: [1], multiplicity: 1n, expected: 1n },
        { component: 1, tilings: [0, 2], multiplicity: 2n, expected: 2n },
      ],
      unmatchedComponents: [],
      unmatchedTilings: [],
    });
  });

  it("fails when a multiplicity is not the number of tilings", () => {
    const found = matchSubspaces([component(2n, 0)], [tiling(0)]);
    expect(found).toMatchObject({ verdict: "fails", pairs: [{ multiplicity: 2n, expected: 1n }] });
  });

  it("fails when a component has no tiling, and says which", () => {
    const found = matchSubspaces([component(1n, 0), component(1n, 1)], [tiling(0)]);
    expect(found).toMatchObject({
      verdict: "fails",
      unmatchedComponents: [1],
      unmatchedTilings: [],
    });
  });

  it("fails when a tiling has no component, and says which", () => {
    const found = matchSubspaces([component(1n, 0)], [tiling(2), tiling(0), tiling(1), tiling(2)]);
    expect(found).toMatchObject({
      verdict: "fails",
      unmatchedComponents: [],
      unmatchedTilings: [0, 2, 3],
    });
  });

  it("leaves embedded components to the caller, and does not let a tiling match one", () => {
    expect(matchSubspaces([component(1n, 0), component(null, 0, 1)], [tiling(0)]).verdict).toBe(
      "holds",
    );
    expect(
      matchSubspaces([component(1n, 0), component(null, 0, 1)], [tiling(0), tiling(0, 1)]),
    ).toMatchObject({
      verdict: "fails",
      unmatchedTilings: [1],
    });
  });

  it("of nothing with nothing holds", () => {
    expect(matchSubspaces([], []).verdict).toBe("holds");
  });
});
