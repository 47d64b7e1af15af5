/** The work of `flatlimit tilings`: counts, lists or draws; lists are written as they are found. */
import { printPermutation, readPermutation } from "../../combinatorics/permutation.js";
import { LimitReached } from "../../outcomes/budget.js";
import { faulty, quote } from "../../outcomes/input-fault.js";
import { drawTiling } from "../../tilings/drawing.js";
import type { Tiling } from "../../tilings/tiling.js";
import { isTilingKind, type TilingFamily, tilingKinds } from "../../tilings/tiling-kinds.js";
import { accept, type Job, type JobContext } from "../job.js";
import { EXIT, type JobRequest } from "../request.js";

/** Prints tilings or their number. */
export const job: Job = (request, context) => {
  const { settings, json } = request;
  const w = accept(readPermutation(request.subject));
  const family = familyOf(settings.kind);
  const listing = settings.all === true ? allOf(family) : family;
  const head = { permutation: printPermutation(w), kind: family.kind };
  try {
    if (settings.count === true || json) {
      const count = String(listing.count(w, context.budget));
      if (settings.count === true) {
        context.write(
          json ? `${JSON.stringify({ ...head, count, degree: count })}\n` : `${count}\n`,
        );
        return EXIT.holds;
      }
      writeJsonList(
        { ...head, count, degree: count },
        listing.enumerate(w, context.budget),
        context,
      );
      return EXIT.holds;
    }
    writeTextList(listing.enumerate(w, context.budget), settings.draw === true, context);
    return EXIT.holds;
  } catch (error) {
    if (!(error instanceof LimitReached)) throw error;
    return reportLimit(error, head, request, context);
  }
};

function familyOf(kind: string | undefined): TilingFamily {
  if (kind !== undefined && isTilingKind(kind)) return tilingKinds[kind];
  const expected = Object.keys(tilingKinds).join(" or ");
  return accept(faulty({ message: `unknown kind of tilings ${quote(kind ?? "")}`, expected }));
}

function allOf(family: TilingFamily): NonNullable<TilingFamily["all"]> {
  if (family.all !== undefined) return family.all;
  const message = `--all is not for ${family.kind} pipe dreams: they are enumerated reduced`;
  return accept(faulty({ message, expected: "--kind bumpless" }));
}

/* One object, written piece by piece, so that millions of tilings need no memory. */
function writeJsonList(head: object, tilings: Iterable<Tiling>, context: JobContext): void {
  context.write(`${JSON.stringify(head).slice(0, -1)},"tilings":[`);
  let separator = "";
  for (const { rows } of tilings) {
    context.write(separator + JSON.stringify(rows));
    separator = ",";
  }
  context.write("]}\n");
}

function writeTextList(tilings: Iterable<Tiling>, draw: boolean, context: JobContext): void {
  let separator = "";
  for (const tiling of tilings) {
    context.write(`${separator}${(draw ? drawTiling(tiling) : tiling.rows).join("\n")}\n`);
    separator = "\n";
  }
}

function reportLimit(
  { undecided }: LimitReached,
  head: object,
  { json, settings }: JobRequest,
  context: JobContext,
): number {
  // A list that has begun ends where it stands; its missing end says that it is not whole.
  if (json && settings.count === true) {
    const outcome = { ...head, verdict: "undecided", reason: undecided.reason };
    context.write(`${JSON.stringify(outcome)}\n`);
  }
  context.warn(`undecided: ${undecided.reason}`);
  return EXIT.undecided;
}
