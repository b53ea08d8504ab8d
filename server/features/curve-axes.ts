/** The quantities that the panel moves, and what moving one does to the contents of a vessel. */

import type { CarbonylForms, Contents } from "../../shared-lib/equilibrium/types.ts";
import { compositionOf } from "../../shared-lib/media/composition.ts";
import { molarVolume, solventByKey } from "../../shared-lib/media/solvents.ts";
import { duration } from "../../shared-lib/report/card/share-words.ts";
import type { CurveAxis, Curves } from "../protocol.ts";

/** Present value of every axis: water by volume (%), °C, pH, mol/L, s. */
export type Stand = Readonly<Record<CurveAxis, number>>;

interface Axis {
  readonly label: string;
  readonly low: number;
  readonly high: number;
  readonly step: number;
  points(count: number): number[];
  says(value: number): string;
}

const even =
  (low: number, high: number) =>
  (count: number): number[] =>
    Array.from({ length: count }, (_, i) => low + ((high - low) * i) / (count - 1));

const figure = (value: number): string => String(Number(value.toPrecision(3)));

export const AXES: Readonly<Record<CurveAxis, Axis>> = {
  water: {
    label: "Water in the solvent (% by volume)",
    low: 0,
    high: 100,
    step: 1,
    points: even(0, 100),
    says: (value) => `${figure(value)} % water by volume`,
  },
  pH: { label: "pH", low: 0, high: 14, step: 0.1, points: even(0, 14), says: (value) => `pH ${figure(value)}` },
  temperature: {
    label: "Temperature (°C)",
    low: 0,
    high: 100,
    step: 1,
    points: even(0, 100),
    says: (value) => `${figure(value)} °C`,
  },
  concentration: {
    label: "Concentration (mol/L)",
    low: 0.001,
    high: 10,
    step: 0.001,
    points: (count) => even(-3, 1)(count).map((log) => 10 ** log),
    says: (value) => `${figure(value)} mol/L`,
  },
  time: {
    label: "Time from mixing (s)",
    low: 0,
    high: 86_400,
    step: 1,
    points: even(0, 86_400),
    says: (value) => `after ${duration(value)}`,
  },
};

const ROOM_NEUTRAL_PH = 7;
/** What the rest of the solvent is where the note has water alone: a solvent that adds nothing itself. */
const OTHER_SOLVENT = "THF";

/** Where the note itself stands on every axis. */
export function standOf(contents: Contents, row: number, heldSeconds: number | undefined): Stand {
  const composition = compositionOf(contents.solvents, contents.temperatureK);
  const water = composition.components.find((component) => component.solvent.nucleophile === "water");
  const volumeL = contents.volumeL ?? composition.volumeL;
  const amount = contents.carbonyls[row]?.amount ?? 0;
  return {
    water: (water?.volumeFraction ?? 0) * 100,
    pH: contents.pH ?? ROOM_NEUTRAL_PH,
    temperature: contents.temperatureK - 273.15,
    concentration: volumeL > 0 ? amount / volumeL : 0,
    time: heldSeconds ?? 0,
  };
}

/** The contents with every axis put to the given values; time changes no contents. */
export function applyAxis(contents: Contents, row: number, stand: Stand): Contents {
  const volumeL = contents.volumeL ?? compositionOf(contents.solvents, contents.temperatureK).volumeL;
  const litres = volumeL > 0 ? volumeL : 1;
  return {
    ...contents,
    temperatureK: stand.temperature + 273.15,
    ...(contents.pH === undefined && stand.pH === ROOM_NEUTRAL_PH ? {} : { pH: stand.pH }),
    solvents: solventsAt(contents, stand.water / 100, litres),
    carbonyls: contents.carbonyls.map((carbonyl, index) =>
      index === row ? { ...carbonyl, amount: stand.concentration * litres } : carbonyl,
    ),
  };
}

/** The note's own solvents with another share of water; left untouched where the share is the note's. */
function solventsAt(contents: Contents, water: number, litres: number): Contents["solvents"] {
  const { components, volumeL } = compositionOf(contents.solvents, contents.temperatureK);
  const own = components.find((component) => component.solvent.nucleophile === "water")?.volumeFraction ?? 0;
  if (Math.abs(own - water) < 1e-9) return contents.solvents;
  const total = volumeL > 0 ? volumeL : litres;
  const others = components.filter((component) => component.solvent.nucleophile !== "water");
  const rest = others.reduce((sum, component) => sum + component.volumeFraction, 0);
  const molesOf = (key: string, fraction: number): Contents["solvents"] => {
    const solvent = solventByKey(key);
    return solvent && fraction > 0
      ? [{ solvent: solvent.key, amount: (fraction * total) / molarVolume(solvent, contents.temperatureK) }]
      : [];
  };
  const organic =
    rest > 0
      ? others.flatMap((other) => molesOf(other.solvent.key, ((1 - water) * other.volumeFraction) / rest))
      : molesOf(OTHER_SOLVENT, 1 - water);
  return [...molesOf("water", water), ...organic];
}

/** Says what the rest is where the note has water alone. */
export function waterLabel(contents: Contents): string {
  const { components } = compositionOf(contents.solvents, contents.temperatureK);
  const alone = components.every((component) => component.solvent.nucleophile === "water");
  return alone ? `${AXES.water.label.replace(")", `, the rest ${OTHER_SOLVENT})`)}` : AXES.water.label;
}

/** Six half-lives, where the approach is known. */
export function timeSpan(forms: CarbonylForms | undefined, count: number): number[] {
  const halfLife = forms?.time?.halfLife.value;
  return even(0, halfLife !== undefined && halfLife > 0 ? halfLife * 6 : 3600)(count);
}

export function controlsOf(stand: Stand): Curves["controls"] {
  return (["water", "temperature", "pH", "concentration"] as const).map((axis) => {
    const { label, low, high, step } = AXES[axis];
    return { axis, label, value: stand[axis], low, high, step };
  });
}
