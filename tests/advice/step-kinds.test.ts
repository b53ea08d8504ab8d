/** What kind of step a note shows; invented notes. */

import { describe, expect, it } from "vitest";
import { additionConversion } from "../../shared-lib/advice/conversion.ts";
import { kindsOf } from "./analyse.ts";

const CASES: readonly (readonly [string, string | undefined])[] = [
  [
    "Benzaldehyde (1.06 g, 10 mmol) and hydroxylamine hydrochloride (0.69 g, 10 mmol) were stirred in water (50 mL).",
    "oxime",
  ],
  [
    "Benzaldehyde (1.06 g, 10 mmol) and phenylhydrazine (1.08 g, 10 mmol) were stirred in ethanol (50 mL).",
    "hydrazone",
  ],
  ["Benzaldehyde (1.06 g, 10 mmol) and benzylamine (1.07 g, 10 mmol) were stirred in methanol (50 mL).", "imine"],
  [
    "Benzaldehyde (1.06 g, 10 mmol), benzylamine (1.07 g, 10 mmol) and sodium borohydride (0.38 g, 10 mmol) were stirred in methanol (50 mL).",
    "reductive-amination",
  ],
  [
    "Benzaldehyde (1.06 g, 10 mmol) and sodium triacetoxyborohydride (2.12 g, 10 mmol) were stirred in THF (50 mL).",
    "reductive-amination",
  ],
  [
    "Benzaldehyde (1.06 g, 10 mmol) and sodium borohydride (0.38 g, 10 mmol) were stirred in methanol (50 mL).",
    "hydride-reduction",
  ],
  [
    "Benzaldehyde (1.06 g, 10 mmol) and lithium aluminium hydride (0.38 g, 10 mmol) were stirred in THF (50 mL).",
    "strong-hydride",
  ],
  [
    "Benzaldehyde (1.06 g, 10 mmol) and methylmagnesium bromide (3.0 M in diethyl ether, 5.0 mL) were stirred in THF (50 mL).",
    "organometallic",
  ],
  ["Benzaldehyde (1.06 g, 10 mmol) and sodium cyanide (0.49 g, 10 mmol) were stirred in water (50 mL).", "cyanohydrin"],
  [
    "Benzaldehyde (1.06 g, 10 mmol), benzylamine (1.07 g, 10 mmol) and sodium cyanide (0.49 g, 10 mmol) were stirred in methanol (50 mL).",
    "strecker",
  ],
  [
    "Benzaldehyde (1.06 g, 10 mmol) and sodium bisulfite (1.04 g, 10 mmol) were stirred in water (50 mL).",
    "bisulfite-adduct",
  ],
  [
    "Benzaldehyde (1.06 g, 10 mmol) and sodium hypochlorite (0.74 g, 10 mmol) were stirred in water (50 mL).",
    "oxidation-of-hydrate",
  ],
  [
    "Benzaldehyde (1.06 g, 10 mmol), acetone (0.58 g, 10 mmol) and sodium hydroxide (0.40 g, 10 mmol) were stirred in water (50 mL).",
    "carbon-acid-addition",
  ],
  ["Stock of benzaldehyde: benzaldehyde (1.06 g, 10 mmol) was stirred in water (50 mL).", "dissolution"],
  // Nothing but the carbonyl is recognised: an unknown partner may stand there, so nothing is claimed.
  ["Benzaldehyde (1.06 g, 10 mmol) and compound 7 (1.00 g) were stirred in water (50 mL).", undefined],
  ["# Oxime of 2a\n\nBenzaldehyde (1.06 g, 10 mmol) and compound 7 (1.00 g) were stirred in water (50 mL).", "oxime"],
  [
    "# Chloroacetaldehyde run\n\nBenzaldehyde (1.06 g, 10 mmol) and compound 7 (1.00 g) were stirred in water (50 mL).",
    undefined,
  ],
  [
    "<!-- oxomargin: step oxime -->\n\nBenzaldehyde (1.06 g, 10 mmol) and sodium borohydride (0.38 g, 10 mmol) were stirred in methanol (50 mL).",
    "oxime",
  ],
];

describe("the kind of a step", () => {
  it.each(CASES)("%s", (note, kind) => {
    expect(kindsOf(note)).toEqual([kind]);
  });
});

describe("conversion of an addition", () => {
  it("solves the law of mass action", () => {
    for (const [constant, a, b] of [
      [1e-3, 0.1, 0.2],
      [10, 1, 1],
      [1e8, 0.5, 0.4],
      [1e15, 1e-6, 2],
    ] as const) {
      const x = additionConversion(constant, a, b) * Math.min(a, b);
      const free = (a - x) * (b - x);
      // K = x / ((a − x)(b − x)), as long as the difference is not lost in rounding.
      if (free > 1e-10) expect(Math.abs(x / free / constant - 1)).toBeLessThan(1e-4);
      expect(x).toBeGreaterThanOrEqual(0);
      expect(x).toBeLessThanOrEqual(Math.min(a, b));
    }
  });

  it("is nothing without a partner", () => expect(additionConversion(100, 0, 1)).toBe(0));
});
