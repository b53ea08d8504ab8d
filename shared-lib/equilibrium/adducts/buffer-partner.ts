/** Buffers whose amine adds to carbonyls, as a dissolved partner. */

import type { Compound } from "../../compounds/types.ts";
import { bufferByKey } from "../../media/buffers.ts";
import type { Contents } from "../types.ts";

/** By key of the buffers table: the amine and its molar mass; a buffer's binding is never the purpose of a step. */
const AMINES: Readonly<
  Record<string, { readonly smiles: string; readonly molarMass: number; readonly formula: string }>
> = {
  Tris: { smiles: "NC(CO)(CO)CO", molarMass: 121.136, formula: "C4H11NO3" },
  glycine: { smiles: "NCC(=O)O", molarMass: 75.067, formula: "C2H5NO2" },
  glycylglycine: { smiles: "NCC(=O)NCC(=O)O", molarMass: 132.119, formula: "C4H8N2O3" },
};

/** The amine of a buffer with its mol in so many litres; undefined for a buffer that leaves carbonyls alone. */
export function bufferPartner(
  buffer: Contents["buffer"],
  litres: number,
): { readonly compound: Compound; readonly amount: number } | undefined {
  const amine = buffer && AMINES[buffer.buffer];
  if (!buffer || !amine) return undefined;
  const molarity = buffer.molarity ?? bufferByKey(buffer.buffer)?.molarity ?? 0;
  const compound: Compound = {
    id: buffer.buffer,
    name: buffer.buffer,
    ...amine,
    tags: ["primary amine"],
    origin: "catalogue",
  };
  return molarity > 0 && litres > 0 ? { compound, amount: molarity * litres } : undefined;
}
