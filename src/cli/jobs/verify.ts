/** The work of `flatlimit verify`. */
import { decideGroebner } from "../../claims/groebner-claim.js";
import { groebnerJson } from "../../report/claim-json.js";
import { groebnerText } from "../../report/claim-text.js";
import type { Job } from "../job.js";
import { EXIT } from "../request.js";
import { writeResult, writeUndecided } from "../result.js";
import { questionOf } from "../subject.js";

/** After a failure the reduced basis is computed for this long at most. */
const BASIS_SECONDS = 10;

/** Decides the claim and prints it. */
export const job: Job = (request, context) => {
  const question = questionOf(request);
  const claim = decideGroebner(question, context.budget, BASIS_SECONDS);
  if (claim.kind === "undecided") return writeUndecided(request, context, question, claim);
  const seconds = context.budget.elapsed();
  writeResult(
    request,
    context,
    () => groebnerJson(claim, seconds),
    () => groebnerText(claim, seconds),
  );
  return claim.verdict === "holds" ? EXIT.holds : EXIT.fails;
};
