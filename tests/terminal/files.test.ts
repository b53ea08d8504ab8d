/** What is read and what is left out, and what a faulty file system does: a message that names the file, and nothing lost. */

import { chmod, rm, symlink } from "node:fs/promises";
import path from "node:path";
import { describe, expect, it } from "vitest";
import { CHLORAL_NOTE, folderWith, QUIET_NOTE } from "./folders.ts";
import { oxomargin } from "./run-terminal.ts";

async function pathsOf(args: readonly string[], cwd: string): Promise<readonly string[]> {
  const { out } = await oxomargin(["check", ...args, "--format", "ndjson"], { cwd });
  return out
    .split("\n")
    .filter(Boolean)
    .map((line) => (JSON.parse(line) as { path: string }).path);
}

describe("which notes are read", () => {
  it("takes .md, .markdown and .txt, each once, in path order, and honours both ignore files", async () => {
    const cwd = await folderWith({
      "b.md": QUIET_NOTE,
      "a/z.txt": QUIET_NOTE,
      "a.markdown": QUIET_NOTE,
      "a/kept.md": QUIET_NOTE,
      "a/drafts/x.md": QUIET_NOTE,
      "a/drafts/wanted.md": QUIET_NOTE,
      "old/y.md": QUIET_NOTE,
      "data.csv": "a,b",
      "node_modules/m.md": QUIET_NOTE,
      ".gitignore": "old/\n",
      "a/.oxomarginignore": "drafts/*\n!drafts/wanted.md\n",
    });
    expect(await pathsOf([".", "b.md"], cwd)).toEqual([
      "a.markdown",
      "a/drafts/wanted.md",
      "a/kept.md",
      "a/z.txt",
      "b.md",
    ]);
  });

  it("takes a file that is named outright whatever its ending", async () => {
    const cwd = await folderWith({ "note.log": CHLORAL_NOTE });
    expect(await pathsOf(["note.log"], cwd)).toEqual(["note.log"]);
  });

  it("comes to an end where links lead in a circle", async () => {
    const cwd = await folderWith({ "in/a.md": QUIET_NOTE });
    await symlink(cwd, path.join(cwd, "in", "up"));
    await symlink("itself.md", path.join(cwd, "in", "itself.md"));
    expect(await pathsOf(["."], cwd)).toEqual(["in/a.md"]);
  });
});

describe("what cannot be read is named, the rest is reported, and the status is 2", () => {
  it("binary bytes and bytes that are no UTF-8", async () => {
    const cwd = await folderWith({
      "binary.txt": new Uint8Array([0x50, 0x4b, 3, 4, 0, 0, 1]),
      "latin.md": Buffer.concat([Buffer.from("# One\n\nat 25 "), Buffer.from([0xb0]), Buffer.from("C\n")]),
      "good.md": CHLORAL_NOTE,
    });
    const { status, out, err } = await oxomargin(["check", ".", "--format", "json"], { cwd });
    expect(status).toBe(2);
    expect((JSON.parse(out) as { files: { path: string }[] }).files.map((file) => file.path)).toEqual(["good.md"]);
    expect(err).toMatch(/binary\.txt: left out: it holds binary data \(a zero byte at byte 5\): save it as UTF-8 text/);
    expect(err).toMatch(/latin\.md: left out: line 3 is not UTF-8 \(byte 14\)/);
  });

  it("a folder and a file without permission", async () => {
    const cwd = await folderWith({ "shut/a.md": QUIET_NOTE, "closed.md": QUIET_NOTE, "open.md": QUIET_NOTE });
    await chmod(cwd, 0o755);
    await chmod(path.join(cwd, "shut"), 0o000);
    await chmod(path.join(cwd, "closed.md"), 0o000);
    // Root may read everything: then the command runs as nobody.
    const uid = process.getuid?.() === 0 ? { uid: 65534 } : {};
    const { status, out, err } = await oxomargin(["check", ".", "--format", "ndjson"], { cwd, ...uid });
    await chmod(path.join(cwd, "shut"), 0o755);
    expect(status).toBe(2);
    expect(out.trimEnd().split("\n")).toHaveLength(1);
    expect(err).toMatch(/shut: left out: no permission to look into it/);
    expect(err).toMatch(/closed\.md: left out: no permission to read it/);
  });

  it("a note that vanishes while the folder is read", async () => {
    const cwd = await folderWith({ "a.md": QUIET_NOTE });
    const { readText } = await import("../../client/terminal/read-text.ts");
    await rm(path.join(cwd, "a.md"));
    expect(await readText(path.join(cwd, "a.md"))).toEqual({ ok: false, problem: "it is no longer there" });
  });
});

describe("notes of every kind", () => {
  it("reads UTF-16 with its mark and UTF-8 with its mark", async () => {
    const wide = Buffer.from(`\uFEFF${CHLORAL_NOTE}`, "utf16le");
    const cwd = await folderWith({ "wide.md": wide, "marked.md": `\uFEFF${CHLORAL_NOTE}` });
    const { status, out } = await oxomargin(["check", ".", "--format", "ndjson"], { cwd });
    expect(status).toBe(0);
    for (const line of out.trimEnd().split("\n"))
      expect((JSON.parse(line) as { charges: unknown[] }).charges.length).toBeGreaterThan(0);
  });

  it("reads a note of CRLF lines with offsets in it", async () => {
    const text = CHLORAL_NOTE.replaceAll("\n", "\r\n");
    const { out } = await oxomargin(["check", "--stdin", "--name", "a.md", "--format", "ndjson"], { input: text });
    const { mentions } = JSON.parse(out) as { mentions: { start: number; end: number; text: string }[] };
    for (const mention of mentions) expect(text.slice(mention.start, mention.end)).toBe(mention.text);
  });

  it("reads an empty note", async () => {
    const { status, out } = await oxomargin(["check", "--stdin", "--name", "a.md"], { input: "" });
    expect({ status, out }).toMatchObject({ status: 0, out: expect.stringContaining("nothing to say") });
  });

  it("names a file of 10 MB as too long for a note, and reads 1 MB of open brackets", async () => {
    const cwd = await folderWith({
      "long.md": "stirred in water. ".repeat(600_000),
      "open.md": "[(".repeat(500_000),
      "open.txt": "((((12 g of ".repeat(85_000),
    });
    const { status, out, err } = await oxomargin(["check", ".", "--format", "ndjson"], { cwd });
    expect(status).toBe(2);
    expect(err).toBe(
      "oxomargin: long.md: left out: it has 10800000 characters, more than the 2000000 of the longest note: split it\n",
    );
    expect(out.trimEnd().split("\n")).toHaveLength(2);
  });
});
