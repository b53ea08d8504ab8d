/** Something else in the flask than the partner binds the carbonyl. */

import type { ReagentTag } from "../../compounds/tags.ts";
import { bufferByKey } from "../../media/buffers.ts";
import { percentWithBounds } from "../figures.ts";
import type { CarbonylView, FindingRule, RawFinding } from "../types.ts";
import { shareOf } from "./mostly-bound.ts";

const MAKES: Readonly<Partial<Record<ReagentTag, string>>> = {
  bisulfite: "the hydroxysulfonate",
  cyanide: "the cyanohydrin",
  ammonia: "the imine and condensates",
  "primary amine": "the imine",
  thiol: "the hemithioacetal",
};

/** Tags that a step kind itself consumes, so that binding by them is the purpose. */
const PURPOSE: Readonly<Record<string, readonly ReagentTag[]>> = {
  "bisulfite-adduct": ["bisulfite"],
  cyanohydrin: ["cyanide"],
  strecker: ["cyanide", "ammonia", "primary amine"],
  imine: ["primary amine", "ammonia"],
  "reductive-amination": ["primary amine", "ammonia"],
  mannich: ["primary amine", "ammonia"],
  "cross-linking": ["primary amine"],
};

/** Partners that show what the step is for; beside them a second nucleophile is not the purpose. */
const PARTNERS: readonly ReagentTag[] = ["hydroxylamine", "hydrazine", "carbon acid", "protein", "phosphonate"];

/** "81 % (60 to 92) of ", as far as the equilibrium knows it. */
function howMuch(view: CarbonylView): string {
  const bound = shareOf(view, ["other", "iminium or imine"]);
  return bound.value < 0.01 ? "" : `${percentWithBounds(bound)} of `;
}

function lookAt(view: CarbonylView): readonly RawFinding[] {
  const { kind } = view.step.decision;
  const { mention, charge } = view;
  const place = { start: mention.start, end: mention.end, mention: charge.mention, fixes: [] };
  const key = view.moment.contents.buffer?.buffer;
  const buffer = key ? bufferByKey(key) : undefined;
  if (buffer?.reacts === "yes" && kind?.id !== "imine") {
    const message = `The buffer ${buffer.key} binds ${howMuch(view)}${charge.compound.name} itself; a buffer without an amine (phosphate, acetate) leaves it alone.`;
    return [{ ...place, message }];
  }
  const tags = new Set(view.step.charges.flatMap((row) => row.compound.tags));
  if (!kind || !PARTNERS.some((tag) => tags.has(tag))) return [];
  for (const { compound } of view.moment.contents.solutes) {
    const tag = compound.tags.find((candidate) => MAKES[candidate] !== undefined);
    if (!tag || PURPOSE[kind.id]?.includes(tag) || compound.tags.some((other) => PARTNERS.includes(other))) continue;
    return [
      {
        ...place,
        message: `${compound.name} makes ${MAKES[tag]} of ${howMuch(view)}${charge.compound.name} beside ${kind.title.toLowerCase()}.`,
      },
    ];
  }
  return [];
}

export const boundByNucleophile: FindingRule = {
  code: "medium/bound-by-nucleophile",
  severity: "note",
  title: "An amine buffer, bisulfite, cyanide or thiol in the flask binds the carbonyl too",
  page: `**Looks for** an amine buffer (Tris, glycine), or an amine, ammonia, bisulfite, cyanide or thiol beside the partner that the step is for.

**Keeps silent** when that nucleophile is the partner itself, and where the kind of step is not known.

**Why.** What such a nucleophile binds is missing from the step.

**Sources.** Buffers from their table, with its source; the additions are common practice, no source.`,
  look: ({ carbonyls }) => carbonyls.flatMap(lookAt),
};
