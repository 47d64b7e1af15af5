/**
 * The irredundant irreducible decomposition of a monomial ideal. An irreducible monomial ideal
 * (x_v^b_v : v in its support) is a vector b, 0 outside the support. The generators come in one by one; a
 * component that lacks the new generator m is cut down at each variable of m. Whether a cut is irredundant
 * is decided by itself: at every variable v of the support some generator g must hold it, with g_v = b_v and
 * g below b everywhere else (else b_v could grow). No two cuts agree, so nothing is compared or stored twice.
 * Cost: components × (generators × variables + variables²) for each new generator.
 * @source Miller, Sturmfels, *Combinatorial Commutative Algebra*, section 5.2 (irreducible components and
 * Alexander duality); the order of work is Berge's multiplication for hypergraphs.
 */
import type { Budget } from "../outcomes/budget.js";
import { type Exponents, MAX_EXPONENT, totalDegree } from "../polynomials/exponents.js";
import type { MonomialIdeal } from "../polynomials/monomial-ideal.js";

/** An irreducible monomial ideal: the exponent b_v ≥ 1 of each variable of its support, 0 elsewhere. */
export type IrreducibleIdeal = Exponents;

/**
 * The irredundant irreducible components: J is their intersection, and none can be left out. The zero
 * ideal has the zero ideal, the unit ideal none. @throws LimitReached
 */
export function irreducibleDecomposition(ideal: MonomialIdeal, budget: Budget): IrreducibleIdeal[] {
  const generators = [...ideal.generators].sort((a, b) => totalDegree(a) - totalDegree(b));
  if (generators.some((g) => totalDegree(g) === 0)) return [];
  let components: IrreducibleIdeal[] = [new Uint16Array(ideal.variableCount)];
  generators.forEach((generator, count) => {
    const known = generators.slice(0, count);
    const next: IrreducibleIdeal[] = [];
    for (const component of components) {
      budget.spend(() => `irreducible components, ${next.length} at generator ${count + 1}`);
      if (containsMonomial(component, generator)) next.push(component);
      else next.push(...cuts(component, generator, known));
    }
    components = next;
  });
  return components;
}

function containsMonomial(component: IrreducibleIdeal, monomial: Exponents): boolean {
  for (let v = 0; v < component.length; v++) {
    const b = component[v] as number;
    if (b > 0 && (monomial[v] as number) >= b) return true;
  }
  return false;
}

/**
 * The irredundant cuts of a component at a generator m that it lacks. The cut at v is held at v by m alone;
 * at any other u it is held by the generators that held the component there, if they are below m at v.
 */
function cuts(
  component: IrreducibleIdeal,
  generator: Exponents,
  known: readonly Exponents[],
): IrreducibleIdeal[] {
  const count = component.length;
  const least = leastOfHolders(component, known);
  const isHeld = (v: number, e: number): boolean => {
    for (let u = 0; u < count; u++) {
      if (u !== v && component[u] !== 0 && (least[u * count + v] as number) >= e) return false;
    }
    return true;
  };
  const found: IrreducibleIdeal[] = [];
  for (let v = 0; v < count; v++) {
    const e = generator[v] as number;
    if (e === 0 || !isHeld(v, e)) continue;
    const cut = component.slice();
    cut[v] = e;
    found.push(cut);
  }
  return found;
}

/** In row u the least exponents of the generators that hold the component at u. */
function leastOfHolders(
  component: IrreducibleIdeal,
  generators: readonly Exponents[],
): Uint16Array {
  const count = component.length;
  const least = new Uint16Array(count * count).fill(MAX_EXPONENT);
  for (const g of generators) {
    const u = onlyMember(component, g);
    if (u === undefined || g[u] !== component[u]) continue;
    for (let v = 0, k = u * count; v < count; v++, k++) {
      if ((g[v] as number) < (least[k] as number)) least[k] = g[v] as number;
    }
  }
  return least;
}

/** The only variable at which a monomial reaches the component's exponent, if there is just one. */
function onlyMember(component: IrreducibleIdeal, g: Exponents): number | undefined {
  let only: number | undefined;
  for (let v = 0; v < component.length; v++) {
    const b = component[v] as number;
    if (b === 0 || (g[v] as number) < b) continue;
    if (only !== undefined) return undefined;
    only = v;
  }
  return only;
}
