/** What else in the vessel takes the carbonyl, where no constant is used for it. */

import type { ReagentTag } from "../compounds/tags.ts";
import type { Contents } from "./types.ts";

const BINDS: Readonly<Partial<Record<ReagentTag, string>>> = {
  "primary amine": "forms the imine",
  "secondary amine": "forms the hemiaminal or iminium ion",
  ammonia: "forms the imine and condensates",
  hydroxylamine: "forms the oxime",
  hydrazine: "forms the hydrazone",
  bisulfite: "forms the hydroxysulfonate",
  cyanide: "forms the cyanohydrin",
  thiol: "forms the hemithioacetal",
};

/** One sentence for each dissolved partner that binds carbonyls itself. */
export function boundByOthers(contents: Contents): string[] {
  const cautions: string[] = [];
  for (const { compound } of contents.solutes) {
    const tag = compound.tags.find((candidate) => BINDS[candidate] !== undefined);
    if (tag) cautions.push(`${compound.name} ${BINDS[tag]}: these shares are those before it does.`);
  }
  return cautions;
}
