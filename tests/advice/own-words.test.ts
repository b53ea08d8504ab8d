import { describe, expect, it } from "vitest";
import { withoutOwnWords } from "../../shared-lib/notes/own-words.ts";

describe("the program's own words in a note", () => {
  it("are blanked out at the same length", () => {
    const text =
      "Propanal (5.8 g) [in flask: 50 % hydrate, 50 mmol free] in water\n<!-- oxomargin ledger -->\n| x |\n<!-- /oxomargin ledger -->\nend";
    const blanked = withoutOwnWords(text);
    expect(blanked).toHaveLength(text.length);
    expect(blanked).toContain("Propanal (5.8 g) ");
    expect(blanked).toContain(" in water\n");
    expect(blanked.endsWith("\nend")).toBe(true);
    expect(blanked).not.toMatch(/hydrate|\| x/);
  });

  it("that lack their end hide nothing else", () => {
    const text = "a [in flask: b\nc ] d\n<!-- oxomargin ledger -->\nAcetaldehyde (4.4 g)";
    expect(withoutOwnWords(text)).toContain("b\nc ] d");
    expect(withoutOwnWords(text)).toContain("Acetaldehyde (4.4 g)");
  });

  it("take linear time, however they are broken", () => {
    const seconds = (times: number) => {
      const text = "[in flask: <!-- oxomargin ledger ".repeat(times);
      const start = performance.now();
      withoutOwnWords(text);
      return performance.now() - start;
    };
    seconds(10_000);
    // Four times the text takes about four times as long; quadratic time would take sixteen times.
    expect(seconds(40_000) / Math.max(1, seconds(10_000))).toBeLessThan(12);
  });
});
