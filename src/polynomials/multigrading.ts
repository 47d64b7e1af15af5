/**
 * Multigradings: integer weight vectors in which given polynomials are homogeneous. The finest one is the
 * integer kernel of the exponent differences within each polynomial; it is found by cutting the space of
 * all weights down difference by difference, so that most differences cost one look.
 */
import type { Exponents } from "./exponents.js";
import type { Polynomial } from "./polynomial.js";

/** Linearly independent weight vectors, one integer a variable. */
export interface Multigrading {
  readonly weights: readonly Int32Array[];
}

/** A weight larger than this is given up: a coarser grading is one too. */
const LARGEST_WEIGHT = 2 ** 20;

/**
 * The finest grading (torsion aside) in which all the polynomials are homogeneous, restricted to the
 * variables that occur. Every polynomial is homogeneous for each of its weights; that no further
 * independent weight exists holds unless weights beyond 2²⁰ were needed.
 */
export function finestGrading(polynomials: readonly Polynomial[]): Multigrading {
  const [first] = polynomials;
  if (first === undefined) return { weights: [] };
  const count = first.ring.variables.length;
  const used = new Set<number>();
  for (const f of polynomials) {
    for (const m of f.monomials) {
      for (let v = 0; v < m.length; v++) if (m[v] !== 0) used.add(v);
    }
  }
  let weights = [...used].sort((a, b) => a - b).map((v) => unitVector(count, v));
  for (const f of polynomials) {
    const [lead, ...others] = f.monomials;
    for (const m of others) {
      if (!haveSameDegrees(weights, lead as Exponents, m)) {
        weights = orthogonalTo(weights, sparseDifference(lead as Exponents, m));
      }
    }
  }
  return { weights };
}

/** Have two monomials the same degree for every weight? */
function haveSameDegrees(weights: readonly Int32Array[], a: Exponents, b: Exponents): boolean {
  const places = new Int32Array(a.length);
  let count = 0;
  for (let v = 0; v < a.length; v++) if (a[v] !== b[v]) places[count++] = v;
  for (const weight of weights) {
    let difference = 0;
    for (let k = 0; k < count; k++) {
      const v = places[k] as number;
      difference += (weight[v] as number) * ((a[v] as number) - (b[v] as number));
    }
    if (difference !== 0) return false;
  }
  return true;
}

/** The finest grading of the polynomials, computed when it is first asked for. */
export function finestGradingLater(polynomials: readonly Polynomial[]): () => Multigrading {
  let grading: Multigrading | undefined;
  return () => {
    grading ??= finestGrading(polynomials);
    return grading;
  };
}

/** The multidegree of a monomial as a key: two monomials have the same key just when they share it. */
export function multidegreeKey({ weights }: Multigrading, monomial: Exponents): string {
  let key = "";
  for (const weight of weights) {
    let degree = 0;
    for (let v = 0; v < weight.length; v++)
      degree += (weight[v] as number) * (monomial[v] as number);
    key += `${degree},`;
  }
  return key;
}

interface SparseVector {
  readonly places: readonly number[];
  readonly values: readonly number[];
}

function sparseDifference(a: Exponents, b: Exponents): SparseVector {
  const places = Array.from(a.keys()).filter((v) => a[v] !== b[v]);
  return { places, values: places.map((v) => (a[v] as number) - (b[v] as number)) };
}

/** The weights of the given span that vanish on a difference. */
function orthogonalTo(weights: Int32Array[], { places, values }: SparseVector): Int32Array[] {
  const products = weights.map((weight) =>
    places.reduce((sum, v, k) => sum + (weight[v] as number) * (values[k] as number), 0),
  );
  let pivot = -1;
  products.forEach((product, k) => {
    if (product === 0) return;
    if (pivot === -1 || Math.abs(product) < Math.abs(products[pivot] as number)) pivot = k;
  });
  if (pivot === -1) return weights;
  const pivotWeight = weights[pivot] as Int32Array;
  const pivotProduct = products[pivot] as number;
  return weights.flatMap((weight, k) => {
    if (k === pivot) return [];
    if (products[k] === 0) return [weight];
    const cut = Array.from(
      weight,
      (w, v) => w * pivotProduct - (pivotWeight[v] as number) * (products[k] as number),
    );
    const common = cut.reduce(gcd, 0);
    const primitive = cut.map((w) => w / common);
    return primitive.some((w) => Math.abs(w) > LARGEST_WEIGHT) ? [] : [Int32Array.from(primitive)];
  });
}

function unitVector(count: number, v: number): Int32Array {
  const vector = new Int32Array(count);
  vector[v] = 1;
  return vector;
}

function gcd(a: number, b: number): number {
  let [x, y] = [Math.abs(a), Math.abs(b)];
  while (y !== 0) [x, y] = [y, x % y];
  return x;
}
