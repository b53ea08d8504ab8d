/** The bundled example notes (an invented laboratory) between them show every finding, and one of them none. */

import { readdirSync, readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { FINDINGS } from "../../shared-lib/advice/findings/list.ts";
import { analyse } from "./analyse.ts";

const folder = new URL("../../media/example-notes/", import.meta.url);
const notes = readdirSync(folder).map((name) => {
  const text = readFileSync(new URL(name, folder), "utf8");
  return { name, findings: analyse(text, {}, name.endsWith(".txt") ? "plain" : "markdown").findings };
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

  it("warn of a charge weighed as another form, and of little else", () => {
    const warnings = notes.flatMap(({ findings }) => findings.filter(({ severity }) => severity === "warning"));
    expect(new Set(warnings.map(({ code }) => code))).toEqual(new Set(["charge/weighed-as-another-form"]));
  });
});
