/**
 * From reduced bases modulo several primes to one over the rationals: bases with the same leading
 * monomials are joined coefficient by coefficient, and reconstructed as rationals once the residues
 * determine them.
 */
import type { PrimeField } from "../arithmetic/prime-field.js";
import { reconstructTogether, remainderJoiner } from "../arithmetic/reconstruction.js";
import type { Budget } from "../outcomes/budget.js";
import type { MonomialId, MonomialTable } from "../polynomials/monomial-table.js";
import { coprimeRow, type ExactRow, type ModularRow, modularRow } from "./rows.js";

/** Reduced bases modulo primes that share their leading monomials, joined into one modulo the product. */
export class JoinedBases {
  #primes: number[] = [];
  #modulus = 1n;
  /** For each element the residues of its coefficients by monomial. */
  #residues: Map<number, bigint>[] = [];
  #hardest = 0;

  /** The primes joined so far. */
  get primes(): readonly number[] {
    return this.#primes;
  }

  /** Joins the reduced basis modulo one more prime. */
  add(prime: number, rows: readonly ModularRow[]): void {
    if (this.#primes.length === 0) this.#residues = rows.map(() => new Map());
    const join = remainderJoiner(this.#modulus, prime);
    rows.forEach((row, k) => {
      const residues = this.#residues[k] as Map<number, bigint>;
      const image = new Map(
        Array.from(row.monomials, (id, t) => [id, row.coefficients[t] as number]),
      );
      for (const [id, value] of residues) {
        if (!image.has(id)) residues.set(id, join(value, 0));
      }
      for (const [id, value] of image) residues.set(id, join(residues.get(id) ?? 0n, value));
    });
    this.#primes = [...this.#primes, prime];
    this.#modulus *= BigInt(prime);
  }

  /**
   * The basis over the rationals that the residues determine, or undefined if they do not suffice. The element
   * that failed last time goes first, so that most failures cost one coefficient. @throws LimitReached
   */
  reconstruct(table: MonomialTable, budget: Budget): ExactRow[] | undefined {
    const rows: ExactRow[] = [];
    const others = Array.from(this.#residues.keys()).filter((k) => k !== this.#hardest);
    for (const k of this.#residues.length === 0 ? [] : [this.#hardest, ...others]) {
      budget.spend(
        () => `lifting ${this.#residues.length} elements from ${this.#primes.length} primes`,
      );
      const row = this.#reconstructElement(k, table);
      if (row === undefined) {
        this.#hardest = k;
        return undefined;
      }
      rows[k] = row;
    }
    return rows;
  }

  #reconstructElement(element: number, table: MonomialTable): ExactRow | undefined {
    const residues = this.#residues[element] as Map<number, bigint>;
    const monomials = Int32Array.from(residues.keys()).sort((a, b) =>
      table.compare(b as MonomialId, a as MonomialId),
    );
    const values = Array.from(monomials, (id) => residues.get(id) as bigint);
    const lifted = reconstructTogether(values, this.#modulus);
    if (lifted === undefined) return undefined;
    const kept = lifted.numerators.flatMap((n, k) => (n === 0n ? [] : [k]));
    return coprimeRow(
      Int32Array.from(kept, (k) => monomials[k] as number),
      kept.map((k) => lifted.numerators[k] as bigint),
    );
  }
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
        image.monomials.length === other.monomials.length &&
        image.monomials.every((id, t) => id === other.monomials[t]) &&
        image.coefficients.every((c, t) => c === other.coefficients[t])
      );
    })
  );
}
