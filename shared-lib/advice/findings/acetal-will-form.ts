/** Acid and alcohol in the flask make the acetal, which the step does not want. */

import { compositionOf } from "../../media/composition.ts";
import type { CarbonylView, FindingRule, RawFinding } from "../types.ts";

/** Volume shares of the flask. */
const LEAST_ALCOHOL = 0.5;
const MOST_WATER = 0.1;
/** mol of strong acid for each mol of carbonyl: a catalyst's worth (common practice, no source). */
const LEAST_ACID = 0.005;

/** Kinds in which the acetal is wanted or the carbonyl leaves faster. */
const NOT_MINDED = new Set(["acetal", "oxime", "hydrazone", "imine", "reductive-amination", "mannich"]);

function lookAt(view: CarbonylView): readonly RawFinding[] {
  const { moment, mention, charge, step } = view;
  const { kind } = step.decision;
  if (kind && NOT_MINDED.has(kind.id)) return [];
  const acid = moment.contents.solutes.filter(({ compound }) => compound.tags.includes("strong acid"));
  const base = moment.contents.solutes.filter(({ compound }) =>
    compound.tags.some((tag) => tag === "base" || tag.endsWith("amine")),
  );
  const mol = acid.reduce((sum, row) => sum + row.amount, 0) - base.reduce((sum, row) => sum + row.amount, 0);
  const known = charge.total?.value;
  const name = acid[0]?.compound.name;
  if (!name || !known || mol < LEAST_ACID * known) return [];
  const parts = compositionOf(moment.contents.solvents, moment.contents.temperatureK).components;
  const volume = (nucleophile: "water" | "alcohol") =>
    parts
      .filter(({ solvent }) => solvent.nucleophile === nucleophile)
      .reduce((sum, part) => sum + part.volumeFraction, 0);
  if (volume("alcohol") < LEAST_ALCOHOL || volume("water") > MOST_WATER) return [];
  const alcohol = parts.find(({ solvent }) => solvent.nucleophile === "alcohol")?.solvent.name ?? "the alcohol";
  const message = `${name} in ${alcohol} will turn ${charge.compound.name} into its acetal: use an aprotic solvent or more water, or add the acid last.`;
  return [
    {
      start: mention.start,
      end: mention.end,
      mention: charge.mention,
      severity: kind ? "note" : "hint",
      message,
      fixes: [],
    },
  ];
}

export const acetalWillForm: FindingRule = {
  code: "medium/acetal-will-form",
  severity: "note",
  title: "Acid and alcohol in the flask will make the acetal",
  page: `**Looks for** a strong acid in excess of the bases, in a flask that is at least half alcohol and at most a tenth water.

**Keeps silent** when the acetal is the purpose, and when an amine, hydroxylamine or hydrazine takes the carbonyl first. Where the kind of step is
not known it is only a hint: the acetal may be what the writer wants.

**Why.** The hemiacetal that alcohol makes by itself goes on to the acetal with acid, and the acetal does not come back without water.

**Sources.** Common practice, no source.`,
  look: ({ carbonyls }) => carbonyls.flatMap(lookAt),
};
