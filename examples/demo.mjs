/**
 * The demonstration: the three conjectures of `corner-note/note.md`, tested over S_4 and chosen permutations of
 * S_5 and S_6 in both corner orders.
 */
import { readFileSync } from "node:fs";
import {
  decideGroebner,
  drawTiling,
  matchTilings,
  permutationsOf,
  printMonomial,
  printPermutation,
  printPolynomial,
  readOrder,
  readPermutation,
  readProblem,
  schubertIdeal,
  suggestedTilings,
  unlimited,
} from "../dist/index.js";

/** @import { GroebnerClaim, Permutation, Reading, TilingsClaim, Undecided } from "../dist/index.js" */

const ANTIDIAGONAL = "revlex from nw by rows";
const DIAGONAL = "lex from nw by rows";
const TROUBLE = ["13254", "21543", "31524", "214365", "321654", "241635"];

const started = performance.now();
const cases = [...permutationsOf(4), ...TROUBLE.map((text) => accept(readPermutation(text)))];

print("Working note: two corners of a rank condition   (examples/corner-note/note.md)", "");
print(
  `Cases: all ${cases.length - TROUBLE.length} permutations of S_4, and ${TROUBLE.join(", ")}.`,
  "",
);

const antidiagonal = cases.map((w) => run(w, ANTIDIAGONAL));
const diagonal = cases.map((w) => run(w, DIAGONAL));

print(`Conjecture 1   Fulton generators, ${ANTIDIAGONAL}`);
tell("a Gröbner basis", antidiagonal, (r) => r.groebner.verdict === "holds");
tell("limit = ordinary pipe dreams, each once", antidiagonal, (r) => r.matched && r.largest === 1n);

print("", `Conjecture 2   Fulton generators, ${DIAGONAL}`);
tell("a Gröbner basis", diagonal, (r) => r.groebner.verdict === "holds");
showFailure();

print("", `Conjecture 3   bumpless pipe dreams, ${DIAGONAL}`);
tell("limit = bumpless pipe dreams, with multiplicity", diagonal, (r) => r.matched);
showMultiplicity();

print(
  "",
  "What is proved: each verdict above, exactly over the rationals, for the cases listed; conjecture 2 is false.",
  "What is not: conjectures 1 and 3 for other permutations. Tested cases prove no theorem.",
  "",
  `Done in ${((performance.now() - started) / 1000).toFixed(1)} s. Next: flatlimit match schubert:214365 --order "lex from se by rows"`,
);

/**
 * One permutation in one order: is the Gröbner claim true, does the limit match its tilings?
 * @param {Permutation} w
 * @param {string} phrase
 */
function run(w, phrase) {
  const ideal = schubertIdeal(w);
  const order = accept(readOrder(phrase, ideal.ring));
  const question = { ideal, generators: ideal.generatingSets[0], order };
  const groebner = /** @type {GroebnerClaim} */ (decided(decideGroebner(question, unlimited())));
  const tilingKind = suggestedTilings(order) ?? "ordinary";
  const claim = /** @type {TilingsClaim} */ (
    decided(matchTilings({ ...question, permutation: w, tilingKind }, unlimited()))
  );
  const { matching } = claim;
  const pairs = "pairs" in matching ? matching.pairs : [];
  const largest = pairs.reduce((m, p) => (p.multiplicity > m ? p.multiplicity : m), 0n);
  const matched = "verdict" in matching && matching.verdict === "holds";
  return { w, name: printPermutation(w), groebner, claim, matched, largest };
}

/**
 * @param {string} what
 * @param {ReturnType<typeof run>[]} results
 * @param {(result: ReturnType<typeof run>) => boolean} holds
 */
function tell(what, results, holds) {
  const failing = results.filter((r) => !holds(r)).map((r) => r.name);
  const count = results.length - failing.length;
  const verdict = failing.length === 0 ? "holds in all" : `holds in ${count} of`;
  print(`  ${what}: ${verdict} ${results.length} cases`);
  if (failing.length > 0) print(`  fails for ${failing.join(", ")}`);
}

function showFailure() {
  const problem = accept(
    readProblem(readFileSync(new URL("corner-note/first-failure.yaml", import.meta.url), "utf8")),
  );
  const claim = /** @type {GroebnerClaim} */ (decided(decideGroebner(problem, unlimited())));
  const { witness, ideal, order } = claim;
  if (witness === undefined) throw new Error("expected the counterexample to fail");
  print(
    `  The smallest counterexample is ${ideal.name}: the S-polynomial of generators ${witness.pair.map((k) => k + 1).join(" and ")} leaves`,
    `    ${printPolynomial(witness.remainder, order)},`,
    `  and no leading monomial of a generator divides ${printMonomial(ideal.ring, witness.leadingMonomial)}.`,
  );
}

function showMultiplicity() {
  const above = diagonal.filter((r) => r.largest > 1n);
  const [first] = above;
  if (first === undefined) throw new Error("expected a multiplicity above 1");
  const { matching, tilings, description } = first.claim;
  const double = "pairs" in matching ? matching.pairs.find((p) => p.multiplicity > 1n) : undefined;
  print(
    `  Multiplicities above 1 occur first for ${first.name}: degree ${description.degree}, ${tilings.length} tilings on ` +
      `${"pairs" in matching ? matching.pairs.length : 0} subspaces.`,
    `  The component of multiplicity ${double?.multiplicity} carries these bumpless pipe dreams:`,
  );
  const carried = tilings.filter((_, k) => double?.tilings.includes(k));
  const drawn = carried.map(drawTiling);
  for (let i = 0; i < (drawn[0]?.length ?? 0); i++) {
    print(`      ${drawn.map((rows) => rows[i]).join("      ")}`);
  }
}

/**
 * @template T
 * @param {Reading<T>} reading
 * @returns {T}
 */
function accept(reading) {
  if (!reading.ok) throw new Error(reading.fault.message);
  return reading.value;
}

/**
 * @template {{ kind: string }} T
 * @param {T | Undecided} outcome
 * @returns {T | Undecided}
 */
function decided(outcome) {
  if (outcome.kind === "undecided") throw new Error("expected a decision without limits");
  return outcome;
}

/** @param {string[]} lines */
function print(...lines) {
  for (const line of lines) process.stdout.write(`${line}\n`);
}
