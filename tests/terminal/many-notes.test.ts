/** Many notes: threads change nothing but the time, and a folder of kept results changes nothing at all. */

import { readdir, readFile, writeFile } from "node:fs/promises";
import path from "node:path";
import { describe, expect, it } from "vitest";
import { CHLORAL_NOTE, folderWith, QUIET_NOTE } from "./folders.ts";
import { oxomargin } from "./run-terminal.ts";

function archive(count: number): Record<string, string> {
  const files: Record<string, string> = {};
  for (let i = 0; i < count; i++)
    files[`s${i % 7}/note-${i}.md`] =
      i % 3 === 0 ? QUIET_NOTE : CHLORAL_NOTE.replace("1.65 g", `${(i / 100 + 1).toFixed(2)} g`);
  return files;
}

describe("--jobs", () => {
  it.each(["ndjson", "json", "sarif", "html"])(
    "gives the same bytes with one thread and with three: %s",
    async (format) => {
      const cwd = await folderWith(archive(40));
      const one = await oxomargin(["check", ".", "--format", format, "--jobs", "1"], { cwd });
      const three = await oxomargin(["check", ".", "--format", format, "--jobs", "3"], { cwd });
      expect(three).toEqual(one);
      expect(one.status).toBe(0);
    },
  );

  it("keeps the order of the report and of the messages when notes fail", async () => {
    const cwd = await folderWith({ ...archive(20), "s3/bad.md": new Uint8Array([0, 1, 2]) as unknown as string });
    const { status, out, err } = await oxomargin(["check", ".", "--format", "ndjson", "--jobs", "2"], { cwd });
    expect(status).toBe(2);
    expect(out.trimEnd().split("\n")).toHaveLength(20);
    expect(err).toMatch(/^oxomargin: s3\/bad\.md: left out: it holds binary data/);
  });
});

describe("--cache", () => {
  const kept = async (cwd: string): Promise<readonly string[]> =>
    (await readdir(path.join(cwd, "kept"), { recursive: true })).filter((name) => name.endsWith(".json"));
  const check = (cwd: string) => oxomargin(["check", "notes", "--format", "json", "--cache", "kept"], { cwd });

  it("answers the same from kept results, and again after a note changed or results were torn", async () => {
    const cwd = await folderWith({ "notes/a.md": CHLORAL_NOTE, "notes/b.md": QUIET_NOTE });
    const plain = await oxomargin(["check", "notes", "--format", "json"], { cwd });
    expect(await check(cwd)).toEqual(plain);
    expect(await kept(cwd)).toHaveLength(2);
    expect(await check(cwd)).toEqual(plain);

    for (const name of await kept(cwd)) {
      const file = path.join(cwd, "kept", name);
      await writeFile(file, (await readFile(file, "utf8")).slice(0, 40));
    }
    expect(await check(cwd)).toEqual(plain);

    await writeFile(path.join(cwd, "notes", "b.md"), CHLORAL_NOTE);
    const changed = JSON.parse((await check(cwd)).out) as { files: { charges: unknown[] }[] };
    expect(changed.files[1]?.charges.length).toBeGreaterThan(0);
  });

  it("really reads what it keeps", async () => {
    const cwd = await folderWith({ "notes/a.md": QUIET_NOTE });
    await check(cwd);
    const [name = ""] = await kept(cwd);
    const file = path.join(cwd, "kept", name);
    const value = JSON.parse(await readFile(file, "utf8")) as object;
    await writeFile(file, JSON.stringify({ ...value, piece: '{"marked":true}' }));
    expect((await check(cwd)).out).toMatch(/"marked":true/);
  });

  it("does without a folder that cannot be written", async () => {
    const cwd = await folderWith({ "notes/a.md": QUIET_NOTE, kept: "a file stands here" });
    expect(await check(cwd)).toEqual(await oxomargin(["check", "notes", "--format", "json"], { cwd }));
  });
});
