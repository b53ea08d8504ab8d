/** The compound's own hydroxyl closes on its carbonyl group. */

import type { FindingRule } from "../types.ts";
import { lookForBound } from "./mostly-bound.ts";

export const ringClosed: FindingRule = {
  code: "forms/ring-closed",
  severity: "note",
  title: "A hydroxyl of the molecule closes a ring on its carbonyl group",
  page: `**Looks for** a carbonyl charge of which at least the share in the settings (half, by default) is bound, mostly as its own cyclic
hemiacetal.

**Keeps silent** on sugars, where every chemist expects it, and when nothing would be changed (as for a hydrate).

**Why.** A hydroxyl four or five atoms away closes a five- or six-membered ring, in dry solvents too: drying does not help.

**Corrections.** Write the forms beside the charge; charge more (never more than three times as much).

**Sources.** C. D. Hurd and W. H. Saunders, J. Am. Chem. Soc. 1952, 74, 5324 (hydroxy-aldehydes; recalled).`,
  look: (context) =>
    lookForBound(
      context,
      "cyclic hemiacetal",
      "ring-closed",
      (view) => !view.charge.compound.carbonyl?.sites.some((site) => site.class === "sugar"),
    ),
};
