/** `flatlimit limit`: the flat limit of an ideal and its components. */
import type { Command } from "commander";
import { runJob, withCommonOptions } from "../options.js";

/** Adds the command to the program. */
export function registerLimit(program: Command): void {
  const command = program
    .command("limit")
    .description("compute the flat limit, its primary components and their multiplicities")
    .argument("<ideal>", "a family member such as schubert:1432, or a problem file")
    .option("--generators <set>", "the generating set to start from")
    .option("--order <order>", 'the term order, such as "revlex from nw by rows"');
  withCommonOptions(command)
    .addHelpText(
      "after",
      `
Example:
  flatlimit limit schubert:1432 --order "revlex from nw by rows"`,
    )
    .action((ideal: string, options) => runJob("limit", ideal, options));
}
