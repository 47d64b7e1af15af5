/** The work of `flatlimit limit`. */

import { describeLimit } from "../../claims/limit-description.js";
import { isList } from "../../outcomes/budget.js";
import { limitJson } from "../../report/claim-json.js";
import { limitText } from "../../report/claim-text.js";
import type { Job } from "../job.js";
import { EXIT } from "../request.js";
import { writeResult, writeUndecided } from "../result.js";
import { questionOf } from "../subject.js";

/** Computes the limit and prints it. */
export const job: Job = (request, context) => {
  const question = questionOf(request);
  const description = describeLimit(question, context.budget);
  if (description.kind === "undecided")
    return writeUndecided(request, context, question, description);
  const seconds = context.budget.elapsed();
  writeResult(
    request,
    context,
    () => limitJson(description, seconds),
    () => limitText(description, seconds),
  );
  return isList(description.components) ? EXIT.holds : EXIT.undecided;
};
