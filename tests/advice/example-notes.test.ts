/** The bundled example notes (an invented laboratory) between them show every finding, and one of them none. */

import { readdirSync, readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { FINDINGS } from "../../shared-lib/advice/findings/list.ts";
import { analyse, applied } from "./analyse.ts";

const folder = new URL("../../media/example-notes/", import.meta.url);
const notes = readdirSync(folder).map((name) => {
  const text = readFileSync(new URL(name, folder), "utf8");
  return { name, text, findings: analyse(text, {}, name.endsWith(".txt") ? "plain" : "markdown").findings };
});

describe("example notes", () => {
  it("are six or more, one of them plain text", () => {
    expect(notes.length).toBeGreaterThanOrEqual(6);
    expect(notes.some(({ name }) => name.endsWith(".txt"))).toBe(true);
  });

  it("show every finding", () => {
    const seen = new Set(notes.flatMap(({ findings }) => findings.map(({ code }) => code)));
    const reading = [...seen].some((code) => code.startsWith("reading/"));
    const unseen = FINDINGS.map(({ code }) => code).filter(
      (code) => !seen.has(code) && !(reading && code.startsWith("reading/")),
    );
    expect(unseen).toEqual([]);
  });

  it("have one where nothing needs saying", () => {
    expect(notes.find(({ name }) => name === "6-nothing-to-say.md")?.findings).toEqual([]);
  });

  it("are mended by all safe fixes at once, and then have none left", () => {
    let made = 0;
    for (const { name, text, findings } of notes) {
      const safe = findings.flatMap(({ fixes }) => fixes.filter((fix) => fix.safe));
      made += safe.length;
      const all = { title: "all", edits: safe.flatMap(({ edits }) => edits), safe: true };
      const after = analyse(applied(text, all), {}, name.endsWith(".txt") ? "plain" : "markdown");
      expect(
        after.findings.flatMap(({ fixes }) => fixes.filter((fix) => fix.safe)),
        name,
      ).toEqual([]);
    }
    expect(made).toBeGreaterThanOrEqual(4);
  });

  it("warn of a charge weighed as another form, and of little else", () => {
    const warnings = notes.flatMap(({ findings }) => findings.filter(({ severity }) => severity === "warning"));
    expect(new Set(warnings.map(({ code }) => code))).toEqual(new Set(["charge/weighed-as-another-form"]));
  });
});
