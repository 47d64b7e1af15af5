/** Writing the result of a job: one JSON object, or lines of text. */
import type { Question } from "../claims/question.js";
import type { Undecided } from "../outcomes/budget.js";
import { problemDocument } from "../problems/problem-document.js";
import type { JobContext } from "./job.js";
import { EXIT, type JobRequest } from "./request.js";

/** Writes what was computed. */
export function writeResult(
  request: JobRequest,
  context: JobContext,
  json: () => object,
  text: () => readonly string[],
): void {
  context.write(request.json ? `${JSON.stringify(json())}\n` : `${text().join("\n")}\n`);
}

/** Writes that nothing was decided, and why; returns the exit status. */
export function writeUndecided(
  request: JobRequest,
  context: JobContext,
  question: Question,
  { limit, reason }: Undecided,
): number {
  const { ideal, order, generators } = question;
  const outcome = {
    ideal: ideal.name,
    order: order.phrase,
    generators: { kind: generators.kind },
    verdict: "undecided",
    evidence: "undecided",
    limit,
    reason,
    problem: problemDocument(question),
    seconds: context.budget.elapsed(),
  };
  if (request.json) context.write(`${JSON.stringify(outcome)}\n`);
  context.warn(`undecided: ${reason}`);
  return EXIT.undecided;
}
