/** A written mixture of solvents to mol of each. */

import { bufferByKey } from "../media/buffers.ts";
import { molesInVolume, type Solvent, solventByKey } from "../media/solvents.ts";
import type { MediumPart } from "../notes/types.ts";

export interface SolventAmount {
  /** Key of the solvents table. */
  readonly solvent: string;
  /** mol */
  readonly amount: number;
}

/** The solvent of a part: a buffer or an aqueous acid, base or salt is water; an unknown word is nothing. */
export function solventOfPart(part: MediumPart): Solvent | undefined {
  if (!part.solvent) return undefined;
  return solventByKey(part.solvent) ?? (bufferByKey(part.solvent) ? solventByKey("water") : undefined);
}

/**
 * mol of each solvent of a mixture.
 *
 * @param totalL litres of the whole where the parts have no volumes of their own
 * @returns nothing for parts whose size does not follow
 */
export function phraseAmounts(parts: readonly MediumPart[], totalL: number | undefined): readonly SolventAmount[] {
  const known = parts.flatMap((part) => {
    const solvent = solventOfPart(part);
    return solvent ? [{ part, solvent }] : [];
  });
  const sized = known.flatMap(({ part, solvent }) => {
    if (part.volumeL !== undefined && part.volumeL > 0)
      return [{ solvent: solvent.key, amount: molesInVolume(solvent, part.volumeL) }];
    if (part.massG !== undefined && part.massG > 0)
      return [{ solvent: solvent.key, amount: part.massG / solvent.molarMass }];
    return [];
  });
  if (sized.length > 0 || totalL === undefined || !(totalL > 0)) return sized;
  const shares = known.map(({ part, solvent }) => ({ solvent, litres: litresPerPart(part, solvent) }));
  const sum = shares.reduce((all, share) => all + share.litres, 0);
  if (!(sum > 0)) return [];
  return shares.map(({ solvent, litres }) => ({
    solvent: solvent.key,
    amount: molesInVolume(solvent, (totalL * litres) / sum),
  }));
}

/** Litres (relative) of one part of a ratio on its basis; a part without a figure counts as one. */
function litresPerPart(part: MediumPart, solvent: Solvent): number {
  const share = part.part !== undefined && part.part > 0 ? part.part : 1;
  if (part.basis === "volume") return share;
  const grams = part.basis === "mass" ? share : share * solvent.molarMass;
  return grams / solvent.density / 1000;
}
