/** Settings as a client sends them, made safe: a wrong type is the default, a figure outside its range is its nearest end. */

import { DEFAULT_SETTINGS, type Settings } from "../shared-lib/model/settings.ts";

/** What only the editor needs, beside the settings of the analysis. */
export interface EditorSettings {
  readonly analysis: Settings;
  readonly codeLens: boolean;
  /** ms between the last keystroke and the display of findings. */
  readonly displayDelay: number;
  /** Longer notes are left alone (UTF-16 code units). */
  readonly longestNote: number;
}

export const DEFAULT_EDITOR_SETTINGS: EditorSettings = {
  analysis: DEFAULT_SETTINGS,
  codeLens: false,
  displayDelay: 250,
  longestNote: 2_000_000,
};

export const SECTION = "oxomargin";

const LEVELS = ["off", "hint", "note", "warning"] as const;

/** Reads the section `oxomargin` of a client's configuration. Never throws. */
export function readSettings(given: unknown): EditorSettings {
  const map = asMap(given);
  const base = DEFAULT_EDITOR_SETTINGS;
  return {
    analysis: {
      basis: oneOf(map.basis, ["charged", "free"] as const, DEFAULT_SETTINGS.basis),
      hints: oneOf(map.hints, ["off", "notable", "all"] as const, DEFAULT_SETTINGS.hints),
      roomTemperatureC: within(map.roomTemperature, 0, 40, DEFAULT_SETTINGS.roomTemperatureC),
      neutralPH: within(map.neutralPH, 0, 14, DEFAULT_SETTINGS.neutralPH),
      boundShare: within(map.boundShare, 0.01, 1, DEFAULT_SETTINGS.boundShare),
      findings: findingLevels(map.findings),
    },
    codeLens: typeof map.codeLens === "boolean" ? map.codeLens : base.codeLens,
    displayDelay: within(map.displayDelay, 0, 5_000, base.displayDelay),
    longestNote: within(map.longestNote, 10_000, 20_000_000, base.longestNote),
  };
}

function asMap(given: unknown): Readonly<Record<string, unknown>> {
  return typeof given === "object" && given !== null && !Array.isArray(given) ? (given as Record<string, unknown>) : {};
}

function oneOf<T extends string>(given: unknown, allowed: readonly T[], otherwise: T): T {
  return allowed.find((value) => value === given) ?? otherwise;
}

function within(given: unknown, low: number, high: number, otherwise: number): number {
  return typeof given === "number" && Number.isFinite(given) ? Math.min(high, Math.max(low, given)) : otherwise;
}

function findingLevels(given: unknown): Settings["findings"] {
  const levels: [string, (typeof LEVELS)[number]][] = [];
  for (const [code, level] of Object.entries(asMap(given))) {
    const known = LEVELS.find((value) => value === level);
    if (known) levels.push([code, known]);
  }
  return Object.fromEntries(levels);
}
