/** pH of a mainly aqueous flask that holds a strong acid or a hydroxide in excess. */

import { molesInVolume, solventByKey } from "../media/solvents.ts";
import type { SolventAmount } from "./phrase-amounts.ts";
import type { ResolvedCharge } from "./types.ts";

/** Below this volume share of water a pH is not what it is in water, and none is derived. */
const LEAST_WATER = 0.5;
/** Below this excess, mol/L, the other charges decide and nothing is derived. */
const LEAST_EXCESS = 0.001;

const HYDROXIDE = "[OH-]";

function hydroxides(smiles: string): number {
  return smiles.split(HYDROXIDE).length - 1;
}

/**
 * pH = 14 + log10 of the hydroxide in excess, or −log10 of the strong acid in excess; each acid group and each acid or amine
 * charged is counted against it. Activity coefficients are left out: good to about 0.3 below 1 mol/L.
 *
 * @returns undefined unless one of them is clearly in excess
 */
export function pHFromCharges(
  charges: readonly ResolvedCharge[],
  solvents: readonly SolventAmount[],
): number | undefined {
  let litres = 0;
  let waterL = 0;
  for (const { solvent: key, amount } of solvents) {
    const solvent = solventByKey(key);
    if (!solvent) continue;
    const own = amount / molesInVolume(solvent, 1);
    litres += own;
    if (key === "water") waterL += own;
  }
  if (!(litres > 0) || waterL < LEAST_WATER * litres) return undefined;
  let base = 0;
  let acid = 0;
  let weakBase = 0;
  let weakAcid = 0;
  for (const { compound, total } of charges) {
    const mol = total?.value ?? 0;
    if (hydroxides(compound.smiles) > 0) base += mol * hydroxides(compound.smiles);
    else if (compound.tags.includes("strong acid")) acid += mol;
    else if (compound.tags.includes("acid")) weakAcid += mol;
    else if (isBasic(compound.tags)) weakBase += mol;
  }
  const excessBase = (base - acid - weakAcid) / litres;
  const excessAcid = (acid - base - weakBase) / litres;
  if (excessBase > LEAST_EXCESS) return Math.min(14, 14 + Math.log10(excessBase));
  if (excessAcid > LEAST_EXCESS) return Math.max(0, -Math.log10(excessAcid));
  return undefined;
}

function isBasic(tags: ResolvedCharge["compound"]["tags"]): boolean {
  return tags.some(
    (tag) =>
      tag === "base" || tag === "ammonia" || tag.endsWith("amine") || tag === "hydroxylamine" || tag === "hydrazine",
  );
}
