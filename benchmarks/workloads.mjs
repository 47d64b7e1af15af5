/** The workloads of the benchmarks: fixed inputs, each returns a checksum that must not change. */
import {
  decideGroebner,
  describeLimit,
  matchTilings,
  modularBasis,
  permutationsOf,
  rationalBasis,
  readFamilyIdeal,
  readOrder,
  schubertIdeal,
  suggestedTilings,
  unlimited,
} from "../dist/index.js";
import { accept } from "./accept.mjs";
import { cyclic, eco, katsura, noon } from "./systems.mjs";

/** @import { Permutation, Polynomial } from "../dist/index.js" */

/**
 * @typedef {object} Workload
 * @property {string} name
 * @property {() => string} run returns the checksum
 * @property {boolean} [long] minutes, only run with `--long`
 */

const CORNERS = ["revlex from nw by rows", "lex from nw by rows"];
/** A prime of 31 bits. */
const PRIME = 2_147_483_647;

/** @param {number} n @param {boolean} [long] @returns {Workload} */
function everything(n, long = false) {
  return {
    name: `S_${n}: verify, limit, components, match in both corner orders`,
    long,
    run() {
      let degrees = 0n;
      let holds = 0;
      for (const w of permutationsOf(n)) {
        const ideal = schubertIdeal(w);
        for (const phrase of CORNERS) {
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

/** @param {number} n @param {boolean} [long] @returns {Workload} */
function verifyDiagonal(n, long = false) {
  return {
    name: `S_${n}: verify CDG in lex from nw by rows`,
    long,
    run() {
      let fails = 0;
      for (const w of permutationsOf(n)) {
        const claim = decideGroebner(diagonalQuestion(w), unlimited());
        if (claim.kind === "undecided") throw new Error(claim.reason);
        if (claim.verdict === "fails") fails++;
      }
      return `${fails} fail`;
    },
  };
}

/** @param {number} n @param {boolean} [long] @returns {Workload} */
function limitDiagonal(n, long = false) {
  return {
    name: `S_${n}: limit in lex from nw by rows`,
    long,
    run() {
      let degrees = 0n;
      for (const w of permutationsOf(n)) {
        const description = describeLimit(diagonalQuestion(w), unlimited());
        if (description.kind === "undecided") throw new Error(description.reason);
        degrees += description.degree;
      }
      return `degrees ${degrees}`;
    },
  };
}

/** @param {Permutation} w */
function diagonalQuestion(w) {
  const ideal = schubertIdeal(w);
  const generators = ideal.generatingSets.find(({ kind }) => kind === "cdg");
  if (generators === undefined) throw new Error("no CDG generators");
  return { ideal, generators, order: accept(readOrder("lex from nw by rows", ideal.ring)) };
}

/** @param {string} name @param {string} phrase @returns {Workload} */
function familyLimit(name, phrase) {
  return {
    name: `${name}: limit in ${phrase}`,
    run() {
      const ideal = accept(readFamilyIdeal(name));
      const order = accept(readOrder(phrase, ideal.ring));
      const [generators] = ideal.generatingSets;
      const description = describeLimit({ ideal, generators, order }, unlimited());
      if (description.kind === "undecided") throw new Error(description.reason);
      return `${description.limit.basis.rows.length} elements, degree ${description.degree}`;
    },
  };
}

/** @param {string} name @param {string} phrase @returns {Workload} */
function familyModulo(name, phrase) {
  const ideal = accept(readFamilyIdeal(name));
  return modulo(name, () => ideal.generatingSets[0].polynomials(), phrase);
}

/** @param {string} name @param {() => readonly Polynomial[]} make @param {string} [phrase] @returns {Workload} */
function modulo(name, make, phrase = "graded revlex") {
  return {
    name: `${name} modulo a 31-bit prime`,
    run() {
      const generators = make();
      const basis = modularBasis(generators, orderOf(generators, phrase), PRIME, unlimited());
      if (basis.kind === "undecided") throw new Error(basis.reason);
      return sizes(basis.elements);
    },
  };
}

/** @param {string} name @param {() => readonly Polynomial[]} make @param {boolean} [long] @returns {Workload} */
function rational(name, make, long = false) {
  return {
    name: `${name} over Q, proved`,
    long,
    run() {
      const generators = make();
      const order = orderOf(generators, "graded revlex");
      const basis = rationalBasis(generators, order, unlimited());
      if (basis.kind === "undecided") throw new Error(basis.reason);
      return sizes(basis.elements);
    },
  };
}

/** @param {readonly Polynomial[]} generators @param {string} phrase */
function orderOf(generators, phrase) {
  const [first] = generators;
  if (first === undefined) throw new Error("expected generators");
  return accept(readOrder(phrase, first.ring));
}

/** @param {readonly Polynomial[]} elements */
function sizes(elements) {
  const terms = elements.reduce((sum, g) => sum + g.monomials.length, 0);
  return `${elements.length} elements, ${terms} terms`;
}

/** @type {Workload[]} */
export const workloads = [
  everything(5),
  everything(6),
  everything(7, true),
  verifyDiagonal(6),
  verifyDiagonal(7),
  verifyDiagonal(8, true),
  limitDiagonal(6),
  limitDiagonal(7, true),
  familyLimit("schubert:2143765", "lex from nw by rows"),
  modulo("katsura-7", () => katsura(7)),
  modulo("katsura-8", () => katsura(8)),
  modulo("katsura-9", () => katsura(9)),
  modulo("katsura-10", () => katsura(10)),
  modulo("cyclic-6", () => cyclic(6)),
  modulo("cyclic-7", () => cyclic(7)),
  modulo("noon-4", () => noon(4)),
  modulo("noon-5", () => noon(5)),
  modulo("eco-8", () => eco(8)),
  rational("katsura-7", () => katsura(7)),
  rational("katsura-8", () => katsura(8)),
  rational("katsura-9", () => katsura(9), true),
  rational("cyclic-6", () => cyclic(6)),
  rational("cyclic-7", () => cyclic(7), true),
  rational("noon-4", () => noon(4)),
  rational("noon-5", () => noon(5)),
  rational("eco-8", () => eco(8)),
  familyModulo("determinantal:5,6,2", "lex from nw by rows"),
  familyModulo("determinantal:6,6,2", "lex from nw by rows"),
  familyModulo("determinantal:6,6,3", "lex from nw by rows"),
];
