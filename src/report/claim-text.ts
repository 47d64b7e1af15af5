/** Results as text for a terminal: what was asked, the answer, how it is known, then the table. */

import type { GroebnerClaim } from "../claims/groebner-claim.js";
import type { LimitDescription } from "../claims/limit-description.js";
import type { TilingsClaim } from "../claims/tilings-claim.js";
import { isList } from "../outcomes/budget.js";
import type { Polynomial } from "../polynomials/polynomial.js";
import { printMonomial, printPolynomial } from "../polynomials/printing.js";
import type { TermOrder } from "../polynomials/term-order.js";
import { subspaceGrid } from "./subspace-grid.js";
import { textTable } from "./text-table.js";

/** Longer polynomials are cut off in text; `--json` has them whole. */
const LONGEST_POLYNOMIAL = 300;

/** The result of `verify`. */
export function groebnerText(claim: GroebnerClaim, seconds: number): string[] {
  const { ideal, generators, order, witness, basis } = claim;
  const lines = [
    `${ideal.name}, ${counted(claim.polynomials.length, "generator")} (${generators.kind}), ${order.phrase}`,
    claim.verdict === "holds"
      ? "holds: the generators are a Gröbner basis"
      : "fails: the generators are no Gröbner basis",
  ];
  if (witness !== undefined) {
    const [i, j] = witness.pair.map((k) => k + 1);
    lines.push(
      `  the S-polynomial of generators ${i} and ${j} leaves a remainder:`,
      ...witness.pair.map((k) => {
        const f = claim.polynomials[k];
        return `    ${String(k + 1).padStart(4)}  ${f === undefined ? "" : shortened(f, order)}`;
      }),
      `    rest  ${shortened(witness.remainder, order)}`,
      `  no leading monomial of a generator divides ${printMonomial(ideal.ring, witness.leadingMonomial)}`,
    );
  }
  if (basis !== undefined) {
    lines.push(
      `reduced basis: ${counted(basis.size, "element")}, degrees up to ${basis.maxDegree}`,
    );
  }
  lines.push(evidence(`${counted(claim.pairsReduced, "S-pair")} reduced exactly`, seconds));
  return lines;
}

/** The result of `limit`. */
export function limitText(description: LimitDescription, seconds: number): string[] {
  return [
    ...limitHead(description),
    ...componentTable(description),
    ...limitFoot(description, seconds),
  ];
}

/** The result of `match`. */
export function tilingsClaimText(claim: TilingsClaim, seconds: number): string[] {
  const { description, matching, tilings, tilingKind } = claim;
  const all = counted(tilings.length, `${tilingKind} pipe dream`);
  if (!("verdict" in matching)) {
    return [
      ...limitHead(description),
      `undecided: ${matching.reason}`,
      ...limitFoot(description, seconds),
    ];
  }
  const { pairs, unmatchedComponents, unmatchedTilings, verdict } = matching;
  const numbers = new Map(
    pairs.map((pair) => [pair.component, pair.tilings.map((k) => k + 1).join(", ")]),
  );
  const remarks = new Map(
    pairs
      .filter((pair) => pair.multiplicity !== pair.expected)
      .map((pair) => [pair.component, `expected multiplicity ${pair.expected}`]),
  );
  for (const k of unmatchedComponents) remarks.set(k, "no tiling");
  const lines = [
    ...limitHead(description),
    ...componentTable(description, numbers, remarks),
    verdict === "holds"
      ? `holds: the components are the ${all}, with their multiplicities`
      : `fails: ${all}, ${counted(unmatchedComponents.length, "component")} without a tiling, ` +
        `${counted(unmatchedTilings.length, "tiling")} without a component`,
  ];
  for (const k of unmatchedTilings) {
    lines.push(
      `  tiling ${k + 1} has no component:`,
      ...(tilings[k]?.rows ?? []).map((row) => `    ${row}`),
    );
  }
  return [...lines, ...limitFoot(description, seconds)];
}

function limitHead(description: LimitDescription): string[] {
  const { ideal, order, limit, squarefree, codimension, degree } = description;
  const kind = limit.monomial ? (squarefree ? "squarefree monomial" : "monomial") : "not monomial";
  const place = Number.isFinite(codimension)
    ? `codimension ${codimension}, degree ${degree}`
    : "the unit ideal";
  return [
    `${ideal.name}, ${order.phrase}`,
    `limit: ${counted(limit.generators.length, "generator")}, ${kind}, ${place}`,
  ];
}

function componentTable(
  description: LimitDescription,
  tilings?: ReadonlyMap<number, string>,
  remarks?: ReadonlyMap<number, string>,
): string[] {
  const { components, ideal } = description;
  if (!isList(components)) return [`components undecided: ${components.reason}`];
  const columns = [
    { heading: "no.", right: true },
    { heading: "vanishing" },
    { heading: "codim", right: true },
    { heading: "mult", right: true },
    { heading: tilings === undefined ? "" : "tilings" },
  ];
  const rows = components.map((c, k) => [
    String(k + 1),
    subspaceGrid(ideal.ring, c.prime),
    String(c.codimension),
    c.multiplicity === null ? "–" : String(c.multiplicity),
    [c.embedded ? "embedded" : "", tilings?.get(k) ?? "", remarks?.get(k) ?? ""]
      .filter((t) => t !== "")
      .join("  "),
  ]);
  return textTable(columns, rows);
}

function limitFoot(description: LimitDescription, seconds: number): string[] {
  const { limit, unmixed } = description;
  const mixed =
    unmixed === null ? [] : [unmixed ? "no embedded components" : "there are embedded components"];
  const { rows, primes } = limit.basis;
  const how =
    primes.length > 0
      ? "S-pairs reduced exactly"
      : "exact, complete by the Hilbert function of a proved basis";
  const basis = `reduced basis of ${counted(rows.length, "element")}, ${how}`;
  return [...mixed, evidence(basis, seconds)];
}

function evidence(how: string, seconds: number): string {
  return `proved over the rationals: ${how} (${seconds.toFixed(2)} s)`;
}

function shortened(f: Polynomial, order: TermOrder): string {
  const text = printPolynomial(f, order);
  if (text.length <= LONGEST_POLYNOMIAL) return text;
  return `${text.slice(0, LONGEST_POLYNOMIAL)} … (${f.monomials.length} terms)`;
}

function counted(count: number, noun: string): string {
  return `${count} ${noun}${count === 1 ? "" : "s"}`;
}
