/**
 * Which basis element's leading monomial divides a given monomial? A scan over the leading monomials
 * with their support masks first; most are rejected by one bit operation.
 */
import type { MonomialId, MonomialTable } from "../polynomials/monomial-table.js";

/** The leading monomials that take part in reduction, each with the element it belongs to. */
export class DivisorSearch {
  readonly #table: MonomialTable;
  #leads = new Int32Array(64);
  #masks = new Int32Array(64);
  #elements = new Int32Array(64);
  #count = 0;
  #version = 0;

  /** An empty search over the monomials of a table. */
  constructor(table: MonomialTable) {
    this.#table = table;
  }

  /** How many leading monomials take part. */
  get size(): number {
    return this.#count;
  }

  /** The elements that take part, oldest first. */
  elements(): Int32Array {
    return this.#elements.slice(0, this.#count);
  }

  /** The leading monomials that take part, oldest first; not a copy. */
  leads(): Int32Array {
    return this.#leads.subarray(0, this.#count);
  }

  /** The support masks of the leading monomials; not a copy. */
  masks(): Int32Array {
    return this.#masks.subarray(0, this.#count);
  }

  /** Another number after every change. */
  get version(): number {
    return this.#version;
  }

  /**
   * Adds an element and drops those whose leading monomial the new one divides; does nothing when an
   * element here divides the new leading monomial.
   */
  add(element: number, lead: MonomialId): void {
    if (this.find(lead) !== -1) return;
    this.#version++;
    let kept = 0;
    for (let k = 0; k < this.#count; k++) {
      if (this.#table.divides(lead, this.#leads[k] as MonomialId)) continue;
      this.#leads[kept] = this.#leads[k] as number;
      this.#masks[kept] = this.#masks[k] as number;
      this.#elements[kept] = this.#elements[k] as number;
      kept++;
    }
    if (kept === this.#leads.length) this.#grow();
    this.#leads[kept] = lead;
    this.#masks[kept] = this.#table.mask(lead);
    this.#elements[kept] = element;
    this.#count = kept + 1;
  }

  /** The oldest element whose leading monomial divides the monomial, or −1. */
  find(monomial: MonomialId): number {
    const outside = ~this.#table.mask(monomial);
    const masks = this.#masks;
    for (let k = 0; k < this.#count; k++) {
      if (((masks[k] as number) & outside) !== 0) continue;
      if (this.#table.divides(this.#leads[k] as MonomialId, monomial)) {
        return this.#elements[k] as number;
      }
    }
    return -1;
  }

  #grow(): void {
    const larger = (old: Int32Array<ArrayBuffer>): Int32Array<ArrayBuffer> => {
      const next = new Int32Array(2 * old.length);
      next.set(old);
      return next;
    };
    this.#leads = larger(this.#leads);
    this.#masks = larger(this.#masks);
    this.#elements = larger(this.#elements);
  }
}
