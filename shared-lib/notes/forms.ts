/** The supplied form that the words beside a name say: "37 wt% aqueous", "2 M in THF", "97 %". */

import type { Lexicon } from "../compounds/lexicon.ts";
import type { Compound, SuppliedForm } from "../compounds/types.ts";
import type { Quantity } from "./types.ts";

/** A strength that far from the table's is another bottle. */
const SAME_BOTTLE = 0.25;
/** Above this a percentage is a purity, below it a solution. */
const PURITY = 0.88;

export interface StatedForm {
  readonly form?: SuppliedForm;
  /** The words say a solution in water without naming the form's strength. */
  readonly aqueous: boolean;
}

function withAssay(form: SuppliedForm, assay: number): SuppliedForm {
  return {
    ...form,
    label: `${form.of}, ${Number((assay * 100).toPrecision(3))} wt%`,
    assay: { value: assay, low: assay * 0.97, high: Math.min(1, assay * 1.03) },
    carries: rescaled(form, assay),
  };
}

/** What a solution of another strength carries: the rest, shared as in the table's bottle. */
function rescaled(form: SuppliedForm, assay: number): SuppliedForm["carries"] {
  const total = form.carries.reduce((sum, part) => sum + part.massFraction, 0);
  return total > 0
    ? form.carries.map((part) => ({ ...part, massFraction: (part.massFraction / total) * (1 - assay) }))
    : form.carries;
}

/**
 * Form of a carbonyl compound from its name's form and the words beside it.
 *
 * @param named the form that the name itself says ("formalin", "paraformaldehyde")
 * @param solvent key of the solvent that the words name, if any ("water" for "aqueous")
 */
export function statedForm(
  compound: Compound,
  named: SuppliedForm | undefined,
  amounts: readonly Quantity[],
  solvent: string | undefined,
  lexicon: Lexicon,
): StatedForm {
  const strength = amounts.find((amount) => amount.of === "assay" && amount.base > 0 && amount.base <= 1);
  const aqueous = solvent === "water";
  if (named)
    return {
      form:
        strength && named.kind === "solution"
          ? withAssay(named, strength.base)
          : strength && strength.base > 0.5
            ? withAssay(named, strength.base)
            : named,
      aqueous,
    };
  if (!compound.carbonyl || !strength) return { aqueous };
  const solutions = lexicon
    .formsOf(compound.id)
    .filter(
      (form) =>
        form.kind === "solution" && (solvent === undefined || form.carries.some((part) => part.solvent === solvent)),
    );
  const near = solutions.find((form) => form.assay && Math.abs(strength.base / form.assay.value - 1) < SAME_BOTTLE);
  if (near) return { form: withAssay(near, strength.base), aqueous };
  if (strength.base >= PURITY) {
    return {
      form: {
        id: `${compound.id} ${strength.text}`,
        of: compound.id,
        label: `${compound.name}, ${strength.text}`,
        kind: "neat",
        massPerMole: compound.molarMass,
        assay: { value: strength.base, low: strength.base, high: Math.min(1, strength.base + 0.02) },
        carries: [],
        boundWater: 0,
        release: "at once",
        source: "as written in the note",
        ...(compound.density === undefined ? {} : { density: compound.density }),
      },
      aqueous,
    };
  }
  const bottle = solutions[0];
  if (!bottle && solvent === undefined) return { aqueous };
  const carries = solvent === undefined ? [] : [{ solvent, massFraction: 1 - strength.base }];
  const own: SuppliedForm = {
    id: `${compound.id} ${strength.text}`,
    of: compound.id,
    label: `${compound.name}, ${strength.text} solution`,
    kind: "solution",
    massPerMole: compound.molarMass,
    carries,
    boundWater: 0,
    release: "at once",
    source: "as written in the note",
  };
  return { form: withAssay(solvent === undefined && bottle ? { ...bottle } : own, strength.base), aqueous };
}
