/** Rings over two sites and oligomers, by the compound; and the longer chains that simple aldehydes make in concentrated solution. */

import { ringChainOf } from "../../constants/ring-chains.ts";
import table from "../../generated/oligomers.json" with { type: "json" };
import type { DerivationLine, FormKind } from "../../model/contract.ts";
import { vantHoff } from "../constants/temperature.ts";
import { addChain, CHAIN_SOURCE } from "./chain.ts";
import { type Conditions, type Species, WATER } from "./species.ts";

interface Row {
  readonly label: string;
  readonly kind: FormKind;
  readonly smiles: string;
  readonly units: number;
  readonly waters: number;
  readonly log10: number;
  readonly overOpen: boolean;
  /** kJ/mol */
  readonly enthalpy: number;
  readonly sd: number;
  readonly source: string;
}
const TABLE = table as unknown as Readonly<Record<string, readonly Row[]>>;
const STANDARD_K = 298.15;
const { LN10 } = Math;

/** kJ/mol: hydration and closing of a ring together (judgement). */
const BRIDGE_ENTHALPY = -35;

function bridge(parent: string): Row | undefined {
  const row = ringChainOf(parent, parent);
  if (row?.closes !== "cyclic hydrate") return undefined;
  return {
    label: "cyclic hydrate",
    kind: "cyclic hemiacetal",
    smiles: "",
    units: 1,
    waters: 1,
    log10: row.log10,
    overOpen: true,
    enthalpy: BRIDGE_ENTHALPY,
    sd: row.sd,
    source: row.source,
  };
}

function rowsOf(parent: string): readonly Row[] {
  const bridged = bridge(parent);
  return bridged ? [bridged, ...(TABLE[parent] ?? [])] : (TABLE[parent] ?? []);
}

/** True when a table holds a ring over two sites or an oligomer of the compound. */
export function hasOligomers(parentSmiles: string): boolean {
  return rowsOf(parentSmiles).length > 0;
}

/** ln of all monomeric forms over the open one in dilute water, and how it moves with each error. */
function monomers(species: readonly Species[]): { ln: number; errors: Record<string, number> } {
  const inWater = species.filter((one) => one.units === 1 && one.holds.every(({ ligand }) => ligand === WATER));
  const sum = inWater.reduce((total, one) => total + Math.exp(one.ln), 0);
  const errors: Record<string, number> = {};
  for (const one of inWater)
    for (const [source, size] of Object.entries(one.errors))
      errors[source] = (errors[source] ?? 0) + (size * Math.exp(one.ln)) / sum;
  return { ln: Math.log(sum), errors };
}

/** Rings and oligomers of the table for a compound, with their lines. */
export function tabledOligomers(
  parentSmiles: string,
  monomer: readonly Species[],
  conditions: Conditions,
): { readonly species: readonly Species[]; readonly lines: readonly DerivationLine[] } {
  const rows = conditions.water ? rowsOf(parentSmiles) : [];
  const reference = monomers(monomer);
  const species = rows.map((row): Species => {
    const shift = vantHoff({ value: row.enthalpy, sd: 8 }, STANDARD_K, conditions.temperatureK);
    const shared = row.overOpen ? {} : reference.errors;
    const errors = Object.fromEntries(Object.entries(shared).map(([source, size]) => [source, size * row.units]));
    return {
      units: row.units,
      holds: row.waters > 0 ? [{ ligand: WATER, count: row.waters }] : [],
      ln: LN10 * (row.log10 + shift.shift) + (row.overOpen ? 0 : row.units * reference.ln),
      corrections: [],
      errors: { ...errors, [row.label]: Math.hypot(row.sd, shift.sd) },
      parts: [{ kind: row.kind, label: row.label, smiles: row.smiles || undefined, share: 1 }],
    };
  });
  const lines = rows.map((row) => ({
    says: `${row.label}: ${row.overOpen ? "over the open molecule" : `from ${row.units} molecules, over all monomeric forms`}`,
    value: `log K = ${row.log10.toFixed(2).replace("-", "−")} ± ${row.sd.toFixed(2)}${row.units > 1 ? ` (M⁻${"¹²³"[row.units - 2] ?? ""})` : ""}`,
    source: row.source,
  }));
  return { species, lines };
}

/** Longest chain that a simple aldehyde is followed to; each further unit is some tens of times rarer. */
const LONGEST = 4;
const CHAIN_SD = 0.4;

/** Glycols and hemiacetals of two and more units of a simple aldehyde, by the chain steps of formaldehyde. */
export function aldehydeChains(
  monomer: readonly Species[],
  lnHydration: number,
  temperatureK: number,
): { readonly species: readonly Species[]; readonly lines: readonly DerivationLine[] } {
  const species: Species[] = [];
  for (const one of monomer) {
    const part = one.parts[0];
    if (part?.kind !== "hydrate" && part?.kind !== "hemiacetal") continue;
    const label = part.kind === "hydrate" ? "longer glycols" : `longer ${part.label}s`;
    addChain(species, one, { lnHydration, temperatureK, longest: LONGEST, label, stepSd: CHAIN_SD });
  }
  const lines =
    species.length > 0
      ? [
          {
            says: "Concentrated: longer chains by the steps that formaldehyde shows, within a factor of 2.5",
            source: CHAIN_SOURCE,
          },
        ]
      : [];
  return { species, lines };
}
