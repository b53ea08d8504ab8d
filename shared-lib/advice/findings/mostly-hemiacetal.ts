/** Most of an aldehyde or ketone is the hemiacetal of an alcohol in this flask. */

import type { FindingRule } from "../types.ts";
import { lookForBound } from "./mostly-bound.ts";

export const mostlyHemiacetal: FindingRule = {
  code: "forms/mostly-hemiacetal",
  severity: "note",
  title: "Most of the aldehyde or ketone is the hemiacetal of the solvent",
  page: `**Looks for** a carbonyl charge that is bound to at least the share in the settings (half, by default), mostly as the hemiacetal of
an alcohol in the flask.

**Keeps silent** when nothing would be changed: the step takes free carbonyl irreversibly and the free share is above 10 %; the
alcohol is the partner (acetal formation); the forms are already written beside the charge; no estimate is given, or its bounds
are too wide to say so.

**Why.** Alcohols add to the carbonyl group as water does, primary ones more strongly.

**Corrections.** Charge more, to keep the free amount (never more than three times as much); write the forms beside the charge.

**Sources.** J. P. Guthrie, Can. J. Chem. 1975, 53, 898 (recalled); the constant behind each figure is cited in its card.`,
  look: (context) => lookForBound(context, "hemiacetal", "hemiacetal"),
};
