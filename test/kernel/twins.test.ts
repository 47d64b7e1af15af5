import fc from "fast-check";
import { describe, expect, it, vi } from "vitest";
import * as at from "../../src/kernel/layout.js";
import { createWorkspace } from "../../src/kernel/thread-workspace.js";
import type { Workspace } from "../../src/kernel/workspace.js";
import type { Exponents } from "../../src/polynomials/exponents.js";
import { multiplyExponents } from "../../src/polynomials/exponents.js";
import { type MonomialId, MonomialTable } from "../../src/polynomials/monomial-table.js";
import { ringOfVariables } from "../../src/polynomials/polynomial-ring.js";
import { orderOf } from "../support/reading.js";

const workspaces = [createWorkspace("compiled"), createWorkspace("plain")];

/** What a matrix is made from: elements as lists of monomials, largest first, and rows to reduce. */
interface Scene {
  readonly table: MonomialTable;
  readonly elements: readonly Int32Array[];
  readonly rows: readonly { readonly element: number; readonly multiplier: MonomialId }[];
}

function scene(
  variables: number,
  phrase: string,
  elements: readonly (readonly Exponents[])[],
  multipliers: readonly Exponents[],
): Scene {
  const r = ringOfVariables(Array.from({ length: variables }, (_, v) => `v${v}`));
  const table = new MonomialTable(orderOf(r, phrase));
  const sorted = elements.map((monomials) => {
    const ids = [...new Set(monomials.map((m) => table.intern(m)))];
    return Int32Array.from(ids.sort((a, b) => table.compare(b, a)));
  });
  const rows = multipliers.map((m, k) => ({
    element: k % sorted.length,
    multiplier: table.intern(m),
  }));
  return { table, elements: sorted, rows };
}

/** Large exponents make chains of reducers that never end; after so many calls a scene is passed over. */
const MOST_CALLS = 60;

/** The matrix of a scene in a workspace, as plain data; all elements but the first reduce. */
function matrixOf(space: Workspace, { table, elements, rows }: Scene, wide: boolean, fuel: number) {
  space.divide({}, table, wide);
  if (!space.copyMonomials(table)) return "too large";
  elements.forEach((monomials, k) => {
    space.setElement(k, monomials, undefined);
  });
  const owners = Int32Array.from(elements.keys()).slice(1);
  const leads = owners.map((k) => (elements[k] as Int32Array)[0] as number);
  const masks = leads.map((id) => table.mask(id as MonomialId));
  space.setLeads(leads, masks, owners);
  for (const { element, multiplier } of rows) {
    if (space.kernel.placeRow(element, multiplier) < 0) return "overflow";
  }
  for (let calls = 1; ; calls++) {
    const state = space.kernel.closeMatrix(fuel);
    if (state === at.OUT_OF_FUEL && calls === MOST_CALLS) return "long";
    if (state === at.EXPONENT_TOO_LARGE) return "overflow";
    if (state === at.OUT_OF_SPACE) return "full";
    if (state === at.DONE) break;
  }
  const numbers = space.arrangeColumns(0, rows.length);
  const exponents = Array.from(numbers, (number) => {
    const column = new Uint16Array(table.variableCount);
    space.readExponents(number, column);
    return [...column];
  });
  const pivots = Array.from(numbers, (_, column) => space.pivotOf(column));
  const rowCount = rows.length + pivots.filter((row) => row >= 0).length;
  const placed = Array.from({ length: rowCount }, (_, k) => {
    const { element, columns } = space.row(k);
    return { element, columns: [...columns] };
  });
  return { exponents, pivots, rows: placed };
}

/** Exponent vectors with few variables in use. */
function monomialsIn(variables: number, largest: number) {
  const entry = fc.tuple(
    fc.nat({ max: variables - 1 }),
    fc.oneof(fc.nat({ max: 2 }), fc.nat({ max: largest })),
  );
  return fc.array(entry, { maxLength: 4 }).map((entries) => {
    const m = new Uint16Array(variables);
    for (const [v, e] of entries) m[v] = e;
    return m;
  });
}

const scenes = fc
  .record({
    variables: fc.constantFrom(1, 3, 16, 17, 40, 130),
    largest: fc.constantFrom(3, 3, 3, 200, 255, 256, 40_000),
    phrase: fc.constantFrom("graded revlex", "graded lex", "plain lex"),
    fuel: fc.constantFrom(1, 20, 400),
  })
  .chain(({ variables, largest, phrase, fuel }) =>
    fc
      .record({
        elements: fc.array(fc.array(monomialsIn(variables, largest), { minLength: 1 }), {
          minLength: 1,
          maxLength: 5,
        }),
        multipliers: fc.array(monomialsIn(variables, largest), { minLength: 1, maxLength: 5 }),
        wide: fc.boolean(),
      })
      .map(({ elements, multipliers, wide }) => ({
        scene: scene(variables, phrase, elements, multipliers),
        wide,
        fuel,
      })),
  );

