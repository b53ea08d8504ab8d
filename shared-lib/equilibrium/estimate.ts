/** One compound in one medium, in the contract's shape: what the terminal's `estimate` and the palette show. */

import type { Compound } from "../compounds/types.ts";
import { type Composition, compositionOf, type MediumAmount } from "../media/composition.ts";
import type { Estimate, Interval } from "../model/contract.ts";
import { speciate } from "./speciate.ts";
import type { CarbonylForms, Contents } from "./types.ts";

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
  /** What else is dissolved (mol per litre of solvent), and the buffer. */
  readonly solutes?: Contents["solutes"];
  readonly buffer?: Contents["buffer"];
}

const UNKNOWN: Interval = { value: 0, low: 0, high: 1 };
/** Where constants, densities and activities are still worth something. */
const TEMPERATURE = { lowest: 193.15, highest: 473.15 };
const PH = { lowest: -2, highest: 16 };
/** g/mL of a compound whose density is not known. */
const USUAL_DENSITY = 1;

function neatMolarity(compound: Compound): number {
  return (1000 * (compound.density ?? USUAL_DENSITY)) / compound.molarMass;
}

/** Why a query cannot be answered, naming what is wrong and the mend. */
function refusal(compound: Compound, query: EstimateQuery): string | undefined {
  const { temperatureK, pH, concentration } = query;
  if (!Number.isFinite(temperatureK) || temperatureK < TEMPERATURE.lowest || temperatureK > TEMPERATURE.highest)
    return `the temperature of ${temperatureK} K is outside −80 to 200 °C, where the constants hold: give one inside`;
  if (pH !== undefined && !(pH >= PH.lowest && pH <= PH.highest))
    return `pH ${pH} is outside ${PH.lowest} to ${PH.highest}: give one inside, or none for neutral`;
  if (concentration === undefined) return undefined;
  if (!(concentration >= 0) || !Number.isFinite(concentration))
    return `a concentration of ${concentration} mol/L is not possible: give 0 or more`;
  const neat = neatMolarity(compound);
  const slack = compound.density === undefined ? 1.5 : 1.02;
  return concentration > slack * neat
    ? `${concentration} mol/L is more than the neat compound holds (${neat.toPrecision(3)} mol/L): check unit and power of ten`
    : undefined;
}

/** The vessel of a query: one litre in all, of which the compound takes its own volume. */
function contentsOf(compound: Compound, query: EstimateQuery, composition: Composition): Contents {
  const concentration = query.concentration ?? 0;
  const left = Math.max(1e-6, 1 - concentration / neatMolarity(compound));
  const perLitre = composition.volumeL > 0 ? left / composition.volumeL : 0;
  return {
    temperatureK: query.temperatureK,
    ...(query.pH === undefined ? {} : { pH: query.pH }),
    solvents: query.medium.map((part) => ({ solvent: part.solvent, amount: part.amount * perLitre })),
    carbonyls: [{ compound, amount: concentration }],
    solutes: query.solutes ?? [],
    ...(query.buffer ? { buffer: query.buffer } : {}),
  };
}

function mediumOf(
  query: EstimateQuery,
  composition: Composition,
  activities: Readonly<Record<string, number>>,
): Estimate["medium"] {
  return {
    components: composition.components.map(({ solvent, moleFraction, volumeFraction }) => {
      const activity = activities[solvent.key];
      return {
        name: solvent.key,
        smiles: solvent.smiles,
        moleFraction,
        volumeFraction,
        ...(activity === undefined ? {} : { activity }),
      };
    }),
    ...(query.pH === undefined ? {} : { pH: query.pH }),
    text: query.mediumText,
  };
}

function shaped(
  compound: Compound,
  query: EstimateQuery,
  composition: Composition,
  found: CarbonylForms | undefined,
  activities: Readonly<Record<string, number>>,
  outside: string | undefined,
): Estimate {
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
    medium: mediumOf(query, composition, activities),
    temperature: query.temperatureK,
    ...(query.concentration === undefined ? {} : { concentration: query.concentration }),
    sites: found?.sites ?? [],
    forms: found?.forms ?? [],
    free: found && outside === undefined ? found.free : UNKNOWN,
    ...(found?.time ? { time: found.time } : {}),
    get derivation() {
      return found?.derivation ?? (outside === undefined ? [] : [{ says: outside }]);
    },
    cautions: found?.cautions ?? [],
    ...(outside === undefined ? {} : { outside }),
  };
}

/** Estimate for a compound; `outside` says why where none can be given. Never throws. */
export function estimate(compound: Compound, query: EstimateQuery): Estimate {
  const refused = refusal(compound, query);
  const composition = compositionOf(query.medium, refused ? 298.15 : query.temperatureK);
  if (refused !== undefined) return shaped(compound, query, composition, undefined, {}, refused);
  const speciation = speciate(contentsOf(compound, query, composition), {
    correlationOnly: query.correlationOnly ?? false,
  });
  const found = speciation.carbonyls[0];
  return shaped(compound, query, composition, found, speciation.activities, found?.outside);
}

/** What changes from point to point of a what-if; what a point leaves out stays as in the query. */
export type GridPoint = Partial<Pick<EstimateQuery, "temperatureK" | "pH" | "concentration" | "medium" | "mediumText">>;

/** The longest what-if that is answered. */
export const MOST_POINTS = 1000;

/** Estimates over a table of conditions, in the order of the points; points beyond `MOST_POINTS` are left out. */
export function estimateGrid(
  compound: Compound,
  query: EstimateQuery,
  points: readonly GridPoint[],
): readonly Estimate[] {
  return points.slice(0, MOST_POINTS).map((point) => estimate(compound, { ...query, ...point }));
}
