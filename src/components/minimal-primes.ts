/**
 * Minimal primes of a monomial ideal: the minimal transversals of the hypergraph of supports. Depth-first
 * search that grows a transversal edge by edge and keeps, for each of its vertices, a count of the edges
 * that only this vertex meets; a vertex without such an edge ends the branch, so nothing that is not
 * minimal is ever produced and nothing produced is stored.
 * @source Murakami, Uno, *Efficient algorithms for dualizing large-scale hypergraphs*, Discrete Appl. Math.
 * 170 (2014), algorithm MMCS.
 */
import type { Budget } from "../outcomes/budget.js";
import type { MonomialIdeal } from "../polynomials/monomial-ideal.js";
import type { VariableIndex } from "../polynomials/polynomial-ring.js";

/** The variables that generate a monomial prime, ascending. */
export type MonomialPrime = readonly VariableIndex[];

/**
 * The minimal primes, each once, in the order of the search. The zero ideal has the empty prime, the unit
 * ideal none. @throws LimitReached
 */
export function minimalPrimes(ideal: MonomialIdeal, budget: Budget): MonomialPrime[] {
  const edges = ideal.generators.map((g) =>
    Array.from(g.keys()).filter((v) => (g[v] as number) > 0),
  );
  if (edges.some((edge) => edge.length === 0)) return [];
  return new TransversalSearch(ideal.variableCount, edges, budget).all();
}

class TransversalSearch {
  readonly #edges: readonly (readonly number[])[];
  readonly #edgesAt: readonly (readonly number[])[];
  readonly #budget: Budget;
  /** For each edge how many chosen vertices meet it, and the sum of these: the vertex itself if there is one. */
  readonly #hits: Int32Array;
  readonly #hitSum: Int32Array;
  /** For each chosen vertex the number of edges that only it meets. */
  readonly #critical: Int32Array;
  readonly #candidate: Uint8Array;
  readonly #chosen: number[] = [];
  readonly #found: MonomialPrime[] = [];

  constructor(vertices: number, edges: readonly (readonly number[])[], budget: Budget) {
    this.#edges = edges;
    const at: number[][] = Array.from({ length: vertices }, () => []);
    edges.forEach((edge, e) => {
      for (const v of edge) (at[v] as number[]).push(e);
    });
    this.#edgesAt = at;
    this.#budget = budget;
    this.#hits = new Int32Array(edges.length);
    this.#hitSum = new Int32Array(edges.length);
    this.#critical = new Int32Array(vertices);
    this.#candidate = new Uint8Array(vertices).fill(1);
  }

  all(): MonomialPrime[] {
    this.#extend();
    return this.#found;
  }

  #extend(): void {
    this.#budget.spend(() => `minimal primes, ${this.#found.length} so far`);
    const edge = this.#tightestOpenEdge();
    if (edge === undefined) {
      this.#found.push([...this.#chosen].sort((a, b) => a - b) as VariableIndex[]);
      return;
    }
    const branches = edge.filter((v) => this.#candidate[v] === 1);
    for (const v of branches) this.#candidate[v] = 0;
    for (const v of branches) {
      this.#choose(v);
      if (this.#chosen.every((c) => (this.#critical[c] as number) > 0)) this.#extend();
      this.#release(v);
      this.#candidate[v] = 1;
    }
  }

  /** The edge not met yet with the fewest candidates. */
  #tightestOpenEdge(): readonly number[] | undefined {
    let tightest: readonly number[] | undefined;
    let least = Infinity;
    for (let e = 0; e < this.#edges.length; e++) {
      if (this.#hits[e] !== 0) continue;
      const edge = this.#edges[e] as readonly number[];
      let open = 0;
      for (const v of edge) open += this.#candidate[v] as number;
      if (open < least) [tightest, least] = [edge, open];
    }
    return tightest;
  }

  #choose(v: number): void {
    const { critical, hits, hitSum } = this.#counters();
    for (const e of this.#edgesAt[v] as readonly number[]) {
      const before = hits[e] as number;
      if (before === 0) critical[v] = (critical[v] as number) + 1;
      else if (before === 1) {
        const owner = hitSum[e] as number;
        critical[owner] = (critical[owner] as number) - 1;
      }
      hits[e] = before + 1;
      hitSum[e] = (hitSum[e] as number) + v;
    }
    this.#chosen.push(v);
  }

  #release(v: number): void {
    const { critical, hits, hitSum } = this.#counters();
    this.#chosen.pop();
    for (const e of this.#edgesAt[v] as readonly number[]) {
      hits[e] = (hits[e] as number) - 1;
      hitSum[e] = (hitSum[e] as number) - v;
      const after = hits[e] as number;
      if (after === 1) {
        const owner = hitSum[e] as number;
        critical[owner] = (critical[owner] as number) + 1;
      }
    }
    critical[v] = 0;
  }

  #counters(): { critical: Int32Array; hits: Int32Array; hitSum: Int32Array } {
    return { critical: this.#critical, hits: this.#hits, hitSum: this.#hitSum };
  }
}
