/** Each finding on notes where it must speak and where it must keep silent. The notes are invented. */

import { describe, expect, it } from "vitest";
import { advise } from "../../shared-lib/advice/advise.ts";
import { FINDINGS } from "../../shared-lib/advice/findings/list.ts";
import { analyse, findingsOf, inputOf } from "./analyse.ts";

interface Case {
  readonly speaks: readonly string[];
  readonly silent: readonly string[];
}

const CASES: Readonly<Record<string, Case>> = {
  "forms/mostly-hydrated": {
    speaks: [
      "1,1,1-Trifluoroacetone (11.2 g, 100 mmol) was stirred in water (500 mL).",
      "Benzylamine (10.7 g, 100 mmol) and 1,1,1-trifluoroacetone (11.2 g, 100 mmol) were stirred in water (500 mL).",
    ],
    silent: [
      "Benzaldehyde (10.6 g, 100 mmol) was stirred in water (500 mL).",
      "Acetone (5.81 g, 100 mmol) was stirred in water (500 mL).",
      "Acetaldehyde (4.41 g, 100 mmol) and hydroxylamine hydrochloride (6.95 g, 100 mmol) were stirred in water (100 mL).",
      "Acetaldehyde (4.41 g, 100 mmol) and sodium hypochlorite (7.44 g, 100 mmol) were stirred in water (500 mL).",
      "1,1,1-Trifluoroacetone (11.2 g, 100 mmol) [in flask: 97 % hydrate, 3.21 mmol free] was stirred in water (500 mL).",
    ],
  },
  "forms/mostly-hemiacetal": {
    speaks: [
      "Propanal (5.81 g, 100 mmol) was stirred in methanol (200 mL).",
      "4-Nitrobenzaldehyde (15.1 g, 100 mmol) and benzylamine (10.7 g, 100 mmol) were stirred in methanol (500 mL).",
    ],
    silent: [
      "4-Methoxybenzaldehyde (13.6 g, 100 mmol) was stirred in methanol (200 mL).",
      "Propanal (5.81 g, 100 mmol) was stirred in THF (200 mL).",
      "4-Nitrobenzaldehyde (15.1 g, 100 mmol) and sodium borohydride (1.9 g, 50 mmol) were stirred in methanol (200 mL).",
    ],
  },
  "forms/ring-closed": {
    speaks: [
      "5-Hydroxypentanal (1.02 g, 10.0 mmol) was stirred in dichloromethane (50 mL).",
      "5-Hydroxypentanal (1.02 g, 10.0 mmol) was stirred in THF (50 mL).",
    ],
    silent: [
      "Pentanal (0.86 g, 10.0 mmol) was stirred in dichloromethane (50 mL).",
      "Glucose (1.80 g, 10.0 mmol) was stirred in water (50 mL).",
    ],
  },
  "forms/oligomer-not-released": {
    speaks: [
      "1,3,5-Trioxane (9.0 g, 0.30 mol) was stirred in acetonitrile (100 mL) at 20 °C for 3 h.",
      "Paraformaldehyde (3.2 g, 100 mmol) was stirred in THF (100 mL) at 20 °C for 3 h.",
    ],
    silent: [
      "Paraformaldehyde (3.2 g, 100 mmol) was stirred in ethanol (100 mL) at 70 °C for 3 h.",
      "1,3,5-Trioxane (9.0 g, 0.30 mol) and sulfuric acid (1.0 g) were stirred in acetonitrile (100 mL).",
      "Formalin (8.1 mL) was stirred in water (100 mL) at 20 °C.",
    ],
  },
  "charge/weighed-as-another-form": {
    speaks: [
      "Chloral hydrate (14.7 g, 100 mmol) was stirred in THF (500 mL).",
      "Glyoxal (40 wt% in water, 5.80 g, 100 mmol) was stirred in THF (500 mL).",
      "37% aqueous formaldehyde (3.00 g, 100 mmol) was stirred in THF (500 mL).",
      "Glyoxylic acid monohydrate (7.40 g, 1.0 equiv) was added to benzylamine (10.7 g, 100 mmol, 1.0 equiv) in THF (100 mL).",
    ],
    silent: [
      "Chloral hydrate (16.5 g, 100 mmol) was stirred in THF (500 mL).",
      "Glyoxal (40 wt% in water, 14.5 g, 100 mmol) was stirred in THF (500 mL).",
      "Chloral hydrate (ca. 15 g, 100 mmol) was stirred in THF (500 mL).",
      "Paraformaldehyde (3.00 g, 100 mmol) was stirred in THF (500 mL).",
      "1,3,5-Trioxane (9.01 g, 100 mmol) was stirred in THF (500 mL).",
    ],
  },
  "charge/amounts-disagree": {
    speaks: [
      "Butanal (7.21 mg, 100 mmol) was stirred in THF (50 mL).",
      "Butanal (7.21 mL, 100 mmol) was stirred in THF (50 mL).",
      "Benzaldehyde (10.6 g, 100 mmol, 1.0 equiv), benzylamine (10.7 g, 100 mmol, 1.0 equiv) and propanal (5.81 g, 100 mmol, 1.5 equiv) were stirred in THF (50 mL).",
      "Benzaldehyde (10.6 g, 1.00 mol) was stirred in THF (50 mL).",
    ],
    silent: [
      "Butanal (7.21 g, 100 mmol) was stirred in THF (50 mL).",
      "Butanal (9.0 mL, 100 mmol) was stirred in THF (50 mL).",
      "Butanal (7 g, 0.1 mol) was stirred in THF (50 mL).",
      "Glycolaldehyde dimer (6.0 g, 50 mmol) was stirred in THF (50 mL).",
      "Sodium acetate (13.6 g, 100 mmol) was stirred in THF (50 mL).",
    ],
  },
  "charge/impossible-concentration": {
    speaks: [
      "Chloroacetaldehyde (75 M in water, 10 mL) was stirred in water (100 mL).",
      "Acetaldehyde (50 M in THF, 10 mL) was stirred in THF (100 mL).",
    ],
    silent: [
      "Acetaldehyde (5.0 M in THF, 10 mL) was stirred in THF (100 mL).",
      "Phenylmagnesium bromide (1.0 M in THF, 10 mL) was stirred in THF (100 mL).",
    ],
  },
  "charge/no-density": {
    speaks: ["Succinaldehyde (40 wt% in water, 12 mL) was stirred in water (80 mL)."],
    silent: [
      "Formalin (8.1 mL) was stirred in water (80 mL).",
      "Succinaldehyde (40 wt% in water, 12 mL, 60 mmol) was stirred in water (80 mL).",
    ],
  },
  "medium/water-carried-in": {
    speaks: [
      "Formalin (8.1 mL, 110 mmol) was added to phenylmagnesium bromide (1.0 M in THF, 100 mL).",
      "Chloral hydrate (16.5 g, 100 mmol) in THF (100 mL) was treated with n-butyllithium (2.5 M in hexane, 44 mL).",
    ],
    silent: [
      "Paraformaldehyde (3.2 g, 100 mmol) was added to phenylmagnesium bromide (1.0 M in THF, 100 mL).",
      "Benzaldehyde (10.6 g, 100 mmol) was added to phenylmagnesium bromide (1.0 M in THF, 100 mL).",
      "Formalin (8.1 mL, 110 mmol) was added to benzylamine (10.7 g, 100 mmol) in THF (100 mL).",
    ],
  },
  "medium/methanol-from-formalin": {
    speaks: [
      "Formalin (8.12 g, 100 mmol) and hydrochloric acid (1.0 mL) were heated in water (50 mL).",
      "Formalin (8.12 g, 100 mmol) and acetophenone (12.0 g, 100 mmol) were heated in water (50 mL).",
    ],
    silent: [
      "Formalin (8.12 g, 100 mmol) was heated in water (50 mL).",
      "Formalin (8.12 g, 100 mmol) and hydrochloric acid (1.0 mL) were heated in methanol (50 mL).",
    ],
  },
  "medium/bound-by-nucleophile": {
    speaks: [
      "Benzaldehyde (1.06 g, 10 mmol), nitromethane (0.61 g, 10 mmol), hydroxylamine hydrochloride (0.69 g, 10 mmol) and sodium bisulfite (1.04 g, 10 mmol) were stirred in water (100 mL).",
    ],
    silent: [
      "Glutaraldehyde (25 wt% in water, 4.0 mL) was stirred in PBS (100 mL).",
      "Propanal (5.81 g, 100 mmol) and sodium bisulfite (10.4 g, 100 mmol) were stirred in water (100 mL).",
    ],
  },
  "medium/acetal-will-form": {
    speaks: [
      "Benzaldehyde (10.6 g, 100 mmol) and sulfuric acid (0.50 g, 5.1 mmol) were stirred in methanol (200 mL).",
      "Butanal (7.21 g, 100 mmol) and p-toluenesulfonic acid (0.95 g, 5.0 mmol) were stirred in ethanol (200 mL).",
    ],
    silent: [
      "Benzaldehyde (10.6 g, 100 mmol) was stirred in methanol (200 mL).",
      "Benzaldehyde (10.6 g, 100 mmol) and sulfuric acid (0.50 g, 5.1 mmol) were stirred in water (200 mL).",
      "Benzaldehyde (10.6 g, 100 mmol), hydroxylamine hydrochloride (6.9 g, 100 mmol) and sulfuric acid (0.50 g, 5.1 mmol) were stirred in methanol (200 mL).",
    ],
  },
  "time/not-at-equilibrium": {
    speaks: [
      "Acetaldehyde (4.41 g, 100 mmol) was stirred in water (500 mL) at 5 °C for 1 s. Benzylamine (10.7 g, 100 mmol) was added and the mixture was stirred for 1 h.",
    ],
    silent: [
      "Acetaldehyde (4.41 g, 100 mmol) was stirred in water (500 mL) at 25 °C for 12 h. Benzylamine (10.7 g, 100 mmol) was added and the mixture was stirred for 1 h.",
      "Acetaldehyde (4.41 g, 100 mmol) was stirred in water (500 mL). Benzylamine (10.7 g, 100 mmol) was added.",
    ],
  },
  "time/long-standing-solution": {
    speaks: [
      "Stock solution: benzaldehyde (10.6 g, 100 mmol) and sodium hydroxide (4.0 g, 100 mmol) were stirred in water (1 L) for 24 h.",
    ],
    silent: [
      "Stock solution: benzaldehyde (10.6 g, 100 mmol) was stirred in water (1 L) for 24 h.",
      "Stock solution: benzaldehyde (10.6 g, 100 mmol) and sodium hydroxide (4.0 g, 100 mmol) were stirred in water (1 L) for 1 h.",
    ],
  },
  "ledger/out-of-date": {
    speaks: [
      "1,1,1-Trifluoroacetone (11.2 g, 100 mmol) [in flask: 40 % hydrate, 60 mmol free] was stirred in water (500 mL).",
    ],
    silent: ["1,1,1-Trifluoroacetone (11.2 g, 100 mmol) was stirred in water (500 mL)."],
  },
  "hazard/caution": {
    speaks: [
      "Formalin (8.12 g, 100 mmol) was heated in water (50 mL).",
      "Sodium cyanide (4.9 g, 100 mmol) and acetic acid (6.0 g, 100 mmol) were stirred with benzaldehyde (10.6 g, 100 mmol) in water (50 mL).",
    ],
    silent: [
      "Benzaldehyde (10.6 g, 100 mmol) was stirred in water (50 mL).",
      "Sodium cyanide (4.9 g, 100 mmol) was stirred with benzaldehyde (10.6 g, 100 mmol) in water (50 mL).",
    ],
  },
};

