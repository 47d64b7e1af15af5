/**
 * From reduced bases modulo several primes to one over the rationals: bases with the same leading
 * monomials are joined coefficient by coefficient, and reconstructed as rationals once the residues
 * determine them. Residues wait until a lift is tried, and then an element is joined with all its waiting
 * primes at once: most attempts fail at the element that failed before, so that the others wait on.
 */
import type { PrimeField } from "../arithmetic/prime-field.js";
import { manyRemaindersJoiner, reconstructTogether } from "../arithmetic/reconstruction.js";
import type { Budget } from "../outcomes/budget.js";
import type { MonomialId, MonomialTable } from "../polynomials/monomial-table.js";
import { coprimeRow, type ExactRow, type ModularRow, modularRow } from "./rows.js";

/** Reduced bases modulo primes that share their leading monomials, joined into one modulo the product. */
export class JoinedBases {
  #primes: number[] = [];
  #elements: JoinedElement[] = [];
  #hardest = 0;
  /** How residues that wait are joined, by the number of primes joined before. */
  readonly #joiners = new Map<number, Joiner>();

  /** The primes joined so far. */
  get primes(): readonly number[] {
    return this.#primes;
  }

  /** Joins the reduced basis modulo one more prime. */
  add(prime: number, rows: readonly ModularRow[]): void {
    rows.forEach((row, k) => {
      if (this.#primes.length === 0) this.#elements.push(new JoinedElement());
      (this.#elements[k] as JoinedElement).add(row);
    });
    this.#primes = [...this.#primes, prime];
    this.#joiners.clear();
  }

  /**
   * The basis over the rationals that the residues determine, or undefined if they do not suffice. The element
   * that failed last time goes first, so that most failures cost one coefficient. @throws LimitReached
   */
  reconstruct(table: MonomialTable, budget: Budget): ExactRow[] | undefined {
    const rows: ExactRow[] = [];
    const others = Array.from(this.#elements.keys()).filter((k) => k !== this.#hardest);
    for (const k of this.#elements.length === 0 ? [] : [this.#hardest, ...others]) {
      budget.spend(
        () => `lifting ${this.#elements.length} elements from ${this.#primes.length} primes`,
      );
      const element = this.#elements[k] as JoinedElement;
      const row = element.reconstruct(this.#joiner(element.primesJoined), table);
      if (row === undefined) {
        this.#hardest = k;
        return undefined;
      }
      rows[k] = row;
    }
    return rows;
  }

  #joiner(primesJoined: number): Joiner {
    const known = this.#joiners.get(primesJoined);
    if (known !== undefined) return known;
    const product = (m: bigint, p: number): bigint => m * BigInt(p);
    const before = this.#primes.slice(0, primesJoined).reduce(product, 1n);
    const waiting = this.#primes.slice(primesJoined);
    const joiner = {
      join: manyRemaindersJoiner(before, waiting),
      modulus: waiting.reduce(product, before),
    };
    this.#joiners.set(primesJoined, joiner);
    return joiner;
  }
}

interface Joiner {
  readonly join: (known: bigint, residues: ArrayLike<number>) => bigint;
  /** The product of all primes. */
  readonly modulus: bigint;
}

/** The residues of one element's coefficients. */
class JoinedElement {
  /** All monomials that have occurred, in no particular order. */
  #monomials = new Int32Array(0);
  /** For each monomial the residue modulo the primes joined so far. */
  #joined: bigint[] = [];
  #primesJoined = 0;
  /** For each further prime the residues, one a monomial; missing ones at the end are 0. */
  #waiting: Int32Array[] = [];

  get primesJoined(): number {
    return this.#primesJoined;
  }

  add({ monomials, coefficients }: ModularRow): void {
    this.#waiting.push(
      isSameArray(monomials, this.#monomials)
        ? coefficients
        : this.#aligned(monomials, coefficients),
    );
  }

  /** The residues at the places of the monomials known so far; new ones get places at the end. */
  #aligned(monomials: Int32Array, coefficients: Int32Array): Int32Array {
    const places = new Map(Array.from(this.#monomials, (id, place) => [id, place]));
    for (const id of monomials) if (!places.has(id)) places.set(id, places.size);
    if (places.size > this.#monomials.length) this.#monomials = Int32Array.from(places.keys());
    const aligned = new Int32Array(places.size);
    monomials.forEach((id, t) => {
      aligned[places.get(id) as number] = coefficients[t] as number;
    });
    return aligned;
  }

  reconstruct({ join, modulus }: Joiner, table: MonomialTable): ExactRow | undefined {
    this.#join(join);
    const joined = this.#joined;
    const order = Array.from(this.#monomials.keys()).sort((a, b) =>
      table.compare(this.#monomials[b] as MonomialId, this.#monomials[a] as MonomialId),
    );
    const values = order.map((place) => joined[place] as bigint);
    const lifted = reconstructTogether(values, modulus);
    if (lifted === undefined) return undefined;
    const kept = lifted.numerators.flatMap((n, k) => (n === 0n ? [] : [k]));
    return coprimeRow(
      Int32Array.from(kept, (k) => this.#monomials[order[k] as number] as number),
      kept.map((k) => lifted.numerators[k] as bigint),
    );
  }

  #join(join: Joiner["join"]): void {
    const waiting = this.#waiting;
    if (waiting.length === 0) return;
    const residues = new Int32Array(waiting.length);
    this.#joined = Array.from(this.#monomials, (_, place) => {
      for (let k = 0; k < waiting.length; k++) residues[k] = (waiting[k] as Int32Array)[place] ?? 0;
      return join(this.#joined[place] ?? 0n, residues);
    });
    this.#primesJoined += waiting.length;
    this.#waiting = [];
  }
}

function isSameArray(a: Int32Array, b: Int32Array): boolean {
  if (a.length !== b.length) return false;
  for (let k = 0; k < a.length; k++) if (a[k] !== b[k]) return false;
  return true;
}

/** Are the modular rows the images of the exact ones? */
export function areImages(
  field: PrimeField,
  exact: readonly ExactRow[],
  modular: readonly ModularRow[],
): boolean {
  return (
    exact.length === modular.length &&
    exact.every((row, k) => {
      const image = modularRow(field, row);
      const other = modular[k] as ModularRow;
      return (
        image !== undefined &&
        isSameArray(image.monomials, other.monomials) &&
        isSameArray(image.coefficients, other.coefficients)
      );
    })
  );
}
