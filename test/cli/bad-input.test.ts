import { mkdtempSync, symlinkSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { describe, expect, it } from "vitest";
import { flatlimit } from "../support/program.js";

const folder = mkdtempSync(join(tmpdir(), "flatlimit-"));

function file(name: string, content: string | Uint8Array): string {
  const path = join(folder, name);
  writeFileSync(path, content);
  return path;
}

function garbage(): Uint8Array {
  const bytes = new Uint8Array(10_000_000);
  let state = 12_345;
  for (let k = 0; k < bytes.length; k++) {
    state = (Math.imul(state, 1_103_515_245) + 12_345) | 0;
    bytes[k] = state >>> 16;
  }
  return bytes;
}

const broken = join(folder, "broken.yaml");
symlinkSync(join(folder, "nowhere.yaml"), broken);

describe("bad input ends with status 2 and one clear message", () => {
  it.each<[string[], RegExp]>([
    [["verify", "schubert:1223"], /the value 2 stands twice/],
    [["verify", "schubert:0"], /0 is no(t| permutation)|"0" is no permutation/],
    [["verify", "schubert:99999999999"], /99999999999/],
    [["verify", "schubert:"], /schubert needs a permutation/],
    [["verify", "schubert:1,2,x"], /"?x"?/],
    [["verify", "schubert"], /schubert needs a permutation/],
    [["verify", "shubert:21"], /unknown family "shubert"\n {2}expected schubert/],
    [["verify", ""], /the ideal is empty/],
    [["verify", "determinantal:3,4"], /determinantal/],
    [["verify", "determinantal:3,4,5"], /determinantal/],
    [["verify", "asm:++/++"], /alternate/],
    [["verify", "partial:2,2"], /two dots in one column/],
    [
      ["verify", "schubert:21", "--order", "lex from xx by rows"],
      /unknown corner "xx"\n.*\n.*\^\n {2}expected one of nw, ne, sw, se/,
    ],
    [["verify", "schubert:21", "--order", "lux from nw by rows"], /unknown rule "lux"/],
    [["verify", "schubert:21", "--order", ""], /the order is empty/],
    [["verify", "schubert:21", "--order", "dual from nw by rows"], /pair/],
    [["verify", "schubert:21", "--order", "weights (1,2) then graded lex"], /4 weights/],
    [["verify", "schubert:21", "--order", "plain revlex from nw by rows"], /z\d\d/],
    [["verify", "schubert:21", "--order"], /argument missing/],
    [
      ["verify", "schubert:21", "--generators", "fultan"],
      /no generating set "fultan"\n {2}expected one of fulton, cdg, defining/,
    ],
    [["verify", "schubert:21", "--seconds", "0"], /positive number of seconds/],
    [["verify", "schubert:21", "--seconds", "abc"], /positive number of seconds/],
    [["verify", "schubert:21", "--memory", "12"], /with its unit/],
    [["verify", "schubert:21", "--speed"], /unknown option/],
    [["verify"], /missing required argument/],
    [["verify", "schubert:21", "schubert:12"], /too many arguments/],
    [["prove", "schubert:21"], /unknown command/],
    [["match", "determinantal:3,3,1"], /has no permutation/],
    [
      ["match", "schubert:132", "--tilings", "square"],
      /unknown kind of tilings "square"\n {2}expected ordinary or bumpless/,
    ],
    [
      ["match", "schubert:132", "--order", "cells lex (z12,z11,z13,z21,z22,z23,z31,z32,z33)"],
      /--tilings/,
    ],
    [["tilings", "2143"], /--kind/],
    [["tilings", "2143", "--kind", "generic2"], /unknown kind/],
    [["tilings", "2143", "--kind", "ordinary", "--all"], /--all is not for ordinary/],
    [["tilings", "2133", "--kind", "ordinary"], /stands twice/],
    [["verify", folder], /this is a directory/],
    [["verify", join(folder, "missing.yaml")], /there is no such file/],
    [["verify", broken], /there is no such file/],
    [["verify", file("empty.yaml", "")], /empty\.yaml:1:1: the file is empty/],
    [["verify", file("garbage.yaml", garbage())], /the file is too large \(10000000 bytes\)/],
    [["verify", file("latin.yaml", Uint8Array.of(0x74, 0xe9, 0x3a, 0x20, 0x31))], /not UTF-8/],
    [
      ["verify", file("key.yaml", "ideall: {family: schubert:21}\n")],
      /key\.yaml:1:1: unknown key "ideall"/,
    ],
    [
      [
        "verify",
        file("wrong.yaml", "variables: {names: [x, y]}\nideal:\n  polynomials:\n    - x*y - w^2\n"),
      ],
      /wrong\.yaml:4:13: unknown variable "w"\n {2}4 \| {5}- x\*y - w\^2\n/,
    ],
  ])("flatlimit %j", (args, message) => {
    const { status, stdout, stderr } = flatlimit(...args);
    expect(stderr).toMatch(/^flatlimit: /);
    expect(stderr).toMatch(message);
    expect(stderr).not.toMatch(/^ +at /m);
    expect(stderr.match(/^flatlimit: /gm)).toHaveLength(1);
    expect(stdout).toBe("");
    expect(status).toBe(2);
  });

  it("is also refused when JSON was asked for: nothing on standard output", () => {
    const { status, stdout, stderr } = flatlimit("verify", "schubert:1223", "--json");
    expect([status, stdout]).toEqual([2, ""]);
    expect(stderr).toContain("stands twice");
  });
});