describe.each(Object.entries(CASES))("%s", (code, { speaks, silent }) => {
  it.each(speaks)("speaks: %s", (note) => {
    const found = findingsOf(note, code);
    expect(found.length, JSON.stringify(analyse(note).findings.map((row) => [row.code, row.message]))).toBeGreaterThan(
      0,
    );
    for (const { message, start, end } of found) {
      expect(message).not.toMatch(/NaN|undefined|Infinity/);
      expect(note.slice(start, end).length).toBeGreaterThan(0);
    }
  });

  it.each(silent)("keeps silent: %s", (note) => {
    expect(findingsOf(note, code).map(({ message }) => message)).toEqual([]);
  });
});

describe("findings as a whole", () => {
  it("say nothing about solvents, products in titles, acids, esters, amides and dry media", () => {
    const notes = [
      "# 1-Phenylbut-3-en-1-one\n\nThe residue was washed with acetone (2 × 50 mL).",
      "Ethyl acetate (88 g), acetic acid (60 g) and N,N-dimethylformamide (73 g) were stirred in THF (100 mL).",
      "Benzaldehyde (10.6 g, 100 mmol) was added to allylmagnesium bromide (1.0 M in THF, 110 mL) in dry THF (100 mL).",
    ];
    for (const note of notes) expect(analyse(note).findings).toEqual([]);
  });

  it("are switched off and made louder by the settings", () => {
    const note = "Propanal (5.81 g, 100 mmol) was stirred in methanol (200 mL).";
    expect(findingsOf(note, "forms/mostly-hemiacetal", { findings: { "forms/mostly-hemiacetal": "off" } })).toEqual([]);
    const loud = findingsOf(note, "forms/mostly-hemiacetal", { findings: { "forms/mostly-hemiacetal": "warning" } });
    expect(loud[0]?.severity).toBe("warning");
    expect(findingsOf(note, "forms/mostly-hemiacetal", { boundShare: 0.999 })).toEqual([]);
  });

  it("are silenced by a directive for the next line", () => {
    const note = "Propanal (5.81 g, 100 mmol) was stirred in methanol (200 mL).";
    const silenced = `<!-- oxomargin: silence forms/mostly-hemiacetal known -->\n${note}\n`;
    expect(findingsOf(silenced, "forms/mostly-hemiacetal")).toEqual([]);
    expect(
      findingsOf(`<!-- oxomargin: silence charge/no-density known -->\n${note}\n`, "forms/mostly-hemiacetal"),
    ).toHaveLength(1);
  });

  it("warn only with a source that is no common practice", () => {
    expect(FINDINGS.filter((rule) => rule.severity === "warning")).toEqual([]);
  });
});

