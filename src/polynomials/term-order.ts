/**
 * Term orders as data. An order is a list of comparisons, each a sparse integer weight vector, tried
 * one after the other: the first whose weights differ decides, the larger weight is the larger
 * monomial. Every order of the trade has this form (Robbiano, *Term orderings on the polynomial ring*,
 * EUROCAL 1985), so lex, revlex, dual, weight vectors and stages need no cases of their own; only
 * `compile` recognises the common shapes to make them fast.
 */
import type { PolynomialRing, VariableIndex } from "./polynomial-ring.js";

/** One comparison: the weight of a monomial is `Σ weights[k] · exponent(variables[k])`. */
export interface Comparison {
  readonly variables: readonly VariableIndex[];
  readonly weights: readonly number[];
}

/**
 * A term order on a ring. The first `decisive` comparisons say which terms a leading form keeps:
 * all of them for a total order, only the weights of the partial order otherwise; the comparisons
 * after them refine it to a total order, in which to compute.
 */
export interface TermOrder {
  /** The phrase that names the order, in normal form: `lex from nw by rows`. */
  readonly phrase: string;
  readonly ring: PolynomialRing;
  readonly degreeFirst: boolean;
  /** Without the degree comparison; together they separate any two monomials. */
  readonly comparisons: readonly Comparison[];
  readonly decisive: number;
  /** How many of the decisive comparisons end each stage, ascending; the last is `decisive`. */
  readonly stages: readonly number[];
}

/** Does the order leave some monomials unordered, so that a limit may keep several terms? */
export function isPartial(order: TermOrder): boolean {
  return order.decisive < order.comparisons.length;
}

/**
 * A total order from comparisons of single variables: `sign` +1 where the larger exponent is the
 * larger monomial (lex), −1 where the smaller is (revlex).
 */
export function singleVariableComparison(variable: VariableIndex, sign: 1 | -1): Comparison {
  return { variables: [variable], weights: [sign] };
}

/**
 * Is 1 the smallest monomial, as a term order needs? With the degree first always; otherwise the
 * first comparison that sees a variable must give it a positive weight. Returns a variable that is
 * below 1, or undefined when all is well.
 */
export function variableBelowOne(order: TermOrder): VariableIndex | undefined {
  if (order.degreeFirst) return undefined;
  return order.ring.variables
    .map((_, v) => v as VariableIndex)
    .find((v) => {
      for (const { variables, weights } of order.comparisons) {
        const weight = weights[variables.indexOf(v)] ?? 0;
        if (weight !== 0) return weight < 0;
      }
      return true;
    });
}

/** Compares two monomials in one arena of exponents, by offsets: positive when the first is larger. */
export type CompareInArena = (exponents: Uint16Array, a: number, b: number) => number;

/**
 * The fast comparison of an order, total degree left out: it is the caller's to compare first when
 * `degreeFirst` holds, since tables keep degrees. Runs of single-variable comparisons become one
 * loop over positions and signs; other comparisons become a sparse weighted sum.
 */
export function compileComparison(order: TermOrder): CompareInArena {
  const steps = compileSteps(order.comparisons);
  const [only] = steps;
  if (steps.length === 1 && only !== undefined) return only;
  return (exponents, a, b) => {
    for (const step of steps) {
      const difference = step(exponents, a, b);
      if (difference !== 0) return difference;
    }
    return 0;
  };
}

/** The fast comparison by the decisive comparisons alone, total degree left out. */
export function compileDecisiveComparison(order: TermOrder): CompareInArena {
  return compileComparison({ ...order, comparisons: order.comparisons.slice(0, order.decisive) });
}

function compileSteps(comparisons: readonly Comparison[]): CompareInArena[] {
  const steps: CompareInArena[] = [];
  let k = 0;
  while (k < comparisons.length) {
    const run: Comparison[] = [];
    for (let c = comparisons[k]; c !== undefined && isSingle(c); c = comparisons[k]) {
      run.push(c);
      k++;
    }
    if (run.length > 0) steps.push(compareVariables(run));
    const weighted = comparisons[k];
    if (weighted !== undefined) {
      steps.push(compareWeights(weighted));
      k++;
    }
  }
  return steps;
}

function isSingle(c: Comparison): boolean {
  return c.variables.length === 1 && Math.abs(c.weights[0] as number) === 1;
}

function compareVariables(run: readonly Comparison[]): CompareInArena {
  const positions = Int32Array.from(run, (c) => c.variables[0] as number);
  const signs = Int32Array.from(run, (c) => c.weights[0] as number);
  const length = positions.length;
  return (exponents, a, b) => {
    for (let k = 0; k < length; k++) {
      const v = positions[k] as number;
      const difference = (exponents[a + v] as number) - (exponents[b + v] as number);
      if (difference !== 0) return difference * (signs[k] as number);
    }
    return 0;
  };
}

function compareWeights({ variables, weights }: Comparison): CompareInArena {
  const positions = Int32Array.from(variables);
  const factors = Float64Array.from(weights);
  const length = positions.length;
  return (exponents, a, b) => {
    let difference = 0;
    for (let k = 0; k < length; k++) {
      const v = positions[k] as number;
      difference +=
        (factors[k] as number) * ((exponents[a + v] as number) - (exponents[b + v] as number));
    }
    return difference;
  };
}
