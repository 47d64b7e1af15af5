/**
 * Critical pairs of a growing basis, kept small by the criteria of Gebauer and Möller (*On an
 * installation of Buchberger's algorithm*, J. Symb. Comp. 6, 1988; the update as in Becker,
 * Weispfenning, *Gröbner Bases*, section 5.5). The least common multiples of a new element with the
 * old ones live in scratch space; only those of surviving pairs enter the table.
 */
import { dividesExponents, type Exponents, lcmExponents } from "../polynomials/exponents.js";
import type { MonomialId, MonomialTable } from "../polynomials/monomial-table.js";

/** A critical pair of elements i < j, the least common multiple of their leading monomials, its sugar. */
export interface CriticalPair {
  readonly first: number;
  readonly second: number;
  readonly lcm: MonomialId;
  /** The degree the S-polynomial would have after homogenisation; the degree for homogeneous input. */
  readonly sugar: number;
}

interface Lead {
  readonly element: number;
  readonly exponents: Exponents;
  readonly degree: number;
  readonly mask: number;
  /** The sugar of the element minus the degree of its leading monomial. */
  readonly excess: number;
}

interface Candidate {
  readonly partner: Lead;
  readonly lcm: Exponents;
  readonly mask: number;
  readonly degree: number;
  readonly coprime: boolean;
}

/** The pairs still to be treated. */
export class CriticalPairs {
  readonly #table: MonomialTable;
  readonly #exponentsOf = new Map<number, Exponents>();
  /** The leading monomials that new pairs are made with: none divides another. */
  #leads: Lead[] = [];
  #pending: CriticalPair[] = [];

  /** No pairs yet, over the monomials of a table. */
  constructor(table: MonomialTable) {
    this.#table = table;
  }

  /** How many pairs are waiting. */
  get size(): number {
    return this.#pending.length;
  }

  /** The smallest sugar among the waiting pairs, or infinity. */
  get nextSugar(): number {
    return this.#pending.reduce((least, pair) => Math.min(least, pair.sugar), Infinity);
  }

  /** Takes out all pairs of the given sugar, those with the smallest lcm first. */
  take(sugar: number): CriticalPair[] {
    const taken = this.#pending.filter((pair) => pair.sugar === sugar);
    this.#pending = this.#pending.filter((pair) => pair.sugar !== sugar);
    return taken.sort(
      (a, b) => this.#table.compare(a.lcm, b.lcm) || a.second - b.second || a.first - b.first,
    );
  }

  /** Brings in a new element by its leading monomial: makes its pairs and drops those not needed. */
  add(element: number, lead: MonomialId, sugar: number): void {
    const table = this.#table;
    const degree = table.degree(lead);
    const added: Lead = {
      element,
      exponents: table.exponents(lead),
      degree,
      mask: table.mask(lead),
      excess: sugar - degree,
    };
    this.#exponentsOf.set(element, added.exponents);
    this.#dropByChain(lead, added);
    for (const { partner, lcm, degree: lcmDegree } of survivors(added, this.#leads)) {
      this.#pending.push({
        first: partner.element,
        second: element,
        lcm: table.intern(lcm),
        sugar: lcmDegree + Math.max(partner.excess, added.excess),
      });
    }
    this.#leads = this.#leads.filter(
      (old) => (added.mask & ~old.mask) !== 0 || !dividesExponents(added.exponents, old.exponents),
    );
    this.#leads.push(added);
  }

  /* Old pairs (i,j) whose lcm the new lead divides, and both lcms with it are other monomials. */
  #dropByChain(lead: MonomialId, added: Lead): void {
    const table = this.#table;
    this.#pending = this.#pending.filter((pair) => {
      if (!table.divides(lead, pair.lcm)) return true;
      const lcm = table.exponents(pair.lcm);
      return this.#reaches(pair.first, added, lcm) || this.#reaches(pair.second, added, lcm);
    });
  }

  #reaches(element: number, added: Lead, lcm: Exponents): boolean {
    const lead = this.#exponentsOf.get(element) as Exponents;
    return lcm.every((e, v) => e === Math.max(lead[v] as number, added.exponents[v] as number));
  }
}

/** The pairs of the new element that neither another new pair nor the product criterion makes superfluous. */
function survivors(added: Lead, leads: readonly Lead[]): Candidate[] {
  const candidates = leads.map((partner) => candidate(added, partner));
  candidates.sort((a, b) => a.degree - b.degree || Number(b.coprime) - Number(a.coprime));
  const kept: Candidate[] = [];
  for (const c of candidates) {
    // A coprime pair is kept for now: it stands for all pairs whose lcm its own lcm divides.
    const implied = kept.some(
      (k) => (k.mask & ~c.mask) === 0 && k.degree <= c.degree && dividesExponents(k.lcm, c.lcm),
    );
    if (!implied) kept.push(c);
  }
  return kept.filter((c) => !c.coprime);
}

function candidate(added: Lead, partner: Lead): Candidate {
  const lcm = lcmExponents(added.exponents, partner.exponents);
  let degree = 0;
  for (let v = 0; v < lcm.length; v++) degree += lcm[v] as number;
  return {
    partner,
    lcm,
    mask: added.mask | partner.mask,
    degree,
    coprime: degree === added.degree + partner.degree,
  };
}
