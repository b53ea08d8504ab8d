/** Most of an aldehyde or ketone is its gem-diol in this flask. */

import type { FindingRule } from "../types.ts";
import { lookForBound } from "./mostly-bound.ts";

export const mostlyHydrated: FindingRule = {
  code: "forms/mostly-hydrated",
  severity: "note",
  title: "Most of the aldehyde or ketone is its hydrate in this flask",
  page: `**Looks for** a carbonyl charge that is bound to at least the share in the settings (half, by default), mostly as hydrate.

**Keeps silent** when nothing would be changed: the step takes free carbonyl irreversibly and the free share is above 10 %;
the hydrate is what reacts; the alcohol is the partner; the forms are already written beside the charge; no estimate is given, or its bounds
are too wide to say so.

**Why.** Water adds to the carbonyl group within seconds to hours. What is bound does not take part in an equilibrium step, so
conversion falls by the free share; in an irreversible step only the rate does.

**Corrections.** Charge more, to keep the free amount (never more than three times as much); write the forms beside the charge.

**Sources.** R. P. Bell, Adv. Phys. Org. Chem. 1966, 4, 1; the constant behind each figure is cited in its card.`,
  look: (context) => lookForBound(context, "hydrate", "hydrate"),
};
