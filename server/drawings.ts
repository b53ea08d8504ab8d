/** Structures as images that a hover can show: a data URI in the colour of the theme's text, nothing to fetch. */

import type { StructureToolkit } from "../shared-lib/compounds/types.ts";
import type { Theme } from "./protocol.ts";

/** Grey that reads on white and on black, for a client that does not say its theme. */
const UNKNOWN_INK = "#808080";

const INKS: Readonly<Record<Theme, string>> = {
  light: "#1f1f1f",
  dark: "#d4d4d4",
  "high contrast dark": "#ffffff",
  "high contrast light": "#000000",
};

const MOST_KEPT = 300;

export interface Drawings {
  image(smiles: string, width: number, height: number): string | undefined;
  setTheme(theme: Theme): void;
}

/** @param toolkit gives the toolkit when it is loaded */
export function createDrawings(toolkit: () => StructureToolkit | undefined): Drawings {
  let ink = UNKNOWN_INK;
  const kept = new Map<string, string>();
  return {
    image(smiles, width, height) {
      const key = `${width} ${height} ${smiles}`;
      const known = kept.get(key);
      if (known !== undefined) return known;
      const svg = toolkit()?.draw(smiles, width, height);
      if (svg === undefined) return undefined;
      const address = `data:image/svg+xml;base64,${base64(svg.replaceAll("currentColor", ink))}`;
      if (kept.size >= MOST_KEPT) kept.clear();
      kept.set(key, address);
      return address;
    },
    setTheme(theme) {
      ink = INKS[theme] ?? UNKNOWN_INK;
      kept.clear();
    },
  };
}

function base64(text: string): string {
  let binary = "";
  for (const byte of new TextEncoder().encode(text)) binary += String.fromCharCode(byte);
  return btoa(binary);
}
