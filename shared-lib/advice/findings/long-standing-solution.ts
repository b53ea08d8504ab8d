/** An aldehyde solution stands for long in base. */

import { timeText } from "../figures.ts";
import type { CarbonylView, FindingRule, RawFinding } from "../types.ts";

/** A day in base at this pH or above (common practice, no source). */
const LONG_S = 12 * 3600;
const BASIC_PH = 10;

function lookAt(view: CarbonylView): readonly RawFinding[] {
  const { charge, mention, step } = view;
  const sites = charge.compound.carbonyl?.sites ?? [];
  if (!sites.some((site) => site.hydrogens > 0) || step.decision.kind?.consequence !== "nothing is consumed") return [];
  const standing = step.moments.find(
    (moment) =>
      moment.carbonylMentions.includes(charge.mention) &&
      (moment.heldSeconds ?? 0) >= LONG_S &&
      (moment.contents.pH ?? 7) >= BASIC_PH,
  );
  if (!standing) return [];
  const enolisable = sites.some((site) => site.class === "aliphatic aldehyde");
  const loss = enolisable ? "aldol addition" : "disproportionation to alcohol and acid";
  const message = `${charge.compound.name} stands ${timeText(standing.heldSeconds ?? 0)} at pH ${standing.contents.pH?.toFixed(1)}: expect losses by ${loss}; make the solution fresh.`;
  return [{ start: mention.start, end: mention.end, mention: charge.mention, message, fixes: [] }];
}

export const longStandingSolution: FindingRule = {
  code: "time/long-standing-solution",
  severity: "hint",
  title: "An aldehyde solution stands for long in base",
  page: `**Looks for** an aldehyde that the note lets stand for 12 h or more at pH 10 or above with nothing to react with.

**Keeps silent** in every step that consumes the aldehyde, and where pH or time do not follow from the note.

**Why.** In base, aldehydes with an alpha hydrogen add to each other; those without disproportionate to alcohol and acid.

**Sources.** T. A. Geissman, Org. React. 1944, 2, 94 (disproportionation; recalled).`,
  look: ({ carbonyls }) => carbonyls.flatMap(lookAt),
};
