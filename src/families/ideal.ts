/**
 * An ideal as the commands know it: a ring, one or more generating sets of the same ideal, a default
 * order, and, for the families, the permutation whose tilings the limit is compared with.
 */
import type { Permutation } from "../combinatorics/permutation.js";
import type { Budget } from "../outcomes/budget.js";
import type { Reading } from "../outcomes/input-fault.js";
import type { Polynomial } from "../polynomials/polynomial.js";
import type { PolynomialRing } from "../polynomials/polynomial-ring.js";

/** One generating set of an ideal. */
export interface GeneratingSet {
  /** The word that `--generators` takes: `fulton`, `cdg`, `defining`, `given`. */
  readonly kind: string;
  /** One line for `--help` and reports. */
  readonly description: string;
  /**
   * The generators, made on demand since large families have many. A family's are non-zero and distinct;
   * those of a problem file are as typed, so that positions in witnesses are positions in the file.
   * @throws LimitReached
   */
  polynomials(budget?: Budget): readonly Polynomial[];
}

/** Generators made when they are first asked for, and kept as long as the ideal is. */
export function madeOnce(
  make: (budget: Budget | undefined) => readonly Polynomial[],
): GeneratingSet["polynomials"] {
  let made: readonly Polynomial[] | undefined;
  return (budget) => {
    made ??= make(budget);
    return made;
  };
}

/** An ideal that can be verified, degenerated and matched. */
export interface Ideal {
  /** What names it on the command line: `schubert:2143`, or the problem's path. */
  readonly name: string;
  readonly ring: PolynomialRing;
  /** At least one; all generate the same ideal; the first is the default. */
  readonly generatingSets: readonly [GeneratingSet, ...GeneratingSet[]];
  /** Phrase of the order used when none is asked for. */
  readonly defaultOrder: string;
  /**
   * The theorem by which the first generating set is a Gröbner basis in the default order, if there is one. Other
   * orders profit from it; it is not taken on trust, but checked before it is used.
   */
  readonly defaultBasis?: string;
  /** Whose tilings its limits are compared with. */
  readonly permutation?: Permutation;
}

/** A named family of ideals, `name:argument` on the command line. */
export interface Family {
  readonly name: string;
  /** What the argument is, for `--help`: "a permutation in one-line notation". */
  readonly argument: string;
  readonly description: string;
  readonly example: string;
  /** Reads the argument and makes the ideal. */
  read(argument: string): Reading<Ideal>;
}
