/** One carbonyl of a solved vessel as it is reported: forms, constants, time, reasons, cautions. */

import type { Compound } from "../compounds/types.ts";
import type { Constant, DerivationLine, FormShare, Interval } from "../model/contract.ts";
import type { ConstantEstimate } from "./constants/types.ts";
import type { CompoundForms, SiteConstants } from "./forms/species.ts";
import { approachTime } from "./time-to-equilibrium.ts";
import type { CarbonylForms, Contents, SiteEstimate } from "./types.ts";
import type { VesselEquilibrium } from "./vessel/equilibrium.ts";
import { Z95 } from "./vessel/form-shares.ts";

/** A constant as the contract prints it. */
export function constantOf(estimate: ConstantEstimate): Constant {
  const half = Z95 * estimate.sd;
  return {
    log10: { value: estimate.log10, low: estimate.log10 - half, high: estimate.log10 + half },
    method: estimate.method,
    source: estimate.source,
    ...(estimate.conditions ? { conditions: estimate.conditions } : {}),
  };
}

/** A carbonyl that the model does not answer, with the reason. */
export function outside(reason: string): CarbonylForms {
  return {
    forms: [],
    free: { value: 0, low: 0, high: 1 },
    sites: [],
    derivation: [{ says: reason }],
    cautions: [],
    outside: reason,
  };
}

function siteEstimate({ site, hydration, alcohols }: SiteConstants): SiteEstimate {
  return {
    atom: site.atom,
    class: site.class,
    hydration: constantOf(hydration),
    alcohols: alcohols.map(({ name, constant }) => ({ name, constant: constantOf(constant) })),
  };
}

export function freeOf(forms: readonly FormShare[]): Interval {
  return forms.find((form) => form.kind === "free carbonyl")?.fraction ?? { value: 0, low: 0, high: 0 };
}

function percent(share: number): string {
  return `${(share * 100).toPrecision(share > 0.0995 ? 2 : 1)} %`;
}

function derivationOf(
  known: CompoundForms,
  contents: Contents,
  solved: VesselEquilibrium,
  forms: readonly FormShare[],
) {
  const lines: DerivationLine[] = [...known.lines];
  for (const correction of solved.corrections.values()) lines.push(...(correction.factor?.lines ?? []));
  if (contents.pH === undefined) lines.push({ says: "No pH is given: neutral is assumed" });
  const largest = [...forms].sort((a, b) => b.fraction.value - a.fraction.value)[0];
  if (largest)
    lines.push({
      says: `Mass balance over every form at ${(contents.temperatureK - 273.15).toFixed(0)} °C: most is ${largest.label}`,
      value: `${percent(largest.fraction.value)} (${percent(largest.fraction.low)} to ${percent(largest.fraction.high)})`,
    });
  return lines;
}

/** The report of a carbonyl; its derivation is written when it is first read. */
export function reportOf(
  compound: Compound,
  known: CompoundForms,
  contents: Contents,
  pH: number,
  solved: VesselEquilibrium,
  forms: readonly FormShare[],
  cautions: readonly string[],
): CarbonylForms {
  const lead = [...known.sites].sort((a, b) => Number(b.site.leading) - Number(a.site.leading))[0];
  const hydrated = forms.some((form) => form.kind === "hydrate");
  const time = lead && hydrated ? approachTime(compound, lead.site, lead.hydration.log10, contents, pH) : undefined;
  let derivation: readonly DerivationLine[] | undefined;
  return {
    forms,
    free: freeOf(forms),
    sites: known.sites.map(siteEstimate),
    ...(time ? { time } : {}),
    get derivation() {
      derivation ??= derivationOf(known, contents, solved, forms);
      return derivation;
    },
    cautions: [...known.cautions, ...cautions],
  };
}
