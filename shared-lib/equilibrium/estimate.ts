/** One compound in one medium, in the contract's shape: what the terminal's `estimate` and the palette show. */

import type { Compound } from "../compounds/types.ts";
import { compositionOf, type MediumAmount } from "../media/composition.ts";
import type { Estimate, Interval } from "../model/contract.ts";
import { speciate } from "./speciate.ts";

export interface EstimateQuery {
  /** What the asker wrote for the compound and the medium. */
  readonly input: string;
  readonly mediumText: string;
  readonly medium: readonly MediumAmount[];
  readonly temperatureK: number;
  readonly pH?: number;
  /** mol/L of the reagent; undefined: infinitely dilute. */
  readonly concentration?: number;
  readonly correlationOnly?: boolean;
}

const UNKNOWN: Interval = { value: 0, low: 0, high: 1 };

/** Estimate for a compound; `outside` says why where none can be given. */
export function estimate(compound: Compound, query: EstimateQuery): Estimate {
  const composition = compositionOf(query.medium, query.temperatureK);
  const perLitre = composition.volumeL > 0 ? 1 / composition.volumeL : 0;
  const speciation = speciate(
    {
      temperatureK: query.temperatureK,
      ...(query.pH === undefined ? {} : { pH: query.pH }),
      solvents: query.medium.map((part) => ({ solvent: part.solvent, amount: part.amount * perLitre })),
      carbonyls: [{ compound, amount: query.concentration ?? 0 }],
      solutes: [],
    },
    { correlationOnly: query.correlationOnly ?? false },
  );
  const found = speciation.carbonyls[0];
  return {
    schema: 1,
    compound: {
      input: query.input,
      name: compound.name,
      smiles: compound.smiles,
      formula: compound.formula,
      molarMass: compound.molarMass,
      ...(compound.cas ? { cas: compound.cas } : {}),
    },
    medium: {
      components: composition.components.map((component) => ({
        name: component.solvent.key,
        smiles: component.solvent.smiles,
        moleFraction: component.moleFraction,
        volumeFraction: component.volumeFraction,
        ...(speciation.activities[component.solvent.key] === undefined
          ? {}
          : { activity: speciation.activities[component.solvent.key] as number }),
      })),
      ...(query.pH === undefined ? {} : { pH: query.pH }),
      text: query.mediumText,
    },
    temperature: query.temperatureK,
    ...(query.concentration === undefined ? {} : { concentration: query.concentration }),
    sites: found?.sites ?? [],
    forms: found?.forms ?? [],
    free: found && found.outside === undefined ? found.free : UNKNOWN,
    ...(found?.time ? { time: found.time } : {}),
    derivation: found?.derivation ?? [],
    cautions: found?.cautions ?? [],
    ...(found?.outside === undefined ? {} : { outside: found.outside }),
  };
}