describe("the compiled kernel and its plain twin", () => {
  it("exist both on this machine", () => {
    expect(workspaces.map(({ kernel }) => kernel.kind)).toEqual(["compiled", "plain"]);
    expect(createWorkspace().kernel.kind).toBe("compiled");
  });

  it("do without WebAssembly, or without the addresses it takes", () => {
    const given = scene(3, "graded lex", [[Uint16Array.of(1, 2, 0)]], [Uint16Array.of(0, 1, 1)]);
    const wanted = matrixOf(workspaces[1] as Workspace, given, false, 100);
    class Refused {
      constructor() {
        throw new RangeError("no memory");
      }
    }
    for (const stub of [undefined, { ...WebAssembly, Memory: Refused }]) {
      vi.stubGlobal("WebAssembly", stub);
      const space = createWorkspace();
      vi.unstubAllGlobals();
      expect(space.kernel.kind).toBe("plain");
      expect(matrixOf(space, given, false, 100)).toEqual(wanted);
    }
  });

  it("make the same matrices, and these hold products, sorted, with reducers where leads divide", () => {
    let made = 0;
    fc.assert(
      fc.property(scenes, ({ scene: given, wide, fuel }) => {
        const [compiled, plain] = workspaces.map((space) => matrixOf(space, given, wide, fuel));
        expect(compiled).toEqual(plain);
        if (compiled === undefined || typeof compiled === "string") return;
        made++;
        const { table, elements, rows } = given;
        const columns = compiled.exponents.map((e) => table.intern(Uint16Array.from(e)));
        columns.forEach((id, k) => {
          if (k > 0) expect(table.compare(columns[k - 1] as MonomialId, id)).toBeGreaterThan(0);
          const divisor = elements.slice(1).find((e) => table.divides(e[0] as MonomialId, id));
          expect((compiled.pivots[k] as number) >= 0).toBe(divisor !== undefined);
        });
        compiled.rows.forEach(({ element, columns: placed }, k) => {
          const monomials = elements[element] as Int32Array;
          const multiplier =
            rows[k]?.multiplier ??
            table.quotient(columns[placed[0] as number] as MonomialId, monomials[0] as MonomialId);
          const wanted = Array.from(monomials, (id) => {
            const factor = table.exponents(multiplier);
            return table.intern(multiplyExponents(table.exponents(id as MonomialId), factor));
          });
          expect(placed.map((column) => columns[column])).toEqual(wanted);
          if (k >= rows.length) expect(compiled.pivots[placed[0] as number]).toBe(k);
        });
      }),
      { numRuns: 400 },
    );
    expect(made).toBeGreaterThan(100);
  });

  it("enlarge their tables of columns many times over", () => {
    const variables = 12;
    const monomials: Exponents[] = [];
    for (let k = 0; k < 4096; k++) {
      monomials.push(Uint16Array.from({ length: variables }, (_, v) => (k >> v) & 1));
    }
    const multipliers = [0, 1, 2, 3].map((e) => new Uint16Array(variables).fill(e));
    const given = scene(variables, "graded revlex", [monomials], multipliers);
    const [compiled, plain] = workspaces.map((space) => matrixOf(space, given, false, 1e6));
    expect(compiled).toEqual(plain);
    expect((compiled as { exponents: unknown[] }).exponents.length).toBeGreaterThan(12_000);
  });

  it("tell monomials of equal hash apart", () => {
    const [space] = workspaces as [Workspace];
    const monomials = Array.from({ length: 50 }, (_, k) => Uint16Array.of(k, 49 - k));
    const given = scene(2, "graded lex", [monomials], [Uint16Array.of(1, 1)]);
    // All weights of the hash equal: every monomial of the element has the same hash.
    const { table } = given;
    const same = Object.create(table, {
      hashWeights: { value: Int32Array.of(7, 7) },
      variableCount: { value: 2 },
      order: { value: table.order },
      size: { value: table.size },
      exponentsBetween: { value: table.exponentsBetween.bind(table) },
      mask: { value: table.mask.bind(table) },
    }) as MonomialTable;
    for (const each of [space, workspaces[1] as Workspace]) {
      const matrix = matrixOf(each, { ...given, table: same }, false, 1e6);
      expect((matrix as { exponents: unknown[] }).exponents).toHaveLength(50);
    }
  });

  it("give the residues of exact arithmetic when they eliminate, one row or four at a time", () => {
    const primes = [2, 3, 32_003, 67_108_859, 2_147_483_647];
    fc.assert(
      fc.property(
        fc.constantFrom(...primes),
        fc.integer({ min: 3, max: 40 }),
        fc.infiniteStream(fc.nat({ max: 2 ** 31 - 1 })),
        (prime, width, stream) => {
          const draw = (): number => stream.next().value as number;
          const numbers = Array.from({ length: 12 * width }, draw);
          const results = workspaces.map((space) => elimination(space, prime, width, numbers));
          const wanted = byDefinition(prime, width, numbers);
          for (const result of results) expect(result).toEqual(wanted);
        },
      ),
      { numRuns: 150 },
    );
  });
});

