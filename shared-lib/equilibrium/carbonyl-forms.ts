/** The forms of one carbonyl compound in the vessel, as they are reported. */

import type { Compound } from "../compounds/types.ts";
import type { Constant, FormShare, Interval } from "../model/contract.ts";
import { boundByOthers } from "./cautions.ts";
import type { ConstantEstimate } from "./constants/types.ts";
import { chainForms } from "./formaldehyde-forms.ts";
import type { FreeSolvents } from "./mass-balance.ts";
import { outsideReason, type SiteShares, siteSharesOf } from "./site-shares.ts";
import { approachTime } from "./time-to-equilibrium.ts";
import type { CarbonylForms, Contents, SiteEstimate, SpeciateOptions } from "./types.ts";

/** Forms below this share are left out of the list; their share goes to none. */
const NOTHING = 1e-12;
const Z95 = 1.959964;

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

function outside(reason: string): CarbonylForms {
  return {
    forms: [],
    free: { value: 0, low: 0, high: 1 },
    sites: [],
    derivation: [{ says: reason }],
    cautions: [],
    outside: reason,
  };
}

function siteEstimate(entry: SiteShares): SiteEstimate {
  return {
    atom: entry.descriptor.atom,
    class: entry.descriptor.class,
    hydration: constantOf(entry.hydration),
    alcohols: entry.site.alcohols.map(({ name, constant }) => ({ name, constant: constantOf(constant) })),
  };
}

function scaled(interval: Interval, by: number): Interval {
  return { value: interval.value * by, low: interval.low * by, high: interval.high * by };
}

function added(a: Interval, b: Interval): Interval {
  return { value: a.value + b.value, low: Math.min(1, a.low + b.low), high: Math.min(1, a.high + b.high) };
}

/** Mean over the sites of a molecule: a form at two sites counts for both. */
function averaged(compound: Compound, entries: readonly SiteShares[]): { forms: FormShare[]; free: Interval } {
  const weight = 1 / entries.length;
  let free: Interval = { value: 0, low: 0, high: 0 };
  const forms = new Map<string, FormShare>();
  for (const entry of entries) {
    free = added(free, scaled(entry.shares.free, weight));
    entry.site.ratios.forEach((ratio, i) => {
      const fraction = scaled(entry.shares.forms[i] as Interval, weight);
      const before = forms.get(ratio.label);
      forms.set(
        ratio.label,
        before
          ? { ...before, fraction: added(before.fraction, fraction) }
          : { kind: ratio.kind, label: ratio.label, ...(ratio.smiles ? { smiles: ratio.smiles } : {}), fraction },
      );
    });
  }
  const all: FormShare[] = [
    { kind: "free carbonyl", label: "free carbonyl", smiles: compound.smiles, fraction: free },
    ...[...forms.values()].filter((form) => form.fraction.value > NOTHING),
  ];
  return { forms: all, free };
}

/** Forms, reasons and cautions of the carbonyl `row` in the vessel. */
export function formsOfCarbonyl(
  row: Contents["carbonyls"][number],
  contents: Contents,
  solvents: FreeSolvents,
  pH: number,
  options: SpeciateOptions,
): CarbonylForms {
  const { compound } = row;
  const reason = outsideReason(compound, contents.temperatureK, options);
  if (reason !== undefined) return outside(reason);
  if (solvents.composition.components.length === 0) return outside("the note names no medium here");
  const chain = chainForms(row, contents, pH, options);
  if (chain) return { ...chain, cautions: boundByOthers(contents) };
  const entries = siteSharesOf(compound, solvents.composition, solvents.dilution, contents.temperatureK, pH, options);
  const first = entries[0];
  if (!first) return outside("no constant is known for it");
  const { forms, free } = averaged(compound, entries);
  const time = first.site.ratios.some((ratio) => ratio.kind === "hydrate")
    ? approachTime(first.descriptor, first.hydration.log10, contents.temperatureK, pH)
    : undefined;
  const derivation = entries.flatMap((entry, i) => [
    {
      says: `${entries.length > 1 ? `Site ${i + 1}: ` : ""}${entry.descriptor.class}${entry.hydration.method === "measured" ? ", measured for this compound" : ""}`,
    },
    ...entry.hydration.lines,
    ...entry.site.lines,
  ]);
  if (contents.pH === undefined) derivation.push({ says: "No pH is given: neutral is assumed" });
  if (solvents.dilution < 0.98)
    derivation.push({
      says: `Carbonyls fill ${((1 - solvents.dilution) * 100).toFixed(0)} % of the volume and dilute the solvent`,
    });
  return {
    forms,
    free,
    sites: entries.map(siteEstimate),
    ...(time ? { time } : {}),
    derivation,
    cautions: boundByOthers(contents),
  };
}
