/** Something written cannot be right or cannot be read. */

import type { FindingRule } from "../types.ts";

export const readingProblem: FindingRule = {
  code: "reading/cannot-be-right",
  severity: "note",
  title: "A figure, a structure or a directive that cannot be right or cannot be read",
  page: `**Looks for** what the reader of notes could not take as written: a SMILES with an open branch, an unclosed ring or an impossible valence, a
negative or absurd amount, a temperature below absolute zero, an assay above 100 %, a directive that is not known. The message names
the place and the mend.

**Keeps silent** on words that merely are not known: an unknown name is no mistake.

**Why.** What cannot be read is left out of every figure, and the writer has to know that.

**Sources.** None needed.`,
  look: ({ reading }) =>
    reading.problems.map(({ start, end, message, code }) => ({
      start,
      end,
      message,
      fixes: [],
      ...(code.includes("/") ? { code } : {}),
    })),
};
