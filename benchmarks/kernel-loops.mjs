/**
 * The kernel's loops on fixed data, compiled and plain; `kernel-loops.c` does the same in C. Each returns
 * seconds and a checksum, which must be the same for all three.
 */
import { compiledKernel, plainKernel } from "../dist/kernel/make-kernel.js";
import { Workspace } from "../dist/kernel/workspace.js";
import { gradedRevlex } from "../dist/polynomials/graded-revlex.js";
import { MonomialTable } from "../dist/polynomials/monomial-table.js";
import { ringOfVariables } from "../dist/polynomials/polynomial-ring.js";

const WIDTH = 20_000;
const LENGTH = 4000;
const ROWS = 64;
const LEADS = 512;
const VARIABLES = 48;
const TERMS = 2000;
const MULTIPLES = 64;
const LARGE_PRIME = 2_147_483_647;
/** Below 2²⁶, where the plain kernel is at its fastest. */
const SMALL_PRIME = 67_108_859;

/** @typedef {{ space: Workspace, buffer: SharedArrayBuffer }} Bench */

/** The loops that all three have. */
export const LOOPS = ["sparse", "sparse26", "lanes", "products", "divisors"];

function randomWords() {
  let state = 0x2545f491;
  return () => {
    state ^= state << 13;
    state ^= state >>> 17;
    state ^= state << 5;
    return state >>> 0;
  };
}

/** @param {Workspace} space @returns {{ columns: number[], residues: number[] }} */
function fillRows(space, prime = LARGE_PRIME) {
  const random = randomWords();
  /** @type {number[]} */
  const columns = [];
  /** @type {number[]} */
  const residues = [];
  for (let r = 0; r < ROWS; r++) {
    const place = space.reserve(4 * LENGTH);
    const values = space.reserve(4 * LENGTH);
    let column = 0;
    for (let k = 0; k < LENGTH; k++) {
      column += 1 + (random() % ((2 * WIDTH) / LENGTH - 1));
      space.integers(place, LENGTH)[k] = column % WIDTH;
      space.integers(values, LENGTH)[k] = random() % prime;
    }
    columns.push(place);
    residues.push(values);
  }
  return { columns, residues };
}

/** @param {number} k @param {number} prime */
const multiplierOf = (k, prime) => 1 + ((k * 12345) % (prime - 1));

/** The sum of the residues in an accumulator. @param {Bench} bench @param {number} start @param {number} length */
function residueSum({ space, buffer }, start, length, prime = LARGE_PRIME) {
  let sum = 0n;
  if (space.kernel.kind === "compiled") {
    for (const entry of new BigUint64Array(buffer, start, length)) sum += entry % BigInt(prime);
  } else {
    for (const entry of new Float64Array(buffer, start, length)) sum += BigInt(entry);
  }
  return String(sum);
}

/** @param {() => void} work */
function timed(work) {
  const start = performance.now();
  work();
  return (performance.now() - start) / 1000;
}

