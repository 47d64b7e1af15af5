/** `flatlimit tilings`: enumerate, count and draw the tilings of a permutation. */
import type { Command } from "commander";
import { runJob, withCommonOptions } from "../options.js";

/** Adds the command to the program. */
export function registerTilings(program: Command): void {
  const command = program
    .command("tilings")
    .description("list, count or draw the tilings of a permutation")
    .argument("<permutation>", "in one-line notation, such as 2143 or 2,1,4,3")
    .requiredOption("--kind <kind>", "ordinary or bumpless")
    .option("--all", "not only reduced ones (bumpless)")
    .option("--count", "count without listing")
    .option("--draw", "draw with box characters");
  withCommonOptions(command)
    .addHelpText(
      "after",
      `
Example:
  flatlimit tilings 2143 --kind bumpless --draw`,
    )
    .action((permutation: string, options) => runJob("tilings", permutation, options));
}
