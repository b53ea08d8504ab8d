/** A solution is measured by volume, and nothing says how much that holds. */

import { writtenQuantities } from "../../flask/charge-quantities.ts";
import type { FindingRule } from "../types.ts";

export const noDensity: FindingRule = {
  code: "charge/no-density",
  severity: "hint",
  title: "A volume of a supplied form without density: no amount follows",
  page: `**Looks for** a carbonyl charge measured by volume, as a solution whose density or molarity neither the note nor the tables give.

**Keeps silent** when a mass or an amount is written too.

**Why.** Without it, no amount and no correction can be given.

**Sources.** None needed.`,
  look: (context) =>
    context.carbonyls.flatMap(({ charge, written, mention }) => {
      const { volume, mass, amount } = writtenQuantities(written);
      if (!volume || mass || amount || charge.total || charge.formIs === "assumed") return [];
      if (!charge.form && !written.dissolvedIn?.length) return [];
      const message = `${volume.text} of ${charge.form?.label ?? charge.compound.name}: write its density or molarity, so that the amount follows.`;
      return [{ start: mention.start, end: mention.end, mention: charge.mention, message, fixes: [] }];
    }),
};
