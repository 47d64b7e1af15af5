/**
 * The monomial table of one computation: each monomial is stored once, in one arena of 16-bit
 * exponents, and named by a small integer. Look-up is open addressing with an additive hash, so that
 * the hash of a product is a sum and a product is found without being written first; a 32-bit mask
 * of the support rejects most divisibility tests. Rejected: packed or BigInt keys in a `Map` (slower
 * by an order of magnitude, and limited to 2²⁴ entries).
 */
import { ExponentOverflow, type Exponents, MAX_EXPONENT } from "./exponents.js";
import { type CompareInArena, compileComparison, type TermOrder } from "./term-order.js";

declare const monomialIdBrand: unique symbol;
/** The name of a monomial in its table. */
export type MonomialId = number & { readonly [monomialIdBrand]: true };

const INITIAL_CAPACITY = 1024;

/** A growing set of monomials, compared by one term order. */
export class MonomialTable {
  readonly order: TermOrder;
  readonly variableCount: number;
  /** The monomial 1. */
  readonly one: MonomialId;
  #size = 0;
  #exponents: Uint16Array;
  #degrees: Int32Array;
  #hashes: Int32Array;
  #masks: Int32Array;
  #slots: Int32Array;
  readonly #hashWeights: Int32Array;
  readonly #scratch: Uint16Array;
  readonly #compareInArena: CompareInArena;

  /** An empty table (but for the monomial 1) for the ring of the order. */
  constructor(order: TermOrder) {
    this.order = order;
    this.variableCount = order.ring.variables.length;
    this.#exponents = new Uint16Array(INITIAL_CAPACITY * this.variableCount);
    this.#degrees = new Int32Array(INITIAL_CAPACITY);
    this.#hashes = new Int32Array(INITIAL_CAPACITY);
    this.#masks = new Int32Array(INITIAL_CAPACITY);
    this.#slots = new Int32Array(2 * INITIAL_CAPACITY).fill(-1);
    this.#hashWeights = hashWeights(this.variableCount);
    this.#scratch = new Uint16Array(this.variableCount);
    this.#compareInArena = compileComparison(order);
    this.one = this.#internScratch();
  }

  /** How many monomials the table holds; their ids are 0 … size−1. */
  get size(): number {
    return this.#size;
  }

  /** Bytes held by the table's arrays. */
  get bytes(): number {
    return (
      this.#exponents.byteLength +
      this.#degrees.byteLength +
      this.#hashes.byteLength +
      this.#masks.byteLength +
      this.#slots.byteLength
    );
  }

  /** The id of a monomial given by its exponents. */
  intern(exponents: Exponents): MonomialId {
    this.#scratch.set(exponents);
    return this.#internScratch();
  }

  /** The exponents of a monomial, as a copy. */
  exponents(id: MonomialId): Exponents {
    const start = id * this.variableCount;
    return this.#exponents.slice(start, start + this.variableCount);
  }

  /** The exponents of the monomials from id `first` up to (without) `end`, one after the other; not a copy. */
  exponentsBetween(first: number, end: number): Uint16Array {
    return this.#exponents.subarray(first * this.variableCount, end * this.variableCount);
  }

  /** The weights of the additive hash, one a variable. */
  get hashWeights(): Int32Array {
    return this.#hashWeights;
  }

  /** The total degree of a monomial. */
  degree(id: MonomialId): number {
    return this.#degrees[id] as number;
  }

  /** A mask with mask(a) & ~mask(b) = 0 whenever a divides b. */
  mask(id: MonomialId): number {
    return this.#masks[id] as number;
  }

