/** From what was typed to a question: a family member or a problem file, a generating set, an order. */
import { readFileSync, statSync } from "node:fs";
import type { Question } from "../claims/question.js";
import type { Ideal } from "../families/ideal.js";
import { readFamilyIdeal } from "../families/registry.js";
import { faulty, quote, type Reading, read } from "../outcomes/input-fault.js";
import { readOrder } from "../polynomials/order-phrase.js";
import { generatingSet, type Problem, readProblem } from "../problems/problem.js";
import { MAX_TEXT } from "../problems/yaml-parsing.js";
import { accept } from "./job.js";
import type { JobRequest } from "./request.js";

/** The question of a request. @throws BadInput */
export function questionOf({ subject, settings }: JobRequest): Question {
  const problem = accept(readSubject(subject));
  const { ideal } = problem;
  const { generators, order } = settings;
  return {
    ...problem,
    ...(generators === undefined ? {} : { generators: accept(generatingSet(ideal, generators)) }),
    ...(order === undefined ? {} : { order: accept(readOrder(order, ideal.ring)) }),
  };
}

function readSubject(subject: string): Reading<Problem> {
  if (subject.trim() === "") {
    return faulty({
      message: "the ideal is empty",
      expected: "a name such as schubert:2143, or a problem file",
    });
  }
  if (looksLikePath(subject)) return readProblemFile(subject);
  const ideal = readFamilyIdeal(subject);
  return ideal.ok ? familyProblem(ideal.value) : ideal;
}

function familyProblem(ideal: Ideal): Reading<Problem> {
  const order = readOrder(ideal.defaultOrder, ideal.ring);
  return order.ok
    ? read({ ideal, generators: ideal.generatingSets[0], order: order.value })
    : order;
}

function looksLikePath(subject: string): boolean {
  return (
    /\.(ya?ml|json)$/i.test(subject) ||
    (subject.includes("/") && !subject.includes(":")) ||
    exists(subject)
  );
}

function exists(path: string): boolean {
  return statSync(path, { throwIfNoEntry: false }) !== undefined;
}

function readProblemFile(path: string): Reading<Problem> {
  const refuse = (
    message: string,
    expected = "a problem file of ours (YAML or JSON)",
  ): Reading<never> => faulty({ message, expected, file: path });
  try {
    const stats = statSync(path);
    if (stats.isDirectory()) return refuse("this is a directory");
    if (stats.size > MAX_TEXT) {
      return refuse(`the file is too large (${stats.size} bytes)`, `at most ${MAX_TEXT} bytes`);
    }
    const text = new TextDecoder("utf-8", { fatal: true }).decode(readFileSync(path));
    return readProblem(text, path);
  } catch (error) {
    if (!(error instanceof Error)) throw error;
    const code = "code" in error ? String(error.code) : "";
    if (code === "ENOENT" || code === "ENOTDIR") return refuse("there is no such file");
    if (code === "EACCES" || code === "EPERM")
      return refuse("the file cannot be read", "leave to read it");
    if (code === "ERR_ENCODING_INVALID_ENCODED_DATA") return refuse("the file is not UTF-8 text");
    if (code.startsWith("E")) return refuse(`the file cannot be read (${quote(code)})`);
    throw error;
  }
}
