/** The order that a problem file asks for: a phrase, or weight vectors with the order that follows them. */
import { quote, type Reading } from "../outcomes/input-fault.js";
import { readOrder } from "../polynomials/order-phrase.js";
import type { PolynomialRing } from "../polynomials/polynomial-ring.js";
import type { TermOrder } from "../polynomials/term-order.js";
import type { ProblemShape } from "./problem-schema.js";
import type { KeyPath, YamlSource } from "./yaml-source.js";

type OrderShape = NonNullable<ProblemShape["order"]>;
type Weighted = Exclude<OrderShape, string>;

/** The largest number of weights in all vectors of a problem's order together. */
const MAX_WEIGHTS = 40_000;

/** Reads the order on the ring. */
export function readOrderShape(
  source: YamlSource,
  shape: OrderShape,
  ring: PolynomialRing,
): Reading<TermOrder> {
  if (typeof shape === "string") {
    return source.moved(["order"], readOrder(shape, ring));
  }
  const refuse = (
    path: KeyPath,
    message: string,
    expected: string,
    key?: string,
  ): Reading<never> => ({ ok: false, fault: source.fault(path, message, expected, key) });
  const { next, refinement } = shape;
  const last = next ?? refinement;
  if (last === undefined) {
    const message = "weights alone do not order all monomials";
    return refuse(["order"], message, "either next or refinement");
  }
  if (next !== undefined && refinement !== undefined) {
    return refuse(["order"], "next and refinement", "either next or refinement");
  }
  const wrong = vectorFault(shape, ring);
  if (wrong !== undefined) {
    return refuse(["order", "weights", wrong.index], wrong.message, wrong.expected, wrong.key);
  }
  const words = vectorsOf(shape, ring)
    .map((vector) => `weights (${vector.join(",")})`)
    .join(" then ");
  const head = `${words} ${next === undefined ? "refined by" : "then"} `;
  const order = readOrder(head + last, ring);
  if (order.ok) return order;
  const column = (order.fault.place?.column ?? 1) - head.length;
  if (column < 1) return refuse(["order"], order.fault.message, order.fault.expected ?? "");
  const path = ["order", next === undefined ? "refinement" : "next"];
  return source.moved(path, { ok: false, fault: { ...order.fault, place: { line: 1, column } } });
}

function vectorFault(
  { weights }: Weighted,
  { variables }: PolynomialRing,
):
  | {
      readonly index: number;
      readonly message: string;
      readonly expected: string;
      readonly key?: string;
    }
  | undefined {
  const most = Math.floor(MAX_WEIGHTS / variables.length);
  if (weights.length > most) {
    const message = `${weights.length} weight vectors of ${variables.length} weights`;
    return { index: most, message, expected: `at most ${MAX_WEIGHTS} weights` };
  }
  const known = new Set(variables);
  for (const [index, vector] of weights.entries()) {
    if (Array.isArray(vector)) {
      if (vector.length === variables.length) continue;
      const expected = `${variables.length}, one for each variable`;
      return { index, message: `${vector.length} weights`, expected };
    }
    const key = Object.keys(vector).find((name) => !known.has(name));
    if (key === undefined) continue;
    const message = `unknown variable ${quote(key)}`;
    return { index, message, expected: "a variable of the ring", key };
  }
  return undefined;
}

function vectorsOf({ weights }: Weighted, { variables }: PolynomialRing): (readonly number[])[] {
  return weights.map((vector) => {
    if (Array.isArray(vector)) return vector;
    return variables.map((name) => (Object.hasOwn(vector, name) ? (vector[name] ?? 0) : 0));
  });
}
