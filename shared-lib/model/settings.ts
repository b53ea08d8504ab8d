/** What the writer may set; every door of shared-lib takes these as plain data. */

export interface Settings {
  /** What the writer counts equivalents in: what was charged, or what is free in the flask. */
  readonly basis: "charged" | "free";
  /** Which hints the margin shows: none, those worth acting on, or one for each carbonyl charge. */
  readonly hints: "off" | "notable" | "all";
  /** Temperature in °C where the note gives none. */
  readonly roomTemperatureC: number;
  /** pH of water and of unbuffered aqueous media where the note gives none. */
  readonly neutralPH: number;
  /** A finding speaks when at least this share of the carbonyl is bound (0 to 1). */
  readonly boundShare: number;
  /** Severity by finding code; "off" silences a finding. */
  readonly findings: Readonly<Record<string, "off" | "hint" | "note" | "warning">>;
}

export const DEFAULT_SETTINGS: Settings = {
  basis: "charged",
  hints: "notable",
  roomTemperatureC: 25,
  neutralPH: 7,
  boundShare: 0.5,
  findings: {},
};
