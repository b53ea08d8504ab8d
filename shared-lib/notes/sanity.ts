/** Amounts that cannot be right, said at the figure. */

import type { Mention, Quantity, ReadingProblem } from "./types.ts";

/** More than this in one charge is a slip of the unit (a hundred tonnes, a thousand cubic metres). */
const MOST = { mass: 1e8, volume: 1e6, amount: 1e6, equivalents: 1e5 } as const;

/** Problems of one charge's figures. */
export function absurdities(mention: Mention, amounts: readonly Quantity[]): ReadingProblem[] {
  const problems: ReadingProblem[] = [];
  for (const amount of amounts) {
    const span = { start: amount.start, end: amount.end };
    if (amount.of === "assay" && amount.base > 1)
      problems.push({
        ...span,
        code: "reading/assay",
        message: `${amount.text} of ${mention.name}: an assay cannot be above 100 %.`,
      });
    if (amount.value === 0 && amount.of !== "assay")
      problems.push({
        ...span,
        code: "reading/amount",
        message: `${amount.text} of ${mention.name}: a charge of nothing.`,
      });
    const most = MOST[amount.of as keyof typeof MOST];
    if (most !== undefined && amount.base > most)
      problems.push({
        ...span,
        code: "reading/amount",
        message: `${amount.text} of ${mention.name} is more than any vessel holds: check the unit.`,
      });
  }
  return problems;
}
