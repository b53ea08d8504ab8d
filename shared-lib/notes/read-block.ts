/** A block read by itself: items, bindings, roles, solvent phrases. Depends on its text alone, so it is cached by it. */

import type { Lexicon } from "../compounds/lexicon.ts";
import type { StructureToolkit } from "../compounds/types.ts";
import type { Role } from "../model/contract.ts";
import { type Binding, bindAmounts } from "./bind.ts";
import type { Block } from "./blocks.ts";
import { type MediumReading, readMedia } from "./media.ts";
import { rolesOf } from "./roles.ts";
import { type Item, type Scan, scanBlock } from "./scan.ts";
import { readTable } from "./table.ts";

export interface BlockReading {
  readonly scan: Scan;
  readonly bindings: ReadonlyMap<number, Binding>;
  /** By item index of a name. */
  readonly roles: ReadonlyMap<number, Role>;
  readonly media: readonly MediumReading[];
  /** Offset in the block where work-up begins; its length when it does not. */
  readonly workUp: number;
  /** A new reaction begins in this block although an earlier one was worked up. */
  readonly charges: boolean;
}

const MOST_CACHED = 1000;
const caches = new WeakMap<Lexicon, Map<string, BlockReading>>();

/** How many blocks were read afresh: tests count on it. */
export const counter = { read: 0 };

function isSolvent(items: readonly Item[], name: number): boolean {
  const item = items[name];
  return item?.kind === "name" && item.match.compound.solvent !== undefined;
}

function readAfresh(block: Block, lexicon: Lexicon, structures: StructureToolkit | undefined): BlockReading {
  counter.read++;
  const scan = scanBlock(block.text, { lexicon, structures });
  const bindings = block.kind === "table" ? readTable(block.text, scan.items) : bindAmounts(scan.items);
  const byName = new Map(bindings.map((binding) => [binding.name, binding]));
  const { roles, workUp } = rolesOf(block, scan.items, byName);
  const solvents = bindings
    .map((binding) => binding.name)
    .filter((name) => roles.get(name) === "solvent" && isSolvent(scan.items, name));
  const charges = bindings.some(
    (binding) =>
      roles.get(binding.name) === "reagent" &&
      binding.amounts.some((amount) => ["amount", "mass", "volume", "equivalents"].includes(amount.of)),
  );
  return { scan, bindings: byName, roles, media: readMedia(scan.items, byName, solvents), workUp, charges };
}

/** Reading of a block, from the cache when the same text was read before. */
export function readBlock(block: Block, lexicon: Lexicon, structures: StructureToolkit | undefined): BlockReading {
  let cache = caches.get(lexicon);
  if (!cache) {
    cache = new Map();
    caches.set(lexicon, cache);
  }
  const key = `${block.kind} ${structures ? "with" : "without"} ${block.text}`;
  const known = cache.get(key);
  if (known) {
    // Most recently used last: the oldest is the first to go.
    cache.delete(key);
    cache.set(key, known);
    return known;
  }
  const fresh = readAfresh(block, lexicon, structures);
  cache.set(key, fresh);
  if (cache.size > MOST_CACHED) cache.delete(cache.keys().next().value as string);
  return fresh;
}
