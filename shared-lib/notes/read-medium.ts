/** A medium on its own, as it is given to an estimate: "water", "9:1 MeOH/H2O", "THF/water 4:1 (v/v)", "50 wt% ethanol", "PBS". */

import type { Lexicon } from "../compounds/lexicon.ts";
import { bufferByKey, usualPH } from "../media/buffers.ts";
import { stockAmounts, stockMediumNamed } from "../media/stock-media.ts";
import { bindAmounts } from "./bind.ts";
import { amountsOf, readMedia } from "./media.ts";
import { scanBlock } from "./scan.ts";

export type StandaloneMedium =
  | {
      readonly ok: true;
      readonly amounts: readonly { readonly solvent: string; readonly amount: number }[];
      readonly pH?: number;
    }
  | { readonly ok: false; readonly problem: string };

/** Reads a medium. @returns moles of each solvent (on one litre), or what is wrong and how to write it */
export function readMedium(text: string, lexicon: Lexicon): StandaloneMedium {
  const stock = stockMediumNamed(text.trim());
  if (stock)
    return { ok: true, amounts: stockAmounts(stock, 1000), ...(stock.pH === undefined ? {} : { pH: stock.pH }) };
  const { items } = scanBlock(text, { lexicon });
  const solvents = items.flatMap((item, i) =>
    item.kind === "name" && item.match.compound.solvent !== undefined ? [i] : [],
  );
  const stranger = items.find((item) => item.kind === "name" && item.match.compound.solvent === undefined);
  if (solvents.length === 0 || stranger)
    return {
      ok: false,
      problem: `"${text}" names no solvent that is known. Write one as in a note: water, MeOH, 9:1 MeOH/H2O, THF/water 4:1 (v/v), 50 wt% ethanol, PBS.`,
    };
  const unknown = items.find(
    (item) =>
      item.kind === "word" &&
      item.word.length > 2 &&
      !["and", "the", "with", "aqueous", "buffer", "mixture", "vol", "dry", "anhydrous", "neat", "pure"].includes(
        item.word,
      ),
  );
  if (unknown?.kind === "word")
    return { ok: false, problem: `"${unknown.word}" in "${text}" is no solvent that is known` };
  const bindings = new Map(bindAmounts(items).map((binding) => [binding.name, binding]));
  const phrases = readMedia(items, bindings, solvents);
  const amounts = phrases.flatMap((phrase) => amountsOf(phrase.parts));
  const buffer = items.flatMap((item) =>
    item.kind === "name" && item.match.compound.buffer ? [bufferByKey(item.match.compound.buffer)] : [],
  )[0];
  const pH = phrases.find((phrase) => phrase.pH !== undefined)?.pH ?? (buffer ? usualPH(buffer, 298.15) : undefined);
  return amounts.length > 0
    ? { ok: true, amounts, ...(pH === undefined ? {} : { pH }) }
    : { ok: false, problem: `"${text}" gives no amounts that make a mixture` };
}
