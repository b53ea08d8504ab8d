/** `fix` prints what it would change, writes a file whole or not at all, and touches nothing else. */

import { chmod, lstat, readdir, readFile, stat, symlink } from "node:fs/promises";
import path from "node:path";
import { applyPatch } from "diff";
import { describe, expect, it } from "vitest";
import { applySafeFixes } from "../../client/terminal/fix.ts";
import type { Finding } from "../../shared-lib/advice/types.ts";
import { folderWith, QUIET_NOTE } from "./folders.ts";
import { oxomargin } from "./run-terminal.ts";

const finding = (...fixes: readonly (readonly [boolean, ...(readonly [number, number, string])[]])[]): Finding => ({
  code: "charge/test",
  severity: "note",
  start: 0,
  end: 1,
  message: "a test",
  fixes: fixes.map(([safe, ...edits]) => ({
    title: "mend",
    safe,
    edits: edits.map(([start, end, text]) => ({ start, end, text })),
  })),
});

describe("applySafeFixes", () => {
  it("takes the first safe fix of each finding and leaves the others", () => {
    const findings = [finding([false, [0, 1, "X"]], [true, [2, 3, "Y"]], [true, [4, 5, "Z"]])];
    expect(applySafeFixes("abcdef", findings)).toBe("abYdef");
  });

  it("takes a fix whole or not at all when it meets an earlier one", () => {
    const findings = [finding([true, [2, 4, "--"]]), finding([true, [0, 1, "X"], [3, 5, "Y"]])];
    expect(applySafeFixes("abcdef", findings)).toBe("ab--ef");
  });

  it("applies edits by their places in the text as written", () => {
    const findings = [finding([true, [5, 6, "longer"]]), finding([true, [0, 1, ""], [2, 2, "in"]])];
    expect(applySafeFixes("abcdef", findings)).toBe("bincdelonger");
  });
});

/** A note with a correction that needs no judgement. Our own invention. */
const SLIP = `# Trial

Butanal (7.21 g, 100 mol) in water (20 mL) was stirred at 25 °C for 2 h.
`;

describe("oxomargin fix", () => {
  it("prints a unified diff that patches the note into what --write makes of it", async () => {
    const cwd = await folderWith({ "a.md": SLIP, "b.md": QUIET_NOTE });
    const printed = await oxomargin(["fix", "."], { cwd });
    expect(printed).toMatchObject({ status: 0, err: "" });
    expect(await readFile(path.join(cwd, "a.md"), "utf8")).toBe(SLIP);
    const written = await oxomargin(["fix", ".", "--write"], { cwd });
    expect(written.status).toBe(0);
    const after = await readFile(path.join(cwd, "a.md"), "utf8");
    if (printed.out === "") expect(after).toBe(SLIP);
    else expect(applyPatch(SLIP, printed.out)).toBe(after);
    expect(await readFile(path.join(cwd, "b.md"), "utf8")).toBe(QUIET_NOTE);
    expect((await readdir(cwd)).sort()).toEqual(["a.md", "b.md"]);
    expect(await oxomargin(["fix", "."], { cwd })).toEqual({ status: 0, out: "", err: "" });
  });

  it("keeps the mode of the file and a link a link", async () => {
    const cwd = await folderWith({ "real.txt": SLIP });
    await chmod(path.join(cwd, "real.txt"), 0o640);
    await symlink("real.txt", path.join(cwd, "link.md"));
    await oxomargin(["fix", "link.md", "--write"], { cwd });
    expect((await lstat(path.join(cwd, "link.md"))).isSymbolicLink()).toBe(true);
    expect((await stat(path.join(cwd, "real.txt"))).mode & 0o777).toBe(0o640);
  });

  it("never rewrites what it cannot read without loss", async () => {
    const bytes = Buffer.concat([Buffer.from(SLIP), Buffer.from([0xe9])]);
    const cwd = await folderWith({ "latin.md": bytes, "wide.md": Buffer.from(`\uFEFF${SLIP}`, "utf16le") });
    const { status, err } = await oxomargin(["fix", ".", "--write"], { cwd });
    expect(status).toBe(2);
    expect(err).toMatch(/latin\.md: left out: line 4 is not UTF-8/);
    expect(err).toMatch(/wide\.md: left out: it is UTF-16/);
    expect(await readFile(path.join(cwd, "latin.md"))).toEqual(bytes);
  });
});