describe("an amine buffer", () => {
  // The buffer is put into the flask by hand, so that this does not rest on how notes are read.
  const codesIn = (buffer: string) => {
    const input = inputOf("Glutaraldehyde (25 wt% in water, 4.0 mL) was stirred in water (100 mL).");
    const moments = input.moments.map((moment) => ({
      ...moment,
      contents: { ...moment.contents, buffer: { buffer } },
    }));
    return advise({ ...input, moments }).findings.map(({ code }) => code);
  };

  it("is said to bind, phosphate is not", () => {
    expect(codesIn("Tris")).toContain("medium/bound-by-nucleophile");
    expect(codesIn("PBS")).not.toContain("medium/bound-by-nucleophile");
  });
});

describe("hints", () => {
  it("have at most 24 characters and speak of notable shares only, unless all are wanted", () => {
    const note =
      "Benzaldehyde (10.6 g, 100 mmol) and 1,1,1-trifluoroacetone (11.2 g, 100 mmol) were stirred in water (500 mL).";
    const labels = (hints: "off" | "notable" | "all") => analyse(note, { hints }).hints.map(({ label }) => label);
    expect(labels("off")).toEqual([]);
    expect(labels("notable")).toHaveLength(1);
    expect(labels("all")).toHaveLength(2);
    for (const label of labels("all")) expect(label).toMatch(/^(?:[<>] )?\d+(?:\.\d+)? % [a-z -]+$/);
    for (const label of labels("all")) expect(label.length).toBeLessThanOrEqual(24);
  });
});
