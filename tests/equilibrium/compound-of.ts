/** Compounds for the tests, read from structures. */
import { createStructureToolkit } from "../../shared-lib/compounds/structure.ts";
import type { ReagentTag } from "../../shared-lib/compounds/tags.ts";
import type { Compound } from "../../shared-lib/compounds/types.ts";
import { speciate } from "../../shared-lib/equilibrium/speciate.ts";
import type { CarbonylForms, Contents, SpeciateOptions } from "../../shared-lib/equilibrium/types.ts";
import type { FormKind } from "../../shared-lib/model/contract.ts";

const toolkit = createStructureToolkit();
const known = new Map<string, Compound>();

export function compoundOf(
  smiles: string,
  more: { readonly tags?: readonly ReagentTag[]; readonly density?: number } = {},
): Compound {
  const kept = known.get(smiles);
  if (kept) return kept;
  const read = toolkit.read(smiles);
  if (!read.ok) throw new Error(`${smiles}: ${read.problem}`);
  const compound: Compound = {
    id: read.canonicalSmiles,
    name: smiles,
    smiles: read.canonicalSmiles,
    formula: read.formula,
    molarMass: read.molarMass,
    tags: more.tags ?? [],
    ...(more.density === undefined ? {} : { density: more.density }),
    ...(read.carbonyl ? { carbonyl: read.carbonyl } : {}),
    origin: "structure",
  };
  known.set(smiles, compound);
  return compound;
}

/** Forms of one carbonyl in a vessel; water (1 L, dilute, 25 °C) unless told otherwise. */
export function formsIn(
  smiles: string,
  contents: Partial<Contents> & { readonly molar?: number } = {},
  options?: SpeciateOptions,
): CarbonylForms {
  const { molar, ...rest } = contents;
  const vessel: Contents = {
    temperatureK: 298.15,
    solvents: [{ solvent: "water", amount: 55.3 }],
    carbonyls: [{ compound: compoundOf(smiles), amount: molar ?? 0 }],
    solutes: [],
    ...rest,
  };
  return speciate(vessel, options).carbonyls[0] as CarbonylForms;
}

/** Sum of the shares of some kinds. */
export function share(forms: CarbonylForms, ...kinds: readonly FormKind[]): number {
  return forms.forms.reduce((sum, form) => sum + (kinds.includes(form.kind) ? form.fraction.value : 0), 0);
}

/** Share of the form whose label holds a word, with its bounds. */
export function labelled(forms: CarbonylForms, word: string): { value: number; low: number; high: number } {
  return forms.forms.find((form) => form.label.includes(word))?.fraction ?? { value: 0, low: 0, high: 0 };
}
