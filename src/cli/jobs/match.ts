/** The work of `flatlimit match`. */

import type { Question } from "../../claims/question.js";
import {
  matchTilings,
  suggestedTilings,
  type TilingsQuestion,
} from "../../claims/tilings-claim.js";
import { faulty, quote } from "../../outcomes/input-fault.js";
import { tilingsClaimJson } from "../../report/claim-json.js";
import { tilingsClaimText } from "../../report/claim-text.js";
import { isTilingKind, tilingKinds } from "../../tilings/tiling-kinds.js";
import { accept, type Job } from "../job.js";
import { EXIT } from "../request.js";
import { writeResult, writeUndecided } from "../result.js";
import { questionOf } from "../subject.js";

/** Matches components with tilings and prints the outcome. */
export const job: Job = (request, context) => {
  const question = tilingsQuestion(questionOf(request), request.settings.tilings);
  const claim = matchTilings(question, context.budget);
  if (claim.kind === "undecided") return writeUndecided(request, context, question, claim);
  const seconds = context.budget.elapsed();
  writeResult(
    request,
    context,
    () => tilingsClaimJson(claim, seconds),
    () => tilingsClaimText(claim, seconds),
  );
  if (!("verdict" in claim.matching)) return EXIT.undecided;
  return claim.matching.verdict === "holds" ? EXIT.holds : EXIT.fails;
};

function tilingsQuestion(question: Question, kind: string | undefined): TilingsQuestion {
  const { permutation } = question.ideal;
  if (permutation === undefined) {
    return accept(
      faulty({
        message: `${question.ideal.name} has no permutation whose tilings could be matched`,
        expected: "a schubert ideal, or a problem file with the key permutation",
      }),
    );
  }
  const kinds = Object.keys(tilingKinds).join(" or ");
  if (kind !== undefined) {
    if (isTilingKind(kind)) return { ...question, permutation, tilingKind: kind };
    return accept(faulty({ message: `unknown kind of tilings ${quote(kind)}`, expected: kinds }));
  }
  const suggested = suggestedTilings(question.order);
  if (suggested !== undefined) return { ...question, permutation, tilingKind: suggested };
  return accept(
    faulty({
      message: "the order takes neither all diagonal nor all antidiagonal terms of minors",
      expected: `--tilings with ${kinds}`,
    }),
  );
}
