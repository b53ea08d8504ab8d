/** Solvent phrases: "in water (20 mL) and methanol (5 mL)", "9:1 MeOH/H2O", "50% aq. EtOH", "PBS (pH 7.4)". */

import { bufferByKey } from "../media/buffers.ts";
import { type Composition, compositionOf, mediumKind } from "../media/composition.ts";
import { densityAt, molarVolume, solventByKey } from "../media/solvents.ts";
import type { MediumKind } from "../model/contract.ts";
import type { Binding } from "./bind.ts";
import type { Item } from "./scan.ts";
import type { MediumPart } from "./types.ts";

export interface MediumReading {
  readonly parts: readonly MediumPart[];
  readonly volumeL?: number;
  readonly pH?: number;
  readonly start: number;
  readonly end: number;
  /** Item indices of the names. */
  readonly names: readonly number[];
}

/** Marks and words that join two solvents to one mixture. */
const JOINTS = new Set([
  "and",
  "in",
  "with",
  "plus",
  "mixture",
  "of",
  "a",
  "the",
  "aq",
  "aqueous",
  "dry",
  "anhydrous",
  "v",
  "or",
]);

/** May the items between two solvents belong to one mixture? */
function joined(items: readonly Item[], from: number, to: number): boolean {
  if (to - from > 14) return false;
  for (let i = from + 1; i < to; i++) {
    const item = items[i] as Item;
    if (item.kind === "quantity" && ["volume", "mass", "assay", "concentration"].includes(item.quantity.of)) continue;
    if (item.kind === "ratio" || item.kind === "number" || item.kind === "pH") continue;
    if (item.kind === "mark" && "()[]/:,|+".includes(item.mark)) continue;
    if (item.kind === "word" && JOINTS.has(item.word)) continue;
    return false;
  }
  return true;
}

function volumeOf(binding: Binding | undefined): number | undefined {
  const amount = binding?.amounts.find((candidate) => candidate.of === "volume");
  return amount?.base;
}

/** Everything one solvent name says: itself, and water for "50 % aq. ethanol" or "1 M HCl". */
function partsOf(item: Item & { kind: "name" }, binding: Binding | undefined, aqueous: boolean): MediumPart[] {
  const { compound } = item.match;
  const solvent = compound.buffer ?? (compound.solvent as string);
  const words = item.match.compound.name;
  const strength = binding?.amounts.find((amount) => amount.of === "assay");
  const mass = binding?.amounts.find((amount) => amount.of === "mass");
  const volumeL = volumeOf(binding);
  const molarity = binding?.amounts.find((amount) => amount.of === "concentration")?.base;
  const own: MediumPart = {
    solvent,
    words,
    basis: "volume",
    ...(volumeL === undefined ? {} : { volumeL }),
    ...(mass ? { massG: mass.base } : {}),
    ...(molarity === undefined ? {} : { molarity }),
  };
  const share =
    strength && strength.base > 0.02 && strength.base < 0.985 && solvent !== "water"
      ? strength.base
      : aqueous && solvent !== "water"
        ? 0.5
        : undefined;
  if (share === undefined) return [own];
  const basis = strength?.unit.startsWith("wt") ? "mass" : "volume";
  if (volumeL !== undefined && basis === "volume")
    return [
      { ...own, volumeL: volumeL * share },
      { solvent: "water", words: "water", basis, volumeL: volumeL * (1 - share) },
    ];
  return [
    { solvent, words, basis, part: share, ...(volumeL === undefined ? {} : { volumeL: volumeL * share }) },
    {
      solvent: "water",
      words: "water",
      basis,
      part: 1 - share,
      ...(volumeL === undefined ? {} : { volumeL: volumeL * (1 - share) }),
    },
  ];
}

/** The ratio that stands right before the first or right behind the last name. */
function ratioOf(items: readonly Item[], first: number, last: number): readonly number[] | undefined {
  for (const i of [first - 1, first - 2, last + 1, last + 2, last + 3]) {
    const item = items[i];
    if (item?.kind === "ratio") return item.parts;
  }
  return undefined;
}

/** A volume written once for the whole mixture: in the bracket behind it, or before it. */
function sharedVolume(bindings: ReadonlyMap<number, Binding>, names: readonly number[]): number | undefined {
  const volumes = names.map((name) => volumeOf(bindings.get(name)));
  const written = volumes.filter((volume) => volume !== undefined);
  return names.length > 1 && written.length === 1 ? written[0] : undefined;
}

