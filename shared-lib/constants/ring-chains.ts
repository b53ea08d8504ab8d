/** Ring–chain constants, [closed]/[free C=O] in water (ring-chain.tsv). */

import table from "../generated/ring-chain.json" with { type: "json" };

export interface RingChainRow {
  readonly parent: string;
  /** "sugar rings", "5-ring hemiacetal", "cyclic hydrate" … */
  readonly closes: string;
  readonly log10: number;
  readonly sd: number;
  readonly celsius: number;
  readonly medium: string;
  readonly source: string;
}

const TABLE = table as unknown as Readonly<Record<string, readonly RingChainRow[]>>;

/** Rows of every isomer of a parent, since a note seldom gives the stereo. */
const BY_PARENT = new Map<string, RingChainRow[]>();
for (const row of Object.values(TABLE).flat()) {
  const rows = BY_PARENT.get(row.parent);
  if (rows) rows.push(row);
  else BY_PARENT.set(row.parent, [row]);
}

/**
 * Published ring–chain constant of a compound.
 *
 * @param canonicalSmiles with stereo: the isomer's own value where it is known
 * @param parent without stereo: else the mean over its isomers, with their scatter
 */
export function ringChainOf(canonicalSmiles: string, parent: string): RingChainRow | undefined {
  const rows = TABLE[canonicalSmiles] ?? BY_PARENT.get(parent) ?? [];
  const [first] = rows;
  if (!first) return undefined;
  const log10 = rows.reduce((sum, row) => sum + row.log10, 0) / rows.length;
  const scatter = Math.sqrt(rows.reduce((sum, row) => sum + (row.log10 - log10) ** 2, 0) / rows.length);
  return { ...first, log10, sd: Math.hypot(first.sd, scatter) };
}
