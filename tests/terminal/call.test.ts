/** How a call is read: help, version, exit status, and messages that name the mend. */

import { describe, expect, it } from "vitest";
import { CHLORAL_NOTE, QUIET_NOTE } from "./folders.ts";
import { oxomargin } from "./run-terminal.ts";

describe("help and version", () => {
  it.each([["--help"], ["check", "--help"], ["estimate", "-h"], ["fix", "--help"], ["serve", "--help"]])(
    "prints a page for %s %s",
    async (...args) => {
      const { status, out, err } = await oxomargin(args.filter(Boolean));
      expect({ status, err }).toEqual({ status: 0, err: "" });
      expect(out).toMatch(/^oxomargin/);
      expect(Math.max(...out.split("\n").map((line) => line.length))).toBeLessThanOrEqual(124);
    },
  );

  it("names the version of the program and of the tables", async () => {
    expect((await oxomargin(["--version"])).out).toMatch(/^\d+\.\d+\.\d+ \(tables [0-9a-f]{12}\)\n$/);
  });
});

describe("exit status", () => {
  const stdin = (text: string, failOn: string) =>
    oxomargin(["check", "--stdin", "--name", "trial.md", "--fail-on", failOn], { input: text });

  it("is 0 below the severity that fails, 1 at or above it", async () => {
    expect((await stdin(CHLORAL_NOTE, "never")).status).toBe(0);
    expect((await stdin(CHLORAL_NOTE, "hint")).status).toBe(1);
    expect((await stdin(QUIET_NOTE, "hint")).status).toBe(0);
  });
});

describe("a call that cannot be used ends with status 2, nothing on standard output, and the mend", () => {
  const calls: readonly (readonly [string, readonly string[], RegExp])[] = [
    ["an unknown call", ["chekc"], /"chekc" is no call: check, estimate, fix or serve/],
    ["an unknown option", ["check", "x.md", "--fromat", "json"], /--fromat.*oxomargin check --help/],
    ["an option of another call", ["fix", "x.md", "--pH", "7"], /--pH.*oxomargin fix --help/],
    ["no path", ["check"], /needs a file or folder/],
    ["a path that is not there", ["check", "no-such-note.md"], /no-such-note\.md: no such file or folder/],
    ["an unknown format", ["check", "x.md", "--format", "pdf"], /--format must be one of text, json/],
    ["an unknown severity", ["check", "x.md", "--fail-on", "error"], /--fail-on must be one of never, hint/],
    ["no threads", ["check", "x.md", "--jobs", "0"], /--jobs must be a whole number from 1 to 64, not "0"/],
    ["standard input without a name", ["check", "--stdin"], /--stdin needs --name NAME\.md/],
    ["nothing to estimate", ["estimate"], /needs one SMILES, name or CAS number/],
    ["an open branch", ["estimate", "CC(C=O"], /branch is not closed.*character/],
    ["an unclosed ring", ["estimate", "O=Cc1ccccc"], /ring/],
    ["a five-valent carbon", ["estimate", "CC(C)(C)(C)C=O"], /carbon|valence|bond/i],
    ["no such temperature", ["estimate", "CC=O", "--at", "-400"], /-400.*no temperature lies below/],
    ["no number", ["estimate", "CC=O", "--pH", "acid"], /--pH must be a number from -2 to 16, not "acid"/],
    ["an unknown medium", ["estimate", "CC=O", "--in", "brindle oil"], /--in: .*brindle/],
    ["a range upside down", ["estimate", "CC=O", "--at", "60..0"], /--at: the range 60\.\.0 must run/],
    ["too many points", ["estimate", "CC=O", "--at", "0..60/100", "--pH", "1..9/100"], /at most 1000/],
    ["no path to correct", ["fix"], /fix needs a file or folder/],
  ];
  it.each(calls)("%s", async (_, args, says) => {
    const { status, out, err } = await oxomargin(args);
    expect({ status, out }).toEqual({ status: 2, out: "" });
    expect(err).toMatch(says);
    expect(err).not.toMatch(/fault of the program|\n.*at /);
  });
});

describe("estimate in text", () => {
  it("prints shares with bounds and how they were reached", async () => {
    const { out } = await oxomargin(["estimate", "acetaldehyde"]);
    expect(out).toMatch(/gem-diol hydrate +5\d % \(\d+ to \d+\)/);
    expect(out).toMatch(/How it was reached/);
  });

  it("prints a table over a range", async () => {
    const { out } = await oxomargin(["estimate", "acetaldehyde", "--at", "0..60"]);
    expect(out.trimEnd().split("\n")).toHaveLength(9);
    expect(out).toMatch(/^T +free carbonyl/m);
  });
});
