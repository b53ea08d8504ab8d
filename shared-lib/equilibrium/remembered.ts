/**
 * Speciations by what is in the vessel: an edit changes one step of a note, and the vessels of the others are what they were.
 * Contents are plain data, so the same key always has the same answer; the memory is bounded and forgets the oldest use first.
 */

import type { Compound } from "../compounds/types.ts";
import { speciate } from "./speciate.ts";
import type { Contents, Speciation } from "./types.ts";

const MOST_REMEMBERED = 4000;
const remembered = new Map<string, Speciation>();

/** A compound stands in the key by its identity and its structure: a lab's own reagent may bear a catalogue's name. */
function keyOf(contents: Contents): string {
  return JSON.stringify(contents, (name, value: unknown) => {
    if (name !== "compound") return value;
    const { id, smiles, origin } = value as Compound;
    return `${origin} ${id} ${smiles}`;
  });
}

/** As `speciate`, answered from memory for contents that were worked out before. */
export function rememberedSpeciation(contents: Contents): Speciation {
  const key = keyOf(contents);
  const known = remembered.get(key);
  // A map keeps the order in which keys were set: what is used goes to the end, and the oldest stands first.
  if (known) remembered.delete(key);
  const speciation = known ?? speciate(contents);
  remembered.set(key, speciation);
  if (remembered.size > MOST_REMEMBERED) remembered.delete(remembered.keys().next().value as string);
  return speciation;
}
