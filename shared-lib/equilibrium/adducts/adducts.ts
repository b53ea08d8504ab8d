/** Partners that add to a carbonyl beside water and alcohols: how much of them is ready at a pH, and how well they bind. */

import type { CarbonylSite } from "../../compounds/perception/types.ts";
import type { ReagentTag } from "../../compounds/tags.ts";
import type { Compound } from "../../compounds/types.ts";
import table from "../../generated/adducts.json" with { type: "json" };
import type { DerivationLine, FormKind } from "../../model/contract.ts";

/** J/(mol K), CODATA. */
const GAS_CONSTANT = 8.314462618;
const STANDARD_K = 298.15;

export interface PartnerKind {
  readonly tag: ReagentTag;
  readonly adduct: string;
  readonly kind: FormKind;
  /** Which side of the pKa the constant counts. */
  readonly ready: "acid" | "base";
  readonly pKa: number;
  readonly pKa2?: number;
  readonly releasesWater: boolean;
  /** Its adduct is one of the forms in the flask; else it is told beside them. */
  readonly counted: boolean;
}

export interface AdductConstant {
  /** log10 of [adduct]/([open C=O][ready partner]), M⁻¹. */
  readonly log10: number;
  readonly sd: number;
  readonly line: DerivationLine;
}

interface Value {
  readonly log10: number;
  readonly sd: number;
  readonly enthalpy: number;
  readonly source: string;
}
const KINDS = table.kinds as readonly PartnerKind[];
const VALUES: Readonly<Record<string, Value>> = table.values;
const LINES: Readonly<Record<string, { slope: number; intercept: number; scatter: number; n: number }>> = table.lines;
const PARTNERS: Readonly<Record<string, { pKa: number; shift: number; sd: number; source: string }>> = table.partners;
const USUAL_ENTHALPY = -45;

/** The kind of a dissolved compound as a partner, by its tags; undefined for what does not add. */
export function partnerKind(compound: Compound): PartnerKind | undefined {
  return KINDS.find((kind) => compound.tags.includes(kind.tag));
}

/** The partner without a counter-ion or its acid: the part that holds nitrogen or sulfur. */
function bareSmiles(smiles: string): string {
  return smiles.split(".").sort((a, b) => b.length - a.length)[0] ?? smiles;
}

/** Share of a partner that is in the state its constant counts, at a pH (activity coefficients left out). */
export function readyShare(kind: PartnerKind, partner: Compound, pH: number): number {
  const pKa = PARTNERS[bareSmiles(partner.smiles)]?.pKa ?? kind.pKa;
  const step = 1 / (1 + 10 ** (kind.ready === "base" ? pKa - pH : pH - pKa));
  return kind.pKa2 === undefined ? step : step / (1 + 10 ** (kind.pKa2 - pH));
}

/**
 * Adduct constant of a site with a kind of partner: published for the compound, else by the line through the published ones against
 * the hydration constant (formaldehyde stands apart from that line).
 *
 * @param logHydration log10 of the site's hydration constant at 25 °C or near
 * @returns undefined where neither holds
 */
export function adductConstant(
  site: CarbonylSite,
  logHydration: number,
  kind: PartnerKind,
  partner: Compound,
  temperatureK: number,
): AdductConstant | undefined {
  const own = VALUES[`${site.parent} ${kind.tag}`];
  const line = LINES[kind.tag];
  const special = PARTNERS[bareSmiles(partner.smiles)];
  if (!own && (!line || site.class === "formaldehyde")) return undefined;
  const at25 =
    own?.log10 ?? (line as (typeof LINES)[string]).intercept + (line as (typeof LINES)[string]).slope * logHydration;
  const enthalpy = own?.enthalpy ?? USUAL_ENTHALPY;
  const shift = ((-1000 * enthalpy) / (GAS_CONSTANT * Math.LN10)) * (1 / temperatureK - 1 / STANDARD_K);
  const log10 = at25 + (special?.shift ?? 0) + shift;
  const sd = Math.hypot(own?.sd ?? line?.scatter ?? 1, special?.sd ?? 0.2, 0.3 * Math.abs(shift));
  return {
    log10,
    sd,
    line: {
      says: `${partner.name}: ${kind.adduct}, ${own ? "published for this compound" : `by the line of ${line?.n} compounds against their hydration`}`,
      value: `log K = ${log10.toFixed(2).replace("-", "−")} ± ${sd.toFixed(2)} (M⁻¹)`,
      source: own?.source ?? "our line through the adduct table",
    },
  };
}
