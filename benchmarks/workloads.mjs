/** The workloads of the benchmarks: fixed inputs, each returns a checksum that must not change. */
import {
  decideGroebner,
  matchTilings,
  permutationsOf,
  rationalBasis,
  readFamilyIdeal,
  readOrder,
  readPolynomial,
  ringOfVariables,
  schubertIdeal,
  suggestedTilings,
  unlimited,
} from "../dist/index.js";

/** @import { Polynomial, Reading } from "../dist/index.js" */

/**
 * @typedef {object} Workload
 * @property {string} name
 * @property {() => string} run returns the checksum
 */

/**
 * @template T
 * @param {Reading<T>} reading
 * @returns {T}
 */
function accept(reading) {
  if (!reading.ok) throw new Error(reading.fault.message);
  return reading.value;
}

/** @param {number} n @param {string[]} phrases @returns {Workload} */
function symmetricGroup(n, phrases) {
  return {
    name: `S_${n}: verify, limit, components, match in ${phrases.length} orders`,
    run() {
      let degrees = 0n;
      let holds = 0;
      for (const phrase of phrases) {
        for (const w of permutationsOf(n)) {
          const ideal = schubertIdeal(w);
          const order = accept(readOrder(phrase, ideal.ring));
          const question = { ideal, generators: ideal.generatingSets[0], order };
          const groebner = decideGroebner(question, unlimited());
          const tilingKind = suggestedTilings(order) ?? "ordinary";
          const claim = matchTilings({ ...question, permutation: w, tilingKind }, unlimited());
          if (claim.kind === "undecided" || groebner.kind === "undecided")
            throw new Error("undecided");
          degrees += claim.description.degree;
          if (groebner.verdict === "holds") holds++;
        }
      }
      return `degrees ${degrees}, Fulton bases ${holds}`;
    },
  };
}

/** @param {string} name @param {string} order @returns {Workload} */
function familyBasis(name, order) {
  const ideal = accept(readFamilyIdeal(name));
  return basisWorkload(`${name}, ${order}, over Q`, ideal.generatingSets[0].polynomials(), order);
}

/** @param {string} name @param {readonly Polynomial[]} generators @param {string} phrase @returns {Workload} */
function basisWorkload(name, generators, phrase) {
  const [first] = generators;
  if (first === undefined) throw new Error("expected generators");
  const order = accept(readOrder(phrase, first.ring));
  return {
    name,
    run() {
      const basis = rationalBasis(generators, order, unlimited());
      if (basis.kind === "undecided") throw new Error(basis.reason);
      const terms = basis.elements.reduce((sum, g) => sum + g.monomials.length, 0);
      return `${basis.elements.length} elements, ${terms} terms`;
    },
  };
}

/** @param {number} n @returns {Polynomial[]} */
function katsura(n) {
  const texts = [
    `u0 - 1${range(n)
      .map((i) => ` + 2*u${i + 1}`)
      .join("")}`,
  ];
  for (let m = 0; m < n; m++) {
    const quadrics = range(2 * n + 1)
      .map((k) => k - n)
      .filter((i) => Math.abs(m - i) <= n)
      .map((i) => `u${Math.abs(i)}*u${Math.abs(m - i)}`);
    texts.push(`${quadrics.join(" + ")} - u${m}`);
  }
  return inVariables(
    range(n + 1).map((i) => `u${i}`),
    texts,
  );
}

/** @param {number} n @returns {Polynomial[]} */
function cyclic(n) {
  const texts = range(n - 1).map((d) =>
    range(n)
      .map((i) =>
        range(d + 1)
          .map((k) => `x${(i + k) % n}`)
          .join("*"),
      )
      .join(" + "),
  );
  return inVariables(
    range(n).map((i) => `x${i}`),
    [
      ...texts,
      `${range(n)
        .map((i) => `x${i}`)
        .join("*")} - 1`,
    ],
  );
}

/** @param {string[]} names @param {string[]} texts */
function inVariables(names, texts) {
  const ring = ringOfVariables(names);
  return texts.map((text) => accept(readPolynomial(text, ring)));
}

/** @param {number} n */
function range(n) {
  return Array.from({ length: n }, (_, i) => i);
}

const ORDERS = ["revlex from nw by rows", "lex from nw by rows"];

/** @type {Workload[]} */
export const workloads = [
  symmetricGroup(4, ORDERS),
  symmetricGroup(5, ORDERS),
  symmetricGroup(6, ORDERS),
  basisWorkload("katsura-6 over Q", katsura(6), "graded revlex"),
  basisWorkload("katsura-7 over Q", katsura(7), "graded revlex"),
  basisWorkload("cyclic-5 over Q", cyclic(5), "graded revlex"),
  basisWorkload("cyclic-6 over Q", cyclic(6), "graded revlex"),
  familyBasis("determinantal:4,5,2", "lex from nw by rows"),
  familyBasis("determinantal:5,6,2", "lex from nw by rows"),
  familyBasis("schubert:21543", "lex from nw by rows"),
];
