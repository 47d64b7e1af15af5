/** Systems of the literature, as texts in the variables they name. */
import { readPolynomial, ringOfVariables } from "../dist/index.js";
import { accept } from "./accept.mjs";

/** @import { Polynomial } from "../dist/index.js" */

/** @param {number} n */
const range = (n) => Array.from({ length: n }, (_, i) => i);

/** @param {string[]} names @param {string[]} texts @returns {Polynomial[]} */
function inVariables(names, texts) {
  const ring = ringOfVariables(names);
  return texts.map((text) => accept(readPolynomial(text, ring)));
}

/** katsura-n: n + 1 variables, 2ⁿ solutions. @param {number} n */
export function katsura(n) {
  const doubled = range(n).map((i) => `2*u${i + 1}`);
  const quadrics = range(n).map((m) => {
    const indices = range(2 * n + 1).map((k) => k - n);
    const products = indices
      .filter((i) => Math.abs(m - i) <= n)
      .map((i) => `u${Math.abs(i)}*u${Math.abs(m - i)}`);
    return `${products.join(" + ")} - u${m}`;
  });
  return inVariables(
    range(n + 1).map((i) => `u${i}`),
    [`${["u0", ...doubled].join(" + ")} - 1`, ...quadrics],
  );
}

/** cyclic-n. @param {number} n */
export function cyclic(n) {
  /** @param {number} start @param {number} length */
  const run = (start, length) =>
    range(length)
      .map((k) => `x${(start + k) % n}`)
      .join("*");
  const sums = range(n - 1).map((d) =>
    range(n)
      .map((i) => run(i, d + 1))
      .join(" + "),
  );
  return inVariables(
    range(n).map((i) => `x${i}`),
    [...sums, `${run(0, n)} - 1`],
  );
}

/** noon-n: 10·x_i·Σ x_j² − 11·x_i + 10. @param {number} n */
export function noon(n) {
  const texts = range(n).map((i) => {
    const squares = range(n)
      .filter((j) => j !== i)
      .map((j) => `x${j}^2`);
    return `10*x${i}*(${squares.join(" + ")}) - 11*x${i} + 10`;
  });
  return inVariables(
    range(n).map((i) => `x${i}`),
    texts,
  );
}

/** eco-n. @param {number} n */
export function eco(n) {
  const rows = range(n - 1).map((k) => {
    const products = range(n - 2 - k).map((i) => `x${i}*x${i + k + 1}`);
    return `(${[`x${k}`, ...products].join(" + ")})*x${n - 1} - ${k + 1}`;
  });
  const sum = range(n - 1).map((i) => `x${i}`);
  return inVariables(
    range(n).map((i) => `x${i}`),
    [...rows, `${sum.join(" + ")} + 1`],
  );
}
