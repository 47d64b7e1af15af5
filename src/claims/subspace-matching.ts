/**
 * Components against tilings, by subspace. The claim: the minimal components of the limit are the
 * coordinate subspaces of the tilings, each with as many tilings as its multiplicity. Checked in both
 * directions: every component has its tilings, every tiling its component.
 */
import type { VariableIndex } from "../polynomials/polynomial-ring.js";

/** What matching needs of a component: the variables that vanish on it, and its multiplicity. */
export interface MatchableComponent {
  /** Ascending. */
  readonly prime: readonly VariableIndex[];
  readonly multiplicity: bigint | null;
  readonly embedded: boolean;
}

/** What matching needs of a tiling. */
export interface MatchableTiling {
  /** The variables that vanish on its subspace; in any order. */
  readonly vanishing: readonly VariableIndex[];
}

/** A minimal component with the tilings on its subspace. */
export interface MatchedPair {
  /** Index into the components. */
  readonly component: number;
  /** Indices into the tilings; not empty. */
  readonly tilings: readonly number[];
  readonly multiplicity: bigint;
  /** The multiplicity that the tilings predict. */
  readonly expected: bigint;
}

/** The outcome: `holds` when nothing is unmatched and all multiplicities are as expected. */
export interface SubspaceMatching {
  readonly verdict: "holds" | "fails";
  readonly pairs: readonly MatchedPair[];
  /** Minimal components on whose subspace there is no tiling. */
  readonly unmatchedComponents: readonly number[];
  /** Tilings whose subspace is no minimal component. */
  readonly unmatchedTilings: readonly number[];
}

/**
 * Matches the minimal components with the tilings. Embedded components belong to no tiling and are
 * left to the caller. Cost: one look-up a tiling.
 */
export function matchSubspaces(
  components: readonly MatchableComponent[],
  tilings: readonly MatchableTiling[],
): SubspaceMatching {
  const onSubspace = new Map<string, number[]>();
  tilings.forEach(({ vanishing }, index) => {
    const key = [...vanishing].sort((a, b) => a - b).join(" ");
    const others = onSubspace.get(key);
    if (others === undefined) onSubspace.set(key, [index]);
    else others.push(index);
  });
  const pairs: MatchedPair[] = [];
  const unmatchedComponents: number[] = [];
  components.forEach(({ prime, multiplicity, embedded }, component) => {
    if (embedded || multiplicity === null) return;
    const key = prime.join(" ");
    const matched = onSubspace.get(key);
    if (matched === undefined) {
      unmatchedComponents.push(component);
      return;
    }
    onSubspace.delete(key);
    pairs.push({ component, tilings: matched, multiplicity, expected: BigInt(matched.length) });
  });
  const unmatchedTilings = [...onSubspace.values()].flat().sort((a, b) => a - b);
  const holds =
    unmatchedComponents.length === 0 &&
    unmatchedTilings.length === 0 &&
    pairs.every((pair) => pair.multiplicity === pair.expected);
  return { verdict: holds ? "holds" : "fails", pairs, unmatchedComponents, unmatchedTilings };
}
