/**
 * From reduced bases modulo several primes to one over the rationals: bases with the same leading
 * monomials are joined coefficient by coefficient, and reconstructed as rationals once the residues
 * determine them. Residues wait until their element is tried, and are then joined all at once: most attempts
 * fail at the element that failed before, so that the others wait on; an element that was lifted before is
 * only compared with the images that came since.
 */
import { type PrimeField, primeField } from "../arithmetic/prime-field.js";
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
    const field = primeField(prime);
    rows.forEach((row, k) => {
      if (this.#primes.length === 0) this.#elements.push(new JoinedElement());
      (this.#elements[k] as JoinedElement).add(field, row);
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
      const row = element.known() ?? element.reconstruct(this.#joiner(element.primesJoined), table);
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

interface Image {
  readonly field: PrimeField;
  readonly row: ModularRow;
}

/** The residues of one element's coefficients. */
class JoinedElement {
  /** All monomials that have occurred, largest first. */
  #monomials = new Int32Array(0);
  /** For each monomial the residue modulo the primes joined so far. */
  #joined: bigint[] = [];
  #primesJoined = 0;
  /** What those primes gave, while the waiting ones agree. */
  #lifted: ExactRow | undefined;
  #waiting: Image[] = [];
  /** How many of the waiting primes have been seen to agree with what is lifted. */
  #agreeing = 0;

  get primesJoined(): number {
    return this.#primesJoined;
  }

  add(field: PrimeField, row: ModularRow): void {
    this.#waiting.push({ field, row });
  }

  /** As lifted before, if it is within the bounds and the primes that came since have the same image. */
  known(): ExactRow | undefined {
    while (this.#lifted !== undefined && this.#agreeing < this.#waiting.length) {
      const { field, row } = this.#waiting[this.#agreeing] as Image;
      if (isImage(field, this.#lifted, row)) this.#agreeing++;
      else this.#lifted = undefined;
    }
    return this.#lifted;
  }

  reconstruct({ join, modulus }: Joiner, table: MonomialTable): ExactRow | undefined {
    this.#join(join, table);
    const lifted = reconstructTogether(this.#joined, modulus);
    if (lifted === undefined) return undefined;
    const kept = lifted.numerators.flatMap((n, k) => (n === 0n ? [] : [k]));
    this.#lifted = coprimeRow(
      Int32Array.from(kept, (k) => this.#monomials[k] as number),
      kept.map((k) => lifted.numerators[k] as bigint),
    );
    this.#agreeing = 0;
    return this.#lifted;
  }

  #join(join: Joiner["join"], table: MonomialTable): void {
    const waiting = this.#waiting;
    if (waiting.length === 0) return;
    this.#makePlaces(table);
    const images = waiting.map(({ row }) => this.#placed(row));
    const residues = new Int32Array(waiting.length);
    this.#joined = Array.from(this.#monomials, (_, place) => {
      for (let k = 0; k < images.length; k++) {
        residues[k] = (images[k] as Int32Array)[place] as number;
      }
      return join(this.#joined[place] ?? 0n, residues);
    });
    this.#primesJoined += waiting.length;
    this.#waiting = [];
  }

  /** Brings in the monomials of the waiting rows; new ones are rare after the first time. */
  #makePlaces(table: MonomialTable): void {
    const old = this.#monomials;
    const residues = new Map(Array.from(old, (id, place) => [id, this.#joined[place] as bigint]));
    for (const { row } of this.#waiting) {
      if (isSameArray(row.monomials, this.#monomials)) continue;
      for (const id of row.monomials) if (!residues.has(id)) residues.set(id, 0n);
      this.#monomials = Int32Array.from(residues.keys()).sort((a, b) =>
        table.compare(b as MonomialId, a as MonomialId),
      );
    }
    this.#joined = Array.from(this.#monomials, (id) => residues.get(id) as bigint);
  }

  /** The residues at the places of their monomials. */
  #placed({ monomials, coefficients }: ModularRow): Int32Array {
    if (isSameArray(monomials, this.#monomials)) return coefficients;
    const placed = new Int32Array(this.#monomials.length);
    let place = 0;
    for (let t = 0; t < monomials.length; t++) {
      while (this.#monomials[place] !== monomials[t]) place++;
      placed[place] = coefficients[t] as number;
    }
    return placed;
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
    exact.every((row, k) => isImage(field, row, modular[k] as ModularRow))
  );
}

function isImage(field: PrimeField, exact: ExactRow, modular: ModularRow): boolean {
  const image = modularRow(field, exact);
  return (
    image !== undefined &&
    isSameArray(image.monomials, modular.monomials) &&
    isSameArray(image.coefficients, modular.coefficients)
  );
}