  /** a·b. @throws ExponentOverflow */
  product(a: MonomialId, b: MonomialId): MonomialId {
    const n = this.variableCount;
    const exponents = this.#exponents;
    const scratch = this.#scratch;
    const startA = a * n;
    const startB = b * n;
    const degree = (this.#degrees[a] as number) + (this.#degrees[b] as number);
    if (degree > MAX_EXPONENT) this.#checkSum(startA, startB);
    for (let i = 0; i < n; i++) {
      scratch[i] = (exponents[startA + i] as number) + (exponents[startB + i] as number);
    }
    const hash = ((this.#hashes[a] as number) + (this.#hashes[b] as number)) | 0;
    return this.#find(hash, degree);
  }

  /** a/b; b must divide a. */
  quotient(a: MonomialId, b: MonomialId): MonomialId {
    const n = this.variableCount;
    const exponents = this.#exponents;
    for (let i = 0; i < n; i++) {
      this.#scratch[i] = (exponents[a * n + i] as number) - (exponents[b * n + i] as number);
    }
    const hash = ((this.#hashes[a] as number) - (this.#hashes[b] as number)) | 0;
    return this.#find(hash, (this.#degrees[a] as number) - (this.#degrees[b] as number));
  }

  /** Does a divide b? */
  divides(a: MonomialId, b: MonomialId): boolean {
    if (((this.#masks[a] as number) & ~(this.#masks[b] as number)) !== 0) return false;
    const n = this.variableCount;
    const exponents = this.#exponents;
    const startA = a * n;
    const startB = b * n;
    for (let i = 0; i < n; i++) {
      if ((exponents[startA + i] as number) > (exponents[startB + i] as number)) return false;
    }
    return true;
  }

  /** Positive when a is larger in the order, negative when b is, 0 when they are the same. */
  compare(a: MonomialId, b: MonomialId): number {
    if (a === b) return 0;
    if (this.order.degreeFirst) {
      const byDegree = (this.#degrees[a] as number) - (this.#degrees[b] as number);
      if (byDegree !== 0) return byDegree;
    }
    return this.#compareInArena(this.#exponents, a * this.variableCount, b * this.variableCount);
  }

  #checkSum(startA: number, startB: number): void {
    for (let i = 0; i < this.variableCount; i++) {
      const sum = (this.#exponents[startA + i] as number) + (this.#exponents[startB + i] as number);
      if (sum > MAX_EXPONENT) throw new ExponentOverflow();
    }
  }

  #internScratch(): MonomialId {
    let hash = 0;
    let degree = 0;
    for (let i = 0; i < this.variableCount; i++) {
      const e = this.#scratch[i] as number;
      degree += e;
      hash = (hash + Math.imul(e, this.#hashWeights[i] as number)) | 0;
    }
    return this.#find(hash, degree);
  }

  /** The id of the monomial in the scratch space, whose hash and degree are known. */
  #find(hash: number, degree: number): MonomialId {
    const n = this.variableCount;
    const limit = this.#slots.length - 1;
    let slot = spread(hash) & limit;
    for (;;) {
      const id = this.#slots[slot] as number;
      if (id === -1) break;
      if (this.#hashes[id] === hash && this.#equalsScratch(id * n)) return id as MonomialId;
      slot = (slot + 1) & limit;
    }
    if (this.#size === this.#degrees.length) {
      this.#grow();
      return this.#find(hash, degree);
    }
    const id = this.#size++;
    this.#slots[slot] = id;
    this.#exponents.set(this.#scratch, id * n);
    this.#degrees[id] = degree;
    this.#hashes[id] = hash;
    this.#masks[id] = supportMask(this.#scratch);
    return id as MonomialId;
  }

  #equalsScratch(start: number): boolean {
    for (let i = 0; i < this.variableCount; i++) {
      if (this.#exponents[start + i] !== this.#scratch[i]) return false;
    }
    return true;
  }

  #grow(): void {
    const capacity = 2 * this.#degrees.length;
    const enlarge = <T extends Int32Array | Uint16Array>(larger: T, old: T): T => {
      larger.set(old);
      return larger;
    };
    this.#exponents = enlarge(new Uint16Array(capacity * this.variableCount), this.#exponents);
    this.#degrees = enlarge(new Int32Array(capacity), this.#degrees);
    this.#hashes = enlarge(new Int32Array(capacity), this.#hashes);
    this.#masks = enlarge(new Int32Array(capacity), this.#masks);
    this.#slots = new Int32Array(2 * capacity).fill(-1);
    const limit = this.#slots.length - 1;
    for (let id = 0; id < this.#size; id++) {
      let slot = spread(this.#hashes[id] as number) & limit;
      while (this.#slots[slot] !== -1) slot = (slot + 1) & limit;
      this.#slots[slot] = id;
    }
  }
}

/** Odd pseudo-random weights, one a variable, the same in every run (a 32-bit xorshift). */
function hashWeights(count: number): Int32Array {
  let state = 0x2545f491;
  return Int32Array.from({ length: count }, () => {
    state ^= state << 13;
    state ^= state >>> 17;
    state ^= state << 5;
    return state | 1;
  });
}

/* Hashes of monomials on a line form an arithmetic progression, which linear probing would pile up. */
function spread(hash: number): number {
  const mixed = Math.imul(hash ^ (hash >>> 16), 0x7feb352d);
  return mixed ^ (mixed >>> 15);
}

/** With at most 16 variables two bits each (exponent ≥ 1, ≥ 2), else one bit, shared past 32. */
function supportMask(exponents: Exponents): number {
  let mask = 0;
  const twoBits = exponents.length <= 16;
  for (let v = 0; v < exponents.length; v++) {
    const e = exponents[v] as number;
    if (e >= 1) mask |= 1 << (v & 31);
    if (twoBits && e >= 2) mask |= 65_536 << v;
  }
  return mask;
}
