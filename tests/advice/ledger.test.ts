import { describe, expect, it } from "vitest";
import { contextOf } from "../../shared-lib/advice/context.ts";
import { ledgerOf } from "../../shared-lib/advice/ledger/build.ts";
import { ledgerActions } from "../../shared-lib/advice/ledger/in-note.ts";
import type { StepLedger } from "../../shared-lib/advice/ledger/types.ts";
import { ledgerCsv, ledgerMarkdown } from "../../shared-lib/advice/ledger/write.ts";
import { analyse, applied, inputOf } from "./analyse.ts";

const NOTE = `# Trial (an invented case)

Formalin (8.12 g, 100 mmol, 1.0 equiv) was added to phenylmagnesium bromide (1.0 M in THF, 200 mL, 200 mmol, 2.0 equiv) in dry THF (100 mL) at 0 °C.
`;

function ledgersOf(text: string): readonly StepLedger[] {
  const context = contextOf(inputOf(text));
  return context.steps.map((step) => ledgerOf(context, step));
}

describe("the ledger of a step", () => {
  it("says what each charge is, and the water against what it destroys", () => {
    const [ledger] = ledgersOf(NOTE);
    const formalin = ledger?.rows.find((row) => row.name === "formaldehyde");
    expect(formalin).toMatchObject({ form: "formalin", formIs: "written", assay: 0.37, equivalents: 1 });
    expect(formalin?.amount?.value).toBeCloseTo(0.1, 6);
    expect(formalin?.water).toBeGreaterThan(0.2);
    expect(ledger?.equivalentMol).toBeCloseTo(0.1, 6);
    expect(ledger?.waterAgainst[0]?.partner).toBe("phenylmagnesium bromide");
    expect(ledger?.waterAgainst[0]?.equivalents).toBeCloseTo((formalin?.water ?? 0) / 0.2, 2);
    // "Dry": no water of the bottle is counted.
    expect(ledger?.water.inSolventGrade).toBe(0);
  });

  it("counts free equivalents with bounds around them", () => {
    const [ledger] = ledgersOf("Acetaldehyde (4.41 g, 100 mmol, 1.0 equiv) was stirred in water (500 mL).");
    const free = ledger?.rows[0]?.freeEquivalents;
    expect(free?.low).toBeLessThan(free?.value ?? 0);
    expect(free?.high).toBeGreaterThan(free?.value ?? 1);
    // Half of it or so is hydrate (common practice, no source: K about 1).
    expect(free?.value).toBeGreaterThan(0.35);
    expect(free?.value).toBeLessThan(0.65);
  });

  it("is inserted behind its step, read past, renewed when the charge changes, and then up to date", () => {
    const insert = ledgerActions(inputOf(NOTE), NOTE.indexOf("Formalin"))[0];
    if (!insert) throw new Error("no ledger is offered");
    const withLedger = applied(NOTE, insert);
    expect(withLedger.startsWith(NOTE.trimEnd())).toBe(true);
    expect(ledgerActions(inputOf(withLedger), NOTE.indexOf("Formalin"))).toEqual([]);
    expect(analyse(withLedger).charges.map(({ total }) => total?.value)).toEqual(
      analyse(NOTE).charges.map(({ total }) => total?.value),
    );
    const changed = withLedger.replace("8.12 g, 100 mmol", "4.06 g, 50.0 mmol");
    const stale = analyse(changed).findings.find(({ code }) => code === "ledger/out-of-date");
    expect(stale?.fixes[0]?.safe).toBe(true);
    const renewed = applied(changed, stale?.fixes[0] ?? { title: "", edits: [], safe: false });
    expect(renewed).toContain("50.0 mmol");
    expect(analyse(renewed).findings.some(({ code }) => code === "ledger/out-of-date")).toBe(false);
  });

  it("keeps Windows line ends", () => {
    const note = NOTE.replaceAll("\n", "\r\n");
    const insert = ledgerActions(inputOf(note), note.indexOf("Formalin"))[0];
    expect(insert?.edits[0]?.text.replaceAll("\r\n", "")).not.toContain("\n");
  });

  it("is a Markdown table and CSV that nothing in a name can break", () => {
    const [ledger] = ledgersOf(NOTE);
    if (!ledger) throw new Error("no ledger");
    const hostile: StepLedger = { ...ledger, rows: ledger.rows.map((row) => ({ ...row, name: '=a|b"c\nd' })) };
    const lines = ledgerMarkdown(hostile).split("\n");
    const bars = (line: string) => line.replaceAll("\\|", "").split("|").length;
    expect(new Set(lines.filter((line) => line.startsWith("|")).map(bars)).size).toBe(1);
    expect(ledgerCsv([hostile])).toContain(`"'=a|b""c`);
    expect(ledgerCsv([ledger]).split("\r\n")[0]?.split(",")).toHaveLength(
      ledgerCsv([ledger]).split("\r\n")[1]?.split(",").length ?? 0,
    );
  });
});
