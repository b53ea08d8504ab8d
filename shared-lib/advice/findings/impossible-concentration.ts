/** A stock solution cannot be as strong as written. */

import { writtenQuantities } from "../../flask/charge-quantities.ts";
import { trimmed } from "../figures.ts";
import type { AdviceContext, FindingRule, RawFinding } from "../types.ts";

/** Density of a dense organic liquid, g/mL, where the catalogue has none. */
const DENSE = 1.6;
/** Written molarity against that from assay and density. */
const APART = 0.3;

function lookAt(context: AdviceContext, index: number): readonly RawFinding[] {
  const written = context.reading.charges[index];
  const mention = written && context.reading.mentions[written.mention];
  const compound = mention?.compound;
  const quantities = written ? writtenQuantities(written) : {};
  const stated = quantities.concentration;
  if (!written || !mention || !compound || !stated) return [];
  const place = { start: stated.start, end: stated.end, mention: written.mention, fixes: [] };
  const neat = (1000 * (compound.density ?? DENSE)) / compound.molarMass;
  if (stated.base > 1.1 * neat) {
    const message = `${stated.text} ${compound.name} cannot be: the pure compound is about ${trimmed(neat, 2)} mol/L; mend the figure or its unit (mM for M?).`;
    return [{ ...place, message }];
  }
  const density = quantities.density?.base ?? mention.form?.density;
  if (!quantities.assay || !density) return [];
  const follows = (1000 * density * quantities.assay.base) / compound.molarMass;
  if (Math.abs(Math.log(stated.base / follows)) <= Math.log(1 + APART)) return [];
  const message = `${stated.text} does not fit ${quantities.assay.text}: that is about ${trimmed(follows, 3)} mol/L.`;
  return [{ ...place, message }];
}

export const impossibleConcentration: FindingRule = {
  code: "charge/impossible-concentration",
  severity: "note",
  title: "A stock solution cannot be as strong as written",
  page: `**Looks for** a written molarity above that of the pure compound, or one that does not fit the assay and density beside it.

**Keeps silent** within 10 % of the pure compound and 30 % of what assay and density give.

**Why.** Usually a unit: M for mM, or g/L for g.

**Sources.** Molar masses from formulas; densities from the catalogue.`,
  look: (context) => context.reading.charges.flatMap((_, index) => lookAt(context, index)),
};