interface SparseRow {
  readonly columns: number;
  readonly residues: number;
  readonly length: number;
}

/** Rows as dense vectors: pivots, monic and zero before their column, in every third column; then five rows. */
function rowsOf(prime: number, width: number, numbers: readonly number[]) {
  let next = 0;
  const draw = (): number => (numbers[next++ % numbers.length] as number) % prime;
  const pivots: number[][] = [];
  for (let column = 0; column < width; column += 3) {
    pivots.push(
      Array.from({ length: width }, (_, c) => (c < column ? 0 : c === column ? 1 : draw())),
    );
  }
  const rows = Array.from({ length: 5 }, () => Array.from({ length: width }, draw));
  return { pivots, rows };
}

/** The five rows reduced by the pivots: the first made monic, the others not. */
function byDefinition(prime: number, width: number, numbers: readonly number[]): number[][] {
  const { pivots, rows } = rowsOf(prime, width, numbers);
  const p = BigInt(prime);
  return rows.map((row, k) => {
    let entries = row.map(BigInt);
    pivots.forEach((pivot, index) => {
      const value = entries[3 * index] as bigint;
      entries = entries.map((e, c) => (((e - value * BigInt(pivot[c] as number)) % p) + p) % p);
    });
    const lead = entries.find((e) => e !== 0n);
    if (k > 0 || lead === undefined) return entries.map(Number);
    const inverse = BigInt(power(Number(lead), prime - 2, prime));
    return entries.map((e) => Number((e * inverse) % p));
  });
}

function power(base: number, exponent: number, prime: number): number {
  let result = 1n;
  let square = BigInt(base);
  for (let e = BigInt(exponent); e > 0n; e >>= 1n) {
    if (e & 1n) result = (result * square) % BigInt(prime);
    square = (square * square) % BigInt(prime);
  }
  return Number(result % BigInt(prime));
}

/** The same by a kernel: the first row alone, the others in lanes. */
function elimination(
  space: Workspace,
  prime: number,
  width: number,
  numbers: readonly number[],
): number[][] {
  const r = ringOfVariables(["x"]);
  const table = new MonomialTable(orderOf(r, "graded lex"));
  space.divide({}, table, false);
  const { kernel } = space;
  const { pivots, rows } = rowsOf(prime, width, numbers);
  const sparse = (row: readonly number[]): SparseRow => {
    const used = row.flatMap((value, column) => (value === 0 ? [] : [column]));
    const columns = space.reserve(4 * width);
    const residues = space.reserve(4 * width);
    space.integers(columns, used.length).set(used);
    space.integers(residues, used.length).set(used.map((c) => row[c] as number));
    return { columns, residues, length: used.length };
  };
  const dense = (columns: number, residues: number, length: number): number[] => {
    const row = new Array<number>(width).fill(0);
    const values = space.integers(residues, length);
    space.integers(columns, length).forEach((column, k) => {
      row[column] = values[k] as number;
    });
    return row;
  };
  space.forgetPivots(width);
  for (const pivot of pivots) {
    const { columns, residues, length } = sparse(pivot);
    space.makePivot(space.addRow(columns, residues, length));
  }
  const [first, ...others] = rows.map(sparse) as [SparseRow, ...SparseRow[]];
  const zeros = (bytes: number): number => {
    const start = space.reserve(bytes);
    space.fillWithZeros(start, bytes);
    return start;
  };
  const accumulator = zeros(8 * width);
  kernel.addRow(accumulator, first.columns, first.residues, first.length, 1, prime);
  const count = kernel.sweep(accumulator, 0, width, prime);
  const columns = space.reserve(4 * width);
  const residues = space.reserve(4 * width);
  expect(kernel.gather(accumulator, 0, width, prime, columns, residues)).toBe(count);
  const results = [dense(columns, residues, count)];
  const lanes = zeros(32 * width);
  others.forEach((row, lane) => {
    kernel.loadLane(lanes, lane, row.columns, row.residues, row.length);
  });
  kernel.sweepLanes(lanes, 0, width, prime);
  for (let lane = 0; lane < 4; lane++) {
    const length = kernel.takeLane(lanes, lane, 0, width, prime, columns, residues);
    results.push(dense(columns, residues, length));
  }
  return results;
}
