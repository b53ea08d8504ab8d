/** The solvents that a charge brings into the flask: of a solution, and those bound in a hydrate or a hemiacetal. */

import type { Compound, SuppliedForm } from "../compounds/types.ts";
import { allSolvents, solventByKey } from "../media/solvents.ts";
import type { MediumPart } from "../notes/types.ts";
import { phraseAmounts, type SolventAmount } from "./phrase-amounts.ts";

export interface CarriedInput {
  readonly compound: Compound;
  readonly form?: SuppliedForm;
  readonly dissolvedIn?: readonly MediumPart[];
  /** Mass fraction written in the note, which wins over the form's. */
  readonly assay?: number;
  readonly totalMol?: number;
  readonly massG?: number;
  readonly volumeL?: number;
}

/** Solvents, in mol, that come in with a charge. Rows of one solvent are not merged. */
export function carriedSolvents(input: CarriedInput): readonly SolventAmount[] {
  const { form } = input;
  const bound = form ? boundSolvent(input.compound, form, input.totalMol) : [];
  if (form && form.carries.length > 0) return [...bound, ...ofForm(form, input.massG, input.assay)];
  return [...bound, ...ofSolution(input)];
}

function ofForm(form: SuppliedForm, massG: number | undefined, writtenAssay: number | undefined): SolventAmount[] {
  if (!massG) return [];
  const rest = form.carries.reduce((sum, part) => sum + part.massFraction, 0);
  const scale = writtenAssay !== undefined && rest > 0 && form.kind === "solution" ? (1 - writtenAssay) / rest : 1;
  return form.carries.flatMap(({ solvent: key, massFraction }) => {
    const solvent = solventByKey(key);
    return solvent ? [{ solvent: key, amount: (massG * massFraction * scale) / solvent.molarMass }] : [];
  });
}

/** A solution that the note describes itself ("2 M in THF", "40 wt% in water"). */
function ofSolution(input: CarriedInput): readonly SolventAmount[] {
  const parts = input.dissolvedIn ?? [];
  if (parts.length === 0) return [];
  if (parts.some((part) => part.volumeL !== undefined || part.massG !== undefined))
    return phraseAmounts(parts, undefined);
  const { massG, assay, volumeL } = input;
  const only = parts.length === 1 ? solventByKey(parts[0]?.solvent ?? "") : undefined;
  if (only && massG && assay !== undefined)
    return [{ solvent: only.key, amount: (massG * (1 - assay)) / only.molarMass }];
  if (!volumeL) return [];
  const soluteL = ((input.totalMol ?? 0) * input.compound.molarMass) / (input.compound.density ?? 1.2) / 1000;
  return phraseAmounts(parts, Math.max(volumeL - soluteL, volumeL * 0.05));
}

/** Water of a hydrate, alcohol of a hemiacetal: 1 mol for each mol that the mass of the form says. */
function boundSolvent(compound: Compound, form: SuppliedForm, totalMol: number | undefined): SolventAmount[] {
  if (!totalMol) return [];
  if (form.boundWater > 0) return [{ solvent: "water", amount: totalMol * form.boundWater }];
  if (form.kind !== "hemiacetal") return [];
  const excess = form.massPerMole - compound.molarMass;
  const alcohol = allSolvents().find((row) => row.nucleophile === "alcohol" && Math.abs(row.molarMass - excess) < 0.1);
  return alcohol ? [{ solvent: alcohol.key, amount: totalMol }] : [];
}
