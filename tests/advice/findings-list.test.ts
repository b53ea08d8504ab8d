import { describe, expect, it } from "vitest";
import { staleFiles } from "../../scripts/findings-table.mts";
import { FINDINGS } from "../../shared-lib/advice/findings/list.ts";
import { STEP_KINDS } from "../../shared-lib/advice/step-kinds/list.ts";

describe("the list of findings", () => {
  it("has codes of a family and a name, none twice", () => {
    const codes = FINDINGS.map((rule) => rule.code);
    expect(new Set(codes).size).toBe(codes.length);
    for (const code of codes) expect(code).toMatch(/^[a-z]+\/[a-z]+(-[a-z]+)*$/);
  });

  it("has a page for each that says what it looks for, when it keeps silent and its sources", () => {
    for (const { code, page } of FINDINGS) {
      for (const part of ["**Looks for**", "**Keeps silent**", "**Sources.**"]) expect(page, code).toContain(part);
    }
  });

  it("stands in the README and in docs/findings as the code has it", async () => {
    expect((await staleFiles()).map(([file]) => file)).toEqual([]);
  });
});

describe("the list of step kinds", () => {
  it("has a source for each, and ids that a directive can name", () => {
    expect(new Set(STEP_KINDS.map((kind) => kind.id)).size).toBe(STEP_KINDS.length);
    for (const kind of STEP_KINDS) {
      expect(kind.id).toMatch(/^[a-z]+(-[a-z]+)*$/);
      expect(kind.source.length, kind.id).toBeGreaterThan(10);
    }
  });
});