/** @type {Record<string, (bench: Bench, rounds: number) => { seconds: number, checksum: string }>} */
const loops = {
  sparse: (bench, rounds) => sparse(bench, rounds, LARGE_PRIME),
  sparse26: (bench, rounds) => sparse(bench, rounds, SMALL_PRIME),

  lanes(bench, rounds) {
    const { space } = bench;
    const { columns, residues } = fillRows(space);
    const accumulator = space.reserve(32 * WIDTH);
    space.fillWithZeros(accumulator, 32 * WIDTH);
    const { kernel } = space;
    const seconds = timed(() => {
      for (let k = 0; k < rounds * ROWS; k++) {
        const c = /** @type {number} */ (columns[k % ROWS]);
        const f = /** @type {number} */ (residues[k % ROWS]);
        const [m0, m1, m2, m3] = [0, 1, 2, 3].map((lane) =>
          multiplierOf(4 * k + lane, LARGE_PRIME),
        );
        // @ts-expect-error four multipliers there are
        kernel.subtractFromLanes(accumulator, c, f, 0, LENGTH, m0, m1, m2, m3, LARGE_PRIME);
      }
    });
    return { seconds, checksum: residueSum(bench, accumulator, 4 * WIDTH) };
  },

  products({ space }, rounds) {
    const { random, monomial, table } = monomials();
    for (let v = 0; v < VARIABLES; v++) random();
    const terms = Int32Array.from({ length: TERMS }, () => table.intern(monomial(5)));
    const multipliers = Array.from({ length: MULTIPLES }, () => table.intern(monomial(1)));
    space.divide(table, table, false);
    space.copyMonomials(table);
    space.setElement(0, terms, undefined);
    const seconds = timed(() => {
      for (let round = 0; round < rounds; round++) {
        space.clear();
        for (const multiplier of multipliers) space.kernel.placeRow(0, multiplier);
      }
    });
    let sum = 0;
    for (let m = 0; m < MULTIPLES; m++) for (const c of space.row(m).columns) sum += c + 1;
    return { seconds, checksum: String(sum * rounds) };
  },

  divisors({ space }, rounds) {
    const { monomial, table } = monomials();
    const leads = Int32Array.from({ length: LEADS }, () => table.intern(monomial(4)));
    const dividends = Int32Array.from({ length: TERMS }, () => table.intern(monomial(8)));
    space.divide(table, table, false);
    space.copyMonomials(table);
    const masks = leads.map((id) => table.mask(/** @type {any} */ (id)));
    space.setLeads(leads, masks, leads);
    const places = Array.from(dividends, (id) => space.addressOfMonomial(id));
    const dividendMasks = dividends.map((id) => table.mask(/** @type {any} */ (id)));
    let sum = 0;
    const seconds = timed(() => {
      for (let round = 0; round < rounds; round++) {
        for (let t = 0; t < TERMS; t++) {
          const place = /** @type {number} */ (places[t]);
          const lead = space.kernel.findDivisor(place, /** @type {number} */ (dividendMasks[t]));
          sum += lead < 0 ? LEADS : lead;
        }
      }
    });
    return { seconds, checksum: String(sum) };
  },
};

/** @param {Bench} bench @param {number} rounds @param {number} prime */
function sparse(bench, rounds, prime) {
  const { space } = bench;
  const { columns, residues } = fillRows(space, prime);
  const accumulator = space.reserve(8 * WIDTH);
  space.fillWithZeros(accumulator, 8 * WIDTH);
  const { kernel } = space;
  const seconds = timed(() => {
    for (let k = 0; k < rounds * ROWS; k++) {
      const c = /** @type {number} */ (columns[k % ROWS]);
      const f = /** @type {number} */ (residues[k % ROWS]);
      kernel.subtractMultiple(accumulator, c, f, 0, LENGTH, multiplierOf(k, prime), prime);
    }
  });
  return { seconds, checksum: residueSum(bench, accumulator, WIDTH, prime) };
}

function monomials() {
  const random = randomWords();
  const names = Array.from({ length: VARIABLES }, (_, v) => `v${v}`);
  const table = new MonomialTable(gradedRevlex(ringOfVariables(names)));
  /** @param {number} degree */
  const monomial = (degree) => {
    const exponents = new Uint16Array(VARIABLES);
    for (let k = 0; k < degree; k++) {
      const v = random() % VARIABLES;
      exponents[v] = /** @type {number} */ (exponents[v]) + 1;
    }
    return exponents;
  };
  return { random, monomial, table };
}

/**
 * Runs one loop, once to warm it up and once for the record.
 * @param {string} loop @param {"compiled" | "plain"} kind @param {number} rounds
 */
export function runLoop(loop, kind, rounds) {
  const run = loops[loop];
  if (run === undefined) throw new Error(`no loop ${loop}`);
  const pages = 2048;
  const shared = new WebAssembly.Memory({ initial: pages, maximum: pages, shared: true });
  const memory = { buffer: shared.buffer, shared };
  const kernel = kind === "plain" ? plainKernel(memory) : compiledKernel(memory);
  if (kernel === undefined) throw new Error("the compiled kernel does not run on this machine");
  run({ space: new Workspace(memory, kernel), buffer: shared.buffer }, rounds);
  return run({ space: new Workspace(memory, kernel), buffer: shared.buffer }, rounds);
}