/**
 * Groups the solvent names into phrases.
 *
 * @param solvents indices of the names whose role is solvent, in order
 */
export function readMedia(
  items: readonly Item[],
  bindings: ReadonlyMap<number, Binding>,
  solvents: readonly number[],
): readonly MediumReading[] {
  const groups: number[][] = [];
  for (const name of solvents) {
    const group = groups.at(-1);
    const previous = group?.at(-1);
    if (group && previous !== undefined && joined(items, previous, name)) group.push(name);
    else groups.push([name]);
  }
  return groups.map((names) => mediumOf(items, bindings, names));
}

function mediumOf(
  items: readonly Item[],
  bindings: ReadonlyMap<number, Binding>,
  names: readonly number[],
): MediumReading {
  const first = names[0] as number;
  const last = names.at(-1) as number;
  const aqueousBefore = items
    .slice(Math.max(0, first - 3), first)
    .some((item) => item.kind === "word" && (item.word === "aqueous" || item.word === "aq"));
  const each = names.map((name) => ({
    name,
    parts: partsOf(items[name] as Item & { kind: "name" }, bindings.get(name), aqueousBefore && names.length === 1),
  }));
  const ratio = names.length > 1 ? ratioOf(items, first, last) : undefined;
  const total = sharedVolume(bindings, names);
  const wholeParts = ratio?.reduce((sum, part) => sum + part, 0) ?? names.length;
  const parts = each.flatMap(({ parts: own }, i) => {
    if (own.length > 1 || names.length === 1) return own;
    const part = ratio?.[i] ?? 1;
    const single = own[0] as MediumPart;
    if (total !== undefined) return [{ ...single, part, volumeL: (total * part) / wholeParts }];
    return single.volumeL !== undefined || single.massG !== undefined ? [single] : [{ ...single, part }];
  });
  const pH = items
    .slice(first, last + 8)
    .find(
      (item, i) =>
        item.kind === "pH" &&
        items.slice(first, first + i).every((between) => !(between.kind === "mark" && between.mark === ".")),
    ) as (Item & { kind: "pH" }) | undefined;
  const volumes = parts.map((part) => part.volumeL);
  const volumeL =
    total ??
    (volumes.every((volume) => volume !== undefined)
      ? volumes.reduce<number>((sum, volume) => sum + (volume ?? 0), 0)
      : undefined);
  return {
    parts,
    ...(volumeL === undefined ? {} : { volumeL }),
    ...(pH ? { pH: pH.pH } : {}),
    start: (items[first] as Item).start,
    end: (items[last] as Item).end,
    names,
  };
}

/** Moles of each part, on one litre where no volume is written, so that a composition can be made of a phrase. */
export function amountsOf(parts: readonly MediumPart[]): { solvent: string; amount: number }[] {
  const anyVolume = parts.some((part) => part.volumeL !== undefined || part.massG !== undefined);
  return parts.flatMap((part) => {
    // A buffer is water as far as the composition goes.
    const key = part.solvent;
    const solvent =
      key === undefined ? undefined : (solventByKey(key) ?? (bufferByKey(key) ? solventByKey("water") : undefined));
    if (!solvent) return [];
    const litres =
      part.volumeL ?? (part.massG === undefined ? undefined : part.massG / densityAt(solvent, 298.15) / 1000);
    if (litres !== undefined) return [{ solvent: solvent.key, amount: litres / molarVolume(solvent, 298.15) }];
    if (anyVolume && parts.length > 1 && part.part === undefined) return [];
    const share = part.part ?? 1;
    if (part.basis === "mass") return [{ solvent: solvent.key, amount: (share * 1000) / solvent.molarMass }];
    if (part.basis === "mole") return [{ solvent: solvent.key, amount: share }];
    return [{ solvent: solvent.key, amount: share / molarVolume(solvent, 298.15) }];
  });
}

/** Composition and kind of a phrase. */
export function mixtureOf(parts: readonly MediumPart[]): { composition: Composition; kind: MediumKind } {
  const composition = compositionOf(amountsOf(parts), 298.15);
  return { composition, kind: mediumKind(composition) };
}
