/** Activities of the solvents of a mixture (pure liquid = 1), held to [x-wise sensible, 1]. */

import type { Composition } from "./composition.ts";
import { hasGroups, unifac } from "./unifac.ts";

export interface Activities {
  /** By key of the solvents table. */
  readonly activity: Readonly<Record<string, number>>;
  /** Standard deviation of ln a of water or the alcohols. */
  readonly sd: number;
  readonly flags: readonly string[];
}

/** Expected error of ln a by the solvent beside water or an alcohol, from the measured points (mean absolute deviations). */
const PAIR_SD: Readonly<Record<string, number>> = {
  methanol: 0.03,
  ethanol: 0.03,
  "1-propanol": 0.05,
  "2-propanol": 0.05,
  acetone: 0.05,
  "1,4-dioxane": 0.06,
  "tert-butanol": 0.08,
  pyridine: 0.1,
  THF: 0.2,
  acetonitrile: 0.15,
  DMSO: 0.2,
  DMF: 0.15,
  glycerol: 0.3,
};
const DEFAULT_SD = 0.3;

/**
 * Activities of a composition at a temperature. A solvent without groups counts as ideal, and that is flagged.
 * A value above 1 means that the model sees two phases: it is held at 1 and flagged.
 */
export function activitiesOf(composition: Composition, temperatureK: number): Activities {
  const { components } = composition;
  const flags: string[] = [];
  const modelled = components.filter((component) => hasGroups(component.solvent.key));
  const activity: Record<string, number> = {};
  for (const component of components) activity[component.solvent.key] = component.moleFraction;
  if (modelled.length > 1) {
    const total = modelled.reduce((sum, component) => sum + component.moleFraction, 0);
    const result = unifac(
      modelled.map((component) => component.solvent.key),
      modelled.map((component) => component.moleFraction / total),
      Math.max(253, Math.min(373, temperatureK)),
    );
    modelled.forEach((component, i) => {
      const value = component.moleFraction * Math.exp(result.lnGamma[i] as number);
      activity[component.solvent.key] = Math.min(1, value);
      if (value > 1) flags.push(`${component.solvent.key} is near its miscibility limit: two phases may form`);
    });
    if (result.predicted) flags.push("some group parameters are predicted, not published");
  }
  const ideal = components.filter((component) => !hasGroups(component.solvent.key));
  if (ideal.length > 0)
    flags.push(`no groups for ${ideal.map((component) => component.solvent.key).join(", ")}: taken as ideal`);
  const sd =
    components.length < 2
      ? 0
      : Math.max(
          ...components.map((component) =>
            component.solvent.key === "water" ? 0 : (PAIR_SD[component.solvent.key] ?? DEFAULT_SD),
          ),
        );
  return { activity, sd, flags };
}
