/** `check --records` is a pure filter: a line in, a line out, whatever the lines hold, so that existing engines can drive it. */

import { spawnSync } from "node:child_process";
import { describe, expect, it } from "vitest";
import type { FileReport } from "../../shared-lib/model/contract.ts";
import { CHLORAL_NOTE, QUIET_NOTE } from "./folders.ts";
import { bundledTerminal, oxomargin, run } from "./run-terminal.ts";
import { fileProblems, schemaProblems } from "./valid-output.ts";

const record = (id: unknown, text: unknown): string => JSON.stringify({ id, text });

async function answers(lines: readonly string[]): Promise<readonly (FileReport & { id: unknown; error?: string })[]> {
  const { status, out, err } = await oxomargin(["check", "--records"], { input: `${lines.join("\n")}\n` });
  expect({ status, err }).toEqual({ status: 0, err: "" });
  return out
    .trimEnd()
    .split("\n")
    .map((line) => JSON.parse(line) as FileReport & { id: unknown; error?: string });
}

describe("check --records", () => {
  it("answers every line with a FileReport that bears the id, in order", async () => {
    const [first, second] = await answers([record("a-1", CHLORAL_NOTE), record(7, QUIET_NOTE)]);
    expect(schemaProblems("fileReport", first)).toBe("");
    expect(first && fileProblems(first, CHLORAL_NOTE)).toEqual([]);
    expect([first?.id, first?.path, second?.id, second?.path]).toEqual(["a-1", "a-1", 7, "7"]);
    expect(first?.charges.length).toBeGreaterThan(0);
  });

  it("answers bad lines with an error and goes on", async () => {
    const lines = [
      "{",
      "[]",
      "null",
      "",
      record("x", 5),
      '{"id":{},"text":"a"}',
      '{"text":"water"}',
      record("end", ""),
    ];
    const all = await answers(lines);
    expect(all).toHaveLength(lines.length);
    expect(all.map((one) => one.error !== undefined)).toEqual([true, true, true, true, true, true, false, false]);
    expect(all.map((one) => one.id)).toEqual([null, null, null, null, "x", null, null, "end"]);
    expect(all[0]?.error).toMatch(/no JSON: write \{"id"/);
  });

  it("is not led astray by a record that names the machinery of objects", async () => {
    const [one] = await answers(['{"id":"p","text":"water","__proto__":{"error":"x"},"constructor":1}']);
    expect(one).toMatchObject({ id: "p", path: "p" });
    expect(one?.error).toBeUndefined();
  });
});

const parallel = spawnSync("parallel", ["--version"]).status === 0;

describe.skipIf(!parallel)("GNU parallel (skipped when it is not installed)", () => {
  it("drives the filter with --pipe, and the order holds with -k", async () => {
    const lines = Array.from({ length: 60 }, (_, i) => record(i, i % 2 ? CHLORAL_NOTE : QUIET_NOTE));
    const command = `${process.execPath} ${await bundledTerminal()} check --records`;
    const { status, out } = await run("parallel", ["--pipe", "-k", "-j2", "-N20", command], {
      input: `${lines.join("\n")}\n`,
    });
    expect(status).toBe(0);
    expect(
      out
        .trimEnd()
        .split("\n")
        .map((line) => (JSON.parse(line) as { id: number }).id),
    ).toEqual(lines.map((_, i) => i));
  });
});
