/**
 * The irredundant irreducible decomposition of a monomial ideal. An irreducible monomial ideal
 * (x_v^b_v : v in its support) is a vector b, 0 outside the support. The generators come in one by one; a
 * component that lacks the new generator m is cut down at each variable of m. Whether a cut is irredundant
 * is decided by itself: at every variable v of the support some generator g must have g_v = b_v and lie
 * below b everywhere else (else b_v could grow). No two cuts agree, so nothing is compared or stored twice.
 * Cost: components × generators × variables for each new generator.
 * @source Miller, Sturmfels, *Combinatorial Commutative Algebra*, section 5.2 (irreducible components and
 * Alexander duality); the order of work is Berge's multiplication for hypergraphs.
 */
import type { Budget } from "../outcomes/budget.js";
import { type Exponents, totalDegree } from "../polynomials/exponents.js";
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
    const known = generators.slice(0, count + 1);
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
  return component.some((b, v) => b > 0 && (monomial[v] as number) >= b);
}

function cuts(
  component: IrreducibleIdeal,
  generator: Exponents,
  known: readonly Exponents[],
): IrreducibleIdeal[] {
  const found: IrreducibleIdeal[] = [];
  generator.forEach((e, v) => {
    if (e === 0) return;
    const cut = component.slice();
    cut[v] = e;
    if (isIrredundant(cut, known)) found.push(cut);
  });
  return found;
}

function isIrredundant(component: IrreducibleIdeal, generators: readonly Exponents[]): boolean {
  let missing = component.reduce((count, b) => count + (b > 0 ? 1 : 0), 0);
  const held = new Uint8Array(component.length);
  for (const g of generators) {
    const v = onlyMember(component, g);
    if (v === undefined || held[v] === 1 || g[v] !== component[v]) continue;
    held[v] = 1;
    if (--missing === 0) return true;
  }
  return missing === 0;
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
