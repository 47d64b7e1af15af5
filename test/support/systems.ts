/** Systems of the literature, as polynomials over the rationals. */
import {
  add,
  constant,
  multiply,
  type Polynomial,
  subtract,
  variable,
} from "../../src/polynomials/polynomial.js";
import { ringOfVariables, type VariableIndex } from "../../src/polynomials/polynomial-ring.js";

function make(count: number): { x: (i: number) => Polynomial; c: (n: number) => Polynomial } {
  const ring = ringOfVariables(Array.from({ length: count }, (_, i) => `x${i}`));
  return {
    x: (i) => variable(ring, i as VariableIndex),
    c: (n) => constant(ring, BigInt(n)),
  };
}

function sum(parts: readonly Polynomial[]): Polynomial {
  return parts.reduce(add);
}

function product(parts: readonly Polynomial[]): Polynomial {
  return parts.reduce(multiply);
}

function range(n: number): number[] {
  return Array.from({ length: n }, (_, i) => i);
}

/** katsura-n: n+1 variables, 2^n solutions. */
export function katsura(n: number): Polynomial[] {
  const { x, c } = make(n + 1);
  const quadrics = range(n).map((m) => {
    const parts: Polynomial[] = [];
    for (let i = -n; i <= n; i++) {
      if (Math.abs(m - i) <= n) parts.push(multiply(x(Math.abs(i)), x(Math.abs(m - i))));
    }
    return subtract(sum(parts), x(m));
  });
  const linear = sum([x(0), ...range(n).map((i) => multiply(c(2), x(i + 1)))]);
  return [subtract(linear, c(1)), ...quadrics];
}

/** cyclic-n. */
export function cyclic(n: number): Polynomial[] {
  const { x, c } = make(n);
  const sums = range(n - 1).map((d) =>
    sum(range(n).map((i) => product(range(d + 1).map((k) => x((i + k) % n))))),
  );
  return [...sums, subtract(product(range(n).map(x)), c(1))];
}

/** noon-n, coefficients cleared: 10·x_i·Σ x_j² − 11·x_i + 10. */
export function noon(n: number): Polynomial[] {
  const { x, c } = make(n);
  return range(n).map((i) => {
    const squares = sum(
      range(n)
        .filter((j) => j !== i)
        .map((j) => multiply(x(j), x(j))),
    );
    return add(subtract(product([c(10), x(i), squares]), multiply(c(11), x(i))), c(10));
  });
}

/** eco-n. */
export function eco(n: number): Polynomial[] {
  const { x, c } = make(n);
  const last = x(n - 1);
  const rows = range(n - 1).map((k) => {
    const inner = sum([x(k), ...range(n - 2 - k).map((i) => multiply(x(i), x(i + k + 1)))]);
    return subtract(multiply(inner, last), c(k + 1));
  });
  return [...rows, add(sum(range(n - 1).map(x)), c(1))];
}
