/** A parsed text checked against the shape of a problem; what does not fit becomes a fault with a place. */
import { quote, type Reading, read } from "../outcomes/input-fault.js";
import { nearestName } from "../polynomials/nearest-name.js";
import { knownKeys, type ProblemShape, problemSchema } from "./problem-schema.js";
import type { KeyPath, YamlSource } from "./yaml-source.js";

/** The shape of a problem, or the first fault; unknown keys come first, since they explain missing ones. */
export function readShape(source: YamlSource): Reading<ProblemShape> {
  const parsed = problemSchema.safeParse(source.content());
  if (parsed.success) return read(parsed.data);
  const { issues } = parsed.error;
  for (const issue of issues) {
    if (issue.code !== "unrecognized_keys") continue;
    return unknownKey(source, issue.path, issue.keys[0] ?? "");
  }
  const path: KeyPath = issues[0]?.path ?? [];
  const message = issues[0]?.message ?? "";
  const expected = message.startsWith("expected ")
    ? message.slice("expected ".length)
    : "another shape";
  if (!source.has(path)) {
    const key = String(path.at(-1));
    const siblings = knownKeys(path.slice(0, -1)).join(", ");
    const what = key === "ideal" ? `ideal: with ${expected}` : siblings;
    return { ok: false, fault: source.fault(path, `the key ${key} is missing`, what) };
  }
  const where = path.length === 0 ? "the problem" : path.map(String).join(".");
  return { ok: false, fault: source.fault(path, `${where} is not right`, expected) };
}

function unknownKey(source: YamlSource, path: KeyPath, key: string): Reading<never> {
  const known = knownKeys(path);
  const near = nearestName(key, known);
  const expected = near === undefined ? `one of ${known.join(", ")}` : `${near}, perhaps`;
  return { ok: false, fault: source.fault(path, `unknown key ${quote(key)}`, expected, key) };
}
